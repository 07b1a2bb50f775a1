/**
 * The 21 cm line in the gas of an expanding universe: optical depth, brightness, and what ties the spins to gas and light.
 * Furlanetto, Oh & Briggs 2006, Phys. Rep. 433, 181 (“FOB06”); Field 1958.
 */
import { constants, type ConstantsEdition } from '../../constants/index.ts';
import type { Gas } from '../thermal/gas.ts';
import { REST_MHZ } from './rest-line.ts';

const { h, k, c, e } = constants.physical;

/** 1/s: spontaneous emission of the line (recalled; FOB06 use 2.85e-15, which moves couplings and depth by 1.2 %). */
export const EMISSION_RATE = 2.8843e-15;
const REST_HZ = REST_MHZ * 1e6;
/** K: the energy of one photon of the line, over k. */
export const LINE_TEMPERATURE = (h.value * REST_HZ) / k.value;
/** Oscillator strength of Lyman α (Morton 2003). */
const LYMAN_ALPHA_STRENGTH = 0.4164;
/** K: the background now that the Lyman α coupling is stated for. */
const BACKGROUND_NOW = 2.7255;

/** 1/Tₛ is the mean of 1/T of light, of Lyman α and of gas, weighted by 1, x_α and x_c. All temperatures in K. */
export function spinTemperature(
	background: number,
	gasTemperature: number,
	{ x_alpha, x_c }: { x_alpha: number; x_c: number },
	colour = gasTemperature
): number {
	return (1 + x_alpha + x_c) / (1 / background + x_alpha / colour + x_c / gasTemperature);
}

/** x_α for J in photons cm⁻² s⁻¹ Hz⁻¹ sr⁻¹ at u = 1 + z, against a background of 2.7255 K now. */
export function lymanAlphaCoupling(
	S_alpha: number,
	J: number,
	u: number,
	{ physical: { m_e, eps_0 } }: ConstantsEdition = constants
): number {
	const chargeSquared = e.value ** 2 / (4 * Math.PI * eps_0.value);
	const perSquareMetre = J * 1e4;
	return (
		(16 *
			Math.PI ** 2 *
			LINE_TEMPERATURE *
			chargeSquared *
			LYMAN_ALPHA_STRENGTH *
			S_alpha *
			perSquareMetre) /
		(27 * EMISSION_RATE * BACKGROUND_NOW * u * m_e.value * c.value)
	);
}

/** Optical depth times spin temperature, in K: 3hc³A₁₀n_HI/(32πkν₀²H). */
export function depthScale(gas: Gas, z: number, x_HI: number): number {
	const u = 1 + z;
	return (
		(3 * h.value * c.value ** 3 * EMISSION_RATE * x_HI * gas.hydrogenDensity(u)) /
		(32 * Math.PI * k.value * REST_HZ ** 2 * gas.hubbleRate(u))
	);
}

/** Brightness against the background, in K as observed, and optical depth. Negative is absorption. */
export function brightnessOf(
	scale: number,
	z: number,
	spin: number,
	background: number
): { tau: number; dTb: number } {
	const tau = scale / spin;
	return { tau, dTb: ((spin - background) / (1 + z)) * -Math.expm1(-tau) };
}

/** The 27 mK of FOB06, for this universe and z, in mK: brightness of wholly neutral gas much warmer than the background. */
export function linearScaleMk({ universe: { parameters } }: Gas, z: number): number {
	const { H0, Om0, Ob0 } = parameters;
	const h2 = (H0 / 100) ** 2;
	return 27 * ((Ob0 * h2) / 0.023) * Math.sqrt((0.15 / (Om0 * h2)) * ((1 + z) / 10));
}
