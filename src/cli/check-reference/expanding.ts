/** Expanding universes against astropy, and against scipy where astropy is the weaker one. */
import type { RawInputs } from '../../lib/physics/calculator.ts';
import type { Chance } from '../seeded.ts';
import {
	numbersOf,
	times,
	within,
	type Column,
	type Family,
	type ReferenceLimit
} from './family.ts';

const EPSILON = Number.EPSILON;
/** QUADPACK’s tolerances as scipy sets them and astropy 5 leaves them: absolute or relative, whichever is met first. */
const QUADPACK = 1.49e-8;

/** How far an estimate of QUADPACK may lie from the error made, as seen in tens of thousands of ages. */
const ESTIMATE_MISSED = 100;

const agesByAstropy: ReferenceLimit = {
	says: 'astropy integrates ages until QUADPACK estimates an absolute 1.5e-8 Hubble times, so early ages lose digits; now and then the estimate is a hundredfold too good. The scipy row has none of it',
	allowed: (_row, { age, hubble_time: hubbleTime }) =>
		(ESTIMATE_MISSED * QUADPACK * hubbleTime!) / age!
};

const pathsByAstropy: ReferenceLimit = {
	says: 'astropy asks its integrals along the line of sight for 1.5e-8, mostly gets far more, and now and then less; the scipy rows ask for 1e-13',
	allowed: () => ESTIMATE_MISSED * QUADPACK
};

const volumesByAstropy: ReferenceLimit = {
	says: 'astropy’s closed form cancels where |Ok|·(D/D_H)² is small, and has no value past the equator of a closed space',
	allowed: (_row, { Ok, E, comoving_distance: way, hubble_distance: unit }) => {
		// A lower bound of |Ok0| (way/unit)² is enough: Ok(z) = Ok0 (1+z)²/E².
		const share = Math.abs(Ok! * E! * E!) * (way! / unit!) ** 2;
		return 3 * QUADPACK + (share === 0 ? 0 : (64 * EPSILON) / share);
	},
	leavesOut: true
};

/** A flat volume is the cube of a path. */
const pathsCubed: ReferenceLimit = { ...pathsByAstropy, allowed: () => 3 * QUADPACK };

const SHARP = 1e-11;

const COLUMNS: Column[] = [
	...within(SHARP, 'age by scipy', 'lookback by scipy', 'comoving_distance by scipy'),
	...within(SHARP, 'particle_horizon by scipy'),
	{ key: 'age', allowed: SHARP, limit: agesByAstropy },
	...[
		'lookback',
		'comoving_distance',
		'transverse',
		'luminosity',
		'angular',
		'distmod',
		'kpc_per_arcsec',
		'arcsec_per_kpc'
	].map((key) => ({ key, allowed: SHARP, limit: pathsByAstropy })),
	{ key: 'comoving_volume', allowed: SHARP, limit: volumesByAstropy },
	...within(1e-12, 'E', 'H', 'critical_density', 'Om', 'Ode', 'Ogamma', 'Onu', 'Ok'),
	...within(1e-13, 'hubble_time', 'hubble_distance')
];

const FLAT_COLUMNS = COLUMNS.map((column) =>
	column.limit === volumesByAstropy ? { ...column, limit: pathsCubed } : column
);

function atRedshift(
	name: string,
	title: string,
	columns: Column[],
	cosmology: (chance: Chance) => RawInputs
): Family {
	return {
		name,
		title,
		reference: 'astropy.cosmology; scipy.integrate.quad where said',
		columns,
		rows: (chance, count) =>
			times(count, () => ({
				inputs: { cosmology: cosmology(chance), z: chance.magnitude(1e-3, 1100) }
			})),
		ours({ inputs }) {
			const numbers = numbersOf('cosmo.at_z', inputs as RawInputs);
			return {
				...numbers,
				'age by scipy': numbers.age,
				'lookback by scipy': numbers.lookback,
				'comoving_distance by scipy': numbers.comoving_distance,
				'particle_horizon by scipy': numbers.particle_horizon
			};
		}
	};
}

const matter = (chance: Chance) => ({
	H0: chance.between(40, 100),
	Om0: chance.between(0.1, 0.6)
});
const light = (chance: Chance) => ({
	Tcmb0: chance.one([0, 2.7255, chance.between(2, 3.5)]),
	Neff: chance.between(3, 3.99)
});
const evolving = (chance: Chance) => ({
	w0: chance.between(-1.3, -0.7),
	wa: chance.between(-0.4, 0.4)
});
const heavy = (chance: Chance) => ({
	Tcmb0: 2.7255,
	Neff: chance.between(3, 3.99),
	m_nu: chance.one([
		[chance.between(0.01, 0.5)],
		[0, 0, chance.between(0.01, 0.3)],
		[0, chance.between(0.005, 0.02), chance.between(0.05, 1)]
	])
});

/** Any of the four kinds. */
const anyUniverse = (chance: Chance): RawInputs => ({
	...matter(chance),
	...chance.one([light, heavy])(chance),
	...(chance.one([true, false]) ? { Ode0: chance.between(0.3, 0.95) } : {}),
	...(chance.one([true, false]) ? evolving(chance) : {})
});

const UNDONE = ['z_from_age', 'z_from_lookback', 'z_from_comoving', 'z_from_luminosity'];

export const expandingFamilies: Family[] = [
	atRedshift('flat', 'Flat universes with and without radiation', FLAT_COLUMNS, (chance) => ({
		...matter(chance),
		...light(chance)
	})),
	atRedshift('curved', 'Curved universes', COLUMNS, (chance) => ({
		...matter(chance),
		...light(chance),
		Ode0: chance.between(0.3, 0.95)
	})),
	atRedshift('dark-energy', 'Dark energy that changes (w0, wa)', COLUMNS, (chance) => ({
		...matter(chance),
		...light(chance),
		...evolving(chance),
		Ode0: chance.between(0.3, 0.95)
	})),
	atRedshift('heavy-neutrinos', 'Neutrinos with mass', FLAT_COLUMNS, (chance) => ({
		...matter(chance),
		...heavy(chance)
	})),
	{
		name: 'inverse',
		title: 'Redshift from age, look-back time and distances',
		reference: 'scipy.integrate.quad on astropy’s E(z), at a redshift that is then found again',
		columns: within(1e-10, ...UNDONE),
		rows: (chance, count) =>
			times(count, () => {
				const cosmology = { ...matter(chance), ...light(chance) };
				return { cosmology, z: chance.magnitude(0.01, 10) };
			}),
		ours: ({ cosmology }, reference) =>
			Object.fromEntries(
				UNDONE.map((kind) => [
					kind,
					numbersOf('cosmo.inverse', { cosmology, kind, value: reference[`${kind} value`] }).z
				])
			)
	},
	{
		name: 'time-between',
		title: 'Time between two redshifts',
		reference: 'scipy.integrate.quad on astropy’s E(z)',
		columns: within(1e-11, 'duration'),
		rows: (chance, count) =>
			times(count, () => {
				const z1 = chance.magnitude(1e-3, 1000);
				const z2 = chance.one([z1 * (1 + chance.magnitude(1e-8, 1)), chance.magnitude(1e-3, 1000)]);
				return { inputs: { cosmology: anyUniverse(chance), z1, z2 } };
			}),
		ours: ({ inputs }) => numbersOf('cosmo.age_diff', inputs as RawInputs)
	}
];
