import { catalogue } from '$lib/physics/calculators/index.ts';
import { runCalculator } from '$lib/physics/calculators/run.ts';
import { describe, expect, test } from 'vitest';
import { firstFields, readFields, readNumber } from './fields.ts';

describe('readNumber', () => {
	test.each([
		['180', 180],
		['−0.5', -0.5],
		['1 420 405 751.768', 1420405751.768],
		['1.5e9', 1.5e9],
		['.5', 0.5]
	])('%s is %d', (typed, value) => {
		expect(readNumber(typed)).toBe(value);
	});

	test.each(['', 'NaN', 'Infinity', '1e999', '0x10', '12 kg', '1,5', '--1'])(
		'“%s” is no number',
		(typed) => {
			expect(readNumber(typed)).toBeNull();
		}
	);
});

describe('the fields of every calculator', () => {
	test.each([...catalogue.values()].map((calculator) => [calculator.id, calculator] as const))(
		'%s gives a reading with its first values',
		(_id, calculator) => {
			const { inputs, problems } = readFields(
				calculator,
				firstFields(calculator, new URLSearchParams())
			);
			expect(problems).toEqual({});
			expect(runCalculator(calculator, inputs)).toMatchObject({ ok: true });
		}
	);
});

test('settings in the address take the place of first values', () => {
	const calculator = catalogue.get('line.observe');
	if (!calculator) throw new Error('line.observe is gone.');
	const fields = firstFields(
		calculator,
		new URLSearchParams('restFrequency_Hz=1420405751.768&z=19.85')
	);
	expect(readFields(calculator, fields).inputs).toEqual({
		restFrequency_Hz: 1420405751.768,
		z: 19.85
	});
});

test('one parameter of a set can be overridden from the address', () => {
	const calculator = catalogue.get('cosmo.at_z');
	if (!calculator) throw new Error('cosmo.at_z is gone.');
	const query = new URLSearchParams('cosmology.set=Planck15&cosmology.H0=70&z=1');
	expect(readFields(calculator, firstFields(calculator, query)).inputs).toEqual({
		cosmology: { set: 'Planck15', H0: 70 },
		z: 1
	});
});
