import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { lineById, restValue } from '../physics/lines/catalogue.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { sameDrop } from '../server/demo/same-drop.ts';
import { chartFindings } from './chart-findings.ts';
import type { ItemChart, LedgerChart, LineChart, WidgetDocument } from './document.ts';

const words = {
	kind: 'chart' as const,
	title: 'Energy before and after',
	source: 'The house’s own calculators',
	description: 'All of the 471 kilojoules that go in come out again, almost all as speed.'
};
const energy = { step: 'weight', output: 'storedEnergy' };
const climb = { step: 'climb', output: 'energy' };

const outputs = (document: WidgetDocument, step: string) =>
	catalogue.get(document.steps.find(({ id }) => id === step)?.calculator ?? '')?.outputs ?? {};

const codes = (chart: Parameters<typeof chartFindings>[0], document = sameDrop) =>
	chartFindings(chart, document, catalogue).map(({ code }) => code);

const line = (more: Partial<LineChart> = {}): LineChart => ({
	...words,
	id: 'chart',
	form: 'line',
	x: { control: 'wave-age', label: 'Age', scale: 'linear' },
	y: { unit: 'MHz', label: 'frequency', scale: 'linear', from: 'data' },
	series: [{ id: 'a', label: '', reading: { step: 'line', output: 'observedFrequency' } }],
	bands: [],
	...more
});

const pinned = (id: string, unit: string) => restValue(lineById(id)!, unit);

const spectrum = (value: number, unit = 'nm'): ItemChart => ({
	...words,
	id: 'chart',
	form: 'spectrum',
	axis: { label: 'wavelength', unit, scale: 'linear' },
	shows: 'area',
	items: [{ id: 'a', label: 'H α', line: 'h-alpha', value }]
});

const items = (more: Partial<ItemChart> = {}): ItemChart => ({
	...words,
	id: 'chart',
	form: 'bars',
	axis: { label: 'energy', unit: 'kJ', scale: 'linear' },
	shows: 'area',
	items: [
		{ id: 'a', label: 'Given up', reading: energy },
		{ id: 'b', label: 'Kept as height', reading: climb }
	],
	...more
});

const ledger = (columns: LedgerChart['columns']): LedgerChart => ({
	...words,
	id: 'chart',
	form: 'ledger',
	axis: { label: 'energy', unit: 'kJ' },
	columns
});

test('the readings of these tests are there', () => {
	expect(Object.keys(outputs(sameDrop, 'weight'))).toContain(energy.output);
	expect(Object.keys(outputs(sameDrop, 'climb'))).toContain(climb.output);
});

describe('the charts of the demo', () => {
	test.each([
		['first-light', firstLight],
		['same-drop', sameDrop]
	])('%s lack nothing', (_name, document) => {
		for (const block of document.blocks) {
			if (block.kind !== 'chart') continue;
			expect(chartFindings(block, document, catalogue)).toEqual([]);
		}
	});
});

describe('words', () => {
	test('title, axes, source and description are wanted', () => {
		const bare = line({ title: ' ', source: '', description: '' });
		bare.x = { ...bare.x, label: '' };
		bare.y = { ...bare.y, label: '' };
		expect(codes(bare, firstLight)).toEqual([
			'no-chart-title',
			'no-x-label',
			'no-y-label',
			'no-chart-source',
			'no-description'
		]);
		const axis = { ...items().axis, label: '' };
		expect(codes(items({ axis }))).toEqual(['no-axis-label']);
	});

	test('a description too short to tell anything is not one', () => {
		expect(codes(line({ description: 'It rises.' }), firstLight)).toEqual(['short-description']);
	});

	test('several lines need names of their own', () => {
		const [only] = line().series;
		const two = (labels: string[]) =>
			line({ series: labels.map((label, index) => ({ ...only!, id: `s${index}`, label })) });
		expect(codes(two(['', 'b']), firstLight)).toEqual(['no-series-label']);
		expect(codes(two(['b', 'b ']), firstLight)).toEqual(['same-label']);
		expect(codes(two(['a', 'b']), firstLight)).toEqual([]);
	});
});

describe('axes', () => {
	test('a unit that the reading can’t be given in', () => {
		expect(codes(line({ y: { ...line().y, unit: 'kg' } }), firstLight)).toContain('mixed-units');
	});

	test('a logarithmic level axis from nought', () => {
		const controls = firstLight.controls.map((control) =>
			control.kind === 'slider' ? { ...control, min: 0 } : control
		);
		const found = chartFindings(
			line({ x: { ...line().x, scale: 'log' } }),
			{ ...firstLight, controls },
			catalogue
		);
		expect(found.map(({ code }) => code)).toContain('log-x');
		expect(found.find(({ code }) => code === 'refused-end')?.says).toMatch(
			/^The line has no reading at 0.million years, where the chart ends\./
		);
	});

	test('a control that is gone', () => {
		const x = { ...line().x, control: 'gone' };
		expect(codes(line({ x }), firstLight)).toEqual(['no-x-control']);
	});

	test('lengths and sizes on a scale whose nought means something', () => {
		const axis = { label: 'temperature', unit: '°C', scale: 'linear' as const };
		expect(codes(items({ axis }))).toContain('no-true-zero');
		expect(codes(items({ axis, form: 'dots' }))).not.toContain('no-true-zero');
	});
});

describe('things', () => {
	test('a comparison of one', () => {
		expect(codes(items({ items: items().items.slice(0, 1) }))).toEqual(['one-item']);
	});

	test('shapes: a length as an area, and another thing as a width', () => {
		expect(codes(items({ form: 'shapes', shows: 'width' }))).toEqual(['width-of-other']);
		expect(codes(items({ form: 'shapes' }))).toEqual([]);
		const axis = { label: 'distance', unit: 'm', scale: 'linear' as const };
		expect(codes(items({ form: 'shapes', axis }))).toContain('length-as-area');
	});

	test('a pinned line whose value the catalogue doesn’t have', () => {
		expect(codes(spectrum(pinned('h-alpha', 'nm')))).toEqual([]);
		expect(codes(spectrum(650))).toEqual(['line-moved']);
		expect(codes(spectrum(650, 'kg'))).toEqual(['line-unit']);
	});
});

describe('ledgers', () => {
	const part = (id: string, label: string, reading = energy) => ({ id, label, reading });

	test('count each reading once, and name each part', () => {
		const twice = [{ id: 'c', label: 'Out', parts: [part('a', 'One'), part('b', 'Two')] }];
		expect(codes(ledger(twice))).toEqual(['counted-twice']);
		const nameless = [{ id: 'c', label: 'Out', parts: [part('a', ''), part('b', 'Two', climb)] }];
		expect(codes(ledger(nameless))).toEqual(['no-series-label']);
	});

	test('hold no part that a reader can bring below nought', () => {
		const debt = {
			kind: 'slider' as const,
			id: 'debt',
			label: 'Debt',
			unit: 'kJ',
			min: -5,
			max: 5,
			step: 1,
			initial: 5
		};
		const columns = [
			{
				id: 'c',
				label: 'Out',
				parts: [part('a', 'Given'), { id: 'b', label: 'Debt', reading: { control: 'debt' } }]
			}
		];
		const document = { ...sameDrop, controls: [...sameDrop.controls, debt] };
		expect(chartFindings(ledger(columns), document, catalogue)).toEqual([
			{
				code: 'negative-part',
				says: 'Debt can be below 0, and what is stacked must add up from 0. Leave it out, or draw bars.',
				at: { block: 'chart' }
			}
		]);
	});
});
