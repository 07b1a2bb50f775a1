/** What looks like a quantity and isn't: dates, times, years, list numbers, and names that carry a number. */
import type { HedgeFamily } from '../widget/stated.ts';
import type { NumberRead } from './number-read.ts';
import type { Patterns } from './patterns.ts';
import { readAt } from './text-patterns.ts';

export interface Skips {
	/** The end of the stretch that covers this place; null when none does. Ask in rising order. */
	find(place: number): number | null;
}

/** Stretches of text to step over, found in one pass. */
export function skippedSpans({ notQuantities }: Patterns, text: string): Skips {
	const spans = [...text.matchAll(notQuantities)].map((match) => ({
		start: match.index,
		end: match.index + match[0].length
	}));
	let index = 0;
	return {
		find(place) {
			while (index < spans.length && (spans[index]?.end ?? 0) <= place) index += 1;
			const span = spans[index];
			return span && span.start <= place ? span.end : null;
		}
	};
}

/**
 * Four bare digits after “in”, “since”, a bracket or a name. A one-sided hedge makes them a number again, unless the hedge
 * is itself a word for a time, as “hasta” and “bis” are.
 */
export function isYear(
	patterns: Patterns,
	text: string,
	number: NumberRead,
	hedge: { family: HedgeFamily; word: string; start: number }
): boolean {
	if (!number.bareDigits || !/^(?:1\d|20)\d\d$/.test(number.numeral)) return false;
	const { yearBefore, yearPerhapsBefore, lexicon } = patterns;
	const tells = lexicon.beforeYear.includes(hedge.word.toLowerCase());
	if (hedge.family !== 'bare' && hedge.family !== 'around' && !tells) return false;
	if (!lexicon.yearsStandAlone && tells) return true;
	const before = text.slice(Math.max(0, hedge.start - 24), hedge.start);
	if (yearBefore.test(before)) return true;
	if (lexicon.yearsStandAlone) return !isCounted(text, number.end);
	if (/\p{Lu}[\p{L}’'-]*,?[\s\u00a0]+$/u.test(before)) return true;
	const maybe = yearPerhapsBefore.test(before) || opensSentence(text, hedge.start);
	return maybe && !isCounted(text, number.end);
}

/**
 * A noun follows that can be counted: one with a capital where nouns have one, else one that ends like a plural and is no
 * word that often comes after a year.
 */
function isCounted(text: string, at: number): boolean {
	const word = /^[\s\u00a0\u202f]+(\p{L}+)/u.exec(text.slice(at, at + 40))?.[1];
	return (
		word !== undefined &&
		(/^\p{Lu}/u.test(word) || /(?<!^(?:i|wa|ha|doe|thi|mi|tra|e))s$/u.test(word))
	);
}

/** “Figure 3”, “Planck 2018”, “Chapter Two”: a numbered noun, or a capital inside a sentence, makes a number a name. */
export function isName(patterns: Patterns, text: string, number: NumberRead): boolean {
	const { numberedBefore, introducedBefore, lexicon } = patterns;
	const before = text.slice(Math.max(0, number.start - 40), number.start);
	if (numberedBefore.test(before)) return true;
	if (number.form === 'word') {
		return (
			/^\p{Lu}/u.test(text.slice(number.start, number.start + 2)) &&
			!opensSentence(text, number.start)
		);
	}
	const capital = /(?<![\p{L}’'-])\p{Lu}[\p{L}’'-]*[\s\u00a0]+$/u.exec(before);
	if (capital === null) return false;
	// “NGC 1300” is a name wherever it stands; any other word has a capital where a sentence opens.
	const isAcronym = /^\p{Lu}{2,}[\s\u00a0]/u.test(capital[0]);
	if (!isAcronym && opensSentence(text, number.start - capital[0].length)) return false;
	return (
		!lexicon.capitalNouns || (!introducedBefore.test(before) && !isDescribed(text, number.end))
	);
}

/** Where every noun has a capital: a noun follows, or an adjective before one, so the number counts something. */
function isDescribed(text: string, at: number): boolean {
	return /^[\s\u00a0\u202f]+(?:\p{Lu}|\p{Ll}+(?:e|en|er|es)(?!\p{L}))/u.test(
		text.slice(at, at + 40)
	);
}

/** “on flight 815”, “el recuadro 2”: the number is the noun's name, where nothing follows that it could count. */
export function isLabel({ labelBefore, of }: Patterns, text: string, number: NumberRead): boolean {
	if (!number.bareDigits || number.numeral.length > 4) return false;
	const before = text.slice(Math.max(0, number.start - 40), number.start);
	return labelBefore.test(before) && !isCounted(text, number.end) && !readAt(of, text, number.end);
}

function opensSentence(text: string, place: number): boolean {
	const before = text.slice(Math.max(0, place - 6), place);
	return place === 0 || /^\s*$|[.!?…:\n]["'”’)\]]*\s*$|["“‘([–—]\s*$/u.test(before);
}
