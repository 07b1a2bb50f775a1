/** Hedge words and the families the rules know them by. */
import type { Language } from '../widget/language.ts';
import type { HedgeFamily } from '../widget/stated.ts';
import type { Lexicon } from './lexicon/lexicon.ts';
import { lexiconOf } from './lexicon/shelf.ts';
import { plainPhrase } from './text-patterns.ts';

/**
 * The family of a hedge written alone; '' and “bare” are no hedge, and an unknown word is undefined.
 * @throws {RangeError} as `lexiconOf` does.
 */
export function hedgeFamily(word: string, language: Language): HedgeFamily | undefined {
	const plain = plainPhrase(word);
	if (plain === '' || plain === 'bare') return 'bare';
	return hedgeWords(lexiconOf(language)).get(plain);
}

/** Every hedge word with its family. */
export function hedgeWords(lexicon: Lexicon): ReadonlyMap<string, HedgeFamily> {
	return new Map(
		(Object.entries(lexicon.hedges) as [HedgeFamily, readonly string[]][]).flatMap(
			([family, words]) => words.map((word) => [word, family] as const)
		)
	);
}

/** “cerca de” is read as “about” by some and as “just below” by others: it weighs as around, and is asked about. */
const READ_TWO_WAYS: ReadonlySet<string> = new Set(['cerca de', 'cerca del']);

export function isReadTwoWays(hedgeWord: string): boolean {
	return READ_TWO_WAYS.has(plainPhrase(hedgeWord));
}
