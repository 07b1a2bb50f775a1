/**
 * A piece’s copy as Markdown, as it reads at the settings it is evaluated at: for reading, filing and sending, with what
 * every number was weighed against as footnotes. It can be brought in again with every word.
 */
import { weighingOf } from '../factcheck/claim-weighing.ts';
import { judgeClaims } from '../factcheck/judge.ts';
import type { Verdict } from '../factcheck/verdict.ts';
import { readsInWords } from '../factcheck/words.ts';
import type { CalculatorSet } from '../physics/calculator.ts';
import { benchSet } from '../widget/bench-set.ts';
import {
	isTextBlock,
	type Block,
	type Inline,
	type TextBlock,
	type WidgetDocument
} from '../widget/document.ts';
import type { Evaluation } from '../widget/evaluate.ts';
import { claimPlaces, wordsAt, type ClaimPlace, type Words } from '../widget/places.ts';
import { chartTable, readingTable } from './block-tables.ts';
import { controlWords } from './control-words.ts';
import { emphasised, inLine, plainLine, runningText, startLine } from './markdown-text.ts';
import { figuresIn, type Worked } from './worked.ts';

export function copyAsMarkdown(
	document: WidgetDocument,
	evaluation: Evaluation,
	house: CalculatorSet
): string {
	const calculators = benchSet(document, house);
	const words = wordsAt(document, evaluation, calculators);
	const places = claimPlaces(document, words).filter(({ claim }) => claim.form !== 'exempt');
	const writer: Writer = {
		worked: { document, evaluation, calculators },
		words,
		notes: new Map(places.map(({ claim }, index) => [claim.id, index + 1]))
	};
	const verdicts = judgeClaims(document, house);
	return [
		`# ${plainLine(document.title) || 'Untitled'}`,
		startLine(emphasised(document.point, '*')),
		...document.blocks.flatMap((block) => blockLines(block, writer)),
		...colophon(document, calculators),
		...places.map((place) => footnote(place, verdicts.get(place.claim.id), writer))
	]
		.filter((part) => part !== '')
		.join('\n\n')
		.concat('\n');
}

interface Writer {
	worked: Worked;
	words: Words;
	/** The number of each claim’s footnote, by claim id. */
	notes: ReadonlyMap<string, number>;
}

function blockLines(block: Block, writer: Writer): string[] {
	if (isTextBlock(block)) return [textLines(block, writer)];
	const { document, evaluation } = writer.worked;
	switch (block.kind) {
		case 'control': {
			const control = document.controls.find(({ id }) => id === block.control);
			return control ? [inLine(controlWords(control, document, evaluation))] : [];
		}
		case 'chart':
			return [
				strongLine(block.title),
				chartTable(block, writer.worked),
				plainLine(block.description),
				sourceLine(block.source)
			];
		case 'table':
			return [
				strongLine(block.title),
				readingTable(block, writer.worked),
				sourceLine(block.source)
			];
		case 'equation':
			return [
				inLine(
					`(equation: ${[equationName(block.step, writer.worked), ...block.values.map((value) => figuresIn(value, writer.worked))].filter(Boolean).join('; ')})`
				),
				plainLine(block.caption)
			];
		case 'picture':
			return [
				inLine(
					`(picture: ${block.alt || block.decorative}${block.labels.length > 0 ? `; ${block.labels.join(', ')}` : ''})`
				),
				plainLine(block.caption),
				plainLine([block.credit, block.licence].filter(Boolean).join(', '))
			];
		case 'guess':
			return [inLine(`(guess first: ${block.question})`)];
		case 'presets':
			return [
				inLine(
					`(settings to try: ${block.label ? `${block.label}: ` : ''}${block.presets.map(({ label }) => label).join(', ')})`
				)
			];
		case 'sources':
			return [
				block.items
					.map(({ text, url }) => `- ${plainLine(text)}${url ? ` ${inLine(url)}` : ''}`)
					.join('\n')
			];
	}
}

/** What a reader sees around the words of a block of this kind. */
const BEFORE: Partial<Record<TextBlock['kind'], string>> = {
	heading: '## ',
	aside: '> ',
	limits: '**What this can’t tell you:** ',
	caution: '**Caution:** '
};

function textLines({ kind, content }: TextBlock, { words, notes }: Writer): string {
	const noteAfter = (inline: Inline) => {
		const claim = inline.kind === 'claim' || inline.kind === 'live' ? inline.claim : undefined;
		const number = claim === undefined ? undefined : notes.get(claim);
		return number === undefined ? '' : `[^${number}]`;
	};
	const line = runningText(content, words, noteAfter);
	return line === '' ? '' : `${BEFORE[kind] ?? ''}${line}`;
}

function strongLine(text: string): string {
	return startLine(emphasised(text, '**'));
}

function sourceLine(source: string): string {
	return source.trim() ? `Source: ${inLine(source.trim())}` : '';
}

function equationName(stepId: string, { document, calculators }: Worked): string {
	const step = document.steps.find(({ id }) => id === stepId);
	return (step && calculators.get(step.calculator)?.title) ?? '';
}

/** What the numbers were worked with. */
function colophon(document: WidgetDocument, calculators: CalculatorSet): string[] {
	const used = [...new Set(document.steps.map(({ calculator }) => calculator))];
	const named = used.flatMap((id) => {
		const calculator = calculators.get(id);
		return calculator ? [`${calculator.title}, revision ${calculator.revision}`] : [];
	});
	return named.length === 0
		? []
		: [inLine(`Worked with constants edition ${document.constants}: ${named.join('; ')}.`)];
}

const VERDICT_WORDS: Record<Verdict['verdict'], string> = {
	level: 'level',
	leans: 'leans',
	tips: 'tips',
	unweighed: 'not weighed'
};

function footnote(
	place: ClaimPlace,
	verdict: Verdict | undefined,
	{ worked, notes }: Writer
): string {
	const { claim, words } = place;
	const weighing = weighingOf(worked.document, worked.evaluation, claim, words, worked.calculators);
	const reads = weighing
		? `reads ${readsInWords(weighing.stated, weighing.reading, worked.document.language)}`
		: 'no reading';
	const told = verdict ? `${VERDICT_WORDS[verdict.verdict]}. ${verdict.reason}` : 'not weighed.';
	return `[^${notes.get(claim.id) ?? 0}]: ${inLine(`${words}: ${reads}; ${told}`)}`;
}
