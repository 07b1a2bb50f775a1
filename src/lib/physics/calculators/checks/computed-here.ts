/**
 * Check values that nobody printed, of motion, light, matter and uncertainty: worked with another method, which is named.
 */
import type { CheckValue } from '../../calculator.ts';
import { computed, rows } from './row.ts';

export const computedHereChecks = (): Record<string, CheckValue[]> => ({
	'energy.drop': [
		...rows(
			'computed-energy.drop-1',
			computed(
				'conservation of energy (textbook, e.g. Halliday, Resnick and Walker)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Speed at the bottom: height of the drop 10 m, mass 2 kg',
					{ height_m: 10, mass_kg: 2 },
					'impactSpeed',
					14.004749,
					6e-7,
					'm/s'
				]
			]
		)
	],
	'energy.counterweight': [
		...rows(
			'computed-energy.counterweight-1',
			computed(
				'conservation of energy; ideal range 2 (M/m) h efficiency (Siano, Trebuchet Mechanics 2013)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Energy the counterweight gives up, at the first values of every setting',
					{ counterweight_kg: 1000, projectile_kg: 10, drop_m: 3, efficiency: 0.6 },
					'storedEnergy',
					29419.95,
					0.00003,
					'J'
				],
				[
					'Speed of the stone at release, at the first values of every setting',
					{ counterweight_kg: 1000, projectile_kg: 10, drop_m: 3, efficiency: 0.6 },
					'launchSpeed',
					59.417119,
					6e-7,
					'm/s'
				],
				[
					'Longest range on flat ground without air, at the first values of every setting',
					{ counterweight_kg: 1000, projectile_kg: 10, drop_m: 3, efficiency: 0.6 },
					'idealRange',
					360,
					4e-7,
					'm'
				]
			]
		)
	],
	'projectile.vacuum': [
		...rows(
			'computed-projectile.vacuum-1',
			computed('constant-acceleration kinematics (textbook)', 'worked with mpmath at 40 digits'),
			[
				[
					'Range: speed at release 30 m/s, angle above the horizontal 45 deg',
					{ v0_ms: 30, angle_deg: 45 },
					'range',
					91.774459,
					6e-7,
					'm'
				],
				[
					'Time of flight: speed at release 30 m/s, angle above the horizontal 45 deg',
					{ v0_ms: 30, angle_deg: 45 },
					'time',
					4.3262895,
					6e-8,
					's'
				]
			]
		)
	],
	'projectile.drag': [
		...rows(
			'computed-projectile.drag-1',
			computed(
				'quadratic drag dv/dt = -g - (rho Cd A/2m)|v|v (textbook; e.g. Timmerman and van der Weele 1999 Am J Phys 67 538)',
				'worked with scipy’s DOP853'
			),
			[
				[
					'Range, at the first values of every setting',
					{ v0_ms: 50, angle_deg: 45, mass_kg: 0.145, diameter_m: 0.0732, Cd: 0.35, rho: 1.225 },
					'range',
					123.73908,
					0.00001,
					'm'
				],
				[
					'Time of flight, at the first values of every setting',
					{ v0_ms: 50, angle_deg: 45, mass_kg: 0.145, diameter_m: 0.0732, Cd: 0.35, rho: 1.225 },
					'time',
					5.7492661,
					7e-7,
					's'
				],
				[
					'Highest point above the landing, at the first values of every setting',
					{ v0_ms: 50, angle_deg: 45, mass_kg: 0.145, diameter_m: 0.0732, Cd: 0.35, rho: 1.225 },
					'apex',
					41.008877,
					0.000005,
					'm'
				]
			]
		)
	],
	'fall.drag': [
		...rows(
			'computed-fall.drag-1',
			computed(
				'v = v_t tanh(g t/v_t), y = v_t^2/g ln cosh(g t/v_t) (textbook)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Speed it tends to, at the first values of every setting',
					{ mass_kg: 80, rho: 1.225, Cd: 1, area_m2: 0.7, t_s: 5 },
					'terminalSpeed',
					42.776305,
					6e-7,
					'm/s'
				],
				[
					'Speed, at the first values of every setting',
					{ mass_kg: 80, rho: 1.225, Cd: 1, area_m2: 0.7, t_s: 5 },
					'speed',
					34.927497,
					6e-7,
					'm/s'
				]
			]
		)
	],
	'launcher.hinged': [
		...rows(
			'computed-launcher.hinged-1',
			computed(
				'The Lagrangian with absolute angles; same system as Siano, Trebuchet Mechanics (2013)',
				'worked with scipy’s DOP853'
			),
			[
				[
					'Time until the stone lifts off, at the first values of every setting',
					{
						longArm_m: 4,
						shortArm_m: 1,
						sling_m: 3.5,
						hanger_m: 0.8,
						projectile_kg: 10,
						counterweight_kg: 1000,
						beam_kg: 100,
						pivotHeight_m: 3,
						releaseAngle_deg: 42
					},
					'liftOffTime',
					0.411385,
					6e-7,
					's'
				],
				[
					'Time until release, at the first values of every setting',
					{
						longArm_m: 4,
						shortArm_m: 1,
						sling_m: 3.5,
						hanger_m: 0.8,
						projectile_kg: 10,
						counterweight_kg: 1000,
						beam_kg: 100,
						pivotHeight_m: 3,
						releaseAngle_deg: 42
					},
					'releaseTime',
					0.994293,
					0.000001,
					's'
				],
				[
					'Speed of the stone at release, at the first values of every setting',
					{
						longArm_m: 4,
						shortArm_m: 1,
						sling_m: 3.5,
						hanger_m: 0.8,
						projectile_kg: 10,
						counterweight_kg: 1000,
						beam_kg: 100,
						pivotHeight_m: 3,
						releaseAngle_deg: 42
					},
					'releaseSpeed',
					43.6351,
					0.00006,
					'm/s'
				]
			]
		)
	],
	'blackbody.planck': [
		...rows(
			'computed-blackbody.planck-1',
			computed('Planck law; CODATA 2018', 'worked with mpmath at 40 digits'),
			[
				[
					'Radiance for each length of wave: temperature 5772 K, wavelength in vacuum 500 nm',
					{ T_K: 5772, wavelength_nm: 500 },
					'B_lambda',
					26238541000000,
					600000,
					'W m-3 sr-1'
				],
				[
					'Radiance for each hertz: temperature 2.7255 K, frequency 160000000000 Hz',
					{ T_K: 2.7255, frequency_Hz: 160000000000 },
					'B_nu',
					3.8387602e-18,
					6e-26,
					'W m-2 Hz-1 sr-1'
				]
			]
		),
		...rows(
			'computed-blackbody.planck-2',
			computed('Planck 1900; CODATA 2018', 'worked with mpmath at 40 digits'),
			[
				[
					'Radiance for each length of wave: temperature 3000 K, wavelength in vacuum 1000 nm',
					{ T_K: 3000, wavelength_nm: 1000 },
					'B_lambda',
					992403330000,
					6000,
					'W m-3 sr-1'
				]
			]
		)
	],
	'doppler.beta_from_z': [
		...rows(
			'computed-doppler.beta_from_z-1',
			computed(
				'special relativity, longitudinal Doppler: 1+z = sqrt((1+b)/(1-b)) (Einstein 1905; Hogg 1999 eq 2)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Speed as a share of that of light: redshift 0.1',
					{ z: 0.1 },
					'beta',
					0.095022624,
					6e-10,
					''
				],
				['Speed away from us: redshift 0.1', { z: 0.1 }, 'velocity', 28487.066, 0.0006, 'km/s'],
				[
					'Share that is missing to the speed of light: redshift 1089.8',
					{ z: 1089.8 },
					'one_minus_beta',
					0.0000016808903,
					6e-14,
					''
				]
			]
		)
	],
	'doppler.z_from_beta': [
		...rows(
			'computed-doppler.z_from_beta-1',
			computed(
				'special relativity, longitudinal Doppler (Einstein 1905)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Redshift when it moves straight away: speed away from us, as a share of that of light 0.5',
					{ beta: 0.5 },
					'z',
					0.73205081,
					6e-9,
					''
				],
				[
					'Redshift when it moves across: speed away from us, as a share of that of light 0.5',
					{ beta: 0.5 },
					'transverse_z',
					0.15470054,
					6e-9,
					''
				]
			]
		),
		...rows(
			'computed-doppler.z_from_beta-2',
			computed('Einstein 1905: √(1.6/0.4) − 1', 'by hand'),
			[
				[
					'Redshift when it moves straight away: speed away from us, as a share of that of light 0.6',
					{ beta: 0.6 },
					'z',
					1,
					1e-9,
					''
				]
			]
		)
	],
	'doppler.z_general': [
		...rows(
			'computed-doppler.z_general-1',
			computed(
				'special relativity: 1+z = gamma(1+beta cos theta), theta = 0 is directly away (Einstein 1905)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Redshift: speed as a share of that of light 0.6, angle between its way and straight away from us 60 deg',
					{ beta: 0.6, theta_deg: 60 },
					'z',
					0.625,
					6e-10,
					''
				]
			]
		),
		...rows(
			'computed-doppler.z_general-2',
			computed('Einstein 1905: straight away, √(1.6/0.4) − 1', 'by hand'),
			[
				[
					'Redshift: speed as a share of that of light 0.6, angle between its way and straight away from us 0 deg',
					{ beta: 0.6, theta_deg: 0 },
					'z',
					1,
					1e-9,
					''
				]
			]
		),
		...rows(
			'computed-doppler.z_general-3',
			computed('Einstein 1905: across, 1/√(1 − 0.64) − 1', 'by hand'),
			[
				[
					'Redshift: speed as a share of that of light 0.8, angle between its way and straight away from us 90 deg',
					{ beta: 0.8, theta_deg: 90 },
					'z',
					0.66666667,
					6e-9,
					''
				]
			]
		)
	],
	'doppler.combine': [
		...rows(
			'computed-doppler.combine-1',
			computed(
				'1+z_obs = (1+z_cos)(1+z_pec) (Davis and Scrimgeour 2014 MNRAS 442 1117)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Redshift observed: redshift from expansion alone 0.02, the galaxy’s own speed, away from us 300 km/s',
					{ zcos: 0.02, vpec_kms: 300 },
					'z',
					0.021021217,
					6e-10,
					''
				]
			]
		),
		...rows(
			'computed-doppler.combine-2',
			computed('Davis and Scrimgeour 2014, MNRAS 442, 1117', 'by hand: at rest nothing is added'),
			[
				[
					'Redshift observed: redshift from expansion alone 0.1, the galaxy’s own speed, away from us 0 km/s',
					{ zcos: 0.1, vpec_kms: 0 },
					'z',
					0.1,
					1e-10,
					''
				]
			]
		),
		...rows(
			'computed-doppler.combine-3',
			computed('Davis and Scrimgeour 2014, MNRAS 442, 1117', 'worked with mpmath at 40 digits'),
			[
				[
					'Redshift observed: redshift from expansion alone 0.05, the galaxy’s own speed, away from us -600 km/s',
					{ zcos: 0.05, vpec_kms: -600 },
					'z',
					0.047900645,
					6e-10,
					''
				]
			]
		)
	],
	'angle.diffraction': [
		...rows(
			'computed-angle.diffraction-1',
			computed(
				'Rayleigh criterion: 1.219669891 lambda/D (first zero of J1)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Smallest angle told apart: wavelength 550 nm, diameter of the opening 2.4 m',
					{ wavelength_nm: 550, D_m: 2.4 },
					'theta',
					0.057652598,
					6e-10,
					'arcsec'
				]
			]
		)
	],
	'sr.add': [
		...rows(
			'computed-sr.add-1',
			computed('relativistic velocity addition', 'worked with mpmath at 40 digits'),
			[
				[
					'Speed together, as a share of that of light: first speed, as a share of that of light 0.5, second speed, as seen from the first 0.5',
					{ beta1: 0.5, beta2: 0.5 },
					'beta',
					0.8,
					8e-10,
					''
				]
			]
		)
	],
	'orbit.kepler_equation': [
		...rows(
			'computed-orbit.kepler_equation-1',
			computed('Kepler equation M = E - e sin E', 'worked with mpmath at 40 digits'),
			[
				[
					'Eccentric anomaly: eccentricity 0.5, share of the time gone by, as an angle (mean anomaly) 1 rad',
					{ e: 0.5, M_rad: 1 },
					'E',
					1.4987011,
					6e-8,
					'rad'
				],
				[
					'Angle from the nearest point (true anomaly): eccentricity 0.5, share of the time gone by, as an angle (mean anomaly) 1 rad',
					{ e: 0.5, M_rad: 1 },
					'trueAnomaly',
					2.0308062,
					6e-8,
					'rad'
				]
			]
		)
	],
	'impact.energy': [
		...rows(
			'computed-impact.energy-1',
			computed('½ m v², the sphere’s mass π/6 ρ d³', 'worked with mpmath at 40 digits'),
			[
				[
					'Energy of its motion: diameter 1 m, density 3000 kg/m3, speed above the air 20000 m/s',
					{ diameter_m: 1, density_kgm3: 3000, speed_ms: 20000 },
					'energy',
					314159270000,
					6000,
					'J'
				]
			]
		)
	],
	'rocket.deltav': [
		...rows(
			'computed-rocket.deltav-1',
			computed('Tsiolkovsky 1903; relativistic: Ackeret 1946', 'worked with mpmath at 40 digits'),
			[
				[
					'Change of speed: speed of the exhaust 4400 m/s, mass before 100 kg, mass after 10 kg',
					{ ve_ms: 4400, m0: 100, m1: 10 },
					'deltav',
					10131.374,
					0.0006,
					'm/s'
				],
				[
					'Change of speed, by special relativity: speed of the exhaust 4400 m/s, mass before 100 kg, mass after 10 kg',
					{ ve_ms: 4400, m0: 100, m1: 10 },
					'deltavRel',
					10131.374,
					0.0006,
					'm/s'
				]
			]
		),
		...rows(
			'computed-rocket.deltav-2',
			computed('Tsiolkovsky 1903: 3000 m/s times ln 2', 'worked with mpmath at 40 digits'),
			[
				[
					'Change of speed: speed of the exhaust 3000 m/s, mass before 20 kg, mass after 10 kg',
					{ ve_ms: 3000, m0: 20, m1: 10 },
					'deltav',
					2079.4415,
					0.00006,
					'm/s'
				]
			]
		)
	],
	'decay.age': [
		...rows(
			'computed-decay.age-1',
			computed('t = T_half log2(1 + D/P) (radiometric dating)', 'worked with mpmath at 40 digits'),
			[
				[
					'Age of the sample: half-life 4.468, daughter atoms for each parent that is left 1',
					{ halflife: 4.468, ratio: 1 },
					'age',
					4.468,
					4e-9,
					'same'
				]
			]
		),
		...rows(
			'computed-decay.age-2',
			computed('three daughters for each parent: two half-lives', 'by hand'),
			[
				[
					'Age of the sample: half-life 1.25, daughter atoms for each parent that is left 3',
					{ halflife: 1.25, ratio: 3 },
					'age',
					2.5,
					3e-9,
					'same'
				]
			]
		)
	],
	'gas.jeans': [
		...rows(
			'computed-gas.jeans-1',
			computed(
				'lambda_J = c_s sqrt(π/(G rho)), c_s isothermal, M_J = 4pi/3 rho (lambda_J/2)^3 (Jeans 1902; Binney and Tremaine 2008)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Size of the smallest cloud: temperature 10 K, mean mass of a particle, in atomic mass units 2.33, particles in each cubic metre 10000000000 m-3',
					{ T_K: 10, mu: 2.33, n_m3: 10000000000 },
					'length',
					0.21352963,
					6e-9,
					'pc'
				],
				[
					'Mass of the smallest cloud: temperature 10 K, mean mass of a particle, in atomic mass units 2.33, particles in each cubic metre 10000000000 m-3',
					{ T_K: 10, mu: 2.33, n_m3: 10000000000 },
					'mass',
					2.91423,
					6e-8,
					'Msun'
				],
				[
					'Time to fall in, without pressure: temperature 10 K, mean mass of a particle, in atomic mass units 2.33, particles in each cubic metre 10000000000 m-3',
					{ T_K: 10, mu: 2.33, n_m3: 10000000000 },
					'freefall',
					0.33841627,
					6e-9,
					'Myr'
				]
			]
		)
	],
	'gas.adiabatic': [
		...rows(
			'computed-gas.adiabatic-1',
			computed('T V^(gamma-1) = const', 'worked with mpmath at 40 digits'),
			[
				[
					'Temperature after: temperature 300 K, ratio of heat capacities 1.6666666666666667, volume after, compared with before 8',
					{ T_K: 300, gamma: 1.6666666666666667, volumeRatio: 8 },
					'T',
					75,
					6e-7,
					'K'
				],
				[
					'Pressure after, compared with before: temperature 300 K, ratio of heat capacities 1.6666666666666667, volume after, compared with before 8',
					{ T_K: 300, gamma: 1.6666666666666667, volumeRatio: 8 },
					'pressureRatio',
					0.03125,
					6e-10,
					''
				]
			]
		),
		...rows(
			'computed-gas.adiabatic-2',
			computed('T V^(γ−1) stays', 'worked with mpmath at 40 digits'),
			[
				[
					'Temperature after: temperature 300 K, ratio of heat capacities 1.4, volume after, compared with before 0.1',
					{ T_K: 300, gamma: 1.4, volumeRatio: 0.1 },
					'T',
					753.56593,
					0.000006,
					'K'
				]
			]
		)
	],
	'mech.pendulum': [
		...rows(
			'computed-mech.pendulum-1',
			computed(
				'T = 2 π sqrt(L/g) small angle; exact 4 sqrt(L/g) K(sin(theta0/2)) (e.g. Landau and Lifshitz Mechanics sec 11)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Time there and back, for small swings: length of the thread 1 m, angle it is let go at 20 deg',
					{ L_m: 1, theta0_deg: 20 },
					'small',
					2.0064093,
					6e-8,
					's'
				]
			]
		)
	],
	'mech.spring': [
		...rows(
			'computed-mech.spring-1',
			computed('T = 2 π sqrt(m/k); E = k x^2/2', 'worked with mpmath at 40 digits'),
			[
				[
					'Time there and back: stiffness of the spring 100 N/m, mass of the weight 1 kg, how far it is drawn out 0.1 m',
					{ k: 100, mass_kg: 1, x_m: 0.1 },
					'period',
					0.62831853,
					6e-9,
					's'
				],
				[
					'Energy in the spring: stiffness of the spring 100 N/m, mass of the weight 1 kg, how far it is drawn out 0.1 m',
					{ k: 100, mass_kg: 1, x_m: 0.1 },
					'energy',
					0.5,
					6e-9,
					'J'
				]
			]
		)
	],
	'mech.rolling': [
		...rows(
			'computed-mech.rolling-1',
			computed(
				'rolling without slipping v = sqrt(2 g h/(1+k)), k = I/(m r^2)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Speed at the bottom: height it comes down by 1 m, how far out its mass lies: 0 sliding, 2/5 ball, 1/2 disc, 1 hoop 0.4',
					{ height_m: 1, k: 0.4 },
					'speed',
					3.7429267,
					6e-8,
					'm/s'
				]
			]
		),
		...rows(
			'computed-mech.rolling-2',
			computed('a hoop: √(g h)', 'worked with mpmath at 40 digits'),
			[
				[
					'Speed at the bottom: height it comes down by 2 m, how far out its mass lies: 0 sliding, 2/5 ball, 1/2 disc, 1 hoop 1',
					{ height_m: 2, k: 1 },
					'speed',
					4.4286906,
					6e-8,
					'm/s'
				]
			]
		)
	],
	'mech.ballistic_pendulum': [
		...rows(
			'computed-mech.ballistic_pendulum-1',
			computed('v = (m+M)/m sqrt(2 g h)', 'worked with mpmath at 40 digits'),
			[
				[
					'Speed of the small body: mass of the small body 0.01 kg, mass of the block 2 kg, height the block rises by 0.1 m',
					{ m: 0.01, M: 2, h: 0.1 },
					'speed',
					281.49546,
					0.000006,
					'm/s'
				]
			]
		),
		...rows(
			'computed-mech.ballistic_pendulum-2',
			computed('conservation of momentum, then of energy', 'worked with mpmath at 40 digits'),
			[
				[
					'Speed of the small body: mass of the small body 0.008 kg, mass of the block 1.5 kg, height the block rises by 0.15 m',
					{ m: 0.008, M: 1.5, h: 0.15 },
					'speed',
					323.31981,
					0.000006,
					'm/s'
				],
				[
					'Speed of the small body: mass of the small body 0.02 kg, mass of the block 3.98 kg, height the block rises by 0.05 m',
					{ m: 0.02, M: 3.98, h: 0.05 },
					'speed',
					198.05706,
					0.000006,
					'm/s'
				]
			]
		)
	],
	'mech.buoyancy': [
		...rows('computed-mech.buoyancy-1', computed('Archimedes', 'worked with mpmath at 40 digits'), [
			[
				'Share of the body below the surface: density of the body 917 kg/m3, density of the fluid 1025 kg/m3, volume of the body 1 m3',
				{ rhoBody: 917, rhoFluid: 1025, V: 1 },
				'submergedFraction',
				0.89463415,
				6e-9,
				''
			]
		])
	],
	'unc.power': [
		...rows(
			'computed-unc.power-1',
			computed(
				'JCGM 100:2008 (GUM) eq 12: (u/y)^2 = sum (p_i u_i/x_i)^2',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Value: exact factor in front 1, factors, each with its uncertainty and power [67.66, 0.42, -1]',
					{ C: 1, terms: [[67.66, 0.42, -1]] },
					'value',
					0.014779781,
					6e-10,
					''
				],
				[
					'Standard uncertainty: exact factor in front 1, factors, each with its uncertainty and power [67.66, 0.42, -1]',
					{ C: 1, terms: [[67.66, 0.42, -1]] },
					'u',
					0.000091745612,
					6e-13,
					''
				]
			]
		),
		...rows(
			'computed-unc.power-2',
			computed(
				'JCGM 100:2008, equation 12: 12 × √(0.02² + 0.01²)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Standard uncertainty: exact factor in front 1, factors, each with its uncertainty and power [2, 0.02, 2], [3, 0.03, 1]',
					{
						C: 1,
						terms: [
							[2, 0.02, 2],
							[3, 0.03, 1]
						]
					},
					'u',
					0.26832816,
					6e-9,
					''
				]
			]
		)
	],
	'unc.linear': [
		...rows(
			'computed-unc.linear-1',
			computed('JCGM 100:2008 eq 13 with correlation', 'worked with mpmath at 40 digits'),
			[
				[
					'Standard uncertainty: what each part is multiplied by 1, -1, standard uncertainty of each part 0.3, 0.4, correlations, row by row [1, 0.5], [0.5, 1]',
					{
						coeff: [1, -1],
						u: [0.3, 0.4],
						corr: [
							[1, 0.5],
							[0.5, 1]
						]
					},
					'u',
					0.36055513,
					6e-9,
					''
				]
			]
		),
		...rows(
			'computed-unc.linear-2',
			computed('JCGM 100:2008, equation 11: √(3² + 4²)', 'by hand'),
			[
				[
					'Standard uncertainty: what each part is multiplied by 1, 1, standard uncertainty of each part 3, 4',
					{ coeff: [1, 1], u: [3, 4] },
					'u',
					5,
					5e-9,
					''
				]
			]
		),
		...rows(
			'computed-unc.linear-3',
			computed('JCGM 100:2008, equation 16: fully tied, 3 + 4', 'by hand'),
			[
				[
					'Standard uncertainty: what each part is multiplied by 1, 1, standard uncertainty of each part 3, 4, correlations, row by row [1, 1], [1, 1]',
					{
						coeff: [1, 1],
						u: [3, 4],
						corr: [
							[1, 1],
							[1, 1]
						]
					},
					'u',
					7,
					7e-9,
					''
				]
			]
		)
	],
	'unc.weighted_mean': [
		...rows(
			'computed-unc.weighted_mean-1',
			computed(
				'inverse-variance weighting (Bevington and Robinson)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Weighted mean: results 67.4, 73.04, standard uncertainty of each 0.5, 1.04',
					{ x: [67.4, 73.04], u: [0.5, 1.04] },
					'mean',
					68.458877,
					6e-7,
					''
				],
				[
					'Standard uncertainty: results 67.4, 73.04, standard uncertainty of each 0.5, 1.04',
					{ x: [67.4, 73.04], u: [0.5, 1.04] },
					'u',
					0.45062621,
					6e-9,
					''
				],
				[
					'Scatter compared with the uncertainties: results 67.4, 73.04, standard uncertainty of each 0.5, 1.04',
					{ x: [67.4, 73.04], u: [0.5, 1.04] },
					'chi2',
					23.888255,
					6e-7,
					''
				]
			]
		)
	]
});
