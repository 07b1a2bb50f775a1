import { defineCalculator, type Computed } from '../../calculator.ts';
import type { ConstantsEdition } from '../../constants/index.ts';
import { cosmologyInput } from '../cosmology/limits.ts';
import { gasOf, heliumInput } from '../thermal/gas.ts';
import { UNIVERSE_WARNINGS, universeWarnings } from '../thermal/sources.ts';
import { brightnessOf, depthScale, linearScaleMk } from './hydrogen-line.ts';
import {
	backgroundFactor,
	DISPUTED_TROUGH,
	FOB06,
	frequencyAt,
	kelvin,
	PRITCHARD_LOEB,
	SIGN_CONVENTION,
	signalRedshift,
	SINGH_2022,
	troughWarnings
} from './signal.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Brightness of the 21 cm line against the background in mK, exact and by the usual linear formula, and its optical
 * depth, for gas of the mean density. Refuses spin temperatures of 0 and below and universes without gas.
 */
export const brightness = defineCalculator({
	id: 'g21.brightness',
	revision: '1.0.0',
	title: '21 cm line: brightness',
	purpose: 'How bright or dark is the 21 centimetre line of early hydrogen against the background?',
	asks: [
		'How deep is the trough?',
		'How strong is the signal from cosmic dawn?',
		'What does the usual formula give?'
	],
	notFor: ['The sky in front of it, ten thousand times brighter.', 'Single clouds or galaxies.'],
	inputs: {
		cosmology: cosmologyInput,
		Yp: heliumInput,
		z: signalRedshift(17.2),
		Ts_K: kelvin('Spin temperature', 'T_s', 'spin-temperature', 7),
		x_HI: {
			kind: 'number',
			label: 'Share of the hydrogen that is neutral',
			symbol: 'x_HI',
			quantity: 'fraction',
			unit: '',
			min: 0,
			max: 1,
			initial: 1,
			optional: true
		},
		backgroundFactor
	},
	outputs: {
		dTb_exact: {
			label: 'Brightness against the background',
			symbol: 'δT_b',
			quantity: 'temperature-difference',
			unit: 'mK'
		},
		dTb_approx: {
			label: 'The same by the linear formula',
			symbol: 'δT_b',
			quantity: 'temperature-difference',
			unit: 'mK'
		},
		tau: { label: 'Optical depth', symbol: 'τ', quantity: 'optical-depth', unit: '' }
	},
	equations: [
		{
			tex: '\\tau = \\frac{3\\,h c^3 A_{10}\\,n_\\mathrm{HI}}{32\\pi\\,k\\,\\nu_0^2\\,T_s H(z)}',
			says: 'The colder the spins and the denser the gas, the more of the background is taken out.'
		},
		{
			tex: '\\delta T_b = \\frac{T_s-T_r}{1+z}\\left(1-e^{-\\tau}\\right)',
			says: 'Spins colder than the background make a dip, warmer ones a rise.'
		},
		{
			tex: '\\delta T_b \\approx 27\\,\\mathrm{mK}\\;x_\\mathrm{HI}\\,\\frac{\\Omega_b h^2}{0.023}\\sqrt{\\frac{0.15}{\\Omega_m h^2}\\,\\frac{1+z}{10}}\\left(1-\\frac{T_r}{T_s}\\right)',
			says: 'The usual short form; 5 per cent too deep at redshift 17 for spins at 7 kelvin.'
		}
	],
	assumptions: [
		SIGN_CONVENTION,
		'Gas of the mean density that moves with the expansion alone.',
		'The background is the cosmic one, times the factor given.'
	],
	warnings: [
		DISPUTED_TROUGH,
		{
			code: 'thick',
			message:
				'The gas is so thick here that the linear formula no longer holds; read the exact one.',
			when: 'optical depth above 0.2',
			validity: 'ok'
		},
		...UNIVERSE_WARNINGS
	],
	sources: [FOB06, PRITCHARD_LOEB, SINGH_2022],
	checks: checksOf('g21.brightness'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute(
		{ cosmology, Yp, z, Ts_K, x_HI, backgroundFactor: factor },
		edition?: ConstantsEdition
	): Computed {
		const opened = gasOf(cosmology, Yp, edition);
		if (!opened.ok) return opened;
		const { gas } = opened;
		const background = factor * gas.background(1 + z);
		const { tau, dTb } = brightnessOf(depthScale(gas, z, x_HI), z, Ts_K, background);
		const exact = dTb * 1000;
		const linear = linearScaleMk(gas, z);
		const hasLinear = Number.isFinite(linear);
		return {
			ok: true,
			values: {
				dTb_exact: exact,
				tau,
				...(hasLinear ? { dTb_approx: linear * x_HI * (1 - background / Ts_K) } : {})
			},
			warnings: [
				...troughWarnings(exact, frequencyAt(z)),
				...(tau > 0.2 ? ['thick'] : []),
				...universeWarnings(gas.universe)
			],
			...(hasLinear
				? {}
				: {
						withheld: {
							dTb_approx: {
								code: 'no-matter',
								message: 'The linear formula takes matter to set the expansion. Set Om0 above 0.'
							}
						}
					})
		};
	}
});
