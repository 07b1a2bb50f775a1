/** The working draft of a piece: made, read, saved. */
import { and, eq, sql } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { CreatePiece } from '../../forms/create-piece.ts';
import type { SaveDraft } from '../../forms/save-draft.ts';
import { EDITION_IN_USE } from '../../physics/constants/index.ts';
import { DOCUMENT_VERSION, type WidgetDocument } from '../../widget/document.ts';
import { canonicalJson } from '../../widget/freeze.ts';
import { parseDocument } from '../../widget/parse.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { PersonName, PieceSummary, PieceView } from '../../workflow/piece.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { pieces, pieceWriters } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { namedIn, readDossier, readDossiers, type PieceRow } from './dossier.ts';
import { nameBook } from './people.ts';
import { summarise, summariseUnreadable, viewPiece } from './piece-view.ts';
import { calculatorsOf } from './stock.ts';
import { refuseUnstorable, unstorableText } from './storable.ts';
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

/** An empty sheet under this title. Without a slug one is made from the title; a given one must be free. */
export async function createPiece(
	ctx: Context,
	input: CreatePiece
): Promise<{ id: string; slug: string }> {
	const { actor, now } = ctx;
	requirePermission(actor, 'create-piece');
	refuseUnstorable(input);
	return ctx.db.transaction(async (tx) => {
		const slug = input.slug ?? (await freeSlug(tx, slugOf(input.title)));
		const [piece] = await tx
			.insert(pieces)
			.values({
				slug,
				document: emptyDocument(input.title),
				createdBy: actor.personId,
				createdAt: now,
				savedBy: actor.personId,
				savedAt: now
			})
			.onConflictDoNothing({ target: pieces.slug })
			.returning({ id: pieces.id, slug: pieces.slug });
		if (!piece) throw new SteelyardError('slug-taken', { slug });
		await addWriter(tx, { pieceId: piece.id, personId: actor.personId, now, version: 1 });
		await record(tx, ctx, 'piece-created', { pieceId: piece.id, slug });
		return piece;
	});
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
	const { actor, now } = ctx;
	requirePermission(actor, 'edit-draft');
	const parsed = parseDocument(input.document, await calculatorsOf(ctx));
	const issues = parsed.ok ? unstorableText(parsed.document) : parsed.issues;
	if (!parsed.ok || issues.length > 0) throw new SteelyardError('document-broken', { issues });

	return ctx.db.transaction(async (tx) => {
		const piece = await lockPiece(tx, slug);
		if (canonicalJson(piece.document) === canonicalJson(parsed.document)) return saved(piece);
		if (piece.version !== input.baseVersion) throw await conflict(tx, piece);

		const [row] = await tx
			.update(pieces)
			.set({
				document: parsed.document,
				version: sql`${pieces.version} + 1`,
				savedBy: actor.personId,
				savedAt: now
			})
			.where(and(eq(pieces.id, piece.id), eq(pieces.version, input.baseVersion)))
			.returning();
		if (!row) throw await conflict(tx, piece);
		const first = await addWriter(tx, {
			pieceId: piece.id,
			personId: actor.personId,
			now,
			version: row.version
		});
		if (first)
			await record(tx, ctx, 'draft-first-changed', { pieceId: piece.id, version: row.version });
		return saved(row);
	});
}

function saved(piece: PieceRow): Saved {
	return { version: piece.version, savedAt: piece.savedAt.toISOString() };
}

async function conflict(tx: Db, piece: PieceRow): Promise<SteelyardError> {
	const names = await nameBook(tx, [piece.savedBy]);
	const current: Conflict = {
		...saved(piece),
		savedBy: names(piece.savedBy),
		document: readStored(piece.document, await calculatorsOf({ db: tx }))
	};
	return new SteelyardError('version-conflict', { ...current });
}

/** The row, held until the transaction ends: two people may press the same button at once. */
export async function lockPiece(tx: Db, slug: string): Promise<PieceRow> {
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
async function addWriter(tx: Db, { pieceId, personId, now, version }: Change): Promise<boolean> {
	const [changed] = await tx
		.update(pieceWriters)
		.set({ changedAt: now, version })
		.where(and(eq(pieceWriters.pieceId, pieceId), eq(pieceWriters.personId, personId)))
		.returning();
	if (changed) return false;
	await tx.insert(pieceWriters).values({ pieceId, personId, changedAt: now, version });
	return true;
}

/** What `createPiece` starts with. */
export function emptyDocument(title: string): WidgetDocument {
	return {
		version: DOCUMENT_VERSION,
		language: 'en',
		constants: EDITION_IN_USE,
		title,
		point: '',
		steps: [],
		controls: [],
		blocks: [],
		claims: []
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
