/**
 * A calculator at many places of one of its inputs, as a line or a table wants it: the other inputs are checked once, and
 * numbers go into columns. Every number, warning and refusal is the one that `runCalculator` gives at that place.
 */
import type { Calculator, CheckedInputs, RawInputs, Refusal, Warning } from '../calculator.ts';
import { checkInput, checkInputs, isTaken } from './check-inputs.ts';
import { planOf } from './plan.ts';
import { noValue, runCalculator } from './run.ts';
import { codesPastZones, toldWarnings } from './told-warnings.ts';

export interface Swept {
	/** By output, in its unit and in the order of the places; NaN where there is no number. */
	columns: Readonly<Record<string, Float64Array>>;
	/** Why an output has no number at a place; undefined where it has one, or has words. */
	refusalAt(index: number, output: string): Refusal | undefined;
	/** What comes with the readings at a place. */
	warningsAt(index: number): Warning[];
}

/** What is known of each place once it was worked. */
interface Worked {
	columns: Record<string, Float64Array>;
	/** 1 where there is a reading. */
	read: Uint8Array;
	/** Codes of the warnings that `compute` gave. */
	codesAt(index: number): readonly string[];
}

/**
 * `key` is an input, or a parameter of a set: `cosmology.H0`. What `raw` holds there is left aside.
 * @throws as `runCalculator` does, for a bug in the calculator.
 */
export function sweepCalculator(
	calculator: Calculator,
	raw: RawInputs,
	key: string,
	places: ArrayLike<number>
): Swept {
	const plan = planOf(calculator);
	const [head = key, part] = key.split('.');
	const whole = (place: number): unknown =>
		part === undefined ? place : { ...(raw[head] as object | undefined), [part]: place };
	const inputsAt = (index: number) => ({ ...raw, [head]: whole(places[index] ?? NaN) });

	const checked = checkInputs(calculator, plan, inputsAt(0), head);
	const inputs = checked.ok ? checked.value : {};
	const { columns, read, codesAt } = !checked.ok
		? nothingRead(calculator, places.length)
		: ((part === undefined ? alongCurve(calculator, inputs, head, places) : null) ??
			pointByPoint(calculator, inputs, head, places, whole));

	return {
		columns,
		refusalAt(index, output) {
			if (!Number.isNaN(columns[output]?.[index])) return undefined;
			const result = runCalculator(calculator, inputsAt(index));
			return result.ok ? result.withheld?.[output] : result.refusal;
		},
		warningsAt(index) {
			if (read[index] !== 1) return [];
			const past = codesPastZones(plan, { ...inputs, [head]: whole(places[index] ?? NaN) });
			return toldWarnings(calculator, [...past, ...codesAt(index)]).warnings;
		}
	};
}

function nothingRead(calculator: Calculator, length: number): Worked {
	const columns: Record<string, Float64Array> = {};
	for (const [output] of planOf(calculator).outputs)
		columns[output] = new Float64Array(length).fill(NaN);
	return { columns, read: new Uint8Array(length), codesAt: () => [] };
}

/** By the calculator's own quick way, where it has one for this input. */
function alongCurve(
	calculator: Calculator,
	inputs: CheckedInputs,
	key: string,
	places: ArrayLike<number>
): Worked | null {
	const spec = calculator.inputs[key];
	if (!calculator.curve || spec?.kind !== 'number') return null;
	const curve = calculator.curve(inputs, key, new Float64Array(places));
	if (!curve) return null;
	const { columns, warnings = [] } = curve;
	const read = new Uint8Array(places.length);
	for (let index = 0; index < read.length; index += 1)
		read[index] = isTaken(spec, places[index]) ? 1 : 0;
	for (const [output] of planOf(calculator).outputs) {
		const column = columns[output];
		if (!column) throw noValue(calculator, output);
		for (let index = 0; index < read.length; index += 1) {
			const value = column[index]! + 0; // no negative zero in copy
			column[index] = value;
			if (value - value !== 0) read[index] = 0; // infinite, or no number
		}
	}
	for (let index = read.indexOf(0); index !== -1; index = read.indexOf(0, index + 1))
		for (const column of Object.values(columns)) column[index] = NaN;
	return { columns, read, codesAt: () => warnings };
}

function pointByPoint(
	calculator: Calculator,
	inputs: CheckedInputs,
	head: string,
	places: ArrayLike<number>,
	whole: (place: number) => unknown
): Worked {
	const { columns, read } = nothingRead(calculator, places.length);
	const slots = Object.entries(columns);
	const codes: (readonly string[] | undefined)[] = [];
	const spec = calculator.inputs[head]!;
	for (let index = 0; index < places.length; index += 1) {
		const given = whole(places[index]!);
		if (spec.kind === 'number') {
			if (!isTaken(spec, given)) continue;
			inputs[head] = given;
		} else {
			const checked = checkInput(head, spec, given);
			if (!checked.ok) continue;
			inputs[head] = checked.value;
		}
		const computed = calculator.compute(inputs);
		if (!computed.ok) continue;
		const { values, withheld, warnings } = computed;
		let finite = true;
		for (const [output, column] of slots) {
			const value = values[output];
			if (typeof value === 'number') {
				column[index] = value + 0; // no negative zero in copy
				finite &&= value - value === 0;
			} else if (value === undefined && !(withheld && Object.hasOwn(withheld, output))) {
				throw noValue(calculator, output);
			}
		}
		if (finite) {
			read[index] = 1;
			if (warnings && warnings.length > 0) codes[index] = warnings;
		} else for (const [, column] of slots) column[index] = NaN;
	}
	return { columns, read, codesAt: (index) => codes[index] ?? [] };
}
