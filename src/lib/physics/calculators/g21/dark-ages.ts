import { defineCalculator, type Computed } from '../../calculator.ts';
import type { ConstantsEdition } from '../../constants/index.ts';
import { cosmologyInput } from '../cosmology/limits.ts';
import { heliumInput } from '../thermal/gas.ts';
import { thermalHistory } from '../thermal/history.ts';
import {
	HELIUM_LEFT_OUT,
	NO_STARS,
	THERMAL_ASSUMPTIONS,
	THERMAL_SOURCES,
	UNIVERSE_WARNINGS,
	universeWarnings
} from '../thermal/sources.ts';
import { COLLISION_RATES, collisionalCoupling } from './collisions.ts';
import { brightnessOf, depthScale, spinTemperature } from './hydrogen-line.ts';
import { FOB06, PRITCHARD_LOEB, SIGN_CONVENTION, signalRedshift } from './signal.ts';
import { checksOf } from '../published-checks.ts';

/** The 21 cm line before any star: spins tied to unheated gas by collisions alone. Brightness in mK, T_s in K. */
export const darkAges = defineCalculator({
	id: 'g21.dark_ages',
	revision: '1.0.0',
	title: '21 cm line: the dark ages',
	purpose:
		'How dark is the 21 centimetre line before the first stars, when only collisions set the spins?',
	asks: [
		'What signal do the dark ages give?',
		'At what frequency is the dark-ages trough deepest?',
		'Why listen from the far side of the Moon?'
	],
	notFor: ['Times after the first stars: their light takes over.'],
	inputs: { cosmology: cosmologyInput, Yp: heliumInput, z: signalRedshift(85) },
	outputs: {
		dTb_exact: {
			label: 'Brightness against the background',
			symbol: 'δT_b',
			quantity: 'temperature-difference',
			unit: 'mK'
		},
		Ts: { label: 'Spin temperature', symbol: 'T_s', quantity: 'spin-temperature', unit: 'K' },
		x_c: { label: 'Coupling by collisions', symbol: 'x_c', quantity: 'coupling', unit: '' },
		Tk: { label: 'Temperature of the gas', symbol: 'T_k', quantity: 'gas-temperature', unit: 'K' }
	},
	equations: [
		{
			tex: '\\frac{1}{T_s} = \\frac{T_\\gamma^{-1} + x_c T_k^{-1}}{1 + x_c}',
			says: 'Collisions pull the spins to the gas while it is dense, the background pulls them back.'
		},
		{
			tex: '\\delta T_b = \\frac{T_s-T_\\gamma}{1+z}\\left(1-e^{-\\tau}\\right)',
			says: 'Spins colder than the background make a dip.'
		}
	],
	assumptions: [SIGN_CONVENTION, 'No star has shone yet.', ...THERMAL_ASSUMPTIONS],
	warnings: [NO_STARS, HELIUM_LEFT_OUT, ...UNIVERSE_WARNINGS],
	sources: [
		FOB06,
		PRITCHARD_LOEB,
		...Object.values(COLLISION_RATES).map(({ source }) => ({ title: source })),
		...THERMAL_SOURCES
	],
	checks: checksOf('g21.dark_ages'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ cosmology, Yp, z }, edition?: ConstantsEdition): Computed {
		const opened = thermalHistory(cosmology, Yp, undefined, edition);
		if (!opened.ok) return opened;
		const { gas, at } = opened.history;
		const { x_e: found, Tk } = at(z);
		const x_e = Math.min(1, found);
		const background = gas.background(1 + z);
		const x_c = collisionalCoupling(gas, 1 + z, Tk, x_e);
		const Ts = spinTemperature(background, Tk, { x_alpha: 0, x_c });
		const { dTb } = brightnessOf(depthScale(gas, z, 1 - x_e), z, Ts, background);
		return {
			ok: true,
			values: { dTb_exact: dTb * 1000, Ts, x_c, Tk },
			warnings: [
				...(z < 30 ? [NO_STARS.code] : []),
				...(z > 1600 ? [HELIUM_LEFT_OUT.code] : []),
				...universeWarnings(gas.universe)
			]
		};
	}
});
