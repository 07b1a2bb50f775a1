/** The rows of earlier drafts: one for each person and two minutes, so that an hour of typing is thirty rows. */
import { and, desc, eq } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { draftVersions } from '../db/schema/index.ts';
import type { PieceRow } from './dossier.ts';

export type DraftVersionRow = typeof draftVersions.$inferSelect;

/** Saves of one person this close together are kept as one: the last. */
export const RUN_MS = 2 * 60_000;

/** Keeps the version that a save made, after the one it was made on. `restoredFrom` is the version it brought back. */
export async function keepVersion(
	tx: Db,
	before: PieceRow,
	after: PieceRow,
	restoredFrom: number | null
): Promise<void> {
	await keepOnce(tx, before);
	const run = restoredFrom === null ? await openRun(tx, after) : null;
	const { version, document, savedAt, savedBy, id: pieceId } = after;
	if (run === null) {
		await tx
			.insert(draftVersions)
			.values({ pieceId, version, document, savedBy, savedAt, since: savedAt, restoredFrom });
		return;
	}
	await tx
		.update(draftVersions)
		.set({ version, document, savedAt })
		.where(isVersion(pieceId, run.version));
}

/** A version that has no row yet, such as the first of a piece, gets one. */
export async function keepOnce(tx: Db, piece: PieceRow): Promise<void> {
	const { id: pieceId, version, document, savedBy, savedAt } = piece;
	const kept = await tx.$count(draftVersions, isVersion(pieceId, version));
	if (kept > 0) return;
	await tx
		.insert(draftVersions)
		.values({ pieceId, version, document, savedBy, savedAt, since: savedAt });
}

/** The row of this person that the next save of theirs replaces; null when a new one begins. */
async function openRun(
	tx: Db,
	{ id, savedBy, savedAt }: PieceRow
): Promise<DraftVersionRow | null> {
	const [last] = await tx
		.select()
		.from(draftVersions)
		.where(and(eq(draftVersions.pieceId, id), eq(draftVersions.savedBy, savedBy)))
		.orderBy(desc(draftVersions.version))
		.limit(1);
	// What a piece was started from is never typed over: it may be an outline or a copy.
	if (!last || last.version === 1) return null;
	if (last.name !== null || last.restoredFrom !== null) return null;
	const age = savedAt.getTime() - last.since.getTime();
	// A clock that was set back begins a new run rather than stretch an old one.
	return age >= 0 && age < RUN_MS ? last : null;
}

export function isVersion(pieceId: string, version: number) {
	return and(eq(draftVersions.pieceId, pieceId), eq(draftVersions.version, version));
}
