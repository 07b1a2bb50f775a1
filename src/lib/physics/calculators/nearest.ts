/** The entry of a list that a mistyped word most likely meant, or undefined: another case first, then one edit in four. */
export function nearestOf(word: string, list: readonly string[]): string | undefined {
	const lower = word.toLowerCase();
	const otherCase = list.find((entry) => entry.toLowerCase() === lower);
	if (otherCase) return otherCase;
	const allowed = Math.max(1, Math.floor(Math.min(word.length, 40) / 4));
	let best: { entry: string; edits: number } | undefined;
	for (const entry of list) {
		const edits = editDistance(lower.slice(0, 60), entry.toLowerCase());
		if (edits <= allowed && entry.length > edits && (!best || edits < best.edits))
			best = { entry, edits };
	}
	return best?.entry;
}

/** Levenshtein 1966: letters added, dropped or changed. */
function editDistance(a: string, b: string): number {
	let row = Array.from({ length: b.length + 1 }, (_, index) => index);
	for (const [i, letter] of [...a].entries()) {
		let left = i + 1;
		let corner = i;
		row = row.map((above, j) => {
			if (j === 0) return left;
			left = Math.min(left + 1, above + 1, corner + (letter === b[j - 1] ? 0 : 1));
			corner = above;
			return left;
		});
	}
	return row.at(-1) ?? 0;
}
