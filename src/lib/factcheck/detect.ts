/**
 * Finds the quantities in prose as it is typed: number, scale, unit and hedge, as one stretch of text. Dates, years,
 * ordinals and names with digits are left alone. Time grows with the length of the text and no faster.
 */
import type { Stated } from '../widget/stated.ts';
import { unitOf } from '../physics/units/units.ts';
import { readHedge, type Hedge } from './hedge-before.ts';
import { lexiconOf, plainPhrase, type Language } from './hedges.ts';
import { isName, isYear, skippedSpans } from './not-quantities.ts';
import { readAt, readNumber, type NumberRead } from './numbers.ts';
import { endsCleanly, stands, valueOf, withUnit, type Part } from './parts.ts';
import { compile, type Patterns } from './patterns.ts';

export type QuantityForm =
	| 'number'
	| 'fraction'
	| 'multiple'
	| 'range'
	| 'percent'
	| 'power'
	| 'uncertainty'
	| 'order-word'
	| 'small-word';

export interface DetectedQuantity {
	/** UTF-16 offsets of `surface`, from the hedge to the unit. */
	start: number;
	end: number;
	surface: string;
	kind: QuantityForm;
	/** In `unit`; null where the words name no one number. */
	value: number | null;
	/** Both ends of a range, in `unit`. */
	ends?: readonly [low: number, high: number];
	/** A symbol of the unit table; '' for a plain number. */
	unit: string;
	/** The hedge as written; '' when bare. */
	hedge: string;
	/** Two hedges on one number, “about up to 15”. */
	doubleHedge: boolean;
	/** What is weighed; null for kinds that no rule in the house weighs yet. */
	stated: Stated | null;
}

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

function nextTrigger({ trigger }: Patterns, text: string, from: number): number | null {
	trigger.lastIndex = from;
	return trigger.exec(text)?.index ?? null;
}

interface Attempt {
	quantity: DetectedQuantity | null;
	/** Where to go on. */
	resume: number;
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
			return unit !== '' && hedge.family !== 'bare';
		case 'word':
			if (alone && Number(number.numeral) < 2) return false;
			return !(alone && isName(patterns, text, number));
		case 'fraction':
			return !patterns.halfNounBefore.test(
				text.slice(Math.max(0, number.start - 24), number.start)
			);
		case 'numeral':
			if (!alone) return true;
			if (isYear(patterns, text, number, hedge.family, hedge.start)) return false;
			return !isName(patterns, text, number);
		default:
			return true;
	}
}

function quantityOf(patterns: Patterns, text: string, part: Part, hedge: Hedge): DetectedQuantity {
	const { number, unit } = part;
	const kind = kindOf(patterns, part);
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
				...unitWord(part),
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

function unitWord({ unit, unitWord: word }: Part): Pick<Stated, 'unitWord'> {
	const words = unitOf(unit)?.words;
	return !word || word === words?.one || word === words?.many ? {} : { unitWord: word };
}

function quantityWord(patterns: Patterns, text: string, at: number): string | undefined {
	const word = readAt(patterns.quantityWord, text, at)?.groups?.word;
	return word && patterns.lexicon.quantities[plainPhrase(word)];
}

function kindOf({ lexicon }: Patterns, { number, unit }: Part): QuantityForm {
	switch (number.form) {
		case 'numeral':
		case 'word':
		case 'article':
			return unit === '%' ? 'percent' : unit === lexicon.times ? 'multiple' : 'number';
		default:
			return number.form;
	}
}

/** “2–3 km”, “between 2 and 3 km”, “from 2 to 3 km”: unit and scale once, at the end, stand for both. */
function readRange(patterns: Patterns, text: string, first: Part, floor: number): Attempt | null {
	const ahead = text.slice(Math.max(floor, first.start - 16), first.start);
	const lead = patterns.betweenBefore.exec(ahead) ?? patterns.fromBefore.exec(ahead);
	const isBetween = lead !== null && patterns.betweenBefore.test(ahead);
	const joint =
		(first.number.form === 'numeral' && readAt(patterns.rangeDash, text, first.end)) ||
		(isBetween && readAt(patterns.rangeAnd, text, first.end)) ||
		readAt(patterns.rangeTo, text, first.end);
	if (!joint || !isCount(first)) return null;
	const second = readSecond(patterns, text, first.end + joint[0].length);
	if (!second || !isCount(second)) return null;
	const isWords = first.number.form === 'word' || second.number.form === 'word';
	const hasUnit = first.unit !== '' || second.unit !== '';
	if (isWords && !lead && !hasUnit) return null;
	const areYears =
		!hasUnit &&
		[first, second].every(({ number }) => number.bareDigits && /^[12]\d{3}$/.test(number.numeral));
	if (areYears) return { quantity: null, resume: second.end };

	const unit = second.unit || first.unit;
	const scaled =
		first.number.scale === 1 && first.unit === ''
			? { ...first.number, scale: second.number.scale }
			: first.number;
	const low = valueOf({ ...first, number: scaled });
	const high = valueOf(second);
	const hedge = aroundOnly(readHedge(patterns, text, first.start, floor), first.start);
	const start = lead ? first.start - lead[0].length : hedge.start;
	const quantity: DetectedQuantity = {
		start,
		end: second.end,
		surface: text.slice(start, second.end),
		kind: 'range',
		value: null,
		...(low === null || high === null ? {} : { ends: [low, high] as const }),
		unit,
		hedge: lead ? '' : hedge.word,
		doubleHedge: false,
		stated: null
	};
	return { quantity, resume: second.end };
}

/** “About 2–3 km” hedges a range; “over 2–3 km” only says where. */
function aroundOnly(hedge: Hedge, start: number): Hedge {
	return hedge.family === 'around' ? hedge : { family: 'bare', word: '', start, double: false };
}

function isCount({ number }: Part): boolean {
	return number.form === 'numeral' || number.form === 'word' || number.form === 'power';
}

/** The far end of a range, with its own sign. */
function readSecond(patterns: Patterns, text: string, at: number): Part | null {
	const sign = readAt(patterns.sign, text, at)?.[0] ?? '';
	const number = readNumber(patterns, text, at + sign.length);
	if (!number || number.form === 'article') return null;
	const part = withUnit(patterns, text, number, at + sign.length);
	return endsCleanly(patterns, text, part)
		? { ...part, negative: sign !== '' && sign !== '+' }
		: null;
}
