import { createHash } from 'node:crypto';
import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import {
	CreateBucketCommand,
	DeleteObjectCommand,
	GetObjectCommand,
	HeadBucketCommand,
	HeadObjectCommand,
	ListObjectsV2Command,
	PutObjectCommand,
	S3Client
} from '@aws-sdk/client-s3';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import type { Listening } from './listen.ts';
import { decodeChunked, startObjectStore } from './object-store.ts';

const Bucket = 'trial';
let folder: string;
let store: Listening;
let client: S3Client;

const clientOf = (url: string, accessKeyId = 'key-of-the-house') =>
	new S3Client({
		endpoint: url,
		region: 'local',
		forcePathStyle: true,
		maxAttempts: 1,
		credentials: { accessKeyId, secretAccessKey: 'secret' }
	});

beforeEach(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-store-'));
	store = await startObjectStore({ port: 0, folder, accessKey: 'key-of-the-house' });
	client = clientOf(store.url);
	await client.send(new CreateBucketCommand({ Bucket }));
});

afterEach(async () => {
	client.destroy();
	await store.close();
	await rm(folder, { recursive: true });
});

const bytesOf = async (Key: string) => {
	const { Body } = await client.send(new GetObjectCommand({ Bucket, Key }));
	return Buffer.from((await Body?.transformToByteArray()) ?? []);
};

describe('the object store, asked by the real client', () => {
	test('gives back the bytes, the type and the metadata it was given', async () => {
		const bytes = Buffer.from([0, 255, 13, 10, 128, 7]);
		const put = await client.send(
			new PutObjectCommand({
				Bucket,
				Key: 'press/ab cd/é+&.bin',
				Body: bytes,
				ContentType: 'font/woff2',
				CacheControl: 'public, max-age=31536000, immutable',
				Metadata: { digest: 'abc' }
			})
		);
		expect(put.ETag).toBe(`"${createHash('md5').update(bytes).digest('hex')}"`);

		expect(await bytesOf('press/ab cd/é+&.bin')).toEqual(bytes);
		const head = await client.send(new HeadObjectCommand({ Bucket, Key: 'press/ab cd/é+&.bin' }));
		expect(head).toMatchObject({
			ContentType: 'font/woff2',
			CacheControl: 'public, max-age=31536000, immutable',
			ContentLength: 6,
			Metadata: { digest: 'abc' }
		});
	});

	test('takes a stream, which the client sends in chunks with a checksum at the end', async () => {
		const bytes = Buffer.alloc(300_000, 'steelyard ');
		await client.send(
			new PutObjectCommand({
				Bucket,
				Key: 'streamed',
				Body: Readable.from([bytes.subarray(0, 100_000), bytes.subarray(100_000)]),
				ContentLength: bytes.length
			})
		);
		expect((await bytesOf('streamed')).equals(bytes)).toBe(true);
	});

	test('lists by prefix in byte order, page by page', async () => {
		for (const Key of ['b/2', 'b/10', 'a', 'b/1', 'c', 'b/é']) {
			await client.send(new PutObjectCommand({ Bucket, Key, Body: Key }));
		}
		const keys: (string | undefined)[] = [];
		let token: string | undefined;
		let pages = 0;
		do {
			const page = await client.send(
				new ListObjectsV2Command({
					Bucket,
					Prefix: 'b/',
					MaxKeys: 3,
					ContinuationToken: token
				})
			);
			keys.push(...(page.Contents ?? []).map(({ Key }) => Key));
			token = page.NextContinuationToken;
			pages += 1;
		} while (token);
		expect(keys).toEqual(['b/1', 'b/10', 'b/2', 'b/é']);
		expect(pages).toBe(2);
	});

	test('deletes, and says so of what is not there', async () => {
		await client.send(new PutObjectCommand({ Bucket, Key: 'gone', Body: 'x' }));
		await client.send(new DeleteObjectCommand({ Bucket, Key: 'gone' }));
		await expect(bytesOf('gone')).rejects.toMatchObject({ name: 'NoSuchKey' });
		await expect(client.send(new HeadObjectCommand({ Bucket, Key: 'gone' }))).rejects.toMatchObject(
			{ name: 'NotFound' }
		);
		await expect(client.send(new HeadBucketCommand({ Bucket: 'another' }))).rejects.toMatchObject({
			name: 'NotFound'
		});
	});

	test('keeps what is there when asked to write only a new object', async () => {
		await client.send(new PutObjectCommand({ Bucket, Key: 'once', Body: 'first' }));
		await expect(
			client.send(new PutObjectCommand({ Bucket, Key: 'once', Body: 'second', IfNoneMatch: '*' }))
		).rejects.toMatchObject({ name: 'PreconditionFailed' });
		expect((await bytesOf('once')).toString()).toBe('first');
	});

	test('keeps its objects over a restart', async () => {
		await client.send(new PutObjectCommand({ Bucket, Key: 'kept', Body: 'still here' }));
		await store.close();
		client.destroy();
		store = await startObjectStore({ port: 0, folder, accessKey: 'key-of-the-house' });
		client = clientOf(store.url);
		expect((await bytesOf('kept')).toString()).toBe('still here');
	});

	test('refuses another access key, and a request that is not signed', async () => {
		const stranger = clientOf(store.url, 'another-key');
		await expect(
			stranger.send(new PutObjectCommand({ Bucket, Key: 'x', Body: 'x' }))
		).rejects.toMatchObject({ name: 'InvalidAccessKeyId' });
		stranger.destroy();
		expect((await fetch(`${store.url}/${Bucket}/x`)).status).toBe(403);
	});

	test('never lets a key point outside its folder', async () => {
		await client.send(new PutObjectCommand({ Bucket, Key: '../../escaped', Body: 'x' }));
		expect(await readdir(folder)).toEqual([Bucket]);
		expect((await bytesOf('../../escaped')).toString()).toBe('x');
	});
});

test('a body with a wrong hash is refused', async () => {
	const answer = await fetch(`${store.url}/${Bucket}/x`, {
		method: 'PUT',
		headers: {
			authorization: 'AWS4-HMAC-SHA256 Credential=key-of-the-house/20261208/local/s3/aws4_request',
			'x-amz-content-sha256': '0'.repeat(64)
		},
		body: 'not these bytes'
	});
	expect(answer.status).toBe(400);
	expect(await answer.text()).toContain('XAmzContentSHA256Mismatch');
});

test.each([
	{ body: 'zz\r\nabc\r\n0\r\n\r\n', why: 'length that is no number' },
	{ body: 'ff\r\nabc\r\n0\r\n\r\n', why: 'chunk cut short' },
	{ body: '', why: 'nothing at all' }
])('a chunked body with a $why is refused', ({ body }) => {
	expect(() => decodeChunked(Buffer.from(body))).toThrow(/chunk/);
});
