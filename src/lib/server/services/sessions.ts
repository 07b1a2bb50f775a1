/** Sessions are rows: a request is only as signed in as its row says at that moment. */
import { and, eq, isNull } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { Actor } from '../../workflow/permissions.ts';
import type { Context, SessionInfo } from '../context.ts';
import type { Db } from '../db/client.ts';
import { people, sessions } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { readActor } from './people.ts';
import { revokeSession } from './session-end.ts';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;

/** A session ends after 8 hours of rest, and after 7 days in any case. */
export const IDLE_MS = 8 * HOUR;
export const ABSOLUTE_MS = 7 * 24 * HOUR;
/** Signing and passing want a sign-in no older than this. */
export const FRESH_MS = 15 * MINUTE;
/** lastSeenAt is written at most this often. */
const SEEN_EVERY_MS = MINUTE;

/** Opens a session for someone who has just proved who they are. */
export async function openSession(tx: Db, now: Date, personId: string): Promise<SessionInfo> {
	const [session] = await tx
		.insert(sessions)
		.values({
			personId,
			createdAt: now,
			lastSeenAt: now,
			expiresAt: new Date(now.getTime() + ABSOLUTE_MS),
			freshAt: now
		})
		.returning({ id: sessions.id, freshAt: sessions.freshAt });
	if (!session) throw new Error('The database took a session and gave back no id.');
	return session;
}

/** Who a session belongs to, with today's roles; null when it is unknown, revoked or over, or its person is gone. */
export async function readSession(
	db: Db,
	now: Date,
	sessionId: string
): Promise<{ actor: Actor; session: SessionInfo } | null> {
	const [row] = await db
		.select()
		.from(sessions)
		.where(and(eq(sessions.id, sessionId), isNull(sessions.revokedAt)));
	if (!row || row.expiresAt <= now || row.lastSeenAt.getTime() + IDLE_MS <= now.getTime())
		return null;
	const actor = await readActor(db, row.personId);
	if (!actor) return null;
	if (now.getTime() - row.lastSeenAt.getTime() >= SEEN_EVERY_MS) {
		await db.update(sessions).set({ lastSeenAt: now }).where(eq(sessions.id, row.id));
	}
	return { actor, session: { id: row.id, freshAt: row.freshAt } };
}

/** Ends the session the request came with; a copied cookie is dead from then on. */
export async function signOut(ctx: Context): Promise<void> {
	const { session } = ctx;
	if (!session) return;
	await ctx.db.transaction(async (tx) => {
		await revokeSession(tx, ctx.now, session.id);
		await record(tx, ctx, 'signed-out', {});
	});
}

export function isFresh({ session, now }: Pick<Context, 'session' | 'now'>): boolean {
	return session !== null && now.getTime() - session.freshAt.getTime() <= FRESH_MS;
}

/**
 * A signature means something only when the person has just shown that it's them. Throws `confirm-needed`, or
 * `confirm-by-link` for someone who has no passphrase to give.
 */
export async function requireFresh(
	ctx: Pick<Context, 'actor' | 'session' | 'now'>,
	tx: Db
): Promise<void> {
	if (isFresh(ctx)) return;
	const [person] = ctx.actor
		? await tx
				.select({ passphraseHash: people.passphraseHash })
				.from(people)
				.where(eq(people.id, ctx.actor.personId))
		: [];
	throw new SteelyardError(person?.passphraseHash ? 'confirm-needed' : 'confirm-by-link');
}
