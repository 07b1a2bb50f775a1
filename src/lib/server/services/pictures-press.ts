/** The pictures of a document that goes to print, fetched from the picture desk under the names they have in a release. */
import { SteelyardError } from '../../errors.ts';
import { pressKey, storeKey } from '../../pictures/address.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { sha256 } from '../auth/hashes.ts';
import type { Fixtures } from '../context.ts';
import type { BundleFile } from '../press/bundle.ts';

/** Each file once. Throws `picture-missing` when the store has one no longer, or holds it with other bytes. */
export async function picturesForPress(
	store: Fixtures['store'],
	document: WidgetDocument
): Promise<BundleFile[]> {
	const files = new Map<string, BundleFile>();
	for (const block of document.blocks) {
		if (block.kind !== 'picture') continue;
		for (const file of block.files) {
			const key = pressKey(file);
			if (files.has(key)) continue;
			// A release that went out before keeps its own copy, should the desk have lost its.
			const bytes = (await store.get(storeKey(file))) ?? (await store.get(key));
			if (!bytes || sha256(bytes) !== file.digest) throw new SteelyardError('picture-missing');
			files.set(key, { key, contentType: file.type, bytes, sha256: file.digest });
		}
	}
	return [...files.values()];
}
