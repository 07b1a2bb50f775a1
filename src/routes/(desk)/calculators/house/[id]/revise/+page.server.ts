import { SteelyardError } from '$lib/errors.ts';
import { cardOf, ReviseHouseCalculator } from '$lib/forms/house-calculator.ts';
import { routes } from '$lib/routes.ts';
import { formFailure, pageFailure } from '$lib/server/http/failures.ts';
import {
	readHouseCalculator,
	reviseHouseCalculator
} from '$lib/server/services/house-calculators.ts';
import { fieldProblems } from '$lib/server/services/house-test.ts';
import { redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const definition = await readHouseCalculator(locals.context, params.id).catch(pageFailure);
	const { title, revision } = definition;
	const card = { ...cardOf(definition), base: revision, change: 'patch' as const, note: '' };
	return {
		title,
		revision,
		form: await superValidate(card, zod4(ReviseHouseCalculator), { id: 'house', errors: false })
	};
};

export const actions: Actions = {
	default: async ({ locals, params, request }) => {
		const form = await superValidate(request, zod4(ReviseHouseCalculator), { id: 'house' });
		try {
			if (!form.valid) {
				const read = ReviseHouseCalculator.safeParse(form.data);
				const problems = read.success ? [] : fieldProblems(read.error);
				throw new SteelyardError('calculator-broken', { problems });
			}
			await reviseHouseCalculator(locals.context, params.id, form.data);
		} catch (thrown) {
			return formFailure(form, thrown);
		}
		redirect(303, routes.calculator(params.id));
	}
};
