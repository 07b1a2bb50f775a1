import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import type { Control } from '../widget/control.ts';
import { checkDraft } from './control-check.ts';
import { asKind, draftOf, freshDraft, inUnit, kindsFor } from './control-draft.ts';
import { movedByControl, movedBySetting, type Moved } from './control-moves.ts';
import { freshStep } from './wiring.ts';

const settings = [...catalogue.values()].flatMap((calculator) => {
	const step = freshStep(calculator);
	return Object.entries(calculator.inputs).flatMap(([key, spec]) => {
		const moved = movedBySetting(step, calculator, key);
		const first = spec.kind === 'cosmology' ? spec.initial.set : spec.initial;
		return moved ? [{ name: `${calculator.id} ${key}`, moved, first }] : [];
	});
});

const metres: Moved = { what: 'number', unit: 'm', min: 0, max: 1000 };

describe('a control made of a setting', () => {
	test.each(settings)('$name: every kind that suits can be kept as it is offered', (setting) => {
		const { moved, first } = setting;
		for (const kind of kindsFor(moved)) {
			if (kind === 'toggle' && moved.what === 'words' && moved.options.length > 2) continue;
			const unit = moved.what === 'number' ? moved.unit : '';
			const value = typeof first === 'number' || typeof first === 'string' ? first : 1;
			const [start] = kindsFor(moved);
			const draft = asKind(freshDraft(start ?? kind, 'It', moved, unit, value), kind, moved);
			const checked = checkDraft(draft, moved);
			if (kind === 'log-slider' && !checked.ok && Number(value) <= 0) continue;
			expect(checked, `${kind} ${JSON.stringify(draft)}`).toMatchObject({ ok: true });
		}
	});

	test('a choice that a unit hangs on is moved by no control', () => {
		const inverse = catalogue.get('cosmo.inverse');
		if (!inverse) throw new Error('cosmo.inverse is gone');
		expect(movedBySetting(freshStep(inverse), inverse, 'kind')).toBeNull();
	});

	test('a range past the calculator is refused, with the nearest that would do', () => {
		const draft = { ...freshDraft('slider', 'Height', metres, 'm', 10), max: '5000', step: '10' };
		const checked = checkDraft(draft, metres);
		if (checked.ok) throw new Error('it was taken');
		expect(checked.says).toBe('The calculator takes 0 to 1000 here.');
		const mended = { ...draft, ...checked.nearest?.fields };
		expect(checkDraft(mended, metres)).toMatchObject({ ok: true });
	});

	test('what hangs on a control bounds it in its own unit', () => {
		const draft = inUnit(freshDraft('slider', 'Height', metres, 'm', 10), 'km');
		expect(checkDraft({ ...draft, max: '1.2', step: '0.1', min: '0' }, metres)).toMatchObject({
			ok: false,
			says: 'The calculator takes 0 to 1 here.'
		});
	});
});

describe('another kind', () => {
	const slider: Control = {
		id: 'control-1',
		kind: 'slider',
		label: 'Height',
		unit: 'm',
		min: 0,
		max: 100,
		step: 5,
		initial: 20
	};

	test('keeps what it can use, and there and back loses nothing', () => {
		const choice = asKind(draftOf(slider), 'choice', metres);
		expect(checkDraft(choice, metres)).toMatchObject({
			ok: true,
			fields: {
				kind: 'choice',
				label: 'Height',
				options: [{ value: 0 }, { value: 20 }, { value: 100 }]
			}
		});
		expect(checkDraft(asKind(choice, 'slider', metres), metres)).toEqual({
			ok: true,
			fields: { kind: 'slider', label: 'Height', unit: 'm', min: 0, max: 100, step: 5, initial: 20 }
		});
	});

	test('a slider by factors leaves nought', () => {
		const checked = checkDraft(asKind(draftOf(slider), 'log-slider', metres), metres);
		expect(checked).toMatchObject({ ok: true, fields: { min: 0.2, initial: 20 } });
	});

	test('a toggle keeps the first two options', () => {
		const toggle = asKind(draftOf(slider), 'toggle', metres);
		expect(checkDraft(toggle, metres)).toMatchObject({
			ok: true,
			fields: { options: [{ value: 0 }, { value: 20 }] }
		});
	});

	test('with nothing hung on it, any range will do', () => {
		expect(movedByControl(slider, { steps: [] }, catalogue)).toBeNull();
		expect(checkDraft(draftOf(slider), null)).toMatchObject({ ok: true });
	});
});
