/** Each form as the server draws it: what is drawn is true, what can't be is said, and the table holds every number. */
import fc from 'fast-check';
import { render } from 'svelte/server';
import { describe, expect, test } from 'vitest';
import type { Drawn } from '../../widget/chart-data.ts';
import { chartPrint } from './axis-words.ts';
import type { LedgerFigure } from './figure-parts.ts';
import type { ItemAxis } from './item-table.ts';
import LedgerChart from './LedgerChart.svelte';
import { ledgerModel as ledgerIn } from './ledger-model.ts';
import LineChart from './LineChart.svelte';
import { lineModel as lineIn, type LineInput } from './line-model.ts';
import RowChart from './RowChart.svelte';
import { rowModel as rowsIn } from './row-model.ts';
import ShapeChart from './ShapeChart.svelte';
import { shapeModel as shapesIn } from './shape-model.ts';
import StemChart from './StemChart.svelte';
import { stemModel as stemsIn } from './stem-model.ts';
import TimelineChart from './TimelineChart.svelte';

const item = (label: string, value: number | null, more: Partial<Drawn> = {}): Drawn => ({
	id: label.toLowerCase().replace(/\W+/g, '-'),
	label,
	value,
	uncertainty: null,
	refusal: value === null ? 'The stone is too light.' : '',
	figures: 3,
	...more
});
const print = chartPrint('en');
const lineModel = (input: LineInput) => lineIn(input, print);
const ledgerModel = (axis: LedgerFigure['axis'], columns: LedgerFigure['columns']) =>
	ledgerIn(axis, columns, print);
const rowModel = (form: 'bars' | 'dots', axis: ItemAxis, items: readonly Drawn[]) =>
	rowsIn(form, axis, items, print);
const shapeModel = (shows: 'area' | 'width', axis: ItemAxis, items: readonly Drawn[]) =>
	shapesIn(shows, axis, items, print);
const stemModel = (form: 'number-line' | 'spectrum', axis: ItemAxis, items: readonly Drawn[]) =>
	stemsIn(form, axis, items, print);
const words = { title: 'A chart', source: 'A table', description: 'It rises from one to nine.' };
const length = { label: 'length', unit: 'm', log: false };

const plain = (html: string) => html.replace(/<!--.*?-->/gs, '');
const textOf = (html: string) =>
	html
		.replace(/<[^>]+>/g, ' ')
		.replace(/\s+/g, ' ')
		.trim();
const cellsOf = (html: string) =>
	[...html.matchAll(/<(?:td|th scope="row")[^>]*>(.*?)<\/t[dh]>/gs)].map((cell) =>
		textOf(cell[1]!)
	);
const drawingOf = (html: string) =>
	html.slice(html.indexOf('role="img"'), html.indexOf('sy-chart-foot'));
const number = (text: string) => Number(text.replace('%', ''));

describe('every form', () => {
	const things = [item('Mouse', 0.1), item('Person', 1.75, { uncertainty: 0.2 }), item('House', 9)];
	const line: LineInput['series'] = [
		{
			id: 'a',
			label: 'first',
			points: [1, 2, 3, 4].map((x) => ({ x, y: x * x })),
			now: { value: 4, uncertainty: null, words: '4\u00a0m' }
		}
	];
	const forms: [string, { body: string }, string[]][] = [
		[
			'line',
			render(LineChart, {
				props: {
					...words,
					x: { label: 'time', unit: 's', from: 1, to: 4, log: false },
					y: { label: 'height', unit: 'm', log: false, zero: true },
					series: line,
					at: 2
				}
			}),
			['As set now: 2', '4 m', '1', '16']
		],
		[
			'bars',
			render(RowChart, {
				props: { ...words, form: 'bars', shows: 'area', axis: length, items: things }
			}),
			['0.1', '1.75', '0.2', '9']
		],
		[
			'dots',
			render(RowChart, {
				props: { ...words, form: 'dots', shows: 'area', axis: length, items: things }
			}),
			['0.1', '1.75', '0.2', '9']
		],
		[
			'number-line',
			render(StemChart, {
				props: { ...words, form: 'number-line', shows: 'area', axis: length, items: things }
			}),
			['0.1', '1.75', '0.2', '9']
		],
		[
			'spectrum',
			render(StemChart, {
				props: { ...words, form: 'spectrum', shows: 'area', axis: length, items: things }
			}),
			['0.1', '1.75', '0.2', '9']
		],
		[
			'timeline',
			render(TimelineChart, {
				props: { ...words, form: 'timeline', shows: 'area', axis: length, items: things }
			}),
			['0.1', '1.75', '0.2', '9']
		],
		[
			'shapes',
			render(ShapeChart, {
				props: { ...words, form: 'shapes', shows: 'width', axis: length, items: things }
			}),
			['0.1', '1.75', '9']
		],
		[
			'ledger',
			render(LedgerChart, {
				props: {
					...words,
					axis: { label: 'energy', unit: 'kJ' },
					columns: [
						{ id: 'out', label: 'Out', parts: [item('Height', 7.06), item('Speed', 463.66)] }
					]
				}
			}),
			['7.1', '463.7', '470.7']
		]
	];

	test.each(forms)(
		'%s has its words and a table with every number drawn',
		(_form, { body }, wanted) => {
			const html = plain(body);
			expect(html).toContain('aria-label="A chart"');
			const described = /aria-describedby="([^"]+)"/.exec(html)?.[1];
			expect(html).toMatch(new RegExp(`id="${described}"[^>]*>It rises from one to nine.`));
			expect(textOf(html)).toContain('Source: A table');
			expect(html).toMatch(/<th scope="col"[^>]*>[^<]*(?:metres|kilojoules)/);
			expect(cellsOf(html)).toEqual(expect.arrayContaining(wanted));
			// The frame's policy takes no style attributes.
			expect(html).not.toContain('style="');

			const cells = cellsOf(html).join(' ');
			const printed = [...drawingOf(html).matchAll(/<(?:text|b)\b([^>]*)>(.*?)<\/(?:text|b)>/gs)]
				.filter(([, attributes]) => /reads|value|^$/.test(attributes!))
				.map(([, , inner]) => textOf(inner!))
				.filter((text) => /^[−\d]/.test(text));
			expect(printed.length).toBeGreaterThan(0);
			for (const text of printed) expect(cells).toContain(text);
		}
	);
});

describe('bars', () => {
	test('stand on zero and are as long as their numbers', () => {
		const values = fc.array(
			fc
				.tuple(
					fc.double({ min: 1, max: 10, noNaN: true }),
					fc.integer({ min: -3, max: 3 }),
					fc.boolean()
				)
				.map(([lead, power, below]) => (below ? -1 : 1) * lead * 10 ** power),
			{ minLength: 1, maxLength: 8 }
		);
		fc.assert(
			fc.property(values, (given) => {
				const model = rowModel(
					'bars',
					{ ...length, log: true },
					given.map((value, index) => item(`Thing ${index}`, value))
				)!;
				expect(model.axis.span.log).toBeUndefined();
				expect(model.axis.span.from <= 0 && model.axis.span.to >= 0).toBe(true);
				const most = Math.max(...given.map(Math.abs));
				const longest = Math.max(...model.rows.map(({ share }) => Math.abs(share! - model.zero)));
				model.rows.forEach(({ share }, index) => {
					const ratio = Math.abs(share! - model.zero) / longest;
					expect(ratio).toBeCloseTo(Math.abs(given[index]!) / most, 6);
				});
			})
		);
	});

	test('negative ones go to the left of zero', () => {
		const { body } = render(RowChart, {
			props: {
				...words,
				form: 'bars',
				shows: 'area',
				axis: length,
				items: [item('Down', -5), item('Up', 10)]
			}
		});
		const [down, up] = [...body.matchAll(/sy-chart-bar" x="([\d.]+)%" width="([\d.]+)%"/g)].map(
			([, x, width]) => [number(x!), number(width!)]
		);
		expect(down![0]! + down![1]!).toBeCloseTo(up![0]!, 2);
		expect(up![1]! / down![1]!).toBeCloseTo(2, 2);
	});

	test('what is too short, and what is refused, is said', () => {
		const { notes } = rowModel('bars', length, [
			item('Mountain', 8000),
			item('Mouse', 0.1),
			item('Stone', null)
		])!;
		expect(notes).toEqual([
			'Stone: no reading. The stone is too light.',
			'Mouse: its bar is too short to be seen at this scale.'
		]);
	});
});

test('discs are in true proportion by area, or by width, and it is said which', () => {
	const values = fc.array(fc.double({ min: 0.001, max: 1e4, noNaN: true }), {
		minLength: 2,
		maxLength: 8
	});
	fc.assert(
		fc.property(values, fc.constantFrom('area' as const, 'width' as const), (given, shows) => {
			const items = given.map((value, index) => item(`Thing ${index}`, value));
			const { shapes, notes } = shapeModel(shows, length, items)!;
			const [most] = shapes.toSorted((a, b) => b.radius - a.radius);
			shapes.forEach(({ radius }, index) => {
				const drawn = shows === 'area' ? (radius / most!.radius) ** 2 : radius / most!.radius;
				expect(Math.abs(drawn / (given[index]! / Math.max(...given)) - 1)).toBeLessThan(0.005);
			});
			expect(notes[0]).toContain(shows === 'area' ? 'by area' : 'by width');
		})
	);
	const { body } = render(ShapeChart, {
		props: {
			...words,
			form: 'shapes',
			shows: 'area',
			axis: length,
			items: [item('One', 1), item('Four', 4)]
		}
	});
	const [one, four] = [...body.matchAll(/<circle[^>]* r="([\d.]+)"/g)].map(([, r]) => Number(r));
	expect((four! / one!) ** 2).toBeCloseTo(4, 6);
});

test('tiny shapes get a ring and a note, and nothing below zero gets a shape', () => {
	const { shapes, notes } = shapeModel('area', length, [
		item('Sun', 1e6),
		item('Dust', 1),
		item('Debt', -4)
	])!;
	expect(shapes.map(({ ringed }) => ringed)).toEqual([false, true, false]);
	expect(shapes[2]!.radius).toBe(0);
	expect(notes.join(' ')).toContain('Dust is too small to be seen well');
	expect(notes.join(' ')).toContain('Debt is below 0');
});

describe('a line chart', () => {
	const input = (more: Partial<LineInput> = {}): LineInput => ({
		x: { label: 'time', unit: 's', from: 1, to: 100, log: false },
		y: { label: 'height', unit: 'm', log: false, zero: false },
		series: [
			{
				id: 'a',
				label: '',
				points: Array.from({ length: 100 }, (_, index) => ({ x: index + 1, y: 46 + index })),
				now: { value: 70, uncertainty: 3, words: '70\u00a0m' }
			}
		],
		bands: [],
		at: 25,
		gaps: [],
		...more
	});

	test('says a cut axis, a log axis and a whisker in words', () => {
		const cut = lineModel(input())!;
		expect(cut.caption).toContain('axis starts at 40');
		expect(cut.notes).toContain('A whisker is one standard uncertainty to either side.');
		const zero = lineModel(input({ y: { label: 'h', unit: 'm', log: false, zero: true } }))!;
		expect(zero.y.span.from).toBe(0);
		expect(zero.caption).not.toContain('starts at');
		const log = lineModel(
			input({
				x: { label: 'time', unit: 's', from: 1, to: 100, log: true },
				y: { label: 'h', unit: 'm', log: true, zero: false }
			})
		)!;
		expect(log.caption).toContain('both scales log');
		expect(log.xName).toContain('each step is ten times');
	});

	test('a gap says its sentence', () => {
		const { notes } = lineModel(
			input({ gaps: [{ series: 0, from: 3, to: 7, message: 'The stone is gone.' }] })
		)!;
		expect(notes).toContain('No reading from 3 to 7\u00a0seconds: The stone is gone.');
	});

	test('lines differ by dash, mark and word, and their labels keep apart', () => {
		const series = ['One', 'Two', 'Three', 'Four'].map((label, index) => ({
			id: label,
			label,
			points: [1, 50, 100].map((x) => ({ x, y: 50 + index * 0.1 + x }))
		}));
		const model = lineModel(input({ series }))!;
		expect(new Set(model.series.map(({ style }) => style.dash)).size).toBe(4);
		expect(new Set(model.series.map(({ style }) => style.mark)).size).toBe(4);
		const places = model.ends.narrow.map(({ label }) => label * 150);
		places.slice(1).forEach((at, index) => expect(at - places[index]!).toBeGreaterThan(14.9));
		expect(model.ends.narrow.map(({ words: said }) => said).toSorted()).toEqual([
			'Four',
			'One',
			'Three',
			'Two'
		]);
	});

	test('long names are letters at the lines’ ends, and whole in the key', () => {
		const label = 'The distance that light has travelled since it left';
		const series = [label, 'b'].map((name) => ({
			id: name,
			label: name,
			points: [1, 100].map((x) => ({ x, y: x }))
		}));
		const { body } = render(LineChart, { props: { ...words, ...input({ series }) } });
		expect(body).toContain(label);
		const ends = [...body.matchAll(/class="sy-chart-end[^>]*>([^<]*)/g)].map(([, said]) => said);
		expect([...new Set(ends)].toSorted()).toEqual(['A', 'B']);
	});

	test('two hundred points are drawn within 0.3 ms', () => {
		const points = Array.from({ length: 200 }, (_, index) => ({
			x: 1 + index / 2,
			y: Math.sin(index / 30)
		}));
		const wanted = input({
			series: [{ id: 'a', label: '', points, now: { value: 0, uncertainty: null, words: '0 m' } }]
		});
		for (let run = 0; run < 200; run += 1) lineModel(wanted);
		const times = Array.from({ length: 50 }, () => {
			const began = performance.now();
			lineModel(wanted);
			return performance.now() - began;
		});
		// The best of them: a shared machine pauses the others.
		expect(Math.min(...times)).toBeLessThan(0.3);
	});

	test('nothing to draw is said', () => {
		const series = [{ id: 'a', label: '', points: [{ x: 1, y: null }] }];
		const { body } = render(LineChart, { props: { ...words, ...input({ series, at: null }) } });
		expect(body).toContain('There is nothing to draw at these settings.');
		expect(body).not.toContain('<table');
	});
});

describe('a spectrum', () => {
	test('hatches what eyes see, on an axis of wavelength, frequency or energy', () => {
		const share = (unit: string, low: number, high: number) =>
			stemModel('spectrum', { label: 'q', unit, log: false }, [item('a', low), item('b', high)])!
				.visible;
		expect(share('nm', 0, 1000)).toEqual({ from: 0.38, to: 0.75 });
		// c / 750 nm and c / 380 nm.
		expect(share('THz', 0, 1000)!.from).toBeCloseTo(0.39972, 4);
		expect(share('THz', 0, 1000)!.to).toBeCloseTo(0.78893, 4);
		// hc = 1239.84 eV nm (CODATA 2018).
		expect(share('eV', 0, 10)!.from).toBeCloseTo(0.165312, 4);
		expect(share('m', 1, 10)).toBeNull();
		expect(share('kg', 0, 1)).toBeNull();
	});

	test('tells lines as emitted from the same as observed', () => {
		const model = stemModel('spectrum', { label: 'q', unit: 'nm', log: false }, [
			item('H α, emitted', 656.28),
			item('H α, observed', 760),
			item('Sodium', 589)
		])!;
		expect(model.stems.map(({ emitted }) => emitted)).toEqual([true, false, false]);
		expect(model.shifts).toHaveLength(1);
		expect(model.notes).toContain('Dashed lines are as emitted, solid ones as observed.');
	});
});

describe('a ledger', () => {
	const energy = { label: 'energy', unit: 'kJ' };
	const column = (...parts: Drawn[]) => [{ id: 'out', label: 'Out', parts }];

	test('lays parts end to end from zero, and prints the total', () => {
		const model = ledgerModel(energy, column(item('Height', 7.0608), item('Speed', 463.6584)))!;
		const [{ parts, total }] = model.columns as [(typeof model.columns)[0]];
		expect(model.axis.span.from).toBe(0);
		expect(parts[0]!.from).toBe(0);
		expect(parts[1]!.from).toBe(parts[0]!.to);
		expect(total).toBe('470.7');
		expect(model.notes).toEqual([
			'The rounded parts add up to 470.8, the total to 470.7: each is rounded by itself.'
		]);
	});

	test('a part below zero, or without a reading, takes its column out, with a sentence', () => {
		const model = ledgerModel(energy, [
			...column(item('Debt', -3), item('Speed', 5)),
			{ id: 'in', label: 'In', parts: [item('Stone', null), item('Weight', 2)] },
			{ id: 'all', label: 'All', parts: [item('Rest', 7)] }
		])!;
		expect(model.columns.map(({ total }) => total)).toEqual(['', '', '7.000']);
		expect(model.columns[0]!.parts.every(({ from }) => from === null)).toBe(true);
		expect(model.notes.join(' ')).toContain('Out, Debt is below 0');
		expect(model.notes.join(' ')).toContain('In, Stone: no reading');
	});
});

test('on a log axis what isn’t above zero is said and stays in the table', () => {
	const model = rowModel('dots', { ...length, log: true }, [item('Up', 10), item('Down', -1)])!;
	expect(model.rows[1]!.share).toBeNull();
	expect(model.notes[0]).toContain('Down isn’t above 0');
	expect(model.table.rows.flat()).toContain('−1');
});
