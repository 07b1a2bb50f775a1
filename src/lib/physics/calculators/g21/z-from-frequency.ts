import { defineCalculator, type Computed } from '../../calculator.ts';
import { checksOf } from '../published-checks.ts';
import {
	BLUESHIFT,
	G21_ASSUMPTIONS,
	G21_SOURCES,
	REST_MHZ,
	REST_RELATIVE_UNCERTAINTY
} from './rest-line.ts';

/** Redshift of hydrogen's 21 cm line seen at a frequency in MHz (above 0): (ν₀ − ν)/ν. Below 0 with a warning. */
export const zFromFrequency = defineCalculator({
	id: 'g21.z_from_frequency',
	revision: '1.0.0',
	title: '21 cm line: frequency to redshift',
	purpose: 'From what redshift does hydrogen’s 21 centimetre line arrive at this frequency?',
	asks: ['What redshift does 78 megahertz stand for?', 'How much has the wave been stretched?'],
	notFor: [
		'Whether anything shines at that frequency.',
		'Other lines: use the redshift of a line.'
	],
	inputs: {
		frequency_MHz: {
			kind: 'number',
			label: 'Frequency as observed',
			symbol: 'ν',
			quantity: 'frequency',
			unit: 'MHz',
			min: 0,
			minExclusive: true,
			max: 1e6,
			initial: 78,
			log: true
		}
	},
	outputs: {
		z: { label: 'Redshift', symbol: 'z', quantity: 'redshift', unit: '' },
		stretch: { label: 'Stretch of the wave', symbol: '1+z', quantity: 'stretch', unit: 'times' }
	},
	equations: [
		{
			tex: 'z = \\frac{\\nu_0-\\nu}{\\nu}',
			says: 'The redshift is how far the frequency has fallen, as a share of what is left.'
		}
	],
	assumptions: G21_ASSUMPTIONS,
	warnings: [BLUESHIFT],
	sources: G21_SOURCES,
	checks: checksOf('g21.z_from_frequency'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ frequency_MHz }): Computed {
		const z = (REST_MHZ - frequency_MHz) / frequency_MHz;
		const stretch = REST_MHZ / frequency_MHz;
		const uncertainty = stretch * REST_RELATIVE_UNCERTAINTY;
		return {
			ok: true,
			values: { z, stretch },
			uncertainties: { z: uncertainty, stretch: uncertainty },
			warnings: z < 0 ? [BLUESHIFT.code] : []
		};
	}
});
