import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { plainDecimal, printNumeral, printStated, roundToFigures } from './stated.ts';

describe('rounding in decimal, half to even (ISO 80000-1:2009 annex B rule A)', () => {
	test.each([
		[13.787, 3, '13.8'],
		[68.1133, 2, '68'],
		[9.96, 2, '10'],
		[0.125, 2, '0.12'],
		[0.135, 2, '0.14'],
		[2.5, 1, '2'],
		[3.5, 1, '4'],
		[-18.564, 2, '-19'],
		[999.96, 4, '1000'],
		[1234567, 2, '1200000'],
		[0.00012345, 3, '0.000123'],
		[1e-7, 2, '0.00000010'],
		[1e21, 1, '1000000000000000000000'],
		[4.4, 2, '4.4'],
		[4, 2, '4.0'],
		[0, 3, '0']
	])('%d to %d figures', (value, figures, expected) => {
		expect(roundToFigures(value, figures)).toBe(expected);
	});

	test('never further than half a unit of the last place', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 1e-12, max: 1e15, noNaN: true }),
				fc.integer({ min: 1, max: 6 }),
				(value, figures) => {
					const place = 10 ** (Math.floor(Math.log10(value)) - figures + 1);
					expect(Math.abs(Number(roundToFigures(value, figures)) - value)).toBeLessThanOrEqual(
						place * (0.5 + 1e-6)
					);
				}
			)
		);
	});
});

test('decimals without exponents', () => {
	expect(plainDecimal(1.5e-9)).toBe('0.0000000015');
	expect(plainDecimal(1420405751.768)).toBe('1420405751.768');
	expect(plainDecimal(6.02e23)).toBe('602000000000000000000000');
});

test('print', () => {
	expect(printNumeral('-19')).toBe('−19');
	expect(printNumeral('17190')).toBe('17\u202f190');
	expect(printNumeral('1420')).toBe('1420');
	expect(
		printStated({ hedge: 'around', hedgeWord: 'about', numeral: '68', scale: 1, unit: 'MHz' })
	).toBe('about 68\u00a0megahertz');
	expect(printStated({ hedge: 'bare', hedgeWord: '', numeral: '180', scale: 1, unit: 'Myr' })).toBe(
		'180\u00a0million years'
	);
	expect(
		printStated({ hedge: 'below', hedgeWord: 'nearly', numeral: '14', scale: 1e9, unit: 'yr' })
	).toBe('nearly 14\u00a0billion years');
});
