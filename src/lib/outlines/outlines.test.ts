import { describe, expect, test } from 'vitest';
import { judgeClaims } from '../factcheck/judge.ts';
import { undeclaredFindings } from '../factcheck/undeclared.ts';
import { catalogue } from '../physics/calculators/index.ts';
import { FIELDS } from '../physics/fields.ts';
import { evaluate } from '../widget/evaluate.ts';
import { findings } from '../widget/findings.ts';
import { parseDocument } from '../widget/parse.ts';
import { outlines } from './index.ts';

test('every field of the shelf has an outline, and each has a name of its own', () => {
	const fields = new Set(outlines.map(({ field }) => field));
	expect(FIELDS.filter((field) => field !== 'Of this house' && !fields.has(field))).toEqual([]);
	expect(new Set(outlines.map(({ id }) => id)).size).toBe(outlines.length);
});

describe.each(outlines.map((outline) => ({ outline, id: outline.id })))('$id', ({ outline }) => {
	const { document } = outline;

	test('hangs together, and nothing is missing for a proof', () => {
		expect(parseDocument(document, catalogue)).toMatchObject({ ok: true });
		expect(findings(document, catalogue)).toEqual([]);
		expect(undeclaredFindings(document)).toEqual([]);
	});

	test('every claim is level, with words and numbers as they stand', () => {
		const verdicts = [...judgeClaims(document, catalogue)].map(
			([claim, { verdict, reason }]) => `${claim}: ${verdict === 'level' ? 'level' : reason}`
		);
		expect(verdicts).toEqual(document.claims.map(({ id }) => `${id}: level`));
	});

	test('its calculators all work, at both ends of every slider too', () => {
		for (const end of ['initial', 'min', 'max'] as const) {
			const values = Object.fromEntries(
				document.controls.map((control) => [control.id, 'min' in control ? control[end] : 0])
			);
			const { steps } = evaluate(document, values, catalogue);
			expect(Object.values(steps).filter(({ ok }) => !ok)).toEqual([]);
		}
	});

	test('a calculator with a caution has one in the copy', () => {
		const cautioned = document.steps.some(({ calculator }) =>
			/^(energy|projectile|launcher|fall|rocket)\./.test(calculator)
		);
		expect(document.blocks.some(({ kind }) => kind === 'caution')).toBe(cautioned);
	});
});
