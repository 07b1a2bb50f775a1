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
}

/** Side of the square that curves are drawn in. */
export const PLOT = 1000;

/** Where a value lies on a span, from 0 to 1. */
export function shareOf(value: number, { from, to }: Span): number {
	return (value - from) / (to - from);
}

/** An upright scale with round ends that holds the whole line; null when there is nothing to draw. */
export function yScale(points: readonly CurvePoint[]): Span | null {
	const [low, high] = extent(points, ({ y }) => (Number.isFinite(y) ? y : undefined));
	if (low === undefined || high === undefined) return null;
	const slack = low === high ? Math.abs(low) / 10 || 1 : 0;
	const [from, to] = nice(low - slack, high + slack, 5);
	return { from, to };
}

export function ticksOn({ from, to }: Span, count: number): number[] {
	return ticks(from, to, count);
}

/** SVG path of the line, in PLOT units with y downwards. */
export function curvePath(points: readonly CurvePoint[], x: Span, y: Span): string {
	let pen: 'M' | 'L' = 'M';
	let path = '';
	for (const point of points) {
		if (point.y === null || !Number.isFinite(point.y)) {
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

export function tickWords(value: number): string {
	return printNumeral(plainDecimal(value));
}

/** Significant figures without trailing zeros after the point. */
function figures(value: number, count: number): string {
	return printNumeral(plainDecimal(Number(roundToFigures(value, count))));
}
