import { pageFailure } from '$lib/server/http/failures.ts';
import { getPicture } from '$lib/server/services/pictures.ts';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params, depends }) => {
	depends('steelyard:pictures');
	return { picture: await getPicture(locals.context, params.id).catch(pageFailure) };
};
