/**
 * Stiff ordinary differential equations of two variables: the linearly implicit Rosenbrock method of order 4 (Kaps &
 * Rentrop 1979, Numer. Math. 33, 55) with the parameters of Shampine 1982, ACM Trans. Math. Softw. 8, 93. The Jacobian
 * is taken by differences.
 */
export type Pair = readonly [number, number];

const GAMMA = 1 / 2;
const A21 = 2;
const A31 = 48 / 25;
const A32 = 6 / 25;
const C21 = -8;
const C31 = 372 / 25;
const C32 = 12 / 5;
const C41 = -112 / 125;
const C42 = -54 / 125;
const C43 = -2 / 5;
const B = [19 / 9, 1 / 2, 25 / 108, 125 / 108] as const;
const E = [17 / 54, 7 / 36, 0, 125 / 108] as const;
const D = [1 / 2, -3 / 2, 121 / 50, 29 / 250] as const;
const X2 = 1;
const X3 = 3 / 5;
/** Relative move for the differences that stand for derivatives. */
const NUDGE = 1e-7;

/**
 * The states at `stops`, which all lie to one side of `start.x` in order, to a relative tolerance (there is no absolute
 * one: both components must keep away from 0). Undefined when more steps than allowed would be needed.
 */
export function solveStiffPair(
	slope: (x: number, y: Pair) => Pair,
	start: { x: number; y: Pair },
	stops: readonly number[],
	relative: number,
	mostSteps: number
): Pair[] | undefined {
	let { x, y } = start;
	let width = ((stops.at(-1) ?? x) - x) * 1e-4;
	let count = 0;
	const states: Pair[] = [];
	for (const stop of stops) {
		while (x !== stop) {
			count += 1;
			if (count > mostSteps || Math.abs(width) < 4 * Number.EPSILON * Math.abs(x)) return undefined;
			const isLast = Math.abs(width) >= Math.abs(stop - x);
			const taken = isLast ? stop - x : width;
			const { to, error } = stepFrom(slope, x, y, taken, relative);
			if (!(error <= 1)) {
				width = taken * (Number.isFinite(error) ? Math.max(0.5, 0.9 * error ** (-1 / 3)) : 0.1);
				continue;
			}
			x = isLast ? stop : x + taken;
			y = to;
			const next = taken * (error > 0.1296 ? 0.9 * error ** -0.25 : 1.5);
			// A step cut short at a stop doesn't shorten the ones after it.
			width = isLast && Math.abs(next) < Math.abs(width) ? width : next;
		}
		states.push(y);
	}
	return states;
}

function stepFrom(
	slope: (x: number, y: Pair) => Pair,
	x: number,
	y: Pair,
	h: number,
	relative: number
): { to: Pair; error: number } {
	const f = slope(x, y);
	const dx = NUDGE * (Math.abs(x) + 1);
	const d0 = NUDGE * Math.abs(y[0]);
	const d1 = NUDGE * Math.abs(y[1]);
	const fx = slope(x + dx, y);
	const f0 = slope(x, [y[0] + d0, y[1]]);
	const f1 = slope(x, [y[0], y[1] + d1]);
	const tx = [(fx[0] - f[0]) / dx, (fx[1] - f[1]) / dx] as const;
	// I/(γh) − J, solved by Cramer's rule.
	const a = 1 / (GAMMA * h) - (f0[0] - f[0]) / d0;
	const b = -(f1[0] - f[0]) / d1;
	const c = -(f0[1] - f[1]) / d0;
	const d = 1 / (GAMMA * h) - (f1[1] - f[1]) / d1;
	const determinant = a * d - b * c;
	const solve = (r0: number, r1: number): Pair => [
		(d * r0 - b * r1) / determinant,
		(a * r1 - c * r0) / determinant
	];

	const g1 = solve(f[0] + h * D[0] * tx[0], f[1] + h * D[0] * tx[1]);
	const s2 = slope(x + X2 * h, [y[0] + A21 * g1[0], y[1] + A21 * g1[1]]);
	const g2 = solve(
		s2[0] + h * D[1] * tx[0] + (C21 * g1[0]) / h,
		s2[1] + h * D[1] * tx[1] + (C21 * g1[1]) / h
	);
	const s3 = slope(x + X3 * h, [
		y[0] + A31 * g1[0] + A32 * g2[0],
		y[1] + A31 * g1[1] + A32 * g2[1]
	]);
	const g3 = solve(
		s3[0] + h * D[2] * tx[0] + (C31 * g1[0] + C32 * g2[0]) / h,
		s3[1] + h * D[2] * tx[1] + (C31 * g1[1] + C32 * g2[1]) / h
	);
	const g4 = solve(
		s3[0] + h * D[3] * tx[0] + (C41 * g1[0] + C42 * g2[0] + C43 * g3[0]) / h,
		s3[1] + h * D[3] * tx[1] + (C41 * g1[1] + C42 * g2[1] + C43 * g3[1]) / h
	);

	const change = (weights: readonly [number, number, number, number], i: 0 | 1) =>
		weights[0] * g1[i] + weights[1] * g2[i] + weights[2] * g3[i] + weights[3] * g4[i];
	const to: Pair = [y[0] + change(B, 0), y[1] + change(B, 1)];
	const error = Math.max(
		Math.abs(change(E, 0)) / Math.abs(y[0]),
		Math.abs(change(E, 1)) / Math.abs(y[1])
	);
	return { to, error: error / relative };
}
