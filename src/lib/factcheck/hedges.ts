/** Hedge words and the families the rules know them by. */
import type { HedgeFamily } from '../widget/stated.ts';
import { english } from './lexicon/en.ts';
import type { Lexicon } from './lexicon/lexicon.ts';

/** Languages whose lexicon is in the house. */
export const LANGUAGES = ['en'] as const;
export type Language = (typeof LANGUAGES)[number];

const LEXICONS: Readonly<Record<Language, Lexicon>> = { en: english };

export function lexiconOf(language: Language): Lexicon {
	return LEXICONS[language];
}

/** The family of a hedge written alone; '' and “bare” are no hedge, and an unknown word is undefined. */
export function hedgeFamily(word: string, language: Language): HedgeFamily | undefined {
	const plain = plainPhrase(word);
	if (plain === '' || plain === 'bare') return 'bare';
	return hedgeWords(LEXICONS[language]).get(plain);
}

/** Small letters, single spaces, so that a phrase compares as the lexicon writes it. */
export function plainPhrase(phrase: string): string {
	return phrase
		.trim()
		.toLowerCase()
		.replace(/[\s\u00a0\u202f\u2009]+/gu, ' ');
}

/** Every hedge word with its family. */
export function hedgeWords(lexicon: Lexicon): ReadonlyMap<string, HedgeFamily> {
	return new Map(
		(Object.entries(lexicon.hedges) as [HedgeFamily, readonly string[]][]).flatMap(
			([family, words]) => words.map((word) => [word, family] as const)
		)
	);
}
