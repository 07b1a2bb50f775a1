/** What the decay calculators share: times in one unit, stated or not. */
import type { ChoiceInput, NumberInput, Source, UnitSpec, WarningSpec } from '../../calculator.ts';
import { unitOf } from '../../units/units.ts';

/** Nothing is known of the unit but that all times have the same one. */
export const UNSTATED = 'same';
const TIMES = ['s', 'ms', 'µs', 'ns', 'min', 'h', 'd', 'yr', 'kyr', 'Myr', 'Gyr'];

export const timeUnit: UnitSpec = {
	by: 'unit',
	units: Object.fromEntries([UNSTATED, ...TIMES].map((symbol) => [symbol, symbol]))
};

export const unitInput: ChoiceInput = {
	kind: 'choice',
	label: 'Unit of the times',
	options: [
		{ value: UNSTATED, label: 'not stated, the same for all' },
		...TIMES.map((value) => ({ value, label: unitOf(value)?.words.many ?? value }))
	],
	initial: UNSTATED,
	optional: true
};

export function halfLifeInput(initial: number): NumberInput {
	return {
		kind: 'number',
		label: 'Half-life',
		symbol: 'T_½',
		quantity: 'duration',
		unit: timeUnit,
		min: 1e-30,
		max: 1e35,
		initial,
		log: true
	};
}

export const DECAY_SOURCES: Source[] = [
	{
		title: 'Rutherford & Soddy 1902, The cause and nature of radioactivity, Phil. Mag. 4, 370',
		doi: '10.1080/14786440209462856',
		fromMemory: true
	}
];

export const ALMOST_GONE: WarningSpec = {
	code: 'almost-gone',
	message:
		'After ten half-lives less than a thousandth is left, and traces of anything else count for more.',
	when: 'more than 10 half-lives',
	validity: 'approximate'
};
