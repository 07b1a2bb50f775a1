/** From a passed proof to what readers get. */
import { and, eq, lte } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { canonicalJson, freeze } from '../../widget/freeze.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { ReleaseView } from '../../workflow/piece.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { pieceWriters, releases } from '../db/schema/index.ts';
import { accountOf, type PublicAccount } from '../press/account.ts';
import { makeBundle, type Bundle } from '../press/press.ts';
import { recordsOf } from '../press/records.ts';
import { record } from './daybook.ts';
import { namedIn, type Dossier, type ProofRow } from './dossier.ts';
import { conditionsOf } from './pass-conditions.ts';
import { nameBook } from './people.ts';
import { picturesForPress } from './pictures-press.ts';
import { viewRelease } from './piece-view.ts';
import { lockNewestProof, type LockedProof } from './proofs.ts';
import { inForce, makersOf, namedBy, signingsOf } from './release-makers.ts';
import { requireFresh } from './sessions.ts';
import { isReleased } from './standing.ts';

/**
 * Releases the newest, passed proof under the next number. The bytes go into the store first, under the hashes of what
 * they are; then one transaction makes the release; then it stands before readers. Cut short anywhere, either nothing
 * is out and it can be tried again, or it is out and `restockShelf` puts it before readers at the next start.
 */
export async function releaseProof(
	ctx: Context,
	slug: string,
	input: { proofId: string }
): Promise<ReleaseView> {
	const { actor, now } = ctx;
	requirePermission(actor, 'release-proof');
	const seen = await ctx.db.transaction((tx) => mayRelease(tx, ctx, slug, input.proofId));
	const number = nextNumber(seen.dossier);
	const { bundle, account } = await print(ctx, seen, number);
	for (const { key, bytes, contentType } of bundle.files) {
		if (!(await ctx.store.head(key))) await ctx.store.put(key, bytes, contentType);
	}

	await ctx.db.transaction(async (tx) => {
		// Asked again: bundling took a while, and what it printed must be what still holds.
		const again = await mayRelease(tx, ctx, slug, input.proofId);
		if (nextNumber(again.dossier) !== number) throw new SteelyardError('proof-superseded');
		if (canonicalJson(printed(again)) !== canonicalJson(printed(seen)))
			throw new SteelyardError('check-moved');
		const { proof } = again;
		await tx.insert(releases).values({
			pieceId: proof.pieceId,
			number,
			digest: proof.digest,
			proofId: proof.id,
			document: proof.document,
			manifest: bundle.manifest,
			account,
			releasedBy: actor.personId,
			releasedAt: now
		});
		// Whoever changes the draft after this proof's version writes the next release.
		await tx
			.delete(pieceWriters)
			.where(
				and(eq(pieceWriters.pieceId, proof.pieceId), lte(pieceWriters.version, proof.version))
			);
		await record(tx, ctx, 'proof-released', {
			pieceId: proof.pieceId,
			proofId: proof.id,
			number,
			digest: proof.digest,
			page: bundle.digest
		});
	});
	await ctx.shelf.place(bundle);
	return viewRelease(
		{
			id: '',
			pieceId: seen.proof.pieceId,
			number,
			digest: seen.proof.digest,
			proofId: seen.proof.id,
			proofNumber: seen.proof.number,
			releasedBy: actor.personId,
			releasedAt: now
		},
		(personId) => ({ personId, name: actor.name })
	);
}

/** A proof that an editor has passed. */
interface PassedProof extends LockedProof {
	proof: ProofRow & { passedBy: string; passedAt: Date };
}

/** All that must hold for the actor to release this proof now; throws what doesn't. */
async function mayRelease(
	tx: Db,
	ctx: Context,
	slug: string,
	proofId: string
): Promise<PassedProof> {
	const { actor } = ctx;
	const locked = await lockNewestProof(tx, slug, proofId);
	const { dossier, proof, standing } = locked;
	requirePermission(actor, 'release-proof', { proof: standing.people });
	if (isReleased(dossier, proof)) throw new SteelyardError('already-released');
	await requireFresh(ctx, tx);
	const names = await nameBook(tx, namedIn([dossier]));
	const open = conditionsOf(dossier, actor, names).filter(({ met }) => !met);
	if (open.length > 0) throw new SteelyardError('conditions-open', { conditions: open });
	const { passedBy, passedAt } = proof;
	if (!passedBy || !passedAt) {
		const says = 'An editor hasn’t passed this proof yet.';
		throw new SteelyardError('conditions-open', {
			conditions: [{ side: 'people', met: false, says, mend: 'Pass it first, then release it.' }]
		});
	}
	return { ...locked, proof: { ...proof, passedBy, passedAt } };
}

function nextNumber({ releases: done }: Dossier): number {
	return (done[0]?.number ?? 0) + 1;
}

/** What a release prints that may change while it is being made. */
function printed({ proof, standing }: PassedProof) {
	return {
		passedBy: proof.passedBy,
		passedAt: proof.passedAt.toISOString(),
		signatures: inForce(standing)
			.map(({ id }) => id)
			.sort()
	};
}

async function print(
	ctx: Context,
	{ dossier, proof, standing }: PassedProof,
	number: number
): Promise<{ bundle: Bundle; account: PublicAccount }> {
	const { calculators, house } = dossier.stock;
	const names = await nameBook(ctx.db, namedBy(standing, proof.passedBy));
	const makers = makersOf(standing, proof.passedBy, names);
	const records = recordsOf(proof.document, calculators, signingsOf(standing, names));
	const bundle = await makeBundle({
		frozen: freeze(proof.document, calculators),
		calculators,
		houseCalculators: house,
		slug: dossier.piece.slug,
		releaseNumber: number,
		releasedAt: ctx.now,
		house: ctx.house.name,
		makers,
		records,
		pictures: await picturesForPress(ctx.store, proof.document),
		pressFolder: ctx.pressFolder
	});
	return { bundle, account: accountOf(proof.document, calculators, records, makers) };
}
