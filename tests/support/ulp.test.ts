import { expect, test } from 'vitest';
import { stepsBetween } from './ulp.ts';

test.each([
	[1, 1, 0],
	[1, 1 + Number.EPSILON, 1],
	[1, 1 - Number.EPSILON / 2, 1],
	[0, -0, 0],
	[-5e-324, 5e-324, 2],
	[-1, -1 - 2 * Number.EPSILON, 2]
])('%d and %d are %d apart', (a, b, steps) => {
	expect(stepsBetween(a, b)).toBe(steps);
});
