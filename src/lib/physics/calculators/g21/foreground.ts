import { defineCalculator, type Computed } from '../../calculator.ts';
import { checksOf } from '../published-checks.ts';
import { FOB06, kelvin } from './signal.ts';
import { megahertz } from './trough-inputs.ts';

/** Radio sky in front of the signal, in K: T_ref (ν/ν_ref)^index, and how many times a signal it is. */
export const foreground = defineCalculator({
	id: 'g21.foreground',
	revision: '1.0.0',
	title: 'Radio sky in front of the signal',
	purpose: 'How bright is the radio sky at a frequency, and how many times the signal is that?',
	asks: ['How loud is the Milky Way at 78 megahertz?', 'Is the early Universe radio quiet?'],
	notFor: ['One direction of the sky: this is an average.', 'The noise of a receiver.'],
	inputs: {
		Tref_K: {
			...kelvin('Sky at the frequency known', 'T_ref', 'temperature', 180),
			optional: true
		},
		nuref_MHz: { ...megahertz('Frequency at which it is known', 'ν_ref', 180), optional: true },
		nu_MHz: {
			...megahertz('Frequency', 'ν', 78),
			good: { min: 20, max: 400, warning: 'beyond-power-law' }
		},
		index: {
			kind: 'number',
			label: 'Power of the frequency',
			symbol: 'β',
			quantity: 'number',
			unit: '',
			min: -5,
			max: 5,
			initial: -2.6,
			optional: true
		},
		signal_K: {
			...kelvin('Depth of the signal to compare with', 'A', 'temperature-difference', 0.2),
			optional: true
		}
	},
	outputs: {
		Tsky: { label: 'Temperature of the sky', symbol: 'T_sky', quantity: 'temperature', unit: 'K' },
		ratio: { label: 'Sky compared with the signal', quantity: 'ratio', unit: 'times' }
	},
	equations: [
		{
			tex: 'T_\\mathrm{sky} = T_\\mathrm{ref}\\left(\\frac{\\nu}{\\nu_\\mathrm{ref}}\\right)^{\\beta}',
			says: 'The glow of fast electrons in the Milky Way grows steeply towards low frequencies.'
		}
	],
	assumptions: [
		'A quiet part of the sky, averaged; near the plane of the Milky Way it is many times brighter.'
	],
	warnings: [
		{
			code: 'beyond-power-law',
			message: 'A single power holds for the radio sky from about 20 to 400 megahertz only.',
			when: 'frequency below 20 or above 400 MHz',
			validity: 'approximate'
		}
	],
	sources: [FOB06],
	checks: checksOf('g21.foreground'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ Tref_K, nuref_MHz, nu_MHz, index, signal_K }): Computed {
		const Tsky = Tref_K * (nu_MHz / nuref_MHz) ** index;
		const values = { Tsky, ratio: Tsky / signal_K };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
