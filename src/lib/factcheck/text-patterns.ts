/** Building blocks of the patterns that read running text. */

/** White space that may stand between the words of one quantity, the narrow and no-break ones among it. */
export const GAP = '[\\s\\u00a0\\u202f\\u2009]+';
export const SPACE = '[\\s\\u00a0\\u202f\\u2009]';
/** A space between groups of digits. */
export const GROUP_SPACE = '[ \\u00a0\\u202f\\u2009]';
export const WORD_END = '(?![\\p{L}\\p{N}])';
export const WORD_START = '(?<![\\p{L}\\p{N}])';

export function escape(text: string): string {
	return text.replace(/[.*+?^${}()|[\]\\/]/g, '\\$&');
}

/** Alternatives, the longest first, with any white space between their words; none matches nothing at all. */
export function oneOf(words: Iterable<string>): string {
	const sorted = [...words].sort((a, b) => b.length - a.length);
	return sorted.length === 0
		? '(?!)'
		: sorted.map((word) => escape(word).replace(/ /g, GAP)).join('|');
}

export const sticky = (source: string, flags = 'iuy') => new RegExp(source, flags);

/** Moves a sticky pattern to a place and reads there. */
export function readAt(pattern: RegExp, text: string, at: number): RegExpExecArray | null {
	pattern.lastIndex = at;
	return pattern.exec(text);
}

/** Small letters, single spaces, so that a phrase compares as the lexicon writes it. */
export function plainPhrase(phrase: string): string {
	return phrase
		.trim()
		.toLowerCase()
		.replace(/[\s\u00a0\u202f\u2009]+/gu, ' ');
}

const LETTERS = /\p{L}+/uy;

/** The run of letters at a place, in small letters; '' where there is none. */
export function wordAt(text: string, at: number): string {
	return readAt(LETTERS, text, at)?.[0].toLowerCase() ?? '';
}
