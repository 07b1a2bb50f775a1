import { defineCalculator, type Computed } from '../../calculator.ts';
import type { ConstantsEdition } from '../../constants/index.ts';
import { cosmologyInput } from '../cosmology/limits.ts';
import { gasOf, heliumInput } from '../thermal/gas.ts';
import { UNIVERSE_WARNINGS, universeWarnings } from '../thermal/sources.ts';
import { beyondTables, COLLISION_RATES, collisionalCoupling } from './collisions.ts';
import { FOB06, kelvin, signalRedshift } from './signal.ts';
import { checksOf } from '../published-checks.ts';

/** How strongly collisions tie hydrogen's spins to gas of a given temperature, compared with the background. */
export const collisional = defineCalculator({
	id: 'g21.x_c',
	revision: '1.0.0',
	title: '21 cm line: coupling by collisions',
	purpose: 'How strongly do collisions tie hydrogen’s spins to the temperature of the gas?',
	asks: ['When was the gas dense enough for collisions to set the spins?', 'What is x_c?'],
	notFor: ['Coupling by starlight: that is x_α.', 'Dense clouds: this is the mean gas.'],
	inputs: {
		cosmology: cosmologyInput,
		Yp: heliumInput,
		z: signalRedshift(80),
		Tk_K: kelvin('Temperature of the gas', 'T_k', 'gas-temperature', 115),
		x_e: {
			kind: 'number',
			label: 'Free electrons for each hydrogen nucleus',
			symbol: 'x_e',
			quantity: 'ionised-fraction',
			unit: '',
			min: 0,
			max: 1,
			initial: 0.00025
		}
	},
	outputs: {
		x_c: { label: 'Coupling by collisions', symbol: 'x_c', quantity: 'coupling', unit: '' }
	},
	equations: [
		{
			tex: 'x_c = \\frac{T_\\ast}{A_{10} T_\\gamma}\\left[n_\\mathrm{HI}\\,\\kappa_\\mathrm{HH} + n_e\\,\\kappa_{e\\mathrm{H}} + n_p\\,\\kappa_{p\\mathrm{H}}\\right]',
			says: 'Flips by collisions compared with flips that the background brings about.'
		}
	],
	assumptions: [
		'Gas of the mean density, without helium’s collisions.',
		'As many protons as electrons.',
		'The line decays at 2.8843 × 10⁻¹⁵ a second; older texts use 2.85, which makes this 1.2 per cent larger.'
	],
	warnings: [
		{
			code: 'beyond-table',
			message:
				'A published table of collision rates ends before this temperature; its last value is held.',
			when: 'gas below 1 K or above 10 000 K',
			validity: 'approximate'
		},
		...UNIVERSE_WARNINGS
	],
	sources: [FOB06, ...Object.values(COLLISION_RATES).map(({ source }) => ({ title: source }))],
	checks: checksOf('g21.x_c'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ cosmology, Yp, z, Tk_K, x_e }, edition?: ConstantsEdition): Computed {
		const opened = gasOf(cosmology, Yp, edition);
		if (!opened.ok) return opened;
		return {
			ok: true,
			values: { x_c: collisionalCoupling(opened.gas, 1 + z, Tk_K, x_e) },
			warnings: [
				...(beyondTables(Tk_K) ? ['beyond-table'] : []),
				...universeWarnings(opened.gas.universe)
			]
		};
	}
});
