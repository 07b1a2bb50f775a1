import { edition, EDITION_IN_USE } from '$lib/physics/constants/index.ts';
import { requirePermission } from '$lib/workflow/permissions.ts';
import { error } from '@sveltejs/kit';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = ({ params, locals }) => {
	requirePermission(locals.context.actor, 'read-calculators');
	const found = edition(params.edition);
	if (!found) {
		error(404, {
			message: 'There is no such edition of the constants.',
			help: 'Those there are stand at the foot of the shelf.',
			code: 'not-found'
		});
	}
	return { edition: found, inUse: found.name === EDITION_IN_USE };
};
