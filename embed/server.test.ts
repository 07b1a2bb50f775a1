import { createHash } from 'node:crypto';
import type { EventEmitter } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { request, type IncomingHttpHeaders, type Server } from 'node:http';
import { connect, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';
import { gunzipSync } from 'node:zlib';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Bundle } from '../src/lib/server/press/bundle.ts';
import { shelfOf } from '../src/lib/server/shelf/shelf.ts';
import { startServer, stopServer, type PageHandler } from './server.ts';

const HTML = `<!doctype html><p>about 68 megahertz</p>${' and so on'.repeat(100)}`;
const hash = (text: string) => createHash('sha256').update(text).digest('hex');

function bundle(slug: string): Bundle {
	const files = [
		{ key: `frames/${hash(HTML)}.html`, contentType: 'text/html; charset=utf-8', text: HTML },
		{ key: 'press/frame-abc.js', contentType: 'text/javascript; charset=utf-8', text: 'export {};' }
	].map(({ text, ...file }) => ({ ...file, bytes: Buffer.from(text), sha256: hash(text) }));
	return {
		digest: hash(HTML),
		files,
		manifest: {
			version: 1,
			slug,
			release: 2,
			releasedAt: '2026-12-15T10:00:00.000Z',
			digest: hash(HTML),
			page: `frames/${hash(HTML)}.html`,
			styles: ['sha256-abc='],
			files
		}
	};
}

const pages: PageHandler = (_request, response) => {
	response.writeHead(200, { 'Content-Type': 'text/plain' }).end('a page of the app');
};

let dataFolder: string;
let server: Server;
let port: number;

const settings = () => ({
	host: '127.0.0.1',
	port: 0,
	origin: 'http://localhost:4720',
	dataFolder,
	loadPages: async () => pages
});
const portOf = (listening: Server) => (listening.address() as AddressInfo).port;

beforeAll(async () => {
	dataFolder = await mkdtemp(join(tmpdir(), 'steelyard-server-'));
	await shelfOf(dataFolder).place(bundle('first-light'));
	server = await startServer(settings());
	port = portOf(server);
});
afterAll(async () => {
	await stopServer(server, 'test');
	await rm(dataFolder, { recursive: true });
});

interface Answer {
	status: number;
	headers: IncomingHttpHeaders;
	body: Buffer;
}

function ask(
	path: string,
	{ method = 'GET', headers = {} as Record<string, string>, at = port } = {}
): Promise<Answer> {
	return new Promise((resolve, reject) => {
		const asked = request({ host: '127.0.0.1', port: at, path, method, headers }, (response) => {
			const chunks: Buffer[] = [];
			response.on('data', (chunk) => chunks.push(chunk));
			response.on('end', () =>
				resolve({
					status: response.statusCode ?? 0,
					headers: response.headers,
					body: Buffer.concat(chunks)
				})
			);
		});
		asked.on('error', reject);
		asked.end();
	});
}

const POLICY =
	"default-src 'none'; script-src 'self'; style-src 'sha256-abc='; font-src 'self'; img-src 'self'; connect-src 'none'; base-uri 'none'; " +
	"form-action 'none'; object-src 'none'; frame-ancestors *; " +
	'sandbox allow-scripts allow-popups allow-popups-to-escape-sandbox; ' +
	"require-trusted-types-for 'script'; trusted-types svelte-trusted-html";

test.each(['/w/first-light/latest', '/w/first-light/2', '/w/first-light/latest?lang=en'])(
	'%s gives the frame with its headers, and no cookie',
	async (path) => {
		const { status, headers, body } = await ask(path);
		expect(status).toBe(200);
		expect(body.toString()).toBe(HTML);
		expect(headers).toMatchObject({
			'content-type': 'text/html; charset=utf-8',
			'content-security-policy': POLICY,
			'cross-origin-resource-policy': 'cross-origin',
			'cross-origin-embedder-policy': 'require-corp',
			'referrer-policy': 'no-referrer',
			'x-content-type-options': 'nosniff',
			'cache-control': 'public, max-age=60, stale-while-revalidate=300, stale-if-error=86400',
			vary: 'Accept-Encoding',
			link: '</w/first-light/latest>; rel="latest-version"'
		});
		expect(headers['permissions-policy']).toContain('camera=()');
		for (const name of [
			'set-cookie',
			'x-frame-options',
			'x-powered-by',
			'strict-transport-security'
		]) {
			expect(headers).not.toHaveProperty(name);
		}
	}
);

test('packed forms are given to those who take them, each with a tag of its own', async () => {
	const plain = await ask('/w/first-light/latest');
	const gzip = await ask('/w/first-light/latest', { headers: { 'Accept-Encoding': 'gzip' } });
	const br = await ask('/w/first-light/latest', { headers: { 'Accept-Encoding': 'gzip, br' } });
	expect(plain.headers['content-encoding']).toBeUndefined();
	expect(gunzipSync(gzip.body).toString()).toBe(HTML);
	expect(br.headers['content-encoding']).toBe('br');
	expect(new Set([plain, gzip, br].map(({ headers }) => headers.etag)).size).toBe(3);
});

test.each([
	(tag: string) => tag,
	(tag: string) => `W/${tag}`,
	(tag: string) => `"0123", ${tag.replace(/"$/, '-br"')}`,
	() => '*'
])('a reader who has it already gets 304 and no body', async (given) => {
	const { headers } = await ask('/w/first-light/latest');
	const again = await ask('/w/first-light/latest', {
		headers: { 'If-None-Match': given(headers.etag ?? '') }
	});
	expect(again.status).toBe(304);
	expect(again.body).toHaveLength(0);
	expect(again.headers['content-security-policy']).toBe(POLICY);
	expect(
		(await ask('/w/first-light/latest', { headers: { 'If-None-Match': '"abc"' } })).status
	).toBe(200);
});

test('HEAD gives the headers alone', async () => {
	const { status, headers, body } = await ask('/w/first-light/latest', { method: 'HEAD' });
	expect(status).toBe(200);
	expect(headers['content-length']).toBe(String(Buffer.byteLength(HTML)));
	expect(body).toHaveLength(0);
});

test('a script of the frame may be fetched from anywhere and kept for good', async () => {
	const { status, headers } = await ask('/press/frame-abc.js', { headers: { Origin: 'null' } });
	expect(status).toBe(200);
	expect(headers).toMatchObject({
		'content-type': 'text/javascript; charset=utf-8',
		'access-control-allow-origin': '*',
		'cross-origin-resource-policy': 'cross-origin',
		'content-security-policy': "default-src 'none'",
		'x-content-type-options': 'nosniff',
		'cache-control': 'public, max-age=31536000, immutable'
	});
});

test.each([
	'/w/nothing/latest',
	'/w/first-light/3',
	'/w/first-light/0',
	'/w/__proto__/latest',
	'/press/none.js'
])('%s is a courteous card, under the same policy', async (path) => {
	const { status, headers, body } = await ask(path);
	expect(status).toBe(404);
	expect(body.toString()).toContain('Nothing is published here');
	expect(headers['content-security-policy']).toContain('frame-ancestors *');
	expect(headers['cache-control']).toBe('no-store');
	const style = /<style>(.*?)<\/style>/.exec(body.toString())?.[1] ?? '';
	const styleHash = createHash('sha256').update(style).digest('base64');
	expect(headers['content-security-policy']).toContain(`'sha256-${styleHash}'`);
});

test.each(['POST', 'PUT', 'DELETE', 'OPTIONS'])('%s on a frame is refused', async (method) => {
	const { status, headers } = await ask('/w/first-light/latest', { method });
	expect(status).toBe(405);
	expect(headers.allow).toBe('GET, HEAD');
});

test.each([
	'/',
	'/w/first-light',
	'/w/first-light/__data.json',
	'/w/first-light/latest/more',
	'/press',
	'/desk'
])('%s goes to the app', async (path) => {
	expect((await ask(path)).body.toString()).toBe('a page of the app');
});

test('over https browsers are told to stay there', async () => {
	const secure = await startServer({ ...settings(), origin: 'https://w.varrowmere.example' });
	const { headers } = await ask('/w/first-light/latest', { at: portOf(secure) });
	expect(headers['strict-transport-security']).toBe('max-age=63072000; includeSubDomains');
	await stopServer(secure, 'test');
});

test('a taken port gives a sentence with the port and the setting, and the app is not opened', async () => {
	let opened = false;
	const second = startServer({
		...settings(),
		port,
		loadPages: async () => ((opened = true), pages)
	});
	await expect(second).rejects.toThrow(
		`Port ${port} is taken. Stop what listens there, or choose another with PORT.`
	);
	expect(opened).toBe(false);
});

test('an app that can’t start says so, and the port is free again', async () => {
	const failing = {
		...settings(),
		loadPages: () => Promise.reject(new Error('The data folder is held.'))
	};
	await expect(startServer(failing)).rejects.toThrow('The data folder is held.');
});

test('frames are answered while the app is still opening', async () => {
	let open: (handler: PageHandler) => void = () => undefined;
	const opening = new Promise<PageHandler>((resolve) => (open = resolve));
	let early = 0;
	const started = startServer({
		...settings(),
		port: 4721,
		loadPages: async () => {
			early = (await ask('/w/first-light/latest', { at: 4721 })).status;
			return opening;
		}
	});
	const page = new Promise<Answer>((resolve) =>
		setTimeout(() => resolve(ask('/desk', { at: 4721 })), 50)
	);
	setTimeout(() => open(pages), 150);
	expect((await page).body.toString()).toBe('a page of the app');
	expect(early).toBe(200);
	await stopServer(await started, 'test');
});

test('stopping waits for answers under way, then closes the app', async () => {
	const order: string[] = [];
	const slow: PageHandler = (_request, response) => {
		setTimeout(() => {
			order.push('answered');
			response.end('late');
		}, 120);
	};
	const stopping = await startServer({ ...settings(), loadPages: async () => slow });
	const events: EventEmitter = process;
	events.once('sveltekit:shutdown', async () => {
		await new Promise((resolve) => setTimeout(resolve, 20));
		order.push('closed');
	});
	const answer = ask('/slow', { at: portOf(stopping) });
	await new Promise((resolve) => setTimeout(resolve, 40));
	await stopServer(stopping, 'SIGTERM');
	expect((await answer).body.toString()).toBe('late');
	expect(order).toEqual(['answered', 'closed']);
});

test('a sender of half a header is not waited for without end', () => {
	expect(server.headersTimeout).toBe(10_000);
	expect(server.requestTimeout).toBe(30_000);
	expect(server.maxConnections).toBe(1_000);
});

test('nonsense on the wire gets 400 and harms nothing', async () => {
	const said = await new Promise<string>((resolve) => {
		const socket = connect(port, '127.0.0.1', () => socket.end('NOT HTTP\r\n\r\n'));
		let heard = '';
		socket.on('data', (chunk) => (heard += chunk.toString()));
		socket.on('close', () => resolve(heard));
	});
	expect(said).toMatch(/^HTTP\/1\.1 400/);
	expect((await ask('/w/first-light/latest')).status).toBe(200);
});
