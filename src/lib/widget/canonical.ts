/** One value, one string of JSON: what signatures, proofs and releases are hashed by. */
import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';

/** SHA-256 of a value's canonical JSON, in hex. */
export function digestOf(value: unknown): string {
	return bytesToHex(sha256(utf8ToBytes(canonicalJson(value))));
}

/**
 * JSON with keys in code-unit order and no white space, numbers as ECMAScript prints them: the form of RFC 8785.
 * Throws a TypeError on a number that isn't finite, since JSON would turn it into null.
 */
export function canonicalJson(value: unknown): string {
	if (typeof value === 'number' && !Number.isFinite(value)) {
		throw new TypeError('A number in a frozen document must be finite.');
	}
	if (Array.isArray(value))
		return `[${value.map((item) => canonicalJson(item ?? null)).join(',')}]`;
	if (typeof value === 'object' && value !== null) {
		const members = Object.entries(value)
			.filter(([, member]) => member !== undefined)
			.sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
			.map(([key, member]) => `${JSON.stringify(key)}:${canonicalJson(member)}`);
		return `{${members.join(',')}}`;
	}
	return JSON.stringify(value ?? null);
}
