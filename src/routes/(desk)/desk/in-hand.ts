/** What waits for one person: derived from the pieces and from who they are, sorted by what goes wrong first. */
import { routes } from '$lib/routes.ts';
import { can, denial, type Actor } from '$lib/workflow/permissions.ts';
import {
	asksForWork,
	wayOut,
	whatHappened,
	whatUses,
	type CalculatorFlag
} from '$lib/workflow/vetting-flags.ts';
import type { PieceSummary, PieceView, ProofView } from '$lib/workflow/piece.ts';

export interface InHand {
	piece: Pick<PieceSummary, 'slug' | 'since'>;
	/** What stands at the head of the row. */
	mark: Exclude<PieceSummary['working'], 'at-rest'> | CalculatorFlag['state'];
	/** One sentence: what is asked. */
	asks: string;
	/** How it came to that, and what to do, where the sentence can't hold it. */
	tells?: string;
	/** What the plate says, and where it leads. */
	act: string;
	href: string;
	/** Lower comes first. */
	rank: number;
}

/** `pieces`: those in work. `flags`: of every piece, also of those at rest. */
export function inHand(
	actor: Actor,
	pieces: readonly PieceView[],
	flags: readonly CalculatorFlag[] = []
): InHand[] {
	const work = pieces.flatMap((piece) =>
		[
			...answersWanted(actor, piece),
			...checksWanted(actor, piece),
			...passesWanted(actor, piece),
			...draftsWanted(actor, piece)
		].map((row) => rowOf(piece, row))
	);
	return [...flags.flatMap((flag) => flagsToClear(actor, flag)), ...work].sort(
		(a, b) => a.rank - b.rank || a.piece.since.localeCompare(b.piece.since)
	);
}

type Wanted = Pick<InHand, 'asks' | 'act' | 'href' | 'rank'>;

function rowOf({ slug, since, working }: PieceView, wanted: Wanted): InHand {
	return { piece: { slug, since }, mark: working === 'at-rest' ? 'draft' : working, ...wanted };
}

/** A calculator out of use is for those who can put the piece right: whoever wrote it, and the editors. */
function flagsToClear(actor: Actor, flag: CalculatorFlag): InHand[] {
	const { piece, state, at, release } = flag;
	const isConcerned =
		flag.writers.includes(actor.personId) || actor.roles.some((role) => role === 'editor');
	if (!isConcerned || !can(actor, 'edit-draft') || !asksForWork(flag)) return [];
	return [
		{
			piece: { slug: piece.slug, since: at },
			mark: state,
			asks: whatUses(flag),
			tells: `${whatHappened(flag)} ${wayOut(flag)}`,
			act: 'Put it right',
			href: routes.manuscript(piece.slug),
			rank: state === 'superseded' ? 3 : release === null ? 1 : 0
		}
	];
}

const openQueries = ({ claims, looseQueries }: ProofView) => [
	...claims.flatMap(({ queries }) => queries.filter(({ closedAt }) => closedAt === null)),
	...looseQueries
];

function answersWanted(actor: Actor, piece: PieceView): Wanted[] {
	if (!piece.proof || !piece.writers.some(({ personId }) => personId === actor.personId)) return [];
	const waiting = openQueries(piece.proof).filter(({ answer }) => answer === null);
	const first = waiting[0];
	if (!first) return [];
	const from = [...new Set(waiting.map(({ askedBy }) => askedBy.name))].join(' and ');
	return [
		{
			asks: `${count(waiting.length, 'query', 'queries')} from ${from} to answer`,
			act: 'Answer',
			href: atClaim(piece.slug, first.claim),
			rank: 1
		}
	];
}

function checksWanted(actor: Actor, piece: PieceView): Wanted[] {
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
				asks: `${count(answered.length, 'answer', 'answers')} to ${answered.length === 1 ? 'your query' : 'your queries'}`,
				act: 'Read it',
				href: atClaim(piece.slug, first.claim),
				rank: 2
			}
		];
	}
	const left = proof.claims.filter(({ state }) => state === 'unsigned' || state === 'lapsed');
	if (left.length === 0) return [];
	const lapsed = left.filter(({ state }) => state === 'lapsed').length;
	return [
		{
			asks: [
				`${left.length} of ${count(proof.claims.length, 'claim', 'claims')} left to check`,
				lapsed > 0 ? `${lapsed} ${lapsed === 1 ? 'signature has' : 'signatures have'} lapsed` : ''
			]
				.filter(Boolean)
				.join('; '),
			act: 'Check',
			href: routes.check(piece.slug),
			rank: 3
		}
	];
}

function passesWanted(actor: Actor, piece: PieceView): Wanted[] {
	const { proof, working } = piece;
	if (!proof) return [];
	const resource = { proof: peopleOf(proof) };
	const wanted =
		working === 'checked' && can(actor, 'pass-proof', resource)
			? { asks: `Proof ${proof.number} is checked and waits to be passed`, act: 'Open release' }
			: working === 'passed' && can(actor, 'release-proof', resource)
				? { asks: `Proof ${proof.number} is passed and can go out`, act: 'Open release' }
				: null;
	return wanted ? [{ ...wanted, href: routes.release(piece.slug), rank: 2 }] : [];
}

function draftsWanted(actor: Actor, piece: PieceView): Wanted[] {
	if (piece.working !== 'draft' || !can(actor, 'edit-draft')) return [];
	if (!piece.writers.some(({ personId }) => personId === actor.personId)) return [];
	return [
		{
			asks: piece.missing ? `Your draft: ${piece.missing}` : 'Your draft is ready for a proof',
			act: 'Write on',
			href: routes.manuscript(piece.slug),
			rank: 4
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
