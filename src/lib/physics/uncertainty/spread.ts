/** What is uncertain about a calculation's inputs: standard uncertainties, and how they move together. */

/** A quantity that isn't exact, in its own unit. */
export interface UncertainQuantity {
	name: string;
	value: number;
	/** Standard uncertainty, above 0. */
	u: number;
}

/** Correlation coefficient of two quantities by name; pairs that aren't named are independent. */
export type Correlation = readonly [one: string, other: string, r: number];

export interface Spread {
	quantities: readonly UncertainQuantity[];
	correlations: readonly Correlation[];
}

/** Rows of the correlation matrix, in the order of the quantities. */
export function correlationMatrix({ quantities, correlations }: Spread): number[][] {
	const rows = quantities.map((_, i): number[] => quantities.map((__, j) => (i === j ? 1 : 0)));
	for (const [one, other, r] of correlations) {
		const i = quantities.findIndex(({ name }) => name === one);
		const j = quantities.findIndex(({ name }) => name === other);
		const [rowI, rowJ] = [rows[i], rows[j]];
		if (!rowI || !rowJ || i === j) continue;
		rowI[j] = r;
		rowJ[i] = r;
	}
	return rows;
}

/** Room for rounding where two quantities are wholly correlated. */
const ROUNDING = 1e-12;

/**
 * Lower triangle L with L·Lᵀ the matrix (Cholesky), which turns independent draws into correlated ones. Null where no
 * quantities can be correlated so: the matrix has a negative direction.
 */
export function triangleOf(matrix: readonly (readonly number[])[]): number[][] | null {
	const lower: number[][] = [];
	for (const [i, row] of matrix.entries()) {
		const made: number[] = [];
		for (let j = 0; j <= i; j += 1) {
			const above = j === i ? made : (lower[j] as number[]);
			let rest = row[j] as number;
			for (let k = 0; k < j; k += 1) rest -= (made[k] as number) * (above[k] as number);
			if (j < i) {
				const pivot = above[j] as number;
				if (pivot === 0 && Math.abs(rest) > Math.sqrt(ROUNDING)) return null;
				made.push(pivot === 0 ? 0 : rest / pivot);
			} else {
				if (rest < -ROUNDING) return null;
				made.push(rest <= ROUNDING ? 0 : Math.sqrt(rest));
			}
		}
		lower.push(made);
	}
	return lower;
}
