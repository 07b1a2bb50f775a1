import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';

/**
 * Runs one decision in one transaction, then wakes the mail sender if the decision queued mail. The work gets `tx` and
 * must use nothing else to reach the database: there is one connection, and asking it from outside waits for ever.
 */
export async function inTransaction<T>(ctx: Context, work: (tx: Db) => Promise<T>): Promise<T> {
	const done = await ctx.db.transaction((tx) => work(tx));
	ctx.mail.wake();
	return done;
}
