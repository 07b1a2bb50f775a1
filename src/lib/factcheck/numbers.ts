/** Reads one number forward from a place in a text: numerals, number words, fractions, multiples, order and small words. */
import { VULGAR_FRACTIONS, type Patterns } from './patterns.ts';

export type NumberForm =
	| 'numeral'
	| 'word'
	/** “a” or “an”, which counts as one only before a unit. */
	| 'article'
	| 'fraction'
	| 'multiple'
	| 'power'
	| 'uncertainty'
	| 'order-word'
	| 'small-word';

export interface NumberRead {
	form: NumberForm;
	start: number;
	end: number;
	/** Decimal text; '' for words that name no one number. */
	numeral: string;
	scale: number;
	fraction?: readonly [over: number, under: number];
	/** A numeral of bare digits, as a year is written. */
	bareDigits?: boolean;
}

/** Moves a sticky pattern to a place and reads there. */
export function readAt(pattern: RegExp, text: string, at: number): RegExpExecArray | null {
	pattern.lastIndex = at;
	return pattern.exec(text);
}

/** The number that begins at `at`, the longest reading first; null when there is none. */
export function readNumber(patterns: Patterns, text: string, at: number): NumberRead | null {
	return (
		readPower(patterns, text, at) ??
		readNumeral(patterns, text, at) ??
		readSmallWord(patterns, text, at) ??
		readFraction(patterns, text, at) ??
		readMultiple(patterns, text, at) ??
		readOrderWord(patterns, text, at) ??
		readWord(patterns, text, at) ??
		readArticle(patterns, text, at)
	);
}

function readPower(patterns: Patterns, text: string, at: number): NumberRead | null {
	const match = readAt(patterns.barePower, text, at);
	if (!match) return null;
	return {
		form: 'power',
		start: at,
		end: at + match[0].length,
		numeral: '1',
		scale: powerOf(match)
	};
}

function readNumeral(patterns: Patterns, text: string, at: number): NumberRead | null {
	const vulgar = VULGAR_FRACTIONS[text[at] ?? ''];
	if (vulgar) return fractionRead(at, at + 1, vulgar);
	const slash = readAt(patterns.slashFraction, text, at);
	if (slash && Number(slash.groups?.over) < Number(slash.groups?.under)) {
		return fractionRead(at, at + slash[0].length, [
			Number(slash.groups?.over),
			Number(slash.groups?.under)
		]);
	}
	const match = readAt(patterns.numeral, text, at);
	if (!match || match[0] === '') return null;
	const { whole = '', decimals = '', exponent, vulgar: tail } = match.groups ?? {};
	const digits = (whole || '0').replace(/\D/g, '') + decimals.replace(/[^\d.]/g, '');
	const end = at + match[0].length;
	const numeral = tail ? addFraction(digits, VULGAR_FRACTIONS[tail]) : digits;
	const read: NumberRead = {
		form: 'numeral',
		start: at,
		end,
		numeral,
		scale: 1,
		bareDigits: /^\d+$/.test(match[0])
	};
	if (exponent) return { ...read, form: 'power', scale: Number(`1e${Number(exponent)}`) };
	const spread = readAt(patterns.uncertainty, text, end);
	const unsure: NumberRead = spread
		? { ...read, form: 'uncertainty', end: end + spread[0].length }
		: read;
	const power = readAt(patterns.timesPower, text, unsure.end);
	if (power) {
		const form = unsure.form === 'uncertainty' ? 'uncertainty' : 'power';
		return { ...unsure, form, end: unsure.end + power[0].length, scale: powerOf(power) };
	}
	const fold = readAt(patterns.foldSuffix, text, end);
	if (fold) return { ...read, form: 'multiple', end: end + fold[0].length };
	return withScale(patterns, text, unsure);
}

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

function powerOf(match: RegExpExecArray): number {
	const { caret, raised } = match.groups ?? {};
	const plain = caret
		? caret.replace('−', '-')
		: [...(raised ?? '')].map((sign) => (sign === '⁻' ? '-' : RAISED.indexOf(sign))).join('');
	return Number(`1e${Number(plain)}`);
}

function addFraction(digits: string, fraction: readonly [number, number] | undefined): string {
	return fraction ? decimalText(Number(digits) + fraction[0] / fraction[1]) : digits;
}

/** Enough digits for a fraction told as a decimal, and no dust. */
function decimalText(value: number): string {
	return value.toFixed(12).replace(/\.?0+$/, '');
}

function withScale(patterns: Patterns, text: string, read: NumberRead): NumberRead {
	const match = readAt(patterns.scale, text, read.end);
	const scale = match?.groups?.scale && patterns.lexicon.scales[match.groups.scale.toLowerCase()];
	return match && scale
		? { ...read, scale: read.scale * scale, end: read.end + match[0].length, bareDigits: false }
		: read;
}

function readWord(patterns: Patterns, text: string, at: number): NumberRead | null {
	const first = readBelowThousand(patterns, text, at);
	if (!first) return null;
	const half = readAt(patterns.andAHalf, text, first.end);
	if (half) {
		const read: NumberRead = {
			...first,
			numeral: `${first.numeral}.5`,
			end: first.end + half[0].length
		};
		return withScale(patterns, text, read);
	}
	const scaled = withScale(patterns, text, first);
	if (scaled.scale !== 1000) return foldOr(patterns, text, scaled);
	return addRemainder(patterns, text, scaled);
}

function foldOr(patterns: Patterns, text: string, read: NumberRead): NumberRead {
	const fold = readAt(patterns.foldSuffix, text, read.end);
	return fold ? { ...read, form: 'multiple', end: read.end + fold[0].length } : read;
}

/** “two thousand five hundred” is one number. */
function addRemainder(patterns: Patterns, text: string, thousands: NumberRead): NumberRead {
	const gap = readAt(patterns.remainder, text, thousands.end);
	const rest = gap && readBelowThousand(patterns, text, thousands.end + gap[0].length);
	if (!rest) return thousands;
	const sum = Number(thousands.numeral) * 1000 + Number(rest.numeral);
	return { ...thousands, numeral: String(sum), scale: 1, end: rest.end };
}

function readBelowThousand(patterns: Patterns, text: string, at: number): NumberRead | null {
	const match = readAt(patterns.numberWord, text, at);
	if (!match) {
		const one = readAt(patterns.article, text, at);
		const read: NumberRead | null = one && {
			form: 'word',
			start: at,
			end: at + one[0].length,
			numeral: '1',
			scale: 1
		};
		const scaled = read && withScale(patterns, text, read);
		return scaled && scaled.scale !== 1 ? { ...scaled, scale: 1, end: read.end } : null;
	}
	const { hundreds, rest, below } = match.groups ?? {};
	const value = below
		? belowHundred(patterns, below)
		: 100 * (hundreds ? belowHundred(patterns, hundreds) : 1) +
			(rest ? belowHundred(patterns, rest) : 0);
	// “tenfold” is found by its stem; a number word must otherwise end where the word does.
	return { form: 'word', start: at, end: at + match[0].length, numeral: String(value), scale: 1 };
}

function belowHundred({ lexicon }: Patterns, words: string): number {
	return words
		.toLowerCase()
		.split(/[- ]/)
		.reduce((sum, word) => sum + (lexicon.ones[word] ?? lexicon.tens[word] ?? 0), 0);
}

/** “half a kelvin”, “a third”, “two-thirds of a million years”, “a hundredth of 1 per cent”. */
function readFraction(patterns: Patterns, text: string, at: number): NumberRead | null {
	const match = readAt(patterns.fraction, text, at);
	if (!match) return null;
	const { half, over, tens, under } = match.groups ?? {};
	const parts: readonly [number, number] = half
		? [1, 2]
		: [
				over ? belowHundred(patterns, over) : 1,
				(patterns.lexicon.denominators[(under ?? '').toLowerCase()] ?? 1) *
					(tens ? tensOf(patterns, tens) : 1)
			];
	const read = fractionRead(at, at + match[0].length, parts);
	const whole = readWhole(patterns, text, read, Boolean(half));
	if (whole) return whole;
	const standsAlone = parts[0] > 1 || Boolean(half);
	return standsAlone || readAt(patterns.afterFraction, text, read.end) ? read : null;
}

function tensOf(patterns: Patterns, word: string): number {
	return belowHundred(patterns, word) || 100;
}

/** What the fraction is of, where that is a number or one of something: its scale joins the fraction's. */
function readWhole(
	patterns: Patterns,
	text: string,
	read: NumberRead,
	isHalf: boolean
): NumberRead | null {
	const of = readAt(patterns.of, text, read.end);
	if (!of && !isHalf) return null;
	const from = read.end + (of?.[0].length ?? 0);
	const gap = /^[\s\u00a0\u202f]+/u.exec(text.slice(from, from + 4));
	if (!gap) return null;
	const at = from + gap[0].length;
	const [over, under] = read.fraction ?? [1, 1];
	const whole = readNumeral(patterns, text, at) ?? readWord(patterns, text, at);
	if (whole && Number(whole.numeral) && Number.isInteger(Number(whole.numeral))) {
		return {
			...fractionRead(read.start, whole.end, [over * Number(whole.numeral), under]),
			scale: whole.scale
		};
	}
	const article = readAt(patterns.article, text, at);
	const end = at + (article?.[0].length ?? 0);
	const unit = article && readAt(patterns.unitName, text, end);
	return unit ? fractionRead(read.start, end, [over, under]) : null;
}

function fractionRead(start: number, end: number, fraction: readonly [number, number]): NumberRead {
	return {
		form: 'fraction',
		start,
		end,
		numeral: decimalText(Number((fraction[0] / fraction[1]).toPrecision(3))),
		scale: 1,
		fraction
	};
}

function readMultiple(patterns: Patterns, text: string, at: number): NumberRead | null {
	const match = readAt(patterns.multiple, text, at);
	const multiple =
		match && patterns.lexicon.multiples.find(({ word }) => word === match[0].toLowerCase());
	if (!match || !multiple) return null;
	return {
		form: 'multiple',
		start: at,
		end: at + match[0].length,
		numeral: String(multiple.value),
		scale: 1
	};
}

function readOrderWord(patterns: Patterns, text: string, at: number): NumberRead | null {
	const match = readAt(patterns.orderWord, text, at);
	if (!match) return null;
	const { orderWords } = patterns.lexicon;
	const { first = '', second } = match.groups ?? {};
	const scale =
		(orderWords[first.toLowerCase()] ?? 1) * (second ? (orderWords[second.toLowerCase()] ?? 1) : 1);
	return { form: 'order-word', start: at, end: at + match[0].length, numeral: '', scale };
}

function readSmallWord(patterns: Patterns, text: string, at: number): NumberRead | null {
	const match = readAt(patterns.smallWord, text, at);
	if (!match) return null;
	const said = match[0].toLowerCase().replace(/[\s\u00a0]+/g, ' ');
	const value = patterns.lexicon.smallWords.find(({ word }) => word === said)?.value ?? null;
	const read: NumberRead = {
		form: 'small-word',
		start: at,
		end: at + match[0].length,
		numeral: value === null ? '' : String(value),
		scale: 1
	};
	const hundred = readAt(patterns.hundredAfter, text, read.end);
	if (hundred) return { ...read, scale: 100, end: read.end + hundred[0].length };
	return withScale(patterns, text, read);
}

function readArticle(patterns: Patterns, text: string, at: number): NumberRead | null {
	const match = readAt(patterns.article, text, at);
	return match && { form: 'article', start: at, end: at + match[0].length, numeral: '1', scale: 1 };
}
