import { describe, expect, test } from 'vitest';
import { generatorFrom, generatorOf } from './generator.ts';

// From state 1, 2, 3, 4, as the reference implementation of Blackman & Vigna and public ports of it give them.
test('xoshiro128** gives the published sequence', () => {
	const generator = generatorOf([1, 2, 3, 4]);
	expect(Array.from({ length: 10 }, () => generator.next32())).toEqual([
		11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597,
		4258142804
	]);
});

test('the same text gives the same numbers, a text one letter away others', () => {
	const some = (seed: string) => {
		const generator = generatorFrom(seed);
		return Array.from({ length: 50 }, () => generator.next32());
	};
	expect(some('age 13.787')).toEqual(some('age 13.787'));
	const one = some('age 13.787');
	const other = some('age 13.786');
	expect(one.filter((value, index) => value === other[index])).toEqual([]);
	expect(some('')).toEqual(some(''));
});

describe('the numbers are spread as they should be', () => {
	const N = 100_000;

	test('even ones: mean 1/2, variance 1/12, none outside [0, 1)', () => {
		const generator = generatorFrom('even');
		const sample = Array.from({ length: N }, generator.even);
		expect(Math.min(...sample.slice(0, 1000))).toBeGreaterThanOrEqual(0);
		expect(sample.every((value) => value >= 0 && value < 1)).toBe(true);
		const mean = sample.reduce((sum, value) => sum + value, 0) / N;
		expect(Math.abs(mean - 0.5)).toBeLessThan(5 * Math.sqrt(1 / 12 / N));
	});

	test('normal ones: mean 0, standard deviation 1, the shares of the normal table', () => {
		const generator = generatorFrom('normal');
		const sample = Array.from({ length: N }, generator.normal);
		const mean = sample.reduce((sum, value) => sum + value, 0) / N;
		const deviation = Math.sqrt(sample.reduce((sum, value) => sum + value * value, 0) / N);
		expect(Math.abs(mean)).toBeLessThan(5 / Math.sqrt(N));
		expect(Math.abs(deviation - 1)).toBeLessThan(5 / Math.sqrt(2 * N));
		// erf(k/√2): 0.682689 and 0.954500, from any table of the normal distribution.
		for (const [k, share] of [
			[1, 0.682689],
			[2, 0.9545]
		] as const) {
			const inside = sample.filter((value) => Math.abs(value) < k).length / N;
			expect(Math.abs(inside - share)).toBeLessThan(5 * Math.sqrt((share * (1 - share)) / N));
		}
	});
});
