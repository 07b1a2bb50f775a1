import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../../calculator.ts';
import { catalogue } from '../index.ts';
import { runCalculator } from '../run.ts';

const run = (id: string, inputs: RawInputs) => runCalculator(catalogue.get(id)!, inputs);
function outputs(id: string, inputs: RawInputs): Record<string, number> {
	const result = run(id, inputs);
	if (!result.ok) throw new Error(result.refusal.message);
	return Object.fromEntries(
		Object.entries(result.outputs).map(([key, { value }]) => [key, value as number])
	);
}
const ball = { mass_kg: 0.145, diameter_m: 0.0732, Cd: 0.35 };
const relative = (value: number | undefined, wanted: number) =>
	Math.abs((value ?? NaN) / wanted - 1);

describe('flight through air', () => {
	test('without air it is the flight without air', () => {
		for (const [angle_deg, h0_m] of [
			[45, 0],
			[30, 12],
			[60, -5],
			[-20, 3],
			[0, 1]
		]) {
			const thrown = { v0_ms: 30, angle_deg, h0_m };
			const thin = outputs('projectile.drag', { ...thrown, ...ball, rho: 1e-14 });
			const none = outputs('projectile.vacuum', thrown);
			for (const key of ['range', 'time', 'apex', 'impactSpeed']) {
				expect(relative(thin[key], none[key]!), key).toBeLessThan(1e-9);
			}
		}
	});

	test('a ball let go falls as the straight fall does', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 0.5, max: 5000, noNaN: true }),
				fc.double({ min: -4, max: 2, noNaN: true }),
				(h0_m, lgMass) => {
					const mass_kg = 10 ** lgMass;
					const drop = outputs('projectile.drag', {
						v0_ms: 0,
						angle_deg: 0,
						...ball,
						mass_kg,
						h0_m
					});
					const fall = outputs('fall.drag', {
						mass_kg,
						Cd: ball.Cd,
						area_m2: (Math.PI * ball.diameter_m ** 2) / 4,
						t_s: drop.time
					});
					expect(relative(fall.distance, h0_m)).toBeLessThan(1e-8);
					expect(relative(fall.speed, drop.impactSpeed!)).toBeLessThan(1e-8);
					expect(relative(fall.terminalSpeed, drop.terminalSpeed!)).toBeLessThan(1e-12);
					expect(drop.range).toBe(0);
				}
			),
			{ seed: 1687, numRuns: 60 }
		);
	});

	// Closed form of the rise: (v_t²/2g) ln(1 + v₀²/v_t²); Thornton & Marion, Classical Dynamics, ch. 2 (from memory).
	test('straight up it rises as the closed form has it', () => {
		const up = outputs('projectile.drag', { v0_ms: 60, angle_deg: 90, ...ball });
		const vt = up.terminalSpeed!;
		expect(relative(up.apex, (vt ** 2 / (2 * 9.80665)) * Math.log1p((60 / vt) ** 2))).toBeLessThan(
			1e-10
		);
		expect(relative(up.impactSpeed, 60 / Math.sqrt(1 + (60 / vt) ** 2))).toBeLessThan(1e-9);
		expect(up.range).toBe(0);
	});

	test('air takes range, and from the best angle', () => {
		const range = (angle_deg: number) =>
			outputs('projectile.drag', { v0_ms: 50, angle_deg, ...ball }).range!;
		expect(range(45)).toBeLessThan(
			outputs('projectile.vacuum', { v0_ms: 50, angle_deg: 45 }).range! / 1.5
		);
		expect(range(41)).toBeGreaterThan(range(45));
	});

	test('a long fall of something light ends at its steady speed', () => {
		const feather = outputs('projectile.drag', {
			v0_ms: 5,
			angle_deg: 45,
			...ball,
			mass_kg: 1e-5,
			h0_m: 9000
		});
		expect(relative(feather.impactSpeed, feather.terminalSpeed!)).toBeLessThan(1e-9);
	});

	test('nothing thrown from nowhere goes nowhere', () => {
		expect(outputs('projectile.drag', { v0_ms: 0, angle_deg: 45, ...ball })).toMatchObject({
			range: 0,
			time: 0
		});
		expect(outputs('projectile.drag', { v0_ms: 10, angle_deg: -45, ...ball })).toMatchObject({
			range: 0,
			time: 0
		});
	});
});

describe('fall through air', () => {
	test('soon after the start it is a free fall, late it is steady', () => {
		const skydiver = { mass_kg: 80, Cd: 1, area_m2: 0.7 };
		const soon = outputs('fall.drag', { ...skydiver, t_s: 1e-6 });
		expect(relative(soon.distance, 0.5 * 9.80665 * 1e-12)).toBeLessThan(1e-11);
		const late = outputs('fall.drag', { ...skydiver, t_s: 1000 });
		const vt = late.terminalSpeed!;
		expect(late.speed).toBe(vt);
		expect(relative(late.distance, vt * 1000 - (vt ** 2 / 9.80665) * Math.LN2)).toBeLessThan(1e-12);
		expect(outputs('fall.drag', { ...skydiver, t_s: 0 })).toMatchObject({ speed: 0, distance: 0 });
	});

	test('the two forms of the distance meet', () => {
		const at = (x: number) => {
			const one = { mass_kg: 1, Cd: 2, rho: 1, area_m2: 1, g_ms2: 1 };
			return outputs('fall.drag', { ...one, t_s: x }).distance!;
		};
		expect(relative(at(1), at(1 - 1e-12))).toBeLessThan(1e-11);
	});

	// A coin of 2.5 g and 2.85 cm² reaches about 11 m/s, not the 93 m/s of a vacuum (computed, with a drag of 1.1).
	test('a coin from a tower comes down at 11 metres a second', () => {
		const coin = outputs('fall.drag', { mass_kg: 0.0025, Cd: 1.1, area_m2: 2.85e-4, t_s: 60 });
		expect(coin.terminalSpeed).toBeCloseTo(11.3, 1);
	});
});

describe('limits', () => {
	test.each([
		['projectile.drag', { v0_ms: 10, angle_deg: 45, ...ball, h0_m: -12 }, 'too-high'],
		['projectile.drag', { v0_ms: 10, angle_deg: -45, ...ball, h0_m: -1 }, 'too-high'],
		['projectile.drag', { v0_ms: 10, angle_deg: 91, ...ball }, 'out-of-range'],
		['projectile.drag', { v0_ms: 10, angle_deg: 45, ...ball, mass_kg: 0 }, 'out-of-range'],
		['projectile.drag', { v0_ms: 10, angle_deg: 45, ...ball, rho: 0 }, 'out-of-range'],
		['fall.drag', { mass_kg: 80, Cd: 1, area_m2: 0, t_s: 5 }, 'out-of-range'],
		['fall.drag', { mass_kg: 80, Cd: 1, area_m2: 0.7, t_s: -5 }, 'out-of-range'],
		['fall.drag', { mass_kg: 1, Cd: 1e-200, area_m2: 1e-200, t_s: 5 }, 'no-finite-value']
	] as [string, RawInputs, string][])('%s %o: %s', (id, inputs, code) => {
		const result = run(id, inputs);
		expect(result).toMatchObject({ ok: false, refusal: { code } });
	});

	test.each([
		[50, 'ok', []],
		[150, 'approximate', ['near-sound']],
		[300, 'outside', ['near-sound', 'at-sound']]
	])('at %d m/s', (v0_ms, validity, warned) => {
		const result = run('projectile.drag', { v0_ms, angle_deg: 10, ...ball });
		expect(result).toMatchObject({ ok: true, validity });
		expect(result.ok && result.warnings.map(({ code }) => code)).toEqual(warned);
	});

	test('what is thrown carries its caution', () => {
		expect(catalogue.get('projectile.drag')?.caution).toMatch(/Launchers injure people/);
	});
});
