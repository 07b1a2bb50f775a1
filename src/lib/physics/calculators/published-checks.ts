/**
 * Values that the calculators must reproduce: published ones, each with where it was printed and how far that was
 * verified; and where fewer than three were found, ones worked with another method, which say so. A calculator shows its
 * own on its page; the tests weigh them all.
 */
import type { CheckValue } from '../calculator.ts';
import { computedHereChecks } from './checks/computed-here.ts';
import { computedSkyChecks } from './checks/computed-sky.ts';
import { lightChecks } from './checks/light.ts';
import { matterChecks } from './checks/matter.ts';
import { motionChecks } from './checks/motion.ts';
import { skyChecks } from './checks/sky.ts';
import { CLOSED_FORM_CHECKS } from './published-checks-closed-forms.ts';

const PUBLISHED: Record<string, CheckValue[]> = {
	...CLOSED_FORM_CHECKS,
	'cosmo.at_z': [
		{
			id: 'chk-01',
			statement: 'Age of the Universe, Planck 2018',
			inputs: { cosmology: { set: 'Planck18' }, z: 0 },
			output: 'age',
			outputScale: 1,
			published: 13.787,
			tolerance: 0.02,
			unit: 'Gyr',
			source: 'Planck Collaboration 2018 VI, A&A 641 A6, Table 2 last column',
			verification: 'verified: astropy 5.2.1 Planck18.meta t0'
		},
		{
			id: 'chk-02',
			statement: 'Age of the Universe, Planck 2015',
			inputs: { cosmology: { set: 'Planck15' }, z: 0 },
			output: 'age',
			outputScale: 1,
			published: 13.799,
			tolerance: 0.021,
			unit: 'Gyr',
			source: 'Planck Collaboration 2015 XIII, A&A 594 A13, Table 4',
			verification: 'verified: astropy Planck15.meta t0 (uncertainty from memory)'
		},
		{
			id: 'chk-03',
			statement: 'Age of the Universe, Planck 2013',
			inputs: { cosmology: { set: 'Planck13' }, z: 0 },
			output: 'age',
			outputScale: 1,
			published: 13.7965,
			tolerance: 0.037,
			unit: 'Gyr',
			source: 'Planck Collaboration 2013 XVI, A&A 571 A16, Table 5',
			verification: 'verified: astropy Planck13.meta t0 (uncertainty from memory)'
		},
		{
			id: 'chk-04',
			statement: 'Age of the Universe, WMAP 9-year',
			inputs: { cosmology: { set: 'WMAP9' }, z: 0 },
			output: 'age',
			outputScale: 1,
			published: 13.772,
			tolerance: 0.059,
			unit: 'Gyr',
			source: 'Hinshaw et al. 2013, ApJS 208 19, Table 4',
			verification: 'verified: astropy WMAP9.meta t0 (uncertainty from memory)'
		},
		{
			id: 'chk-05',
			statement: 'Age now in the worked example H₀ = 71, Ωₘ = 0.27, flat',
			inputs: { cosmology: { H0: 71, Om0: 0.27, Tcmb0: 2.72528, Neff: 3.04, m_nu: [0] }, z: 0 },
			output: 'age',
			outputScale: 1,
			published: 13.666,
			tolerance: 0.005,
			unit: 'Gyr',
			source: 'Wright 2006, PASP 118 1711',
			verification: 'from memory'
		},
		{
			id: 'chk-06',
			statement: 'Matter alone (Einstein and de Sitter), H₀ = 50: age 2/(3H₀)',
			inputs: { cosmology: { H0: 50, Om0: 1 }, z: 0 },
			output: 'age',
			outputScale: 1,
			published: 13.037,
			tolerance: 0.001,
			unit: 'Gyr',
			source: 'the closed form 2/(3H₀), Hogg 1999, astro-ph/9905116',
			verification: 'verified: closed form'
		},
		{
			id: 'chk-07',
			statement: 'Comoving distance to last scattering, z = 1089.8',
			inputs: { cosmology: { set: 'Planck18' }, z: 1089.8 },
			output: 'comoving_distance',
			outputScale: 0.001,
			published: 13.87,
			tolerance: 0.03,
			unit: 'Gpc',
			source:
				'Planck Collaboration 2018 VI, Table 2: r* = 144.57 Mpc and 100 θ* = 1.04119 give 13.885 Gpc',
			verification: 'from memory'
		},
		{
			id: 'chk-08',
			statement: 'Age at last scattering',
			inputs: { cosmology: { set: 'Planck18' }, z: 1089.8 },
			output: 'age',
			outputScale: 1000,
			published: 0.38,
			tolerance: 0.01,
			unit: 'Myr',
			source: 'Planck Collaboration 2013 I: “about 380 000 years”',
			verification: 'from memory'
		},
		{
			id: 'chk-09',
			statement: 'Age at the redshift of reionisation, 7.82',
			inputs: { cosmology: { set: 'Planck18' }, z: 7.82 },
			output: 'age',
			outputScale: 1,
			published: 0.66,
			tolerance: 0.1,
			unit: 'Gyr',
			source: 'Planck Collaboration 2018 VI, Table 2: 7.82 ± 0.71',
			verification: 'verified: astropy meta z_reion (age computed)'
		},
		{
			id: 'chk-10',
			statement: 'Age at redshift 14.32, one of the highest measured for a galaxy',
			inputs: { cosmology: { set: 'Planck18' }, z: 14.32 },
			output: 'age',
			outputScale: 1,
			published: 0.29,
			tolerance: 0.01,
			unit: 'Gyr',
			source: 'Carniani et al. 2024, Nature 633 318',
			verification: 'from memory'
		},
		{
			id: 'chk-11',
			statement: 'Present particle horizon (comoving radius of observable Universe)',
			inputs: { cosmology: { set: 'Planck18' }, z: 0 },
			output: 'particle_horizon',
			outputScale: 0.003261563777,
			published: 46.3,
			tolerance: 0.4,
			unit: 'Gly',
			source: 'Davis & Lineweaver 2004, PASA 21 97 (46 Gly); Gott et al. 2005',
			verification: 'from memory'
		},
		{
			id: 'chk-12',
			statement: 'Present event horizon',
			inputs: { cosmology: { set: 'Planck18' }, z: 0 },
			output: 'event_horizon',
			outputScale: 0.003261563777,
			published: 16.7,
			tolerance: 0.6,
			unit: 'Gly',
			source: 'Davis & Lineweaver 2004 (about 16 Gly)',
			verification: 'from memory'
		},
		{
			id: 'chk-13',
			statement: 'Hubble time for H₀ = 67.66',
			inputs: { cosmology: { set: 'Planck18' }, z: 0 },
			output: 'hubble_time',
			outputScale: 1,
			published: 14.45,
			tolerance: 0.01,
			unit: 'Gyr',
			source: 'the definition, 1/H₀',
			verification: 'verified: closed form'
		},
		{
			id: 'chk-14',
			statement: 'Critical density today, h = 0.6766',
			inputs: { cosmology: { set: 'Planck18' }, z: 0 },
			output: 'critical_density',
			outputScale: 1,
			published: 8.6e-27,
			tolerance: 1e-29,
			unit: 'kg/m3',
			source: 'Particle Data Group: 1.878 × 10⁻²⁶ h² kg/m³, from 3H₀²/8πG',
			verification: 'from memory (PDG prefactor)'
		}
	],
	'g21.frequency_from_z': [
		{
			id: 'chk-21',
			statement: '21 cm line wavelength',
			inputs: { z: 0 },
			output: 'wavelength',
			outputScale: 100,
			published: 21.106114,
			tolerance: 1e-6,
			unit: 'cm',
			source: 'Hellwig et al. 1970; c/ν',
			verification: 'from memory'
		}
	],
	'g21.z_from_frequency': [
		{
			id: 'chk-22',
			statement: '78 MHz corresponds to z = 17.2',
			inputs: { frequency_MHz: 78 },
			output: 'z',
			outputScale: 1,
			published: 17.2,
			tolerance: 0.05,
			unit: '',
			source: 'Hills et al. 2018, Nature 564 E32',
			verification: 'from memory'
		}
	],
	'g21.deepest': [
		{
			id: 'chk-26',
			statement: 'Deepest 21 cm absorption near 78 MHz for unheated gas',
			inputs: { cosmology: { set: 'Planck18' }, Yp: 0.245, z: 17.2 },
			output: 'dTb_exact',
			outputScale: 0.001,
			published: -0.2,
			tolerance: 0.03,
			unit: 'K',
			source: 'Barkana 2018; Cohen et al. 2017',
			verification: 'from memory'
		}
	],
	'g21.tk_for_depth': [
		{
			id: 'chk-27',
			statement: 'Gas temperature needed for −500 mK at z = 17.2 (approximate formula)',
			inputs: { cosmology: { set: 'Planck18' }, z: 17.2, depth_mK: -500 },
			output: 'Tk',
			outputScale: 1,
			published: 3.3,
			tolerance: 0.3,
			unit: 'K',
			source: 'Barkana 2018, Nature 555 71 (below about 3.2 K)',
			verification: 'from memory'
		}
	],
	'g21.foreground': [
		{
			id: 'chk-28',
			statement: 'Sky temperature at 78 MHz (average, 180 K at 180 MHz)',
			inputs: { Tref_K: 180, nuref_MHz: 180, nu_MHz: 78, index: -2.6 },
			output: 'Tsky',
			outputScale: 1,
			published: 1600,
			tolerance: 300,
			unit: 'K',
			source: 'Furlanetto, Oh & Briggs 2006',
			verification: 'from memory'
		}
	],
	'thermal.tla1': [
		{
			id: 'chk-23',
			statement: 'Gas temperature at z = 17.2 without heating',
			inputs: { cosmology: { set: 'Planck18' }, Yp: 0.245, z: 17.2 },
			output: 'Tk',
			outputScale: 1,
			published: 7,
			tolerance: 0.5,
			unit: 'K',
			source: 'Barkana 2018, Nature 555 71 (about 7 K)',
			verification: 'from memory'
		},
		{
			id: 'chk-24',
			statement: 'Residual ionised fraction (z = 20)',
			inputs: { cosmology: { set: 'Planck18' }, Yp: 0.245, z: 20 },
			output: 'x_e',
			outputScale: 1,
			published: 0.00021,
			tolerance: 3e-5,
			unit: '',
			source: 'Seager, Sasselov & Scott 1999/2000: 2-3e-4',
			verification: 'from memory'
		},
		{
			id: 'chk-25',
			statement: 'x_e at z = 200, h = 0.70, Ob = 0.04, Om = 0.24, Y = 0.25, T0 = 2.725',
			inputs: {
				cosmology: { H0: 70, Om0: 0.24, Tcmb0: 2.725, Neff: 3.04, m_nu: [0], Ob0: 0.04 },
				Yp: 0.25,
				z: 200
			},
			output: 'x_e',
			outputScale: 1,
			published: 0.00035714,
			tolerance: 1e-6,
			unit: '',
			source: 'RECFAST 1.5.2 example output (public code output file)',
			verification: 'verified: compared with a stored RECFAST output file'
		}
	],
	'energy.convert': [
		{
			id: 'chk-29',
			statement: '1 t TNT',
			inputs: { value: 1, from: 'tTNT', to: 'J' },
			output: 'value',
			outputScale: 1,
			published: 4184000000,
			tolerance: 0,
			unit: 'J',
			source: 'NIST SP 811 Appendix B.8',
			verification: 'verified by definition'
		},
		{
			id: 'chk-30',
			statement: '1 kg rest energy in Mt TNT',
			inputs: { value: 1, from: 'kgmc2', to: 'MtTNT' },
			output: 'value',
			outputScale: 1,
			published: 21.48,
			tolerance: 0.01,
			unit: 'Mt',
			source: 'E=mc^2; textbook',
			verification: 'verified: closed form'
		}
	]
};

/** Built when they are asked for: a reader's frame asks for none, and carries none. */
let tables: Record<string, CheckValue[]>[] | null = null;

/** The values a calculator is checked against, published ones first; none for an id without any. */
export function checksOf(calculatorId: string): CheckValue[] {
	tables ??= [
		PUBLISHED,
		lightChecks(),
		motionChecks(),
		skyChecks(),
		matterChecks(),
		computedSkyChecks(),
		computedHereChecks()
	];
	return tables.flatMap((table) => table[calculatorId] ?? []);
}
