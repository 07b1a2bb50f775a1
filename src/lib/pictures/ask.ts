/** Asks the picture desk’s addresses; a failure comes back as the sentence to show. */
import { explanations, type ErrorCode } from '../errors.ts';
import { routes } from '../routes.ts';
import type { ShownFailure } from '../ui/failure.ts';
import type { PictureFinding, PictureRecord } from './record.ts';
import type { PictureView } from './view.ts';

export type Answered<T> =
	{ ok: true; value: T } | { ok: false; failure: ShownFailure; details: FailureDetails };

/** What an answer carries beside its sentence. */
export interface FailureDetails {
	says?: string;
	mend?: string;
	issues?: { path: string; message: string }[];
	findings?: PictureFinding[];
	/** As someone else left it meanwhile. */
	picture?: PictureView;
}

interface Refusal {
	error?: Partial<ShownFailure> & { details?: FailureDetails };
}

/** A failure with a code of the house, in the house’s words. */
export function failureOf(code: ErrorCode): ShownFailure {
	const { message, help } = explanations[code];
	return { code, message, help };
}

export const AWAY: ShownFailure = {
	code: 'away',
	message: 'The house doesn’t answer.',
	help: 'What you typed stands here still. Try again when the connection is back.'
};

/** The refusal in an answer’s text: a picture’s own sentence, when it has one. */
export function refusalIn(text: string): Answered<never> {
	let error: Refusal['error'];
	try {
		error = (JSON.parse(text) as Refusal).error;
	} catch {
		error = undefined; // something in between answered, in its own words
	}
	const details = error?.details ?? {};
	const message = details.says ?? error?.message;
	if (message === undefined) return { ok: false, failure: AWAY, details };
	const help = details.mend ?? error?.help ?? '';
	return { ok: false, failure: { code: error?.code ?? '', message, help }, details };
}

async function ask<T>(address: string, method = 'GET', body?: unknown): Promise<Answered<T>> {
	try {
		const response = await fetch(address, {
			method,
			...(body === undefined
				? {}
				: { headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) })
		});
		const text = await response.text();
		if (!response.ok) return refusalIn(text);
		return { ok: true, value: (text === '' ? null : JSON.parse(text)) as T };
	} catch {
		return { ok: false, failure: AWAY, details: {} };
	}
}

export const askPictures = () => ask<{ pictures: PictureView[] }>(routes.api.pictures());

export const sendRecord = (id: string, baseVersion: number, record: PictureRecord) =>
	ask<{ picture: PictureView }>(routes.api.picture(id), 'PUT', { baseVersion, record });

export const sendReplacement = (id: string, by: string) =>
	ask<{ drafts: string[] }>(routes.api.replacePicture(id), 'POST', { by });

export const sendDeletion = (id: string) => ask<null>(routes.api.picture(id), 'DELETE');
