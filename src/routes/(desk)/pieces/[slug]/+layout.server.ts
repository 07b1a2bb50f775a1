import { pageFailure } from '$lib/server/http/failures.ts';
import { getPiece } from '$lib/server/services/pieces.ts';
import { listCalculators } from '$lib/server/services/vettings.ts';
import type { LayoutServerLoad } from './$types';

/** The piece and the calculators it may be worked with, once, for the masthead and for every room it is in. */
export const load: LayoutServerLoad = async ({ locals, params }) => ({
	piece: await getPiece(locals.context, params.slug).catch(pageFailure),
	calculators: await listCalculators(locals.context).catch(pageFailure)
});
