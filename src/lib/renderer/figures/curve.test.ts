import { expect, test } from 'vitest';
import { bandOnScale, curvePath, shareOf, tableRows, ticksOn, tickWords, yScale } from './curve.ts';

const line = [
	{ x: 0, y: 46 },
	{ x: 5, y: 90 },
	{ x: 10, y: 134 }
];

test('the upright scale has round ends and holds the line', () => {
	expect(yScale(line)).toEqual({ from: 40, to: 140 });
});

test('a level line still gets a scale, and no points get none', () => {
	const scale = yScale([
		{ x: 0, y: 7 },
		{ x: 1, y: 7 }
	]);
	expect(scale && scale.from < 7 && scale.to > 7).toBe(true);
	expect(yScale([{ x: 0, y: 0 }])).toEqual({ from: -1, to: 1 });
	expect(yScale([{ x: 0, y: null }])).toBeNull();
});

test('a refused reading leaves a gap', () => {
	const path = curvePath(
		[
			{ x: 0, y: 0 },
			{ x: 1, y: null },
			{ x: 2, y: 1 },
			{ x: 4, y: 2 }
		],
		{ from: 0, to: 4 },
		{ from: 0, to: 2 }
	);
	expect(path).toBe('M0.0 1000.0M500.0 500.0L1000.0 0.0');
});

test('a band is cut to the scale, or left out', () => {
	expect(bandOnScale({ from: 87.5, to: 108 }, { from: 40, to: 100 })).toEqual({
		from: 87.5,
		to: 100
	});
	expect(bandOnScale({ from: 200, to: 300 }, { from: 40, to: 100 })).toBeNull();
});

test('the table has both ends and says where there is no reading', () => {
	expect(tableRows(line, 2)).toEqual([
		{ x: '0', y: '46' },
		{ x: '10', y: '134' }
	]);
	expect(tableRows([{ x: 1, y: null }])).toEqual([{ x: '1', y: 'no reading' }]);
});

test('by the logarithm the scale ends on powers of ten, or finer where the line spans little', () => {
	const over = (...values: number[]) =>
		yScale(
			values.map((y, x) => ({ x, y })),
			true
		);
	expect(over(3, 40_000)).toEqual({ from: 1, to: 100_000, log: true });
	expect(over(3, 40)).toEqual({ from: 2, to: 50, log: true });
	expect(over(1, 1)).toEqual({ from: 1, to: 2, log: true });
	expect(over(-1, 0)).toBeNull();
	expect(over(-1, 3)).toEqual({ from: 2, to: 5, log: true });
	expect(shareOf(10, { from: 1, to: 1000, log: true })).toBeCloseTo(1 / 3, 12);
});

test('ticks by the logarithm are round and few', () => {
	expect(ticksOn({ from: 1, to: 1000, log: true }, 5)).toEqual([1, 10, 100, 1000]);
	expect(ticksOn({ from: 2, to: 50, log: true }, 5)).toEqual([2, 5, 10, 20, 50]);
	expect(ticksOn({ from: 1e-30, to: 1e30, log: true }, 5).length).toBeLessThanOrEqual(7);
	expect(ticksOn({ from: 20, to: 50, log: true }, 5)).toEqual([20, 25, 30, 35, 40, 45, 50]);
});

test('what isn’t above nought is a gap on a logarithmic scale', () => {
	const points = [
		{ x: 1, y: 1 },
		{ x: 10, y: 0 },
		{ x: 100, y: 100 }
	];
	expect(curvePath(points, { from: 1, to: 100, log: true }, { from: 1, to: 100, log: true })).toBe(
		'M0.0 1000.0M1000.0 0.0'
	);
});

test('ticks past ten million and under a ten-thousandth are powers of ten', () => {
	expect([0, 1500, 1e9, 2.5e-7, -1e12].map(tickWords)).toEqual([
		'0',
		'1500',
		'10⁹',
		'2.5 × 10⁻⁷',
		'−1 × 10¹²'
	]);
});
