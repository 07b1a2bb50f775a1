/** How the claims of the newest proof stand. Derived from signatures and queries each time; nothing stores it. */
import type { ClaimState } from '../../workflow/piece.ts';
import type { ProofPeople } from '../../workflow/permissions.ts';
import type { Dossier, ProofRow, QueryRow, SignatureRow } from './dossier.ts';
import { examine, type ExaminedClaim } from './examination.ts';
import { standingFormulas, type StandingFormula } from './formula-standing.ts';

export interface StandingClaim {
	examined: ExaminedClaim;
	state: ClaimState;
	signatures: (SignatureRow & { inForce: boolean })[];
	queries: QueryRow[];
}

export interface Standing {
	claims: StandingClaim[];
	/** Open queries on claims that this proof doesn't hold: tying the words anew doesn't settle what was asked. */
	looseQueries: QueryRow[];
	/** The piece's own formulas, in the proof's order. */
	formulas: StandingFormula[];
	people: ProofPeople;
}

/**
 * A signature is in force while what it covers is, to the last character, what the proof holds; it was not taken back;
 * and its signer hasn't become one of the proof's writers. With `at`, as that stood at that moment: a release keeps the
 * names it went out with.
 */
export function standingOf(dossier: Dossier, proof: ProofRow, at?: Date): Standing {
	const { claims: examinedClaims } = examine(proof.document, dossier.stock.calculators);
	const claims = examinedClaims.map((examined) => {
		const id = examined.claim.id;
		const signatures = dossier.signatures
			.filter((signature) => signature.claim === id && stoodAt(signature, at))
			.map((signature) => ({
				...signature,
				inForce:
					signature.coverHash === examined.coverHash && !proof.writers.includes(signature.personId)
			}));
		const queries = dossier.queries.filter(({ claim }) => claim === id);
		return { examined, signatures, queries, state: claimState(examined, signatures, queries) };
	});
	const checkers = claims.flatMap(({ signatures }) =>
		signatures.filter(({ inForce }) => inForce).map(({ personId }) => personId)
	);
	const held = new Set(claims.map(({ examined }) => examined.claim.id));
	const looseQueries = dossier.queries.filter((query) => isOpen(query) && !held.has(query.claim));
	return {
		claims,
		looseQueries,
		formulas: standingFormulas(proof.document, dossier.formulaSignings, proof.writers),
		people: { writers: proof.writers, checkers: [...new Set(checkers)] }
	};
}

function stoodAt({ signedAt, takenBackAt }: SignatureRow, at: Date | undefined): boolean {
	if (!at) return takenBackAt === null;
	return signedAt <= at && (takenBackAt === null || takenBackAt > at);
}

function claimState(
	{ claim }: ExaminedClaim,
	signatures: readonly { inForce: boolean }[],
	queries: readonly QueryRow[]
): ClaimState {
	if (queries.some(isOpen)) return 'queried';
	if (claim.form === 'exempt') return 'exempt';
	if (signatures.some(({ inForce }) => inForce)) return 'signed';
	return signatures.length > 0 ? 'lapsed' : 'unsigned';
}

export function isOpen(query: Pick<QueryRow, 'closedAt'>): boolean {
	return query.closedAt === null;
}

/** On any claim of the piece. */
export function openQueries({ claims, looseQueries }: Standing): QueryRow[] {
	return [...claims.flatMap(({ queries }) => queries.filter(isOpen)), ...looseQueries].sort(
		(a, b) => a.askedAt.getTime() - b.askedAt.getTime()
	);
}

export function isReleased(dossier: Dossier, proof: ProofRow): boolean {
	return dossier.releases.some(({ proofId }) => proofId === proof.id);
}
