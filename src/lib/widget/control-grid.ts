/** The values a control can take, counted from its lowest: what − and +, arrow keys and links lead to. */
import type { Control, LogSlider, Option } from './control.ts';
import { hasOptions } from './control-kind.ts';
import { largestOnGrid, snapToGrid } from './grid.ts';

/** Figures a logarithmic slider's settings are kept to. */
const LOG_FIGURES = 3;

/** Steps from the lowest setting to the highest. */
export function stepsOf(control: Control): number {
	if (hasOptions(control)) return control.options.length - 1;
	if (control.kind === 'log-slider') return logSteps(control);
	return Math.round((largestOnGrid(control) - control.min) / control.step);
}

/** The setting so many steps from the lowest; steps past an end lead to that end. */
export function settingAt(control: Control, index: number): number {
	const step = Math.min(stepsOf(control), Math.max(0, Math.round(index)));
	if (hasOptions(control)) return step;
	if (control.kind === 'log-slider') return logSetting(control, step);
	return snapToGrid(control.min + step * control.step, control);
}

/** How many steps from the lowest the nearest setting to `value` lies. */
export function stepOf(control: Control, value: number): number {
	const last = stepsOf(control);
	const exact = hasOptions(control)
		? value
		: control.kind === 'log-slider'
			? Math.log10(Math.max(value, control.min) / control.min) * control.perDecade
			: (value - control.min) / control.step;
	return Math.min(last, Math.max(0, Math.round(exact)));
}

/** The nearest value a control can have. A number field takes any between its ends. `value` must be finite. */
export function nearestSetting(control: Control, value: number): number {
	if (control.kind === 'number') return Math.min(control.max, Math.max(control.min, value));
	return settingAt(control, stepOf(control, value));
}

/** A value a control may stand at: inside its range, its first setting where none or no number is given. */
export function settleValue(control: Control, value: number | undefined): number {
	if (value === undefined || !Number.isFinite(value)) return control.initial;
	if (hasOptions(control)) return settingAt(control, value);
	return Math.min(control.max, Math.max(control.min, value));
}

/** The option that is chosen at a value; null for controls that measure. */
export function optionAt(control: Control, value: number): Option | null {
	return hasOptions(control) ? (control.options[settleValue(control, value)] ?? null) : null;
}

/** What a calculator's setting gets from a control at `value`: a number in the control's unit, or an option's word. */
export function settingFrom(control: Control, value: number): number | string {
	return optionAt(control, value)?.value ?? value;
}

/** Settings from end to end: at most `count`, evenly in steps, and the one it starts at; every one where they are few. */
export function settingsAcross(control: Control, count: number): number[] {
	const last = stepsOf(control);
	const all = hasOptions(control) || last < count;
	const number = all ? last + 1 : count;
	const evenly = Array.from({ length: number }, (_, index) =>
		settingAt(control, number === 1 ? 0 : (last * index) / (number - 1))
	);
	const ends = hasOptions(control) ? [] : [control.max];
	return [...new Set([...evenly, ...ends, control.initial])].sort((a, b) => a - b);
}

function logSteps({ min, max, perDecade }: LogSlider): number {
	return Math.max(1, Math.round(Math.log10(max / min) * perDecade));
}

function logSetting(control: LogSlider, step: number): number {
	const { min, max, perDecade } = control;
	if (step === 0) return min;
	if (step === logSteps(control)) return max;
	return Number((min * 10 ** (step / perDecade)).toPrecision(LOG_FIGURES));
}
