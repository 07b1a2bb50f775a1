import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { typeset } from './typeset.ts';

const equations = [...catalogue.values()].flatMap(({ id, equations: own }) =>
	own.map((equation, index) => ({ id, index, equation }))
);

describe('every equation of the catalogue', () => {
	test.each(equations)('$id, $index is set with MathML beside it', ({ equation }) => {
		const { html, says } = typeset(equation);
		expect(html).toContain('<math');
		expect(html).not.toContain('katex-error');
		expect(says).toBe(equation.says);
	});
});

test('source past the limits is told in words alone', () => {
	expect(typeset({ tex: 'x+'.repeat(2000), says: 'A long sum.' })).toEqual({
		html: null,
		says: 'A long sum.'
	});
});

test('so is one that takes too many steps to set', () => {
	const rounds = Array.from({ length: 60 }, () => '\\operatorname{round}\\left(x\\right)');
	expect(typeset({ tex: rounds.join(' + '), says: 'Rounded.' })).toEqual({
		html: null,
		says: 'Rounded.'
	});
});

test('nothing in the source becomes a link', () => {
	expect(typeset({ tex: '\\href{javascript:alert(1)}{x}', says: '' }).html).not.toMatch(
		/<a\b|href=/
	);
});

test('a slip in the source stops the page instead of showing red letters', () => {
	expect(() => typeset({ tex: '\\frac{1}', says: '' })).toThrow();
});
