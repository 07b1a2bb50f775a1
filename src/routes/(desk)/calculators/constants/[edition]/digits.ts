import type { Constant } from '$lib/physics/constants/index.ts';
import {
	decimalOf,
	decimalText,
	leadingPower,
	roundToDigits,
	roundToPlace,
	type Decimal
} from '$lib/physics/numerics/decimal.ts';
import { printDigits } from '$lib/widget/print-reading.ts';

/** More than any constant of ours has, and few enough to hide the dust of binary fractions. */
const ALL_FIGURES = 16;
/** Between the groups of three digits that the SI Brochure asks for. */
const NARROW = '\u202f';

/** A value with every digit it has. */
export function exactDigits(value: number): string {
	return printDigits(value, ALL_FIGURES, true);
}

/**
 * A constant with its standard uncertainty in the last digits, as tables of constants print it: 6.674 30(15) × 10⁻¹¹.
 * Every digit where it is exact.
 */
export function conciseDigits({ value, uncertainty }: Pick<Constant, 'value' | 'uncertainty'>) {
	if (uncertainty === 'exact') return exactDigits(value);
	const spread = roundToDigits(decimalOf(String(uncertainty)), 2, 'half-even');
	const rounded = roundToPlace(decimalOf(String(value)), spread.exponent, 'half-even');
	const lead = leadingPower(rounded);
	const isPlain = lead >= -4 && lead < 9;
	const power = isPlain ? '' : printDigits(Number(`1e${lead}`), 1, true).slice(1);
	return `${grouped(isPlain ? rounded : shifted(rounded, lead))}(${spread.digits})${power}`;
}

/** A share, or a count of uncertainties, with its sign. */
export function signed(value: number, figures = 2): string {
	return `${value > 0 ? '+' : ''}${printDigits(value, figures)}`;
}

function shifted(value: Decimal, places: number): Decimal {
	return { ...value, exponent: value.exponent - places };
}

/** In groups of three from the point; four digits at an end stay together. */
function grouped(value: Decimal): string {
	const [whole = '', fraction = ''] = decimalText(value).split('.');
	const left = whole.replace(/\B(?=(\d{3})+$)/g, NARROW);
	const right = fraction.replace(/(\d{3})(?=\d{2})/g, `$1${NARROW}`);
	return fraction ? `${left}.${right}` : left;
}
