import { describe, expect, test } from 'vitest';
import { constants } from '../constants/index.ts';
import { formulaBook } from './book.ts';
import { NAME } from './tree.ts';

/** The dimensions of the SI's named units that constants are given in (SI Brochure, 9th edition, tables 2 and 4). */
const UNITS: Record<string, Record<string, number>> = {
	m: { m: 1 },
	s: { s: 1 },
	kg: { kg: 1 },
	K: { K: 1 },
	mol: { mol: 1 },
	J: { kg: 1, m: 2, s: -2 },
	W: { kg: 1, m: 2, s: -3 },
	C: { A: 1, s: 1 },
	F: { A: 2, s: 4, kg: -1, m: -2 }
};

/** “m3/(kg s2)”: factors with powers; all that follows the stroke is below it. */
function dimensionOf(unit: string): Record<string, number> {
	const [above = '', below = ''] = unit.split('/');
	const sum: Record<string, number> = {};
	const add = (factors: string, sign: number) => {
		for (const factor of factors.replace(/[()]/g, '').split(' ')) {
			const [, symbol = '', power = '1'] = /^([A-Za-z]+)(\d*)$/.exec(factor) ?? [];
			for (const [base, exponent] of Object.entries(UNITS[symbol] ?? {})) {
				sum[base] = (sum[base] ?? 0) + sign * exponent * Number(power || 1);
			}
		}
	};
	add(above, 1);
	add(below, -1);
	return Object.fromEntries(Object.entries(sum).filter(([, exponent]) => exponent !== 0));
}

describe('the book of constants', () => {
	const published = [
		...Object.values(constants.physical),
		...Object.values(constants.astronomical)
	];

	test('has every constant, under a name that a formula can hold', () => {
		const book = [...formulaBook().values()];
		expect(book.every(({ name }) => NAME.test(name))).toBe(true);
		for (const constant of published) {
			const entry = book.find(({ says }) => says === constant.name);
			expect(entry?.value, constant.name).toBe(constant.value);
			expect(entry?.uncertainty, constant.name).toBe(constant.uncertainty);
		}
	});

	test.each(published.map((constant) => [constant.name, constant.unit] as const))(
		'%s has the dimension of %s',
		(name, unit) => {
			const entry = [...formulaBook().values()].find(({ says }) => says === name);
			expect(entry?.dimension).toEqual(dimensionOf(unit));
		}
	);
});
