/** From uncertain quantities to uncertain readings: the straight line where it serves, seeded draws where it doesn't. */
import type { DrawnSpread } from '../calculator.ts';
import { propagateLinearly, type LinearReading, type Model } from './linear.ts';
import { propagateByDraws, REACHES_LIMIT } from './monte-carlo.ts';
import { correlationMatrix, triangleOf, type Spread } from './spread.ts';

export type { Model } from './linear.ts';

export type Propagated =
	| { ok: true; u: number; changes: readonly number[]; drawn?: DrawnSpread }
	| { ok: false; reason: string };

/**
 * One entry for each reading of the model. `own` is what each reading has on top, independent of the quantities.
 * The model is called twice for each quantity, once more, and `draws` times when a straight line is doubtful for any
 * reading; with 0 draws such a reading is not available.
 */
export function propagate(
	model: Model,
	spread: Spread,
	own: readonly number[],
	draws: number
): Propagated[] {
	if (triangleOf(correlationMatrix(spread)) === null) {
		return own.map(() => ({ ok: false, reason: 'These correlations can’t all hold at once.' }));
	}
	const linear = propagateLinearly(model, spread, own);
	const drawn =
		draws > 0 && linear.some(({ doubtful, u }) => doubtful && !Number.isNaN(u))
			? propagateByDraws(model, spread, own, draws)
			: null;
	return linear.map((reading, output) => {
		if (Number.isNaN(reading.u)) return { ok: false, reason: REACHES_LIMIT };
		if (!reading.doubtful) return straight(reading);
		const one = drawn?.[output];
		if (!one) return { ok: false, reason: 'The reading bends too much for a straight line here.' };
		if (!one.ok) return one;
		const { u, median, low, high } = one;
		return { ok: true, u, changes: reading.changes, drawn: { median, low, high, draws } };
	});
}

function straight({ u, changes }: LinearReading): Propagated {
	return { ok: true, u, changes };
}
