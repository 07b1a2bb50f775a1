/** Mail is a row, written in the transaction of what it tells about; jobs/sender.ts takes it from there. */
import type { Db } from '../db/client.ts';
import { outbox } from '../db/schema/index.ts';

/** Every kind of mail, with what its template needs. Values are names, slugs and ids: never copy, never a secret. */
export type Mail =
	| { event: 'sign-in-link'; input: { linkId: string } }
	| { event: 'query-raised'; input: { slug: string; title: string; by: string; claim: string } }
	| { event: 'query-answered'; input: { slug: string; title: string; by: string; claim: string } }
	| {
			event: 'calculator-flagged';
			input: {
				calculator: string;
				title: string;
				revision: string;
				state: 'withdrawn' | 'superseded';
				by: string;
				/** Slugs, with commas between them. */
				pieces: string;
			};
	  };

export interface Addressee {
	name: string;
	email: string;
}

/** `goodUntil`: when the letter is of no use any more, and isn't sent. */
export async function queueMail(
	tx: Db,
	now: Date,
	to: Addressee,
	mail: Mail,
	goodUntil: Date | null = null
): Promise<void> {
	await tx.insert(outbox).values({
		event: mail.event,
		toName: to.name,
		toAddress: to.email,
		input: mail.input,
		createdAt: now,
		dueAt: now,
		goodUntil
	});
}
