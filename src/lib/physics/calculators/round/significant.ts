import { defineCalculator, type Computed } from '../../calculator.ts';
import { decimalOf, decimalText, roundToDigits, type Tie } from '../../numerics/decimal.ts';
import {
	numberInput,
	ROUNDING_ASSUMPTIONS,
	ROUNDING_SOURCES,
	roundedOutput,
	tieInput
} from './rules.ts';
import { checksOf } from '../published-checks.ts';

/** A number to so many significant digits, as text. */
export const significant = defineCalculator({
	id: 'round.significant',
	revision: '1.0.0',
	title: 'Round to significant digits',
	purpose: 'How does a number read with so many digits?',
	asks: ['How do I round to three figures?', 'Which way does a five go?'],
	notFor: ['Rounding a number that has been rounded already.'],
	inputs: {
		text: numberInput,
		digits: {
			kind: 'number',
			label: 'Significant digits',
			quantity: 'number',
			unit: '',
			min: 1,
			max: 40,
			whole: true,
			initial: 3
		},
		mode: tieInput
	},
	outputs: { text: roundedOutput },
	equations: [
		{
			tex: '2.345 \\to 2.34 \\quad(\\text{to even}),\\qquad 2.345 \\to 2.35 \\quad(\\text{away from zero})',
			says: 'Only an exact half depends on the rule.'
		}
	],
	assumptions: ROUNDING_ASSUMPTIONS,
	warnings: [],
	sources: ROUNDING_SOURCES,
	checks: checksOf('round.significant'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ text, digits, mode }): Computed {
		const rounded = roundToDigits(decimalOf(text), digits, mode as Tie);
		return { ok: true, values: { text: decimalText(rounded) }, uncertainties: { text: 'exact' } };
	}
});
