import { BLOCK_WORDS } from '$lib/builder/schema.ts';
import { SteelyardError } from '$lib/errors.ts';
import { NameDraft, RestoreDraft } from '$lib/forms/earlier-drafts.ts';
import { routes } from '$lib/routes.ts';
import type { Context } from '$lib/server/context.ts';
import { formFailure, pageFailure } from '$lib/server/http/failures.ts';
import { listDrafts, nameDraft, openDraft, restoreDraft } from '$lib/server/services/history.ts';
import { calculatorsOf } from '$lib/server/services/stock.ts';
import { compareDocuments } from '$lib/widget/compare.ts';
import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

/** `?open=12` reads one draft, `?from=9&to=12` lays two side by side, `?instead=14` says what was brought back over. */
export const load: PageServerLoad = async ({ locals: { context }, params: { slug }, url }) => {
	const asked = (name: string) => Number(url.searchParams.get(name)) || null;
	const [open, from, to] = [asked('open'), asked('from'), asked('to')];
	return {
		drafts: await listDrafts(context, slug).catch(pageFailure),
		opened: open === null ? null : await read(context, slug, open),
		compared: from === null || to === null ? null : await compare(context, slug, from, to),
		// Here, so that the page doesn't carry the editor for the sake of a few words.
		blockWords: BLOCK_WORDS,
		instead: asked('instead'),
		nameForm: await superValidate(zod4(NameDraft), { id: 'name', errors: false }),
		restoreForm: await superValidate(zod4(RestoreDraft), { id: 'restore', errors: false })
	};
};

/** One draft; `null` as its document where nothing can read it any more. */
async function read(context: Context, slug: string, version: number) {
	try {
		return await openDraft(context, slug, version);
	} catch (thrown) {
		if (thrown instanceof SteelyardError && thrown.code === 'document-broken')
			return { draft: { version }, document: null };
		return pageFailure(thrown);
	}
}

async function compare(context: Context, slug: string, from: number, to: number) {
	const [before, after] = [await read(context, slug, from), await read(context, slug, to)];
	return {
		from,
		to,
		comparison:
			before.document && after.document
				? compareDocuments(before.document, after.document, await calculatorsOf(context))
				: null
	};
}

export const actions: Actions = {
	name: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(NameDraft), { id: 'name' });
		if (!form.valid) return fail(400, { form });
		try {
			await nameDraft(locals.context, params.slug, form.data);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	restore: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(RestoreDraft), { id: 'restore' });
		if (!form.valid) return fail(400, { form });
		let version: number;
		try {
			({ version } = await restoreDraft(locals.context, params.slug, form.data));
		} catch (thrown) {
			return formFailure(form, thrown);
		}
		const back = `open=${version}&instead=${form.data.baseVersion}`;
		redirect(303, `${routes.earlierDrafts(params.slug)}?${back}#draft`);
	}
};
