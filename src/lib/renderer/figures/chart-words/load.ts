/** Loads what charts say in one language, so that a reader's frame carries no other. */
import type { Language } from '../../../widget/language.ts';
import { putOnShelf, type ChartWords } from './shelf.ts';

const LOADERS: Record<Exclude<Language, 'en'>, () => Promise<ChartWords>> = {
	de: async () => (await import('./de.ts')).de,
	es: async () => (await import('./es.ts')).es
};

export async function loadChartWords(language: Language): Promise<void> {
	if (language !== 'en') putOnShelf(language, await LOADERS[language]());
}
