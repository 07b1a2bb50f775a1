/** What is compared: a family of random inputs, the calculators’ answers to them, and how near the reference must be. */
import type { RawInputs } from '../../lib/physics/calculator.ts';
import { catalogue } from '../../lib/physics/calculators/index.ts';
import { runCalculator } from '../../lib/physics/calculators/run.ts';
import type { Chance } from '../seeded.ts';

/** Answers by output; null where the reference has none. */
export type Answers = Readonly<Record<string, number | null>>;
export type Row = Readonly<Record<string, unknown>>;

/** A weakness of the reference itself, told in the table instead of being covered by a wider tolerance. */
export interface ReferenceLimit {
	says: string;
	/** Relative error that the reference may have for this row, where it is larger than the column’s own. */
	allowed?(row: Row, reference: Answers): number;
	/** The reference gives null past its limit, and those rows are counted. */
	leavesOut?: true;
}

export interface Column {
	key: string;
	/** Largest relative difference that passes. */
	allowed: number;
	limit?: ReferenceLimit;
}

export interface Family {
	name: string;
	title: string;
	/** Who answers on the other side. */
	reference: string;
	rows(chance: Chance, count: number): Row[];
	ours(row: Row, reference: Answers): Record<string, number | undefined>;
	columns: Column[];
}

/** Columns that share one tolerance. */
export function within(allowed: number, ...keys: string[]): Column[] {
	return keys.map((key) => ({ key, allowed }));
}

/** A calculator’s numbers; throws the refusal’s sentence, since every row lies inside the domain. */
export function numbersOf(calculator: string, inputs: RawInputs): Record<string, number> {
	const result = runCalculator(catalogue.get(calculator)!, inputs);
	if (!result.ok) {
		throw new Error(`${calculator} refused ${JSON.stringify(inputs)}: ${result.refusal.message}`);
	}
	return Object.fromEntries(
		Object.entries(result.outputs).flatMap(([key, { value }]) =>
			typeof value === 'number' ? [[key, value]] : []
		)
	);
}

/** `count` rows, each made by `make`. */
export function times<T>(count: number, make: (index: number) => T): T[] {
	return Array.from({ length: count }, (_, index) => make(index));
}
