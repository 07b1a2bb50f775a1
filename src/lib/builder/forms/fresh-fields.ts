/** What a block starts with when it is put in: the likeliest readings, and words from what the calculators say of themselves. */
import { convertQuantity, commensurable } from '../../physics/units/units.ts';
import type { CalculatorSet } from '../../physics/calculator.ts';
import { hasOptions } from '../../widget/control.ts';
import type { ChartItem, WidgetDocument } from '../../widget/document.ts';
import type { BenchReading } from '../bench-readings.ts';
import { suggestChart } from '../chart-fields.ts';
import { newId } from '../ids.ts';
import type { FieldBlockKind, FieldsOf } from '../schema.ts';
import { roundDown, roundUp } from '../wiring.ts';
import type { ChartForm } from '../../widget/chart.ts';

/** What can be put in by a form: a kind of block, or a form of chart. */
export type FormKind = Exclude<FieldBlockKind, 'chart' | 'picture'> | ChartForm;

export interface Bench {
	document: WidgetDocument;
	/** Readings at the first settings, outputs first. */
	readings: readonly BenchReading[];
	calculators: CalculatorSet;
}

/** The fields, or the sentence that says what has to be there first. */
export type Fresh =
	| { ok: true; kind: FieldBlockKind; fields: FieldsOf<FieldBlockKind> }
	| { ok: false; says: string };

const fresh = (kind: FieldBlockKind, fields: FieldsOf<FieldBlockKind>): Fresh => ({
	ok: true,
	kind,
	fields
});
const first = (says: string): Fresh => ({ ok: false, says });

export function freshFields(kind: FormKind, bench: Bench): Fresh {
	const { document, readings, calculators } = bench;
	const numbers = readings.filter(isNumber);
	const outputs = numbers.filter(({ tag }) => tag !== '');
	const [reading] = outputs.length > 0 ? outputs.slice(-1) : numbers;
	const source = usedSources(bench)[0]?.text ?? '';
	switch (kind) {
		case 'sources': {
			const items = usedSources(bench);
			return fresh('sources', {
				items: items.length > 0 ? items : [{ id: newId('source'), text: '', url: '' }]
			});
		}
		case 'presets':
			return document.controls.length === 0
				? first('Settings to try set the controls of the piece. Make a control first.')
				: fresh('presets', {
						label: '',
						presets: [{ id: newId('preset'), label: '', values: {} }]
					});
		case 'equation': {
			const step = document.steps.find(
				({ calculator }) => (calculators.get(calculator)?.equations.length ?? 0) > 0
			);
			return step
				? fresh('equation', { step: step.id, equation: 0, values: [], caption: '' })
				: first('An equation is a calculator’s own. Hang a calculator on the bench first.');
		}
		default: // the rest shows readings
	}
	if (!reading) return first('This shows readings. Hang a calculator on the bench first.');
	const unit = unitOfReading(reading);
	switch (kind) {
		case 'line': {
			const control = document.controls.find((each) => !hasOptions(each));
			return control
				? fresh('chart', suggestChart(document, reading, control, calculators))
				: first('A line draws a reading against a slider. Make a slider first.');
		}
		case 'ledger':
			return fresh('chart', {
				form: 'ledger',
				title: '',
				source,
				description: '',
				axis: { label: reading.label, unit },
				columns: [
					{
						id: newId('column'),
						label: '',
						parts: like(reading, numbers)
							.slice(0, 3)
							.map((each) => ({ id: newId('part'), label: each.label, reading: each.ref }))
					}
				]
			});
		case 'table':
			return fresh('table', {
				title: '',
				source,
				across: null,
				rows: outputs.slice(0, 4).map((each) => ({
					id: newId('row'),
					label: each.label,
					reading: each.ref,
					unit: unitOfReading(each),
					figures: 3
				}))
			});
		case 'guess': {
			const value = numberOf(reading) ?? 1;
			const isFactor = value > 0;
			return fresh('guess', {
				question: '',
				reading: reading.ref,
				unit,
				figures: 2,
				min: isFactor ? roundDown(value / 30) : roundDown(Math.abs(value)) * -10,
				max: isFactor ? roundUp(value * 30) : 0,
				scale: isFactor ? 'log' : 'linear'
			});
		}
		default:
			return fresh('chart', {
				form: kind,
				title: '',
				source,
				description: '',
				axis: { label: reading.label, unit, scale: kind === 'timeline' ? 'log' : 'linear' },
				shows: 'area',
				items: like(reading, numbers)
					.slice(0, 4)
					.map((each): ChartItem => ({ id: newId('item'), label: each.label, reading: each.ref }))
			});
	}
}

export function isNumber({ outcome }: BenchReading): boolean {
	return outcome.ok && typeof outcome.reading.value === 'number';
}

export function unitOfReading({ outcome }: BenchReading): string {
	return outcome.ok ? outcome.reading.unit : '';
}

function numberOf({ outcome }: BenchReading): number | null {
	return outcome.ok && typeof outcome.reading.value === 'number' ? outcome.reading.value : null;
}

/** Readings that can stand on one axis with this one, itself first. */
function like(reading: BenchReading, all: readonly BenchReading[]): BenchReading[] {
	const unit = unitOfReading(reading);
	return [
		reading,
		...all.filter((other) => other !== reading && commensurable(unitOfReading(other), unit))
	];
}

/** The first source of every calculator on the bench, each once. */
export function usedSources({
	document,
	calculators
}: Pick<Bench, 'document' | 'calculators'>): FieldsOf<'sources'>['items'] {
	const found = new Map<string, string>();
	for (const { calculator } of document.steps) {
		const [source] = calculators.get(calculator)?.sources ?? [];
		if (source) found.set(source.title.slice(0, 400), addressOf(source));
	}
	return [...found].map(([text, url]) => ({ id: newId('source'), text, url }));
}

function addressOf(source: { doi?: string; url?: string }): string {
	if (source.doi) return `https://doi.org/${source.doi}`;
	return source.url?.startsWith('https://') ? source.url : '';
}

/** A reading's number in a unit; null where it has none. */
export function readingIn(reading: BenchReading, unit: string): number | null {
	const value = numberOf(reading);
	if (value === null || !reading.outcome.ok) return null;
	const { unit: own, quantity } = reading.outcome.reading;
	return commensurable(own, unit) ? convertQuantity(value, own, unit, quantity) : null;
}
