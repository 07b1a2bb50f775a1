/**
 * The calculators of one document: the house's, and in front of them the document's own formulas. Whoever evaluates a
 * document needs this set; `parseDocument`, `findings`, `freeze`, covers and the fact-check come to it by themselves.
 * A reader's frame doesn't load this file: its release carries the formulas as definitions, beside the house's own.
 */
import type { Calculator, CalculatorSet } from '../physics/calculator.ts';
import { formulaBook } from '../physics/formula/book.ts';
import { formulaTex, nameTex } from '../physics/formula/print.ts';
import { buildHouseCalculator } from '../physics/house/build.ts';
import type { WidgetDocument } from './document.ts';
import { formulaDefinition } from './formula-definition.ts';
import { formulaIssues } from './formula-issues.ts';
import type { FormulaStep } from './formula-step.ts';

type Formulas = WidgetDocument['formulas'];

/** By the set they were put in front of, and by the list they came from: asked again, nothing is built again. */
const known = new WeakMap<CalculatorSet, WeakMap<Formulas, CalculatorSet>>();

/** A formula that doesn't hold is left out, so that what is tied to it is refused in words and nothing is thrown. */
export function benchSet(
	{ formulas }: Pick<WidgetDocument, 'formulas'>,
	calculators: CalculatorSet
): CalculatorSet {
	if (formulas.length === 0) return calculators;
	const sets = known.get(calculators) ?? new WeakMap<Formulas, CalculatorSet>();
	known.set(calculators, sets);
	const found = sets.get(formulas) ?? setOf(formulas, calculators);
	sets.set(formulas, found);
	return found;
}

function setOf(formulas: Formulas, calculators: CalculatorSet): CalculatorSet {
	const own = formulas
		.filter((formula) => formulaIssues(formula).length === 0)
		.map((formula) => formulaCalculator(formula));
	const isThere = own.every(({ id, revision }) => calculators.get(id)?.revision === revision);
	if (isThere) return calculators;
	const ids = new Set(own.map(({ id }) => id));
	return new Map([
		...own.map((calculator): [string, Calculator] => [calculator.id, calculator]),
		...[...calculators].filter(([id]) => !ids.has(id))
	]);
}

/** @throws {RangeError} for a formula that `formulaIssues` finds something wrong with. */
export function formulaCalculator(formula: FormulaStep): Calculator {
	const { purpose, output } = formula;
	return Object.freeze({
		...buildHouseCalculator(formulaDefinition(formula)),
		equations: [{ tex: equationTex(formula), says: purpose || output.label }]
	});
}

/** Letters that stand in TeX for themselves; with any other the right-hand side stands alone. */
const PLAIN = /^[A-Za-z0-9 ,.()-]+$/;

function equationTex({ output, tree }: FormulaStep): string {
	const book = formulaBook();
	const right = formulaTex(tree, (name) => book.get(name)?.tex ?? nameTex(name));
	return PLAIN.test(output.label) ? `\\text{${output.label}} = ${right}` : right;
}
