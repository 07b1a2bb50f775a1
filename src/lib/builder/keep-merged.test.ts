import fc from 'fast-check';
import { history, redo, undo } from 'prosemirror-history';
import { EditorState, TextSelection, type Transaction } from 'prosemirror-state';
import { describe, expect, test } from 'vitest';
import { anyDocument, Author, Chance, edited } from '../../../tests/support/edit-scripts.ts';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { mergeDocuments } from '../widget/merge.ts';
import { toDocument, toManuscript } from './convert.ts';
import { takeIn, writeInto } from './keep-merged.ts';
import { keepTheirs } from './keep-theirs.ts';
import { mend, upkeep } from './upkeep.ts';
import { wiringOf } from './schema.ts';

/** A sheet as the manuscript has it, without the screen. */
class Sheet {
	state: EditorState;
	constructor(document: WidgetDocument) {
		const plugins = [history(), keepTheirs(), upkeep()];
		const bare = EditorState.create({ doc: toManuscript(document), plugins });
		this.state = EditorState.create({ doc: bare.apply(mend(bare)).doc, plugins });
	}
	apply(transaction: Transaction): void {
		this.state = this.state.apply(transaction);
	}
	type(at: number, words: string): void {
		this.apply(this.state.tr.insertText(words, at));
	}
	undo = () => undo(this.state, (transaction) => this.apply(transaction));
	redo = () => redo(this.state, (transaction) => this.apply(transaction));
	get document(): WidgetDocument {
		return toDocument(this.state.doc);
	}
	endOf(id: string): number {
		let end = -1;
		this.state.doc.forEach((block, offset) => {
			if (block.attrs.id === id) end = offset + block.nodeSize - 1;
		});
		return end;
	}
}

const changed = (document: WidgetDocument, change: (copy: WidgetDocument) => void) => {
	const copy = structuredClone(document);
	change(copy);
	return copy;
};
const wordsOf = (document: WidgetDocument, id: string) => {
	const block = document.blocks.find((one) => one.id === id);
	return block && 'content' in block
		? block.content.map((inline) => ('text' in inline ? inline.text : '…')).join('')
		: null;
};

test('any document is written into any other', { timeout: 60_000 }, () => {
	const seeds = fc.array(fc.nat(10_000), { minLength: 20, maxLength: 60 });
	fc.assert(
		fc.property(seeds, seeds, fc.integer({ min: 1, max: 20 }), (one, other, edits) => {
			const before = anyDocument(new Chance(one));
			const after = edited(before, edits, new Chance(other), new Author('mine'));
			const sheet = new Sheet(before);
			sheet.apply(writeInto(sheet.state.tr, after));
			expect(sheet.document).toEqual(new Sheet(after).document);
			sheet.state.doc.check();
			sheet.undo();
			expect(sheet.document).toEqual(new Sheet(before).document);
		}),
		{ numRuns: 60, seed: 20261208 }
	);
});

describe('a merge comes into the sheet', () => {
	const theirs = changed(firstLight, (document) => {
		const block = document.blocks.find(({ id }) => id === 'limits');
		const last = block && 'content' in block ? block.content.at(-1) : undefined;
		if (last?.kind === 'text') last.text += ' Theirs.';
		document.blocks.unshift({
			id: 'theirs',
			kind: 'paragraph',
			content: [
				{ kind: 'text', text: 'It started at ' },
				{ kind: 'claim', claim: 'start', text: '180 million years' },
				{ kind: 'text', text: '.' }
			]
		});
		document.claims.push({ id: 'start', form: 'stated', reading: { control: 'wave-age' } });
		document.controls[0] = { ...document.controls[0]!, label: 'Their label' };
	});

	/** One's own words in a block, and a calculator of one's own, before theirs come in. */
	function merged(): Sheet {
		const sheet = new Sheet(firstLight);
		sheet.type(sheet.endOf('opening'), ' Mine.');
		const { steps } = wiringOf(sheet.state.doc);
		const own = { ...firstLight.steps[1]!, id: 'own' };
		sheet.apply(sheet.state.tr.setDocAttribute('steps', [...steps, own]).setTime(5_000));
		const { document } = mergeDocuments(firstLight, sheet.document, theirs, catalogue);
		sheet.apply(takeIn(sheet.state, document));
		expect(sheet.document).toEqual(document);
		return sheet;
	}

	test('the caret stays in the words one was writing', () => {
		const sheet = new Sheet(firstLight);
		sheet.type(sheet.endOf('opening'), ' Mine.');
		const at = sheet.endOf('opening') - 2;
		sheet.apply(sheet.state.tr.setSelection(TextSelection.create(sheet.state.doc, at)));
		const { document } = mergeDocuments(firstLight, sheet.document, theirs, catalogue);
		sheet.apply(takeIn(sheet.state, document));
		const { $from } = sheet.state.selection;
		expect($from.parent.attrs.id).toBe('opening');
		expect($from.parent.textBetween($from.parentOffset, $from.parent.content.size)).toBe('e.');
	});

	test('undo takes back one’s own words and wiring, and leaves what came from others', () => {
		const sheet = merged();
		while (sheet.undo());
		expect(sheet.document).toEqual(theirs);
		expect(sheet.document.claims.map(({ id }) => id)).toContain('start');
		expect(sheet.document.controls[0]?.label).toBe('Their label');
	});

	test('redo brings one’s own back over theirs', () => {
		const sheet = merged();
		const { document } = sheet;
		while (sheet.undo());
		while (sheet.redo());
		expect(wordsOf(sheet.document, 'opening')).toBe(wordsOf(document, 'opening'));
		expect(sheet.document.steps.map(({ id }) => id).sort()).toEqual(
			document.steps.map(({ id }) => id).sort()
		);
		expect(sheet.document.claims).toEqual(document.claims);
		expect(sheet.document.controls[0]?.label).toBe('Their label');
	});

	test('what one changes of theirs afterwards is one’s own, and undo takes it back to theirs', () => {
		const sheet = merged();
		const [control] = wiringOf(sheet.state.doc).controls;
		sheet.apply(
			sheet.state.tr
				.setDocAttribute('controls', [{ ...control!, label: 'Mine now' }])
				.setTime(20_000)
		);
		sheet.undo();
		expect(sheet.document.controls[0]?.label).toBe('Their label');
	});
});
