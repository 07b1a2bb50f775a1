/** Geometry of a line chart, in per mille of the plot, so that a drawing needs no measuring. */
import { shareOf, type Span } from './span.ts';

export interface CurvePoint {
	x: number;
	/** Null where the reading is refused: the line has a gap there. */
	y: number | null;
}

/** Side of the square that curves are drawn in. */
export const PLOT = 1000;

/** Whether a point has a place on the upright axis. */
export function isDrawn(y: number | null, log = false): y is number {
	return y !== null && Number.isFinite(y) && !(log && y <= 0);
}

/** SVG path of the line, in PLOT units with y downwards. */
export function curvePath(points: readonly CurvePoint[], x: Span, y: Span): string {
	let pen: 'M' | 'L' = 'M';
	let path = '';
	for (const point of points) {
		if (!isDrawn(point.y, y.log)) {
			pen = 'M';
			continue;
		}
		const across = Math.round(shareOf(point.x, x) * PLOT * 10) / 10;
		const up = Math.round((1 - shareOf(point.y, y)) * PLOT * 10) / 10;
		path += `${pen}${across} ${up}`;
		pen = 'L';
	}
	return path;
}

/** The line in shares of the plot, y downwards, with its gaps. */
export function traceOf(
	points: readonly CurvePoint[],
	x: Span,
	y: Span
): { x: number; y: number | null }[] {
	return points.map((point) => ({
		x: shareOf(point.x, x),
		y: isDrawn(point.y, y.log) ? 1 - shareOf(point.y, y) : null
	}));
}

/** The part of a band that shows; null when it lies outside the scale. */
export function bandOnScale(band: { from: number; to: number }, scale: Span): Span | null {
	const from = Math.max(band.from, scale.from);
	const to = Math.min(band.to, scale.to);
	return from < to ? { from, to } : null;
}

/** Indices of a few points for the table, ends included. */
export function tableIndices(length: number, rows = 9): number[] {
	const count = Math.min(rows, length);
	return Array.from({ length: count }, (_, index) =>
		count > 1 ? Math.round((index * (length - 1)) / (count - 1)) : 0
	);
}
