/** Traps 1, 2, 6, 12, 15 and 16: the number is right, and it is another output’s. */
import type { Calculator, Result } from '../../physics/calculator.ts';
import { constants } from '../../physics/constants/index.ts';
import { commensurable, convert } from '../../physics/units/units.ts';
import type { Language } from '../../widget/language.ts';
import { printStated, type Stated } from '../../widget/stated.ts';
import { fits, standsAsWritten, type Trap, type TrapMatch } from './trap.ts';

const { c } = constants.physical;

/** Outputs of the same run that the number fits, when it doesn’t fit its own. */
export function siblingOutput(
	stated: Stated,
	calculator: Calculator,
	result: Result,
	output: string,
	language: Language = 'en'
): Trap | null {
	const others = otherReadings(stated, result, output);
	const matches = others
		.filter(({ value, unit }) => commensurable(unit, stated.unit) && fits(stated, value, unit))
		.map((one) => ({ ...one, label: labelOf(calculator, one.key) }));
	const [best] = matches;
	if (!best) return null;
	return {
		code: 'sibling-output',
		says: `${capital(printStated(stated, language))} doesn’t fit “${labelOf(calculator, output)}”, and fits “${best.label}”. Which of them do the words mean?`,
		matches
	};
}

/** “13.8 billion light years” where 13.8 billion years is a time of the same run: light’s way in that time is no distance now. */
export function timeAsDistance(
	stated: Stated,
	calculator: Calculator,
	result: Result,
	output: string,
	language: Language = 'en'
): Trap | null {
	if (!commensurable(stated.unit, 'ly')) return null;
	const matches = otherReadings(stated, result, output)
		.filter(({ unit }) => commensurable(unit, 's'))
		.map((one) => ({ ...one, way: convert(one.value, one.unit, 's') * c.value }))
		.filter(({ way }) => fits(stated, way, 'm'))
		.map(({ key, value, unit }) => ({ key, value, unit, label: labelOf(calculator, key) }));
	const [best] = matches;
	if (!best) return null;
	return {
		code: 'time-as-distance',
		says: `${capital(printStated(stated, language))} is “${best.label}” with light years for years. Space has grown meanwhile, so the distance is another one.`,
		matches
	};
}

/** Numbers of the run but the output’s own; none when the stated number fits that. */
function otherReadings(stated: Stated, result: Result, output: string): Omit<TrapMatch, 'label'>[] {
	const own = result.ok ? result.outputs[output] : undefined;
	if (!result.ok || !own || typeof own.value !== 'number') return [];
	if (standsAsWritten(stated, { ...own, value: own.value })) return [];
	return Object.entries(result.outputs).flatMap(([key, { value, unit, quantity }]) =>
		// The same quantity in another unit is no other thing.
		key === output || typeof value !== 'number' || (quantity === own.quantity && unit !== own.unit)
			? []
			: [{ key, value, unit }]
	);
}

function labelOf(calculator: Calculator, key: string): string {
	return calculator.outputs[key]?.label ?? key;
}

function capital(sentence: string): string {
	return sentence.charAt(0).toUpperCase() + sentence.slice(1);
}
