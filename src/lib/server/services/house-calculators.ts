/** The house's own calculators, proposed and revised by a scientist. What becomes of a revision is in vetting-acts.ts. */
import { eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import {
	draftOf,
	type ProposeHouseCalculator,
	type ReviseHouseCalculator
} from '../../forms/house-calculator.ts';
import type { HouseDefinition, HouseDraft } from '../../physics/house/definition.ts';
import { digestOf } from '../../widget/freeze.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import { compareRevisions, raised } from '../../workflow/vetting.ts';
import type { Context } from '../context.ts';
import { sqlState, UNIQUE_VIOLATION, type Db } from '../db/client.ts';
import { houseCalculators } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { isSmaller, leastChange } from './house-changes.ts';
import { testHouseCalculator } from './house-test.ts';
import { refuseUnstorable } from './storable.ts';
import { writeStep } from './vetting-record.ts';

export interface Proposed {
	calculator: string;
	revision: string;
}

export type HouseRow = typeof houseCalculators.$inferSelect;

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

/** The newest revision as it was proposed, whatever has become of it. Throws `not-found`. */
export async function readHouseCalculator(
	ctx: Context,
	calculator: string
): Promise<HouseDefinition> {
	requirePermission(ctx.actor, 'propose-calculator');
	return (await newestRevision(ctx.db, calculator)).definition;
}

/** The definition with its trees; throws `calculator-broken` with all that keeps it from being tested. */
export function settled(draft: HouseDraft): HouseDefinition {
	const test = testHouseCalculator(draft);
	if (!test.definition || test.problems.length > 0)
		throw new SteelyardError('calculator-broken', { problems: test.problems });
	return test.definition;
}

/** Every revision of a calculator, held until the transaction ends. */
export async function revisionsOf(tx: Db, calculator: string): Promise<HouseRow[]> {
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
	await writeStep(tx, ctx, row, 'proposed', '');
	await writeStep(tx, ctx, row, 'tested', `${definition.checks.length} check values agree.`);
	await record(tx, ctx, 'calculator-proposed', { calculator, revision, digest: row.digest });
	return { calculator, revision };
}

function dayOf(moment: Date): string {
	return moment.toISOString().slice(0, 10);
}
