/**
 * What a chart draws, from the document's evaluation: readings in the chart's unit with their uncertainty, or the
 * sentence that says why there is none. Pure; nothing is worked that the evaluation hasn't worked already, save the
 * middle of each gap in a line, which must say its reason.
 */
import type { CalculatorSet } from '../physics/calculator.ts';
import { commensurable, convertDifference } from '../physics/units/units.ts';
import type {
	Claim,
	ControlValues,
	ItemChart,
	LedgerChart,
	LineChart,
	ReadingRef
} from './document.ts';
import {
	evaluate,
	readingAt,
	valueIn,
	type ChartPoint,
	type Evaluation,
	type ReadingOutcome,
	type Wired
} from './evaluate.ts';
import { wiringOf } from './graph.ts';

export interface Drawn {
	id: string;
	label: string;
	/** In the chart's unit; null where there is no number to draw, and `refusal` says why. */
	value: number | null;
	/** Standard uncertainty in the chart's unit; null where it is exact or not known. */
	uncertainty: number | null;
	refusal: string;
	/** Significant figures it is printed with. */
	figures: number;
}

export interface DrawnColumn {
	id: string;
	label: string;
	parts: Drawn[];
}

/** Figures of a drawn number that the copy doesn't print. */
const FIGURES = 3;
/** Figures of a line of the catalogue, which is pinned as published. */
const PINNED_FIGURES = 5;

/** What charts are drawn from. */
export interface ChartSource {
	document: Wired & { claims: readonly Claim[] };
	evaluation: Evaluation;
	calculators: CalculatorSet;
}

export function itemsDrawn(chart: Pick<ItemChart, 'axis' | 'items'>, source: ChartSource): Drawn[] {
	return chart.items.map((item) => {
		const { id, label } = item;
		return 'reading' in item
			? { id, label, ...readingDrawn(item.reading, chart.axis.unit, source) }
			: {
					id,
					label,
					value: item.value,
					uncertainty: null,
					refusal: '',
					figures: PINNED_FIGURES
				};
	});
}

export function columnsDrawn(
	chart: Pick<LedgerChart, 'axis' | 'columns'>,
	source: ChartSource
): DrawnColumn[] {
	return chart.columns.map(({ id, label, parts }) => ({
		id,
		label,
		parts: parts.map((part) => ({
			id: part.id,
			label: part.label,
			...readingDrawn(part.reading, chart.axis.unit, source)
		}))
	}));
}

/** The readings of a line chart at the present settings, in the order of its series. */
export function seriesDrawn(chart: Pick<LineChart, 'y' | 'series'>, source: ChartSource): Drawn[] {
	return chart.series.map(({ id, label, reading }) => ({
		id,
		label,
		...readingDrawn(reading, chart.y.unit, source)
	}));
}

function readingDrawn(
	ref: ReadingRef,
	unit: string,
	{ document, evaluation, calculators }: ChartSource
): Omit<Drawn, 'id' | 'label'> {
	const outcome = readingAt(document, evaluation, ref, calculators);
	const value = valueIn(outcome, unit);
	const figures = figuresOf(ref, unit, document.claims);
	return value !== null && Number.isFinite(value)
		? { value, uncertainty: uncertaintyIn(outcome, unit), refusal: '', figures }
		: { value: null, uncertainty: null, refusal: whyNot(outcome, unit), figures };
}

function uncertaintyIn(outcome: ReadingOutcome, unit: string): number | null {
	if (!outcome.ok || typeof outcome.reading.uncertainty !== 'number') return null;
	return Math.abs(convertDifference(outcome.reading.uncertainty, outcome.reading.unit, unit));
}

function whyNot(outcome: ReadingOutcome, unit: string): string {
	if (!outcome.ok) return outcome.refusal.message;
	if (typeof outcome.reading.value === 'string')
		return 'This reading is a word and has no place on an axis.';
	return commensurable(outcome.reading.unit, unit)
		? 'There is no number to give at this setting.'
		: `This reading can’t be given in ${unit || 'plain numbers'}.`;
}

/** As many figures as the copy prints of the same reading, so that chart and sentence say one number. */
function figuresOf(ref: ReadingRef, unit: string, claims: readonly Claim[]): number {
	const wanted = JSON.stringify(ref);
	for (const claim of claims) {
		const same =
			claim.form === 'live' && claim.unit === unit && JSON.stringify(claim.reading) === wanted;
		if (same) return claim.figures;
	}
	return FIGURES;
}

/** A stretch of the level axis without readings of one series, and why. */
export interface Gap {
	series: number;
	from: number;
	to: number;
	message: string;
}

/** Why a line has gaps: each is worked once more at its middle point, which says it. */
export function gapsDrawn(
	document: Wired,
	values: ControlValues,
	chart: Pick<LineChart, 'x' | 'y' | 'series'>,
	lines: readonly (readonly ChartPoint[])[],
	calculators: CalculatorSet
): Gap[] {
	return lines.flatMap((points, series) => {
		const reading = chart.series[series]?.reading;
		if (!reading) return [];
		const upstream = {
			formulas: document.formulas,
			controls: document.controls,
			steps: wiringOf(document.steps, reading).steps
		};
		return stretchesWithout(points).map(({ first, last }): Gap => {
			const middle = points[Math.floor((first + last) / 2)]?.x ?? 0;
			const at = evaluate(upstream, { ...values, [chart.x.control]: middle }, calculators);
			const outcome = readingAt(upstream, at, reading, calculators);
			return {
				series,
				from: points[first]?.x ?? middle,
				to: points[last]?.x ?? middle,
				message: whyNot(outcome, chart.y.unit)
			};
		});
	});
}

function stretchesWithout(points: readonly ChartPoint[]): { first: number; last: number }[] {
	const found: { first: number; last: number }[] = [];
	points.forEach(({ y }, index) => {
		if (y !== null && Number.isFinite(y)) return;
		const open = found.at(-1);
		if (open && open.last === index - 1) open.last = index;
		else found.push({ first: index, last: index });
	});
	return found;
}
