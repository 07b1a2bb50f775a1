import { EditorState } from 'prosemirror-state';
import { describe, expect, test } from 'vitest';
import { bringsWholeDocument, headLimits, headLines, isNearLimit } from './head-limits.ts';
import { schema } from './schema.ts';

function sheet(title: string, heldBack: string[] = []): EditorState {
	return EditorState.create({
		doc: schema.node('doc', null, [
			schema.node('title', null, title ? [schema.text(title)] : []),
			schema.node('point'),
			schema.node('paragraph', { id: 'p' }, [schema.text('Words to move up. '.repeat(10))])
		]),
		plugins: [headLimits(({ name }) => heldBack.push(name))]
	});
}
const title = (state: EditorState) => state.doc.child(0).textContent;

describe('a title holds 120 characters', () => {
	test('the 120th comes in, the 121st is held back and said', () => {
		const heldBack: string[] = [];
		let state = sheet('x'.repeat(119), heldBack);
		state = state.apply(state.tr.insertText('y', 1));
		expect(title(state)).toHaveLength(120);
		expect(heldBack).toEqual([]);
		state = state.apply(state.tr.insertText('z', 1));
		expect(title(state)).toHaveLength(120);
		expect(heldBack).toEqual(['title']);
	});

	test('what is dragged up and doesn’t fit stays where it was', () => {
		const state = sheet('Title');
		const from = state.doc.child(0).nodeSize + state.doc.child(1).nodeSize + 1;
		const words = state.doc.textBetween(from, from + 150);
		const dragged = state.apply(state.tr.delete(from, from + 150).insertText(words, 1));
		expect(dragged.doc.eq(state.doc)).toBe(true);
	});

	test('one that is too long already can be shortened, and the copy below written on', () => {
		let state = sheet('x'.repeat(140));
		state = state.apply(state.tr.delete(1, 3));
		expect(title(state)).toHaveLength(138);
		state = state.apply(state.tr.insertText('More. ', state.doc.content.size - 1));
		expect(state.doc.textContent).toContain('More. ');
	});

	test('a whole document comes as it is', () => {
		const state = sheet('');
		const loaded = state.apply(bringsWholeDocument(state.tr.insertText('x'.repeat(121), 1)));
		expect(title(loaded)).toHaveLength(121);
	});

	test('the count shows near the limit', () => {
		const near = (length: number) => headLines(sheet('x'.repeat(length)).doc).map(isNearLimit);
		expect(near(101)).toEqual([false, false]);
		expect(near(102)).toEqual([true, false]);
	});
});
