/**
 * The one way to get a reading. Bad input of any sort is a refusal with a sentence that says how to mend it; a bug
 * inside a calculator is thrown, since hiding it would print a wrong number.
 */
import {
	refuse,
	resolveUnit,
	type Calculator,
	type CheckedInputs,
	type ChoiceInput,
	type InputSpec,
	type NumberInput,
	type RawInputs,
	type Reading,
	type Refusal,
	type Result,
	type Uncertainty,
	type Validity
} from '../calculator.ts';
import { resolveCosmology } from './cosmology/parameters.ts';
import { nearestOf } from './nearest.ts';
import { printNumber, rangeWords } from './wording.ts';
import { checkDecimal, checkList } from './written.ts';

type Checked<T> = { ok: true; value: T } | { ok: false; refusal: Refusal };

/**
 * Runs a calculator on raw inputs, numbers in the declared units.
 *
 * `uncertainties` tells what is known of inputs that come from another reading (absent means exact, as a setting is).
 * An input that isn't exact leaves no output exact; numbers are carried by `uncertainty/run-with-uncertainty.ts`, which
 * works a calculator many times over and so isn't for every move of a slider.
 */
export function runCalculator(
	calculator: Calculator,
	raw: RawInputs,
	uncertainties: Readonly<Record<string, Uncertainty>> = {}
): Result {
	const checked = checkInputs(calculator, raw);
	if (!checked.ok) return checked;
	const inputs = checked.value;

	const computed = calculator.compute(inputs);
	if (!computed.ok) return computed;

	const inputsExact = Object.keys(inputs).every(
		(key) => (uncertainties[key] ?? 'exact') === 'exact'
	);
	const outputs: Record<string, Reading> = {};
	for (const [key, spec] of Object.entries(calculator.outputs)) {
		const value = computed.values[key];
		if (value === undefined) {
			if (computed.withheld && Object.hasOwn(computed.withheld, key)) continue;
			throw new Error(`${calculator.id} gave no value for its output “${key}”`);
		}
		if (typeof value === 'number' && !Number.isFinite(value)) {
			return refuse(
				'no-finite-value',
				`${spec.label} has no finite value for these inputs. Move them away from the limits.`
			);
		}
		outputs[key] = {
			value: value === 0 ? 0 : value, // no negative zero in copy
			unit: resolveUnit(spec.unit, inputs),
			quantity: spec.quantity,
			uncertainty: inputsExact
				? (computed.uncertainties?.[key] ?? 'not-available')
				: 'not-available'
		};
	}

	const codes = new Set([...pastGoodZone(calculator, inputs), ...(computed.warnings ?? [])]);
	const warned = calculator.warnings.filter((warning) => codes.has(warning.code));
	const undeclared = [...codes].find((code) => !warned.some((warning) => warning.code === code));
	if (undeclared) throw new Error(`${calculator.id} gave the undeclared warning “${undeclared}”`);
	return {
		ok: true,
		outputs,
		warnings: warned.map(({ code, message }) => ({ code, message })),
		validity: worstOf(warned.map((warning) => warning.validity)),
		...(computed.withheld && Object.keys(computed.withheld).length > 0
			? { withheld: computed.withheld }
			: {})
	};
}

function worstOf(validities: readonly Validity[]): Validity {
	if (validities.includes('outside')) return 'outside';
	return validities.includes('approximate') ? 'approximate' : 'ok';
}

function checkInputs(calculator: Calculator, raw: RawInputs): Checked<CheckedInputs> {
	if (typeof raw !== 'object' || raw === null || Array.isArray(raw)) {
		return refuse('inputs-broken', 'Inputs must be an object with one entry for each input.');
	}
	const known = Object.keys(calculator.inputs);
	for (const key of Object.keys(raw)) {
		if (!known.includes(key)) {
			const near = nearestOf(key, known);
			const hint = near ? `Did you mean “${near}”?` : `It takes ${known.join(', ')}.`;
			return refuse('unknown-input', `“${calculator.title}” has no input “${key}”. ${hint}`, key);
		}
	}

	const grouped = new Set((calculator.oneOf ?? []).flat());
	for (const group of calculator.oneOf ?? []) {
		const given = group.filter((key) => isGiven(raw[key]));
		if (given.length !== 1) {
			const found = given.length === 0 ? 'none was given' : `${given.join(' and ')} were given`;
			return refuse(
				'one-of',
				`Give exactly one of ${group.join(', ')}; ${found}.`,
				given[1] ?? group[0]
			);
		}
	}

	const inputs: CheckedInputs = {};
	for (const [key, spec] of Object.entries(calculator.inputs)) {
		const given = raw[key];
		if (!isGiven(given)) {
			if (grouped.has(key)) continue;
			if (spec.kind === 'number' && spec.neededWith && !isGiven(raw[spec.neededWith])) continue;
			if (!spec.optional) {
				return refuse('missing-input', `${spec.label} is missing. Give a value for “${key}”.`, key);
			}
			if ('absent' in spec && spec.absent !== undefined) continue;
		}
		const checked = checkInput(key, spec, isGiven(given) ? given : spec.initial);
		if (!checked.ok) return checked;
		inputs[key] = checked.value;
	}
	return { ok: true, value: inputs };
}

function checkInput(key: string, spec: InputSpec, given: unknown): Checked<unknown> {
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

function checkNumber(key: string, spec: NumberInput, given: unknown): Checked<number> {
	if (typeof given !== 'number') {
		return refuse(
			'not-a-number',
			`${spec.label} must be a number, written without quotes or unit.`,
			key
		);
	}
	if (!Number.isFinite(given)) {
		return refuse(
			'not-finite',
			`${spec.label} must be a finite number. Give a value “${key}” can have.`,
			key
		);
	}
	const tooLow = spec.minExclusive ? given <= spec.min : given < spec.min;
	const tooHigh = spec.maxExclusive ? given >= spec.max : given > spec.max;
	if (tooLow || tooHigh) {
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

function checkChoice(key: string, spec: ChoiceInput, given: unknown): Checked<string> {
	const values = spec.options.map((option) => option.value);
	if (typeof given === 'string' && values.includes(given)) return { ok: true, value: given };
	// JSON's true and false choose “true” and “false”, where a calculator offers them.
	if (typeof given === 'boolean' && values.includes(String(given)))
		return { ok: true, value: String(given) };
	const near = typeof given === 'string' ? nearestOf(given, values) : undefined;
	const hint = near ? `Did you mean “${near}”?` : `Choose one of ${values.join(', ')}.`;
	const found =
		typeof given === 'string'
			? `“${given.slice(0, 40)}” isn't among the choices.`
			: 'A word is needed here.';
	return refuse('unknown-choice', `${spec.label}: ${found} ${hint}`, key);
}

function pastGoodZone(calculator: Calculator, inputs: CheckedInputs): string[] {
	return Object.entries(calculator.inputs).flatMap(([key, spec]) => {
		if (spec.kind !== 'number' || !spec.good) return [];
		const value: unknown = inputs[key];
		return typeof value === 'number' && (value < spec.good.min || value > spec.good.max)
			? [spec.good.warning]
			: [];
	});
}
