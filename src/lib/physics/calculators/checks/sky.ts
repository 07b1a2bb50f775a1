/** Published values of gravity, planets, stars and the sky at 21 cm. */
import type { CheckValue } from '../../calculator.ts';
import { rows } from './row.ts';

const textbook = { source: 'textbooks of astronomy', verification: 'from memory' };
const BOWMAN = {
	source: 'Bowman et al. 2018, Nature 555, 67: 50 to 100 MHz is z from 27 to 13',
	verification: 'from memory'
};
const GW150914 = {
	source: 'Abbott et al. 2016, PRL 116, 241102: chirp mass of GW150914',
	verification: 'from memory'
};
const CHELYABINSK = {
	source: 'Popova et al. 2013, Science 342, 1069: the Chelyabinsk airburst',
	verification: 'from memory'
};
const planck18 = { set: 'Planck18' };

export const skyChecks = (): Record<string, CheckValue[]> => ({
	'gravity.black_hole': rows(
		'hawking-lifetime',
		{ source: 'Hawking 1975; textbooks', verification: 'from memory' },
		[
			[
				'Lifetime of a hole of one solar mass',
				{ mass_kg: 1.988409870698051e30 },
				'lifetime',
				2.1,
				0.05,
				'10⁶⁷ yr',
				1e-67
			]
		]
	),
	'tide.roche': [
		...rows('solar-tide', textbook, [
			[
				'The Sun’s tide at Earth',
				{ M_kg: 1.98841e30, r_m: 6378100, d_m: 149597870700, rhoM: 5513, rhom: 3346 },
				'tidalAccel',
				5.05,
				0.02,
				'10⁻⁷ m/s²',
				1e7
			]
		]),
		...rows('roche-earth', textbook, [
			[
				'Roche limit of Earth for a rigid Moon',
				{ R_m: 6378137, r_m: 1737400, d_m: 384400000, rhoM: 5513, rhom: 3346 },
				'rocheRigid',
				9492,
				5,
				'km',
				1e-3
			]
		])
	],
	'exoplanet.transit': rows(
		'jupiter-transit',
		{ source: 'Winn 2010; textbooks', verification: 'from memory' },
		[
			[
				'Depth of Jupiter’s transit across the Sun',
				{ Rp_m: 7.1492e7, Rs_m: 6.957e8, a_m: 7.783e11 },
				'depth',
				1,
				0.1,
				'%',
				100
			]
		]
	),
	'exoplanet.rv': rows(
		'51-peg',
		{ source: 'Butler et al. 2006, ApJ 646, 505: 51 Pegasi b', verification: 'from memory' },
		[
			[
				'Amplitude of 51 Pegasi',
				{ P_s: 365539.824, m_kg: 8.95915e26, M_kg: 2.1673669e30, e: 0.013 },
				'K',
				55.94,
				0.69,
				'm/s'
			]
		]
	),
	'gw.inspiral': [
		...rows('gw150914', GW150914, [
			[
				'Chirp mass of 36 and 29 solar masses',
				{ m1_Msun: 36, m2_Msun: 29, distance_Mpc: 410, f_Hz: 30 },
				'chirpMass',
				28.1,
				0.05,
				'Msun'
			]
		]),
		...rows(
			'neutron-stars',
			{ source: 'Abbott et al. 2017, PRL 119, 161101; textbooks', verification: 'from memory' },
			[
				[
					'Chirp mass of two neutron stars of 1.4 solar masses',
					{ m1_Msun: 1.4, m2_Msun: 1.4, distance_Mpc: 40, f_Hz: 100 },
					'chirpMass',
					1.219,
					0.0005,
					'Msun'
				]
			]
		),
		...rows(
			'last-orbit',
			{
				source: 'Maggiore 2007, Gravitational Waves 1, §4.1: twice 2.2 kHz for one solar mass',
				verification: 'from memory'
			},
			[
				[
					'Last stable orbit of one solar mass in all',
					{ m1_Msun: 0.5, m2_Msun: 0.5, distance_Mpc: 40, f_Hz: 100 },
					'lastStableFrequency',
					4.4,
					0.1,
					'kHz',
					1e-3
				]
			]
		)
	],
	'impact.energy': rows('chelyabinsk', CHELYABINSK, [
		[
			'Mass of 19.8 m at 3300 kg/m³',
			{ diameter_m: 19.8, density_kgm3: 3300, speed_ms: 19160 },
			'mass',
			1.3,
			0.05,
			'10⁷ kg',
			1e-7
		],
		[
			'Its energy at 19.16 km/s',
			{ diameter_m: 19.8, density_kgm3: 3300, speed_ms: 19160 },
			'energyTNT',
			590,
			50,
			'ktTNT'
		]
	]),
	'g21.frequency_from_z': rows('band-edges', BOWMAN, [
		['The low end of the band, z = 27', { z: 27 }, 'frequency', 50, 1, 'MHz'],
		['The high end of the band, z = 13', { z: 13 }, 'frequency', 100, 2, 'MHz']
	]),
	'g21.z_from_frequency': rows('band-redshifts', BOWMAN, [
		['50 MHz', { frequency_MHz: 50 }, 'z', 27, 0.5, ''],
		['100 MHz', { frequency_MHz: 100 }, 'z', 13, 0.5, '']
	]),
	'g21.dark_ages': rows(
		'dark-ages',
		{
			source:
				'Pritchard and Loeb 2012, Rep. Prog. Phys. 75, 086901: about −40 mK near z = 85 to 90',
			verification: 'from memory'
		},
		[
			[
				'Depth of the dark-ages trough at z = 85',
				{ cosmology: planck18, z: 85 },
				'dTb_exact',
				-40,
				3,
				'mK'
			]
		]
	)
});
