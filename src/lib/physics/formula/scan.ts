/**
 * Reads a source once from left to right, before any parser sees it. What passes holds only numbers, known names, known
 * functions with as many arguments as they take, and signs in their places, within the limits: so the parser's work is
 * bounded, and what it makes can only be arithmetic. Every refusal has its place in the source.
 */
import { FormulaRefused } from './problem.ts';
import type { FormulaScope } from './scope.ts';
import { checkNames } from './token-names.ts';
import { checkOrder } from './token-order.ts';
import { SAME_AS, tokensOf, type Token } from './tokens.ts';
import { FORMULA_LIMITS } from './tree.ts';

/** @throws {FormulaRefused} at the first thing that is wrong. */
export function scanFormula(
	source: string,
	scope: FormulaScope
): { tokens: Token[]; plain: string } {
	if (source.length > FORMULA_LIMITS.characters) {
		throw new FormulaRefused(
			{ from: FORMULA_LIMITS.characters, to: source.length },
			'too-long',
			`The formula is ${source.length} characters long; ${FORMULA_LIMITS.characters} are the most.`,
			'Give parts of it names of their own, as values on the way.'
		);
	}
	const tokens = tokensOf(source);
	if (tokens.length === 0) {
		throw new FormulaRefused(
			{ from: 0, to: source.length },
			'empty',
			'There is no formula yet.',
			'Write one over the names of the inputs, such as mass*speed^2/2.'
		);
	}
	checkOrder(tokens, source);
	checkNames(tokens, scope);
	return { tokens, plain: plainOf(source) };
}

/** Of the same length, with what the parser would read otherwise made plain. */
function plainOf(source: string): string {
	return source.replace(/\s/g, ' ').replace(/[−×·÷⋅]/g, (sign) => SAME_AS[sign] ?? sign);
}
