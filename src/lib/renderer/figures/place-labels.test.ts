import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
	BESIDE,
	boxAt,
	crosses,
	overlaps,
	placeBeside,
	raiseFlags,
	spreadAlong,
	type Box,
	type Flag,
	type RaisedFlag
} from './place-labels.ts';
import { textWidth, wrapText } from './text-size.ts';

describe('labels along a line', () => {
	test('stay where they belong while there is room', () => {
		expect(
			spreadAlong(
				[
					{ at: 20, size: 10 },
					{ at: 60, size: 10 }
				],
				100
			)
		).toEqual([20, 60]);
	});

	test('part evenly where they would touch', () => {
		expect(
			spreadAlong(
				[
					{ at: 50, size: 20 },
					{ at: 50, size: 20 }
				],
				100
			)
		).toEqual([40, 60]);
	});

	test('never touch and never leave', () => {
		const items = fc.array(
			fc.record({
				at: fc.double({ min: 0, max: 400, noNaN: true }),
				size: fc.double({ min: 1, max: 24, noNaN: true })
			}),
			{ minLength: 1, maxLength: 16 }
		);
		fc.assert(
			fc.property(items, (unsorted) => {
				const sorted = [...unsorted].sort((a, b) => a.at - b.at);
				const middles = spreadAlong(sorted, 400);
				expect(middles).toHaveLength(sorted.length);
				middles.forEach((middle, index) => {
					const half = sorted[index]!.size / 2;
					expect(middle - half).toBeGreaterThanOrEqual(-1e-6);
					expect(middle + half).toBeLessThanOrEqual(400 + 1e-6);
					const next = middles[index + 1];
					if (next !== undefined)
						expect(next - middle).toBeGreaterThanOrEqual(half + sorted[index + 1]!.size / 2 - 1e-6);
				});
			})
		);
	});
});

describe('flags over a line', () => {
	const LENGTH = 216;
	const flags = fc.array(
		fc.record({
			share: fc.oneof(fc.double({ min: 0, max: 1, noNaN: true }), fc.constantFrom(0, 0.25, 0.5, 1)),
			width: fc.integer({ min: 6, max: LENGTH / 2 - BESIDE - 2 }),
			height: fc.constantFrom(30, 45, 60)
		}),
		{ minLength: 1, maxLength: 16 }
	);

	const partsAt = (flag: Flag, raised: RaisedFlag, length: number): { words: Box; stem: Box } => {
		const x = flag.share * length;
		const [near, far] = [raised.lift, raised.lift + flag.height];
		const [top, bottom] = raised.below ? [near, far] : [-far, -near];
		const left = raised.side === 'start' ? x + BESIDE : x - BESIDE - flag.width;
		return {
			words: { left, right: left + flag.width, top, bottom },
			stem: raised.below
				? { left: x, right: x, top: 0, bottom: far }
				: { left: x, right: x, top: -far, bottom: 0 }
		};
	};

	test('no words touch others, another stem or an edge, at any width from the narrowest on', () => {
		fc.assert(
			fc.property(flags, fc.constantFrom(1, 1.3, 2, 3.4), (given, times) => {
				const raised = raiseFlags(given, LENGTH);
				const parts = given.map((flag, index) => partsAt(flag, raised[index]!, LENGTH * times));
				const amiss = parts.filter(
					({ words }, index) =>
						words.left < 0 ||
						words.right > LENGTH * times ||
						parts.some(
							(other, otherIndex) =>
								otherIndex !== index &&
								(overlaps(words, other.words) || overlaps(words, other.stem))
						)
				);
				expect(amiss).toEqual([]);
			}),
			{ numRuns: 1000 }
		);
	});
});

describe('words beside a point', () => {
	const plots = [
		{ width: 200, height: 150 },
		{ width: 430, height: 150 }
	];
	const smooth = fc
		.tuple(
			fc.double({ min: 0.2, max: 2, noNaN: true }),
			fc.double({ min: 0, max: 6, noNaN: true }),
			fc.double({ min: -1, max: 1, noNaN: true })
		)
		.map(([waves, phase, slope]) =>
			Array.from({ length: 81 }, (_, index) => {
				const x = index / 80;
				const y = 0.5 + 0.25 * Math.sin(waves * 6.28 * x + phase) + 0.4 * slope * (x - 0.5);
				return { x, y: Math.min(1, Math.max(0, y)) };
			})
		);

	test('lie on no line and inside the plot', () => {
		let placed = 0;
		const runs = 500;
		fc.assert(
			fc.property(smooth, fc.integer({ min: 0, max: 80 }), (trace, at) => {
				const spot = placeBeside(trace[at]!, '68.1 MHz', 13, plots, [trace]);
				if (!spot) return;
				placed += 1;
				for (const plot of plots) {
					const box = boxAt(trace[at]!, spot, textWidth('68.1 MHz', 13), plot);
					expect(box.left).toBeGreaterThanOrEqual(0);
					expect(box.right).toBeLessThanOrEqual(plot.width);
					expect(box.bottom).toBeLessThanOrEqual(plot.height);
					const inside = trace.filter(
						({ x, y }) =>
							x * plot.width > box.left &&
							x * plot.width < box.right &&
							y * plot.height > box.top &&
							y * plot.height < box.bottom
					);
					expect(inside).toEqual([]);
				}
			}),
			{ numRuns: runs }
		);
		// Elsewhere the words stand under the chart.
		expect(placed).toBeGreaterThan(runs * 0.9);
	});

	test('a line through a box is found, whichever way it runs', () => {
		const box = { left: 10, right: 20, top: 10, bottom: 20 };
		const plot = { width: 100, height: 100 };
		const line = (...ends: [number, number][]) =>
			crosses(
				ends.map(([x, y]) => ({ x: x / 100, y: y / 100 })),
				box,
				plot,
				0
			);
		expect(line([0, 0], [30, 30])).toBe(true);
		expect(line([0, 15], [30, 15])).toBe(true);
		expect(line([15, 0], [15, 30])).toBe(true);
		expect(line([0, 0], [30, 5])).toBe(false);
		expect(line([0, 25], [12, 40])).toBe(false);
	});
});

test('words are broken to the width, and too long ones anywhere', () => {
	expect(wrapText('First galaxies large enough', 90, 12)).toEqual([
		'First galaxies',
		'large enough'
	]);
	const lines = wrapText('Donaudampfschifffahrtsgesellschaft', 80, 12);
	expect(lines.join('')).toBe('Donaudampfschifffahrtsgesellschaft');
	for (const line of lines) expect(textWidth(line, 12)).toBeLessThanOrEqual(80);
});
