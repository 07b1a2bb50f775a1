import { defineCalculator, type Computed, type NumberInput } from '../../calculator.ts';
import { BARKANA_2018, NEW_PHYSICS, signalRedshift } from './signal.ts';
import { checksOf } from '../published-checks.ts';

function pure(
	label: string,
	symbol: string,
	[min, max, initial]: [number, number, number],
	minExclusive = false
): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'ratio',
		unit: '',
		min,
		max,
		minExclusive,
		initial,
		optional: true
	};
}

/** A cooling law with a free end: dlnT/dlnt goes from −2/3 (tied to the background) to α/3; α = −4 is standard. */
export const mfCooling = defineCalculator({
	id: 'g21.mf_cooling',
	revision: '1.0.0',
	title: 'Cooling law of the gas',
	purpose:
		'How steeply does the temperature of unheated gas fall with time, in a law with a free end?',
	asks: ['How would the gas cool if it cooled faster than it should?'],
	notFor: ['Evidence for extra cooling: there is none accepted.', 'Gas that stars have warmed.'],
	inputs: {
		alpha: {
			...pure('End of the law', 'α', [-20, 0, -4]),
			good: { min: -4, max: 0, warning: NEW_PHYSICS.code }
		},
		z0: { ...pure('Redshift of the change', 'z_0', [0, 2000, 189.6], true), quantity: 'redshift' },
		beta: pure('Sharpness of the change', 'β', [0, 20, 1.27], true),
		z: signalRedshift(17)
	},
	outputs: {
		slope: {
			label: 'Power of time by which it cools',
			symbol: 'dlnT/dlnt',
			quantity: 'number',
			unit: ''
		}
	},
	equations: [
		{
			tex: '\\frac{\\mathrm{d}\\ln T}{\\mathrm{d}\\ln t} = \\frac{\\alpha}{3} - \\frac{2+\\alpha}{3}\\left[1-e^{-(z/z_0)^\\beta}\\right]',
			says: 'From cooling in step with the background to cooling by expansion alone, or by something more.'
		}
	],
	assumptions: [
		'Matter rules the expansion, so that time goes as (1+z)^(−3/2).',
		'α = −4, z₀ = 189.6 and β = 1.27 follow standard cooling: within 1.6 per cent of the thermal history down to redshift 17, 2 per cent at 10.'
	],
	warnings: [{ ...NEW_PHYSICS, when: 'α below −4' }],
	sources: [
		{
			title: 'Mirocha & Furlanetto 2019, MNRAS 483, 1980',
			doi: '10.1093/mnras/sty3260',
			fromMemory: true
		},
		BARKANA_2018
	],
	checks: checksOf('g21.mf_cooling'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ alpha, z0, beta, z }): Computed {
		const values = { slope: alpha / 3 + ((2 + alpha) / 3) * Math.expm1(-((z / z0) ** beta)) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
