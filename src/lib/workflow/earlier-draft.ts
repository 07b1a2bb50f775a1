import type { PersonName } from './piece.ts';

/** An earlier draft of a piece that can be opened, as its list shows it. */
export interface EarlierDraft {
	version: number;
	savedBy: PersonName;
	/** ISO 8601, UTC. */
	savedAt: string;
	/** Given by a person: “before the cut”; null for most. */
	name: string | null;
	namedBy: PersonName | null;
	/** The version whose words this one brought back. */
	restoredFrom: number | null;
	/** Number of the proof that was pulled from it. */
	proof: number | null;
	/** It is what stands in the manuscript now. */
	isNewest: boolean;
}
