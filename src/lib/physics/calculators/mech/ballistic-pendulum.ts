import { defineCalculator, type Computed } from '../../calculator.ts';
import { PROJECTILE_CAUTION } from '../cautions.ts';
import { gravityInput } from '../energy/gravity.ts';
import { openStax, STANDARD_GRAVITY_SOURCE } from '../sources.ts';
import { heightInput, massInput } from './inputs.ts';
import { checksOf } from '../published-checks.ts';

/** Speed, m/s, of a small body (kg) that sticks in a hanging block (kg) and lifts it by h (m): (m+M)/m √(2gh). */
export const ballisticPendulum = defineCalculator({
	id: 'mech.ballistic_pendulum',
	revision: '1.0.0',
	title: 'Speed from a hanging block',
	purpose: 'A small fast body sticks in a hanging block and lifts it: how fast was it?',
	asks: ['How was the speed of a bullet first measured?', 'How can a swing tell a speed?'],
	notFor: ['Bodies that go through or bounce off.', 'Trying it.'],
	inputs: {
		m: massInput('Mass of the small body', 'm', 0.01),
		M: massInput('Mass of the block', 'M', 2),
		h: heightInput('Height the block rises by', 0.1),
		g: gravityInput
	},
	outputs: {
		speed: { label: 'Speed of the small body', symbol: 'v', quantity: 'speed', unit: 'm/s' }
	},
	equations: [
		{
			tex: 'v = \\frac{m+M}{m}\\sqrt{2gh}',
			says: 'The blow keeps momentum, not energy; the rise then keeps energy.'
		}
	],
	assumptions: [
		'The body sticks, and the block has hardly moved by then.',
		'The block swings without turning, friction or air.'
	],
	warnings: [],
	caution: PROJECTILE_CAUTION,
	sources: [
		{ title: 'Robins 1742, New Principles of Gunnery', fromMemory: true },
		openStax(1, '§9.4, types of collisions'),
		STANDARD_GRAVITY_SOURCE
	],
	checks: checksOf('mech.ballistic_pendulum'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ m, M, h, g }): Computed {
		const values = { speed: ((m + M) / m) * Math.sqrt(2 * g * h) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
