/** What the rules look at: a stated value and a reading in the claim's own unit, as exact decimals. */
import { commensurable, convert, convertDifference } from '../physics/units/units.ts';
import type { Uncertainty } from '../physics/calculator.ts';
import type { Stated } from '../widget/stated.ts';
import { bands } from './bands.ts';
import {
	add,
	compare,
	decimalOf,
	decimalOfText,
	divide,
	firstPlace,
	multiply,
	powerOfTen,
	signOf,
	size,
	subtract,
	toNumber,
	ZERO,
	type Decimal
} from './decimal.ts';

export interface WeighedReading {
	/** NaN and the infinities are no reading, and are never weighed. */
	value: number;
	/** A symbol of the unit table; '' for a plain number. */
	unit: string;
	/** Standard uncertainty in `unit`. */
	uncertainty: Uncertainty;
	/** Compared only where the claim's words name a kind too. */
	quantity?: string;
	/** A maximum over a stated range, as “up to” needs. */
	maximum?: boolean;
	/** A calculator's word that the reading lies on one side, though it carries no uncertainty. */
	directionEstablished?: boolean;
}

export interface Weighing {
	stated: Stated;
	reading: WeighedReading;
	/** Stated value. */
	v: Decimal;
	/** Reading in the claim's unit. */
	x: Decimal;
	/** Standard uncertainty in the claim's unit; null when not available. */
	u: Decimal | null;
	/** One unit of the last place written; null for fraction words, which have none. */
	lastPlace: Decimal | null;
	/** Significant figures written. */
	figures: number;
	/** How far the reading lies past the stated number; by size when both are negative. */
	past: Decimal;
}

/** Lays both on the arm; the units must be commensurable. */
export function prepare(stated: Stated, reading: WeighedReading): Weighing {
	const v = valueOf(stated);
	const u = uncertaintyIn(reading, stated.unit);
	const x = decimalOf(inUnit(reading, stated.unit));
	return {
		stated,
		reading,
		v,
		x,
		u: u === null ? null : decimalOf(u),
		lastPlace: stated.fraction ? null : lastPlaceOf(stated),
		figures: stated.fraction ? 0 : figuresOf(stated.numeral),
		past: bothNegative(v, x) ? subtract(size(x), size(v)) : subtract(x, v)
	};
}

/** Whether two units measure the same thing. A unit the table doesn't know matches only itself. */
export function sameDimension(from: string, to: string): boolean {
	return from === to || commensurable(from, to);
}

/** The reading's value in another unit; a difference of temperatures keeps clear of the scales' zero points. */
export function inUnit({ value, unit, quantity }: WeighedReading, wanted: string): number {
	if (unit === wanted) return value;
	const turn = quantity === 'temperature-difference' ? convertDifference : convert;
	return turn(value, unit, wanted);
}

/** Standard uncertainty in another unit; null when not available. */
export function uncertaintyIn(
	{ uncertainty, unit }: WeighedReading,
	wanted: string
): number | null {
	if (uncertainty === 'exact') return 0;
	if (uncertainty === 'not-available' || !Number.isFinite(uncertainty)) return null;
	return Math.abs(unit === wanted ? uncertainty : convertDifference(uncertainty, unit, wanted));
}

function valueOf(stated: Stated): Decimal {
	const [over, under] = stated.fraction ?? [];
	const number =
		over !== undefined && under !== undefined
			? divide(decimalOf(over), decimalOf(under))
			: decimalOfText(stated.numeral);
	return multiply(number, decimalOf(stated.scale));
}

/** The trailing zeros of a whole number are no figures: “100” has one, “1.0” has two. */
function figuresOf(numeral: string): number {
	const digits = numeral.replace(/^-?[0.]*/, '');
	return (numeral.includes('.') ? digits.replace('.', '') : digits.replace(/0+$/, '')).length;
}

function lastPlaceOf({ numeral, scale }: Stated): Decimal {
	const [whole = '', fraction] = numeral.split('.');
	const zeros = /[1-9]/.test(whole) ? (/0*$/.exec(whole)?.[0].length ?? 0) : 0;
	return multiply(powerOfTen(fraction === undefined ? zeros : -fraction.length), decimalOf(scale));
}

export function bothNegative(v: Decimal, x: Decimal): boolean {
	return signOf(v) < 0 && signOf(x) < 0;
}

/** (x − v)/|v| in per cent, signed; null where the copy says nought. */
export function departurePercent({ v, x }: Weighing): number | null {
	if (signOf(v) === 0) return signOf(x) === 0 ? 0 : null;
	const fraction = divide(subtract(x, v), size(v));
	return toNumber(multiply(fraction, powerOfTen(2)));
}

/** |x − v| against a share of the stated number: −1 nearer, 0 exactly there, 1 farther. */
export function compareDistance({ v, x }: Weighing, percent: number): number {
	const distance = multiply(size(subtract(x, v)), decimalOf(100));
	return compare(distance, multiply(size(v), decimalOf(percent)));
}

export function isWithin(w: Weighing, percent: number): boolean {
	return compareDistance(w, percent) <= 0;
}

/**
 * The stated number is the reading rounded at the last place written; a half may go either way. Fraction words have no
 * last place, so they answer null.
 */
export function isRounding(w: Weighing): boolean | null {
	return w.lastPlace && isNear(w, 0.5);
}

/** |x − v| is at most this many last places. */
export function isNear({ v, x, lastPlace }: Weighing, places: number): boolean {
	if (!lastPlace) return false;
	return compare(size(subtract(x, v)), multiply(lastPlace, decimalOf(places))) <= 0;
}

/** The last place written is finer than the second significant digit of the uncertainty. */
export function hasIdleDigits({ u, lastPlace }: Weighing): boolean {
	if (!u || signOf(u) === 0 || !lastPlace) return false;
	return compare(lastPlace, powerOfTen(firstPlace(u) - 1)) < 0;
}

export type Clearance = 'clear' | 'within-uncertainty' | 'unknown';

/** Whether the reading stays on its side of the stated number at two standard uncertainties. */
export function clearance({ past, u, reading }: Weighing, mayTouch = false): Clearance {
	if (!u) return reading.directionEstablished ? 'clear' : 'unknown';
	if (signOf(u) === 0) return 'clear';
	const spare = compare(size(past), multiply(u, decimalOf(bands.clearance)));
	return spare > 0 || (mayTouch && spare === 0) ? 'clear' : 'within-uncertainty';
}

/** Nought in the copy fits a reading that can't be told from nought, or rounds to it at the place written. */
export function isNought(w: Weighing): boolean {
	const reach = multiply(w.u ?? ZERO, decimalOf(bands.clearance));
	return compare(size(w.x), reach) <= 0 || isRounding(w) === true;
}

/** The far end of reading plus one standard uncertainty passes the stated number. */
export function reachesPast({ past, u }: Weighing): boolean {
	return signOf(add(past, u ?? ZERO)) > 0;
}
