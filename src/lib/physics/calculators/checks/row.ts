/** A check value in one line of a table, for values whose source and verification many share. */
import type { CheckValue, RawInputs } from '../../calculator.ts';

export interface Origin {
	source: string;
	verification: string;
	computed?: true;
}

/** `[statement, inputs, output, value, ± , unit, multiply the output by this to get the unit]`. */
export type Row = [
	statement: string,
	inputs: RawInputs,
	output: string,
	value: number | string,
	tolerance: number,
	unit: string,
	outputScale?: number
];

/** The check values of one origin; `id` is the first part of theirs. */
export function rows(id: string, origin: Origin, table: readonly Row[]): CheckValue[] {
	return table.map(
		([statement, inputs, output, published, tolerance, unit, outputScale = 1], index) => ({
			id: `${id}-${index + 1}`,
			statement,
			inputs,
			output,
			outputScale,
			published,
			tolerance,
			unit,
			...origin
		})
	);
}

/** The origin of values that nobody printed. `how`: the method, which isn't the calculator's own. */
export function computed(source: string, how: string): Origin {
	return { source, verification: how, computed: true };
}
