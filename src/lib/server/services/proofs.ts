/** Proofs: pulled from the draft, passed by an editor when every condition is met. */
import { eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { requirePermission, type Actor } from '../../workflow/permissions.ts';
import type { Condition } from '../../workflow/piece.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { proofs } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { readDossier, type Dossier, type ProofRow } from './dossier.ts';
import { examine } from './examination.ts';
import { conditionsOf } from './pass-conditions.ts';
import { nameBook } from './people.ts';
import { lockPiece } from './pieces.ts';
import { requireFresh } from './sessions.ts';
import { isReleased, standingOf, type Standing } from './standing.ts';

/** Freezes the draft under the next number. Pulling twice from the same draft gives the same proof. */
export async function pullProof(
	ctx: Context,
	slug: string
): Promise<{ proofId: string; number: number }> {
	const { actor, now } = ctx;
	requirePermission(actor, 'pull-proof');
	return ctx.db.transaction(async (tx) => {
		const { piece, proof: newest, writers, stock } = await dossierOf(tx, await lockPiece(tx, slug));
		const { findings: lacking, digest } = examine(piece.document, stock.calculators);
		if (lacking.length > 0) throw new SteelyardError('proof-not-ready', { findings: lacking });

		if (newest?.digest === digest) return { proofId: newest.id, number: newest.number };

		const number = (newest?.number ?? 0) + 1;
		const [pulled] = await tx
			.insert(proofs)
			.values({
				pieceId: piece.id,
				number,
				version: piece.version,
				document: piece.document,
				digest,
				pulledBy: actor.personId,
				pulledAt: now,
				writers
			})
			.returning({ id: proofs.id });
		if (!pulled) throw new Error('The database took a proof and gave back no id.');
		await record(tx, ctx, 'proof-pulled', {
			pieceId: piece.id,
			proofId: pulled.id,
			number,
			digest
		});
		return { proofId: pulled.id, number };
	});
}

/** What the release room lists: every condition as a sentence, met or with its mend, for the person who asks. */
export async function passConditions(ctx: Context, slug: string): Promise<Condition[]> {
	requirePermission(ctx.actor, 'read-proof');
	const dossier = await readDossier(ctx.db, { slug });
	if (!dossier) throw new SteelyardError('not-found');
	return conditionsFor(ctx.db, ctx.actor, dossier);
}

/** Passes the newest proof for press. Throws `conditions-open` with what is still open. */
export async function passProof(
	ctx: Context,
	slug: string,
	input: { proofId: string }
): Promise<void> {
	const { actor, now } = ctx;
	requirePermission(actor, 'pass-proof');
	await ctx.db.transaction(async (tx) => {
		const { proof, standing, dossier } = await lockNewestProof(tx, slug, input.proofId);
		requirePermission(actor, 'pass-proof', { proof: standing.people });
		await requireFresh(ctx, tx);
		const open = (await conditionsFor(tx, actor, dossier)).filter(({ met }) => !met);
		if (open.length > 0) throw new SteelyardError('conditions-open', { conditions: open });
		if (proof.passedAt) return;

		await tx
			.update(proofs)
			.set({ passedBy: actor.personId, passedAt: now })
			.where(eq(proofs.id, proof.id));
		await record(tx, ctx, 'proof-passed', {
			pieceId: proof.pieceId,
			proofId: proof.id,
			digest: proof.digest
		});
	});
}

/** Takes a pass away when what it rested on has changed; a released proof keeps its pass. */
export async function dropPass(
	tx: Db,
	ctx: Context,
	dossier: Dossier,
	proof: ProofRow,
	cause: string
): Promise<void> {
	if (!proof.passedAt || isReleased(dossier, proof)) return;
	await tx.update(proofs).set({ passedBy: null, passedAt: null }).where(eq(proofs.id, proof.id));
	await record(tx, ctx, 'pass-dropped', { pieceId: proof.pieceId, proofId: proof.id, cause });
}

export interface LockedProof {
	dossier: Dossier;
	proof: ProofRow;
	standing: Standing;
}

/** The piece locked, with its newest proof; throws `proof-superseded` when that isn't the one the caller looked at. */
export async function lockNewestProof(tx: Db, slug: string, proofId: string): Promise<LockedProof> {
	const locked = await lockAnyProof(tx, slug);
	if (locked.proof.id !== proofId)
		throw new SteelyardError('proof-superseded', { newest: locked.proof.number });
	return locked;
}

/** The piece locked, with its newest proof; throws `not-found` when none was ever pulled. */
export async function lockAnyProof(tx: Db, slug: string): Promise<LockedProof> {
	const dossier = await dossierOf(tx, await lockPiece(tx, slug));
	const { proof } = dossier;
	if (!proof) throw new SteelyardError('not-found');
	return { dossier, proof, standing: standingOf(dossier, proof) };
}

async function dossierOf(tx: Db, piece: Dossier['piece']): Promise<Dossier> {
	const dossier = await readDossier(tx, { piece });
	if (!dossier) throw new SteelyardError('not-found');
	return dossier;
}

async function conditionsFor(db: Db, actor: Actor, dossier: Dossier): Promise<Condition[]> {
	const people = [
		...(dossier.proof?.writers ?? []),
		...dossier.signatures.map(({ personId }) => personId)
	];
	return conditionsOf(dossier, actor, await nameBook(db, people));
}
