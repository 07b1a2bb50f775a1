import { apiFailure } from '$lib/server/http/failures.ts';
import { readJson } from '$lib/server/http/json-body.ts';
import { tryFormula } from '$lib/server/services/formula-steps.ts';
import type { RequestHandler } from './$types';

/** A formula of a piece, read as it stands in the form: its tree or what is wrong with it, and what it gives. Keeps nothing. */
export const POST: RequestHandler = async ({ locals, request }) => {
	try {
		return Response.json(tryFormula(locals.context, await readJson(request)));
	} catch (error) {
		return apiFailure(error);
	}
};
