/** Answers of the public API: any origin may read them, none sends credentials along. */
import { explanations, SteelyardError } from '../../errors.ts';

const OPEN = { 'access-control-allow-origin': '*' };

export function publicJson(
	body: unknown,
	init: { status?: number; headers?: Record<string, string> } = {}
): Response {
	return Response.json(body, { status: init.status ?? 200, headers: { ...OPEN, ...init.headers } });
}

/** What a browser asks before it sends JSON from another origin. */
export function preflight(methods: string): Response {
	return new Response(null, {
		status: 204,
		headers: {
			...OPEN,
			'access-control-allow-methods': methods,
			'access-control-allow-headers': 'content-type',
			'access-control-max-age': '86400'
		}
	});
}

/** A request that couldn't be read, in the words the calculators refuse with. */
export function publicRefusal(thrown: unknown): Response {
	if (!(thrown instanceof SteelyardError)) throw thrown;
	const { status, message, help } = explanations[thrown.code];
	const { retryAfterSeconds } = thrown.details;
	const issues = Array.isArray(thrown.details.issues) ? thrown.details.issues : [];
	const told = issues.map((issue: { message: string }) => issue.message).join(' ');
	return publicJson(
		{ refused: { code: thrown.code, message: told || `${message} ${help}` } },
		{
			status,
			headers:
				typeof retryAfterSeconds === 'number' ? { 'retry-after': String(retryAfterSeconds) } : {}
		}
	);
}
