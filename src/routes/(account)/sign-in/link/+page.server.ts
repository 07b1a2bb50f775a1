import { redirect } from '@sveltejs/kit';
import { fail, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { SignInByLink } from '$lib/forms/sign-in.ts';
import { routes } from '$lib/routes.ts';
import { signInThrough } from '$lib/server/auth/auth-js.ts';
import { cookieNames, dropCookie } from '$lib/server/auth/cookies.ts';
import { formFailure } from '$lib/server/http/failures.ts';
import { signInByLink } from '$lib/server/services/sign-in.ts';
import type { Actions, PageServerLoad } from './$types';

/**
 * Opening the page does nothing: mail scanners open links too. The button consumes. The address goes to no other host;
 * with `no-referrer` a browser would send the form without its origin, and be refused.
 */
export const load: PageServerLoad = async ({ url, setHeaders }) => {
	setHeaders({ 'cache-control': 'no-store', 'referrer-policy': 'same-origin' });
	return {
		form: await superValidate({ token: url.searchParams.get('token') ?? '' }, zod4(SignInByLink), {
			errors: false
		})
	};
};

export const actions: Actions = {
	default: async (event) => {
		const { house, secret } = event.locals.context;
		const form = await superValidate(event.request, zod4(SignInByLink));
		if (!form.valid) return fail(400, { form });
		const names = cookieNames(house.origin);
		const nonce = event.cookies.get(names.linkNonce) ?? '';
		try {
			await signInThrough(event, { origin: house.origin, secret }, 'link', () =>
				signInByLink(event.locals.context, { token: form.data.token, nonce })
			);
		} catch (error) {
			return formFailure(form, error);
		}
		dropCookie(event.cookies, names, names.linkNonce);
		redirect(303, routes.desk());
	}
};
