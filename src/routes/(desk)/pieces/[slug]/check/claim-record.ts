/**
 * What stands behind one claim, for the checker's right-hand column: the reading, how it was worked, from which
 * settings and sources, and how the sentence fares along the sliders. Everything comes from `evaluate`.
 */
import { weighingOf } from '$lib/factcheck/claim-weighing.ts';
import type {
	Calculator,
	CalculatorSet,
	Reading,
	Result,
	Source
} from '$lib/physics/calculator.ts';
import { lineById } from '$lib/physics/lines/catalogue.ts';
import { routes } from '$lib/routes.ts';
import { commensurable, convert, convertDifference } from '$lib/physics/units/units.ts';
import { isFormulaId } from '$lib/widget/formula-id.ts';
import type {
	Claim,
	ControlValues,
	ReadingRef,
	SettingSource,
	Step,
	WidgetDocument
} from '$lib/widget/document.ts';
import { evaluate, readingAt, type Evaluation } from '$lib/widget/evaluate.ts';
import { readingWithUncertainty } from '$lib/widget/evaluate-uncertainty.ts';
import { wiringOf } from '$lib/widget/graph.ts';
import {
	OUTPUT_FIGURES,
	printReading,
	readingWords,
	type PrintedReading
} from '$lib/widget/print-reading.ts';
import type { Stated } from '$lib/widget/stated.ts';
import { stripsOf, type Strip } from './probe-strips.ts';
import { tryAddress } from './try-address.ts';

export interface SettingRow {
	label: string;
	value: string;
	/** Who or what set it. */
	origin: string;
	from: SettingSource['from'];
}

export interface ReadingRow {
	label: string;
	value: string;
	/** What the claim itself hangs on. */
	own: boolean;
}

export interface WorkingStep {
	id: string;
	title: string;
	/** The calculator's card, or the formula's place on this screen. */
	href: string;
	/** “1.2.0”, or “a formula of this piece”. */
	revision: string;
	settings: SettingRow[];
	/** The outputs that the claim, or a later step, takes. */
	readings: ReadingRow[];
	refusal: string | null;
}

export interface ClaimRecord {
	reading: PrintedReading | null;
	/** How its uncertainty was found, or why it has none. */
	uncertaintyNote: string | null;
	/** What is read: “frequency today”. */
	label: string;
	refusal: string | null;
	/** Null when the number hangs on a slider alone. */
	calculator: Calculator | null;
	working: WorkingStep[];
	sources: Source[];
	/** One strip for each slider that reaches a number which moves. */
	strips: Strip[];
	/** The calculator's page with these settings in its fields. */
	tryAt: string | null;
}

export function claimRecord(
	document: WidgetDocument,
	claim: Claim,
	/** The claim's own words, for the unit it is read in. */
	words: string,
	calculators: CalculatorSet,
	/** Where the sliders stand; their first settings when left out. */
	values: ControlValues = {}
): ClaimRecord | null {
	if (claim.form === 'exempt') return null;
	const ref = claim.reading;
	const evaluation = evaluate(document, values, calculators);
	const read = claim.form === 'live' ? readingAt : readingWithUncertainty;
	const outcome = read(document, evaluation, ref, calculators);
	const wiring = wiringOf(document.steps, ref);
	const stated = weighingOf(document, evaluation, claim, words, calculators)?.stated ?? null;
	const step = 'step' in ref ? document.steps.find(({ id }) => id === ref.step) : undefined;
	const calculator = (step && calculators.get(step.calculator)) ?? null;
	return {
		reading: outcome.ok ? printReading(inUnitOf(stated, outcome.reading), OUTPUT_FIGURES) : null,
		uncertaintyNote: (outcome.ok && outcome.reading.uncertaintyNote) || null,
		label: refLabel(document, ref, calculators),
		refusal: outcome.ok ? null : outcome.refusal.message,
		calculator,
		working: wiring.steps.map((each) =>
			workingStep(document, evaluation, each, ref, wiring.steps, calculators)
		),
		sources: sourcesOf(wiring.steps, calculators),
		strips: claim.form === 'live' ? stripsOf(document, claim, wiring.controls, calculators) : [],
		tryAt:
			step && !isFormulaId(step.calculator)
				? tryAddress(document, evaluation, step, calculators)
				: null
	};
}

/** The reading in the unit the copy uses, where it can be given in it. */
function inUnitOf(stated: Stated | null, reading: Reading): Reading {
	const { value, unit, uncertainty } = reading;
	if (!stated || typeof value !== 'number' || !commensurable(unit, stated.unit)) return reading;
	return {
		...reading,
		value: convert(value, unit, stated.unit),
		unit: stated.unit,
		uncertainty:
			typeof uncertainty === 'number'
				? convertDifference(uncertainty, unit, stated.unit)
				: uncertainty
	};
}

export function refLabel(
	document: WidgetDocument,
	ref: ReadingRef,
	calculators: CalculatorSet
): string {
	if ('control' in ref) {
		return document.controls.find(({ id }) => id === ref.control)?.label ?? 'slider';
	}
	const step = document.steps.find(({ id }) => id === ref.step);
	const calculator = step && calculators.get(step.calculator);
	const spec = 'output' in ref ? calculator?.outputs[ref.output] : calculator?.inputs[ref.setting];
	return spec?.label ?? '';
}

function workingStep(
	document: WidgetDocument,
	evaluation: Evaluation,
	step: Step,
	ref: ReadingRef,
	upstream: readonly Step[],
	calculators: CalculatorSet
): WorkingStep {
	const calculator = calculators.get(step.calculator);
	const result = evaluation.steps[step.id];
	const taken = upstream.flatMap(({ settings }) =>
		Object.values(settings).flatMap((source) =>
			source.from === 'reading' && source.step === step.id ? [source.output] : []
		)
	);
	const own = 'output' in ref && ref.step === step.id ? ref.output : null;
	const used = new Set(own === null ? taken : [...taken, own]);
	return {
		id: step.id,
		title: calculator?.title ?? step.calculator,
		href: hrefOf(step.calculator),
		revision: revisionWords(step.calculator, calculator?.revision ?? step.revision),
		settings: Object.entries(step.settings).map(([key, source]) => ({
			label: settingLabel(calculator, key),
			value: settingWords(document, evaluation, step, key, source, calculators),
			origin: originWords(document, evaluation, source, calculators),
			from: source.from
		})),
		readings:
			'setting' in ref && ref.step === step.id
				? [settingReading(document, evaluation, ref, calculators)]
				: usedReadings(result, used, own, calculator),
		refusal: result && !result.ok ? result.refusal.message : null
	};
}

function hrefOf(calculator: string): string {
	return isFormulaId(calculator)
		? `#${calculator.replace('.', '-')}`
		: routes.calculator(calculator);
}

export function revisionWords(calculator: string, revision: string): string {
	return isFormulaId(calculator) ? 'a formula of this piece' : revision;
}

function usedReadings(
	result: Result | undefined,
	used: ReadonlySet<string>,
	own: string | null,
	calculator: Calculator | undefined
): ReadingRow[] {
	if (!result?.ok) return [];
	return [...used].flatMap((key) => {
		const reading = result.outputs[key];
		const label = calculator?.outputs[key]?.label ?? key;
		return reading
			? [{ label, value: readingWords(reading, OUTPUT_FIGURES), own: key === own }]
			: [];
	});
}

/** A number tied to a setting is read off the setting itself. */
function settingReading(
	document: WidgetDocument,
	evaluation: Evaluation,
	ref: ReadingRef,
	calculators: CalculatorSet
): ReadingRow {
	const outcome = readingAt(document, evaluation, ref, calculators);
	return {
		label: refLabel(document, ref, calculators),
		value: outcome.ok ? readingWords(outcome.reading) : '–',
		own: true
	};
}

function settingLabel(calculator: Calculator | undefined, key: string): string {
	const [head = key, part] = key.split('.');
	const label = calculator?.inputs[head]?.label ?? head;
	return part ? `${label}, ${part}` : label;
}

function settingWords(
	document: WidgetDocument,
	evaluation: Evaluation,
	step: Step,
	key: string,
	source: SettingSource,
	calculators: CalculatorSet
): string {
	const outcome = readingAt(document, evaluation, { step: step.id, setting: key }, calculators);
	if (outcome.ok) return readingWords(outcome.reading);
	if (source.from !== 'fixed') return '–';
	const spec = calculators.get(step.calculator)?.inputs[key];
	const value = source.value;
	if (spec?.kind === 'choice') {
		return spec.options.find((option) => option.value === value)?.label ?? String(value);
	}
	if (typeof value === 'object') {
		return Object.entries(value)
			.map(([name, part]) => (name === 'set' ? String(part) : `${name} ${String(part)}`))
			.join(', ');
	}
	return String(value);
}

function originWords(
	document: WidgetDocument,
	evaluation: Evaluation,
	source: SettingSource,
	calculators: CalculatorSet
): string {
	switch (source.from) {
		case 'fixed':
			return 'the writer’s choice';
		case 'control': {
			const control = document.controls.find(({ id }) => id === source.control);
			return control && evaluation.values[control.id] !== control.initial
				? `the slider “${control.label}”, here at this setting`
				: `where the slider “${control?.label ?? ''}” starts`;
		}
		case 'line':
			return lineById(source.line)?.label ?? 'line catalogue';
		case 'reading': {
			const step = document.steps.find(({ id }) => id === source.step);
			return `from ${(step && calculators.get(step.calculator)?.title) ?? 'the step before'}`;
		}
	}
}

function sourcesOf(steps: readonly Step[], calculators: CalculatorSet): Source[] {
	const all = steps.flatMap((step) => calculators.get(step.calculator)?.sources ?? []);
	const seen = new Set<string>();
	return all.filter(({ title, locator }) => {
		const key = `${title} ${locator ?? ''}`;
		return !seen.has(key) && seen.add(key);
	});
}
