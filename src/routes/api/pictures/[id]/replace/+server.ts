import { ReplacePicture } from '$lib/pictures/save-picture.ts';
import { apiFailure } from '$lib/server/http/failures.ts';
import { readJson, shaped } from '$lib/server/http/json-body.ts';
import { replacePicture } from '$lib/server/services/pictures-replace.ts';
import type { RequestHandler } from './$types';

/** `{ by }`, the id of the picture that takes the place, in; `{ drafts }`, the slugs that were changed, out. */
export const POST: RequestHandler = async ({ locals, params, request }) => {
	try {
		const { by } = shaped(ReplacePicture, await readJson(request));
		return Response.json(await replacePicture(locals.context, params.id, by));
	} catch (error) {
		return apiFailure(error);
	}
};
