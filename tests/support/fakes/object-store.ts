/**
 * An object store that speaks the S3 protocol, as far as the app uses it: path-style addresses, PUT, GET, HEAD, DELETE and
 * ListObjectsV2. Objects are files in a folder, so that they outlive a restart. For the demo and for tests.
 */
import { createHash, randomUUID } from 'node:crypto';
import { mkdir, readdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { createServer } from 'node:http';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { join } from 'node:path';
import { listenOn } from './listen.ts';
import type { Listening } from './listen.ts';

export interface ObjectStoreOptions {
	/** 0 takes a free one. */
	port: number;
	host?: string;
	/** Where the objects are kept. */
	folder: string;
	/** Requests signed with another key, or not signed, are refused. */
	accessKey: string;
	/** Asked before each request; what it says true to is answered as a fault of the store. */
	fails?: (method: string, key: string) => boolean;
}

interface Kept {
	key: string;
	size: number;
	etag: string;
	modified: string;
	headers: Record<string, string>;
}

/** Headers of an upload that come back with the object. */
const KEPT_HEADERS =
	/^(?:content-type|cache-control|content-disposition|content-language|x-amz-meta-.+)$/;
const LONGEST_OBJECT = 64 * 1024 * 1024;

class Refused extends Error {
	constructor(
		readonly status: number,
		readonly code: string,
		message: string
	) {
		super(message);
	}
}

const escapeXml = (text: string) =>
	text.replace(/[<>&"']/g, (character) => `&#${character.charCodeAt(0)};`);

const sha256 = (bytes: Buffer | string) => createHash('sha256').update(bytes).digest('hex');

/** Body of the `aws-chunked` encoding: chunks with their size in hexadecimal, then trailing headers, which are dropped. */
export function decodeChunked(body: Buffer): Buffer {
	const chunks: Buffer[] = [];
	let at = 0;
	for (;;) {
		const end = body.indexOf('\r\n', at);
		const size = end < 0 ? NaN : parseInt(body.subarray(at, end).toString('latin1'), 16);
		if (Number.isNaN(size)) {
			throw new Refused(400, 'IncompleteBody', 'A chunk of the body has no readable length.');
		}
		if (size === 0) return Buffer.concat(chunks);
		const start = end + 2;
		if (start + size > body.length) {
			throw new Refused(400, 'IncompleteBody', 'The body ends inside a chunk.');
		}
		chunks.push(body.subarray(start, start + size));
		at = start + size + 2;
	}
}

async function readBody(request: IncomingMessage): Promise<Buffer> {
	const parts: Buffer[] = [];
	let length = 0;
	for await (const part of request as AsyncIterable<Buffer>) {
		length += part.length;
		if (length > LONGEST_OBJECT) {
			throw new Refused(400, 'EntityTooLarge', 'The object is longer than this store takes.');
		}
		parts.push(part);
	}
	const raw = Buffer.concat(parts);
	const declared = String(request.headers['x-amz-content-sha256'] ?? '');
	const isChunked =
		declared.startsWith('STREAMING-') ||
		String(request.headers['content-encoding'] ?? '').includes('aws-chunked');
	if (isChunked) return decodeChunked(raw);
	if (/^[0-9a-f]{64}$/.test(declared) && sha256(raw) !== declared) {
		throw new Refused(
			400,
			'XAmzContentSHA256Mismatch',
			'The body does not have the hash that its header gives.'
		);
	}
	return raw;
}

/** The folder of one bucket. Files are named by the hash of their key, so no key can point outside. */
class Bucket {
	constructor(readonly folder: string) {}

	#body = (key: string) => join(this.folder, `${sha256(key)}.bytes`);
	#note = (key: string) => join(this.folder, `${sha256(key)}.json`);

	async exists(): Promise<boolean> {
		return (await readdir(this.folder).catch(missing)) !== null;
	}

	async note(key: string): Promise<Kept | null> {
		const text = await readFile(this.#note(key), 'utf8').catch(missing);
		return text === null ? null : (JSON.parse(text) as Kept);
	}

	async body(key: string): Promise<Buffer | null> {
		return readFile(this.#body(key)).catch(missing);
	}

	/** The bytes first, the note second, each by rename: an object is whole or not there. */
	async put(kept: Kept, body: Buffer): Promise<void> {
		for (const [path, content] of [
			[this.#body(kept.key), body],
			[this.#note(kept.key), JSON.stringify(kept)]
		] as const) {
			const partial = `${path}.${randomUUID()}.partial`;
			await writeFile(partial, content);
			await rename(partial, path);
		}
	}

	async remove(key: string): Promise<void> {
		await rm(this.#note(key), { force: true });
		await rm(this.#body(key), { force: true });
	}

	/** All notes, in the order of their keys' UTF-8 bytes, as the protocol lists them. */
	async list(): Promise<Kept[]> {
		const names = (await readdir(this.folder)).filter((name) => name.endsWith('.json'));
		const notes = await Promise.all(
			names.map(async (name) => JSON.parse(await readFile(join(this.folder, name), 'utf8')) as Kept)
		);
		return notes.sort((a, b) => Buffer.compare(Buffer.from(a.key), Buffer.from(b.key)));
	}
}

function missing(error: NodeJS.ErrnoException): null {
	if (error.code === 'ENOENT') return null;
	throw error;
}

function requireSignature(request: IncomingMessage, accessKey: string): void {
	const given = request.headers.authorization ?? '';
	const credential = /^AWS4-HMAC-SHA256 Credential=([^/]+)\//.exec(given)?.[1];
	if (credential === undefined)
		throw new Refused(403, 'AccessDenied', 'The request is not signed.');
	if (credential !== accessKey) {
		throw new Refused(403, 'InvalidAccessKeyId', 'The access key is not known here.');
	}
}

function sendXml(response: ServerResponse, status: number, xml: string): void {
	response.writeHead(status, { 'content-type': 'application/xml' });
	response.end(`<?xml version="1.0" encoding="UTF-8"?>\n${xml}`);
}

function listing(bucketName: string, all: Kept[], query: URLSearchParams): string {
	const prefix = query.get('prefix') ?? '';
	const token = query.get('continuation-token');
	const after = token
		? Buffer.from(token, 'base64url').toString('utf8')
		: (query.get('start-after') ?? '');
	const most = Math.min(Number(query.get('max-keys') ?? 1000) || 1000, 1000);
	const matching = all.filter(
		({ key }) =>
			key.startsWith(prefix) &&
			(after === '' || Buffer.compare(Buffer.from(key), Buffer.from(after)) > 0)
	);
	const page = matching.slice(0, most);
	const isCut = matching.length > page.length;
	const next = isCut ? Buffer.from(page.at(-1)?.key ?? '').toString('base64url') : '';
	const contents = page.map(
		({ key, modified, etag, size }) =>
			`<Contents><Key>${escapeXml(key)}</Key><LastModified>${modified}</LastModified>` +
			`<ETag>${escapeXml(etag)}</ETag><Size>${size}</Size><StorageClass>STANDARD</StorageClass></Contents>`
	);
	return (
		`<ListBucketResult xmlns="http://s3.amazonaws.com/doc/2006-03-01/"><Name>${escapeXml(bucketName)}</Name>` +
		`<Prefix>${escapeXml(prefix)}</Prefix><KeyCount>${page.length}</KeyCount><MaxKeys>${most}</MaxKeys>` +
		`<IsTruncated>${isCut}</IsTruncated>` +
		(isCut ? `<NextContinuationToken>${next}</NextContinuationToken>` : '') +
		`${contents.join('')}</ListBucketResult>`
	);
}

function objectHeaders(kept: Kept): Record<string, string> {
	return {
		...kept.headers,
		etag: kept.etag,
		'last-modified': new Date(kept.modified).toUTCString(),
		'content-length': String(kept.size),
		'accept-ranges': 'none'
	};
}

async function answerObject(
	request: IncomingMessage,
	response: ServerResponse,
	bucket: Bucket,
	key: string
): Promise<void> {
	switch (request.method) {
		case 'PUT': {
			const body = await readBody(request);
			if (request.headers['if-none-match'] === '*' && (await bucket.note(key))) {
				throw new Refused(412, 'PreconditionFailed', 'There is already an object of this name.');
			}
			const headers = Object.fromEntries(
				Object.entries(request.headers)
					.filter(([name, value]) => KEPT_HEADERS.test(name) && typeof value === 'string')
					.map(([name, value]) => [name, String(value)])
			);
			const etag = `"${createHash('md5').update(body).digest('hex')}"`;
			await bucket.put(
				{ key, size: body.length, etag, modified: new Date().toISOString(), headers },
				body
			);
			response.writeHead(200, { etag }).end();
			return;
		}
		case 'GET':
		case 'HEAD': {
			const kept = await bucket.note(key);
			const body = kept && request.method === 'GET' ? await bucket.body(key) : null;
			if (!kept || (request.method === 'GET' && !body)) {
				throw new Refused(404, 'NoSuchKey', 'There is no object of this name.');
			}
			response.writeHead(200, objectHeaders(kept)).end(body ?? undefined);
			return;
		}
		case 'DELETE':
			await bucket.remove(key);
			response.writeHead(204).end();
			return;
		default:
			throw new Refused(405, 'MethodNotAllowed', 'This store does not do that to an object.');
	}
}

async function answerBucket(
	request: IncomingMessage,
	response: ServerResponse,
	bucket: Bucket,
	name: string,
	query: URLSearchParams
): Promise<void> {
	if (request.method === 'PUT') {
		await mkdir(bucket.folder, { recursive: true });
		response.writeHead(200, { location: `/${name}` }).end();
		return;
	}
	if (!(await bucket.exists()))
		throw new Refused(404, 'NoSuchBucket', 'There is no bucket of this name.');
	if (request.method === 'HEAD') {
		response.writeHead(200).end();
	} else if (request.method === 'GET' && query.get('list-type') === '2') {
		sendXml(response, 200, listing(name, await bucket.list(), query));
	} else {
		throw new Refused(405, 'MethodNotAllowed', 'This store does not do that to a bucket.');
	}
}

async function answer(
	request: IncomingMessage,
	response: ServerResponse,
	{ folder, accessKey, fails }: ObjectStoreOptions
): Promise<void> {
	requireSignature(request, accessKey);
	// Read by hand: `URL` would resolve the dots of a key such as `a/../b`.
	const [path = '', search = ''] = (request.url ?? '/').split(/\?(.*)/s);
	const [, name = '', ...rest] = path.split('/');
	if (!/^[a-z0-9][a-z0-9.-]{1,61}[a-z0-9]$/.test(name)) {
		throw new Refused(
			400,
			'InvalidBucketName',
			'A bucket’s name is 3 to 63 small letters, digits, dots or dashes.'
		);
	}
	const bucket = new Bucket(join(folder, name));
	const key = decodeURIComponent(rest.join('/'));
	if (fails?.(request.method ?? '', key))
		throw new Refused(500, 'InternalError', 'The store has a fault.');
	if (key === '') return answerBucket(request, response, bucket, name, new URLSearchParams(search));
	if (!(await bucket.exists()))
		throw new Refused(404, 'NoSuchBucket', 'There is no bucket of this name.');
	return answerObject(request, response, bucket, key);
}

/** Starts the store; what it returns says where, and closes it. */
export async function startObjectStore(options: ObjectStoreOptions): Promise<Listening> {
	await mkdir(options.folder, { recursive: true });
	const server = createServer((request, response) => {
		answer(request, response, options).catch((error: unknown) => {
			const refused =
				error instanceof Refused ? error : new Refused(500, 'InternalError', String(error));
			if (response.headersSent) return response.destroy();
			const xml = `<Error><Code>${refused.code}</Code><Message>${escapeXml(refused.message)}</Message></Error>`;
			if (request.method === 'HEAD') response.writeHead(refused.status).end();
			else sendXml(response, refused.status, xml);
		});
	});
	return listenOn(server, options);
}
