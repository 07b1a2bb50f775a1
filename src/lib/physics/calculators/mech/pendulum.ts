import { defineCalculator, type Computed } from '../../calculator.ts';
import { sineOfDegrees } from '../../numerics/degrees.ts';
import { gravityInput } from '../energy/gravity.ts';
import { checksOf } from '../published-checks.ts';
import { STANDARD_GRAVITY_SOURCE } from '../sources.ts';

/**
 * Swing of a weight on a thread of length L (m) let go at θ₀ (degrees, below 180): period 2π√(L/g) for small swings and
 * 4√(L/g) K(sin θ₀/2) for any, in s, and speed at the lowest point 2√(gL) sin(θ₀/2) in m/s.
 */
export const pendulum = defineCalculator({
	id: 'mech.pendulum',
	revision: '1.0.0',
	title: 'Pendulum',
	purpose:
		'A weight swings on a thread: how long does it take there and back, and how fast is it below?',
	asks: [
		'How long does a pendulum take to swing?',
		'How long must a thread be to beat seconds?',
		'Does a wide swing take longer?'
	],
	notFor: ['Swinging bars and children, whose mass is not in one point.', 'Swings that air slows.'],
	inputs: {
		L_m: {
			kind: 'number',
			label: 'Length of the thread',
			symbol: 'L',
			quantity: 'length',
			unit: 'm',
			min: 0,
			minExclusive: true,
			max: 1e5,
			initial: 1
		},
		theta0_deg: {
			kind: 'number',
			label: 'Angle it is let go at',
			symbol: 'θ_0',
			quantity: 'angle',
			unit: 'deg',
			min: 0,
			max: 180,
			maxExclusive: true,
			good: { min: 0, max: 90, warning: 'slack-thread' },
			initial: 20
		},
		g: gravityInput
	},
	outputs: {
		small: {
			label: 'Time there and back, for small swings',
			symbol: 'T_0',
			quantity: 'duration',
			unit: 's'
		},
		exact: { label: 'Time there and back', symbol: 'T', quantity: 'duration', unit: 's' },
		maxSpeed: { label: 'Speed at the lowest point', symbol: 'v', quantity: 'speed', unit: 'm/s' }
	},
	equations: [
		{
			tex: 'T_0 = 2\\pi\\sqrt{\\frac Lg}',
			says: 'For small swings neither the weight nor the width of the swing counts.'
		},
		{
			tex: 'T = 4\\sqrt{\\frac Lg}\\;K\\left(\\sin\\frac{\\theta_0}2\\right)',
			says: 'Wider swings take longer, by a complete elliptic integral.'
		},
		{
			tex: 'v = 2\\sqrt{gL}\\,\\sin\\frac{\\theta_0}2',
			says: 'The height lost turns into speed.'
		}
	],
	assumptions: [
		'All mass in one point, on a thread or rod without mass.',
		'No air and no friction.',
		'Left out, gravity is the standard one of the Earth.'
	],
	warnings: [
		{
			code: 'slack-thread',
			message: 'Let go above the level of its pivot, a thread goes slack: only a rod swings so.',
			when: 'angle above 90 degrees',
			validity: 'approximate'
		},
		{
			code: 'wide-swing',
			message:
				'The swing is wide: the time for small swings is too short by more than half a per cent.',
			when: 'times for small swings and for this one more than 0.5 per cent apart',
			validity: 'ok'
		}
	],
	sources: [
		{ title: 'Landau & Lifshitz 1976, Mechanics', locator: '§11, problem 1', fromMemory: true },
		STANDARD_GRAVITY_SOURCE
	],
	checks: checksOf('mech.pendulum'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ L_m: L, theta0_deg: theta, g }): Computed {
		const small = 2 * Math.PI * Math.sqrt(L / g);
		const values = {
			small,
			// 4K = 2π/AGM(1, cos θ₀/2); the cosine as a sine keeps its digits near the top.
			exact: small / arithmeticGeometricMean(1, sineOfDegrees((180 - theta) / 2)),
			maxSpeed: 2 * Math.sqrt(g * L) * sineOfDegrees(theta / 2)
		};
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: values.exact > 1.005 * small ? ['wide-swing'] : []
		};
	}
});

/** Gauss's mean of two positive numbers; digits double at each turn. */
function arithmeticGeometricMean(a: number, b: number): number {
	for (let turn = 0; turn < 40 && Math.abs(a - b) > 1e-16 * a; turn += 1) {
		[a, b] = [(a + b) / 2, Math.sqrt(a * b)];
	}
	return (a + b) / 2;
}
