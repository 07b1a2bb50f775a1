/**
 * Drains the outbox: takes a lease on due rows, sends, marks them sent. At least once: a crash between sending and
 * marking sends a letter again, under the same Message-ID. After eight tries a row is parked, with its last error.
 */
import { and, eq, inArray, isNull, lte, or, sql } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { outbox } from '../db/schema/index.ts';
import { renderMail, type MailHouse } from '../mail/render.ts';
import type { MailTransport } from '../mail/transport.ts';

const POLL_MS = 1_000;
const BATCH = 10;
/** Longer than the transport's own time limits together. */
const LEASE_MS = 60_000;
const MOST_TRIES = 8;
const FIRST_WAIT_MS = 5_000;

export interface Sender {
	/** There may be new mail. */
	wake(): void;
	/** Finishes the letter in hand, then stops. */
	stop(): Promise<void>;
}

export interface SenderParts {
	db: Db;
	house: MailHouse;
	transport: MailTransport;
	clock(): Date;
	/** Told of failures; addresses and copy stay out of it. */
	report(message: string): void;
}

export function startSender(parts: SenderParts): Sender {
	let stopped = false;
	let draining: Promise<void> | null = null;

	const drain = () => {
		if (stopped) return;
		draining ??= drainOutbox(parts, () => stopped)
			.catch((error: unknown) => parts.report(`The outbox could not be read: ${reason(error)}`))
			.finally(() => (draining = null));
	};
	const timer = setInterval(drain, POLL_MS);
	timer.unref();

	return {
		wake: drain,
		async stop() {
			stopped = true;
			clearInterval(timer);
			await draining;
		}
	};
}

/** Sends all that is due, or what it has in hand once `stopped`: the rest is left for the next start, untried. */
export async function drainOutbox(
	parts: SenderParts,
	stopped: () => boolean = () => false
): Promise<void> {
	while (!stopped()) {
		const rows = await lease(parts.db, parts.clock());
		if (rows.length === 0) return;
		for (const [index, row] of rows.entries()) {
			if (stopped()) return giveBack(parts.db, rows.slice(index));
			await deliver(parts, row);
		}
	}
}

type OutboxRow = typeof outbox.$inferSelect;

/** One statement takes the rows, so two senders never hold the same one while the lease lasts. */
async function lease(db: Db, now: Date): Promise<OutboxRow[]> {
	const due = db
		.select({ id: outbox.id })
		.from(outbox)
		.where(
			and(
				isNull(outbox.sentAt),
				isNull(outbox.parkedAt),
				lte(outbox.dueAt, now),
				or(isNull(outbox.leaseUntil), lte(outbox.leaseUntil, now))
			)
		)
		.orderBy(outbox.dueAt)
		.limit(BATCH)
		.for('update', { skipLocked: true });
	return db
		.update(outbox)
		.set({ leaseUntil: new Date(now.getTime() + LEASE_MS), attempts: sql`${outbox.attempts} + 1` })
		.where(inArray(outbox.id, due))
		.returning();
}

/** Ends the lease on rows that nobody tried to send. */
async function giveBack(db: Db, rows: readonly OutboxRow[]): Promise<void> {
	await db
		.update(outbox)
		.set({ leaseUntil: null, attempts: sql`${outbox.attempts} - 1` })
		.where(
			inArray(
				outbox.id,
				rows.map(({ id }) => id)
			)
		);
}

async function deliver(
	{ db, house, transport, clock, report }: SenderParts,
	row: OutboxRow
): Promise<void> {
	const mine = eq(outbox.id, row.id);
	if (row.goodUntil && row.goodUntil <= clock()) {
		await db
			.update(outbox)
			.set({ leaseUntil: null, parkedAt: clock(), lastError: 'Too late to be of use.' })
			.where(mine);
		return;
	}
	try {
		const letter = renderMail(house, row);
		await transport.send(
			{
				messageId: messageId(row.id, house.origin),
				to: { name: row.toName, address: row.toAddress }
			},
			letter
		);
		await db.update(outbox).set({ sentAt: clock(), leaseUntil: null, lastError: null }).where(mine);
	} catch (error) {
		const now = clock();
		const parked = row.attempts >= MOST_TRIES;
		const wait = FIRST_WAIT_MS * 2 ** (row.attempts - 1);
		await db
			.update(outbox)
			.set({
				leaseUntil: null,
				lastError: reason(error),
				dueAt: new Date(now.getTime() + wait),
				parkedAt: parked ? now : null
			})
			.where(mine);
		report(
			`Mail ${row.id} (${row.event}) ${parked ? 'was given up' : 'will be tried again'}: ${reason(error)}`
		);
	}
}

/** RFC 5322 §3.6.4: unique for good, and the same however often the row is sent. */
export function messageId(rowId: string, origin: string): string {
	return `<${rowId}@${new URL(origin).hostname}>`;
}

function reason(error: unknown): string {
	return error instanceof Error ? error.message : String(error);
}
