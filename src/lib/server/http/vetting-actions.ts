/** The acts on a calculator's card: a second scientist's signature, taking a revision out of use, testing it again. */
import { fail, type RequestEvent } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { ConfirmedRetest, ConfirmedVetting, ConfirmedWithdrawal } from '../../forms/confirm.ts';
import { retestCalculator, vetCalculator, withdrawCalculator } from '../services/vetting-acts.ts';
import { confirmed } from './confirmed.ts';
import { formFailure } from './failures.ts';

type Event = Pick<RequestEvent, 'locals' | 'request'>;

/** For `load`: what `VettingBlock` takes as `forms`. */
export async function vettingForms() {
	return {
		vet: await superValidate(zod4(ConfirmedVetting), { id: 'vet' }),
		withdraw: await superValidate(zod4(ConfirmedWithdrawal), { id: 'withdraw' }),
		retest: await superValidate(zod4(ConfirmedRetest), { id: 'retest' })
	};
}

/** For `actions` of the card's page. */
export const vettingActions = {
	vet: async ({ locals, request }: Event) => {
		const form = await superValidate(request, zod4(ConfirmedVetting), { id: 'vet' });
		if (!form.valid) return fail(400, { form });
		const { passphrase, ...input } = form.data;
		form.data.passphrase = ''; // never sent back
		try {
			await vetCalculator(await confirmed(locals.context, passphrase), input);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	withdraw: async ({ locals, request }: Event) => {
		const form = await superValidate(request, zod4(ConfirmedWithdrawal), { id: 'withdraw' });
		if (!form.valid) return fail(400, { form });
		const { passphrase, ...input } = form.data;
		form.data.passphrase = '';
		try {
			await withdrawCalculator(await confirmed(locals.context, passphrase), input);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	},
	retest: async ({ locals, request }: Event) => {
		const form = await superValidate(request, zod4(ConfirmedRetest), { id: 'retest' });
		if (!form.valid) return fail(400, { form });
		const { passphrase, ...input } = form.data;
		form.data.passphrase = '';
		try {
			await retestCalculator(await confirmed(locals.context, passphrase), input);
			return { form };
		} catch (thrown) {
			return formFailure(form, thrown);
		}
	}
};
