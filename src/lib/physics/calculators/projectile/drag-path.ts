/**
 * A throw through still air with drag that goes as the square of the speed, in plain numbers: speeds in terms of a speed of
 * the throw, gravity 1. Followed to the top, then to the ground.
 */
import { follow, type Ending, type Slope } from '../../numerics/dormand-prince.ts';

export interface Throw {
	/** Height of the release above the landing. */
	height: number;
	along: number;
	up: number;
	/** Drag deceleration over speed². */
	drag: number;
}

export interface Landing {
	range: number;
	time: number;
	apex: number;
	speed: number;
}

/** Longer than any flight that is followed. */
const FOREVER = 1e9;
const TOLERANCE = 1e-10;
const MOST_STEPS = 20_000;
/** Closer to a steady fall than this, what is left is a straight drop at that speed. */
const SETTLED = 1e-11;

const height = (_t: number, y: readonly number[]) => y[1] ?? NaN;
const upward = (_t: number, y: readonly number[]) => y[3] ?? NaN;

/** Where it comes down; `short` with the top when that lies below the landing, `lost` when it can't be followed. */
export function landingOf(
	thrown: Throw
): { by: 'landing'; landing: Landing } | { by: 'short'; apex: number } | { by: 'lost' } {
	const { drag } = thrown;
	const terminal = 1 / Math.sqrt(drag);
	const slope: Slope = (_t, [, , vx = 0, vy = 0], out) => {
		const braking = drag * Math.hypot(vx, vy);
		out[0] = vx;
		out[1] = vy;
		out[2] = -braking * vx;
		out[3] = -1 - braking * vy;
	};
	const slowest = Math.min(1, terminal);
	const motion = {
		slope,
		end: FOREVER,
		relative: TOLERANCE,
		absolute: [1, 1, 1, 1].map((size, i) => 1e-3 * TOLERANCE * size * (i < 2 ? 1 : slowest)),
		mostSteps: MOST_STEPS
	};

	let x = 0;
	let y: readonly number[] = [0, thrown.height, thrown.along, thrown.up];
	if (thrown.up > 0) {
		const top = follow({ ...motion, x, y, events: [upward] });
		if (top.by !== 'event') return { by: 'lost' };
		x = top.x;
		y = top.y;
	}
	const apex = y[1] ?? NaN;
	if (apex < 0) return { by: 'short', apex };
	if (apex === 0) return { by: 'landing', landing: landed({ x, y: [...y] }, apex) };

	const unsettled = (_t: number, [, , vx = 0, vy = 0]: readonly number[]) =>
		Math.max(Math.abs(-vy / terminal - 1), vx / terminal) - SETTLED;
	const end: Ending = follow({ ...motion, x, y, events: [height, unsettled] });
	if (end.by !== 'event') return { by: 'lost' };
	if (end.event === 0) return { by: 'landing', landing: landed(end, apex) };
	const left = (end.y[1] ?? NaN) / terminal;
	const [range = NaN, , along = 0, down = NaN] = end.y;
	return {
		by: 'landing',
		landing: { range, time: end.x + left, apex, speed: Math.hypot(along, down) }
	};
}

function landed({ x, y }: { x: number; y: readonly number[] }, apex: number): Landing {
	const [range = NaN, , along = NaN, up = NaN] = y;
	return { range, time: x, apex, speed: Math.hypot(along, up) };
}
