import { expect, test } from 'vitest';
import { gaussLegendre } from './quadrature.ts';
import { RUNNING_NODES, runningCoefficients, runningMean } from './running-integral.ts';

const LENGTH = 0.125;
const SHARES = [0, 1e-12, 1e-6, 0.01, 0.3, 0.5, 0.77, 0.999, 1];

function means(f: (s: number) => number): number[] {
	const coefficients = runningCoefficients(RUNNING_NODES.map((s) => f(LENGTH * s)));
	return SHARES.map((share) => runningMean(coefficients, share));
}

// Closed forms: (1/x) ∫₀ˣ eᵏᵗ dt = (eᵏˣ − 1)/(kx), and (1/x) ∫₀ˣ t¹¹ dt = x¹¹/12.
test.each([-10.5, -2, -1.5, 0.5, 3])(
	'the mean of an exponential of %d, short ways and long',
	(k) => {
		means((t) => Math.exp(k * t)).forEach((mean, index) => {
			const x = k * LENGTH * SHARES[index]!;
			const wanted = x === 0 ? 1 : Math.expm1(x) / x;
			expect(Math.abs(mean / wanted - 1)).toBeLessThan(2e-14);
		});
	}
);

test('a polynomial of the eleventh degree is integrated exactly', () => {
	const coefficients = runningCoefficients(RUNNING_NODES.map((s) => s ** 11));
	expect(runningMean(coefficients, 1)).toBeCloseTo(1 / 12, 14);
	expect(runningMean(coefficients, 0.5)).toBeCloseTo(0.5 ** 11 / 12, 15);
});

test('no worse than many nodes of Gauss for what has no closed form', () => {
	const f = (t: number) => 1 / Math.sqrt(0.7 + 0.3 * Math.exp(3 * t));
	const nodes = gaussLegendre(40);
	means(f).forEach((mean, index) => {
		const way = LENGTH * SHARES[index]!;
		const wanted = nodes.reduce((sum, { at, weight }) => sum + weight * f(way * at), 0);
		expect(Math.abs(mean / wanted - 1)).toBeLessThan(1e-15 * 8);
	});
});
