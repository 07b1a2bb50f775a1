/**
 * Requests that change something must come from our own pages. SvelteKit's own check looks at form content types only,
 * so a request without a body, or with JSON, would pass it.
 */
const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Null when the request may go on; otherwise why not, as a sentence. */
export function originRefusal(request: Request, own: string): string | null {
	if (SAFE.has(request.method)) return null;
	if (request.headers.get('origin') !== own) {
		return 'This must be sent from a page of this house.';
	}
	const site = request.headers.get('sec-fetch-site');
	return site === null || site === 'same-origin'
		? null
		: 'This must be sent from a page of this house.';
}
