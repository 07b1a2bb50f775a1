/**
 * `runCalculator` with uncertainties carried to the outputs: those of the inputs, as given, those of a published
 * parameter set, and those of the constants inside. It works the calculator several times over, so it is for when
 * someone asks, not for every move of a slider. A chain of calculators goes through `widget/evaluate-uncertainty.ts`.
 */
import type { Calculator, RawInputs, Reading, Result } from '../calculator.ts';
import { runCalculator } from '../calculators/run.ts';
import { printNumber } from '../calculators/wording.ts';
import type { CosmologySetName } from '../constants/index.ts';
import { checkGiven, type GivenUncertainties } from './given.ts';
import {
	BY_HAND,
	carriedNote,
	cosmologyKeyOf,
	drawsFor,
	ownUncertaintyOf,
	publishedNote,
	spreadOfSet,
	type OwnUncertainty
} from './own.ts';
import { propagate, type Propagated } from './propagate.ts';
import type { Spread } from './spread.ts';

export type { GivenUncertainties } from './given.ts';

/** What a reading gets on top of its value. */
export type CarriedUncertainty = Pick<Reading, 'uncertainty' | 'uncertaintyNote' | 'drawn'>;

/** Refuses what `runCalculator` refuses, and uncertainties that don't belong to these inputs. */
export function runWithUncertainty(
	calculator: Calculator,
	inputs: RawInputs,
	given: GivenUncertainties = { uncertainties: {} }
): Result {
	const result = runCalculator(calculator, inputs);
	if (!result.ok) return result;
	const checked = checkGiven(calculator, inputs, given);
	if (!checked.ok) return checked;

	const plans = Object.entries(result.outputs).map(([key, reading]) => ({
		key,
		reading,
		plan: planFor(calculator, checked.value, ownUncertaintyOf(calculator, inputs, key, reading))
	}));
	const carried = new Map<string, CarriedUncertainty>();
	for (const withSet of [false, true]) {
		const group = plans.flatMap(({ key, reading, plan }) =>
			plan.ok && plan.withSet === withSet && typeof reading.value === 'number'
				? [{ key, plan }]
				: []
		);
		const [first] = group;
		if (!first || first.plan.spread.quantities.length === 0) continue;
		const propagated = propagate(
			modelOf(
				calculator,
				inputs,
				first.plan.spread,
				group.map(({ key }) => key)
			),
			first.plan.spread,
			group.map(({ plan }) => plan.own),
			drawsFor([calculator])
		);
		for (const [index, { key, plan }] of group.entries()) {
			carried.set(key, carriedFrom(propagated[index] as Propagated, plan.note));
		}
	}
	return {
		...result,
		outputs: Object.fromEntries(
			plans.map(({ key, reading, plan }) => [
				key,
				{ ...reading, ...(carried.get(key) ?? uncarried(reading, plan, checked.value)) }
			])
		)
	};
}

type Plan =
	| { ok: true; spread: Spread; withSet: boolean; own: number; note: string | null }
	| { ok: false; reason: string };

/** Which quantities one output's uncertainty comes from, and what comes on top. */
function planFor(calculator: Calculator, given: Spread, own: OwnUncertainty): Plan {
	const fromGiven = (u: number, note: string | null): Plan => ({
		ok: true,
		spread: given,
		withSet: false,
		own: u,
		note
	});
	switch (own.kind) {
		case 'exact':
			return fromGiven(0, null);
		case 'constants':
			return fromGiven(own.u, null);
		case 'unknown':
			return { ok: false, reason: own.reason };
		case 'by-hand':
			return parametersIn(calculator, given) ? fromGiven(0, null) : { ok: false, reason: BY_HAND };
		case 'set':
			if (own.published !== null) return fromGiven(own.published, publishedNote(own.set));
			return parametersIn(calculator, given)
				? fromGiven(0, null)
				: withSet(calculator, given, own.set);
	}
}

function withSet(calculator: Calculator, given: Spread, set: CosmologySetName): Plan {
	const fit = spreadOfSet(set);
	if (!fit.ok) return fit;
	const key = cosmologyKeyOf(calculator) ?? '';
	const { quantities, correlations } = fit.spread;
	return {
		ok: true,
		withSet: true,
		own: 0,
		note: carriedNote(set),
		spread: {
			quantities: [
				...given.quantities,
				...quantities.map((one) => ({ ...one, name: `${key}.${one.name}` }))
			],
			correlations: [
				...given.correlations,
				...correlations.map(([a, b, r]) => [`${key}.${a}`, `${key}.${b}`, r] as const)
			]
		}
	};
}

function parametersIn(calculator: Calculator, { quantities }: Spread): boolean {
	return quantities.some(({ name }) => name.startsWith(`${cosmologyKeyOf(calculator) ?? ''}.`));
}

/** The outputs as functions of the uncertain inputs; null where one is refused, withheld or no number. */
function modelOf(
	calculator: Calculator,
	inputs: RawInputs,
	{ quantities }: Spread,
	keys: readonly string[]
) {
	return (values: readonly number[]): (number | null)[] => {
		const moved: RawInputs = { ...inputs };
		for (const [index, { name }] of quantities.entries()) {
			const [head = name, part] = name.split('.');
			moved[head] =
				part === undefined ? values[index] : { ...(moved[head] as object), [part]: values[index] };
		}
		const result = runCalculator(calculator, moved);
		return keys.map((key) => {
			const value = result.ok ? result.outputs[key]?.value : undefined;
			return typeof value === 'number' ? value : null;
		});
	};
}

/** A propagated uncertainty in the words and shape of a reading. `note` says where it comes from. */
export function carriedFrom(propagated: Propagated, note: string | null): CarriedUncertainty {
	if (!propagated.ok) return { uncertainty: 'not-available', uncertaintyNote: propagated.reason };
	const { u, drawn } = propagated;
	if (u === 0) return { uncertainty: 'exact' };
	const notes = [
		note,
		drawn &&
			`A straight line would mislead here: of ${drawn.draws} draws the middle is ${printNumber(drawn.median)}, and 95 in 100 lie between ${printNumber(drawn.low)} and ${printNumber(drawn.high)}.`
	].filter(Boolean);
	return {
		uncertainty: u,
		...(notes.length > 0 ? { uncertaintyNote: notes.join(' ') } : {}),
		...(drawn ? { drawn } : {})
	};
}

/** Where there was nothing to carry. */
function uncarried(reading: Reading, plan: Plan, given: Spread): CarriedUncertainty {
	if (!plan.ok) return { uncertainty: 'not-available', uncertaintyNote: plan.reason };
	if (typeof reading.value === 'string' && given.quantities.length > 0) {
		return { uncertainty: 'not-available', uncertaintyNote: 'Words have no spread.' };
	}
	return {
		uncertainty: reading.uncertainty,
		...(plan.note === null ? {} : { uncertaintyNote: plan.note })
	};
}
