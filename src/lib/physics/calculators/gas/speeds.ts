import {
	defineCalculator,
	refuse,
	type Computed,
	type Refusal,
	type Uncertainty
} from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { checksOf } from '../published-checks.ts';
import { codata2018 } from '../sources.ts';
import { dueTo } from '../uncertainties.ts';
import { gammaInput, gasTemperature } from './ideal.ts';

const { k, c } = constants.physical;

/**
 * Speeds in an ideal gas at T (K) of particles of mass m (u), in m/s: most probable √(2kT/m), mean √(8kT/πm), root mean
 * square √(3kT/m), and that of sound √(γkT/m) where γ is given. Refuses gases whose particles would outrun light.
 */
export const gasSpeeds = defineCalculator({
	id: 'gas.speeds',
	revision: '1.0.0',
	title: 'How fast a gas moves',
	purpose:
		'How fast do the particles of a gas fly at this temperature, and how fast is sound in it?',
	asks: [
		'How fast are the molecules of air?',
		'How fast is sound in helium?',
		'Can a planet keep its air?'
	],
	notFor: ['Gases squeezed until they are nearly liquid.', 'Sound in liquids and solids.'],
	inputs: {
		T_K: gasTemperature(300, 1e12),
		mass_u: {
			kind: 'number',
			label: 'Mass of a particle',
			symbol: 'm',
			quantity: 'mass',
			unit: 'u',
			min: 5e-4,
			max: 1e12,
			initial: 28.0134,
			log: true
		},
		gamma: {
			...gammaInput(1.4),
			optional: true,
			absent: 'not known, so no speed of sound'
		}
	},
	outputs: {
		mostProbable: {
			label: 'Most probable speed',
			symbol: 'v_p',
			quantity: 'speed',
			unit: 'm/s'
		},
		mean: { label: 'Mean speed', symbol: '⟨v⟩', quantity: 'speed', unit: 'm/s' },
		rms: {
			label: 'Root of the mean square speed',
			symbol: 'v_rms',
			quantity: 'speed',
			unit: 'm/s'
		},
		sound: { label: 'Speed of sound', symbol: 'c_s', quantity: 'speed', unit: 'm/s' }
	},
	equations: [
		{
			tex: 'v_p = \\sqrt{\\frac{2kT}{m}}, \\qquad \\langle v\\rangle = \\sqrt{\\frac{8kT}{\\pi m}}, \\qquad v_\\mathrm{rms} = \\sqrt{\\frac{3kT}{m}}',
			says: 'Light particles are fast, and four times as hot is twice as fast; three ways to say “typical”.'
		},
		{
			tex: 'c_s = \\sqrt{\\frac{\\gamma kT}{m}}',
			says: 'Sound goes about as fast as the particles that carry it.'
		}
	],
	assumptions: [
		'An ideal gas at rest, one temperature throughout.',
		'All particles have this mass.'
	],
	warnings: [
		{
			code: 'near-light',
			message: 'So hot, its particles near the speed of light and these formulas run high.',
			when: 'root mean square speed above a tenth of that of light',
			validity: 'outside'
		}
	],
	sources: [
		{
			title: 'Maxwell 1860, Illustrations of the dynamical theory of gases, Phil. Mag. 19, 19',
			fromMemory: true
		},
		codata2018('k, exact; m_u, uncertainty 3 × 10⁻¹⁰')
	],
	checks: checksOf('gas.speeds'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ T_K: T, mass_u, gamma }, { physical: { m_u } } = constants): Computed {
		const thermal = (k.value * T) / (mass_u * m_u.value);
		const rms = Math.sqrt(3 * thermal);
		if (rms >= c.value) {
			return refuse(
				'outruns-light',
				'By this formula the particles would outrun light. Give a lower temperature or heavier particles.',
				'T_K'
			);
		}
		const values: Record<string, number> = {
			mostProbable: Math.sqrt(2 * thermal),
			mean: Math.sqrt((8 / Math.PI) * thermal),
			rms
		};
		const withheld: Record<string, Refusal> = {};
		if (gamma === undefined) {
			withheld.sound = {
				code: 'needs-gamma',
				message: 'Give the ratio of heat capacities to get the speed of sound.'
			};
		} else values.sound = Math.sqrt(gamma * thermal);
		const uncertainties: Record<string, Uncertainty> = {};
		for (const [key, value] of Object.entries(values)) {
			uncertainties[key] = dueTo(m_u.uncertainty / m_u.value, value, -0.5);
		}
		return {
			ok: true,
			values,
			uncertainties,
			withheld,
			warnings: rms > c.value / 10 ? ['near-light'] : []
		};
	}
});
