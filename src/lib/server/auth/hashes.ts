import { createHash, createHmac } from 'node:crypto';

/** In hex; text is hashed as UTF-8. */
export function sha256(content: string | Uint8Array): string {
	return createHash('sha256').update(content).digest('hex');
}

/** How content policies name an inline style: SHA-256 in base64. */
export function policyHash(style: string): string {
	return `sha256-${createHash('sha256').update(style).digest('base64')}`;
}

/** A secret that can be worked out again from its row's id and the house's secret, so it is never stored. */
export function derivedToken(secret: string, purpose: string, id: string): string {
	return createHmac('sha256', secret).update(`${purpose}:${id}`).digest('base64url');
}
