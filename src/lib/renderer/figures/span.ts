/** Where values lie on an axis, linear or logarithmic, as shares from 0 to 1: a drawing needs no measuring. */
import { nice } from 'd3-array';

export interface Span {
	from: number;
	to: number;
	/** Measured by the logarithm; both ends lie above nought then. */
	log?: boolean;
}

/** Where a value lies on a span, from 0 to 1. */
export function shareOf(value: number, { from, to, log }: Span): number {
	return log
		? (Math.log(value) - Math.log(from)) / (Math.log(to) - Math.log(from))
		: (value - from) / (to - from);
}

/** A share as SVG takes it. */
export function percent(share: number): string {
	return `${Number((share * 100).toFixed(3))}%`;
}

export interface SpanOptions {
	log?: boolean;
	/** A linear span that holds nought whatever the values are. */
	zero?: boolean;
}

/**
 * A span with round ends that holds all finite values; null when there is nothing to hold. By the logarithm it holds
 * what lies above nought.
 */
export function spanOver(values: Iterable<number | null>, options: SpanOptions = {}): Span | null {
	let [low, high] = [Infinity, -Infinity];
	for (const value of values) {
		if (value === null || !Number.isFinite(value) || (options.log && value <= 0)) continue;
		if (value < low) low = value;
		if (value > high) high = value;
	}
	if (low > high) return null;
	return options.log ? logSpan(low, high) : linearSpan(low, high, options.zero ?? false);
}

/** Slack under which a span can't be told from one number in doubles. */
const DUST = 1e-12;

function linearSpan(low: number, high: number, zero: boolean): Span {
	if (zero) {
		low = Math.min(0, low);
		high = Math.max(0, high);
	}
	const size = Math.max(Math.abs(low), Math.abs(high));
	const slack = high - low <= size * DUST ? size / 10 || 1 : 0;
	let [from, to] = nice(low - slack, high + slack, 5);
	// Rounding to even ends may not turn a bar's zero into another number.
	if (zero && low === 0) from = 0;
	if (zero && high === 0) to = 0;
	return { from, to };
}

/** Ends on powers of ten, or on 1, 2 and 5 times them where the values span less than two. */
function logSpan(low: number, high: number): Span {
	const steps = Math.log10(high) - Math.log10(low) < 2 ? [1, 2, 5] : [1];
	// One power more on either side: a logarithm next to a whole number is rounded to it.
	const [first, last] = [Math.floor(Math.log10(low)) - 1, Math.ceil(Math.log10(high)) + 1];
	const ends: number[] = [];
	for (let power = first; power <= last; power += 1) {
		for (const step of steps) ends.push(Number(`${step}e${power}`));
	}
	const from = ends.findLast((end) => end > 0 && end <= low) ?? low;
	const to = ends.find((end) => Number.isFinite(end) && end >= high && end > from) ?? high;
	return { from, to, log: true };
}
