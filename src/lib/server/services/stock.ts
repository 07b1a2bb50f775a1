/** The calculators a house works with: the software's and its own, each in the revision that runs, and how far it is trusted. */
import { desc, inArray, lte } from 'drizzle-orm';
import type { Calculator, CalculatorSet } from '../../physics/calculator.ts';
import { catalogue } from '../../physics/calculators/index.ts';
import { buildHouseCalculator } from '../../physics/house/build.ts';
import type { HouseDefinition } from '../../physics/house/definition.ts';
import { compareRevisions, RUNNING_ORDER, type VettingState } from '../../workflow/vetting.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { houseCalculators, vettings } from '../db/schema/index.ts';

export interface Stock {
	/** By id. The same revisions give the same set, so that what was worked out with it can be kept. */
	calculators: CalculatorSet;
	/** The house's own among them, as data. */
	house: readonly HouseDefinition[];
	/** Where the running revision of a calculator stands. */
	stateOf(calculator: Calculator): VettingState;
}

interface HouseRevision {
	calculator: string;
	revision: string;
	digest: string;
	state: VettingState;
}

/** Every calculator a piece of this house may be worked with. */
export async function calculatorsOf({ db }: Pick<Context, 'db'>): Promise<CalculatorSet> {
	return (await readStock(db)).calculators;
}

/** With `at`, as it stood at that moment: a release keeps the revisions it went out with. */
export async function readStock(db: Db, at?: Date): Promise<Stock> {
	const states = await readStates(db, at);
	const rows = await db
		.select({
			calculator: houseCalculators.calculator,
			revision: houseCalculators.revision,
			digest: houseCalculators.digest
		})
		.from(houseCalculators)
		.where(at && lte(houseCalculators.proposedAt, at));
	const running = runningOf(
		rows.map((row) => ({ ...row, state: states.get(keyOf(row)) ?? 'proposed' }))
	);
	const made = await makeAll(db, running);
	return {
		calculators: setOf(made),
		house: made.map(({ definition }) => definition),
		stateOf: ({ id, revision }) =>
			states.get(keyOf({ calculator: id, revision })) ?? (catalogue.has(id) ? 'vetted' : 'proposed')
	};
}

/** Which revision of a house calculator runs, or ran at a moment; undefined when there was none. */
export type RunningRevision = (calculator: string, at?: Date) => string | undefined;

/** The whole record at once, for questions about many moments. */
export async function readRunningRevisions(db: Db): Promise<RunningRevision> {
	const revisions = await db
		.select({
			calculator: houseCalculators.calculator,
			revision: houseCalculators.revision,
			digest: houseCalculators.digest,
			proposedAt: houseCalculators.proposedAt
		})
		.from(houseCalculators);
	const steps = await db.select().from(vettings).orderBy(vettings.seq);
	return (calculator, at) => {
		const then = <T>(all: T[], when: (each: T) => Date) =>
			at ? all.filter((each) => when(each) <= at) : all;
		const own = then(
			revisions.filter((each) => each.calculator === calculator),
			({ proposedAt }) => proposedAt
		);
		const states = new Map(
			then(
				steps.filter((step) => step.calculator === calculator),
				(step) => step.at
			).map((step) => [keyOf(step), step.state])
		);
		const [running] = runningOf(
			own.map((row) => ({ ...row, state: states.get(keyOf(row)) ?? 'proposed' }))
		);
		return running?.revision;
	};
}

/** The last step of every revision that has any. */
async function readStates(db: Db, at?: Date): Promise<Map<string, VettingState>> {
	const last = await db
		.selectDistinctOn([vettings.calculator, vettings.revision], {
			calculator: vettings.calculator,
			revision: vettings.revision,
			state: vettings.state
		})
		.from(vettings)
		.where(at && lte(vettings.at, at))
		.orderBy(vettings.calculator, vettings.revision, desc(vettings.seq));
	return new Map(last.map((row) => [keyOf(row), row.state]));
}

function keyOf({ calculator, revision }: { calculator: string; revision: string }): string {
	return `${calculator} ${revision}`;
}

/** Of each calculator the revision that runs: a vetted one as long as there is one, and of those the newest. */
function runningOf(revisions: readonly HouseRevision[]): HouseRevision[] {
	const best = new Map<string, HouseRevision>();
	const rank = ({ state }: HouseRevision) => RUNNING_ORDER.indexOf(state);
	for (const revision of revisions) {
		const other = best.get(revision.calculator);
		const order =
			other &&
			(rank(revision) - rank(other) || compareRevisions(other.revision, revision.revision));
		if (order === undefined || order < 0) best.set(revision.calculator, revision);
	}
	return [...best.values()].sort((a, b) => (a.calculator < b.calculator ? -1 : 1));
}

interface Made {
	digest: string;
	definition: HouseDefinition;
	calculator: Calculator;
}

/** By the digest of its definition; a revision is built once while the process runs. */
const built = new Map<string, Made>();

async function makeAll(db: Db, revisions: readonly HouseRevision[]): Promise<Made[]> {
	const unknown = revisions.map(({ digest }) => digest).filter((digest) => !built.has(digest));
	if (unknown.length > 0) {
		const rows = await db
			.select({ digest: houseCalculators.digest, definition: houseCalculators.definition })
			.from(houseCalculators)
			.where(inArray(houseCalculators.digest, unknown));
		for (const { digest, definition } of rows)
			built.set(digest, { digest, definition, calculator: buildHouseCalculator(definition) });
	}
	return revisions.flatMap(({ digest }) => built.get(digest) ?? []);
}

const sets = new Map<string, CalculatorSet>();
const SETS_KEPT = 20;

function setOf(made: readonly Made[]): CalculatorSet {
	if (made.length === 0) return catalogue;
	const key = made.map(({ digest }) => digest).join(' ');
	const kept = sets.get(key);
	if (kept) return kept;
	const fresh: CalculatorSet = new Map([
		...catalogue,
		...made.map(({ calculator }): [string, Calculator] => [calculator.id, calculator])
	]);
	const [oldest] = sets.keys();
	if (sets.size >= SETS_KEPT && oldest !== undefined) sets.delete(oldest);
	sets.set(key, fresh);
	return fresh;
}
