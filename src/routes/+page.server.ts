import { routes } from '$lib/routes.ts';
import { redirect } from '@sveltejs/kit';
import type { PageServerLoad } from './$types';

/** The front door: to the desk for those who are in, to the sign-in plate for everyone else. */
export const load: PageServerLoad = ({ locals }) => {
	redirect(303, locals.actor ? routes.desk() : routes.signIn());
};
