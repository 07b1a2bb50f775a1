/** From a piece's rows to what its rooms show. */
import { canonicalJson } from '../../widget/freeze.ts';
import {
	workingState,
	type ClaimView,
	type PersonName,
	type PieceSummary,
	type PieceView,
	type ProofView,
	type QueryView,
	type ReleaseView,
	type SignatureView,
	type WorkingState
} from '../../workflow/piece.ts';
import type { Dossier, PieceRow, ProofRow, QueryRow, ReleaseRow } from './dossier.ts';
import { examine } from './examination.ts';
import type { StandingFormula } from './formula-standing.ts';
import {
	isReleased,
	openQueries,
	standingOf,
	type Standing,
	type StandingClaim
} from './standing.ts';

type Names = (personId: string) => PersonName;

export function summarise(dossier: Dossier, names: Names): PieceSummary {
	const { piece, proof, releases } = dossier;
	const standing = proof && standingOf(dossier, proof);
	const working = stateOf(dossier, standing);
	const held = holder(dossier, standing, working);
	return {
		id: piece.id,
		slug: piece.slug,
		title: piece.document.title,
		point: piece.document.point,
		version: piece.version,
		proofNumber: proof?.number ?? null,
		working,
		liveRelease: releases[0]?.number ?? null,
		heldBy: held.by === null ? null : names(held.by),
		since: held.since.toISOString(),
		missing: missing(dossier, standing, working)
	};
}

/** A line for a piece whose document can't be read: it is there, and someone must see to it. */
export function summariseUnreadable(piece: PieceRow, names: Names): PieceSummary {
	return {
		id: piece.id,
		slug: piece.slug,
		title: piece.slug,
		point: '',
		version: piece.version,
		proofNumber: null,
		working: 'draft',
		liveRelease: null,
		heldBy: names(piece.savedBy),
		since: piece.savedAt.toISOString(),
		missing: 'a document that can be read'
	};
}

export function viewPiece(dossier: Dossier, names: Names): PieceView {
	const { piece, proof, writers, releases } = dossier;
	return {
		...summarise(dossier, names),
		document: piece.document,
		slip: piece.slip,
		spiked: piece.spikedAt && {
			by: names(piece.spikedBy ?? piece.savedBy),
			at: piece.spikedAt.toISOString()
		},
		savedAt: piece.savedAt.toISOString(),
		savedBy: names(piece.savedBy),
		writers: writers.map(names),
		proof: proof && viewProof(proof, standingOf(dossier, proof), names),
		releases: releases.map((release) => viewRelease(release, names))
	};
}

function viewProof(
	proof: ProofRow,
	{ claims, looseQueries, formulas, people }: Standing,
	names: Names
): ProofView {
	return {
		id: proof.id,
		number: proof.number,
		digest: proof.digest,
		document: proof.document,
		pulledBy: names(proof.pulledBy),
		pulledAt: proof.pulledAt.toISOString(),
		writers: people.writers.map(names),
		checkers: people.checkers.map(names),
		claims: claims.map((claim) => viewClaim(claim, names)),
		looseQueries: looseQueries.map((row) => viewQuery(row, names)),
		formulas: formulas.map((formula) => viewFormula(formula, names)),
		passedBy: proof.passedBy === null ? null : names(proof.passedBy),
		passedAt: proof.passedAt?.toISOString() ?? null
	};
}

function viewClaim(
	{ examined, state, signatures, queries }: StandingClaim,
	names: Names
): ClaimView {
	const { claim, label, words, sentence, before, after, verdict } = examined;
	return {
		id: claim.id,
		label,
		form: claim.form,
		words,
		sentence,
		before,
		after,
		reading: claim.form === 'exempt' ? null : claim.reading,
		verdict,
		state,
		signatures: signatures.map((row): SignatureView => ({
			id: row.id,
			claim: row.claim,
			by: names(row.personId),
			signedAt: row.signedAt.toISOString(),
			proofNumber: row.proofNumber,
			inForce: row.inForce,
			sentence: row.sentence
		})),
		queries: queries.map((row) => viewQuery(row, names))
	};
}

function viewFormula({ formula, digest, vetted, signings }: StandingFormula, names: Names) {
	return {
		id: formula.id,
		digest,
		vetted,
		signings: signings.map(({ personId, signedAt, note, counts }) => ({
			by: names(personId),
			at: signedAt.toISOString(),
			note,
			counts
		}))
	};
}

function viewQuery(row: QueryRow, names: Names): QueryView {
	return {
		id: row.id,
		claim: row.claim,
		question: row.question,
		askedBy: names(row.askedBy),
		askedAt: row.askedAt.toISOString(),
		answer: row.answer,
		answeredBy: row.answeredBy === null ? null : names(row.answeredBy),
		answeredAt: row.answeredAt?.toISOString() ?? null,
		closedAt: row.closedAt?.toISOString() ?? null,
		proofNumber: row.proofNumber
	};
}

export function viewRelease(row: ReleaseRow, names: Names): ReleaseView {
	return {
		number: row.number,
		digest: row.digest,
		proofNumber: row.proofNumber,
		releasedBy: names(row.releasedBy),
		releasedAt: row.releasedAt.toISOString()
	};
}

function stateOf(dossier: Dossier, standing: Standing | null): WorkingState {
	const { piece, proof } = dossier;
	if (!proof || !standing) return workingState({ draftDigest: '', proof: null });
	// A proof's digest covers more than its document; the draft is at the proof when the documents are the same.
	const atProof = canonicalJson(piece.document) === canonicalJson(proof.document);
	return workingState({
		draftDigest: atProof ? proof.digest : '',
		proof: {
			digest: proof.digest,
			passed: proof.passedAt !== null,
			released: isReleased(dossier, proof),
			claimStates: standing.claims.map(({ state }) => state),
			looseQueries: standing.looseQueries.length
		}
	});
}

/** Who has to act next, where that is one person, and since when. */
function holder(
	{ piece, proof, signatures, releases }: Dossier,
	standing: Standing | null,
	working: WorkingState
): { by: string | null; since: Date } {
	if (working === 'draft' || !proof || !standing)
		return { by: piece.savedBy, since: piece.savedAt };
	if (working === 'at-rest') return { by: null, since: releases[0]?.releasedAt ?? proof.pulledAt };
	if (working === 'passed') return { by: proof.passedBy, since: proof.passedAt ?? proof.pulledAt };
	if (working === 'queried') {
		const [oldest] = openQueries(standing);
		if (!oldest) return { by: null, since: proof.pulledAt };
		return oldest.answeredAt
			? { by: oldest.askedBy, since: oldest.answeredAt }
			: { by: proof.pulledBy, since: oldest.askedAt };
	}
	const last = signatures.at(-1)?.signedAt ?? proof.pulledAt;
	return {
		by: null,
		since: working === 'checked' && last > proof.pulledAt ? last : proof.pulledAt
	};
}

function missing(dossier: Dossier, standing: Standing | null, working: WorkingState): string {
	if (working === 'at-rest') return '';
	if (working === 'passed') return 'its release';
	const unvetted = standing?.formulas.filter(({ vetted }) => !vetted).length ?? 0;
	const toVet = counted(unvetted, 'formula to vet', 'formulas to vet');
	if (working === 'checked') return toVet || 'an editor’s pass';
	const examination = examine(
		working === 'draft' || !dossier.proof ? dossier.piece.document : dossier.proof.document,
		dossier.stock.calculators
	);
	const weighed = examination.claims.filter(({ claim }) => claim.form !== 'exempt');
	const verdicts = (name: string) =>
		weighed.filter(({ verdict }) => verdict.verdict === name).length;
	const states = (name: string) =>
		standing?.claims.filter(({ state }) => state === name).length ?? 0;
	const open = standing ? openQueries(standing).length : 0;
	return [
		counted(verdicts('tips'), 'tips', 'tip'),
		counted(verdicts('unweighed'), 'not weighed'),
		working === 'draft'
			? counted(examination.findings.length, 'thing to add', 'things to add')
			: '',
		working === 'draft' ? '' : counted(states('unsigned') + states('lapsed'), 'to sign'),
		working === 'draft' ? '' : toVet,
		counted(open, 'query', 'queries')
	]
		.filter(Boolean)
		.join(', ');
}

function counted(number: number, one: string, many = one): string {
	return number === 0 ? '' : `${number} ${number === 1 ? one : many}`;
}
