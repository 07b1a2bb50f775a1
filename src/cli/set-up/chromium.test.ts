import { chmod, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { ensureChromium, findChromium } from './chromium.mjs';

let folder: string;

/** A program on a PATH that holds nothing else. */
async function program(name: string, lines: string[]) {
	const path = join(folder, name);
	await writeFile(path, ['#!/bin/sh', ...lines].join('\n'));
	await chmod(path, 0o755);
	return path;
}

beforeEach(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-chromium-'));
	vi.stubEnv('PATH', folder);
	vi.stubEnv('CHROMIUM_PATH', '');
});

afterEach(async () => {
	vi.unstubAllEnvs();
	vi.restoreAllMocks();
	await rm(folder, { recursive: true });
});

test('the browser that is named goes before the one on the PATH', async () => {
	const onPath = await program('chromium', ['exit 0']);
	expect(findChromium()).toBe(onPath);
	const named = await program('another-browser', ['exit 0']);
	vi.stubEnv('CHROMIUM_PATH', named);
	expect(findChromium()).toBe(named);
});

test('a name that leads nowhere is said, not passed over', async () => {
	await program('chromium', ['exit 0']);
	vi.stubEnv('CHROMIUM_PATH', join(folder, 'none'));
	expect(() => findChromium()).toThrow('there is no such file');
});

test('without the right to install, a sentence says how to get one', async () => {
	await program('apt-get', ['exit 1']);
	vi.spyOn(process, 'getuid').mockReturnValue(1000);
	await expect(ensureChromium()).rejects.toThrow('sudo apt-get install chromium');
});

test('without apt, a sentence says how to name one', async () => {
	vi.spyOn(process, 'getuid').mockReturnValue(0);
	await expect(ensureChromium()).rejects.toThrow('set CHROMIUM_PATH');
});

test('with the right to, it is installed through apt, and apt’s own words are passed on when that fails', async () => {
	vi.spyOn(process, 'getuid').mockReturnValue(0);
	await program('apt-get', ['echo "E: no such package"', 'exit 100']);
	await expect(ensureChromium()).rejects.toThrow('E: no such package');
	await program('apt-get', [
		`[ "$1" = update ] && exit 0`,
		`: > ${folder}/chromium`,
		`/bin/chmod 755 ${folder}/chromium`
	]);
	expect(await ensureChromium()).toBe(join(folder, 'chromium'));
});
