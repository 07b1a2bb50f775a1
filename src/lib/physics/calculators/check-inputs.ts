/** Raw inputs against what a calculator declares; what is wrong is told so that it can be mended. */
import {
	refuse,
	type Calculator,
	type CheckedInputs,
	type ChoiceInput,
	type InputSpec,
	type NumberInput,
	type RawInputs,
	type Refusal
} from '../calculator.ts';
import { resolveCosmology } from './cosmology/parameters.ts';
import { nearestOf } from './nearest.ts';
import type { Plan } from './plan.ts';
import { printNumber, rangeWords } from './wording.ts';
import { checkDecimal, checkList } from './written.ts';

type Checked<T> = { ok: true; value: T } | { ok: false; refusal: Refusal };

/** All inputs; `apart` is one whose value is left for its own check, as a swept input's is. */
export function checkInputs(
	calculator: Calculator,
	plan: Plan,
	raw: RawInputs,
	apart?: string
): Checked<CheckedInputs> {
	const wrong = unknownInput(calculator, raw) ?? brokenGroup(calculator, raw);
	if (wrong) return wrong;
	const inputs: CheckedInputs = {};
	for (const [key, spec] of plan.inputs) {
		if (key === apart) continue;
		const given = raw[key];
		if (!isGiven(given)) {
			if (plan.grouped.has(key)) continue;
			if (spec.kind === 'number' && spec.neededWith && !isGiven(raw[spec.neededWith])) continue;
			if (!spec.optional) {
				return refuse('missing-input', `${spec.label} is missing. Give it a value.`, key);
			}
			if ('absent' in spec && spec.absent !== undefined) continue;
		}
		const value: unknown = isGiven(given) ? given : spec.initial;
		// The usual case of the two usual kinds, without a result object for each.
		if (spec.kind === 'number' ? isTaken(spec, value) : isOffered(spec, value)) {
			inputs[key] = value;
			continue;
		}
		const checked = checkInput(key, spec, value);
		if (!checked.ok) return checked;
		inputs[key] = checked.value;
	}
	return { ok: true, value: inputs };
}

function unknownInput(calculator: Calculator, raw: RawInputs) {
	if (typeof raw !== 'object' || raw === null || Array.isArray(raw)) {
		return refuse('inputs-broken', 'Inputs must be an object with one entry for each input.');
	}
	for (const key of Object.keys(raw)) {
		if (Object.hasOwn(calculator.inputs, key)) continue;
		const known = Object.keys(calculator.inputs);
		const near = nearestOf(key, known);
		const hint = near ? `Did you mean “${near}”?` : `It takes ${known.join(', ')}.`;
		return refuse('unknown-input', `“${calculator.title}” has no input “${key}”. ${hint}`, key);
	}
	return null;
}

function brokenGroup({ oneOf, inputs }: Calculator, raw: RawInputs) {
	if (!oneOf) return null;
	for (const group of oneOf) {
		let count = 0;
		for (const key of group) if (isGiven(raw[key])) count += 1;
		if (count === 1) continue;
		const given = group.filter((key) => isGiven(raw[key]));
		const named = (keys: readonly string[]) => keys.map((key) => `“${inputs[key]?.label ?? key}”`);
		const found = count === 0 ? 'none was given' : `${named(given).join(' and ')} were given`;
		return refuse(
			'one-of',
			`Give exactly one of ${named(group).join(', ')}; ${found}.`,
			given[1] ?? group[0]
		);
	}
	return null;
}

export function checkInput(key: string, spec: InputSpec, given: unknown): Checked<unknown> {
	switch (spec.kind) {
		case 'number':
			return checkNumber(key, spec, given);
		case 'choice':
			return checkChoice(key, spec, given);
		case 'cosmology':
			return resolveCosmology(given, key);
		case 'decimal':
			return checkDecimal(key, spec, given);
		case 'list':
			return checkList(key, spec, given);
	}
}

function isGiven(value: unknown): boolean {
	return value !== undefined && value !== null;
}

/** Whether a number input takes this value as it is. */
export function isTaken(spec: NumberInput, given: unknown): given is number {
	return (
		typeof given === 'number' &&
		Number.isFinite(given) &&
		!isOutside(spec, given) &&
		(!spec.whole || Number.isInteger(given))
	);
}

function isOutside(spec: NumberInput, value: number): boolean {
	return (
		(spec.minExclusive ? value <= spec.min : value < spec.min) ||
		(spec.maxExclusive ? value >= spec.max : value > spec.max)
	);
}

function checkNumber(key: string, spec: NumberInput, given: unknown): Checked<number> {
	if (typeof given !== 'number') {
		return refuse(
			'not-a-number',
			`${spec.label} must be a number, written without quotes or unit.`,
			key
		);
	}
	if (!Number.isFinite(given)) {
		return refuse('not-finite', `${spec.label} must be a finite number.`, key);
	}
	if (isOutside(spec, given)) {
		return refuse(
			'out-of-range',
			`${spec.label} must be ${rangeWords(spec, typeof spec.unit === 'string' ? spec.unit : '')}; ${printNumber(given)} was given.`,
			key
		);
	}
	if (spec.whole && !Number.isInteger(given)) {
		return refuse(
			'not-whole',
			`${spec.label} must be a whole number; ${printNumber(given)} was given.`,
			key
		);
	}
	return { ok: true, value: given };
}

function isOffered(spec: InputSpec, word: unknown): word is string {
	if (spec.kind !== 'choice') return false;
	for (const { value } of spec.options) if (value === word) return true;
	return false;
}

function checkChoice(key: string, spec: ChoiceInput, given: unknown): Checked<string> {
	// JSON's true and false choose “true” and “false”, where a calculator offers them.
	const word = typeof given === 'boolean' ? String(given) : given;
	if (isOffered(spec, word)) return { ok: true, value: word };
	const values = spec.options.map((option) => option.value);
	const near = typeof given === 'string' ? nearestOf(given, values) : undefined;
	const hint = near ? `Did you mean “${near}”?` : `Choose one of ${values.join(', ')}.`;
	const found =
		typeof given === 'string'
			? `“${given.slice(0, 40)}” isn't among the choices.`
			: 'A word is needed here.';
	return refuse('unknown-choice', `${spec.label}: ${found} ${hint}`, key);
}
