import { describeCalculators } from '$lib/api/calculation.ts';
import { preflight, publicJson } from '$lib/server/http/public-api.ts';
import { offeredCalculators } from '$lib/server/services/public-calculators.ts';
import type { RequestHandler } from './$types';

/** Every vetted calculator of the house with its inputs, outputs, units, ranges, equations, sources and checks. */
export const GET: RequestHandler = async ({ locals: { context } }) => {
	const { calculators } = await offeredCalculators(context);
	return publicJson(
		{ calculators: describeCalculators(calculators) },
		// One that is withdrawn is gone from here within the minute.
		{ headers: { 'cache-control': 'public, max-age=60' } }
	);
};

export const OPTIONS: RequestHandler = () => preflight('GET');
