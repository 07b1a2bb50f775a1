import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import { gum, OWN_UNIT } from './sources.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Standard uncertainty of a weighted sum Σaᵢxᵢ whose parts may depend on one another: u² = Σ aᵢaⱼuᵢuⱼrᵢⱼ. Refuses what is
 * no table of correlations.
 */
export const linear = defineCalculator({
	id: 'unc.linear',
	revision: '1.0.0',
	title: 'Uncertainty of a sum',
	purpose:
		'How well is a sum or difference known, when its parts are known so well and hang together so much?',
	asks: ['How do uncertainties add?', 'What do correlations do to a difference?'],
	notFor: ['Products and powers.'],
	inputs: {
		coeff: {
			kind: 'list',
			label: 'What each part is multiplied by',
			symbol: 'a',
			shape: 'row',
			min: -1e100,
			max: 1e100,
			longest: 20,
			initial: '1, -1'
		},
		u: {
			kind: 'list',
			label: 'Standard uncertainty of each part',
			symbol: 'u',
			shape: 'row',
			min: 0,
			max: 1e100,
			longest: 20,
			initial: '0.3, 0.4'
		},
		corr: {
			kind: 'list',
			label: 'Correlations, row by row',
			symbol: 'r',
			shape: 'rows',
			min: -1,
			max: 1,
			longest: 20,
			initial: '1, 0.5; 0.5, 1',
			optional: true,
			absent: 'no correlation'
		}
	},
	outputs: { u: { label: 'Standard uncertainty', symbol: 'u', quantity: 'number', unit: '' } },
	equations: [
		{
			tex: 'u^2 = \\sum_i\\sum_j a_i a_j\\,u_i u_j\\,r_{ij}',
			says: 'Independent parts add as squares; parts that move together add more, or cancel in a difference.'
		}
	],
	assumptions: ['Without correlations given, the parts are independent.', OWN_UNIT],
	warnings: [],
	sources: [gum('5.2.2, equation (16)')],
	checks: checksOf('unc.linear'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute(inputs): Computed {
		const coeff = inputs.coeff as number[];
		const own = inputs.u as number[];
		const corr = inputs.corr as number[][] | undefined;
		if (own.length !== coeff.length) {
			return refuse(
				'lengths-differ',
				`There are ${coeff.length} parts and ${own.length} uncertainties. Give as many of one as of the other.`,
				'u'
			);
		}
		const flaw = corr && flawOf(corr, coeff.length);
		if (flaw) return refuse('no-correlations', flaw, 'corr');
		const pulls = coeff.map((a, i) => a * (own[i] ?? NaN));
		// In units of the largest pull, so that squares neither vanish nor run over.
		const largest = Math.max(...pulls.map(Math.abs));
		let square = 0;
		for (const [i, p] of pulls.entries()) {
			for (const [j, q] of pulls.entries()) {
				const r = corr ? (corr[i]?.[j] ?? NaN) : i === j ? 1 : 0;
				if (largest > 0) square += (p / largest) * (q / largest) * r;
			}
		}
		const values = { u: largest * Math.sqrt(Math.max(0, square)) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});

/** What is wrong with a table of correlations, in a sentence. */
function flawOf(corr: readonly number[][], size: number): string | undefined {
	if (corr.length !== size || corr.some((row) => row.length !== size)) {
		return `Correlations of ${size} parts are ${size} rows of ${size} numbers.`;
	}
	for (const [i, row] of corr.entries()) {
		if (row[i] !== 1) return 'Each part is wholly correlated with itself: set the diagonal to 1.';
		if (row.some((value, j) => value !== corr[j]?.[i])) {
			return 'Correlations are the same both ways: make the table symmetric.';
		}
	}
	return isPossible(corr)
		? undefined
		: 'No three things can hang together like this: make the correlations weaker.';
}

/** Whether no weighted sum would have a negative variance (Cholesky's decomposition exists, to rounding). */
function isPossible(corr: readonly number[][]): boolean {
	const lower: number[][] = [];
	for (const [i, row] of corr.entries()) {
		const made: number[] = [];
		for (let j = 0; j <= i; j += 1) {
			const other = j === i ? made : (lower[j] ?? []);
			let rest = row[j] ?? NaN;
			for (let k = 0; k < j; k += 1) rest -= (made[k] ?? 0) * (other[k] ?? 0);
			if (j === i) {
				if (rest < -1e-9) return false;
				made.push(Math.sqrt(Math.max(0, rest)));
			} else {
				const pivot = other[j] ?? 0;
				if (pivot < 1e-7) {
					if (Math.abs(rest) > 1e-6) return false;
					made.push(0);
				} else made.push(rest / pivot);
			}
		}
		lower.push(made);
	}
	return true;
}
