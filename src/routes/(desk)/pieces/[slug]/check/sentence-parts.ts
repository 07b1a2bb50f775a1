/** The sentence of a claim and its neighbours, cut where claims stand, so that each number can be underlined. */
import { isTextBlock, type WidgetDocument } from '$lib/widget/document.ts';
import {
	blockText,
	claimPlaces,
	sentenceSpans,
	type Span,
	type Words
} from '$lib/widget/places.ts';

export interface Part {
	text: string;
	/** The claim these words belong to; null for running text. */
	claim: string | null;
}

export interface SentenceParts {
	before: Part[];
	sentence: Part[];
	after: Part[];
}

export function sentenceParts(
	document: WidgetDocument,
	claimId: string,
	words: Words
): SentenceParts | null {
	const places = claimPlaces(document, words);
	const place = places.find(({ claim }) => claim.id === claimId);
	const block = document.blocks.find(({ id }) => id === place?.blockId);
	if (!place || !block || !isTextBlock(block)) return null;

	const text = blockText(block, words);
	const spans = sentenceSpans(text);
	const index = spans.findIndex(({ end }) => place.startInBlock < end);
	const inBlock = places
		.filter(({ blockId }) => blockId === block.id)
		.map(({ claim, startInBlock, words: said }) => ({
			claim: claim.id,
			start: startInBlock,
			end: startInBlock + said.length
		}));
	const cut = (span: Span | undefined) => (span ? partsOf(text, span, inBlock) : []);
	return {
		before: cut(spans[index - 1]),
		sentence: cut(spans[index]),
		after: cut(spans[index + 1])
	};
}

function partsOf(text: string, span: Span, claims: (Span & { claim: string })[]): Part[] {
	const parts: Part[] = [];
	let at = span.start;
	for (const claim of claims) {
		if (claim.end <= span.start || claim.start >= span.end) continue;
		const start = Math.max(at, claim.start);
		const end = Math.min(span.end, claim.end);
		if (start > at) parts.push({ text: text.slice(at, start), claim: null });
		if (end > start) parts.push({ text: text.slice(start, end), claim: claim.claim });
		at = Math.max(at, end);
	}
	if (at < span.end) parts.push({ text: text.slice(at, span.end).trimEnd(), claim: null });
	return parts.filter(({ text: words }) => words !== '');
}
