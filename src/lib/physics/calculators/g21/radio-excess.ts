import { defineCalculator, type Computed } from '../../calculator.ts';
import { dueTo } from '../uncertainties.ts';
import { REST_MHZ, REST_RELATIVE_UNCERTAINTY } from './rest-line.ts';
import { NEW_PHYSICS, signalRedshift } from './signal.ts';
import { checksOf } from '../published-checks.ts';

/** Background then, in K, with a radio glow beside the cosmic one: T₀(1+z)[1 + A (ν/78 MHz)^β]. */
export const radioExcess = defineCalculator({
	id: 'g21.radio_excess',
	revision: '1.0.0',
	title: '21 cm line: a brighter background',
	purpose:
		'How bright is the background of the 21 centimetre line if there is a radio glow beside the cosmic one?',
	asks: [
		'What if the early Universe had a radio glow?',
		'Would more background explain a deep trough?'
	],
	notFor: ['The radio sky of the Milky Way: that is the foreground.'],
	inputs: {
		Tcmb0: {
			kind: 'number',
			label: 'Temperature of the cosmic background now',
			symbol: 'T_0',
			quantity: 'background-temperature',
			unit: 'K',
			min: 0,
			minExclusive: true,
			max: 100,
			initial: 2.7255,
			optional: true
		},
		z: signalRedshift(17.2),
		A_r: {
			kind: 'number',
			label: 'Strength of the glow at 78 MHz, compared with the cosmic background',
			symbol: 'A_r',
			quantity: 'ratio',
			unit: '',
			min: 0,
			max: 1e6,
			initial: 1
		},
		beta: {
			kind: 'number',
			label: 'Power of the frequency',
			symbol: 'β',
			quantity: 'number',
			unit: '',
			min: -5,
			max: 5,
			initial: -2.6,
			optional: true
		}
	},
	outputs: {
		Trad: {
			label: 'Temperature of the background then',
			symbol: 'T_r',
			quantity: 'background-temperature',
			unit: 'K'
		},
		factor: { label: 'Background, times the cosmic one', quantity: 'ratio', unit: '' }
	},
	equations: [
		{
			tex: 'T_r = T_0\\,(1+z)\\left[1 + A_r\\left(\\frac{\\nu}{78\\,\\mathrm{MHz}}\\right)^{\\beta}\\right],\\qquad \\nu = \\frac{\\nu_0}{1+z}',
			says: 'A glow that was there before the gas adds to what the gas can take out.'
		}
	],
	assumptions: ['The glow lies behind the gas, evenly all over the sky.'],
	warnings: [{ ...NEW_PHYSICS, when: 'any glow at all (A_r above 0)', validity: 'ok' }],
	sources: [
		{
			title: 'Fialkov & Barkana 2019, MNRAS 486, 1763',
			doi: '10.1093/mnras/stz873',
			fromMemory: true
		}
	],
	checks: checksOf('g21.radio_excess'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ Tcmb0, z, A_r, beta }): Computed {
		const excess = A_r * (REST_MHZ / (1 + z) / 78) ** beta;
		const factor = 1 + excess;
		const Trad = Tcmb0 * (1 + z) * factor;
		const relative = dueTo(REST_RELATIVE_UNCERTAINTY, excess / factor, beta);
		return {
			ok: true,
			values: { Trad, factor },
			uncertainties: { Trad: Trad * relative, factor: factor * relative },
			warnings: A_r > 0 ? [NEW_PHYSICS.code] : []
		};
	}
});
