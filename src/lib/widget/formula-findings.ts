/** What a piece's own formulas lack before a proof can be pulled: use, and published values that they reproduce. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { checkRows } from '../physics/check-values.ts';
import { CHECKS_NEEDED } from '../physics/house/definition.ts';
import type { WidgetDocument } from './document.ts';
import type { Finding } from './findings.ts';
import { formulaCalculatorId } from './formula-id.ts';
import type { FormulaStep } from './formula-step.ts';
import { plainDecimal } from './stated.ts';

/** `calculators` holds the document's formulas (`benchSet`). */
export function formulaFindings(
	{ formulas, steps }: Pick<WidgetDocument, 'formulas' | 'steps'>,
	calculators: CalculatorSet
): Finding[] {
	return formulas.flatMap((formula) => {
		const calculator = formulaCalculatorId(formula.id);
		const step = steps.find((each) => each.calculator === calculator);
		if (!step) {
			return [
				{
					code: 'formula-unused',
					says: `The formula “${formula.title}” isn’t on the bench: hang it there, or take it out.`,
					at: { formula: formula.id }
				}
			];
		}
		const at = { step: step.id, formula: formula.id };
		const built = calculators.get(calculator);
		return [
			...(formula.title.trim()
				? []
				: [{ code: 'formula-untitled', says: 'Give the formula on the bench a title.', at }]),
			...(built ? disagreements(formula, checkRows(built), at) : []),
			...tooFew(formula, at)
		];
	});
}

function tooFew({ title, checks }: FormulaStep, at: Finding['at']): Finding[] {
	// Twice the same point of the formula proves it no better than once.
	const apart = new Set(checks.map(({ inputs }) => JSON.stringify(Object.entries(inputs).sort())));
	if (apart.size >= CHECKS_NEEDED) return [];
	return [
		{
			code: 'formula-checks',
			says: `The formula “${title}” has ${apart.size} of the ${CHECKS_NEEDED} check values it needs: add values that someone has published, at inputs far apart.`,
			at
		}
	];
}

function disagreements(
	{ title }: FormulaStep,
	rows: ReturnType<typeof checkRows>,
	at: Finding['at']
): Finding[] {
	return rows
		.filter(({ agrees }) => !agrees)
		.map(({ check, reads, refusal }) => ({
			code: 'formula-check-disagrees',
			says: `The formula “${title}” doesn’t reproduce ${plainDecimal(Number(check.published))} (${check.source}): ${
				reads === null ? refusal : `it gives ${plainDecimal(Number(Number(reads).toPrecision(8)))}`
			}. Look at the formula, at the units, and at what was printed.`,
			at
		}));
}
