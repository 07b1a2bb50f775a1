import { defineCalculator, type Computed } from '../../calculator.ts';
import { beyondTables, COLLISION_RATES, collisionRate, type CollisionPair } from './collisions.ts';
import { kelvin } from './signal.ts';
import { checksOf } from '../published-checks.ts';

/** Rate coefficient in cm³/s at which one sort of collision flips hydrogen's spin, from 1 K to 10⁴ or 2 × 10⁴ K. */
export const kappa = defineCalculator({
	id: 'g21.kappa',
	revision: '1.0.0',
	title: '21 cm line: collision rates',
	purpose: 'How often does a collision flip the spin of hydrogen, at a given temperature?',
	asks: ['What are the collision rates of the 21 centimetre line?'],
	notFor: ['Collisions that change anything but the spin.'],
	inputs: {
		pair: {
			kind: 'choice',
			label: 'What collides with hydrogen',
			options: [
				{ value: 'HH', label: 'hydrogen' },
				{ value: 'eH', label: 'electrons' },
				{ value: 'pH', label: 'protons' }
			],
			initial: 'HH'
		},
		T_K: kelvin('Temperature of the gas', 'T_k', 'gas-temperature', 100)
	},
	outputs: {
		kappa: { label: 'Rate coefficient', symbol: 'κ', quantity: 'rate-coefficient', unit: 'cm3/s' }
	},
	equations: [
		{
			tex: '\\ln\\kappa = S(\\ln T_k)',
			says: 'A smooth curve (a natural cubic spline) through the logarithms of published tables.'
		}
	],
	assumptions: [
		'The tables are as published; between their points the curve is ours.',
		'Beyond a table its end value is held.'
	],
	warnings: [
		{
			code: 'beyond-table',
			message: 'The published table ends before this temperature; its last value is held.',
			when: 'below 1 K, or above 10 000 K (hydrogen) or 20 000 K (electrons, protons)',
			validity: 'outside'
		}
	],
	sources: Object.values(COLLISION_RATES).map(({ source }) => ({ title: source })),
	checks: checksOf('g21.kappa'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ pair, T_K }): Computed {
		return {
			ok: true,
			values: { kappa: collisionRate(pair as CollisionPair, T_K) },
			warnings: beyondTables(T_K, [pair as CollisionPair]) ? ['beyond-table'] : []
		};
	}
});
