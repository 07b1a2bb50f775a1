/** What a release is made of: files under content-addressed keys, and the list that says which is which. */

export interface BundleFile {
	/** `frames/<sha256>.html`, `releases/<sha256>.json`, or `press/<name>` where the name carries a hash. */
	key: string;
	contentType: string;
	bytes: Uint8Array;
	/** Of the bytes, in hex. */
	sha256: string;
}

/** Plain JSON: kept with the release's row and beside the bytes on the shelf. */
export interface BundleManifest {
	version: 1;
	slug: string;
	release: number;
	/** ISO 8601, UTC. */
	releasedAt: string;
	/** SHA-256 of the frame's document, in hex. */
	digest: string;
	/** The frame's document. */
	page: string;
	/** Hashes of the styles that stand in the document, as content policies write them. */
	styles: string[];
	files: { key: string; contentType: string; sha256: string }[];
}

export interface Bundle {
	digest: string;
	files: BundleFile[];
	manifest: BundleManifest;
}
