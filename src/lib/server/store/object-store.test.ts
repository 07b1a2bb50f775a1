import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { startObjectStore } from '../../../../tests/support/fakes/object-store.ts';
import { openObjectStore, type ObjectStore } from './object-store.ts';

let folder: string;
let fake: Awaited<ReturnType<typeof startObjectStore>>;
let store: ObjectStore;

const settings = (endpoint: string) => ({
	endpoint,
	bucket: 'steelyard',
	region: 'local',
	accessKeyId: 'key-of-the-tests',
	secretAccessKey: 'secret'
});

beforeAll(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-store-'));
	fake = await startObjectStore({ port: 0, folder, accessKey: 'key-of-the-tests' });
	store = openObjectStore(settings(fake.url));
});
afterAll(async () => {
	store.close();
	await fake.close();
	await rm(folder, { recursive: true, force: true });
});

test('bytes come back as they went in', async () => {
	const bytes = Uint8Array.from({ length: 70_000 }, (_, index) => index % 256);
	expect(await store.head('a/b')).toBe(false);
	await store.put('a/b', bytes, 'application/octet-stream');
	await store.put('a/b', bytes, 'application/octet-stream');
	expect(await store.head('a/b')).toBe(true);
	expect(Buffer.from((await store.get('a/b'))!).equals(Buffer.from(bytes))).toBe(true);
});

test('a key that isn’t there is null, not an error', async () => {
	expect(await store.get('nothing')).toBeNull();
});

test('a store that isn’t there, or refuses, is away', async () => {
	const gone = openObjectStore(settings('http://127.0.0.1:1'));
	await expect(gone.put('a', new Uint8Array(1), 'text/plain')).rejects.toMatchObject({
		code: 'store-away'
	});
	const stranger = openObjectStore({ ...settings(fake.url), accessKeyId: 'another' });
	await expect(stranger.get('a/b')).rejects.toMatchObject({ code: 'store-away' });
});

test('a store that takes the request and never answers is away within its time limit', async () => {
	const silent: Server = createServer(() => undefined);
	await new Promise<void>((resolve) => silent.listen(0, '127.0.0.1', resolve));
	const { port } = silent.address() as AddressInfo;
	const slow = openObjectStore({ ...settings(`http://127.0.0.1:${port}`), requestTimeoutMs: 200 });
	const start = performance.now();
	await expect(slow.get('a')).rejects.toMatchObject({ code: 'store-away' });
	expect(performance.now() - start).toBeLessThan(5_000);
	silent.closeAllConnections();
	await new Promise((resolve) => silent.close(resolve));
});
