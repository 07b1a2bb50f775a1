/** Every trap that one stated number and its calculator can show, the most telling first. */
import type { Calculator, RawInputs } from '../../physics/calculator.ts';
import { runCalculator } from '../../physics/calculators/run.ts';
import { commensurable } from '../../physics/units/units.ts';
import type { Language } from '../../widget/language.ts';
import type { Stated } from '../../widget/stated.ts';
import type { WeighedReading } from '../weighing.ts';
import { factorTwo, reciprocal, scaleSlip } from './factors.ts';
import { parameterSet } from './parameter-sets.ts';
import { siblingOutput, timeAsDistance } from './siblings.ts';
import type { Trap } from './trap.ts';

/** None where the number fits its reading, or where there is no reading. Never throws. */
export function findTraps(
	stated: Stated,
	calculator: Calculator,
	inputs: RawInputs,
	output: string,
	language: Language = 'en'
): Trap[] {
	const result = runCalculator(calculator, inputs);
	const own = result.ok ? result.outputs[output] : undefined;
	if (!own || typeof own.value !== 'number') return [];
	const reading: WeighedReading = { ...own, value: own.value };
	// Another dimension is another mistake, and the weighing tells it.
	const compared = commensurable(stated.unit, own.unit)
		? [
				parameterSet(stated, calculator, inputs, output),
				scaleSlip(stated, reading),
				reciprocal(stated, reading),
				factorTwo(stated, reading)
			]
		: [];
	return [
		siblingOutput(stated, calculator, result, output, language),
		timeAsDistance(stated, calculator, result, output, language),
		...compared
	].filter((trap) => trap !== null);
}
