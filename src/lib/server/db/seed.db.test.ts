import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, beforeEach, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { reword, SLUG } from '../../../../tests/support/desk.ts';
import { Office } from '../../../../tests/support/office.ts';
import { PRESS_FOLDER } from '../../../../tests/support/release.ts';
import { firstLight } from '../demo/first-light.ts';
import { createPiece } from '../services/draft-start.ts';
import { getPiece, listPieces, saveDraft } from '../services/pieces.ts';
import { ReleaseShelf } from '../shelf/shelf.ts';
import { seed } from './seed.ts';

let database: TestDatabase;
let office: Office;
let folder: string;

beforeAll(async () => {
	database = await openTestDatabase();
});
afterAll(() => database.close());
beforeEach(async () => {
	await database.fresh();
	folder = await mkdtemp(join(tmpdir(), 'steelyard-seed-'));
	office = new Office(database.db, new ReleaseShelf(folder));
	office.pressFolder = PRESS_FOLDER;
});
afterEach(() => rm(folder, { recursive: true, force: true }));

const writer = async () => office.as(await office.add('Kofi Adjarra-Lund', ['writer']));

test('the demo starts with two pieces out, and a second start changes nothing', async () => {
	await seed(office.stranger(), 'demo');
	const ctx = await writer();
	const first = await listPieces(ctx);
	expect(first.map(({ liveRelease }) => liveRelease)).toEqual([1, 1]);
	await seed(office.stranger(), 'demo');
	expect(await listPieces(ctx)).toEqual(first);
});

test('a start that was cut short is finished', async () => {
	const ctx = await writer();
	await createPiece(ctx, { title: firstLight.title, slug: SLUG });
	await seed(office.stranger(), 'demo');
	expect((await getPiece(ctx, SLUG)).releases).toHaveLength(1);
});

test.each([
	[
		'rewritten',
		() => {
			const document = structuredClone(firstLight);
			reword(document, 'opening', 'faint', 'feeble');
			return document;
		}
	],
	[
		'another one of that slug',
		() => ({ ...firstLight, title: 'Our own', steps: [], controls: [], blocks: [], claims: [] })
	]
])('a piece that someone has made their own is left as it is: %s', async (_, make) => {
	const ctx = await writer();
	const document = make();
	await createPiece(ctx, { title: document.title, slug: SLUG });
	await saveDraft(ctx, SLUG, { baseVersion: 1, document });
	await seed(office.stranger(), 'demo');
	expect(await getPiece(ctx, SLUG)).toMatchObject({ document, version: 2, proof: null });
});
