/** How one number is known, as a reader is told. Made when a proof is released; the frame adds what moves. */
import type { BeamPicture } from '../factcheck/beam.ts';

export interface ClaimRecord {
	/** The beam at the first settings; null where there is nothing to weigh. */
	beam: { picture: BeamPicture; words: string; reads: string } | null;
	/** One sentence about the weighing at the first settings. */
	says: string;
	/** Who signed it, newest first. */
	checkedBy: { name: string; /** ISO 8601. */ on: string }[];
	/** Published sources of the values and methods upstream. */
	restsOn: string[];
	/** What each calculator does, in words, in order. */
	working: string[];
}

/** By claim id. */
export type ClaimRecords = Readonly<Record<string, ClaimRecord>>;
