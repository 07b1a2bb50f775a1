/** What waits for one person: derived from the pieces and from who they are, sorted by what goes wrong first. */
import { routes } from '$lib/routes.ts';
import { can, denial, type Actor } from '$lib/workflow/permissions.ts';
import type { PieceSummary, PieceView, ProofView } from '$lib/workflow/piece.ts';

export interface InHand {
	piece: Pick<PieceSummary, 'slug' | 'working' | 'since'>;
	/** One sentence: what is asked. */
	asks: string;
	/** What the plate says, and where it leads. */
	act: string;
	href: string;
	/** Lower comes first. */
	rank: number;
}

export function inHand(actor: Actor, pieces: readonly PieceView[]): InHand[] {
	return pieces
		.flatMap((piece) => [
			...answersWanted(actor, piece),
			...checksWanted(actor, piece),
			...passesWanted(actor, piece),
			...draftsWanted(actor, piece)
		])
		.map(({ piece: { slug, working, since }, ...row }) => ({
			piece: { slug, working, since },
			...row
		}))
		.sort((a, b) => a.rank - b.rank || a.piece.since.localeCompare(b.piece.since));
}

const openQueries = ({ claims, looseQueries }: ProofView) => [
	...claims.flatMap(({ queries }) => queries.filter(({ closedAt }) => closedAt === null)),
	...looseQueries
];

function answersWanted(actor: Actor, piece: PieceView): InHand[] {
	if (!piece.proof || !piece.writers.some(({ personId }) => personId === actor.personId)) return [];
	const waiting = openQueries(piece.proof).filter(({ answer }) => answer === null);
	const first = waiting[0];
	if (!first) return [];
	const from = [...new Set(waiting.map(({ askedBy }) => askedBy.name))].join(' and ');
	return [
		{
			piece,
			asks: `${count(waiting.length, 'query', 'queries')} from ${from} to answer`,
			act: 'Answer',
			href: atClaim(piece.slug, first.claim),
			rank: 0
		}
	];
}

function checksWanted(actor: Actor, piece: PieceView): InHand[] {
	const { proof } = piece;
	if (!proof || (piece.working !== 'in-check' && piece.working !== 'queried')) return [];
	if (denial(actor, 'sign-claim', { proof: peopleOf(proof) })) return [];
	const answered = openQueries(proof).filter(
		({ answer, askedBy }) => answer !== null && askedBy.personId === actor.personId
	);
	const first = answered[0];
	if (first) {
		return [
			{
				piece,
				asks: `${count(answered.length, 'answer', 'answers')} to ${answered.length === 1 ? 'your query' : 'your queries'}`,
				act: 'Read it',
				href: atClaim(piece.slug, first.claim),
				rank: 1
			}
		];
	}
	const left = proof.claims.filter(({ state }) => state === 'unsigned' || state === 'lapsed');
	if (left.length === 0) return [];
	const lapsed = left.filter(({ state }) => state === 'lapsed').length;
	return [
		{
			piece,
			asks: [
				`${left.length} of ${count(proof.claims.length, 'claim', 'claims')} left to check`,
				lapsed > 0 ? `${lapsed} ${lapsed === 1 ? 'signature has' : 'signatures have'} lapsed` : ''
			]
				.filter(Boolean)
				.join('; '),
			act: 'Check',
			href: routes.check(piece.slug),
			rank: 2
		}
	];
}

function passesWanted(actor: Actor, piece: PieceView): InHand[] {
	const { proof, working } = piece;
	if (!proof) return [];
	const resource = { proof: peopleOf(proof) };
	const wanted =
		working === 'checked' && can(actor, 'pass-proof', resource)
			? { asks: `Proof ${proof.number} is checked and waits to be passed`, act: 'Open release' }
			: working === 'passed' && can(actor, 'release-proof', resource)
				? { asks: `Proof ${proof.number} is passed and can go out`, act: 'Open release' }
				: null;
	return wanted ? [{ piece, ...wanted, href: routes.release(piece.slug), rank: 1 }] : [];
}

function draftsWanted(actor: Actor, piece: PieceView): InHand[] {
	if (piece.working !== 'draft' || !can(actor, 'edit-draft')) return [];
	if (!piece.writers.some(({ personId }) => personId === actor.personId)) return [];
	return [
		{
			piece,
			asks: piece.missing ? `Your draft: ${piece.missing}` : 'Your draft is ready for a proof',
			act: 'Write on',
			href: routes.manuscript(piece.slug),
			rank: 3
		}
	];
}

const peopleOf = (proof: ProofView) => ({
	writers: proof.writers.map(({ personId }) => personId),
	checkers: proof.checkers.map(({ personId }) => personId)
});

const atClaim = (slug: string, claim: string) =>
	`${routes.check(slug)}?claim=${encodeURIComponent(claim)}`;

const count = (number: number, one: string, many: string) =>
	`${number} ${number === 1 ? one : many}`;
