import { defineCalculator, type Computed } from '../../calculator.ts';
import { openStax } from '../sources.ts';
import { gammaInput, gasTemperature } from './ideal.ts';
import { checksOf } from '../published-checks.ts';

/**
 * A gas that changes its volume by a factor r without heat getting in or out: temperature T r^(1−γ) in K, and pressure
 * r^(−γ) of what it was. γ from 1 to 5/3.
 */
export const adiabaticGas = defineCalculator({
	id: 'gas.adiabatic',
	revision: '1.0.0',
	title: 'A gas that spreads and cools',
	purpose: 'A gas takes up more or less room without heat getting in or out: how warm is it then?',
	asks: [
		'Why does gas cool when it spreads?',
		'Why does a bicycle pump get hot?',
		'How did the gas of the early Universe cool?'
	],
	notFor: ['Changes slow enough for heat to leak.', 'Gases about to turn liquid.'],
	inputs: {
		T_K: gasTemperature(300, 1e12),
		gamma: gammaInput(5 / 3),
		volumeRatio: {
			kind: 'number',
			label: 'Volume after, compared with before',
			symbol: 'r',
			quantity: 'ratio',
			unit: '',
			min: 1e-30,
			max: 1e30,
			initial: 8,
			log: true
		}
	},
	outputs: {
		T: { label: 'Temperature after', symbol: 'T', quantity: 'temperature', unit: 'K' },
		pressureRatio: {
			label: 'Pressure after, compared with before',
			quantity: 'ratio',
			unit: ''
		}
	},
	equations: [
		{
			tex: 'T = T_0\\,r^{\\,1-\\gamma}, \\qquad \\frac{p}{p_0} = r^{-\\gamma}',
			says: 'Spreading takes work, and the gas pays for it with its own heat.'
		}
	],
	assumptions: [
		'An ideal gas, and no heat in or out.',
		'For the gas between galaxies γ is 5/3 and volume grows as the cube of the scale of space, so its temperature falls with the square.'
	],
	warnings: [],
	sources: [openStax(2, '§3.6, adiabatic processes')],
	checks: checksOf('gas.adiabatic'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ T_K: T, gamma, volumeRatio: r }): Computed {
		const values = { T: T * r ** (1 - gamma), pressureRatio: r ** -gamma };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
