import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { compileFormula, compileTest, evaluateFormula } from './compile.ts';
import { parseFormula, parseTest } from './parse.ts';
import { formulaText } from './print.ts';
import { formulaScope } from './scope.ts';
import { isFormulaTree, namesIn, type FormulaTree } from './tree.ts';

const slots = ['x', 'y', 'z'];
const scope = formulaScope(slots.map((name) => [name, { dimension: {}, says: name }]));

function treeOf(source: string): FormulaTree {
	const parsed = parseFormula(source, scope);
	if (!parsed.ok) throw new Error(`${source}: ${parsed.problem.says}`);
	return parsed.tree;
}

const run = (source: string, ...values: number[]) =>
	compileFormula(treeOf(source), { slots })(values);

describe('evaluation', () => {
	test.each([
		['1 + 2*3 - 4/8', [], 6.5],
		['-x^2', [3], -9],
		['2^3^2', [], 512],
		['x - y - z', [10, 3, 2], 5],
		['x/y/z', [12, 3, 2], 2],
		['x^0.5', [9], 3],
		['x^y', [2, 10], 1024],
		['round(-2.5)', [], -3],
		['round(2.5)', [], 3],
		['x > y ? x : y', [1, 2], 2],
		['x > 0 and y > 0 ? 1 : 2', [1, -1], 2],
		['x > 0 or y > 0 ? 1 : 2', [1, -1], 1],
		['not (x == y) ? 1 : 2', [1, 1], 2],
		['x <= y ? 1 : 2', [1, 1], 1],
		['x != y ? 1 : 2', [1, 1], 2]
	])('%s at %j is %d', (source, values, is) => {
		expect(run(source, ...values)).toBe(is);
	});

	test.each([
		['sqrt(x)', -1],
		['1/x', 0],
		['ln(x)', 0],
		['exp(x)', 1e4],
		['asin(x)', 2]
	])('%s at %d has no finite value, and nothing is thrown', (source, x) => {
		expect(Number.isFinite(run(source, x))).toBe(false);
	});

	test.each([
		['sqrt(x) > 1 ? 1 : 2'],
		['sqrt(x) != 1 ? 1 : 2'],
		['not (sqrt(x) > 1) ? 1 : 2'],
		['y > 0 and sqrt(x) > 1 ? 1 : 2'],
		['sqrt(x) > 1 and y > 0 ? 1 : 2'],
		['sqrt(x) > 1 or y < 0 ? 1 : 2']
	])('%s has no value where its test has no answer', (source) => {
		expect(run(source, -1, 1)).toBeNaN();
	});

	test('one side may settle a test alone', () => {
		expect(run('y < 0 and sqrt(x) > 1 ? 1 : 2', -1, 1)).toBe(2);
		expect(run('sqrt(x) > 1 or y > 0 ? 1 : 2', -1, 1)).toBe(1);
	});

	test('every order of slot, number and work gives what JavaScript gives', () => {
		const parts = ['x', 'y', '3', 'exp(x)', '(y - 2)'];
		const of: Record<string, (x: number, y: number) => number> = {
			x: (x) => x,
			y: (_, y) => y,
			'3': () => 3,
			'exp(x)': (x) => Math.exp(x),
			'(y - 2)': (_, y) => y - 2
		};
		for (const left of parts) {
			for (const right of parts) {
				const a = of[left]?.(1.7, 4.1) as number;
				const b = of[right]?.(1.7, 4.1) as number;
				expect(run(`${left} + ${right}`, 1.7, 4.1)).toBe(a + b);
				expect(run(`${left} - ${right}`, 1.7, 4.1)).toBe(a - b);
				expect(run(`${left} * ${right}`, 1.7, 4.1)).toBe(a * b);
				expect(run(`${left} / ${right}`, 1.7, 4.1)).toBe(a / b);
			}
		}
	});

	test('a cube by multiplication is a power to the last bits', () => {
		fc.assert(
			fc.property(fc.double({ min: -1e60, max: 1e60, noNaN: true }), (x) => {
				const cube = run('x^3', x);
				return Math.abs(cube - x ** 3) <= 4e-16 * Math.abs(cube) + Number.MIN_VALUE;
			}),
			{ seed: 3, numRuns: 2000 }
		);
	});

	test('by name, once', () => {
		const tree = treeOf('x*y + z');
		expect(
			evaluateFormula(tree, new Map([['x', 2], ['y', 3], ['z', 4]])) // prettier-ignore
		).toBe(10);
		expect(() => evaluateFormula(tree, new Map([['x', 2]]))).toThrow(RangeError);
	});

	test('a test', () => {
		const parsed = parseTest('x > y', scope);
		if (!parsed.ok) throw new Error(parsed.problem.says);
		const holds = compileTest(parsed.tree, { slots });
		expect([holds([2, 1]), holds([1, 2]), holds([NaN, 2])]).toEqual([true, false, undefined]);
		expect(() => compileFormula(parsed.tree, { slots })).toThrow(RangeError);
		expect(() => compileTest(treeOf('x'), { slots })).toThrow(RangeError);
	});
});

describe('a stored tree', () => {
	test('is let in as it was made', () => {
		for (const source of ['2*x^3 - sin(y)', 'x > 0 and not (y < 1) ? max(x, y) : -z']) {
			const tree: unknown = JSON.parse(JSON.stringify(treeOf(source)));
			expect(isFormulaTree(tree)).toBe(true);
		}
		expect(namesIn(treeOf('x + y*x'))).toEqual(['x', 'y']);
	});

	const x = { is: 'name', name: 'x' };
	const deep = (levels: number): unknown =>
		levels === 0 ? x : { is: 'unary', sign: '-', of: deep(levels - 1) };
	const wide = (levels: number): unknown =>
		levels === 0 ? x : { is: 'binary', sign: '+', left: wide(levels - 1), right: wide(levels - 1) };
	test.each<[string, unknown]>([
		['nothing', null],
		['text', 'x'],
		['a list', [x]],
		['an unknown kind', { is: 'code', code: '1' }],
		['a number that is none', { is: 'number', value: '1' }],
		['no finite number', { is: 'number', value: Infinity }],
		['a name that can’t be one', { is: 'name', name: '__proto__' }],
		['an unknown sign', { is: 'binary', sign: '%', left: x, right: x }],
		['an unknown function', { is: 'call', name: 'constructor', args: [x] }],
		['too few arguments', { is: 'call', name: 'atan2', args: [x] }],
		['something extra', { is: 'name', name: 'x', run: 'y' }],
		['something missing', { is: 'if', test: x, then: x }],
		['33 levels', deep(32)],
		['255 nodes', wide(7)]
	])('%s is kept out', (_, stored) => {
		expect(isFormulaTree(stored)).toBe(false);
	});

	test('32 levels and 127 nodes are let in', () => {
		expect(isFormulaTree(deep(31))).toBe(true);
		expect(isFormulaTree(wide(6))).toBe(true);
	});
});

test('what is printed reads as the same tree', () => {
	for (const source of [
		'-(-x)',
		'(-x)^2',
		'-x^2',
		'x^-y',
		'x^(y^z)',
		'(x^y)^z',
		'x - (y + z)',
		'x/(y*z)',
		'x*(y/z)',
		'(x > 0 ? 1 : 2)*3',
		'x > 0 ? (y > 0 ? 1 : 2) : 3',
		'not (x > 0 and y > 0) ? 1 : 2',
		'(x > 0 or y > 0) and z > 0 ? 1 : 2',
		'1e-30*x + 2e30'
	]) /* prettier-ignore */ {
		expect(formulaText(treeOf(formulaText(treeOf(source))))).toBe(formulaText(treeOf(source)));
		expect(treeOf(formulaText(treeOf(source)))).toEqual(treeOf(source));
	}
});
