import { createHash } from 'node:crypto';
import { mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { afterEach, beforeEach, expect, test } from 'vitest';
import type { Bundle } from '../press/bundle.ts';
import { ReleaseShelf, shelfOf } from './shelf.ts';

let folder: string;
beforeEach(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-shelf-'));
});
afterEach(() => rm(folder, { recursive: true }));

const hash = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex');

function bundle(slug: string, release: number, words: string): Bundle {
	const html = Buffer.from(`<!doctype html><p>${words}</p>${' and so on'.repeat(50)}`);
	const script = Buffer.from(
		`export const words = ${JSON.stringify('the same in all releases '.repeat(20))};`
	);
	const font = Buffer.from('bytes of a font');
	const files = [
		{ key: `frames/${hash(html)}.html`, contentType: 'text/html; charset=utf-8', bytes: html },
		{ key: 'press/frame-abc.js', contentType: 'text/javascript; charset=utf-8', bytes: script },
		{ key: 'press/face-abc.woff2', contentType: 'font/woff2', bytes: font }
	].map((file) => ({ ...file, sha256: hash(file.bytes) }));
	return {
		digest: hash(html),
		files,
		manifest: {
			version: 1,
			slug,
			release,
			releasedAt: '2026-12-15T10:00:00.000Z',
			digest: hash(html),
			page: `frames/${hash(html)}.html`,
			styles: ['sha256-abc'],
			files: files.map(({ key, contentType, sha256 }) => ({ key, contentType, sha256 }))
		}
	};
}

const wordsOf = (page: { plain: Buffer } | undefined) =>
	/<p>(.*?)<\/p>/.exec(page?.plain.toString() ?? '')?.[1];

test('the newest release is the latest, and older ones stay', async () => {
	const shelf = new ReleaseShelf(folder);
	await shelf.place(bundle('first-light', 2, 'two'));
	await shelf.place(bundle('first-light', 1, 'one'));
	expect(wordsOf(shelf.find('first-light', 'latest'))).toBe('two');
	expect(wordsOf(shelf.find('first-light', 1))).toBe('one');
	expect(shelf.find('first-light', 3)).toBeUndefined();
	expect(shelf.find('elsewhere', 'latest')).toBeUndefined();
	expect(shelf.asset('frame-abc.js')?.contentType).toBe('text/javascript; charset=utf-8');
	expect(shelf.asset('../lists/first-light.1.json')).toBeUndefined();
});

test('packed forms hold the same bytes, and fonts have none', async () => {
	const shelf = new ReleaseShelf(folder);
	await shelf.place(bundle('first-light', 1, 'one'));
	const page = shelf.find('first-light', 1);
	if (!page?.packed.br || !page.packed.gzip) throw new Error('The page has no packed forms.');
	expect(brotliDecompressSync(page.packed.br)).toEqual(page.plain);
	expect(gunzipSync(page.packed.gzip)).toEqual(page.plain);
	expect(shelf.asset('face-abc.woff2')?.packed).toEqual({ br: null, gzip: null });
});

test('a shelf opened again has all that was placed', async () => {
	const before = new ReleaseShelf(folder);
	await before.place(bundle('first-light', 1, 'one'));
	await before.place(bundle('same-drop', 4, 'four'));
	const after = new ReleaseShelf(folder);
	expect(await after.load()).toEqual({ placed: 2, damaged: [] });
	expect(wordsOf(after.find('same-drop', 'latest'))).toBe('four');
	expect(after.find('first-light', 1)).toEqual(before.find('first-light', 1));
	expect((await everyFile(folder)).filter((name) => name.endsWith('.tmp'))).toEqual([]);
});

test('an altered page is left out and named, and can be placed again', async () => {
	await new ReleaseShelf(folder).place(bundle('first-light', 1, 'one'));
	const file = (await everyFile(folder)).find((name) =>
		name.endsWith(bundle('first-light', 1, 'one').digest)
	);
	if (!file) throw new Error('The page isn’t on disk.');
	await writeFile(file, (await readFile(file, 'utf8')).replace('one', 'two'));

	const shelf = new ReleaseShelf(folder);
	expect(await shelf.load()).toEqual({ placed: 0, damaged: ['first-light.1'] });
	expect(shelf.find('first-light', 'latest')).toBeUndefined();
	await shelf.place(bundle('first-light', 1, 'one'));
	expect(wordsOf(shelf.find('first-light', 'latest'))).toBe('one');
	expect(await new ReleaseShelf(folder).load()).toEqual({ placed: 1, damaged: [] });
});

test('a broken list or packed form never reaches a reader', async () => {
	await new ReleaseShelf(folder).place(bundle('first-light', 1, 'one'));
	await new ReleaseShelf(folder).place(bundle('same-drop', 1, 'drop'));
	for (const name of await everyFile(folder)) {
		if (name.endsWith('.br')) await writeFile(name, 'not packed');
		if (name.endsWith('same-drop.1.json')) await writeFile(name, '{"version":');
	}
	const shelf = new ReleaseShelf(folder);
	expect(await shelf.load()).toEqual({ placed: 1, damaged: ['same-drop.1'] });
	const page = shelf.find('first-light', 1);
	expect(page?.packed.br && brotliDecompressSync(page.packed.br)).toEqual(page?.plain);
});

test.each([
	'null',
	'[]',
	'{"version":1}',
	'{"version":1,"slug":"same-drop","release":1,"files":[null]}'
])('a list of another shape is damaged, and closes nothing else: %s', async (list) => {
	await new ReleaseShelf(folder).place(bundle('first-light', 1, 'one'));
	await new ReleaseShelf(folder).place(bundle('same-drop', 1, 'drop'));
	for (const name of await everyFile(folder))
		if (name.endsWith('same-drop.1.json')) await writeFile(name, list);
	expect(await new ReleaseShelf(folder).load()).toEqual({
		placed: 1,
		damaged: ['same-drop.1']
	});
});

test('what is out can’t be placed again with other words', async () => {
	const shelf = new ReleaseShelf(folder);
	await shelf.place(bundle('first-light', 1, 'one'));
	await shelf.place(bundle('first-light', 1, 'one'));
	await expect(shelf.place(bundle('first-light', 1, 'two'))).rejects.toThrow('out already');
	expect(wordsOf(shelf.find('first-light', 1))).toBe('one');
});

test('a slug that isn’t one names no file', async () => {
	const shelf = new ReleaseShelf(folder);
	await expect(shelf.place(bundle('../up', 1, 'one'))).rejects.toThrow('slug');
	expect(await readdir(folder)).toEqual([]);
});

test('one data folder has one shelf in the process', () => {
	expect(shelfOf(folder)).toBe(shelfOf(`${folder}/.`));
});

async function everyFile(place: string): Promise<string[]> {
	const entries = await readdir(place, { withFileTypes: true, recursive: true });
	return entries
		.filter((entry) => entry.isFile())
		.map((entry) => join(entry.parentPath, entry.name));
}
