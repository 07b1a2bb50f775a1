import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { copyFromMarkdown } from '../import/markdown-copy.ts';
import { catalogue } from '../physics/calculators/index.ts';
import { isTextBlock, type Inline, type WidgetDocument } from '../widget/document.ts';
import { evaluate } from '../widget/evaluate.ts';
import { parseDocument } from '../widget/parse.ts';
import { blockText, wordsAt } from '../widget/places.ts';
import { copyAsMarkdown } from './copy-as-markdown.ts';

function golden(name: string): WidgetDocument {
	const address = new URL(`../../../tests/documents/${name}.json`, import.meta.url);
	const parsed = parseDocument(JSON.parse(readFileSync(address, 'utf8')), catalogue);
	if (!parsed.ok) throw new Error(JSON.stringify(parsed.issues));
	return parsed.document;
}

const exported = (document: WidgetDocument) =>
	copyAsMarkdown(document, evaluate(document, {}, catalogue), catalogue);

test('the worked example, with its live numbers, slider, chart and footnotes', () => {
	const markdown = exported(golden('v1-first-light'));
	expect(markdown).toMatch(/^# First light on the dial\n\n\*Cold hydrogen sends one radio note\./);
	expect(markdown).toContain('Cold hydrogen gives off a faint radio wave at 1420 megahertz[^1]');
	expect(markdown).toMatch(
		/^\(slider: The wave left at this age, 100 to 500, at 180\smillion\syears\)$/m
	);
	expect(markdown).toContain('**Where the wave arrives on today’s radio dial**');
	expect(markdown.match(/^\| .* \|$/gm)).toHaveLength(11);
	expect(markdown).toMatch(/^\[\^1\]: 1420 megahertz: reads .*; level\./m);
	expect(markdown).not.toMatch(/NaN|undefined|\{live|\{setting/);
});

const wordsOf = (text: string) => text.split(/[\s\u00a0]+/u).filter(Boolean);

/** Whether `words` stand in `among` in their order. */
function missingIn(words: readonly string[], among: readonly string[]): string | null {
	let at = 0;
	for (const word of words) {
		const found = among.indexOf(word, at);
		if (found === -1) return word;
		at = found + 1;
	}
	return null;
}

/** Footnote numbers touch the word before them, as they do in print. */
function importedWords(markdown: string): string[] {
	const { title = '', blocks } = copyFromMarkdown(markdown);
	return [title, ...blocks.map(({ content }) => content.map(({ text }) => text).join(''))].flatMap(
		wordsOf
	);
}

function readWords(document: WidgetDocument): string[] {
	const words = wordsAt(document, evaluate(document, {}, catalogue), catalogue);
	return [
		document.title,
		document.point,
		...document.blocks.flatMap((block) => (isTextBlock(block) ? [blockText(block, words)] : []))
	].flatMap(wordsOf);
}

describe('brought in again', () => {
	test.each(['v1-first-light', 'v1-same-drop'])('%s keeps every word', (name) => {
		const document = golden(name);
		expect(missingIn(readWords(document), importedWords(exported(document)))).toBeNull();
	});

	const sign = fc.constantFrom(
		...'ab7ü’“”–−.,:;!?()[]{}<>*_`~#+-=|\\/&^$%@"\''.split(''),
		'&amp;',
		'[^1]',
		'1.',
		'---',
		'```',
		'![a](b)',
		'https://a.example/_b_',
		'<b>'
	);
	const word = fc.array(sign, { minLength: 1, maxLength: 5 }).map((signs) => signs.join(''));
	const text = fc
		.tuple(
			fc.constantFrom('', ' '),
			fc.array(word, { minLength: 1, maxLength: 6 }),
			fc.constantFrom('', ' ')
		)
		.map(([before, words, after]) => before + words.join(' ') + after);
	const inline = fc.record({
		kind: fc.constant('text' as const),
		text,
		marks: fc.subarray(['em' as const, 'strong' as const])
	});
	const block = fc.record({
		kind: fc.constantFrom('paragraph', 'heading', 'aside', 'result', 'limits', 'caution'),
		content: fc.array(inline, { minLength: 1, maxLength: 5 })
	});

	test('random copy keeps every word, in order, signs and all', { timeout: 60_000 }, () => {
		const base = golden('v1-first-light');
		fc.assert(
			fc.property(
				text,
				text,
				fc.array(block, { minLength: 1, maxLength: 5 }),
				(title, point, blocks) => {
					const document: WidgetDocument = {
						...base,
						title: title.slice(0, 60),
						point,
						claims: [],
						blocks: blocks.map(({ kind, content }, index) => ({
							id: `b${index}`,
							kind: kind as 'paragraph',
							content: content as Inline[]
						}))
					};
					expect(missingIn(readWords(document), importedWords(exported(document)))).toBeNull();
				}
			),
			{ numRuns: 500 }
		);
	});
});
