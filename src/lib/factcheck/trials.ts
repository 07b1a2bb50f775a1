/** Weighing over the settings a reader can reach: which are tried, and which of them is worst. */
import { hasOptions } from '../widget/control.ts';
import { optionAt, settingsAcross } from '../widget/control-grid.ts';
import type { Control, ControlValues, ReadingRef, WidgetDocument } from '../widget/document.ts';
import { wiringOf } from '../widget/graph.ts';
import type { Language } from '../widget/language.ts';
import { plainDecimal, printStated } from '../widget/stated.ts';
import type { Decision } from './decide.ts';
import type { Severity } from './verdict.ts';

/** Settings of each slider that a number is weighed at; the one it starts at comes on top. */
const SETTINGS = 11;
/** Sliders whose ends are tried together; 2⁶ corners at most. */
const CORNERED = 6;

export interface Trial {
	decision: Decision;
	/** “500 million years”, with the slider's label where there are several. */
	setting: string;
}

export function controlsReaching(document: WidgetDocument, reading: ReadingRef): Control[] {
	const reached = wiringOf(document.steps, reading).controls;
	return document.controls.filter(({ id }) => reached.includes(id));
}

/**
 * Weighs from end to end of every slider that reaches the reading, the others at their first settings, and at every
 * corner where all of them stand at an end: the worst is often where two sliders pull the same way.
 */
export function tryThroughout(
	document: WidgetDocument,
	reading: ReadingRef,
	weighAt: (values: ControlValues) => Decision
): Trial[] {
	const controls = controlsReaching(document, reading);
	const tried = [
		...controls.flatMap((control) => settingsOf(control).map((value) => ({ [control.id]: value }))),
		...(controls.length > 1 ? corners(controls.slice(0, CORNERED)) : [])
	];
	return tried.map((values) => ({
		decision: weighAt(values),
		setting: controls
			.flatMap((control) => {
				const value = values[control.id];
				return value === undefined
					? []
					: [settingWords(control, value, controls.length > 1, document.language)];
			})
			.join(' and ')
	}));
}

function corners(controls: readonly Control[]): Record<string, number>[] {
	return controls.reduce<Record<string, number>[]>(
		(found, control) =>
			found.flatMap((values) =>
				endsOf(control).map((value) => ({ ...values, [control.id]: value }))
			),
		[{}]
	);
}

function endsOf(control: Control): number[] {
	return hasOptions(control)
		? control.options.map((_, index) => index)
		: [control.min, control.max];
}

export function worstOf(trials: readonly Trial[]): Trial | null {
	return trials.reduce<Trial | null>(
		(worse, trial) => (worse && rank(worse.decision) >= rank(trial.decision) ? worse : trial),
		null
	);
}

const VERDICT_RANK = { level: 0, leans: 10, unweighed: 20, tips: 30 };
const SEVERITY_RANK: Record<Severity, number> = { none: 0, note: 1, ask: 11, block: 21 };

/** Worst first: tips, block, unweighed, ask, leans, level. */
export function rank({ verdict, severity }: Decision): number {
	return Math.max(VERDICT_RANK[verdict], SEVERITY_RANK[severity]);
}

/** From end to end on the control's own steps, and where it starts; every one of them where they are few. */
export function settingsOf(control: Control): number[] {
	return settingsAcross(control, SETTINGS);
}

/** What a control stands at, in words; `named` says whose setting it is as well. */
export function settingWords(
	control: Control,
	value: number,
	named: boolean,
	language: Language
): string {
	const printed = valueWords(control, value, language);
	return named ? `${printed} (${control.label})` : printed;
}

function valueWords(control: Control, value: number, language: Language): string {
	const option = optionAt(control, value);
	if (option) return `“${option.label}”`;
	const numeral = plainDecimal(Number(value.toPrecision(12)));
	return printStated(
		{ hedge: 'bare', hedgeWord: '', numeral, scale: 1, unit: control.unit },
		language
	);
}

/** “from 100 to 500 million years”, or what it offers. */
export function reachWords(control: Control, language: Language): string {
	if (hasOptions(control))
		return `for ${control.options.map(({ label }) => `“${label}”`).join(', ')}`;
	const { min, max } = control;
	return `from ${settingWords(control, min, false, language)} to ${settingWords(control, max, false, language)}`;
}
