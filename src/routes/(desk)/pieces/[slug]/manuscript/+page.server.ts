import { routes } from '$lib/routes.ts';
import { formFailure } from '$lib/server/http/failures.ts';
import { pullProof } from '$lib/server/services/proofs.ts';
import { redirect } from '@sveltejs/kit';
import type { Actions } from './$types';

export const actions: Actions = {
	pullProof: async ({ locals, params }) => {
		try {
			await pullProof(locals.context, params.slug);
		} catch (thrown) {
			return formFailure({}, thrown);
		}
		redirect(303, routes.check(params.slug));
	}
};
