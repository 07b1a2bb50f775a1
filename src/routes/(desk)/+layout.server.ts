import { routes } from '$lib/routes.ts';
import { redirect } from '@sveltejs/kit';
import type { LayoutServerLoad } from './$types';

/** Who is here. The guard is in the hooks and in every service; this only spares a stranger an empty room. */
export const load: LayoutServerLoad = ({ locals }) => {
	const { actor, house } = locals.context;
	if (!actor) redirect(303, routes.signIn());
	return { person: actor, house: house.name };
};
