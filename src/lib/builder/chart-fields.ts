/** A chart's words to begin with, from what the calculators say of themselves. The writer changes them at will. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { unitOf } from '../physics/units/units.ts';
import { hasOptions } from '../widget/control.ts';
import type { Control, LineChart, ReadingRef, WidgetDocument } from '../widget/document.ts';
import { sampleChart } from '../widget/evaluate.ts';
import { wiringOf } from '../widget/graph.ts';
import { printStated, stateReading } from '../widget/stated.ts';
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
	return { ...fields, description: ends(document, control, fields, calculators) };
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

/** “From 100 to 500 million years (the wave left at this age), frequency as observed rises from … to ….” */
function ends(
	document: WidgetDocument,
	control: Control,
	fields: Pick<LineFields, 'x' | 'y' | 'series'>,
	calculators: CalculatorSet
): string {
	const [points = []] = sampleChart(document, {}, fields, calculators);
	const first = points[0]?.y;
	const last = points.at(-1)?.y;
	if (first == null || last == null || hasOptions(control)) return '';
	const { unit, label } = fields.y;
	const say = (value: number) =>
		printStated(stateReading(value, unit, { unit, figures: 3, hedge: 'none' }));
	const trend = last > first ? 'rises' : last < first ? 'falls' : 'goes';
	const range = `${control.min} to ${control.max} ${unitOf(control.unit)?.words.many ?? ''}`.trim();
	return `From ${range} (${lowerFirst(control.label)}), ${lowerFirst(label)} ${trend} from ${say(first)} to ${say(last)}.`;
}

function lowerFirst(text: string): string {
	return text.charAt(0).toLowerCase() + text.slice(1);
}
