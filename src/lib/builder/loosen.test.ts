import { EditorState } from 'prosemirror-state';
import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { parseDocument } from '../widget/parse.ts';
import { toDocument, toManuscript } from './convert.ts';
import { looseEnds, remove, type PrintedWords, type Removed } from './loosen.ts';

const document: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: 'First light',
	point: '',
	formulas: [],
	steps: [
		{
			id: 'age',
			calculator: 'cosmo.inverse',
			revision: '1.0.0',
			settings: {
				cosmology: { from: 'fixed', value: { set: 'Planck18' } },
				kind: { from: 'fixed', value: 'z_from_age' },
				value: { from: 'control', control: 'wave-age' }
			}
		},
		{
			id: 'line',
			calculator: 'g21.frequency_from_z',
			revision: '1.0.0',
			settings: { z: { from: 'reading', step: 'age', output: 'z' } }
		}
	],
	controls: [
		{
			id: 'wave-age',
			kind: 'slider',
			label: 'The wave left at this age',
			unit: 'Myr',
			min: 100,
			max: 500,
			step: 10,
			initial: 180
		}
	],
	blocks: [
		{
			id: 'result',
			kind: 'result',
			content: [
				{ kind: 'text', text: 'After ' },
				{ kind: 'setting', control: 'wave-age' },
				{ kind: 'text', text: ', stretched ' },
				{ kind: 'claim', claim: 'stretch', text: 'about 21 times' },
				{ kind: 'text', text: ', it arrives at ' },
				{ kind: 'live', claim: 'frequency' }
			]
		},
		{ id: 'slider', kind: 'control', control: 'wave-age' },
		{
			id: 'dial',
			kind: 'chart',
			title: 'On the dial',
			form: 'line',
			x: { control: 'wave-age', label: 'Age', scale: 'linear' },
			y: { unit: 'MHz', label: 'Frequency', scale: 'linear', from: 'data' },
			series: [{ id: 'line', reading: { step: 'line', output: 'frequency' }, label: '' }],
			bands: [],
			source: '',
			description: ''
		}
	],
	claims: [
		{ id: 'stretch', form: 'stated', reading: { step: 'age', output: 'stretch' } },
		{
			id: 'frequency',
			form: 'live',
			reading: { step: 'line', output: 'frequency' },
			unit: 'MHz',
			figures: 2,
			hedge: 'none'
		}
	]
};

const printed: PrintedWords = {
	live: () => '68 megahertz',
	setting: () => '180 million years'
};

function without(removed: Removed): WidgetDocument {
	const state = EditorState.create({ doc: toManuscript(document) });
	const after = state.apply(remove(state.tr, removed, catalogue, printed));
	const parsed = parseDocument(toDocument(after.doc), catalogue);
	if (!parsed.ok) throw new Error(parsed.issues.map(({ message }) => message).join(' '));
	return parsed.document;
}

const wordsOf = ({ blocks: [block] }: WidgetDocument) =>
	block && 'content' in block
		? block.content.map((inline) => ('text' in inline ? inline.text : `{${inline.kind}}`)).join('')
		: '';

describe('taking away what is in use', () => {
	test('the example hangs together', () => {
		expect(parseDocument(document, catalogue)).toMatchObject({ ok: true });
	});

	test('everything that would come loose is named before', () => {
		const doc = toManuscript(document);
		expect(looseEnds(doc, { step: 'line' }, catalogue, printed)).toEqual([
			'“68 megahertz” would stop following its reading and stay as words, not weighed.',
			'The chart “On the dial” would be taken out.'
		]);
		expect(looseEnds(doc, { step: 'age' }, catalogue, printed)).toEqual([
			'“about 21 times” would no longer be weighed.',
			'“Redshift” of 21 cm line: redshift to frequency would go back to a fixed value.'
		]);
		expect(looseEnds(doc, { control: 'wave-age' }, catalogue, printed)).toEqual([
			'“Age after the Big Bang” of Age or distance to redshift would go back to a fixed value.',
			'“180 million years” would stay as words and no longer move.',
			'The control would be taken out of the copy.',
			'The chart “On the dial” would be taken out.'
		]);
	});

	test('a calculator goes with its ties; the words stay', () => {
		const after = without({ step: 'line' });
		expect(after.steps.map(({ id }) => id)).toEqual(['age']);
		expect(after.claims.map(({ id }) => id)).toEqual(['stretch']);
		expect(after.blocks.map(({ kind }) => kind)).toEqual(['result', 'control']);
		expect(wordsOf(after)).toBe(
			'After {setting}, stretched about 21 times, it arrives at 68 megahertz'
		);
	});

	test('what it fed goes back to a fixed value', () => {
		const after = without({ step: 'age' });
		expect(after.steps).toMatchObject([
			{ id: 'line', settings: { z: { from: 'fixed', value: 17.2 } } }
		]);
		expect(wordsOf(after)).toContain('stretched about 21 times');
		expect(after.claims.map(({ id }) => id)).toEqual(['frequency']);
	});

	test('a slider leaves where it started, in the setting’s own unit', () => {
		const after = without({ control: 'wave-age' });
		expect(after.controls).toEqual([]);
		expect(after.steps[0]?.settings.value).toEqual({ from: 'fixed', value: 0.18 });
		expect(after.blocks.map(({ kind }) => kind)).toEqual(['result']);
		expect(wordsOf(after)).toContain('After 180 million years, stretched');
	});
});
