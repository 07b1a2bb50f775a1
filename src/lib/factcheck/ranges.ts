/** Ranges: “2–3 km”, “between 2 and 3 kilometres”, “von 2 bis 3”, “de 2 a 3”. */
import type { DetectedQuantity } from './detected.ts';
import { readHedge, type Hedge } from './hedge-before.ts';
import { isName } from './not-quantities.ts';
import { readNumber } from './numbers.ts';
import { endsCleanly, valueOf, withUnit, type Part } from './parts.ts';
import type { Patterns } from './patterns.ts';
import { readAt } from './text-patterns.ts';

export interface Attempt {
	quantity: DetectedQuantity | null;
	/** Where to go on. */
	resume: number;
}

/** “2–3 km”, “between 2 and 3 km”, “from 2 to 3 km”: unit and scale once, at the end, stand for both. */
export function readRange(
	patterns: Patterns,
	text: string,
	first: Part,
	floor: number
): Attempt | null {
	const hedge = aroundOnly(readHedge(patterns, text, first.start, floor), first.start);
	const ahead = text.slice(Math.max(floor, hedge.start - 24), hedge.start);
	const lead = patterns.betweenBefore.exec(ahead) ?? patterns.fromBefore.exec(ahead);
	const isBetween = lead !== null && patterns.betweenBefore.test(ahead);
	const joint =
		(first.number.form === 'numeral' && readAt(patterns.rangeDash, text, first.end)) ||
		(isBetween && readAt(patterns.rangeAnd, text, first.end)) ||
		readAt(patterns.rangeTo, text, first.end);
	if (!joint || !(isCount(first) || isOneOf(patterns, first))) return null;
	const second = readSecond(patterns, text, first.end + joint[0].length);
	if (!second || !isFarCount(second)) return null;
	const isWords = [first, second].some(
		({ number: { form } }) => form === 'word' || form === 'article'
	);
	const hasUnit = first.unit !== '' || second.unit !== '';
	if (isWords && !lead && !hasUnit) return null;
	const areYears =
		!hasUnit &&
		[first, second].every(({ number }) => number.bareDigits && /^[12]\d{3}$/.test(number.numeral));
	const isNamed = !hasUnit && isName(patterns, text, first.number);
	if (areYears || isNamed) return { quantity: null, resume: second.end };

	const unit = second.unit || first.unit;
	const scaled =
		first.number.scale === 1 && first.unit === ''
			? { ...first.number, scale: second.number.scale }
			: first.number;
	const low = valueOf({ ...first, number: scaled });
	const high = valueOf(second);
	const start = hedge.start - (lead?.[0].length ?? 0);
	const quantity: DetectedQuantity = {
		start,
		end: second.end,
		surface: text.slice(start, second.end),
		kind: 'range',
		value: null,
		...(low === null || high === null ? {} : { ends: [low, high] as const }),
		unit,
		hedge: hedge.word,
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

/** “ein bis zwei Grad”, “de uno a dos grados”: where “one” and “a” are the same word. */
function isOneOf({ lexicon: { loosely } }: Patterns, { number }: Part): boolean {
	return number.form === 'article' && loosely !== 'all';
}

/** The far end may be a multiple as well: “drei- bis viermal”. */
function isFarCount(part: Part): boolean {
	return isCount(part) || part.number.form === 'multiple';
}

/** The far end of a range, with its own sign. */
function readSecond(patterns: Patterns, text: string, at: number): Part | null {
	const sign = readAt(patterns.sign, text, at)?.[0] ?? '';
	const place = at + sign.length;
	const number = readNumber(patterns, text, place);
	if (!number || number.form === 'article') {
		const article = readAt(patterns.rangeArticle, text, at)?.[0].length;
		return article ? readSecond(patterns, text, at + article) : null;
	}
	const part = withUnit(patterns, text, number, place);
	return endsCleanly(patterns, text, part)
		? { ...part, negative: sign !== '' && sign !== '+' }
		: null;
}
