import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import { depthOf, readJson, shaped } from './json-body.ts';

const post = (body: BodyInit | null, type: string | null = 'application/json') =>
	new Request('http://localhost:4700/api', {
		method: 'POST',
		body,
		headers: type ? { 'content-type': type } : {}
	});

const refused = (code: string, words: RegExp) =>
	expect.objectContaining({
		code,
		details: expect.objectContaining({
			issues: [expect.objectContaining({ message: expect.stringMatching(words) })]
		})
	});

test('JSON comes through', async () => {
	expect(await readJson(post('{"a":[1,"ü"]}', 'application/json; charset=utf-8'))).toEqual({
		a: [1, 'ü']
	});
});

test.each([null, 'text/plain', 'application/x-www-form-urlencoded', 'application/jsonp'])(
	'the content type %s is refused',
	async (type) => {
		await expect(readJson(post('{}', type))).rejects.toEqual(
			refused('input-broken', /application\/json/)
		);
	}
);

test.each(['', '{', '{"a":NaN}', '{"a":Infinity}', '{"a":1,}', "{'a':1}", '\u0000'])(
	'%j is no JSON',
	async (body) => {
		await expect(readJson(post(body))).rejects.toEqual(refused('input-broken', /JSON/));
	}
);

test('bytes that aren’t UTF-8 are refused', async () => {
	await expect(readJson(post(new Uint8Array([0x22, 0xff, 0x22])))).rejects.toEqual(
		refused('input-broken', /UTF-8/)
	);
});

test('a hundred thousand levels are refused quickly, 80 are taken', async () => {
	const nested = (levels: number) => '['.repeat(levels) + ']'.repeat(levels);
	const start = performance.now();
	await expect(readJson(post(nested(100_000)))).rejects.toEqual(
		refused('input-broken', /80 levels/)
	);
	expect(performance.now() - start).toBeLessThan(500);
	await expect(readJson(post(nested(81)))).rejects.toEqual(refused('input-broken', /80 levels/));
	await expect(readJson(post(nested(80)))).resolves.toBeDefined();
});

test('brackets in strings don’t count as depth', () => {
	expect(depthOf(String.raw`{"a":"[[[[\"[[[[\\"}`)).toBe(1);
	expect(depthOf('"unfinished [')).toBe(0);
});

describe('a body of more than 512 kB', () => {
	test('is refused by its announced length', async () => {
		const request = new Request('http://localhost:4700/api', {
			method: 'POST',
			body: '{}',
			headers: { 'content-type': 'application/json', 'content-length': '600000' }
		});
		await expect(readJson(request)).rejects.toMatchObject({ code: 'too-large' });
	});

	test('is refused when it comes without a length, without reading it all', async () => {
		let sent = 0;
		const endless = new ReadableStream<Uint8Array>({
			pull(controller) {
				sent += 1;
				controller.enqueue(new Uint8Array(64 * 1024).fill(0x20));
			}
		});
		const request = new Request('http://localhost:4700/api', {
			method: 'POST',
			body: endless,
			headers: { 'content-type': 'application/json' },
			duplex: 'half'
		} as RequestInit);
		await expect(readJson(request)).rejects.toMatchObject({ code: 'too-large' });
		expect(sent).toBeLessThan(20);
	});
});

test('a body of another shape names each issue by its path', () => {
	const Shape = z.strictObject({ baseVersion: z.int(), document: z.unknown() });
	expect(() => shaped(Shape, { baseVersion: 'x', extra: 1 })).toThrow(
		expect.objectContaining({
			code: 'input-broken',
			details: {
				issues: expect.arrayContaining([expect.objectContaining({ path: 'baseVersion' })])
			}
		})
	);
});
