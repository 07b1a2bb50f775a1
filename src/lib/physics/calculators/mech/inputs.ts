/** Inputs that the calculators of motion share. */
import type { NumberInput } from '../../calculator.ts';

export function massInput(label: string, symbol: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'mass',
		unit: 'kg',
		min: 0,
		minExclusive: true,
		max: 1e30,
		initial,
		log: true
	};
}

export function heightInput(label: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol: 'h',
		quantity: 'height',
		unit: 'm',
		min: 0,
		max: 1e4,
		initial
	};
}
