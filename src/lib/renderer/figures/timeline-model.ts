/** A timeline that runs downwards, so that names have the whole width. */
import type { Drawn } from '../../widget/chart-data.ts';
import { axisOf, type Axis } from './axis.ts';
import { axisCaption, type ChartPrint } from './axis-words.ts';
import { NARROWEST, WIDE, type FigureTable } from './figure-parts.ts';
import {
	hasValue,
	itemNotes,
	itemTable,
	itemWords,
	valuesWithWhiskers,
	type ItemAxis
} from './item-table.ts';
import { spreadAlong } from './place-labels.ts';
import { shareOf, spanOver } from './span.ts';
import { textWidth, wrapText } from './text-size.ts';

export interface TimelineEvent {
	id: string;
	/** On the line, and the top of its words, in pixels from the start. */
	at: number;
	top: number;
	words: string;
	lines: string[];
	whisker: { from: number; to: number } | null;
}

export interface TimelineLayout {
	height: number;
	events: TimelineEvent[];
}

export interface TimelineModel {
	axis: Axis;
	caption: string;
	left: number;
	narrow: TimelineLayout;
	wide: TimelineLayout;
	notes: string[];
	table: FigureTable;
}

export const EVENT_LINE = 16;
/** From the line to the words. */
export const LEADER = 34;
const SHORTEST = 220;
const BETWEEN = 8;
const NAME_SIZE = 13;

export function timelineModel(
	{ label, unit, log }: ItemAxis,
	items: readonly Drawn[],
	print: ChartPrint
): TimelineModel | null {
	const span = spanOver(valuesWithWhiskers(items), { log });
	if (!span) return null;
	const axis = axisOf(span, { label, unit, print, length: SHORTEST, upright: true, sayCut: true });
	const left = Math.ceil(Math.max(...axis.ticks.map(({ words }) => textWidth(words, 12)))) + 13;
	const placed = items
		.filter(hasValue)
		.filter(({ value }) => !span.log || value > 0)
		.sort((a, b) => a.value - b.value);

	function layout(width: number): TimelineLayout {
		const named = placed.map((item) => {
			const lines = wrapText(item.label, width - left - LEADER - 2, NAME_SIZE);
			return { item, lines, size: (lines.length + 1) * EVENT_LINE + BETWEEN };
		});
		const needed = named.reduce((sum, { size }) => sum + size, 0);
		const height = Math.max(SHORTEST, needed);
		const share = (value: number) => shareOf(value, axis.span) * height;
		const middles = spreadAlong(
			named.map(({ item, size }) => ({ at: share(item.value), size })),
			height
		);
		return {
			height,
			events: named.map(({ item, lines, size }, index) => {
				const low = item.value - (item.uncertainty ?? 0);
				return {
					id: item.id,
					at: share(item.value),
					top: (middles[index] ?? 0) - size / 2 + BETWEEN / 2,
					words: itemWords(item, axis.words, print),
					lines,
					whisker: item.uncertainty
						? {
								from: axis.span.log && low <= 0 ? 0 : share(low),
								to: share(item.value + item.uncertainty)
							}
						: null
				};
			})
		};
	}

	const narrow = layout(NARROWEST);
	return {
		axis,
		caption: axisCaption(print, axis),
		left,
		narrow,
		wide: layout(WIDE),
		notes: [
			...itemNotes(items, log, print),
			...(narrow.events.some(({ whisker }) => whisker) ? [print.says.whisker] : [])
		],
		table: itemTable(items, label, axis, print)
	};
}
