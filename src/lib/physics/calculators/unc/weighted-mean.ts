import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import { gum, OWN_UNIT } from './sources.ts';
import { checksOf } from '../published-checks.ts';

/** Mean of independent results weighted by 1/u², its standard uncertainty, and χ² of the results about it. */
export const weightedMean = defineCalculator({
	id: 'unc.weighted_mean',
	revision: '1.0.0',
	title: 'Mean of several measurements',
	purpose: 'What do several measurements say together, and do they agree with one another?',
	asks: ['How are measurements combined?', 'Do these two results disagree?'],
	notFor: ['Results that share data or errors.', 'Covering up a disagreement.'],
	inputs: {
		x: {
			kind: 'list',
			label: 'Results',
			symbol: 'x',
			shape: 'row',
			min: -1e100,
			max: 1e100,
			longest: 100,
			initial: '9.81, 9.79'
		},
		u: {
			kind: 'list',
			label: 'Standard uncertainty of each',
			symbol: 'u',
			shape: 'row',
			min: 1e-100,
			max: 1e100,
			longest: 100,
			initial: '0.02, 0.03'
		}
	},
	outputs: {
		mean: { label: 'Weighted mean', quantity: 'number', unit: '' },
		u: { label: 'Standard uncertainty', symbol: 'u', quantity: 'number', unit: '' },
		chi2: {
			label: 'Scatter compared with the uncertainties',
			symbol: 'χ²',
			quantity: 'number',
			unit: ''
		}
	},
	equations: [
		{
			tex: '\\bar x = \\frac{\\sum x_i/u_i^2}{\\sum 1/u_i^2},\\qquad u = \\Bigl(\\sum 1/u_i^2\\Bigr)^{-1/2}',
			says: 'Well-known results count more; together they are known better than the best one.'
		},
		{
			tex: '\\chi^2 = \\sum\\frac{(x_i-\\bar x)^2}{u_i^2}',
			says: 'Results that agree give about one less than their number.'
		}
	],
	assumptions: ['The results are independent, and each uncertainty is right.', OWN_UNIT],
	warnings: [
		{
			code: 'disagree',
			message:
				'The results differ by more than their uncertainties allow: their mean is no better known than they agree. Say that they differ.',
			when: 'χ² more than two standard deviations above one less than the number of results',
			validity: 'approximate'
		}
	],
	sources: [
		gum('5.1.2; weights of 1/u²'),
		{
			title: 'Particle Data Group, Review of Particle Physics',
			locator: 'introduction, §5.2.2: unconstrained averaging',
			fromMemory: true
		}
	],
	checks: checksOf('unc.weighted_mean'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute(inputs): Computed {
		const x = inputs.x as number[];
		const own = inputs.u as number[];
		if (own.length !== x.length) {
			return refuse(
				'lengths-differ',
				`There are ${x.length} results and ${own.length} uncertainties. Give as many of one as of the other.`,
				'u'
			);
		}
		const best = Math.min(...own);
		const weights = own.map((one) => (best / one) ** 2);
		const total = weights.reduce((sum, weight) => sum + weight, 0);
		// About the first result, so that results near one another keep their digits.
		const [first = NaN] = x;
		const mean =
			first + x.reduce((sum, one, i) => sum + (weights[i] ?? NaN) * (one - first), 0) / total;
		const chi2 = x.reduce((sum, one, i) => sum + ((one - mean) / (own[i] ?? NaN)) ** 2, 0);
		const values = { mean, u: best / Math.sqrt(total), chi2 };
		const free = x.length - 1;
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: chi2 > free + 2 * Math.sqrt(2 * free) ? ['disagree'] : []
		};
	}
});
