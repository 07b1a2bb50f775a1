import { EditorState, TextSelection } from 'prosemirror-state';
import { describe, expect, test } from 'vitest';
import type { ImportedCopy } from '../../import/imported-copy.ts';
import { emptyDocument } from '../../widget/empty-document.ts';
import type { Block } from '../../widget/document.ts';
import { toDocument, toManuscript } from '../convert.ts';
import { bringInCopy, pasteCopy } from './copy-nodes.ts';

const paragraph = (id: string, text: string): Block => ({
	id,
	kind: 'paragraph',
	content: text ? [{ kind: 'text', text }] : []
});

const copy: ImportedCopy = {
	title: 'A note',
	blocks: [
		{ kind: 'heading', content: [{ kind: 'text', text: 'First' }] },
		{
			kind: 'paragraph',
			content: [
				{ kind: 'text', text: 'One ' },
				{ kind: 'text', text: 'two', marks: ['em'] }
			]
		}
	],
	links: [],
	notes: []
};

function stateOf(title: string, blocks: Block[]): EditorState {
	return EditorState.create({ doc: toManuscript({ ...emptyDocument(title), blocks }) });
}

/** The caret at the end of the last block. */
function atEnd(state: EditorState): EditorState {
	return state.apply(state.tr.setSelection(TextSelection.atEnd(state.doc)));
}

const said = (document: ReturnType<typeof toDocument>) =>
	document.blocks.map((block) =>
		'content' in block
			? `${block.kind}: ${block.content.map((inline) => ('text' in inline ? inline.text : '')).join('')}`
			: block.kind
	);

describe('a file brought in', () => {
	test('takes the place of a fresh sheet’s empty line, and names it', () => {
		const { transaction, left } = bringInCopy(stateOf('', []).tr, copy);
		const document = toDocument(transaction.doc);
		expect(document.title).toBe('A note');
		expect(said(document)).toEqual(['heading: First', 'paragraph: One two']);
		expect(left).toBe(0);
	});

	test('goes after the block one is in; its title becomes a heading where the piece has one', () => {
		const state = atEnd(stateOf('Mine', [paragraph('block-1', 'Before.')]));
		const document = toDocument(bringInCopy(state.tr, copy).transaction.doc);
		expect(document.title).toBe('Mine');
		expect(said(document)).toEqual([
			'paragraph: Before.',
			'heading: A note',
			'heading: First',
			'paragraph: One two'
		]);
	});

	test('says how much found no room', () => {
		const full = Array.from({ length: 199 }, (_, index) => paragraph(`block-${index}`, 'Full.'));
		const { transaction, left } = bringInCopy(atEnd(stateOf('Mine', full)).tr, copy);
		expect(toDocument(transaction.doc).blocks).toHaveLength(200);
		expect(left).toBe(2);
	});
});

describe('pasted copy', () => {
	test('one paragraph goes into the line one is in', () => {
		const [, words] = copy.blocks;
		const state = atEnd(stateOf('Mine', [paragraph('block-1', 'Zero, ')]));
		const pasted = pasteCopy(state.tr, { ...copy, blocks: words ? [words] : [] });
		expect(said(toDocument(pasted.doc))).toEqual(['paragraph: Zero, One two']);
	});

	test('in the title it is plain words on one line', () => {
		const state = stateOf('', []);
		const inTitle = state.apply(state.tr.setSelection(TextSelection.create(state.doc, 1)));
		expect(toDocument(pasteCopy(inTitle.tr, copy).doc).title).toBe('First One two');
	});
});
