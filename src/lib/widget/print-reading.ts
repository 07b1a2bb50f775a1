/**
 * A reading as the office reads it, with more digits than copy has: as many as its uncertainty carries, four
 * significant figures where nobody knows it, and where it is exact as many as the place has room for.
 */
import type { Reading, Uncertainty } from '../physics/calculator.ts';
import { plainDecimal, printNumeral, roundToFigures, superscript } from './stated.ts';

export interface PrintedReading {
	/** The value alone: “68.14”, “1.989 × 10³⁰”, or the words of a text reading. */
	value: string;
	/** The unit's symbol as printed: “m/s²”; '' for a pure number. */
	unit: string;
	/** “u 0.04 MHz”, “exact”, “uncertainty not available”; '' for words. */
	uncertainty: string;
}

const UNKNOWN_FIGURES = 4;
/** A setting is shown whole: twelve hide the binary dust of a conversion, and nothing here is known better. */
const WHOLE_FIGURES = 12;
/** A setting as it was typed, “1 420 405 751.768”, stands as it is up to this many characters. */
const LONGEST_WHOLE = 15;
/** Enough of an exact output to weigh copy by. */
export const OUTPUT_FIGURES = 6;
const NO_BREAK = '\u00a0';

export function printReading(
	reading: Pick<Reading, 'value' | 'unit' | 'uncertainty'>,
	exactFigures = WHOLE_FIGURES
): PrintedReading {
	const { value, unit, uncertainty } = reading;
	if (typeof value === 'string') return { value, unit: '', uncertainty: '' };
	const whole = plainDecimal(value);
	const fits =
		uncertainty === 'exact' && exactFigures === WHOLE_FIGURES && whole.length <= LONGEST_WHOLE;
	return {
		value: fits
			? printNumeral(whole)
			: printDigits(value, figuresFor(value, uncertainty, exactFigures), uncertainty === 'exact'),
		unit: printUnit(unit),
		uncertainty: uncertaintyWords(uncertainty, printUnit(unit))
	};
}

/** Value and unit in one string. */
export function readingWords(
	reading: Pick<Reading, 'value' | 'unit' | 'uncertainty'>,
	exactFigures = WHOLE_FIGURES
): string {
	const { value, unit } = printReading(reading, exactFigures);
	return unit ? value + NO_BREAK + unit : value;
}

/** A unit's symbol with its powers raised: m/s2 is the table's, m/s² the reader's. */
export function printUnit(symbol: string): string {
	return symbol.replace(/(?<=[a-zA-Z])-?\d+/g, (power) => superscript(Number(power)));
}

/** A number with so many significant figures: plain from 0.0001 to ten million, else with a power of ten. */
export function printDigits(value: number, figures: number, isExact = false): string {
	const rounded = roundToFigures(value, figures);
	const numeral = isExact ? withoutIdleZeros(rounded) : rounded;
	const size = Math.abs(Number(numeral));
	if (size === 0 || (size >= 1e-4 && size < 1e7)) return printNumeral(numeral);
	// The shortest digits of the rounded number, so that no division brings binary dust.
	const [mantissa = '0', exponent = '0'] = size.toExponential().split('e');
	return `${printNumeral((value < 0 ? '-' : '') + mantissa)}${NO_BREAK}×${NO_BREAK}10${superscript(Number(exponent))}`;
}

/** The last place printed is the second significant one of the uncertainty. */
function figuresFor(value: number, uncertainty: Uncertainty, exactFigures: number): number {
	if (uncertainty === 'exact') return exactFigures;
	if (typeof uncertainty !== 'number') return UNKNOWN_FIGURES;
	if (uncertainty === 0 || value === 0) return UNKNOWN_FIGURES;
	const places = decade(value) - decade(uncertainty) + 2;
	return Math.min(WHOLE_FIGURES, Math.max(2, places));
}

const decade = (value: number) => Number(value.toExponential().split('e')[1]);

function uncertaintyWords(uncertainty: Uncertainty, unit: string): string {
	if (uncertainty === 'exact') return 'exact';
	if (uncertainty === 'not-available') return 'uncertainty not available';
	const size = printDigits(uncertainty, 2);
	return `u${NO_BREAK}${unit ? size + NO_BREAK + unit : size}`;
}

/** An exact 6000 isn't “6000.00000000”. */
function withoutIdleZeros(numeral: string): string {
	return numeral.includes('.') ? numeral.replace(/\.?0+$/, '') : numeral;
}
