import '$lib/factcheck/lexicon/all.ts';
import { sequence } from '@sveltejs/kit/hooks';
import { redirect, type Handle, type HandleServerError, type ServerInit } from '@sveltejs/kit';
import { explanations, SteelyardError } from '$lib/errors.ts';
import { routes } from '$lib/routes.ts';
import { sessionIdOf } from '$lib/server/auth/auth-js.ts';
import { cookieNames } from '$lib/server/auth/cookies.ts';
import { newId } from '$lib/server/db/ids.ts';
import { house, openHouseOnce } from '$lib/server/house.ts';
import { bodyLimitOf, withinLimit } from '$lib/server/http/body-limit.ts';
import { apiFailure } from '$lib/server/http/failures.ts';
import { guardOf } from '$lib/server/http/guard.ts';
import { withSecurityHeaders } from '$lib/server/http/headers.ts';
import { originRefusal } from '$lib/server/http/origin-check.ts';
import { logFault } from '$lib/server/log.ts';
import { readSession } from '$lib/server/services/sessions.ts';

export const init: ServerInit = async () => {
	await openHouseOnce();
};

const answer: Handle = async ({ event, resolve }) => {
	event.locals.requestId = newId();
	event.locals.actor = null;
	const response = await resolve(event);
	return withSecurityHeaders(response, {
		secure: house().origin.startsWith('https:'),
		personal: event.locals.actor !== null || event.request.method !== 'GET',
		requestId: event.locals.requestId,
		framedByUs: event.route.id?.startsWith('/(strip)') ?? false
	});
};

/** PostgreSQL takes no NUL character, so nothing in this house has one in its address. */
const refuseNul: Handle = ({ event, resolve }) => {
	if (!/%00/.test(event.url.pathname + event.url.search)) return resolve(event);
	return apiFailure(new SteelyardError('not-found'));
};

const refuseForeign: Handle = ({ event, resolve }) => {
	if (guardOf(event.route.id) !== 'public-api') {
		const refusal = originRefusal(event.request, house().origin);
		if (refusal) return Response.json({ error: { message: refusal } }, { status: 403 });
	}
	const limit = bodyLimitOf(event.route.id, event.request.method);
	if (Number(event.request.headers.get('content-length')) > limit.bytes) {
		const refusal = apiFailure(new SteelyardError(limit.code));
		// What was sent stays unread, so nothing more can come over this connection.
		refusal.headers.set('connection', 'close');
		return refusal;
	}
	event.request = withinLimit(event.request, limit.bytes);
	return resolve(event);
};

const identify: Handle = async ({ event, resolve }) => {
	const { fixtures, origin } = house();
	const now = new Date();
	const sessionId = await sessionIdOf(event.request, { origin, secret: fixtures.secret });
	const known = sessionId === null ? null : await readSession(fixtures.db, now, sessionId);
	event.locals.actor = known?.actor ?? null;
	event.locals.context = {
		...fixtures,
		actor: event.locals.actor,
		session: known?.session ?? null,
		client: {
			address: event.getClientAddress(),
			device: event.cookies.get(cookieNames(origin).device) ?? null
		},
		now
	};
	return resolve(event);
};

const guard: Handle = ({ event, resolve }) => {
	if (event.locals.actor) return resolve(event);
	switch (guardOf(event.route.id)) {
		case 'api':
			return apiFailure(new SteelyardError('not-signed-in'));
		case 'page': {
			const signIn = `${routes.signIn()}?next=${encodeURIComponent(event.url.pathname + event.url.search)}`;
			// The client router has its own form of redirect, which SvelteKit makes from a thrown one.
			if (event.isDataRequest || event.request.headers.has('x-sveltekit-action'))
				redirect(303, signIn);
			return new Response(null, { status: 303, headers: { location: signIn } });
		}
		case 'open':
		case 'public-api':
			return resolve(event);
	}
};

export const handle = sequence(answer, refuseNul, refuseForeign, identify, guard);

export const handleError: HandleServerError = ({ error, event, status, message }) => {
	if (error instanceof SteelyardError) {
		const { message: says, help } = explanations[error.code];
		return { message: says, help, code: error.code };
	}
	if (status < 500) return { message, help: 'Look for it from the desk.' };
	const reference = event.locals.requestId;
	logFault(reference, event.route.id, error);
	return {
		message: 'Something broke on our side.',
		help: `Nothing you saved is lost. If it happens again, tell the house’s admin the number ${reference}.`,
		reference
	};
};
