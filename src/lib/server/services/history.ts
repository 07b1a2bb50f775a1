/** Earlier drafts: listed, opened, named, brought back, and let go after ninety days. */
import { and, eq, isNull, lt, max, sql } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { NameDraft, RestoreDraft } from '../../forms/earlier-drafts.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import type { EarlierDraft } from '../../workflow/earlier-draft.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context, Fixtures } from '../context.ts';
import type { Db } from '../db/client.ts';
import { daybook, draftVersions, pieces, proofs } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import type { PieceRow } from './dossier.ts';
import { isVersion, keepOnce } from './draft-versions.ts';
import { nameBook } from './people.ts';
import { conflict, lockPiece, writeDraft, type Saved } from './pieces.ts';
import { calculatorsOf } from './stock.ts';
import { refuseUnstorable } from './storable.ts';
import { readStored } from './stored-document.ts';

const DAY_MS = 24 * 3_600_000;
/** Unnamed drafts are kept this long; named ones, and those that proofs were pulled from, for good. */
export const KEPT_DAYS = 90;

/** What a draft's row says, without its document. */
type Found = Omit<EarlierDraft, 'savedBy' | 'namedBy' | 'savedAt'> & {
	savedBy: string;
	namedBy: string | null;
	savedAt: Date;
};

/** Every draft that can be opened, newest first. */
export async function listDrafts(ctx: Context, slug: string): Promise<EarlierDraft[]> {
	requirePermission(ctx.actor, 'read-proof');
	return named(ctx.db, await findDrafts(ctx.db, await findPiece(ctx.db, slug)));
}

/** One draft with its document, for reading. Throws `document-broken` when it can't be read any more. */
export async function openDraft(
	ctx: Context,
	slug: string,
	version: number
): Promise<{ draft: EarlierDraft; document: WidgetDocument }> {
	requirePermission(ctx.actor, 'read-proof');
	const piece = await findPiece(ctx.db, slug);
	const found = (await findDrafts(ctx.db, piece)).find((draft) => draft.version === version);
	const document = found && (await storedVersion(ctx.db, piece, version));
	if (!found || !document) throw new SteelyardError('not-found');
	const [draft] = await named(ctx.db, [found]);
	if (!draft) throw new SteelyardError('not-found');
	return { draft, document: readStored(document, await calculatorsOf(ctx)) };
}

/** Gives a draft a name, so that it can be found again and stays for good; '' takes the name away. */
export async function nameDraft(ctx: Context, slug: string, input: NameDraft): Promise<void> {
	const { actor } = ctx;
	requirePermission(actor, 'edit-draft');
	refuseUnstorable(input);
	await ctx.db.transaction(async (tx) => {
		const piece = await lockPiece(tx, slug);
		if (piece.version === input.version) await keepOnce(tx, piece);
		const name = input.name || null;
		const [row] = await tx
			.update(draftVersions)
			.set({ name, namedBy: name === null ? null : actor.personId })
			.where(isVersion(piece.id, input.version))
			.returning({ version: draftVersions.version });
		if (!row) throw new SteelyardError('not-found');
		await record(tx, ctx, 'draft-named', { pieceId: piece.id, version: row.version });
	});
}

/** Brings an earlier draft back as the newest one, on top of `baseVersion`; what stood before stays among the drafts. */
export async function restoreDraft(
	ctx: Context,
	slug: string,
	input: RestoreDraft
): Promise<Saved> {
	const { actor, now } = ctx;
	requirePermission(actor, 'edit-draft');
	return ctx.db.transaction(async (tx) => {
		const piece = await lockPiece(tx, slug);
		if (piece.version !== input.baseVersion) throw await conflict(tx, piece);
		const stored = await storedVersion(tx, piece, input.version);
		if (!stored) throw new SteelyardError('not-found');
		const document = readStored(stored, await calculatorsOf({ db: tx }));
		const saved = await writeDraft(tx, { actor, now }, piece, document, input.version);
		await record(tx, ctx, 'draft-restored', {
			pieceId: piece.id,
			version: saved.version,
			restoredFrom: input.version
		});
		return saved;
	});
}

/**
 * Lets unnamed drafts go that are older than ninety days; how many. Days on which nobody was in the house don't count:
 * a clock that jumps ahead must not empty the shelf, and what happened last in the daybook tells them apart.
 */
export async function sweepDrafts({ db }: Pick<Fixtures, 'db'>, now: Date): Promise<number> {
	const [last] = await db.select({ at: max(daybook.at) }).from(daybook);
	const lastSeen = Math.min(now.getTime(), (last?.at ?? now).getTime() + DAY_MS);
	const gone = await db
		.delete(draftVersions)
		.where(
			and(
				isNull(draftVersions.name),
				lt(draftVersions.savedAt, new Date(lastSeen - KEPT_DAYS * DAY_MS)),
				// The newest draft is no earlier one, however long it has lain.
				sql`${draftVersions.version} < (select ${pieces.version} from ${pieces} where ${pieces.id} = ${draftVersions.pieceId})`
			)
		)
		.returning({ version: draftVersions.version });
	return gone.length;
}

async function findPiece(db: Db, slug: string): Promise<PieceRow> {
	const [piece] = await db.select().from(pieces).where(eq(pieces.slug, slug));
	if (!piece) throw new SteelyardError('not-found');
	return piece;
}

/** Kept versions, the drafts of proofs, and the one in the manuscript, newest first, each once. */
async function findDrafts(db: Db, piece: PieceRow): Promise<Found[]> {
	const rows = await db
		.select({
			version: draftVersions.version,
			savedBy: draftVersions.savedBy,
			savedAt: draftVersions.savedAt,
			name: draftVersions.name,
			namedBy: draftVersions.namedBy,
			restoredFrom: draftVersions.restoredFrom
		})
		.from(draftVersions)
		.where(eq(draftVersions.pieceId, piece.id));
	const pulled = await db
		.select({
			version: proofs.version,
			number: proofs.number,
			pulledBy: proofs.pulledBy,
			pulledAt: proofs.pulledAt
		})
		.from(proofs)
		.where(eq(proofs.pieceId, piece.id));
	const bare = { name: null, namedBy: null, restoredFrom: null };
	const all = new Map<number, Omit<Found, 'proof' | 'isNewest'>>();
	// A proof from before versions were counted says version 0, and can't be placed among the drafts.
	for (const { version, pulledBy, pulledAt } of pulled.filter(({ version }) => version > 0))
		all.set(version, { ...bare, version, savedBy: pulledBy, savedAt: pulledAt });
	const { version, savedBy, savedAt } = piece;
	all.set(version, { ...bare, version, savedBy, savedAt });
	for (const row of rows) all.set(row.version, row);
	return [...all.values()]
		.sort((a, b) => b.version - a.version)
		.map((draft) => ({
			...draft,
			proof: pulled.find((one) => one.version === draft.version)?.number ?? null,
			isNewest: draft.version === piece.version
		}));
}

async function storedVersion(
	db: Db,
	piece: PieceRow,
	version: number
): Promise<WidgetDocument | null> {
	if (piece.version === version) return piece.document;
	const [kept] = await db
		.select({ document: draftVersions.document })
		.from(draftVersions)
		.where(isVersion(piece.id, version));
	if (kept) return kept.document;
	const [pulled] = await db
		.select({ document: proofs.document })
		.from(proofs)
		.where(and(eq(proofs.pieceId, piece.id), eq(proofs.version, version)));
	return pulled?.document ?? null;
}

async function named(db: Db, found: Found[]): Promise<EarlierDraft[]> {
	const names = await nameBook(
		db,
		found.flatMap(({ savedBy, namedBy }) => [savedBy, namedBy])
	);
	return found.map(({ savedBy, namedBy, savedAt, ...draft }) => ({
		...draft,
		savedBy: names(savedBy),
		namedBy: namedBy === null ? null : names(namedBy),
		savedAt: savedAt.toISOString()
	}));
}
