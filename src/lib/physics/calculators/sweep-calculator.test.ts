import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { inputsAllOver, valuesOf } from '../../../../tests/support/any-inputs.ts';
import { defineCalculator, type Calculator, type RawInputs } from '../calculator.ts';
import { COSMOLOGY_PARAMETERS } from './cosmology/parameters.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';
import { sweepCalculator } from './sweep-calculator.ts';

/** What a sweep must say at one place, from running the calculator there. */
function pointwise(calculator: Calculator, raw: RawInputs, key: string, place: number) {
	const [head = key, part] = key.split('.');
	const value =
		part === undefined ? place : { ...(raw[head] as object | undefined), [part]: place };
	return runCalculator(calculator, { ...raw, [head]: value });
}

function expectSame(calculator: Calculator, raw: RawInputs, key: string, places: number[]) {
	const swept = sweepCalculator(calculator, raw, key, places);
	places.forEach((place, index) => {
		const alone = pointwise(calculator, raw, key, place);
		const where = `${calculator.id}, ${key} = ${place}`;
		expect(swept.warningsAt(index), where).toEqual(alone.ok ? alone.warnings : []);
		for (const output of Object.keys(calculator.outputs)) {
			const number = swept.columns[output]?.[index];
			const value = alone.ok ? alone.outputs[output]?.value : undefined;
			// Object.is: the very same bits, and no negative zero.
			expect(
				Object.is(number, typeof value === 'number' ? value : NaN),
				`${where}, ${output}`
			).toBe(true);
			const refusal = alone.ok ? alone.withheld?.[output] : alone.refusal;
			expect(swept.refusalAt(index, output), `${where}, ${output}`).toEqual(refusal);
		}
	});
}

/** Calculators that integrate a motion or a history take milliseconds for each place. */
const SLOW = /^(launcher|projectile\.drag|thermal|g21\.(dark_ages|deepest|tk_for_depth))/;

describe('every number, warning and refusal is the one of the calculator at that place', () => {
	const sweeps = [...catalogue.values()].flatMap((calculator) =>
		Object.entries(calculator.inputs)
			.filter(([, { kind }]) => kind === 'number' || kind === 'decimal')
			.map(([key, spec]) => [calculator.id, key, calculator, spec] as const)
	);

	test.each(sweeps)(
		'%s along %s',
		(id, key, calculator, spec) => {
			const odd = fc.constantFrom(-0, 0, NaN, Infinity, -1, 0.5, 1e300);
			const place = fc.oneof(
				{ weight: 4, arbitrary: valuesOf(spec).map(Number) },
				{ weight: 1, arbitrary: odd }
			);
			fc.assert(
				fc.property(
					inputsAllOver(calculator, key),
					fc.array(place, { minLength: 1, maxLength: SLOW.test(id) ? 3 : 12 }),
					(raw, places) => expectSame(calculator, raw, key, places)
				),
				{ seed: 1000, numRuns: SLOW.test(id) ? 3 : 20 }
			);
		},
		60_000
	);

	test.each(Object.entries(COSMOLOGY_PARAMETERS))('cosmo.at_z along cosmology.%s', (part, spec) => {
		const calculator = catalogue.get('cosmo.at_z')!;
		fc.assert(
			fc.property(
				inputsAllOver(calculator),
				fc.array(valuesOf(spec).map(Number), { minLength: 1, maxLength: 8 }),
				(raw, places) => expectSame(calculator, raw, `cosmology.${part}`, places)
			),
			{ seed: 1001, numRuns: 20 }
		);
	});
});

describe('what is wrong with the other inputs, or with the key, holds everywhere', () => {
	const calculator = catalogue.get('cosmo.at_z')!;
	test.each<[RawInputs, string]>([
		[{}, 'z'],
		[{ cosmology: { set: 'None' } }, 'z'],
		[{ cosmology: { set: 'Planck18' } }, 'nowhere'],
		[{ cosmology: { set: 'Planck18' }, z: 1 }, 'cosmology.h0'],
		[{ cosmology: { set: 'Planck18' }, z: 1, other: 1 }, 'z']
	])('%o along %s', (raw, key) => expectSame(calculator, raw, key, [0.5, 1, 2]));

	test('of a group the swept input alone may be given', () => {
		const photon = catalogue.get('photon.convert')!;
		expectSame(photon, { energy_eV: 2 }, 'wavelength_nm', [500, 600]);
		expectSame(photon, { energy_eV: 2 }, 'energy_eV', [1, 2]);
	});

	test('no places, no points', () => {
		const { columns } = sweepCalculator(calculator, { cosmology: { set: 'Planck18' } }, 'z', []);
		expect(columns.age).toHaveLength(0);
	});
});

test('a bug in a calculator is thrown, as it is for one value', () => {
	const { curve: _quick, ...photon } = catalogue.get('photon.convert')!;
	const silent = defineCalculator({ ...photon, compute: () => ({ ok: true, values: {} }) });
	const halfway = defineCalculator({ ...photon, curve: () => ({ columns: {} }) });
	for (const faulty of [silent, halfway])
		expect(() => sweepCalculator(faulty, {}, 'wavelength_nm', [500])).toThrow('gave no value');
});
