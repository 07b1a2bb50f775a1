import { defineCalculator, type Computed } from '../../calculator.ts';
import { cosineOfDegrees, sineOfDegrees } from '../../numerics/degrees.ts';
import { lessOne, lorentzFactor } from '../relativity/lorentz.ts';
import { DOPPLER_SOURCES, radialRedshift } from './moving-source.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Redshift of a source that moves at a slant: 1 + z = γ(1 + β cos θ), θ in degrees as seen by us when the light left,
 * 0 straight away and 180 straight towards us. β in [0, 1).
 */
export const zGeneral = defineCalculator({
	id: 'doppler.z_general',
	revision: '1.0.0',
	title: 'Doppler shift at a slant',
	purpose: 'A source moves at an angle to our line of sight: how much is its light shifted?',
	asks: ['What shift does a jet that points past us show?', 'At which angle is there no shift?'],
	notFor: ['Galaxies carried by expansion.', 'Sound.'],
	inputs: {
		beta: {
			kind: 'number',
			label: 'Speed as a share of that of light',
			symbol: 'β',
			quantity: 'speed-share',
			unit: '',
			min: 0,
			max: 1,
			maxExclusive: true,
			initial: 0.6
		},
		theta_deg: {
			kind: 'number',
			label: 'Angle between its way and straight away from us',
			symbol: 'θ',
			quantity: 'angle',
			unit: 'deg',
			min: 0,
			max: 180,
			initial: 60
		}
	},
	outputs: { z: { label: 'Redshift', symbol: 'z', quantity: 'redshift', unit: '' } },
	equations: [
		{
			tex: '1+z = \\gamma\\,(1+\\beta\\cos\\theta)',
			says: 'The slow clock stretches the light, and the motion along the line of sight adds its own share.'
		}
	],
	assumptions: [
		'The source moves through space, and nothing else shifts its light.',
		'The angle is the one we see when the light left.'
	],
	warnings: [],
	sources: DOPPLER_SOURCES,
	checks: checksOf('doppler.z_general'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ beta, theta_deg: theta }): Computed {
		const values = { z: slantRedshift(beta, theta) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});

/**
 * Fast and towards us, γ and γβ cos θ are large and nearly cancel. There γ(1 + β cos θ) is formed as the straight approach,
 * √((1−β)/(1+β)), and what the slant adds to it, 2γβ cos²(θ/2).
 */
function slantRedshift(beta: number, theta: number): number {
	const gamma = lorentzFactor(beta);
	if (theta <= 90 || gamma < 2) return lessOne(beta) + gamma * beta * cosineOfDegrees(theta);
	const halfCosine = sineOfDegrees((180 - theta) / 2);
	return radialRedshift(-beta) + 2 * gamma * beta * halfCosine * halfCosine;
}
