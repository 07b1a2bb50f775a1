import { EditorState } from 'prosemirror-state';
import { describe, expect, test } from 'vitest';
import { thrownStone } from '../../../../tests/support/thrown-stone.ts';
import { catalogue } from '../../physics/calculators/index.ts';
import { benchSet } from '../../widget/bench-set.ts';
import type { FormulaStep } from '../../widget/document.ts';
import { formulaRevision } from '../../widget/formula-definition.ts';
import { parseDocument } from '../../widget/parse.ts';
import { toDocument, toManuscript } from '../convert.ts';
import { looseEnds, remove } from '../loosen.ts';
import { fieldsOf, renamedIn } from './formula-fields.ts';
import { withFormula } from './keep-formula.ts';

const printed = { live: () => '8.10 metres', setting: () => '1 second' };

function kept(
	formula: FormulaStep,
	renamed: ReadonlyMap<string, string> = new Map(),
	document = thrownStone()
) {
	const { tr } = EditorState.create({ doc: toManuscript(document) });
	return toDocument(withFormula(tr, formula, renamed).doc);
}

function changed(change: (formula: FormulaStep) => void): FormulaStep {
	const formula = thrownStone().formulas[0]!;
	change(formula);
	return formula;
}

describe('a formula that is kept', () => {
	test('hangs at the end of the rail with its first values', () => {
		const other = { ...thrownStone().formulas[0]!, id: 'other' };
		const document = kept(other);
		const step = document.steps.at(-1);
		expect(document.formulas.map(({ id }) => id)).toEqual(['thrown', 'other']);
		expect(step).toMatchObject({
			calculator: 'formula.other',
			revision: formulaRevision(other),
			settings: { speed: { from: 'fixed', value: 13 }, time: { from: 'fixed', value: 1 } }
		});
		expect(parseDocument(document, catalogue).ok).toBe(true);
	});

	test('takes the place of what it was, and its steps pin what it is now', () => {
		const formula = changed((one) => (one.title = 'Up there'));
		const { formulas, steps } = kept(formula);
		expect(formulas).toEqual([formula]);
		expect(steps[0]).toEqual({ ...thrownStone().steps[0], revision: formulaRevision(formula) });
	});

	test('keeps what hung on an input under its new name', () => {
		const fields = fieldsOf(thrownStone().formulas[0]!);
		fields.inputs[1]!.name = 't';
		const formula = changed((one) => (one.inputs[1]!.name = 't'));
		const { steps } = kept(formula, renamedIn(fields));
		expect(steps[0]?.settings.t).toEqual({ from: 'control', control: 'time' });
		expect(steps[0]?.settings).not.toHaveProperty('time');
	});

	test('converts a fixed value to the input’s new unit, and takes the first one where it can’t', () => {
		const formula = changed(({ inputs }) => {
			Object.assign(inputs[0]!, { unit: 'km/s', max: 1, initial: 0.01 });
			Object.assign(inputs[2]!, { max: 5, initial: 3 });
		});
		const { settings } = kept(formula).steps[0]!;
		expect(settings.speed).toEqual({ from: 'fixed', value: 0.013 });
		expect(settings.gravity).toEqual({ from: 'fixed', value: 3 });
	});

	test('gives a new input its first value, and forgets one that is gone', () => {
		const formula = changed(({ inputs }) => {
			inputs[2]!.name = 'pull';
		});
		const { settings } = kept(formula).steps[0]!;
		expect(Object.keys(settings)).toEqual(['speed', 'time', 'pull']);
		expect(settings.pull).toEqual({ from: 'fixed', value: 9.8 });
	});

	test('hangs again when nothing hung it', () => {
		const document = thrownStone();
		document.steps = [];
		document.claims = [];
		document.blocks = [];
		const { formulas, steps } = kept(document.formulas[0]!, new Map(), document);
		expect([formulas.length, steps.length]).toEqual([1, 1]);
	});
});

test('a formula goes with its plate, its ties told and loosened; another one stays', () => {
	const document = thrownStone();
	document.formulas.push({ ...document.formulas[0]!, id: 'idle' });
	const state = EditorState.create({ doc: toManuscript(document) });
	const set = benchSet(document, catalogue);
	expect(looseEnds(state.doc, { step: 'throw' }, set, printed)).toEqual([
		expect.stringContaining('13 metres per second'),
		expect.stringContaining('8.1 metres'),
		expect.stringContaining('8.10 metres'),
		expect.stringContaining('would go back to a fixed value')
	]);
	const left = toDocument(remove(state.tr, { step: 'throw' }, set, printed).doc);
	expect(left.formulas.map(({ id }) => id)).toEqual(['idle']);
	expect(left.claims.map(({ id }) => id)).toEqual(['landing']);
});
