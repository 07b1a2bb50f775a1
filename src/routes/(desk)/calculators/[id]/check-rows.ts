/** A calculator's published values, worked anew. */
import type { Calculator, CheckValue } from '$lib/physics/calculator.ts';
import { runCalculator } from '$lib/physics/calculators/run.ts';

export interface CheckRow {
	check: CheckValue;
	/** In the published unit; null when the calculator refuses. */
	reads: number | null;
	refusal: string | null;
	agrees: boolean;
}

export function checkRows(calculator: Calculator): CheckRow[] {
	return calculator.checks.map((check) => {
		const result = runCalculator(calculator, check.inputs);
		const value = result.ok ? result.outputs[check.output]?.value : undefined;
		const reads = typeof value === 'number' ? value * check.outputScale : null;
		return {
			check,
			reads,
			refusal: result.ok ? null : result.refusal.message,
			agrees: reads !== null && Math.abs(reads - check.published) <= check.tolerance
		};
	});
}
