import { defineCalculator, type Computed } from '../../calculator.ts';
import type { ConstantsEdition } from '../../constants/index.ts';
import { cosmologyInput } from '../cosmology/limits.ts';
import { checksOf } from '../published-checks.ts';
import { codata2018 } from '../sources.ts';
import { heliumInput } from './gas.ts';
import { FIRST_Z, thermalHistory } from './history.ts';
import {
	HELIUM_LEFT_OUT,
	NO_STARS,
	THERMAL_ASSUMPTIONS,
	THERMAL_SOURCES,
	UNIVERSE_WARNINGS,
	universeWarnings
} from './sources.ts';

/**
 * Temperature (K) and ionised share of the cosmic gas at z from 0 to 1700 when nothing but the background warms it, good
 * to about one part in 100 000 of the model. Refuses universes without gas or with another recombination.
 */
export const tla1 = defineCalculator({
	id: 'thermal.tla1',
	revision: '1.0.0',
	title: 'Gas that nothing warms',
	purpose: 'How warm, and how ionised, was the gas between the galaxies before any star warmed it?',
	asks: [
		'How cold was the gas at cosmic dawn?',
		'When did the gas let go of the cosmic background?',
		'How many free electrons were left?'
	],
	notFor: [
		'Gas that stars, X-rays or black holes have warmed.',
		'The exact moment of recombination: helium is left out.'
	],
	inputs: {
		cosmology: cosmologyInput,
		Yp: heliumInput,
		z: {
			kind: 'number',
			label: 'Redshift',
			symbol: 'z',
			quantity: 'redshift',
			unit: '',
			min: 0,
			max: FIRST_Z,
			initial: 100
		},
		fudge: {
			kind: 'choice',
			label: 'Correction to the recombination rate',
			options: [
				{ value: 'recfast15', label: '1.125 and two Gaussians (RECFAST 1.5)' },
				{ value: 'seager1999', label: '1.14 (Seager and others 1999)' }
			],
			initial: 'recfast15',
			optional: true
		}
	},
	outputs: {
		Tk: { label: 'Temperature of the gas', symbol: 'T_k', quantity: 'gas-temperature', unit: 'K' },
		x_e: {
			label: 'Free electrons for each hydrogen nucleus',
			symbol: 'x_e',
			quantity: 'ionised-fraction',
			unit: ''
		},
		ratio: {
			label: 'Temperature compared with the background',
			quantity: 'ratio',
			unit: ''
		}
	},
	equations: [
		{
			tex: '\\frac{\\mathrm{d}T_k}{\\mathrm{d}\\ln(1+z)} = 2\\,T_k + \\frac{8\\,\\sigma_T a_R T_\\gamma^4}{3\\,m_e c\\,H}\\,\\frac{x_e}{1+f_\\mathrm{He}+x_e}\\,(T_k-T_\\gamma)',
			says: 'Expansion cools the gas; free electrons, scattering the background, hold it back while there are enough.'
		},
		{
			tex: '\\frac{\\mathrm{d}x_e}{\\mathrm{d}\\ln(1+z)} = \\frac{C}{H}\\left[\\alpha\\,x_e^2 n_H - \\beta\\,(1-x_e)\\,e^{-E_\\alpha/kT_k}\\right]',
			says: 'Electrons and protons join, and the background parts them again, until they are too thin to meet.'
		}
	],
	assumptions: THERMAL_ASSUMPTIONS,
	warnings: [NO_STARS, HELIUM_LEFT_OUT, ...UNIVERSE_WARNINGS],
	sources: [...THERMAL_SOURCES, codata2018('h, c, k, m_e, m_u, σ_T')],
	checks: checksOf('thermal.tla1'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ cosmology, Yp, z, fudge }, edition?: ConstantsEdition): Computed {
		const opened = thermalHistory(cosmology, Yp, fudge, edition);
		if (!opened.ok) return opened;
		const { gas, at } = opened.history;
		const { x_e, Tk } = at(z);
		return {
			ok: true,
			values: { Tk, x_e, ratio: Tk / gas.background(1 + z) },
			warnings: [
				...(z < 30 ? [NO_STARS.code] : []),
				...(z > 1600 ? [HELIUM_LEFT_OUT.code] : []),
				...universeWarnings(gas.universe)
			]
		};
	}
});
