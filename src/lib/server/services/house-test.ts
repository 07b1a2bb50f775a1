/** A house calculator tried out before anything is kept: what is wrong with it, what its check values give, a first run. */
import type { z } from 'zod';
import {
	draftOf,
	ProposeHouseCalculator,
	ReviseHouseCalculator
} from '../../forms/house-calculator.ts';
import type { Calculator, Result } from '../../physics/calculator.ts';
import { runCalculator } from '../../physics/calculators/run.ts';
import { buildHouseCalculator } from '../../physics/house/build.ts';
import {
	CHECKS_NEEDED,
	type HouseCheck,
	type HouseDefinition,
	type HouseDraft,
	type HouseProblem
} from '../../physics/house/definition.ts';
import { settleHouse } from '../../physics/house/settle.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';

export interface CheckOutcome {
	statement: string;
	published: number;
	/** Null when the calculator refuses these inputs. */
	got: number | null;
	unit: string;
	agrees: boolean;
	/** Why not, in a sentence; '' when it agrees. */
	says: string;
}

export interface HouseTest {
	/** Null when the formulas don't hold together. */
	definition: HouseDefinition | null;
	problems: HouseProblem[];
	checks: CheckOutcome[];
	/** The run at the first values of all inputs; null as long as it can't be built. */
	preview: Result | null;
}

/** Settles the draft, and runs its check values on what comes out. */
export function testHouseCalculator(draft: HouseDraft): HouseTest {
	const settled = settleHouse(draft);
	if (!settled.ok)
		return { definition: null, problems: settled.problems, checks: [], preview: null };
	const { definition } = settled;
	const calculator = buildHouseCalculator(definition);
	const checks = definition.checks.map((check) => outcomeOf(calculator, check));
	const first = Object.fromEntries(definition.inputs.map(({ name, initial }) => [name, initial]));
	return {
		definition,
		problems: [...sourceProblems(definition), ...checkProblems(checks)],
		checks,
		preview: runCalculator(calculator, first)
	};
}

/**
 * The same for what stands in the form at this moment, however unfinished. Keeps nothing. What is still empty is filled
 * in for the trial, so that a formula is looked at as soon as it is written.
 */
export function tryHouseCalculator(ctx: Context, sent: unknown): HouseTest {
	requirePermission(ctx.actor, 'propose-calculator');
	const isRevision = typeof sent === 'object' && sent !== null && 'base' in sent;
	const schema = isRevision ? ReviseHouseCalculator : ProposeHouseCalculator;
	const read = schema.safeParse(sent);
	if (read.success) return testHouseCalculator(trialDraft(read.data));
	const unfinished = fieldProblems(read.error);
	const filled = schema.safeParse(filledIn(sent, read.error));
	if (!filled.success) return { definition: null, problems: unfinished, checks: [], preview: null };
	const test = testHouseCalculator(trialDraft(filled.data));
	return {
		...test,
		definition: null,
		preview: null,
		problems: [...unfinished, ...test.problems.filter((problem) => !restsOn(unfinished, problem))]
	};
}

function trialDraft(form: ProposeHouseCalculator | ReviseHouseCalculator): HouseDraft {
	const id = 'slug' in form ? `house.${form.slug}` : 'house.revised';
	return draftOf(form, { id, revision: '1.0.0', history: [] });
}

/** A copy with something in every place that the schema found empty or wrong. */
function filledIn(sent: unknown, error: z.ZodError): unknown {
	const copy: unknown = structuredClone(sent);
	error.issues.forEach((issue, index) => {
		const holder = issue.path
			.slice(0, -1)
			.reduce<unknown>((inside, key) => (isHolder(inside) ? inside[key] : undefined), copy);
		const last = issue.path.at(-1);
		if (!isHolder(holder) || last === undefined) return;
		const isNumber = issue.code === 'invalid_type' && issue.expected === 'number';
		const words = issue.code === 'invalid_value' ? 'number' : `unfinished${index}`;
		holder[last] = isNumber ? 1 : words;
	});
	return copy;
}

function isHolder(value: unknown): value is Record<PropertyKey, unknown> {
	return typeof value === 'object' && value !== null;
}

/** True for a problem of a row that has something unfinished in it, formulas aside: it may come from what was filled in. */
function restsOn(unfinished: readonly HouseProblem[], { path, at }: HouseProblem): boolean {
	if (at) return false;
	const rowOf = (where: string) => where.split('.').slice(0, 2).join('.');
	return unfinished.some((problem) => rowOf(problem.path) === rowOf(path));
}

/** Empty and oversized fields, as problems among the others. */
export function fieldProblems(error: z.ZodError): HouseProblem[] {
	return error.issues.map(({ path, message }) => ({
		path: path.join('.'),
		code: 'field',
		says: message,
		mend: ''
	}));
}

function outcomeOf(calculator: Calculator, check: HouseCheck): CheckOutcome {
	const { statement, published, tolerance } = check;
	const result = runCalculator(calculator, check.inputs);
	const reading = result.ok ? result.outputs[check.output] : undefined;
	const got = typeof reading?.value === 'number' ? reading.value : null;
	const unit = reading?.unit ?? '';
	const agrees = got !== null && Math.abs(got - published) <= tolerance;
	const refusal = result.ok ? `There is no output “${check.output}”.` : result.refusal.message;
	return {
		statement,
		published,
		got,
		unit,
		agrees,
		says: agrees ? '' : got === null ? refusal : `It gives ${spoken(got)}, not ${published}.`
	};
}

function spoken(value: number): string {
	return String(Number(value.toPrecision(8)));
}

function checkProblems(checks: readonly CheckOutcome[]): HouseProblem[] {
	return checks.flatMap(({ agrees, says, statement }, index) =>
		agrees
			? []
			: [
					{
						path: `checks.${index}.published`,
						code: 'check-disagrees',
						says: `“${statement}”: ${says}`,
						mend: 'Look at the formula, at the units, and at what was printed; the tolerance is half of the last printed digit.'
					}
				]
	);
}

/** Enough check values, each with where it was printed, and each printed somewhere else than in one's head. */
function sourceProblems({ checks, sources }: HouseDefinition): HouseProblem[] {
	const problems: HouseProblem[] = [];
	if (checks.length < CHECKS_NEEDED) {
		problems.push({
			path: 'checks',
			code: 'too-few-checks',
			says: `It has ${checks.length} of the ${CHECKS_NEEDED} check values it needs.`,
			mend: 'Add values that someone has published, at inputs far apart.'
		});
	}
	checks.forEach(({ source }, index) => {
		if (source.trim()) return;
		problems.push({
			path: `checks.${index}.source`,
			code: 'no-source',
			says: 'This check value names no source.',
			mend: 'Say where it was printed, with enough to find it again.'
		});
	});
	if (sources.length === 0) {
		problems.push({
			path: 'sources',
			code: 'no-source',
			says: 'It names no source for its method.',
			mend: 'Name the work the formula is from.'
		});
	}
	return problems;
}
