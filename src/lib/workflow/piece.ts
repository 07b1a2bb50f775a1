/** The shapes in which a piece travels from services to pages, and the states derived from its parts. */
import type { Verdict } from '../factcheck/verdict.ts';
import type { ReadingRef, WidgetDocument } from '../widget/document.ts';
import type { Slip } from './slip.ts';

/** How a claim stands on the newest proof. `lapsed`: it was signed, and what the signature covers has changed since. */
export const CLAIM_STATES = ['unsigned', 'signed', 'lapsed', 'queried', 'exempt'] as const;
export type ClaimState = (typeof CLAIM_STATES)[number];

/** Working copy and live release are two machines, shown as two marks side by side. */
export const WORKING_STATES = [
	'draft',
	'in-check',
	'queried',
	'checked',
	'passed',
	'at-rest'
] as const;
export type WorkingState = (typeof WORKING_STATES)[number];

export interface PersonName {
	personId: string;
	name: string;
}

export interface SignatureView {
	id: string;
	claim: string;
	by: PersonName;
	/** ISO 8601, UTC. */
	signedAt: string;
	proofNumber: number;
	inForce: boolean;
	/** The sentence as it stood when signed, for the two-line difference. */
	sentence: string;
}

export interface QueryView {
	id: string;
	claim: string;
	question: string;
	askedBy: PersonName;
	askedAt: string;
	answer: string | null;
	answeredBy: PersonName | null;
	answeredAt: string | null;
	closedAt: string | null;
	proofNumber: number;
}

export interface ClaimView {
	id: string;
	/** “2b”: block and letter, as shown to people. */
	label: string;
	form: 'stated' | 'live' | 'exempt';
	/** The claim's words as a reader sees them at the first settings. */
	words: string;
	/** The sentence it stands in, with the ones before and after for context ('' at the ends of a block). */
	sentence: string;
	before: string;
	after: string;
	reading: ReadingRef | null;
	verdict: Verdict;
	state: ClaimState;
	signatures: SignatureView[];
	queries: QueryView[];
}

/** A formula that was written for the piece, on its proof. */
export interface FormulaView {
	id: string;
	/** What a signature on it is about. */
	digest: string;
	vetted: boolean;
	/** Oldest first. `counts`: not of someone who has become one of the proof's writers. */
	signings: { by: PersonName; at: string; note: string; counts: boolean }[];
}

export interface ProofView {
	id: string;
	number: number;
	digest: string;
	document: WidgetDocument;
	pulledBy: PersonName;
	pulledAt: string;
	writers: PersonName[];
	checkers: PersonName[];
	claims: ClaimView[];
	/** Open queries on claims that this proof no longer holds. */
	looseQueries: QueryView[];
	formulas: FormulaView[];
	passedBy: PersonName | null;
	passedAt: string | null;
}

export interface ReleaseView {
	number: number;
	digest: string;
	proofNumber: number;
	releasedBy: PersonName;
	releasedAt: string;
}

/** One line of the desk. */
export interface PieceSummary {
	id: string;
	slug: string;
	title: string;
	point: string;
	version: number;
	proofNumber: number | null;
	working: WorkingState;
	liveRelease: number | null;
	heldBy: PersonName | null;
	since: string;
	/** “2 not weighed, 1 query”; '' when nothing is missing. */
	missing: string;
}

/** A piece on the spike. */
export interface SpikedPiece {
	slug: string;
	title: string;
	spikedBy: PersonName;
	/** ISO 8601, UTC. */
	spikedAt: string;
}

/** A piece with all that its rooms show. */
export interface PieceView extends PieceSummary {
	document: WidgetDocument;
	slip: Slip;
	/** Who discarded it and when; null for a piece on the desk. */
	spiked: { by: PersonName; at: string } | null;
	savedAt: string;
	savedBy: PersonName;
	/** Everyone who has changed the draft since the last release. */
	writers: PersonName[];
	proof: ProofView | null;
	releases: ReleaseView[];
}

/** One side of the forme on the release screen. */
export interface Condition {
	side: 'claims' | 'people' | 'galley' | 'time';
	met: boolean;
	/** The condition as a sentence. */
	says: string;
	/** How to clear it, when open. */
	mend: string;
	href?: string;
}

/** What still has to happen, from the parts alone: state is derived, never stored. */
export function workingState(piece: {
	draftDigest: string;
	proof: {
		digest: string;
		passed: boolean;
		released: boolean;
		claimStates: readonly ClaimState[];
		/** How many queries are open on claims that the proof no longer holds. */
		looseQueries: number;
	} | null;
}): WorkingState {
	const { proof, draftDigest } = piece;
	if (!proof || proof.digest !== draftDigest) return 'draft';
	if (proof.released) return 'at-rest';
	if (proof.passed) return 'passed';
	if (proof.claimStates.includes('queried') || proof.looseQueries > 0) return 'queried';
	if (proof.claimStates.every((state) => state === 'signed' || state === 'exempt'))
		return 'checked';
	return 'in-check';
}
