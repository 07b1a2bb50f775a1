/** Where a house calculator's numbers pass between the units of its card and the coherent SI units of its formulas. */
import type { QuantityKind } from '../units/quantities.ts';
import { unitOf, type Unit } from '../units/units.ts';

/** A difference of temperatures has no zero point. */
function zeroPoint(unit: Unit, quantity: QuantityKind): number {
	return quantity === 'temperature-difference' ? 0 : unit.offset;
}

/** @throws {RangeError} for a unit that isn't in the table. */
export function intoSI(symbol: string, quantity: QuantityKind): (value: number) => number {
	const unit = known(symbol);
	const offset = zeroPoint(unit, quantity);
	return (value) => scaleByTen((value + offset) * unit.factor, unit.decade);
}

/** @throws {RangeError} for a unit that isn't in the table. */
export function outOfSI(symbol: string, quantity: QuantityKind): (value: number) => number {
	const unit = known(symbol);
	const offset = zeroPoint(unit, quantity);
	return (value) => scaleByTen(value / unit.factor, -unit.decade) - offset;
}

function known(symbol: string): Unit {
	const unit = unitOf(symbol);
	if (!unit) throw new RangeError(`There is no unit “${symbol}” in the table.`);
	return unit;
}

/** Divides for negative powers, since 10⁻³ is no double and 10³ is. */
function scaleByTen(value: number, decades: number): number {
	return decades >= 0 ? value * 10 ** decades : value / 10 ** -decades;
}
