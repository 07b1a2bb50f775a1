/**
 * One HTTP server for both: published frames are answered from the shelf, at once and without the database; everything
 * else waits for SvelteKit's pages.
 */
import type { EventEmitter } from 'node:events';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import process from 'node:process';
import { shelfAnswers } from '../src/lib/server/shelf/answer.ts';
import { shelfOf } from '../src/lib/server/shelf/shelf.ts';

export type PageHandler = (request: IncomingMessage, response: ServerResponse) => void;

export interface ServerSettings {
	host: string;
	port: number;
	/** The address people type; its scheme decides whether browsers are told to stay with https. */
	origin: string;
	dataFolder: string;
	/** Opens the app; rejects when it can't start. */
	loadPages(): Promise<PageHandler>;
}

/** Limits on slow and greedy clients, in milliseconds and counts. */
const HEADERS_TIMEOUT = 10_000;
const REQUEST_TIMEOUT = 30_000;
const CONNECTIONS = 1_000;
const REQUESTS_PER_CONNECTION = 10_000;
/** How long answers under way may take once the server is told to stop. */
const DRAIN = 10_000;

/** Resolves when both frames and pages answer. Rejects with a sentence when the port is taken or the app can't start. */
export async function startServer(settings: ServerSettings): Promise<Server> {
	const shelf = shelfOf(settings.dataFolder);
	const report = await shelf.load();
	if (report.damaged.length > 0) {
		process.stderr.write(
			`Published copies on disk can’t be used and wait for the store: ${report.damaged.join(', ')}\n`
		);
	}
	const answerFromShelf = shelfAnswers(shelf, { https: settings.origin.startsWith('https:') });

	let pages: Promise<PageHandler> | undefined;
	const guarded = guardHeaders(settings.origin);
	const server = createServer((request, response) => {
		if (answerFromShelf(request, response)) return;
		response.setHeaders(guarded);
		Promise.resolve(pages).then(
			(handler) => (handler ? handler(request, response) : unavailable(response)),
			() => unavailable(response)
		);
	});
	server.headersTimeout = HEADERS_TIMEOUT;
	server.requestTimeout = REQUEST_TIMEOUT;
	server.maxConnections = CONNECTIONS;
	server.maxRequestsPerSocket = REQUESTS_PER_CONNECTION;

	// The port first: a second instance must end before it touches the data.
	await listen(server, settings);
	try {
		pages = settings.loadPages();
		await pages;
	} catch (error) {
		server.close();
		server.closeAllConnections();
		throw error;
	}
	return server;
}

/**
 * What even a static file or a fault is answered with: the app's pages put their own policy over it.
 * Files under /_app and /static are answered before the app's hooks run.
 */
function guardHeaders(origin: string): Map<string, string> {
	const headers = new Map([
		['Content-Security-Policy', "default-src 'none'; frame-ancestors 'none'"],
		['Cross-Origin-Resource-Policy', 'same-origin'],
		['Referrer-Policy', 'no-referrer'],
		['X-Content-Type-Options', 'nosniff'],
		['X-Frame-Options', 'DENY']
	]);
	if (origin.startsWith('https:')) {
		headers.set('Strict-Transport-Security', 'max-age=63072000; includeSubDomains');
	}
	return headers;
}

function unavailable(response: ServerResponse): void {
	response.writeHead(503, {
		'Content-Type': 'text/plain; charset=utf-8',
		'Retry-After': '2',
		'Cache-Control': 'no-store'
	});
	response.end('Starting. Try again in a moment.\n');
}

function listen(server: Server, { host, port }: ServerSettings): Promise<void> {
	return new Promise((resolve, reject) => {
		server.once('error', (error: NodeJS.ErrnoException) =>
			reject(new Error(listenSentence(error, host, port)))
		);
		server.listen(port, host, () => {
			server.removeAllListeners('error');
			resolve();
		});
	});
}

function listenSentence(error: NodeJS.ErrnoException, host: string, port: number): string {
	switch (error.code) {
		case 'EADDRINUSE':
			return `Port ${port} is taken. Stop what listens there, or choose another with PORT.`;
		case 'EACCES':
			return `Port ${port} may not be used by this account. Choose one above 1023 with PORT.`;
		case 'EADDRNOTAVAIL':
		case 'ENOTFOUND':
			return `This computer has no address ${host}. Choose another with HOST.`;
		default:
			return `The server can’t listen on ${host}:${port}: ${error.message}`;
	}
}

/** Stops taking connections, lets answers under way finish, closes the app, and resolves when all of it is done. */
export async function stopServer(server: Server, reason: string): Promise<void> {
	const closed = new Promise<void>((resolve) => server.close(() => resolve()));
	const idle = setInterval(() => server.closeIdleConnections(), 50);
	const late = setTimeout(() => server.closeAllConnections(), DRAIN);
	await closed;
	clearInterval(idle);
	clearTimeout(late);
	// The adapter's own event, awaited: the database is closed by one of its listeners.
	const events: EventEmitter = process;
	const closing = events.listeners('sveltekit:shutdown');
	events.removeAllListeners('sveltekit:shutdown');
	await Promise.allSettled(closing.map(async (close) => close(reason)));
}

/** SIGTERM and SIGINT stop the server in order; a second one ends the process there and then. */
export function stopOnSignals(server: Server): void {
	let stopping = false;
	for (const signal of ['SIGTERM', 'SIGINT'] as const) {
		process.on(signal, () => {
			if (stopping) process.exit(1);
			stopping = true;
			void stopServer(server, signal).then(() => process.exit(0));
		});
	}
}
