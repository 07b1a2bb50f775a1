/** Units: look-up, conversion, and a hint for a symbol that is nearly right. Symbols are case-sensitive: mHz is not MHz. */
import type { QuantityKind } from './quantities.ts';
import { UNIT_TABLE, type BaseDimension, type Dimension, type UnitRow } from './table.ts';

export type { Dimension } from './table.ts';

export interface Unit {
	symbol: string;
	dimension: Dimension;
	/** One of this unit in coherent SI units (for °C and °F: one degree in kelvin). */
	toSI: number;
	/** `toSI` as significand and power of ten, so that prefixes convert without rounding. */
	factor: number;
	decade: number;
	/** SI value = (value + offset) × toSI; 0 for all but °C and °F. */
	offset: number;
	/** What is printed after a numeral: “1 metre”, “2 metres”. */
	words: { one: string; many: string };
	/** What a screen reader says after a numeral. */
	spoken: string;
	/** Every English name, singular and plural, in both spellings. Scale words (“million years”) are left out. */
	names: readonly string[];
	/** Other ways to write the symbol: m s⁻¹ for m/s. */
	symbols: readonly string[];
	/** Where the factor is defined, for units outside the SI. */
	source?: string;
}

const SCALED = /^(thousand|million|billion) /;

function namesOf(row: UnitRow): string[] {
	const given = [row.one, row.many, ...(row.also ?? [])].filter(
		(name) => name && !SCALED.test(name)
	);
	const per = given.map((name) =>
		name.replace(/ an? (?=second|hour|cubic|megaparsec|arcsecond|kiloparsec)/g, ' per ')
	);
	const spelled = [...given, ...per].flatMap((name) => [name, name.replace(/metre/g, 'meter')]);
	return [...new Set(spelled)];
}

function unitFrom(row: UnitRow): Unit {
	return Object.freeze({
		symbol: row.symbol,
		dimension: row.dimension,
		toSI: scaleByTen(row.factor, row.decade),
		factor: row.factor,
		decade: row.decade,
		offset: row.offset ?? 0,
		words: { one: row.one, many: row.many },
		spoken: row.spoken ?? row.many,
		names: namesOf(row),
		symbols: row.symbols ?? [],
		...(row.source ? { source: row.source } : {})
	});
}

const POWERS_OF_TEN: readonly number[] = Array.from({ length: 64 }, (_, decades) => 10 ** decades);

/** Every unit, in the order of the table. */
export const units: readonly Unit[] = UNIT_TABLE.map(unitFrom);

const bySymbol = new Map<string, Unit>();
for (const unit of units)
	for (const symbol of [unit.symbol, ...unit.symbols]) bySymbol.set(symbol, unit);

const byName = new Map<string, Unit>();
for (const unit of units) {
	for (const name of unit.names)
		if (!byName.has(name.toLowerCase())) byName.set(name.toLowerCase(), unit);
}

/** The unit with this symbol, or undefined. Case matters. */
export function unitOf(symbol: string): Unit | undefined {
	return bySymbol.get(symbol);
}

/** The unit with this English name (“metres per second”); case doesn't matter for names. */
export function unitNamed(name: string): Unit | undefined {
	return byName.get(name.trim().toLowerCase().replace(/\s+/g, ' '));
}

/** True when a value in one unit can be stated in the other. False for a symbol that isn't in the table. */
export function commensurable(from: string, to: string): boolean {
	const a = unitOf(from);
	const b = unitOf(to);
	return a !== undefined && b !== undefined && sameDimension(a.dimension, b.dimension);
}

/**
 * Converts a value, temperatures with their zero points.
 * @throws {RangeError} for a symbol that isn't in the table, or units of different dimensions.
 */
export function convert(value: number, from: string, to: string): number {
	if (from === to && unitOf(from)) return value;
	const [a, b] = pair(from, to);
	if (a.offset === 0 && b.offset === 0) return scale(value, a, b);
	// Adding the zero points in one step keeps 0 °C = 273.15 K free of rounding.
	return scale(value + a.offset, a, b) - b.offset;
}

/**
 * Converts a difference or a standard uncertainty: by scale alone, without the zero point of a temperature.
 * @throws {RangeError} as `convert` does.
 */
export function convertDifference(value: number, from: string, to: string): number {
	if (from === to && unitOf(from)) return value;
	return scale(value, ...pair(from, to));
}

/** A unit that was probably meant: another case, a name, or one letter off. Undefined when nothing is near. */
export function suggestUnit(text: string): Unit | undefined {
	const wanted = text.trim();
	if (wanted === '') return undefined;
	const lower = wanted.toLowerCase();
	const named = unitNamed(wanted);
	if (named) return named;
	const known = [...bySymbol.keys()].filter((symbol) => symbol !== '');
	const otherCase = known.find((symbol) => symbol.toLowerCase() === lower);
	if (otherCase) return bySymbol.get(otherCase);
	const near = [...known, ...byName.keys()].find(
		(candidate) => candidate.length > 2 && isOneEditAway(candidate.toLowerCase(), lower)
	);
	return near === undefined ? undefined : (bySymbol.get(near) ?? byName.get(near));
}

function pair(from: string, to: string): [Unit, Unit] {
	const a = unitOf(from);
	const b = unitOf(to);
	if (!a || !b) throw new RangeError(`There is no unit “${a ? to : from}” in the table.`);
	if (!sameDimension(a.dimension, b.dimension)) {
		throw new RangeError(
			`${a.symbol || 'A pure number'} can't be stated in ${b.symbol || 'a pure number'}.`
		);
	}
	return [a, b];
}

function scale(value: number, from: Unit, to: Unit): number {
	const decades = from.decade - to.decade;
	if (from.factor === to.factor) return scaleByTen(value, decades);
	return scaleByTen((value * from.factor) / to.factor, decades);
}

/** value × 10^decades; divides for negative powers, since 10⁻³ is no double and 10³ is. */
function scaleByTen(value: number, decades: number): number {
	return decades >= 0 ? value * powerOfTen(decades) : value / powerOfTen(-decades);
}

/** Raising to a power takes longer than all the rest of a conversion. */
function powerOfTen(decades: number): number {
	return POWERS_OF_TEN[decades] ?? 10 ** decades;
}

function sameDimension(a: Dimension, b: Dimension): boolean {
	return a === b || (isWithin(a, b) && isWithin(b, a));
}

/** Whether every base of one dimension has the same power in the other. */
function isWithin(one: Dimension, other: Dimension): boolean {
	for (const base in one) {
		if ((one[base as BaseDimension] ?? 0) !== (other[base as BaseDimension] ?? 0)) return false;
	}
	return true;
}

/** One letter added, dropped or changed, or two neighbours swapped. */
function isOneEditAway(a: string, b: string): boolean {
	if (a === b || Math.abs(a.length - b.length) > 1) return false;
	let start = 0;
	while (start < a.length && a[start] === b[start]) start += 1;
	let end = 0;
	while (end < Math.min(a.length, b.length) - start && a.at(-1 - end) === b.at(-1 - end)) end += 1;
	const restA = a.slice(start, a.length - end);
	const restB = b.slice(start, b.length - end);
	if (restA.length <= 1 && restB.length <= 1) return true;
	return restA.length === 2 && restB.length === 2 && restA[0] === restB[1] && restA[1] === restB[0];
}

/** Converts a value of a kind: a temperature difference has no zero point to shift. Throws as `convert` does. */
export function convertQuantity(
	value: number,
	from: string,
	to: string,
	quantity: QuantityKind
): number {
	return (quantity === 'temperature-difference' ? convertDifference : convert)(value, from, to);
}
