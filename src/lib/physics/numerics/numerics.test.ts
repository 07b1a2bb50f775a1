import { describe, expect, test } from 'vitest';
import { GL64, gaussLegendre } from './quadrature.ts';
import { brentRoot, goldenMinimum } from './roots.ts';

describe('Gauss–Legendre', () => {
	test('order 5 has the nodes and weights of Abramowitz & Stegun 1964, table 25.4', () => {
		const rule = gaussLegendre(5).map(({ at, weight }) => [2 * at - 1, 2 * weight]);
		const printed = [
			[-0.906179845938664, 0.236926885056189],
			[-0.538469310105683, 0.478628670499366],
			[0, 0.568888888888889],
			[0.538469310105683, 0.478628670499366],
			[0.906179845938664, 0.236926885056189]
		];
		printed.forEach(([node = NaN, weight = NaN], i) => {
			expect(rule[i]?.[0]).toBeCloseTo(node, 14);
			expect(rule[i]?.[1]).toBeCloseTo(weight, 14);
		});
	});

	test('64 nodes integrate every power up to 127 exactly', () => {
		expect(GL64).toHaveLength(64);
		for (const power of [0, 1, 2, 17, 64, 127]) {
			const sum = GL64.reduce((total, { at, weight }) => total + weight * at ** power, 0);
			expect(sum * (power + 1)).toBeCloseTo(1, 13);
		}
	});
});

describe('roots and minima', () => {
	test.each([
		{ name: 'cos x = x', f: (x: number) => Math.cos(x) - x, a: 0, b: 1, root: 0.7390851332151607 },
		{
			name: 'x³ = 2x + 5',
			f: (x: number) => x ** 3 - 2 * x - 5,
			a: 2,
			b: 3,
			root: 2.0945514815423265
		},
		{ name: 'a flat one', f: (x: number) => (x - 1) ** 9, a: 0, b: 3, root: 1 }
	])('$name', ({ f, a, b, root }) => {
		expect(Math.abs((brentRoot(f, a, b, 1e-14) ?? NaN) - root)).toBeLessThan(1e-10);
	});

	test('no change of sign, no root', () => {
		expect(brentRoot((x) => x * x + 1, -1, 1, 1e-12)).toBeUndefined();
		expect(brentRoot(() => NaN, -1, 1, 1e-12)).toBeUndefined();
	});

	test('the lowest point of a dip', () => {
		expect(goldenMinimum((x) => (x - 0.3) ** 2 - 4, -2, 2, 1e-9).x).toBeCloseTo(0.3, 7);
	});
});
