/** Loads one language's lexicon and words for print, where a page has no use for the others. */
import type { Language } from '../../widget/language.ts';
import { loadPrintWords } from '../../widget/languages/load.ts';
import { hasLexicon, putOnShelf } from './shelf.ts';

const LOADERS = {
	de: async () => (await import('./de.ts')).german,
	es: async () => (await import('./es.ts')).spanish
};

/** Afterwards everything in the fact-check works in this language. Asking twice loads once. */
export async function loadLexicon(language: Language): Promise<void> {
	await loadPrintWords(language);
	if (language === 'en' || hasLexicon(language)) return;
	putOnShelf(await LOADERS[language]());
}
