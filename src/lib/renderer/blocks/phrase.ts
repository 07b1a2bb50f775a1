/** Keeping a number's words together on a line. */

const NO_BREAK = '\u00a0';

/** Joins a numeral to the word after it: “about 21 times” may break after “about” alone. */
export function keepTogether(words: string): string {
	return words.replace(/(\d) (?=\S)/g, `$1${NO_BREAK}`);
}

/** What may break from what stays with the mark: the last stretch without a plain space. */
export function splitLastWord(words: string): { head: string; tail: string } {
	const at = words.lastIndexOf(' ') + 1;
	return { head: words.slice(0, at), tail: words.slice(at) };
}
