import { catalogue } from '$lib/physics/calculators/index.ts';
import { typeset } from '$lib/server/typeset.ts';
import { error } from '@sveltejs/kit';
import type { PageServerLoad } from './$types';
import { checkRows } from './check-rows.ts';

/** Equations are set here, once, so that no page carries the typesetter; check values are worked anew each time. */
export const load: PageServerLoad = ({ params }) => {
	const calculator = catalogue.get(params.id);
	if (!calculator) {
		error(404, {
			message: 'There is no such calculator.',
			help: 'Take one from the shelf.',
			code: 'not-found'
		});
	}
	return {
		id: calculator.id,
		equations: calculator.equations.map(typeset),
		checks: checkRows(calculator)
	};
};
