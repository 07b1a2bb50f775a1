import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import {
	decimalOf,
	decimalText,
	isZero,
	leadingPower,
	roundToDigits,
	roundToPlace,
	type Decimal,
	type Tie
} from '../../numerics/decimal.ts';
import { gum } from '../unc/sources.ts';
import {
	numberInput,
	ROUNDING_ASSUMPTIONS,
	ROUNDING_SOURCES,
	roundedOutput,
	tieInput
} from './rules.ts';
import { checksOf } from '../published-checks.ts';

/**
 * A value and its uncertainty in the concise form, 13.787(20): the uncertainty to one or two digits, the value to the same
 * place. Refuses an uncertainty of 0 and below.
 */
export const withUncertainty = defineCalculator({
	id: 'round.with_uncertainty',
	revision: '1.0.0',
	title: 'Value with its uncertainty, in short',
	purpose: 'How are a value and its uncertainty written, with the digits that mean something?',
	asks: ['What does 13.787(20) mean?', 'How many digits may I print?'],
	notFor: ['Uncertainties that differ up and down.'],
	inputs: {
		x: { ...numberInput, label: 'Value as computed', symbol: 'x', initial: '13.78688' },
		u: {
			...numberInput,
			label: 'Standard uncertainty as computed',
			symbol: 'u',
			initial: '0.0203'
		},
		digits: {
			kind: 'number',
			label: 'Digits of the uncertainty',
			quantity: 'number',
			unit: '',
			min: 1,
			max: 2,
			whole: true,
			initial: 2,
			optional: true,
			absent: 'one digit, or two where the first is 1 or 2'
		},
		mode: tieInput
	},
	outputs: { text: { ...roundedOutput, label: 'In short' } },
	equations: [
		{
			tex: '13.787(20) = 13.787 \\pm 0.020',
			says: 'The digits in brackets stand under the last digits of the value.'
		}
	],
	assumptions: [
		'The house rule, unless the digits are given: two digits where the uncertainty begins with 1 or 2, one from 3 on.',
		'The uncertainty is a standard one, not a range.',
		...ROUNDING_ASSUMPTIONS
	],
	warnings: [],
	sources: [gum('7.2.2 and 7.2.6'), ...ROUNDING_SOURCES],
	checks: checksOf('round.with_uncertainty'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ x, u, digits, mode }): Computed {
		const value = decimalOf(x);
		const spread = decimalOf(u);
		if (spread.isNegative || isZero(spread)) {
			return refuse(
				'no-uncertainty',
				'The uncertainty must be more than 0. Without one, round to significant digits instead.',
				'u'
			);
		}
		const count = digits ?? ('12'.includes(spread.digits[0] ?? '') ? 2 : 1);
		const text = concise(value, roundToDigits(spread, count, mode as Tie), mode as Tie);
		return { ok: true, values: { text }, uncertainties: { text: 'exact' } };
	}
});

function concise(value: Decimal, spread: Decimal, tie: Tie): string {
	const rounded = roundToPlace(value, spread.exponent, tie);
	const lead = Math.max(leadingPower(rounded), leadingPower(spread));
	if (lead < -7 || lead > 20) {
		const shifted = (one: Decimal) => ({ ...one, exponent: one.exponent - lead });
		return `${bracketed(shifted(rounded), shifted(spread))}e${lead}`;
	}
	return bracketed(rounded, spread);
}

/** Behind a point the bare digits, unless the uncertainty has a point itself; before it the number in full. */
function bracketed(rounded: Decimal, spread: Decimal): string {
	const inBrackets =
		spread.exponent < 0 && leadingPower(spread) < 0 ? spread.digits : decimalText(spread);
	return `${decimalText(rounded)}(${inBrackets})`;
}
