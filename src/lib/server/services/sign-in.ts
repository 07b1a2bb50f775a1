/** Proving who one is: by passphrase, or by a link sent to one's mailbox. */
import { and, eq, isNull } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { derivedToken, sha256 } from '../auth/hashes.ts';
import { passphraseFits } from '../auth/passphrase.ts';
import type { Context, SessionInfo } from '../context.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/ids.ts';
import { people, sessions, signInLinks } from '../db/schema/index.ts';
import { queueMail } from '../mail/outbox.ts';
import { record } from './daybook.ts';
import { normalEmail } from './people.ts';
import { revokeSession } from './session-end.ts';
import { openSession } from './sessions.ts';
import {
	countLinkWish,
	countPassphraseTry,
	forgetTry,
	markRight,
	recordLinkSignIn
} from './sign-in-limits.ts';
import { inTransaction } from './transaction.ts';

export const LINK_LIFE_MS = 10 * 60_000;

export interface SignedIn {
	session: SessionInfo;
	/** What the browser's device cookie is to be. */
	device: string;
}

/** Throws `sign-in-failed` for a wrong passphrase and an unknown address alike, `sign-in-slowed` past the limits. */
export async function signInByPassphrase(
	ctx: Context,
	{ passphrase, ...given }: { email: string; passphrase: string }
): Promise<SignedIn> {
	const email = normalEmail(given.email);
	const person = await findPerson(ctx.db, email);
	const tryId = await tryPassphrase(ctx, email, person?.passphraseHash ?? null, passphrase);
	if (!person) throw new SteelyardError('sign-in-failed');

	const device = ctx.client.device ?? newId();
	return ctx.db.transaction(async (tx) => {
		await markRight(tx, tryId, device);
		return { session: await enter(tx, ctx, person.id, 'passphrase'), device };
	});
}

/** Counts a try and weighs it; the id of the counted try when it was right. Throws like `signInByPassphrase`. */
async function tryPassphrase(
	ctx: Context,
	email: string,
	passphraseHash: string | null,
	passphrase: string
): Promise<string> {
	const tryId = await ctx.db.transaction((tx) =>
		countPassphraseTry(tx, ctx.now, { ...ctx.client, email })
	);
	try {
		// Outside any transaction: it takes tens of milliseconds.
		if (await passphraseFits(passphraseHash, passphrase)) return tryId;
	} catch (error) {
		// Nobody looked at it, so it was not a wrong one.
		if (error instanceof SteelyardError) await forgetTry(ctx.db, tryId);
		throw error;
	}
	throw new SteelyardError('sign-in-failed');
}

/** Renews the session's proof of who it is. Throws like `signInByPassphrase`, and `confirm-by-link` without a passphrase. */
export async function confirmPassphrase(ctx: Context, passphrase: string): Promise<void> {
	const { actor, session } = ctx;
	if (!actor || !session) throw new SteelyardError('not-signed-in');
	const [person] = await ctx.db.select().from(people).where(eq(people.id, actor.personId));
	if (!person) throw new SteelyardError('not-signed-in');
	if (person.passphraseHash === null) throw new SteelyardError('confirm-by-link');
	const tryId = await tryPassphrase(ctx, person.email, person.passphraseHash, passphrase);
	await ctx.db.transaction(async (tx) => {
		await markRight(tx, tryId, ctx.client.device ?? newId());
		await tx.update(sessions).set({ freshAt: ctx.now }).where(eq(sessions.id, session.id));
		await record(tx, ctx, 'passphrase-confirmed', {});
	});
}

/**
 * Mails a link to the address when it belongs to someone; does nothing, just as quietly, when it doesn't. The link
 * works once, for ten minutes, in the browser that keeps `nonce`, and not after a newer one was asked for.
 */
export async function sendSignInLink(
	ctx: Context,
	wish: { email: string; nonce: string }
): Promise<void> {
	const email = normalEmail(wish.email);
	// Counted on its own, so that a refusal stays counted too.
	await ctx.db.transaction((tx) => countLinkWish(tx, ctx.now, { ...ctx.client, email }));
	await inTransaction(ctx, async (tx) => {
		const person = await findPerson(tx, email);
		if (!person) return;
		await tx
			.update(signInLinks)
			.set({ usedAt: ctx.now })
			.where(and(eq(signInLinks.personId, person.id), isNull(signInLinks.usedAt)));
		const id = newId();
		const expiresAt = new Date(ctx.now.getTime() + LINK_LIFE_MS);
		await tx.insert(signInLinks).values({
			id,
			personId: person.id,
			tokenHash: sha256(linkToken(ctx.secret, id)),
			nonceHash: sha256(wish.nonce),
			createdAt: ctx.now,
			expiresAt
		});
		await queueMail(
			tx,
			ctx.now,
			person,
			{ event: 'sign-in-link', input: { linkId: id } },
			expiresAt
		);
	});
}

/** The token of a link, worked out anew for the mail, so that no place at rest holds it. */
export function linkToken(secret: string, linkId: string): string {
	return derivedToken(secret, 'sign-in-link', linkId);
}

/** Throws `link-spent` when the link was used, is too old, was overtaken, or belongs to another browser. */
export async function signInByLink(
	ctx: Context,
	{ token, nonce }: { token: string; nonce: string }
): Promise<SignedIn> {
	return ctx.db.transaction(async (tx) => {
		const [link] = await tx
			.update(signInLinks)
			.set({ usedAt: ctx.now })
			.where(
				and(
					eq(signInLinks.tokenHash, sha256(token)),
					eq(signInLinks.nonceHash, sha256(nonce)),
					isNull(signInLinks.usedAt)
				)
			)
			.returning();
		if (!link || link.expiresAt <= ctx.now) throw new SteelyardError('link-spent');
		const [person] = await tx.select().from(people).where(eq(people.id, link.personId));
		if (!person || person.disabledAt) throw new SteelyardError('link-spent');
		const device = ctx.client.device ?? newId();
		await recordLinkSignIn(tx, ctx.now, { ...ctx.client, device, email: person.email });
		return { session: await enter(tx, ctx, person.id, 'link'), device };
	});
}

async function enter(
	tx: Db,
	ctx: Context,
	personId: string,
	by: 'passphrase' | 'link'
): Promise<SessionInfo> {
	// The browser's earlier session ends here: nobody who has kept its cookie stays in by it.
	if (ctx.session) await revokeSession(tx, ctx.now, ctx.session.id);
	const session = await openSession(tx, ctx.now, personId);
	await record(tx, ctx, 'signed-in', { personId, by });
	return session;
}

async function findPerson(db: Db, email: string) {
	const [person] = await db
		.select()
		.from(people)
		.where(and(eq(people.email, email), isNull(people.disabledAt)));
	return person ?? null;
}
