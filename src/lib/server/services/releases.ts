/** From a passed proof to what readers get, and back to the shelf after a restart. */
import { and, desc, eq, lte } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { catalogue } from '../../physics/calculators/index.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { freeze } from '../../widget/freeze.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { ReleaseView } from '../../workflow/piece.ts';
import { sha256 } from '../auth/hashes.ts';
import type { Context, Fixtures } from '../context.ts';
import type { Db } from '../db/client.ts';
import { pieces, pieceWriters, proofs, releases } from '../db/schema/index.ts';
import { recordsOf } from '../press/records.ts';
import { makeBundle, type Bundle, type BundleManifest, type Makers } from '../press/press.ts';
import { record } from './daybook.ts';
import { namedIn, readDossier, type Dossier, type ProofRow } from './dossier.ts';
import { conditionsOf } from './pass-conditions.ts';
import { nameBook } from './people.ts';
import { viewRelease } from './piece-view.ts';
import { lockNewestProof, type LockedProof } from './proofs.ts';
import { requireFresh } from './sessions.ts';
import { isReleased, standingOf } from './standing.ts';

/**
 * Releases the newest, passed proof under the next number. The bytes go into the store first, under the hashes of what
 * they are; then one transaction makes the release; then it stands before readers. Cut short anywhere, either nothing
 * is out and it can be tried again, or it is out and `restockShelf` puts it before readers at the next start.
 */
export async function releaseProof(ctx: Context, slug: string, input: { proofId: string }): Promise<ReleaseView> {
	const { actor, now } = ctx;
	requirePermission(actor, 'release-proof');
	const seen = await ctx.db.transaction((tx) => mayRelease(tx, ctx, slug, input.proofId));
	const number = nextNumber(seen.dossier);
	const bundle = await printBundle(ctx, seen, number);
	for (const { key, bytes, contentType } of bundle.files) {
		if (!(await ctx.store.head(key))) await ctx.store.put(key, bytes, contentType);
	}

	await ctx.db.transaction(async (tx) => {
		// Asked again: bundling took a while, and someone may have been quicker.
		const { dossier, proof } = await mayRelease(tx, ctx, slug, input.proofId);
		if (nextNumber(dossier) !== number) throw new SteelyardError('proof-superseded');
		await tx.insert(releases).values({
			pieceId: proof.pieceId,
			number,
			digest: proof.digest,
			proofId: proof.id,
			document: proof.document,
			manifest: bundle.manifest,
			releasedBy: actor.personId,
			releasedAt: now
		});
		// Whoever changes the draft from now on writes the next release.
		await tx
			.delete(pieceWriters)
			.where(and(eq(pieceWriters.pieceId, proof.pieceId), lte(pieceWriters.changedAt, proof.pulledAt)));
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

/** All that must hold for the actor to release this proof now; throws what doesn't. */
async function mayRelease(tx: Db, ctx: Context, slug: string, proofId: string): Promise<LockedProof> {
	const { actor } = ctx;
	const locked = await lockNewestProof(tx, slug, proofId);
	const { dossier, proof, standing } = locked;
	requirePermission(actor, 'release-proof', { proof: standing.people });
	if (isReleased(dossier, proof)) throw new SteelyardError('already-released');
	requireFresh(ctx);
	const names = await nameBook(tx, namedIn([dossier]));
	const open = conditionsOf(dossier, actor, names).filter(({ met }) => !met);
	if (open.length > 0) throw new SteelyardError('conditions-open', { conditions: open });
	if (!proof.passedBy) {
		const says = 'An editor hasn’t passed this proof yet.';
		throw new SteelyardError('conditions-open', {
			conditions: [{ side: 'people', met: false, says, mend: 'Pass it first, then release it.' }]
		});
	}
	return locked;
}

function nextNumber({ releases: done }: Dossier): number {
	return (done[0]?.number ?? 0) + 1;
}

async function printBundle(ctx: Context, { dossier, proof, standing }: LockedProof, number: number): Promise<Bundle> {
	const frozen = freeze(proof.document, catalogue);
	// A calculator may have changed under a proof that was checked with the one before.
	if (frozen.digest !== proof.digest) throw new SteelyardError('proof-superseded');
	const names = await nameBook(ctx.db, namedIn([dossier]));
	return makeBundle({
		frozen,
		slug: dossier.piece.slug,
		releaseNumber: number,
		releasedAt: ctx.now,
		house: ctx.house.name,
		makers: makersOf(dossier, proof, names),
		records: recordsOf(
			proof.document,
			catalogue,
			standing.claims.flatMap(({ signatures }) =>
				signatures
					.filter(({ inForce }) => inForce)
					.map(({ claim, personId, signedAt }) => ({ claim, name: names(personId).name, signedAt }))
			)
		),
		pressFolder: ctx.pressFolder
	});
}

function makersOf(dossier: Dossier, proof: ProofRow, names: (id: string) => { name: string }): Makers {
	const { writers, checkers } = standingOf(dossier, proof).people;
	return {
		writers: writers.map((id) => names(id).name),
		checkers: checkers.map((id) => names(id).name),
		editor: proof.passedBy ? names(proof.passedBy).name : ''
	};
}

/** A release as the public page shows it. */
export interface PublicRelease {
	slug: string;
	number: number;
	digest: string;
	/** ISO 8601, UTC. */
	releasedAt: string;
	document: WidgetDocument;
	makers: Makers;
	/** Every release of the piece, newest first. */
	releases: { number: number; releasedAt: string }[];
}

/** The newest release of a piece, for anyone; throws `not-found` when nothing of it is out. */
export async function getPublicRelease(ctx: Pick<Context, 'db'>, slug: string): Promise<PublicRelease> {
	const dossier = await readDossier(ctx.db, { slug });
	const newest = dossier?.releases[0];
	if (!dossier || !newest) throw new SteelyardError('not-found');
	const [row] = await ctx.db
		.select({ document: releases.document, proof: proofs })
		.from(releases)
		.innerJoin(proofs, eq(proofs.id, releases.proofId))
		.where(eq(releases.id, newest.id));
	if (!row) throw new SteelyardError('not-found');
	const names = await nameBook(ctx.db, [...namedIn([dossier]), ...row.proof.writers, row.proof.passedBy]);
	return {
		slug,
		number: newest.number,
		digest: newest.digest,
		releasedAt: newest.releasedAt.toISOString(),
		document: row.document,
		makers: makersOf(dossier, row.proof, names),
		releases: dossier.releases.map(({ number, releasedAt }) => ({ number, releasedAt: releasedAt.toISOString() }))
	};
}

export interface Restocked {
	/** Releases that stood on the shelf's own disk. */
	there: number;
	/** Releases fetched from the store. */
	fetched: number;
	/** “slug.number” of releases that couldn't be fetched. */
	missing: string[];
}

/** Puts every release before readers, fetching from the store what the shelf's own disk lacks. */
export async function restockShelf({ db, shelf, store }: Pick<Fixtures, 'db' | 'shelf' | 'store'>): Promise<Restocked> {
	await shelf.load();
	const rows = await db
		.select({ slug: pieces.slug, number: releases.number, manifest: releases.manifest })
		.from(releases)
		.innerJoin(pieces, eq(pieces.id, releases.pieceId))
		.orderBy(pieces.slug, desc(releases.number));
	const report: Restocked = { there: 0, fetched: 0, missing: [] };
	for (const { slug, number, manifest } of rows) {
		if (shelf.find(slug, number)?.sha256 === manifest.digest) {
			report.there += 1;
			continue;
		}
		const bundle = await fetchBundle(store, manifest);
		if (bundle) {
			await shelf.place(bundle);
			report.fetched += 1;
		} else report.missing.push(`${slug}.${number}`);
	}
	return report;
}

/** Null when the store is away, or lacks a file or holds it with other bytes. */
async function fetchBundle(store: Fixtures['store'], manifest: BundleManifest): Promise<Bundle | null> {
	const files: Bundle['files'] = [];
	for (const { key, contentType, sha256: hash } of manifest.files) {
		const bytes = await fetchFile(store, key);
		if (!bytes || sha256(bytes) !== hash) return null;
		files.push({ key, contentType, sha256: hash, bytes });
	}
	return { digest: manifest.digest, files, manifest };
}

async function fetchFile(store: Fixtures['store'], key: string): Promise<Uint8Array | null> {
	try {
		return await store.get(key);
	} catch (error) {
		// A house starts without its store, too: what is on the shelf is served.
		if (error instanceof SteelyardError && error.code === 'store-away') return null;
		throw error;
	}
}
