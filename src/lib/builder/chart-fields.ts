/** A chart's words to begin with, from what the calculators say of themselves. The writer changes them at will. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { hasOptions } from '../widget/control.ts';
import type { Control, LineChart, ReadingRef, WidgetDocument } from '../widget/document.ts';
import { sampleChart } from '../widget/evaluate.ts';
import { wiringOf } from '../widget/graph.ts';
import { sameRef, type BenchReading } from './bench-readings.ts';

export type LineFields = Omit<LineChart, 'id' | 'kind'>;

export function suggestChart(
	document: WidgetDocument,
	reading: BenchReading,
	control: Control,
	calculators: CalculatorSet
): LineFields {
	const unit = chartUnit(document, reading);
	const fields = {
		form: 'line' as const,
		title: reading.label,
		x: {
			control: control.id,
			label: control.label,
			scale: control.kind === 'log-slider' ? ('log' as const) : ('linear' as const)
		},
		y: { unit, label: reading.label, scale: 'linear' as const, from: 'data' as const },
		series: [{ id: 'line', reading: reading.ref, label: '' }],
		bands: [],
		source: sources(document, reading.ref, calculators),
		description: ''
	};
	return { ...fields, description: trend(document, control, fields, calculators) };
}

/** The unit that the copy prints this reading in, or the reading's own. */
export function chartUnit(document: WidgetDocument, reading: BenchReading): string {
	const printed = document.claims.find(
		(claim) => claim.form === 'live' && sameRef(claim.reading, reading.ref)
	);
	if (printed?.form === 'live') return printed.unit;
	return reading.outcome.ok ? reading.outcome.reading.unit : '';
}

function sources(document: WidgetDocument, ref: ReadingRef, calculators: CalculatorSet): string {
	const titles = wiringOf(document.steps, ref).steps.flatMap(
		(step) =>
			calculators
				.get(step.calculator)
				?.sources.slice(0, 1)
				.map(({ title }) => title) ?? []
	);
	return [...new Set(titles)].join('; ').slice(0, 240);
}

/**
 * “Further along its slider, the wave left at this age, frequency as observed rises.” Without numbers: they can't be tied
 * in a description, and the table under the chart gives them.
 */
function trend(
	document: WidgetDocument,
	control: Control,
	fields: Pick<LineFields, 'x' | 'y' | 'series'>,
	calculators: CalculatorSet
): string {
	const [points = []] = sampleChart(document, {}, fields, calculators);
	const heights = points.flatMap(({ y }) => (y === null ? [] : [y]));
	const [first] = heights;
	const last = heights.at(-1);
	if (first === undefined || last === undefined || hasOptions(control)) return '';
	const top = Math.max(...heights);
	const bottom = Math.min(...heights);
	const what = lowerFirst(fields.y.label);
	const along = `A line over “${control.label}”, from the lowest setting to the highest: ${what}`;
	if (top > Math.max(first, last)) return `${along} rises to a peak and falls again.`;
	if (bottom < Math.min(first, last)) return `${along} falls to a trough and rises again.`;
	return `${along} ${last > first ? 'rises' : last < first ? 'falls' : 'stays level'} all the way.`;
}

function lowerFirst(text: string): string {
	return text.charAt(0).toLowerCase() + text.slice(1);
}
