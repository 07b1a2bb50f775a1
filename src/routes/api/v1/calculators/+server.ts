import { describeCalculators } from '$lib/api/calculation.ts';
import { preflight, publicJson } from '$lib/server/http/public-api.ts';
import type { RequestHandler } from './$types';

/** Every calculator with its inputs, outputs, units, ranges, equations, sources and published checks. */
export const GET: RequestHandler = () =>
	publicJson(
		{ calculators: describeCalculators() },
		{ headers: { 'cache-control': 'public, max-age=300' } }
	);

export const OPTIONS: RequestHandler = () => preflight('GET');
