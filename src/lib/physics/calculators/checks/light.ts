/** Published values of light: lines, air, photons, black bodies, the sky's sizes and brightnesses. */
import type { CheckValue } from '../../calculator.ts';
import { rows } from './row.ts';

const MORTON = {
	source: 'Morton 2003, ApJS 149, 205, table 2',
	verification: 'checked against a public transcription of the table'
};
const NIST_LINES = {
	source: 'NIST Atomic Spectra Database',
	verification: 'checked against a public list of vacuum wavelengths'
};
const SCHMIDT = {
	source: 'Schmidt 1963, Nature 197, 1040: the lines of 3C 273, divided by 1.158',
	verification: 'from memory'
};
const CODATA = {
	source: 'CODATA 2018, energy equivalents',
	verification: 'from memory; follows from the exact h, c and e'
};
const PLANCK_TABLE = {
	source:
		'Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, table of black-body functions',
	verification: 'from memory'
};
const FACT_SHEETS = { source: 'NASA NSSDCA planetary fact sheets', verification: 'from memory' };
const OPENSTAX = { source: 'OpenStax, College Physics, example 27.5', verification: 'from memory' };
const ISO_SPECTRUM = { source: 'ISO 21348:2007, spectral categories', verification: 'from memory' };
const IAU_B2 = { source: 'IAU 2015 Resolution B2', verification: 'verified by definition' };

export const lightChecks = (): Record<string, CheckValue[]> => ({
	'line.observe': rows('schmidt-observe', SCHMIDT, [
		[
			'Hβ of 3C 273 comes in at',
			{ restWavelength_nm: 486.4, z: 0.158 },
			'observedWavelength',
			563.2,
			0.1,
			'nm'
		],
		[
			'Hγ of 3C 273 comes in at',
			{ restWavelength_nm: 434.5, z: 0.158 },
			'observedWavelength',
			503.2,
			0.1,
			'nm'
		],
		[
			'Hδ of 3C 273 comes in at',
			{ restWavelength_nm: 410.4, z: 0.158 },
			'observedWavelength',
			475.3,
			0.1,
			'nm'
		]
	]),
	'line.redshift': rows('schmidt-redshift', SCHMIDT, [
		[
			'Redshift of 3C 273 from Hβ',
			{ restWavelength_nm: 486.4, observedWavelength_nm: 563.2 },
			'z',
			0.158,
			0.0005,
			''
		],
		[
			'Redshift of 3C 273 from Hγ',
			{ restWavelength_nm: 434.5, observedWavelength_nm: 503.2 },
			'z',
			0.158,
			0.0005,
			''
		],
		[
			'Redshift of 3C 273 from Hδ',
			{ restWavelength_nm: 410.4, observedWavelength_nm: 475.3 },
			'z',
			0.158,
			0.0005,
			''
		]
	]),
	'line.rydberg': [
		...rows('rydberg-morton', MORTON, [
			[
				'Lyman alpha; fine structure is left out',
				{ nLower: 1, nUpper: 2 },
				'wavelength',
				121.567,
				0.0016,
				'nm'
			]
		]),
		...rows('rydberg-nist', NIST_LINES, [
			[
				'H alpha; fine structure is left out',
				{ nLower: 2, nUpper: 3 },
				'wavelength',
				656.4614,
				0.0098,
				'nm'
			],
			[
				'H beta; fine structure is left out',
				{ nLower: 2, nUpper: 4 },
				'wavelength',
				486.2683,
				0.0073,
				'nm'
			]
		])
	],
	'line.band': rows('band', ISO_SPECTRUM, [
		['Green light, 550 nm', { wavelength_nm: 550 }, 'band', 'visible', 0, ''],
		['Lyman alpha, 121.567 nm', { wavelength_nm: 121.567 }, 'band', 'ultraviolet', 0, ''],
		['The Sun’s X-rays, 1 nm', { wavelength_nm: 1 }, 'band', 'X-ray', 0, '']
	]),
	'air.from_vacuum': rows('air-from', MORTON, [
		['Sodium D2 in air', { vacuum_nm: 589.15833 }, 'air', 588.9951, 0.0001, 'nm'],
		['Ca II K in air', { vacuum_nm: 393.4777 }, 'air', 393.3663, 0.0001, 'nm']
	]),
	'air.to_vacuum': [
		...rows('air-to-morton', MORTON, [
			['Sodium D2 in vacuum', { air_nm: 588.9951 }, 'vacuum', 589.15833, 0.0001, 'nm'],
			['Ca II K in vacuum', { air_nm: 393.3663 }, 'vacuum', 393.4777, 0.0001, 'nm']
		]),
		...rows('air-to-nist', NIST_LINES, [
			['[O III] 5007 in vacuum', { air_nm: 500.6843 }, 'vacuum', 500.824, 0.0001, 'nm']
		])
	],
	'photon.convert': rows('photon', CODATA, [
		['Wavelength of 1 eV', { energy_eV: 1 }, 'wavelength', 1239.841984, 5e-7, 'nm'],
		['Frequency of 1 eV', { energy_eV: 1 }, 'frequency', 2.417989242, 5e-10, '10¹⁴ Hz', 1e-14],
		['1 eV in joules', { energy_eV: 1 }, 'energyJ', 1.602176634, 0, '10⁻¹⁹ J', 1e19]
	]),
	'blackbody.band_fraction': rows('planck-table', PLANCK_TABLE, [
		[
			'Up to λT = 2000 µm K',
			{ T_K: 1000, from_nm: 1, to_nm: 2000 },
			'fraction',
			0.066728,
			1e-5,
			''
		],
		['Up to λT = 5000 µm K', { T_K: 1000, from_nm: 1, to_nm: 5000 }, 'fraction', 0.633747, 3e-5, '']
	]),
	'light.travel': rows('parsec', IAU_B2, [
		['1 pc in astronomical units', { value: 1, unit: 'pc' }, 'au', 206264.806, 0.0005, 'au']
	]),
	'light.flux': rows('irradiance', FACT_SHEETS, [
		['Sunlight at Venus', { L_W: 3.828e26, d_m: 1.0821e11 }, 'flux', 2601.3, 1, 'W/m2'],
		['Sunlight at Mars', { L_W: 3.828e26, d_m: 2.27956e11 }, 'flux', 586.2, 0.5, 'W/m2']
	]),
	'angle.size': [
		...rows(
			'sun-size',
			{
				source: 'The Astronomical Almanac: semidiameter of the Sun, 959.63″',
				verification: 'from memory'
			},
			[
				[
					'The Sun from 1 au, 1.392 million km across',
					{ D_m: 1.392e9, d_m: 149597870700 },
					'angle',
					1919.26,
					0.02,
					'arcsec'
				]
			]
		),
		...rows('disc-size', FACT_SHEETS, [
			['The Moon from 378 000 km', { D_m: 3.4748e6, d_m: 3.78e8 }, 'angle', 1896, 0.5, 'arcsec'],
			['Jupiter at its nearest', { D_m: 1.42984e8, d_m: 5.885e11 }, 'angle', 50.1, 0.05, 'arcsec']
		])
	],
	'angle.diffraction': rows('diffraction', OPENSTAX, [
		[
			'A 2.40 m telescope at 550 nm',
			{ wavelength_nm: 550, D_m: 2.4 },
			'theta',
			2.8,
			0.01,
			'10⁻⁷ rad',
			4.84813681109536e-6 * 1e7
		]
	]),
	'stars.magnitude': rows('magnitude', IAU_B2, [
		['Bolometric magnitude of the Sun', { L_W: 3.828e26 }, 'Mbol', 4.74, 0.005, 'mag'],
		['Five magnitudes fainter', { dm: 5 }, 'fluxRatio', 0.01, 1e-12, '']
	])
});
