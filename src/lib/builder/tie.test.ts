import { EditorState } from 'prosemirror-state';
import { describe, expect, test } from 'vitest';
import { detectQuantities } from '../factcheck/detect.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { toDocument, toManuscript } from './convert.ts';
import { numbersInCopy } from './quantities.ts';
import {
	exempt,
	liveFormat,
	printLive,
	replaceWords,
	scaledUnit,
	significantFigures,
	tie,
	untie
} from './tie.ts';

const document: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: '',
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
			kind: 'result',
			content: [{ kind: 'text', text: 'It arrives at about 68 megahertz today.' }]
		}
	],
	claims: []
};

const fresh = () => EditorState.create({ doc: toManuscript(document) });

function onlyNumber(state: EditorState) {
	const [number] = numbersInCopy(state.doc);
	if (!number) throw new Error('no number in the copy');
	return number;
}

const content = (state: EditorState) => {
	const [block] = toDocument(state.doc).blocks;
	return block && 'content' in block ? block.content : [];
};

describe('declaring a number', () => {
	const reading = { step: 'line', output: 'frequency' };

	test('tying marks the hedge and the unit along with the number', () => {
		const before = fresh();
		const after = before.apply(tie(before.tr, onlyNumber(before), reading));
		const [claim] = toDocument(after.doc).claims;
		expect(claim).toMatchObject({ form: 'stated', reading });
		expect(content(after)).toEqual([
			{ kind: 'text', text: 'It arrives at ' },
			{ kind: 'claim', claim: claim?.id, text: 'about 68 megahertz' },
			{ kind: 'text', text: ' today.' }
		]);
	});

	test('tying again keeps the claim and changes what it hangs on', () => {
		const before = fresh();
		const tied = before.apply(tie(before.tr, onlyNumber(before), reading));
		const other = { step: 'line', output: 'observedWavelength' };
		const again = tied.apply(tie(tied.tr, onlyNumber(tied), other));
		expect(toDocument(again.doc).claims).toEqual([
			{ id: toDocument(tied.doc).claims[0]?.id, form: 'stated', reading: other }
		]);
	});

	test('tied to a slider, the words give way to the slider’s own value, and the claim goes', () => {
		const before = fresh();
		const tied = before.apply(tie(before.tr, onlyNumber(before), reading));
		const set = toDocument(tied.apply(tie(tied.tr, onlyNumber(tied), { control: 'age' })).doc);
		expect(set.claims).toEqual([]);
		expect(JSON.stringify(set.blocks)).toContain('"kind":"setting","control":"age"');
	});

	test('untying leaves the words and no claim', () => {
		const before = fresh();
		const tied = before.apply(exempt(before.tr, onlyNumber(before), 'A name.'));
		const after = tied.apply(untie(tied.tr, onlyNumber(tied), ''));
		expect(toDocument(after.doc)).toEqual(document);
	});

	test('printing live puts the number in place of the words', () => {
		const before = fresh();
		const number = onlyNumber(before);
		const after = before.apply(
			printLive(before.tr, number, reading, liveFormat(number.quantity, 'Hz'))
		);
		const [claim] = toDocument(after.doc).claims;
		expect(claim).toMatchObject({ form: 'live', reading, unit: 'MHz', figures: 2, hedge: 'about' });
		expect(content(after)[1]).toEqual({ kind: 'live', claim: claim?.id });
	});

	test('a slider printed live is its setting, and no claim', () => {
		const before = fresh();
		const number = onlyNumber(before);
		const after = before.apply(
			printLive(before.tr, number, { control: 'age' }, liveFormat(number.quantity, 'Myr'))
		);
		expect(toDocument(after.doc).claims).toEqual([]);
		expect(content(after)[1]).toEqual({ kind: 'setting', control: 'age' });
	});

	test('other words keep the tie', () => {
		const before = fresh();
		const tied = before.apply(tie(before.tr, onlyNumber(before), reading));
		const after = tied.apply(replaceWords(tied.tr, onlyNumber(tied), 'nearly 70 megahertz'));
		expect(content(after)[1]).toMatchObject({ kind: 'claim', text: 'nearly 70 megahertz' });
		expect(toDocument(after.doc).claims).toEqual(toDocument(tied.doc).claims);
	});
});

describe('the format that words ask for', () => {
	test.each([
		['180 million years', { unit: 'Myr', figures: 2, hedge: 'none' }],
		['about 13.8 billion years', { unit: 'Gyr', figures: 3, hedge: 'about' }],
		['1420 megahertz', { unit: 'MHz', figures: 3, hedge: 'none' }],
		['0.0250 metres', { unit: 'm', figures: 3, hedge: 'none' }]
	])('%s', (text, format) => {
		const [quantity] = detectQuantities(text, 'en');
		expect(liveFormat(quantity ?? null, 's')).toEqual(format);
	});

	test('a scale without a unit of its own gives the reading’s unit', () => {
		expect(scaledUnit('m/s', 1e12)).toBeNull();
	});

	test.each([
		['1420', 3],
		['1000', 1],
		['0.0250', 3],
		['-19.0', 3],
		['0', 1],
		['123456789', 6]
	])('%s has %i figures', (numeral, figures) => {
		expect(significantFigures(numeral)).toBe(figures);
	});
});
