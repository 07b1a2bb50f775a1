/** Where labels stand so that they touch neither each other nor what is drawn. Pure geometry in pixels, y downwards. */
import { textWidth } from './text-size.ts';

export interface Box {
	left: number;
	right: number;
	top: number;
	bottom: number;
}

export function overlaps(a: Box, b: Box): boolean {
	return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}

/**
 * Middles as near as may be to where they belong, in the order given, at least half of both sizes apart and inside
 * 0 … `length`. `at` must not fall; the sizes must fit the length together.
 */
export function spreadAlong(
	items: readonly { at: number; size: number }[],
	length: number
): number[] {
	/** Neighbours that touch move as one, to the mean of where they belong. */
	interface Cluster {
		start: number;
		size: number;
		wanted: number;
		count: number;
	}
	const clusters: Cluster[] = [];
	const settle = (cluster: Cluster) => {
		const start = cluster.wanted / cluster.count;
		cluster.start = Math.max(0, Math.min(length - cluster.size, start));
	};
	for (const { at, size } of items) {
		let cluster: Cluster = { start: 0, size, wanted: at - size / 2, count: 1 };
		settle(cluster);
		let before = clusters.at(-1);
		while (before && before.start + before.size > cluster.start) {
			clusters.pop();
			cluster = {
				start: 0,
				size: before.size + cluster.size,
				wanted: before.wanted + cluster.wanted - before.size * cluster.count,
				count: before.count + cluster.count
			};
			settle(cluster);
			before = clusters.at(-1);
		}
		clusters.push(cluster);
	}
	const middles: number[] = [];
	for (const { start, count } of clusters) {
		let edge = start;
		for (let index = 0; index < count; index += 1) {
			const size = items[middles.length]?.size ?? 0;
			middles.push(edge + size / 2);
			edge += size;
		}
	}
	return middles;
}

export interface Flag {
	/** Where its stem stands, from 0 to 1. */
	share: number;
	width: number;
	height: number;
}

export interface RaisedFlag {
	/** Side of the stem that the words are on. */
	side: 'start' | 'end';
	/** How far the near edge of the words is from the line. */
	lift: number;
	/** Hangs under the line instead of standing over it. */
	below: boolean;
}

/** From the stem to the words. */
export const BESIDE = 5;
const FIRST_LIFT = 10;
const BETWEEN = 4;

/**
 * Flags on stems over one line: no words touch other words or another stem. Those of the left half have their words on
 * the right and the other way round; where two would each have to stand over the other, the right half hangs under the
 * line. What keeps apart at `length` keeps apart at every greater one, since stems move away from each other and words
 * keep their size. Widths must not be greater than half the length.
 */
export function raiseFlags(flags: readonly Flag[], length: number): RaisedFlag[] {
	const raised: (RaisedFlag | undefined)[] = flags.map(() => undefined);
	const all = flags.map((_, index) => index);
	if (!raise(flags, all, length, raised, false)) {
		const isLeft = (index: number) => sideOf(flags[index]) === 'start';
		raise(flags, all.filter(isLeft), length, raised, false);
		raise(
			flags,
			all.filter((index) => !isLeft(index)),
			length,
			raised,
			true
		);
	}
	return raised.map((flag) => flag ?? { side: 'start', lift: FIRST_LIFT, below: false });
}

interface Spread {
	x: number;
	side: 'start' | 'end';
	left: number;
	right: number;
	height: number;
	lift: number;
}

function sideOf(flag: Flag | undefined): 'start' | 'end' {
	return (flag?.share ?? 0) <= 0.5 ? 'start' : 'end';
}

/** Raises some of the flags in an order where whatever a flag's words stand over is there before; false if none is. */
function raise(
	flags: readonly Flag[],
	some: readonly number[],
	length: number,
	raised: (RaisedFlag | undefined)[],
	below: boolean
): boolean {
	const spots = new Map(
		some.map((index) => {
			const { share, width, height } = flags[index] ?? { share: 0, width: 0, height: 0 };
			const x = share * length;
			const side: Spread['side'] = sideOf(flags[index]);
			const reach = BESIDE + width;
			const [left, right] = side === 'start' ? [x, x + reach] : [x - reach, x];
			return [index, { x, side, left, right, height, lift: 0 }] as [number, Spread];
		})
	);
	const under = new Map(
		some.map((index) => {
			const own = spots.get(index)!;
			const covered = some.filter((other) => {
				const { x } = spots.get(other)!;
				// Of two on one spot the first stands over the second.
				if (x === own.x) return other > index && spots.get(other)!.side === own.side;
				return x > own.left - BETWEEN && x < own.right + BETWEEN && isOnSide(own, x);
			});
			return [index, covered] as const;
		})
	);
	const waiting = new Set(some);
	const done: number[] = [];
	while (waiting.size > 0) {
		const next = [...waiting].find((index) =>
			under.get(index)!.every((each) => !waiting.has(each))
		);
		if (next === undefined) return false;
		const own = spots.get(next)!;
		const neighbours = done
			.map((index) => spots.get(index)!)
			.filter(({ left, right }) => left < own.right + BETWEEN && own.left < right + BETWEEN);
		own.lift = FIRST_LIFT;
		for (const index of under.get(next)!) {
			const { lift, height } = spots.get(index)!;
			own.lift = Math.max(own.lift, lift + height + BETWEEN);
		}
		for (const { lift, height } of neighbours.sort((a, b) => a.lift - b.lift)) {
			if (own.lift < lift + height + BETWEEN && lift < own.lift + own.height + BETWEEN)
				own.lift = lift + height + BETWEEN;
		}
		waiting.delete(next);
		done.push(next);
	}
	for (const [index, { side, lift }] of spots) raised[index] = { side, lift, below };
	return true;
}

/** Whether a stem at `x` is on the side where the words are. */
function isOnSide({ x: own, side }: { x: number; side: 'start' | 'end' }, x: number): boolean {
	return side === 'start' ? x > own : x < own;
}

export interface Spot {
	/** From the point to the baseline of the words. */
	dx: number;
	dy: number;
	anchor: 'start' | 'middle' | 'end';
}

export interface Plot {
	width: number;
	height: number;
}

/** A line through shares of the plot, from left to right, y downwards; null where it has a gap. */
export type Trace = readonly { x: number; y: number | null }[];

const ASCENT = 12;
const DESCENT = 4;
const RISES = [18, -11, 36, -29, 54, -47, 72, -65, 90, -83];

/** Nearest first: beside the point, then further up and down; straight above last. Never across its own drop lines. */
const SPOTS: readonly Spot[] = RISES.flatMap((dy) => [
	{ dx: 13, dy, anchor: 'start' as const },
	{ dx: -13, dy, anchor: 'end' as const },
	...(dy < -20 ? [{ dx: 0, dy, anchor: 'middle' as const }] : [])
]);

/**
 * A place for a point's words that is free at every one of the given sizes of the plot: inside it, off the lines and
 * off the other boxes. Null where there is none.
 */
export function placeBeside(
	point: { x: number; y: number },
	words: string,
	size: number,
	plots: readonly Plot[],
	traces: readonly Trace[],
	taken: (plot: Plot) => readonly Box[] = () => []
): Spot | null {
	const width = textWidth(words, size);
	const isFree = (spot: Spot) =>
		plots.every((plot) => {
			const box = boxAt(point, spot, width, plot);
			return (
				box.left >= 0 &&
				box.right <= plot.width &&
				box.top >= -6 &&
				box.bottom <= plot.height - 1 &&
				!taken(plot).some((other) => overlaps(box, other)) &&
				!traces.some((trace) => crosses(trace, box, plot))
			);
		});
	return SPOTS.find(isFree) ?? null;
}

export function boxAt(
	point: { x: number; y: number },
	{ dx, dy, anchor }: Spot,
	width: number,
	plot: Plot
): Box {
	const x = point.x * plot.width + dx;
	const y = point.y * plot.height + dy;
	const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
	return { left, right: left + width, top: y - ASCENT, bottom: y + DESCENT };
}

/** Whether a line goes through a box; the line's own width is allowed for. */
export function crosses(trace: Trace, box: Box, { width, height }: Plot, slack = 3): boolean {
	const right = (box.right + slack) / width;
	// The segment before the first point that lies past the box's left side may still reach into it.
	for (let index = Math.max(1, firstFrom(trace, (box.left - slack) / width)); ; index += 1) {
		const [from, to] = [trace[index - 1], trace[index]];
		if (!from || !to || from.x > right) return false;
		if (from.y === null || to.y === null) continue;
		const [y0, y1] = [from.y * height, to.y * height];
		if (Math.max(y0, y1) < box.top - slack || Math.min(y0, y1) > box.bottom + slack) continue;
		if (isCut(from.x * width, y0, to.x * width, y1, box, slack)) return true;
	}
}

/** Index of the first point that isn't left of `x`; the length where all are. */
function firstFrom(trace: Trace, x: number): number {
	let [low, high] = [0, trace.length];
	while (low < high) {
		const middle = (low + high) >> 1;
		if ((trace[middle]?.x ?? 0) < x) low = middle + 1;
		else high = middle;
	}
	return low;
}

/** Clips the segment against the box, side by side (Liang and Barsky). */
function isCut(x0: number, y0: number, x1: number, y1: number, box: Box, slack: number): boolean {
	let [enter, leave] = [0, 1];
	const sides: [number, number][] = [
		[x0 - x1, x0 - (box.left - slack)],
		[x1 - x0, box.right + slack - x0],
		[y0 - y1, y0 - (box.top - slack)],
		[y1 - y0, box.bottom + slack - y0]
	];
	for (const [direction, room] of sides) {
		if (direction === 0) {
			if (room < 0) return false;
			continue;
		}
		const at = room / direction;
		if (direction < 0) enter = Math.max(enter, at);
		else leave = Math.min(leave, at);
		if (enter > leave) return false;
	}
	return true;
}
