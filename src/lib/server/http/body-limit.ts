/**
 * How much a request may send. The server in front takes as much as the largest of all: a picture. Everything else is
 * held to what JSON may have, also when it comes without saying how long it is.
 */
import { error } from '@sveltejs/kit';
import { explanations, type ErrorCode } from '../../errors.ts';
import { LARGEST_BYTES } from '../../pictures/view.ts';
import { WORD_FILE_LIMIT_BYTES } from '../word-files/limit.ts';
import { BODY_LIMIT_BYTES } from './json-body.ts';

interface Limit {
	bytes: number;
	/** What is said to one who sends more. */
	code: ErrorCode;
}

const JSON_LIMIT: Limit = { bytes: BODY_LIMIT_BYTES, code: 'too-large' };
/** Routes that a file may be posted to. */
const FILES: Readonly<Record<string, Limit>> = {
	'/api/pictures': { bytes: LARGEST_BYTES, code: 'picture-too-heavy' },
	'/api/import/word': { bytes: WORD_FILE_LIMIT_BYTES, code: 'word-file-too-heavy' }
};

/** For SvelteKit’s name of the route. */
export function bodyLimitOf(routeId: string | null, method: string): Limit {
	return (method === 'POST' && FILES[routeId ?? '']) || JSON_LIMIT;
}

/** The request with a body that ends in a 413 at the limit; the same request when its length is known. */
export function withinLimit(request: Request, limit: number): Request {
	if (!request.body || request.headers.has('content-length')) return request;
	const reader = request.body.getReader();
	let size = 0;
	const body = new ReadableStream<Uint8Array>({
		async pull(controller) {
			const { done, value } = await reader.read();
			size += value?.byteLength ?? 0;
			// The source isn’t cancelled: that would close the connection before the answer is out.
			if (size > limit) controller.error(tooLarge());
			else if (done) controller.close();
			else controller.enqueue(value);
		},
		cancel: (reason) => reader.cancel(reason)
	});
	return new Request(request, { body, duplex: 'half' } as RequestInit);
}

/** In SvelteKit’s own form, which it answers with the status, wherever the body is read. */
function tooLarge(): unknown {
	const { status, message, help } = explanations['too-large'];
	try {
		error(status, { message, help, code: 'too-large' });
	} catch (thrown) {
		return thrown;
	}
}
