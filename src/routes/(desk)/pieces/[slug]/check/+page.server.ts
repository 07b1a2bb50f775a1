import { AnswerQuery, CloseQuery, RaiseQuery, TakeBackSignature } from '$lib/forms/check.ts';
import { ConfirmedFormula, ConfirmedSignature } from '$lib/forms/confirm.ts';
import { TakeBackFormula } from '$lib/forms/vet-formula.ts';
import { confirmed } from '$lib/server/http/confirmed.ts';
import { formFailure } from '$lib/server/http/failures.ts';
import { signClaim, takeBackSignature } from '$lib/server/services/claims.ts';
import { takeBackFormula, vetFormula } from '$lib/server/services/formula-vettings.ts';
import { answerQuery, closeQuery, raiseQuery } from '$lib/server/services/queries.ts';
import { typeset } from '$lib/server/typeset.ts';
import { formulaCalculator } from '$lib/widget/bench-set.ts';
import { fail } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

/** Equations are set here, so that no page carries the typesetter. */
export const load: PageServerLoad = async ({ parent }) => ({
	equations: Object.fromEntries(
		((await parent()).piece.proof?.document.formulas ?? []).flatMap((formula) =>
			formulaCalculator(formula).equations.map((equation) => [formula.id, typeset(equation)])
		)
	),
	vetFormula: await superValidate(zod4(ConfirmedFormula), { id: 'vet-formula' }),
	takeBackFormula: await superValidate(zod4(TakeBackFormula), { id: 'take-back-formula' }),
	sign: await superValidate(zod4(ConfirmedSignature), { id: 'sign' }),
	takeBack: await superValidate(zod4(TakeBackSignature), { id: 'take-back' }),
	query: await superValidate(zod4(RaiseQuery), { id: 'query' }),
	answer: await superValidate(zod4(AnswerQuery), { id: 'answer' }),
	close: await superValidate(zod4(CloseQuery), { id: 'close' })
});

export const actions: Actions = {
	sign: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(ConfirmedSignature), { id: 'sign' });
		if (!form.valid) return fail(400, { form });
		const { passphrase, ...input } = form.data;
		form.data.passphrase = ''; // never sent back
		try {
			const context = await confirmed(locals.context, passphrase);
			const { signatureId } = await signClaim(context, params.slug, input);
			return { form, signed: { claim: input.claim, signatureId } };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	takeBack: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(TakeBackSignature), { id: 'take-back' });
		if (!form.valid) return fail(400, { form });
		try {
			await takeBackSignature(locals.context, params.slug, form.data);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	vetFormula: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(ConfirmedFormula), { id: 'vet-formula' });
		if (!form.valid) return fail(400, { form });
		const { passphrase, ...input } = form.data;
		form.data.passphrase = ''; // never sent back
		try {
			await vetFormula(await confirmed(locals.context, passphrase), params.slug, input);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	takeBackFormula: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(TakeBackFormula), { id: 'take-back-formula' });
		if (!form.valid) return fail(400, { form });
		try {
			await takeBackFormula(locals.context, params.slug, form.data);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	query: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(RaiseQuery), { id: 'query' });
		if (!form.valid) return fail(400, { form });
		try {
			await raiseQuery(locals.context, params.slug, form.data);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	answer: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(AnswerQuery), { id: 'answer' });
		if (!form.valid) return fail(400, { form });
		try {
			await answerQuery(locals.context, params.slug, form.data);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	close: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(CloseQuery), { id: 'close' });
		if (!form.valid) return fail(400, { form });
		try {
			await closeQuery(locals.context, params.slug, form.data);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	}
};
