/**
 * The integral of a smooth function from the start of a short stretch to any place in it, from the function's values at
 * twelve fixed places: interpolation at Chebyshev's nodes, integrated exactly (Trefethen 2013, Approximation Theory and
 * Approximation Practice, ch. 19; from memory). As exact as six nodes of Gauss from the start to each place, and a
 * fraction of the work where many places are asked for.
 */
import { GL6 } from './quadrature.ts';

const COUNT = 12;

/** Where the function's values are wanted, as shares of the stretch. */
export const RUNNING_NODES: readonly number[] = Array.from(
	{ length: COUNT },
	(_, k) => (1 + Math.cos((Math.PI * (2 * k + 1)) / (2 * COUNT))) / 2
);

/** 1 at node `k`, 0 at the others. */
function lagrange(k: number, s: number): number {
	const own = RUNNING_NODES[k] ?? 0;
	return RUNNING_NODES.reduce(
		(product, node, other) => (other === k ? product : (product * (s - node)) / (own - node)),
		1
	);
}

/**
 * From values to the Chebyshev coefficients of the mean from the start to each place, row by row. The mean rather than
 * the integral: it stays level towards the start, so that short ways keep all their digits. Six nodes of Gauss are exact
 * for what twelve values decide.
 */
const TO_MEAN: readonly (readonly number[])[] = (() => {
	const means = RUNNING_NODES.map((place) =>
		RUNNING_NODES.map((_, k) =>
			GL6.reduce((sum, { at, weight }) => sum + weight * lagrange(k, place * at), 0)
		)
	);
	return RUNNING_NODES.map((_, degree) =>
		RUNNING_NODES.map((_, k) => {
			const sum = means.reduce(
				(total, row, j) =>
					total + (row[k] ?? 0) * Math.cos((Math.PI * degree * (2 * j + 1)) / (2 * COUNT)),
				0
			);
			return ((degree === 0 ? 1 : 2) / COUNT) * sum;
		})
	);
})();

/** Chebyshev coefficients, for `runningMean`, from the values at `RUNNING_NODES`. */
export function runningCoefficients(values: readonly number[]): readonly number[] {
	return TO_MEAN.map((row) => {
		let sum = 0;
		for (let k = 0; k < COUNT; k += 1) sum += row[k]! * values[k]!;
		return sum;
	});
}

/**
 * The mean of the function from the start of the stretch to a share of it in [0, 1], by Clenshaw's recurrence; times that
 * share and the stretch's length it is the integral.
 */
export function runningMean(coefficients: readonly number[], share: number): number {
	const twice = 4 * share - 2;
	let next = 0;
	let afterNext = 0;
	for (let degree = COUNT - 1; degree > 0; degree -= 1) {
		const here = twice * next - afterNext + coefficients[degree]!;
		afterNext = next;
		next = here;
	}
	return (twice / 2) * next - afterNext + coefficients[0]!;
}
