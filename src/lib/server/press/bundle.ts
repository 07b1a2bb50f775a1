/** What a release is made of: files under content-addressed keys, and the list that says which is which. */
import { z } from 'zod';

export interface BundleFile {
	/** `frames/<sha256>.html`, `releases/<sha256>.json`, or `press/<name>` where the name carries a hash. */
	key: string;
	contentType: string;
	bytes: Uint8Array;
	/** Of the bytes, in hex. */
	sha256: string;
}

const Sha256 = z.string().regex(/^[0-9a-f]{64}$/);

/** Plain JSON: kept with the release's row and beside the bytes on the shelf. */
export const BundleManifest = z.strictObject({
	version: z.literal(1),
	slug: z.string(),
	release: z.number().int().positive(),
	/** ISO 8601, UTC. */
	releasedAt: z.iso.datetime(),
	/** SHA-256 of the frame's document, in hex. */
	digest: Sha256,
	/** The frame's document. */
	page: z.string(),
	/** Hashes of the styles that stand in the document, as content policies write them. */
	styles: z.array(z.string()),
	files: z.array(z.strictObject({ key: z.string(), contentType: z.string(), sha256: Sha256 }))
});
export type BundleManifest = z.infer<typeof BundleManifest>;

export interface Bundle {
	digest: string;
	files: BundleFile[];
	manifest: BundleManifest;
}
