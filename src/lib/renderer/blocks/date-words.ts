import type { Language } from '../../widget/language.ts';

const LOCALES: Record<Language, string> = { en: 'en-GB', de: 'de-DE', es: 'es-ES' };

/** “24 November 2026”, in UTC, so that server and reader print one date. `iso` must be ISO 8601. */
export function dateInWords(iso: string, language: Language): string {
	const words = new Intl.DateTimeFormat(LOCALES[language], {
		day: 'numeric',
		month: 'long',
		year: 'numeric',
		timeZone: 'UTC'
	});
	return words.format(new Date(iso));
}
