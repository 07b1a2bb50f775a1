/**
 * What the widget itself says to readers, in the language of the piece. Plain words; the trade's stay in the office. A
 * reader's frame carries one language: its build takes `reader-words-later.ts` in place of this file.
 */
import type { Language } from '../widget/language.ts';
import { de } from './reader-words/de.ts';
import { en, type ReaderWords } from './reader-words/en.ts';
import { es } from './reader-words/es.ts';

export type { ReaderWords } from './reader-words/en.ts';

const BY_LANGUAGE: Record<Language, ReaderWords> = { en, de, es };

export function readerWords(language: Language): ReaderWords {
	return BY_LANGUAGE[language];
}

/** Afterwards the widget speaks the language. Here it speaks them all from the start. */
export async function loadReaderWords(_language: Language): Promise<void> {}
