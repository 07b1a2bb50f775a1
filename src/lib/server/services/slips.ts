/** The slip of a piece, changed by those who may edit its draft. */
import { eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { slipOf, type SaveSlip } from '../../forms/slip.ts';
import { canonicalJson } from '../../widget/freeze.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Slip } from '../../workflow/slip.ts';
import type { Context } from '../context.ts';
import { pieces } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { lockPiece } from './pieces.ts';
import { refuseUnstorable } from './storable.ts';

/** Changes the slip; throws `slip-changed`, with the one that stands, when it isn't the one the change was made on. */
export async function saveSlip(ctx: Context, slug: string, input: SaveSlip): Promise<Slip> {
	requirePermission(ctx.actor, 'edit-draft');
	refuseUnstorable(input.fields);
	const slip = slipOf(input.fields);
	return ctx.db.transaction(async (tx) => {
		const piece = await lockPiece(tx, slug);
		if (canonicalJson(piece.slip) === canonicalJson(slip)) return slip;
		if (canonicalJson(piece.slip) !== canonicalJson(input.was))
			throw new SteelyardError('slip-changed', { slip: piece.slip });
		await tx.update(pieces).set({ slip }).where(eq(pieces.id, piece.id));
		await record(tx, ctx, 'slip-changed', { pieceId: piece.id });
		return slip;
	});
}
