/** One picture in another’s place, in every draft. */
import { eq, sql } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { placePicture } from '../../pictures/place.ts';
import { pictureReady } from '../../pictures/record.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import { pieces } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { addWriter } from './pieces.ts';
import { lockPicture } from './pictures.ts';

export interface Replaced {
	/** Slugs of the pieces whose drafts were changed. */
	drafts: string[];
}

/**
 * Puts the picture `by` wherever `id` stands in a draft, with its own record; captions stay as they were written.
 * Proofs and releases keep what they have. Throws `picture-not-ready` when the new one’s record isn’t complete.
 */
export async function replacePicture(ctx: Context, id: string, by: string): Promise<Replaced> {
	const { actor, now } = ctx;
	requirePermission(actor, 'replace-picture');
	return ctx.db.transaction(async (tx) => {
		await lockPicture(tx, id);
		const next = await lockPicture(tx, by);
		const { ready, findings } = pictureReady(next.record, now.toISOString().slice(0, 10));
		if (!ready) throw new SteelyardError('picture-not-ready', { findings });
		if (id === by) return { drafts: [] };

		const holds = JSON.stringify({ blocks: [{ kind: 'picture', picture: id }] });
		const rows = await tx
			.select()
			.from(pieces)
			.where(sql`${pieces.document} @> ${holds}::jsonb`)
			.orderBy(pieces.slug)
			.for('update');
		const { caption: _caption, ...placed } = placePicture(next);
		for (const piece of rows) {
			const blocks = piece.document.blocks.map((block) =>
				block.kind === 'picture' && block.picture === id ? { ...block, ...placed } : block
			);
			const version = piece.version + 1;
			await tx
				.update(pieces)
				.set({
					document: { ...piece.document, blocks },
					version,
					savedBy: actor.personId,
					savedAt: now
				})
				.where(eq(pieces.id, piece.id));
			const about = { pieceId: piece.id, version };
			if (await addWriter(tx, { ...about, personId: actor.personId, now }))
				await record(tx, ctx, 'draft-first-changed', about);
			await record(tx, ctx, 'picture-replaced', { ...about, pictureId: id, by });
		}
		return { drafts: rows.map(({ slug }) => slug) };
	});
}
