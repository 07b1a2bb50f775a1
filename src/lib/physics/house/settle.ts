/** Settles a draft on the server: parses every formula, checks every name, unit and dimension, and puts values in order. */
import { parseFormula, parseTest, type FormulaProblem } from '../formula/parse.ts';
import { dimensionOfUnit, formulaScope, type ScopeName } from '../formula/scope.ts';
import { unitOf } from '../units/units.ts';
import { declaredProblems, sizeProblems } from './declared.ts';
import type { HouseDefinition, HouseDraft, HouseProblem, SettledHouse } from './definition.ts';
import { orderDerived, wordsOf } from './order.ts';

/**
 * The definition of a draft, or all that is wrong with it. One broken formula doesn't hide the others; what can only be
 * judged once another is mended is left till then.
 */
export function settleHouse(draft: HouseDraft): SettledHouse {
	const oversize = sizeProblems(draft);
	if (oversize.length > 0) return { ok: false, problems: oversize };

	const { order, circular, problems: circles } = orderDerived(draft.derived);
	const problems = [...declaredProblems(draft), ...circles];
	const scope = new Map<string, ScopeName>();
	/** Names whose dimension isn't known, since they, or what they need, must be mended first. */
	const unsettled = new Set(circular);
	const waits = (formula: string) => [...wordsOf(formula)].some((word) => unsettled.has(word));

	for (const { name, label, unit } of draft.inputs) {
		if (unitOf(unit)) scope.set(name, { dimension: dimensionOfUnit(unit), says: label });
		else unsettled.add(name);
	}

	const derived: HouseDefinition['derived'] = [];
	for (const at of order) {
		const value = draft.derived[at];
		if (!value) continue;
		const parsed = waits(value.formula)
			? undefined
			: parseFormula(value.formula, formulaScope(scope));
		if (!parsed?.ok) {
			unsettled.add(value.name);
			if (parsed) problems.push(inFormula(`derived.${at}.formula`, parsed.problem));
			continue;
		}
		derived.push({ ...value, tree: parsed.tree });
		const dimension = parsed.dimension === 'anything' ? {} : parsed.dimension;
		scope.set(value.name, { dimension, says: value.label });
	}

	const full = formulaScope(scope);
	const outputs: HouseDefinition['outputs'] = [];
	for (const [at, output] of draft.outputs.entries()) {
		if (waits(output.formula) || !unitOf(output.unit)) continue;
		const parsed = parseFormula(output.formula, full, output.unit);
		if (parsed.ok) outputs.push({ ...output, tree: parsed.tree });
		else problems.push(inFormula(`outputs.${at}.formula`, parsed.problem));
	}
	const conditions: HouseDefinition['conditions'] = [];
	for (const [at, condition] of draft.conditions.entries()) {
		if (waits(condition.formula)) continue;
		const parsed = parseTest(condition.formula, full);
		if (parsed.ok) conditions.push({ ...condition, tree: parsed.tree });
		else problems.push(inFormula(`conditions.${at}.formula`, parsed.problem));
	}

	return problems.length > 0
		? { ok: false, problems }
		: { ok: true, definition: { ...draft, derived, outputs, conditions } };
}

function inFormula(path: string, problem: FormulaProblem): HouseProblem {
	return { path, ...problem };
}
