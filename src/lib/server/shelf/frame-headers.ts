/** The headers of every answer that readers get on other people's pages. */
import { PERMISSIONS_POLICY } from '../http/permissions-policy.ts';

/**
 * `sandbox` gives the document an opaque origin even when the page around it forgets the attribute: no cookies, no
 * storage, nothing of the house's to read. Svelte's own policy for markup is the only one that may make any.
 */
function contentPolicy(styles: readonly string[]): string {
	return [
		"default-src 'none'",
		"script-src 'self'",
		`style-src ${styles.map((hash) => `'${hash}'`).join(' ')}`,
		"font-src 'self'",
		"img-src 'self'",
		"connect-src 'none'",
		"base-uri 'none'",
		"form-action 'none'",
		"object-src 'none'",
		'frame-ancestors *',
		'sandbox allow-scripts allow-popups allow-popups-to-escape-sandbox',
		"require-trusted-types-for 'script'",
		'trusted-types svelte-trusted-html'
	].join('; ');
}

export type Headers = Record<string, string>;

export function frameHeaders(styles: readonly string[]): Headers {
	return {
		'Content-Security-Policy': contentPolicy(styles),
		'Cross-Origin-Embedder-Policy': 'require-corp',
		'Cross-Origin-Resource-Policy': 'cross-origin',
		'Permissions-Policy': PERMISSIONS_POLICY,
		'Referrer-Policy': 'no-referrer',
		'X-Content-Type-Options': 'nosniff'
	};
}

/** A new release, or a hold, reaches every reader in about a minute. */
export const FRAME_CACHE = 'public, max-age=60, stale-while-revalidate=300, stale-if-error=86400';

/** The name carries the hash: these bytes never change. */
export const ASSET_CACHE = 'public, max-age=31536000, immutable';

/** Sandboxed documents fetch scripts and fonts from a null origin, hence the open door. */
export const ASSET_HEADERS: Headers = {
	'Access-Control-Allow-Origin': '*',
	'Content-Security-Policy': "default-src 'none'",
	'Cross-Origin-Resource-Policy': 'cross-origin',
	'Referrer-Policy': 'no-referrer',
	'X-Content-Type-Options': 'nosniff'
};

export const HTTPS_ONLY: Headers = {
	'Strict-Transport-Security': 'max-age=63072000; includeSubDomains'
};
