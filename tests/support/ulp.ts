/** How far apart two doubles are, counted in doubles. */

const view = new DataView(new ArrayBuffer(8));

/** Steps from one finite double to the next, 0 for the same one (and between the two zeros). */
export function stepsBetween(a: number, b: number): number {
	return Number(ordinal(a) - ordinal(b) < 0n ? ordinal(b) - ordinal(a) : ordinal(a) - ordinal(b));
}

/** The doubles in a row: neighbours differ by 1. */
function ordinal(value: number): bigint {
	view.setFloat64(0, value);
	const bits = view.getBigInt64(0);
	return bits < 0n ? -(bits & 0x7fffffffffffffffn) : bits;
}
