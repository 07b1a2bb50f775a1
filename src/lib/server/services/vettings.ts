/** Where calculators stand in their vetting, for their cards and their list. */
import { and, eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { HouseDefinition } from '../../physics/house/definition.ts';
import { catalogue } from '../../physics/calculators/index.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import {
	checksAgree,
	compareRevisions,
	vettingOf,
	type VettingView
} from '../../workflow/vetting.ts';
import type { Context, Fixtures } from '../context.ts';
import { houseCalculators, vettings } from '../db/schema/index.ts';
import { nameBook } from './people.ts';
import { readStock } from './stock.ts';

export interface ShelfOfCalculators {
	/** The house's own, as data, each in the revision that runs. */
	house: readonly HouseDefinition[];
	/** State of the running revision by calculator id; one of the software's that isn't here is vetted. */
	states: Record<string, VettingView['state']>;
}

/** All that a page needs to show every calculator of the house beside the software's. */
export async function listCalculators(ctx: Context): Promise<ShelfOfCalculators> {
	requirePermission(ctx.actor, 'read-calculators');
	const { house, calculators, stateOf } = await readStock(ctx.db);
	const own = new Set(house.map(({ id }) => id));
	return {
		house,
		states: Object.fromEntries(
			[...calculators.values()]
				.map((calculator) => [calculator.id, stateOf(calculator)] as const)
				.filter(([id, state]) => own.has(id) || state !== 'vetted')
		)
	};
}

/**
 * Two scientists of a house put their names to every calculator that came with the software, in the revision that runs.
 * What has a record already is left as it is.
 */
export async function signWhatCame(
	{ db }: Pick<Fixtures, 'db'>,
	now: Date,
	[first, second]: readonly [first: string, second: string]
): Promise<void> {
	await db.transaction(async (tx) => {
		const known = await tx
			.selectDistinct({ calculator: vettings.calculator, revision: vettings.revision })
			.from(vettings);
		const has = new Set(known.map(({ calculator, revision }) => `${calculator} ${revision}`));
		const steps = [...catalogue.values()]
			.filter(({ id, revision }) => !has.has(`${id} ${revision}`))
			.flatMap(({ id: calculator, revision, checks }): (typeof vettings.$inferInsert)[] => {
				const about = { calculator, revision, at: now };
				return [
					{ ...about, state: 'tested', personId: first, note: checksAgree(checks) },
					{ ...about, state: 'vetted', personId: second, note: '' }
				];
			});
		if (steps.length > 0) await tx.insert(vettings).values(steps);
	});
}

/** One revision of a house calculator, whether it runs or not. Throws `not-found`. */
export async function readRevision(
	ctx: Context,
	calculator: string,
	revision: string
): Promise<HouseDefinition> {
	requirePermission(ctx.actor, 'read-calculators');
	const [row] = await ctx.db
		.select({ definition: houseCalculators.definition })
		.from(houseCalculators)
		.where(
			and(eq(houseCalculators.calculator, calculator), eq(houseCalculators.revision, revision))
		);
	if (!row) throw new SteelyardError('not-found');
	return row.definition;
}

/** Every revision of a calculator with its vetting, newest first; empty when there is no such calculator. */
export async function readVettings(ctx: Context, calculator: string): Promise<VettingView[]> {
	requirePermission(ctx.actor, 'read-calculators');
	const rows = await ctx.db
		.select()
		.from(vettings)
		.where(eq(vettings.calculator, calculator))
		.orderBy(vettings.seq);
	const own = await ctx.db
		.select({ revision: houseCalculators.revision, proposedBy: houseCalculators.proposedBy })
		.from(houseCalculators)
		.where(eq(houseCalculators.calculator, calculator));
	const builtIn = catalogue.get(calculator);
	const names = await nameBook(ctx.db, [
		...rows.map(({ personId }) => personId),
		...own.map(({ proposedBy }) => proposedBy)
	]);
	const revisions = new Set([
		...rows.map(({ revision }) => revision),
		...own.map(({ revision }) => revision),
		...(builtIn ? [builtIn.revision] : [])
	]);
	return [...revisions]
		.sort((a, b) => compareRevisions(b, a))
		.map((revision) => {
			const steps = rows.filter((row) => row.revision === revision);
			const last = steps.at(-1);
			// What came with the software is proposed by whoever put it to the test again.
			const proposer =
				own.find((each) => each.revision === revision)?.proposedBy ??
				(last?.state === 'tested' ? last.personId : null);
			return vettingOf(
				{
					calculator,
					revision,
					house: !builtIn,
					proposedBy: proposer === null ? null : names(proposer)
				},
				steps.map(({ state, personId, at, note }) => ({
					state,
					by: names(personId),
					at: at.toISOString(),
					note
				}))
			);
		});
}
