/** What a line chart draws and where its words go. */
import { axisOf, type Axis } from './axis.ts';
import { rangeWords, scaleWords, type ChartPrint } from './axis-words.ts';
import { curvePath, isDrawn, tableIndices, traceOf, type CurvePoint } from './curve.ts';
import { NARROWEST, WIDE, WIDEST, type FigureTable } from './figure-parts.ts';
import {
	bandBox,
	endLabels,
	gutter,
	HEIGHT,
	placeBands,
	type DrawnBand,
	type EndLabel,
	type Room
} from './line-labels.ts';
import { placeBeside, type Plot, type Spot } from './place-labels.ts';
import { seriesStyle, type SeriesStyle } from './series-style.ts';
import { shareOf, spanOver, type Span } from './span.ts';
import { textWidth } from './text-size.ts';

export interface LineSeries {
	id: string;
	label: string;
	points: readonly CurvePoint[];
	/** The reading where the reader stands; null where there is none. */
	now?: { value: number; uncertainty: number | null; words: string } | null;
}

export interface LineInput {
	x: { label: string; unit: string; from: number; to: number; log: boolean };
	y: { label: string; unit: string; log: boolean; zero: boolean };
	series: readonly LineSeries[];
	bands: readonly { from: number; to: number; label: string }[];
	/** Where the reader stands on the level axis; null for nowhere. */
	at: number | null;
	gaps: readonly { series: number; from: number; to: number; message: string }[];
}

/** Widths of the whole drawing at which words must be free: the ends of each range and one between. */
const WIDTHS: Record<Room, readonly number[]> = {
	narrow: [NARROWEST, 340, WIDE - 1],
	wide: [WIDE, 600, WIDEST]
};
const RIGHT = 14;
const READS_SIZE = 13;
/** Marks along each line. */
const MARKS = 4;
const TICK_ROOM = 12;

export interface DrawnSeries {
	id: string;
	label: string;
	style: SeriesStyle;
	path: string;
	/** Marks along the line; none where there is only one. */
	marks: { x: number; y: number }[];
	/** Where the line ends before the plot does: a leader goes on to its label. */
	end: { x: number; y: number } | null;
	now: {
		x: number;
		y: number;
		words: string;
		/** Ends of the whisker, y downwards. */
		whisker: { top: number; bottom: number } | null;
	} | null;
	/** For the key. */
	reads: string;
}

export interface LineModel {
	x: Axis;
	y: Axis;
	caption: string;
	xName: string;
	left: number;
	right: { narrow: number; wide: number };
	ends: { narrow: EndLabel[]; wide: EndLabel[] };
	series: DrawnSeries[];
	bands: DrawnBand[];
	spot: { narrow: Spot | null; wide: Spot | null };
	gaps: { from: number; to: number }[];
	/** Top of the line from the markers down to where the reader stands. */
	drop: { x: number; y: number } | null;
	notes: string[];
	notesIn: Record<Room, string[]>;
	table: FigureTable;
}

/** Null where no series has a point that can be drawn. */
export function lineModel(input: LineInput, print: ChartPrint): LineModel | null {
	const { x: along, y: up, series } = input;
	const ySpan = spanOver(valuesOf(input), { log: up.log, zero: up.zero });
	if (!ySpan || !series.some(({ points }) => points.some(({ y }) => isDrawn(y, up.log))))
		return null;
	const xSpan: Span = { from: along.from, to: along.to, ...(along.log ? { log: true } : {}) };
	const y = axisOf(ySpan, { ...up, print, length: HEIGHT.narrow, upright: true, sayCut: true });
	const left = Math.ceil(Math.max(...y.ticks.map(({ words }) => textWidth(words, 12)))) + TICK_ROOM;
	const several = series.length > 1;
	const drawn = series.map((each, index) =>
		drawSeries(each, index, { xSpan, ySpan, at: input.at, several })
	);
	const right = {
		narrow: several ? gutter(drawn, 'narrow') : RIGHT,
		wide: several ? gutter(drawn, 'wide') : RIGHT
	};
	const x = axisOf(xSpan, { ...along, print, length: NARROWEST - left - right.narrow });
	const traces = series.map(({ points }) => traceOf(points, xSpan, ySpan));
	const plotsIn = (room: Room): Plot[] =>
		WIDTHS[room].map((width) => ({ width: width - left - right[room], height: HEIGHT[room] }));
	const plots = { narrow: plotsIn('narrow'), wide: plotsIn('wide') };
	const bands = placeBands(input.bands, y, traces, plots);
	const only = several ? undefined : drawn[0]?.now;
	const spotIn = (room: Room) =>
		only
			? placeBeside(only, only.words, READS_SIZE, plots[room], traces, (plot) =>
					bands.flatMap((band) => {
						const words = band[room];
						return words ? [bandBox(band, words, plot)] : [];
					})
				)
			: null;
	/** What has no place in the drawing stands under it. The reading's line is kept free, so that no setting moves the page. */
	const unplaced = (room: Room) => [
		...(only ? [spot[room] ? '' : `${print.says.now}: ${only.words}.`] : []),
		...bands
			.filter((band) => band[room]?.words !== band.whole)
			.map(({ whole }) => print.says.band(whole))
	];
	const spot = { narrow: spotIn('narrow'), wide: spotIn('wide') };
	return {
		x,
		y,
		caption: [y.name, scaleWords(print, up.log, along.log), y.step, ...y.notes]
			.filter(Boolean)
			.join('; '),
		xName: [x.name, x.step, ...x.notes].filter(Boolean).join('; '),
		left,
		right,
		ends: {
			narrow: several ? endLabels(drawn, 'narrow') : [],
			wide: several ? endLabels(drawn, 'wide') : []
		},
		series: drawn,
		bands,
		spot,
		gaps: input.gaps.map(({ from, to }) => ({
			from: shareOf(from, xSpan),
			to: shareOf(to, xSpan)
		})),
		drop: dropOf(drawn),
		notes: notesOf(input, drawn, print),
		notesIn: { narrow: unplaced('narrow'), wide: unplaced('wide') },
		table: tableOf(input, x, y, print)
	};
}

function* valuesOf({ series }: LineInput): Generator<number | null> {
	for (const { points, now } of series) {
		for (const { y } of points) yield y;
		if (!now) continue;
		yield now.value;
		if (now.uncertainty === null) continue;
		yield now.value - now.uncertainty;
		yield now.value + now.uncertainty;
	}
}

interface Frame {
	xSpan: Span;
	ySpan: Span;
	at: number | null;
	several: boolean;
}

function drawSeries(
	{ id, label, points, now }: LineSeries,
	index: number,
	{ xSpan, ySpan, at, several }: Frame
): DrawnSeries {
	const place = ({ x, y }: CurvePoint) =>
		isDrawn(y, ySpan.log) ? { x: shareOf(x, xSpan), y: 1 - shareOf(y, ySpan) } : null;
	const last = points.findLast(({ y }) => isDrawn(y, ySpan.log));
	const here = now && at !== null ? place({ x: at, y: now.value }) : null;
	const marks = several
		? Array.from({ length: MARKS }, (_, mark) => {
				const share = (mark + 0.3 + index * 0.13) / MARKS;
				const point = points[Math.round(share * (points.length - 1))];
				return point ? place(point) : null;
			}).filter((mark) => mark !== null)
		: [];
	return {
		id,
		label,
		style: seriesStyle(index),
		path: curvePath(points, xSpan, ySpan),
		marks,
		end: last ? place(last) : null,
		now: here && now ? { ...here, words: now.words, whisker: whiskerOf(now, ySpan) } : null,
		reads: now?.words ?? ''
	};
}

function dropOf(drawn: readonly DrawnSeries[]): { x: number; y: number } | null {
	const standing = drawn.map(({ now }) => now).filter((now) => now !== null);
	const [first] = standing;
	return first ? { x: first.x, y: Math.min(...standing.map(({ y }) => y)) } : null;
}

function whiskerOf(
	{ value, uncertainty }: { value: number; uncertainty: number | null },
	span: Span
): { top: number; bottom: number } | null {
	if (!uncertainty) return null;
	const low = value - uncertainty;
	return {
		top: 1 - shareOf(value + uncertainty, span),
		bottom: span.log && low <= 0 ? 1 : 1 - shareOf(low, span)
	};
}

function notesOf(
	{ series, gaps, x, y }: LineInput,
	drawn: readonly DrawnSeries[],
	print: ChartPrint
): string[] {
	const several = series.length > 1;
	const below = series.flatMap(({ label, points }) =>
		y.log && points.some(({ y: value }) => value !== null && value <= 0)
			? [print.says.partlyNotAboveZero(label || y.label)]
			: []
	);
	const refused = gaps.map(({ series: index, from, to, message }) =>
		print.says.gap(
			rangeWords(print, from, to, print.unit(x.unit)),
			several ? (series[index]?.label ?? '') : '',
			message
		)
	);
	const whiskers = drawn.some(({ now }) => now?.whisker) ? [print.says.whisker] : [];
	return [...new Set([...below, ...refused, ...whiskers])];
}

function tableOf(
	{ series, at, y: up }: LineInput,
	x: Axis,
	y: Axis,
	print: ChartPrint
): FigureTable {
	const inUnit = (label: string, unit: string) => [label, unit].filter(Boolean).join(' / ');
	const names = series.map(({ label }) => inUnit(series.length > 1 ? label : up.label, y.unit));
	const words = (value: number | null | undefined) =>
		value === null || value === undefined ? print.says.noReading : y.words(value, 3);
	const rows = tableIndices(series[0]?.points.length ?? 0).map((index) => [
		x.words(series[0]?.points[index]?.x ?? 0, 4),
		...series.map(({ points }) => words(points[index]?.y))
	]);
	const now =
		at !== null && series.some((each) => each.now)
			? [
					[
						`${print.says.now}: ${x.words(at, 12)}`,
						...series.map((each) => each.now?.words ?? print.says.noReading)
					]
				]
			: [];
	return { head: [inUnit(x.label, x.unit), ...names], rows: [...now, ...rows] };
}
