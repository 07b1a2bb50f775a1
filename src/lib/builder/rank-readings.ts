/** Which reading a number most likely speaks of: those it can be compared with, nearest value first. */
import { commensurable, convert } from '../physics/units/units.ts';
import type { BenchReading } from './bench-readings.ts';

export interface RankedReading {
	reading: BenchReading;
	/** The reading in the number's unit. */
	value: number;
	/** The reading's own unit is the number's. */
	sameUnit: boolean;
}

/** How far apart two values are as a factor, on a log scale; signs that differ are as far as can be. */
export function distance(stated: number, read: number): number {
	if (stated === read) return 0;
	if (stated === 0 || read === 0 || Math.sign(stated) !== Math.sign(read)) return Infinity;
	return Math.abs(Math.log(read / stated));
}

/** “times” and “per cent” say what kind of plain number is meant; metres and kilometres are the same kind. */
function saysKind(unit: string): boolean {
	return unit !== '' && commensurable(unit, '');
}

/**
 * Readings in units that can be converted into the number's, ordered by closeness of value. Within a tenth of a per
 * cent two readings are as near as each other; then the one in the number's own unit comes first, then bench order.
 * A plain number with a word to it (“15 times”) looks first among readings with that word.
 */
export function rankReadings(
	stated: { value: number; unit: string },
	readings: readonly BenchReading[]
): RankedReading[] {
	const comparable = readings.flatMap((reading): (RankedReading & { apart: number })[] => {
		const { outcome } = reading;
		if (!outcome.ok || typeof outcome.reading.value !== 'number') return [];
		if (!commensurable(outcome.reading.unit, stated.unit)) return [];
		const value = convert(outcome.reading.value, outcome.reading.unit, stated.unit);
		const sameUnit = outcome.reading.unit === stated.unit;
		return [{ reading, value, sameUnit, apart: Math.round(distance(stated.value, value) * 1000) }];
	});
	return comparable
		.map((entry, index) => ({ entry, index }))
		.sort(
			(a, b) =>
				(saysKind(stated.unit) ? Number(b.entry.sameUnit) - Number(a.entry.sameUnit) : 0) ||
				compare(a.entry.apart, b.entry.apart) ||
				Number(b.entry.sameUnit) - Number(a.entry.sameUnit) ||
				a.index - b.index
		)
		.map(({ entry: { reading, value, sameUnit } }) => ({ reading, value, sameUnit }));
}

/** Infinity − Infinity isn't a number, so no subtraction here. */
function compare(a: number, b: number): number {
	return a < b ? -1 : a > b ? 1 : 0;
}
