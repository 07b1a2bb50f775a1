import { SteelyardError } from '$lib/errors.ts';
import { SaveTheme } from '$lib/forms/save-theme.ts';
import { routes } from '$lib/routes.ts';
import { formFailure, pageFailure } from '$lib/server/http/failures.ts';
import { listPieces } from '$lib/server/services/pieces.ts';
import { deleteTheme, listThemes, saveTheme } from '$lib/server/services/themes.ts';
import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals: { context }, params }) => {
	const themes = await listThemes(context).catch(pageFailure);
	const theme = themes.find(({ id }) => id === params.id);
	if (!theme) return pageFailure(new SteelyardError('not-found'));
	const pieces = await listPieces(context).catch(pageFailure);
	return {
		theme,
		/** A published piece to look at in this theme. */
		live: pieces.find(({ liveRelease }) => liveRelease !== null)?.slug ?? null,
		form: await superValidate(theme, zod4(SaveTheme), { id: 'theme', errors: false })
	};
};

export const actions: Actions = {
	save: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(SaveTheme), { id: 'theme' });
		if (!form.valid) return fail(400, { form });
		try {
			await saveTheme(locals.context, { ...form.data, id: params.id });
		} catch (thrown) {
			return formFailure(form, thrown);
		}
		return { form };
	},
	delete: async ({ locals, params }) => {
		await deleteTheme(locals.context, params.id).catch(pageFailure);
		redirect(303, routes.themes());
	}
};
