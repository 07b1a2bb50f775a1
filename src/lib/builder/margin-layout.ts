/** Where the notes of a crowded margin stand: each at its line if it can be, never over another. */

export interface WantedPlace {
	key: string;
	/** Where its line is. */
	wanted: number;
	height: number;
}

/**
 * Tops of the notes, in order of their lines. Notes are pushed down; with one focused, that one stands exactly at its
 * line, and those above it are pushed up as far as the top of the sheet. What finds no room there goes below it.
 */
export function placeNotes(
	notes: readonly WantedPlace[],
	focusedKey: string | null,
	gap = 10
): Map<string, number> {
	const tops = new Map<string, number>();
	const pivot = Math.max(
		0,
		notes.findIndex(({ key }) => key === focusedKey)
	);
	let ceiling = notes[pivot]?.wanted ?? 0;
	const displaced: WantedPlace[] = [];
	for (const note of notes.slice(0, pivot).reverse()) {
		const top = Math.min(note.wanted, ceiling - gap - note.height);
		if (top < 0) {
			displaced.unshift(note);
			continue;
		}
		tops.set(note.key, top);
		ceiling = top;
	}

	const [focused, ...below] = notes.slice(pivot);
	let floor = -Infinity;
	for (const note of [...(focused ? [focused] : []), ...displaced, ...below]) {
		const top = Math.max(note.wanted, floor);
		tops.set(note.key, top);
		floor = top + note.height + gap;
	}
	return tops;
}
