/** Finding things by any of their words, in any order. */

/** Case and accents don't matter; every word typed must be somewhere in the text. */
export function matches(query: string, text: string): boolean {
	const haystack = plain(text);
	return plain(query)
		.split(/\s+/)
		.every((word) => haystack.includes(word));
}

function plain(text: string): string {
	return text.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase().trim();
}
