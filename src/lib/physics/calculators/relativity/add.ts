import { defineCalculator, type Computed, type NumberInput } from '../../calculator.ts';
import { EINSTEIN_1905 } from '../sources.ts';
import { checksOf } from '../published-checks.ts';

function share(label: string, symbol: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'speed-share',
		unit: '',
		min: -1,
		minExclusive: true,
		max: 1,
		maxExclusive: true,
		initial
	};
}

/** Two speeds along one line, each as a share of that of light in (−1, 1), one on top of the other: (a+b)/(1+ab). */
export const addSpeeds = defineCalculator({
	id: 'sr.add',
	revision: '1.0.0',
	title: 'One speed on top of another',
	purpose: 'A body moves inside something that moves: how fast is it for us?',
	asks: [
		'What do two speeds near that of light add up to?',
		'How fast do two approaching ships see each other?'
	],
	notFor: ['Speeds along different lines.', 'Galaxies carried by expansion.'],
	inputs: {
		beta1: share('First speed, as a share of that of light', 'β_1', 0.5),
		beta2: share('Second speed, as seen from the first', 'β_2', 0.5)
	},
	outputs: {
		beta: {
			label: 'Speed together, as a share of that of light',
			symbol: 'β',
			quantity: 'speed-share',
			unit: ''
		}
	},
	equations: [
		{
			tex: '\\beta = \\frac{\\beta_1+\\beta_2}{1+\\beta_1\\beta_2}',
			says: 'However they are put together, speeds below that of light stay below it.'
		}
	],
	assumptions: ['Both speeds lie along one line.', 'Flat space: no gravity.'],
	warnings: [],
	sources: [EINSTEIN_1905],
	checks: checksOf('sr.add'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ beta1, beta2 }): Computed {
		const product = beta1 * beta2;
		// Near ±1 and opposite, 1 + β₁β₂ is all difference; taken apart, each part is exact.
		const under =
			product < 0 ? 1 - Math.abs(beta1) + Math.abs(beta1) * (1 - Math.abs(beta2)) : 1 + product;
		const values = { beta: (beta1 + beta2) / under };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
