/** Answers readers from the shelf: two look-ups and a write, before any other code of the app is asked. */
import type { IncomingMessage, ServerResponse } from 'node:http';
import { acceptedEncoding } from './encodings.ts';
import {
	ASSET_CACHE,
	ASSET_HEADERS,
	FRAME_CACHE,
	frameHeaders,
	HTTPS_ONLY,
	type Headers
} from './frame-headers.ts';
import { CARD_STYLES, METHOD_CARD, MISSING_CARD } from './missing-card.ts';
import type { ReleaseShelf, ShelfFile, ShelfPage } from './shelf.ts';

const FRAME = /^\/w\/([^/]+)\/(latest|\d{1,9})$/;
const ASSET = /^\/press\/([^/]+)$/;

export type Answer = (request: IncomingMessage, response: ServerResponse) => boolean;

/** False when the address isn't one of the shelf's, and nothing was written. */
export function shelfAnswers(shelf: ReleaseShelf, { https }: { https: boolean }): Answer {
	const transport = https ? HTTPS_ONLY : {};
	const cardHeaders = { ...frameHeaders(CARD_STYLES), ...transport, 'Cache-Control': 'no-store' };
	const assetHeaders = { ...ASSET_HEADERS, ...transport, 'Cache-Control': ASSET_CACHE };
	const pageHeaders = new WeakMap<ShelfPage, Headers>();

	function headersOf(page: ShelfPage): Headers {
		let headers = pageHeaders.get(page);
		if (!headers) {
			headers = {
				...frameHeaders(page.styles),
				...transport,
				'Cache-Control': FRAME_CACHE,
				Link: `</w/${page.slug}/latest>; rel="latest-version"`
			};
			pageHeaders.set(page, headers);
		}
		return headers;
	}

	return (request, response) => {
		const path = (request.url ?? '').split('?', 1)[0] ?? '';
		const frame = path.startsWith('/w/') ? FRAME.exec(path) : null;
		const asset = frame ? null : path.startsWith('/press/') ? ASSET.exec(path) : null;
		if (!frame && !asset) return false;

		if (request.method !== 'GET' && request.method !== 'HEAD') {
			sendCard(request, response, 405, METHOD_CARD, { ...cardHeaders, Allow: 'GET, HEAD' });
			return true;
		}
		const [, slug = '', release = ''] = frame ?? [];
		const found = frame && shelf.find(slug, release === 'latest' ? release : Number(release));
		const page = found && shelf.themes.dress(found, request.url ?? '');
		const file = page ?? (asset && shelf.asset(asset[1] ?? ''));
		if (page) sendFile(request, response, page, headersOf(page));
		else if (file) sendFile(request, response, file, assetHeaders);
		else sendCard(request, response, 404, MISSING_CARD, cardHeaders);
		return true;
	};
}

function sendFile(
	request: IncomingMessage,
	response: ServerResponse,
	file: ShelfFile,
	headers: Headers
): void {
	const encoding = acceptedEncoding(header(request, 'accept-encoding'));
	const packed = encoding && file.packed[encoding];
	const body = packed ?? file.plain;
	// Each form is a representation of its own; the tag says which.
	const tag = `"${file.sha256.slice(0, 32)}${packed ? `-${encoding}` : ''}"`;
	const varied = { ...headers, ETag: tag, Vary: 'Accept-Encoding' };
	if (matches(request.headers['if-none-match'], file.sha256.slice(0, 32))) {
		response.writeHead(304, varied).end();
		return;
	}
	response.writeHead(200, {
		...varied,
		'Content-Type': file.contentType,
		'Content-Length': body.length,
		...(packed ? { 'Content-Encoding': encoding } : {})
	});
	response.end(request.method === 'HEAD' ? undefined : body);
}

/** Weak comparison: any form of the same bytes will do, since the browser has it unpacked. */
function matches(given: string | undefined, tag: string): boolean {
	if (!given) return false;
	if (given.trim() === '*') return true;
	return given
		.split(',')
		.some((each) => /^(?:W\/)?"([0-9a-f]+)(?:-[a-z]+)?"$/.exec(each.trim())?.[1] === tag);
}

function sendCard(
	request: IncomingMessage,
	response: ServerResponse,
	status: number,
	card: Buffer,
	headers: Headers
): void {
	response.writeHead(status, {
		...headers,
		'Content-Type': 'text/html; charset=utf-8',
		'Content-Length': card.length
	});
	response.end(request.method === 'HEAD' ? undefined : card);
}

function header(request: IncomingMessage, name: string): string | undefined {
	const value = request.headers[name];
	return Array.isArray(value) ? value.join(',') : value;
}
