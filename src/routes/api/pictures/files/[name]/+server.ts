import { apiFailure } from '$lib/server/http/failures.ts';
import { readPictureFile } from '$lib/server/services/pictures.ts';
import type { RequestHandler } from './$types';

/** A stored width, for those who are signed in; readers get the release’s own copy, under /press/. */
export const GET: RequestHandler = async ({ locals, params }) => {
	try {
		const { file, bytes } = await readPictureFile(locals.context, params.name);
		return new Response(bytes as Uint8Array<ArrayBuffer>, {
			headers: {
				'content-type': file.type,
				'content-length': String(bytes.length),
				'content-disposition': `inline; filename="${params.name}"`,
				'content-security-policy': "default-src 'none'; frame-ancestors 'none'; sandbox"
			}
		});
	} catch (error) {
		return apiFailure(error);
	}
};
