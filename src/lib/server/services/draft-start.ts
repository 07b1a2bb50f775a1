/** Starting a piece: from an empty sheet, from an outline, or from the words and wiring of another piece. */
import { desc, eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { CreatePiece } from '../../forms/create-piece.ts';
import { slipOf } from '../../forms/slip.ts';
import { outlines } from '../../outlines/index.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { emptyDocument } from '../../widget/empty-document.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import { EMPTY_SLIP, type Slip } from '../../workflow/slip.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { pieces, pieceWriters, proofs } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { addWriter } from './pieces.ts';
import { calculatorsOf } from './stock.ts';
import { refuseUnstorable } from './storable.ts';
import { readStored } from './stored-document.ts';

/** The slip as filled in; all but the title may still be open. */
export type NewPiece = Pick<CreatePiece, 'title'> & Partial<CreatePiece>;

/** What a piece starts with. */
interface Beginning {
	document: WidgetDocument;
	/** People whose words it holds: they can’t check them. */
	writers: readonly string[];
	/** Id of the piece it is a copy of. */
	copyOf: string | null;
}

/** A new piece. Without a slug one is made from the title; a given one must be free. */
export async function createPiece(
	ctx: Context,
	input: NewPiece
): Promise<{ id: string; slug: string }> {
	const { actor, now } = ctx;
	requirePermission(actor, 'create-piece');
	refuseUnstorable(input);
	return ctx.db.transaction(async (tx) => {
		const { document, writers, copyOf } = await beginning(tx, input.start ?? 'sheet');
		const slug = input.slug || (await freeSlug(tx, slugOf(input.title)));
		const [piece] = await tx
			.insert(pieces)
			.values({
				slug,
				slip: slipIn(input),
				document: { ...document, title: input.title, point: input.point || document.point },
				createdBy: actor.personId,
				createdAt: now,
				savedBy: actor.personId,
				savedAt: now
			})
			.onConflictDoNothing({ target: pieces.slug })
			.returning({ id: pieces.id, slug: pieces.slug });
		if (!piece) throw new SteelyardError('slug-taken', { slug });
		for (const personId of new Set([actor.personId, ...writers]))
			await addWriter(tx, { pieceId: piece.id, personId, now, version: 1 });
		await record(tx, ctx, 'piece-created', {
			pieceId: piece.id,
			slug,
			...(copyOf === null ? {} : { copyOf })
		});
		return piece;
	});
}

function slipIn({ reader, partner, embargo, words, due, zone }: NewPiece): Slip {
	return slipOf({
		reader: reader ?? EMPTY_SLIP.reader,
		partner: partner ?? EMPTY_SLIP.partner,
		embargo: embargo ?? EMPTY_SLIP.embargo,
		words: words ?? '',
		due: due ?? '',
		zone: zone ?? 'UTC'
	});
}

/** `sheet`, `outline:<id>` or `piece:<slug>`; throws `not-found` when there is no such outline or piece. */
async function beginning(tx: Db, start: string): Promise<Beginning> {
	const [kind, name = ''] = start.split(':');
	if (kind === 'piece') return copyOf(tx, name);
	if (kind === 'sheet') return { document: emptyDocument(''), writers: [], copyOf: null };
	const outline = outlines.find(({ id }) => id === name);
	if (!outline) throw new SteelyardError('not-found');
	return { document: outline.document, writers: [], copyOf: null };
}

/** Words and wiring; signatures, queries, proofs and the slip stay with the original. */
async function copyOf(tx: Db, slug: string): Promise<Beginning> {
	const [piece] = await tx.select().from(pieces).where(eq(pieces.slug, slug));
	if (!piece) throw new SteelyardError('not-found');
	const changed = await tx
		.select({ personId: pieceWriters.personId })
		.from(pieceWriters)
		.where(eq(pieceWriters.pieceId, piece.id));
	const [newest] = await tx
		.select({ writers: proofs.writers })
		.from(proofs)
		.where(eq(proofs.pieceId, piece.id))
		.orderBy(desc(proofs.number))
		.limit(1);
	return {
		document: readStored(piece.document, await calculatorsOf({ db: tx })),
		writers: [...changed.map(({ personId }) => personId), ...(newest?.writers ?? [])],
		copyOf: piece.id
	};
}

/** “Same drop, same blow” → same-drop-same-blow. */
function slugOf(title: string): string {
	const plain = title
		.normalize('NFKD')
		.replace(/\p{M}/gu, '')
		.toLowerCase()
		.replace(/['’]/g, '')
		.replace(/[^a-z0-9]+/g, '-')
		.slice(0, 70)
		.replace(/^-+|-+$/g, '');
	return plain || 'piece';
}

async function freeSlug(tx: Db, wanted: string): Promise<string> {
	for (let number = 1; ; number += 1) {
		const slug = number === 1 ? wanted : `${wanted}-${number}`;
		const taken = await tx.$count(pieces, eq(pieces.slug, slug));
		if (taken === 0) return slug;
	}
}
