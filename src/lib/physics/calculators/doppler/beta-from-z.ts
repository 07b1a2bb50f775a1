import { defineCalculator, type Computed } from '../../calculator.ts';
import { DOPPLER_SOURCES, LIGHT_SPEED_KMS, NOT_EXPANSION } from './moving-source.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Speed of a source that moves straight along the line of sight, from its redshift in (−1, 10⁵]:
 * β = z(2+z)/(1+(1+z)²), with 1 − β apart because it keeps its digits near the speed of light. Special relativity only.
 */
export const betaFromZ = defineCalculator({
	id: 'doppler.beta_from_z',
	revision: '1.0.0',
	title: 'Speed from a Doppler shift',
	purpose:
		'A source moves straight away from us or towards us: how fast, by the shift of its light?',
	asks: [
		'How fast does this star move away?',
		'What speed does a redshift stand for?',
		'How close to the speed of light is that?'
	],
	notFor: [
		'Galaxies carried by expansion: use the recession speeds of the expanding universe.',
		'Sources that move across the line of sight.'
	],
	inputs: {
		z: {
			kind: 'number',
			label: 'Redshift',
			symbol: 'z',
			quantity: 'redshift',
			unit: '',
			min: -1,
			minExclusive: true,
			max: 1e5,
			initial: 0.001
		}
	},
	outputs: {
		beta: {
			label: 'Speed as a share of that of light',
			symbol: 'β',
			quantity: 'speed-share',
			unit: ''
		},
		velocity: { label: 'Speed away from us', symbol: 'v', quantity: 'speed', unit: 'km/s' },
		one_minus_beta: {
			label: 'Share that is missing to the speed of light',
			symbol: '1−β',
			quantity: 'fraction',
			unit: ''
		}
	},
	equations: [
		{
			tex: '1+z = \\sqrt{\\frac{1+\\beta}{1-\\beta}}',
			says: 'Light from a source that moves away is stretched by this factor.'
		},
		{
			tex: '\\beta = \\frac{z(2+z)}{1+(1+z)^2}',
			says: 'Turned round, the stretch tells the speed.'
		}
	],
	assumptions: [
		'The source moves through space along the line of sight, and nothing else shifts its light.',
		'A speed above 0 is away from us.'
	],
	warnings: [NOT_EXPANSION],
	sources: DOPPLER_SOURCES,
	checks: checksOf('doppler.beta_from_z'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ z }): Computed {
		const stretch = 1 + z;
		const values = {
			beta: (z * (2 + z)) / (1 + stretch * stretch),
			velocity: (LIGHT_SPEED_KMS * (z * (2 + z))) / (1 + stretch * stretch),
			one_minus_beta: 2 / (1 + stretch * stretch)
		};
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: z > 0.01 ? [NOT_EXPANSION.code] : []
		};
	}
});
