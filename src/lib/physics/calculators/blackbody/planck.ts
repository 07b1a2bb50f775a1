import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import {
	BLACK_BODY_ASSUMPTIONS,
	NOT_BLACK,
	PLANCK_SOURCES,
	temperatureInput
} from './radiation.ts';
import { checksOf } from '../published-checks.ts';

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
	checks: checksOf('blackbody.planck'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ T_K: T, wavelength_nm, frequency_Hz }): Computed {
		const metres = wavelength_nm !== undefined ? wavelength_nm * 1e-9 : c.value / frequency_Hz;
		const hertz = frequency_Hz ?? HERTZ_NM / wavelength_nm;
		const filled = occupied(hertz, T);
		const values = {
			B_lambda: byWavelength(metres, filled),
			B_nu: byFrequency(hertz, filled)
		};
		return { ok: true, values, uncertainties: 'exact', warnings: [NOT_BLACK.code] };
	},
	curve(inputs, key, places) {
		const B_lambda = new Float64Array(places.length);
		const B_nu = new Float64Array(places.length);
		const alongWavelength = key === 'wavelength_nm';
		if (!alongWavelength && key !== 'frequency_Hz') return null;
		for (let index = 0; index < places.length; index += 1) {
			const place = places[index]!;
			const metres = alongWavelength ? place * 1e-9 : c.value / place;
			const hertz = alongWavelength ? HERTZ_NM / place : place;
			const filled = occupied(hertz, inputs.T_K as number);
			B_lambda[index] = byWavelength(metres, filled);
			B_nu[index] = byFrequency(hertz, filled);
		}
		return { columns: { B_lambda, B_nu }, warnings: [NOT_BLACK.code] };
	}
});

const HERTZ_NM = c.value * 1e9;
const TWO_H = 2 * h.value;
const LIGHT_SPEED_SQUARED = c.value ** 2;
const TWO_H_C_SQUARED = TWO_H * LIGHT_SPEED_SQUARED;

/** Photons in each state of this frequency (Hz) at T (K). */
function occupied(hertz: number, T: number): number {
	const x = (h.value * hertz) / (k.value * T);
	return x > NOTHING_LEFT ? 0 : 1 / Math.expm1(x);
}

const byWavelength = (metres: number, filled: number) => (TWO_H_C_SQUARED / metres ** 5) * filled;
const byFrequency = (hertz: number, filled: number) =>
	((TWO_H * hertz ** 3) / LIGHT_SPEED_SQUARED) * filled;
