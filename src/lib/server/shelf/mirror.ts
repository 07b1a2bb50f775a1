/** The shelf's copy on disk: bytes under their own hash, and one list a release. */
import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { z } from 'zod';
import { sha256 } from '../auth/hashes.ts';
import { BundleManifest } from '../press/bundle.ts';
import { isMissing, write } from './atomic-file.ts';
import { ENCODINGS, pack, unpacksTo, type Encoding, type Packed } from './encodings.ts';

export interface StoredFile {
	bytes: Buffer;
	packed: Packed;
}

const ENDINGS: Record<Encoding, string> = { br: '.br', gzip: '.gz' };

export class ShelfMirror {
	constructor(readonly folder: string) {}

	/** Keeps the bytes with their packed forms; a file that is there already is left as it is. */
	async keepFile(hash: string, bytes: Uint8Array, contentType: string): Promise<StoredFile> {
		const kept = await this.readFile(hash, contentType);
		if (kept) return kept;
		const packed = await pack(bytes, contentType);
		await Promise.all(
			ENCODINGS.map(async (encoding) => {
				const form = packed[encoding];
				if (form) await write(this.#file(hash) + ENDINGS[encoding], form);
			})
		);
		await write(this.#file(hash), bytes);
		return { bytes: Buffer.from(bytes), packed };
	}

	/** Null when the file isn't there, or isn't what its name says. Packed forms that don't fit are made again. */
	async readFile(hash: string, contentType: string): Promise<StoredFile | null> {
		const bytes = await readIfThere(this.#file(hash));
		if (!bytes || sha256(bytes) !== hash) return null;
		const [br, gzip] = await Promise.all(
			ENCODINGS.map(async (encoding) => {
				const form = await readIfThere(this.#file(hash) + ENDINGS[encoding]);
				return form && (await unpacksTo(form, encoding, bytes)) ? form : null;
			})
		);
		if (br && gzip) return { bytes, packed: { br, gzip } };
		return { bytes, packed: await pack(bytes, contentType) };
	}

	async keepList(manifest: BundleManifest): Promise<void> {
		await write(this.#list(manifest.slug, manifest.release), Buffer.from(JSON.stringify(manifest)));
	}

	/** Every release's list that can be read, and the places of those that can't. */
	async lists(): Promise<{ manifests: BundleManifest[]; damaged: string[] }> {
		const manifests: BundleManifest[] = [];
		const damaged: string[] = [];
		const folder = join(this.folder, 'lists');
		for (const name of await namesIn(folder)) {
			if (!name.endsWith('.json')) continue;
			try {
				manifests.push(
					BundleManifest.parse(JSON.parse(await readFile(join(folder, name), 'utf8')))
				);
			} catch (error) {
				if (!(error instanceof SyntaxError || error instanceof z.ZodError)) throw error;
				damaged.push(name.replace(/\.json$/, ''));
			}
		}
		return { manifests, damaged };
	}

	#file(hash: string): string {
		return join(this.folder, 'files', hash.slice(0, 2), hash);
	}

	#list(slug: string, release: number): string {
		return join(this.folder, 'lists', `${slug}.${release}.json`);
	}
}

async function readIfThere(file: string): Promise<Buffer | null> {
	try {
		return await readFile(file);
	} catch (error) {
		if (isMissing(error)) return null;
		throw error;
	}
}

async function namesIn(folder: string): Promise<string[]> {
	try {
		return (await readdir(folder)).sort();
	} catch (error) {
		if (isMissing(error)) return [];
		throw error;
	}
}
