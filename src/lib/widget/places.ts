/** The copy as text: each block's words, its sentences, and where every claim stands in them. */
import type { CalculatorSet, Reading } from '../physics/calculator.ts';
import {
	isTextBlock,
	type Claim,
	type Inline,
	type TextBlock,
	type WidgetDocument
} from './document.ts';
import { readingAt, type Evaluation } from './evaluate.ts';
import type { Language } from './language.ts';
import { hasOptions } from './control-kind.ts';
import { optionAt } from './control-grid.ts';
import { plainDecimal, printStated, roundToFigures, stateReading, type Stated } from './stated.ts';

export interface ClaimPlace {
	claim: Claim;
	blockId: string;
	/** “2b”: the number of the text block, and a letter by order in it. */
	label: string;
	/** The claim's own words at these settings. */
	words: string;
	/** The sentence it stands in, and the ones beside it in its block. */
	sentence: string;
	before: string;
	after: string;
	/** Where the words start in `sentence`, in UTF-16 units. */
	start: number;
	/** Where the words start in the block's text, in UTF-16 units. */
	startInBlock: number;
}

/** Stands in for a live number whose reading is refused. */
export const NO_READING = '…';

/** Words for each inline; with no evaluation, live numbers and settings keep a placeholder that names them. */
export type Words = (inline: Inline) => string;

export function wordsAt(
	document: WidgetDocument,
	evaluation: Evaluation,
	calculators: CalculatorSet
): Words {
	return (inline) => {
		switch (inline.kind) {
			case 'text':
			case 'claim':
				return inline.text;
			case 'setting':
				return settingWords(document, evaluation, inline.control) || NO_READING;
			case 'live': {
				const stated = liveStated(document, evaluation, inline.claim, calculators);
				return stated ? printStated(stated, document.language) : NO_READING;
			}
		}
	};
}

/** The text of a block with its tokens named, so that it changes only when an author changes it. */
export const tokenWords: Words = (inline) => {
	switch (inline.kind) {
		case 'text':
		case 'claim':
			return inline.text;
		case 'live':
			return `{live ${inline.claim}}`;
		case 'setting':
			return `{setting ${inline.control}}`;
	}
};

/** What a live claim prints at these settings; null when its reading is refused or isn't a number. */
export function liveStated(
	document: WidgetDocument,
	evaluation: Evaluation,
	claimId: string,
	calculators: CalculatorSet
): Stated | null {
	const claim = document.claims.find(({ id }) => id === claimId);
	if (claim?.form !== 'live') return null;
	const outcome = readingAt(document, evaluation, claim.reading, calculators);
	return outcome.ok ? stateLive(outcome.reading, claim, document.language) : null;
}

function stateLive(
	reading: Reading,
	claim: Extract<Claim, { form: 'live' }>,
	language: Language
): Stated | null {
	const { value, unit, quantity, uncertainty } = reading;
	return typeof value === 'number'
		? stateReading(value, unit, claim, quantity, language, uncertainty)
		: null;
}

/** A measured control's value as printed: all its digits, since a setting is exact. */
export function settingStated(
	document: Pick<WidgetDocument, 'controls'>,
	evaluation: Pick<Evaluation, 'values'>,
	controlId: string
): Stated | null {
	const control = document.controls.find(({ id }) => id === controlId);
	if (!control || hasOptions(control)) return null;
	const value = evaluation.values[controlId] ?? control.initial;
	// Twelve figures hide the binary dust of stepping by tenths, and no reader's setting has more.
	const numeral = plainDecimal(Number(roundToFigures(value, 12)));
	return { hedge: 'bare', hedgeWord: '', numeral, scale: 1, unit: control.unit };
}

/** A control's value in words: “180 million years”, or the label of the option that is chosen; '' for no control. */
export function settingWords(
	document: Pick<WidgetDocument, 'controls' | 'language'>,
	evaluation: Pick<Evaluation, 'values'>,
	controlId: string
): string {
	const control = document.controls.find(({ id }) => id === controlId);
	const option = control && optionAt(control, evaluation.values[controlId] ?? control.initial);
	if (option) return option.label;
	const stated = settingStated(document, evaluation, controlId);
	return stated ? printStated(stated, document.language) : '';
}

export function blockText(block: TextBlock, words: Words): string {
	return block.content.map(words).join('');
}

export interface Span {
	start: number;
	end: number;
}

/**
 * Sentences of running text. A sentence ends at . ! ? or … (with closing quotes and brackets) before white space and
 * something that isn't a small letter, so “4.4 metres” and “e.g. this” hold together. Spans meet and cover the text.
 */
export function sentenceSpans(text: string): Span[] {
	const spans: Span[] = [];
	let start = 0;
	for (const match of text.matchAll(/[.!?…]+["'”’)\]]*\s+(?=[^\p{Ll}\s])/gu)) {
		const end = match.index + match[0].length;
		spans.push({ start, end });
		start = end;
	}
	if (start < text.length) spans.push({ start, end: text.length });
	return spans;
}

/** Every claim in reading order. */
export function claimPlaces(document: WidgetDocument, words: Words): ClaimPlace[] {
	const claims = new Map(document.claims.map((claim) => [claim.id, claim]));
	let blockNumber = 0;
	return document.blocks.filter(isTextBlock).flatMap((block) => {
		blockNumber += 1;
		const text = blockText(block, words);
		const spans = sentenceSpans(text);
		const places: ClaimPlace[] = [];
		let offset = 0;
		for (const inline of block.content) {
			const said = words(inline);
			const claim =
				inline.kind === 'claim' || inline.kind === 'live' ? claims.get(inline.claim) : undefined;
			if (claim) {
				const { sentence, before, after, start } = sentenceAt(text, spans, offset);
				places.push({
					claim,
					blockId: block.id,
					label: `${blockNumber}${letter(places.length)}`,
					words: said,
					sentence,
					before,
					after,
					start: offset - start,
					startInBlock: offset
				});
			}
			offset += said.length;
		}
		return places;
	});
}

function sentenceAt(text: string, spans: readonly Span[], offset: number) {
	const index = Math.max(
		0,
		spans.findIndex(({ end }) => offset < end)
	);
	const slice = (span: Span | undefined) => (span ? text.slice(span.start, span.end).trim() : '');
	const span = spans[index];
	const start = span
		? span.start + (text.slice(span.start, span.end).match(/^\s*/)?.[0].length ?? 0)
		: 0;
	return {
		sentence: slice(span),
		before: slice(spans[index - 1]),
		after: slice(spans[index + 1]),
		start
	};
}

/** a … z, then aa, ab … */
function letter(index: number): string {
	const tail = String.fromCharCode(97 + (index % 26));
	return index < 26 ? tail : letter(Math.floor(index / 26) - 1) + tail;
}
