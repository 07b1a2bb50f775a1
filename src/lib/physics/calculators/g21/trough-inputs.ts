/** Inputs and output that the shapes of a trough share. */
import type { NumberInput, OutputSpec } from '../../calculator.ts';

export function megahertz(
	label: string,
	symbol: string,
	initial: number,
	quantity: NumberInput['quantity'] = 'frequency'
): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity,
		unit: 'MHz',
		min: 0,
		minExclusive: true,
		max: 1e4,
		initial
	};
}

export function amplitude(initial: number): NumberInput {
	return {
		kind: 'number',
		label: 'Depth of the trough',
		symbol: 'A',
		quantity: 'temperature-difference',
		unit: 'K',
		min: 0,
		max: 1000,
		initial
	};
}

export const profile: OutputSpec = {
	label: 'Brightness against the background',
	symbol: 'T',
	quantity: 'temperature-difference',
	unit: 'K'
};
