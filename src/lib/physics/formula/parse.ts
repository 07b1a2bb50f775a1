/**
 * From source to tree, on the server, when a formula is saved. The library's parser settles what binds tighter, and
 * nothing more: it is given only what `scanFormula` let through, what it makes is walked node by node against what is
 * allowed, and it never evaluates. It must not be imported by what a reader's frame or a writer's browser loads.
 */
import { create, parseDependencies, type MathNode } from 'mathjs/number';
import { unitOf } from '../units/units.ts';
import { measureFormula, measureTest } from './dimensions.ts';
import { FUNCTIONS, isFunctionName } from './functions.ts';
import { FormulaRefused, quoted, type FormulaProblem, type Span } from './problem.ts';
import { scanFormula } from './scan.ts';
import type { FormulaScope } from './scope.ts';
import type { Token } from './tokens.ts';
import { FORMULA_LIMITS, isBinarySign, partsOf, type FormulaTree } from './tree.ts';
import { canBeStated, dimensionWords, type FormulaDimension } from './vectors.ts';

const { parse } = create({ ...parseDependencies });

export type { FormulaProblem } from './problem.ts';

export type ParsedFormula =
	| { ok: true; tree: FormulaTree; dimension: FormulaDimension }
	| { ok: false; problem: FormulaProblem };

export type ParsedTest = { ok: true; tree: FormulaTree } | { ok: false; problem: FormulaProblem };

/**
 * Parses a formula that gives a number. With `unit`, its dimension must be that of the unit.
 * A wrong formula is refused with its place and a mend, within milliseconds, however long or hostile it is.
 */
export function parseFormula(source: string, scope: FormulaScope, unit?: string): ParsedFormula {
	return refusing(() => {
		const { tree, spans } = read(source, scope);
		const measured = measureFormula(tree, scope);
		if (!measured.ok) throw placed(measured.problem, spans);
		checkUnit(measured.dimension, unit, source);
		return { ok: true, tree, dimension: measured.dimension };
	});
}

/** Parses a formula that says yes or no: `mass_after > mass_before`. */
export function parseTest(source: string, scope: FormulaScope): ParsedTest {
	return refusing(() => {
		const { tree, spans } = read(source, scope);
		const measured = measureTest(tree, scope);
		if (!measured.ok) throw placed(measured.problem, spans);
		return { ok: true, tree };
	});
}

type Spans = ReadonlyMap<FormulaTree, Span>;

function refusing<T>(work: () => T): T | { ok: false; problem: FormulaProblem } {
	try {
		return work();
	} catch (error) {
		if (error instanceof FormulaRefused) return { ok: false, problem: error.problem };
		throw error;
	}
}

function placed(
	problem: { node: FormulaTree; code: string; says: string; mend: string },
	spans: Spans
): FormulaRefused {
	const at = spans.get(problem.node) ?? { from: 0, to: 0 };
	return new FormulaRefused(at, problem.code, problem.says, problem.mend);
}

function checkUnit(found: FormulaDimension, symbol: string | undefined, source: string): void {
	if (symbol === undefined) return;
	const unit = unitOf(symbol);
	if (unit && canBeStated(found, unit.dimension)) return;
	throw new FormulaRefused(
		{ from: 0, to: source.length },
		'unit-differs',
		unit
			? `The formula ${dimensionWords(found)}; ${symbol === '' ? 'a pure number' : quoted(symbol)} ${symbol === '' ? 'is asked for' : dimensionWords(unit.dimension)}.`
			: `There is no unit ${quoted(symbol)} in the table.`,
		unit ? 'Correct the formula, or choose a unit of its kind.' : 'Choose a unit of the table.'
	);
}

/** Scan, parse, walk; and where each node stands in the source. */
function read(source: string, scope: FormulaScope): { tree: FormulaTree; spans: Spans } {
	const { tokens, plain } = scanFormula(source, scope);
	const walk = new Walk(tokens);
	const tree = walk.tree(parsed(plain));
	checkDepth(tree, walk.spans);
	return { tree, spans: walk.spans };
}

function parsed(plain: string): MathNode {
	try {
		return parse(plain);
	} catch (error) {
		// Its errors carry the place they were noticed at, counted from 1; a full stack carries none.
		const char = (error as { char?: unknown }).char;
		const at = typeof char === 'number' ? Math.min(Math.max(char - 1, 0), plain.length - 1) : 0;
		throw new FormulaRefused(
			{ from: at, to: at + 1 },
			error instanceof RangeError ? 'too-deep' : 'unreadable',
			error instanceof RangeError
				? 'Too much stands inside one another here.'
				: "The formula can't be read from here on.",
			'Put brackets round what belongs together, or give parts names of their own.'
		);
	}
}

function checkDepth(tree: FormulaTree, spans: Spans): void {
	const visit = (node: FormulaTree, depth: number): void => {
		if (depth > FORMULA_LIMITS.depth) {
			throw placed(
				{
					node,
					code: 'too-deep',
					says: `More than ${FORMULA_LIMITS.depth} steps stand inside one another here.`,
					mend: 'Put brackets round parts of a long sum or product, or give them names of their own.'
				},
				spans
			);
		}
		partsOf(node).forEach((part) => visit(part, depth + 1));
	};
	visit(tree, 1);
}

/** The parts of the library's nodes that are read here; anything else about them is left alone. */
interface Node {
	type: string;
	op?: unknown;
	implicit?: unknown;
	value?: unknown;
	name?: unknown;
	fn?: { type?: unknown; name?: unknown };
	args?: Node[];
	content?: Node;
	condition?: Node;
	trueExpr?: Node;
	falseExpr?: Node;
}

/** Copies what is allowed into plain nodes. Leaves come in the order of their tokens, which gives each its place. */
class Walk {
	readonly spans = new Map<FormulaTree, Span>();
	readonly #leaves: Token[];
	#next = 0;

	constructor(tokens: readonly Token[]) {
		this.#leaves = tokens.filter(
			({ kind }) => kind === 'number' || kind === 'name' || kind === 'function'
		);
	}

	tree(given: MathNode): FormulaTree {
		return this.#copy(given as unknown as Node);
	}

	#copy(node: Node): FormulaTree {
		switch (node.type) {
			case 'ParenthesisNode':
				return this.#copy(required(node.content));
			case 'ConstantNode': {
				const at = this.#leaf();
				if (typeof node.value !== 'number' || !Number.isFinite(node.value)) throw foreign(node, at);
				return this.#place({ is: 'number', value: node.value }, at);
			}
			case 'SymbolNode': {
				const at = this.#leaf();
				if (node.name !== at.text) throw foreign(node, at);
				return this.#place({ is: 'name', name: at.text }, at);
			}
			case 'FunctionNode':
				return this.#call(node);
			case 'OperatorNode':
				return this.#operator(node);
			case 'ConditionalNode': {
				const test = this.#copy(required(node.condition));
				const then = this.#copy(required(node.trueExpr));
				const otherwise = this.#copy(required(node.falseExpr));
				return this.#place({ is: 'if', test, then, otherwise }, this.#across(test, otherwise));
			}
			case 'RelationalNode':
				throw new FormulaRefused(
					this.#here(),
					'comparison-chained',
					'Two comparisons stand in a row here.',
					'Write them apart: a < b and b < c.'
				);
			default:
				throw foreign(node, this.#here());
		}
	}

	#operator(node: Node): FormulaTree {
		const [first, second] = (node.args ?? []) as [Node, Node | undefined];
		if (node.implicit === true) throw foreign(node, this.#here());
		if (!second) {
			if (node.op !== '-' && node.op !== 'not') throw foreign(node, this.#here());
			const of = this.#copy(first);
			return this.#place({ is: 'unary', sign: node.op, of }, this.#across(of, of));
		}
		if (node.args?.length !== 2 || !isBinarySign(node.op)) throw foreign(node, this.#here());
		const left = this.#copy(first);
		const right = this.#copy(second);
		return this.#place({ is: 'binary', sign: node.op, left, right }, this.#across(left, right));
	}

	#call(node: Node): FormulaTree {
		const at = this.#leaf();
		const name = node.fn?.name;
		if (node.fn?.type !== 'SymbolNode' || name !== at.text || !isFunctionName(name))
			throw foreign(node, at);
		const args = (node.args ?? []).map((arg) => this.#copy(arg));
		const last = args.at(-1);
		if (args.length !== FUNCTIONS[name].arity || !last) throw foreign(node, at);
		return this.#place(
			{ is: 'call', name, args },
			{ from: at.from, to: this.#across(last, last).to }
		);
	}

	#leaf(): Token {
		const token = this.#leaves[this.#next];
		if (!token) throw new Error('The parser made more values than the formula has.');
		this.#next += 1;
		return token;
	}

	#here(): Span {
		return this.#leaves[Math.min(this.#next, this.#leaves.length - 1)] ?? { from: 0, to: 0 };
	}

	#place(tree: FormulaTree, { from, to }: Span): FormulaTree {
		this.spans.set(tree, { from, to });
		return tree;
	}

	#across(first: FormulaTree, last: FormulaTree): Span {
		return { from: this.spans.get(first)?.from ?? 0, to: this.spans.get(last)?.to ?? 0 };
	}
}

function required(node: Node | undefined): Node {
	if (!node) throw new Error('The parser left out part of a node.');
	return node;
}

function foreign(node: Node, at: Span): FormulaRefused {
	return new FormulaRefused(
		at,
		'not-allowed',
		`A formula can't hold this (${node.type}).`,
		'Use numbers, names, + - * / ^, comparisons, and, or, not, choices with ? and :, and the functions.'
	);
}
