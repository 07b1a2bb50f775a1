/**
 * Names that every formula knows: the constants book under the names that physics gives them, π and e, and the SI's base
 * units, so that a coefficient can be written with its unit: `0.606*metre/second/kelvin`.
 */
import { constants, type Constant, type ConstantsEdition } from '../constants/index.ts';
import type { Dimension } from '../units/units.ts';

export interface BookEntry {
	name: string;
	/** In coherent SI units. */
	value: number;
	/** Standard uncertainty in the same unit. */
	uncertainty: number | 'exact';
	dimension: Dimension;
	says: string;
	tex: string;
}

interface BookRow {
	from: (edition: ConstantsEdition) => Constant;
	dimension: Dimension;
	tex: string;
}

const LENGTH: Dimension = { m: 1 };
const MASS: Dimension = { kg: 1 };
const POWER: Dimension = { kg: 1, m: 2, s: -3 };
const MASS_PARAMETER: Dimension = { m: 3, s: -2 };

/** Where a name differs from the book's own key it is because e is 2.718… in a formula, and k too often an index. */
const BOOK: Readonly<Record<string, BookRow>> = {
	c: { from: ({ physical }) => physical.c, dimension: { m: 1, s: -1 }, tex: 'c' },
	h: { from: ({ physical }) => physical.h, dimension: { kg: 1, m: 2, s: -1 }, tex: 'h' },
	k_B: {
		from: ({ physical }) => physical.k,
		dimension: { kg: 1, m: 2, s: -2, K: -1 },
		tex: 'k_\\mathrm{B}'
	},
	q_e: { from: ({ physical }) => physical.e, dimension: { A: 1, s: 1 }, tex: 'q_\\mathrm{e}' },
	N_A: { from: ({ physical }) => physical.N_A, dimension: { mol: -1 }, tex: 'N_\\mathrm{A}' },
	G: { from: ({ physical }) => physical.G, dimension: { m: 3, kg: -1, s: -2 }, tex: 'G' },
	m_e: { from: ({ physical }) => physical.m_e, dimension: MASS, tex: 'm_\\mathrm{e}' },
	m_p: { from: ({ physical }) => physical.m_p, dimension: MASS, tex: 'm_\\mathrm{p}' },
	m_u: { from: ({ physical }) => physical.m_u, dimension: MASS, tex: 'm_\\mathrm{u}' },
	alpha: { from: ({ physical }) => physical.alpha, dimension: {}, tex: '\\alpha' },
	R_inf: { from: ({ physical }) => physical.R_inf, dimension: { m: -1 }, tex: 'R_\\infty' },
	sigma_T: {
		from: ({ physical }) => physical.sigma_T,
		dimension: { m: 2 },
		tex: '\\sigma_\\mathrm{T}'
	},
	eps_0: {
		from: ({ physical }) => physical.eps_0,
		dimension: { A: 2, s: 4, kg: -1, m: -3 },
		tex: '\\varepsilon_0'
	},
	g_0: { from: ({ physical }) => physical.g_0, dimension: { m: 1, s: -2 }, tex: 'g_0' },
	sigma: {
		from: ({ physical }) => physical.sigma,
		dimension: { kg: 1, s: -3, K: -4 },
		tex: '\\sigma'
	},
	au: { from: ({ astronomical }) => astronomical.au, dimension: LENGTH, tex: '\\mathrm{au}' },
	pc: { from: ({ astronomical }) => astronomical.pc, dimension: LENGTH, tex: '\\mathrm{pc}' },
	ly: { from: ({ astronomical }) => astronomical.ly, dimension: LENGTH, tex: '\\mathrm{ly}' },
	yr: {
		from: ({ astronomical }) => astronomical.julianYear,
		dimension: { s: 1 },
		tex: '\\mathrm{yr}'
	},
	GM_sun: {
		from: ({ astronomical }) => astronomical.GM_sun,
		dimension: MASS_PARAMETER,
		tex: 'GM_\\odot'
	},
	R_sun: { from: ({ astronomical }) => astronomical.R_sun, dimension: LENGTH, tex: 'R_\\odot' },
	L_sun: { from: ({ astronomical }) => astronomical.L_sun, dimension: POWER, tex: 'L_\\odot' },
	T_sun: { from: ({ astronomical }) => astronomical.T_sun, dimension: { K: 1 }, tex: 'T_\\odot' },
	GM_earth: {
		from: ({ astronomical }) => astronomical.GM_earth,
		dimension: MASS_PARAMETER,
		tex: 'GM_\\oplus'
	},
	R_earth: {
		from: ({ astronomical }) => astronomical.R_earth,
		dimension: LENGTH,
		tex: 'R_\\oplus'
	},
	GM_jupiter: {
		from: ({ astronomical }) => astronomical.GM_jupiter,
		dimension: MASS_PARAMETER,
		tex: 'GM_\\mathrm{J}'
	},
	R_jupiter: {
		from: ({ astronomical }) => astronomical.R_jupiter,
		dimension: LENGTH,
		tex: 'R_\\mathrm{J}'
	},
	L_0: { from: ({ astronomical }) => astronomical.L_0, dimension: POWER, tex: 'L_0' }
};

const MATHEMATICAL: readonly BookEntry[] = [
	{ name: 'pi', value: Math.PI, uncertainty: 'exact', dimension: {}, says: 'π', tex: '\\pi' },
	{
		name: 'e',
		value: Math.E,
		uncertainty: 'exact',
		dimension: {},
		says: 'base of the natural logarithm',
		tex: '\\mathrm{e}'
	}
];

const BASE_UNITS: readonly BookEntry[] = (
	[
		['metre', 'm'],
		['kilogram', 'kg'],
		['second', 's'],
		['kelvin', 'K'],
		['ampere', 'A'],
		['mole', 'mol'],
		['candela', 'cd']
	] as const
).map(([name, base]) => ({
	name,
	value: 1,
	uncertainty: 'exact',
	dimension: { [base]: 1 },
	says: `one ${name}`,
	tex: `\\mathrm{${base}}`
}));

/** The book of an edition, by the names that formulas use. */
export function formulaBook(edition: ConstantsEdition = constants): ReadonlyMap<string, BookEntry> {
	const entries = Object.entries(BOOK).map(([name, { from, dimension, tex }]): BookEntry => {
		const { value, uncertainty, name: says } = from(edition);
		return { name, value, uncertainty, dimension, says, tex };
	});
	return new Map([...MATHEMATICAL, ...BASE_UNITS, ...entries].map((entry) => [entry.name, entry]));
}
