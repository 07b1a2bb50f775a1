/** Lists of a form as plain values: one moved, one taken out. */
export function moved<T>(list: readonly T[], from: number, to: number): T[] {
	const rest = list.filter((_, index) => index !== from);
	const taken = list.slice(from, from + 1);
	return [...rest.slice(0, to), ...taken, ...rest.slice(to)];
}

export function without<T>(list: readonly T[], at: number): T[] {
	return list.filter((_, index) => index !== at);
}
