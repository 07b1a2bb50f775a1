import type { NumberInput } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';

export const STANDARD_GRAVITY = constants.physical.g_0.value;

/** The pull of gravity as an input; left out, it is the standard one of the Earth. */
export const gravityInput: NumberInput = {
	kind: 'number',
	label: 'Pull of gravity',
	symbol: 'g',
	quantity: 'acceleration',
	unit: 'm/s2',
	min: 0,
	minExclusive: true,
	max: 1000,
	initial: STANDARD_GRAVITY,
	optional: true
};
