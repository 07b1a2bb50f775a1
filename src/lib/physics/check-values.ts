/** A calculator's check values, worked anew. */
import type { Calculator, CheckValue } from './calculator.ts';
import { runCalculator } from './calculators/run.ts';

export interface CheckRow {
	check: CheckValue;
	/** In the published unit; null when the calculator refuses. */
	reads: number | string | null;
	refusal: string | null;
	agrees: boolean;
	/** How far the reading lies from the published value, in units of what is published as its ±; null where that is 0. */
	within: number | null;
}

export function checkRows(calculator: Calculator): CheckRow[] {
	return calculator.checks.map((check) => {
		const result = runCalculator(calculator, check.inputs);
		const value = result.ok ? result.outputs[check.output]?.value : undefined;
		const reads = typeof value === 'number' ? value * check.outputScale : (value ?? null);
		const refusal = result.ok ? null : result.refusal.message;
		if (typeof reads !== 'number' || typeof check.published !== 'number')
			return { check, reads, refusal, agrees: reads === check.published, within: null };
		const apart = Math.abs(reads - check.published);
		return {
			check,
			reads,
			refusal,
			agrees: apart <= check.tolerance,
			within: check.tolerance === 0 ? null : apart / check.tolerance
		};
	});
}
