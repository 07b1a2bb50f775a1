/**
 * Scientists who put their names to the formulas of a piece. What is signed is the formula's digest: the same formula,
 * vetted once, is vetted wherever it stands unchanged, and any change of it asks for a new signature.
 */
import { SteelyardError } from '../../errors.ts';
import type { TakeBackFormula, VetFormula } from '../../forms/vet-formula.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { vettings } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { FORMULA } from './formula-standing.ts';
import { formulaProblems } from './formula-steps.ts';
import { dropPass, lockAnyProof, lockNewestProof } from './proofs.ts';
import { requireFresh } from './sessions.ts';
import { isReleased } from './standing.ts';
import { refuseUnstorable } from './storable.ts';

/** Signs a formula of the newest proof. Signing again what one has signed changes nothing. */
export async function vetFormula(ctx: Context, slug: string, input: VetFormula): Promise<void> {
	const { actor } = ctx;
	requirePermission(actor, 'vet-formula');
	refuseUnstorable(input);
	await ctx.db.transaction(async (tx) => {
		const { proof, standing } = await lockNewestProof(tx, slug, input.proofId);
		requirePermission(actor, 'vet-formula', { proof: standing.people });
		await requireFresh(ctx, tx);
		const found = standing.formulas.find(({ digest }) => digest === input.digest);
		if (!found) throw new SteelyardError('not-found');
		const problems = formulaProblems(found.formula); // what runs now, not what ran at the proof
		if (problems.length > 0) throw new SteelyardError('formula-broken', { problems });
		if (found.signings.some(({ personId }) => personId === actor.personId)) return;

		await step(tx, ctx, input.digest, 'vetted', input.note);
		await record(tx, ctx, 'formula-vetted', { pieceId: proof.pieceId, digest: input.digest });
	});
}

/** Takes one's own signature back, as long as the newest proof isn't released. A pass that rested on it drops. */
export async function takeBackFormula(
	ctx: Context,
	slug: string,
	input: TakeBackFormula
): Promise<void> {
	const { actor } = ctx;
	requirePermission(actor, 'read-proof');
	await ctx.db.transaction(async (tx) => {
		const { dossier, proof, standing } = await lockAnyProof(tx, slug);
		const found = standing.formulas.find(({ digest }) => digest === input.digest);
		if (!found) throw new SteelyardError('not-found');
		if (!found.signings.some(({ personId }) => personId === actor.personId)) return;
		if (isReleased(dossier, proof)) throw new SteelyardError('already-released');

		await step(tx, ctx, input.digest, 'withdrawn', '');
		await record(tx, ctx, 'formula-vetting-taken-back', {
			pieceId: proof.pieceId,
			digest: input.digest
		});
		await dropPass(tx, ctx, dossier, proof, 'formula-vetting-taken-back');
	});
}

async function step(
	tx: Db,
	{ actor, now }: Context,
	digest: string,
	state: 'vetted' | 'withdrawn',
	note: string
): Promise<void> {
	if (!actor) throw new SteelyardError('not-signed-in');
	const row = { calculator: FORMULA, revision: digest, state, note };
	await tx.insert(vettings).values({ ...row, personId: actor.personId, at: now });
}
