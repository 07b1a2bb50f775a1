/**
 * Error function, to about 1e-15 relative: its power series times e^(−x²) near 0 (Abramowitz & Stegun 1964, 7.1.6), the
 * continued fraction of its complement beyond (7.1.14), by Lentz's method.
 */
export function erf(x: number): number {
	const size = Math.abs(x);
	if (size < 2.5) {
		let term = 2 * x * (Math.exp(-x * x) / Math.sqrt(Math.PI));
		let sum = term;
		for (let n = 1; Math.abs(term) > (Number.EPSILON * Math.abs(sum)) / 4; n += 1) {
			term *= (2 * x * x) / (2 * n + 1);
			sum += term;
		}
		return sum;
	}
	return size > 6 ? Math.sign(x) : Math.sign(x) * (1 - complement(size));
}

/** 1 − erf(x) for x of 2.5 and more: e^(−x²)/√π × 1/(x + ½/(x + 1/(x + 3⁄2/(x + …)))). */
function complement(x: number): number {
	let fraction = x;
	let c = x;
	let d = 0;
	for (let n = 1; n < 500; n += 1) {
		const a = n / 2;
		d = 1 / (x + a * d);
		c = x + a / c;
		fraction *= c * d;
		if (Math.abs(c * d - 1) < Number.EPSILON) break;
	}
	return Math.exp(-x * x) / (Math.sqrt(Math.PI) * fraction);
}
