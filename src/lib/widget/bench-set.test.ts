import { describe, expect, test } from 'vitest';
import { thrownStone } from '../../../tests/support/thrown-stone.ts';
import { judgeClaims } from '../factcheck/judge.ts';
import { catalogue } from '../physics/calculators/index.ts';
import { benchSet } from './bench-set.ts';
import { claimCovers, coverHash } from './cover.ts';
import type { FormulaStep, WidgetDocument } from './document.ts';
import { evaluate, readingAt } from './evaluate.ts';
import { evaluateUncertainty } from './evaluate-uncertainty.ts';
import { findings } from './findings.ts';
import { formulaDigest, formulaRevision } from './formula-definition.ts';
import { freeze } from './freeze.ts';
import { parseDocument } from './parse.ts';

const height = { step: 'throw', output: 'value' };

function changed(change: (formula: FormulaStep) => void): WidgetDocument {
	const document = thrownStone();
	change(document.formulas[0]!);
	return document;
}

describe('the calculators of a document', () => {
	test('are the house’s own where it has no formulas', () => {
		expect(benchSet({ formulas: [] }, catalogue)).toBe(catalogue);
	});

	test('are built once for the same list, and not again in front of themselves', () => {
		const document = thrownStone();
		const set = benchSet(document, catalogue);
		expect(benchSet(document, catalogue)).toBe(set);
		expect(benchSet(document, set)).toBe(set);
		expect([...set.keys()][0]).toBe('formula.thrown');
		expect(set.size).toBe(catalogue.size + 1);
	});

	test('never hold another document’s formula of the same name', () => {
		const other = changed((formula) => (formula.title = 'Something else'));
		const set = benchSet(other, benchSet(thrownStone(), catalogue));
		expect(set.get('formula.thrown')?.title).toBe('Something else');
	});

	test('leave out a formula that doesn’t hold, and what is tied to it is refused in words', () => {
		const document = changed((formula) => (formula.tree = { is: 'name', name: 'nothing' }));
		const set = benchSet(document, catalogue);
		const { steps } = evaluate(document, {}, set);
		expect(steps.throw).toMatchObject({ ok: false, refusal: { code: 'unknown-calculator' } });
	});
});

describe('a formula at work', () => {
	const document = thrownStone();
	const set = benchSet(document, catalogue);

	// 13 m/s × 1 s − 9.8 m/s² × (1 s)²/2, and √(2 × 9.8 m/s² × 8.1 m) for the fall from there, by hand.
	test('reads what one works out by hand, and feeds a calculator', () => {
		const evaluation = evaluate(document, {}, set);
		const up = readingAt(document, evaluation, height, set);
		const down = readingAt(document, evaluation, { step: 'drop', output: 'impactSpeed' }, set);
		expect(up.ok && up.reading).toMatchObject({ value: 8.1, unit: 'm', uncertainty: 'exact' });
		expect(down.ok && down.reading.value).toBeCloseTo(Math.sqrt(158.76), 12);
	});

	test('moves with the slider', () => {
		const evaluation = evaluate(document, { time: 2 }, set);
		const up = readingAt(document, evaluation, height, set);
		expect(up.ok && up.reading.value).toBeCloseTo(6.4, 12);
	});

	test('is weighed, frozen and found complete without being asked for', () => {
		expect(findings(document, catalogue)).toEqual([]);
		const verdicts = [...judgeClaims(document, catalogue).values()];
		expect(verdicts.map(({ verdict }) => verdict)).toEqual(['level', 'level', 'level', 'level']);
		expect(freeze(document, catalogue).calculators).toEqual([
			{ id: 'energy.drop', revision: '1.0.0' },
			{ id: 'formula.thrown', revision: formulaRevision(document.formulas[0]!) }
		]);
	});

	// G is known to 0.00015 in 6.67430 (CODATA 2022), so gravity is known to that share of itself, and half of it, at
	// t = 1 s, is what the height is known to.
	test('passes the uncertainty of what it takes on', () => {
		const onEarth = thrownStone();
		onEarth.steps.push({
			id: 'earth',
			calculator: 'gravity.body',
			revision: catalogue.get('gravity.body')!.revision,
			settings: {
				mass_kg: { from: 'fixed', value: 5.9722e24 },
				radius_m: { from: 'fixed', value: 6.371e6 }
			}
		});
		const gravity = { step: 'earth', output: 'surfaceGravity' };
		onEarth.steps[0]!.settings.gravity = { from: 'reading', ...gravity };
		const own = benchSet(onEarth, catalogue);
		const evaluation = evaluate(onEarth, {}, own);
		const pull = readingAt(onEarth, evaluation, gravity, own);
		const carried = evaluateUncertainty(onEarth, evaluation, height, own);
		const share = 0.00015 / 6.6743;
		expect(carried.uncertainty).toBeCloseTo((Number(pull.ok && pull.reading.value) * share) / 2, 8);
	});
});

describe('a formula’s revision', () => {
	const base = thrownStone().formulas[0]!;

	test('is the same wherever the formula stands', () => {
		const elsewhere = { ...structuredClone(base), id: 'elsewhere' };
		elsewhere.checks[0]!.id = 'another';
		expect(formulaDigest(elsewhere)).toBe(formulaDigest(base));
	});

	test.each<[string, (formula: FormulaStep) => void]>([
		['title', (formula) => (formula.title += '.')],
		['source', (formula) => (formula.formula += ' ')],
		['tree', (formula) => (formula.tree = { is: 'number', value: 1 })],
		['range', (formula) => (formula.inputs[0]!.max = 99)],
		['check value', (formula) => (formula.checks[0]!.published = 8.11)],
		['unit', (formula) => (formula.output.unit = 'km')]
	])('changes with its %s', (_what, change) => {
		const other = structuredClone(base);
		change(other);
		expect(formulaRevision(other)).not.toBe(formulaRevision(base));
	});
});

describe('a signature', () => {
	const hashes = (document: WidgetDocument) =>
		Object.fromEntries(
			[...claimCovers(document, catalogue)].map(([id, cover]) => [id, coverHash(cover)])
		);

	test('lapses on everything downstream when the formula changes, and on nothing else', () => {
		const before = thrownStone();
		before.claims.push({ id: 'apart', form: 'exempt', reason: 'a figure of speech' });
		before.blocks.push({
			id: 'apart',
			kind: 'paragraph',
			content: [{ kind: 'claim', claim: 'apart', text: 'one' }]
		});
		const after = structuredClone(before);
		after.formulas[0]!.inputs[2]!.max = 90;
		const [was, is] = [hashes(before), hashes(after)];
		const lapsed = Object.keys(was).filter((id) => was[id] !== is[id]);
		expect(lapsed).toEqual(['start', 'height', 'live-height', 'landing']);
	});

	test('stays when another formula of the piece changes', () => {
		const before = thrownStone();
		before.formulas.push({ ...structuredClone(before.formulas[0]!), id: 'other' });
		const after = structuredClone(before);
		after.formulas[1]!.title = 'Another';
		expect(hashes(after)).toEqual(hashes(before));
	});
});

describe('what a draft may not hold', () => {
	const issuesOf = (document: unknown) => {
		const parsed = parseDocument(document, catalogue);
		return parsed.ok ? [] : parsed.issues.map(({ path, message }) => `${path}: ${message}`);
	};

	test.each<[string, (formula: FormulaStep) => void, RegExp]>([
		[
			'a unit that isn’t in the table',
			(formula) => (formula.inputs[0]!.unit = 'furlongs'),
			/^formulas\.0\.inputs\.0\.unit: There is no unit “furlongs”/
		],
		[
			'a unit of another kind than the output’s quantity',
			(formula) => (formula.output.unit = 's'),
			/^formulas\.0\.output\.unit: .*isn't measured in s/
		],
		[
			'a range without extent',
			(formula) => (formula.inputs[1]!.min = 20),
			/^formulas\.0\.inputs\.1\.min: The lowest value must be below/
		],
		[
			'a first value outside the range',
			(formula) => (formula.inputs[1]!.initial = 21),
			/^formulas\.0\.inputs\.1\.initial: The first value/
		],
		[
			'two inputs of one name',
			(formula) => (formula.inputs[1]!.name = 'speed'),
			/^formulas\.0\.inputs\.1\.name: “speed” is there already/
		],
		[
			'an input called as the output is',
			(formula) => (formula.inputs[1]!.name = 'value'),
			/^formulas\.0\.inputs\.1\.name: “value” is what the formula itself gives/
		],
		[
			'an input called as a constant',
			(formula) => (formula.inputs[1]!.name = 'pi'),
			/^formulas\.0\.inputs\.1\.name: “pi” stands for/
		],
		[
			'a tree with a name that nothing declares',
			(formula) => (formula.tree = { is: 'name', name: 'mass' }),
			/^formulas\.0\.formula: “mass” is neither/
		],
		[
			'a tree of another dimension than its output',
			(formula) => (formula.tree = { is: 'name', name: 'time' }),
			/^formulas\.0\.formula: The formula is a time; its output is in m/
		],
		[
			'a tree that says yes or no',
			(formula) =>
				(formula.tree = {
					is: 'binary',
					sign: '>',
					left: { is: 'name', name: 'time' },
					right: { is: 'number', value: 0 }
				}),
			/^formulas\.0\.formula: .* is a test where a value belongs/
		]
	])('%s', (_what, change, says) => {
		expect(issuesOf(changed(change))).toEqual([expect.stringMatching(says)]);
	});

	test('two formulas with one id', () => {
		const document = thrownStone();
		document.formulas.push(document.formulas[0]!);
		expect(issuesOf(document)).toEqual(['formulas.1.id: The id “thrown” is used twice.']);
	});

	test('a step of a formula that isn’t there, or a setting that the formula hasn’t', () => {
		const gone = thrownStone();
		gone.formulas = [];
		expect(issuesOf(gone)).toContain('steps.0: There is no calculator “formula.thrown”.');
		const extra = thrownStone();
		extra.steps[0]!.settings.mass = { from: 'fixed', value: 1 };
		expect(issuesOf(extra)).toEqual([expect.stringMatching(/has no setting “mass”/)]);
	});

	test('a ring through a formula', () => {
		const document = thrownStone();
		document.steps[0]!.settings.speed = { from: 'reading', step: 'drop', output: 'impactSpeed' };
		expect(issuesOf(document)).toEqual([
			expect.stringMatching(/in a ring: Height of a thrown stone → .+ → Height of a thrown stone/)
		]);
	});

	test('a reading that comes to the formula in another kind of unit', () => {
		const document = thrownStone();
		document.steps[0]!.settings.time = { from: 'fixed', value: 1 };
		document.controls[0]!.unit = 'kg';
		document.steps[0]!.settings.speed = { from: 'control', control: 'time' };
		expect(issuesOf(document)).toEqual([expect.stringMatching(/can’t take a value in kg/)]);
	});
});

describe('a proof is held back by', () => {
	const codes = (document: WidgetDocument) =>
		findings(document, catalogue).map(({ code, says }) => `${code}: ${says}`);

	test('fewer than three check values', () => {
		const few = changed((formula) => formula.checks.pop());
		expect(codes(few)).toEqual([
			expect.stringMatching(/^formula-checks: .* has 2 of the 3 check values it needs/)
		]);
	});

	test('one check value written three times', () => {
		const same = changed((formula) => {
			const [first] = formula.checks;
			formula.checks = [1, 2, 3].map((number) => ({ ...first!, id: `same-${number}` }));
		});
		expect(codes(same)).toEqual([expect.stringMatching(/^formula-checks: .* has 1 of the 3/)]);
	});

	test('a check value that disagrees, told with what comes out', () => {
		const off = changed((formula) => (formula.checks[2]!.published = -5.2));
		expect(codes(off)).toEqual([
			expect.stringMatching(/^formula-check-disagrees: .*-5\.2 \(OpenStax.*it gives -5\.1/)
		]);
	});

	test('a check value at inputs that the formula refuses', () => {
		const out = changed((formula) => (formula.checks[2]!.inputs.time = 30));
		expect(codes(out)[0]).toMatch(/^formula-check-disagrees: /);
	});

	test('a formula that hangs nowhere', () => {
		const document = thrownStone();
		document.formulas.push({ ...document.formulas[0]!, id: 'idle', title: 'Idle' });
		expect(codes(document)).toEqual([
			expect.stringMatching(/^formula-unused: The formula “Idle” isn’t on the bench/)
		]);
	});
});
