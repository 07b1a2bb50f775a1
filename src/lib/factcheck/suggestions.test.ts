import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Stated } from '../widget/stated.ts';
import { detectQuantities } from './detect.ts';
import { suggestWordings } from './suggestions.ts';
import { weigh, type WeighedReading } from './weigh.ts';

function statedIn(text: string): Stated {
	const stated = detectQuantities(text, 'en')[0]?.stated;
	if (!stated) throw new Error(`nothing to weigh in “${text}”`);
	return stated;
}

const plain = (texts: string[]) =>
	texts.map((text) => text.replaceAll('\u00a0', ' ').replaceAll('\u202f', ' '));
const exact = (value: number, unit: string): WeighedReading => ({
	value,
	unit,
	uncertainty: 'exact'
});

describe('suggestWordings', () => {
	test.each([
		[
			'more than 15 times',
			exact(20.84, 'times'),
			['about 21 times', 'nearly 21 times', 'more than 20 times']
		],
		[
			'more than 6 kilometres',
			exact(6.562, 'km'),
			['about 6.6 kilometres', 'nearly 7 kilometres', 'more than 6.5 kilometres']
		],
		[
			'about 15 billion years',
			{ value: 13.787, unit: 'Gyr', uncertainty: 0.02 } as const,
			['about 14 billion years', 'nearly 14 billion years', 'more than 13 billion years']
		],
		['5 MHz', exact(68.14e6, 'Hz'), ['about 68 MHz', 'nearly 70 MHz', 'more than 68 MHz']],
		['20% higher', exact(0.252, ''), ['about 25%', 'nearly 26%', 'more than 25%']]
	])('%s', (text, reading, suggestions) => {
		expect(plain(suggestWordings(statedIn(text), reading))).toEqual(suggestions);
	});

	test('the scale word follows the reading: a trillion too many becomes a billion', () => {
		expect(
			plain(suggestWordings(statedIn('nearly 14 trillion years'), exact(13.787, 'Gyr')))[0]
		).toBe('about 14 billion years');
	});

	test('no side is suggested where none is established', () => {
		const reading: WeighedReading = { value: 20.84, unit: 'times', uncertainty: 'not-available' };
		for (const text of suggestWordings(statedIn('15 times'), reading))
			expect(text).not.toMatch(/nearly|more than/);
	});

	test('nothing is suggested for another dimension, for nought, or without a reading', () => {
		expect(suggestWordings(statedIn('3 km'), exact(3, 's'))).toEqual([]);
		expect(suggestWordings(statedIn('3 km'), exact(0, 'km'))).toEqual([]);
		expect(suggestWordings(statedIn('3 km'), exact(NaN, 'km'))).toEqual([]);
	});

	test('every suggestion, read again from its own words, weighs level', () => {
		const reading = fc.record({
			value: fc.double({ min: -1e15, max: 1e15, noNaN: true }),
			unit: fc.constantFrom('km', 'm', 'mm'),
			uncertainty: fc.oneof(
				fc.constant('exact' as const),
				fc.constant('not-available' as const),
				fc.double({ min: 0, max: 1e12, noNaN: true })
			)
		});
		const words = fc.constantFrom(
			'about 14 km',
			'nearly 3 million kilometres',
			'0.5 m',
			'exactly 12.5 mm',
			'half a kilometre',
			'1.5 × 10⁻¹⁸ m'
		);
		fc.assert(
			fc.property(words, reading, (text, read) => {
				const suggestions = suggestWordings(statedIn(text), read);
				expect(suggestions.length).toBeLessThanOrEqual(3);
				expect(new Set(suggestions).size).toBe(suggestions.length);
				for (const suggestion of suggestions) {
					const [found] = detectQuantities(suggestion, 'en');
					expect(found?.surface).toBe(suggestion);
					expect(weigh(statedIn(suggestion), read).verdict, suggestion).toBe('level');
				}
			}),
			{ numRuns: 400 }
		);
	});
});
