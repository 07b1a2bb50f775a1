import { describe, expect, test } from 'vitest';
import type { RawInputs, Reading, Result } from '../calculator.ts';
import { catalogue } from '../calculators/index.ts';
import { constants, type CosmologySetName } from '../constants/index.ts';
import { runCalculator } from '../calculators/run.ts';
import { runWithUncertainty, type GivenUncertainties } from './run-with-uncertainty.ts';

const run = (id: string, inputs: RawInputs, given?: GivenUncertainties): Result =>
	runWithUncertainty(catalogue.get(id)!, inputs, given);

function reading(result: Result, key: string): Reading {
	if (!result.ok) throw new Error(result.refusal.message);
	return result.outputs[key]!;
}

const planck = { set: 'Planck18' };
const byHand = { H0: 67.66, Om0: 0.30966, Tcmb0: 2.7255, Neff: 3.046, m_nu: [0, 0, 0.06] };
const H0_AND_OM0 = { 'cosmology.H0': 0.42, 'cosmology.Om0': 0.0056 };

describe('the age of the Universe', () => {
	// Planck 2018 VI, table 2, last column: 13.787 ± 0.020 Gyr.
	test('keeps its published uncertainty in a set', () => {
		const age = reading(run('cosmo.at_z', { cosmology: planck, z: 0 }), 'age');
		expect(age.uncertainty).toBe(0.02);
		expect(age.uncertaintyNote).toMatch(/published/);
	});

	// H₀ and Ωₘ of the fit are tied to each other. Taken as independent they would give 0.11 Gyr.
	test('is never as uncertain as independent parameters would make it', () => {
		const independent = run(
			'cosmo.at_z',
			{ cosmology: byHand, z: 0 },
			{ uncertainties: H0_AND_OM0, correlations: [['cosmology.H0', 'cosmology.Om0', 0]] }
		);
		expect(reading(independent, 'age').uncertainty).toBeCloseTo(0.11, 2);

		for (const set of Object.keys(constants.cosmologies)) {
			for (const z of [0, 1e-9, 1e-3]) {
				const { uncertainty } = reading(run('cosmo.at_z', { cosmology: { set }, z }), 'age');
				if (typeof uncertainty === 'number') expect(uncertainty).toBeLessThan(0.06);
				else expect(uncertainty).toBe('not-available');
			}
		}
		expect(
			run('cosmo.at_z', { cosmology: byHand, z: 0 }, { uncertainties: H0_AND_OM0 })
		).toMatchObject({ ok: false, refusal: { code: 'correlation-missing' } });
	});

	test('carried from the fit with its correlation comes near the published one', () => {
		const tied = run(
			'cosmo.at_z',
			{ cosmology: byHand, z: 0 },
			{ uncertainties: H0_AND_OM0, correlations: [['cosmology.H0', 'cosmology.Om0', -0.98]] }
		);
		const u = reading(tied, 'age').uncertainty;
		expect(u).toBeGreaterThan(0.015);
		expect(u).toBeLessThan(0.025);
		// And a hair from now, where nothing is published, the set gives the same.
		const soon = reading(run('cosmo.at_z', { cosmology: planck, z: 1e-9 }), 'age');
		expect(soon.uncertainty).toBeCloseTo(u as number, 6);
		expect(soon.uncertaintyNote).toMatch(/from memory/);
	});

	test.each([
		['Planck15', /move together/],
		['WMAP9', /move together/],
		['Simple', /convention/]
	])('in %s at z = 1 it is not available, and it says why', (set, why) => {
		const age = reading(run('cosmo.at_z', { cosmology: { set }, z: 1 }), 'age');
		expect(age.uncertainty).toBe('not-available');
		expect(age.uncertaintyNote).toMatch(why);
	});

	test('with parameters set by hand it is not available, and it says why', () => {
		const age = reading(run('cosmo.at_z', { cosmology: { ...planck, H0: 73 }, z: 0 }), 'age');
		expect(age).toMatchObject({
			uncertainty: 'not-available',
			uncertaintyNote: expect.stringMatching(/by hand/)
		});
	});

	test('the published uncertainty and that of the redshift add as squares', () => {
		const age = reading(
			run('cosmo.at_z', { cosmology: planck, z: 0 }, { uncertainties: { z: 0.001 } }),
			'age'
		);
		// dt/dz = −1/H₀ now: 14.4516 Gyr for each unit of redshift.
		expect(age.uncertainty).toBeCloseTo(Math.hypot(0.02, 14.4516 * 0.001), 4);
	});
});

describe('what each output is limited by', () => {
	test('choices of the model carry nothing; the rest carries the fit', () => {
		const result = run('cosmo.at_z', { cosmology: planck, z: 1 });
		expect(reading(result, 'Ok0').uncertainty).toBe('not-available');
		expect(reading(result, 'scale_factor').uncertainty).toBe('exact');
		expect(reading(result, 'Om').uncertainty).toBeGreaterThan(0);
		// 0.0006 K at 1 + z = 2.
		expect(reading(result, 'Tcmb').uncertainty).toBeCloseTo(0.0012, 9);
	});

	test('values are those of the plain run', () => {
		for (const inputs of [
			{ cosmology: planck, z: 3 },
			{ cosmology: { set: 'Simple' as CosmologySetName }, z: 0 }
		]) {
			const plain = runCalculator(catalogue.get('cosmo.at_z')!, inputs);
			const carried = run('cosmo.at_z', inputs, { uncertainties: { z: 0.01 } });
			if (!plain.ok || !carried.ok) throw new Error('both run');
			for (const [key, { value }] of Object.entries(plain.outputs)) {
				expect(carried.outputs[key]?.value).toBe(value);
			}
			expect(carried.warnings).toEqual(plain.warnings);
		}
	});

	// mgh with h = 5 ± 0.1 m: m g u(h), g = 9.80665 m/s² (CGPM 1901); the speed √(2gh) by half the relative uncertainty.
	test('inputs alone, where the formula holds no measured constant', () => {
		const result = run(
			'energy.drop',
			{ mass_kg: 10, height_m: 5 },
			{ uncertainties: { height_m: 0.1 } }
		);
		expect(reading(result, 'energy').uncertainty).toBeCloseTo(10 * 9.80665 * 0.1, 9);
		expect(reading(result, 'impactSpeed').uncertainty).toBeCloseTo(
			(Math.sqrt(2 * 9.80665 * 5) * 0.1) / 10,
			3
		);
	});

	test('a measured constant and the inputs add as squares', () => {
		const inputs = { mass_kg: 5.97e24, radius_m: 6.371e6 };
		const alone = reading(run('gravity.body', inputs), 'surfaceGravity').uncertainty as number;
		const both = reading(
			run('gravity.body', inputs, { uncertainties: { mass_kg: 5.97e20 } }),
			'surfaceGravity'
		);
		const share = 1e-4 * (both.value as number);
		expect(both.uncertainty).toBeCloseTo(Math.hypot(alone, share), 9);
	});

	test('a model of unknown worth stays not available, with a sentence', () => {
		const result = run('thermal.tla1', { cosmology: planck, z: 17.2 });
		if (!result.ok) throw new Error(result.refusal.message);
		for (const output of Object.values(result.outputs)) {
			expect(output.uncertainty).toBe('not-available');
			expect(output.uncertaintyNote).toMatch(/\.$/);
		}
	});

	test('a lopsided reading is drawn, the same each time, and says so', () => {
		const far = () =>
			run('stars.magnitude', { parallax_mas: 10 }, { uncertainties: { parallax_mas: 2.5 } });
		const distance = reading(far(), 'distance');
		expect(distance).toEqual(reading(far(), 'distance'));
		expect(distance.uncertainty).toBe('not-available'); // 1/p has tails without end
		const flux = reading(
			run('light.flux', { L_W: 1e26, d_m: 1e12 }, { uncertainties: { d_m: 1.5e11 } }),
			'flux'
		);
		expect(flux.drawn?.draws).toBe(10_000);
		expect(flux.drawn!.high - flux.drawn!.median).toBeGreaterThan(
			flux.drawn!.median - flux.drawn!.low
		);
		expect(flux.uncertaintyNote).toMatch(/10000 draws/);
	});
});

describe('uncertainties that don’t belong are refused with a mend', () => {
	const at = { cosmology: planck, z: 1 };
	test.each([
		[at, { zz: 1 }, undefined, 'unknown-input'],
		[at, { z: -1 }, undefined, 'uncertainty-broken'],
		[at, { z: '1' }, undefined, 'uncertainty-broken'],
		[at, { z: NaN }, undefined, 'uncertainty-broken'],
		[at, { cosmology: 1 }, undefined, 'unknown-parameter'],
		[at, { 'cosmology.toString': 1 }, undefined, 'unknown-parameter'],
		[at, { 'cosmology.H0': 1 }, undefined, 'set-has-its-own'],
		[
			{ cosmology: byHand, z: 1 },
			{ 'cosmology.Ode0': 0.1 },
			undefined,
			'uncertainty-without-value'
		],
		[at, { z: 0.1 }, ['z'], 'correlation-broken'],
		[at, { z: 0.1 }, [['z', 'z', 1]], 'correlation-broken'],
		[
			{ cosmology: byHand, z: 1 },
			{ ...H0_AND_OM0 },
			[['cosmology.H0', 'cosmology.Om0', 2]],
			'correlation-broken'
		],
		[
			{ cosmology: byHand, z: 1 },
			{ ...H0_AND_OM0, z: 0.1 },
			[
				['cosmology.H0', 'cosmology.Om0', -0.98],
				['z', 'cosmology.Om0', 0.9],
				['z', 'cosmology.H0', 0.9]
			],
			'correlations-impossible'
		]
	])('%# %o', (inputs, uncertainties, correlations, code) => {
		expect(
			run('cosmo.at_z', inputs, { uncertainties, ...(correlations ? { correlations } : {}) })
		).toMatchObject({ ok: false, refusal: { code, message: expect.stringMatching(/[.?]$/) } });
	});

	test('a count and a choice carry none', () => {
		expect(
			run(
				'cosmo.inverse',
				{ cosmology: planck, kind: 'z_from_age', value: 1 },
				{ uncertainties: { kind: 1 } }
			)
		).toMatchObject({ ok: false, refusal: { code: 'no-spread' } });
	});
});
