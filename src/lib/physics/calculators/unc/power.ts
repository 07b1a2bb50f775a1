import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import { gum, OWN_UNIT, plain } from './sources.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Value and standard uncertainty of a product of powers C × x₁^p₁ × x₂^p₂ …, by the linear rule: (u/y)² = Σ(pᵢuᵢ/xᵢ)².
 * Refuses a factor of 0, and roots of negative factors.
 */
export const power = defineCalculator({
	id: 'unc.power',
	revision: '1.0.0',
	title: 'Uncertainty of a product of powers',
	purpose: 'How well is a product or quotient known, when its factors are known so well?',
	asks: ['How do relative uncertainties add?', 'How well is 1/H₀ known?'],
	notFor: ['Factors that depend on one another.', 'Sums: use the sum with correlations.'],
	inputs: {
		C: {
			...plain('Exact factor in front', 'C', [-1e300, 1e300, 1]),
			optional: true
		},
		terms: {
			kind: 'list',
			label: 'Factors, each with its uncertainty and power',
			symbol: 'x, u, p',
			shape: 'rows',
			columns: ['value', 'uncertainty', 'power'],
			min: -1e150,
			max: 1e150,
			longest: 20,
			initial: '67.66, 0.42, -1'
		}
	},
	outputs: {
		value: { label: 'Value', symbol: 'y', quantity: 'number', unit: '' },
		u: { label: 'Standard uncertainty', symbol: 'u', quantity: 'number', unit: '' }
	},
	equations: [
		{
			tex: 'y = C\\prod_i x_i^{p_i},\\qquad \\left(\\frac{u}{y}\\right)^2 = \\sum_i\\left(\\frac{p_i u_i}{x_i}\\right)^2',
			says: 'Relative uncertainties, each times its power, add as squares.'
		}
	],
	assumptions: ['The factors are independent of one another.', OWN_UNIT],
	warnings: [
		{
			code: 'linear-doubtful',
			message:
				'The uncertainties are so large that the linear rule is doubtful: the real spread is lopsided.',
			when: '|f(x+u) + f(x−u) − 2f(x)| above a fifth of |f(x+u) − f(x−u)| for any factor',
			validity: 'approximate'
		}
	],
	sources: [gum('5.1.6, and 5.1.2 note for the limits of the linear rule')],
	checks: checksOf('unc.power'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ C, terms }): Computed {
		let value: number = C;
		let squares = 0;
		let isDoubtful = false;
		for (const [x, u, p] of terms as [number, number, number][]) {
			if (u < 0) return refuse('negative-uncertainty', 'An uncertainty can’t be below 0.', 'terms');
			if (x === 0) {
				return refuse(
					'zero-factor',
					'A factor of 0 has no relative uncertainty. Give factors other than 0.',
					'terms'
				);
			}
			if (x < 0 && !Number.isInteger(p)) {
				return refuse(
					'root-of-negative',
					'A negative factor takes whole powers only. Give a whole power, or a factor above 0.',
					'terms'
				);
			}
			value *= x ** p;
			squares += ((p * u) / x) ** 2;
			isDoubtful ||= isBent(u / Math.abs(x), p);
		}
		const values = { value, u: Math.abs(value) * Math.sqrt(squares) };
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: isDoubtful ? ['linear-doubtful'] : []
		};
	}
});

/** Whether x^p bends too much over x ± u for the linear rule. */
function isBent(relative: number, p: number): boolean {
	if (relative >= 1) return p !== 1 && p !== 0;
	const high = (1 + relative) ** p;
	const low = (1 - relative) ** p;
	return Math.abs(high + low - 2) > 0.2 * Math.abs(high - low);
}
