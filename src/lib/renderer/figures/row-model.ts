/** Bars and dots: one row for each thing, all on one axis. */
import type { Drawn } from '../../widget/chart-data.ts';
import { axisOf, MARGIN, type Axis } from './axis.ts';
import { axisCaption, type ChartPrint } from './axis-words.ts';
import { NARROWEST, type FigureTable } from './figure-parts.ts';
import {
	hasValue,
	itemNotes,
	itemTable,
	itemWords,
	valuesWithWhiskers,
	type ItemAxis
} from './item-table.ts';
import { shareOf, spanOver, type Span } from './span.ts';
import { textWidth } from './text-size.ts';

export interface Row {
	id: string;
	label: string;
	/** The value as printed. */
	words: string;
	/** Where the value lies; null where it can't be drawn. */
	share: number | null;
	whisker: { from: number; to: number } | null;
	/** Where a bar's words stand: past its end, or past its whisker. */
	wordsAt: number;
	negative: boolean;
}

export interface RowModel {
	axis: Axis;
	caption: string;
	/** Where nought lies; bars begin there. */
	zero: number;
	rows: Row[];
	left: number;
	right: number;
	notes: string[];
	table: FigureTable;
}

const VALUE_SIZE = 13;
/** From the end of a bar to its words. */
export const BESIDE_BAR = 6;
const SHORTEST_PLOT = 120;

export function rowModel(
	form: 'bars' | 'dots',
	{ label, unit, log: wantsLog }: ItemAxis,
	items: readonly Drawn[],
	print: ChartPrint
): RowModel | null {
	const log = form === 'dots' && wantsLog;
	const span = spanOver(valuesWithWhiskers(items), { log, zero: form === 'bars' });
	if (!span) return null;
	const words = axisOf(span, { label, unit, print, length: NARROWEST });
	const rows = items.map((item) => rowOf(item, span, words, print));
	const { left, right } = form === 'bars' ? barRoom(rows) : { left: MARGIN, right: MARGIN };
	const length = NARROWEST - left - right;
	const axis = axisOf(span, { label, unit, print, length, sayCut: true });
	return {
		axis,
		caption: axisCaption(print, axis),
		zero: span.log ? 0 : shareOf(0, span),
		rows,
		left,
		right,
		notes: [
			...itemNotes(items, log, print),
			...(form === 'bars' ? shortBars(rows, span, length, print) : []),
			...(rows.some(({ whisker }) => whisker) ? [print.says.whisker] : [])
		],
		table: itemTable(items, label, axis, print)
	};
}

function rowOf(item: Drawn, span: Span, axis: Axis, print: ChartPrint): Row {
	const { id, label, uncertainty } = item;
	const words = itemWords(item, axis.words, print);
	const nowhere = { id, label, words, share: null, whisker: null, wordsAt: 0, negative: false };
	if (!hasValue(item) || (span.log && item.value <= 0)) return nowhere;
	const { value } = item;
	const share = shareOf(value, span);
	const low = value - (uncertainty ?? 0);
	const whisker = uncertainty
		? {
				from: span.log && low <= 0 ? 0 : shareOf(low, span),
				to: shareOf(value + uncertainty, span)
			}
		: null;
	const negative = value < 0;
	const wordsAt = whisker ? (negative ? whisker.from : whisker.to) : share;
	return { id, label, words, share, whisker, wordsAt, negative };
}

/** Room beside the plot for the words at the bars' ends, at its shortest. */
function barRoom(rows: readonly Row[]): { left: number; right: number } {
	let [left, right] = [MARGIN, MARGIN];
	for (const { share, wordsAt, words, negative } of rows) {
		const width = textWidth(words, VALUE_SIZE) + BESIDE_BAR + 2;
		if (share === null) right = Math.max(right, width - SHORTEST_PLOT);
		else if (negative) left = Math.max(left, width - wordsAt * SHORTEST_PLOT);
		else right = Math.max(right, width - (1 - wordsAt) * SHORTEST_PLOT);
	}
	return { left: Math.ceil(left), right: Math.ceil(right) };
}

/** Bars under a pixel long where the chart is narrowest; nothing is drawn longer than it is. */
function shortBars(rows: readonly Row[], span: Span, length: number, print: ChartPrint): string[] {
	const zero = shareOf(0, span);
	return rows.flatMap(({ label, share }) =>
		share !== null && Math.abs(share - zero) * length < 1 ? [print.says.tooShort(label)] : []
	);
}
