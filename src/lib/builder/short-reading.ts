/** A reading as short as the bench needs it: in a unit of handy size, with no more figures than anyone reads. */
import {
	commensurable,
	convert,
	convertDifference,
	unitOf,
	units
} from '../physics/units/units.ts';
import type { Uncertainty } from '../physics/calculator.ts';
import { plainDecimal, roundToFigures } from '../widget/stated.ts';
import { readingWords } from '../widget/print-reading.ts';

export interface NumberRead {
	value: number;
	unit: string;
	uncertainty: Uncertainty;
}

/** Exact readings carry twelve figures elsewhere; on the bench six are enough to tell them apart. */
const FIGURES = 6;

/** The reading in another unit, its uncertainty with it. */
export function readIn({ value, unit, uncertainty }: NumberRead, shown: string): NumberRead {
	return {
		value: convert(value, unit, shown),
		unit: shown,
		uncertainty:
			typeof uncertainty === 'number' ? convertDifference(uncertainty, unit, shown) : uncertainty
	};
}

/** Its own unit if that gives 0.1 to 10 000, else the power-of-ten relative that gives 1 to 1000 (Hz → MHz). */
export function handyUnit(value: number, symbol: string): string {
	const own = unitOf(symbol);
	const size = Math.abs(value);
	if (!own || symbol === '' || size === 0 || (size >= 0.1 && size < 1e4)) return symbol;
	const relative = units.find(
		(unit) =>
			unit.offset === 0 &&
			unit.factor === own.factor &&
			commensurable(unit.symbol, symbol) &&
			inHand(Math.abs(convert(value, symbol, unit.symbol)))
	);
	return relative?.symbol ?? symbol;
}

function inHand(size: number): boolean {
	return size >= 1 && size < 1000;
}

/** “68.1133 MHz”; words of a text reading as they are. */
export function shortReading(reading: {
	value: number | string;
	unit: string;
	uncertainty: Uncertainty;
}): string {
	const { value, unit, uncertainty } = reading;
	if (typeof value === 'string') return value;
	return wordsOf(readIn({ value, unit, uncertainty }, handyUnit(value, unit)));
}

export function wordsOf(read: NumberRead): string {
	if (read.uncertainty !== 'exact') return readingWords(read);
	const value = Number(roundToFigures(read.value, FIGURES));
	return readingWords({ ...read, value: Number(plainDecimal(value)) });
}
