/** One order from two: what each side moved or added stands where that side put it. */

/**
 * The ids of `present` in one order. Mine is the ground; what only they moved or added goes after what it follows on
 * their side. Where both moved the same thing, it stays where mine has it.
 */
export function mergeOrder(
	base: readonly string[],
	mine: readonly string[],
	theirs: readonly string[],
	present: ReadonlySet<string>
): string[] {
	const inMine = new Set(mine);
	const movedByMe = moved(base, mine);
	const movedByThem = moved(base, theirs);
	const stays = (id: string) => inMine.has(id) && (!movedByThem.has(id) || movedByMe.has(id));
	const order = mine.filter((id) => present.has(id) && stays(id));
	const placed = new Set(order);
	for (const side of [theirs, mine, base]) {
		let before: string | null = null;
		for (const id of side) {
			if (!present.has(id)) continue;
			if (!placed.has(id)) {
				order.splice(before === null ? 0 : order.indexOf(before) + 1, 0, id);
				placed.add(id);
			}
			before = id;
		}
	}
	return order;
}

/** Ids that don’t stand in the order they had: all but the longest run that kept it. */
export function moved(before: readonly string[], after: readonly string[]): Set<string> {
	const rank = new Map(before.map((id, index) => [id, index]));
	const common = after.filter((id) => rank.has(id));
	const kept = new Set(longestRising(common.map((id) => rank.get(id) ?? 0)));
	return new Set(common.filter((id) => !kept.has(rank.get(id) ?? 0)));
}

/** The longest rising run of different numbers, in order (patience sorting). */
function longestRising(numbers: readonly number[]): number[] {
	const ends: number[] = [];
	const previous = new Map<number, number | undefined>();
	for (const number of numbers) {
		let low = 0;
		let high = ends.length;
		while (low < high) {
			const middle = (low + high) >> 1;
			if ((ends[middle] ?? 0) < number) low = middle + 1;
			else high = middle;
		}
		previous.set(number, ends[low - 1]);
		ends[low] = number;
	}
	const run: number[] = [];
	for (let at = ends.at(-1); at !== undefined; at = previous.get(at)) run.push(at);
	return run.reverse();
}
