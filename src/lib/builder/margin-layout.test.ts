import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { placeNotes, type WantedPlace } from './margin-layout.ts';

const note = (key: string, wanted: number, height = 100): WantedPlace => ({ key, wanted, height });

describe('notes in the margin', () => {
	test('each stands at its line where there is room', () => {
		const tops = placeNotes([note('a', 0), note('b', 200)], null);
		expect([...tops]).toEqual([
			['a', 0],
			['b', 200]
		]);
	});

	test('a crowd is pushed down', () => {
		const tops = placeNotes([note('a', 0), note('b', 20), note('c', 40)], null, 10);
		expect(tops).toEqual(
			new Map([
				['a', 0],
				['b', 110],
				['c', 220]
			])
		);
	});

	test('the focused note stands exactly at its line, those above make room', () => {
		const tops = placeNotes([note('a', 100), note('b', 120), note('c', 140)], 'b', 10);
		expect(Object.fromEntries(tops)).toEqual({ a: 10, b: 120, c: 230 });
	});

	test('what finds no room above the focused note goes below it', () => {
		const tops = placeNotes([note('a', 0), note('b', 20), note('c', 40)], 'b', 10);
		expect(Object.fromEntries(tops)).toEqual({ b: 20, a: 130, c: 240 });
	});

	test('notes never overlap, and the focused one is at its line', () => {
		const notes = fc
			.array(fc.tuple(fc.nat(600), fc.integer({ min: 20, max: 200 })), {
				minLength: 1,
				maxLength: 12
			})
			.map((pairs) =>
				pairs
					.sort((a, b) => a[0] - b[0])
					.map(([wanted, height], index) => note(String(index), wanted, height))
			);
		fc.assert(
			fc.property(notes, fc.nat(11), (wanted, pick) => {
				const focused = wanted[pick]?.key ?? null;
				const tops = placeNotes(wanted, focused);
				if (focused) expect(tops.get(focused)).toBe(wanted[pick]?.wanted);
				const placed = wanted
					.map(({ key, height }) => ({ top: tops.get(key) as number, height }))
					.sort((a, b) => a.top - b.top);
				expect(placed).toHaveLength(wanted.length);
				placed.slice(1).forEach(({ top }, index) => {
					const above = placed[index] as { top: number; height: number };
					expect(top).toBeGreaterThanOrEqual(above.top + above.height);
				});
			})
		);
	});
});
