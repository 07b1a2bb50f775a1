import { defineCalculator, type Computed } from '../../calculator.ts';
import type { ConstantsEdition } from '../../constants/index.ts';
import { codata2018 } from '../sources.ts';
import { lymanAlphaCoupling } from './hydrogen-line.ts';
import { FIELD_1958, FOB06, signalRedshift } from './signal.ts';
import { checksOf } from '../published-checks.ts';

/** How strongly Lyman α light of intensity J ties hydrogen's spins to the gas: 1.7841 × 10¹¹ S J/(1+z). */
export const lymanAlpha = defineCalculator({
	id: 'g21.x_alpha',
	revision: '1.0.0',
	title: '21 cm line: coupling by Lyman α',
	purpose:
		'How strongly does the ultraviolet light of the first stars tie hydrogen’s spins to the gas?',
	asks: ['How much starlight switches the signal on?', 'What is the Wouthuysen–Field coupling?'],
	notFor: ['How much light the first stars gave: that is an input.'],
	inputs: {
		S_alpha: {
			kind: 'number',
			label: 'Correction for scattering',
			symbol: 'S_α',
			quantity: 'ratio',
			unit: '',
			min: 0,
			max: 10,
			initial: 1,
			optional: true
		},
		J: {
			kind: 'number',
			label: 'Lyman α photons for each cm², second, hertz and steradian',
			symbol: 'J',
			quantity: 'photon-intensity',
			unit: '1/(cm2 s Hz sr)',
			min: 0,
			max: 1,
			initial: 1e-10,
			log: true
		},
		z: signalRedshift(17)
	},
	outputs: {
		x_alpha: { label: 'Coupling by Lyman α', symbol: 'x_α', quantity: 'coupling', unit: '' }
	},
	equations: [
		{
			tex: 'x_\\alpha = \\frac{16\\pi^2\\,T_\\ast\\,e^2 f_\\alpha}{27\\,A_{10}\\,T_\\gamma\\,m_e c}\\,S_\\alpha J',
			says: 'Spins flipped by scattering starlight compared with spins flipped by the background.'
		}
	],
	assumptions: [
		'A background of 2.7255 K now.',
		'Oscillator strength 0.4164 (Morton 2003).',
		'The line decays at 2.8843 × 10⁻¹⁵ a second. Published roundings, 1.81 and 1.66 × 10¹¹ S J/(1+z), differ through that and the background.'
	],
	warnings: [],
	sources: [
		FIELD_1958,
		{ title: 'Wouthuysen 1952, AJ 57, 31', fromMemory: true },
		FOB06,
		codata2018('h, k, e, m_e, c, ε₀')
	],
	checks: checksOf('g21.x_alpha'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ S_alpha, J, z }, edition?: ConstantsEdition): Computed {
		return { ok: true, values: { x_alpha: lymanAlphaCoupling(S_alpha, J, 1 + z, edition) } };
	}
});
