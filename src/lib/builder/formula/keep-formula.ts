/** A formula comes onto the bench, or takes the place of what it was, as one change of the wiring. */
import type { Transaction } from 'prosemirror-state';
import { commensurable, convert } from '../../physics/units/units.ts';
import { formulaCalculator } from '../../widget/bench-set.ts';
import type { FormulaStep, SettingSource, Step } from '../../widget/document.ts';
import { formulaRevision } from '../../widget/formula-definition.ts';
import { formulaCalculatorId } from '../../widget/formula-id.ts';
import { wiringOf } from '../schema.ts';
import { freshStep } from '../wiring.ts';

type Input = FormulaStep['inputs'][number];

/** `renamed`: names its inputs had, to names they have. One that hangs nowhere is hung at the end of the rail. */
export function withFormula(
	transaction: Transaction,
	formula: FormulaStep,
	renamed: ReadonlyMap<string, string>
): Transaction {
	const { formulas, steps } = wiringOf(transaction.doc);
	const before = formulas.find(({ id }) => id === formula.id);
	const calculator = formulaCalculatorId(formula.id);
	const hangs = before && steps.some((step) => step.calculator === calculator);
	return transaction
		.setDocAttribute(
			'formulas',
			before
				? formulas.map((other) => (other.id === formula.id ? formula : other))
				: [...formulas, formula]
		)
		.setDocAttribute(
			'steps',
			hangs
				? steps.map((step) =>
						step.calculator === calculator ? hungAnew(step, before, formula, renamed) : step
					)
				: [...steps, freshStep(formulaCalculator(formula))]
		);
}

function hungAnew(
	step: Step,
	before: FormulaStep,
	after: FormulaStep,
	renamed: ReadonlyMap<string, string>
): Step {
	const were = new Map(
		before.inputs.map((input) => [renamed.get(input.name) ?? input.name, input])
	);
	const settings = after.inputs.map((input): [string, SettingSource] => {
		const was = were.get(input.name);
		const source = was && step.settings[was.name];
		return [input.name, (source && settingFor(source, was, input)) ?? first(input)];
	});
	return { ...step, revision: formulaRevision(after), settings: Object.fromEntries(settings) };
}

/** What a setting was, as far as the input still takes it. */
function settingFor(source: SettingSource, was: Input, is: Input): SettingSource | null {
	if (!commensurable(was.unit, is.unit)) return null;
	if (source.from === 'control' || source.from === 'reading') return source;
	if (typeof source.value !== 'number') return null;
	const value = was.unit === is.unit ? source.value : convert(source.value, was.unit, is.unit);
	return value >= is.min && value <= is.max ? { ...source, value } : null;
}

function first({ initial }: Input): SettingSource {
	return { from: 'fixed', value: initial };
}
