/** What must hold before a proof goes to press. Each condition is a row here: a sentence, and the way to clear it. */
import type { Calculator } from '../../physics/calculator.ts';
import { routes } from '../../routes.ts';
import { can, type Actor } from '../../workflow/permissions.ts';
import { mayPublish, type VettingState } from '../../workflow/vetting.ts';
import type { Condition, PersonName } from '../../workflow/piece.ts';
import type { Dossier, ProofRow } from './dossier.ts';
import { examine } from './examination.ts';
import { isOpen, standingOf, type Standing, type StandingClaim } from './standing.ts';
import type { Stock } from './stock.ts';

interface Facts {
	slug: string;
	proof: ProofRow;
	standing: Standing;
	stock: Stock;
	actor: Actor;
	names: (personId: string) => PersonName;
}

/** Null where it has nothing to say about this piece. */
type Rule = (facts: Facts) => Condition | null;

const RULES: Rule[] = [
	({ standing, slug }) => {
		const open = standing.claims.filter(({ state }) => state === 'unsigned' || state === 'lapsed');
		const signed = standing.claims.filter(({ state }) => state === 'signed').length;
		return {
			side: 'claims',
			met: open.length === 0,
			says:
				open.length === 0
					? `${claimsAre(signed)} signed.`
					: `${claimsAre(open.length)} not signed: ${labels(open)}.`,
			mend: open.length === 0 ? '' : 'A scientist who didn’t write this signs or queries each one.',
			href: routes.check(slug)
		};
	},
	({ standing, slug }) => {
		const weighed = standing.claims.filter(({ examined: { claim } }) => claim.form !== 'exempt');
		const unweighed = weighed.filter(({ examined }) => examined.verdict.verdict === 'unweighed');
		const tipping = weighed.filter(
			({ examined: { verdict } }) =>
				verdict.verdict === 'tips' ||
				(verdict.severity === 'block' && verdict.verdict !== 'unweighed')
		);
		const met = tipping.length + unweighed.length === 0;
		const told = [
			tipping.length > 0 ? `These tip: ${labels(tipping)}.` : '',
			unweighed.length > 0 ? `These aren’t weighed: ${labels(unweighed)}.` : ''
		];
		return {
			side: 'claims',
			met,
			says: met ? 'No claim tips, and none is unweighed.' : told.filter(Boolean).join(' '),
			mend: met ? '' : 'The writer changes the words or the reading, and pulls a new proof.',
			href: routes.manuscript(slug)
		};
	},
	({ standing, slug }) => {
		const queried = standing.claims.filter(({ queries }) => queries.some(isOpen));
		const on = [
			queried.length > 0 ? labels(queried) : '',
			standing.looseQueries.length > 0 ? 'a claim that is no longer in the copy' : ''
		].filter(Boolean);
		return {
			side: 'claims',
			met: on.length === 0,
			says: on.length === 0 ? 'No query is open.' : `A query is open on ${on.join(' and on ')}.`,
			mend: on.length === 0 ? '' : 'The writer answers it; who asked closes it.',
			href: routes.check(slug)
		};
	},
	({ standing, names }) => {
		const { writers, checkers } = standing.people;
		const both = checkers.filter((id) => writers.includes(id));
		const met = checkers.length > 0 && both.length === 0;
		const named = (ids: readonly string[]) => ids.map((id) => names(id).name).join(', ');
		return {
			side: 'people',
			met,
			says: met
				? `${writers.length > 0 ? `Written by ${named(writers)}` : 'No words changed since the last release'}; checked by ${named(checkers)}.`
				: 'Nobody besides the writers has checked this proof.',
			mend: met ? '' : 'A scientist who didn’t write this signs the claims.'
		};
	},
	({ standing, actor }) => {
		const met = can(actor, 'pass-proof', { proof: standing.people });
		return {
			side: 'people',
			met,
			says: met ? 'You have neither written nor checked it.' : passer(actor),
			mend: met ? '' : 'An editor who has neither written nor checked this proof passes it.'
		};
	},
	({ proof, slug, stock }) => {
		const { findings } = examine(proof.document, stock.calculators);
		return {
			side: 'galley',
			met: findings.length === 0,
			says:
				findings.length === 0
					? 'Title, point, copy, sliders and charts are complete.'
					: findings.map(({ says }) => says).join(' '),
			mend: findings.length === 0 ? '' : 'The writer sees to it and pulls a new proof.',
			href: routes.manuscript(slug)
		};
	},
	({ proof, slug, stock }) => {
		const met = examine(proof.document, stock.calculators).digest === proof.digest;
		return {
			side: 'galley',
			met,
			says: met
				? 'The calculators are the ones it was checked with.'
				: 'A calculator, or the form in which pieces are kept, has changed since this proof was pulled.',
			mend: met ? '' : 'The writer pulls a new proof; what has moved is checked again.',
			href: routes.manuscript(slug)
		};
	},
	({ proof, stock }) => {
		const used = new Set(proof.document.steps.map(({ calculator }) => calculator));
		const open = [...used].flatMap((id) => {
			const calculator = stock.calculators.get(id);
			const state = calculator && stock.stateOf(calculator);
			return calculator && state && !mayPublish(state) ? [{ calculator, state }] : [];
		});
		const [first] = open;
		return {
			side: 'galley',
			met: !first,
			says: first
				? open.map(({ calculator, state }) => notVetted(calculator, state)).join(' ')
				: 'Every calculator it uses is vetted.',
			mend: first ? VETTING_MENDS[first.state] : '',
			...(first ? { href: routes.calculator(first.calculator.id) } : {})
		};
	},
	({ standing: { formulas }, slug }) => {
		if (formulas.length === 0) return null;
		const open = formulas.filter(({ vetted }) => !vetted);
		const titles = open.map(({ formula }) => `“${formula.title}”`).join(', ');
		return {
			side: 'galley',
			met: open.length === 0,
			says:
				open.length === 0
					? 'Every formula that was written for it is vetted.'
					: `${open.length === 1 ? 'A formula' : 'Formulas'} written for this piece ${open.length === 1 ? 'isn’t' : 'aren’t'} vetted: ${titles}.`,
			mend:
				open.length === 0
					? ''
					: 'A scientist who didn’t write this looks it over on the Check screen and signs it.',
			href: `${routes.check(slug)}#formulas`
		};
	},
	() => ({
		side: 'time',
		met: true,
		says: 'Nothing holds it back: it can go out at once.',
		mend: ''
	})
];

/** A piece without a proof has one condition: that there be one. */
export function conditionsOf(dossier: Dossier, actor: Actor, names: Facts['names']): Condition[] {
	const { proof } = dossier;
	const { slug } = dossier.piece;
	if (!proof) {
		return [
			{
				side: 'galley',
				met: false,
				says: 'No proof has been pulled yet.',
				mend: 'The writer pulls one from the manuscript.',
				href: routes.manuscript(slug)
			}
		];
	}
	const { stock } = dossier;
	const facts: Facts = { slug, proof, standing: standingOf(dossier, proof), stock, actor, names };
	return RULES.flatMap((rule) => rule(facts) ?? []);
}

function notVetted({ title, revision }: Calculator, state: VettingState): string {
	return `${title}, ${revision} is ${state}, not vetted.`;
}

const VETTING_MENDS: Record<VettingState, string> = {
	proposed: 'Its check values have to agree, and a second scientist signs it.',
	tested: 'A second scientist looks at its card and signs it.',
	vetted: '',
	superseded: 'A newer revision has to be vetted.',
	withdrawn: 'The writer hangs another calculator in its place, and pulls a new proof.'
};

function passer(actor: Actor): string {
	return actor.roles.includes('editor')
		? 'You have written or checked this proof yourself.'
		: 'An editor passes it; that isn’t your role.';
}

function claimsAre(number: number): string {
	return number === 1 ? '1 claim is' : `${number} claims are`;
}

function labels(claims: readonly StandingClaim[]): string {
	return claims.map(({ examined }) => examined.label).join(', ');
}
