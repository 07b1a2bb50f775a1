/** Loads the words of one language, so that a reader's frame carries no other. */
import type { Language } from '../language.ts';
import { hasPrintWords, putOnShelf } from './print-words.ts';

const LOADERS = {
	de: async () => (await import('./de.ts')).german,
	es: async () => (await import('./es.ts')).spanish
};

/** Afterwards numbers print in this language. Asking twice loads once. */
export async function loadPrintWords(language: Language): Promise<void> {
	if (language === 'en' || hasPrintWords(language)) return;
	putOnShelf(await LOADERS[language]());
}
