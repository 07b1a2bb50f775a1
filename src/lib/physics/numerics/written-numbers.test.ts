import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { decimalOf, decimalText, roundToDigits, roundToPlace } from './decimal.ts';
import { erf } from './erf.ts';

describe('decimals', () => {
	test.each([
		['2.345', '2.345'],
		['-0.00', '0.00'],
		['+.5', '0.5'],
		['12.50e3', '12500'],
		['1.50e-9', '1.50e-9'],
		['007', '7'],
		['-1e22', '-1e22']
	])('%s is written %s', (given, written) => {
		expect(decimalText(decimalOf(given))).toBe(written);
	});

	test('rounding to a place is that of exact arithmetic', () => {
		const halfEven = (scaled: bigint, by: bigint) => {
			const size = scaled < 0n ? -scaled : scaled;
			const twice = (size % by) * 2n;
			const down = size / by;
			const up = twice > by || (twice === by && down % 2n === 1n);
			return (scaled < 0n ? -1n : 1n) * (up ? down + 1n : down);
		};
		fc.assert(
			fc.property(
				fc.bigInt({ min: -(10n ** 18n), max: 10n ** 18n }),
				fc.integer({ min: 1, max: 20 }),
				(scaled, dropped) => {
					const text = `${scaled}e-6`;
					const rounded = roundToPlace(decimalOf(text), dropped - 6, 'half-even');
					const value = BigInt(rounded.digits || '0') * (rounded.isNegative ? -1n : 1n);
					expect(value).toBe(halfEven(scaled, 10n ** BigInt(dropped)));
				}
			),
			{ seed: 82, numRuns: 500 }
		);
	});

	test('agrees with the shortest form of a double where no tie is in play', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 1e-6, max: 1e9, noNaN: true }),
				fc.integer({ min: 1, max: 12 }),
				(value, digits) => {
					const text = decimalText(roundToDigits(decimalOf(String(value)), digits, 'half-away'));
					const off =
						Math.abs(Number(text) - value) / 10 ** (Math.floor(Math.log10(value)) - digits + 1);
					expect(off).toBeLessThanOrEqual(0.5 + 1e-6);
				}
			),
			{ seed: 83, numRuns: 500 }
		);
	});
});

describe('error function', () => {
	// Abramowitz & Stegun 1964, table 7.1, to its ten decimals.
	test.each([
		[0, 0],
		[0.5, 0.5204998778],
		[1, 0.8427007929],
		[1.5, 0.9661051465],
		[2, 0.995322265]
	])('at %d', (x, printed) => {
		expect(erf(x)).toBeCloseTo(printed, 9);
		expect(erf(-x)).toBeCloseTo(-printed, 9);
	});

	test('keeps its digits at both ends, and its two forms meet', () => {
		expect(erf(1e-150) / 1e-150).toBeCloseTo(2 / Math.sqrt(Math.PI), 14);
		expect(erf(2.5) - erf(2.4999999)).toBeCloseTo(
			(2e-7 / Math.sqrt(Math.PI)) * Math.exp(-6.25),
			14
		);
		expect(erf(40)).toBe(1);
	});
});
