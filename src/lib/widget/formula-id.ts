/** How steps and readings name a formula of their piece. */

/** Key of its one output. */
export const FORMULA_OUTPUT = 'value';

/** True for what steps of a formula name as their calculator. */
export function isFormulaId(calculator: string): boolean {
	return calculator.startsWith('formula.');
}

/** What a step on the bench names as its calculator. */
export function formulaCalculatorId(formulaId: string): string {
	return `formula.${formulaId}`;
}
