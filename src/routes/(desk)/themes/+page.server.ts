import { SaveTheme } from '$lib/forms/save-theme.ts';
import { routes } from '$lib/routes.ts';
import { formFailure } from '$lib/server/http/failures.ts';
import { saveTheme } from '$lib/server/services/themes.ts';
import { HOUSE_THEME } from '$lib/themes/theme.ts';
import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async () => ({
	form: await superValidate({ id: '', ...HOUSE_THEME }, zod4(SaveTheme), {
		id: 'theme',
		errors: false
	})
});

export const actions: Actions = {
	save: async ({ locals, request }) => {
		const form = await superValidate(request, zod4(SaveTheme), { id: 'theme' });
		if (!form.valid) return fail(400, { form });
		let id: string;
		try {
			id = await saveTheme(locals.context, { ...form.data, id: '' });
		} catch (thrown) {
			return formFailure(form, thrown);
		}
		redirect(303, routes.theme(id));
	}
};
