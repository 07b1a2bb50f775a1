/** The slip of a piece: what it is for, agreed before it is written. Its point is the document’s own, and stands there. */
export interface Slip {
	/** Who it is for. */
	reader: string;
	/** Where it is to run. */
	partner: string;
	/** What was asked about keeping it back, in words; the release sets the instant. */
	embargo: string;
	/** How long the copy is to be, in words; null where nobody has said. */
	words: number | null;
	/** When it is due: an instant (ISO 8601, UTC), and the zone it was given in. */
	due: { at: string; zone: string } | null;
}

export const EMPTY_SLIP: Slip = { reader: '', partner: '', embargo: '', words: null, due: null };

/** What a slip still lacks, as a sentence lists it. An embargo is no part of it: most pieces have none. */
export function lackingOn({ reader, partner, words, due }: Slip, point: string): string[] {
	return [
		point.trim() ? '' : 'the point',
		reader ? '' : 'the reader',
		words === null ? 'the length' : '',
		partner ? '' : 'the partner',
		due ? '' : 'the date'
	].filter(Boolean);
}
