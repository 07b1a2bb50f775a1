import { defineCalculator, type Computed } from '../../calculator.ts';
import { erf } from '../../numerics/erf.ts';
import { gum, OWN_UNIT, plain } from './sources.ts';
import { checksOf } from '../published-checks.ts';

/** The interval from k lower to k upper uncertainties about a value, and the share of a normal spread that it covers. */
export const asymmetricInterval = defineCalculator({
	id: 'unc.asymmetric_interval',
	revision: '1.0.0',
	title: 'Interval and coverage',
	purpose:
		'What interval do so many standard uncertainties span, and how much of the spread does it cover?',
	asks: ['What does two sigma mean?', 'Is this range 68 or 95 per cent?'],
	notFor: ['Spreads that are far from normal.'],
	inputs: {
		k: { ...plain('Number of standard uncertainties', 'k', [0, 100, 2]) },
		x: { ...plain('Value', 'x', [-1e100, 1e100, 0]), optional: true },
		uLower: { ...plain('Uncertainty downwards', 'u_-', [0, 1e100, 1]), optional: true },
		uUpper: { ...plain('Uncertainty upwards', 'u_+', [0, 1e100, 1]), optional: true }
	},
	outputs: {
		coverage: { label: 'Share covered', quantity: 'fraction', unit: '' },
		low: { label: 'Lower end', quantity: 'number', unit: '' },
		high: { label: 'Upper end', quantity: 'number', unit: '' }
	},
	equations: [
		{
			tex: 'p = \\operatorname{erf}\\frac{k}{\\sqrt 2},\\qquad [\\,x - k u_-,\\; x + k u_+\\,]',
			says: 'One standard uncertainty to each side covers about 68 per cent, two about 95.'
		}
	],
	assumptions: [
		'A normal spread; a lopsided one is two halves of normal curves joined at the value, for which the share is the same.',
		OWN_UNIT
	],
	warnings: [
		{
			code: 'lopsided',
			message:
				'The two sides are so unlike that a normal spread is doubtful; look at the real distribution.',
			when: 'one side more than twice the other',
			validity: 'approximate'
		}
	],
	sources: [gum('6.2.2 and annex G')],
	checks: checksOf('unc.asymmetric_interval'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ k, x, uLower, uUpper }): Computed {
		const values = {
			coverage: erf(k / Math.SQRT2),
			low: x - k * uLower,
			high: x + k * uUpper
		};
		const isLopsided = uUpper > 2 * uLower || uLower > 2 * uUpper;
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: isLopsided ? ['lopsided'] : []
		};
	}
});
