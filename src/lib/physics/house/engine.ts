/** A house calculator at work: inputs into SI, values on the way, conditions, outputs into their units. */
import { refuse, type CheckedInputs, type Computed } from '../calculator.ts';
import { compileFormula, compileTest, type SlotValues } from '../formula/compile.ts';
import type { FormulaTree } from '../formula/tree.ts';
import type { HouseCondition, HouseDefinition } from './definition.ts';
import { intoSI, outOfSI } from './edges.ts';

type Refused = Extract<Computed, { ok: false }>;

/** Outputs in the order in which they are declared, and the codes of the conditions that hold. */
export type Outcome = { ok: true; outputs: Float64Array; warnings: string[] } | Refused;

export type Engine = (inputs: CheckedInputs) => Outcome;

/**
 * Compiles every formula with these values of the constants. What the formulas can't give is refused: a condition's own
 * refusal first, since its sentence tells most, then a value on the way that isn't finite, then a condition left open.
 */
export function engine(definition: HouseDefinition, fixed: ReadonlyMap<string, number>): Engine {
	const { inputs, derived, conditions, outputs } = definition;
	const slots = [...inputs, ...derived].map(({ name }) => name);
	const compile = ({ tree }: { tree: FormulaTree }) => compileFormula(tree, { slots, fixed });
	const entries = inputs.map(({ name, unit, quantity }) => ({
		name,
		take: intoSI(unit, quantity)
	}));
	const steps = derived.map(compile);
	const tests = conditions.map((condition) => ({
		condition,
		holds: compileTest(condition.tree, { slots, fixed })
	}));
	const exits = outputs.map((output) => ({
		work: compile(output),
		state: outOfSI(output.unit, output.quantity)
	}));

	return (given) => {
		const values = new Float64Array(slots.length);
		entries.forEach(({ name, take }, at) => {
			values[at] = take(given[name] as number);
		});
		steps.forEach((step, at) => {
			values[entries.length + at] = step(values);
		});
		const told = tests.map(({ condition, holds }) => ({ condition, holds: holds(values) }));
		const refusing = told.find(({ condition, holds }) => holds && condition.effect === 'refuse');
		if (refusing) return refuse(refusing.condition.code, refusing.condition.message);
		const lost = derived.find((_, at) => !Number.isFinite(values[entries.length + at]));
		if (lost) return noValue(lost.label);
		const open = told.find(({ holds }) => holds === undefined);
		if (open) return undecided(open.condition);
		return {
			ok: true,
			outputs: stated(exits, values),
			warnings: told.filter(({ holds }) => holds).map(({ condition }) => condition.code)
		};
	};
}

function stated(
	exits: readonly { work: (values: SlotValues) => number; state: (value: number) => number }[],
	values: SlotValues
): Float64Array {
	return Float64Array.from(exits, ({ work, state }) => state(work(values)));
}

function noValue(label: string): Refused {
	return refuse(
		'no-finite-value',
		`${label} has no finite value for these inputs. Move them away from the limits.`
	);
}

function undecided({ formula }: HouseCondition): Refused {
	return refuse(
		'no-finite-value',
		`For these inputs it can't be told whether ${formula}. Move them away from the limits.`
	);
}
