/** What `reader-words.ts` gives, for a reader's frame: English, and the language of its piece once that is loaded. */
import type { Language } from '../widget/language.ts';
import { en, type ReaderWords } from './reader-words/en.ts';

export type { ReaderWords } from './reader-words/en.ts';

const LOADERS = {
	de: async () => (await import('./reader-words/de.ts')).de,
	es: async () => (await import('./reader-words/es.ts')).es
};

const loaded = new Map<Language, ReaderWords>([['en', en]]);

/** @throws {RangeError} when nothing has loaded the language's words. */
export function readerWords(language: Language): ReaderWords {
	const words = loaded.get(language);
	if (!words) throw new RangeError(`The widget’s own words in “${language}” aren’t loaded.`);
	return words;
}

export async function loadReaderWords(language: Language): Promise<void> {
	if (language !== 'en') loaded.set(language, await LOADERS[language]());
}
