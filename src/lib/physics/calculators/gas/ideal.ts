/** What the gas calculators share. */
import type { NumberInput } from '../../calculator.ts';

/** 5/3, that of single atoms, as people write it: nothing real lies above, and a rounded 1.667 is meant for it. */
const GAMMA_MAX = 1.67;

/** Ratio of the two heat capacities: 5/3 for single atoms, about 7/5 for air, 1 at a fixed temperature. */
export function gammaInput(initial: number): NumberInput {
	return {
		kind: 'number',
		label: 'Ratio of heat capacities',
		symbol: 'γ',
		quantity: 'ratio',
		unit: '',
		min: 1,
		max: GAMMA_MAX,
		initial
	};
}

export function gasTemperature(initial: number, max: number): NumberInput {
	return {
		kind: 'number',
		label: 'Temperature',
		symbol: 'T',
		quantity: 'temperature',
		unit: 'K',
		min: 0,
		minExclusive: true,
		max,
		initial,
		log: true
	};
}
