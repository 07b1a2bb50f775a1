import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, SLUG } from '../../../../tests/support/desk.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import { outlines } from '../../outlines/index.ts';
import { EMPTY_SLIP } from '../../workflow/slip.ts';
import { firstLight } from '../demo/first-light.ts';
import { daybook } from '../db/schema/index.ts';
import { createPiece } from './draft-start.ts';
import { listSpiked, recoverPiece, spikePiece } from './draft-spike.ts';
import { getPiece, lastSigned, listPieces, saveDraft } from './pieces.ts';
import { pullProof } from './proofs.ts';
import { saveSlip } from './slips.ts';

let database: TestDatabase;
let office: Office;
let desk: Desk;

beforeAll(async () => {
	database = await openTestDatabase();
});
afterAll(() => database.close());
beforeEach(async () => {
	await database.fresh();
	office = new Office(database.db, noShelf);
	desk = await Desk.open(office);
});

const as = (by = desk.writer) => office.as(by);
const piece = async (slug = SLUG) => getPiece(await as(), slug);
const fields = { reader: '', partner: '', embargo: '', words: '', due: '', zone: 'UTC' };

describe('starting a piece', () => {
	test('with a slip filled in', async () => {
		const { slug } = await createPiece(await as(), {
			title: 'How cold was it?',
			point: 'Colder than anything near us.',
			reader: 'People who like the night sky',
			words: '400',
			partner: 'A newspaper',
			due: '2026-12-17T15:00',
			zone: 'Europe/Berlin',
			embargo: 'Not before the paper is out'
		});
		expect(await piece(slug)).toMatchObject({
			point: 'Colder than anything near us.',
			document: { title: 'How cold was it?', blocks: [] },
			slip: {
				reader: 'People who like the night sky',
				words: 400,
				partner: 'A newspaper',
				embargo: 'Not before the paper is out',
				due: { at: '2026-12-17T14:00:00.000Z', zone: 'Europe/Berlin' }
			}
		});
	});

	test('with a title alone, for the rest can follow', async () => {
		const { slug } = await createPiece(await as(), { title: 'Tides' });
		expect(await piece(slug)).toMatchObject({ slip: EMPTY_SLIP, spiked: null });
	});

	test.each(outlines.map(({ id }) => id))('from the outline %s', async (id) => {
		const { slug } = await createPiece(await as(), { title: 'Mine', start: `outline:${id}` });
		const { document } = outlines.find((outline) => outline.id === id)!;
		expect((await piece(slug)).document).toEqual({ ...document, title: 'Mine' });
		await expect(pullProof(await as(), slug)).resolves.toMatchObject({ number: 1 });
	});

	test('an outline or a piece that there isn’t is not found', async () => {
		for (const start of ['outline:nothing', 'piece:nothing'])
			await expect(createPiece(await as(), { title: 'x', start })).rejects.toMatchObject({
				code: 'not-found'
			});
		expect(await listPieces(await as())).toEqual([]);
	});
});

describe('a duplicate', () => {
	beforeEach(async () => {
		await desk.toChecked();
	});

	test('has the words and the wiring, and no signature, proof or slip', async () => {
		const { slug } = await createPiece(await as(), {
			title: 'A second one',
			start: `piece:${SLUG}`
		});
		expect(await piece(slug)).toMatchObject({
			version: 1,
			working: 'draft',
			proof: null,
			releases: [],
			slip: EMPTY_SLIP,
			document: { ...firstLight, title: 'A second one' }
		});
		await pullProof(await as(), slug);
		const states = (await piece(slug)).proof?.claims.map(({ state }) => state);
		expect(new Set(states)).toEqual(new Set(['unsigned']));
		expect(await desk.states()).toMatchObject({ stretch: 'signed' });
	});

	test('those who wrote the original have written the copy too', async () => {
		const kofi = await office.add('Kofi Adjarra-Lund', ['writer']);
		const { slug } = await createPiece(await as(kofi), { title: 'Copy', start: `piece:${SLUG}` });
		expect((await piece(slug)).writers.map(({ personId }) => personId).sort()).toEqual(
			[kofi, desk.writer].sort()
		);
	});
});

describe('the slip', () => {
	beforeEach(() => desk.create());

	test('is changed on what it was; a second change on the same is told of the first', async () => {
		const change = async (reader: string, was = EMPTY_SLIP) =>
			saveSlip(await as(), SLUG, { was, fields: { ...fields, reader } });
		const first = await change('Children');
		expect(first).toEqual({ ...EMPTY_SLIP, reader: 'Children' });
		await expect(change('Grown-ups')).rejects.toMatchObject({
			code: 'slip-changed',
			details: { slip: first }
		});
		// The answer to a change may get lost; sent again, it holds.
		expect(await change('Children')).toEqual(first);
		expect(await change('Grown-ups', first)).toMatchObject({ reader: 'Grown-ups' });
		expect((await piece()).slip.reader).toBe('Grown-ups');
	});

	test('a change of the slip makes no new draft and nobody a writer', async () => {
		await saveSlip(await as(desk.editor), SLUG, {
			was: EMPTY_SLIP,
			fields: { ...fields, words: '300' }
		});
		const { version, writers } = await piece();
		expect(version).toBe(1);
		expect(writers.map(({ personId }) => personId)).toEqual([desk.writer]);
	});

	test('scientists read it and don’t change it', async () => {
		await expect(
			saveSlip(await as(desk.scientist), SLUG, { was: EMPTY_SLIP, fields })
		).rejects.toMatchObject({ code: 'not-permitted' });
	});
});

describe('the spike', () => {
	beforeEach(async () => {
		await desk.create();
		await desk.save(firstLight);
	});

	test('takes a piece out of the lists, whole, and gives it back as it was', async () => {
		await spikePiece(await as(), SLUG);
		expect(await listPieces(await as())).toEqual([]);
		expect(await listSpiked(await as(desk.editor))).toEqual([
			{
				slug: SLUG,
				title: firstLight.title,
				spikedBy: { personId: desk.writer, name: 'Tamsin Orrelby' },
				spikedAt: office.now.toISOString()
			}
		]);
		expect(await piece()).toMatchObject({
			spiked: { by: { name: 'Tamsin Orrelby' } },
			document: firstLight
		});
		await recoverPiece(await as(desk.editor), SLUG);
		expect((await listPieces(await as())).map(({ slug }) => slug)).toEqual([SLUG]);
		expect(await listSpiked(await as())).toEqual([]);
		expect((await piece()).document).toEqual(firstLight);
		const rows = await office.db.select().from(daybook).orderBy(daybook.seq);
		expect(
			rows.map(({ event }) => event).filter((event) => /spiked|recovered/.test(event))
		).toEqual(['piece-spiked', 'piece-recovered']);
	});

	test('nothing is done to a piece on the spike until it is recovered', async () => {
		await spikePiece(await as(), SLUG);
		const spiked = { code: 'piece-spiked' };
		await expect(
			saveDraft(await as(), SLUG, { baseVersion: 2, document: { ...firstLight, title: 'x' } })
		).rejects.toMatchObject(spiked);
		await expect(pullProof(await as(), SLUG)).rejects.toMatchObject(spiked);
		await expect(saveSlip(await as(), SLUG, { was: EMPTY_SLIP, fields })).rejects.toMatchObject(
			spiked
		);
	});

	test('twice is once; its slug stays taken', async () => {
		await spikePiece(await as(), SLUG);
		await spikePiece(await as(), SLUG);
		await expect(createPiece(await as(), { title: 'Another', slug: SLUG })).rejects.toMatchObject({
			code: 'slug-taken'
		});
		await recoverPiece(await as(), SLUG);
		await recoverPiece(await as(), SLUG);
		expect(await office.db.$count(daybook)).toBe((await office.db.select().from(daybook)).length);
	});

	test('scientists and strangers can’t', async () => {
		for (const verb of [spikePiece, recoverPiece]) {
			await expect(verb(await as(desk.scientist), SLUG)).rejects.toMatchObject({
				code: 'not-permitted'
			});
			await expect(verb(office.stranger(), SLUG)).rejects.toMatchObject({ code: 'not-signed-in' });
		}
	});
});

test('the last thing one signed is the last that one hasn’t taken back', async () => {
	expect(await lastSigned(await as(desk.scientist))).toBeNull();
	await desk.toProof();
	office.wait(5);
	await desk.signAll();
	expect(await lastSigned(await as(desk.scientist))).toEqual({
		slug: SLUG,
		at: office.now.toISOString()
	});
	expect(await lastSigned(await as())).toBeNull();
});
