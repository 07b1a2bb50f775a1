/** A revoked session is dead at its next request, whoever holds its cookie. */
import { and, eq, isNull } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { sessions } from '../db/schema/index.ts';

export async function revokeSession(tx: Db, now: Date, sessionId: string): Promise<void> {
	await tx
		.update(sessions)
		.set({ revokedAt: now })
		.where(and(eq(sessions.id, sessionId), isNull(sessions.revokedAt)));
}

/** Ends every session of a person. */
export async function revokeSessions(tx: Db, now: Date, personId: string): Promise<void> {
	await tx
		.update(sessions)
		.set({ revokedAt: now })
		.where(and(eq(sessions.personId, personId), isNull(sessions.revokedAt)));
}
