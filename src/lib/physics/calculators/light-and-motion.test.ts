import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../calculator.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';

function outputs(id: string, inputs: RawInputs): Record<string, number> {
	const result = runCalculator(catalogue.get(id)!, inputs);
	if (!result.ok) throw new Error(result.refusal.message);
	return Object.fromEntries(
		Object.entries(result.outputs).map(([key, reading]) => [key, reading.value as number])
	);
}
const relative = (value: number | undefined, wanted: number) =>
	Math.abs((value ?? NaN) / wanted - 1);

describe('lines', () => {
	test('the redshift of an observed line is the one it was given', () => {
		const keys = ['Wavelength_nm', 'Frequency_Hz', 'Energy_eV'] as const;
		const seen = ['observedWavelength', 'observedFrequency', 'observedEnergy'] as const;
		fc.assert(
			fc.property(
				fc.nat(2),
				fc.nat(2),
				fc.double({ min: 0.01, max: 1000, noNaN: true }),
				(rest, observed, z) => {
					const value = [121.567, 2.47e15, 10.2][rest]!;
					const light = outputs('line.observe', { [`rest${keys[rest]}`]: value, z });
					const back = outputs('line.redshift', {
						[`rest${keys[rest]}`]: value,
						[`observed${keys[observed]}`]: light[seen[observed]!]
					});
					expect(relative(back.z, z)).toBeLessThan(1e-12);
				}
			),
			{ seed: 1215, numRuns: 300 }
		);
	});

	test('a small redshift keeps its digits', () => {
		const z = outputs('line.redshift', {
			restWavelength_nm: 500,
			observedWavelength_nm: 500.000001
		}).z;
		expect(relative(z, (500.000001 - 500) / 500)).toBe(0);
	});

	test.each([
		[{ restWavelength_nm: 500, z: 0.001 }, ['near-motion']],
		[{ restWavelength_nm: 500, z: 0.1 }, []],
		[{ restWavelength_nm: 121.567, z: 0.5 }, ['blocked-by-air']],
		[{ restFrequency_Hz: 1420405751.768, z: 40 }, ['unseen']],
		[{ restFrequency_Hz: 1420405751.768, z: 200 }, ['unseen', 'blocked-by-air']]
	])('%o warns of %o', (inputs, codes) => {
		const result = runCalculator(catalogue.get('line.observe')!, inputs);
		expect(result.ok && result.warnings.map((warning) => warning.code)).toEqual(codes);
	});

	test.each([
		[0.009, 'gamma ray'],
		[0.01, 'X-ray'],
		[379.9, 'ultraviolet'],
		[380, 'visible'],
		[760, 'near-infrared'],
		[5e4, 'far-infrared'],
		[3e8, 'radio'],
		[1e17, 'radio']
	])('%d nm is %s', (wavelength_nm, name) => {
		expect(outputs('line.band', { wavelength_nm }).band).toBe(name);
	});
});

describe('the 21 cm line', () => {
	test('there and back', () => {
		fc.assert(
			fc.property(fc.double({ min: 0.01, max: 1e5, noNaN: true }), (z) => {
				const { frequency } = outputs('g21.frequency_from_z', { z });
				expect(
					relative(outputs('g21.z_from_frequency', { frequency_MHz: frequency }).z, z)
				).toBeLessThan(1e-12);
			}),
			{ seed: 1420405, numRuns: 200 }
		);
	});

	// The chain of the first demo piece, by its own steps: age 180 Myr → z 19.85 → 68.1 MHz, 4.40 m.
	test('a wave that left 180 million years after the Big Bang arrives at 68.1 megahertz', () => {
		const { z, stretch } = outputs('cosmo.inverse', {
			cosmology: { set: 'Planck18' },
			kind: 'z_from_age',
			value: 0.18
		});
		const light = outputs('line.observe', { restFrequency_Hz: 1420405751.768, z });
		expect(z).toBeCloseTo(19.8536, 4);
		expect(stretch).toBeCloseTo(20.8536, 4);
		expect(light.observedFrequency! / 1e6).toBeCloseTo(68.11, 2);
		expect(light.observedWavelength! / 1e9).toBeCloseTo(4.401, 3);
	});
});

describe('falls and throws', () => {
	test('speed squared, energy and time agree for every drop', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 0.001, max: 1e4, noNaN: true }),
				fc.double({ min: 0, max: 1000, noNaN: true }),
				(height_m, v0_ms) => {
					const { energy, impactSpeed, fallTime } = outputs('energy.drop', {
						height_m,
						mass_kg: 3,
						v0_ms
					});
					expect(relative(energy! + 1.5 * v0_ms ** 2, 1.5 * impactSpeed! ** 2)).toBeLessThan(1e-12);
					expect(
						relative(v0_ms * fallTime! + (9.80665 / 2) * fallTime! ** 2, height_m)
					).toBeLessThan(1e-11);
				}
			),
			{ seed: 980665, numRuns: 300 }
		);
		expect(outputs('energy.drop', { height_m: 0, mass_kg: 1 })).toEqual({
			energy: 0,
			impactSpeed: 0,
			fallTime: 0
		});
	});

	test('a stone arrives at a wall as fast by its energy as by its flight, flat or lofted', () => {
		const thrown = outputs('energy.counterweight', {
			counterweight_kg: 6000,
			projectile_kg: 60,
			drop_m: 8,
			efficiency: 1,
			climb_m: 12
		});
		expect(thrown.storedEnergy).toBeCloseTo(470_719.2, 6);
		expect(thrown.climbShare).toBeCloseTo(1.5, 12);
		expect(thrown.arrivalSpeed).toBeCloseTo(124.319, 3);
		for (const angle_deg of [14, 45, 77]) {
			const flight = outputs('projectile.vacuum', {
				v0_ms: thrown.launchSpeed,
				angle_deg,
				h0_m: -12
			});
			expect(relative(flight.impactSpeed, thrown.arrivalSpeed!)).toBeLessThan(1e-12);
		}
	});

	test('no drop has no share to give', () => {
		const result = runCalculator(catalogue.get('energy.counterweight')!, {
			counterweight_kg: 100,
			projectile_kg: 1,
			drop_m: 0
		});
		expect(result.ok && result.outputs.climbShare).toBeUndefined();
		expect(result.ok && result.withheld?.climbShare?.code).toBe('no-energy');
	});

	test('the best angle carries at least as far as any other', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 20, max: 50, noNaN: true }),
				fc.double({ min: -5, max: 50, noNaN: true }),
				fc.double({ min: 40, max: 60, noNaN: true }),
				(v0_ms, h0_m, other) => {
					const best = outputs('projectile.vacuum', { v0_ms, h0_m, angle_deg: 45 }).bestAngle!;
					const farthest = outputs('projectile.vacuum', { v0_ms, h0_m, angle_deg: best }).range!;
					const range = outputs('projectile.vacuum', { v0_ms, h0_m, angle_deg: other }).range!;
					expect(range).toBeLessThanOrEqual(farthest * (1 + 1e-12));
				}
			),
			{ seed: 45, numRuns: 200 }
		);
	});

	test('a throw ends where it lands: height 0 after the time of flight', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 1, max: 50, noNaN: true }),
				fc.double({ min: -90, max: 90, noNaN: true }),
				fc.double({ min: 1, max: 100, noNaN: true }),
				(v0_ms, angle_deg, h0_m) => {
					const { time } = outputs('projectile.vacuum', { v0_ms, angle_deg, h0_m });
					const up = v0_ms * Math.sin((angle_deg * Math.PI) / 180);
					const height = h0_m + up * time! - (9.80665 / 2) * time! ** 2;
					expect(Math.abs(height)).toBeLessThan(
						1e-11 * (h0_m + Math.abs(up) * time! + 5 * time! ** 2)
					);
				}
			),
			{ seed: 90, numRuns: 300 }
		);
	});

	test('straight up comes straight down', () => {
		expect(outputs('projectile.vacuum', { v0_ms: 30, angle_deg: 90 }).range).toBe(0);
		expect(outputs('projectile.vacuum', { v0_ms: 0, angle_deg: 45 })).toMatchObject({
			range: 0,
			time: 0,
			bestAngle: 0
		});
	});

	test('whatever throws carries its caution', () => {
		for (const id of ['energy.counterweight', 'projectile.vacuum']) {
			expect(catalogue.get(id)?.caution).toMatch(/Launchers injure people/);
		}
	});
});

describe('every calculator', () => {
	test.each([...catalogue.values()].map((calculator) => [calculator.id, calculator] as const))(
		'%s declares what its card shows, and works as it is first laid out',
		(id, calculator) => {
			for (const list of [
				calculator.asks,
				calculator.notFor,
				calculator.equations,
				calculator.assumptions,
				calculator.sources
			]) {
				expect(list.length, id).toBeGreaterThan(0);
			}
			expect(calculator.revision).toMatch(/^\d+\.\d+\.\d+$/);
			expect(calculator.history.at(-1)?.revision).toBe(calculator.revision);
			const later = new Set((calculator.oneOf ?? []).flatMap((group) => group.slice(1)));
			const first = Object.entries(calculator.inputs)
				.filter(([key]) => !later.has(key))
				.map(([key, spec]) => [key, spec.initial]);
			const result = runCalculator(calculator, Object.fromEntries(first) as RawInputs);
			// A rule of thumb says so always; nothing else warns of its number before anyone has moved a setting.
			const isRough = calculator.warnings.some(
				({ when, validity }) => when === 'always' && validity === 'approximate'
			);
			expect(result, id).toMatchObject({ ok: true, validity: isRough ? 'approximate' : 'ok' });
		}
	);
});
