/**
 * Natural cubic spline through points with rising x: the curve with continuous second derivative, zero at both ends
 * (Press et al. 2007, Numerical Recipes, §3.3). Outside the points it holds the end values.
 */
export function naturalSpline(xs: readonly number[], ys: readonly number[]): (x: number) => number {
	const at = (values: readonly number[], index: number) => values[index] ?? NaN;
	const last = xs.length - 1;
	const curvature = new Array<number>(xs.length).fill(0);
	const sweep = new Array<number>(xs.length).fill(0);
	for (let i = 1; i < last; i += 1) {
		const left = at(xs, i) - at(xs, i - 1);
		const right = at(xs, i + 1) - at(xs, i);
		const share = left / (left + right);
		const pivot = share * at(curvature, i - 1) + 2;
		curvature[i] = (share - 1) / pivot;
		const bend = (at(ys, i + 1) - at(ys, i)) / right - (at(ys, i) - at(ys, i - 1)) / left;
		sweep[i] = ((6 * bend) / (left + right) - share * at(sweep, i - 1)) / pivot;
	}
	curvature[last] = 0;
	for (let i = last - 1; i > 0; i -= 1) {
		curvature[i] = at(curvature, i) * at(curvature, i + 1) + at(sweep, i);
	}
	return (x) => {
		if (x <= at(xs, 0)) return at(ys, 0);
		if (x >= at(xs, last)) return at(ys, last);
		let low = 0;
		let high = last;
		while (high - low > 1) {
			const middle = (low + high) >> 1;
			if (at(xs, middle) > x) high = middle;
			else low = middle;
		}
		const width = at(xs, high) - at(xs, low);
		const a = (at(xs, high) - x) / width;
		const b = 1 - a;
		return (
			a * at(ys, low) +
			b * at(ys, high) +
			((a ** 3 - a) * at(curvature, low) + (b ** 3 - b) * at(curvature, high)) *
				((width * width) / 6)
		);
	};
}
