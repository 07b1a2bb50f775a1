import { defineCalculator, refuse, type Computed, type Refusal } from '../../calculator.ts';
import type { ConstantsEdition } from '../../constants/index.ts';
import { brentRoot } from '../../numerics/roots.ts';
import { cosmologyInput } from '../cosmology/limits.ts';
import { checksOf } from '../published-checks.ts';
import { gasOf, heliumInput, type Gas } from '../thermal/gas.ts';
import { thermalHistory } from '../thermal/history.ts';
import { UNIVERSE_WARNINGS, universeWarnings } from '../thermal/sources.ts';
import { printNumber } from '../wording.ts';
import { brightnessOf, depthScale, linearScaleMk } from './hydrogen-line.ts';
import {
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
 * Gas temperature in K that a brightness in mK stands for, with neutral gas and spins as cold as it: by the linear formula
 * T_r/(1 − δ/A), and exactly. Refuses emission brighter than any warmth gives.
 */
export const tkForDepth = defineCalculator({
	id: 'g21.tk_for_depth',
	revision: '1.0.0',
	title: '21 cm line: gas temperature for a depth',
	purpose: 'How cold must the gas be for a trough to be this deep?',
	asks: ['What gas temperature does half a kelvin ask for?', 'Is the trough too deep for the gas?'],
	notFor: ['A measured temperature: another background would give another answer.'],
	inputs: {
		cosmology: cosmologyInput,
		Yp: heliumInput,
		z: signalRedshift(17.2),
		depth_mK: {
			kind: 'number',
			label: 'Brightness against the background (a trough is negative)',
			symbol: 'δT_b',
			quantity: 'temperature-difference',
			unit: 'mK',
			min: -1e5,
			max: 1e4,
			initial: -500
		}
	},
	outputs: {
		Tk: {
			label: 'Temperature of the gas, by the linear formula',
			symbol: 'T_k',
			quantity: 'gas-temperature',
			unit: 'K'
		},
		Tk_exact: {
			label: 'Temperature of the gas, exactly',
			symbol: 'T_k',
			quantity: 'gas-temperature',
			unit: 'K'
		}
	},
	equations: [
		{
			tex: 'T_k = \\frac{T_\\gamma}{1-\\delta T_b/A}',
			says: 'The deeper the trough, the colder the gas; A is how bright the line would be in very warm gas.'
		}
	],
	assumptions: [
		SIGN_CONVENTION,
		'All hydrogen is neutral and its spins are as cold as the gas: anything else needs still colder gas.',
		'The background is the cosmic one alone.'
	],
	warnings: [
		DISPUTED_TROUGH,
		{
			...NEW_PHYSICS,
			when: 'gas colder than the thermal history without any heating has it',
			validity: 'ok'
		},
		...UNIVERSE_WARNINGS
	],
	sources: [BARKANA_2018, FOB06, SINGH_2022],
	checks: checksOf('g21.tk_for_depth'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ cosmology, Yp, z, depth_mK: depth }, edition?: ConstantsEdition): Computed {
		const opened = gasOf(cosmology, Yp, edition);
		if (!opened.ok) return opened;
		const { gas } = opened;
		const scale = linearScaleMk(gas, z);
		if (depth >= scale) {
			return refuse(
				'too-bright',
				`However warm, the gas can’t be brighter than ${printNumber(scale)} mK at this redshift. Ask for less than that.`,
				'depth_mK'
			);
		}
		if (!Number.isFinite(scale)) {
			return refuse(
				'no-matter',
				'The linear formula takes matter to set the expansion. Set Om0 above 0.',
				'cosmology'
			);
		}
		const Tk = gas.background(1 + z) / (1 - depth / scale);
		const exact = exactTemperature(gas, z, depth);
		const isCold = isColderThanUnheated(typeof exact === 'number' ? exact : Tk);
		return {
			ok: true,
			values: { Tk, ...(typeof exact === 'number' ? { Tk_exact: exact } : {}) },
			warnings: [
				...troughWarnings(depth, frequencyAt(z)),
				...(isCold ? [NEW_PHYSICS.code] : []),
				...universeWarnings(gas.universe)
			],
			...(typeof exact === 'number' ? {} : { withheld: { Tk_exact: exact } })
		};

		function isColderThanUnheated(temperature: number): boolean {
			const history = thermalHistory(cosmology, Yp, undefined, edition);
			return history.ok && temperature < history.history.at(z).Tk;
		}
	}
});

function exactTemperature(gas: Gas, z: number, depthMk: number): number | Refusal {
	const background = gas.background(1 + z);
	const scale = depthScale(gas, z, 1);
	const difference = (lnT: number) =>
		brightnessOf(scale, z, Math.exp(lnT), background).dTb * 1000 - depthMk;
	const around = Math.log(background);
	const root = brentRoot(difference, around - 25, around + 25, 1e-14);
	if (root !== undefined) return Math.exp(root);
	return depthMk < 0
		? {
				code: 'deeper-than-background',
				message: `Even gas at absolute zero can’t take out more than the whole background, ${printNumber(gas.background(1) * 1000)} mK. Ask for a shallower trough.`
			}
		: {
				code: 'too-bright',
				message: 'However warm, the gas can’t be this bright at this redshift. Ask for less.'
			};
}
