import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, SLUG } from '../../../../tests/support/desk.ts';
import { soundInAir } from '../../../../tests/support/house-calculator.ts';
import { Office } from '../../../../tests/support/office.ts';
import { PRESS_FOLDER } from '../../../../tests/support/release.ts';
import { cardOf, type HouseCard } from '../../forms/house-calculator.ts';
import { catalogue } from '../../physics/calculators/index.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { wayOut, whatHappened, whatUses } from '../../workflow/vetting-flags.ts';
import { outbox } from '../db/schema/index.ts';
import { firstLight } from '../demo/first-light.ts';
import { renderMail } from '../mail/render.ts';
import { ReleaseShelf } from '../shelf/shelf.ts';
import {
	proposeHouseCalculator,
	readHouseCalculator,
	reviseHouseCalculator
} from './house-calculators.ts';
import { disablePerson } from './people.ts';
import { createPiece } from './draft-start.ts';
import { saveDraft } from './pieces.ts';
import { passConditions } from './proofs.ts';
import { offeredCalculators } from './public-calculators.ts';
import { releaseProof } from './releases.ts';
import { retestCalculator, vetCalculator, withdrawCalculator } from './vetting-acts.ts';
import { listFlags } from './vetting-flags.ts';
import { listCalculators, readVettings } from './vettings.ts';

const ID = 'house.sound-in-air';
const WHY = 'The constant was mistyped.';

let database: TestDatabase;
let office: Office;
let desk: Desk;
let second: string;
let folder: string;

beforeAll(async () => {
	database = await openTestDatabase();
});
afterAll(() => database.close());
beforeEach(async () => {
	await database.fresh();
	folder = await mkdtemp(join(tmpdir(), 'steelyard-flags-'));
	office = new Office(database.db, new ReleaseShelf(folder));
	office.pressFolder = PRESS_FOLDER;
	desk = await Desk.open(office);
	second = await office.add('Ama Tindleforth', ['scientist']);
});
afterEach(() => rm(folder, { recursive: true, force: true }));

/** “First light”, with the house's calculator hung beside its chain. */
function withSound(): WidgetDocument {
	const document = structuredClone(firstLight);
	document.steps.push({
		id: 'sound',
		calculator: ID,
		revision: '1.0.0',
		settings: { T: { from: 'fixed', value: 293.15 } }
	});
	return document;
}

async function vet(revision: string, by = second): Promise<void> {
	await vetCalculator(await office.as(by), { calculator: ID, revision, note: '' });
}

async function withdraw(calculator: string, revision: string, by = second): Promise<void> {
	await withdrawCalculator(await office.as(by), { calculator, revision, note: WHY });
}

async function revise(
	change: 'patch' | 'major',
	base: string,
	edit: (card: HouseCard) => void
): Promise<string> {
	const ctx = await office.as(desk.scientist);
	const card = cardOf(await readHouseCalculator(ctx, ID));
	edit(card);
	const input = { ...card, base, change, note: 'A change.' };
	return (await reviseHouseCalculator(ctx, ID, input)).revision;
}

const otherFormula = (card: HouseCard) => (card.outputs[0]!.formula = 'sqrt(1.401*k_B*T/molecule)');

/** Proposed, vetted, wired into the piece, checked, passed and live. */
async function goLive(document = withSound()): Promise<void> {
	await proposeHouseCalculator(await office.as(desk.scientist), soundInAir());
	await vet('1.0.0');
	office.wait(1);
	const proofId = await desk.toProof(document);
	await desk.signAll();
	await desk.pass(proofId);
	await releaseProof(await office.as(desk.editor), SLUG, { proofId });
	office.wait(1);
}

/** Another proof of the draft as it stands, signed, passed and released. */
async function releaseAnew(): Promise<void> {
	const proofId = await desk.pull();
	await desk.signAll();
	await desk.pass(proofId);
	await releaseProof(await office.as(desk.editor), SLUG, { proofId });
	office.wait(1);
}

const flags = async (slug?: string) => listFlags(await office.as(desk.writer), slug);
const letters = async () =>
	(await database.db.select().from(outbox).orderBy(outbox.toAddress)).filter(
		({ event }) => event === 'calculator-flagged'
	);

describe('a revision that is withdrawn', () => {
	test('flags the live release and the draft at once, with who, when, why and what to do', async () => {
		await goLive();
		expect(await flags()).toEqual([]);
		await withdraw(ID, '1.0.0');
		const [flag, ...others] = await flags();
		expect(others).toEqual([]);
		expect(flag).toEqual({
			piece: { slug: SLUG, title: firstLight.title },
			calculator: { id: ID, title: 'Speed of sound in air', revision: '1.0.0' },
			state: 'withdrawn',
			by: { personId: second, name: 'Ama Tindleforth' },
			at: office.now.toISOString(),
			reason: WHY,
			release: 1,
			inDraft: true,
			instead: null,
			writers: [desk.writer]
		});
		expect(whatUses(flag!)).toBe(
			'Release 1, which readers have now, and the draft work with Speed of sound in air, 1.0.0.'
		);
		expect(whatHappened(flag!)).toBe(`Withdrawn by Ama Tindleforth: ${WHY}`);
		expect(wayOut(flag!)).toBe(
			'Hang another calculator in its place, then pull a proof and release anew.'
		);
		expect(await flags(SLUG)).toEqual([flag]);
		await createPiece(await office.as(desk.writer), { title: 'Tides', slug: 'tides' });
		expect(await flags('tides')).toEqual([]);
	});

	test('writes one letter a person, in the same transaction, to writers, signers and editors', async () => {
		await goLive();
		await office.add('Oswin Fairlight', ['editor']);
		const gone = await office.add('Gone Long', ['editor']);
		await disablePerson(office.stranger(), gone);
		await office.add('Bystander Plain', ['writer']);
		// A second piece that uses it, by the same writer: still one letter each.
		const ctx = await office.as(desk.writer);
		await createPiece(ctx, { title: 'Thunder', slug: 'thunder' });
		await saveDraft(ctx, 'thunder', { baseVersion: 1, document: withSound() });

		const before = office.woken;
		await withdraw(ID, '1.0.0');
		expect(office.woken).toBe(before + 1);
		const queued = await letters();
		expect(queued.map(({ toName }) => toName).sort()).toEqual([
			'Mateus Quevarro',
			'Oswin Fairlight',
			'Perpetua Lindqvane',
			'Tamsin Orrelby'
		]);
		const byName = new Map(queued.map((row) => [row.toName, row]));
		expect(byName.get('Oswin Fairlight')?.input.pieces?.split(', ').sort()).toEqual(
			[SLUG, 'thunder'].sort()
		);
		// The signer signed in one of them only.
		expect(byName.get('Mateus Quevarro')?.input.pieces).toBe(SLUG);

		const house = { name: 'A house', origin: 'https://desk.example', secret: 's'.repeat(40) };
		const letter = renderMail(house, byName.get('Tamsin Orrelby')!);
		expect(letter.subject).toBe('Withdrawn: Speed of sound in air, 1.0.0');
		expect(letter.text).toContain('Ama Tindleforth has taken the calculator');
		expect(letter.text).toContain(SLUG);
		expect(letter.text).toContain(`https://desk.example/calculators/${ID}`);
		expect(letter.text).not.toContain(WHY);
	});

	test('a withdrawal that is refused leaves neither flag nor letter', async () => {
		await goLive();
		const stale = await office.as(second);
		office.wait(20);
		await expect(
			withdrawCalculator(
				{ ...stale, now: office.now },
				{ calculator: ID, revision: '1.0.0', note: WHY }
			)
		).rejects.toEqual(expect.objectContaining({ code: 'confirm-by-link' }));
		expect(await flags()).toEqual([]);
		expect(await letters()).toEqual([]);
	});

	test('nobody is written to when no piece rests on it', async () => {
		await proposeHouseCalculator(await office.as(desk.scientist), soundInAir());
		await vet('1.0.0');
		await withdraw(ID, '1.0.0');
		expect(await flags()).toEqual([]);
		expect(await letters()).toEqual([]);
	});

	test('the draft is cleared by taking the step out, the release by releasing anew', async () => {
		await goLive();
		await withdraw(ID, '1.0.0');
		await desk.edit(
			(document) => (document.steps = document.steps.filter(({ id }) => id !== 'sound'))
		);
		const [flag] = await flags();
		expect(flag).toMatchObject({ release: 1, inDraft: false });
		expect(wayOut(flag!)).toContain('The draft no longer works with it');
		await releaseAnew();
		expect(await flags()).toEqual([]);
	});
});

describe('a revision that a newer one supersedes', () => {
	test('flags what went out with it, and writes where answers may differ', async () => {
		await goLive();
		await revise('major', '1.0.0', otherFormula);
		expect(await flags()).toEqual([]);
		await vet('2.0.0');
		const [flag, ...others] = await flags();
		expect(others).toEqual([]);
		expect(flag).toMatchObject({
			state: 'superseded',
			release: 1,
			inDraft: false, // the draft runs with the newest one
			instead: '2.0.0',
			by: { name: 'Ama Tindleforth' }
		});
		expect(whatHappened(flag!)).toBe('Superseded: Ama Tindleforth vetted revision 2.0.0.');
		expect((await letters()).map(({ toName }) => toName).sort()).toEqual([
			'Mateus Quevarro',
			'Perpetua Lindqvane',
			'Tamsin Orrelby'
		]);
		await releaseAnew();
		expect(await flags()).toEqual([]);
	});

	test('where only words differ nobody is written to, and the line says that nothing moves', async () => {
		await goLive();
		await revise('patch', '1.0.0', (card) => (card.title = 'Sound in dry air'));
		await vet('1.0.1');
		const [flag] = await flags();
		expect(wayOut(flag!)).toBe('Every answer stays; the next release takes it along.');
		expect(await letters()).toEqual([]);
	});

	test('withdrawn after it was superseded, the release is flagged as withdrawn', async () => {
		await goLive();
		await revise('major', '1.0.0', otherFormula);
		await vet('2.0.0');
		office.wait(1);
		await withdraw(ID, '1.0.0');
		const all = await flags();
		expect(all).toMatchObject([
			{ state: 'withdrawn', release: 1, inDraft: false, instead: '2.0.0' }
		]);
	});
});

describe('a calculator of the software', () => {
	const builtIn = catalogue.get('line.observe')!;
	const state = async () =>
		(await readVettings(await office.as(desk.writer), builtIn.id))[0]?.state;

	test('is withdrawn like any other: flagged, kept off benches, out of releases and out of the API', async () => {
		await goLive();
		const offered = async () => offeredCalculators(office.stranger());
		expect((await offered()).calculators.has(builtIn.id)).toBe(true);
		await withdraw(builtIn.id, builtIn.revision);
		expect(await state()).toBe('withdrawn');
		expect(await flags()).toMatchObject([
			{ calculator: { id: builtIn.id, title: builtIn.title }, release: 1, inDraft: true }
		]);
		const { states } = await listCalculators(await office.as(desk.writer));
		expect(states[builtIn.id]).toBe('withdrawn');
		const open = (await passConditions(await office.as(desk.editor), SLUG)).filter(
			({ met }) => !met
		);
		expect(open.map(({ says }) => says).join(' ')).toContain(
			`${builtIn.title}, ${builtIn.revision} is withdrawn`
		);
		expect((await offered()).calculators.has(builtIn.id)).toBe(false);
		expect((await offered()).withheld(builtIn.id)).toMatchObject({ code: 'calculator-withdrawn' });
	});

	test('comes back by a test with a reason and a second scientist', async () => {
		await goLive();
		await withdraw(builtIn.id, builtIn.revision);
		office.wait(1);
		const again = {
			calculator: builtIn.id,
			revision: builtIn.revision,
			note: 'It was the note that was wrong.'
		};
		await retestCalculator(await office.as(desk.scientist), again);
		expect(await state()).toBe('tested');
		const sign = { ...again, note: '' };
		await expect(vetCalculator(await office.as(desk.scientist), sign)).rejects.toEqual(
			expect.objectContaining({ code: 'own-proposal' })
		);
		await vetCalculator(await office.as(second), sign);
		expect(await state()).toBe('vetted');
		expect(await flags()).toEqual([]);
		await expect(retestCalculator(await office.as(second), again)).rejects.toEqual(
			expect.objectContaining({ code: 'vetting-out-of-order' })
		);
	});

	test('a revision that the software doesn’t run can’t be withdrawn', async () => {
		await expect(withdraw(builtIn.id, '0.9.0')).rejects.toEqual(
			expect.objectContaining({ code: 'not-found' })
		);
	});

	test('one of the house’s own isn’t tested again, it is revised', async () => {
		await goLive();
		await withdraw(ID, '1.0.0');
		const again = { calculator: ID, revision: '1.0.0', note: 'Please.' };
		await expect(retestCalculator(await office.as(second), again)).rejects.toEqual(
			expect.objectContaining({ code: 'vetting-out-of-order' })
		);
	});
});
