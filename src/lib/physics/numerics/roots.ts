/**
 * Root of `f` in [a, b] by Brent's method (Brent 1973, Algorithms for Minimization Without Derivatives, ch. 4).
 * `f(a)` and `f(b)` must differ in sign; undefined otherwise. `tolerance` is absolute, in x.
 */
export function brentRoot(
	f: (x: number) => number,
	a: number,
	b: number,
	tolerance: number
): number | undefined {
	let fa = f(a);
	let fb = f(b);
	if (fa === 0) return a;
	if (fb === 0) return b;
	if (!(fa < 0 !== fb < 0) || Number.isNaN(fa) || Number.isNaN(fb)) return undefined;
	let c = a;
	let fc = fa;
	let step = b - a;
	let stepBefore = step;
	for (let turn = 0; turn < 200; turn += 1) {
		if (fb < 0 === fc < 0) {
			c = a;
			fc = fa;
			step = stepBefore = b - a;
		}
		if (Math.abs(fc) < Math.abs(fb)) {
			[a, b, c] = [b, c, b];
			[fa, fb, fc] = [fb, fc, fb];
		}
		const close = 2 * Number.EPSILON * Math.abs(b) + tolerance / 2;
		const half = (c - b) / 2;
		if (Math.abs(half) <= close || fb === 0) return b;
		if (Math.abs(stepBefore) >= close && Math.abs(fa) > Math.abs(fb)) {
			const ratio = fb / fa;
			let p: number;
			let q: number;
			if (a === c) {
				p = 2 * half * ratio;
				q = 1 - ratio;
			} else {
				const u = fa / fc;
				const v = fb / fc;
				p = ratio * (2 * half * u * (u - v) - (b - a) * (v - 1));
				q = (u - 1) * (v - 1) * (ratio - 1);
			}
			if (p > 0) q = -q;
			else p = -p;
			if (2 * p < Math.min(3 * half * q - Math.abs(close * q), Math.abs(stepBefore * q))) {
				stepBefore = step;
				step = p / q;
			} else {
				step = stepBefore = half;
			}
		} else {
			step = stepBefore = half;
		}
		a = b;
		fa = fb;
		b += Math.abs(step) > close ? step : Math.sign(half) * close;
		fb = f(b);
	}
	return b;
}

/** Lowest point of `f` in [a, b] by golden-section search (Kiefer 1953), to `tolerance` in x. */
export function goldenMinimum(
	f: (x: number) => number,
	a: number,
	b: number,
	tolerance: number
): { x: number; value: number } {
	const golden = (Math.sqrt(5) - 1) / 2;
	let left = b - golden * (b - a);
	let right = a + golden * (b - a);
	let fLeft = f(left);
	let fRight = f(right);
	while (b - a > tolerance) {
		if (fLeft < fRight) {
			b = right;
			[right, fRight] = [left, fLeft];
			left = b - golden * (b - a);
			fLeft = f(left);
		} else {
			a = left;
			[left, fLeft] = [right, fRight];
			right = a + golden * (b - a);
			fRight = f(right);
		}
	}
	return fLeft < fRight ? { x: left, value: fLeft } : { x: right, value: fRight };
}
