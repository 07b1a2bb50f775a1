import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../../calculator.ts';
import { catalogue } from '../index.ts';
import { runCalculator } from '../run.ts';
import {
	energyOf,
	projectileAt,
	throwOf,
	velocityOf,
	type Machine,
	type Throw
} from './machine.ts';

const machine: Machine = {
	longArm: 4,
	shortArm: 1,
	sling: 3.5,
	hanger: 0.8,
	projectile: 10,
	counterweight: 1000,
	beam: 100,
	pivotHeight: 3,
	releaseAngle: (42 * Math.PI) / 180,
	gravity: 9.80665
};
const inputs = {
	longArm_m: 4,
	shortArm_m: 1,
	sling_m: 3.5,
	hanger_m: 0.8,
	projectile_kg: 10,
	counterweight_kg: 1000,
	beam_kg: 100,
	pivotHeight_m: 3,
	releaseAngle_deg: 42
};
function thrownBy(built: Machine): Throw {
	const thrown = throwOf(built);
	if (typeof thrown === 'string') throw new Error(thrown);
	return thrown;
}
const run = (more: RawInputs = {}) =>
	runCalculator(catalogue.get('launcher.hinged')!, { ...inputs, ...more });
function outputs(more: RawInputs = {}): Record<string, number> {
	const result = run(more);
	if (!result.ok) throw new Error(result.refusal.message);
	return Object.fromEntries(
		Object.entries(result.outputs).map(([key, { value }]) => [key, value as number])
	);
}

describe('a throw', () => {
	test('keeps its energy at every step of both phases', () => {
		const thrown = thrownBy(machine);
		expect(thrown.energyDrift).toBeLessThan(1e-10);
		const scale = machine.counterweight * machine.gravity * machine.shortArm;
		for (const pose of [thrown.liftOff, thrown.release]) {
			const off = energyOf(machine, pose) - energyOf(machine, thrown.start);
			expect(Math.abs(off / scale)).toBeLessThan(1e-10);
		}
	});

	test('keeps it in machines of any build that throws', () => {
		let threw = 0;
		fc.assert(
			fc.property(
				fc.record({
					longArm: fc.double({ min: 2, max: 12, noNaN: true }),
					shortShare: fc.double({ min: 0.1, max: 0.5, noNaN: true }),
					slingShare: fc.double({ min: 0.3, max: 1.2, noNaN: true }),
					hanger: fc.double({ min: 0.2, max: 2, noNaN: true }),
					massRatio: fc.double({ min: 40, max: 300, noNaN: true }),
					heightShare: fc.double({ min: 0.55, max: 0.95, noNaN: true })
				}),
				({ longArm, shortShare, slingShare, hanger, massRatio, heightShare }) => {
					const built = {
						...machine,
						longArm,
						shortArm: longArm * shortShare,
						sling: longArm * slingShare,
						hanger,
						counterweight: 10 * massRatio,
						pivotHeight: longArm * heightShare
					};
					const thrown = throwOf(built);
					if (typeof thrown === 'string') return;
					threw += 1;
					expect(thrown.energyDrift).toBeLessThan(1e-9);
				}
			),
			{ seed: 1304, numRuns: 40 }
		);
		expect(threw).toBeGreaterThan(20);
	});

	test('starts on the ground behind, slides level, and lets go in the wanted direction', () => {
		const thrown = thrownBy(machine);
		expect(projectileAt(machine, thrown.start)[1]).toBeCloseTo(-3, 12);
		expect(projectileAt(machine, thrown.liftOff)[1]).toBeCloseTo(-3, 9);
		expect(velocityOf(machine, thrown.liftOff)[1]).toBeCloseTo(0, 8);
		const [vx, vy] = velocityOf(machine, thrown.release);
		expect((Math.atan2(vy, vx) * 180) / Math.PI).toBeCloseTo(42, 8);
		expect(thrown.leastTension).toBeGreaterThan(0);
	});

	test('the stone takes along what the efficiency says, and never more than there is', () => {
		const { energyEfficiency, releaseSpeed, counterweightDrop } = outputs();
		const kinetic = 0.5 * 10 * releaseSpeed! ** 2;
		expect(kinetic / (1000 * 9.80665 * counterweightDrop!)).toBeCloseTo(energyEfficiency!, 12);
		expect(energyEfficiency).toBeLessThan(1);
	});

	test('gravity sets the tempo and the speed, not the shape: range and efficiency stay', () => {
		const earth = outputs();
		const moon = outputs({ g_ms2: 1.62 });
		expect(moon.range).toBeCloseTo(earth.range!, 6);
		expect(moon.energyEfficiency).toBeCloseTo(earth.energyEfficiency!, 8);
		expect(moon.releaseTime! / earth.releaseTime!).toBeCloseTo(Math.sqrt(9.80665 / 1.62), 8);
	});

	test('all masses doubled change nothing', () => {
		const same = outputs({ projectile_kg: 20, counterweight_kg: 2000, beam_kg: 200 });
		expect(same.releaseSpeed).toBeCloseTo(outputs().releaseSpeed!, 8);
	});

	test('a hinge gives more than the whole box lifted to the arm would: the drop is not two short arms', () => {
		expect(outputs().counterweightDrop).toBeLessThan(2);
	});
});

describe('limits', () => {
	test.each([
		[{ pivotHeight_m: 4 }, 'tip-in-air', 'longArm_m'],
		[{ shortArm_m: 3 }, 'arm-in-ground', 'shortArm_m'],
		[{ counterweight_kg: 200 }, 'does-not-throw', undefined],
		[{ counterweight_kg: 10 }, 'does-not-throw', undefined],
		[{ hanger_m: 0.02, shortArm_m: 0.01 }, 'does-not-throw', undefined],
		[
			{
				shortArm_m: 0.01,
				sling_m: 0.05,
				hanger_m: 0.02,
				projectile_kg: 0.001,
				counterweight_kg: 0.01,
				beam_kg: 0,
				pivotHeight_m: 0.05
			},
			'not-followed',
			undefined
		],
		[{ projectile_kg: 0 }, 'out-of-range', 'projectile_kg'],
		[{ releaseAngle_deg: 91 }, 'out-of-range', 'releaseAngle_deg']
	] as [RawInputs, string, string | undefined][])('%o: %s', (more, code, input) => {
		const result = run(more);
		if (result.ok) throw new Error('no refusal');
		expect(result.refusal.code).toBe(code);
		expect(result.refusal.input).toBe(input);
		expect(result.refusal.message).toMatch(/\.$/);
	});

	test('a hanger that would strike the ground, and a fast stone, are warned of', () => {
		const low = run({ hanger_m: 2 });
		expect(low.ok && low.warnings.map(({ code }) => code)).toContain('hits-ground');
		const fast = run({ counterweight_kg: 3000 });
		expect(fast.ok && fast.warnings.map(({ code }) => code)).toContain('air-matters');
	});

	test('it carries the caution, and no output is a measure to build by', () => {
		expect(catalogue.get('launcher.hinged')?.caution).toMatch(/Launchers injure people/);
		expect(catalogue.get('launcher.hinged')?.notFor.join()).toMatch(/Building one/);
	});
});
