import { embedSnippet } from '$lib/embed-snippet.ts';
import { ConfirmedPass, ConfirmedRelease } from '$lib/forms/confirm.ts';
import { confirmed } from '$lib/server/http/confirmed.ts';
import { formFailure, pageFailure } from '$lib/server/http/failures.ts';
import { passConditions, passProof } from '$lib/server/services/proofs.ts';
import { releaseProof } from '$lib/server/services/releases.ts';
import { fail } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals: { context }, params, parent }) => {
	const { piece } = await parent();
	const { origin } = context.house;
	const document = piece.proof?.document ?? piece.document;
	return {
		conditions: await passConditions(context, params.slug).catch(pageFailure),
		origin,
		snippet: embedSnippet({ origin, slug: piece.slug, document }),
		pass: await superValidate(zod4(ConfirmedPass), { id: 'pass' }),
		release: await superValidate(zod4(ConfirmedRelease), { id: 'release' })
	};
};

export const actions: Actions = {
	pass: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(ConfirmedPass), { id: 'pass' });
		if (!form.valid) return fail(400, { form });
		const { passphrase, ...input } = form.data;
		form.data.passphrase = ''; // never sent back
		try {
			await passProof(await confirmed(locals.context, passphrase), params.slug, input);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	release: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(ConfirmedRelease), { id: 'release' });
		if (!form.valid) return fail(400, { form });
		const { passphrase, ...input } = form.data;
		form.data.passphrase = '';
		try {
			await releaseProof(await confirmed(locals.context, passphrase), params.slug, input);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	}
};
