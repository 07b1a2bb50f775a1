/** Names and attributes of every cookie the house sets; strangers get none of them. */
import type { Cookies } from '@sveltejs/kit';

const MINUTE = 60;
const DAY = 24 * 60 * MINUTE;

export interface CookieNames {
	secure: boolean;
	/** Auth.js's encrypted token; holds our session id and nothing else. */
	session: string;
	/** Marks a browser that has signed in here before, for the limits on guessing. */
	device: string;
	/** Binds a sign-in link to the browser that asked for it. */
	linkNonce: string;
}

/** With https the names carry `__Host-`, which ties them to this very host; plain http (development) can't have that. */
export function cookieNames(origin: string): CookieNames {
	const secure = origin.startsWith('https:');
	const prefix = secure ? '__Host-' : '';
	return {
		secure,
		session: `${prefix}steelyard.session`,
		device: `${prefix}steelyard.device`,
		linkNonce: `${prefix}steelyard.link`
	};
}

const attributes = (names: CookieNames, maxAge: number) =>
	({ path: '/', httpOnly: true, sameSite: 'lax', secure: names.secure, maxAge }) as const;

export function setDeviceCookie(cookies: Cookies, names: CookieNames, device: string): void {
	cookies.set(names.device, device, attributes(names, 365 * DAY));
}

export function setLinkNonce(cookies: Cookies, names: CookieNames, nonce: string): void {
	cookies.set(names.linkNonce, nonce, attributes(names, 10 * MINUTE));
}

export function dropCookie(cookies: Cookies, names: CookieNames, name: string): void {
	cookies.delete(name, { path: '/', httpOnly: true, sameSite: 'lax', secure: names.secure });
}
