/** Reads one number forward from a place in a text: numerals, number words, fractions, multiples, order and small words. */
import { readFraction, readSlashFraction, vulgarAt } from './fractions.ts';
import { readNumberWord, withScale } from './number-words.ts';
import { addParts, type NumberRead } from './number-read.ts';
import { VULGAR_FRACTIONS, type Patterns } from './patterns.ts';
import { GAP, readAt, sticky, wordAt } from './text-patterns.ts';

/** The number that begins at `at`, the longest reading first; null when there is none. */
export function readNumber(patterns: Patterns, text: string, at: number): NumberRead | null {
	if (/[^\p{L}]/u.test(text[at] ?? '')) {
		return readPower(patterns, text, at) ?? readNumeral(patterns, text, at);
	}
	return (
		readSmallWord(patterns, text, at) ??
		readFraction(patterns, text, at) ??
		readMultiple(patterns, text, at) ??
		readOrderWord(patterns, text, at) ??
		readNumberWord(patterns, text, at) ??
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
	const fraction = vulgarAt(text, at) ?? readSlashFraction(patterns, text, at);
	if (fraction) return fraction;
	const match = matchNumeral(patterns, text, at);
	if (!match) return null;
	const { whole = '', decimals = '', exponent, vulgar: tail } = match.groups ?? {};
	const after = decimals.replace(/\D/g, '');
	const digits = (whole || '0').replace(/\D/g, '') + (after && `.${after}`);
	const end = at + match[0].length;
	const read: NumberRead = {
		form: 'numeral',
		start: at,
		end,
		numeral: tail ? addParts(digits, VULGAR_FRACTIONS[tail]) : digits,
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
	if (fold) return foldRead(patterns, read, fold, end + fold[0].length);
	return withScale(patterns, text, unsure);
}

function matchNumeral(patterns: Patterns, text: string, at: number): RegExpExecArray | null {
	for (const pattern of patterns.numerals) {
		const match = readAt(pattern, text, at);
		if (match && match[0] !== '') return match;
	}
	return null;
}

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

function powerOf(match: RegExpExecArray): number {
	const { caret, raised, said } = match.groups ?? {};
	const plain =
		caret ??
		said?.replace(/^[^\d]+/u, '-') ??
		[...(raised ?? '')].map((sign) => (sign === '⁻' ? '-' : RAISED.indexOf(sign))).join('');
	return Number(`1e${Number(plain.replace('−', '-'))}`);
}

function foldRead(
	{ lexicon }: Patterns,
	read: NumberRead,
	fold: RegExpExecArray,
	end: number
): NumberRead {
	const unit = lexicon.folds[(fold.groups?.fold ?? '').toLowerCase()];
	return { ...read, form: 'multiple', end, ...(unit ? { unit } : {}), bareDigits: false };
}

/** “twice”, “das Doppelte”, “tenfold”, “das Zehnfache”. */
function readMultiple(patterns: Patterns, text: string, at: number): NumberRead | null {
	const found = patterns.multiples.read(text, at);
	if (found && mayStand(text, at, found.end, found.value)) {
		const numeral = String(found.value.value);
		return { form: 'multiple', start: at, end: found.end, numeral, scale: 1 };
	}
	const article = readAt(patterns.foldArticle, text, at);
	const start = at + (article?.[0].length ?? 0);
	const fold = readAt(patterns.foldWord, text, start);
	const { stem, fold: ending } = fold?.groups ?? {};
	const value = stem === undefined ? null : wholeWord(patterns, stem.toLowerCase());
	if (!fold || value === null || value <= 1) return null;
	// “das Zehnfache” is one noun; “das zweimal” is not.
	if (article && patterns.lexicon.folds[ending?.toLowerCase() ?? ''] !== '') return null;
	const read: NumberRead = {
		form: 'multiple',
		start: at,
		end: at,
		numeral: String(value),
		scale: 1
	};
	return foldRead(patterns, read, fold, start + fold[0].length);
}

function mayStand(
	text: string,
	start: number,
	end: number,
	{ needs, after }: Patterns['lexicon']['multiples'][number]
): boolean {
	if (after && !after.includes(wordBefore(text, start))) return false;
	return !needs || needs.includes(wordAfter(text, end));
}

function wordBefore(text: string, at: number): string {
	return (
		/(\p{L}+)[\s\u00a0\u202f]+$/u.exec(text.slice(Math.max(0, at - 16), at))?.[1]?.toLowerCase() ??
		''
	);
}

const ANY_GAP = sticky(GAP);

function wordAfter(text: string, at: number): string {
	const gap = readAt(ANY_GAP, text, at);
	return gap ? wordAt(text, at + gap[0].length) : '';
}

function wholeWord({ lexicon }: Patterns, word: string): number | null {
	return lexicon.cardinals[word] ?? lexicon.compound?.(word) ?? lexicon.scales[word] ?? null;
}

/** “dozens of”, “hundreds of thousands of”. */
function readOrderWord(patterns: Patterns, text: string, at: number): NumberRead | null {
	const { lexicon } = patterns;
	let found = patterns.orderWords.read(text, at);
	if (!found) return null;
	let { end, value: scale } = found;
	for (;;) {
		const of = readAt(patterns.of, text, end);
		const gap = readAt(ANY_GAP, text, of ? of.index + of[0].length : end);
		found = gap && patterns.orderWords.read(text, gap.index + gap[0].length);
		if (!found) break;
		scale *= found.value;
		end = found.end;
	}
	if (lexicon.orderNeedsOf && !readAt(patterns.of, text, end)) return null;
	if (!lexicon.orderNeedsOf && wordAfter(text, end) === '') return null;
	return { form: 'order-word', start: at, end, numeral: '', scale };
}

/** “a few”, “several hundred”, “varios cientos”. */
function readSmallWord(patterns: Patterns, text: string, at: number): NumberRead | null {
	const found = patterns.smallWords.read(text, at);
	if (!found) return null;
	const read: NumberRead = {
		form: 'small-word',
		start: at,
		end: found.end,
		numeral: found.value === null ? '' : String(found.value),
		scale: 1
	};
	const hundred = readAt(patterns.hundred, text, read.end);
	if (hundred) return { ...read, scale: 100, end: read.end + hundred[0].length };
	const gap = readAt(ANY_GAP, text, read.end);
	const order = gap && patterns.orderWords.read(text, read.end + gap[0].length);
	if (order) return withScale(patterns, text, { ...read, scale: order.value, end: order.end });
	return withScale(patterns, text, read);
}

function readArticle(patterns: Patterns, text: string, at: number): NumberRead | null {
	const found = patterns.articles.read(text, at);
	return found && { form: 'article', start: at, end: found.end, numeral: '1', scale: 1 };
}
