import { pageFailure } from '$lib/server/http/failures.ts';
import { getPiece } from '$lib/server/services/pieces.ts';
import type { LayoutServerLoad } from './$types';

/** The piece, once, for the masthead and for every room it is in. */
export const load: LayoutServerLoad = async ({ locals, params }) => ({
	piece: await getPiece(locals.context, params.slug).catch(pageFailure)
});
