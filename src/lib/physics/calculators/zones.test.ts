/** Where the calculators in closed form warn, withhold and refuse. */
import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../calculator.ts';
import { constants } from '../constants/index.ts';
import { convert } from '../units/units.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';

const run = (id: string, inputs: RawInputs) => runCalculator(catalogue.get(id)!, inputs);
const SUN_KG = constants.astronomical.GM_sun.value / constants.physical.G.value;
const mpc = (value: number) => convert(value, 'Mpc', 'm');

describe('a refusal names the input and the mend', () => {
	test.each([
		['doppler.beta_from_z', { z: -1 }, 'out-of-range', /more than −1/, 'z'],
		['doppler.z_from_beta', { beta: 1 }, 'out-of-range', /less than 1/, 'beta'],
		['doppler.z_from_beta', { beta: -1 }, 'out-of-range', /more than −1/, 'beta'],
		['doppler.z_general', { beta: 0.5, theta_deg: 181 }, 'out-of-range', /180 deg/, 'theta_deg'],
		['doppler.combine', { zcos: 0, vpec_kms: 299_792.458 }, 'out-of-range', /km\/s/, 'vpec_kms'],
		['air.from_vacuum', { vacuum_nm: 2501 }, 'out-of-range', /2500 nm/, 'vacuum_nm'],
		[
			'air.to_vacuum',
			{ air_nm: 500, formula: 'cidor1996' },
			'unknown-choice',
			/ciddor1996/,
			'formula'
		],
		['line.rydberg', { nLower: 2, nUpper: 2 }, 'no-fall', /above the lower/, 'nUpper'],
		['line.rydberg', { nLower: 1.5, nUpper: 3 }, 'not-whole', /whole numbers/, 'nLower'],
		['line.rydberg', { nLower: 1, nUpper: 2, Z: 1.2 }, 'not-whole', /whole numbers/, 'Z'],
		['blackbody.total', { T_K: 0 }, 'out-of-range', /at least/, 'T_K'],
		['blackbody.planck', { T_K: 300 }, 'one-of', /none was given/, 'wavelength_nm'],
		[
			'blackbody.band_fraction',
			{ T_K: 300, from_nm: 500, to_nm: 500 },
			'empty-band',
			/ends before/,
			'to_nm'
		],
		['photon.convert', {}, 'one-of', /none was given/, 'wavelength_nm'],
		['sr.kinematics', { beta: 1 }, 'out-of-range', /less than 1/, 'beta'],
		['sr.from_gamma', { gamma: 0.999 }, 'out-of-range', /at least 1/, 'gamma'],
		['sr.rocket_trip', { distance_ly: 1, flip: 'maybe' }, 'unknown-choice', /true, false/, 'flip'],
		['sr.rocket_trip', { distance_ly: 1, flip: 1 }, 'unknown-choice', /word/, 'flip'],
		['gravity.body', { mass_kg: 1, radius_m: 0 }, 'out-of-range', /more than 0/, 'radius_m'],
		['gravity.black_hole', { mass_kg: 1e-9 }, 'out-of-range', /at least/, 'mass_kg'],
		['orbit.kepler', { mass_kg: SUN_KG, a_m: 1000 }, 'inside-horizon', /larger orbit/, 'a_m'],
		['orbit.kepler', { mass_kg: SUN_KG, a_m: 1e11, e: 1 }, 'out-of-range', /less than 1/, 'e'],
		['tide.roche', { M_kg: 1e22, r_m: 1e6 }, 'missing-input', /is missing/, 'd_m'],
		['tide.roche', { M_kg: 1e22, r_m: 1e6, d_m: 1e6 }, 'inside-the-body', /above the body/, 'd_m'],
		['tide.roche', { R_m: 1e6, rhoM: 1000 }, 'missing-input', /is missing/, 'rhom'],
		['tide.roche', {}, 'one-of', /“.+”, “.+”; none was given/, 'M_kg'],
		['stars.magnitude', { parallax_mas: 0 }, 'out-of-range', /more than 0/, 'parallax_mas'],
		['stars.magnitude', { parallax_mas: 1, dm: 1 }, 'one-of', /were given/, 'dm'],
		['light.travel', { value: 1, unit: 'furlong' }, 'unknown-choice', /Choose one of/, 'unit'],
		[
			'exoplanet.transit',
			{ Rp_m: 2e9, Rs_m: 1e9, a_m: 1e12 },
			'covers-the-star',
			/smaller planet/,
			'Rp_m'
		],
		[
			'exoplanet.transit',
			{ Rp_m: 1e8, Rs_m: 1e9, a_m: 1.1e9 },
			'touches-the-star',
			/two radii/,
			'a_m'
		],
		[
			'exoplanet.transit',
			{ Rp_m: 1e8, Rs_m: 1e9, a_m: 1e12, b: 1.2 },
			'misses-the-star',
			/closer/,
			'b'
		],
		['decay.halflife', { t: -1, halflife: 1 }, 'out-of-range', /at least 0/, 't'],
		['decay.age', { halflife: 1, ratio: -0.1 }, 'out-of-range', /at least 0/, 'ratio'],
		['decay.in_flight', { beta: 0, path_m: 1 }, 'out-of-range', /more than 0/, 'beta'],
		['rocket.deltav', { ve_ms: 4000, m0: 1, m1: 2 }, 'gets-heavier', /lighter as it burns/, 'm1'],
		['gas.speeds', { T_K: 1e12, mass_u: 0.2 }, 'outruns-light', /heavier particles/, 'T_K'],
		[
			'gas.adiabatic',
			{ T_K: 1, gamma: 1.7, volumeRatio: 1 },
			'out-of-range',
			/at most 1\.67/,
			'gamma'
		],
		['mech.pendulum', { L_m: 1, theta0_deg: 180 }, 'out-of-range', /less than 180/, 'theta0_deg'],
		['mech.collision', { m1: 1, m2: 1, u1: 1, u2: 0, e: 1.1 }, 'out-of-range', /at most 1/, 'e'],
		[
			'gw.inspiral',
			{ m1_Msun: 30, m2_Msun: 30, distance_Mpc: 400, f_Hz: 74 },
			'past-the-last-orbit',
			/Past 73.2/,
			'f_Hz'
		]
	] as [string, RawInputs, string, RegExp, string][])(
		'%s %o: %s',
		(id, inputs, code, words, input) => {
			const result = run(id, inputs);
			if (result.ok) throw new Error('no refusal');
			expect(result.refusal).toMatchObject({ code, input });
			expect(result.refusal.message).toMatch(words);
		}
	);
});

describe('a warning stands on one side of its line', () => {
	const transit = { Rp_m: 1e8, Rs_m: 1e9, a_m: 1e12 };
	const wave = { m1_Msun: 1.4, m2_Msun: 1.4, distance_Mpc: 100, f_Hz: 50 };
	test.each([
		['doppler.beta_from_z', { z: 0.01 }, { z: 0.011 }, 'not-expansion', 'ok'],
		[
			'doppler.combine',
			{ zcos: 0.1, vpec_kms: 3000 },
			{ zcos: 0.1, vpec_kms: -3001 },
			'too-fast',
			'approximate'
		],
		[
			'air.from_vacuum',
			{ vacuum_nm: 230 },
			{ vacuum_nm: 229 },
			'past-the-measurements',
			'approximate'
		],
		[
			'air.from_vacuum',
			{ vacuum_nm: 1690 },
			{ vacuum_nm: 1691 },
			'past-the-measurements',
			'approximate'
		],
		['air.from_vacuum', { vacuum_nm: 200 }, { vacuum_nm: 199 }, 'vacuum-by-convention', 'outside'],
		['air.to_vacuum', { air_nm: 200 }, { air_nm: 121.5 }, 'vacuum-by-convention', 'outside'],
		[
			'line.rydberg',
			{ nLower: 1, nUpper: 2, Z: 20 },
			{ nLower: 1, nUpper: 2, Z: 21 },
			'heavy-ion',
			'approximate'
		],
		['sr.rocket_trip', { distance_ly: 3e8 }, { distance_ly: 4e8 }, 'space-grows', 'outside'],
		[
			'gravity.body',
			{ mass_kg: SUN_KG, radius_m: 296_000 },
			{ mass_kg: SUN_KG, radius_m: 295_000 },
			'strong-gravity',
			'approximate'
		],
		[
			'gravity.body',
			{ mass_kg: SUN_KG, radius_m: 2954 },
			{ mass_kg: SUN_KG, radius_m: 2953 },
			'black-hole',
			'outside'
		],
		['gravity.black_hole', { mass_kg: 4e22 }, { mass_kg: 5e22 }, 'colder-than-sky', 'ok'],
		['gravity.black_hole', { mass_kg: 1e14 }, { mass_kg: 1e12 }, 'more-particles', 'approximate'],
		[
			'orbit.kepler',
			{ mass_kg: 1e30, a_m: 1e11, m_kg: 1e28 },
			{ mass_kg: 1e30, a_m: 1e11, m_kg: 1.1e28 },
			'not-so-light',
			'approximate'
		],
		[
			'orbit.kepler',
			{ mass_kg: SUN_KG, a_m: 3e6 },
			{ mass_kg: SUN_KG, a_m: 2.9e6 },
			'strong-gravity',
			'approximate'
		],
		[
			'tide.roche',
			{ M_kg: 1e22, r_m: 1e6, d_m: 2.1e7 },
			{ M_kg: 1e22, r_m: 1e6, d_m: 1.9e7 },
			'large-body',
			'approximate'
		],
		[
			'stars.magnitude',
			{ parallax_mas: 5, parallaxError_mas: 1 },
			{ parallax_mas: 4.9, parallaxError_mas: 1 },
			'weak-parallax',
			'outside'
		],
		['light.flux', { L_W: 1, d_m: mpc(429) }, { L_W: 1, d_m: mpc(431) }, 'space-grows', 'outside'],
		[
			'light.travel',
			{ value: 100, unit: 'Mpc' },
			{ value: 101, unit: 'Mpc' },
			'space-grows',
			'outside'
		],
		['angle.size', { D_m: 1, d_m: mpc(429) }, { D_m: 1, d_m: mpc(431) }, 'space-grows', 'outside'],
		[
			'angle.diffraction',
			{ wavelength_nm: 550, D_m: 0.2 },
			{ wavelength_nm: 550, D_m: 0.21 },
			'air-blurs',
			'approximate'
		],
		[
			'angle.diffraction',
			{ wavelength_nm: 2e8, D_m: 2 },
			{ wavelength_nm: 2e8, D_m: 1.9 },
			'small-opening',
			'outside'
		],
		['exoplanet.transit', { ...transit, b: 0.9 }, { ...transit, b: 0.91 }, 'grazing', 'outside'],
		[
			'exoplanet.rv',
			{ P_s: 1e6, m_kg: 1e30, M_kg: 1e30 },
			{ P_s: 1, m_kg: 1e30, M_kg: 1e30 },
			'too-fast',
			'outside'
		],
		[
			'decay.halflife',
			{ t: 10, halflife: 1 },
			{ t: 10.1, halflife: 1 },
			'almost-gone',
			'approximate'
		],
		[
			'decay.age',
			{ halflife: 1, ratio: 1023 },
			{ halflife: 1, ratio: 1025 },
			'almost-gone',
			'approximate'
		],
		[
			'decay.halflife',
			{ t: 1, halflife: 1, unit: 'h', halflife_s: 3600 },
			{ t: 1, halflife: 1, unit: 'h', halflife_s: 3700 },
			'half-lives-differ',
			'outside'
		],
		[
			'rocket.deltav',
			{ ve_ms: 2e7, m0: 2, m1: 1 },
			{ ve_ms: 1e8, m0: 2, m1: 1 },
			'near-light',
			'outside'
		],
		['gas.speeds', { T_K: 1e10, mass_u: 1 }, { T_K: 1e11, mass_u: 1 }, 'near-light', 'outside'],
		[
			'mech.pendulum',
			{ L_m: 1, theta0_deg: 90 },
			{ L_m: 1, theta0_deg: 91 },
			'slack-thread',
			'approximate'
		],
		['mech.pendulum', { L_m: 1, theta0_deg: 16 }, { L_m: 1, theta0_deg: 17 }, 'wide-swing', 'ok'],
		['mech.rolling', { height_m: 1, k: 1 }, { height_m: 1, k: 1.1 }, 'thin-axle', 'approximate'],
		[
			'mech.buoyancy',
			{ rhoBody: 1, rhoFluid: 1, V: 1 },
			{ rhoBody: 1.1, rhoFluid: 1, V: 1 },
			'sinks',
			'outside'
		],
		[
			'gw.inspiral',
			{ ...wave, distance_Mpc: 430 },
			{ ...wave, distance_Mpc: 431 },
			'space-grows',
			'approximate'
		],
		['gw.inspiral', { ...wave, f_Hz: 780 }, { ...wave, f_Hz: 790 }, 'close-to-the-end', 'ok'],
		[
			'impact.energy',
			{ diameter_m: 1, density_kgm3: 3000, speed_ms: 11_200 },
			{ diameter_m: 1, density_kgm3: 3000, speed_ms: 11_100 },
			'too-slow',
			'approximate'
		],
		[
			'impact.energy',
			{ diameter_m: 1, density_kgm3: 3000, speed_ms: 72_800 },
			{ diameter_m: 1, density_kgm3: 3000, speed_ms: 72_900 },
			'not-from-here',
			'approximate'
		]
	] as [string, RawInputs, RawInputs, string, string][])(
		'%s %o, then %o: %s',
		(id, inside, past, code, validity) => {
			const [near, far] = [run(id, inside), run(id, past)];
			if (!near.ok || !far.ok) throw new Error('refused');
			const codes = (warnings: { code: string }[]) => warnings.map((warning) => warning.code);
			expect(codes(near.warnings)).not.toContain(code);
			expect(codes(far.warnings)).toContain(code);
			expect(far.validity).toBe(validity);
		}
	);

	test.each([
		['gravity.body', { mass_kg: 1, radius_m: 1 }, 'known-to-five-digits'],
		['blackbody.total', { T_K: 300 }, 'two-peaks'],
		['sr.rocket_trip', { distance_ly: 4 }, 'no-fuel'],
		['gas.jeans', { T_K: 10, mu: 2, n_m3: 1e9 }, 'by-convention']
	] as [string, RawInputs, string][])('%s %o always says %s', (id, inputs, code) => {
		expect(run(id, inputs)).toMatchObject({
			ok: true,
			validity: 'ok',
			warnings: expect.arrayContaining([expect.objectContaining({ code })])
		});
	});
});

describe('what is not given is withheld with its mend, not made up', () => {
	test.each([
		['sr.kinematics', { beta: 0.5 }, ['kineticEnergy', 'dilatedTime']],
		['sr.kinematics', { beta: 0.5, mass_kg: 1 }, ['dilatedTime']],
		['air.from_vacuum', { vacuum_nm: 121.567 }, ['n_minus_1']],
		[
			'gravity.body',
			{ mass_kg: SUN_KG, radius_m: 100 },
			['escapeSpeed', 'surfaceGravity', 'circularSpeed', 'gravRedshift']
		],
		['tide.roche', { M_kg: 1e22, r_m: 1e6, d_m: 1e8 }, ['rocheRigid', 'rocheFluid']],
		['tide.roche', { R_m: 6e7, rhoM: 687, rhom: 900 }, ['tidalAccel']],
		['stars.magnitude', { parallax_mas: 100 }, ['fluxRatio', 'Mbol']],
		['stars.magnitude', { dm: 1 }, ['distance', 'distanceLy', 'distmod', 'Mbol']],
		['exoplanet.transit', { Rp_m: 1e7, Rs_m: 1e9, a_m: 1e11, Ts_K: 5000 }, ['Teq', 'duration']],
		['decay.halflife', { t: 1, halflife: 2 }, ['activity']],
		['decay.halflife', { t: 1, halflife: 2, N: 1e20 }, ['activity']],
		['gas.speeds', { T_K: 300, mass_u: 28 }, ['sound']],
		['mech.spring', { k: 1, mass_kg: 1 }, ['energy', 'maxSpeed']],
		['gw.inspiral', { m1_Msun: 1, m2_Msun: 1, distance_Mpc: 1, f_Hz: 10 }, ['armChange']]
	] as [string, RawInputs, string[]][])('%s %o lacks %o', (id, inputs, lacking) => {
		const result = run(id, inputs);
		if (!result.ok) throw new Error(result.refusal.message);
		expect(Object.keys(result.withheld ?? {}).sort()).toEqual([...lacking].sort());
		for (const { message } of Object.values(result.withheld ?? {})) {
			expect(message).toMatch(/\bGive\b.*\.$/);
		}
		for (const key of lacking) expect(result.outputs[key]).toBeUndefined();
	});
});

describe('units and uncertainties', () => {
	test('times of a decay come in the unit given, and in none when none is stated', () => {
		const unstated = run('decay.age', { halflife: 4.468, ratio: 1 });
		const stated = run('decay.age', { halflife: 4.468, ratio: 1, unit: 'Gyr' });
		expect(unstated.ok && unstated.outputs.age?.unit).toBe('same');
		expect(stated.ok && stated.outputs.age?.unit).toBe('Gyr');
	});

	test('a stated unit is enough for the activity', () => {
		const stated = run('decay.halflife', { t: 0, halflife: 1, unit: 'h', N: 3600 });
		expect(stated.ok && stated.outputs.activity?.value).toBeCloseTo(Math.LN2, 14);
	});

	test('below 200 nanometres air changes nothing', () => {
		const short = run('air.from_vacuum', { vacuum_nm: 121.567 });
		expect(short.ok && short.outputs.air?.value).toBe(121.567);
	});

	// Relative uncertainty of G, CODATA 2018: 2.2 × 10⁻⁵.
	test.each([
		['gravity.body', { mass_kg: SUN_KG, radius_m: 7e8 }, 'escapeSpeed', 0.5],
		['gravity.body', { mass_kg: SUN_KG, radius_m: 7e8 }, 'surfaceGravity', 1],
		['gravity.body', { mass_kg: SUN_KG, radius_m: 7e8 }, 'gravRedshift', 1],
		['gravity.black_hole', { mass_kg: SUN_KG }, 'hawkingT', 1],
		['orbit.kepler', { mass_kg: SUN_KG, a_m: 1.5e11 }, 'period', 0.5],
		['tide.roche', { M_kg: 1e22, r_m: 1e6, d_m: 1e8 }, 'tidalAccel', 1],
		['exoplanet.rv', { P_s: 1e8, m_kg: 1e27, M_kg: SUN_KG }, 'K', 1 / 3],
		['gas.jeans', { T_K: 10, mu: 2.33, n_m3: 1e10 }, 'mass', 0.5]
	] as [string, RawInputs, string, number][])(
		'%s is known as well as G: %o %s',
		(id, inputs, output, power) => {
			const result = run(id, inputs);
			const reading = result.ok ? result.outputs[output] : undefined;
			const share = (reading?.uncertainty as number) / (reading?.value as number);
			expect(share / power / 2.2e-5).toBeCloseTo(1, 1);
		}
	);

	test('what follows from exact constants is exact', () => {
		for (const [id, inputs, output] of [
			['photon.convert', { wavelength_nm: 550 }, 'energy'],
			['blackbody.total', { T_K: 300 }, 'flux'],
			['light.travel', { value: 1, unit: 'au' }, 'time']
		] as [string, RawInputs, string][]) {
			const result = run(id, inputs);
			expect(result.ok && result.outputs[output]?.uncertainty).toBe('exact');
		}
	});

	test('a parallax gives its own uncertainty to the distance', () => {
		const sure = run('stars.magnitude', { parallax_mas: 100, parallaxError_mas: 1 });
		expect(sure.ok && sure.outputs.distance?.uncertainty).toBeCloseTo(0.1, 12);
		const weak = run('stars.magnitude', { parallax_mas: 2, parallaxError_mas: 1 });
		expect(weak.ok && weak.outputs.distance?.uncertainty).toBe('not-available');
	});
});

test.each([
	['mech.ballistic_pendulum', /Projectiles injure people.*qualified people/],
	['rocket.deltav', /Propellants burn.*qualified supervision/],
	['decay.halflife', /safe to handle.*qualified/],
	['decay.age', /safe to handle/],
	['decay.in_flight', /safe to handle/],
	['light.flux', /Never look at the Sun/],
	['angle.size', /Never look at the Sun/],
	['angle.diffraction', /Never look at the Sun/]
])('%s carries its caution', (id, words) => {
	expect(catalogue.get(id)?.caution).toMatch(words);
});
