import { frameSnippet } from '$lib/embed-snippet.ts';
import { pageFailure } from '$lib/server/http/failures.ts';
import { readColophon } from '$lib/server/services/colophon.ts';
import type { PageServerLoad } from './$types';

/** What was frozen with the live release, and the way to embed it; a reader's page carries no calculator. */
export const load: PageServerLoad = async ({ locals: { context }, params }) => {
	const { account, releases, slug } = await readColophon(context, params.slug).catch(pageFailure);
	const { origin, name } = context.house;
	return {
		house: name,
		slug,
		...account,
		releases,
		snippet: frameSnippet({ origin, slug, title: account.title, height: account.height })
	};
};
