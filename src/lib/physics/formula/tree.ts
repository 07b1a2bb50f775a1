/**
 * A formula as plain JSON. It is parsed on the server when it is saved; from then on only the tree travels, so that a
 * reader's frame evaluates it without a parser. A tree from outside goes through `isFormulaTree` first.
 */
import { isFunctionName, FUNCTIONS, type FunctionName } from './functions.ts';

export const ARITHMETIC = ['+', '-', '*', '/', '^'] as const;
export const COMPARISONS = ['<', '<=', '>', '>=', '==', '!='] as const;
export const CONNECTIVES = ['and', 'or'] as const;

export type Arithmetic = (typeof ARITHMETIC)[number];
export type Comparison = (typeof COMPARISONS)[number];
export type Connective = (typeof CONNECTIVES)[number];
export type BinarySign = Arithmetic | Comparison | Connective;

export type FormulaTree =
	| { is: 'number'; value: number }
	| { is: 'name'; name: string }
	| { is: 'unary'; sign: '-' | 'not'; of: FormulaTree }
	| { is: 'binary'; sign: BinarySign; left: FormulaTree; right: FormulaTree }
	| { is: 'call'; name: FunctionName; args: FormulaTree[] }
	| { is: 'if'; test: FormulaTree; then: FormulaTree; otherwise: FormulaTree };

/** How large a formula may be. The same limits hold for its source, before it is parsed, and for its tree. */
export const FORMULA_LIMITS = {
	/** UTF-16 units of the source. */
	characters: 2048,
	/** Brackets inside brackets, and branches inside branches. */
	depth: 32,
	/** Numbers, names, signs and functions. */
	nodes: 200,
	/** Different names. */
	names: 40,
	/** Size of a written exponent. */
	exponent: 1000
} as const;

/** What a name may look like: a letter, then letters, digits and underscores, 32 at most. */
export const NAME = /^[A-Za-z][A-Za-z0-9_]{0,31}$/;

/** The parts of a node, in the order they are written. */
export function partsOf(tree: FormulaTree): FormulaTree[] {
	switch (tree.is) {
		case 'number':
		case 'name':
			return [];
		case 'unary':
			return [tree.of];
		case 'binary':
			return [tree.left, tree.right];
		case 'call':
			return tree.args;
		case 'if':
			return [tree.test, tree.then, tree.otherwise];
	}
}

/** Every name in a tree, once, in the order of first use. */
export function namesIn(tree: FormulaTree): string[] {
	const names = new Set<string>();
	const visit = (node: FormulaTree): void => {
		if (node.is === 'name') names.add(node.name);
		partsOf(node).forEach(visit);
	};
	visit(tree);
	return [...names];
}

/** True for a tree within the limits whose nodes are all of the allowed kinds and have nothing else in them. */
export function isFormulaTree(stored: unknown): stored is FormulaTree {
	const names = new Set<string>();
	let nodes = 0;
	const sound = (node: unknown, depth: number): boolean => {
		nodes += 1;
		if (depth > FORMULA_LIMITS.depth || nodes > FORMULA_LIMITS.nodes) return false;
		if (typeof node !== 'object' || node === null) return false;
		const shape = node as Record<string, unknown>;
		const inner = (part: unknown) => sound(part, depth + 1);
		switch (shape.is) {
			case 'number':
				return keysAre(shape, 'value') && Number.isFinite(shape.value);
			case 'name':
				if (!keysAre(shape, 'name') || typeof shape.name !== 'string') return false;
				names.add(shape.name);
				return NAME.test(shape.name) && names.size <= FORMULA_LIMITS.names;
			case 'unary':
				return (
					keysAre(shape, 'sign', 'of') &&
					(shape.sign === '-' || shape.sign === 'not') &&
					inner(shape.of)
				);
			case 'binary':
				return (
					keysAre(shape, 'sign', 'left', 'right') &&
					isBinarySign(shape.sign) &&
					inner(shape.left) &&
					inner(shape.right)
				);
			case 'call':
				return (
					keysAre(shape, 'name', 'args') &&
					isFunctionName(shape.name) &&
					Array.isArray(shape.args) &&
					shape.args.length === FUNCTIONS[shape.name].arity &&
					shape.args.every(inner)
				);
			case 'if':
				return (
					keysAre(shape, 'test', 'then', 'otherwise') &&
					inner(shape.test) &&
					inner(shape.then) &&
					inner(shape.otherwise)
				);
			default:
				return false;
		}
	};
	return sound(stored, 1);
}

export function isBinarySign(sign: unknown): sign is BinarySign {
	return ([...ARITHMETIC, ...COMPARISONS, ...CONNECTIVES] as unknown[]).includes(sign);
}

/** True where a node says yes or no, and so can only be a test or a part of one. */
export function isTruth(tree: FormulaTree): boolean {
	if (tree.is === 'unary') return tree.sign === 'not';
	return tree.is === 'binary' && !(ARITHMETIC as readonly string[]).includes(tree.sign);
}

function keysAre(shape: Record<string, unknown>, ...keys: string[]): boolean {
	return (
		Object.keys(shape).length === keys.length + 1 && keys.every((key) => Object.hasOwn(shape, key))
	);
}
