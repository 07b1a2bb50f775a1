import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Office } from '../../../../tests/support/office.ts';
import type { SaveTheme } from '../../forms/save-theme.ts';
import { HOUSE_THEME } from '../../themes/theme.ts';
import type { Context } from '../context.ts';
import { daybook } from '../db/schema/index.ts';
import { ReleaseShelf, type ShelfPage } from '../shelf/shelf.ts';
import { deleteTheme, listThemes, saveTheme, shelveThemes } from './themes.ts';

let database: TestDatabase;
let office: Office;
let folder: string;
let shelf: ReleaseShelf;
let editor: Context;

beforeAll(async () => {
	database = await openTestDatabase();
	folder = await mkdtemp(join(tmpdir(), 'steelyard-themes-'));
});
afterAll(async () => {
	await database.close();
	await rm(folder, { recursive: true });
});
beforeEach(async () => {
	await database.fresh();
	await rm(join(folder, 'themes.json'), { force: true });
	shelf = new ReleaseShelf(folder);
	office = new Office(database.db, shelf);
	editor = await office.as(await office.add('Perpetua Lindqvane', ['editor']));
});

const partner = (over: Partial<SaveTheme> = {}): SaveTheme => ({
	...HOUSE_THEME,
	id: '',
	name: 'The Harbour Courier',
	ground: '#fdf6ec',
	accent: '#8b1a2b',
	...over
});
const code = (wanted: string) => expect.objectContaining({ code: wanted });

const page: ShelfPage = {
	slug: 'a',
	release: 1,
	contentType: 'text/html; charset=utf-8',
	sha256: 'x',
	plain: Buffer.from(
		'<head><link rel="preload" as="font" href="/press/literata.woff2"><style>p{}</style></head><body></body>'
	),
	packed: { br: null, gzip: null },
	styles: ['sha256-old']
};
const dressed = (id: string, on = shelf) => on.themes.dress(page, `/w/a/latest?theme=${id}`);

test('a theme is kept, listed with who kept it, and put before readers at once', async () => {
	const id = await saveTheme(editor, partner());
	expect(await listThemes(editor)).toEqual([
		{
			...HOUSE_THEME,
			id,
			name: 'The Harbour Courier',
			ground: '#fdf6ec',
			accent: '#8b1a2b',
			savedBy: expect.objectContaining({ name: 'Perpetua Lindqvane' }) as unknown,
			savedAt: office.now.toISOString()
		}
	]);
	const html = dressed(id).plain.toString();
	expect(html).toMatch(/<style>p\{\}<\/style><style>@media \(forced-colors:none\).*<\/head>/);
	expect(html).toContain('--indelible:light-dark(#8b1a2b,');
	expect(dressed(id).styles).toHaveLength(2);
	expect(dressed(id).sha256).not.toBe(page.sha256);
	expect(dressed(id)).toBe(dressed(id));
});

test('a theme that can’t be read well enough is never kept', async () => {
	const before = await saveTheme(editor, partner());
	for (const id of ['', before]) {
		await expect(
			saveTheme(editor, partner({ id, name: 'Pale', accent: '#f0a030' }))
		).rejects.toMatchObject({
			code: 'theme-fails',
			details: {
				problems: expect.arrayContaining([
					expect.stringMatching(
						/^Links on the ground, light scheme: 2\.0 to 1, and 4\.5 is needed\./
					)
				]) as unknown
			}
		});
	}
	expect((await listThemes(editor)).map(({ accent }) => accent)).toEqual(['#8b1a2b']);
});

test('a change reaches frames, keeps the id, and another face isn’t loaded ahead', async () => {
	const id = await saveTheme(editor, partner());
	const old = dressed(id);
	expect(await saveTheme(editor, partner({ id, face: 'host-sans', radiusPx: 10 }))).toBe(id);
	expect(dressed(id).plain.toString()).toContain('--corner:10px');
	expect(dressed(id).plain.toString()).not.toContain('preload');
	expect(old.plain.toString()).toContain('preload');
});

test('names are one theme’s alone', async () => {
	const id = await saveTheme(editor, partner());
	await expect(saveTheme(editor, partner())).rejects.toEqual(code('theme-name-taken'));
	await saveTheme(editor, partner({ id }));
	const twice = await Promise.allSettled(
		[1, 2].map(() => saveTheme(editor, partner({ name: 'Twice' })))
	);
	expect(twice.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
	await expect(saveTheme(editor, partner({ id: 'nowhere', name: 'X' }))).rejects.toEqual(
		code('not-found')
	);
});

test('a deleted theme, an unknown one and a strange address give the house’s look', async () => {
	const id = await saveTheme(editor, partner());
	await deleteTheme(editor, id);
	expect(dressed(id)).toBe(page);
	expect(dressed('nobody')).toBe(page);
	expect(shelf.themes.dress(page, '/w/a/latest?theme=</style>')).toBe(page);
	expect(shelf.themes.dress(page, '/w/a/latest')).toBe(page);
	await expect(deleteTheme(editor, id)).rejects.toEqual(code('not-found'));
	const events = (await database.db.select().from(daybook)).map(({ event }) => event);
	expect(events.filter((event) => event.startsWith('theme'))).toEqual([
		'theme-saved',
		'theme-deleted'
	]);
});

test('after a restart frames are themed before the database is open, and a damaged copy stops nothing', async () => {
	const id = await saveTheme(editor, partner());
	const restarted = new ReleaseShelf(folder);
	await restarted.load();
	expect(dressed(id, restarted)).not.toBe(page);

	const file = join(folder, 'themes.json');
	for (const damage of ['{', 'null', '[["x",{"ground":"red;}</style>","accent":"#000000"}]]']) {
		await writeFile(file, damage);
		const damaged = new ReleaseShelf(folder);
		await damaged.load();
		expect(dressed('x', damaged)).toBe(page);
		await shelveThemes({ db: database.db, shelf: damaged });
		expect(dressed(id, damaged)).not.toBe(page);
	}
	expect(await readFile(file, 'utf8')).toContain('#fdf6ec');
});

test('editors and admins keep themes; everyone in the house may look', async () => {
	for (const role of ['writer', 'scientist'] as const) {
		const other = await office.as(await office.add(`A-${role} B`, [role]));
		await expect(saveTheme(other, partner())).rejects.toEqual(code('not-permitted'));
		await expect(deleteTheme(other, 'x')).rejects.toEqual(code('not-permitted'));
		expect(await listThemes(other)).toEqual([]);
	}
	const admin = await office.as(await office.add('Juno B', ['admin']));
	await saveTheme(admin, partner());
	await expect(listThemes(office.stranger())).rejects.toEqual(code('not-signed-in'));
});
