/** Where the words of a line chart stand: names at the lines' ends, and those of bands. Two layouts, as in the style sheet. */
import type { Axis } from './axis.ts';
import { bandOnScale } from './curve.ts';
import { boxAt, crosses, spreadAlong, type Box, type Plot, type Trace } from './place-labels.ts';
import type { SeriesStyle } from './series-style.ts';
import { shareOf } from './span.ts';
import { textWidth } from './text-size.ts';

export type Room = 'narrow' | 'wide';

/** Heights of the plot in the style sheet, in pixels. */
export const HEIGHT = { narrow: 150, wide: 190 };
const LABEL_SIZE = 12;
const LABEL_HEIGHT = 15;
const AT_END = 12;

export interface EndLabel {
	words: string;
	/** Shares of the plot's height, y downwards. */
	line: number;
	label: number;
	style: SeriesStyle;
}

export interface BandWords {
	words: string;
	anchor: 'start' | 'end';
}

export interface DrawnBand {
	top: number;
	bottom: number;
	/** Name and ends: “FM radio, 87.5–108”. */
	whole: string;
	narrow: BandWords | null;
	wide: BandWords | null;
}

interface EndedLine {
	label: string;
	style: SeriesStyle;
	end: { x: number; y: number } | null;
}

/** Widest label that stands at a line's end, in pixels. */
const WIDEST_LABEL: Record<Room, number> = { narrow: 66, wide: 150 };

/** Labels in words where all of them are short enough, else the letters of the key. */
function labelsIn(drawn: readonly EndedLine[], room: Room): string[] {
	const short = drawn.every(
		({ label }) => label.trim() && textWidth(label, LABEL_SIZE) <= WIDEST_LABEL[room]
	);
	return drawn.map(({ label, style }) => (short ? label : style.letter));
}

export function gutter(drawn: readonly EndedLine[], room: Room): number {
	const widest = Math.max(...labelsIn(drawn, room).map((words) => textWidth(words, LABEL_SIZE)));
	return Math.ceil(widest) + AT_END + 2;
}

export function endLabels(drawn: readonly EndedLine[], room: Room): EndLabel[] {
	const labels = labelsIn(drawn, room);
	const height = HEIGHT[room];
	const standing = drawn
		.map(({ end, style }, index) => ({ end, style, words: labels[index] ?? '' }))
		.filter((each): each is typeof each & { end: { x: number; y: number } } => each.end !== null)
		.sort((a, b) => a.end.y - b.end.y);
	const middles = spreadAlong(
		standing.map(({ end }) => ({ at: end.y * height + LABEL_HEIGHT / 2, size: LABEL_HEIGHT })),
		height + LABEL_HEIGHT
	);
	return standing.map(({ end, style, words }, index) => ({
		words,
		style,
		line: end.y,
		label: ((middles[index] ?? 0) - LABEL_HEIGHT / 2) / height
	}));
}

/** A band's words stand on the side where no line runs through them at any width: whole, else its name alone. */
export function placeBands(
	bands: readonly { from: number; to: number; label: string }[],
	y: Axis,
	traces: readonly Trace[],
	plots: Record<Room, readonly Plot[]>
): DrawnBand[] {
	return bands.flatMap((band) => {
		const shown = bandOnScale(band, y.span);
		if (!shown) return [];
		const range = `${y.words(band.from, 6)}–${y.words(band.to, 6)}`;
		const whole = [band.label, range].filter(Boolean).join(', ');
		const top = 1 - shareOf(shown.to, y.span);
		const bottom = 1 - shareOf(shown.from, y.span);
		const place = (room: Room): BandWords | null => {
			for (const words of new Set([whole, band.label])) {
				for (const anchor of ['start', 'end'] as const) {
					const isFree = plots[room].every((plot) => {
						const box = bandBox({ top, bottom }, { words, anchor }, plot);
						return (
							box.left >= 0 &&
							box.right <= plot.width &&
							!traces.some((trace) => crosses(trace, box, plot))
						);
					});
					if (isFree && words) return { words, anchor };
				}
			}
			return null;
		};
		return [{ top, bottom, whole, narrow: place('narrow'), wide: place('wide') }];
	});
}

/** From the side of the plot to a band's words. */
export const BAND_INSET = 10;

export function bandBox(
	{ top, bottom }: { top: number; bottom: number },
	{ words, anchor }: BandWords,
	plot: Plot
): Box {
	return boxAt(
		{ x: anchor === 'start' ? 0 : 1, y: (top + bottom) / 2 },
		{ dx: anchor === 'start' ? BAND_INSET : -BAND_INSET, dy: 4, anchor },
		textWidth(words, LABEL_SIZE),
		plot
	);
}
