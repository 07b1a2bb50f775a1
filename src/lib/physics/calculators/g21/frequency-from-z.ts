import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { checksOf } from '../published-checks.ts';
import {
	BLUESHIFT,
	G21_ASSUMPTIONS,
	G21_SOURCES,
	REST_MHZ,
	REST_RELATIVE_UNCERTAINTY
} from './rest-line.ts';

/** Where hydrogen's 21 cm line arrives from redshift z in (−1, 10⁵]: ν₀/(1+z) in MHz, and the wavelength in m. */
export const frequencyFromZ = defineCalculator({
	id: 'g21.frequency_from_z',
	revision: '1.0.0',
	title: '21 cm line: redshift to frequency',
	purpose: 'At what frequency does hydrogen’s 21 centimetre line arrive from a redshift?',
	asks: [
		'Where on the dial does early hydrogen come in?',
		'How long is the wave when it gets here?'
	],
	notFor: ['How strong the line is.', 'Other lines: use the redshifted line.'],
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
			initial: 17.2
		}
	},
	outputs: {
		frequency: { label: 'Frequency as observed', symbol: 'ν', quantity: 'frequency', unit: 'MHz' },
		wavelength: { label: 'Wavelength as observed', symbol: 'λ', quantity: 'wavelength', unit: 'm' }
	},
	equations: [
		{
			tex: '\\nu = \\frac{\\nu_0}{1+z}',
			says: 'The frequency falls by as much as space has grown.'
		}
	],
	assumptions: G21_ASSUMPTIONS,
	warnings: [BLUESHIFT],
	sources: G21_SOURCES,
	checks: checksOf('g21.frequency_from_z'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ z }): Computed {
		const frequency = REST_MHZ / (1 + z);
		const wavelength = (constants.physical.c.value / (REST_MHZ * 1e6)) * (1 + z);
		return {
			ok: true,
			values: { frequency, wavelength },
			uncertainties: {
				frequency: frequency * REST_RELATIVE_UNCERTAINTY,
				wavelength: wavelength * REST_RELATIVE_UNCERTAINTY
			},
			warnings: z < 0 ? [BLUESHIFT.code] : []
		};
	}
});
