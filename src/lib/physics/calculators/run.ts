/**
 * The one way to get a reading. Bad input of any sort is a refusal with a sentence that says how to mend it; a bug
 * inside a calculator is thrown, since hiding it would print a wrong number.
 */
import {
	refuse,
	resolveUnit,
	type Calculator,
	type RawInputs,
	type Reading,
	type Result,
	type Uncertainty
} from '../calculator.ts';
import { checkInputs } from './check-inputs.ts';
import { planOf } from './plan.ts';
import { codesPastZones, toldWarnings } from './told-warnings.ts';

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
	uncertainties?: Readonly<Record<string, Uncertainty>>
): Result {
	const plan = planOf(calculator);
	const checked = checkInputs(calculator, plan, raw);
	if (!checked.ok) return checked;
	const inputs = checked.value;

	const computed = calculator.compute(inputs);
	if (!computed.ok) return computed;

	const inputsExact =
		!uncertainties ||
		Object.keys(inputs).every((key) => (uncertainties[key] ?? 'exact') === 'exact');
	const known = inputsExact ? computed.uncertainties : undefined;
	const outputs: Record<string, Reading> = {};
	for (const [key, spec] of plan.outputs) {
		const value = computed.values[key];
		if (value === undefined) {
			if (computed.withheld && Object.hasOwn(computed.withheld, key)) continue;
			throw noValue(calculator, key);
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
			uncertainty: known === 'exact' ? 'exact' : (known?.[key] ?? 'not-available')
		};
	}

	const past = codesPastZones(plan, inputs);
	const codes = computed.warnings ? [...past, ...computed.warnings] : past;
	const { warnings, validity } = toldWarnings(calculator, codes);
	const result: Result = { ok: true, outputs, warnings, validity };
	if (computed.withheld && Object.keys(computed.withheld).length > 0)
		result.withheld = computed.withheld;
	return result;
}

/** A declared output that `compute` neither gave nor withheld. */
export function noValue({ id }: Calculator, key: string): Error {
	return new Error(`${id} gave no value for its output “${key}”`);
}
