/** A formula of a piece as the house calculator of one output that it is worked as, and the digest that names it. */
import type { HouseDefinition } from '../physics/house/definition.ts';
import { digestOf } from './canonical.ts';
import { FORMULA_OUTPUT, formulaCalculatorId } from './formula-id.ts';
import type { FormulaStep } from './formula-step.ts';

const digests = new WeakMap<FormulaStep, string>();

/**
 * SHA-256 in hex of all that is vetted: words, names, units, ranges, formula and check values. Ids are left out, so that
 * the same formula is the same wherever it stands.
 */
export function formulaDigest(formula: FormulaStep): string {
	const known = digests.get(formula);
	if (known !== undefined) return known;
	const { id: _id, checks, ...rest } = formula;
	const digest = digestOf({ ...rest, checks: checks.map(({ id: _check, ...check }) => check) });
	digests.set(formula, digest);
	return digest;
}

const REVISION_DIGITS = 16;

/** What steps pin: enough of the digest to tell any two formulas apart. */
export function formulaRevision(formula: FormulaStep): string {
	return formulaDigest(formula).slice(0, REVISION_DIGITS);
}

/** Its check values are its sources: nothing else of it was printed anywhere. */
export function formulaDefinition(
	formula: FormulaStep,
	revision = formulaRevision(formula)
): HouseDefinition {
	const { label, quantity, unit } = formula.output;
	const printed = new Set(formula.checks.map(({ source }) => source));
	return {
		id: formulaCalculatorId(formula.id),
		revision,
		title: formula.title,
		purpose: formula.purpose,
		asks: [],
		notFor: [],
		inputs: formula.inputs,
		derived: [],
		outputs: [
			{ name: FORMULA_OUTPUT, label, quantity, unit, formula: formula.formula, tree: formula.tree }
		],
		conditions: [],
		checks: formula.checks.map(({ id, inputs, published, tolerance, source }) => ({
			id,
			statement: source,
			inputs,
			output: FORMULA_OUTPUT,
			published,
			tolerance,
			source,
			verification: ''
		})),
		assumptions: [],
		sources: [...printed].map((title) => ({ title })),
		history: []
	};
}
