import { expect, test } from 'vitest';
import { copyFromMarkdown } from './markdown-copy.ts';

const lines = (markdown: string) =>
	copyFromMarkdown(markdown).blocks.map(
		({ kind, content }) =>
			`${kind}: ${content.map(({ text, marks }) => (marks ? `[${marks.join('+')} ${text}]` : text)).join('')}`
	);

test('headings, emphasis, lists, quotes, tables, footnotes and links', () => {
	const markdown = `# Rain and hail

A drop falls *steadily*, **fast** and ***both***[^1].
It goes on here.

## What holds it back

- air
- water
  1. cold
  2. warm

> Seen from a train.

| Body | Speed |
| ---- | ----- |
| Moon | 2.38  |

[^1]: Measured with a [mirror](https://example.org/m).

![A drop](drop.png) beside it.
`;
	const copy = copyFromMarkdown(markdown);
	expect(copy.title).toBe('Rain and hail');
	expect(lines(markdown)).toEqual([
		'paragraph: A drop falls [em steadily], [strong fast] and [em+strong both]. It goes on here.',
		'heading: What holds it back',
		'paragraph: –\u00a0air',
		'paragraph: –\u00a0water',
		'paragraph: 1.\u00a0cold',
		'paragraph: 2.\u00a0warm',
		'aside: Seen from a train.',
		'paragraph: Body\tSpeed',
		'paragraph: Moon\t2.38',
		'paragraph: A drop beside it.',
		'aside: Measured with a mirror.'
	]);
	expect(copy.links).toEqual([{ text: 'mirror', url: 'https://example.org/m' }]);
	expect(copy.notes).toEqual([
		'One table came in as lines, their cells apart by tabs.',
		'One picture was left out. Pictures come in at the picture desk, with their credit.',
		'One footnote stands at the end as asides.'
	]);
});

test('HTML is words, and a dangerous link has no address', () => {
	expect(lines('<script>alert(1)</script>')).toEqual(['paragraph: <script>alert(1)</script>']);
	expect(copyFromMarkdown('[x](javascript:alert(1))').links).toEqual([]);
});

test('a title from the head of the file', () => {
	expect(
		copyFromMarkdown('---\ntitle: "Hail"\ndate: 2026\n---\n\n# Not this\n\nText')
	).toMatchObject({
		title: 'Hail',
		blocks: [{ kind: 'heading' }, { kind: 'paragraph' }]
	});
});
