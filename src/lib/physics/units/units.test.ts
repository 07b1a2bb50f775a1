import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { QUANTITY_KINDS } from './quantities.ts';
import {
	commensurable,
	convert,
	convertDifference,
	suggestUnit,
	unitNamed,
	unitOf,
	units
} from './units.ts';

describe('the table', () => {
	test('no symbol or other writing of one stands for two units', () => {
		const seen = new Set<string>();
		for (const unit of units) {
			for (const symbol of [unit.symbol, ...unit.symbols]) {
				expect(seen.has(symbol), symbol).toBe(false);
				seen.add(symbol);
			}
		}
	});

	test('a unit outside the SI says where its factor comes from', () => {
		const coherent =
			/^(|times|%|ppm|[kMGTcmµn]?(m|s|Hz|g|J|W|Wh|K|N|Pa)|kg|rad|m\/s2?|km\/s|km\/h|kg\/m3|m3|mag)$/;
		for (const unit of units) {
			if (!coherent.test(unit.symbol)) expect(unit.source, unit.symbol).toBeTruthy();
		}
	});

	test('every kind of quantity has a unit of the table, and is confused only with kinds that exist', () => {
		for (const [kind, row] of Object.entries(QUANTITY_KINDS)) {
			expect(unitOf(row.unit), kind).toBeDefined();
			for (const other of 'mistakenFor' in row ? row.mistakenFor : []) {
				expect(Object.keys(QUANTITY_KINDS)).toContain(other);
			}
		}
	});

	test('a name means one dimension, in both spellings', () => {
		expect(unitNamed('metres per second')?.symbol).toBe('m/s');
		expect(unitNamed('Meters a second')?.symbol).toBe('m/s');
		expect(unitNamed('light-years')?.symbol).toBe('ly');
		expect(unitOf('Myr')?.names).not.toContain('million years');
		expect(unitOf('Myr')?.words.many).toBe('million years');
	});
});

describe('conversion', () => {
	test.each([
		// SI Brochure, 9th edition; IAU 2012 B2, 2015 B2; NIST SP 811 B.8. Each exact to the digits given.
		{ value: 1, from: 'kWh', to: 'J', is: 3.6e6 },
		{ value: 1, from: 'tTNT', to: 'J', is: 4.184e9 },
		{ value: 1, from: 'au', to: 'm', is: 149_597_870_700 },
		{ value: 1, from: 'ly', to: 'm', is: 9_460_730_472_580_800 },
		{ value: 0.07, from: 'GHz', to: 'MHz', is: 70 },
		{ value: 72, from: 'km/h', to: 'm/s', is: 20 },
		{ value: 0, from: '°C', to: 'K', is: 273.15 },
		{ value: 100, from: '°C', to: '°F', is: 212 },
		{ value: 2, from: 'kJ', to: 'J', is: 2000 },
		{ value: 0.25, from: '', to: '%', is: 25 },
		{ value: 3, from: 'times', to: '', is: 3 },
		{ value: 180, from: 'deg', to: 'rad', is: Math.PI },
		{ value: 1, from: 'Btu_IT', to: 'J', is: 1055.05585262 }
	])('$value $from is $is $to', ({ value, from, to, is }) => {
		expect(convert(value, from, to)).toBeCloseTo(is, 9);
		expect(Math.abs(convert(value, from, to) - is)).toBeLessThanOrEqual(1e-14 * is);
	});

	test('a parsec is 3.26156 light years, as every astronomy text prints', () => {
		expect(convert(1, 'pc', 'ly')).toBeCloseTo(3.26156, 5);
	});

	test('a hartree is 27.211 386 245 988 eV (CODATA 2018)', () => {
		expect(convert(1, 'hartree', 'eV')).toBeCloseTo(27.211386245988, 12);
	});

	test('there and back again changes nothing beyond the last bits', () => {
		const pairs = units.flatMap((a) =>
			units.filter((b) => commensurable(a.symbol, b.symbol)).map((b) => [a, b] as const)
		);
		fc.assert(
			fc.property(
				fc.constantFrom(...pairs),
				fc.double({ min: -1e6, max: 1e6, noNaN: true }),
				([a, b], drawn) => {
					const value = Math.abs(drawn) < 1e-9 ? 0 : drawn; // subnormal numbers lose bits by nature
					const back = convert(convert(value, a.symbol, b.symbol), b.symbol, a.symbol);
					const zeroPoint = Math.max(Math.abs(a.offset), Math.abs(b.offset));
					expect(Math.abs(back - value)).toBeLessThanOrEqual(
						1e-14 * (Math.abs(value) + zeroPoint * 2) + Number.MIN_VALUE
					);
				}
			),
			{ seed: 811, numRuns: 2000 }
		);
	});

	test('a unit to itself gives the very same number', () => {
		expect(convert(0.1 + 0.2, '°F', '°F')).toBe(0.1 + 0.2);
	});

	test('a difference of temperatures has no zero point', () => {
		expect(convertDifference(10, '°C', 'K')).toBe(10);
		expect(convertDifference(9, '°F', '°C')).toBeCloseTo(5, 12);
	});

	test.each([
		['kg', 'm'],
		['deg', '%'],
		['mag', ''],
		['W', 'J'],
		['furlong', 'm'],
		['m', 'constructor'],
		['furlong', 'furlong']
	])('%s to %s is refused', (from, to) => {
		expect(() => convert(1, from, to)).toThrow(RangeError);
		expect(commensurable(from, to)).toBe(false);
	});
});

describe('a near miss', () => {
	test.each([
		['mHz', 'MHz'],
		['Mev', 'MeV'],
		['KM', 'km'],
		['Kpc', 'kpc'],
		['kilometers', 'km'],
		['lightyear', 'ly'],
		['kilomter', 'km']
	])('%s suggests %s', (typed, meant) => {
		expect(unitOf(typed)).toBeUndefined();
		expect(suggestUnit(typed)?.symbol).toBe(meant);
	});

	test.each(['', 'zzzz', 'quux per blorb'])('“%s” suggests nothing', (typed) => {
		expect(suggestUnit(typed)).toBeUndefined();
	});
});
