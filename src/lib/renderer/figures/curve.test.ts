import { expect, test } from 'vitest';
import { bandOnScale, curvePath, tableRows, yScale } from './curve.ts';

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
