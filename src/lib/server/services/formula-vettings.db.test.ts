import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, reword, SLUG } from '../../../../tests/support/desk.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import { thrownStone } from '../../../../tests/support/thrown-stone.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { formulaDigest } from '../../widget/formula-definition.ts';
import { daybook, vettings } from '../db/schema/index.ts';
import { takeBackFormula, vetFormula } from './formula-vettings.ts';
import { createPiece } from './draft-start.ts';
import { getPiece, listPieces, saveDraft } from './pieces.ts';
import { passConditions, pullProof } from './proofs.ts';

let database: TestDatabase;
let office: Office;
let desk: Desk;

const DIGEST = formulaDigest(thrownStone().formulas[0]!);
const code = (wanted: string) => expect.objectContaining({ code: wanted });

beforeAll(async () => {
	database = await openTestDatabase();
});
afterAll(() => database.close());
beforeEach(async () => {
	await database.fresh();
	office = new Office(database.db, noShelf);
	desk = await Desk.open(office);
});

async function vet(by = desk.scientist, digest = DIGEST): Promise<void> {
	const { proof } = await desk.piece();
	await vetFormula(await office.as(by), SLUG, { proofId: proof!.id, digest, note: '' });
}

/** What the release room says of formulas; null when it says nothing. */
async function condition() {
	const all = await passConditions(await office.as(desk.editor), SLUG);
	return all.find(({ says }) => /formula/i.test(says)) ?? null;
}

async function formulaView() {
	return (await desk.piece()).proof!.formulas[0]!;
}

async function missing() {
	const [line] = await listPieces(await office.as(desk.writer));
	return line?.missing;
}

describe('a formula that was written for a piece', () => {
	test('holds the piece back until a scientist who didn’t write it has signed it', async () => {
		const proofId = await desk.toProof(thrownStone());
		await desk.signAll();
		expect(await condition()).toMatchObject({
			met: false,
			says: 'A formula written for this piece isn’t vetted: “Height of a thrown stone”.',
			href: `/pieces/${SLUG}/check#formulas`
		});
		expect(await missing()).toBe('1 formula to vet');
		await expect(desk.pass(proofId)).rejects.toEqual(code('conditions-open'));

		await vet();
		expect(await condition()).toMatchObject({
			met: true,
			says: 'Every formula that was written for it is vetted.'
		});
		expect(await formulaView()).toMatchObject({
			id: 'thrown',
			digest: DIGEST,
			vetted: true,
			signings: [{ by: { personId: desk.scientist }, counts: true }]
		});
		expect(await missing()).toBe('an editor’s pass');
		await desk.pass(proofId);
	});

	test('is no matter for a piece that has none', async () => {
		await desk.toProof();
		expect(await condition()).toBeNull();
		expect((await desk.piece()).proof?.formulas).toEqual([]);
	});

	test('is signed once by each, and the daybook tells it', async () => {
		await desk.toProof(thrownStone());
		await vet();
		await vet();
		await vet(await office.add('Ama Tindleforth', ['scientist']));
		expect(await database.db.$count(vettings)).toBe(2);
		const events = await database.db.select().from(daybook);
		expect(events.filter(({ event }) => event === 'formula-vetted')).toHaveLength(2);
	});

	test('asks for a new signature when it changes, and not when the words do', async () => {
		await desk.toProof(thrownStone());
		await vet();
		await desk.edit((document) => reword(document, 'opening', 'One breath', 'A breath'));
		await desk.pull();
		expect((await formulaView()).vetted).toBe(true);

		await desk.edit((document) => (document.formulas[0]!.inputs[0]!.max = 90));
		await desk.pull();
		expect(await formulaView()).toMatchObject({ vetted: false, signings: [] });
		await expect(vet()).rejects.toEqual(code('not-found')); // one signs what one has in sight
	});

	test('vetted in one piece is vetted in another where it stands unchanged', async () => {
		await desk.toProof(thrownStone());
		await vet();
		const ctx = await office.as(desk.writer);
		const { slug } = await createPiece(ctx, { title: 'Another stone' });
		const document = { ...thrownStone(), title: 'Another stone' };
		document.formulas[0] = { ...document.formulas[0]!, id: 'copied' };
		document.steps[0] = { ...document.steps[0]!, calculator: 'formula.copied' };
		await saveDraft(ctx, slug, { baseVersion: 1, document });
		await pullProof(ctx, slug);
		expect((await getPiece(ctx, slug)).proof?.formulas[0]).toMatchObject({
			id: 'copied',
			vetted: true
		});
	});
});

describe('who signs a formula', () => {
	test('is a scientist, after a fresh sign-in', async () => {
		await desk.toProof(thrownStone());
		await expect(vet(desk.editor)).rejects.toEqual(code('not-permitted'));
		await expect(vet(desk.writer)).rejects.toEqual(code('not-permitted'));
		const { proof } = await desk.piece();
		const input = { proofId: proof!.id, digest: DIGEST, note: '' };
		const ctx = await office.as(desk.scientist);
		const stale = { ...ctx, now: new Date(ctx.now.getTime() + 20 * 60_000) };
		await expect(vetFormula(stale, SLUG, input)).rejects.toEqual(code('confirm-by-link'));
	});

	test('didn’t write the piece', async () => {
		const both = await office.add('Ilse Quarnby', ['writer', 'scientist']);
		await desk.create();
		await desk.save(thrownStone(), both);
		await desk.pull();
		await expect(vet(both)).rejects.toEqual(code('same-person-twice'));
	});

	test('counts no longer once they write on it', async () => {
		const both = await office.add('Ilse Quarnby', ['writer', 'scientist']);
		await desk.toProof(thrownStone());
		await vet(both);
		expect((await formulaView()).vetted).toBe(true);
		await desk.edit((document) => reword(document, 'opening', 'One breath', 'A breath'), both);
		await desk.pull();
		expect(await formulaView()).toMatchObject({ vetted: false, signings: [{ counts: false }] });
	});

	test('can take it back before the release, and a pass that rested on it drops', async () => {
		const proofId = await desk.toProof(thrownStone());
		await desk.signAll();
		await vet();
		await desk.pass(proofId);
		await takeBackFormula(await office.as(desk.scientist), SLUG, { digest: DIGEST });
		expect(await formulaView()).toMatchObject({ vetted: false, signings: [] });
		expect((await desk.piece()).proof?.passedAt).toBeNull();
		await vet();
		expect((await formulaView()).vetted).toBe(true);
	});
});

describe('a draft', () => {
	const broken = (change: (document: WidgetDocument) => void) => async () => {
		await desk.create();
		await desk.save(thrownStone());
		const before = await desk.piece();
		const refusal = await desk.edit(change).then(
			() => null,
			(error: { code: string; details: { issues: { path: string; message: string }[] } }) => error
		);
		expect(refusal?.code).toBe('document-broken');
		expect(await desk.piece()).toEqual(before);
		return refusal!.details.issues;
	};

	test('with a tree that its source doesn’t say is refused, and the one before is kept', async () => {
		const issues = await broken((document) => {
			document.formulas[0]!.tree = {
				is: 'binary',
				sign: '*',
				left: { is: 'name', name: 'speed' },
				right: { is: 'name', name: 'time' }
			};
		})();
		expect(issues).toEqual([expect.objectContaining({ path: 'formulas.0.tree' })]);
	});

	test('with a tree that isn’t one is refused', async () => {
		const issues = await broken((document) => {
			Object.assign(document.formulas[0]!.tree, { is: 'call', name: 'constructor', args: [] });
		})();
		expect(issues).toEqual([expect.objectContaining({ path: 'formulas.0.tree' })]);
	});
});
