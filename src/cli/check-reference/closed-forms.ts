/** Light, motion, units and constants against astropy, scipy and 80-bit arithmetic. */
import type { RawInputs } from '../../lib/physics/calculator.ts';
import { constants } from '../../lib/physics/constants/index.ts';
import { convert } from '../../lib/physics/units/units.ts';
import { numbersOf, times, within, type Family } from './family.ts';

/** A family whose rows are a calculator’s own inputs. */
function ofCalculator(
	calculator: string,
	family: Omit<Family, 'rows' | 'ours'>,
	inputs: (chance: Parameters<Family['rows']>[0]) => RawInputs
): Family {
	return {
		...family,
		rows: (chance, count) => times(count, () => ({ inputs: inputs(chance) })),
		ours: (row) => numbersOf(calculator, row.inputs as RawInputs)
	};
}

/** hc/k in nm K: the wavelength at which hν = kT, times T. */
const HC_OVER_K_NM = 14_387_768.775;

const blackBody: Family[] = [
	ofCalculator(
		'blackbody.planck',
		{
			name: 'black-body',
			title: 'Glow at one wavelength or frequency',
			reference: 'astropy.modeling BlackBody',
			// A relative error of 1e-16 in hν/kT is 6e-14 in the light at hν/kT = 600.
			columns: within(1e-12, 'B_lambda', 'B_nu')
		},
		(chance) => {
			const T_K = chance.magnitude(1e-2, 1e9);
			const wavelength = HC_OVER_K_NM / T_K / chance.magnitude(1e-4, 600);
			return chance.one([
				{ T_K, wavelength_nm: wavelength },
				{ T_K, frequency_Hz: 299_792_458e9 / wavelength }
			]);
		}
	),
	ofCalculator(
		'blackbody.total',
		{
			name: 'black-body-whole',
			title: 'Glow in all, and its peaks',
			reference: 'astropy.constants; scipy.special lambertw and zeta',
			columns: within(
				1e-12,
				'peakWavelength',
				'peakFrequency',
				'flux',
				'photonDensity',
				'energyDensity',
				'meanPhotonEnergy'
			)
		},
		(chance) => ({ T_K: chance.magnitude(1e-3, 1e12) })
	),
	ofCalculator(
		'blackbody.band_fraction',
		{
			name: 'black-body-band',
			title: 'Share of the glow in a band',
			reference: 'scipy.integrate.quad of Planck’s law',
			columns: within(1e-11, 'fraction')
		},
		(chance) => {
			const T_K = chance.magnitude(1, 1e7);
			const from_nm = HC_OVER_K_NM / T_K / chance.magnitude(0.02, 50);
			return { T_K, from_nm, to_nm: from_nm * (1 + chance.magnitude(1e-2, 30)) };
		}
	)
];

/** Our symbols beside astropy’s names, in groups that convert into one another. */
const UNIT_NAMES: Record<string, string>[] = [
	{ m: 'm', mm: 'mm', cm: 'cm', km: 'km', µm: 'um', nm: 'nm', au: 'AU', ly: 'lyr', Mly: 'Mlyr' },
	{ pc: 'pc', kpc: 'kpc', Mpc: 'Mpc', Gpc: 'Gpc', ly: 'lyr', Gly: 'Glyr', km: 'km', Rsun: 'R_sun' },
	{ Rsun: 'R_sun', Rearth: 'R_earth', Rjup: 'R_jup', km: 'km', au: 'AU' },
	{ s: 's', ms: 'ms', min: 'min', h: 'h', d: 'd', yr: 'yr', Myr: 'Myr', Gyr: 'Gyr' },
	{ Hz: 'Hz', kHz: 'kHz', MHz: 'MHz', GHz: 'GHz', THz: 'THz' },
	{ kg: 'kg', g: 'g', t: 't', u: 'u', Msun: 'M_sun', Mearth: 'M_earth', Mjup: 'M_jup' },
	{ J: 'J', kJ: 'kJ', eV: 'eV', keV: 'keV', MeV: 'MeV', Wh: 'W h', kWh: 'kW h', erg: 'erg' },
	{ J: 'J', cal: 'cal', kcal: 'kcal', ftlbf: 'ft lbf', foe: '1e44 J', erg: 'erg' },
	{ W: 'W', kW: 'kW', MW: 'MW', Lsun: 'L_sun' },
	{ rad: 'rad', deg: 'deg', arcmin: 'arcmin', arcsec: 'arcsec', mas: 'mas' },
	{ 'm/s': 'm/s', 'km/s': 'km/s', 'km/h': 'km/h' },
	{ '°C': 'deg_C', '°F': 'deg_F', K: 'K' }
];

const units: Family = {
	name: 'units',
	title: 'Units',
	reference: 'astropy.units',
	columns: [
		{
			key: 'value',
			allowed: 1e-13,
			limit: {
				says: 'astropy builds the foot-pound on a slug of eight digits',
				allowed: ({ from, to }) => ([from, to].includes('ft lbf') ? 2e-8 : 0)
			}
		}
	],
	rows: (chance, count) =>
		times(count, () => {
			const group = chance.one(UNIT_NAMES);
			const [own, theirs] = chance.one(Object.entries(group));
			// A temperature is told in kelvin, where no difference near 0 can lose digits.
			const [ownTo, theirsTo] = 'K' in group ? ['K', 'K'] : chance.one(Object.entries(group));
			return { own, ownTo, from: theirs, to: theirsTo, value: chance.magnitude(1e-6, 1e6) };
		}),
	ours: ({ value, own, ownTo }) => ({
		value: convert(value as number, own as string, ownTo as string)
	})
};

const CODATA_NAMES = {
	c: 'speed of light in vacuum',
	h: 'Planck constant',
	k: 'Boltzmann constant',
	e: 'elementary charge',
	N_A: 'Avogadro constant',
	G: 'Newtonian constant of gravitation',
	m_e: 'electron mass',
	m_p: 'proton mass',
	m_u: 'atomic mass constant',
	alpha: 'fine-structure constant',
	R_inf: 'Rydberg constant',
	sigma_T: 'Thomson cross section',
	eps_0: 'vacuum electric permittivity',
	g_0: 'standard acceleration of gravity',
	sigma: 'Stefan-Boltzmann constant'
} as const;

const ASTRONOMICAL_NAMES = {
	au: 'au',
	pc: 'pc',
	GM_sun: 'GM_sun',
	R_sun: 'R_sun',
	L_sun: 'L_sun'
} as const;

interface ConstantRow {
	of: 'scipy' | 'astropy';
	key: string;
	name: string;
}

const constantRows: ConstantRow[] = [
	...Object.entries(CODATA_NAMES).map(([key, name]) => ({ of: 'scipy', key, name }) as const),
	...Object.entries(ASTRONOMICAL_NAMES).map(
		([key, name]) => ({ of: 'astropy', key, name }) as const
	)
];

const fixedConstants: Family = {
	name: 'constants',
	title: 'Constants (each once: there is nothing random in them)',
	reference: 'scipy.constants (CODATA 2018), astropy.constants (IAU 2012, 2015)',
	columns: [
		{
			key: 'value',
			allowed: 1e-15,
			limit: {
				says: 'scipy holds σ, exact by the SI, to the ten digits that CODATA prints',
				allowed: ({ key }) => (key === 'sigma' ? 1e-9 : 0)
			}
		},
		{ key: 'uncertainty', allowed: 1e-12 }
	],
	rows: () => constantRows.map((row) => ({ ...row })),
	ours(row) {
		const { of, key } = row as unknown as ConstantRow;
		if (of === 'astropy') {
			return { value: constants.astronomical[key as keyof typeof ASTRONOMICAL_NAMES].value };
		}
		const { value, uncertainty } = constants.physical[key as keyof typeof CODATA_NAMES];
		return { value, uncertainty: uncertainty === 'exact' ? 0 : uncertainty };
	}
};

const light: Family[] = [
	ofCalculator(
		'photon.convert',
		{
			name: 'photon',
			title: 'Photon: wavelength, frequency, energy, momentum',
			reference: 'astropy.units spectral equivalency',
			columns: within(1e-13, 'wavelength', 'frequency', 'energy', 'energyJ', 'momentum')
		},
		(chance) =>
			chance.one([
				{ wavelength_nm: chance.magnitude(1e-9, 1e18) },
				{ frequency_Hz: chance.magnitude(1, 1e27) },
				{ energy_eV: chance.magnitude(1e-15, 1e13) }
			])
	),
	{
		name: 'air',
		title: 'Air and vacuum wavelengths',
		reference: 'the three published formulas in 80-bit numbers (astropy has none of them)',
		columns: [...within(1e-15, 'air', 'vacuum'), ...within(1e-12, 'n_minus_1')],
		rows: (chance, count) =>
			times(count, () => ({
				nm: chance.between(200, 2500),
				formula: chance.one(['ciddor1996', 'edlen1953', 'edlen1966'])
			})),
		ours: ({ nm, formula }) => ({
			...numbersOf('air.from_vacuum', { vacuum_nm: nm, formula }),
			...numbersOf('air.to_vacuum', { air_nm: nm, formula })
		})
	},
	{
		name: 'starlight',
		title: 'Parallax and magnitudes',
		reference: 'astropy.coordinates Distance; astropy.units magnitudes',
		columns: within(1e-12, 'distance', 'distanceLy', 'distmod', 'fluxRatio', 'Mbol'),
		rows: (chance, count) =>
			times(count, () => ({
				parallax_mas: chance.one([chance.magnitude(1e-3, 90), chance.between(110, 1000)]),
				dm: chance.between(-30, 30),
				L_W: chance.magnitude(1e20, 1e27)
			})),
		ours: ({ parallax_mas, dm, L_W }) => ({
			...numbersOf('stars.magnitude', { parallax_mas }),
			...numbersOf('stars.magnitude', { dm }),
			...numbersOf('stars.magnitude', { L_W })
		})
	}
];

const relativity: Family[] = [
	{
		name: 'special-relativity',
		title: 'Speed, Lorentz factor and Doppler shift',
		reference: 'the formulas in 80-bit numbers',
		columns: within(
			1e-13,
			'gamma',
			'gamma_minus_1',
			'rapidity',
			'kineticEnergy',
			'dilatedTime',
			'z',
			'transverse_z'
		),
		rows: (chance, count) =>
			times(count, () => ({
				inputs: {
					beta: chance.one([chance.magnitude(1e-9, 0.5), 1 - chance.magnitude(1e-12, 0.5)]),
					mass_kg: chance.magnitude(1e-30, 1e30),
					properTime_s: chance.magnitude(1e-9, 1e15)
				}
			})),
		ours({ inputs }) {
			const { beta } = inputs as { beta: number };
			return {
				...numbersOf('sr.kinematics', inputs as RawInputs),
				...numbersOf('doppler.z_from_beta', { beta })
			};
		}
	},
	{
		name: 'shift-to-speed',
		title: 'Doppler shift to speed',
		reference: 'the formula in 80-bit numbers',
		columns: within(1e-14, 'beta', 'one_minus_beta'),
		rows: (chance, count) =>
			times(count, () => ({
				z: chance.one([chance.magnitude(1e-9, 1e4), -chance.magnitude(1e-6, 0.99)])
			})),
		ours: ({ z }) => numbersOf('doppler.beta_from_z', { z })
	},
	ofCalculator(
		'sr.add',
		{
			name: 'speeds-added',
			title: 'Speeds added',
			reference: 'the formula in 80-bit numbers',
			columns: within(1e-13, 'beta')
		},
		(chance) => ({ beta1: chance.between(0, 0.999_999), beta2: chance.between(0, 0.999_999) })
	)
];

const motion: Family[] = [
	ofCalculator(
		'orbit.kepler_equation',
		{
			name: 'kepler-equation',
			title: 'Kepler’s equation',
			reference: 'halving in 80-bit numbers, one turn',
			columns: within(1e-12, 'E', 'trueAnomaly')
		},
		(chance) => ({
			M_rad: chance.magnitude(1e-6, 3.14) * chance.one([1, -1]),
			e: chance.between(0, 0.99)
		})
	),
	ofCalculator(
		'orbit.kepler',
		{
			name: 'orbit',
			title: 'Period and speeds of an orbit',
			reference: 'astropy.constants and units',
			columns: within(1e-12, 'period', 'vPeri', 'vApo')
		},
		(chance) => ({
			mass_kg: chance.magnitude(1e20, 1e33),
			a_m: chance.magnitude(1e11, 1e18),
			e: chance.between(0, 0.95)
		})
	),
	ofCalculator(
		'mech.pendulum',
		{
			name: 'pendulum',
			title: 'Pendulum at any swing',
			reference: 'scipy.special.ellipkm1',
			columns: within(1e-12, 'small', 'exact')
		},
		(chance) => ({
			L_m: chance.magnitude(1e-3, 1e4),
			theta0_deg: chance.between(0, 179.9),
			g: chance.magnitude(0.1, 100)
		})
	),
	ofCalculator(
		'projectile.drag',
		{
			name: 'projectile',
			title: 'Throw through air',
			reference: 'scipy.integrate.solve_ivp, DOP853, relative 1e-12',
			columns: [
				...within(1e-8, 'range', 'time', 'apex', 'impactSpeed'),
				...within(1e-13, 'terminalSpeed')
			]
		},
		(chance) => ({
			v0_ms: chance.between(5, 100),
			angle_deg: chance.between(10, 80),
			mass_kg: chance.magnitude(0.05, 100),
			diameter_m: chance.magnitude(0.02, 0.5),
			Cd: chance.between(0.1, 1.2),
			rho: 1.225,
			h0_m: chance.between(0.1, 50),
			g_ms2: 9.80665
		})
	)
];

export const closedFormFamilies: Family[] = [
	...blackBody,
	...light,
	units,
	fixedConstants,
	...relativity,
	...motion
];
