import { pageFailure } from '$lib/server/http/failures.ts';
import { listCalculators } from '$lib/server/services/vettings.ts';
import type { LayoutServerLoad } from './$types';

/** The house's own calculators beside the software's, as data, and how far each is trusted. */
export const load: LayoutServerLoad = async ({ locals }) => ({
	calculators: await listCalculators(locals.context).catch(pageFailure)
});
