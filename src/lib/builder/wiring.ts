/** Changes to what hangs on the bench, as plain values; the manuscript puts them into one undoable step. */
import { resolveUnit, type Calculator, type InputSpec } from '../physics/calculator.ts';
import type { SettingSource, Step } from '../widget/document.ts';
import { plainDecimal, roundToFigures } from '../widget/stated.ts';
import { fixedSettings } from '../widget/tie-units.ts';
import { newId } from './ids.ts';

/** A calculator as it comes off the shelf: every needed setting at its first value, one of each either-or group. */
export function freshStep(calculator: Calculator): Step {
	const settings: Record<string, SettingSource> = {};
	for (const [key, spec] of Object.entries(calculator.inputs)) {
		const group = groupOf(calculator, key);
		if (group ? group[0] !== key : spec.optional && spec.kind === 'number') continue;
		settings[key] = firstSource(spec);
	}
	return { id: newId('step'), calculator: calculator.id, revision: calculator.revision, settings };
}

export function firstSource(spec: InputSpec): SettingSource {
	return { from: 'fixed', value: spec.kind === 'cosmology' ? { ...spec.initial } : spec.initial };
}

/** Inputs of which exactly one is given, if `key` is one of them. */
export function groupOf(calculator: Calculator, key: string): string[] | undefined {
	return calculator.oneOf?.find((group) => group.includes(key));
}

export interface Peg {
	/** The setting that is given, or that would be. */
	key: string;
	/** All keys of the either-or group; just the one otherwise. */
	keys: string[];
	source: SettingSource | undefined;
}

/** The pegs of a plate, in the calculator's order; an either-or group is one peg. */
export function pegsOf(step: Step, calculator: Calculator): Peg[] {
	return Object.keys(calculator.inputs).flatMap((key): Peg[] => {
		const keys = groupOf(calculator, key) ?? [key];
		if (keys[0] !== key) return [];
		const given = keys.find((candidate) => candidate in step.settings) ?? key;
		return [{ key: given, keys, source: step.settings[given] }];
	});
}

export function withSetting(step: Step, key: string, source: SettingSource | undefined): Step {
	const settings = { ...step.settings };
	if (source) settings[key] = source;
	else delete settings[key];
	return { ...step, settings };
}

/** What a setting is called; where a choice says what the number is (“Age after the Big Bang”), by that choice. */
export function settingLabel(calculator: Calculator, step: Step, key: string): string {
	const spec = calculator.inputs[key];
	if (!spec) return key;
	if (spec.kind !== 'number' || typeof spec.unit === 'string') return spec.label;
	const deciding = calculator.inputs[spec.unit.by];
	const chosen = fixedSettings(step)[spec.unit.by];
	if (deciding?.kind !== 'choice') return spec.label;
	return deciding.options.find(({ value }) => value === chosen)?.label ?? spec.label;
}

/** Takes another input of an either-or group in place of the one given. */
export function withGroupChoice(
	step: Step,
	calculator: Calculator,
	keys: string[],
	key: string
): Step {
	const settings = { ...step.settings };
	for (const other of keys) delete settings[other];
	const spec = calculator.inputs[key];
	if (spec) settings[key] = firstSource(spec);
	return { ...step, settings };
}

/**
 * A choice may decide the unit of another setting (`kind` in `cosmo.inverse`); a fixed number in the old unit would
 * then be another quantity, so it goes back to its first value.
 */
export function withChoice(step: Step, calculator: Calculator, key: string, value: string): Step {
	const next = withSetting(step, key, { from: 'fixed', value });
	for (const [other, spec] of Object.entries(calculator.inputs)) {
		if (spec.kind !== 'number' || typeof spec.unit === 'string' || spec.unit.by !== key) continue;
		const before = resolveUnit(spec.unit, fixedSettings(step));
		const after = resolveUnit(spec.unit, fixedSettings(next));
		if (before !== after && other in next.settings) next.settings[other] = firstSource(spec);
	}
	return next;
}

/** A number as a field shows it: all of its digits that mean something, without an exponent. */
export function fieldText(value: number): string {
	return plainDecimal(Number(roundToFigures(value, 12)));
}

/** What was typed into a number field; null when it isn't a number. Spaces group digits, a real minus counts. */
export function typedNumber(text: string): number | null {
	const plain = text
		.trim()
		.replaceAll('\u2212', '-')
		.replace(/[\s\u202f\u00a0]/g, '');
	if (!/^-?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain)) return null;
	const value = Number(plain);
	return Number.isFinite(value) ? value : null;
}

/** 1, 2 or 5 times a power of ten, at most `value`; nought for what isn't above it. */
export function roundDown(value: number): number {
	if (value <= 0) return 0;
	const power = 10 ** Math.floor(Math.log10(value));
	const lead = value / power;
	return (lead >= 5 ? 5 : lead >= 2 ? 2 : 1) * power;
}

/** 1, 2, 5 or 10 times a power of ten, at least `value`, which is above nought. */
export function roundUp(value: number): number {
	const power = 10 ** Math.floor(Math.log10(value));
	const lead = value / power;
	return (lead <= 1 ? 1 : lead <= 2 ? 2 : lead <= 5 ? 5 : 10) * power;
}

/** A, B … Z, AA, AB …: the tag on a hook. */
export function tagLetter(index: number): string {
	const tail = String.fromCharCode(65 + (index % 26));
	return index < 26 ? tail : tagLetter(Math.floor(index / 26) - 1) + tail;
}
