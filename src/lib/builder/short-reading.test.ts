import { describe, expect, test } from 'vitest';
import { handyUnit, readIn, shortReading } from './short-reading.ts';

const SPACE = '\u00a0';

describe('readings on the bench', () => {
	test('a large or small number takes the unit that gives it one to three digits', () => {
		expect(handyUnit(68_113_258.8, 'Hz')).toBe('MHz');
		expect(handyUnit(4.401e9, 'nm')).toBe('m');
		expect(handyUnit(0.18, 'Gyr')).toBe('Gyr');
		expect(handyUnit(0.0004, 'Gyr')).toBe('kyr');
	});

	test('plain numbers and units without relatives keep their own', () => {
		expect(handyUnit(1e9, '')).toBe('');
		expect(handyUnit(20.85, 'times')).toBe('times');
	});

	test('an exact reading is cut to six figures', () => {
		expect(shortReading({ value: 68_113_258.8032, unit: 'Hz', uncertainty: 'exact' })).toBe(
			`68.1133${SPACE}MHz`
		);
	});

	test('the uncertainty goes along to the other unit', () => {
		expect(readIn({ value: 5e6, unit: 'Hz', uncertainty: 1e4 }, 'MHz')).toEqual({
			value: 5,
			unit: 'MHz',
			uncertainty: 0.01
		});
	});

	test('words stay words', () => {
		expect(shortReading({ value: 'radio', unit: '', uncertainty: 'exact' })).toBe('radio');
	});
});
