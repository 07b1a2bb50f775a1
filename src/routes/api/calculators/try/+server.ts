import { apiFailure } from '$lib/server/http/failures.ts';
import { readJson } from '$lib/server/http/json-body.ts';
import { tryHouseCalculator } from '$lib/server/services/house-test.ts';
import type { RequestHandler } from './$types';

/** What stands in the form of a house calculator, tried out: problems, check values and a first run. Keeps nothing. */
export const POST: RequestHandler = async ({ locals, request }) => {
	try {
		const { problems, checks, preview } = tryHouseCalculator(
			locals.context,
			await readJson(request)
		);
		return Response.json({ problems, checks, preview });
	} catch (error) {
		return apiFailure(error);
	}
};
