import { SteelyardError } from '$lib/errors.ts';
import { ProposeHouseCalculator } from '$lib/forms/house-calculator.ts';
import { routes } from '$lib/routes.ts';
import { formFailure, pageFailure } from '$lib/server/http/failures.ts';
import { proposeHouseCalculator } from '$lib/server/services/house-calculators.ts';
import { fieldProblems } from '$lib/server/services/house-test.ts';
import { emptyCard } from '$lib/vetting/fresh.ts';
import { requirePermission } from '$lib/workflow/permissions.ts';
import { redirect } from '@sveltejs/kit';
import { superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals }) => {
	try {
		requirePermission(locals.context.actor, 'propose-calculator');
	} catch (thrown) {
		pageFailure(thrown);
	}
	const empty = { ...emptyCard(), slug: '' };
	return {
		form: await superValidate(empty, zod4(ProposeHouseCalculator), { id: 'house', errors: false })
	};
};

export const actions: Actions = {
	default: async ({ locals, request }) => {
		const form = await superValidate(request, zod4(ProposeHouseCalculator), { id: 'house' });
		let calculator: string;
		try {
			if (!form.valid) {
				const read = ProposeHouseCalculator.safeParse(form.data);
				const problems = read.success ? [] : fieldProblems(read.error);
				throw new SteelyardError('calculator-broken', { problems });
			}
			({ calculator } = await proposeHouseCalculator(locals.context, form.data));
		} catch (thrown) {
			return formFailure(form, thrown);
		}
		redirect(303, routes.calculator(calculator));
	}
};
