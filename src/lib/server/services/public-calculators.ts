/** The calculators that a house offers to anyone: those that are vetted, the software's and its own. */
import { mayPublish, type VettingState } from '../../workflow/vetting.ts';
import type { OfferedCalculators } from '../../api/calculation.ts';
import type { Context } from '../context.ts';
import { readStock } from './stock.ts';

/** Needs no session: only what may be published leaves the house, and of the rest no more than why it doesn't. */
export async function offeredCalculators({ db }: Pick<Context, 'db'>): Promise<OfferedCalculators> {
	const { calculators, stateOf } = await readStock(db);
	const all = [...calculators.values()];
	return {
		calculators: new Map(
			all
				.filter((calculator) => mayPublish(stateOf(calculator)))
				.map((calculator) => [calculator.id, calculator])
		),
		withheld(id) {
			const calculator = calculators.get(id);
			const state = calculator && stateOf(calculator);
			return state && !mayPublish(state) ? WITHHELD[state](id) : null;
		}
	};
}

const notVetted = (id: string) => ({
	code: 'calculator-not-vetted',
	message: `“${id}” isn't vetted yet: a second scientist of this house hasn't signed it, so it is run for nobody outside. Ask again later.`
});

const WITHHELD: Record<VettingState, (id: string) => { code: string; message: string }> = {
	proposed: notVetted,
	tested: notVetted,
	vetted: notVetted,
	superseded: (id) => ({
		code: 'calculator-superseded',
		message: `“${id}” is between revisions: the newest was withdrawn, and the one before it is superseded. Ask again when a new one is vetted.`
	}),
	withdrawn: (id) => ({
		code: 'calculator-withdrawn',
		message: `“${id}” was withdrawn by a scientist of this house, so it is run for nobody. Use another calculator; the house lists those it stands behind.`
	})
};
