/**
 * Slows guessing without becoming a lock that others can close: the limits on one account don't bind a browser that
 * has signed in to it before, which has limits of its own. Counts live in the database, so a restart forgets nothing.
 */
import { and, count, eq, gt, type SQL } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { sha256 } from '../auth/hashes.ts';
import type { Client } from '../context.ts';
import type { Db } from '../db/client.ts';
import { signInAttempts } from '../db/schema/index.ts';

const MINUTE = 60_000;
const WINDOW_MS = 15 * MINUTE;
const WRONG_PER_ACCOUNT = 10;
const WRONG_PER_ADDRESS = 50;
const LINK_WINDOW_MS = 60 * MINUTE;
const LINKS_PER_ACCOUNT = 5;
const LINKS_IN_ALL = 100;

interface Try extends Client {
	email: string;
}

/** Counts a try at a passphrase as wrong until `markRight`; throws `sign-in-slowed` when there were too many. */
export async function countPassphraseTry(tx: Db, now: Date, attempt: Try): Promise<string> {
	const { accountHash, addressHash, deviceHash } = hashes(attempt);
	const account = eq(signInAttempts.accountHash, accountHash);
	const device = deviceHash ? eq(signInAttempts.deviceHash, deviceHash) : undefined;
	const usual =
		device !== undefined &&
		(await howMany(tx, account, device, eq(signInAttempts.succeeded, true))) > 0;

	const wrong = and(
		eq(signInAttempts.kind, 'passphrase'),
		eq(signInAttempts.succeeded, false),
		gt(signInAttempts.at, new Date(now.getTime() - WINDOW_MS))
	);
	const slowed = usual
		? (await howMany(tx, wrong, account, device)) >= WRONG_PER_ACCOUNT
		: (await howMany(tx, wrong, account)) >= WRONG_PER_ACCOUNT ||
			(await howMany(tx, wrong, eq(signInAttempts.addressHash, addressHash))) >= WRONG_PER_ADDRESS;
	if (slowed) throw new SteelyardError('sign-in-slowed', { retryAfterSeconds: WINDOW_MS / 1000 });

	return insertTry(tx, now, 'passphrase', attempt, false);
}

/** The try was right after all; from now on its device is a usual one. */
export async function markRight(tx: Db, attemptId: string, device: string): Promise<void> {
	await tx
		.update(signInAttempts)
		.set({ succeeded: true, deviceHash: sha256(device) })
		.where(eq(signInAttempts.id, attemptId));
}

/** Takes a try back that nobody looked at. */
export async function forgetTry(tx: Db, attemptId: string): Promise<void> {
	await tx.delete(signInAttempts).where(eq(signInAttempts.id, attemptId));
}

/** Counts a wish for a link; throws `links-slowed` past 5 an hour for one address or 100 an hour in all. */
export async function countLinkWish(tx: Db, now: Date, attempt: Try): Promise<void> {
	const recent = and(
		eq(signInAttempts.kind, 'link'),
		eq(signInAttempts.succeeded, false),
		gt(signInAttempts.at, new Date(now.getTime() - LINK_WINDOW_MS))
	);
	const account = eq(signInAttempts.accountHash, hashes(attempt).accountHash);
	const slowed =
		(await howMany(tx, recent, account)) >= LINKS_PER_ACCOUNT ||
		(await howMany(tx, recent)) >= LINKS_IN_ALL;
	if (slowed)
		throw new SteelyardError('links-slowed', { retryAfterSeconds: LINK_WINDOW_MS / 1000 });
	await insertTry(tx, now, 'link', attempt, false);
}

/** Someone came in by a link: from now on this device is a usual one for the account. */
export async function recordLinkSignIn(tx: Db, now: Date, attempt: Try): Promise<void> {
	await insertTry(tx, now, 'link', attempt, true);
}

async function insertTry(
	tx: Db,
	now: Date,
	kind: 'passphrase' | 'link',
	attempt: Try,
	succeeded: boolean
): Promise<string> {
	const [row] = await tx
		.insert(signInAttempts)
		.values({ kind, ...hashes(attempt), succeeded, at: now })
		.returning({ id: signInAttempts.id });
	if (!row) throw new Error('The database took a sign-in attempt and gave back no id.');
	return row.id;
}

async function howMany(tx: Db, ...conditions: (SQL | undefined)[]): Promise<number> {
	const [row] = await tx
		.select({ rows: count() })
		.from(signInAttempts)
		.where(and(...conditions));
	return row?.rows ?? 0;
}

function hashes({ email, address, device }: Try) {
	return {
		accountHash: sha256(email),
		addressHash: sha256(address),
		deviceHash: device ? sha256(device) : null
	};
}
