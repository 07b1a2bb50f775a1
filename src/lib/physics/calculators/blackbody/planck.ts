import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { exactly } from '../uncertainties.ts';
import {
	BLACK_BODY_ASSUMPTIONS,
	NOT_BLACK,
	PLANCK_SOURCES,
	temperatureInput
} from './radiation.ts';

const { h, c, k } = constants.physical;
/** Past this hν/kT the light is below 10⁻³⁰⁰ of what it is near the peak. */
const NOTHING_LEFT = 700;

/**
 * Light of a black body at one wavelength (nm) or frequency (Hz), T in K: B_λ = 2hc²/λ⁵ / (e^{hc/λkT} − 1) in
 * W m⁻³ sr⁻¹ and B_ν = 2hν³/c² / (e^{hν/kT} − 1) in W m⁻² Hz⁻¹ sr⁻¹. 0 far past the peak.
 */
export const planck = defineCalculator({
	id: 'blackbody.planck',
	revision: '1.0.0',
	title: 'Glow at one wavelength',
	purpose: 'How brightly does a hot body shine at one wavelength or frequency?',
	asks: [
		'How bright is a star in this colour?',
		'How bright is the microwave background at this frequency?'
	],
	notFor: ['Gases that shine in lines.', 'All colours together: use the whole glow.'],
	inputs: {
		T_K: temperatureInput,
		wavelength_nm: {
			kind: 'number',
			label: 'Wavelength in vacuum',
			symbol: 'λ',
			quantity: 'wavelength',
			unit: 'nm',
			min: 1e-9,
			max: 1e18,
			initial: 500,
			optional: true,
			log: true
		},
		frequency_Hz: {
			kind: 'number',
			label: 'Frequency',
			symbol: 'ν',
			quantity: 'frequency',
			unit: 'Hz',
			min: 1e-1,
			max: 1e27,
			initial: 1.6e11,
			optional: true,
			log: true
		}
	},
	oneOf: [['wavelength_nm', 'frequency_Hz']],
	outputs: {
		B_lambda: {
			label: 'Radiance for each length of wave',
			symbol: 'B_λ',
			quantity: 'radiance-by-wavelength',
			unit: 'W m-3 sr-1'
		},
		B_nu: {
			label: 'Radiance for each hertz',
			symbol: 'B_ν',
			quantity: 'radiance-by-frequency',
			unit: 'W m-2 Hz-1 sr-1'
		}
	},
	equations: [
		{
			tex: 'B_\\lambda = \\frac{2hc^2}{\\lambda^5}\\,\\frac{1}{e^{hc/\\lambda kT}-1}',
			says: 'The power a black body sends out through each square metre, by wavelength.'
		},
		{
			tex: 'B_\\nu = \\frac{2h\\nu^3}{c^2}\\,\\frac{1}{e^{h\\nu/kT}-1}',
			says: 'The same power, by frequency; this curve has its peak at another photon.'
		}
	],
	assumptions: BLACK_BODY_ASSUMPTIONS,
	warnings: [NOT_BLACK],
	sources: PLANCK_SOURCES,
	checks: [],
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ T_K: T, wavelength_nm, frequency_Hz }): Computed {
		const metres = wavelength_nm !== undefined ? wavelength_nm * 1e-9 : c.value / frequency_Hz;
		const hertz = frequency_Hz ?? (c.value * 1e9) / wavelength_nm;
		const x = (h.value * hertz) / (k.value * T);
		const occupied = x > NOTHING_LEFT ? 0 : 1 / Math.expm1(x);
		const values = {
			B_lambda: ((2 * h.value * c.value ** 2) / metres ** 5) * occupied,
			B_nu: ((2 * h.value * hertz ** 3) / c.value ** 2) * occupied
		};
		return { ok: true, values, uncertainties: exactly(values), warnings: [NOT_BLACK.code] };
	}
});
