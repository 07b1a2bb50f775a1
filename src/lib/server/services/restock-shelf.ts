/** Puts what is out before readers again after a restart. */
import { desc, eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { sha256 } from '../auth/hashes.ts';
import type { Fixtures } from '../context.ts';
import { pieces, releases } from '../db/schema/index.ts';
import type { Bundle, BundleManifest } from '../press/bundle.ts';

export interface Restocked {
	/** Releases that stood on the shelf's own disk. */
	there: number;
	/** Releases fetched from the store. */
	fetched: number;
	/** “slug.number” of releases that couldn't be fetched. */
	missing: string[];
}

/** Puts every release before readers, fetching from the store what the shelf's own disk lacks. */
export async function restockShelf({
	db,
	shelf,
	store
}: Pick<Fixtures, 'db' | 'shelf' | 'store'>): Promise<Restocked> {
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
async function fetchBundle(
	store: Fixtures['store'],
	manifest: BundleManifest
): Promise<Bundle | null> {
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
