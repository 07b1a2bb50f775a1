/**
 * Auth.js makes and reads the session cookie; who may sign in is decided by the services. Its token holds the id of
 * our session row and nothing else, and it serves no addresses of its own: the sign-in pages call it.
 */
import { SvelteKitAuth, AuthError, type SvelteKitAuthConfig } from '@auth/sveltekit';
import { getToken } from '@auth/core/jwt';
import Credentials from '@auth/sveltekit/providers/credentials';
import { isRedirect, type RequestEvent } from '@sveltejs/kit';
import { SteelyardError } from '../../errors.ts';
import { routes } from '../../routes.ts';
import { ABSOLUTE_MS } from '../services/sessions.ts';
import type { SignedIn } from '../services/sign-in.ts';
import { cookieNames, dropCookie, setDeviceCookie } from './cookies.ts';
import { ownPath } from './own-path.ts';

export interface AuthHouse {
	origin: string;
	secret: string;
}

/** One provider for each way to prove who one is. Both take a check that has been done by a service. */
const PROVIDERS = { passphrase: 'Passphrase', link: 'Sign-in link' } as const;

function config(
	{ origin, secret }: AuthHouse,
	prove: () => Promise<SignedIn>,
	entered: (by: SignedIn) => void
) {
	const names = cookieNames(origin);
	return {
		secret,
		trustHost: true, // the host is ORIGIN's, set in `request` below
		useSecureCookies: names.secure,
		cookies: {
			sessionToken: {
				name: names.session,
				options: { httpOnly: true, sameSite: 'lax', path: '/', secure: names.secure }
			}
		},
		session: { strategy: 'jwt', maxAge: ABSOLUTE_MS / 1000 },
		pages: { signIn: routes.signIn(), error: routes.signIn() },
		providers: Object.entries(PROVIDERS).map(([id, name]) =>
			Credentials({
				id,
				name,
				credentials: {},
				async authorize() {
					const signedIn = await prove();
					entered(signedIn);
					return { id: signedIn.session.id };
				}
			})
		),
		callbacks: {
			jwt: ({ user }) => ({ sid: user.id }),
			redirect: ({ url, baseUrl }) => new URL(ownPath(url, origin, routes.desk()), baseUrl).href
		},
		logger: { error() {}, warn() {}, debug() {} }
	} satisfies SvelteKitAuthConfig;
}

/**
 * Runs `prove` (a sign-in service bound to its input) through Auth.js and, when it holds, sets the session cookie and
 * the device cookie. Errors of the service come out as they went in.
 */
export async function signInThrough(
	event: RequestEvent,
	house: AuthHouse,
	provider: keyof typeof PROVIDERS,
	prove: () => Promise<SignedIn>
): Promise<void> {
	const names = cookieNames(house.origin);
	let failure: unknown;
	const auth = SvelteKitAuth(
		config(
			house,
			() =>
				prove().catch((error: unknown) => {
					failure = error;
					throw error;
				}),
			({ device }) => setDeviceCookie(event.cookies, names, device)
		)
	);
	try {
		await auth.signIn({
			...event,
			request: request(house.origin, provider),
			cookies: only(event, names.session)
		});
	} catch (error) {
		if (isRedirect(error)) return; // Auth.js is done; where to go is the page's to say
		if (failure instanceof SteelyardError) throw failure;
		if (error instanceof AuthError && failure === undefined)
			throw new SteelyardError('sign-in-failed');
		throw failure ?? error;
	}
}

/** What Auth.js gets to see: our own origin, whatever the client's headers say, and no secret. */
function request(origin: string, providerId: string): Request {
	const { host, protocol } = new URL(origin);
	return new Request(`${origin}${routes.signIn()}`, {
		method: 'POST',
		headers: { host, 'x-forwarded-host': host, 'x-forwarded-proto': protocol.replace(':', '') },
		body: new URLSearchParams({ providerId, redirectTo: routes.desk() })
	});
}

/** Auth.js also wants to set a callback-url cookie, which we have no use for. */
function only({ cookies }: RequestEvent, name: string): RequestEvent['cookies'] {
	return {
		get: (wanted, options) => cookies.get(wanted, options),
		getAll: (options) => cookies.getAll(options),
		serialize: (wanted, value, options) => cookies.serialize(wanted, value, options),
		delete: (wanted, options) => cookies.delete(wanted, options),
		set(wanted, value, options) {
			if (wanted === name) cookies.set(wanted, value, options);
		}
	};
}

/** The session id in the request's cookie; null when there is none, or it isn't ours. Says nothing about the row. */
export async function sessionIdOf(
	request: Request,
	{ origin, secret }: AuthHouse
): Promise<string | null> {
	const names = cookieNames(origin);
	// Strangers, who are most, cost nothing here and get no cookie.
	if (!request.headers.get('cookie')?.includes(names.session)) return null;
	const token = await getToken({
		req: { headers: withoutAuthorization(request.headers) },
		secret,
		cookieName: names.session,
		salt: names.session,
		secureCookie: names.secure
	});
	return typeof token?.sid === 'string' ? token.sid : null;
}

/** `getToken` would take a bearer token as well; a session comes by cookie alone. */
function withoutAuthorization(headers: Headers): Headers {
	return new Headers({ cookie: headers.get('cookie') ?? '' });
}

export function forgetSession(event: RequestEvent, { origin }: AuthHouse): void {
	const names = cookieNames(origin);
	dropCookie(event.cookies, names, names.session);
}
