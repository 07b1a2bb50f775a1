/**
 * Published values for the calculators in closed form: light, motion, gravity, stars, decay, gases. Each with where it was
 * printed and how far that was verified.
 */
import type { CheckValue } from '../calculator.ts';

export const CLOSED_FORM_CHECKS: Record<string, CheckValue[]> = {
	'blackbody.total': [
		{
			id: 'chk-15',
			statement: 'CMB photon number density at 2.7255 K',
			inputs: { T_K: 2.7255 },
			output: 'photonDensity',
			outputScale: 1e-6,
			published: 410.7,
			tolerance: 0.3,
			unit: 'cm-3',
			source: 'Particle Data Group, Astrophysical constants',
			verification: 'from memory'
		},
		{
			id: 'chk-16',
			statement: 'CMB spectrum peak frequency',
			inputs: { T_K: 2.7255 },
			output: 'peakFrequency',
			outputScale: 1e-9,
			published: 160.2,
			tolerance: 0.1,
			unit: 'GHz',
			source: 'Fixsen 2009 ApJ 707 916 temperature + Wien b’',
			verification: 'verified: scipy CODATA Wien frequency constant'
		},
		{
			id: 'chk-17',
			statement: 'Wien displacement: peak wavelength at 1 K',
			inputs: { T_K: 1 },
			output: 'peakWavelength',
			outputScale: 1,
			published: 2897771.955,
			tolerance: 1,
			unit: 'nm',
			source: 'CODATA 2018 b',
			verification: 'verified: scipy/astropy'
		},
		{
			id: 'chk-18',
			statement: 'Stefan-Boltzmann flux at 1 K',
			inputs: { T_K: 1 },
			output: 'flux',
			outputScale: 1,
			published: 5.670374419e-8,
			tolerance: 1e-17,
			unit: 'W/m2',
			source: 'CODATA 2018 sigma',
			verification: 'verified: scipy/astropy'
		}
	],
	'blackbody.band_fraction': [
		{
			id: 'chk-19',
			statement: 'Fraction of solar-temperature blackbody in 380-760 nm',
			inputs: { T_K: 5772, from_nm: 380, to_nm: 760 },
			output: 'fraction',
			outputScale: 1,
			published: 0.45,
			tolerance: 0.01,
			unit: '',
			source: 'textbook ("just under half")',
			verification: 'from memory'
		}
	],
	'light.flux': [
		{
			id: 'chk-20',
			statement: 'Total solar irradiance at 1 au',
			inputs: { L_W: 3.828e26, d_m: 149597870700 },
			output: 'flux',
			outputScale: 1,
			published: 1361,
			tolerance: 1,
			unit: 'W/m2',
			source: 'IAU 2015 Res. B3 nominal; Kopp & Lean 2011 GRL 38 L01706 (1360.8+-0.5)',
			verification: 'from memory (nominal L, au verified in astropy)'
		}
	],
	'sr.from_gamma': [
		{
			id: 'chk-31',
			statement: 'Proton Lorentz factor at 6.5 TeV: v deficit',
			inputs: { gamma: 6928 },
			output: 'one_minus_beta',
			outputScale: 1,
			published: 1.04e-8,
			tolerance: 1e-10,
			unit: '',
			source: 'CERN LHC design notes',
			verification: 'from memory'
		}
	],
	'sr.kinematics': [
		{
			id: 'chk-32',
			statement: 'Muon storage ring lifetime, gamma 29.33',
			inputs: { beta: 0.9994186, mass_kg: 1, properTime_s: 2.197e-6 },
			output: 'dilatedTime',
			outputScale: 1000000,
			published: 64.4,
			tolerance: 0.1,
			unit: 'us',
			source: 'Bailey et al. 1977, Nature 268 301 (64.4 us)',
			verification: 'from memory'
		}
	],
	'gravity.body': [
		{
			id: 'chk-33',
			statement: 'Escape speed, Earth (mean radius 6371.0 km)',
			inputs: { mass_kg: 5.972167867791379e24, radius_m: 6371000 },
			output: 'escapeSpeed',
			outputScale: 1,
			published: 11.186,
			tolerance: 0.002,
			unit: 'km/s',
			source: 'NASA planetary fact sheet',
			verification: 'from memory'
		},
		{
			id: 'chk-34',
			statement: 'Escape speed, Moon',
			inputs: { mass_kg: 7.346e22, radius_m: 1737400 },
			output: 'escapeSpeed',
			outputScale: 1,
			published: 2.38,
			tolerance: 0.01,
			unit: 'km/s',
			source: 'NASA fact sheet',
			verification: 'from memory'
		},
		{
			id: 'chk-35',
			statement: 'Solar gravitational redshift',
			inputs: { mass_kg: 1.988409870698051e30, radius_m: 695700000 },
			output: 'gravRedshift',
			outputScale: 1,
			published: 2.12e-6,
			tolerance: 1e-8,
			unit: '',
			source: 'Einstein 1911; 636 m/s (e.g. Takeda & Ueno 2012)',
			verification: 'from memory'
		}
	],
	'gravity.black_hole': [
		{
			id: 'chk-36',
			statement: 'Schwarzschild radius of the Sun',
			inputs: { mass_kg: 1.988409870698051e30 },
			output: 'radius',
			outputScale: 0.001,
			published: 2.953,
			tolerance: 0.001,
			unit: 'km',
			source: '2GM/c^2',
			verification: 'verified: closed form'
		},
		{
			id: 'chk-37',
			statement: 'Hawking temperature of a solar-mass hole',
			inputs: { mass_kg: 1.988409870698051e30 },
			output: 'hawkingT',
			outputScale: 1,
			published: 6.17e-8,
			tolerance: 1e-10,
			unit: 'K',
			source: 'Hawking 1975; textbook',
			verification: 'from memory'
		}
	],
	'orbit.kepler': [
		{
			id: 'chk-38',
			statement: 'Geostationary orbital period (a = 42164 km)',
			inputs: { mass_kg: 5.972167867791379e24, a_m: 42164000 },
			output: 'period',
			outputScale: 1,
			published: 86164,
			tolerance: 5,
			unit: 's',
			source: 'sidereal day 86164.09 s (IERS)',
			verification: 'from memory'
		},
		{
			id: 'chk-39',
			statement: 'Comet Halley perihelion speed',
			inputs: { mass_kg: 1.988409870698051e30, a_m: 2667000000000, e: 0.9671 },
			output: 'vPeri',
			outputScale: 1,
			published: 54.5,
			tolerance: 0.3,
			unit: 'km/s',
			source: 'JPL orbital elements a=17.83 au e=0.9671',
			verification: 'from memory'
		}
	],
	'tide.roche': [
		{
			id: 'chk-40',
			statement: 'Lunar tidal acceleration at Earth',
			inputs: { M_kg: 7.346e22, r_m: 6378100, d_m: 384400000 },
			output: 'tidalAccel',
			outputScale: 1,
			published: 1.1e-6,
			tolerance: 2e-8,
			unit: 'm/s2',
			source: 'textbook',
			verification: 'from memory'
		}
	],
	'stars.magnitude': [
		{
			id: 'chk-41',
			statement: 'Proxima Centauri distance',
			inputs: { parallax_mas: 768.0665 },
			output: 'distance',
			outputScale: 1,
			published: 1.302,
			tolerance: 0.0001,
			unit: 'pc',
			source: 'Gaia DR3 parallax 768.0665+-0.0499 mas',
			verification: 'from memory'
		}
	],
	'light.travel': [
		{
			id: 'chk-42',
			statement: 'Parsec in light years',
			inputs: { value: 1, unit: 'pc' },
			output: 'ly',
			outputScale: 1,
			published: 3.261563777,
			tolerance: 1e-9,
			unit: 'ly',
			source: 'IAU 2015 B2 + Julian year',
			verification: 'verified: astropy'
		},
		{
			id: 'chk-43',
			statement: 'Light time for 1 au',
			inputs: { value: 1, unit: 'au' },
			output: 'time',
			outputScale: 1,
			published: 499.004784,
			tolerance: 1e-6,
			unit: 's',
			source: 'IAU 2012 B2 / c',
			verification: 'verified: astropy'
		}
	],
	'exoplanet.transit': [
		{
			id: 'chk-44',
			statement: 'Earth transit depth across the Sun',
			inputs: { Rp_m: 6378100, Rs_m: 695700000, a_m: 149597870700 },
			output: 'depth',
			outputScale: 1000000,
			published: 84,
			tolerance: 1,
			unit: 'ppm',
			source: 'Winn 2010; textbook',
			verification: 'from memory'
		},
		{
			id: 'chk-45',
			statement: 'Earth equilibrium temperature, albedo 0.3',
			inputs: { Rp_m: 6378100, Rs_m: 695700000, a_m: 149597870700, Ts_K: 5772, albedo: 0.3 },
			output: 'Teq',
			outputScale: 1,
			published: 255,
			tolerance: 1,
			unit: 'K',
			source: 'textbook (de Pater & Lissauer)',
			verification: 'from memory'
		}
	],
	'exoplanet.rv': [
		{
			id: 'chk-46',
			statement: 'Jupiter induced solar velocity',
			inputs: { P_s: 374335776, m_kg: 1.8981245973360505e27, M_kg: 1.988409870698051e30 },
			output: 'K',
			outputScale: 1,
			published: 12.5,
			tolerance: 0.1,
			unit: 'm/s',
			source: 'Lovis & Fischer 2010',
			verification: 'from memory'
		},
		{
			id: 'chk-47',
			statement: 'Earth induced solar velocity',
			inputs: { P_s: 31558149.5, m_kg: 5.972167867791379e24, M_kg: 1.988409870698051e30 },
			output: 'K',
			outputScale: 1,
			published: 0.09,
			tolerance: 0.005,
			unit: 'm/s',
			source: 'Lovis & Fischer 2010',
			verification: 'from memory'
		}
	],
	'angle.diffraction': [
		{
			id: 'chk-48',
			statement: 'Diffraction limit of 2.4 m telescope at 550 nm',
			inputs: { wavelength_nm: 550, D_m: 2.4 },
			output: 'theta',
			outputScale: 1,
			published: 0.058,
			tolerance: 0.001,
			unit: 'arcsec',
			source: 'Rayleigh criterion',
			verification: 'verified: closed form'
		}
	],
	'decay.halflife': [
		{
			id: 'chk-49',
			statement: 'Carbon-14 remaining after 11460 yr',
			inputs: { t: 11460, halflife: 5730 },
			output: 'remaining',
			outputScale: 1,
			published: 0.25,
			tolerance: 0,
			unit: '',
			source: 'two half-lives of 5730 yr',
			verification: 'verified: closed form'
		}
	],
	'gas.speeds': [
		{
			id: 'chk-50',
			statement: 'rms speed of N2 at 300 K',
			inputs: { T_K: 300, mass_u: 28.0134 },
			output: 'rms',
			outputScale: 1,
			published: 517,
			tolerance: 1,
			unit: 'm/s',
			source: 'textbook',
			verification: 'from memory'
		},
		{
			id: 'chk-51',
			statement: 'Speed of sound in dry air at 0 C',
			inputs: { T_K: 273.15, mass_u: 28.9647, gamma: 1.4 },
			output: 'sound',
			outputScale: 1,
			published: 331.3,
			tolerance: 0.3,
			unit: 'm/s',
			source: 'Cramer 1993 JASA 93 2510 (331.46 real gas)',
			verification: 'from memory'
		}
	],
	'mech.pendulum': [
		{
			id: 'chk-52',
			statement: 'Foucault pendulum, 67 m',
			inputs: { L_m: 67, theta0_deg: 2, g: 9.81 },
			output: 'exact',
			outputScale: 1,
			published: 16.4,
			tolerance: 0.1,
			unit: 's',
			source: 'Foucault 1851',
			verification: 'from memory'
		}
	],
	'air.from_vacuum': [
		{
			id: 'chk-53',
			statement: 'H alpha in air',
			inputs: { vacuum_nm: 656.4614, formula: 'ciddor1996' },
			output: 'air',
			outputScale: 1,
			published: 656.28,
			tolerance: 0.001,
			unit: 'nm',
			source: 'NIST ASD (656.279-656.282 by component)',
			verification: 'from memory'
		},
		{
			id: 'chk-54',
			statement: '[O III] 5007 in air',
			inputs: { vacuum_nm: 500.824, formula: 'ciddor1996' },
			output: 'air',
			outputScale: 1,
			published: 500.684,
			tolerance: 0.001,
			unit: 'nm',
			source: 'NIST ASD',
			verification: 'from memory'
		}
	],
	'mech.buoyancy': [
		{
			id: 'chk-55',
			statement: 'Iceberg submerged fraction',
			inputs: { rhoBody: 917, rhoFluid: 1025, V: 1 },
			output: 'submergedFraction',
			outputScale: 1,
			published: 0.9,
			tolerance: 0.01,
			unit: '',
			source: 'textbook (917/1025)',
			verification: 'from memory'
		}
	]
};
