/**
 * Security headers of everything SvelteKit answers. Pages get their policy, with its nonce, from svelte.config.js; what
 * is not a page may load nothing at all. Frames for partner pages never come through here: embed/serve.ts.
 */
import { PERMISSIONS_POLICY } from './permissions-policy.ts';

const NOT_A_PAGE =
	"default-src 'none'; frame-ancestors 'none'; base-uri 'none'; form-action 'none'";

export interface Answer {
	secure: boolean;
	/** The answer depends on who asked. */
	personal: boolean;
	requestId: string;
	/** May stand in a frame of our own pages, and of nobody else's: a strip of the galley. */
	framedByUs?: boolean;
}

/** The response with all headers in place; copies it when its headers can't be changed, as with redirects. */
export function withSecurityHeaders(response: Response, answer: Answer): Response {
	const type = response.headers.get('content-type') ?? '';
	const page = type.startsWith('text/html');
	const set: [string, string][] = [
		['X-Content-Type-Options', 'nosniff'],
		['X-Frame-Options', 'DENY'],
		['Permissions-Policy', PERMISSIONS_POLICY],
		['Cross-Origin-Resource-Policy', 'same-origin'],
		['X-Request-Id', answer.requestId]
	];
	if (!response.headers.has('referrer-policy')) {
		set.push(['Referrer-Policy', page ? 'strict-origin-when-cross-origin' : 'no-referrer']);
	}
	if (page) set.push(['Cross-Origin-Opener-Policy', 'same-origin']);
	const policy = response.headers.get('content-security-policy');
	if (policy === null) set.push(['Content-Security-Policy', NOT_A_PAGE]);
	else if (answer.framedByUs && page) {
		const ours = policy.replace("frame-ancestors 'none'", "frame-ancestors 'self'");
		set.push(['Content-Security-Policy', ours], ['X-Frame-Options', 'SAMEORIGIN']);
	}
	if (answer.secure) set.push(['Strict-Transport-Security', 'max-age=63072000; includeSubDomains']);
	if (answer.personal) set.push(['Cache-Control', 'no-store']);
	if (/^(text\/|application\/json)/.test(type) && !/charset=/i.test(type)) {
		set.push(['Content-Type', `${type}; charset=utf-8`]);
	}

	const writable = isWritable(response) ? response : new Response(response.body, response);
	for (const [name, value] of set) {
		// The public API opens itself to other origins; everything else stays closed.
		if (
			name === 'Cross-Origin-Resource-Policy' &&
			writable.headers.has('access-control-allow-origin')
		)
			continue;
		writable.headers.set(name, value);
	}
	return writable;
}

function isWritable(response: Response): boolean {
	try {
		response.headers.delete('x-steelyard-probe');
		return true;
	} catch (error) {
		if (error instanceof TypeError) return false;
		throw error;
	}
}
