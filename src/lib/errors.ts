/** Every failure a person can act on has one entry here: what happened, and what to do next. */
export const explanations = {
	'not-signed-in': {
		status: 401,
		message: 'You are not signed in.',
		help: 'Sign in and try again. What you typed is kept in this browser.'
	},
	'sign-in-failed': {
		status: 400,
		message: 'That e-mail and passphrase don’t go together.',
		help: 'Check both, or ask for a sign-in link instead.'
	},
	'sign-in-slowed': {
		status: 429,
		message: 'Too many tries in a short time.',
		help: 'Wait a quarter of an hour, or ask for a sign-in link instead.'
	},
	'links-slowed': {
		status: 429,
		message: 'Too many sign-in links were asked for.',
		help: 'Wait an hour, or sign in with your passphrase.'
	},
	'calculations-slowed': {
		status: 429,
		message: 'This network address has asked for 60 calculations within a minute.',
		help: 'Wait a minute. For many at once, run npm run calc from a checkout.'
	},
	'link-spent': {
		status: 400,
		message: 'This sign-in link has been used, or is older than ten minutes.',
		help: 'Ask for a new one, and open it in the same browser.'
	},
	'confirm-needed': {
		status: 403,
		message: 'A signature needs your passphrase, given within the last quarter of an hour.',
		help: 'Give it once more. What you were about to do is kept.'
	},
	'confirm-by-link': {
		status: 403,
		message:
			'A signature needs a sign-in from the last quarter of an hour, and you have no passphrase.',
		help: 'Sign out, sign in again by link, and come back. Nothing was signed or passed.'
	},
	'not-permitted': {
		status: 403,
		message: 'Your role doesn’t allow this.',
		help: 'Ask a colleague whose role does.'
	},
	'same-person-twice': {
		status: 403,
		message: 'Writer, checker and editor of one proof are three people.',
		help: 'Someone who hasn’t written or checked this proof must do this.'
	},
	'own-proposal': {
		status: 403,
		message: 'You proposed this revision yourself.',
		help: 'A second scientist signs it.'
	},
	'not-found': {
		status: 404,
		message: 'There is nothing at this address.',
		help: 'Look for it from the desk.'
	},
	'version-conflict': {
		status: 409,
		message: 'Someone else saved this piece while you were writing.',
		help: 'Load their version, or keep yours as the newest. Both are kept.'
	},
	'document-broken': {
		status: 422,
		message: 'This document doesn’t hang together.',
		help: 'What was kept before is untouched. If you have just changed something, undo it; if not, tell the house’s admin.'
	},
	'slug-taken': {
		status: 409,
		message: 'Another piece has this slug.',
		help: 'Choose another short name.'
	},
	'proof-not-ready': {
		status: 409,
		message: 'A proof can’t be pulled yet.',
		help: 'See to what is listed, then pull it again.'
	},
	'proof-superseded': {
		status: 409,
		message: 'A newer proof has been pulled since.',
		help: 'Reload to see the newest proof.'
	},
	'claim-tips': {
		status: 409,
		message: 'This claim tips: the words don’t fit the reading.',
		help: 'Query it, so that the writer can change the words or the reading.'
	},
	'claim-unweighed': {
		status: 409,
		message: 'This claim hangs on no reading, so there is nothing to sign.',
		help: 'Query it, so that the writer ties it to a reading.'
	},
	'query-open': {
		status: 409,
		message: 'This claim has an open query.',
		help: 'Settle the query first.'
	},
	'query-closed': {
		status: 409,
		message: 'This query is closed.',
		help: 'Raise a new one if something is still unclear.'
	},
	'conditions-open': {
		status: 409,
		message: 'The proof can’t be passed yet.',
		help: 'Each open condition says how to clear it.'
	},
	'check-moved': {
		status: 409,
		message: 'A signature or the pass has changed while this was being released.',
		help: 'Nothing was released. Look it over, then release it again.'
	},
	'already-released': {
		status: 409,
		message: 'This proof is already released.',
		help: 'Pull a new proof to release a new version.'
	},
	'calculator-broken': {
		status: 422,
		message: 'This calculator doesn’t hold yet.',
		help: 'Each problem is named beside its field. What you wrote is kept.'
	},
	'calculator-id-taken': {
		status: 409,
		message: 'Another calculator has this short name.',
		help: 'Choose another, or revise the one that has it.'
	},
	'revision-too-small': {
		status: 409,
		message: 'This change is larger than it is labelled.',
		help: 'Label it as what it is; widgets that use the calculator are checked again.'
	},
	'revision-superseded': {
		status: 409,
		message: 'Someone else has proposed a newer revision meanwhile.',
		help: 'Open the newest one, and make your change on it.'
	},
	'vetting-out-of-order': {
		status: 409,
		message: 'This revision doesn’t stand where it could take this step.',
		help: 'Reload the card to see where it stands.'
	},
	'store-away': {
		status: 503,
		message: 'The store for published pieces doesn’t answer.',
		help: 'Nothing was published. Try again in a minute.'
	},
	'input-broken': {
		status: 422,
		message: 'Some of what was sent can’t be read.',
		help: 'Each problem is named beside its field.'
	},
	'too-large': {
		status: 413,
		message: 'This is larger than the house takes.',
		help: 'Send less than 512 kilobytes at once.'
	}
} satisfies Record<string, { status: number; message: string; help: string }>;

export type ErrorCode = keyof typeof explanations;

/** Thrown by services; routes turn it into an answer. Anything else thrown is a bug. */
export class SteelyardError extends Error {
	constructor(
		readonly code: ErrorCode,
		/** What the sentence alone can't say: field issues, current versions, open conditions. */
		readonly details: Record<string, unknown> = {}
	) {
		super(explanations[code].message);
		this.name = 'SteelyardError';
	}
}
