/** Gauss–Legendre quadrature (Press et al. 2007, Numerical Recipes, §4.6; nodes by Newton's method on the polynomial). */

/** One node in (0, 1) and its weight; the weights of a rule add to 1. */
export interface Node {
	at: number;
	weight: number;
}

/** Nodes and weights of order `count` on (0, 1), correct to the last few bits. */
export function gaussLegendre(count: number): readonly Node[] {
	const lower: Node[] = [];
	for (let i = 0; i < Math.ceil(count / 2); i += 1) {
		let x = Math.cos((Math.PI * (i + 0.75)) / (count + 0.5));
		let slope = 1;
		for (let step = 0; step < 100; step += 1) {
			let before = 1;
			let value = x;
			for (let degree = 2; degree <= count; degree += 1) {
				[before, value] = [value, ((2 * degree - 1) * x * value - (degree - 1) * before) / degree];
			}
			slope = (count * (x * value - before)) / (x * x - 1);
			const move = value / slope;
			x -= move;
			if (Math.abs(move) < 1e-16) break;
		}
		lower.push({ at: (1 - x) / 2, weight: 1 / ((1 - x * x) * slope * slope) });
	}
	// The rule is symmetric about the middle; an odd one has a node there.
	const upper = lower
		.slice(0, Math.floor(count / 2))
		.map(({ at, weight }) => ({ at: 1 - at, weight }));
	return [...lower, ...upper.reverse()];
}

/** 64 nodes: about 1e-14 relative for every integral of an expanding universe in the variables used there. */
export const GL64 = gaussLegendre(64);

/** 6 nodes, for short steps. */
export const GL6 = gaussLegendre(6);
