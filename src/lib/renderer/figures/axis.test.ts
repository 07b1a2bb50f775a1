import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { axisOf, MARGIN, tickBox, type Axis } from './axis.ts';
import { chartPrint } from './axis-words.ts';
import { spanOver } from './span.ts';

const print = chartPrint('en');

const LENGTH = 190;
const level = (from: number, to: number, unit = '', log = false) =>
	axisOf(log ? { from, to, log } : { from, to }, {
		label: 'q',
		unit,
		length: LENGTH,
		print,
		sayCut: true
	});
const words = ({ ticks }: Axis) => ticks.map((tick) => tick.words);

describe('long numbers are printed short, and the axis says how', () => {
	test('by the unit with another prefix where the table has one', () => {
		const axis = level(0, 13_800_000_000, 'yr');
		expect(axis.name).toBe('q / billion years');
		expect(words(axis)).toEqual(['0', '2', '4', '6', '8', '10', '12']);
		expect(axis.words(13_787_000_000, 4)).toBe('13.79');
		expect(level(0, 1.5e-7, 'm').name).toBe('q / nanometres');
	});

	test('by a power of ten where it hasn’t', () => {
		const axis = level(0, 6e24, 'kg');
		expect(axis.name).toBe('q / 10²⁴\u00a0kilograms');
		expect(axis.notes).toContain('1 on the axis is 10²⁴\u00a0kilograms');
		expect(words(axis)).toEqual(['0', '1', '2', '3', '4', '5', '6']);
		expect(axis.words(5.9722e24, 3)).toBe('5.97');
	});

	test('from another number where only the last digits differ', () => {
		const axis = level(1_420_405_750, 1_420_405_753, 'Hz');
		expect(axis.notes).toEqual(['counted from 1\u202f420\u202f405\u202f750\u00a0hertz']);
		expect(words(axis)[0]).toBe('0');
		expect(axis.words(1_420_405_751.768, 3)).toBe('1\u202f420\u202f405\u202f751.768');
		expect(axis.differenceWords(0.25, 2)).toBe('0.25');
	});

	test('ones that can be read are left as they are', () => {
		expect(level(0, 140, 'MHz').name).toBe('q / megahertz');
		expect(level(0, 150_000, 'km').name).toBe('q / kilometres');
		expect(words(level(0, 0.05))).toContain('0.02');
	});
});

describe('the kind of the axis is said', () => {
	test('a linear one that doesn’t start at zero', () => {
		expect(level(40, 140).notes).toEqual(['axis starts at 40']);
		expect(level(40, 140).cut).toBe(true);
		expect(level(0, 140).notes).toEqual([]);
		expect(level(-5, 140).cut).toBe(false);
	});

	test('a logarithmic one, by what a step is', () => {
		expect(level(1, 1000, '', true).step).toBe('each step is ten times');
		expect(level(1e-30, 1e30, '', true).step).toMatch(/^each step is 10.+ times$/);
		expect(level(2, 50, '', true).step).toBe('equal distances are equal factors');
	});
});

const size = fc
	.tuple(fc.double({ min: 1, max: 10, noNaN: true }), fc.integer({ min: -30, max: 30 }))
	.map(([lead, power]) => lead * 10 ** power);
const anySpan = fc.record({
	a: size,
	b: size,
	signs: fc.constantFrom([1, 1], [-1, 1], [-1, -1]),
	log: fc.boolean(),
	zero: fc.boolean(),
	unit: fc.constantFrom('', 'm', 'yr', 'Hz', 'kg', 'J', '%', 'km/s'),
	length: fc.integer({ min: 140, max: 700 })
});

test('ticks never touch, run out or say the same, over sixty decades', () => {
	fc.assert(
		fc.property(anySpan, ({ a, b, signs, log, zero, unit, length }) => {
			const values = log ? [a, b] : [a * signs[0]!, b * signs[1]!];
			const span = spanOver(values, { log, zero })!;
			const { ticks } = axisOf(span, { label: 'q', unit, print, length });
			expect(ticks.length).toBeGreaterThanOrEqual(2);
			expect(new Set(ticks.map((tick) => tick.words)).size).toBe(ticks.length);
			const amiss = ticks.filter((tick, index) => {
				const [left, right] = tickBox(tick, length);
				const next = ticks[index + 1];
				const touches = next && tickBox(next, length)[0] <= right;
				return left < -MARGIN || right > length + MARGIN || touches;
			});
			expect(amiss).toEqual([]);
		}),
		{ numRuns: 1500 }
	);
}, 20_000);

test('a tick’s words, with the axis’s power and start, give back its number', () => {
	fc.assert(
		fc.property(anySpan, ({ a, b, signs, zero }) => {
			const span = spanOver([a * signs[0]!, b * signs[1]!], { zero })!;
			const axis = axisOf(span, { label: 'q', unit: '', print, length: 300, upright: true });
			const power = /10([⁰¹²³⁴⁵⁶⁷⁸⁹⁻]+)/.exec(axis.name)?.[1] ?? '⁰';
			const from = axis.notes.find((note) => note.startsWith('counted from'));
			const base = from ? plain(from.replace('counted from ', '')) : 0;
			for (const { at, words: said } of axis.ticks) {
				const read = plain(said) * Number(`1e${lowered(power)}`) + base;
				expect(Math.abs(read - at)).toBeLessThanOrEqual(
					Math.max(Math.abs(at), span.to - span.from) * 1e-9
				);
			}
		}),
		{ numRuns: 1000 }
	);
});

const lowered = (text: string) =>
	[...text]
		.map((sign) => '⁰¹²³⁴⁵⁶⁷⁸⁹⁻'.indexOf(sign))
		.map((at) => (at === 10 ? '-' : at))
		.join('');
const plain = (text: string) => Number(text.replace(/[\u202f\u00a0]/g, '').replace('−', '-'));
