/** What the calculators of an expanding universe share: their limits, warnings, sources and the cosmology input. */
import {
	refuse,
	type CosmologyInput,
	type NumberInput,
	type Refusal,
	type Source,
	type WarningSpec
} from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { printNumber } from '../wording.ts';
import type { CosmologyParameters } from './parameters.ts';
import { universeOf, type Universe } from './universe.ts';

export const cosmologyInput: CosmologyInput = {
	kind: 'cosmology',
	label: 'Expanding universe',
	initial: { set: 'Planck18' }
};

export function redshiftInput(label: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol: 'z',
		quantity: 'redshift',
		unit: '',
		min: -1,
		minExclusive: true,
		max: 1e10,
		initial
	};
}

export const COSMOLOGY_SOURCES: Source[] = [
	{
		title: 'Hogg 1999, Distance measures in cosmology',
		locator: 'eqs. 14–20',
		url: 'https://arxiv.org/abs/astro-ph/9905116'
	},
	{
		title: 'Carroll, Press & Turner 1992, The cosmological constant, ARA&A 30, 499',
		locator: 'volume',
		doi: '10.1146/annurev.aa.30.090192.002435',
		fromMemory: true
	},
	{
		title: 'Davis & Lineweaver 2004, Expanding confusion, PASA 21, 97',
		locator: 'horizons',
		doi: '10.1071/AS03040',
		fromMemory: true
	},
	{
		title: 'Komatsu et al. 2011, Seven-year WMAP observations, ApJS 192, 18',
		locator: 'eq. 26, neutrinos with mass',
		doi: '10.1088/0067-0049/192/2/18',
		fromMemory: true
	},
	{
		title:
			'Chevallier & Polarski 2001, Int. J. Mod. Phys. D 10, 213; Linder 2003, Phys. Rev. Lett. 90, 091301',
		locator: 'dark energy with w₀ and wₐ',
		fromMemory: true
	},
	...Object.values(constants.cosmologies).map((set) => ({ title: set.source, locator: set.label }))
];

export const COSMOLOGY_ASSUMPTIONS = [
	'Space is filled evenly and expands everywhere alike (a Friedmann–Lemaître universe); motions of galaxies through it are left out.',
	'Matter now (Ωₘ) counts ordinary and cold dark matter; neutrinos are counted apart.',
	'Neutrinos with mass follow a fit that is good to about one part in 100 000 of the expansion rate.',
	'Years are Julian years of 365.25 days.'
];

export const COSMOLOGY_WARNINGS: WarningSpec[] = [
	{
		code: 'future',
		message:
			'This lies in the future: the model says what comes next only if dark energy stays as assumed.',
		when: 'redshift below 0',
		validity: 'approximate'
	},
	{
		code: 'before-last-scattering',
		message: 'No light reaches us from before redshift 1100, when the gas was still opaque.',
		when: 'redshift above 1100',
		validity: 'approximate'
	},
	{
		code: 'first-seconds',
		message:
			'Electrons meeting positrons and neutrinos letting go are not in this model, and they matter this early.',
		when: 'redshift above 10⁸',
		validity: 'outside'
	},
	{
		code: 'heavy-neutrinos',
		message:
			'Neutrinos together heavier than 0.12 eV lie above the 95 per cent limit of Planck 2018 VI with galaxy surveys.',
		when: 'neutrino masses add to more than 0.12 eV',
		validity: 'approximate'
	},
	{
		code: 'phantom',
		message: 'Dark energy with w₀ below −1 is called phantom: no agreed physics stands behind it.',
		when: 'w₀ below −1',
		validity: 'approximate'
	},
	{
		code: 'strong-curvature',
		message: 'A curvature beyond 0.01 is ruled out by the cosmic background with galaxy surveys.',
		when: '|Ωₖ| above 0.01',
		validity: 'approximate'
	}
];

/** Codes of the warnings that hold for a universe seen at redshift z. */
export function cosmologyWarnings(universe: Universe, z: number): string[] {
	const { m_nu, w0 } = universe.parameters;
	const codes: string[] = [];
	if (z < 0) codes.push('future');
	if (z > 1100) codes.push('before-last-scattering');
	if (z > 1e8) codes.push('first-seconds');
	if (m_nu.reduce((sum, one) => sum + one, 0) > 0.12) codes.push('heavy-neutrinos');
	if (w0 < -1) codes.push('phantom');
	if (Math.abs(universe.Ok0) > 0.01) codes.push('strong-curvature');
	return codes;
}

/** The universe with these parameters, unless it has no Big Bang. */
export function universeWithPast(
	parameters: CosmologyParameters
): { ok: true; universe: Universe } | { ok: false; refusal: Refusal } {
	const universe = universeOf(parameters);
	if (universe.bounces) {
		return refuse(
			'no-big-bang',
			'Run backwards, this universe shrinks and then grows again: it has no Big Bang. Lower the dark energy or raise the matter.',
			'cosmology'
		);
	}
	return { ok: true, universe };
}

/** A refusal when the universe stops expanding before it reaches redshift z. */
export function beyondTurnaround(
	universe: Universe,
	z: number,
	input: string
): { ok: false; refusal: Refusal } | null {
	if (1 + z > universe.turnaround) return null;
	const last = printNumber(universe.turnaround - 1);
	return refuse(
		'stops-expanding',
		`This universe stops expanding at redshift ${last} and falls back. Ask for a redshift above that.`,
		input
	);
}

/** A refusal when nothing bounds the past: dark energy alone never had a beginning. */
export function ageless(universe: Universe): { ok: false; refusal: Refusal } | null {
	if (universe.earlyPower > 0) return null;
	return refuse(
		'no-age',
		'This universe has always been expanding: it has no age. Give it some matter.',
		'cosmology'
	);
}
