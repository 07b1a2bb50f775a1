import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { parseDocument } from '../widget/parse.ts';
import { refusedWords } from './refused-words.ts';

const EMPTY: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: '',
	point: '',
	formulas: [],
	steps: [],
	controls: [],
	blocks: [],
	claims: []
};
const paragraph = (id: string, text: string): WidgetDocument['blocks'][number] => ({
	id,
	kind: 'paragraph',
	content: [{ kind: 'text', text }]
});

/** What the server would say of this draft. */
function refused(changes: Partial<WidgetDocument>): string[] {
	const draft = { ...EMPTY, ...changes };
	const parsed = parseDocument(draft, catalogue);
	return parsed.ok ? [] : refusedWords(parsed.issues, draft, catalogue);
}

describe('a draft that the server can’t keep', () => {
	test.each<[Partial<WidgetDocument>, string]>([
		[{ title: 'x'.repeat(121) }, 'The title is longer than 120 characters: shorten it.'],
		[
			{ point: 'x'.repeat(241) },
			'The point under the title is longer than 240 characters: shorten it.'
		],
		[
			{ blocks: [paragraph('p', 'Once upon a time '.repeat(1500))] },
			'The paragraph “Once upon a time Once upon a tim …” is longer than 20000 characters: shorten it.'
		],
		[
			{ blocks: Array.from({ length: 201 }, (_, index) => paragraph(`p${index}`, 'x')) },
			'Paragraphs and other blocks can be 200 at most: take some away.'
		],
		[
			{ steps: [{ id: 'a', calculator: 'no.such', revision: '1', settings: {} }] },
			'A calculator on the bench can’t be kept as it stands: There is no calculator “no.such”.'
		]
	])('is told by place and mend', (changes, sentence) => {
		expect(refused(changes)).toEqual([sentence]);
	});
});
