import { describe, expect, test } from 'vitest';
import type { BenchReading } from './bench-readings.ts';
import { distance, rankReadings } from './rank-readings.ts';

function reading(tag: string, value: number | string, unit: string): BenchReading {
	return {
		ref: { step: 'step-1', output: tag },
		tag,
		label: tag,
		where: 'bench',
		outcome: {
			ok: true,
			reading: { value, unit, quantity: 'number', uncertainty: 'not-available' }
		}
	};
}

const tags = (stated: { value: number; unit: string }, readings: BenchReading[]) =>
	rankReadings(stated, readings).map(({ reading: { tag } }) => tag);

describe('readings for a number', () => {
	test('only units that convert are offered', () => {
		const bench = [reading('A', 19.8, ''), reading('B', 68.1, 'MHz'), reading('C', 4.4, 'm')];
		expect(tags({ value: 68, unit: 'MHz' }, bench)).toEqual(['B']);
		expect(tags({ value: 21, unit: '' }, bench)).toEqual(['A']);
	});

	test('the nearest value comes first, whatever its unit', () => {
		const bench = [reading('A', 1420.405751768, 'MHz'), reading('B', 68.1e6, 'Hz')];
		expect(tags({ value: 68, unit: 'MHz' }, bench)).toEqual(['B', 'A']);
		expect(tags({ value: 1420, unit: 'MHz' }, bench)).toEqual(['A', 'B']);
	});

	test('the value is given in the number’s unit', () => {
		const [first] = rankReadings({ value: 68, unit: 'MHz' }, [reading('A', 68.1e6, 'Hz')]);
		expect(first?.value).toBeCloseTo(68.1, 12);
		expect(first?.sameUnit).toBe(false);
	});

	test('between equal values the number’s own unit wins, then the order on the bench', () => {
		const bench = [reading('A', 68e6, 'Hz'), reading('B', 68, 'MHz'), reading('C', 68, 'MHz')];
		expect(tags({ value: 68, unit: 'MHz' }, bench)).toEqual(['B', 'C', 'A']);
	});

	test('“15 times” looks first among readings in times', () => {
		const bench = [reading('A', 19.85, ''), reading('B', 20.85, 'times')];
		expect(tags({ value: 15, unit: 'times' }, bench)).toEqual(['B', 'A']);
		expect(tags({ value: 15, unit: '' }, bench)).toEqual(['A', 'B']);
	});

	test('words and refusals are left out', () => {
		const refused: BenchReading = {
			...reading('R', 0, ''),
			outcome: { ok: false, refusal: { code: 'x', message: 'No.' } }
		};
		expect(tags({ value: 1, unit: '' }, [reading('A', 'radio', ''), refused])).toEqual([]);
	});

	test('zero and opposite signs come last, not first', () => {
		const bench = [reading('A', 0, ''), reading('B', -21, ''), reading('C', 30, '')];
		expect(tags({ value: 21, unit: '' }, bench)).toEqual(['C', 'A', 'B']);
		expect(distance(0, 0)).toBe(0);
		expect(distance(10, 1)).toBeCloseTo(distance(1, 10), 12);
	});
});
