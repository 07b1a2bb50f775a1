import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { daybook } from '../db/schema/index.ts';

export type DaybookEvent =
	| 'piece-created'
	| 'slip-changed'
	| 'piece-spiked'
	| 'piece-recovered'
	| 'draft-first-changed'
	| 'draft-named'
	| 'draft-restored'
	| 'proof-pulled'
	| 'claim-signed'
	| 'signature-taken-back'
	| 'query-raised'
	| 'query-answered'
	| 'query-closed'
	| 'proof-passed'
	| 'pass-dropped'
	| 'proof-released'
	| 'calculator-proposed'
	| 'calculator-vetted'
	| 'calculator-withdrawn'
	| 'formula-vetted'
	| 'formula-vetting-taken-back'
	| 'picture-added'
	| 'picture-recorded'
	| 'picture-replaced'
	| 'picture-deleted'
	| 'calculator-retested'
	| 'signed-in'
	| 'signed-out'
	| 'passphrase-confirmed'
	| 'person-added'
	| 'roles-changed'
	| 'person-disabled'
	| 'theme-saved'
	| 'theme-deleted';

/** Writes one line in the daybook, in the transaction of what it tells about. Details hold ids and numbers, never copy. */
export async function record(
	tx: Db,
	{ actor, now }: Pick<Context, 'actor' | 'now'>,
	event: DaybookEvent,
	about: { pieceId?: string; personId?: string; [detail: string]: unknown }
): Promise<void> {
	const { pieceId, personId, ...details } = about;
	await tx.insert(daybook).values({
		at: now,
		personId: personId ?? actor?.personId ?? null,
		event,
		pieceId: pieceId ?? null,
		details
	});
}
