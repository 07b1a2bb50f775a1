/** What physics says of calculators together: inverses undo, one quantity grows with another, limits meet closed forms. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../calculator.ts';
import { constants } from '../constants/index.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';

const { c, G, h, k } = constants.physical;

function numbers(id: string, inputs: RawInputs): Record<string, number> {
	const result = runCalculator(catalogue.get(id)!, inputs);
	if (!result.ok) throw new Error(`${id}: ${result.refusal.message}`);
	return Object.fromEntries(
		Object.entries(result.outputs).map(([key, { value }]) => [key, value as number])
	);
}

function near(value: number | undefined, wanted: number, relative: number) {
	const off = Math.abs((value ?? NaN) - wanted);
	expect(off).toBeLessThanOrEqual(relative * Math.abs(wanted));
}

/** Even in the logarithm. */
const size = (low: number, high: number) =>
	fc.double({ min: Math.log(low), max: Math.log(high), noNaN: true }).map(Math.exp);
const share = (low: number, high: number) => fc.double({ min: low, max: high, noNaN: true });

const cosmology = fc.record({
	H0: share(40, 100),
	Om0: share(0.1, 0.6),
	Ode0: share(0.3, 0.95),
	Tcmb0: fc.constantFrom(0, 2.7255),
	m_nu: fc.constantFrom([0], [0, 0, 0.06])
});

describe('inverses undo', () => {
	test.each<[string, fc.Arbitrary<number>, (x: number) => number, number]>([
		[
			'redshift and frequency of the 21 cm line',
			size(0.01, 200),
			(z) =>
				numbers('g21.z_from_frequency', {
					frequency_MHz: numbers('g21.frequency_from_z', { z }).frequency
				}).z!,
			1e-12
		],
		[
			'luminosity and flux at a distance',
			size(1e20, 1e40),
			(L_W) => {
				const d_m = 1e18;
				const { flux } = numbers('light.flux', { L_W, d_m });
				return flux! * 4 * Math.PI * d_m ** 2;
			},
			1e-13
		],
		[
			'distance told as a time and back',
			size(1e-3, 1e9),
			(value) =>
				numbers('light.travel', { value, unit: 'pc' }).time! *
				(c.value / constants.astronomical.pc.value),
			1e-13
		],
		[
			'joules to kilowatt-hours and back',
			size(1e-20, 1e40),
			(value) => {
				const kWh = numbers('energy.convert', { value, from: 'J', to: 'kWh' }).value;
				return numbers('energy.convert', { value: kWh, from: 'kWh', to: 'J' }).value!;
			},
			1e-15
		],
		[
			'the half-life that a decayed share tells',
			share(0.01, 10),
			(halfLives) => {
				const T_half = 1000;
				const { remaining } = numbers('decay.halflife', {
					halflife: T_half,
					t: halfLives * T_half
				});
				return -Math.log2(remaining!);
			},
			1e-12
		]
	])('%s', (_what, arbitrary, thereAndBack, relative) => {
		fc.assert(
			fc.property(arbitrary, (x) => {
				near(thereAndBack(x), x, relative);
			}),
			{ seed: 1958, numRuns: 200 }
		);
	});
});

describe('distances of an expanding universe', () => {
	test('luminosity distance is (1+z)² times angular-diameter distance, and a magnitude is its logarithm', () => {
		// Etherington 1933, Phil. Mag. 15, 761: true in any of these universes.
		fc.assert(
			fc.property(cosmology, size(1e-3, 1000), (set, z) => {
				const is = numbers('cosmo.at_z', { cosmology: set, z });
				near(is.luminosity, (1 + z) ** 2 * is.angular!, 1e-14);
				near(is.transverse, (1 + z) * is.angular!, 1e-14);
				near(is.distmod, 5 * Math.log10(is.luminosity!) + 25, 1e-14);
				near(is.recession_now, is.comoving_distance! * set.H0, 1e-13);
			}),
			{ seed: 1933, numRuns: 200 }
		);
	});

	test('near by, all distances are Hubble’s: cz/H₀', () => {
		fc.assert(
			fc.property(cosmology, size(1e-9, 1e-6), (set, z) => {
				const is = numbers('cosmo.at_z', { cosmology: set, z });
				const hubble = (c.value / 1000 / set.H0) * z;
				for (const key of ['comoving_distance', 'luminosity', 'angular', 'transverse']) {
					near(is[key], hubble, 3 * z + 1e-14);
				}
			}),
			{ seed: 1929, numRuns: 100 }
		);
	});

	test('light and matter alone: the particle horizon in closed form', () => {
		// ∫ da/√(Ωₘa + Ωᵣ) = 2(√(Ωₘa + Ωᵣ) − √Ωᵣ)/Ωₘ, Peebles 1993, Principles of Physical Cosmology, §6 (from memory).
		fc.assert(
			fc.property(share(40, 100), size(0.001, 10), size(0.001, 1e4), (H0, Tcmb0, z) => {
				const first = numbers('cosmo.at_z', { cosmology: { H0, Om0: 0.9, Tcmb0 }, z: 0 });
				const light = first.Ogamma0! + first.Onu0!;
				const Om0 = 1 - light;
				const is = numbers('cosmo.at_z', { cosmology: { H0, Om0, Ode0: 0, Tcmb0 }, z });
				const inside = Math.sqrt(Om0 / (1 + z) + light);
				// Rationalised, since the two roots nearly cancel early on.
				const wanted = 2 / (1 + z) / (inside + Math.sqrt(light));
				near(is.particle_horizon, wanted * is.hubble_distance!, 1e-11);
			}),
			{ seed: 1965, numRuns: 200 }
		);
	});

	test('between near redshifts as much time passes as the rate there says', () => {
		fc.assert(
			fc.property(cosmology, size(0.01, 1000), size(1e-12, 1e-7), (set, z1, part) => {
				const z2 = z1 + (1 + z1) * part;
				const step = (z2 - z1) / (1 + z1);
				const { H } = numbers('cosmo.at_z', { cosmology: set, z: z1 });
				const { hubble_time: hubbleTime } = numbers('cosmo.at_z', { cosmology: set, z: 0 });
				const { duration } = numbers('cosmo.age_diff', { cosmology: set, z1, z2 });
				near(duration, 1000 * hubbleTime! * (set.H0 / H!) * step, 3 * step + 1e-13);
			}),
			{ seed: 1978, numRuns: 200 }
		);
	});

	test('no answer depends on what was asked before', () => {
		const set = { H0: 67.123, Om0: 0.31, Tcmb0: 2.7255, m_nu: [0, 0, 0.06] };
		const forwards = [0.01, 0.5, 3, 20, 1100].map((z) =>
			numbers('cosmo.at_z', { cosmology: set, z })
		);
		// Another universe with the same numbers, asked the other way round.
		const backwards = [1100, 20, 3, 0.5, 0.01].map((z) =>
			numbers('cosmo.at_z', { cosmology: { ...set, Ob0: 0.05 }, z })
		);
		expect(backwards.reverse()).toEqual(forwards);
	});
});

describe('one grows with the other', () => {
	interface Growth {
		what: string;
		calculator: string;
		output: string;
		input: fc.Arbitrary<number>;
		inputs(x: number): RawInputs;
		way: 'up' | 'down';
	}
	const growths: Growth[] = [
		{
			what: 'glow at one wavelength with temperature',
			calculator: 'blackbody.planck',
			output: 'B_lambda',
			input: size(300, 1e6),
			inputs: (T_K) => ({ T_K, wavelength_nm: 550 }),
			way: 'up'
		},
		{
			what: 'peak wavelength with temperature (hotter is bluer)',
			calculator: 'blackbody.total',
			output: 'peakWavelength',
			input: size(1, 1e9),
			inputs: (T_K) => ({ T_K }),
			way: 'down'
		},
		{
			what: 'escape speed with mass',
			calculator: 'gravity.body',
			output: 'escapeSpeed',
			input: size(1e20, 1e27),
			inputs: (mass_kg) => ({ mass_kg, radius_m: 6e6 }),
			way: 'up'
		},
		{
			what: 'pull with distance from the centre',
			calculator: 'gravity.body',
			output: 'surfaceGravity',
			input: size(1e6, 1e12),
			inputs: (radius_m) => ({ mass_kg: 6e24, radius_m }),
			way: 'down'
		},
		{
			what: 'Lorentz factor with speed',
			calculator: 'sr.kinematics',
			output: 'gamma_minus_1',
			input: share(0.001, 0.999_999),
			inputs: (beta) => ({ beta }),
			way: 'up'
		},
		{
			what: 'shift with speed',
			calculator: 'doppler.z_from_beta',
			output: 'z',
			input: share(-0.999, 0.999),
			inputs: (beta) => ({ beta }),
			way: 'up'
		},
		{
			what: 'period with the size of an orbit',
			calculator: 'orbit.kepler',
			output: 'period',
			input: size(1e8, 1e15),
			inputs: (a_m) => ({ mass_kg: 2e30, a_m, e: 0 }),
			way: 'up'
		},
		{
			what: 'swing time with the width of the swing',
			calculator: 'mech.pendulum',
			output: 'exact',
			input: share(1, 179),
			inputs: (theta0_deg) => ({ L_m: 1, theta0_deg }),
			way: 'up'
		},
		{
			what: 'range with drag',
			calculator: 'projectile.drag',
			output: 'range',
			input: share(0.05, 2),
			inputs: (Cd) => ({ v0_ms: 40, angle_deg: 45, mass_kg: 1, diameter_m: 0.1, Cd }),
			way: 'down'
		},
		{
			what: 'look-back time with redshift',
			calculator: 'cosmo.at_z',
			output: 'lookback',
			input: size(0.001, 1e4),
			inputs: (z) => ({ cosmology: { set: 'Planck18' }, z }),
			way: 'up'
		},
		{
			what: 'particle horizon with redshift',
			calculator: 'cosmo.at_z',
			output: 'particle_horizon',
			input: size(0.001, 1e4),
			inputs: (z) => ({ cosmology: { set: 'Planck18' }, z }),
			way: 'down'
		}
	];

	test.each(growths.map((growth) => [growth.what, growth] as const))('%s', (_what, growth) => {
		const { calculator, output, input, inputs, way } = growth;
		fc.assert(
			fc.property(input, input, (a, b) => {
				fc.pre(Math.abs(a - b) > 1e-6 * Math.abs(b));
				const [less, more] = [Math.min(a, b), Math.max(a, b)];
				const low = numbers(calculator, inputs(less))[output]!;
				const high = numbers(calculator, inputs(more))[output]!;
				if (way === 'up') expect(high).toBeGreaterThan(low);
				else expect(high).toBeLessThan(low);
			}),
			{ seed: 1687, numRuns: 60 }
		);
	});
});

describe('limits meet closed forms', () => {
	test('slow bodies have Newton’s energy', () => {
		fc.assert(
			fc.property(size(1e-9, 1e-4), size(1e-3, 1e6), (beta, mass_kg) => {
				const { kineticEnergy } = numbers('sr.kinematics', { beta, mass_kg });
				near(kineticEnergy, (mass_kg * (beta * c.value) ** 2) / 2, beta ** 2 + 1e-13);
			}),
			{ seed: 1905 }
		);
	});

	test('long waves glow as Rayleigh and Jeans said, short ones as Wien said', () => {
		fc.assert(
			fc.property(size(1, 1e6), size(1e-6, 1e-4), (T_K, x) => {
				const nu = (x * k.value * T_K) / h.value;
				const { B_nu } = numbers('blackbody.planck', { T_K, frequency_Hz: nu });
				near(B_nu, (2 * nu ** 2 * k.value * T_K) / c.value ** 2, x);
			})
		);
		fc.assert(
			fc.property(size(1, 1e6), share(40, 500), (T_K, x) => {
				const nu = (x * k.value * T_K) / h.value;
				const { B_nu } = numbers('blackbody.planck', { T_K, frequency_Hz: nu });
				near(B_nu, ((2 * h.value * nu ** 3) / c.value ** 2) * Math.exp(-x), 1e-12);
			})
		);
	});

	test('small swings take the small swing’s time', () => {
		fc.assert(
			fc.property(size(1e-3, 1), size(0.01, 100), (theta0_deg, L_m) => {
				const { small, exact } = numbers('mech.pendulum', { L_m, theta0_deg });
				const theta = (theta0_deg * Math.PI) / 180;
				near(exact, small! * (1 + theta ** 2 / 16), theta ** 4 + 1e-14);
			})
		);
	});

	test('on a round orbit both ends are passed at the circular speed', () => {
		fc.assert(
			fc.property(size(1e22, 1e31), size(1e9, 1e13), (mass_kg, a_m) => {
				const { vPeri, vApo } = numbers('orbit.kepler', { mass_kg, a_m, e: 0 });
				const circular = Math.sqrt((G.value * mass_kg) / a_m) / 1000;
				near(vPeri, circular, 1e-13);
				near(vApo, circular, 1e-13);
			})
		);
	});

	test('without drag, the throw through air is the throw through nothing', () => {
		fc.assert(
			fc.property(share(1, 100), share(5, 85), share(0, 50), (v0_ms, angle_deg, h0_m) => {
				const throwIt = { v0_ms, angle_deg, h0_m };
				const free = numbers('projectile.vacuum', throwIt);
				const thin = numbers('projectile.drag', {
					...throwIt,
					mass_kg: 1e6,
					diameter_m: 1e-3,
					Cd: 1e-3
				});
				near(thin.range, free.range!, 1e-9);
				near(thin.time, free.time!, 1e-9);
			}),
			{ seed: 1638, numRuns: 60 }
		);
	});

	test('speeds far below that of light simply add', () => {
		fc.assert(
			fc.property(size(1e-9, 1e-5), size(1e-9, 1e-5), (beta1, beta2) => {
				near(numbers('sr.add', { beta1, beta2 }).beta, beta1 + beta2, beta1 * beta2 + 1e-15);
			})
		);
	});
});
