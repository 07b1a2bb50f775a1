import { spawn } from 'node:child_process';
import { once } from 'node:events';
import type * as Fs from 'node:fs';
import { writeFileSync } from 'node:fs';
import { mkdtemp, readdir, readFile, realpath, rm } from 'node:fs/promises';
import { hostname, tmpdir } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { lockDataFolder } from '../../lib/server/db/lock.ts';
import { FolderHeld, holdFolder } from './folder-lock.mjs';

/** What another process does in the moment between our look at the note and our taking it away. */
const meanwhile = vi.hoisted(() => ({ act: null as (() => void) | null }));
vi.mock('node:fs', async (original) => {
	const fs = await original<typeof Fs>();
	return {
		...fs,
		renameSync(...names: Parameters<typeof Fs.renameSync>) {
			meanwhile.act?.();
			meanwhile.act = null;
			fs.renameSync(...names);
		}
	};
});

let folder: string;

beforeEach(async () => {
	folder = await realpath(await mkdtemp(join(tmpdir(), 'steelyard-lock-')));
});
afterEach(() => rm(folder, { recursive: true }));

test('one holder at a time, and it can be had again after', async () => {
	const release = await holdFolder(folder);
	await expect(holdFolder(folder)).rejects.toThrow(FolderHeld);
	await expect(holdFolder(folder)).rejects.toThrow(`${folder} is held by process ${process.pid}`);
	release();
	(await holdFolder(folder))();
});

test('it is the lock that the server takes on its data, from either side', async () => {
	const release = await holdFolder(folder);
	await expect(lockDataFolder(folder)).rejects.toThrow(`in use by process ${process.pid}`);
	release();

	const lock = await lockDataFolder(folder);
	await expect(holdFolder(folder)).rejects.toThrow(`held by process ${process.pid}`);
	await lock.release();
});

test('a holder that is killed outright holds nothing', async () => {
	const lockModule = new URL('./folder-lock.mjs', import.meta.url).href;
	const holder = spawn(
		process.execPath,
		[
			'--input-type=module',
			'--eval',
			`import { holdFolder } from ${JSON.stringify(lockModule)};
			await holdFolder(${JSON.stringify(folder)});
			console.log('held');
			setInterval(() => {}, 1000);`
		],
		{ stdio: ['ignore', 'pipe', 'inherit'] }
	);
	await once(holder.stdout, 'data');
	await expect(holdFolder(folder)).rejects.toThrow(`held by process ${holder.pid}`);
	holder.kill('SIGKILL');
	await once(holder, 'close');
	(await holdFolder(folder))();
});

/** What a holder leaves that the socket doesn't show: one in another container, on another host, or dead. */
const leave = (holder: Record<string, unknown>) =>
	writeFileSync(
		join(folder, '.in-use'),
		JSON.stringify({
			pid: process.pid,
			startedTicks: '',
			boot: '',
			host: hostname(),
			command: 'node demo',
			since: '2026-12-08T09:00:00.000Z',
			...holder
		})
	);
const note = () => readFile(join(folder, '.in-use'), 'utf8');

test('a note by another host can’t be checked, so it refuses, says which file, and leaves it', async () => {
	leave({ host: 'another-host' });
	await expect(holdFolder(folder)).rejects.toThrow(/on another-host .*delete .*\.in-use/);
	expect(await note()).toContain('another-host');
});

test('a dead holder’s note is taken over', async () => {
	leave({ boot: 'an earlier boot' });
	const release = await holdFolder(folder);
	expect(JSON.parse(await note())).toMatchObject({ pid: process.pid });
	release();
});

test('of two that find a dead holder’s note, the slower one leaves the quicker one’s in place', async () => {
	leave({ boot: 'an earlier boot' });
	meanwhile.act = () => leave({ host: 'the-quicker-one' });
	await expect(holdFolder(folder)).rejects.toThrow(/on the-quicker-one/);
	expect(await note()).toContain('the-quicker-one');
	expect(await readdir(folder)).toEqual(['.in-use']);
});
