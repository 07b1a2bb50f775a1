/** Published values of motion: falls, throws, swings, collisions, near the speed of light, rockets, orbits. */
import type { CheckValue } from '../../calculator.ts';
import { rows } from './row.ts';

const openStax = (example: string) => ({
	source: `OpenStax, College Physics, ${example}`,
	verification: 'from memory'
});
const ROCKET_PAGE = {
	source: 'Gibbs and Koks, The Relativistic Rocket (Usenet Physics FAQ), table for 1 g',
	verification: 'from memory'
};
const ACCELERATORS = {
	source: 'CERN: protons of 7 TeV, electrons of 104.5 GeV',
	verification: 'from memory'
};
const MUONS = {
	source: 'Review of Particle Physics: cτ of muon and charged pion',
	verification: 'from memory'
};
const FACT_SHEETS = { source: 'NASA NSSDCA, Earth fact sheet', verification: 'from memory' };

export const motionChecks = (): Record<string, CheckValue[]> => ({
	'energy.drop': rows('coaster', openStax('example 7.8, a roller coaster'), [
		[
			'Speed after 20.0 m from rest',
			{ height_m: 20, mass_kg: 1, g_ms2: 9.8 },
			'impactSpeed',
			19.8,
			0.05,
			'm/s'
		],
		[
			'Speed after 20.0 m from 5.00 m/s',
			{ height_m: 20, mass_kg: 1, v0_ms: 5, g_ms2: 9.8 },
			'impactSpeed',
			20.4,
			0.05,
			'm/s'
		]
	]),
	'projectile.vacuum': rows('fireworks', openStax('example 3.4, a shell of fireworks'), [
		[
			'Apex of a shell fired at 70.0 m/s and 75°',
			{ v0_ms: 70, angle_deg: 75, g_ms2: 9.8 },
			'apex',
			233,
			0.5,
			'm'
		]
	]),
	'fall.drag': rows('skydiver', openStax('section 5.2, a skydiver head first'), [
		[
			'Terminal speed',
			{ mass_kg: 75, rho: 1.21, Cd: 0.7, area_m2: 0.18, t_s: 60, g_ms2: 9.8 },
			'terminalSpeed',
			98,
			0.6,
			'm/s'
		]
	]),
	'mech.pendulum': rows('pendulum', openStax('example 16.5, g from a pendulum'), [
		[
			'Period of 75.000 cm where g is 9.8281 m/s²',
			{ L_m: 0.75, theta0_deg: 1, g: 9.8281 },
			'small',
			1.7357,
			5e-5,
			's'
		]
	]),
	'mech.spring': rows('shocks', openStax('example 16.4, a car on its springs'), [
		['Period of 900 kg on 6.53 × 10⁴ N/m', { k: 65300, mass_kg: 900 }, 'period', 0.738, 0.0005, 's']
	]),
	'mech.rolling': rows('cylinder', openStax('example 10.10, a rolling cylinder'), [
		['Speed after 2.00 m', { height_m: 2, k: 0.5, g: 9.8 }, 'speed', 5.11, 0.005, 'm/s']
	]),
	'mech.collision': [
		...rows('elastic', openStax('example 8.4, an elastic collision'), [
			[
				'0.500 kg at 4.00 m/s bounces off 3.50 kg',
				{ m1: 0.5, m2: 3.5, u1: 4, u2: 0, e: 1 },
				'v1',
				-3,
				0.005,
				'm/s'
			],
			[
				'3.50 kg struck by 0.500 kg at 4.00 m/s',
				{ m1: 0.5, m2: 3.5, u1: 4, u2: 0, e: 1 },
				'v2',
				1,
				0.005,
				'm/s'
			]
		]),
		...rows('goalie', openStax('example 8.5, a puck and a goalie'), [
			[
				'Energy lost when the goalie holds the puck',
				{ m1: 0.15, m2: 70, u1: 35, u2: 0, e: 0 },
				'energyLost',
				91.7,
				0.05,
				'J'
			]
		])
	],
	'mech.buoyancy': rows('floating', openStax('example 11.9, density by floating'), [
		[
			'970 kg/m³ in fresh water',
			{ rhoBody: 970, rhoFluid: 1000, V: 1 },
			'submergedFraction',
			97,
			0.05,
			'%',
			100
		]
	]),
	'sr.kinematics': rows('muon-example', openStax('example 28.1, a muon at 0.950 c'), [
		['Lorentz factor', { beta: 0.95, mass_kg: 1, properTime_s: 1.52e-6 }, 'gamma', 3.2, 0.005, ''],
		[
			'1.52 µs, seen from the ground',
			{ beta: 0.95, mass_kg: 1, properTime_s: 1.52e-6 },
			'dilatedTime',
			4.87,
			0.005,
			'µs',
			1e6
		]
	]),
	'sr.from_gamma': rows('accelerators', ACCELERATORS, [
		[
			'A proton of 7 TeV falls short of c by',
			{ gamma: 7460.52 },
			'one_minus_beta',
			9,
			0.1,
			'10⁻⁹',
			1e9
		],
		[
			'An electron of 104.5 GeV falls short of c by',
			{ gamma: 204501 },
			'one_minus_beta',
			12,
			0.5,
			'10⁻¹²',
			1e12
		]
	]),
	'sr.add': rows('canister', openStax('example 28.3, a canister from a ship'), [
		['0.750 c ahead of a ship at 0.500 c', { beta1: 0.5, beta2: 0.75 }, 'beta', 0.909, 0.0005, ''],
		['0.750 c behind a ship at 0.500 c', { beta1: 0.5, beta2: -0.75 }, 'beta', -0.4, 0.0005, '']
	]),
	'sr.rocket_trip': rows('relativistic-rocket', ROCKET_PAGE, [
		['To the nearest star, 4.3 ly, ship’s time', { distance_ly: 4.3 }, 'shipTime', 3.6, 0.05, 'yr'],
		['To Vega, 27 ly, ship’s time', { distance_ly: 27 }, 'shipTime', 6.6, 0.05, 'yr'],
		[
			'To the centre of the Galaxy, 30 000 ly, ship’s time',
			{ distance_ly: 30000 },
			'shipTime',
			20,
			0.5,
			'yr'
		]
	]),
	'decay.in_flight': [
		...rows('muon-path', MUONS, [
			[
				'Muon at p = mc: its path',
				{ beta: Math.SQRT1_2, path_m: 100, meanLife_s: 2.1969811e-6 },
				'meanPath',
				658.638,
				0.0005,
				'm'
			],
			[
				'Charged pion at p = mc: its path',
				{ beta: Math.SQRT1_2, path_m: 1, meanLife_s: 2.6033e-8 },
				'meanPath',
				7.8045,
				5e-5,
				'm'
			]
		]),
		...rows(
			'storage-ring',
			{ source: 'Bailey et al. 1977, Nature 268, 301', verification: 'from memory' },
			[
				[
					'Muons in a storage ring, γ = 29.33',
					{ beta: 0.9994186, path_m: 100, meanLife_s: 2.197e-6 },
					'meanLifetime',
					64.4,
					0.1,
					'µs',
					1e6
				]
			]
		)
	],
	'orbit.kepler': rows('earth', FACT_SHEETS, [
		[
			'Earth’s speed at perihelion',
			{ mass_kg: 1.98841e30, a_m: 1.49598e11, e: 0.0167 },
			'vPeri',
			30.29,
			0.005,
			'km/s'
		]
	]),
	'orbit.kepler_equation': rows(
		'meeus',
		{ source: 'Meeus, Astronomical Algorithms, example 30.a', verification: 'from memory' },
		[
			[
				'e = 0.1, M = 5°: eccentric anomaly',
				{ M_rad: 0.08726646259971647, e: 0.1 },
				'E',
				5.554589,
				5e-7,
				'°',
				57.29577951308232
			]
		]
	)
});
