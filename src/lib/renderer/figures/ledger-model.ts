/** Columns of parts laid end to end from nought, all on one axis, with their totals. */
import type { Drawn, DrawnColumn } from '../../widget/chart-data.ts';
import { axisOf, MARGIN, type Axis } from './axis.ts';
import { axisCaption, type ChartPrint } from './axis-words.ts';
import { NARROWEST, type FigureTable } from './figure-parts.ts';
import { hasValue, type Placed } from './item-table.ts';
import { shareOf, spanOver, type Span } from './span.ts';

export interface LedgerPart {
	id: string;
	label: string;
	words: string;
	/** Which of the patterns, from 0. */
	pattern: number;
	/** Shares of the axis; null where its column isn't drawn. */
	from: number | null;
	to: number | null;
}

export interface LedgerColumn {
	id: string;
	label: string;
	parts: LedgerPart[];
	/** '' where there is none. */
	total: string;
}

export interface LedgerModel {
	axis: Axis;
	caption: string;
	columns: LedgerColumn[];
	notes: string[];
	table: FigureTable;
}

export const PATTERNS = 6;
/** Figures of the largest total; all other numbers keep its decimal places. */
const TOTAL_FIGURES = 4;

export function ledgerModel(
	{ label, unit }: { label: string; unit: string },
	columns: readonly DrawnColumn[],
	print: ChartPrint
): LedgerModel | null {
	const totals = columns.map(({ parts }) => totalOf(parts));
	const span = spanOver(totals, { zero: true });
	if (!span || span.to <= 0) return null;
	const length = NARROWEST - 2 * MARGIN;
	const axis = axisOf(span, { label, unit, print, length });
	const scaled = (value: number) => axis.counted(value);
	const largest = Math.max(...totals.map((total) => scaled(total ?? 0)));
	const places = Math.min(12, Math.max(0, TOTAL_FIGURES - 1 - Math.floor(Math.log10(largest))));
	// A part that is there isn’t “0.00”.
	const say = (value: number) =>
		value !== 0 && Math.abs(scaled(value)) <= 0.5 / 10 ** places
			? print.value(scaled(value), 1)
			: print.places(scaled(value), places);
	const patternOf = patternsFor(columns);
	const drawn = columns.map((column, index): LedgerColumn => {
		const total = totals[index] ?? null;
		return {
			id: column.id,
			label: column.label,
			total: total === null ? '' : say(total),
			parts: partsOf(column.parts, total === null ? null : span, patternOf, (part) =>
				hasValue(part) ? say(part.value) : print.says.noReading
			)
		};
	});
	return {
		axis,
		caption: axisCaption(print, axis),
		columns: drawn,
		notes: [
			...columns.flatMap(({ label: name, parts }) => refusedParts(name, parts, print)),
			...drawn.flatMap(({ parts }) => thinParts(parts, length, print)),
			...columns.flatMap(({ parts }, index) =>
				roundingNote(parts, totals[index] ?? null, scaled, places, print)
			)
		],
		table: tableOf(drawn, axis, print)
	};
}

/** The sum of a column; null where a part is missing or below nought, since the rest alone would mislead. */
function totalOf(parts: readonly Drawn[]): number | null {
	return parts.every((part): part is Placed => hasValue(part) && part.value >= 0)
		? parts.reduce((sum, { value }) => sum + value, 0)
		: null;
}

function partsOf(
	parts: readonly Drawn[],
	span: Span | null,
	patternOf: (label: string, index: number) => number,
	words: (part: Drawn) => string
): LedgerPart[] {
	let sum = 0;
	return parts.map((part, index) => {
		const from = sum;
		sum += part.value ?? 0;
		return {
			id: part.id,
			label: part.label,
			words: words(part),
			pattern: patternOf(part.label, index),
			from: span && shareOf(from, span),
			to: span && shareOf(sum, span)
		};
	});
}

/** Parts of one name look alike in every column, as long as there are patterns enough. */
function patternsFor(columns: readonly DrawnColumn[]): (label: string, index: number) => number {
	const names = [...new Set(columns.flatMap(({ parts }) => parts.map(({ label }) => label)))];
	return names.length <= PATTERNS
		? (label) => names.indexOf(label)
		: (_label, index) => index % PATTERNS;
}

function refusedParts(column: string, parts: readonly Drawn[], print: ChartPrint): string[] {
	const name = (label: string) => [column, label].filter(Boolean).join(', ');
	return parts.flatMap((part) => {
		if (!hasValue(part)) return [print.says.partRefused(name(part.label), part.refusal)];
		return part.value < 0 ? [print.says.negativePart(name(part.label))] : [];
	});
}

function thinParts(parts: readonly LedgerPart[], length: number, print: ChartPrint): string[] {
	return parts.flatMap(({ label, from, to }) =>
		from !== null && to !== null && (to - from) * length < 1 ? [print.says.tooThin(label)] : []
	);
}

/** Where rounded parts don't add up to the rounded total, the ledger says why. */
function roundingNote(
	parts: readonly Drawn[],
	total: number | null,
	scaled: (value: number) => number,
	places: number,
	print: ChartPrint
): string[] {
	if (total === null || parts.length < 2) return [];
	const rounded = (value: number) => Number(scaled(value).toFixed(places));
	const sum = parts.reduce((all, { value }) => all + rounded(value ?? 0), 0);
	const [said, whole] = [print.places(sum, places), print.places(rounded(total), places)];
	return said === whole ? [] : [print.says.rounded(said, whole)];
}

function tableOf(columns: readonly LedgerColumn[], axis: Axis, print: ChartPrint): FigureTable {
	return {
		head: [print.says.part, [axis.label, axis.unit].filter(Boolean).join(' / ')],
		rows: columns.flatMap(({ label, parts, total }) => [
			...parts.map((part) => [[label, part.label].filter(Boolean).join(', '), part.words]),
			...(total ? [[[label, print.says.total].filter(Boolean).join(', '), total]] : [])
		])
	};
}
