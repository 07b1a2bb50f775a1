import { defineCalculator, type Computed } from '../../calculator.ts';
import { isBlockedByAir } from './bands.ts';
import {
	energyOfFrequency,
	energyOfWavelength,
	frequencyOfEnergy,
	frequencyOfWavelength,
	lightInputs,
	REDSHIFT_SOURCES,
	REDSHIFT_WARNINGS,
	redshiftWarnings,
	wavelengthOfEnergy,
	wavelengthOfFrequency
} from './spectrum.ts';
import { checksOf } from '../published-checks.ts';

const LYMAN_ALPHA_NM = 121.567;

/**
 * Where a line is seen after a redshift: λ(1+z) in nm, ν/(1+z) in Hz, E/(1+z) in eV. z in (−1, 10⁵].
 * Wavelengths are vacuum values.
 */
export const observe = defineCalculator({
	id: 'line.observe',
	revision: '1.0.0',
	title: 'Redshifted line',
	purpose: 'A line left its source at a known wavelength; where does it arrive after a redshift?',
	asks: [
		'At what frequency does hydrogen’s 21 centimetre line arrive?',
		'Where does this line land in our telescope?',
		'How long is the wave by the time it gets here?'
	],
	notFor: ['Wavelengths in air, as older optical lists give them.', 'The speed of a source.'],
	inputs: {
		...lightInputs('rest', 'at rest', LYMAN_ALPHA_NM),
		z: {
			kind: 'number',
			label: 'Redshift',
			symbol: 'z',
			quantity: 'redshift',
			unit: '',
			min: -1,
			minExclusive: true,
			max: 1e5,
			initial: 9.5
		}
	},
	oneOf: [['restWavelength_nm', 'restFrequency_Hz', 'restEnergy_eV']],
	outputs: {
		observedWavelength: {
			label: 'Wavelength as observed',
			symbol: 'λ',
			quantity: 'wavelength',
			unit: 'nm'
		},
		observedFrequency: {
			label: 'Frequency as observed',
			symbol: 'ν',
			quantity: 'frequency',
			unit: 'Hz'
		},
		observedEnergy: {
			label: 'Energy of a photon as observed',
			symbol: 'E',
			quantity: 'photon-energy',
			unit: 'eV'
		},
		stretch: { label: 'Stretch of the wave', symbol: '1+z', quantity: 'stretch', unit: 'times' }
	},
	equations: [
		{
			tex: '\\lambda_\\mathrm{obs} = \\lambda_\\mathrm{rest}\\,(1+z), \\qquad \\nu_\\mathrm{obs} = \\frac{\\nu_\\mathrm{rest}}{1+z}',
			says: 'The wave grows by the factor 1 + z, and its frequency falls by the same.'
		},
		{ tex: 'E = h\\nu = \\frac{hc}{\\lambda}', says: 'A photon’s energy goes with its frequency.' }
	],
	assumptions: [
		'Wavelengths are in vacuum.',
		'The redshift is the whole change, whatever caused it.'
	],
	warnings: [
		...REDSHIFT_WARNINGS,
		{
			code: 'blocked-by-air',
			message: 'Air lets little of this through: a telescope on the ground would not see it.',
			when: 'observed wavelength in a stretch that air absorbs',
			validity: 'ok'
		}
	],
	sources: REDSHIFT_SOURCES,
	checks: checksOf('line.observe'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ restWavelength_nm, restFrequency_Hz, restEnergy_eV, z }): Computed {
		const u = 1 + z;
		const light =
			restWavelength_nm !== undefined
				? fromWavelength(restWavelength_nm * u)
				: restFrequency_Hz !== undefined
					? fromFrequency(restFrequency_Hz / u)
					: fromEnergy(restEnergy_eV / u);
		return {
			ok: true,
			values: {
				observedWavelength: light.observedWavelength,
				observedFrequency: light.observedFrequency,
				observedEnergy: light.observedEnergy,
				stretch: u
			},
			uncertainties: 'exact',
			warnings: isBlockedByAir(light.observedWavelength)
				? [...redshiftWarnings(z), 'blocked-by-air']
				: redshiftWarnings(z)
		};
	}
});

function fromWavelength(nm: number) {
	return {
		observedWavelength: nm,
		observedFrequency: frequencyOfWavelength(nm),
		observedEnergy: energyOfWavelength(nm)
	};
}

function fromFrequency(hertz: number) {
	return {
		observedWavelength: wavelengthOfFrequency(hertz),
		observedFrequency: hertz,
		observedEnergy: energyOfFrequency(hertz)
	};
}

function fromEnergy(ev: number) {
	return {
		observedWavelength: wavelengthOfEnergy(ev),
		observedFrequency: frequencyOfEnergy(ev),
		observedEnergy: ev
	};
}
