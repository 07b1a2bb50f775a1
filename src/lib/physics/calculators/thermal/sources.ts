/** What every reading that stands on the thermal history shares. */
import type { Source, WarningSpec } from '../../calculator.ts';
import {
	COSMOLOGY_ASSUMPTIONS,
	COSMOLOGY_WARNINGS,
	cosmologyWarnings
} from '../cosmology/limits.ts';
import type { Universe } from '../cosmology/universe.ts';

export const THERMAL_SOURCES: Source[] = [
	{ title: 'Peebles 1968, Recombination of the primeval plasma, ApJ 153, 1', fromMemory: true },
	{
		title:
			'Seager, Sasselov & Scott 1999, A new calculation of the recombination epoch, ApJ 523, L1; 2000, ApJS 128, 407',
		fromMemory: true
	},
	{
		title:
			'Wong, Moss & Scott 2008, How well do we understand cosmological recombination?, MNRAS 386, 1023',
		locator: 'and RECFAST 1.5.2: factor 1.125 and two Gaussians',
		fromMemory: true
	},
	{
		title: 'Péquignot, Petitjean & Boisson 1991, A&A 251, 680',
		locator: 'recombination coefficient',
		fromMemory: true
	}
];

export const THERMAL_ASSUMPTIONS = [
	'Hydrogen is an atom of three levels; helium stays neutral from redshift 1700 on.',
	'Nothing warms the gas but the cosmic background: no stars, no X-rays, no decaying matter.',
	COSMOLOGY_ASSUMPTIONS[0]!
];

export const NO_STARS: WarningSpec = {
	code: 'no-stars',
	message:
		'By then stars may already warm and ionise the gas; this is the floor without any of them.',
	when: 'redshift below 30',
	validity: 'approximate'
};

export const HELIUM_LEFT_OUT: WarningSpec = {
	code: 'helium-left-out',
	message: 'This early helium still holds back electrons, and the model leaves that out.',
	when: 'redshift above 1600',
	validity: 'approximate'
};

/** Warnings about the universe itself; those about when light left don't apply to gas. */
const ABOUT_UNIVERSE = ['heavy-neutrinos', 'phantom', 'strong-curvature'];
export const UNIVERSE_WARNINGS = COSMOLOGY_WARNINGS.filter(({ code }) =>
	ABOUT_UNIVERSE.includes(code)
);

export function universeWarnings(universe: Universe): string[] {
	return cosmologyWarnings(universe, 0).filter((code) => ABOUT_UNIVERSE.includes(code));
}
