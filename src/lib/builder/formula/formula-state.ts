/** How far a formula of the draft is trusted. */
import type { CalculatorSet } from '../../physics/calculator.ts';
import { checkRows } from '../../physics/check-values.ts';
import { CHECKS_NEEDED } from '../../physics/house/definition.ts';
import type { FormulaStep } from '../../widget/document.ts';
import { formulaDigest } from '../../widget/formula-definition.ts';
import { formulaCalculatorId } from '../../widget/formula-id.ts';
import type { VettingState } from '../../workflow/vetting.ts';

/** Tested as soon as enough check values agree; vetted where a scientist has signed this very formula. */
export function formulaState(
	formula: FormulaStep,
	calculators: CalculatorSet,
	vetted: ReadonlySet<string>
): VettingState {
	if (vetted.has(formulaDigest(formula))) return 'vetted';
	const calculator = calculators.get(formulaCalculatorId(formula.id));
	const rows = calculator ? checkRows(calculator) : [];
	return rows.length >= CHECKS_NEEDED && rows.every(({ agrees }) => agrees) ? 'tested' : 'proposed';
}
