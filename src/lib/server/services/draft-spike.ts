/** The spike: drafts that were discarded. They are out of the lists, and all that belongs to them is kept. */
import { desc, eq, isNotNull } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { SpikedPiece } from '../../workflow/piece.ts';
import type { Context } from '../context.ts';
import { pieces, releases } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { nameBook } from './people.ts';
import { lockPieceAnywhere } from './pieces.ts';

/** Discards a piece. Throws `piece-out` for one that was ever released. Spiking twice changes nothing. */
export async function spikePiece(ctx: Context, slug: string): Promise<void> {
	const { actor, now } = ctx;
	requirePermission(actor, 'spike-piece');
	await ctx.db.transaction(async (tx) => {
		const piece = await lockPieceAnywhere(tx, slug);
		if (piece.spikedAt) return;
		if ((await tx.$count(releases, eq(releases.pieceId, piece.id))) > 0)
			throw new SteelyardError('piece-out');
		await tx
			.update(pieces)
			.set({ spikedAt: now, spikedBy: actor.personId })
			.where(eq(pieces.id, piece.id));
		await record(tx, ctx, 'piece-spiked', { pieceId: piece.id, slug });
	});
}

/** Takes a piece off the spike, as it was. */
export async function recoverPiece(ctx: Context, slug: string): Promise<void> {
	requirePermission(ctx.actor, 'recover-piece');
	await ctx.db.transaction(async (tx) => {
		const piece = await lockPieceAnywhere(tx, slug);
		if (!piece.spikedAt) return;
		await tx.update(pieces).set({ spikedAt: null, spikedBy: null }).where(eq(pieces.id, piece.id));
		await record(tx, ctx, 'piece-recovered', { pieceId: piece.id, slug });
	});
}

/** What is on the spike, the last one first. */
export async function listSpiked(ctx: Context): Promise<SpikedPiece[]> {
	requirePermission(ctx.actor, 'read-desk');
	const rows = await ctx.db
		.select({
			slug: pieces.slug,
			document: pieces.document,
			savedBy: pieces.savedBy,
			spikedBy: pieces.spikedBy,
			spikedAt: pieces.spikedAt
		})
		.from(pieces)
		.where(isNotNull(pieces.spikedAt))
		.orderBy(desc(pieces.spikedAt), desc(pieces.id));
	const names = await nameBook(
		ctx.db,
		rows.flatMap(({ spikedBy, savedBy }) => [spikedBy, savedBy])
	);
	return rows.flatMap(({ slug, document, savedBy, spikedBy, spikedAt }) =>
		spikedAt
			? [
					{
						slug,
						title: document.title || slug,
						spikedBy: names(spikedBy ?? savedBy),
						spikedAt: spikedAt.toISOString()
					}
				]
			: []
	);
}
