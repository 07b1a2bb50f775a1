import { defineCalculator, type CheckedInputs, type Computed } from '../../calculator.ts';
import {
	lightInputs,
	REDSHIFT_SOURCES,
	REDSHIFT_WARNINGS,
	redshiftWarnings,
	wavelengthOfEnergy,
	wavelengthOfFrequency
} from './spectrum.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Redshift from a line at rest and as observed: z = (λ_obs − λ_rest)/λ_rest, the difference formed first so that a
 * small redshift keeps its digits. Each of the two may be a wavelength, a frequency or an energy.
 */
export const redshift = defineCalculator({
	id: 'line.redshift',
	revision: '1.0.0',
	title: 'Redshift of a line',
	purpose: 'A known line arrives at another wavelength: what is its redshift?',
	asks: ['What redshift does this line show?', 'How much has this wave been stretched?'],
	notFor: [
		'Wavelengths in air beside wavelengths in vacuum.',
		'Reading the redshift of a galaxy as a speed.'
	],
	inputs: {
		...lightInputs('rest', 'at rest', 656.4614),
		...lightInputs('observed', 'observed', 700)
	},
	oneOf: [
		['restWavelength_nm', 'restFrequency_Hz', 'restEnergy_eV'],
		['observedWavelength_nm', 'observedFrequency_Hz', 'observedEnergy_eV']
	],
	outputs: {
		z: { label: 'Redshift', symbol: 'z', quantity: 'redshift', unit: '' },
		stretch: { label: 'Stretch of the wave', symbol: '1+z', quantity: 'stretch', unit: 'times' }
	},
	equations: [
		{
			tex: 'z = \\frac{\\lambda_\\mathrm{obs}-\\lambda_\\mathrm{rest}}{\\lambda_\\mathrm{rest}} = \\frac{\\nu_\\mathrm{rest}-\\nu_\\mathrm{obs}}{\\nu_\\mathrm{obs}}',
			says: 'The redshift is how much longer the wave has become, as a share of what it was.'
		}
	],
	assumptions: ['Both wavelengths are in vacuum.', 'The line has been named rightly.'],
	warnings: [
		...REDSHIFT_WARNINGS,
		{
			code: 'blueshift',
			message:
				'The wave arrives shorter than it left: the source comes towards us, whatever space does.',
			when: 'redshift below 0',
			validity: 'ok'
		}
	],
	sources: REDSHIFT_SOURCES,
	checks: checksOf('line.redshift'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute(inputs): Computed {
		const z = redshiftOf(inputs);
		return {
			ok: true,
			values: { z, stretch: 1 + z },
			uncertainties: { z: 'exact', stretch: 'exact' },
			warnings: [...redshiftWarnings(z), ...(z < 0 ? ['blueshift'] : [])]
		};
	}
});

function redshiftOf(inputs: CheckedInputs): number {
	const {
		restFrequency_Hz: nu0,
		observedFrequency_Hz: nu,
		restEnergy_eV: e0,
		observedEnergy_eV: e
	} = inputs;
	if (nu0 !== undefined && nu !== undefined) return (nu0 - nu) / nu;
	if (e0 !== undefined && e !== undefined) return (e0 - e) / e;
	const rest = wavelength(inputs.restWavelength_nm, nu0, e0);
	const observed = wavelength(inputs.observedWavelength_nm, nu, e);
	return (observed - rest) / rest;
}

function wavelength(
	nm: number | undefined,
	hertz: number | undefined,
	ev: number | undefined
): number {
	if (nm !== undefined) return nm;
	return hertz !== undefined ? wavelengthOfFrequency(hertz) : wavelengthOfEnergy(ev as number);
}
