import { catalogue } from '$lib/physics/calculators/index.ts';
import { edition, EDITION_IN_USE, editions } from '$lib/physics/constants/index.ts';
import { movedConstants } from '$lib/physics/constants/moved.ts';
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
	return {
		edition: found,
		inUse: found.name === EDITION_IN_USE,
		others: Object.values(editions)
			.filter(({ name }) => name !== found.name)
			.map((other) => ({ name: other.name, moved: movedConstants(found, other) })),
		following: [...catalogue.values()]
			.filter(({ followsEdition }) => followsEdition)
			.map(({ id, title }) => ({ id, title }))
	};
};
