import { pageFailure } from '$lib/server/http/failures.ts';
import { listThemes } from '$lib/server/services/themes.ts';
import { can } from '$lib/workflow/permissions.ts';
import type { LayoutServerLoad } from './$types';

export const load: LayoutServerLoad = async ({ locals: { context } }) => ({
	themes: await listThemes(context).catch(pageFailure),
	mayEdit: context.actor !== null && can(context.actor, 'edit-themes')
});
