/** From a SteelyardError to an answer. Anything else is a bug and goes on to `handleError`. */
import { error, fail, type ActionFailure } from '@sveltejs/kit';
import { explanations, SteelyardError } from '../../errors.ts';
import type { ErrorCode } from '../../errors.ts';

export interface Failure {
	code: ErrorCode;
	message: string;
	help: string;
}

export function failureOf({ code }: SteelyardError): Failure {
	const { message, help } = explanations[code];
	return { code, message, help };
}

/** Details are for the services. What of them a client needs is listed here, and nothing else leaves the house. */
const TOLD: Partial<Record<ErrorCode, readonly string[]>> = {
	'version-conflict': ['version', 'savedAt', 'savedBy', 'document'],
	'slip-changed': ['slip'],
	'document-broken': ['issues'],
	'input-broken': ['issues'],
	'picture-refused': ['why', 'says', 'mend'],
	'picture-not-ready': ['findings'],
	'picture-used': ['uses'],
	'picture-changed': ['picture'],
	'word-file-refused': ['why', 'says', 'mend'],
	'theme-fails': ['problems']
};

function toldOf({ code, details }: SteelyardError): Record<string, unknown> {
	const told = TOLD[code] ?? [];
	return Object.fromEntries(Object.entries(details).filter(([name]) => told.includes(name)));
}

/** For loads: `await getPiece(…).catch(pageFailure)`. */
export function pageFailure(thrown: unknown): never {
	if (!(thrown instanceof SteelyardError)) throw thrown;
	const { status, message, help } = explanations[thrown.code];
	error(status, { message, help, code: thrown.code });
}

/** For form actions: keeps what was typed in `form`, with the sentence and its mend beside it. */
export function formFailure<Form extends Record<string, unknown>>(
	form: Form,
	thrown: unknown
): ActionFailure<{ form: Form; failure: Failure }> {
	if (!(thrown instanceof SteelyardError)) throw thrown;
	return fail(explanations[thrown.code].status, { form, failure: failureOf(thrown) });
}

/** For JSON endpoints. */
export function apiFailure(thrown: unknown): Response {
	if (!(thrown instanceof SteelyardError)) throw thrown;
	const headers = new Headers();
	const { retryAfterSeconds } = thrown.details;
	if (typeof retryAfterSeconds === 'number') headers.set('Retry-After', String(retryAfterSeconds));
	return Response.json(
		{ error: { ...failureOf(thrown), details: toldOf(thrown) } },
		{ status: explanations[thrown.code].status, headers }
	);
}
