/** The picture desk against a real database and the store’s own protocol: kept whole or not at all. */
import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, SLUG } from '../../../../tests/support/desk.ts';
import type { Listening } from '../../../../tests/support/fakes/listen.ts';
import { startObjectStore } from '../../../../tests/support/fakes/object-store.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import * as made from '../../../../tests/support/pictures.ts';
import { pressKey, storeKey } from '../../pictures/address.ts';
import { placePicture } from '../../pictures/place.ts';
import { emptyRecord, type PictureRecord } from '../../pictures/record.ts';
import { LARGEST_BYTES, type PictureView } from '../../pictures/view.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import type { Context } from '../context.ts';
import { daybook, pictures } from '../db/schema/index.ts';
import { sweepPictures } from '../pictures/keep.ts';
import { openObjectStore, type ObjectStore } from '../store/object-store.ts';
import { picturesForPress } from './pictures-press.ts';
import { replacePicture } from './pictures-replace.ts';
import {
	addPicture,
	deletePicture,
	getPicture,
	listPictures,
	pictureFiles,
	readPictureFile,
	savePictureRecord
} from './pictures.ts';

let database: TestDatabase;
let folder: string;
let fake: Listening;
let store: ObjectStore;
let fails: (method: string, key: string) => boolean = () => false;
let desk: Desk;

beforeAll(async () => {
	database = await openTestDatabase();
	folder = await mkdtemp(join(tmpdir(), 'steelyard-pictures-'));
	fake = await startObjectStore({
		port: 0,
		folder,
		accessKey: 'key',
		fails: (method, key) => fails(method, key)
	});
	store = openObjectStore({
		endpoint: fake.url,
		bucket: 'steelyard',
		region: 'local',
		accessKeyId: 'key',
		secretAccessKey: 'secret'
	});
});
afterAll(async () => {
	store.close();
	await fake.close();
	await database.close();
	await rm(folder, { recursive: true, force: true });
});
beforeEach(async () => {
	fails = () => false;
	await database.fresh();
	desk = await Desk.open(new Office(database.db, noShelf));
	for (const { key } of await store.list('')) await store.remove(key);
});

const writer = async (): Promise<Context> => ({ ...(await desk.office.as(desk.writer)), store });

async function* inPieces(bytes: Buffer): AsyncGenerator<Uint8Array> {
	for (let at = 0; at < bytes.length; at += 65_536) yield bytes.subarray(at, at + 65_536);
}

const add = async (bytes: Buffer, fileName = 'scene.jpg', ctx?: Context) =>
	addPicture(ctx ?? (await writer()), { body: inPieces(bytes), fileName, declaredType: '' });

const keys = async () => (await store.list('pictures/')).map(({ key }) => key).sort();
const incoming = async () =>
	(await readdir(tmpdir())).filter((name) => name.startsWith('steelyard-picture-'));

const RECORD: PictureRecord = {
	...emptyRecord(),
	creator: 'The desk',
	credit: 'Varrowmere Institute',
	licence: 'CC-BY-4.0',
	source: 'Drawn for this piece',
	alt: 'A pendulum at rest.',
	labels: ['diagram', 'not-to-scale'],
	people: 'none-shown'
};

async function described(picture: PictureView, over: Partial<PictureRecord> = {}) {
	return savePictureRecord(await writer(), picture.id, {
		baseVersion: picture.version,
		record: { ...RECORD, ...over }
	});
}

const placeIn = (picture: PictureView) => (document: WidgetDocument) => {
	document.blocks.push({ id: 'picture-1', kind: 'picture', ...placePicture(picture, 'At rest.') });
};

test('a picture is stored under the hashes of its files, and written down with them', async () => {
	const picture = await add(await made.jpeg());
	expect(picture).toMatchObject({ width: 700, height: 500, version: 1, uses: [] });
	expect(await keys()).toEqual(picture.files.map(storeKey).sort());
	const files = await pictureFiles(await writer(), picture.id);
	for (const file of files) {
		const bytes = await store.get(file.key);
		expect(bytes?.length).toBe(file.bytes);
		const read = await sharp(bytes!).metadata();
		expect([read.width, read.height, read.mediaType]).toEqual([file.width, file.height, file.type]);
	}
	const { bytes } = await readPictureFile(await writer(), files[0]!.key.replace('pictures/', ''));
	expect(bytes.length).toBe(files[0]!.bytes);
	expect(await listPictures(await writer())).toEqual([picture]);
	expect((await database.db.select().from(daybook)).map(({ event }) => event)).toContain(
		'picture-added'
	);
	expect(await incoming()).toEqual([]);
});

test('its name is shown plain, and is part of no address', async () => {
	const odd = `../..\\etc/pass\u0000wd\r\n\u202egnp.${'x'.repeat(300)} scene.jpg`;
	const picture = await add(await made.jpeg(), odd);
	expect(picture.fileName).toMatch(/^passwdgnp\.x+\.jpg$/);
	expect(picture.fileName.length).toBeLessThanOrEqual(120);
	for (const key of await keys()) expect(key).toMatch(/^pictures\/[0-9a-f]{64}\.(webp|jpg|png)$/);
});

describe('what comes in another shape than its name', () => {
	const KINDS = { png: made.png, jpg: made.jpeg, webp: made.webp, avif: made.avif, svg: made.svg };
	const names = Object.keys(KINDS) as (keyof typeof KINDS)[];
	const pairs = names.flatMap((is) =>
		names.filter((name) => name !== is).map((name) => [is, name] as const)
	);
	test.each(pairs)('%s called .%s', async (is, name) => {
		await expect(add(Buffer.from(await KINDS[is]()), `scene.${name}`)).rejects.toMatchObject({
			code: 'picture-refused',
			details: { why: 'renamed', says: expect.stringContaining(`.${name}`) }
		});
	});
	test('and declared as another kind', async () => {
		await expect(
			addPicture(await writer(), {
				body: inPieces(await made.png()),
				fileName: 'scene.png',
				declaredType: 'image/jpeg'
			})
		).rejects.toMatchObject({ details: { why: 'declared' } });
	});
	afterAll(async () => expect(await keys()).toEqual([]));
});

test('what is larger than 10 MB is cut off at the limit, however long it goes on', async () => {
	let sent = 0;
	async function* endless(): AsyncGenerator<Uint8Array> {
		for (;;) {
			sent += 65_536;
			yield Buffer.alloc(65_536, 0xff);
		}
	}
	await expect(
		addPicture(await writer(), { body: endless(), fileName: 'a.jpg', declaredType: '' })
	).rejects.toMatchObject({ code: 'picture-too-heavy' });
	expect(sent).toBeLessThanOrEqual(LARGEST_BYTES + 2 * 65_536);
	expect(await incoming()).toEqual([]);
});

test('a sender who goes away leaves nothing', async () => {
	const bytes = await made.jpeg();
	async function* broken(): AsyncGenerator<Uint8Array> {
		yield bytes.subarray(0, 1000);
		throw new Error('aborted');
	}
	await expect(
		addPicture(await writer(), { body: broken(), fileName: 'a.jpg', declaredType: '' })
	).rejects.toMatchObject({ code: 'picture-cut-off' });
	expect([await keys(), await incoming(), await listPictures(await writer())]).toEqual([
		[],
		[],
		[]
	]);
});

describe('a store with a fault', () => {
	test.each([1, 2, 3, 4])('at file %d leaves nothing of the picture', async (nth) => {
		const put = new Set<string>();
		fails = (method, key) => {
			if (method !== 'PUT' || key === '') return false;
			put.add(key);
			return put.size >= nth;
		};
		await expect(add(await made.jpeg())).rejects.toMatchObject({ code: 'store-away' });
		expect(put.size).toBe(nth);
		fails = () => false;
		expect(await keys()).toEqual([]);
		expect(await listPictures(await writer())).toEqual([]);
		// And it can be tried again.
		expect((await add(await made.jpeg())).files).toHaveLength(4);
	});

	test('keeps what another picture has of the same bytes', async () => {
		const first = await add(await made.jpeg());
		fails = (method) => method === 'HEAD';
		await expect(add(await made.jpeg())).rejects.toMatchObject({ code: 'store-away' });
		fails = () => false;
		expect(await keys()).toEqual(first.files.map(storeKey).sort());
	});

	test('that can’t remove either leaves the rest to the sweep, which spares what is used and what is new', async () => {
		const kept = await add(await made.png(), 'kept.png');
		let puts = 0;
		fails = (method, key) =>
			method === 'DELETE' || (method === 'PUT' && key !== '' && (puts += 1) > 2);
		await expect(add(await made.jpeg())).rejects.toMatchObject({ code: 'store-away' });
		fails = () => false;
		const left = (await keys()).length - kept.files.length;
		expect(left).toBeGreaterThan(0);
		const parts = { db: database.db, store };
		expect(await sweepPictures(parts, new Date())).toBe(0);
		const later = new Date(Date.now() + 25 * 3_600_000);
		expect(await sweepPictures(parts, later)).toBe(left);
		expect(await sweepPictures(parts, later)).toBe(0);
		expect(await keys()).toEqual(kept.files.map(storeKey).sort());
	});

	test('and a database that refuses leave nothing', async () => {
		const ctx = await writer();
		await expect(
			add(await made.jpeg(), 'a.jpg', { ...ctx, actor: { ...ctx.actor!, personId: 'nobody' } })
		).rejects.toThrow();
		expect(await keys()).toEqual([]);
	});
});

test('a record is kept half done, and not over another’s', async () => {
	const picture = await add(await made.jpeg());
	const saved = await described(picture, { credit: '' });
	expect(saved).toMatchObject({ version: 2, record: { credit: '' } });
	await expect(described(picture)).rejects.toMatchObject({
		code: 'picture-changed',
		details: { picture: { version: 2 } }
	});
});

test('where a picture is used, and that it isn’t deleted while it is', async () => {
	const picture = await described(await add(await made.jpeg()));
	await desk.create();
	await desk.edit(placeIn(picture));
	expect((await getPicture(await writer(), picture.id)).uses).toEqual([
		{ slug: SLUG, title: expect.any(String), draft: true, proofs: [], releases: [], live: false }
	]);
	await expect(deletePicture(await writer(), picture.id)).rejects.toMatchObject({
		code: 'picture-used'
	});
	await desk.edit((document) => {
		document.blocks = document.blocks.filter(({ kind }) => kind !== 'picture');
	});
	await deletePicture(await writer(), picture.id);
	expect([await keys(), await database.db.select().from(pictures)]).toEqual([[], []]);
});

test('two pictures of the same bytes: deleting one leaves the other whole', async () => {
	const [first, second] = [await add(await made.jpeg()), await add(await made.jpeg())];
	await deletePicture(await writer(), first.id);
	expect(await keys()).toEqual(second.files.map(storeKey).sort());
	// At the same moment, too.
	await Promise.all([deletePicture(await writer(), second.id), add(await made.jpeg())]);
	const [third] = await listPictures(await writer());
	expect(await keys()).toEqual(third!.files.map(storeKey).sort());
});

test('a picture is replaced in every draft, with its own record; captions stay', async () => {
	const old = await described(await add(await made.jpeg()));
	const next = await add(await made.png(400, 300), 'next.png');
	await desk.create();
	await desk.edit(placeIn(old));
	const before = await desk.piece();
	await expect(replacePicture(await writer(), old.id, next.id)).rejects.toMatchObject({
		code: 'picture-not-ready'
	});
	await described(next, { alt: 'A pendulum, moving.', labels: ['photograph'] });
	const ctx = { ...(await desk.office.as(desk.editor)), store };
	expect(await replacePicture(ctx, old.id, next.id)).toEqual({ drafts: [SLUG] });
	const after = await desk.piece();
	expect(after.version).toBe(before.version + 1);
	const block = after.document.blocks.find(({ kind }) => kind === 'picture');
	expect(block).toMatchObject({
		picture: next.id,
		alt: 'Photograph: A pendulum, moving.',
		caption: 'At rest.',
		labels: ['Photograph']
	});
	expect((await getPicture(ctx, old.id)).uses).toEqual([]);
	await deletePicture(ctx, old.id);
});

test('for press, the files come under their public names, or not at all', async () => {
	const picture = await described(await add(await made.jpeg()));
	const document = { blocks: [] as unknown[] } as WidgetDocument;
	placeIn(picture)(document);
	placeIn(picture)(document);
	const files = await picturesForPress(store, document);
	expect(files.map(({ key }) => key).sort()).toEqual(picture.files.map(pressKey).sort());
	await store.put(storeKey(picture.files[0]!), Buffer.from('other bytes'), 'image/webp');
	await expect(picturesForPress(store, document)).rejects.toMatchObject({
		code: 'picture-missing'
	});
});
