/**
 * Document and control values in, every reading out. The only code that computes a reading: the manuscript, the
 * frame and the fact-check all call it, so they cannot disagree. It never throws; a reading that can't be had is a
 * refusal, and what hangs on it is refused with the first cause.
 */
import {
	refuse,
	resolveUnit,
	type CalculatorSet,
	type Calculator,
	type InputSpec,
	type NumberInput,
	type RawInputs,
	type Reading,
	type Refusal,
	type Result,
	type Uncertainty
} from '../physics/calculator.ts';
import { inEdition } from '../physics/calculators/in-edition.ts';
import { runCalculator } from '../physics/calculators/run.ts';
import { constants, edition } from '../physics/constants/index.ts';
import type { QuantityKind } from '../physics/units/quantities.ts';
import { commensurable, convertQuantity } from '../physics/units/units.ts';
import { hasOptions } from './control-kind.ts';
import { settingFrom, settleValue } from './control-grid.ts';
import type {
	Control,
	ControlValues,
	LineChart,
	ReadingRef,
	SettingSource,
	Step,
	WidgetDocument
} from './document.ts';
import { orderSteps, wiringOf } from './graph.ts';
import { fixedSettings } from './tie-units.ts';

export interface Evaluation {
	/** Every control's value, after keeping it inside its range. */
	values: ControlValues;
	/** Results by step id. */
	steps: Readonly<Record<string, Result>>;
}

export type ReadingOutcome = { ok: true; reading: Reading } | { ok: false; refusal: Refusal };

/** Without an edition the constants in use hold. */
export type Wired = Pick<WidgetDocument, 'formulas' | 'steps' | 'controls'> &
	Partial<Pick<WidgetDocument, 'constants'>>;

/** Works one step on inputs that its settings came to; `evaluateUncertainty` puts its own in place of the plain one. */
export type RunStep = (
	step: Step,
	calculator: Calculator,
	inputs: RawInputs,
	uncertainties: Readonly<Record<string, Uncertainty>>
) => Result;

const runPlainly: RunStep = (_step, calculator, inputs, uncertainties) =>
	runCalculator(calculator, inputs, uncertainties);

/** Works every step in order. Values outside a control's range are brought to its nearest end. */
export function evaluate(
	document: Wired,
	values: ControlValues,
	calculators: CalculatorSet,
	run: RunStep = runPlainly
): Evaluation {
	const settled = settleValues(document.controls, values);
	const order = orderSteps(document.steps);
	const results: Record<string, Result> = {};
	for (const step of order.ok ? order.steps : document.steps) {
		results[step.id] = order.ok
			? evaluateStep(step, document, settled, results, calculators, run)
			: refuse('wiring', 'The calculators on the bench are wired in a ring.');
	}
	return { values: settled, steps: results };
}

function settleValues(controls: readonly Control[], values: ControlValues): Record<string, number> {
	return Object.fromEntries(
		controls.map((control) => [control.id, settleValue(control, values[control.id])])
	);
}

function evaluateStep(
	step: Step,
	document: Wired,
	values: ControlValues,
	results: Record<string, Result>,
	calculators: CalculatorSet,
	run: RunStep
): Result {
	const offered = calculators.get(step.calculator);
	if (!offered) return refuse('unknown-calculator', `There is no calculator “${step.calculator}”.`);
	const calculator = inEdition(offered, edition(document.constants ?? '') ?? constants);

	const inputs: RawInputs = {};
	const uncertainties: Record<string, Uncertainty> = {};
	for (const [key, source] of settingsInOrder(step, calculator.inputs)) {
		const [head = key] = key.split('.');
		const spec = calculator.inputs[head];
		const outcome = settingValue(source, spec, inputs, document, values, results);
		if (!outcome.ok) return outcome;
		assign(inputs, key, outcome.value);
		if (outcome.uncertainty !== undefined) uncertainties[head] = outcome.uncertainty;
	}
	return run(step, calculator, inputs, uncertainties);
}

/** Choices first: a number's unit may hang on one (`energy.convert`, `cosmo.inverse`). Whole objects before their parts. */
function settingsInOrder(step: Step, inputs: Record<string, InputSpec>): [string, SettingSource][] {
	const rank = (key: string) => (key.includes('.') ? 2 : inputs[key]?.kind === 'number' ? 1 : 0);
	return Object.entries(step.settings).sort(([a], [b]) => rank(a) - rank(b));
}

/** `uncertainty` is known of what comes from another reading; a setting is exact. */
type SettingOutcome =
	{ ok: true; value: unknown; uncertainty?: Uncertainty } | { ok: false; refusal: Refusal };

function settingValue(
	source: SettingSource,
	spec: InputSpec | undefined,
	inputs: RawInputs,
	document: Wired,
	values: ControlValues,
	results: Record<string, Result>
): SettingOutcome {
	switch (source.from) {
		case 'fixed':
		case 'line':
			return { ok: true, value: source.value };
		case 'control': {
			const control = document.controls.find(({ id }) => id === source.control);
			if (!control)
				return refuse('missing-control', 'The control of this setting isn’t in the piece.');
			const value = settingFrom(control, values[control.id] ?? control.initial);
			if (typeof value === 'string') return { ok: true, value };
			return toUnit(value, control.unit, unitIn(spec, inputs));
		}
		case 'reading': {
			const outcome = outputOf(results[source.step], source.output);
			if (!outcome.ok) return outcome;
			const { value, unit, uncertainty, quantity } = outcome.reading;
			if (typeof value !== 'number') return { ok: true, value };
			const converted = toUnit(value, unit, unitIn(spec, inputs), quantity);
			return converted.ok && uncertainty !== 'exact'
				? { ...converted, uncertainty: 'not-available' }
				: converted;
		}
	}
}

/** The unit a number is wanted in. Parts of a parameter set (`cosmology.H0`) are taken as they come. */
function unitIn(spec: InputSpec | undefined, inputs: RawInputs): string | null {
	return spec?.kind === 'number' ? resolveUnit((spec as NumberInput).unit, inputs) : null;
}

function toUnit(
	value: number,
	from: string,
	to: string | null,
	quantity: QuantityKind = 'number'
): SettingOutcome {
	if (to === null || from === to) return { ok: true, value };
	if (!commensurable(from, to)) {
		return refuse(
			'unit-mismatch',
			`This setting is in ${to || 'plain numbers'} and can’t take ${from || 'a plain number'}.`
		);
	}
	return { ok: true, value: convertQuantity(value, from, to, quantity) };
}

function assign(inputs: RawInputs, key: string, value: unknown): void {
	const [head = key, part] = key.split('.');
	if (part === undefined) inputs[head] = value;
	else inputs[head] = { ...(inputs[head] as object | undefined), [part]: value };
}

function outputOf(result: Result | undefined, output: string): ReadingOutcome {
	if (!result) return refuse('missing-step', 'The calculator of this reading isn’t on the bench.');
	if (!result.ok) return result;
	const reading = result.outputs[output];
	const withheld = result.withheld?.[output];
	if (!reading && withheld) return { ok: false, refusal: withheld };
	return reading
		? { ok: true, reading }
		: refuse('missing-output', `This calculator gives no “${output}”.`);
}

/** The reading a claim, a live number or a chart hangs on. Settings and controls read as exact. */
export function readingAt(
	document: Wired,
	evaluation: Evaluation,
	ref: ReadingRef,
	calculators: CalculatorSet
): ReadingOutcome {
	if ('control' in ref) {
		const control = document.controls.find(({ id }) => id === ref.control);
		if (!control)
			return refuse('missing-control', 'The control of this number isn’t in the piece.');
		const value = settingFrom(control, evaluation.values[control.id] ?? control.initial);
		if (typeof value === 'string')
			return refuse('not-a-number', 'This control offers words, not numbers.');
		return exact(value, control.unit);
	}
	if ('output' in ref) return outputOf(evaluation.steps[ref.step], ref.output);
	return settingReading(document, evaluation, ref, calculators);
}

function settingReading(
	document: Wired,
	evaluation: Evaluation,
	ref: { step: string; setting: string },
	calculators: CalculatorSet
): ReadingOutcome {
	const step = document.steps.find(({ id }) => id === ref.step);
	const calculator = step && calculators.get(step.calculator);
	const source = step?.settings[ref.setting];
	if (!step || !calculator || !source) {
		return refuse('missing-setting', 'The setting of this number isn’t on the bench.');
	}
	const choices = fixedSettings(step);
	const spec = calculator.inputs[ref.setting];
	const outcome = settingValue(
		source,
		spec,
		choices,
		document,
		evaluation.values,
		evaluation.steps
	);
	if (!outcome.ok) return outcome;
	if (typeof outcome.value !== 'number' || spec?.kind !== 'number') {
		return refuse('not-a-number', 'This setting isn’t a number.');
	}
	return {
		ok: true,
		reading: {
			value: outcome.value,
			unit: resolveUnit(spec.unit, choices),
			quantity: spec.quantity,
			uncertainty: outcome.uncertainty ?? 'exact'
		}
	};
}

function exact(value: number, unit: string): ReadingOutcome {
	return { ok: true, reading: { value, unit, quantity: 'number', uncertainty: 'exact' } };
}

/** How many points a drawn line has. */
const CHART_POINTS = 81;

export interface ChartPoint {
	x: number;
	/** In the chart's unit; null where the reading is refused. */
	y: number | null;
}

/**
 * A chart's lines over its control's range, in the chart's units and in the order of its series. Points lie evenly on
 * the axis as it is drawn; only what the readings hang on is worked.
 */
export function sampleChart(
	document: Wired,
	values: ControlValues,
	chart: Pick<LineChart, 'x' | 'y' | 'series'>,
	calculators: CalculatorSet,
	points = CHART_POINTS
): ChartPoint[][] {
	const control = document.controls.find(({ id }) => id === chart.x.control);
	if (!control || hasOptions(control)) return chart.series.map(() => []);
	const along = xValues(control.min, control.max, chart.x.scale === 'log', points);
	return chart.series.map(({ reading }) => {
		const upstream = {
			constants: document.constants,
			formulas: document.formulas,
			controls: document.controls,
			steps: wiringOf(document.steps, reading).steps
		};
		return along.map((x) => {
			const evaluation = evaluate(upstream, { ...values, [control.id]: x }, calculators);
			return { x, y: valueIn(readingAt(upstream, evaluation, reading, calculators), chart.y.unit) };
		});
	});
}

/** Where a chart's points lie; evenly by the logarithm when both ends lie above nought. */
export function xValues(min: number, max: number, log: boolean, points = CHART_POINTS): number[] {
	const ratio = log && min > 0 ? max / min : null;
	return Array.from({ length: points }, (_, index) => {
		if (index === points - 1) return max;
		const share = index / (points - 1);
		return ratio === null ? min + (max - min) * share : min * ratio ** share;
	});
}

/** A reading's number in another unit; null for refusals, words and other dimensions. */
export function valueIn(outcome: ReadingOutcome, unit: string): number | null {
	if (!outcome.ok || typeof outcome.reading.value !== 'number') return null;
	return commensurable(outcome.reading.unit, unit)
		? convertQuantity(outcome.reading.value, outcome.reading.unit, unit, outcome.reading.quantity)
		: null;
}
