import { describe, expect, test } from 'vitest';
import { lintCopy } from '../../copy-lint/lint.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { emptyDocument } from '../../widget/empty-document.ts';
import { toManuscript } from '../convert.ts';
import { placeNotes } from './lint-desk.svelte.ts';

const piece: WidgetDocument = {
	...emptyDocument('A very unique note'),
	controls: [
		{ id: 'age', kind: 'slider', label: 'Age', unit: 'Myr', min: 1, max: 9, step: 1, initial: 2 }
	],
	blocks: [
		{
			id: 'block-1',
			kind: 'paragraph',
			content: [
				{ kind: 'setting', control: 'age' },
				{ kind: 'text', text: ' ago the the wave left.' }
			]
		}
	]
};

describe('notes at their words', () => {
	const doc = toManuscript(piece);
	const placed = placeNotes(doc, lintCopy(piece));

	test('what the widget prints counts as one character', () => {
		const doubled = placed.find(({ note }) => note.code === 'doubled-word');
		expect(doubled?.words).toBe('the the');
		expect(doc.textBetween(doubled?.from ?? 0, doubled?.to ?? 0)).toBe('the the');
	});

	test('notes on a block that is gone aren’t placed', () => {
		const [note] = lintCopy(piece);
		if (!note) throw new Error('the lint found nothing');
		expect(placeNotes(doc, [{ ...note, block: 'block-9' }])).toEqual([]);
	});
});
