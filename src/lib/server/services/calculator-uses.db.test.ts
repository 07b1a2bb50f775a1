import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, SLUG } from '../../../../tests/support/desk.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import { firstLight } from '../demo/first-light.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { proofs, releases } from '../db/schema/index.ts';
import { listUses } from './calculator-uses.ts';
import { createPiece } from './draft-start.ts';

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

const uses = async (id: string) => listUses(await office.as(desk.writer), id);

/** A proof of this document and its release, as they stand in the database; their bytes are the press's affair. */
async function putOut(number: number, document: WidgetDocument): Promise<void> {
	const { id: pieceId } = await desk.piece();
	const at = office.now;
	const digest = `digest of release ${number}`;
	const [proof] = await office.db
		.insert(proofs)
		.values({
			pieceId,
			number,
			version: 1,
			document,
			digest,
			pulledBy: desk.writer,
			pulledAt: at,
			writers: []
		})
		.returning();
	await office.db.insert(releases).values({
		pieceId,
		number,
		digest,
		proofId: proof!.id,
		document,
		manifest: {
			version: 1,
			slug: SLUG,
			release: number,
			releasedAt: at.toISOString(),
			digest,
			page: '',
			styles: [],
			files: []
		},
		releasedBy: desk.editor,
		releasedAt: at
	});
}

test('a draft uses the calculators of its steps, and no other', async () => {
	await desk.create();
	expect(await uses('line.observe')).toEqual([]);
	await desk.save(firstLight);
	await createPiece(await office.as(desk.writer), { title: 'Tides' });
	const revision = firstLight.steps.find(
		({ calculator }) => calculator === 'line.observe'
	)!.revision;
	expect(await uses('line.observe')).toEqual([
		{
			slug: SLUG,
			title: firstLight.title,
			// The rest frequency, the frequency and the crest.
			draft: { revisions: [revision], claims: 3 },
			release: null
		}
	]);
	expect(await uses('tide.roche')).toEqual([]);
	expect(await uses("line.observe' or true --")).toEqual([]);
});

test('the newest release counts, whatever has become of the draft; older ones don’t', async () => {
	await desk.create();
	await desk.save(firstLight);
	await putOut(1, firstLight);
	const shorter: WidgetDocument = {
		...firstLight,
		steps: firstLight.steps.filter(({ id }) => id === 'age'),
		claims: firstLight.claims.filter(({ id }) => id === 'stretch'),
		blocks: [
			{
				id: 'only',
				kind: 'paragraph',
				content: [{ kind: 'claim', claim: 'stretch', text: '20.8' }]
			}
		]
	};
	await desk.save(shorter);
	expect(await uses('line.observe')).toMatchObject([
		{ slug: SLUG, draft: null, release: { number: 1, claims: 3 } }
	]);
	await putOut(2, shorter);
	expect(await uses('line.observe')).toEqual([]);
	expect(await uses('cosmo.inverse')).toMatchObject([
		{ draft: { claims: 1 }, release: { number: 2, claims: 1 } }
	]);
});

test('a stranger learns nothing', async () => {
	await expect(
		listUses({ ...(await office.as(desk.writer)), actor: null }, 'line.observe')
	).rejects.toEqual(expect.objectContaining({ code: 'not-signed-in' }));
});
