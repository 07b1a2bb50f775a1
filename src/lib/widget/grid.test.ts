import { expect, test } from 'vitest';
import { gridProblem, largestOnGrid, snapToGrid } from './grid.ts';

const ages = { min: 100, max: 500, step: 10 };

test.each([
	{ grid: ages, value: 184, expected: 180 },
	{ grid: ages, value: 185, expected: 190 },
	{ grid: ages, value: -1, expected: 100 },
	{ grid: ages, value: 1e9, expected: 500 },
	{ grid: { min: 0.1, max: 1, step: 0.1 }, value: 0.30000000000000004, expected: 0.3 },
	{ grid: { min: 0.1, max: 1, step: 0.1 }, value: 2, expected: 1 },
	{ grid: { min: -2, max: 2, step: 0.5 }, value: -0.2, expected: 0 },
	{ grid: { min: 1, max: 10, step: 4 }, value: 10, expected: 9 },
	{ grid: { min: 1e-7, max: 5e-7, step: 1e-7 }, value: 3.2e-7, expected: 3e-7 }
])('$value goes to $expected on $grid', ({ grid, value, expected }) => {
	expect(snapToGrid(value, grid)).toBe(expected);
});

test('the end is the last whole step inside the range', () => {
	expect(largestOnGrid({ min: 1, max: 10, step: 4 })).toBe(9);
	expect(largestOnGrid({ min: 0.1, max: 1, step: 0.1 })).toBe(1);
});

test.each([
	[{ min: 0, max: 90, step: 7 }, 0, 'Steps of 7 from 0 lead to 84, not to 90.'],
	[{ min: 0, max: 91, step: 7 }, 45, 'No whole step from 0 leads to 45; the nearest is 42.'],
	[{ min: 0.1, max: 1, step: 0.1 }, 0.3, ''],
	[{ min: 100, max: 500, step: 10 }, 180, '']
])('%j from %d', (grid, initial, problem) => {
	expect(gridProblem(grid, initial)).toBe(problem);
});
