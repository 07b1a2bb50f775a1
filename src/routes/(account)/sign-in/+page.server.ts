import { redirect, type Cookies } from '@sveltejs/kit';
import { fail, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { SendSignInLink, SignInByPassphrase } from '$lib/forms/sign-in.ts';
import { routes } from '$lib/routes.ts';
import { signInThrough } from '$lib/server/auth/auth-js.ts';
import { cookieNames, setLinkNonce } from '$lib/server/auth/cookies.ts';
import { ownPath } from '$lib/server/auth/own-path.ts';
import { newId } from '$lib/server/db/ids.ts';
import { formFailure } from '$lib/server/http/failures.ts';
import { sendSignInLink, signInByPassphrase } from '$lib/server/services/sign-in.ts';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const { origin } = locals.context.house;
	const next = ownPath(url.searchParams.get('next'), origin, routes.desk());
	if (locals.actor) redirect(303, next);
	return {
		next,
		passphraseForm: await superValidate(zod4(SignInByPassphrase), { id: 'passphrase' }),
		linkForm: await superValidate(zod4(SendSignInLink), { id: 'link' })
	};
};

export const actions: Actions = {
	passphrase: async (event) => {
		const { house, secret } = event.locals.context;
		const form = await superValidate(event.request, zod4(SignInByPassphrase), { id: 'passphrase' });
		if (!form.valid) return fail(400, { form });
		const { email, passphrase } = form.data;
		form.data.passphrase = ''; // never sent back
		try {
			await signInThrough(event, { origin: house.origin, secret }, 'passphrase', () =>
				signInByPassphrase(event.locals.context, { email, passphrase })
			);
		} catch (error) {
			return formFailure(form, error);
		}
		redirect(303, ownPath(event.url.searchParams.get('next'), house.origin, routes.desk()));
	},

	/** Says the same whether or not the address is known. */
	link: async ({ locals, request, cookies }) => {
		const form = await superValidate(request, zod4(SendSignInLink), { id: 'link' });
		if (!form.valid) return fail(400, { form });
		try {
			await sendSignInLink(locals.context, {
				email: form.data.email,
				nonce: keepNonce(cookies, locals)
			});
		} catch (error) {
			return formFailure(form, error);
		}
		return { form, linkSent: true };
	}
};

/** A fresh value in this browser's cookie, which the link will ask for. */
function keepNonce(cookies: Cookies, { context }: App.Locals): string {
	const nonce = newId();
	setLinkNonce(cookies, cookieNames(context.house.origin), nonce);
	return nonce;
}
