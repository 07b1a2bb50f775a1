import { apiFailure } from '$lib/server/http/failures.ts';
import { exportCopy } from '$lib/server/services/copy-export.ts';
import type { RequestHandler } from './$types';

/** The working draft’s copy as a Markdown file. */
export const GET: RequestHandler = async ({ locals, params }) => {
	try {
		const { fileName, markdown } = await exportCopy(locals.context, params.slug);
		return new Response(markdown, {
			headers: {
				'Content-Type': 'text/markdown; charset=utf-8',
				'Content-Disposition': `attachment; filename="${fileName}"`,
				'Cache-Control': 'no-store'
			}
		});
	} catch (error) {
		return apiFailure(error);
	}
};
