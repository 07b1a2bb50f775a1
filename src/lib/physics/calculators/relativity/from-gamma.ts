import { defineCalculator, type Computed } from '../../calculator.ts';
import { checksOf } from '../published-checks.ts';
import { EINSTEIN_1905 } from '../sources.ts';

/**
 * Speed from a Lorentz factor (1 to 10¹⁰⁰): β = √((γ−1)(γ+1))/γ, and what is missing to the speed of light,
 * 1/(γ²(1+β)), which keeps its digits when β prints as 1.
 */
export const fromGamma = defineCalculator({
	id: 'sr.from_gamma',
	revision: '1.0.0',
	title: 'Speed from a Lorentz factor',
	purpose: 'A particle has this Lorentz factor: how close to the speed of light is it?',
	asks: [
		'How fast are protons in a collider?',
		'How much slower than light is this particle?',
		'At what speed does a clock run ten times slow?'
	],
	notFor: ['Clocks in strong gravity.', 'Galaxies carried by expansion.'],
	inputs: {
		gamma: {
			kind: 'number',
			label: 'Lorentz factor',
			symbol: 'γ',
			quantity: 'lorentz-factor',
			unit: '',
			min: 1,
			max: 1e100,
			initial: 10,
			log: true
		}
	},
	outputs: {
		beta: {
			label: 'Speed as a share of that of light',
			symbol: 'β',
			quantity: 'speed-share',
			unit: ''
		},
		one_minus_beta: {
			label: 'Share that is missing to the speed of light',
			symbol: '1−β',
			quantity: 'fraction',
			unit: ''
		}
	},
	equations: [
		{
			tex: '\\beta = \\sqrt{1-\\frac{1}{\\gamma^2}}',
			says: 'However large the factor, the speed stays below that of light.'
		},
		{
			tex: '1-\\beta = \\frac{1}{\\gamma^2(1+\\beta)}',
			says: 'What is missing falls with the square of the factor.'
		}
	],
	assumptions: ['Flat space: no gravity.'],
	warnings: [],
	sources: [EINSTEIN_1905],
	checks: checksOf('sr.from_gamma'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ gamma }): Computed {
		// The two roots apart, as their product would overflow for the largest factors.
		const beta = (Math.sqrt(gamma - 1) * Math.sqrt(gamma + 1)) / gamma;
		const values = { beta: Math.min(1, beta), one_minus_beta: 1 / (gamma * gamma * (1 + beta)) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
