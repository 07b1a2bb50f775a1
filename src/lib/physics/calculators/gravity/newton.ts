/** The constant of gravitation and what it costs: it is the worst known of the constants used here. */
import type { WarningSpec } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { dueTo } from '../uncertainties.ts';

export const G = constants.physical.G.value;
const SHARE = constants.physical.G.uncertainty / G;

/** m²/s² */
export const LIGHT_SPEED_SQUARED = constants.physical.c.value ** 2;

/** Radius of the horizon of a mass that doesn't turn, 2GM/c², in m. */
export function horizonOf(massKg: number): number {
	return (2 * G * massKg) / LIGHT_SPEED_SQUARED;
}

/** Standard uncertainty of a value that goes with this power of G. */
export function dueToG(value: number, power: number): number {
	return dueTo(SHARE, value, power);
}

export const FIVE_DIGITS: WarningSpec = {
	code: 'known-to-five-digits',
	message: 'The constant of gravitation is known to 2 parts in 100 000. Quote five digits at most.',
	when: 'always',
	validity: 'ok'
};
