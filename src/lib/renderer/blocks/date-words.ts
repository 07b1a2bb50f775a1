const WORDS = new Intl.DateTimeFormat('en-GB', {
	day: 'numeric',
	month: 'long',
	year: 'numeric',
	timeZone: 'UTC'
});

/** “24 November 2026”, in UTC, so that server and reader print one date. `iso` must be ISO 8601. */
export function dateInWords(iso: string): string {
	return WORDS.format(new Date(iso));
}
