import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import { cosmologyInput } from '../cosmology/limits.ts';
import { FOB06, signalRedshift } from './signal.ts';
import { checksOf } from '../published-checks.ts';

/** Rule of thumb for unheated gas: it let go of the background at 1+z_dec and cooled as (1+z)² since. Kelvin. */
export const adiabatic = defineCalculator({
	id: 'g21.adiabatic',
	revision: '1.0.0',
	title: 'Gas that nothing warms: rule of thumb',
	purpose: 'How cold is unheated gas, by a rule that fits on a napkin?',
	asks: ['How cold was the gas before the first stars, roughly?', 'When did the gas let go?'],
	notFor: [
		'A figure to print: follow the thermal history for that.',
		'Gas that stars have warmed.'
	],
	inputs: { cosmology: cosmologyInput, z: signalRedshift(17.2) },
	outputs: {
		Tk: { label: 'Temperature of the gas', symbol: 'T_k', quantity: 'gas-temperature', unit: 'K' },
		one_plus_z_dec: {
			label: '1 + redshift at which the gas let go',
			symbol: '1+z_dec',
			quantity: 'stretch',
			unit: ''
		}
	},
	equations: [
		{
			tex: '1+z_\\mathrm{dec} = 150\\left(\\frac{\\Omega_b h^2}{0.023}\\right)^{2/5}',
			says: 'More gas keeps hold of the background for less time.'
		},
		{
			tex: 'T_k = \\frac{T_0\\,(1+z)^2}{1+z_\\mathrm{dec}}',
			says: 'After that, expansion cools gas as the square of the stretch, light only in step with it.'
		}
	],
	assumptions: [
		'The gas lets go at one moment; really it does so slowly, and is 13 per cent warmer at redshift 17.'
	],
	warnings: [
		{
			code: 'rule-of-thumb',
			message: 'A rule of thumb: the followed history is about 13 per cent warmer at redshift 17.',
			when: 'always',
			validity: 'approximate'
		},
		{
			code: 'still-held',
			message: 'Before it let go, the gas was as warm as the background, not as this formula says.',
			when: '1+z above 1+z_dec',
			validity: 'outside'
		}
	],
	sources: [FOB06],
	checks: checksOf('g21.adiabatic'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ cosmology, z }): Computed {
		const { Ob0, H0, Tcmb0 } = cosmology;
		if (Ob0 === 0 || Tcmb0 === 0) {
			return refuse(
				'no-gas',
				'This needs ordinary matter (Ob0) and a background (Tcmb0). Give both, or take a published set such as Planck 2018.',
				'cosmology'
			);
		}
		const letGo = 150 * ((Ob0 * (H0 / 100) ** 2) / 0.023) ** 0.4;
		return {
			ok: true,
			values: { Tk: (Tcmb0 * (1 + z) ** 2) / letGo, one_plus_z_dec: letGo },
			warnings: ['rule-of-thumb', ...(1 + z > letGo ? ['still-held'] : [])]
		};
	}
});
