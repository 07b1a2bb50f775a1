import { defineCalculator, type Computed } from '../../calculator.ts';
import { DOPPLER_SOURCES, LIGHT_SPEED_KMS, radialRedshift } from './moving-source.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Redshift observed from a galaxy that moves through space (km/s, away from us above 0) while space carries it:
 * 1 + z = (1 + z_space)(1 + z_motion). Redshifts multiply; they never add.
 */
export const combine = defineCalculator({
	id: 'doppler.combine',
	revision: '1.0.0',
	title: 'Expansion and motion together',
	purpose:
		'Space carries a galaxy away and it moves on its own besides: which redshift is observed?',
	asks: [
		'What does a galaxy’s own motion do to its redshift?',
		'How do two redshifts add up?',
		'Why is a nearby galaxy’s redshift no good measure of distance?'
	],
	notFor: ['Finding the two parts from one observed redshift: that needs a distance.'],
	inputs: {
		zcos: {
			kind: 'number',
			label: 'Redshift from expansion alone',
			symbol: 'z_exp',
			quantity: 'redshift',
			unit: '',
			min: -1,
			minExclusive: true,
			max: 1e5,
			initial: 0.02
		},
		vpec_kms: {
			kind: 'number',
			label: 'The galaxy’s own speed, away from us',
			symbol: 'v',
			quantity: 'speed',
			unit: 'km/s',
			min: -LIGHT_SPEED_KMS,
			minExclusive: true,
			max: LIGHT_SPEED_KMS,
			maxExclusive: true,
			good: { min: -3000, max: 3000, warning: 'too-fast' },
			initial: 300
		}
	},
	outputs: { z: { label: 'Redshift observed', symbol: 'z', quantity: 'redshift', unit: '' } },
	equations: [
		{
			tex: '1+z = (1+z_\\mathrm{exp})(1+z_\\mathrm{own})',
			says: 'One stretch follows the other, so the factors multiply.'
		},
		{
			tex: '1+z_\\mathrm{own} = \\sqrt{\\frac{1+v/c}{1-v/c}}',
			says: 'The galaxy’s own motion shifts light as any motion does.'
		}
	],
	assumptions: [
		'The galaxy’s own motion lies along the line of sight.',
		'Our own motion has been taken out already.'
	],
	warnings: [
		{
			code: 'too-fast',
			message: 'Galaxies seldom move through space at more than 3000 kilometres a second.',
			when: 'own speed beyond 3000 km/s either way',
			validity: 'approximate'
		}
	],
	sources: [
		{
			title: 'Davis & Scrimgeour 2014, Deriving accurate peculiar velocities, MNRAS 442, 1117',
			doi: '10.1093/mnras/stu920'
		},
		{ title: 'Harrison 1993, The redshift-distance and velocity-distance laws, ApJ 403, 28' },
		...DOPPLER_SOURCES
	],
	checks: checksOf('doppler.combine'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ zcos, vpec_kms }): Computed {
		const own = radialRedshift(vpec_kms / LIGHT_SPEED_KMS);
		const values = { z: zcos + own + zcos * own };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
