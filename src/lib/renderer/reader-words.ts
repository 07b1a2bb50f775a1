/** What the widget itself says to readers, in the language of the piece. Plain words; the trade's stay in the office. */
import type { Language } from '../widget/language.ts';
import { de } from './reader-words/de.ts';
import { en } from './reader-words/en.ts';
import { es } from './reader-words/es.ts';

export type ReaderWords = typeof en;

const BY_LANGUAGE: Record<Language, ReaderWords> = { en, de, es };

export function readerWords(language: Language): ReaderWords {
	return BY_LANGUAGE[language];
}
