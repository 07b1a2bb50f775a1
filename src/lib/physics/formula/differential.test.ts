/** Our evaluation against the library's own, number by number. The library evaluates in this test and nowhere else. */
import { all, create } from 'mathjs/number';
import { describe, expect, test } from 'vitest';
import { compileFormula } from './compile.ts';
import { FUNCTIONS, type FunctionName } from './functions.ts';
import { parseFormula } from './parse.ts';
import { formulaText } from './print.ts';
import { formulaScope } from './scope.ts';
import { ARITHMETIC, COMPARISONS, partsOf, type FormulaTree } from './tree.ts';

const math = create({ ...all });
const NAMES = ['a_1', 'b_1', 'c_1', 'd_1', 'x', 'y'];
const scope = formulaScope(NAMES.map((name) => [name, { dimension: {}, says: name }]));
/**
 * What the library calls otherwise, has for other kinds of number only, or, like floor and ceil, works out after moving
 * numbers that are nearly whole.
 */
const OWN_NAMES = { ln: Math.log, hypot: Math.hypot, floor: Math.floor, ceil: Math.ceil };

/** Mulberry32, so that a failure can be had again. */
function draws(seed: number): () => number {
	let state = seed;
	return () => {
		state = (state + 0x6d2b79f5) | 0;
		let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
		mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
		return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
	};
}

function pick<T>(draw: () => number, list: readonly T[]): T {
	return list[Math.floor(draw() * list.length)] as T;
}

/** A tree of at most so many nodes, each kind of node in its turn. */
function randomTree(draw: () => number, budget: number): FormulaTree {
	if (budget < 3) {
		return draw() < 0.35
			? { is: 'number', value: Number((draw() * 10 ** Math.floor(draw() * 5 - 2)).toPrecision(4)) }
			: { is: 'name', name: pick(draw, NAMES) };
	}
	const kind = draw();
	if (kind < 0.1) return { is: 'unary', sign: '-', of: randomTree(draw, budget - 1) };
	if (kind < 0.35) {
		const name = pick(draw, Object.keys(FUNCTIONS) as FunctionName[]);
		const { arity } = FUNCTIONS[name];
		const share = Math.floor((budget - 1) / arity);
		return { is: 'call', name, args: Array.from({ length: arity }, () => randomTree(draw, share)) };
	}
	if (kind < 0.43 && budget >= 8) {
		const share = Math.floor((budget - 1) / 3);
		return {
			is: 'if',
			test: randomTest(draw, share),
			then: randomTree(draw, share),
			otherwise: randomTree(draw, share)
		};
	}
	const sign = pick(draw, ARITHMETIC);
	const left = randomTree(draw, Math.floor((budget - 1) / 2));
	const right: FormulaTree =
		sign === '^' && draw() < 0.7 // cubes, rounded otherwise by a power, have a test of their own
			? { is: 'number', value: pick(draw, [0.5, 1, 2, 4, 5]) }
			: randomTree(draw, Math.floor((budget - 1) / 2));
	return { is: 'binary', sign, left, right };
}

function randomTest(draw: () => number, budget: number): FormulaTree {
	if (budget > 8 && draw() < 0.4) {
		const share = Math.floor(budget / 2);
		return {
			is: 'binary',
			sign: pick(draw, ['and', 'or'] as const),
			left: randomTest(draw, share),
			right: randomTest(draw, share)
		};
	}
	if (budget > 5 && draw() < 0.15) {
		return { is: 'unary', sign: 'not', of: randomTest(draw, budget - 1) };
	}
	const share = Math.max(1, Math.floor(budget / 2));
	return {
		is: 'binary',
		sign: pick(draw, COMPARISONS),
		left: randomTree(draw, share),
		right: randomTree(draw, share)
	};
}

function sizeOf(tree: FormulaTree): number {
	return 1 + partsOf(tree).reduce((sum, part) => sum + sizeOf(part), 0);
}

function holdsChoice(tree: FormulaTree): boolean {
	return tree.is === 'if' || partsOf(tree).some(holdsChoice);
}

describe('random formulas', () => {
	test(
		'10 000 give what the library’s number mode gives, to 1e-12',
		{ timeout: 60_000 },
		async ({ annotate }) => {
			const draw = draws(20261201);
			let finite = 0;
			let worst = 0;
			const wrong: unknown[] = [];
			for (let count = 0; count < 10_000; count += 1) {
				const source = formulaText(randomTree(draw, 3 + Math.floor(draw() * 40)));
				const values = NAMES.map(() => Number((draw() * 8 - 2).toPrecision(6)));
				const parsed = parseFormula(source, scope);
				if (!parsed.ok) {
					// A random exponent may be too large; nothing else is wrong with these formulas.
					expect([source, parsed.problem.code]).toEqual([source, 'exponent-too-large']);
					continue;
				}
				const ours = compileFormula(parsed.tree, { slots: NAMES })(values);
				const names = NAMES.map((name, at) => [name, values[at]] as const);
				const theirs: unknown = math.evaluate(
					source,
					new Map<string, unknown>([...names, ...Object.entries(OWN_NAMES)])
				);
				if (Number.isNaN(ours) && holdsChoice(parsed.tree)) continue; // a test without an answer: theirs says no
				if (Number.isFinite(ours)) finite += 1;
				const apart =
					Object.is(ours, theirs) || ours === theirs ? 0 : Math.abs(ours - Number(theirs));
				const relative = apart / Math.max(Math.abs(ours), 1e-300);
				if (!(relative <= 1e-12) && !(Number.isNaN(ours) && Number.isNaN(theirs))) {
					wrong.push({ source, values, ours, theirs });
				} else if (Number.isFinite(relative)) worst = Math.max(worst, relative);
			}
			expect(wrong).toEqual([]);
			expect(finite).toBeGreaterThan(5000);
			await annotate(
				`${finite} of 10 000 finite; worst relative difference ${worst.toExponential(1)}`
			);
		}
	);
});

describe('cost', () => {
	test(
		'of the largest formulas that are let through',
		{ timeout: 30_000 },
		async ({ annotate }) => {
			const draw = draws(77);
			const slots = NAMES;
			const values = Float64Array.of(1.2, 3.4, 0.7, 2.2, 1.1, 0.4);
			let [compileMs, evaluateUs, most, count] = [0, 0, 0, 0];
			while (count < 100) {
				const tree = randomTree(draw, 400);
				const size = sizeOf(tree);
				if (size < 120 || size > 200) continue;
				const source = formulaText(tree);
				const before = performance.now();
				const parsed = parseFormula(source, scope);
				if (!parsed.ok) continue;
				const run = compileFormula(parsed.tree, { slots });
				compileMs += performance.now() - before;
				for (let warm = 0; warm < 300; warm += 1) run(values);
				const start = performance.now();
				for (let round = 0; round < 1000; round += 1) run(values);
				const cost = performance.now() - start;
				evaluateUs += cost;
				most = Math.max(most, cost);
				count += 1;
			}
			// Figures of a busy machine are printed, not asserted.
			await annotate(
				`100 formulas of 120 to 200 nodes: parse and compile ${(compileMs / 100).toFixed(2)} ms each, evaluate ${(evaluateUs / 100).toFixed(2)} µs each, ${most.toFixed(2)} µs at most`
			);
			expect(count).toBe(100);
		}
	);
});
