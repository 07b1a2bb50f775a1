/**
 * The path to go to after signing in, or the fallback for anything that isn't plainly a path of this house:
 * other origins, `//host`, `/\host`, encoded slashes, control characters.
 */
export function ownPath(
	wanted: string | null | undefined,
	origin: string,
	fallback: string
): string {
	if (!wanted || !/^\/(?![/\\])[\x21-\x7e]*$/.test(wanted) || /\\|%2f|%5c/i.test(wanted))
		return fallback;
	const url = URL.canParse(wanted, origin) ? new URL(wanted, origin) : null;
	// Dots are resolved by now: `/.//host` has become `//host`.
	return url?.origin === origin && !url.pathname.startsWith('//')
		? url.pathname + url.search
		: fallback;
}
