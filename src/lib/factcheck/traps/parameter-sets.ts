/** Traps 4 and 58: a number of the expanding universe belongs to the parameter set it was computed with. */
import type { Calculator, RawInputs } from '../../physics/calculator.ts';
import { runCalculator } from '../../physics/calculators/run.ts';
import { constants } from '../../physics/constants/index.ts';
import type { Stated } from '../../widget/stated.ts';
import { readsInWords } from '../words.ts';
import { fits, standsAsWritten, type Trap, type TrapMatch } from './trap.ts';

/** Published sets that the number fits, when it doesn’t fit the one in use. Null for calculators without a cosmology. */
export function parameterSet(
	stated: Stated,
	calculator: Calculator,
	inputs: RawInputs,
	output: string
): Trap | null {
	const own = numberOf(calculator, inputs, output);
	if (!own || standsAsWritten(stated, { ...own, uncertainty: 'exact' })) return null;
	const matches = overSets(calculator, inputs, output).filter(({ value, unit }) =>
		fits(stated, value, unit)
	);
	if (matches.length === 0) return null;
	const names = matches.map(({ label }) => label).join(', ');
	const reads = readsInWords(stated, { ...own, uncertainty: 'exact' });
	return {
		code: 'parameter-set',
		says: `The set in use gives ${reads}; the number fits ${names}. Say which set the copy goes by, or take the one in use.`,
		matches
	};
}

/** The output by every published set, the lowest first: how much depends on the choice. */
export function overSets(calculator: Calculator, inputs: RawInputs, output: string): TrapMatch[] {
	const key = Object.keys(calculator.inputs).find(
		(name) => calculator.inputs[name]?.kind === 'cosmology'
	);
	if (key === undefined) return [];
	return Object.entries(constants.cosmologies)
		.flatMap(([set, { label }]) => {
			const found = numberOf(calculator, { ...inputs, [key]: { set } }, output);
			return found ? [{ key: set, label, ...found }] : [];
		})
		.sort((a, b) => a.value - b.value);
}

function numberOf(
	calculator: Calculator,
	inputs: RawInputs,
	output: string
): { value: number; unit: string } | null {
	const result = runCalculator(calculator, inputs);
	const reading = result.ok ? result.outputs[output] : undefined;
	return reading && typeof reading.value === 'number'
		? { value: reading.value, unit: reading.unit }
		: null;
}
