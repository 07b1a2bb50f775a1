/** A line worked point by point, with a breath now and then so that the page stays awake. */
import type { Calculator, RawInputs } from '$lib/physics/calculator.ts';
import {
	sweepPlaces,
	sweptPoints,
	type Sweep,
	type SweptPoint
} from '$lib/physics/calculators/sweep.ts';

/** All that a line hangs on, as plain data. */
export interface PlotOrder {
	inputs: RawInputs;
	sweep: Sweep;
	/** The input takes whole numbers alone. */
	whole: boolean;
}

/** At a stretch, in milliseconds: less than a frame. */
const STRETCH_MS = 12;

/**
 * Works the points and tells how many are done after each stretch; `pause` lets the page breathe. Gives up, with null,
 * once `onstretch` says false.
 */
export async function workPoints(
	calculator: Calculator,
	{ inputs, sweep, whole }: PlotOrder,
	pause: () => Promise<unknown>,
	onstretch: (done: number, of: number) => boolean
): Promise<SweptPoint[] | null> {
	const places = sweepPlaces(sweep, whole);
	const points: SweptPoint[] = [];
	let since = performance.now();
	/** Points worked at one go: a single one at first, since some calculators take long over it. */
	let share = 1;
	while (points.length < places.length) {
		const next = places.slice(points.length, points.length + share);
		points.push(...sweptPoints(calculator, inputs, sweep, next));
		const spent = performance.now() - since;
		if (spent < STRETCH_MS / 4) share *= 2;
		if (spent < STRETCH_MS) continue;
		share = Math.max(1, Math.floor(share / 2));
		if (!onstretch(points.length, places.length)) return null;
		await pause();
		since = performance.now();
	}
	return onstretch(points.length, places.length) ? points : null;
}
