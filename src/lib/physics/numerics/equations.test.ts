import { describe, expect, test } from 'vitest';
import { follow, type Motion } from './dormand-prince.ts';
import { solveStiffPair } from './rosenbrock.ts';
import { naturalSpline } from './spline.ts';

const circle: Motion = {
	slope: (_x, [y = 0, v = 0], out) => {
		out[0] = v;
		out[1] = -y;
	},
	x: 0,
	y: [0, 1],
	end: 20 * Math.PI,
	relative: 1e-10,
	absolute: [1e-12, 1e-12],
	mostSteps: 20_000
};

describe('Dormand and Prince', () => {
	test('ten turns of a circle come back to their start', () => {
		const { by, x, y } = follow(circle);
		expect([by, x]).toEqual(['end', 20 * Math.PI]);
		expect(y[0]).toBeCloseTo(0, 8);
		expect(y[1]).toBeCloseTo(1, 8);
	});

	test('the method is of order 5: a tenth of the tolerance takes about 1.6 times the steps', () => {
		const steps = (relative: number) => {
			let count = 0;
			follow({ ...circle, relative, absolute: [0, 0].map(() => relative), onStep: () => count++ });
			return count;
		};
		expect(steps(1e-11) / steps(1e-6)).toBeGreaterThan(8);
		expect(steps(1e-11) / steps(1e-6)).toBeLessThan(12);
	});

	test('an event is found where it falls through 0, to the accuracy of the method', () => {
		const ending = follow({ ...circle, events: [(_x, [y = NaN]) => y] });
		expect(ending).toMatchObject({ by: 'event', event: 0 });
		expect(Math.abs(ending.x - Math.PI)).toBeLessThan(1e-9);
		expect(Math.abs(ending.y[1]! + 1)).toBeLessThan(1e-9);
	});

	test('of two events the first in time ends it, and a dip within one step is not passed over', () => {
		const early = (x: number) => 2 - x;
		const ending = follow({ ...circle, events: [(_x, [y = NaN]) => y, early] });
		expect(ending).toMatchObject({ by: 'event', event: 1 });
		expect(ending.x).toBeCloseTo(2, 12);
		// Nothing moves, so steps grow fast: one goes from about 4 to 20, and the event is below 0 from 5 to 9 only.
		const still = { ...circle, y: [0, 0], end: 40 };
		const dip = follow({ ...still, events: [(x) => (x - 5) * (x - 9)] });
		expect(dip.x).toBeCloseTo(5, 9);
	});

	test('stops with what it has when more steps would be needed than allowed', () => {
		const ending = follow({ ...circle, mostSteps: 10 });
		expect(ending.by).toBe('exhaustion');
		expect(ending.x).toBeLessThan(circle.end);
	});

	test('a state that runs over is exhaustion, not an endless loop', () => {
		const blowUp = follow({
			...circle,
			slope: (_x, [y = 0], out) => {
				out[0] = y * y;
				out[1] = 0;
			},
			y: [1, 0]
		});
		expect(blowUp.by).toBe('exhaustion');
		expect(blowUp.x).toBeLessThan(1.01);
	});
});

describe('Rosenbrock', () => {
	// Kaps 1981: y₁ = e^(−2x), y₂ = e^(−x) exactly, whatever the stiffness.
	const kaps =
		(stiffness: number) =>
		(_x: number, [a, b]: readonly [number, number]) =>
			[-(stiffness + 2) * a + stiffness * b * b, a - b * (1 + b)] as const;

	test.each([
		[1, 1e-8],
		[1e3, 1e-8],
		[1e6, 1e-6]
	])('the problem of Kaps with stiffness %d', (stiffness, tolerance) => {
		const stops = [0.5, 1, 2];
		const states = solveStiffPair(kaps(stiffness), { x: 0, y: [1, 1] }, stops, tolerance, 5000);
		for (const [i, x] of stops.entries()) {
			expect(Math.abs((states?.[i]?.[0] ?? NaN) / Math.exp(-2 * x) - 1)).toBeLessThan(
				30 * tolerance
			);
			expect(Math.abs((states?.[i]?.[1] ?? NaN) / Math.exp(-x) - 1)).toBeLessThan(tolerance);
		}
	});

	test('goes backwards, keeps to stops at its start, and gives up when told to', () => {
		const grown = solveStiffPair(
			kaps(1),
			{ x: 1, y: [Math.exp(-2), Math.exp(-1)] },
			[1, 0],
			1e-8,
			5000
		);
		expect(grown?.[0]?.[1]).toBe(Math.exp(-1));
		expect(grown?.[1]?.[1]).toBeCloseTo(1, 6);
		expect(solveStiffPair(kaps(1e6), { x: 0, y: [1, 1] }, [2], 1e-12, 20)).toBeUndefined();
	});
});

describe('natural spline', () => {
	// Burden & Faires, Numerical Analysis, 9th edition, §3.5, example 1 (from memory): through (1,2), (2,3), (3,5).
	test('the worked example', () => {
		const curve = naturalSpline([1, 2, 3], [2, 3, 5]);
		const printed = (x: number) =>
			x < 2
				? 2 + 0.75 * (x - 1) + 0.25 * (x - 1) ** 3
				: 3 + 1.5 * (x - 2) + 0.75 * (x - 2) ** 2 - 0.25 * (x - 2) ** 3;
		for (const x of [1, 1.3, 2, 2.5, 3]) expect(curve(x)).toBeCloseTo(printed(x), 14);
	});

	test('goes through its points, follows a line exactly and holds its ends', () => {
		const xs = [-1, 0, 0.5, 2, 7];
		const line = naturalSpline(
			xs,
			xs.map((x) => 3 * x - 1)
		);
		for (const x of [-1, -0.2, 0.7, 5, 7]) expect(line(x)).toBeCloseTo(3 * x - 1, 12);
		expect(line(-5)).toBe(-4);
		expect(line(70)).toBe(20);
	});
});
