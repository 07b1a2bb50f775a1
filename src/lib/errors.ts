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
		help: 'Bring yours together with theirs, and save on their version. Both are kept.'
	},
	'slip-changed': {
		status: 409,
		message: 'Someone else has changed this slip meanwhile.',
		help: 'Look at what it says now, then change it again.'
	},
	'piece-spiked': {
		status: 403,
		message: 'This piece is on the spike.',
		help: 'Take it off the spike at the desk, then go on. Nothing of it is lost.'
	},
	'piece-out': {
		status: 409,
		message: 'This piece has been released, so it can’t be spiked.',
		help: 'Readers may have it open. Change it, or leave it as it stands.'
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
	'formula-broken': {
		status: 409,
		message: 'This formula doesn’t hold any more.',
		help: 'The writer mends it on the bench, and pulls a new proof.'
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
	'picture-refused': {
		status: 422,
		message: 'This file can’t be taken as a picture.',
		help: 'What is wrong, and how to mend it, stands beside the file.'
	},
	'picture-too-heavy': {
		status: 413,
		message: 'This file is larger than 10 MB.',
		help: 'Make the picture smaller in a picture program, or save it as JPEG or WebP.'
	},
	'picture-cut-off': {
		status: 400,
		message: 'The file stopped coming before it was whole.',
		help: 'Nothing of it is kept. Send it again.'
	},
	'pictures-slowed': {
		status: 429,
		message: 'Many pictures are coming in at once.',
		help: 'Wait a few seconds and send this one again.'
	},
	'pictures-full': {
		status: 409,
		message: 'You have brought 500 pictures to the desk, which is as many as one person may.',
		help: 'Delete some that aren’t used, or ask a colleague to add this one.'
	},
	'picture-changed': {
		status: 409,
		message: 'Someone else has changed this picture’s record meanwhile.',
		help: 'Look at what they wrote, then save yours again if it still holds.'
	},
	'picture-not-ready': {
		status: 409,
		message: 'This picture’s record isn’t complete.',
		help: 'Fill in what is listed, then use it.'
	},
	'picture-used': {
		status: 409,
		message: 'This picture is used.',
		help: 'Take it out of the drafts that are listed, or replace it. What is in proofs and releases stays for good.'
	},
	'picture-missing': {
		status: 409,
		message: 'A picture of this piece is no longer at the picture desk.',
		help: 'Put another in its place in the manuscript, and pull a new proof.'
	},
	'word-file-refused': {
		status: 422,
		message: 'This file can’t be brought in.',
		help: 'What is wrong, and how to mend it, stands beside the file.'
	},
	'word-file-too-heavy': {
		status: 413,
		message: 'This file is larger than 5 MB.',
		help: 'Save it without its pictures, or paste the text into the manuscript.'
	},
	'word-files-slowed': {
		status: 429,
		message: 'Two files are being read already.',
		help: 'Wait a few seconds and send this one again.'
	},
	'theme-fails': {
		status: 422,
		message: 'This theme can’t be read well enough.',
		help: 'Each pair that fails is named, with the nearest colour that would do.'
	},
	'theme-name-taken': {
		status: 409,
		message: 'Another theme has this name.',
		help: 'Choose another name.'
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
