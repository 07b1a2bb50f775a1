/**
 * Published frames, ready to hand over: in memory, with a copy on disk, so that readers are answered without the
 * database and without the store. What is placed here is never changed; a newer release stands beside the older one.
 */
import { resolve } from 'node:path';
import type { Bundle, BundleManifest } from '../press/bundle.ts';
import type { Encoding } from './encodings.ts';
import { ShelfMirror, type StoredFile } from './mirror.ts';
import { ThemeShelf } from './theme-shelf.ts';

/** A file in all its forms, with what its answers need. */
export interface ShelfFile {
	contentType: string;
	sha256: string;
	plain: Buffer;
	packed: Record<Encoding, Buffer | null>;
}

export interface ShelfPage extends ShelfFile {
	slug: string;
	release: number;
	/** Hashes of the styles in the document, for its policy. */
	styles: string[];
}

export interface LoadReport {
	/** How many releases stand on the shelf now. */
	placed: number;
	/** “slug.number” of releases whose copy on disk can't be used; place them again from the store. */
	damaged: string[];
}

export class ReleaseShelf {
	readonly folder: string;
	readonly themes: ThemeShelf;
	#mirror: ShelfMirror;
	#pages = new Map<string, ShelfPage>();
	#newest = new Map<string, number>();
	#assets = new Map<string, ShelfFile>();

	constructor(folder: string) {
		this.folder = folder;
		this.themes = new ThemeShelf(folder);
		this.#mirror = new ShelfMirror(folder);
	}

	/** Brings the copy on disk into memory. A release with a missing or altered file is left out and named. */
	async load(): Promise<LoadReport> {
		await this.themes.load();
		const { manifests, damaged } = await this.#mirror.lists();
		for (const manifest of manifests) {
			const files = await this.#storedFiles(manifest);
			if (files) this.#stand(manifest, files);
			else damaged.push(`${manifest.slug}.${manifest.release}`);
		}
		return { placed: this.#pages.size, damaged };
	}

	/**
	 * Puts a release on disk, then before readers. Placing it again changes nothing. Throws when another release has the
	 * same number, or when a file of the same name has other bytes.
	 */
	async place({ manifest, files }: Bundle): Promise<void> {
		if (!SLUG.test(manifest.slug))
			throw new Error(`“${manifest.slug}” is no slug: small letters, digits, dashes.`);
		const standing = this.#pages.get(pageKey(manifest.slug, manifest.release));
		if (standing && standing.sha256 !== manifest.digest) {
			throw new Error(
				`Release ${manifest.release} of ${manifest.slug} is out already, with other words.`
			);
		}
		const stored = new Map<string, StoredFile>();
		for (const { key, sha256, bytes, contentType } of files) {
			const known = this.#assets.get(assetName(key));
			if (known && known.sha256 !== sha256)
				throw new Error(`${key} is on the shelf with other bytes.`);
			stored.set(key, await this.#mirror.keepFile(sha256, bytes, contentType));
		}
		await this.#mirror.keepList(manifest);
		this.#stand(manifest, stored);
	}

	find(slug: string, release: number | 'latest'): ShelfPage | undefined {
		const number = release === 'latest' ? this.#newest.get(slug) : release;
		return number === undefined ? undefined : this.#pages.get(pageKey(slug, number));
	}

	/** A file under /press/, by its name there. */
	asset(name: string): ShelfFile | undefined {
		return this.#assets.get(name);
	}

	async #storedFiles(manifest: BundleManifest): Promise<Map<string, StoredFile> | null> {
		const files = new Map<string, StoredFile>();
		for (const { key, sha256, contentType } of manifest.files) {
			const file = await this.#mirror.readFile(sha256, contentType);
			if (!file) return null;
			files.set(key, file);
		}
		return files;
	}

	#stand(manifest: BundleManifest, files: Map<string, StoredFile>): void {
		for (const { key, sha256, contentType } of manifest.files) {
			const stored = files.get(key);
			if (!stored) continue;
			const file = { contentType, sha256, plain: stored.bytes, packed: stored.packed };
			if (key.startsWith(ASSETS)) this.#assets.set(assetName(key), file);
			if (key !== manifest.page) continue;
			const { slug, release, styles } = manifest;
			this.#pages.set(pageKey(slug, release), { ...file, slug, release, styles });
			this.#newest.set(slug, Math.max(release, this.#newest.get(slug) ?? 0));
		}
	}
}

const ASSETS = 'press/';
/** It names a file, too. */
const SLUG = /^[a-z0-9][a-z0-9-]{0,99}$/;

function assetName(key: string): string {
	return key.startsWith(ASSETS) ? key.slice(ASSETS.length) : key;
}

function pageKey(slug: string, release: number): string {
	return `${slug}/${release}`;
}

const SHELVES = Symbol.for('steelyard.release-shelves');
type Holder = { [SHELVES]?: Map<string, ReleaseShelf> };

/**
 * The shelf of a data folder, one a process, made at first call and not loaded yet. The server's entry and SvelteKit's
 * bundle each carry this file, and both get the same shelf.
 */
export function shelfOf(dataFolder: string): ReleaseShelf {
	const shelves = ((globalThis as Holder)[SHELVES] ??= new Map());
	const folder = resolve(dataFolder, 'shelf');
	const shelf = shelves.get(folder) ?? new ReleaseShelf(folder);
	shelves.set(folder, shelf);
	return shelf;
}
