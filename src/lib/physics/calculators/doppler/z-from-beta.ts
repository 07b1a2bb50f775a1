import { defineCalculator, type Computed } from '../../calculator.ts';
import { lessOne } from '../relativity/lorentz.ts';
import { DOPPLER_SOURCES, radialRedshift, speedShareInput } from './moving-source.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Redshift of a moving source from its speed as a share of that of light, in (−1, 1): straight away, √((1+β)/(1−β)) − 1;
 * across the line of sight, γ − 1. Both in forms that keep their digits at small speeds.
 */
export const zFromBeta = defineCalculator({
	id: 'doppler.z_from_beta',
	revision: '1.0.0',
	title: 'Doppler shift from a speed',
	purpose: 'A source moves at a known speed: how much is its light shifted?',
	asks: [
		'What redshift does this speed give?',
		'How much bluer is a star that comes towards us?',
		'Is light shifted when the source passes by?'
	],
	notFor: ['Galaxies carried by expansion.', 'Sound.'],
	inputs: { beta: speedShareInput },
	outputs: {
		z: {
			label: 'Redshift when it moves straight away',
			symbol: 'z',
			quantity: 'redshift',
			unit: ''
		},
		transverse_z: {
			label: 'Redshift when it moves across',
			symbol: 'z_⊥',
			quantity: 'redshift',
			unit: ''
		}
	},
	equations: [
		{
			tex: '1+z = \\sqrt{\\frac{1+\\beta}{1-\\beta}}',
			says: 'Moving away stretches light; moving towards us, with β below 0, shortens it.'
		},
		{
			tex: '1+z_\\perp = \\gamma = \\frac{1}{\\sqrt{1-\\beta^2}}',
			says: 'A source that moves across is redshifted too, since its clock runs slow.'
		}
	],
	assumptions: [
		'The source moves through space, and nothing else shifts its light.',
		'A speed above 0 is away from us.'
	],
	warnings: [],
	sources: DOPPLER_SOURCES,
	checks: checksOf('doppler.z_from_beta'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ beta }): Computed {
		const values = { z: radialRedshift(beta), transverse_z: lessOne(beta) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
