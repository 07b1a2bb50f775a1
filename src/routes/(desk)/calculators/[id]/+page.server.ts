import { EDITION_IN_USE } from '$lib/physics/constants/index.ts';
import { buildHouseCalculator } from '$lib/physics/house/build.ts';
import { pageFailure } from '$lib/server/http/failures.ts';
import { vettingActions, vettingForms } from '$lib/server/http/vetting-actions.ts';
import { listUses } from '$lib/server/services/calculator-uses.ts';
import { calculatorsOf } from '$lib/server/services/stock.ts';
import { readRevision, readVettings } from '$lib/server/services/vettings.ts';
import { typeset } from '$lib/server/typeset.ts';
import { error } from '@sveltejs/kit';
import type { Actions, PageServerLoad } from './$types';

/**
 * Equations are set here, once, so that no page carries the typesetter. The card is of the revision that runs, unless
 * the address names another one of the house's.
 */
export const load: PageServerLoad = async ({ params, locals, url }) => {
	const running = (await calculatorsOf(locals.context)).get(params.id);
	const asked = url.searchParams.get('revision');
	const definition =
		asked !== null && asked !== running?.revision
			? await readRevision(locals.context, params.id, asked).catch(pageFailure)
			: null;
	const calculator = definition ? buildHouseCalculator(definition) : running;
	if (!calculator) {
		error(404, {
			message: 'There is no such calculator.',
			help: 'Take one from the shelf.',
			code: 'not-found'
		});
	}
	return {
		id: calculator.id,
		/** The revision that was asked for, where it isn't the one that runs. */
		definition,
		equations: calculator.equations.map(typeset),
		uses: await listUses(locals.context, calculator.id),
		vettings: await readVettings(locals.context, calculator.id),
		forms: await vettingForms(),
		constants: EDITION_IN_USE
	};
};

export const actions: Actions = vettingActions;
