import { expect, test } from 'vitest';
import { LARGEST_BYTES } from '../../pictures/view.ts';
import { WORD_FILE_LIMIT_BYTES } from '../word-files/limit.ts';
import { bodyLimitOf, withinLimit } from './body-limit.ts';
import { BODY_LIMIT_BYTES } from './json-body.ts';

const POST = 'http://localhost:4700/somewhere';

test('a picture and a word file may be large, and nothing else', () => {
	expect(bodyLimitOf('/api/pictures', 'POST').bytes).toBe(LARGEST_BYTES);
	expect(bodyLimitOf('/api/import/word', 'POST').bytes).toBe(WORD_FILE_LIMIT_BYTES);
	// The server in front takes no more than a picture.
	expect(WORD_FILE_LIMIT_BYTES).toBeLessThanOrEqual(LARGEST_BYTES);
	for (const [route, method] of [
		['/api/pictures', 'PUT'],
		['/api/pictures/[id]', 'PUT'],
		['/(account)/sign-in', 'POST'],
		[null, 'POST']
	] as const)
		expect(bodyLimitOf(route, method).bytes).toBe(BODY_LIMIT_BYTES);
});

/** Sends pieces of a kilobyte for as long as they are asked for. */
function endless(): { request: Request; sent: () => number; cancelled: () => boolean } {
	let sent = 0;
	let cancelled = false;
	const body = new ReadableStream<Uint8Array>({
		pull(controller) {
			sent += 1024;
			controller.enqueue(new Uint8Array(1024).fill(0x61));
		},
		cancel() {
			cancelled = true;
		}
	});
	const request = new Request(POST, {
		method: 'POST',
		headers: { 'content-type': 'text/plain', 'x-kept': 'yes' },
		body,
		duplex: 'half'
	} as RequestInit);
	return { request, sent: () => sent, cancelled: () => cancelled };
}

test('a body without a length ends in a 413 at the limit, and its connection stays open for the answer', async () => {
	const { request, sent, cancelled } = endless();
	const limited = withinLimit(request, 10_000);
	expect(limited.headers.get('x-kept')).toBe('yes');
	await expect(limited.text()).rejects.toMatchObject({ status: 413 });
	expect(sent()).toBeLessThan(16_384);
	expect(cancelled()).toBe(false);
});

test('a body within it comes through whole', async () => {
	const body = new Blob([new Uint8Array(9_000).fill(0x61)]).stream();
	const request = new Request(POST, { method: 'POST', body, duplex: 'half' } as RequestInit);
	expect((await withinLimit(request, 10_000).text()).length).toBe(9_000);
});

test('a request that says its length, or has no body, is left as it is', () => {
	const get = new Request(POST);
	expect(withinLimit(get, 1)).toBe(get);
	const long = new Request(POST, {
		method: 'POST',
		body: 'abc',
		headers: { 'content-length': '3' }
	});
	expect(withinLimit(long, 1)).toBe(long);
});
