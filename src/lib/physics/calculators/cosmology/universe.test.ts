import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../../calculator.ts';
import { catalogue } from '../index.ts';
import { GL6 } from '../../numerics/quadrature.ts';
import { runCalculator } from '../run.ts';
import { resolveCosmology, type CosmologyParameters } from './parameters.ts';
import { universeOf } from './universe.ts';

function outputs(id: string, inputs: RawInputs): Record<string, number> {
	const result = runCalculator(catalogue.get(id)!, inputs);
	if (!result.ok) throw new Error(result.refusal.message);
	return Object.fromEntries(
		Object.entries(result.outputs).map(([key, reading]) => [key, reading.value as number])
	);
}
const at = (cosmology: object, z: number) => outputs('cosmo.at_z', { cosmology, z });
const near = (value: number | undefined, wanted: number, relative = 1e-12) =>
	expect(Math.abs((value ?? NaN) / wanted - 1)).toBeLessThan(relative);

// Closed forms: Hogg 1999; Peebles 1993, Principles of Physical Cosmology, §13.
describe('closed forms', () => {
	test.each([0.1, 1, 3, 1000])('Einstein–de Sitter at z = %d', (z) => {
		const is = at({ H0: 50, Om0: 1 }, z);
		near(is.age, ((2 / 3) * is.hubble_time!) / (1 + z) ** 1.5);
		near(is.luminosity, 2 * is.hubble_distance! * (1 + z - Math.sqrt(1 + z)), 1e-11);
		near(is.deceleration_q, 0.5);
	});

	test.each([0.5, 2, 10])('an empty universe at z = %d', (z) => {
		const is = at({ H0: 70, Om0: 0, Ode0: 0 }, z);
		near(is.transverse, is.hubble_distance! * Math.sinh(Math.log1p(z)));
		near(is.age, is.hubble_time! / (1 + z));
	});

	test.each([0.5, 2, 10])('dark energy alone at z = %d', (z) => {
		const is = at({ H0: 70, Om0: 0, Ode0: 1 }, z);
		near(is.comoving_distance, is.hubble_distance! * z);
		expect(is.age).toBeUndefined();
	});

	test('matter and dark energy, flat: the age by an inverse hyperbolic sine', () => {
		const [m, l] = [0.3, 0.7];
		const is = at({ set: 'Simple' }, 0);
		near(is.age, (2 / (3 * Math.sqrt(l))) * Math.asinh(Math.sqrt(l / m)) * is.hubble_time!);
	});

	test('the volume of a nearly flat universe is that of a flat one', () => {
		const curved = at({ H0: 70, Om0: 0.3, Ode0: 0.7 + 1e-12 }, 2).comoving_volume;
		near(curved, at({ H0: 70, Om0: 0.3, Ode0: 0.7 }, 2).comoving_volume!, 1e-10);
	});
});

describe('what a universe adds up to', () => {
	const cosmology = fc.record({
		H0: fc.double({ min: 40, max: 100, noNaN: true }),
		Om0: fc.double({ min: 0.1, max: 0.6, noNaN: true }),
		Tcmb0: fc.constantFrom(0, 2.7255),
		Ode0: fc.double({ min: 0.3, max: 0.9, noNaN: true }),
		w0: fc.double({ min: -1.3, max: -0.7, noNaN: true }),
		wa: fc.double({ min: -0.3, max: 0.3, noNaN: true }),
		m_nu: fc.constantFrom([0], [0, 0, 0.06], [0.1])
	});
	const redshift = fc.double({ min: 0.01, max: 1000, noNaN: true });

	test('shares make one, and age and look-back make the age now', () => {
		fc.assert(
			fc.property(cosmology, redshift, (set, z) => {
				const then = at(set, z);
				near(then.Om! + then.Ode! + then.Ogamma! + then.Onu! + then.Ok!, 1, 1e-11);
				near(then.age! + then.lookback!, at(set, 0).age!, 1e-9);
			}),
			{ seed: 13787, numRuns: 150 }
		);
	});

	test('the age falls and the distance grows with redshift', () => {
		fc.assert(
			fc.property(
				cosmology,
				redshift,
				fc.double({ min: 1e-6, max: 10, noNaN: true }),
				(set, z, more) => {
					const nearer = at(set, z);
					const farther = at(set, z * (1 + more));
					expect(farther.age!).toBeLessThan(nearer.age!);
					expect(farther.comoving_distance!).toBeGreaterThan(nearer.comoving_distance!);
				}
			),
			{ seed: 1420, numRuns: 150 }
		);
	});

	test.each([
		['z_from_age', 'age'],
		['z_from_lookback', 'lookback'],
		['z_from_comoving', 'comoving_distance'],
		['z_from_luminosity', 'luminosity']
	])('%s undoes %s', (kind, output) => {
		fc.assert(
			fc.property(cosmology, fc.double({ min: 0.01, max: 100, noNaN: true }), (set, z) => {
				const value = at(set, z)[output]!;
				const back = outputs('cosmo.inverse', { cosmology: set, kind, value });
				// A long look-back says little about a high redshift: allow what the last bit of it can do.
				near(back.z, z, kind === 'z_from_lookback' ? 1e-9 : 1e-11);
				near(back.stretch, 1 + back.z!);
			}),
			{ seed: 21, numRuns: 100 }
		);
	});

	test('an age in the future has a redshift below 0, and says so', () => {
		const result = runCalculator(catalogue.get('cosmo.inverse')!, {
			cosmology: { set: 'Planck18' },
			kind: 'z_from_age',
			value: 20
		});
		expect(result).toMatchObject({
			ok: true,
			warnings: [{ code: 'future' }],
			validity: 'approximate'
		});
		expect(result.ok && at({ set: 'Planck18' }, result.outputs.z!.value as number).age).toBeCloseTo(
			20,
			10
		);
	});

	test('no time and no distance is redshift 0', () => {
		for (const kind of ['z_from_lookback', 'z_from_comoving', 'z_from_luminosity']) {
			expect(outputs('cosmo.inverse', { cosmology: { set: 'Planck18' }, kind, value: 0 }).z).toBe(
				0
			);
		}
	});

	test('the time between two redshifts doesn’t ask which comes first', () => {
		const one = outputs('cosmo.age_diff', {
			cosmology: { set: 'Planck18' },
			z1: 6,
			z2: 10
		}).duration;
		expect(
			outputs('cosmo.age_diff', { cosmology: { set: 'Planck18' }, z1: 10, z2: 6 }).duration
		).toBeCloseTo(one!, 10);
		expect(
			outputs('cosmo.age_diff', { cosmology: { set: 'Planck18' }, z1: 6, z2: 6 }).duration
		).toBe(0);
	});
});

describe('the way a set is given', () => {
	test('a set is the same as its parameters written out', () => {
		const written = { H0: 67.66, Om0: 0.30966, Tcmb0: 2.7255, Neff: 3.046, m_nu: [0, 0, 0.06] };
		expect(at(written, 2)).toEqual(at({ set: 'Planck18' }, 2));
	});

	test('one parameter may differ: a faster pace makes a younger universe', () => {
		// Flat, with everything else as in the set.
		expect(at({ set: 'Planck18', H0: 73 }, 0).age).toBeCloseTo(12.78, 2);
	});
});

describe('uncertainty', () => {
	const reading = (cosmology: object, z: number, output: string) => {
		const result = runCalculator(catalogue.get('cosmo.at_z')!, { cosmology, z });
		return result.ok ? result.outputs[output]?.uncertainty : undefined;
	};

	// Planck 2018 VI, table 2, last column: 13.787 ± 0.020 Gyr, 67.66 ± 0.42 km/s/Mpc.
	test('the age now has the published one, and only with the published set', () => {
		expect(reading({ set: 'Planck18' }, 0, 'age')).toBe(0.02);
		expect(reading({ set: 'Planck18', H0: 67.66 }, 0, 'age')).toBe(0.02);
		expect(reading({ set: 'Planck18', H0: 73 }, 0, 'age')).toBe('not-available');
		expect(reading({ set: 'Planck18' }, 1, 'age')).toBe('not-available');
		expect(reading({ set: 'Simple' }, 0, 'age')).toBe('not-available');
	});

	test('what H₀ alone decides has its uncertainty', () => {
		expect(reading({ set: 'Planck18' }, 0, 'H')).toBe(0.42);
		expect(reading({ set: 'Planck18' }, 3, 'hubble_time')).toBeCloseTo((14.4516 * 0.42) / 67.66, 4);
		expect(reading({ set: 'Planck18' }, 3, 'comoving_distance')).toBe('not-available');
	});
});

describe('warnings', () => {
	test.each([
		[{ set: 'Planck18' }, 1, [], 'ok'],
		[{ set: 'Planck18' }, -0.2, ['future'], 'approximate'],
		[{ set: 'Planck18' }, 2000, ['before-last-scattering'], 'approximate'],
		[{ set: 'Planck18' }, 2e8, ['before-last-scattering', 'first-seconds'], 'outside'],
		[{ set: 'Planck18', m_nu: [0.1] }, 1, ['heavy-neutrinos'], 'approximate'],
		[{ set: 'Planck18', w0: -1.1 }, 1, ['phantom'], 'approximate'],
		[{ H0: 70, Om0: 0.3, Ode0: 0.6 }, 1, ['strong-curvature'], 'approximate']
	])('%o at z = %d: %o', (cosmology, z, codes, validity) => {
		const result = runCalculator(catalogue.get('cosmo.at_z')!, { cosmology, z });
		expect(result.ok && result.warnings.map((warning) => warning.code)).toEqual(codes);
		expect(result.ok && result.validity).toBe(validity);
	});
});

describe('what is kept between two questions', () => {
	const resolved = resolveCosmology({ set: 'Planck18', Ode0: 0.69 });
	if (!resolved.ok) throw new Error(resolved.refusal.message);
	const parameters: CosmologyParameters = resolved.value;

	test('is found again by its parameters', () => {
		expect(universeOf({ ...parameters, m_nu: [...parameters.m_nu] })).toBe(universeOf(parameters));
	});

	test.each(Object.keys(parameters) as (keyof CosmologyParameters)[])(
		'another %s is another universe',
		(key) => {
			const other = key === 'm_nu' ? [0, 0, 0.07] : key === 'set' ? 'Planck18' : 0.9;
			const moved = universeOf({ ...parameters, [key]: other });
			expect(moved).not.toBe(universeOf(parameters));
			expect(moved.parameters[key]).toEqual(other);
		}
	);

	test('is forgotten when many others came, and then worked anew to the same bits', () => {
		const first = at({ H0: 70, Om0: 0.3 }, 1.7);
		for (let H0 = 50; H0 < 150; H0 += 1) at({ H0: H0 + 0.5, Om0: 0.3 }, 1);
		expect(at({ H0: 70, Om0: 0.3 }, 1.7)).toEqual(first);
	});
});

// The time between two redshifts against Gauss–Legendre in 2000 pieces; the last two linger near a standstill.
test.each([
	[{ set: 'Planck18' }, 0.3, 20],
	[{ set: 'Planck18' }, 9, 0.01],
	[{ H0: 70, Om0: 0.3, Tcmb0: 2.7255, w0: -1.2, wa: 0.4 }, 0.05, 1000],
	[{ set: 'Simple', Om0: 0.5123759, Ode0: 1.95729597 }, 0.19, 10],
	[{ set: 'Simple', Om0: 0.15948762, Ode0: 1.45545432 }, 1.7, 1e9]
])('%o between z = %d and %d, piece by piece', (cosmology, z1, z2) => {
	const resolved = resolveCosmology(cosmology);
	if (!resolved.ok) throw new Error(resolved.refusal.message);
	const universe = universeOf(resolved.value);
	const [from, to] = [Math.log1p(z1), Math.log1p(z2)];
	const width = (to - from) / 2000;
	let time = 0;
	for (let piece = 0; piece < 2000; piece += 1) {
		for (const { at: share, weight } of GL6)
			time += (weight * width) / Math.sqrt(universe.E2(Math.exp(from + width * (piece + share))));
	}
	near(
		outputs('cosmo.age_diff', { cosmology, z1, z2 }).duration,
		Math.abs(time) * universe.hubbleTimeGyr * 1000,
		1e-12
	);
});
