/** A picture on its way to readers: its files become part of the release, and stand on the shelf under their hashes. */
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, SLUG } from '../../../../tests/support/desk.ts';
import { Office } from '../../../../tests/support/office.ts';
import * as made from '../../../../tests/support/pictures.ts';
import { PRESS_FOLDER } from '../../../../tests/support/release.ts';
import { fileNameOf, pressAddress, pressKey } from '../../pictures/address.ts';
import { placePicture } from '../../pictures/place.ts';
import { emptyRecord } from '../../pictures/record.ts';
import { sha256 } from '../auth/hashes.ts';
import { firstLight } from '../demo/first-light.ts';
import { ReleaseShelf } from '../shelf/shelf.ts';
import { addPicture, deletePicture, getPicture, savePictureRecord } from './pictures.ts';
import { releaseProof } from './releases.ts';
import { restockShelf } from './restock-shelf.ts';

let database: TestDatabase;
let folder: string;
beforeAll(async () => {
	database = await openTestDatabase();
	folder = await mkdtemp(join(tmpdir(), 'steelyard-shelf-'));
});
afterAll(async () => {
	await database.close();
	await rm(folder, { recursive: true, force: true });
});

async function* body(bytes: Buffer): AsyncGenerator<Uint8Array> {
	yield bytes;
}

test('a released piece brings its picture along, which can’t be deleted any more', async () => {
	const office = new Office(database.db, new ReleaseShelf(folder));
	office.pressFolder = PRESS_FOLDER;
	const desk = await Desk.open(office);
	const writer = await office.as(desk.writer);
	const added = await addPicture(writer, {
		body: body(await made.jpeg()),
		fileName: 'dial.jpg',
		declaredType: ''
	});
	const picture = await savePictureRecord(writer, added.id, {
		baseVersion: 1,
		record: {
			...emptyRecord(),
			creator: 'The desk',
			credit: 'Varrowmere Institute',
			licence: 'own-work',
			alt: 'A dial with one hand.',
			labels: ['photograph'],
			people: 'none-shown'
		}
	});
	const document = structuredClone(firstLight);
	document.blocks.push({
		id: 'picture-of-the-dial',
		kind: 'picture',
		...placePicture(picture, 'The dial.')
	});
	const proofId = await desk.toProof(document);
	await desk.signAll();
	await desk.pass(proofId);

	// A store that has lost a file stops the release, and nothing is out.
	const [first] = picture.files;
	const key = `pictures/${fileNameOf(first!)}`;
	const bytes = office.store.objects.get(key)!;
	office.store.objects.delete(key);
	const editor = await office.as(desk.editor);
	await expect(releaseProof(editor, SLUG, { proofId })).rejects.toMatchObject({
		code: 'picture-missing'
	});
	expect(office.shelf.find(SLUG, 'latest')).toBeUndefined();
	office.store.objects.set(key, bytes);

	await releaseProof(editor, SLUG, { proofId });
	const page = office.shelf.find(SLUG, 'latest')!.plain.toString('utf8');
	for (const file of picture.files) {
		const asset = office.shelf.asset(fileNameOf(file));
		expect([asset?.contentType, asset?.sha256]).toEqual([file.type, file.digest]);
		expect(asset?.packed).toEqual({ br: null, gzip: null });
		expect(sha256(asset!.plain)).toBe(file.digest);
		expect(office.store.objects.has(pressKey(file))).toBe(true);
		expect(page).toContain(pressAddress(file));
	}
	expect(page).toContain('A dial with one hand.');

	expect((await getPicture(editor, picture.id)).uses).toEqual([
		{ slug: SLUG, title: firstLight.title, draft: true, proofs: [1], releases: [1], live: true }
	]);
	await expect(deletePicture(editor, picture.id)).rejects.toMatchObject({ code: 'picture-used' });

	// A shelf that has lost everything is filled again from the store, pictures with it.
	await rm(folder, { recursive: true, force: true });
	const shelf = new ReleaseShelf(folder);
	expect(await restockShelf({ db: database.db, store: office.store, shelf })).toMatchObject({
		fetched: 1,
		missing: []
	});
	expect(shelf.asset(fileNameOf(first!))?.sha256).toBe(first!.digest);
});
