import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { checksOf } from '../published-checks.ts';
import {
	BLACK_BODY_ASSUMPTIONS,
	HC_OVER_K_NM,
	NOT_BLACK,
	PLANCK_SOURCES,
	temperatureInput
} from './radiation.ts';

const { h, c, k, e, sigma } = constants.physical;

/** Roots of x = 5(1 − e⁻ˣ) and x = 3(1 − e⁻ˣ): hν/kT at the peak by wavelength and by frequency. */
const PEAK_BY_WAVELENGTH = 4.965114231744276;
const PEAK_BY_FREQUENCY = 2.821439372122079;
/** Apéry's constant, the sum of 1/n³. */
const ZETA_3 = 1.202056903159594;

/**
 * The whole glow of a black body at T in K: peaks in nm and Hz, flux σT⁴ in W/m², photons 16πζ(3)(kT/hc)³ in m⁻³,
 * energy 4σT⁴/c in J/m³, and the mean photon, energy by photons, in eV.
 */
export const total = defineCalculator({
	id: 'blackbody.total',
	revision: '1.0.0',
	title: 'The whole glow of a hot body',
	purpose: 'What colour is a hot body, and how much power, how many photons does it give?',
	asks: [
		'At what wavelength does the Sun shine most?',
		'How much power does a hot surface give off?',
		'How many photons are in each cubic metre of space?'
	],
	notFor: ['The colour an eye sees.', 'Lamps and gases that shine in lines.'],
	inputs: { T_K: temperatureInput },
	outputs: {
		peakWavelength: {
			label: 'Peak by wavelength',
			symbol: 'λ_peak',
			quantity: 'wavelength',
			unit: 'nm'
		},
		peakFrequency: {
			label: 'Peak by frequency',
			symbol: 'ν_peak',
			quantity: 'frequency',
			unit: 'Hz'
		},
		flux: {
			label: 'Power from each square metre',
			symbol: 'F',
			quantity: 'irradiance',
			unit: 'W/m2'
		},
		photonDensity: {
			label: 'Photons in each cubic metre of its light',
			symbol: 'n',
			quantity: 'number-density',
			unit: 'm-3'
		},
		energyDensity: {
			label: 'Energy in each cubic metre of its light',
			symbol: 'u',
			quantity: 'energy-density',
			unit: 'J/m3'
		},
		meanPhotonEnergy: {
			label: 'Mean energy of a photon',
			symbol: '⟨E⟩',
			quantity: 'photon-energy',
			unit: 'eV'
		}
	},
	equations: [
		{
			tex: '\\lambda_\\mathrm{peak} = \\frac{hc}{4.9651\\,kT}, \\qquad \\nu_\\mathrm{peak} = \\frac{2.8214\\,kT}{h}',
			says: 'Hotter is bluer: the peak moves with the temperature.'
		},
		{ tex: 'F = \\sigma T^4', says: 'Twice as hot gives sixteen times the power.' },
		{
			tex: 'n = 16\\pi\\,\\zeta(3)\\left(\\frac{kT}{hc}\\right)^3, \\qquad u = \\frac{4\\sigma T^4}{c}',
			says: 'Photons go with the cube of the temperature, and their energy with its fourth power.'
		}
	],
	assumptions: BLACK_BODY_ASSUMPTIONS,
	warnings: [
		{
			code: 'two-peaks',
			message:
				'The peak by wavelength and the peak by frequency are two different photons. Say which one is meant.',
			when: 'always',
			validity: 'ok'
		},
		NOT_BLACK
	],
	sources: PLANCK_SOURCES,
	checks: checksOf('blackbody.total'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ T_K: T }): Computed {
		const flux = sigma.value * T ** 4;
		const energyDensity = (4 * flux) / c.value;
		const photonDensity = 16 * Math.PI * ZETA_3 * ((k.value * T) / (h.value * c.value)) ** 3;
		const values = {
			peakWavelength: HC_OVER_K_NM / (PEAK_BY_WAVELENGTH * T),
			peakFrequency: (PEAK_BY_FREQUENCY * k.value * T) / h.value,
			flux,
			photonDensity,
			energyDensity,
			meanPhotonEnergy: energyDensity / photonDensity / e.value
		};
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: ['two-peaks', NOT_BLACK.code]
		};
	}
});
