import { defineCalculator, type Computed, type Refusal } from '../../calculator.ts';
import { openStax } from '../sources.ts';
import { massInput } from './inputs.ts';
import { checksOf } from '../published-checks.ts';

/**
 * A weight on a spring of stiffness k (N/m): time there and back 2π√(m/k) in s; drawn out by x (m), energy kx²/2 in J and
 * speed in the middle x√(k/m) in m/s.
 */
export const spring = defineCalculator({
	id: 'mech.spring',
	revision: '1.0.0',
	title: 'Weight on a spring',
	purpose:
		'A weight bobs on a spring: how long does it take, how much energy is in it, how fast is it?',
	asks: [
		'How much energy is in a stretched spring?',
		'How long does a weight on a spring take to bob?'
	],
	notFor: ['Springs drawn out of shape.', 'Springs as heavy as their weight.'],
	inputs: {
		k: {
			kind: 'number',
			label: 'Stiffness of the spring',
			symbol: 'k',
			quantity: 'spring-constant',
			unit: 'N/m',
			min: 0,
			minExclusive: true,
			max: 1e12,
			initial: 100,
			log: true
		},
		mass_kg: massInput('Mass of the weight', 'm', 1),
		x_m: {
			kind: 'number',
			label: 'How far it is drawn out',
			symbol: 'x',
			quantity: 'length',
			unit: 'm',
			min: 0,
			max: 1e4,
			initial: 0.1,
			optional: true,
			absent: 'not drawn out, so no energy and no speed'
		}
	},
	outputs: {
		period: { label: 'Time there and back', symbol: 'T', quantity: 'duration', unit: 's' },
		energy: { label: 'Energy in the spring', symbol: 'E', quantity: 'energy', unit: 'J' },
		maxSpeed: { label: 'Speed in the middle', symbol: 'v', quantity: 'speed', unit: 'm/s' }
	},
	equations: [
		{
			tex: 'T = 2\\pi\\sqrt{\\frac mk}',
			says: 'Heavy weights on soft springs are slow; how far they swing does not count.'
		},
		{
			tex: 'E = \\tfrac12 k x^2 = \\tfrac12 m v^2',
			says: 'The energy drawn in comes back as speed.'
		}
	],
	assumptions: [
		'The spring pulls in step with how far it is drawn out, and has no mass.',
		'No friction.'
	],
	warnings: [],
	sources: [openStax(1, '§15.1, simple harmonic motion')],
	checks: checksOf('mech.spring'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ k, mass_kg: m, x_m: x }): Computed {
		const values: Record<string, number> = { period: 2 * Math.PI * Math.sqrt(m / k) };
		const withheld: Record<string, Refusal> = {};
		if (x === undefined) {
			withheld.energy = NEEDS_DRAW;
			withheld.maxSpeed = NEEDS_DRAW;
		} else {
			values.energy = (k * x * x) / 2;
			values.maxSpeed = x * Math.sqrt(k / m);
		}
		return { ok: true, values, uncertainties: 'exact', withheld };
	}
});

const NEEDS_DRAW: Refusal = {
	code: 'needs-draw',
	message: 'Give how far the spring is drawn out to get this.'
};
