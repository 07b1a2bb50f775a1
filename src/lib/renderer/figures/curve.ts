/** Geometry of a line chart, in per mille of the plot, so that a drawing needs no measuring. */
import { extent, nice, ticks } from 'd3-array';
import { plainDecimal, printNumeral, roundToFigures } from '../../widget/stated.ts';

export interface CurvePoint {
	x: number;
	/** Null where the reading is refused: the line has a gap there. */
	y: number | null;
}

export interface Span {
	from: number;
	to: number;
	/** Measured by the logarithm; both ends lie above nought then. */
	log?: boolean;
}

/** Side of the square that curves are drawn in. */
export const PLOT = 1000;

/** Where a value lies on a span, from 0 to 1. */
export function shareOf(value: number, { from, to, log }: Span): number {
	return log ? Math.log(value / from) / Math.log(to / from) : (value - from) / (to - from);
}

/**
 * An upright scale with round ends that holds the whole line; null when there is nothing to draw. By the logarithm it
 * holds what lies above nought.
 */
export function yScale(points: readonly CurvePoint[], log = false): Span | null {
	const [low, high] = extent(points, ({ y }) =>
		Number.isFinite(y) && !(log && Number(y) <= 0) ? y : undefined
	);
	if (low === undefined || high === undefined) return null;
	if (log) return logScale(low, high);
	const slack = low === high ? Math.abs(low) / 10 || 1 : 0;
	const [from, to] = nice(low - slack, high + slack, 5);
	return { from, to };
}

/** Ends on powers of ten, or on 1, 2 and 5 times them where the line spans less than two. */
function logScale(low: number, high: number): Span {
	const steps = Math.log10(high / low) < 2 ? [1, 2, 5] : [1];
	const [first, last] = [Math.floor(Math.log10(low)), Math.ceil(Math.log10(high))];
	const ends: number[] = [];
	for (let power = first; power <= last; power += 1) {
		for (const step of steps) ends.push(Number(`${step}e${power}`));
	}
	ends.push(Number(`1e${last + 1}`));
	const from = ends.findLast((end) => end <= low) ?? low;
	return { from, to: ends.find((end) => end >= high && end > from) ?? high, log: true };
}

export function ticksOn(span: Span, count: number): number[] {
	return span.log ? logTicks(span, count) : ticks(span.from, span.to, count);
}

/** Powers of ten, every second or fifth where there are many, with 2 and 5 between them where there are few. */
function logTicks({ from, to }: Span, count: number): number[] {
	const [first, last] = [Math.ceil(Math.log10(from) - 1e-9), Math.floor(Math.log10(to) + 1e-9)];
	if (last - first < 1 && to / from < 10) return ticks(from, to, count);
	if (last - first < 2) {
		const fine = [first - 1, first, first + 1].flatMap((power) =>
			[1, 2, 5].map((step) => Number(`${step}e${power}`))
		);
		return fine.filter((tick) => tick >= from * (1 - 1e-9) && tick <= to * (1 + 1e-9));
	}
	const stride = Math.ceil((last - first + 1) / (count + 1));
	const powers: number[] = [];
	for (let power = first; power <= last; power += stride) powers.push(Number(`1e${power}`));
	return powers;
}

/** SVG path of the line, in PLOT units with y downwards. */
export function curvePath(points: readonly CurvePoint[], x: Span, y: Span): string {
	let pen: 'M' | 'L' = 'M';
	let path = '';
	for (const point of points) {
		if (point.y === null || !Number.isFinite(point.y) || (y.log && point.y <= 0)) {
			pen = 'M';
			continue;
		}
		const across = (shareOf(point.x, x) * PLOT).toFixed(1);
		const up = ((1 - shareOf(point.y, y)) * PLOT).toFixed(1);
		path += `${pen}${across} ${up}`;
		pen = 'L';
	}
	return path;
}

/** The part of a band that shows; null when it lies outside the scale. */
export function bandOnScale(band: Span, scale: Span): Span | null {
	const from = Math.max(band.from, scale.from);
	const to = Math.min(band.to, scale.to);
	return from < to ? { from, to } : null;
}

/** A few points for the table, ends included. */
export function tableRows(points: readonly CurvePoint[], rows = 9): { x: string; y: string }[] {
	const count = Math.min(rows, points.length);
	return Array.from({ length: count }, (_, index) => {
		const at = count > 1 ? Math.round((index * (points.length - 1)) / (count - 1)) : 0;
		const point = points[at];
		return {
			x: point ? figures(point.x, 4) : '',
			y: point?.y === null || point === undefined ? 'no reading' : figures(point.y, 3)
		};
	});
}

/** A band by its name and its ends: “FM radio, 87.5–108”. */
export function bandWords({ label, from, to }: Span & { label: string }): string {
	return `${label}, ${tickWords(from)}–${tickWords(to)}`;
}

/** Very large and very small ones by their power of ten, since a tick has no room for thirty noughts. */
export function tickWords(value: number): string {
	const size = Math.abs(value);
	if (size === 0 || (size >= 1e-4 && size < 1e7)) return printNumeral(plainDecimal(value));
	const [lead = '', power = ''] = Number(value.toPrecision(3)).toExponential().split('e');
	const raised = power
		.replace('+', '')
		.replace('-', '⁻')
		.replace(/\d/g, (digit) => RAISED[Number(digit)] ?? '');
	return lead === '1' ? `10${raised}` : `${printNumeral(lead)} × 10${raised}`;
}

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Significant figures without trailing zeros after the point. */
function figures(value: number, count: number): string {
	return tickWords(Number(roundToFigures(value, count)));
}
