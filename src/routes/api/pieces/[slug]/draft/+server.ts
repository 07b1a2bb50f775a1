import { SaveDraft } from '$lib/forms/save-draft.ts';
import { apiFailure } from '$lib/server/http/failures.ts';
import { readJson, shaped } from '$lib/server/http/json-body.ts';
import { saveDraft } from '$lib/server/services/pieces.ts';
import type { RequestHandler } from './$types';

/** Autosave: `{ baseVersion, document }` in, `{ version, savedAt }` out. */
export const PUT: RequestHandler = async ({ locals, params, request }) => {
	try {
		const input = shaped(SaveDraft, await readJson(request));
		return Response.json(await saveDraft(locals.context, params.slug, input));
	} catch (error) {
		return apiFailure(error);
	}
};
