import { defineCalculator, type Computed } from '../../calculator.ts';
import { decimalOf, decimalText, roundToPlace, type Tie } from '../../numerics/decimal.ts';
import {
	numberInput,
	ROUNDING_ASSUMPTIONS,
	ROUNDING_SOURCES,
	roundedOutput,
	tieInput
} from './rules.ts';
import { checksOf } from '../published-checks.ts';

/** A number to so many decimals, as text; −2 decimals are whole hundreds. */
export const decimals = defineCalculator({
	id: 'round.decimals',
	revision: '1.0.0',
	title: 'Round to decimals',
	purpose: 'How does a number read with so many decimals?',
	asks: ['How do I round to two decimals?', 'How do I round to whole hundreds?'],
	notFor: ['Rounding a number that has been rounded already.'],
	inputs: {
		text: { ...numberInput, initial: '0.125' },
		decimals: {
			kind: 'number',
			label: 'Decimals',
			quantity: 'number',
			unit: '',
			min: -20,
			max: 40,
			whole: true,
			initial: 2
		},
		mode: tieInput
	},
	outputs: { text: roundedOutput },
	equations: [
		{
			tex: '0.125 \\to 0.12 \\quad(\\text{to even}),\\qquad 0.125 \\to 0.13 \\quad(\\text{away from zero})',
			says: 'Only an exact half depends on the rule.'
		}
	],
	assumptions: ROUNDING_ASSUMPTIONS,
	warnings: [],
	sources: ROUNDING_SOURCES,
	checks: checksOf('round.decimals'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ text, decimals: places, mode }): Computed {
		const rounded = roundToPlace(decimalOf(text), -places, mode as Tie);
		return { ok: true, values: { text: decimalText(rounded) }, uncertainties: { text: 'exact' } };
	}
});
