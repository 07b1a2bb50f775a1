/** The shapes in which the picture desk’s pictures travel between server and screen. */
import type { PictureRecord } from './record.ts';

/** What may be uploaded. */
export const PICTURE_TYPES = [
	'image/png',
	'image/jpeg',
	'image/webp',
	'image/avif',
	'image/svg+xml'
] as const;
export type PictureType = (typeof PICTURE_TYPES)[number];

/** What is stored of it. */
export type StoredType = 'image/webp' | 'image/jpeg' | 'image/png';

export const LARGEST_BYTES = 10 * 1024 * 1024;
export const MOST_PIXELS = 24_000_000;

/** One stored width. */
export interface PictureFile {
	/** SHA-256 of the bytes, in hex: its name. */
	digest: string;
	/** In pixels. */
	width: number;
	height: number;
	type: StoredType;
	bytes: number;
}

/** Where a picture stands in print or on the way there. */
export interface PictureUse {
	slug: string;
	title: string;
	/** In the working draft. */
	draft: boolean;
	/** Numbers of the proofs that hold it, oldest first. */
	proofs: number[];
	/** Numbers of the releases that hold it, oldest first. */
	releases: number[];
	/** The newest release holds it: it is what readers get. */
	live: boolean;
}

export interface PictureView {
	id: string;
	fileName: string;
	sourceType: PictureType;
	/** In pixels, upright. */
	width: number;
	height: number;
	files: PictureFile[];
	record: PictureRecord;
	version: number;
	addedBy: string;
	/** ISO 8601, UTC. */
	addedAt: string;
	savedBy: string;
	savedAt: string;
	uses: PictureUse[];
}
