/**
 * What is wrong with a formula of a piece, as far as it can be told without reading its source: names, units, ranges, and
 * whether its tree gives what its output says. Check values may be missing from a draft; see formula-findings.ts.
 */
import { measureFormula } from '../physics/formula/dimensions.ts';
import { dimensionOfUnit, formulaScope } from '../physics/formula/scope.ts';
import { canBeStated, dimensionWords } from '../physics/formula/vectors.ts';
import { declaredProblems } from '../physics/house/declared.ts';
import type { HouseProblem } from '../physics/house/definition.ts';
import { formulaDefinition } from './formula-definition.ts';
import { FORMULA_OUTPUT } from './formula-id.ts';
import type { FormulaStep } from './formula-step.ts';

const found = new WeakMap<FormulaStep, HouseProblem[]>();

/** Empty for a formula that can be worked. Paths are into the formula: `inputs.0.unit`, `formula`. */
export function formulaIssues(formula: FormulaStep): HouseProblem[] {
	const known = found.get(formula);
	if (known) return known;
	const declared = declaredProblems(formulaDefinition(formula))
		.map((problem) => inFormula(problem, formula))
		.filter(({ path }) => path !== 'id' && !path.startsWith('checks'));
	const issues = declared.length > 0 ? declared : treeProblems(formula);
	found.set(formula, issues);
	return issues;
}

/** A problem of the house calculator that a formula is settled as, at its place in the formula. */
export function inFormula<Problem extends HouseProblem>(
	problem: Problem,
	formula: { inputs: readonly { name: string }[] }
): Problem {
	const { path, code } = problem;
	if (path === 'outputs.0.formula') return { ...problem, path: 'formula' };
	if (path === 'outputs.0.name' && code === 'name-twice') {
		const at = formula.inputs.findIndex(({ name }) => name === FORMULA_OUTPUT);
		const says = `“${FORMULA_OUTPUT}” is what the formula itself gives.`;
		return { ...problem, path: `inputs.${at}.name`, says, mend: 'Choose another name.' };
	}
	return { ...problem, path: path.replace(/^outputs\.0(?=\.|$)/, 'output') };
}

function treeProblems({ inputs, output, tree }: FormulaStep): HouseProblem[] {
	const scope = formulaScope(
		inputs.map(({ name, label, unit }) => [name, { dimension: dimensionOfUnit(unit), says: label }])
	);
	const measured = measureFormula(tree, scope);
	if (!measured.ok) {
		const { code, says, mend } = measured.problem;
		return [{ path: 'formula', code, says, mend }];
	}
	const wanted = dimensionOfUnit(output.unit);
	if (canBeStated(measured.dimension, wanted)) return [];
	return [
		{
			path: 'formula',
			code: 'unit-differs',
			says: `The formula ${dimensionWords(measured.dimension)}; its output is in ${output.unit || 'plain numbers'}, which ${dimensionWords(wanted)}.`,
			mend: 'Correct the formula, or choose a unit of its kind.'
		}
	];
}
