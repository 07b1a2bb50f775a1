/** Published values of matter and of numbers themselves: energy units, decay, gases, uncertainty, rounding. */
import type { CheckValue } from '../../calculator.ts';
import { rows } from './row.ts';

const SP_811 = { source: 'NIST SP 811, appendix B.8', verification: 'from memory' };
const SP_811_ROUNDING = { source: 'NIST SP 811, B.7.1', verification: 'from memory' };
const GUM_TABLE = {
	source: 'JCGM 100:2008, table G.1',
	verification: 'from memory; follows from the error function'
};
const openStax = (example: string) => ({
	source: `OpenStax, College Physics, ${example}`,
	verification: 'from memory'
});
const CODATA = { source: 'CODATA 2018', verification: 'verified: scipy’s table of constants' };

export const matterChecks = (): Record<string, CheckValue[]> => ({
	'energy.convert': rows('energy-units', SP_811, [
		['1 kWh', { value: 1, from: 'kWh', to: 'J' }, 'value', 3600000, 0, 'J'],
		['1 thermochemical calorie', { value: 1, from: 'cal', to: 'J' }, 'value', 4.184, 0, 'J']
	]),
	'decay.halflife': [
		...rows(
			'curie',
			{
				source: 'the curie, once the activity of a gram of radium-226',
				verification: 'common practice'
			},
			[
				[
					'Activity of 1 g of radium-226, half-life 1600 yr',
					{ t: 1, halflife: 1600, halflife_s: 5.049e10, N: 2.6644e21 },
					'activity',
					3.7,
					0.05,
					'10¹⁰ Bq',
					1e-10
				]
			]
		),
		...rows(
			'mean-life',
			{ source: 'the radiocarbon convention: mean life 8267 yr', verification: 'from memory' },
			[
				[
					'Mean life of carbon-14, half-life 5730 yr',
					{ t: 1, halflife: 5730 },
					'meanLife',
					8267,
					1,
					'yr'
				]
			]
		)
	],
	'decay.age': rows('shroud', openStax('example 31.4, carbon-14 dating'), [
		[
			'92 per cent of the carbon-14 is left',
			{ halflife: 5730, ratio: 0.08 / 0.92 },
			'age',
			690,
			5,
			'yr'
		]
	]),
	'gas.speeds': rows('nitrogen', openStax('example 13.10, speed of nitrogen'), [
		['rms speed of nitrogen at 20 °C', { T_K: 293, mass_u: 28.0134 }, 'rms', 511, 0.6, 'm/s']
	]),
	'unc.asymmetric_interval': rows('coverage', GUM_TABLE, [
		['Within one standard uncertainty', { k: 1 }, 'coverage', 68.27, 0.005, '%', 100],
		['Within two', { k: 2 }, 'coverage', 95.45, 0.005, '%', 100],
		['Within three', { k: 3 }, 'coverage', 99.73, 0.005, '%', 100]
	]),
	'round.significant': rows('sp811', SP_811_ROUNDING, [
		['6.974951 to three digits', { text: '6.974951', digits: 3 }, 'text', '6.97', 0, ''],
		['6.9749515 to seven digits', { text: '6.9749515', digits: 7 }, 'text', '6.974952', 0, ''],
		['6.9749505 to seven digits', { text: '6.9749505', digits: 7 }, 'text', '6.974950', 0, '']
	]),
	'round.decimals': rows('sp811-decimals', SP_811_ROUNDING, [
		['6.974951 to two decimals', { text: '6.974951', decimals: 2 }, 'text', '6.97', 0, ''],
		['6.9749515 to six decimals', { text: '6.9749515', decimals: 6 }, 'text', '6.974952', 0, ''],
		['6.9749505 to six decimals', { text: '6.9749505', decimals: 6 }, 'text', '6.974950', 0, '']
	]),
	'round.with_uncertainty': [
		...rows('codata-concise', CODATA, [
			[
				'The gravitational constant',
				{ x: '0.0000000000667430', u: '0.0000000000000015' },
				'text',
				'6.67430(15)e-11',
				0,
				''
			],
			[
				'The Rydberg constant',
				{ x: '10973731.568160', u: '0.000021' },
				'text',
				'10973731.568160(21)',
				0,
				''
			]
		]),
		...rows(
			'planck-concise',
			{
				source: 'Planck Collaboration 2018 VI, A&A 641, A6, table 2',
				verification: 'verified: astropy 5.2.1'
			},
			[
				[
					'Age of the Universe, Planck 2018',
					{ x: '13.787', u: '0.020' },
					'text',
					'13.787(20)',
					0,
					''
				]
			]
		)
	]
});
