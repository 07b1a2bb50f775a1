import { defineCalculator, type Computed } from '../../calculator.ts';
import type { ConstantsEdition } from '../../constants/index.ts';
import { cosmologyInput } from '../cosmology/limits.ts';
import { checksOf } from '../published-checks.ts';
import { heliumInput } from '../thermal/gas.ts';
import { thermalHistory } from '../thermal/history.ts';
import {
	HELIUM_LEFT_OUT,
	THERMAL_ASSUMPTIONS,
	THERMAL_SOURCES,
	UNIVERSE_WARNINGS,
	universeWarnings
} from '../thermal/sources.ts';
import { brightnessOf, depthScale } from './hydrogen-line.ts';
import {
	backgroundFactor,
	BARKANA_2018,
	DISPUTED_TROUGH,
	FOB06,
	frequencyAt,
	NEW_PHYSICS,
	SIGN_CONVENTION,
	signalRedshift,
	SINGH_2022,
	troughWarnings
} from './signal.ts';

/**
 * The deepest 21 cm trough in mK that gas without any heating allows at z: spins wholly tied to the gas of the thermal
 * history. Optional factors make the gas colder or the background brighter than standard physics has them.
 */
export const deepest = defineCalculator({
	id: 'g21.deepest',
	revision: '1.0.0',
	title: '21 cm line: the deepest trough',
	purpose: 'How deep can the trough of early hydrogen be at most, if nothing warms the gas?',
	asks: [
		'Is half a kelvin deeper than it should be?',
		'What is the floor of the signal?',
		'How much deeper would colder gas make it?'
	],
	notFor: ['What is really there: stars warm the gas, and the trough is then shallower.'],
	inputs: {
		cosmology: cosmologyInput,
		Yp: heliumInput,
		z: signalRedshift(17.2),
		gasFactor: {
			kind: 'number',
			label: 'Temperature of the gas, times the unheated one',
			quantity: 'ratio',
			unit: '',
			min: 0,
			minExclusive: true,
			max: 1,
			initial: 1,
			optional: true
		},
		backgroundFactor: { ...backgroundFactor, min: 1, minExclusive: false }
	},
	outputs: {
		dTb_exact: {
			label: 'Deepest brightness against the background',
			symbol: 'δT_b',
			quantity: 'temperature-difference',
			unit: 'mK'
		},
		Tk: { label: 'Temperature of the gas', symbol: 'T_k', quantity: 'gas-temperature', unit: 'K' },
		tau: { label: 'Optical depth', symbol: 'τ', quantity: 'optical-depth', unit: '' }
	},
	equations: [
		{
			tex: '\\delta T_b = \\frac{T_k-T_r}{1+z}\\left(1-e^{-\\tau}\\right),\\qquad T_s = T_k',
			says: 'The trough is deepest when the spins are as cold as the gas and nothing has warmed it.'
		}
	],
	assumptions: [
		SIGN_CONVENTION,
		'The spins are as cold as the gas, which takes starlight and no warmth from it.',
		...THERMAL_ASSUMPTIONS
	],
	warnings: [
		DISPUTED_TROUGH,
		{
			...NEW_PHYSICS,
			when: 'gas colder than unheated, or a background brighter than the cosmic one'
		},
		{
			code: 'before-stars',
			message:
				'Before the first stars nothing ties the spins wholly to the gas: look at the dark ages instead.',
			when: 'redshift above 40',
			validity: 'approximate'
		},
		{
			code: 'reionised',
			message:
				'By then the gas between the galaxies is ionised, and little of this signal is left.',
			when: 'redshift below 6',
			validity: 'outside'
		},
		HELIUM_LEFT_OUT,
		...UNIVERSE_WARNINGS
	],
	sources: [
		BARKANA_2018,
		{ title: 'Cohen et al. 2017, MNRAS 472, 1915', fromMemory: true },
		FOB06,
		SINGH_2022,
		...THERMAL_SOURCES
	],
	checks: checksOf('g21.deepest'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute(
		{ cosmology, Yp, z, gasFactor, backgroundFactor: factor },
		edition?: ConstantsEdition
	): Computed {
		const opened = thermalHistory(cosmology, Yp, undefined, edition);
		if (!opened.ok) return opened;
		const { gas, at } = opened.history;
		const state = at(z);
		const Tk = gasFactor * state.Tk;
		const { tau, dTb } = brightnessOf(
			depthScale(gas, z, Math.max(0, 1 - state.x_e)),
			z,
			Tk,
			factor * gas.background(1 + z)
		);
		const held: Record<string, boolean> = {
			[NEW_PHYSICS.code]: gasFactor < 1 || factor > 1,
			'before-stars': z > 40,
			reionised: z < 6,
			[HELIUM_LEFT_OUT.code]: z > 1600
		};
		return {
			ok: true,
			values: { dTb_exact: dTb * 1000, Tk, tau },
			warnings: [
				...troughWarnings(dTb * 1000, frequencyAt(z)),
				...Object.keys(held).filter((code) => held[code]),
				...universeWarnings(gas.universe)
			]
		};
	}
});
