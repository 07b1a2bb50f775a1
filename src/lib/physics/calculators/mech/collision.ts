import { defineCalculator, type Computed, type NumberInput } from '../../calculator.ts';
import { openStax } from '../sources.ts';
import { massInput } from './inputs.ts';
import { checksOf } from '../published-checks.ts';

function speed(label: string, symbol: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'speed',
		unit: 'm/s',
		min: -1e7,
		max: 1e7,
		initial
	};
}

/**
 * Two bodies meet on a line: speeds after, m/s, from momentum and the coefficient of restitution e in [0, 1], and the
 * energy lost, m₁m₂/(2(m₁+m₂)) (1−e²)(u₁−u₂)² in J.
 */
export const collision = defineCalculator({
	id: 'mech.collision',
	revision: '1.0.0',
	title: 'Two bodies collide',
	purpose: 'Two bodies meet head on: how fast is each after it, and how much energy is lost?',
	asks: [
		'What happens when a heavy body hits a light one?',
		'How much energy does a collision turn into heat and dents?'
	],
	notFor: ['Bodies that meet at a slant or spin.', 'What a crash does to people.'],
	inputs: {
		m1: massInput('Mass of the first body', 'm_1', 2),
		m2: massInput('Mass of the second body', 'm_2', 1),
		u1: speed('Speed of the first body before', 'u_1', 3),
		u2: speed('Speed of the second body before', 'u_2', 0),
		e: {
			kind: 'number',
			label: 'Share of the closing speed they part with',
			symbol: 'e',
			quantity: 'number',
			unit: '',
			min: 0,
			max: 1,
			initial: 1,
			optional: true
		}
	},
	outputs: {
		v1: { label: 'Speed of the first body after', symbol: 'v_1', quantity: 'speed', unit: 'm/s' },
		v2: { label: 'Speed of the second body after', symbol: 'v_2', quantity: 'speed', unit: 'm/s' },
		energyLost: { label: 'Energy lost from the motion', quantity: 'energy', unit: 'J' }
	},
	equations: [
		{
			tex: 'v_1 = \\frac{m_1u_1+m_2u_2+m_2e(u_2-u_1)}{m_1+m_2}, \\qquad v_2 = v_1 + e(u_1-u_2)',
			says: 'Momentum is kept, and the bodies part at a share e of the speed they met with.'
		},
		{
			tex: '\\Delta E = \\frac{m_1m_2}{2(m_1+m_2)}\\,(1-e^2)(u_1-u_2)^2',
			says: 'Perfect bounces lose nothing; bodies that stick lose most.'
		}
	],
	assumptions: ['They do meet, on one line, and nothing else pushes.', 'Neither spins.'],
	warnings: [],
	sources: [openStax(1, '§9.4, types of collisions')],
	checks: checksOf('mech.collision'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ m1, m2, u1, u2, e }): Computed {
		const both = m1 + m2;
		const closing = u1 - u2;
		const values = {
			v1: (m1 * u1 + m2 * u2 - m2 * e * closing) / both,
			v2: (m1 * u1 + m2 * u2 + m1 * e * closing) / both,
			energyLost: 0.5 * m1 * (m2 / both) * (1 - e) * (1 + e) * closing * closing
		};
		return { ok: true, values, uncertainties: 'exact' };
	}
});
