/** Reads a JSON body without trusting it: type, size and depth first, then the parser. */
import type { ZodType } from 'zod';
import { SteelyardError } from '../../errors.ts';

export const BODY_LIMIT_BYTES = 512 * 1024;
/** A document with the deepest formula that may stand in it, and some. */
const DEEPEST = 80;

/** Throws `input-broken` or `too-large`, never a parser's error. */
export async function readJson(request: Request): Promise<unknown> {
	const type = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase();
	if (type !== 'application/json')
		throw broken('Send JSON, with the content type application/json.');
	const text = await readText(request);
	if (depthOf(text) > DEEPEST) throw broken(`This is nested deeper than ${DEEPEST} levels.`);
	try {
		return JSON.parse(text) as unknown;
	} catch (error) {
		throw broken(
			`This isn’t JSON: ${error instanceof Error ? error.message : 'it can’t be read'}.`
		);
	}
}

function broken(message: string): SteelyardError {
	return new SteelyardError('input-broken', { issues: [{ path: '', message }] });
}

/** The body as text; stops reading at the limit, whatever Content-Length says. */
async function readText(request: Request): Promise<string> {
	if (Number(request.headers.get('content-length')) > BODY_LIMIT_BYTES)
		throw new SteelyardError('too-large');
	const chunks: Uint8Array[] = [];
	let size = 0;
	try {
		for await (const chunk of request.body ?? []) {
			size += chunk.byteLength;
			if (size > BODY_LIMIT_BYTES) throw new SteelyardError('too-large');
			chunks.push(chunk);
		}
	} catch (error) {
		// The server has a limit of its own, which ends the stream with a 413.
		if (error instanceof Error && 'status' in error && error.status === 413)
			throw new SteelyardError('too-large');
		throw error;
	}
	try {
		return new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(chunks));
	} catch {
		throw broken('The text isn’t UTF-8.');
	}
}

/**
 * How deep brackets nest outside strings. A hundred thousand levels parse without trouble and overflow the stack when
 * they are written out again, so they are counted before parsing.
 */
export function depthOf(json: string): number {
	let depth = 0;
	let deepest = 0;
	for (let at = 0; at < json.length; at += 1) {
		const character = json[at];
		if (character === '"') at = endOfString(json, at);
		else if (character === '{' || character === '[') deepest = Math.max(deepest, ++depth);
		else if (character === '}' || character === ']') depth -= 1;
	}
	return deepest;
}

function endOfString(json: string, start: number): number {
	for (let at = start + 1; at < json.length; at += 1) {
		if (json[at] === '\\') at += 1;
		else if (json[at] === '"') return at;
	}
	return json.length;
}

/** The body in the schema's shape; throws `input-broken` with each issue named by its path. */
export function shaped<T>(schema: ZodType<T>, body: unknown): T {
	const read = schema.safeParse(body);
	if (read.success) return read.data;
	throw new SteelyardError('input-broken', {
		issues: read.error.issues.map(({ path, message }) => ({ path: path.join('.'), message }))
	});
}
