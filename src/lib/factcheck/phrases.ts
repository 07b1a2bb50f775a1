/** Tables of phrases, found by their first word, so that reading doesn't slow down with the size of a table. */
import { oneOf, plainPhrase, readAt, sticky, wordAt, WORD_END } from './text-patterns.ts';

export interface PhraseRead<T> {
	value: T;
	/** As the table writes it. */
	phrase: string;
	end: number;
}

export interface Phrases<T> {
	/** The longest phrase that begins at a place and ends where its last word does. */
	read(text: string, at: number): PhraseRead<T> | null;
	readonly firstWords: readonly string[];
}

/** Phrases begin with a letter; where one comes twice, the first counts. */
export function phrasesOf<T>(entries: Iterable<readonly [phrase: string, value: T]>): Phrases<T> {
	const values = new Map<string, T>();
	const groups = new Map<string, string[]>();
	for (const [written, value] of entries) {
		const phrase = plainPhrase(written);
		const first = wordAt(phrase, 0);
		if (values.has(phrase) || first === '') continue;
		values.set(phrase, value);
		groups.set(first, [...(groups.get(first) ?? []), phrase]);
	}
	const compiled = new Map<string, RegExp>();
	function patternOf(first: string, group: readonly string[]): RegExp {
		const known = compiled.get(first);
		if (known) return known;
		const pattern = sticky(`(?:${oneOf(group)})${WORD_END}`);
		compiled.set(first, pattern);
		return pattern;
	}
	return {
		firstWords: [...groups.keys()],
		read(text, at) {
			const first = wordAt(text, at);
			const group = groups.get(first);
			if (!group) return null;
			const match = readAt(patternOf(first, group), text, at);
			if (!match) return null;
			const phrase = plainPhrase(match[0]);
			const value = values.get(phrase);
			return value === undefined ? null : { value, phrase, end: at + match[0].length };
		}
	};
}
