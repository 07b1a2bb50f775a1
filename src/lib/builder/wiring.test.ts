import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import type { Calculator } from '../physics/calculator.ts';
import { evaluate } from '../widget/evaluate.ts';
import { suggestRange } from './control-draft.ts';
import {
	freshStep,
	pegsOf,
	settingLabel,
	tagLetter,
	typedNumber,
	withChoice,
	withGroupChoice
} from './wiring.ts';

function shelf(id: string): Calculator {
	const calculator = catalogue.get(id);
	if (!calculator) throw new Error(`no ${id}`);
	return calculator;
}

describe('a calculator on the bench', () => {
	test.each([...catalogue.keys()])('%s gives readings as it comes off the shelf', (id) => {
		const step = freshStep(shelf(id));
		const { steps } = evaluate({ steps: [step], formulas: [], controls: [] }, {}, catalogue);
		expect(steps[step.id]).toMatchObject({ ok: true });
	});

	test('an either-or group is one peg, and taking another input drops the first', () => {
		const observe = shelf('line.observe');
		const step = freshStep(observe);
		const [light, redshift] = pegsOf(step, observe);
		expect(light?.keys).toEqual(['restWavelength_nm', 'restFrequency_Hz', 'restEnergy_eV']);
		expect(redshift?.key).toBe('z');
		const next = withGroupChoice(step, observe, light?.keys ?? [], 'restFrequency_Hz');
		expect(Object.keys(next.settings).sort()).toEqual(['restFrequency_Hz', 'z']);
	});

	test('a choice that changes a setting’s unit sets it to its first value, and its name follows', () => {
		const inverse = shelf('cosmo.inverse');
		const step = freshStep(inverse);
		expect(settingLabel(inverse, step, 'value')).toBe('Age after the Big Bang');
		const typed = {
			...step,
			settings: { ...step.settings, value: { from: 'fixed' as const, value: 13 } }
		};
		expect(withChoice(typed, inverse, 'kind', 'z_from_lookback').settings.value).toMatchObject({
			value: 13
		});
		const distance = withChoice(typed, inverse, 'kind', 'z_from_comoving');
		expect(distance.settings.value).toMatchObject({ value: 0.18 });
		expect(settingLabel(inverse, distance, 'value')).toBe('Distance now (comoving)');
	});
});

describe('a control made of a setting', () => {
	test.each(
		[...catalogue.values()].flatMap((calculator) =>
			Object.entries(calculator.inputs).flatMap(([key, spec]) =>
				spec.kind === 'number' && typeof spec.unit === 'string'
					? [{ name: `${calculator.id} ${key}`, spec, unit: spec.unit }]
					: []
			)
		)
	)('$name: ends, step and start fit together', ({ spec, unit }) => {
		const fields = suggestRange({ what: 'number', ...spec, unit }, unit, spec.initial);
		expect(fields.min).toBeLessThan(fields.max);
		expect(fields.min).toBeGreaterThanOrEqual(spec.min);
		expect(fields.max).toBeLessThanOrEqual(spec.max);
		expect(fields.step).toBeGreaterThan(0);
		expect(fields.initial).toBeGreaterThanOrEqual(fields.min);
		expect(fields.initial).toBeLessThanOrEqual(fields.max);
	});
});

describe('what is typed into a field', () => {
	test.each([
		['180', 180],
		[' 1 420.4 ', 1420.4],
		['−19', -19],
		['.5', 0.5],
		['1e-3', 0.001],
		['', null],
		['A', null],
		['12,5', null],
		['1e999', null]
	])('“%s”', (text, value) => {
		expect(typedNumber(text)).toBe(value);
	});
});

test('tags go on after Z', () => {
	expect([0, 25, 26, 27, 52].map(tagLetter)).toEqual(['A', 'Z', 'AA', 'AB', 'BA']);
});
