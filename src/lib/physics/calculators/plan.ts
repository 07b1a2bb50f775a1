/** What a calculator declares, laid out once for running: lists instead of look-ups, and what the lists have in common. */
import type { Calculator, InputSpec, OutputSpec } from '../calculator.ts';

export interface Plan {
	inputs: readonly (readonly [key: string, spec: InputSpec])[];
	/** Inputs that stand in an either-or group. */
	grouped: ReadonlySet<string>;
	outputs: readonly (readonly [key: string, spec: OutputSpec])[];
	/** Good zones of inputs, with the warning past each. */
	zones: readonly { key: string; min: number; max: number; warning: string }[];
}

const plans = new WeakMap<Calculator, Plan>();

export function planOf(calculator: Calculator): Plan {
	const kept = plans.get(calculator);
	if (kept) return kept;
	const inputs = Object.entries(calculator.inputs);
	const plan = {
		inputs,
		grouped: new Set((calculator.oneOf ?? []).flat()),
		outputs: Object.entries(calculator.outputs),
		zones: inputs.flatMap(([key, spec]) =>
			spec.kind === 'number' && spec.good ? [{ key, ...spec.good }] : []
		)
	};
	plans.set(calculator, plan);
	return plan;
}
