/** Every number in the copy with what is known of it: found by the detector, marked as a claim, or printed live. */
import type { Node } from 'prosemirror-model';
import { detectQuantities, type DetectedQuantity } from '../factcheck/detect.ts';
import { wantsWeighing } from '../factcheck/undeclared.ts';
import { hasLexicon } from '../factcheck/lexicon/shelf.ts';
import type { Claim } from '../widget/document.ts';
import type { Language } from '../widget/language.ts';
import { claimOf, schema, wiringOf } from './schema.ts';

export interface NumberInCopy {
	/** Stays with the number while the copy around it changes. */
	key: string;
	/** Positions in the manuscript; `to` is after the last character. */
	from: number;
	to: number;
	blockId: string;
	/** The words, '' for numbers that the widget prints. */
	words: string;
	/** What it is tied to; null while it isn't weighed. */
	claim: Claim | null;
	/** The number as detected; null for live numbers and for words nobody reads as a number. */
	quantity: DetectedQuantity | null;
	/** The control whose value is printed here. */
	control: string | null;
}

/** Inline atoms count as one character, so offsets in the text are positions in the block. */
const ATOM = '\ufffc';
/** As many characters as the words of a claim may have. */
const LONGEST_CLAIM = 400;

const detected = new WeakMap<Node, { language: Language; found: DetectedQuantity[] }>();

/** Quantities of one block of text. Blocks never change, so an untouched one is read once. */
export function quantitiesOf(block: Node, language: Language): DetectedQuantity[] {
	const known = detected.get(block);
	if (known?.language === language) return known.found;
	// Its lexicon is on the way; then the copy is read again.
	if (!hasLexicon(language)) return [];
	const text = block.textBetween(0, block.content.size, undefined, ATOM);
	const found = detectQuantities(text, language).filter(wantsWeighing);
	detected.set(block, { language, found });
	return found;
}

export interface Run {
	claim: string;
	start: number;
	end: number;
}

/** Stretches of a block under one claim's mark, in order; touching stretches of one claim are one. */
export function claimRuns(block: Node): Run[] {
	const runs: Run[] = [];
	block.forEach((child, offset) => {
		const claim = claimOf(child);
		if (claim === null) return;
		const last = runs.at(-1);
		if (last && last.claim === claim && last.end === offset) last.end = offset + child.nodeSize;
		else runs.push({ claim, start: offset, end: offset + child.nodeSize });
	});
	return runs;
}

export function numbersInCopy(doc: Node): NumberInCopy[] {
	const { language, claims: entries } = wiringOf(doc);
	const claims = new Map(entries.map((claim) => [claim.id, claim]));
	const numbers: NumberInCopy[] = [];
	doc.forEach((block, offset) => {
		if (
			!block.inlineContent ||
			block.type === schema.nodes.title ||
			block.type === schema.nodes.point
		)
			return;
		numbers.push(...numbersOf(block, offset + 1, claims, language));
	});
	return numbers;
}

function numbersOf(
	block: Node,
	start: number,
	claims: ReadonlyMap<string, Claim>,
	language: Language
): NumberInCopy[] {
	const blockId = block.attrs.id as string;
	const quantities = quantitiesOf(block, language);
	const runs = claimRuns(block);
	const overlaps = (quantity: DetectedQuantity, run: Run) =>
		quantity.start < run.end && quantity.end > run.start;
	const numbers: NumberInCopy[] = runs.map((run) => ({
		key: run.claim,
		from: start + run.start,
		to: start + run.end,
		blockId,
		words: block.textBetween(run.start, run.end),
		claim: claims.get(run.claim) ?? null,
		quantity: quantities.find((quantity) => overlaps(quantity, run)) ?? null,
		control: null
	}));
	for (const quantity of quantities) {
		if (runs.some((run) => overlaps(quantity, run))) continue;
		numbers.push({
			key: `${blockId}:${quantity.start}`,
			from: start + quantity.start,
			to: start + quantity.end,
			blockId,
			words: quantity.surface,
			claim: null,
			quantity,
			control: null
		});
	}
	block.forEach((child, offset) => {
		const live = child.type === schema.nodes.live;
		if (!live && child.type !== schema.nodes.setting) return;
		const id = (live ? child.attrs.claim : child.attrs.control) as string;
		numbers.push({
			key: live ? id : `${blockId}:${offset}`,
			from: start + offset,
			to: start + offset + 1,
			blockId,
			words: '',
			claim: live ? (claims.get(id) ?? null) : null,
			quantity: null,
			control: live ? null : id
		});
	});
	return numbers.sort((a, b) => a.from - b.from);
}

/** The number a caret stands in or right after, or that holds the whole selection. */
export function numberAt(
	numbers: readonly NumberInCopy[],
	from: number,
	to: number = from
): NumberInCopy | null {
	return (
		numbers.find((number) =>
			from === to ? number.from < from && from <= number.to : number.from <= from && to <= number.to
		) ?? null
	);
}

/** Words that are selected within one block, to be marked by hand; null over claims, printed numbers and the title. */
export function numberByHand(doc: Node, from: number, to: number): NumberInCopy | null {
	const $from = doc.resolve(from);
	const block = $from.parent;
	const { title, point } = schema.nodes;
	if (from === to || !block.inlineContent || !$from.sameParent(doc.resolve(to))) return null;
	if (block.type === title || block.type === point) return null;
	const start = $from.start();
	let isPlain = true;
	doc.nodesBetween(from, to, (node) => {
		if (node.isInline && (!node.isText || claimOf(node) !== null)) isPlain = false;
	});
	const words = doc.textBetween(from, to);
	const lead = words.length - words.trimStart().length;
	const trimmed = words.trim();
	if (!isPlain || trimmed === '' || trimmed.length > LONGEST_CLAIM) return null;
	const [first, last] = [from + lead, from + lead + trimmed.length];
	const quantity = quantitiesOf(block, wiringOf(doc).language).find(
		(each) => start + each.start < last && start + each.end > first
	);
	return {
		key: `hand ${first}`,
		from: first,
		to: last,
		blockId: block.attrs.id as string,
		words: trimmed,
		claim: null,
		quantity: quantity ?? null,
		control: null
	};
}

/** Not declared by anyone: neither tied nor named as no claim. */
export function isUndeclared(number: NumberInCopy): boolean {
	return number.claim === null && number.control === null;
}
