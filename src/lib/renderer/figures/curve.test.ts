import { expect, test } from 'vitest';
import { bandOnScale, curvePath, tableIndices, traceOf } from './curve.ts';

test('a refused reading leaves a gap', () => {
	const points = [
		{ x: 0, y: 0 },
		{ x: 1, y: null },
		{ x: 2, y: 1 },
		{ x: 4, y: 2 }
	];
	const [x, y] = [
		{ from: 0, to: 4 },
		{ from: 0, to: 2 }
	];
	expect(curvePath(points, x, y)).toBe('M0 1000M500 500L1000 0');
	expect(traceOf(points, x, y)).toEqual([
		{ x: 0, y: 1 },
		{ x: 0.25, y: null },
		{ x: 0.5, y: 0.5 },
		{ x: 1, y: 0 }
	]);
});

test('what isn’t above nought is a gap on a logarithmic scale', () => {
	const points = [
		{ x: 1, y: 1 },
		{ x: 10, y: 0 },
		{ x: 100, y: 100 }
	];
	expect(curvePath(points, { from: 1, to: 100, log: true }, { from: 1, to: 100, log: true })).toBe(
		'M0 1000M1000 0'
	);
});

test('a band is cut to the scale, or left out', () => {
	expect(bandOnScale({ from: 87.5, to: 108 }, { from: 40, to: 100 })).toEqual({
		from: 87.5,
		to: 100
	});
	expect(bandOnScale({ from: 200, to: 300 }, { from: 40, to: 100 })).toBeNull();
});

test('the table has both ends', () => {
	expect(tableIndices(81)).toEqual([0, 10, 20, 30, 40, 50, 60, 70, 80]);
	expect(tableIndices(2)).toEqual([0, 1]);
	expect(tableIndices(0)).toEqual([]);
});
