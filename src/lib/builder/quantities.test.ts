import { EditorState } from 'prosemirror-state';
import { describe, expect, test } from 'vitest';
import type { Verdict } from '../factcheck/verdict.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { toManuscript } from './convert.ts';
import { isUndeclared, numberAt, numbersInCopy } from './quantities.ts';
import { schema } from './schema.ts';
import { mend, upkeep } from './upkeep.ts';
import { numberDecorations, NOTHING_WEIGHED, stateOf, type Weighing } from './weighing.ts';

const LEVEL: Verdict = {
	verdict: 'level',
	severity: 'none',
	rule: 'N1',
	reason: '',
	departurePercent: 0,
	suggestions: []
};

const document: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: 'First light, at 21 centimetres',
	point: '',
	formulas: [],
	steps: [],
	controls: [
		{
			id: 'age',
			kind: 'slider',
			label: 'Age',
			unit: 'Myr',
			min: 100,
			max: 500,
			step: 10,
			initial: 180
		}
	],
	blocks: [
		{
			id: 'block-a',
			kind: 'paragraph',
			content: [
				{ kind: 'text', text: 'It gives off ' },
				{ kind: 'claim', claim: 'rest', text: '1420 megahertz' },
				{ kind: 'text', text: ', and 21 centimetres from crest to crest.' }
			]
		},
		{
			id: 'block-b',
			kind: 'result',
			content: [
				{ kind: 'text', text: 'After ' },
				{ kind: 'setting', control: 'age' },
				{ kind: 'text', text: ' it arrives at ' },
				{ kind: 'live', claim: 'frequency' },
				{ kind: 'text', text: '.' }
			]
		}
	],
	claims: [
		{ id: 'rest', form: 'exempt', reason: 'For the test.' },
		{
			id: 'frequency',
			form: 'live',
			reading: { control: 'age' },
			unit: 'Myr',
			figures: 2,
			hedge: 'none'
		}
	]
};

const manuscript = () => toManuscript(document);

/** What the manuscript shows between two of its positions. */
function textAt(from: number, to: number): string {
	return manuscript().textBetween(from, to, ' ', '*');
}

describe('numbers in the copy', () => {
	test('detected, marked and printed numbers are listed in reading order, the title’s left out', () => {
		expect(
			numbersInCopy(manuscript()).map(({ from, to, claim, control }) => [
				textAt(from, to),
				claim?.id ?? control
			])
		).toEqual([
			['1420 megahertz', 'rest'],
			['21 centimetres', null],
			['*', 'age'],
			['*', 'frequency']
		]);
	});

	test('only what nobody has declared asks to be weighed', () => {
		expect(
			numbersInCopy(manuscript())
				.filter(isUndeclared)
				.map(({ words }) => words)
		).toEqual(['21 centimetres']);
	});

	test('the caret is in a number when it stands inside or right after it, not before it', () => {
		const numbers = numbersInCopy(manuscript());
		const [first] = numbers;
		if (!first) throw new Error('no number');
		expect(numberAt(numbers, first.from)).toBeNull();
		expect(numberAt(numbers, first.from + 1)?.key).toBe('rest');
		expect(numberAt(numbers, first.to)?.key).toBe('rest');
		expect(numberAt(numbers, first.to + 1)).toBeNull();
	});
});

describe('what is drawn on a number', () => {
	const weighing: Weighing = {
		verdicts: new Map([['frequency', LEVEL]]),
		tags: new Map([['frequency', 'B']]),
		queried: new Set()
	};

	test('each decoration covers its number, in its state, with its letter', () => {
		const numbers = numbersInCopy(manuscript());
		const drawn = numberDecorations(numbers, weighing, 'frequency');
		expect(
			drawn.map(({ from, to, state, focused, tag }) => [textAt(from, to), state, focused, tag])
		).toEqual([
			['1420 megahertz', 'exempt', false, ''],
			['21 centimetres', 'unweighed', false, ''],
			['*', 'setting', false, ''],
			['*', 'level', true, 'B']
		]);
	});

	test('an open query comes before the verdict', () => {
		const live = numbersInCopy(manuscript()).find(({ key }) => key === 'frequency');
		if (!live) throw new Error('no live number');
		expect(stateOf(live, weighing)).toBe('level');
		expect(stateOf(live, { ...weighing, queried: new Set(['frequency']) })).toBe('queried');
		expect(stateOf(live, NOTHING_WEIGHED)).toBe('unweighed');
	});
});

describe('what the manuscript mends by itself', () => {
	const state = () => EditorState.create({ doc: manuscript(), plugins: [upkeep()] });
	const claimed = (of: EditorState) =>
		numbersInCopy(of.doc).map(({ from, to, claim }) => [
			of.doc.textBetween(from, to, ' ', '*'),
			claim?.id
		]);
	const rest = (of: EditorState) => {
		const number = numbersInCopy(of.doc).find(({ key }) => key === 'rest');
		if (!number) throw new Error('the claim is gone');
		return number;
	};

	test('a hedge typed before a tied number belongs to it', () => {
		const before = state();
		const after = before.apply(before.tr.insertText('about ', rest(before).from));
		expect(claimed(after)[0]).toEqual(['about 1420 megahertz', 'rest']);
	});

	test('splitting a block gives the new one its own id', () => {
		const before = state();
		const after = before.apply(before.tr.split(rest(before).to + 3));
		const ids = after.doc.children.slice(2).map(({ attrs }) => attrs.id as string);
		expect(new Set(ids).size).toBe(3);
		expect(ids[0]).toBe('block-a');
	});

	test('a claim copied elsewhere in the piece becomes a claim of its own', () => {
		const before = state();
		const { from, to } = rest(before);
		const copy = before.doc.slice(from, to).content.addToStart(schema.text(' Again '));
		const after = before.apply(before.tr.insert(before.doc.content.size - 1, copy));
		const ids = claimed(after).flatMap(([words, id]) => (words === '1420 megahertz' ? [id] : []));
		expect(ids).toHaveLength(2);
		expect(ids[0]).toBe('rest');
		expect(ids[1]).toMatch(/^claim-/);
	});

	test('a claim pasted from another piece comes as plain words', () => {
		const before = state();
		const foreign = schema.text('13.8 billion years', [
			schema.mark('claim', { id: 'claim-elsewhere' })
		]);
		const pasted = [schema.text(' That was '), foreign];
		const after = before.apply(before.tr.insert(before.doc.content.size - 1, pasted));
		expect(claimed(after).at(-1)).toEqual(['13.8 billion years', undefined]);
	});

	test('a live number of another piece is left out', () => {
		const before = state();
		const foreign = schema.node('live', { claim: 'claim-elsewhere' });
		const after = before.apply(before.tr.insert(before.doc.content.size - 1, foreign));
		expect(claimed(after)).toEqual(claimed(before));
	});

	test('an untouched manuscript needs no mending', () => {
		expect(mend(state()).docChanged).toBe(false);
	});
});
