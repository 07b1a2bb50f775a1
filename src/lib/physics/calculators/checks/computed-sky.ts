/**
 * Check values that nobody printed, of the Universe and its 21 cm signal: worked with another method, which is named.
 */
import type { CheckValue } from '../../calculator.ts';
import { computed, rows } from './row.ts';

export const computedSkyChecks = (): Record<string, CheckValue[]> => ({
	'g21.spin_temperature': [
		...rows(
			'computed-g21.spin_temperature-1',
			computed(
				'Field 1958 Proc IRE 46 240; Furlanetto, Oh and Briggs 2006 Phys Rep 433 181 (T_c = T_k)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Spin temperature: temperature of the background then 49.6041 K, temperature of the gas 7 K, coupling by Lyman α 1, coupling by collisions 0.002',
					{ Trad_K: 49.6041, Tk_K: 7, x_alpha: 1, x_c: 0.002 },
					'Ts',
					12.259459,
					6e-7,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.spin_temperature-2',
			computed('Field 1958, Proc. IRE 46, 240', 'worked with mpmath at 40 digits'),
			[
				[
					'Spin temperature: temperature of the background then 50 K, temperature of the gas 10 K, coupling by Lyman α 0, coupling by collisions 1',
					{ Trad_K: 50, Tk_K: 10, x_alpha: 0, x_c: 1 },
					'Ts',
					16.666667,
					6e-7,
					'K'
				],
				[
					'Spin temperature: temperature of the background then 30 K, temperature of the gas 200 K, coupling by Lyman α 3, coupling by collisions 0.5',
					{ Trad_K: 30, Tk_K: 200, x_alpha: 3, x_c: 0.5 },
					'Ts',
					88.52459,
					6e-7,
					'K'
				]
			]
		)
	],
	'g21.x_c': [
		...rows(
			'computed-g21.x_c-1',
			computed(
				'Furlanetto, Oh and Briggs 2006 eq for x_c = C10 T*/(A10 T_rad), A10 = 2.8843e-15 /s',
				'worked with scipy’s spline'
			),
			[
				[
					'Coupling by collisions: Planck 2018, redshift 80, temperature of the gas 115 K, free electrons for each hydrogen nucleus 0.00025',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 80, Tk_K: 115, x_e: 0.00025 },
					'x_c',
					1.4100513,
					6e-8,
					''
				]
			]
		),
		...rows(
			'computed-g21.x_c-2',
			computed(
				'Furlanetto, Oh and Briggs 2006, Phys. Rep. 433, 181; at a knot of the published tables',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Coupling by collisions: Planck 2018, redshift 50, temperature of the gas 50 K, free electrons for each hydrogen nucleus 0.0002',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 50, Tk_K: 50, x_e: 0.0002 },
					'x_c',
					0.2955295,
					6e-8,
					''
				],
				[
					'Coupling by collisions: Planck 2018, redshift 20, temperature of the gas 10 K, free electrons for each hydrogen nucleus 0.0002',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 20, Tk_K: 10, x_e: 0.0002 },
					'x_c',
					0.002253953,
					6e-10,
					''
				]
			]
		)
	],
	'g21.x_alpha': [
		...rows(
			'computed-g21.x_alpha-1',
			computed(
				'Chen and Miralda-Escude 2004; Furlanetto, Oh and Briggs 2006: x_alpha = 16 π^2 T* e^2 f_alpha S J/(27 A10 T_g m_e c), f_alpha = 0.4164 (Morton 2003), A10 = 2.8843e-15 /s',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Coupling by Lyman α: correction for scattering 1, Lyman α photons for each cm², second, hertz and steradian 1 × 10⁻¹⁰ 1/(cm2 s Hz sr), redshift 17',
					{ S_alpha: 1, J: 1e-10, z: 17 },
					'x_alpha',
					0.99116333,
					6e-9,
					''
				]
			]
		),
		...rows(
			'computed-g21.x_alpha-2',
			computed(
				'Chen and Miralda-Escudé 2004; Furlanetto, Oh and Briggs 2006, Phys. Rep. 433, 181',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Coupling by Lyman α: correction for scattering 1, Lyman α photons for each cm², second, hertz and steradian 1 × 10⁻¹¹ 1/(cm2 s Hz sr), redshift 19',
					{ S_alpha: 1, J: 1e-11, z: 19 },
					'x_alpha',
					0.0892047,
					6e-10,
					''
				],
				[
					'Coupling by Lyman α: correction for scattering 0.8, Lyman α photons for each cm², second, hertz and steradian 5 × 10⁻¹⁰ 1/(cm2 s Hz sr), redshift 14',
					{ S_alpha: 0.8, J: 5e-10, z: 14 },
					'x_alpha',
					4.757584,
					6e-8,
					''
				]
			]
		)
	],
	'g21.kappa': [
		...rows(
			'computed-g21.kappa-1',
			computed(
				'H-H: Zygelman 2005 ApJ 622 1356; e-H: Furlanetto and Furlanetto 2007 MNRAS 374 547; p-H: Furlanetto and Furlanetto 2007 MNRAS 379 130',
				'worked with scipy’s CubicSpline'
			),
			[
				[
					'Rate coefficient: hydrogen, temperature of the gas 10 K',
					{ pair: 'HH', T_K: 10 },
					'kappa',
					2.88e-12,
					6e-20,
					'cm3/s'
				],
				[
					'Rate coefficient: hydrogen, temperature of the gas 55 K',
					{ pair: 'HH', T_K: 55 },
					'kappa',
					7.5221073e-11,
					9e-19,
					'cm3/s'
				],
				[
					'Rate coefficient: electrons, temperature of the gas 7 K',
					{ pair: 'eH', T_K: 7 },
					'kappa',
					6.2559514e-10,
					8e-18,
					'cm3/s'
				]
			]
		)
	],
	'g21.adiabatic': [
		...rows(
			'computed-g21.adiabatic-1',
			computed(
				'Furlanetto, Oh and Briggs 2006: 1+z_dec = 150 (Ob h^2/0.023)^(2/5); T_k = T_CMB0 (1+z)^2/(1+z_dec)',
				'worked with the closed form in Python'
			),
			[
				[
					'1 + redshift at which the gas let go: Planck 2018, redshift 17.2',
					{ cosmology: { set: 'Planck18' }, z: 17.2 },
					'one_plus_z_dec',
					148.46968,
					0.000006,
					''
				],
				[
					'Temperature of the gas: Planck 2018, redshift 17.2',
					{ cosmology: { set: 'Planck18' }, z: 17.2 },
					'Tk',
					6.0806667,
					6e-8,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.adiabatic-2',
			computed(
				'Furlanetto, Oh and Briggs 2006, Phys. Rep. 433, 181',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Temperature of the gas: Planck 2018, redshift 30',
					{ cosmology: { set: 'Planck18' }, z: 30 },
					'Tk',
					17.64135,
					6e-7,
					'K'
				]
			]
		)
	],
	'g21.mf_cooling': [
		...rows(
			'computed-g21.mf_cooling-1',
			computed(
				'Mirocha and Furlanetto 2019 MNRAS 483 1980: dlnT/dlnt = alpha/3-(2+alpha)/3 (1-exp(-(z/z0)^beta)) (from memory)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Power of time by which it cools, at the first values of every setting',
					{ alpha: -4, z0: 189.6, beta: 1.27, z: 17 },
					'slope',
					-1.3028816,
					6e-8,
					''
				]
			]
		),
		...rows(
			'computed-g21.mf_cooling-2',
			computed('Mirocha and Furlanetto 2019, MNRAS 483, 1980', 'worked with mpmath at 40 digits'),
			[
				[
					'Power of time by which it cools: end of the law -4, redshift of the change 189.6, sharpness of the change 1.27, redshift 100',
					{ alpha: -4, z0: 189.6, beta: 1.27, z: 100 },
					'slope',
					-1.0944142,
					6e-8,
					''
				],
				[
					'Power of time by which it cools: end of the law -6, redshift of the change 189.6, sharpness of the change 1.27, redshift 20',
					{ alpha: -6, z0: 189.6, beta: 1.27, z: 20 },
					'slope',
					-1.9255316,
					6e-8,
					''
				]
			]
		)
	],
	'g21.brightness': [
		...rows(
			'computed-g21.brightness-1',
			computed(
				'optical depth + radiative transfer (Furlanetto, Oh and Briggs 2006 sec 2; Pritchard and Loeb 2012 Rep Prog Phys 75 086901)',
				'worked with mpmath'
			),
			[
				[
					'Optical depth: Planck 2018, redshift 17.2, spin temperature 7 K, share of the hydrogen that is neutral 1',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 17.2, Ts_K: 7, x_HI: 1 },
					'tau',
					0.094809087,
					6e-10,
					''
				],
				[
					'Brightness against the background: Planck 2018, redshift 17.2, spin temperature 7 K, share of the hydrogen that is neutral 1',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 17.2, Ts_K: 7, x_HI: 1 },
					'dTb_exact',
					-211.74106,
					0.000006,
					'mK'
				],
				[
					'The same by the linear formula: Planck 2018, redshift 17.2, spin temperature 7 K, share of the hydrogen that is neutral 1',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 17.2, Ts_K: 7, x_HI: 1 },
					'dTb_approx',
					-222.27476,
					0.000006,
					'mK'
				]
			]
		)
	],
	'g21.deepest': [
		...rows(
			'computed-g21.deepest-1',
			computed(
				'dTb_exact with T_s = T_k(TLA1), x_HI = 1 - x_e',
				'worked with a second programme (scipy)'
			),
			[
				[
					'Deepest brightness against the background: Planck 2018, redshift 17.2',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 17.2 },
					'dTb_exact',
					-210.76,
					0.006,
					'mK'
				]
			]
		),
		...rows(
			'computed-g21.deepest-2',
			computed(
				'Thermal history of Peebles with RECFAST’s corrections; Furlanetto, Oh and Briggs 2006, Phys. Rep. 433, 181',
				'worked with a second programme (scipy’s implicit solver), to three figures'
			),
			[
				[
					'Deepest brightness against the background: Planck 2018, redshift 15',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 15 },
					'dTb_exact',
					-228,
					0.6,
					'mK'
				]
			]
		)
	],
	'g21.dark_ages': [
		...rows(
			'computed-g21.dark_ages-1',
			computed(
				'collisional coupling only, TLA1 gas, T_s = (1+x_c)/(1/T_g+x_c/T_k)',
				'worked with a second programme (scipy)'
			),
			[
				[
					'Coupling by collisions: Planck 2018, redshift 85',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 85 },
					'x_c',
					1.695,
					0.00006,
					''
				],
				[
					'Spin temperature: Planck 2018, redshift 85',
					{ cosmology: { set: 'Planck18' }, Yp: 0.245, z: 85 },
					'Ts',
					154.05,
					0.006,
					'K'
				]
			]
		)
	],
	'g21.tk_for_depth': [
		...rows(
			'computed-g21.tk_for_depth-1',
			computed(
				'inverse of dTb_approx with T_s = T_k (fully coupled), x_HI = 1',
				'worked with the closed form in Python'
			),
			[
				[
					'Temperature of the gas, by the linear formula: Planck 2018, redshift 17.2, brightness against the background (a trough is negative) -500 mK',
					{ cosmology: { set: 'Planck18' }, z: 17.2, depth_mK: -500 },
					'Tk',
					3.37651,
					6e-8,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.tk_for_depth-2',
			computed(
				'the exact brightness, solved for the gas; Furlanetto, Oh and Briggs 2006, Phys. Rep. 433, 181',
				'worked with a second programme (Brent’s method in scipy), to three figures'
			),
			[
				[
					'Temperature of the gas, exactly: Planck 2018, redshift 17.2, brightness against the background (a trough is negative) -500 mK',
					{ cosmology: { set: 'Planck18' }, z: 17.2, depth_mK: -500 },
					'Tk_exact',
					3.05,
					0.006,
					'K'
				]
			]
		)
	],
	'g21.radio_excess': [
		...rows(
			'computed-g21.radio_excess-1',
			computed(
				'Fialkov and Barkana 2019 MNRAS 486 1763: T_rad = T_CMB0(1+z)[1+A_r (nu_obs/78 MHz)^beta]',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Temperature of the background then, at the first values of every setting',
					{ Tcmb0: 2.7255, z: 17.2, A_r: 1, beta: -2.6 },
					'Trad',
					99.135072,
					6e-7,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.radio_excess-2',
			computed('Fialkov and Barkana 2019, MNRAS 486, 1763', 'worked with mpmath at 40 digits'),
			[
				[
					'Temperature of the background then: temperature of the cosmic background now 2.7255 K, redshift 20, strength of the glow at 78 MHz, compared with the cosmic background 0.5, power of the frequency -2.6',
					{ Tcmb0: 2.7255, z: 20, A_r: 0.5, beta: -2.6 },
					'Trad',
					98.690729,
					6e-7,
					'K'
				],
				[
					'Background, times the cosmic one: temperature of the cosmic background now 2.7255 K, redshift 15, strength of the glow at 78 MHz, compared with the cosmic background 2, power of the frequency -2.6',
					{ Tcmb0: 2.7255, z: 15, A_r: 2, beta: -2.6 },
					'factor',
					2.4286164,
					6e-8,
					''
				]
			]
		)
	],
	'g21.gaussian': [
		...rows(
			'computed-g21.gaussian-1',
			computed(
				'Gaussian trough A exp(-(nu-nu0)^2/(2 sigma^2)), e.g. Bernardi et al. 2015 ApJ 799 90',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Brightness against the background, at the first values of every setting',
					{ A: 0.1, nu: 75, nu0: 70, sigma: 8 },
					'T',
					-0.082257756,
					6e-10,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.gaussian-2',
			computed(
				'Bernardi et al. 2015, ApJ 799, 90',
				'by hand: at its centre a trough is as deep as its amplitude'
			),
			[
				[
					'Brightness against the background: depth of the trough 0.2 K, frequency 78 MHz, middle of the trough 78 MHz, standard width 5 MHz',
					{ A: 0.2, nu: 78, nu0: 78, sigma: 5 },
					'T',
					-0.2,
					2e-10,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.gaussian-3',
			computed('Bernardi et al. 2015, ApJ 799, 90', 'worked with mpmath at 40 digits'),
			[
				[
					'Brightness against the background: depth of the trough 0.2 K, frequency 83 MHz, middle of the trough 78 MHz, standard width 5 MHz',
					{ A: 0.2, nu: 83, nu0: 78, sigma: 5 },
					'T',
					-0.12130613,
					6e-9,
					'K'
				]
			]
		)
	],
	'g21.flattened_gaussian': [
		...rows(
			'computed-g21.flattened_gaussian-1',
			computed(
				'Hills et al. 2018 Nature 564 E32 (flattened Gaussian)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Brightness against the background: depth of the trough 0.53 K, frequency 80 MHz, middle of the trough 78.1 MHz, full width at half depth 18.7 MHz, flatness of the floor 7',
					{ A: 0.53, nu: 80, nu0: 78.1, w: 18.7, tau: 7 },
					'T',
					-0.52956831,
					6e-9,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.flattened_gaussian-2',
			computed(
				'Hills et al. 2018, Nature 564, E32',
				'by hand: at its centre a trough is as deep as its amplitude'
			),
			[
				[
					'Brightness against the background: depth of the trough 0.5 K, frequency 78 MHz, middle of the trough 78 MHz, full width at half depth 19 MHz, flatness of the floor 7',
					{ A: 0.5, nu: 78, nu0: 78, w: 19, tau: 7 },
					'T',
					-0.5,
					5e-10,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.flattened_gaussian-3',
			computed(
				'Hills et al. 2018, Nature 564, E32: half as deep at half its width',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Brightness against the background: depth of the trough 0.5 K, frequency 87.5 MHz, middle of the trough 78 MHz, full width at half depth 19 MHz, flatness of the floor 7',
					{ A: 0.5, nu: 87.5, nu0: 78, w: 19, tau: 7 },
					'T',
					-0.25,
					3e-10,
					'K'
				]
			]
		)
	],
	'g21.tanh': [
		...rows(
			'computed-g21.tanh-1',
			computed(
				'tanh parametrisation A(z) = A_ref/2 (1+tanh((z0-z)/dz)): Mirocha, Harker and Burns 2015 ApJ 813 11',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Height reached, at the first values of every setting',
					{ Aref: 1, z0: 9, dz: 2, z: 8 },
					'A',
					0.73105858,
					6e-9,
					''
				]
			]
		),
		...rows(
			'computed-g21.tanh-2',
			computed(
				'Mirocha, Harker and Burns 2015, ApJ 813, 11',
				'by hand: half of the step at its middle'
			),
			[
				[
					'Height reached: height of the step 1, redshift in the middle of the step 9, width of the step 2, redshift 9',
					{ Aref: 1, z0: 9, dz: 2, z: 9 },
					'A',
					0.5,
					5e-10,
					''
				]
			]
		),
		...rows(
			'computed-g21.tanh-3',
			computed('Mirocha, Harker and Burns 2015, ApJ 813, 11', 'worked with mpmath at 40 digits'),
			[
				[
					'Height reached: height of the step 2, redshift in the middle of the step 9, width of the step 1, redshift 12',
					{ Aref: 2, z0: 9, dz: 1, z: 12 },
					'A',
					0.0049452463,
					6e-11,
					''
				]
			]
		)
	],
	'g21.foreground': [
		...rows(
			'computed-g21.foreground-1',
			computed(
				'power law sky: 180 K (nu/180 MHz)^-2.6 (Furlanetto, Oh and Briggs 2006) generalised',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Temperature of the sky, at the first values of every setting',
					{ Tref_K: 180, nuref_MHz: 180, nu_MHz: 78, index: -2.6 },
					'Tsky',
					1583.1973,
					0.00006,
					'K'
				]
			]
		),
		...rows(
			'computed-g21.foreground-2',
			computed(
				'Furlanetto, Oh and Briggs 2006, Phys. Rep. 433, 181',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Temperature of the sky: sky at the frequency known 180 K, frequency at which it is known 180 MHz, frequency 60 MHz, power of the frequency -2.6',
					{ Tref_K: 180, nuref_MHz: 180, nu_MHz: 60, index: -2.6 },
					'Tsky',
					3131.7549,
					0.00006,
					'K'
				]
			]
		)
	],
	'g21.radiometer': [
		...rows(
			'computed-g21.radiometer-1',
			computed(
				'Dicke 1946 radiometer equation dT = T_sys/sqrt(B t)',
				'worked with mpmath at 40 digits'
			),
			[
				[
					'Listening time: temperature of sky and receiver 1700 K, noise wanted 0.02 K, width of a channel 400000 Hz',
					{ Tsys_K: 1700, rms_K: 0.02, bandwidth_Hz: 400000 },
					'time',
					18062.5,
					0.00002,
					's'
				],
				[
					'Listening time, in hours: temperature of sky and receiver 1700 K, noise wanted 0.02 K, width of a channel 400000 Hz',
					{ Tsys_K: 1700, rms_K: 0.02, bandwidth_Hz: 400000 },
					'time_h',
					5.0173611,
					6e-8,
					'h'
				]
			]
		),
		...rows(
			'computed-g21.radiometer-2',
			computed('Dicke 1946: (1000 K / 0.01 K)² / 1 MHz', 'by hand'),
			[
				[
					'Listening time: temperature of sky and receiver 1000 K, noise wanted 0.01 K, width of a channel 1000000 Hz',
					{ Tsys_K: 1000, rms_K: 0.01, bandwidth_Hz: 1000000 },
					'time',
					10000,
					0.00001,
					's'
				]
			]
		)
	],
	'cosmo.inverse': [
		...rows(
			'computed-cosmo.inverse-1',
			computed('numerical inverse of cosmo.at_z', 'worked with mpmath quadrature at 30 digits'),
			[
				[
					'Redshift: Planck 2018, age after the Big Bang, its value 0.18',
					{ cosmology: { set: 'Planck18' }, kind: 'z_from_age', value: 0.18 },
					'z',
					19.853587,
					6e-7,
					''
				],
				[
					'Redshift: Planck 2018, time before now, its value 10',
					{ cosmology: { set: 'Planck18' }, kind: 'z_from_lookback', value: 10 },
					'z',
					1.7163313,
					6e-8,
					''
				],
				[
					'Redshift: Planck 2018, distance now (comoving), its value 5000',
					{ cosmology: { set: 'Planck18' }, kind: 'z_from_comoving', value: 5000 },
					'z',
					1.7999585,
					6e-8,
					''
				]
			]
		)
	],
	'cosmo.age_diff': [
		...rows(
			'computed-cosmo.age_diff-1',
			computed('integral of dz/((1+z)H)', 'worked with mpmath quadrature'),
			[
				[
					'Time between them: Planck 2018, first redshift 6, second redshift 10',
					{ cosmology: { set: 'Planck18' }, z1: 6, z2: 10 },
					'duration',
					457.85017,
					0.000006,
					'Myr'
				]
			]
		),
		...rows(
			'computed-cosmo.age_diff-2',
			computed('the integral of dz/((1+z)H)', 'worked with mpmath quadrature'),
			[
				[
					'Time between them: Planck 2018, first redshift 0, second redshift 1',
					{ cosmology: { set: 'Planck18' }, z1: 0, z2: 1 },
					'duration',
					7935.542,
					0.00006,
					'Myr'
				],
				[
					'Time between them: Planck 2018, first redshift 10, second redshift 30',
					{ cosmology: { set: 'Planck18' }, z1: 10, z2: 30 },
					'duration',
					372.45722,
					0.000006,
					'Myr'
				]
			]
		)
	],
	'cosmo.omega_nu': [
		...rows(
			'computed-cosmo.omega_nu-1',
			computed('Komatsu 2011 eq 26 fit vs exact Fermi-Dirac integral', 'worked with mpmath'),
			[
				[
					'Energy of neutrinos for each unit of the photons’: Planck 2018, redshift 0',
					{ cosmology: { set: 'Planck18' }, z: 0 },
					'nu_relative_density',
					26.65069,
					6e-7,
					''
				]
			]
		),
		...rows(
			'computed-cosmo.omega_nu-2',
			computed('Komatsu et al. 2011, ApJS 192, 18, equation 26', 'worked with mpmath at 40 digits'),
			[
				[
					'Share of neutrinos then: Planck 2018, redshift 0',
					{ cosmology: { set: 'Planck18' }, z: 0 },
					'Onu',
					0.0014396743,
					6e-11,
					''
				],
				[
					'Energy of neutrinos for each unit of the photons’: Planck 2018, redshift 1000',
					{ cosmology: { set: 'Planck18' }, z: 1000 },
					'nu_relative_density',
					0.69410704,
					6e-9,
					''
				]
			]
		)
	]
});
