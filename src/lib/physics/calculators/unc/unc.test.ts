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
function codes(id: string, inputs: RawInputs): string[] {
	const result = run(id, inputs);
	if (!result.ok) throw new Error(result.refusal.message);
	return result.warnings.map(({ code }) => code);
}

describe('products of powers', () => {
	// GUM H.2 has R = V/(I cos φ); here its first two factors alone, by hand: (0.003/5)² + (0.01/20)².
	test('relative uncertainties add as squares', () => {
		const { value, u } = outputs('unc.power', {
			terms: [
				[5, 0.003, 1],
				[20, 0.01, -1]
			]
		});
		expect(value).toBe(0.25);
		expect(u).toBeCloseTo(0.25 * Math.hypot(0.0006, 0.0005), 15);
	});

	test('the linear rule is doubted where the curve bends', () => {
		expect(codes('unc.power', { terms: [[10, 0.1, 3]] })).toEqual([]);
		expect(codes('unc.power', { terms: [[10, 4, 3]] })).toEqual(['linear-doubtful']);
		expect(codes('unc.power', { terms: [[10, 40, 1]] })).toEqual([]);
		expect(codes('unc.power', { terms: [[10, 10, -1]] })).toEqual(['linear-doubtful']);
	});
});

describe('sums', () => {
	test('without correlations the parts add as squares', () => {
		expect(outputs('unc.linear', { coeff: [1, -1], u: [0.3, 0.4] }).u).toBeCloseTo(0.5, 14);
	});

	test('wholly correlated parts add, and cancel in a difference', () => {
		const corr = [
			[1, 1],
			[1, 1]
		];
		expect(outputs('unc.linear', { coeff: [1, 1], u: [0.3, 0.4], corr }).u).toBeCloseTo(0.7, 14);
		expect(outputs('unc.linear', { coeff: [1, -1], u: [0.4, 0.4], corr }).u).toBe(0);
	});

	test('lists may be written out as text', () => {
		const written = { coeff: '1, −1', u: '0.3,0.4', corr: '1, 0.5; 0.5, 1' };
		const given = {
			coeff: [1, -1],
			u: [0.3, 0.4],
			corr: [
				[1, 0.5],
				[0.5, 1]
			]
		};
		expect(outputs('unc.linear', written)).toEqual(outputs('unc.linear', given));
	});
});

describe('means', () => {
	test('equal results weigh alike', () => {
		const { mean, u, chi2 } = outputs('unc.weighted_mean', { x: [9, 10, 11], u: [1, 1, 1] });
		expect(mean).toBe(10);
		expect(u).toBeCloseTo(1 / Math.sqrt(3), 14);
		expect(chi2).toBe(2);
	});

	test('results that differ too much say so, and one alone doesn’t', () => {
		expect(codes('unc.weighted_mean', { x: [67.4, 73.04], u: [0.5, 1.04] })).toEqual(['disagree']);
		expect(codes('unc.weighted_mean', { x: [5], u: [1] })).toEqual([]);
	});
});

describe('coverage', () => {
	// JCGM 100:2008, table G.1.
	test.each([
		[1, 68.27],
		[1.645, 90],
		[1.96, 95],
		[2, 95.45],
		[2.576, 99],
		[3, 99.73]
	])('k = %d covers %d per cent', (k, printed) => {
		expect(100 * outputs('unc.asymmetric_interval', { k }).coverage!).toBeCloseTo(printed, 1);
	});

	test('the ends lie k uncertainties out, each to its side', () => {
		const inputs = { k: 2, x: 7.82, uLower: 0.6, uUpper: 0.71 };
		expect(outputs('unc.asymmetric_interval', inputs).low).toBeCloseTo(6.62, 12);
		expect(outputs('unc.asymmetric_interval', inputs).high).toBeCloseTo(9.24, 12);
		expect(codes('unc.asymmetric_interval', { ...inputs, uUpper: 2 })).toEqual(['lopsided']);
	});
});

describe('refusals', () => {
	test.each([
		['unc.power', { terms: [[0, 1, 1]] }, 'zero-factor', 'terms'],
		['unc.power', { terms: [[1, -1, 1]] }, 'negative-uncertainty', 'terms'],
		['unc.power', { terms: [[-2, 1, 0.5]] }, 'root-of-negative', 'terms'],
		['unc.power', { terms: [[1, 1]] }, 'row-broken', 'terms'],
		['unc.power', { terms: [1, 2, 3] }, 'not-a-list', 'terms'],
		['unc.power', { terms: [] }, 'not-a-list', 'terms'],
		['unc.power', { terms: [[1e100, 1, 20]] }, 'no-finite-value', undefined],
		['unc.linear', { coeff: [1], u: [1, 2] }, 'lengths-differ', 'u'],
		['unc.linear', { coeff: [1, 2], u: [1, -2] }, 'out-of-range', 'u'],
		['unc.linear', { coeff: [1, 2], u: [1, 2], corr: [[1, 0]] }, 'no-correlations', 'corr'],
		[
			'unc.linear',
			{
				coeff: [1, 2],
				u: [1, 2],
				corr: [
					[0.9, 0],
					[0, 1]
				]
			},
			'no-correlations',
			'corr'
		],
		[
			'unc.linear',
			{
				coeff: [1, 2],
				u: [1, 2],
				corr: [
					[1, 0.1],
					[0.2, 1]
				]
			},
			'no-correlations',
			'corr'
		],
		[
			'unc.linear',
			{
				coeff: [1, 1, 1],
				u: [1, 1, 1],
				corr: [
					[1, -0.9, -0.9],
					[-0.9, 1, -0.9],
					[-0.9, -0.9, 1]
				]
			},
			'no-correlations',
			'corr'
		],
		['unc.linear', { coeff: 'one, two', u: [1, 2] }, 'not-a-list', 'coeff'],
		['unc.linear', { coeff: '1; 2', u: [1, 2] }, 'not-a-list', 'coeff'],
		['unc.linear', { coeff: Array(21).fill(1), u: [1] }, 'list-too-long', 'coeff'],
		['unc.weighted_mean', { x: [1, 2], u: [1, 0] }, 'out-of-range', 'u'],
		['unc.weighted_mean', { x: [1, 2], u: [1] }, 'lengths-differ', 'u'],
		['unc.weighted_mean', { x: [1, NaN], u: [1, 1] }, 'not-a-list', 'x'],
		['unc.asymmetric_interval', { k: -1 }, 'out-of-range', 'k']
	] as [string, RawInputs, string, string | undefined][])(
		'%s %o: %s',
		(id, inputs, code, input) => {
			const result = run(id, inputs);
			if (result.ok) throw new Error('no refusal');
			expect(result.refusal.code).toBe(code);
			expect(result.refusal.input).toBe(input);
			expect(result.refusal.message).toMatch(/[.?]$/);
		}
	);
});
