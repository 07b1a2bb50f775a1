import { routes } from '$lib/routes.ts';
import { forgetSession } from '$lib/server/auth/auth-js.ts';
import { signOut } from '$lib/server/services/sessions.ts';
import type { RequestHandler } from './$types';

export const POST: RequestHandler = async (event) => {
	const { context } = event.locals;
	await signOut(context);
	forgetSession(event, { origin: context.house.origin, secret: context.secret });
	// Not "storage": a draft that hasn't reached the server yet is kept in there.
	return new Response(null, {
		status: 303,
		headers: { location: routes.signIn(), 'clear-site-data': '"cache"' }
	});
};
