import { defineCalculator, type Computed } from '../../calculator.ts';
import { gravityInput } from '../energy/gravity.ts';
import { openStax, STANDARD_GRAVITY_SOURCE } from '../sources.ts';
import { heightInput } from './inputs.ts';
import { checksOf } from '../published-checks.ts';

/** Speed, m/s, of a body that has rolled down by a height h (m) without slipping: √(2gh/(1+k)), k = I/mr². */
export const rolling = defineCalculator({
	id: 'mech.rolling',
	revision: '1.0.0',
	title: 'Rolling down a slope',
	purpose: 'A ball or hoop rolls down by a height: how fast is it at the bottom?',
	asks: [
		'Does a ball or a hoop get down first?',
		'How fast does a rolling ball get?',
		'Why is rolling slower than sliding?'
	],
	notFor: ['Slopes so steep that the body slips.', 'Soft balls and rough ground.'],
	inputs: {
		height_m: heightInput('Height it comes down by', 1),
		k: {
			kind: 'number',
			label: 'How far out its mass lies: 0 sliding, 2/5 ball, 1/2 disc, 1 hoop',
			symbol: 'k',
			quantity: 'number',
			unit: '',
			min: 0,
			max: 1000,
			good: { min: 0, max: 1, warning: 'thin-axle' },
			initial: 0.4
		},
		g: gravityInput
	},
	outputs: { speed: { label: 'Speed at the bottom', symbol: 'v', quantity: 'speed', unit: 'm/s' } },
	equations: [
		{
			tex: 'v = \\sqrt{\\frac{2gh}{1+k}}, \\qquad k = \\frac{I}{mr^2}',
			says: 'Part of the energy goes into the spin, the more the farther out the mass lies.'
		}
	],
	assumptions: ['It rolls without slipping, from rest.', 'No air, and nothing else rubs.'],
	warnings: [
		{
			code: 'thin-axle',
			message: 'More than a hoop is only had by rolling on an axle thinner than the body.',
			when: 'k above 1',
			validity: 'approximate'
		}
	],
	sources: [openStax(1, '§11.1, rolling motion'), STANDARD_GRAVITY_SOURCE],
	checks: checksOf('mech.rolling'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ height_m: h, k, g }): Computed {
		const values = { speed: Math.sqrt((2 * g * h) / (1 + k)) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
