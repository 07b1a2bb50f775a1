import { apiFailure } from '$lib/server/http/failures.ts';
import { importWordFile } from '$lib/server/services/word-import.ts';
import type { RequestHandler } from './$types';

async function* nothing(): AsyncGenerator<Uint8Array> {}

/** A .docx file as the body, with any content type (without one there is no body); its copy as blocks comes back. */
export const POST: RequestHandler = async ({ locals, request }) => {
	try {
		return Response.json(await importWordFile(locals.context, request.body ?? nothing()));
	} catch (error) {
		return apiFailure(error);
	}
};
