/**
 * Ordinary differential equations that are not stiff: Dormand & Prince 1980, J. Comput. Appl. Math. 6, 19, order 5 with
 * an embedded order 4 and the continuous extension of Hairer, Nørsett & Wanner 1993, Solving Ordinary Differential
 * Equations I, §II.6. Events are found by Brent's method on the continuous extension.
 */
import { brentRoot } from './roots.ts';

export type State = readonly number[];
/** Writes dy/dx at (x, y) into `slope`. */
export type Slope = (x: number, y: State, slope: number[]) => void;

export interface Motion {
	slope: Slope;
	x: number;
	y: State;
	/** Where to stop if no event comes first; beyond `x`. */
	end: number;
	relative: number;
	/** Absolute tolerance of each component. */
	absolute: readonly number[];
	/** Each ends the motion where it falls from above 0 to 0 or below. */
	events?: ((x: number, y: State) => number)[];
	/** Called after each step that is taken whole. */
	onStep?: (x: number, y: State) => void;
	mostSteps: number;
}

export type Ending =
	| { by: 'event'; event: number; x: number; y: number[] }
	| { by: 'end'; x: number; y: number[] }
	/** More steps than allowed, or a step too small to take. */
	| { by: 'exhaustion'; x: number; y: number[] };

const C = [0, 1 / 5, 3 / 10, 4 / 5, 8 / 9, 1, 1];
const A = [
	[],
	[1 / 5],
	[3 / 40, 9 / 40],
	[44 / 45, -56 / 15, 32 / 9],
	[19372 / 6561, -25360 / 2187, 64448 / 6561, -212 / 729],
	[9017 / 3168, -355 / 33, 46732 / 5247, 49 / 176, -5103 / 18656],
	[35 / 384, 0, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84]
];
const ERROR = [71 / 57600, 0, -71 / 16695, 71 / 1920, -17253 / 339200, 22 / 525, -1 / 40];
const DENSE = [
	-12715105075 / 11282082432,
	0,
	87487479700 / 32700410799,
	-10690763975 / 1880347072,
	701980252875 / 199316789632,
	-1453857185 / 822651844,
	69997945 / 29380423
];
/** Places within a step where events are looked at, so that a quick dip isn't passed over. */
const WATCHED = [0.25, 0.5, 0.75, 1];

interface Step {
	x: number;
	width: number;
	from: number[];
	to: number[];
	/** The seven slopes. */
	slopes: number[][];
}

/** Follows a motion until an event, its end, or more steps than allowed. */
export function follow(motion: Motion): Ending {
	const { end, events = [], onStep, mostSteps } = motion;
	let x = motion.x;
	let y = [...motion.y];
	let first = slopeAt(motion, x, y);
	let width = Math.min(firstWidth(motion, y, first), end - x);
	let heights = events.map((event) => event(x, y));
	let rejected = false;
	for (let count = 0; count < mostSteps && x < end; count += 1) {
		width = Math.min(width, end - x);
		if (!(width > 4 * Number.EPSILON * Math.abs(x)) || !(width > 0)) break;
		const step = stepFrom(motion, x, y, first, width);
		const error = errorOf(motion, step);
		if (!(error <= 1)) {
			width *= Number.isFinite(error) ? Math.max(0.2, 0.9 * error ** -0.2) : 0.1;
			rejected = true;
			continue;
		}
		const crossing = firstCrossing(step, events, heights);
		if (crossing) {
			// The interpolant finds the place; a step that ends there has the full accuracy of the method.
			const last = stepFrom(motion, x, y, first, crossing.x - x);
			return { by: 'event', event: crossing.event, x: crossing.x, y: last.to };
		}
		x = width === end - x ? end : x + width;
		y = step.to;
		first = step.slopes[6] ?? first;
		heights = events.map((event) => event(x, y));
		onStep?.(x, y);
		const growth = error === 0 ? 5 : Math.min(5, Math.max(0.2, 0.9 * error ** -0.2));
		width *= rejected ? Math.min(1, growth) : growth;
		rejected = false;
	}
	return { by: x < end ? 'exhaustion' : 'end', x, y };
}

function slopeAt({ slope }: Motion, x: number, y: State): number[] {
	const result = new Array<number>(y.length).fill(0);
	slope(x, y, result);
	return result;
}

function stepFrom(motion: Motion, x: number, from: number[], first: number[], width: number): Step {
	const slopes = [first];
	let to = from;
	for (let stage = 1; stage < 7; stage += 1) {
		const row = A[stage] ?? [];
		to = from.map((value, i) => {
			let sum = 0;
			for (let j = 0; j < stage; j += 1) sum += (row[j] ?? 0) * (slopes[j]?.[i] ?? 0);
			return value + width * sum;
		});
		slopes.push(slopeAt(motion, x + (C[stage] ?? 1) * width, to));
	}
	return { x, width, from, to, slopes };
}

/** Root mean square of the estimated error over what is tolerated; 1 or less is good enough. */
function errorOf({ relative, absolute }: Motion, { width, from, to, slopes }: Step): number {
	let sum = 0;
	for (let i = 0; i < from.length; i += 1) {
		const size = Math.max(Math.abs(from[i] ?? 0), Math.abs(to[i] ?? 0));
		const error = width * weighted(ERROR, slopes, i);
		sum += (error / ((absolute[i] ?? 0) + relative * size)) ** 2;
	}
	return Math.sqrt(sum / from.length);
}

function weighted(weights: readonly number[], slopes: number[][], i: number): number {
	let sum = 0;
	for (let j = 0; j < weights.length; j += 1) sum += (weights[j] ?? 0) * (slopes[j]?.[i] ?? 0);
	return sum;
}

/** A first step that changes the state by about a hundredth of itself (Hairer et al. 1993, §II.4). */
function firstWidth({ relative, absolute, end, x }: Motion, y: number[], first: number[]): number {
	let size = 0;
	let speed = 0;
	for (let i = 0; i < y.length; i += 1) {
		const scale = (absolute[i] ?? 0) + relative * Math.abs(y[i] ?? 0);
		size += ((y[i] ?? 0) / scale) ** 2;
		speed += ((first[i] ?? 0) / scale) ** 2;
	}
	return size < 1e-10 || speed < 1e-10 ? 1e-6 * (end - x) : 0.01 * Math.sqrt(size / speed);
}

/** The state at a share (0 to 1) of the step, by the continuous extension of order 4. */
function within({ width, from, to, slopes }: Step, share: number): number[] {
	const rest = 1 - share;
	return from.map((value, i) => {
		const change = (to[i] ?? 0) - value;
		const bend = width * (slopes[0]?.[i] ?? 0) - change;
		const twist = change - width * (slopes[6]?.[i] ?? 0) - bend;
		const dense = width * weighted(DENSE, slopes, i);
		return value + share * (change + rest * (bend + share * (twist + rest * dense)));
	});
}

function firstCrossing(
	step: Step,
	events: ((x: number, y: State) => number)[],
	heights: readonly number[]
): { event: number; x: number } | undefined {
	let found: { event: number; x: number } | undefined;
	for (const [index, event] of events.entries()) {
		const height = (share: number) =>
			event(step.x + share * step.width, share === 1 ? step.to : within(step, share));
		let before = 0;
		let heightBefore = heights[index] ?? NaN;
		for (const share of WATCHED) {
			const heightNow = height(share);
			if (heightBefore > 0 && heightNow <= 0) {
				const root = brentRoot(height, before, share, 1e-15) ?? share;
				const x = step.x + root * step.width;
				if (!found || x < found.x) found = { event: index, x };
				break;
			}
			before = share;
			heightBefore = heightNow;
		}
	}
	return found;
}
