/**
 * The uncertainty of one reading, through the whole chain behind it. Everything upstream is worked again for each
 * quantity that isn't exact, so that what two steps share (a parameter set) moves in both at once; adding up the
 * uncertainties step by step would get a chain wrong. It costs a dozen evaluations, or a thousand where a straight
 * line is doubtful: ask where a number is weighed, not at every move of a slider.
 */
import type { CalculatorSet } from '../physics/calculator.ts';
import { runCalculator } from '../physics/calculators/run.ts';
import { drawsFor } from '../physics/uncertainty/own.ts';
import { propagate, type Propagated } from '../physics/uncertainty/propagate.ts';
import {
	carriedFrom,
	type CarriedUncertainty
} from '../physics/uncertainty/run-with-uncertainty.ts';
import type { UncertainQuantity } from '../physics/uncertainty/spread.ts';
import { convertDifference } from '../physics/units/units.ts';
import type { ReadingRef } from './document.ts';
import {
	evaluate,
	readingAt,
	type Evaluation,
	type ReadingOutcome,
	type Wired
} from './evaluate.ts';
import { wiringOf } from './graph.ts';
import { CONSTANTS, inSet, shifted, sourcesOf, type Worked } from './uncertainty-sources.ts';

export interface UncertaintyOptions {
	/** Work a doubtful reading by seeded draws; without, it is not available. On by default. */
	draws?: boolean;
}

/** `readingAt` with the uncertainty carried through the chain, or a note why it can't be. */
export function readingWithUncertainty(
	document: Wired,
	evaluation: Evaluation,
	ref: ReadingRef,
	calculators: CalculatorSet,
	options: UncertaintyOptions = {}
): ReadingOutcome {
	const outcome = readingAt(document, evaluation, ref, calculators);
	if (!outcome.ok || outcome.reading.uncertainty !== 'not-available') return outcome;
	if (typeof outcome.reading.value !== 'number') return outcome;
	const carried = evaluateUncertainty(document, evaluation, ref, calculators, options);
	return { ok: true, reading: { ...outcome.reading, ...carried } };
}

/** The uncertainty of a reading that is there, in its own unit. Controls and settings are exact. Never throws. */
export function evaluateUncertainty(
	document: Wired,
	evaluation: Evaluation,
	ref: ReadingRef,
	calculators: CalculatorSet,
	{ draws = true }: UncertaintyOptions = {}
): CarriedUncertainty {
	if ('control' in ref) return { uncertainty: 'exact' };
	if ('setting' in ref) return ofSetting(document, evaluation, ref, calculators, { draws });

	const upstream = {
		constants: document.constants,
		formulas: document.formulas,
		controls: document.controls,
		steps: wiringOf(document.steps, ref).steps
	};
	const worked = workPlainly(upstream, evaluation, calculators);
	const sources = sourcesOf(upstream.steps, ref, worked, calculators);
	if (!sources.ok) return { uncertainty: 'not-available', uncertaintyNote: sources.reason };
	const { quantities, correlations, note } = sources;
	if (quantities.length === 0) return { uncertainty: 'exact' };

	const model = (values: readonly number[]): (number | null)[] => {
		const moved = new Map(quantities.map(({ name }, index) => [name, values[index] ?? NaN]));
		const again = evaluate(upstream, evaluation.values, calculators, (step, calculator, inputs) =>
			shifted(step, runCalculator(calculator, inSet(calculator, inputs, moved)), moved)
		);
		const outcome = readingAt(upstream, again, ref, calculators);
		return [outcome.ok && typeof outcome.reading.value === 'number' ? outcome.reading.value : null];
	};
	const used = upstream.steps.flatMap(({ calculator }) => calculators.get(calculator) ?? []);
	const spread = { quantities, correlations };
	const [propagated] = propagate(model, spread, [0], draws ? drawsFor(used) : 0);
	if (!propagated) return { uncertainty: 'not-available' };
	return sharedConstants(propagated, quantities) ?? carriedFrom(propagated, note);
}

/** A setting that takes another reading is as uncertain as that reading. */
function ofSetting(
	document: Wired,
	evaluation: Evaluation,
	{ step: id, setting }: { step: string; setting: string },
	calculators: CalculatorSet,
	options: UncertaintyOptions
): CarriedUncertainty {
	const source = document.steps.find((step) => step.id === id)?.settings[setting];
	if (source?.from !== 'reading') return { uncertainty: 'exact' };
	const ref = { step: source.step, output: source.output };
	const from = readingAt(document, evaluation, ref, calculators);
	const into = readingAt(document, evaluation, { step: id, setting }, calculators);
	const carried =
		from.ok && from.reading.uncertainty !== 'not-available'
			? { uncertainty: from.reading.uncertainty }
			: evaluateUncertainty(document, evaluation, ref, calculators, options);
	if (!from.ok || !into.ok || typeof carried.uncertainty !== 'number') return carried;
	const units = [from.reading.unit, into.reading.unit] as const;
	const { drawn: _drawn, ...rest } = carried;
	return { ...rest, uncertainty: Math.abs(convertDifference(carried.uncertainty, ...units)) };
}

function workPlainly(
	upstream: Wired,
	{ values }: Evaluation,
	calculators: CalculatorSet
): Map<string, Worked> {
	const worked = new Map<string, Worked>();
	evaluate(upstream, values, calculators, (step, calculator, inputs) => {
		const result = runCalculator(calculator, inputs);
		worked.set(step.id, { inputs, result });
		return result;
	});
	return worked;
}

/** How much of the uncertainty may hang on constants that two calculators share. */
const SHARED_SHARE = 0.1;

/**
 * Calculators don't say which constants make them uncertain, so two of them may rest on the same one, and their shifts
 * may add up or cancel. Where that matters the uncertainty is not available.
 */
function sharedConstants(
	propagated: Propagated,
	quantities: readonly UncertainQuantity[]
): CarriedUncertainty | null {
	if (!propagated.ok) return null;
	const shifts = propagated.changes
		.filter((_, index) => quantities[index]?.name.startsWith(`${CONSTANTS}:`))
		.map(Math.abs);
	if (shifts.length < 2) return null;
	const together = shifts.reduce((sum, one) => sum + one, 0);
	const apart = Math.max(0, 2 * Math.max(...shifts) - together);
	const squares = shifts.reduce((sum, one) => sum + one * one, 0);
	const rest = Math.max(0, propagated.u ** 2 - squares);
	const most = Math.sqrt(rest + together ** 2);
	const least = Math.sqrt(rest + apart ** 2);
	return most - least <= SHARED_SHARE * propagated.u
		? null
		: {
				uncertainty: 'not-available',
				uncertaintyNote:
					'Several steps rest on measured constants, and whether their errors add up or cancel isn’t known.'
			};
}
