import { describe, expect, test } from 'vitest';
import { propagateByDraws } from './monte-carlo.ts';
import { propagate, type Model, type Propagated } from './propagate.ts';
import type { Spread } from './spread.ts';

const DRAWS = 10_000;

function spreadOf(
	quantities: Record<string, [value: number, u: number]>,
	correlations: Spread['correlations'] = []
): Spread {
	return {
		quantities: Object.entries(quantities).map(([name, [value, u]]) => ({ name, value, u })),
		correlations
	};
}

function one(model: Model, spread: Spread, own = 0): Propagated {
	return propagate(model, spread, [own], DRAWS)[0]!;
}

describe('the law of propagation', () => {
	test('of independent quantities: a sum and a product by hand', () => {
		const spread = spreadOf({ x: [3, 0.03], y: [4, 0.04] });
		const [sum, product] = propagate(([x = 0, y = 0]) => [x + y, x * y], spread, [0, 0], DRAWS);
		expect(sum).toMatchObject({ ok: true, u: expect.closeTo(0.05, 12) });
		expect(product).toMatchObject({ ok: true, u: expect.closeTo(12 * Math.SQRT2 * 0.01, 12) });
	});

	test('what a reading has of its own adds as a square', () => {
		expect(one(([x = 0]) => [2 * x], spreadOf({ x: [1, 0.015] }), 0.04)).toMatchObject({
			u: expect.closeTo(0.05, 12)
		});
	});

	test('a difference of wholly correlated quantities is exact, a sum doubles', () => {
		const spread = spreadOf({ x: [10, 0.5], y: [7, 0.5] }, [['x', 'y', 1]]);
		const [difference, sum] = propagate(([x = 0, y = 0]) => [x - y, x + y], spread, [0, 0], DRAWS);
		expect(difference).toMatchObject({ ok: true, u: expect.closeTo(0, 12) });
		expect(sum).toMatchObject({ ok: true, u: expect.closeTo(1, 12) });
	});

	// JCGM 100:2008, H.2, tables H.2 to H.4 (from memory): resistance, reactance and impedance from V, I and φ measured
	// together: 127.732(71) Ω, 219.847(295) Ω, 254.260(236) Ω.
	test('the guide’s own example of correlated quantities', () => {
		const spread = spreadOf(
			{ V: [4.999, 0.0032], I: [19.661e-3, 9.5e-6], phi: [1.04446, 0.00075] },
			[
				['V', 'I', -0.36],
				['V', 'phi', 0.86],
				['I', 'phi', -0.65]
			]
		);
		const model: Model = ([V = 0, I = 0, phi = 0]) => [
			(V / I) * Math.cos(phi),
			(V / I) * Math.sin(phi),
			V / I
		];
		const [resistance, reactance, impedance] = propagate(model, spread, [0, 0, 0], DRAWS);
		// The correlations are printed to two digits, which moves the last digit of u.
		expect(resistance).toMatchObject({ u: expect.closeTo(0.071, 2) });
		expect(reactance).toMatchObject({ u: expect.closeTo(0.295, 2) });
		expect(impedance).toMatchObject({ u: expect.closeTo(0.236, 2) });
	});

	test('correlations that can’t all hold are told', () => {
		const spread = spreadOf({ x: [1, 1], y: [1, 1], z: [1, 1] }, [
			['x', 'y', 0.9],
			['y', 'z', 0.9],
			['x', 'z', -0.9]
		]);
		expect(one(([x = 0]) => [x], spread)).toMatchObject({ ok: false });
	});
});

describe('seeded draws', () => {
	// JCGM 101: for a linear model the draws must repeat the law of propagation, within the scatter of N draws.
	test('repeat the straight line, with correlations', () => {
		const spread = spreadOf({ x: [3, 0.3], y: [4, 0.4] }, [['x', 'y', -0.7]]);
		const model: Model = ([x = 0, y = 0]) => [2 * x + y];
		const straight = propagate(model, spread, [0.1], 0)[0]!;
		const drawn = propagateByDraws(model, spread, [0.1], DRAWS)[0]!;
		if (!straight.ok || !drawn.ok) throw new Error('both have an answer');
		const { u } = straight;
		expect(Math.abs(drawn.u - u)).toBeLessThan((5 * u) / Math.sqrt(2 * DRAWS));
		// The median of N normal draws scatters by u √(π/2N).
		expect(Math.abs(drawn.median - 10)).toBeLessThan(5 * u * Math.sqrt(Math.PI / 2 / DRAWS));
		// A 2.5 per cent point scatters by u √(0.025·0.975/N)/φ(1.96), φ(1.96) = 0.05845.
		const scatter = (u * Math.sqrt((0.025 * 0.975) / DRAWS)) / 0.05845;
		expect(Math.abs(drawn.low - (10 - 1.959964 * u))).toBeLessThan(5 * scatter);
		expect(Math.abs(drawn.high - (10 + 1.959964 * u))).toBeLessThan(5 * scatter);
	});

	// x² about x = 0 is χ² with one degree of freedom: median 0.454936, 2.5 and 97.5 per cent points 0.000982 and
	// 5.023886, standard deviation √2 (any table of χ²). The straight line would say 0.
	test('take over where the straight line is doubtful', () => {
		const outcome = one(([x = 0]) => [x * x], spreadOf({ x: [0, 1] }));
		if (!outcome.ok || !outcome.drawn) throw new Error('it must be drawn');
		expect(outcome.drawn.draws).toBe(DRAWS);
		// The fourth moment of χ² makes its deviation scatter by √((κ−1)/4N)·√2, κ = 15.
		expect(Math.abs(outcome.u - Math.SQRT2)).toBeLessThan(
			5 * Math.SQRT2 * Math.sqrt(14 / 4 / DRAWS)
		);
		expect(outcome.drawn.median).toBeCloseTo(0.454936, 1);
		expect(outcome.drawn.low).toBeLessThan(0.003);
		expect(Math.abs(outcome.drawn.high - 5.023886)).toBeLessThan(0.4);
	});

	// A lognormal of σ = 0.5: median 1, standard deviation √((e^σ² − 1) e^σ²).
	test('keep a lopsided spread lopsided', () => {
		const outcome = one(([x = 0]) => [Math.exp(x)], spreadOf({ x: [0, 0.5] }));
		if (!outcome.ok || !outcome.drawn) throw new Error('it must be drawn');
		const deviation = Math.sqrt(Math.expm1(0.25) * Math.exp(0.25));
		expect(Math.abs(outcome.u / deviation - 1)).toBeLessThan(0.06);
		expect(outcome.drawn.median).toBeCloseTo(1, 1);
		expect(outcome.drawn.high - 1).toBeGreaterThan(2 * (1 - outcome.drawn.low));
	});

	test('are the same every time, and others for other inputs', () => {
		const at = (value: number) => one(([x = 0]) => [x * x], spreadOf({ x: [value, 1] }));
		expect(at(0)).toEqual(at(0));
		expect(at(0)).not.toEqual(at(1e-6));
	});

	test('1/x about nought has no standard uncertainty, and none is made up', () => {
		expect(one(([x = 0]) => [1 / x], spreadOf({ x: [0.5, 1] }))).toEqual({
			ok: false,
			reason: expect.stringMatching(/tails/)
		});
	});

	test('an input that may lie where the model refuses leaves nothing available', () => {
		const root: Model = ([x = 0]) => [x < 0 ? null : Math.sqrt(x)];
		expect(one(root, spreadOf({ x: [0.5, 1] }))).toMatchObject({ ok: false });
		expect(one(root, spreadOf({ x: [2.5, 1] }))).toMatchObject({ ok: true });
		const bent: Model = ([x = 0]) => [x < 0 ? null : (x - 2) ** 2];
		expect(one(bent, spreadOf({ x: [2, 1] }))).toMatchObject({ ok: false });
	});

	test('aren’t made where a bend is far below the rest of the uncertainty', () => {
		let calls = 0;
		const model: Model = ([x = 0, y = 0]) => {
			calls += 1;
			return [x * x + 1000 * y];
		};
		expect(one(model, spreadOf({ x: [0, 1], y: [0, 1] }))).toMatchObject({
			u: expect.closeTo(1000, 6)
		});
		expect(calls).toBe(5);
	});
});
