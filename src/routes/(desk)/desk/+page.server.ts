import { CreatePiece } from '$lib/forms/create-piece.ts';
import { routes } from '$lib/routes.ts';
import { formFailure, pageFailure } from '$lib/server/http/failures.ts';
import { outlines } from '$lib/outlines/index.ts';
import { SpikedSlug } from '$lib/forms/spike.ts';
import { listSpiked, recoverPiece, spikePiece } from '$lib/server/services/draft-spike.ts';
import { createPiece } from '$lib/server/services/draft-start.ts';
import { getPiece, lastSigned, listPieces } from '$lib/server/services/pieces.ts';
import { listFlags } from '$lib/server/services/vetting-flags.ts';
import { can } from '$lib/workflow/permissions.ts';
import { fail, redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';
import { inHand } from './in-hand.ts';

export const load: PageServerLoad = async ({ locals: { context } }) => {
	const { actor } = context;
	const pieces = await listPieces(context).catch(pageFailure);
	const mayRead = actor !== null && can(actor, 'read-proof');
	const inWork = mayRead
		? await Promise.all(
				pieces
					.filter(({ working }) => working !== 'at-rest')
					.map(({ slug }) => getPiece(context, slug).catch(pageFailure))
			)
		: [];
	const flags = mayRead ? await listFlags(context).catch(pageFailure) : [];
	return {
		now: context.now.toISOString(),
		pieces,
		hands: actor ? inHand(actor, inWork, flags) : [],
		lastSigned: await lastSigned(context).catch(pageFailure),
		spiked: await listSpiked(context).catch(pageFailure),
		outlines: outlines.map(({ id, field, says, document: { title } }) => ({
			id,
			field,
			says,
			title
		})),
		slip: await superValidate(zod4(CreatePiece), { id: 'slip' })
	};
};

export const actions: Actions = {
	create: async ({ locals, request }) => {
		const form = await superValidate(request, zod4(CreatePiece), { id: 'slip' });
		if (!form.valid) return fail(400, { form });
		let slug: string;
		try {
			({ slug } = await createPiece(locals.context, form.data));
		} catch (thrown) {
			return formFailure(form, thrown);
		}
		redirect(303, routes.manuscript(slug));
	},
	spike: async ({ locals, request }) => {
		const form = await superValidate(request, zod4(SpikedSlug), { id: 'spike' });
		if (!form.valid) return fail(400, { form });
		try {
			await spikePiece(locals.context, form.data.slug);
			return { form, spiked: form.data.slug };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	recover: async ({ locals, request }) => {
		const form = await superValidate(request, zod4(SpikedSlug), { id: 'spike' });
		if (!form.valid) return fail(400, { form });
		try {
			await recoverPiece(locals.context, form.data.slug);
			return { form, recovered: form.data.slug };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	}
};
