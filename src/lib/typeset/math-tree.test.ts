import { expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import type { MathNode } from '../renderer/math-node.ts';
import { mathTree } from './math-tree.ts';

const textOf = (node: MathNode): string =>
	typeof node === 'string' ? node : node.children.map(textOf).join('');

test('sets a fraction as one', () => {
	const tree = mathTree('E = \\frac{h c}{\\lambda}');
	expect(JSON.stringify(tree)).toContain('"tag":"mfrac"');
	expect(textOf(tree ?? '')).toBe('E=hcλ');
});

test('keeps signs that XML would escape', () => {
	expect(textOf(mathTree('a < b \\& c') ?? '')).toContain('<');
});

test('every equation of the software’s calculators is set, with nothing but MathML', () => {
	for (const { id, equations } of catalogue.values()) {
		for (const { tex } of equations) {
			const tree = mathTree(tex);
			expect(tree, `${id}: ${tex}`).not.toBeNull();
			expect(textOf(tree ?? ''), id).not.toBe('');
			expect(JSON.stringify(tree), id).not.toMatch(/annotation|semantics|"(class|style|href)"/);
		}
	}
});

test('a source past the limits is left to its words', () => {
	expect(mathTree(`x${'+x'.repeat(1100)}`)).toBeNull();
});
