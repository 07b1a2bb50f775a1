/**
 * A reading as the office reads it, with more digits than copy has: as many as its uncertainty carries, all of them
 * where it is exact, four significant figures where nobody knows.
 */
import type { Reading, Uncertainty } from '../physics/calculator.ts';
import { printNumeral, roundToFigures } from './stated.ts';

export interface PrintedReading {
	/** The value alone: “68.14”, “1.989 × 10³⁰”, or the words of a text reading. */
	value: string;
	/** A symbol of the unit table; '' for a pure number. */
	unit: string;
	/** “u 0.04 MHz”, “exact”, “uncertainty not available”; '' for words. */
	uncertainty: string;
}

const UNKNOWN_FIGURES = 4;
/** Twelve hide the binary dust of a conversion, and nothing here is known better. */
const EXACT_FIGURES = 12;
const NO_BREAK = '\u00a0';

export function printReading(reading: Pick<Reading, 'value' | 'unit' | 'uncertainty'>): PrintedReading {
	const { value, unit, uncertainty } = reading;
	if (typeof value === 'string') return { value, unit: '', uncertainty: '' };
	return {
		value: printDigits(value, figuresFor(value, uncertainty)),
		unit,
		uncertainty: uncertaintyWords(uncertainty, unit)
	};
}

/** Value and unit in one string. */
export function readingWords(reading: Pick<Reading, 'value' | 'unit' | 'uncertainty'>): string {
	const { value, unit } = printReading(reading);
	return unit ? value + NO_BREAK + unit : value;
}

/** A number with so many significant figures: plain from 0.0001 to ten million, else with a power of ten. */
export function printDigits(value: number, figures: number): string {
	const numeral = withoutIdleZeros(roundToFigures(value, figures), figures);
	const size = Math.abs(Number(numeral));
	if (size === 0 || (size >= 1e-4 && size < 1e7)) return printNumeral(numeral);
	// The shortest digits of the rounded number, so that no division brings binary dust.
	const [mantissa = '0', exponent = '0'] = size.toExponential().split('e');
	return `${printNumeral((value < 0 ? '-' : '') + mantissa)}${NO_BREAK}×${NO_BREAK}10${superscript(Number(exponent))}`;
}

/** The last place printed is the second significant one of the uncertainty. */
function figuresFor(value: number, uncertainty: Uncertainty): number {
	if (uncertainty === 'exact') return EXACT_FIGURES;
	if (typeof uncertainty !== 'number') return UNKNOWN_FIGURES;
	if (uncertainty === 0 || value === 0) return UNKNOWN_FIGURES;
	const places = decade(value) - decade(uncertainty) + 2;
	return Math.min(EXACT_FIGURES, Math.max(2, places));
}

const decade = (value: number) => Number(value.toExponential().split('e')[1]);

function uncertaintyWords(uncertainty: Uncertainty, unit: string): string {
	if (uncertainty === 'exact') return 'exact';
	if (uncertainty === 'not-available') return 'uncertainty not available';
	const size = printDigits(uncertainty, 2);
	return `u${NO_BREAK}${unit ? size + NO_BREAK + unit : size}`;
}

/** An exact 6000 isn't “6000.00000000”. */
function withoutIdleZeros(numeral: string, figures: number): string {
	return figures === EXACT_FIGURES && numeral.includes('.') ? numeral.replace(/\.?0+$/, '') : numeral;
}

function superscript(exponent: number): string {
	const digits = '⁰¹²³⁴⁵⁶⁷⁸⁹';
	const sign = exponent < 0 ? '⁻' : '';
	return sign + [...String(Math.abs(exponent))].map((digit) => digits[Number(digit)]).join('');
}
