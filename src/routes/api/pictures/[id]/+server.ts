import { SavePicture } from '$lib/pictures/save-picture.ts';
import { apiFailure } from '$lib/server/http/failures.ts';
import { readJson, shaped } from '$lib/server/http/json-body.ts';
import { deletePicture, getPicture, savePictureRecord } from '$lib/server/services/pictures.ts';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = async ({ locals, params }) => {
	try {
		return Response.json({ picture: await getPicture(locals.context, params.id) });
	} catch (error) {
		return apiFailure(error);
	}
};

/** `{ baseVersion, record }` in, the picture out. */
export const PUT: RequestHandler = async ({ locals, params, request }) => {
	try {
		const input = shaped(SavePicture, await readJson(request));
		return Response.json({ picture: await savePictureRecord(locals.context, params.id, input) });
	} catch (error) {
		return apiFailure(error);
	}
};

export const DELETE: RequestHandler = async ({ locals, params }) => {
	try {
		await deletePicture(locals.context, params.id);
		return new Response(null, { status: 204 });
	} catch (error) {
		return apiFailure(error);
	}
};
