/**
 * The dimension of a formula, worked out when it is saved: evaluation is plain numbers. Angles and magnitudes count as
 * pure numbers in arithmetic, as the SI has it, yet are remembered: an angle is not stated as a per cent.
 */
import type { Dimension } from '../units/units.ts';
import { FUNCTIONS, type FunctionName } from './functions.ts';
import { formulaText } from './print.ts';
import { quoted } from './problem.ts';
import type { FormulaScope } from './scope.ts';
import {
	alike,
	combine,
	dimensionWords,
	isPure,
	nonZero,
	power,
	rootOf,
	type FormulaDimension
} from './vectors.ts';
import { FORMULA_LIMITS, isTruth, type Arithmetic, type FormulaTree } from './tree.ts';

/** What is wrong with a tree, and at which of its nodes. */
export interface TreeProblem {
	node: FormulaTree;
	code: string;
	says: string;
	mend: string;
}

class TreeRefused extends Error {
	readonly problem: TreeProblem;
	constructor(node: FormulaTree, code: string, says: string, mend: string) {
		super(says);
		this.problem = { node, code, says, mend };
	}
}

type Measured<T> = ({ ok: true } & T) | { ok: false; problem: TreeProblem };

/** The dimension of a formula that gives a number, or the first place where its dimensions don't fit. */
export function measureFormula(
	tree: FormulaTree,
	scope: FormulaScope
): Measured<{ dimension: FormulaDimension }> {
	return caught(() => ({ dimension: dimensionOf(tree, scope) }));
}

/** The same for a formula that says yes or no. */
export function measureTest(tree: FormulaTree, scope: FormulaScope): Measured<object> {
	return caught(() => {
		checkTest(tree, scope);
		return {};
	});
}

function caught<T extends object>(work: () => T): Measured<T> {
	try {
		return { ok: true, ...work() };
	} catch (error) {
		if (error instanceof TreeRefused) return { ok: false, problem: error.problem };
		throw error;
	}
}

function dimensionOf(tree: FormulaTree, scope: FormulaScope): FormulaDimension {
	switch (tree.is) {
		case 'number':
			return tree.value === 0 ? 'anything' : {};
		case 'name': {
			const named = scope.get(tree.name);
			if (!named) {
				throw new TreeRefused(
					tree,
					'unknown-name',
					`${quoted(tree.name)} is neither an input, nor a value on the way, nor a constant.`,
					'Declare it as an input, or correct the name.'
				);
			}
			return named.dimension;
		}
		case 'unary':
			if (tree.sign === 'not') throw notANumber(tree);
			return dimensionOf(tree.of, scope);
		case 'binary':
			if (isTruth(tree)) throw notANumber(tree);
			return dimensionOfArithmetic(tree, scope);
		case 'call':
			return dimensionOfCall(tree, scope);
		case 'if':
			checkTest(tree.test, scope);
			return together(
				tree,
				tree.then,
				tree.otherwise,
				"can't be the two values of one choice",
				scope
			);
	}
}

function dimensionOfArithmetic(
	tree: Extract<FormulaTree, { is: 'binary' }>,
	scope: FormulaScope
): FormulaDimension {
	const { left, right } = tree;
	switch (tree.sign as Arithmetic) {
		case '+':
			return together(tree, left, right, "can't be added", scope);
		case '-':
			return together(tree, left, right, "can't be subtracted", scope);
		case '*':
			return combine(dimensionOf(left, scope), dimensionOf(right, scope), 1);
		case '/':
			return combine(dimensionOf(left, scope), dimensionOf(right, scope), -1);
		case '^':
			return dimensionOfPower(tree, scope);
	}
}

/** Both sides alike; otherwise a sentence that names both. */
function together(
	tree: FormulaTree,
	left: FormulaTree,
	right: FormulaTree,
	verb: string,
	scope: FormulaScope
): FormulaDimension {
	const a = dimensionOf(left, scope);
	const b = dimensionOf(right, scope);
	if (a === 'anything') return b;
	if (b === 'anything') return a;
	if (!alike(a, b)) {
		throw new TreeRefused(
			tree,
			'dimensions-differ',
			`${quoted(formulaText(left))} ${dimensionWords(a)} and ${quoted(formulaText(right))} ${dimensionWords(b)}: they ${verb}.`,
			mendFor(a, b)
		);
	}
	return nonZero(a).length > 0 ? a : b;
}

function mendFor(a: Dimension, b: Dimension): string {
	if (isPure(a) || isPure(b)) {
		return 'Give the number its unit, as in 3*metre, or divide the other by a value of its kind.';
	}
	return "Multiply or divide one of them until both are of one kind, or take out the one that doesn't belong.";
}

function dimensionOfPower(
	tree: Extract<FormulaTree, { is: 'binary' }>,
	scope: FormulaScope
): FormulaDimension {
	const base = dimensionOf(tree.left, scope);
	const exponent = dimensionOf(tree.right, scope);
	if (exponent !== 'anything' && !isPure(exponent)) {
		throw new TreeRefused(
			tree.right,
			'exponent-not-pure',
			`The exponent ${quoted(formulaText(tree.right))} ${dimensionWords(exponent)}; only a pure number can be one.`,
			'Divide it by a value of its kind first.'
		);
	}
	const written = writtenNumber(tree.right);
	if (written !== undefined && !(Math.abs(written) <= FORMULA_LIMITS.exponent)) {
		throw new TreeRefused(
			tree.right,
			'exponent-too-large',
			`An exponent goes to ${FORMULA_LIMITS.exponent} on either side of nought.`,
			'Write a smaller one, or use exp( ).'
		);
	}
	if (base === 'anything' || isPure(base)) return {};
	if (written === undefined) {
		throw new TreeRefused(
			tree.right,
			'exponent-not-written',
			`${quoted(formulaText(tree.left))} ${dimensionWords(base)}, so its exponent must be written as a number.`,
			'Write the number, as in x^2 or x^(3/2), or divide by a value of its kind before raising it.'
		);
	}
	return power(base, written);
}

/** The value of a number, or of plain arithmetic over numbers: (3/2), -2. */
function writtenNumber(tree: FormulaTree): number | undefined {
	if (tree.is === 'number') return tree.value;
	if (tree.is === 'unary') {
		const of = tree.sign === '-' ? writtenNumber(tree.of) : undefined;
		return of === undefined ? undefined : -of;
	}
	if (tree.is !== 'binary') return undefined;
	const a = writtenNumber(tree.left);
	const b = writtenNumber(tree.right);
	if (a === undefined || b === undefined) return undefined;
	switch (tree.sign) {
		case '+':
			return a + b;
		case '-':
			return a - b;
		case '*':
			return a * b;
		case '/':
			return a / b;
		case '^':
			return a ** b;
		default:
			return undefined;
	}
}

function dimensionOfCall(
	tree: Extract<FormulaTree, { is: 'call' }>,
	scope: FormulaScope
): FormulaDimension {
	const [first, second] = tree.args as [FormulaTree, FormulaTree | undefined];
	switch (FUNCTIONS[tree.name].rule) {
		case 'pure':
			checkPure(tree.name, first, scope);
			return {};
		case 'angle':
			checkPure(tree.name, first, scope);
			return { angle: 1 };
		case 'root-2':
			return rootOf(dimensionOf(first, scope), 2);
		case 'root-3':
			return rootOf(dimensionOf(first, scope), 3);
		case 'sign':
			dimensionOf(first, scope);
			return {};
		case 'same':
			return second
				? together(tree, first, second, `can't stand in one ${tree.name}( )`, scope)
				: dimensionOf(first, scope);
		case 'alike-angle':
			if (second) together(tree, first, second, `can't stand in one ${tree.name}( )`, scope);
			return { angle: 1 };
	}
}

function checkPure(name: FunctionName, arg: FormulaTree, scope: FormulaScope): void {
	const dimension = dimensionOf(arg, scope);
	if (dimension === 'anything' || isPure(dimension)) return;
	const takes = ['sin', 'cos', 'tan'].includes(name)
		? 'an angle or a pure number'
		: 'a pure number';
	throw new TreeRefused(
		arg,
		'argument-not-pure',
		`${name}( ) takes ${takes}; ${quoted(formulaText(arg))} ${dimensionWords(dimension)}.`,
		'Divide it by a value of its kind first.'
	);
}

function checkTest(tree: FormulaTree, scope: FormulaScope): void {
	if (tree.is === 'unary' && tree.sign === 'not') return checkTest(tree.of, scope);
	if (tree.is !== 'binary' || !isTruth(tree)) {
		throw new TreeRefused(
			tree,
			'not-a-test',
			`${quoted(formulaText(tree))} is a value where a test belongs.`,
			'Compare it with something, as in x > 0.'
		);
	}
	if (tree.sign === 'and' || tree.sign === 'or') {
		checkTest(tree.left, scope);
		checkTest(tree.right, scope);
		return;
	}
	together(tree, tree.left, tree.right, "can't be compared", scope);
}

function notANumber(tree: FormulaTree): TreeRefused {
	return new TreeRefused(
		tree,
		'test-as-value',
		`${quoted(formulaText(tree))} is a test where a value belongs.`,
		tree.is === 'unary'
			? 'Put the whole test in brackets after not: not (x > 0).'
			: 'Say what follows from it: test ? value : other value.'
	);
}
