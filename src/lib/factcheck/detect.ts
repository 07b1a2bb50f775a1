/**
 * Finds the quantities in prose as it is typed: number, scale, unit and hedge, as one stretch of text. Dates, years,
 * ordinals and names with digits are left alone. Time grows with the length of the text and no faster.
 */
import type { Stated } from '../widget/stated.ts';
import type { Language } from '../widget/language.ts';
import { printWordsOf } from '../widget/languages/print-words.ts';
import type { DetectedQuantity, QuantityForm } from './detected.ts';
import { readHedge, type Hedge } from './hedge-before.ts';
import { lexiconOf } from './lexicon/shelf.ts';
import { isLabel, isName, isYear, skippedSpans } from './not-quantities.ts';
import type { NumberRead } from './number-read.ts';
import { readNumber } from './numbers.ts';
import { stands, valueOf, withUnit, type Part } from './parts.ts';
import { compile, type Patterns } from './patterns.ts';
import { readRange, type Attempt } from './ranges.ts';
import { readAt, sticky, GAP } from './text-patterns.ts';

export type { DetectedQuantity, QuantityForm } from './detected.ts';

const compiled = new Map<Language, Patterns>();

function patternsOf(language: Language): Patterns {
	const known = compiled.get(language);
	if (known) return known;
	const patterns = compile(lexiconOf(language));
	compiled.set(language, patterns);
	return patterns;
}

/** Every quantity of a text, in reading order. */
export function detectQuantities(text: string, language: Language): DetectedQuantity[] {
	const patterns = patternsOf(language);
	const skips = skippedSpans(patterns, text);
	const found: DetectedQuantity[] = [];
	let at = 0;
	for (;;) {
		const place = nextTrigger(patterns, text, at);
		if (place === null) return found;
		const skip = skips.find(place);
		if (skip !== null) {
			at = skip;
			continue;
		}
		const { quantity, resume } = readQuantity(patterns, text, place, found.at(-1)?.end ?? 0);
		if (quantity) found.push(quantity);
		at = Math.max(resume, place + 1);
	}
}

/** The next digit, or the next word that may begin a number. */
function nextTrigger(patterns: Patterns, text: string, from: number): number | null {
	const { trigger, beginnings, lexicon, foldEnding } = patterns;
	trigger.lastIndex = from;
	for (let match = trigger.exec(text); match; match = trigger.exec(text)) {
		const [token] = match;
		if (!/\p{L}/u.test(token)) return match.index;
		const word = token.toLowerCase();
		const begins =
			beginnings.has(word) || lexicon.compound?.(word) != null || foldEnding.test(word);
		if (begins && !/[\p{L}\p{N}]/u.test(text[match.index - 1] ?? '')) return match.index;
	}
	return null;
}

function readQuantity(patterns: Patterns, text: string, at: number, floor: number): Attempt {
	const number = readNumber(patterns, text, at);
	if (!number) return { quantity: null, resume: at + 1 };
	const first = withUnit(patterns, text, number, floor);
	const nothing: Attempt = { quantity: null, resume: afterToken(text, number) };
	if (!stands(patterns, text, first)) return nothing;

	const range = readRange(patterns, text, first, floor);
	if (range) return range.quantity || number.form !== 'article' ? range : nothing;

	const hedge = readHedge(patterns, text, first.start, floor);
	if (!isQuantity(patterns, text, first, hedge)) return nothing;
	return { quantity: quantityOf(patterns, text, first, hedge), resume: first.end };
}

/** After a number that isn't read: past its digits or its word, so that “W4” doesn't stop at every sign. */
function afterToken(text: string, number: NumberRead): number {
	return number.form === 'numeral'
		? number.end
		: Math.min(number.end, number.start + wordLength(text, number.start));
}

function wordLength(text: string, at: number): number {
	return /^[\p{L}\p{N}]+/u.exec(text.slice(at, at + 40))?.[0].length ?? 1;
}

/** Words that are a quantity only in company: “one metre”, not “one”; “about a metre”, not “a metre”. */
function isQuantity(patterns: Patterns, text: string, part: Part, hedge: Hedge): boolean {
	const { number, unit } = part;
	const alone = unit === '' && number.scale === 1;
	switch (number.form) {
		case 'article':
			return unit !== '' && (hedge.family !== 'bare' || !isLoose(patterns, unit));
		case 'word':
			if (!alone) return true;
			if (['0', '1'].includes(number.numeral) || readAt(patterns.clockAfter, text, number.end))
				return false;
			return !isName(patterns, text, number);
		case 'fraction':
			return !patterns.fractionNounBefore.test(
				text.slice(Math.max(0, number.start - 24), number.start)
			);
		case 'numeral':
			if (!alone) return true;
			if (isYear(patterns, text, number, hedge) || isName(patterns, text, number)) return false;
			return hedge.family !== 'bare' || part.negative || !isLabel(patterns, text, number);
		default:
			return true;
	}
}

function isLoose({ lexicon: { loosely } }: Patterns, unit: string): boolean {
	return loosely === 'all' || loosely.includes(unit);
}

function quantityOf(patterns: Patterns, text: string, part: Part, hedge: Hedge): DetectedQuantity {
	const { number, unit } = part;
	const kind = kindOf(patterns, text, part);
	const numeral = (part.negative ? '-' : '') + number.numeral;
	const weighed = kind !== 'order-word' && kind !== 'small-word' && kind !== 'uncertainty';
	const quantity = quantityWord(patterns, text, part.end);
	const stated: Stated | null = weighed
		? {
				hedge: hedge.family,
				hedgeWord: hedge.word,
				numeral,
				scale: number.scale,
				unit,
				...unitWord(patterns, part),
				...(number.fraction ? { fraction: number.fraction } : {}),
				...(quantity ? { quantity } : {})
			}
		: null;
	return {
		start: hedge.start,
		end: part.end,
		surface: text.slice(hedge.start, part.end),
		kind,
		value: valueOf(part),
		unit,
		hedge: hedge.word,
		doubleHedge: hedge.double,
		stated
	};
}

function unitWord({ lexicon }: Patterns, { unit, unitWord: word }: Part): Pick<Stated, 'unitWord'> {
	const printed = printWordsOf(lexicon.language).units(unit);
	return !word || printed?.includes(word) ? {} : { unitWord: word };
}

const SPACES = sticky(GAP);

function quantityWord({ quantityWords }: Patterns, text: string, at: number): string | undefined {
	const gap = readAt(SPACES, text, at);
	return gap ? quantityWords.read(text, at + gap[0].length)?.value : undefined;
}

function kindOf(patterns: Patterns, text: string, { number, unit }: Part): QuantityForm {
	switch (number.form) {
		case 'numeral':
		case 'word':
		case 'article':
			if (unit === '%') return 'percent';
			return unit === 'times' || (unit === '' && isFactor(patterns, text, number))
				? 'multiple'
				: 'number';
		default:
			return number.form;
	}
}

/** “a factor of 8”. */
function isFactor({ factorBefore }: Patterns, text: string, { start }: NumberRead): boolean {
	return factorBefore.test(text.slice(Math.max(0, start - 24), start));
}
