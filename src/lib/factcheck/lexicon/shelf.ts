/** The lexicons at hand. English always is; the others come by `load.ts`, one at a time, or all at once by `all.ts`. */
import type { Language } from '../../widget/language.ts';
import { english } from './en.ts';
import type { Lexicon } from './lexicon.ts';

const shelf = new Map<Language, Lexicon>([['en', english]]);

export function putOnShelf(lexicon: Lexicon): void {
	shelf.set(lexicon.language, lexicon);
}

export function hasLexicon(language: Language): boolean {
	return shelf.has(language);
}

/** @throws {RangeError} when nothing has loaded the language's lexicon. */
export function lexiconOf(language: Language): Lexicon {
	const lexicon = shelf.get(language);
	if (!lexicon) {
		throw new RangeError(`The lexicon of “${language}” isn’t loaded: call loadLexicon first.`);
	}
	return lexicon;
}
