/** Why the plate that signs isn't there: one sentence, or null when this person may sign this claim now. */
import type { Denial } from '$lib/workflow/permissions.ts';
import type { ClaimView } from '$lib/workflow/piece.ts';

export function whyNotSigned(
	claim: Pick<ClaimView, 'state' | 'form' | 'verdict' | 'label'>,
	refused: Denial | null,
	signedByViewer: boolean
): string | null {
	if (refused === 'same-person-twice') {
		return 'You wrote on this proof, so another scientist signs it. Writer, checker and editor are three people.';
	}
	if (refused === 'not-permitted')
		return 'Scientists sign claims. You can query them, and answer queries.';
	if (claim.form === 'exempt') return 'Nothing to sign: the writer has marked this as no claim.';
	if (signedByViewer) return `You have signed ${claim.label}.`;
	if (claim.state === 'queried')
		return 'This claim has an open query. It can be signed when that is settled.';
	if (claim.verdict.verdict === 'tips') {
		return 'This claim tips, so it can’t be signed. Query it, and the writer can change the words or the reading.';
	}
	if (claim.verdict.verdict === 'unweighed') {
		return 'This number hangs on no reading, so it can’t be signed. Query it, and the writer can tie it.';
	}
	return null;
}
