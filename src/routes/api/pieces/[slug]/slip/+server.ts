import { SaveSlip } from '$lib/forms/slip.ts';
import { apiFailure } from '$lib/server/http/failures.ts';
import { readJson, shaped } from '$lib/server/http/json-body.ts';
import { saveSlip } from '$lib/server/services/slips.ts';
import type { RequestHandler } from './$types';

/** A change of the slip: `{ was, fields }` in, the slip out. */
export const PUT: RequestHandler = async ({ locals, params, request }) => {
	try {
		const input = shaped(SaveSlip, await readJson(request));
		return Response.json(await saveSlip(locals.context, params.slug, input));
	} catch (error) {
		return apiFailure(error);
	}
};
