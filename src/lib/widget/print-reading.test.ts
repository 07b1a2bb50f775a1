import { describe, expect, test } from 'vitest';
import { printDigits, printReading, printUnit, readingWords } from './print-reading.ts';

const NB = '\u00a0';

describe('printReading', () => {
	test('prints the digits that its uncertainty carries', () => {
		expect(printReading({ value: 6.561661, unit: 'km', uncertainty: 0.00066 })).toEqual({
			value: '6.56166',
			unit: 'km',
			uncertainty: `u${NB}0.00066${NB}km`
		});
		expect(printReading({ value: 13.7866, unit: 'Gyr', uncertainty: 0.02 }).value).toBe('13.787');
	});

	test('prints four figures where the uncertainty isn’t known, and says so', () => {
		expect(printReading({ value: 68.141592, unit: 'MHz', uncertainty: 'not-available' })).toEqual({
			value: '68.14',
			unit: 'MHz',
			uncertainty: 'uncertainty not available'
		});
	});

	test('prints an exact value whole and without idle zeros', () => {
		expect(readingWords({ value: 1420.405751768, unit: 'MHz', uncertainty: 'exact' })).toBe(
			`1420.405751768${NB}MHz`
		);
		expect(readingWords({ value: 1420.405751768, unit: 'MHz', uncertainty: 'exact' }, 6)).toBe(
			`1420.41${NB}MHz`
		);
		expect(readingWords({ value: 6000, unit: 'kg', uncertainty: 'exact' })).toBe(`6000${NB}kg`);
	});

	test('prints a setting as it was typed', () => {
		expect(printReading({ value: 1420405751.768, unit: 'Hz', uncertainty: 'exact' }).value).toBe(
			'1\u202f420\u202f405\u202f751.768'
		);
	});

	test('leaves words as they are', () => {
		expect(printReading({ value: 'X band', unit: '', uncertainty: 'exact' }).value).toBe('X band');
	});
});

test.each([
	['m/s2', 'm/s²'],
	['kg/m3', 'kg/m³'],
	['MHz', 'MHz'],
	['', '']
])('unit %s is printed %s', (symbol, printed) => {
	expect(printUnit(symbol)).toBe(printed);
});

test.each([
	{ value: 1.98892e30, figures: 4, printed: `1.989${NB}×${NB}10³⁰` },
	{ value: -4.2e-9, figures: 2, printed: `−4.2${NB}×${NB}10⁻⁹` },
	{ value: 9.9999e7, figures: 2, printed: `1${NB}×${NB}10⁸` },
	{ value: 0, figures: 4, printed: '0' }
])('$value with $figures figures', ({ value, figures, printed }) => {
	expect(printDigits(value, figures)).toBe(printed);
});
