import { describe, expect, test } from 'vitest';
import type { Stated } from '../widget/stated.ts';
import { detectQuantities } from './detect.ts';
import { weigh, type WeighedReading } from './weigh.ts';
import { readsInWords, readsOnBeam, verdictSentence, type Audience } from './words.ts';

function statedIn(text: string): Stated {
	const stated = detectQuantities(text, 'en')[0]?.stated;
	if (!stated) throw new Error(`nothing to weigh in “${text}”`);
	return stated;
}

const plain = (text: string) => text.replaceAll('\u00a0', ' ').replaceAll('\u202f', ' ');

function told(text: string, reading: WeighedReading, audience: Audience = 'office'): string {
	const stated = statedIn(text);
	return plain(verdictSentence(stated, reading, weigh(stated, reading), audience));
}

const age: WeighedReading = { value: 13.786, unit: 'Gyr', uncertainty: 0.02 };

describe('verdictSentence', () => {
	test('says what the copy says, what is read, what is allowed, and how it hangs', () => {
		expect(told('nearly 14 billion years', age)).toBe(
			'The copy says nearly 14 billion years. The calculator reads 13.786 ± 0.020 billion years, 1.5 per cent below. Nearly allows up to 5 per cent below. Level.'
		);
	});
	test('readers get plain words', () => {
		expect(told('nearly 14 billion years', age, 'reader')).toMatch(/It fits\.$/);
		expect(told('about 15 billion years', age, 'reader')).toMatch(/It’s a stretch\.$/);
		expect(told('13.7 billion years', age, 'reader')).toMatch(/It’s wrong\.$/);
	});
	test('what isn’t level is told by its reason', () => {
		expect(told('more than 10 billion years', age)).toBe(
			'The copy says more than 10 billion years. The calculator reads 13.786 ± 0.020 billion years, 38 per cent above. True but weak: more than 25 per cent past the bound. Leans.'
		);
	});
	test('another dimension, and no reading', () => {
		expect(told('3 kilograms', { value: 3, unit: 'km', uncertainty: 'exact' })).toBe(
			'The copy says 3 kilograms. The calculator reads 3 kilometres. The reading is a number of kilometres; the copy gives a number of kilograms. Tips.'
		);
		expect(told('3 kilograms', { value: NaN, unit: 'kg', uncertainty: 'exact' })).toBe(
			'The copy says 3 kilograms. No reading. Not weighed.'
		);
	});
	test('keeps the claim’s own words where they are given', () => {
		const stated = statedIn('half a kelvin');
		const reading: WeighedReading = { value: 0.52, unit: 'K', uncertainty: 'exact' };
		expect(
			plain(verdictSentence(stated, reading, weigh(stated, reading), 'office', 'half a kelvin'))
		).toBe(
			'The copy says half a kelvin. The calculator reads 0.52 kelvin, 4 per cent above. A fraction without a hedge allows up to 5 per cent. Level.'
		);
	});
	test('a far reading is told as a multiple, and a negative one by its size', () => {
		expect(told('11 times', { value: 125.641, unit: '', uncertainty: 'exact' })).toContain(
			'about 11 times as much'
		);
		expect(told('about −19 °C', { value: 254.586, unit: 'K', uncertainty: 0.1 })).toContain(
			'−18.56 ± 0.10 °C, 2.3 per cent smaller in size'
		);
	});
	test('“nearly” past 5 per cent says why it is still level', () => {
		expect(told('nearly 0.7', { value: 0.65535, unit: '', uncertainty: 'exact' })).toContain(
			'Nearly allows up to 10 per cent below a number that the reading rounds to. Level.'
		);
	});
});

describe('the reading in words', () => {
	test.each([
		['nearly 14 billion years', age, '13.786 ± 0.020 billion years'],
		['nearly 14 trillion years', age, '13.786 ± 0.020 billion years'],
		[
			'about 68 MHz',
			{ value: 68.14e6, unit: 'Hz', uncertainty: 'not-available' } as const,
			'68.14 MHz'
		],
		[
			'6000 kilograms',
			{ value: 6000, unit: 'kg', uncertainty: 'exact' } as const,
			'6000 kilograms'
		],
		[
			'1420 megahertz',
			{ value: 1420405751.768, unit: 'Hz', uncertainty: 'exact' } as const,
			'1420.41 megahertz'
		],
		[
			'more than 6 kilometres',
			{ value: 6.5616604, unit: 'km', uncertainty: 7e-6 } as const,
			'6.562 kilometres'
		],
		[
			'1 kilogram',
			{ value: 1.989e30, unit: 'kg', uncertainty: 'exact' } as const,
			'1.989 × 10³⁰ kilograms'
		],
		['about 20%', { value: 0.2, unit: '', uncertainty: 'exact' } as const, '20%']
	])('%s', (text, reading, words) => {
		expect(plain(readsInWords(statedIn(text), reading))).toBe(words);
	});
	test('beside the rider it brings its departure', () => {
		expect(plain(readsOnBeam(statedIn('nearly 14 billion years'), age))).toBe(
			'13.786 ± 0.020 billion years, −1.5 %'
		);
	});
});
