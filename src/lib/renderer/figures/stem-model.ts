/** Things on one level line, each with a flag that names it: a number line, or the strip of a spectrum. */
import { convert, unitOf } from '../../physics/units/units.ts';
import type { Drawn } from '../../widget/chart-data.ts';
import { axisOf, type Axis } from './axis.ts';
import { axisCaption, type ChartPrint } from './axis-words.ts';
import { NARROWEST, type FigureTable } from './figure-parts.ts';
import {
	hasValue,
	itemNotes,
	itemTable,
	itemWords,
	valuesWithWhiskers,
	type ItemAxis,
	type Placed
} from './item-table.ts';
import { BESIDE, raiseFlags, type RaisedFlag } from './place-labels.ts';
import { shareOf, spanOver, type Span } from './span.ts';
import { textWidth, wrapText } from './text-size.ts';

export interface Stem extends RaisedFlag {
	id: string;
	share: number;
	/** Name, broken into lines. */
	lines: string[];
	words: string;
	height: number;
	whisker: { from: number; to: number } | null;
	/** A line of a spectrum as it left, where its name says so. */
	emitted: boolean;
}

export interface StemModel {
	axis: Axis;
	caption: string;
	stems: Stem[];
	/** Pixels that the flags take over and under the line. */
	over: number;
	under: number;
	/** The part of a spectrum's axis that eyes see. */
	visible: { from: number; to: number } | null;
	/** From a line as emitted to the same line as observed. */
	shifts: { from: number; to: number }[];
	notes: string[];
	table: FigureTable;
}

export const NAME_LINE = 15;
const NAME_SIZE = 12;
const VALUE_SIZE = 13;
export const SIDE = 14;
/** The row of ticks under the line, which hanging flags keep clear of. */
export const TICK_ROW = 24;

export function stemModel(
	form: 'number-line' | 'spectrum',
	{ label, unit, log }: ItemAxis,
	items: readonly Drawn[],
	print: ChartPrint
): StemModel | null {
	const span = spanOver(valuesWithWhiskers(items), { log });
	if (!span) return null;
	const length = NARROWEST - 2 * SIDE;
	const axis = axisOf(span, { label, unit, print, length, sayCut: form === 'number-line' });
	const placed = items
		.filter(hasValue)
		.filter(({ value }) => !span.log || value > 0)
		.map((item) => ({
			item,
			share: shareOf(item.value, span),
			...flagOf(item, axis, length, print)
		}));
	const raised = raiseFlags(placed, length);
	const stems = placed.map(({ item, share, lines, words, height }, index): Stem => ({
		...(raised[index] ?? { side: 'start', lift: 0, below: false }),
		id: item.id,
		share,
		lines,
		words,
		height,
		whisker: whiskerOf(item, span),
		emitted: form === 'spectrum' && EMITTED.test(item.label)
	}));
	const reach = (below: boolean) =>
		stems.reduce(
			(most, stem) => (stem.below === below ? Math.max(most, stem.lift + stem.height) : most),
			0
		);
	const visible = form === 'spectrum' ? visibleOn(span, unit) : null;
	return {
		axis,
		caption: axisCaption(print, axis),
		stems,
		over: reach(false) + 4,
		under: reach(true),
		visible,
		shifts: form === 'spectrum' ? shiftsIn(placed) : [],
		notes: [
			...itemNotes(items, log, print),
			...(visible ? [print.says.visible(VISIBLE_NM.join('–'))] : []),
			...(stems.some(({ emitted }) => emitted) ? [print.says.emitted] : []),
			...(stems.some(({ whisker }) => whisker) ? [print.says.whisker] : [])
		],
		table: itemTable(items, label, axis, print)
	};
}

function flagOf(item: Placed, axis: Axis, length: number, print: ChartPrint) {
	const words = itemWords(item, axis.words, print);
	const room = length / 2 - BESIDE - 2;
	const lines = wrapText(item.label, room, NAME_SIZE);
	const widths = [...lines.map((line) => textWidth(line, NAME_SIZE)), textWidth(words, VALUE_SIZE)];
	return {
		words,
		lines,
		width: Math.min(length / 2, Math.max(...widths)),
		height: (lines.length + 1) * NAME_LINE
	};
}

function whiskerOf({ value, uncertainty }: Placed, span: Span): Stem['whisker'] {
	if (!uncertainty) return null;
	const low = value - uncertainty;
	return {
		from: span.log && low <= 0 ? 0 : shareOf(low, span),
		to: shareOf(value + uncertainty, span)
	};
}

/** Words by which a line's name says that it is the line as it left, or as it was caught. */
const EMITTED = /\b(?:emitted|at rest|in the laboratory|ausgesandt|im labor|emitida|en reposo)\b/i;
const OBSERVED = /\b(?:observed|received|beobachtet|empfangen|observada|recibida)\b/i;

function shiftsIn(
	placed: readonly { item: Placed; share: number }[]
): { from: number; to: number }[] {
	const bare = (label: string, word: RegExp) =>
		label
			.replace(word, '')
			.replace(/[^\p{L}\p{N}]+/gu, ' ')
			.trim()
			.toLowerCase();
	return placed.flatMap(({ item, share: from }) => {
		if (!EMITTED.test(item.label)) return [];
		const same = placed.find(
			(other) =>
				OBSERVED.test(other.item.label) &&
				bare(other.item.label, OBSERVED) === bare(item.label, EMITTED)
		);
		return same && same.share !== from ? [{ from, to: same.share }] : [];
	});
}

/** Wavelengths that eyes see, in nm; common practice. */
const VISIBLE_NM = [380, 750] as const;
/** Exact in the SI (SI Brochure, 9th edition, table 1). */
const LIGHT_SPEED = 299_792_458;
const PLANCK = 6.626_070_15e-34;

/** What of the visible band lies on an axis of wavelength, frequency or photon energy; null where none can be seen. */
function visibleOn(span: Span, unit: string): { from: number; to: number } | null {
	const dimension = JSON.stringify(unitOf(unit)?.dimension);
	const like = (symbol: string) => JSON.stringify(unitOf(symbol)?.dimension) === dimension;
	const inUnit = (nm: number): number | null => {
		const hertz = LIGHT_SPEED / (nm * 1e-9);
		if (like('m')) return convert(nm, 'nm', unit);
		if (like('Hz')) return convert(hertz, 'Hz', unit);
		return like('J') ? convert(PLANCK * hertz, 'J', unit) : null;
	};
	const [a, b] = VISIBLE_NM.map(inUnit);
	if (a === null || a === undefined || b === null || b === undefined) return null;
	const low = Math.max(span.from, Math.min(a, b));
	const high = Math.min(span.to, Math.max(a, b));
	if (low >= high) return null;
	const [from, to] = [shareOf(low, span), shareOf(high, span)];
	return (to - from) * NARROWEST < 1 ? null : { from, to };
}
