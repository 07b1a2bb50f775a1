/**
 * What charts say, by language. English is always at hand; of the others a frame loads the one of its piece (`load.ts`),
 * and the server and the office have them all (`all.ts`).
 */
import type { Language } from '../../../widget/language.ts';
import { en } from './en.ts';

export type ChartWords = typeof en;

const shelf = new Map<Language, ChartWords>([['en', en]]);

export function putOnShelf(language: Language, words: ChartWords): void {
	shelf.set(language, words);
}

/** @throws {RangeError} when nothing has loaded the language's words. */
export function chartWordsOf(language: Language): ChartWords {
	const words = shelf.get(language);
	if (!words) throw new RangeError(`The words of charts in “${language}” aren’t loaded.`);
	return words;
}
