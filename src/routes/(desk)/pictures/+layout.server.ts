import { pageFailure } from '$lib/server/http/failures.ts';
import { listPictures } from '$lib/server/services/pictures.ts';
import type { LayoutServerLoad } from './$types';

export const load: LayoutServerLoad = async ({ locals, depends }) => {
	depends('steelyard:pictures');
	return {
		pictures: await listPictures(locals.context).catch(pageFailure),
		/** The day by which rights are judged, as 2026-12-08. */
		today: locals.context.now.toISOString().slice(0, 10)
	};
};
