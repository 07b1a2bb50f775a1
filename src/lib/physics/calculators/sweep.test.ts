import { describe, expect, test } from 'vitest';
import type { Calculator } from '../calculator.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';
import { firstStretch, sweepables, sweepPlaces, sweptPoints } from './sweep.ts';

function calculatorOf(id: string): Calculator {
	const calculator = catalogue.get(id);
	if (!calculator) throw new Error(`${id} is gone.`);
	return calculator;
}

describe('the places of the points', () => {
	test('both ends are met exactly, evenly or by the logarithm', () => {
		const even = sweepPlaces({ from: 0.1, to: 0.7, log: false });
		expect(even).toHaveLength(200);
		expect([even[0], even.at(-1)]).toEqual([0.1, 0.7]);
		const log = sweepPlaces({ from: 1e-3, to: 1e7, log: true }, false, 11);
		expect([log[0], log.at(-1)]).toEqual([1e-3, 1e7]);
		log.forEach((place, index) => expect(Math.log10(place)).toBeCloseTo(index - 3, 9));
	});

	test('an input of whole numbers gets each of them once', () => {
		expect(sweepPlaces({ from: 1, to: 4, log: false }, true)).toEqual([1, 2, 3, 4]);
	});
});

test('a point is what the calculator reads there', () => {
	const calculator = calculatorOf('projectile.vacuum');
	const inputs = { v0_ms: 124.3, angle_deg: 40 };
	const direct = runCalculator(calculator, { ...inputs, angle_deg: 30 });
	const sweep = { input: 'angle_deg', output: 'range' };
	const [point] = sweptPoints(calculator, inputs, sweep, [30]);
	expect(direct.ok && point?.y === direct.outputs.range?.value).toBe(true);
});

test('outside the domain a point has no reading and says why', () => {
	const calculator = calculatorOf('cosmo.at_z');
	const inputs = { cosmology: { set: 'Planck18' }, z: 1 };
	const [point] = sweptPoints(calculator, inputs, { input: 'z', output: 'age' }, [-2]);
	expect(point).toMatchObject({ y: null, refusal: expect.stringContaining('must be') });
});

test('a parameter of a set is swept without touching the others', () => {
	const calculator = calculatorOf('cosmo.at_z');
	const inputs = { cosmology: { set: 'Simple', Om0: 0.25 }, z: 0 };
	const sweep = { input: 'cosmology.H0', output: 'age' };
	const [slow, fast] = sweptPoints(calculator, inputs, sweep, [35, 70]).map(({ y }) => y);
	// With no radiation the age goes with 1/H₀ exactly.
	expect(Number(slow) / Number(fast)).toBeCloseTo(2, 9);
});

test('of a group only the given one can be swept', () => {
	const keys = sweepables(calculatorOf('line.observe'), { restFrequency_Hz: 1e9, z: 1 }).map(
		({ key }) => key
	);
	expect(keys).toEqual(['restFrequency_Hz', 'z']);
});

test.each([
	['projectile.vacuum', 'angle_deg', { from: -90, to: 90, log: false }],
	['cosmo.at_z', 'z', { from: 0.1, to: 10, log: true }]
])('%s runs along %s at first where it is worth seeing', (id, key, stretch) => {
	const sweepable = sweepables(calculatorOf(id), {}).find((each) => each.key === key)!;
	expect(firstStretch(sweepable, undefined)).toEqual(stretch);
});

test('every stretch offered first lies inside the domain, with its ends in order', () => {
	for (const calculator of catalogue.values()) {
		for (const sweepable of sweepables(calculator, {})) {
			const { from, to, log } = firstStretch(sweepable, undefined);
			const name = `${calculator.id} ${sweepable.key}`;
			expect(from, name).toBeGreaterThanOrEqual(sweepable.spec.min);
			expect(to, name).toBeLessThanOrEqual(sweepable.spec.max);
			expect(from, name).toBeLessThan(to);
			if (log) expect(from, name).toBeGreaterThan(0);
		}
	}
});
