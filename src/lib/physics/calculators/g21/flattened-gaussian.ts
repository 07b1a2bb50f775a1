import { defineCalculator, type Computed } from '../../calculator.ts';
import { DISPUTED_TROUGH, SIGN_CONVENTION, SINGH_2022, troughWarnings } from './signal.ts';
import { amplitude, megahertz, profile } from './trough-inputs.ts';
import { checksOf } from '../published-checks.ts';

/**
 * A trough with a flat floor: −A(1 − e^(−τe^B))/(1 − e^(−τ)) in K, with full width w at half depth in MHz. At τ = 0 it is
 * a bell.
 */
export const flattenedGaussian = defineCalculator({
	id: 'g21.flattened_gaussian',
	revision: '1.0.0',
	title: 'Trough with a flat floor',
	purpose: 'What does a trough with a flat floor read at a frequency?',
	asks: ['What did the reported profile look like?', 'How wide is the trough?'],
	notFor: ['Physics: this is a shape to fit, nothing more.'],
	inputs: {
		A: amplitude(0.5),
		nu: megahertz('Frequency', 'ν', 80),
		nu0: megahertz('Middle of the trough', 'ν_0', 78),
		w: megahertz('Full width at half depth', 'w', 19, 'bandwidth'),
		tau: {
			kind: 'number',
			label: 'Flatness of the floor',
			symbol: 'τ',
			quantity: 'number',
			unit: '',
			min: 0,
			max: 1000,
			initial: 7
		}
	},
	outputs: { T: profile },
	equations: [
		{
			tex: 'T = -A\\,\\frac{1-e^{-\\tau e^{B}}}{1-e^{-\\tau}},\\qquad B = \\frac{4(\\nu-\\nu_0)^2}{w^2}\\,\\ln\\!\\left[-\\frac{1}{\\tau}\\ln\\frac{1+e^{-\\tau}}{2}\\right]',
			says: 'A bell whose bottom has been pressed flat, with its width at half depth kept.'
		}
	],
	assumptions: [
		SIGN_CONVENTION,
		'τ is a number of the fit, not an optical depth that was measured.'
	],
	warnings: [DISPUTED_TROUGH],
	sources: [
		{
			title: 'Hills et al. 2018, Nature 564, E32',
			locator: 'the form of the profile; 0.5 K, 78 MHz, 19 MHz, τ = 7 as example',
			doi: '10.1038/s41586-018-0796-5',
			fromMemory: true
		},
		SINGH_2022
	],
	checks: checksOf('g21.flattened_gaussian'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ A, nu, nu0, w, tau }): Computed {
		// log1p and expm1 keep the digits of a small τ, where the floor is hardly flat.
		const half = tau === 0 ? 0.5 : -Math.log1p(Math.expm1(-tau) / 2) / tau;
		const bell = Math.exp(4 * ((nu - nu0) / w) ** 2 * Math.log(half));
		const shape = tau === 0 ? bell : Math.expm1(-tau * bell) / Math.expm1(-tau);
		const values = { T: -A * shape };
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: troughWarnings(-1000 * A, nu0)
		};
	}
});
