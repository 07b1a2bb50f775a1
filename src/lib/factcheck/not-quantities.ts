/** What looks like a quantity and isn't: dates, times, years, list numbers, and names that carry a number. */
import type { HedgeFamily } from '../widget/stated.ts';
import type { NumberRead } from './numbers.ts';
import type { Patterns } from './patterns.ts';

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

/** Four bare digits after “in”, “since”, a bracket or a name. A one-sided hedge makes them a number again. */
export function isYear(
	{ yearBefore, yearPerhapsBefore }: Patterns,
	text: string,
	number: NumberRead,
	hedge: HedgeFamily,
	hedgeStart: number
): boolean {
	if (!number.bareDigits || !/^[12]\d{3}$/.test(number.numeral)) return false;
	if (hedge !== 'bare' && hedge !== 'around') return false;
	const before = text.slice(Math.max(0, hedgeStart - 24), hedgeStart);
	if (yearBefore.test(before) || /\p{Lu}[\p{L}’'-]*[\s\u00a0]+$/u.test(before)) return true;
	return (
		yearPerhapsBefore.test(before) &&
		!/^[\s\u00a0]\p{L}/u.test(text.slice(number.end, number.end + 2))
	);
}

/** “Figure 3”, “Planck 2018”, “Chapter Two”: a numbered noun, or a capital inside a sentence, makes a number a name. */
export function isName({ numberedBefore }: Patterns, text: string, number: NumberRead): boolean {
	const before = text.slice(Math.max(0, number.start - 40), number.start);
	if (numberedBefore.test(before)) return true;
	if (number.form === 'word') {
		return (
			/^\p{Lu}/u.test(text.slice(number.start, number.start + 2)) &&
			!opensSentence(text, number.start)
		);
	}
	const capital = /(?<![\p{L}’'-])\p{Lu}[\p{L}’'-]*[\s\u00a0]+$/u.exec(before);
	return capital !== null && !opensSentence(text, number.start - capital[0].length);
}

function opensSentence(text: string, place: number): boolean {
	const before = text.slice(Math.max(0, place - 6), place);
	return place === 0 || /^\s*$|[.!?…:\n]["'”’)\]]*\s*$|["“‘([–—]\s*$/u.test(before);
}
