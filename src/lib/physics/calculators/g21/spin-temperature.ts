import { defineCalculator, type Computed, type NumberInput } from '../../calculator.ts';
import { spinTemperature } from './hydrogen-line.ts';
import { FIELD_1958, FOB06, kelvin } from './signal.ts';
import { checksOf } from '../published-checks.ts';

function coupling(label: string, symbol: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'coupling',
		unit: '',
		min: 0,
		max: 1e12,
		initial
	};
}

/** Spin temperature of hydrogen in K between light, gas and Lyman α; all temperatures above 0, couplings from 0 up. */
export const spinTemperatureCalculator = defineCalculator({
	id: 'g21.spin_temperature',
	revision: '1.0.0',
	title: '21 cm line: spin temperature',
	purpose:
		'Between the background and the gas, where does the temperature of hydrogen’s spins lie?',
	asks: [
		'What is the spin temperature?',
		'Does the line follow the gas or the background?',
		'How strong must the starlight be to tie the spins to the gas?'
	],
	notFor: ['Temperatures of the gas itself.', 'How strong the couplings are: they have their own.'],
	inputs: {
		Trad_K: kelvin('Temperature of the background then', 'T_r', 'background-temperature', 49.6),
		Tk_K: kelvin('Temperature of the gas', 'T_k', 'gas-temperature', 7),
		x_alpha: coupling('Coupling by Lyman α', 'x_α', 1),
		x_c: coupling('Coupling by collisions', 'x_c', 0.002),
		Tc_K: {
			...kelvin('Colour temperature of Lyman α', 'T_c', 'temperature', 7),
			optional: true,
			absent: 'the temperature of the gas'
		}
	},
	outputs: {
		Ts: { label: 'Spin temperature', symbol: 'T_s', quantity: 'spin-temperature', unit: 'K' }
	},
	equations: [
		{
			tex: '\\frac{1}{T_s} = \\frac{T_r^{-1} + x_\\alpha T_c^{-1} + x_c T_k^{-1}}{1 + x_\\alpha + x_c}',
			says: 'Light, Lyman α and collisions each pull the spins their way, by their strength.'
		}
	],
	assumptions: [
		'The spins have settled: they are far quicker than the expansion.',
		'Lyman α has the temperature of the gas unless another is given.'
	],
	warnings: [],
	sources: [FIELD_1958, FOB06],
	checks: checksOf('g21.spin_temperature'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ Trad_K, Tk_K, x_alpha, x_c, Tc_K }): Computed {
		const values = { Ts: spinTemperature(Trad_K, Tk_K, { x_alpha, x_c }, Tc_K ?? Tk_K) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
