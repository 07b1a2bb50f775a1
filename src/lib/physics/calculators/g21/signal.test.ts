import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../../calculator.ts';
import { catalogue } from '../index.ts';
import { runCalculator } from '../run.ts';

const cosmology = { set: 'Planck18' };
const run = (id: string, inputs: RawInputs) => runCalculator(catalogue.get(id)!, inputs);
function outputs(id: string, inputs: RawInputs): Record<string, number> {
	const result = run(id, inputs);
	if (!result.ok) throw new Error(result.refusal.message);
	return Object.fromEntries(
		Object.entries(result.outputs).map(([key, { value }]) => [key, value as number])
	);
}
function codes(id: string, inputs: RawInputs): string[] {
	const result = run(id, inputs);
	if (!result.ok) throw new Error(result.refusal.message);
	return result.warnings.map(({ code }) => code);
}
const relative = (value: number | undefined, wanted: number) =>
	Math.abs((value ?? NaN) / wanted - 1);

describe('the deepest trough', () => {
	// Computed independently (stiff solver of another library, rtol 1e-11) and rounded to 1 mK.
	test.each([
		[10, -281],
		[15, -228],
		[17.2, -211],
		[20, -193],
		[25, -168]
	])('z = %d: %d mK', (z, depth) => {
		expect(Math.round(outputs('g21.deepest', { cosmology, z }).dTb_exact!)).toBe(depth);
	});

	test('is the exact brightness of gas from the thermal history', () => {
		const { Tk, x_e } = outputs('thermal.tla1', { cosmology, z: 17.2 });
		const bright = outputs('g21.brightness', { cosmology, z: 17.2, Ts_K: Tk, x_HI: 1 - x_e! });
		const floor = outputs('g21.deepest', { cosmology, z: 17.2 });
		expect(relative(floor.dTb_exact, bright.dTb_exact!)).toBeLessThan(1e-12);
	});

	// Fialkov & Barkana 2019; Barkana 2018: what half a kelvin takes (from memory).
	test('half a kelvin takes 2.2 times the background, or gas at under half its temperature', () => {
		expect(
			outputs('g21.deepest', { cosmology, z: 17.2, backgroundFactor: 2.2 }).dTb_exact
		).toBeCloseTo(-505, -1);
		expect(outputs('g21.deepest', { cosmology, z: 17.2, gasFactor: 0.43 }).dTb_exact).toBeLessThan(
			-500
		);
		expect(codes('g21.deepest', { cosmology, z: 17.2, gasFactor: 0.43 })).toContain('new-physics');
	});
});

describe('the dark ages', () => {
	// About −40 mK near z = 85–90 (Pritchard & Loeb 2012; from memory).
	test('the trough is deepest at z = 85, 16.5 MHz', () => {
		const depth = (z: number) => outputs('g21.dark_ages', { cosmology, z }).dTb_exact!;
		const deepest = Array.from({ length: 101 }, (_, i) => 40 + i).reduce((best, z) =>
			depth(z) < depth(best) ? z : best
		);
		expect(Math.abs(deepest - 85)).toBeLessThanOrEqual(2);
		expect(depth(85)).toBeCloseTo(-40.1, 1);
		expect(outputs('g21.frequency_from_z', { z: 85 }).frequency).toBeCloseTo(16.5, 1);
	});

	test('its spins are what the separate calculators give', () => {
		const z = 85;
		const ages = outputs('g21.dark_ages', { cosmology, z });
		const { Tk, x_e } = outputs('thermal.tla1', { cosmology, z });
		const { x_c } = outputs('g21.x_c', { cosmology, z, Tk_K: Tk, x_e });
		const { Ts } = outputs('g21.spin_temperature', {
			Trad_K: 2.7255 * (1 + z),
			Tk_K: Tk,
			x_alpha: 0,
			x_c
		});
		expect(relative(ages.x_c, x_c!)).toBeLessThan(1e-12);
		expect(relative(ages.Ts, Ts!)).toBeLessThan(1e-12);
	});
});

describe('brightness and its inverse', () => {
	test('the exact inverse undoes the exact brightness, the linear one the linear', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 6, max: 200, noNaN: true }),
				fc.double({ min: -3, max: 5, noNaN: true }),
				(z, lg) => {
					const Ts_K = 10 ** lg;
					const bright = outputs('g21.brightness', { cosmology, z, Ts_K });
					if (bright.dTb_exact! < -2720) return; // the whole background is gone, and with it the digits
					const exact = outputs('g21.tk_for_depth', { cosmology, z, depth_mK: bright.dTb_exact! });
					const linear = outputs('g21.tk_for_depth', {
						cosmology,
						z,
						depth_mK: Math.max(-1e5, bright.dTb_approx!)
					});
					const ill = 1e-11 * Math.max(1, Ts_K / (2.7255 * (1 + z)));
					expect(relative(exact.Tk_exact, Ts_K)).toBeLessThan(100 * ill);
					if (bright.dTb_approx! > -1e5) expect(relative(linear.Tk, Ts_K)).toBeLessThan(ill);
				}
			),
			{ seed: 78, numRuns: 300 }
		);
	});

	// Barkana 2018, “below about 3.2 K” (from memory): between the exact and the linear answer.
	test('half a kelvin at z = 17.2 asks for 3.05 K exactly, 3.38 K by the linear formula', () => {
		const gas = outputs('g21.tk_for_depth', { cosmology, z: 17.2, depth_mK: -500 });
		expect(gas.Tk_exact).toBeCloseTo(3.05, 2);
		expect(gas.Tk).toBeCloseTo(3.38, 2);
	});

	test('thin gas reads alike by both formulas, thick gas less deep by the exact one', () => {
		const thin = outputs('g21.brightness', { cosmology, z: 17.2, Ts_K: 1e4, x_HI: 0.01 });
		expect(relative(thin.dTb_exact, thin.dTb_approx!)).toBeLessThan(0.01);
		const thick = outputs('g21.brightness', { cosmology, z: 17.2, Ts_K: 7 });
		expect(thick.dTb_approx! / thick.dTb_exact!).toBeCloseTo(1.05, 2);
	});

	test('spins as warm as the background leave nothing to see', () => {
		const none = outputs('g21.brightness', { cosmology, z: 17.2, Ts_K: 2.7255 * 18.2 });
		expect(none.dTb_exact).toBe(0);
		expect(outputs('g21.tk_for_depth', { cosmology, z: 17.2, depth_mK: 0 }).Tk).toBeCloseTo(
			49.6041,
			10
		);
	});

	test('without matter the linear formula has nothing to say, and the exact one has', () => {
		const result = run('g21.brightness', {
			cosmology: { H0: 70, Om0: 0, Ob0: 0.05, Tcmb0: 2.7 },
			z: 10,
			Ts_K: 5
		});
		if (!result.ok) throw new Error(result.refusal.message);
		expect(result.withheld?.dTb_approx?.code).toBe('no-matter');
		expect(result.outputs.dTb_exact?.value).toBeLessThan(0);
	});

	test('a trough deeper than the whole background has a linear answer and no exact one', () => {
		const result = run('g21.tk_for_depth', { cosmology, z: 17.2, depth_mK: -5000 });
		if (!result.ok) throw new Error(result.refusal.message);
		expect(result.withheld?.Tk_exact?.code).toBe('deeper-than-background');
		expect(result.outputs.Tk?.value).toBeGreaterThan(0);
	});
});

describe('couplings and rates', () => {
	// Zygelman 2005 and Furlanetto & Furlanetto 2007, as tabulated.
	test.each([
		['HH', 1, 1.38e-13],
		['HH', 300, 2.09e-10],
		['HH', 10_000, 7.87e-10],
		['eH', 100, 2.26e-9],
		['pH', 20_000, 2.201e-9]
	])('%s at %d K is the published %d cm³/s', (pair, T_K, published) => {
		expect(relative(outputs('g21.kappa', { pair, T_K }).kappa, published)).toBeLessThan(1e-13);
	});

	test.each([
		['HH', 0.5, 1.38e-13],
		['HH', 2e4, 7.87e-10],
		['eH', 1e5, 8.11e-9]
	])('%s at %d K holds the end of its table and says so', (pair, T_K, held) => {
		const result = run('g21.kappa', { pair, T_K });
		expect(result).toMatchObject({
			ok: true,
			validity: 'outside',
			warnings: [{ code: 'beyond-table' }]
		});
		expect(relative(outputs('g21.kappa', { pair, T_K }).kappa, held)).toBeLessThan(1e-13);
	});

	test('electrons in a table that ends higher don’t warn', () => {
		expect(codes('g21.kappa', { pair: 'eH', T_K: 15_000 })).toEqual([]);
		expect(codes('g21.x_c', { cosmology, z: 80, Tk_K: 15_000, x_e: 0 })).toEqual(['beyond-table']);
	});

	// Furlanetto, Oh & Briggs 2006: x_α = 1.81 × 10¹¹ S J/(1+z), with A₁₀ 2.85 and T₀ 2.725 (from memory).
	test('the coupling by Lyman α is that of the literature, but for its constants', () => {
		const here = outputs('g21.x_alpha', { J: 1e-11, z: 9 }).x_alpha!;
		expect(relative(here * (2.8843 / 2.85) * (2.7255 / 2.725), 1.81e11 * 1e-12)).toBeLessThan(
			0.005
		);
	});

	test('strong coupling ties the spins to the gas, none to the background, and they lie between', () => {
		const spins = (x_alpha: number, x_c: number) =>
			outputs('g21.spin_temperature', { Trad_K: 50, Tk_K: 7, x_alpha, x_c }).Ts!;
		expect(spins(0, 0)).toBe(50);
		expect(spins(1e9, 0)).toBeCloseTo(7, 7);
		expect(spins(0, 1e9)).toBeCloseTo(7, 7);
		expect(spins(1, 1)).toBeGreaterThan(7);
		expect(spins(1, 1)).toBeLessThan(50);
		const coloured = { Trad_K: 50, Tk_K: 7, x_alpha: 1e9, x_c: 0, Tc_K: 9 };
		expect(outputs('g21.spin_temperature', coloured).Ts).toBeCloseTo(9, 7);
	});
});

describe('rules of thumb and cooling laws', () => {
	test('the rule of thumb is 13 per cent colder than the history at z = 17.2', () => {
		const thumb = outputs('g21.adiabatic', { cosmology, z: 17.2 }).Tk!;
		expect(1 - thumb / outputs('thermal.tla1', { cosmology, z: 17.2 }).Tk!).toBeCloseTo(0.13, 2);
		expect(codes('g21.adiabatic', { cosmology, z: 300 })).toEqual(['rule-of-thumb', 'still-held']);
	});

	test('the cooling law with its standard numbers follows the thermal history within 2 per cent', () => {
		const count = 2000;
		const width = (Math.log(1201) - Math.log(18)) / count;
		const zAt = (i: number) => 1201 * Math.exp(-i * width) - 1;
		let lnT = Math.log(2.7255 * 1201);
		for (let i = 0; i < count; i += 1) {
			// Time goes as (1+z)^(−3/2) while matter rules.
			lnT += outputs('g21.mf_cooling', { z: zAt(i + 0.5) }).slope! * 1.5 * width;
		}
		const followed = outputs('thermal.tla1', { cosmology, z: zAt(count) }).Tk!;
		expect(relative(Math.exp(lnT), followed)).toBeLessThan(0.02);
	});

	test('it starts in step with the background and ends with expansion alone, or faster', () => {
		expect(outputs('g21.mf_cooling', { z: 1700, beta: 20 }).slope).toBeCloseTo(-2 / 3, 12);
		expect(outputs('g21.mf_cooling', { z: 0 }).slope).toBeCloseTo(-4 / 3, 12);
		expect(codes('g21.mf_cooling', { z: 17, alpha: -6 })).toEqual(['new-physics']);
		expect(outputs('g21.mf_cooling', { z: 17, alpha: -6 }).slope).toBeLessThan(-4 / 3);
	});

	test('a glow as strong as the background at 78 MHz doubles it there, and warns', () => {
		const z = 1420.405751768 / 78 - 1;
		expect(outputs('g21.radio_excess', { z, A_r: 1 }).factor).toBeCloseTo(2, 12);
		expect(outputs('g21.radio_excess', { z, A_r: 0 }).Trad).toBeCloseTo(2.7255 * (1 + z), 12);
		expect(codes('g21.radio_excess', { z, A_r: 0.01 })).toEqual(['new-physics']);
		expect(codes('g21.radio_excess', { z, A_r: 0 })).toEqual([]);
	});
});

describe('shapes', () => {
	const half = (tau: number) =>
		outputs('g21.flattened_gaussian', { A: 0.5, nu: 87.5, nu0: 78, w: 19, tau }).T!;

	test.each([0, 1e-12, 0.1, 7, 500])(
		'the flat trough of τ = %d is half as deep at half its width',
		(tau) => {
			expect(half(tau)).toBeCloseTo(-0.25, 12);
		}
	);

	test('without flatness it is a bell of the same width', () => {
		const sigma = 19 / (2 * Math.sqrt(2 * Math.LN2));
		for (const nu of [50, 70, 78, 81]) {
			const bell = outputs('g21.gaussian', { A: 0.5, nu, nu0: 78, sigma }).T!;
			for (const tau of [0, 1e-13]) {
				const flat = outputs('g21.flattened_gaussian', { A: 0.5, nu, nu0: 78, w: 19, tau }).T!;
				expect(relative(flat, bell)).toBeLessThan(1e-11);
			}
		}
	});

	// The wing is A τe^B/(1−e^(−τ)) to first order: a relative check where 1 − exp(−small) would have no digit left.
	test('its far wing keeps its digits', () => {
		const tau = 7;
		const B = 4 * (60 / 19) ** 2 * Math.log(-Math.log((1 + Math.exp(-tau)) / 2) / tau);
		const wing = (-0.5 * tau * Math.exp(B)) / (1 - Math.exp(-tau));
		const there = outputs('g21.flattened_gaussian', { A: 0.5, nu: 138, nu0: 78, w: 19, tau }).T!;
		expect(relative(there, wing)).toBeLessThan(1e-12);
	});

	test('the foot of a step keeps its digits', () => {
		const foot = outputs('g21.tanh', { Aref: 1, z0: 9, dz: 0.5, z: 29 }).A!;
		expect(relative(foot, Math.exp(-80))).toBeLessThan(1e-12);
		expect(outputs('g21.tanh', { Aref: 1, z0: 9, dz: 1, z: 1700 }).A).toBe(0);
	});
});

describe('sky and noise', () => {
	test('the sky is thousands of times the signal', () => {
		expect(outputs('g21.foreground', { nu_MHz: 78, signal_K: 0.16 }).ratio).toBeCloseTo(9895, 0);
		expect(codes('g21.foreground', { nu_MHz: 10 })).toEqual(['beyond-power-law']);
	});

	test('half the noise takes four times as long, and thermal noise is not all there is', () => {
		const listen = (rms_K: number) =>
			outputs('g21.radiometer', { Tsys_K: 1700, rms_K, bandwidth_Hz: 4e5 }).time!;
		expect(listen(0.01) / listen(0.02)).toBeCloseTo(4, 12);
		expect(codes('g21.radiometer', { Tsys_K: 1700, rms_K: 0.02, bandwidth_Hz: 4e5 })).toEqual([
			'thermal-only'
		]);
	});
});

describe('the honest note beside a deep trough near 78 MHz', () => {
	test.each([
		['g21.brightness', { cosmology, z: 17.2, Ts_K: 3 }],
		['g21.deepest', { cosmology, z: 17.2 }],
		['g21.tk_for_depth', { cosmology, z: 17.2, depth_mK: -500 }],
		['g21.gaussian', { A: 0.5, nu: 78, nu0: 78, sigma: 8 }],
		['g21.flattened_gaussian', { A: 0.5, nu: 60, nu0: 78, w: 19, tau: 7 }]
	] as [string, RawInputs][])('%s', (id, inputs) => {
		const result = run(id, inputs);
		const note = result.ok && result.warnings.find(({ code }) => code === 'disputed-trough');
		expect(note && note.message).toMatch(/Singh et al. 2022.*rejects/);
	});

	test.each([
		['g21.brightness', { cosmology, z: 17.2, Ts_K: 20 }],
		['g21.deepest', { cosmology, z: 10 }],
		['g21.tk_for_depth', { cosmology, z: 17.2, depth_mK: -100 }],
		['g21.gaussian', { A: 0.5, nu: 78, nu0: 120, sigma: 8 }],
		['g21.flattened_gaussian', { A: 0.1, nu: 78, nu0: 78, w: 19, tau: 7 }]
	] as [string, RawInputs][])('but not beside a shallow one, or elsewhere: %s', (id, inputs) => {
		expect(codes(id, inputs)).not.toContain('disputed-trough');
	});
});

describe('refusals', () => {
	const bare = { H0: 70, Om0: 0.3, Tcmb0: 2.7 };
	test.each([
		['g21.brightness', { cosmology, z: 17.2, Ts_K: 0 }, 'out-of-range', /more than 0/],
		['g21.brightness', { cosmology, z: 17.2, Ts_K: -7 }, 'out-of-range', /more than 0/],
		['g21.brightness', { cosmology, z: 17.2, Ts_K: 7, x_HI: 1.1 }, 'out-of-range', /at most 1/],
		['g21.brightness', { cosmology: bare, z: 17.2, Ts_K: 7 }, 'no-gas', /Ob0/],
		['g21.deepest', { cosmology: { set: 'Simple' }, z: 17.2 }, 'no-background', /Tcmb0/],
		['g21.deepest', { cosmology, z: 17.2, backgroundFactor: 0.5 }, 'out-of-range', /at least 1/],
		['g21.dark_ages', { cosmology: bare, z: 85 }, 'no-gas', /Planck 2018/],
		['g21.x_c', { cosmology: bare, z: 85, Tk_K: 100, x_e: 0 }, 'no-gas', /Planck 2018/],
		['g21.adiabatic', { cosmology: { set: 'Simple' }, z: 17 }, 'no-gas', /Tcmb0/],
		['g21.tk_for_depth', { cosmology, z: 17.2, depth_mK: 40 }, 'too-bright', /brighter than/],
		[
			'g21.tk_for_depth',
			{ cosmology: { ...cosmology, Om0: 0 }, z: 17.2, depth_mK: -9 },
			'no-matter',
			/Om0/
		],
		['g21.kappa', { pair: 'HHe', T_K: 10 }, 'unknown-choice', /“HH”/],
		['g21.kappa', { pair: 'HH', T_K: 0 }, 'out-of-range', /more than 0/],
		[
			'g21.spin_temperature',
			{ Trad_K: 50, Tk_K: 7, x_alpha: -1, x_c: 0 },
			'out-of-range',
			/at least 0/
		],
		['g21.x_alpha', { J: -1, z: 17 }, 'out-of-range', /at least 0/],
		['g21.gaussian', { A: 1, nu: 78, nu0: 78, sigma: 0 }, 'out-of-range', /more than 0/],
		[
			'g21.flattened_gaussian',
			{ A: 1, nu: 78, nu0: 78, w: 19, tau: -1 },
			'out-of-range',
			/at least 0/
		],
		['g21.tanh', { Aref: 1, z0: 9, dz: 0, z: 8 }, 'out-of-range', /more than 0/],
		['g21.foreground', { nu_MHz: 0 }, 'out-of-range', /more than 0/],
		['g21.radiometer', { Tsys_K: 1, rms_K: 0, bandwidth_Hz: 1 }, 'out-of-range', /more than 0/],
		['g21.radio_excess', { z: 17, A_r: -1 }, 'out-of-range', /at least 0/],
		['g21.mf_cooling', { z: 17, z0: 0 }, 'out-of-range', /more than 0/]
	] as [string, RawInputs, string, RegExp][])('%s %o: %s', (id, inputs, code, words) => {
		const result = run(id, inputs);
		if (result.ok) throw new Error('no refusal');
		expect(result.refusal.code).toBe(code);
		expect(result.refusal.message).toMatch(words);
	});
});
