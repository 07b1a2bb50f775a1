/** The house's own calculators: proposed and revised by one scientist, signed by a second, taken out of use with a reason. */
import { and, eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import {
	draftOf,
	type ProposeHouseCalculator,
	type ReviseHouseCalculator,
	type VetCalculator,
	type WithdrawCalculator
} from '../../forms/house-calculator.ts';
import type { HouseDefinition, HouseDraft } from '../../physics/house/definition.ts';
import { digestOf } from '../../widget/freeze.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import {
	compareRevisions,
	mayBecome,
	raised,
	requireStep,
	type VettingState
} from '../../workflow/vetting.ts';
import type { Context } from '../context.ts';
import { sqlState, UNIQUE_VIOLATION, type Db } from '../db/client.ts';
import { houseCalculators, vettings } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { isSmaller, leastChange } from './house-changes.ts';
import { testHouseCalculator } from './house-test.ts';
import { requireFresh } from './sessions.ts';
import { refuseUnstorable } from './storable.ts';

export interface Proposed {
	calculator: string;
	revision: string;
}

type HouseRow = typeof houseCalculators.$inferSelect;

/**
 * Adds a calculator under `house.` and its short name, tested: it is refused with `calculator-broken` and every problem
 * named when a formula doesn't hold, or fewer than three check values with named sources agree.
 */
export async function proposeHouseCalculator(
	ctx: Context,
	input: ProposeHouseCalculator
): Promise<Proposed> {
	requirePermission(ctx.actor, 'propose-calculator');
	refuseUnstorable(input);
	const { slug, ...card } = input;
	const definition = settled(
		draftOf(card, {
			id: `house.${slug}`,
			revision: '1.0.0',
			history: [{ revision: '1.0.0', date: dayOf(ctx.now), change: 'First revision.' }]
		})
	);
	return ctx.db.transaction(async (tx) => {
		if ((await revisionsOf(tx, definition.id)).length > 0) {
			throw new SteelyardError('calculator-id-taken', { calculator: definition.id });
		}
		return keep(tx, ctx, definition);
	});
}

/**
 * Proposes a revision on top of the newest. Throws `revision-too-small` when the same inputs may give another answer, or
 * there is an output more, and the change isn't labelled so.
 */
export async function reviseHouseCalculator(
	ctx: Context,
	calculator: string,
	input: ReviseHouseCalculator
): Promise<Proposed> {
	requirePermission(ctx.actor, 'propose-calculator');
	refuseUnstorable(input);
	const { base, change, note, ...card } = input;
	const newest = await newestRevision(ctx.db, calculator);
	const revision = raised(newest.revision, change);
	const definition = settled(
		draftOf(card, {
			id: calculator,
			revision,
			history: [{ revision, date: dayOf(ctx.now), change: note }, ...newest.definition.history]
		})
	);
	const least = leastChange(newest.definition, definition);
	if (isSmaller(change, least)) throw new SteelyardError('revision-too-small', { change, least });
	return ctx.db.transaction(async (tx) => {
		if ((await newestRevision(tx, calculator)).revision !== base) {
			throw new SteelyardError('revision-superseded', { newest: newest.revision });
		}
		return keep(tx, ctx, definition);
	});
}

/** A second scientist's signature: from now on it may be published, and the revisions before it are superseded. */
export async function vetCalculator(ctx: Context, input: VetCalculator): Promise<void> {
	const { actor } = ctx;
	requirePermission(actor, 'vet-calculator');
	refuseUnstorable(input);
	await ctx.db.transaction(async (tx) => {
		const revisions = await revisionsOf(tx, input.calculator);
		const signed = revisions.find(({ revision }) => revision === input.revision);
		if (!signed) throw new SteelyardError('not-found');
		requirePermission(actor, 'vet-calculator', { proof: null, proposer: signed.proposedBy });
		await requireFresh(ctx, tx);
		requireStep(await stateOf(tx, signed), 'vetted');
		settled(signed.definition); // what runs now, not what ran when it was proposed

		await step(tx, ctx, signed, 'vetted', input.note);
		for (const older of revisions) {
			if (compareRevisions(older.revision, signed.revision) >= 0) continue;
			if (!mayBecome(await stateOf(tx, older), 'superseded')) continue;
			await step(tx, ctx, older, 'superseded', `Revision ${signed.revision} was vetted.`);
		}
		await record(tx, ctx, 'calculator-vetted', about(signed));
	});
}

/** Takes a revision out of use, with a reason. What was published with it stays as it is. */
export async function withdrawCalculator(ctx: Context, input: WithdrawCalculator): Promise<void> {
	requirePermission(ctx.actor, 'withdraw-calculator');
	refuseUnstorable(input);
	await ctx.db.transaction(async (tx) => {
		const revisions = await revisionsOf(tx, input.calculator);
		const found = revisions.find(({ revision }) => revision === input.revision);
		if (!found) throw new SteelyardError('not-found');
		await requireFresh(ctx, tx);
		requireStep(await stateOf(tx, found), 'withdrawn');
		await step(tx, ctx, found, 'withdrawn', input.note);
		await record(tx, ctx, 'calculator-withdrawn', about(found));
	});
}

/** The newest revision as it was proposed, whatever has become of it. Throws `not-found`. */
export async function readHouseCalculator(
	ctx: Context,
	calculator: string
): Promise<HouseDefinition> {
	requirePermission(ctx.actor, 'propose-calculator');
	return (await newestRevision(ctx.db, calculator)).definition;
}

/** The definition with its trees; throws `calculator-broken` with all that keeps it from being tested. */
function settled(draft: HouseDraft): HouseDefinition {
	const test = testHouseCalculator(draft);
	if (!test.definition || test.problems.length > 0)
		throw new SteelyardError('calculator-broken', { problems: test.problems });
	return test.definition;
}

/** Every revision of a calculator, held until the transaction ends. */
async function revisionsOf(tx: Db, calculator: string): Promise<HouseRow[]> {
	return tx
		.select()
		.from(houseCalculators)
		.where(eq(houseCalculators.calculator, calculator))
		.for('update');
}

async function newestRevision(db: Db, calculator: string): Promise<HouseRow> {
	const rows = await db
		.select()
		.from(houseCalculators)
		.where(eq(houseCalculators.calculator, calculator));
	const newest = rows.sort((a, b) => compareRevisions(b.revision, a.revision))[0];
	if (!newest) throw new SteelyardError('not-found');
	return newest;
}

async function keep(tx: Db, ctx: Context, definition: HouseDefinition): Promise<Proposed> {
	const { id: calculator, revision } = definition;
	const proposedBy = ctx.actor?.personId;
	if (!proposedBy) throw new SteelyardError('not-signed-in');
	const row = { calculator, revision, definition, digest: digestOf(definition), proposedBy };
	try {
		await tx.insert(houseCalculators).values({ ...row, proposedAt: ctx.now });
	} catch (error) {
		if (sqlState(error) === UNIQUE_VIOLATION) throw new SteelyardError('revision-superseded');
		throw error;
	}
	await step(tx, ctx, row, 'proposed', '');
	const count = definition.checks.length;
	await step(tx, ctx, row, 'tested', `${count} check values agree.`);
	await record(tx, ctx, 'calculator-proposed', about(row));
	return { calculator, revision };
}

type Revision = Pick<HouseRow, 'calculator' | 'revision' | 'digest'>;

function about({ calculator, revision, digest }: Revision) {
	return { calculator, revision, digest };
}

async function stateOf(tx: Db, { calculator, revision }: Revision): Promise<VettingState | 'new'> {
	const steps = await tx
		.select({ state: vettings.state })
		.from(vettings)
		.where(and(eq(vettings.calculator, calculator), eq(vettings.revision, revision)))
		.orderBy(vettings.seq);
	return steps.at(-1)?.state ?? 'new';
}

async function step(
	tx: Db,
	{ actor, now }: Context,
	{ calculator, revision }: Revision,
	state: VettingState,
	note: string
): Promise<void> {
	if (!actor) throw new SteelyardError('not-signed-in');
	await tx
		.insert(vettings)
		.values({ calculator, revision, state, personId: actor.personId, at: now, note });
}

function dayOf(moment: Date): string {
	return moment.toISOString().slice(0, 10);
}
