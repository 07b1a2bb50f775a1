import { catalogue } from '$lib/physics/calculators/index.ts';
import { firstLight } from '$lib/server/demo/first-light.ts';
import { compareDocuments } from '$lib/widget/compare.ts';
import type { WidgetDocument } from '$lib/widget/document.ts';
import { expect, test } from 'vitest';
import { comparisonSentence } from './comparison-words.ts';

const said = (change: (copy: WidgetDocument) => void) => {
	const after = structuredClone(firstLight);
	change(after);
	return comparisonSentence(compareDocuments(firstLight, after, catalogue));
};

test.each<[string, (copy: WidgetDocument) => void, string]>([
	['nothing', () => undefined, 'The two are the same, word for word.'],
	['the title', (copy) => (copy.title = 'x'), 'The title changed.'],
	[
		'blocks and a slider',
		(copy) => {
			copy.blocks = copy.blocks.filter(({ id }) => id !== 'limits');
			copy.blocks.push({ id: 'n', kind: 'paragraph', content: [] });
			copy.controls[0] = { ...copy.controls[0]!, label: 'x' };
		},
		'Blocks: 1 added, 1 taken out; on the bench: 1 change.'
	],
	['a move', ({ blocks }) => blocks.push(blocks.shift()!), 'Blocks: 1 moved.']
])('%s', (_, change, sentence) => {
	expect(said(change)).toBe(sentence);
});
