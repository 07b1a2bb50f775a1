/**
 * A formula tree as a function of numbers: nested closures, no code made from text. What doesn't depend on a slot is
 * worked out once.
 */
import {
	arithmetic,
	runOf,
	type CompiledFormula,
	type Part,
	type SlotValues
} from './arithmetic.ts';
import { FUNCTIONS } from './functions.ts';
import { isTruth, type Arithmetic, type Comparison, type FormulaTree } from './tree.ts';

export type { CompiledFormula, SlotValues } from './arithmetic.ts';

/** Undefined where it can't be told, because a side has no value: what follows from it then has none either. */
export type CompiledTest = (values: SlotValues) => boolean | undefined;

/** Where names get their values: by position in what the closure is given, or fixed for good. */
export interface Slots {
	slots: readonly string[];
	fixed?: ReadonlyMap<string, number>;
}

/**
 * Compiles a formula that gives a number. Never throws when it runs; what has no value comes out as NaN or infinity.
 * @throws {RangeError} for a name that is neither slot nor fixed, and for a test where a number belongs.
 */
export function compileFormula(tree: FormulaTree, names: Slots): CompiledFormula {
	return runOf(partOf(tree, positions(names), names.fixed ?? new Map()));
}

/**
 * Compiles a formula that says yes or no.
 * @throws {RangeError} as `compileFormula` does.
 */
export function compileTest(tree: FormulaTree, names: Slots): CompiledTest {
	return testOf(tree, positions(names), names.fixed ?? new Map());
}

/** One evaluation, with every name's value given by name, in coherent SI units. */
export function evaluateFormula(tree: FormulaTree, values: ReadonlyMap<string, number>): number {
	return compileFormula(tree, { slots: [], fixed: values })([]);
}

type Positions = ReadonlyMap<string, number>;

function positions({ slots }: Slots): Positions {
	return new Map(slots.map((name, at) => [name, at]));
}

function partOf(tree: FormulaTree, slots: Positions, fixed: ReadonlyMap<string, number>): Part {
	switch (tree.is) {
		case 'number':
			return { as: 'fixed', value: tree.value };
		case 'name': {
			const at = slots.get(tree.name);
			if (at !== undefined) return { as: 'slot', at };
			const value = fixed.get(tree.name);
			if (value === undefined) throw new RangeError(`“${tree.name}” has no value here.`);
			return { as: 'fixed', value };
		}
		case 'unary': {
			if (tree.sign === 'not') throw truthError();
			const of = partOf(tree.of, slots, fixed);
			const run = runOf(of);
			return settled((values) => -run(values), of);
		}
		case 'binary': {
			if (isTruth(tree)) throw truthError();
			const left = partOf(tree.left, slots, fixed);
			const right = partOf(tree.right, slots, fixed);
			return settled(arithmetic(tree.sign as Arithmetic, left, right), left, right);
		}
		case 'call': {
			const args = tree.args.map((arg) => partOf(arg, slots, fixed));
			return settled(call(FUNCTIONS[tree.name].work, args.map(runOf)), ...args);
		}
		case 'if': {
			const test = testOf(tree.test, slots, fixed);
			const then = runOf(partOf(tree.then, slots, fixed));
			const otherwise = runOf(partOf(tree.otherwise, slots, fixed));
			return {
				as: 'work',
				run: (values) => {
					const told = test(values);
					return told ? then(values) : told === false ? otherwise(values) : NaN;
				}
			};
		}
	}
}

/** Work whose parts are all fixed is done here and now. */
function settled(run: CompiledFormula, ...parts: Part[]): Part {
	return parts.every(({ as }) => as === 'fixed')
		? { as: 'fixed', value: run([]) }
		: { as: 'work', run };
}

function call(
	work: (a: number, b: number) => number,
	[first, second]: CompiledFormula[]
): CompiledFormula {
	if (!first) throw new RangeError('A function needs an argument.');
	if (!second) return (values) => (work as (a: number) => number)(first(values));
	return (values) => work(first(values), second(values));
}

function testOf(
	tree: FormulaTree,
	slots: Positions,
	fixed: ReadonlyMap<string, number>
): CompiledTest {
	if (tree.is === 'unary' && tree.sign === 'not') {
		const of = testOf(tree.of, slots, fixed);
		return (values) => negation(of(values));
	}
	if (tree.is !== 'binary' || !isTruth(tree)) {
		throw new RangeError('A number stands where a test belongs.');
	}
	if (tree.sign === 'and' || tree.sign === 'or') {
		const a = testOf(tree.left, slots, fixed);
		const b = testOf(tree.right, slots, fixed);
		// One side may settle it: a “no” under “and”, a “yes” under “or”. Otherwise both must be known.
		const settles = tree.sign === 'or';
		return (values) => {
			const left = a(values);
			if (left === settles) return settles;
			const right = b(values);
			return right === settles || left !== undefined ? right : undefined;
		};
	}
	const a = runOf(partOf(tree.left, slots, fixed));
	const b = runOf(partOf(tree.right, slots, fixed));
	return comparison(tree.sign as Comparison, a, b);
}

function negation(told: boolean | undefined): boolean | undefined {
	return told === undefined ? undefined : !told;
}

function comparison(sign: Comparison, a: CompiledFormula, b: CompiledFormula): CompiledTest {
	switch (sign) {
		case '<':
			return (values) => decided(a(values), b(values), (x, y) => x < y);
		case '<=':
			return (values) => decided(a(values), b(values), (x, y) => x <= y);
		case '>':
			return (values) => decided(a(values), b(values), (x, y) => x > y);
		case '>=':
			return (values) => decided(a(values), b(values), (x, y) => x >= y);
		case '==':
			return (values) => decided(a(values), b(values), (x, y) => x === y);
		case '!=':
			return (values) => decided(a(values), b(values), (x, y) => x !== y);
	}
}

function decided(
	a: number,
	b: number,
	holds: (a: number, b: number) => boolean
): boolean | undefined {
	return Number.isNaN(a) || Number.isNaN(b) ? undefined : holds(a, b);
}

function truthError(): RangeError {
	return new RangeError('A test stands where a number belongs.');
}
