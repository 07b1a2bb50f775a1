/** A scientist's name under one claim: given, and taken back. */
import { eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { SignClaim, TakeBackSignature } from '../../forms/check.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import { signatures } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { dropPass, lockAnyProof, lockNewestProof } from './proofs.ts';
import { requireFresh } from './sessions.ts';
import { isOpen, isReleased } from './standing.ts';

/** Signs one claim of the newest proof. Signing again what one has signed changes nothing. */
export async function signClaim(
	ctx: Context,
	slug: string,
	input: SignClaim
): Promise<{ signatureId: string }> {
	const { actor, now } = ctx;
	requirePermission(actor, 'sign-claim');
	return ctx.db.transaction(async (tx) => {
		const { proof, standing } = await lockNewestProof(tx, slug, input.proofId);
		requirePermission(actor, 'sign-claim', { proof: standing.people });
		await requireFresh(ctx, tx);

		const standingClaim = standing.claims.find(({ examined }) => examined.claim.id === input.claim);
		if (!standingClaim) throw new SteelyardError('not-found');
		const { examined, queries } = standingClaim;
		if (queries.some(isOpen)) throw new SteelyardError('query-open');
		if (examined.verdict.verdict === 'tips')
			throw new SteelyardError('claim-tips', { reason: examined.verdict.reason });
		if (examined.verdict.verdict === 'unweighed') throw new SteelyardError('claim-unweighed');
		const own = standingClaim.signatures.find(
			({ inForce, personId }) => inForce && personId === actor.personId
		);
		if (own) return { signatureId: own.id };

		const [signature] = await tx
			.insert(signatures)
			.values({
				pieceId: proof.pieceId,
				claim: input.claim,
				coverHash: examined.coverHash,
				cover: examined.cover,
				sentence: examined.sentence,
				proofId: proof.id,
				personId: actor.personId,
				signedAt: now
			})
			.returning({ id: signatures.id });
		if (!signature) throw new Error('The database took a signature and gave back no id.');
		await record(tx, ctx, 'claim-signed', {
			pieceId: proof.pieceId,
			proofId: proof.id,
			claim: input.claim,
			coverHash: examined.coverHash
		});
		return { signatureId: signature.id };
	});
}

/** Takes one's own signature back, as long as the newest proof isn't released. A pass that rested on it drops. */
export async function takeBackSignature(
	ctx: Context,
	slug: string,
	input: TakeBackSignature
): Promise<void> {
	const { actor, now } = ctx;
	requirePermission(actor, 'read-proof');
	await ctx.db.transaction(async (tx) => {
		const { dossier, proof } = await lockAnyProof(tx, slug);
		const signature = dossier.signatures.find(({ id }) => id === input.signatureId);
		if (!signature) throw new SteelyardError('not-found');
		if (signature.personId !== actor.personId) throw new SteelyardError('not-permitted');
		if (signature.takenBackAt) return;
		if (isReleased(dossier, proof)) throw new SteelyardError('already-released');

		await tx.update(signatures).set({ takenBackAt: now }).where(eq(signatures.id, signature.id));
		await record(tx, ctx, 'signature-taken-back', {
			pieceId: proof.pieceId,
			signatureId: signature.id,
			claim: signature.claim
		});
		await dropPass(tx, ctx, dossier, proof, 'signature-taken-back');
	});
}
