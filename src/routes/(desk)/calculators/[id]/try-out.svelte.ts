/** What stands in the try-out now; the fields, the reading and the plot all look at this. */
import type { Calculator, Result } from '$lib/physics/calculator.ts';
import { runCalculator } from '$lib/physics/calculators/run.ts';
import { runWithUncertainty } from '$lib/physics/uncertainty/run-with-uncertainty.ts';
import { firstFields, groupOf, readFields, type Fields } from './fields.ts';

export class TryOutState {
	fields: Fields = $state({});
	readonly read = $derived.by(() => readFields(this.calculator, this.fields));
	/** Null while something in a field isn't a number. */
	readonly result = $derived.by(() =>
		Object.keys(this.read.problems).length > 0
			? null
			: runCalculator(this.calculator, this.read.inputs)
	);
	readonly refusal = $derived(this.result && !this.result.ok ? this.result.refusal : null);

	#weighed: { of: Result; result: Result } | null = $state.raw(null);
	/** The reading with its uncertainty carried through, once `weighUncertainty` has worked it; null until then. */
	readonly known = $derived(this.#weighed?.of === this.result ? this.#weighed.result : null);

	constructor(
		readonly calculator: Calculator,
		query: URLSearchParams
	) {
		this.fields = firstFields(calculator, query);
	}

	/** Carries the uncertainties of parameter sets and constants to the reading that stands now. */
	weighUncertainty(): void {
		if (!this.result?.ok) return;
		const result = runWithUncertainty(this.calculator, this.read.inputs);
		this.#weighed = { of: this.result, result };
	}

	reset(): void {
		this.fields = firstFields(this.calculator, new URLSearchParams());
	}

	/** The member of a group that is given now. */
	givenOf(group: readonly string[]): string {
		return group.find((key) => this.fields[key] !== '') ?? group[0] ?? '';
	}

	/** False for the members of a group that aren't given. */
	isShown(key: string): boolean {
		const group = groupOf(this.calculator, key);
		return !group || this.givenOf(group) === key;
	}

	/** Takes another member of the group in place of the one given, at its first value. */
	give(group: readonly string[], key: string): void {
		for (const other of group) this.fields[other] = '';
		const spec = this.calculator.inputs[key];
		this.fields[key] = spec && spec.kind !== 'cosmology' ? String(spec.initial) : '';
	}

	/** What is wrong with a field, in sentences. */
	problemsAt(key: string): string[] | undefined {
		const own = this.read.problems[key];
		if (own) return [own];
		return this.refusal?.input === key ? [this.refusal.message] : undefined;
	}
}
