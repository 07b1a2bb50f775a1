import katex from 'katex';
import { expect, test } from 'vitest';
import { formulaBook } from './book.ts';
import { FUNCTIONS, type FunctionName } from './functions.ts';
import { parseFormula } from './parse.ts';
import { formulaTex, nameTex } from './print.ts';
import { formulaScope } from './scope.ts';

const names = ['x', 'y', 'a', 'M', 'mass_before', 'theta_1'];
const scope = formulaScope(names.map((name) => [name, { dimension: {}, says: name }]));

function texOf(source: string): string {
	const parsed = parseFormula(source, scope);
	if (!parsed.ok) throw new Error(`${source}: ${parsed.problem.says}`);
	return formulaTex(parsed.tree, (name) => formulaBook().get(name)?.tex ?? nameTex(name));
}

test.each([
	['2*pi*sqrt(a^3/x)', '2 \\, \\pi \\, \\sqrt{\\frac{{a}^{3}}{x}}'],
	['x*(y + 1)', 'x \\, \\left(y + 1\\right)'],
	['(x + y)^2', '{\\left(x + y\\right)}^{2}'],
	['2*3', '2 \\cdot 3'],
	['2e30*x', '2\\times 10^{30} \\, x'],
	['-(x + y)', '-\\left(x + y\\right)'],
	['x - (y - a)', 'x - \\left(y - a\\right)'],
	['ln(mass_before)', '\\ln\\left({\\mathrm{mass}}_{\\mathrm{before}}\\right)'],
	['sin(theta_1)', '\\sin\\left({\\theta}_{\\mathrm{1}}\\right)'],
	['x > 0 ? x : -x', '\\begin{cases}x & \\text{if }x > 0\\\\ -x & \\text{otherwise}\\end{cases}']
])('%s', (source, tex) => {
	expect(texOf(source)).toBe(tex);
});

test('everything that can be written can be set', () => {
	const calls = (Object.keys(FUNCTIONS) as FunctionName[]).map((name) =>
		FUNCTIONS[name].arity === 1 ? `${name}(x + y)` : `${name}(x, -y)`
	);
	const constants = [...formulaBook().values()].map(({ tex }) => tex);
	const rest = [
		'x^-y/(a - M)^(1/2)',
		'-x^2*-y',
		'x >= 0 and not (y != 1) or x <= 2 ? x/y : (x == y ? 1 : 2)',
		'1e-300*x + 123456789*y'
	];
	for (const tex of [...[...calls, ...rest].map(texOf), ...constants]) {
		expect(
			() => katex.renderToString(tex, { throwOnError: true, strict: 'error' }),
			tex
		).not.toThrow();
	}
});
