import { NameDraft } from '$lib/forms/earlier-drafts.ts';
import { apiFailure } from '$lib/server/http/failures.ts';
import { readJson, shaped } from '$lib/server/http/json-body.ts';
import { nameDraft } from '$lib/server/services/history.ts';
import type { RequestHandler } from './$types';

/** Names a draft: `{ version, name }` in; '' takes the name away. */
export const PUT: RequestHandler = async ({ locals, params, request }) => {
	try {
		await nameDraft(locals.context, params.slug, shaped(NameDraft, await readJson(request)));
		return new Response(null, { status: 204 });
	} catch (error) {
		return apiFailure(error);
	}
};
