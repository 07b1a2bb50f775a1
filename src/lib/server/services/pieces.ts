/** The working draft of a piece: listed, read, saved. */
import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { SaveDraft } from '../../forms/save-draft.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { canonicalJson } from '../../widget/freeze.ts';
import { parseDocument } from '../../widget/parse.ts';
import { requirePermission, type Actor } from '../../workflow/permissions.ts';
import type { PersonName, PieceSummary, PieceView } from '../../workflow/piece.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { pieces, pieceWriters, signatures } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { namedIn, readDossier, readDossiers, type PieceRow } from './dossier.ts';
import { keepVersion } from './draft-versions.ts';
import { formulaSourceIssues } from './formula-steps.ts';
import { nameBook } from './people.ts';
import { summarise, summariseUnreadable, viewPiece } from './piece-view.ts';
import { calculatorsOf } from './stock.ts';
import { unstorableText } from './storable.ts';
import { readStored } from './stored-document.ts';

/** The desk: one line a piece, the one saved last first. */
export async function listPieces(ctx: Context): Promise<PieceSummary[]> {
	requirePermission(ctx.actor, 'read-desk');
	const { dossiers, unreadable } = await readDossiers(ctx.db);
	const names = await nameBook(ctx.db, [
		...namedIn(dossiers),
		...unreadable.map(({ savedBy }) => savedBy)
	]);
	// One piece that can't be read must not close the desk for the others.
	return [
		...unreadable.map((piece) => summariseUnreadable(piece, names)),
		...dossiers.map((dossier) => summarise(dossier, names))
	];
}

export async function getPiece(ctx: Context, slug: string): Promise<PieceView> {
	requirePermission(ctx.actor, 'read-proof');
	const dossier = await readDossier(ctx.db, { slug });
	if (!dossier) throw new SteelyardError('not-found');
	return viewPiece(dossier, await nameBook(ctx.db, namedIn([dossier])));
}

/** The last signature that the person who asks has put under a claim; null for who never signed. */
export async function lastSigned(ctx: Context): Promise<{ slug: string; at: string } | null> {
	const { actor } = ctx;
	requirePermission(actor, 'read-desk');
	const [last] = await ctx.db
		.select({ slug: pieces.slug, at: signatures.signedAt })
		.from(signatures)
		.innerJoin(pieces, eq(pieces.id, signatures.pieceId))
		.where(and(eq(signatures.personId, actor.personId), isNull(signatures.takenBackAt)))
		.orderBy(desc(signatures.signedAt), desc(signatures.id))
		.limit(1);
	return last ? { slug: last.slug, at: last.at.toISOString() } : null;
}

export interface Saved {
	version: number;
	/** ISO 8601, UTC. */
	savedAt: string;
}

/** What a `version-conflict` carries, so that the page can offer both versions. */
export interface Conflict extends Saved {
	savedBy: PersonName;
	document: WidgetDocument;
}

/**
 * Saves the draft on top of `baseVersion`. Incomplete drafts are fine; one that doesn't hang together is refused with
 * `document-broken` and its issues named, and one made on an older version with `version-conflict`. Saving what is
 * there already changes nothing, on whatever version: the answer to a save may get lost on its way, and is asked for again.
 */
export async function saveDraft(ctx: Context, slug: string, input: SaveDraft): Promise<Saved> {
	const { actor } = ctx;
	requirePermission(actor, 'edit-draft');
	const parsed = parseDocument(input.document, await calculatorsOf(ctx));
	const issues = parsed.ok
		? [...unstorableText(parsed.document), ...formulaSourceIssues(parsed.document)]
		: parsed.issues;
	if (!parsed.ok || issues.length > 0) throw new SteelyardError('document-broken', { issues });

	return ctx.db.transaction(async (tx) => {
		const piece = await lockPiece(tx, slug);
		if (canonicalJson(piece.document) === canonicalJson(parsed.document)) return saved(piece);
		if (piece.version !== input.baseVersion) throw await conflict(tx, piece);
		return writeDraft(tx, { ...ctx, actor }, piece, parsed.document, null);
	});
}

/**
 * Makes a checked document the newest draft of a piece that the transaction holds: counts up, keeps what stood before
 * among the earlier drafts, and notes who changed it. `restoredFrom` is the version whose words it brings back.
 */
export async function writeDraft(
	tx: Db,
	ctx: { actor: Actor; now: Date },
	piece: PieceRow,
	document: WidgetDocument,
	restoredFrom: number | null
): Promise<Saved> {
	const { personId } = ctx.actor;
	const [row] = await tx
		.update(pieces)
		.set({
			document,
			version: sql`${pieces.version} + 1`,
			savedBy: personId,
			savedAt: ctx.now
		})
		.where(and(eq(pieces.id, piece.id), eq(pieces.version, piece.version)))
		.returning();
	if (!row) throw await conflict(tx, piece);
	await keepVersion(tx, piece, row, restoredFrom);
	const { id: pieceId, version } = row;
	const first = await addWriter(tx, { pieceId, personId, now: ctx.now, version });
	if (first) await record(tx, ctx, 'draft-first-changed', { pieceId, version });
	return saved(row);
}

function saved(piece: PieceRow): Saved {
	return { version: piece.version, savedAt: piece.savedAt.toISOString() };
}

/** The failure for a change that was made on an older version, with the newest one. */
export async function conflict(tx: Db, piece: PieceRow): Promise<SteelyardError> {
	const names = await nameBook(tx, [piece.savedBy]);
	const current: Conflict = {
		...saved(piece),
		savedBy: names(piece.savedBy),
		document: readStored(piece.document, await calculatorsOf({ db: tx }))
	};
	return new SteelyardError('version-conflict', { ...current });
}

/** The row, held until the transaction ends: two people may press the same button at once. Throws `piece-spiked`. */
export async function lockPiece(tx: Db, slug: string): Promise<PieceRow> {
	const piece = await lockPieceAnywhere(tx, slug);
	if (piece.spikedAt) throw new SteelyardError('piece-spiked');
	return piece;
}

/** The row held, also of a piece that is on the spike. */
export async function lockPieceAnywhere(tx: Db, slug: string): Promise<PieceRow> {
	const [piece] = await tx.select().from(pieces).where(eq(pieces.slug, slug)).for('update');
	if (!piece) throw new SteelyardError('not-found');
	return piece;
}

interface Change {
	pieceId: string;
	personId: string;
	now: Date;
	/** The version that the change made. */
	version: number;
}

/** Marks a person as one who changed the draft; true when they weren't one since the last release. */
export async function addWriter(
	tx: Db,
	{ pieceId, personId, now, version }: Change
): Promise<boolean> {
	const [changed] = await tx
		.update(pieceWriters)
		.set({ changedAt: now, version })
		.where(and(eq(pieceWriters.pieceId, pieceId), eq(pieceWriters.personId, personId)))
		.returning();
	if (changed) return false;
	await tx.insert(pieceWriters).values({ pieceId, personId, changedAt: now, version });
	return true;
}
