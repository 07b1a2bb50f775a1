import { pageFailure } from '$lib/server/http/failures.ts';
import { getPiece } from '$lib/server/services/pieces.ts';
import { listFlags } from '$lib/server/services/vetting-flags.ts';
import { listCalculators } from '$lib/server/services/vettings.ts';
import type { LayoutServerLoad } from './$types';

/** The piece, the calculators it may be worked with and those it rests on in vain, once, for every room it is in. */
export const load: LayoutServerLoad = async ({ locals, params }) => ({
	piece: await getPiece(locals.context, params.slug).catch(pageFailure),
	calculators: await listCalculators(locals.context).catch(pageFailure),
	flags: await listFlags(locals.context, params.slug).catch(pageFailure)
});
