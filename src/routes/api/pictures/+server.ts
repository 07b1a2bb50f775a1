import { apiFailure } from '$lib/server/http/failures.ts';
import { addPicture, listPictures } from '$lib/server/services/pictures.ts';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = async ({ locals }) => {
	try {
		return Response.json({ pictures: await listPictures(locals.context) });
	} catch (error) {
		return apiFailure(error);
	}
};

async function* nothing(): AsyncGenerator<Uint8Array> {}

/** The file itself as the body, its name as `?name=`; the picture as it is kept comes back. */
export const POST: RequestHandler = async ({ locals, request, url }) => {
	try {
		const picture = await addPicture(locals.context, {
			body: request.body ?? nothing(),
			fileName: url.searchParams.get('name') ?? '',
			declaredType: request.headers.get('content-type') ?? ''
		});
		return Response.json({ picture }, { status: 201 });
	} catch (error) {
		return apiFailure(error);
	}
};
