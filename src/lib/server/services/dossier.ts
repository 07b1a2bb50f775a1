/** All rows about a piece, read together; the views are worked out from them. */
import { desc, eq, inArray, isNull } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { Db } from '../db/client.ts';
import { pieces, pieceWriters, proofs, queries, releases, signatures } from '../db/schema/index.ts';
import { readFormulaSignings, type FormulaSigning } from './formula-standing.ts';
import { readStored } from './stored-document.ts';

import { readStock, type Stock } from './stock.ts';

export type PieceRow = typeof pieces.$inferSelect;
export type ProofRow = typeof proofs.$inferSelect;
export type SignatureRow = typeof signatures.$inferSelect & { proofNumber: number };
export type QueryRow = typeof queries.$inferSelect & { proofNumber: number };
export type ReleaseRow = Omit<typeof releases.$inferSelect, 'document' | 'manifest' | 'account'> & {
	proofNumber: number;
};

export interface Dossier {
	piece: PieceRow;
	/** Ids of everyone who changed the draft since the last release. */
	writers: string[];
	/** The newest. */
	proof: ProofRow | null;
	signatures: SignatureRow[];
	queries: QueryRow[];
	/** On formulas of the newest proof, in whatever piece they were signed. */
	formulaSignings: FormulaSigning[];
	/** Newest first. */
	releases: ReleaseRow[];
	/** What the piece is worked with now. */
	stock: Stock;
}

/**
 * The dossier of one piece, null when there is none; reads by `slug` or by a row already locked. Throws
 * `document-broken` when a stored document can't be read any more.
 */
export async function readDossier(
	db: Db,
	which: { slug: string } | { piece: PieceRow }
): Promise<Dossier | null> {
	const rows =
		'piece' in which
			? [which.piece]
			: await db.select().from(pieces).where(eq(pieces.slug, which.slug));
	const [gathered] = await gather(db, rows);
	return gathered ? readable(gathered) : null;
}

/** Every piece on the desk, the one saved last first; apart from them those whose documents can't be read any more. */
export async function readDossiers(
	db: Db
): Promise<{ dossiers: Dossier[]; unreadable: PieceRow[] }> {
	const rows = await db
		.select()
		.from(pieces)
		.where(isNull(pieces.spikedAt))
		.orderBy(desc(pieces.savedAt), desc(pieces.id));
	const dossiers: Dossier[] = [];
	const unreadable: PieceRow[] = [];
	for (const gathered of await gather(db, rows)) {
		try {
			dossiers.push(readable(gathered));
		} catch (error) {
			if (!(error instanceof SteelyardError)) throw error;
			unreadable.push(gathered.piece);
		}
	}
	return { dossiers, unreadable };
}

/** The documents in today's shape. Digests stay those of what is stored. Throws `document-broken`. */
function readable({ piece, proof, ...rest }: Dossier): Dossier {
	return {
		...rest,
		piece: { ...piece, document: readStored(piece.document, rest.stock.calculators) },
		proof: proof && { ...proof, document: readStored(proof.document, rest.stock.calculators) }
	};
}

async function gather(db: Db, rows: PieceRow[]): Promise<Dossier[]> {
	if (rows.length === 0) return [];
	const ids = rows.map(({ id }) => id);
	const stock = await readStock(db);
	const writers = await db.select().from(pieceWriters).where(inArray(pieceWriters.pieceId, ids));
	const newest = await db
		.selectDistinctOn([proofs.pieceId])
		.from(proofs)
		.where(inArray(proofs.pieceId, ids))
		.orderBy(proofs.pieceId, desc(proofs.number));
	const formulaSignings = await readFormulaSignings(
		db,
		newest.map(({ document }) => document)
	);
	const signed = await db
		.select({ row: signatures, proofNumber: proofs.number })
		.from(signatures)
		.innerJoin(proofs, eq(proofs.id, signatures.proofId))
		.where(inArray(signatures.pieceId, ids))
		.orderBy(signatures.signedAt, signatures.id);
	const asked = await db
		.select({ row: queries, proofNumber: proofs.number })
		.from(queries)
		.innerJoin(proofs, eq(proofs.id, queries.proofId))
		.where(inArray(queries.pieceId, ids))
		.orderBy(queries.askedAt, queries.id);
	const released = await db
		.select({
			id: releases.id,
			pieceId: releases.pieceId,
			number: releases.number,
			digest: releases.digest,
			proofId: releases.proofId,
			releasedBy: releases.releasedBy,
			releasedAt: releases.releasedAt,
			proofNumber: proofs.number
		})
		.from(releases)
		.innerJoin(proofs, eq(proofs.id, releases.proofId))
		.where(inArray(releases.pieceId, ids))
		.orderBy(desc(releases.number));

	return rows.map((piece) => {
		const ofPiece = <T extends { pieceId: string }>(all: T[]) =>
			all.filter(({ pieceId }) => pieceId === piece.id);
		return {
			piece,
			writers: ofPiece(writers).map(({ personId }) => personId),
			proof: ofPiece(newest)[0] ?? null,
			signatures: ofPiece(signed.map(({ row, proofNumber }) => ({ ...row, proofNumber }))),
			queries: ofPiece(asked.map(({ row, proofNumber }) => ({ ...row, proofNumber }))),
			formulaSignings,
			releases: ofPiece(released),
			stock
		};
	});
}

/** Everyone named in the dossiers, for the name book. */
export function* namedIn(dossiers: readonly Dossier[]): Generator<string | null> {
	for (const dossier of dossiers) {
		const { piece, writers, proof, signatures, queries, formulaSignings, releases } = dossier;
		yield* [piece.savedBy, piece.spikedBy];
		yield* writers;
		if (proof) yield* [proof.pulledBy, proof.passedBy, ...proof.writers];
		for (const { personId } of [...signatures, ...formulaSignings]) yield personId;
		for (const { askedBy, answeredBy } of queries) yield* [askedBy, answeredBy];
		for (const { releasedBy } of releases) yield releasedBy;
	}
}
