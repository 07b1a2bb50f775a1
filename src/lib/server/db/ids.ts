import { randomBytes } from 'node:crypto';

/** 128 random bits as 22 URL-safe characters: unguessable, and still checked wherever it is used. */
export function newId(): string {
	return randomBytes(16).toString('base64url');
}
