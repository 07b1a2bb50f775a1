import { eq } from 'drizzle-orm';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, reword, SLUG } from '../../../../tests/support/desk.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { upgrades } from '../../widget/upgrades.ts';
import { firstLight } from '../demo/first-light.ts';
import { pieces, pieceWriters, proofs } from '../db/schema/index.ts';
import { createPiece } from './draft-start.ts';
import { getPiece, listPieces, saveDraft } from './pieces.ts';

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

const code = (code: string, details = {}) =>
	expect.objectContaining({ code, details: expect.objectContaining(details) });
const save = async (baseVersion: number, document: unknown, by = desk.writer) =>
	saveDraft(await office.as(by), SLUG, { baseVersion, document });

describe('a new piece', () => {
	test('is an empty sheet under its title, at version 1', async () => {
		const { slug } = await createPiece(await office.as(desk.writer), { title: 'How cold was it?' });
		expect(slug).toBe('how-cold-was-it');
		expect(await getPiece(await office.as(desk.writer), slug)).toMatchObject({
			title: 'How cold was it?',
			version: 1,
			working: 'draft',
			proof: null,
			savedBy: { personId: desk.writer, name: 'Tamsin Orrelby' },
			writers: [{ personId: desk.writer }]
		});
	});

	test.each([
		['Émilie’s 2nd Über-Test!', 'emilies-2nd-uber-test'],
		['?!', 'piece'],
		['א', 'piece']
	])('%s gets the slug %s', async (title, slug) => {
		expect((await createPiece(await office.as(desk.writer), { title })).slug).toBe(slug);
	});

	test('a second one of that title gets a number; a slug asked for by name must be free', async () => {
		const ctx = await office.as(desk.writer);
		await createPiece(ctx, { title: 'Tides' });
		expect((await createPiece(ctx, { title: 'Tides' })).slug).toBe('tides-2');
		await expect(createPiece(ctx, { title: 'Tides', slug: 'tides' })).rejects.toEqual(
			code('slug-taken')
		);
	});
});

describe('saving a draft', () => {
	beforeEach(() => desk.create());

	test('counts the version up, and reads back what was saved', async () => {
		expect(await save(1, firstLight)).toMatchObject({
			version: 2,
			savedAt: office.now.toISOString()
		});
		expect((await desk.piece()).document).toEqual(firstLight);
	});

	test('saving what is there already changes nothing, whatever the order of its keys', async () => {
		await save(1, firstLight);
		const reversed = Object.fromEntries(Object.entries(structuredClone(firstLight)).reverse());
		expect(await save(2, reversed)).toMatchObject({ version: 2 });
	});

	test('on an older version it is refused, with the newest text and who wrote it; nothing is lost', async () => {
		await save(1, firstLight);
		const kofi = await office.add('Kofi Adjarra-Lund', ['writer']);
		await expect(save(1, { ...firstLight, title: 'Another' }, kofi)).rejects.toEqual(
			code('version-conflict', {
				version: 2,
				savedBy: { personId: desk.writer, name: 'Tamsin Orrelby' },
				document: firstLight
			})
		);
		expect((await desk.piece()).document).toEqual(firstLight);
	});

	test('a save whose answer was lost is answered when it is sent again, on its old version', async () => {
		const first = await save(1, firstLight);
		office.wait(1);
		expect(await save(1, firstLight)).toEqual(first);
		expect((await desk.piece()).version).toBe(2);
	});

	test('of many saves on one version at once, one wins and the others are told', async () => {
		const saves = await Promise.allSettled(
			Array.from({ length: 8 }, (_, index) =>
				save(1, { ...firstLight, title: `Version by ${index}` })
			)
		);
		expect(saves.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
		for (const outcome of saves) {
			if (outcome.status === 'rejected')
				expect(outcome.reason).toEqual(code('version-conflict', { version: 2 }));
		}
		expect((await desk.piece()).version).toBe(2);
	});

	test('an unfinished draft is kept', async () => {
		await expect(save(1, { ...firstLight, title: '', point: '' })).resolves.toMatchObject({
			version: 2
		});
	});

	test.each([
		['nothing', null],
		['a list', []],
		['another version of the format', { ...firstLight, version: 999 }],
		['a field that isn’t one', { ...firstLight, ownerId: 'me' }],
		['a claim that stands nowhere', { ...firstLight, blocks: [] }],
		['no number', { ...firstLight, controls: [{ ...firstLight.controls[0], min: Number.NaN }] }],
		['a character that can’t be kept', { ...firstLight, title: 'First\u0000light' }],
		['half a character', { ...firstLight, point: '\ud800' }]
	])('one that doesn’t hang together is refused with the place named: %s', async (_, document) => {
		await expect(save(1, document)).rejects.toEqual(
			code('document-broken', {
				issues: expect.arrayContaining([expect.objectContaining({ message: expect.any(String) })])
			})
		);
		expect((await desk.piece()).version).toBe(1);
	});

	test('whoever changes the document becomes one of its writers, and whoever saves it unchanged doesn’t', async () => {
		await save(1, firstLight);
		await save(2, firstLight, desk.editor);
		expect((await desk.piece()).writers.map(({ personId }) => personId)).toEqual([desk.writer]);
		await save(2, { ...firstLight, title: 'First light, on the dial' }, desk.editor);
		expect((await desk.piece()).writers.map(({ personId }) => personId).sort()).toEqual(
			[desk.writer, desk.editor].sort()
		);
		expect(await office.db.select().from(pieceWriters)).toHaveLength(2);
	});

	test('a piece that isn’t there is not found', async () => {
		await expect(
			saveDraft(await office.as(desk.writer), 'nowhere', { baseVersion: 1, document: firstLight })
		).rejects.toEqual(code('not-found'));
		await expect(getPiece(await office.as(desk.writer), 'nowhere')).rejects.toEqual(
			code('not-found')
		);
	});
});

describe('a document stored by an older house', () => {
	/** As if version 2 had followed a version 0 that called the point something else. */
	const older = ({ point, ...document }: WidgetDocument) => ({
		...document,
		version: 0,
		gist: point
	});
	const store = (document: unknown) =>
		office.db.update(pieces).set({ document: document as WidgetDocument });

	beforeEach(async () => {
		await desk.create();
		await desk.save(firstLight);
		upgrades[0] = ({ gist, ...document }) => ({ ...document, version: 2, point: gist });
	});
	afterEach(() => {
		delete upgrades[0];
	});

	test('reads in today’s shape, everywhere', async () => {
		await store(older(firstLight));
		expect((await desk.piece()).document).toEqual(firstLight);
		expect((await listPieces(await office.as(desk.editor)))[0]).toMatchObject({
			point: firstLight.point
		});
		await desk.pull();
		expect((await desk.piece()).proof?.document).toEqual(firstLight);
		await expect(save(1, { ...firstLight, title: 'Another' })).rejects.toEqual(
			code('version-conflict', { document: firstLight })
		);
	});

	test('a proof of it keeps its digest, and is pulled anew before it can be passed', async () => {
		const first = await desk.pull();
		const { digest } = (await desk.piece()).proof!;
		await office.db.update(proofs).set({ document: older(firstLight) as never, digest: 'of old' });
		expect((await desk.piece()).proof).toMatchObject({ digest: 'of old', document: firstLight });
		expect(await desk.pull()).not.toBe(first);
		expect((await desk.piece()).proof).toMatchObject({ digest });
	});

	test('one that can’t be read any more is a sentence, and leaves the rest of the desk open', async () => {
		await createPiece(await office.as(desk.writer), { title: 'Tides' });
		await office.db
			.update(pieces)
			.set({ document: { ...firstLight, version: 999 } as never })
			.where(eq(pieces.slug, SLUG));
		await expect(desk.piece()).rejects.toEqual(code('document-broken'));
		await expect(desk.pull()).rejects.toEqual(code('document-broken'));
		const lines = await listPieces(await office.as(desk.editor));
		expect(lines.map(({ slug, missing }) => ({ slug, missing }))).toEqual([
			{ slug: SLUG, missing: 'a document that can be read' },
			{ slug: 'tides', missing: expect.any(String) }
		]);
		// It can be written again.
		await expect(save(2, firstLight)).resolves.toMatchObject({ version: 3 });
	});
});

test('the desk says what each piece waits for, from draft to checked', async () => {
	const line = async () => (await listPieces(await office.as(desk.editor)))[0];
	await desk.create();
	expect(await line()).toMatchObject({
		working: 'draft',
		missing: '2 things to add',
		heldBy: { name: 'Tamsin Orrelby' }
	});
	await desk.save(firstLight);
	await desk.pull();
	expect(await line()).toMatchObject({
		working: 'in-check',
		missing: '4 to sign',
		heldBy: null,
		proofNumber: 1
	});
	await desk.signAll();
	expect(await line()).toMatchObject({ working: 'checked', missing: 'an editor’s pass' });
	await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'));
	expect(await line()).toMatchObject({ working: 'draft', missing: '' });
});
