import { firstLight } from '$lib/server/demo/first-light.ts';
import type { Actor, Role } from '$lib/workflow/permissions.ts';
import type { ClaimView, PieceView, ProofView, QueryView } from '$lib/workflow/piece.ts';
import type { CalculatorFlag } from '$lib/workflow/vetting-flags.ts';
import { expect, test } from 'vitest';
import { inHand } from './in-hand.ts';

const person = (personId: string, ...roles: Role[]): Actor => ({ personId, name: personId, roles });
const tamsin = person('tamsin', 'writer');
const ama = person('ama', 'scientist');
const perpetua = person('perpetua', 'editor');
const name = ({ personId }: Actor) => ({ personId, name: personId });

function claim(id: string, state: ClaimView['state'], queries: QueryView[] = []): ClaimView {
	const verdict = {
		verdict: 'level',
		severity: 'none',
		rule: 'N1',
		reason: '',
		departurePercent: 0,
		suggestions: []
	};
	return {
		id,
		state,
		queries,
		signatures: [],
		label: id,
		form: 'stated',
		verdict
	} as unknown as ClaimView;
}

function query(answer: string | null): QueryView {
	return {
		id: 'q',
		claim: 'c1',
		question: '?',
		askedBy: name(ama),
		answer,
		closedAt: null
	} as QueryView;
}

function piece(working: PieceView['working'], claims: ClaimView[] = [], missing = ''): PieceView {
	const proof: ProofView = {
		id: 'p',
		number: 3,
		digest: '',
		document: firstLight,
		pulledBy: name(tamsin),
		pulledAt: '2026-12-08T10:00:00Z',
		writers: [name(tamsin)],
		checkers: claims.some(({ state }) => state === 'signed') ? [name(ama)] : [],
		claims,
		looseQueries: [],
		formulas: [],
		passedBy: null,
		passedAt: null
	};
	return {
		slug: 'first-light',
		working,
		missing,
		since: '2026-12-08T10:00:00Z',
		writers: [name(tamsin)],
		proof: working === 'draft' ? null : proof
	} as unknown as PieceView;
}

const asks = (actor: Actor, view: PieceView) => inHand(actor, [view]).map((row) => row.asks);

test('a draft is in its writer’s hands, with what it lacks', () => {
	expect(asks(tamsin, piece('draft', [], '2 not weighed'))).toEqual(['Your draft: 2 not weighed']);
	expect(asks(ama, piece('draft'))).toEqual([]);
	expect(asks(perpetua, piece('draft'))).toEqual([]);
});

test('a proof is in the hands of scientists who didn’t write it', () => {
	const view = piece('in-check', [
		claim('c1', 'unsigned'),
		claim('c2', 'lapsed'),
		claim('c3', 'signed')
	]);
	expect(asks(ama, view)).toEqual(['2 of 3 claims left to check; 1 signature has lapsed']);
	expect(asks(person('tamsin', 'writer', 'scientist'), view)).toEqual([]);
});

test('a query goes to the writer, and its answer back to who asked', () => {
	const open = piece('queried', [claim('c1', 'queried', [query(null)])]);
	expect(asks(tamsin, open)).toEqual(['1 query from ama to answer']);
	expect(asks(ama, open)).toEqual([]);
	const answered = piece('queried', [claim('c1', 'queried', [query('As it comes in.')])]);
	expect(asks(tamsin, answered)).toEqual([]);
	expect(inHand(ama, [answered])[0]).toMatchObject({
		asks: '1 answer to your query',
		href: '/pieces/first-light/check?claim=c1'
	});
});

test('a checked proof waits for an editor who had no hand in it', () => {
	const view = piece('checked', [claim('c1', 'signed')]);
	expect(asks(perpetua, view)).toEqual(['Proof 3 is checked and waits to be passed']);
	expect(asks(person('ama', 'scientist', 'editor'), view)).toEqual([]);
	expect(asks(tamsin, view)).toEqual([]);
});

test('what stops others comes first', () => {
	const answer = piece('queried', [claim('c1', 'queried', [query(null)])]);
	expect(inHand(tamsin, [piece('draft'), answer]).map(({ act }) => act)).toEqual([
		'Answer',
		'Write on'
	]);
});

const flag: CalculatorFlag = {
	piece: { slug: 'first-light', title: 'First light' },
	calculator: { id: 'house.sound', title: 'Speed of sound', revision: '1.0.0' },
	state: 'withdrawn',
	by: name(ama),
	at: '2026-12-09T10:00:00Z',
	reason: 'The constant was mistyped',
	release: 2,
	inDraft: true,
	instead: null,
	writers: ['tamsin']
};

test('a calculator out of use comes first, to those who wrote the piece and to editors', () => {
	const rows = inHand(tamsin, [piece('queried', [claim('c1', 'queried', [query(null)])])], [flag]);
	expect(rows.map(({ act }) => act)).toEqual(['Put it right', 'Answer']);
	expect(rows[0]).toMatchObject({
		mark: 'withdrawn',
		asks: 'Release 2, which readers have now, and the draft work with Speed of sound, 1.0.0.',
		tells:
			'Withdrawn by ama: The constant was mistyped. Hang another calculator in its place, then pull a proof and release anew.',
		href: '/pieces/first-light/manuscript'
	});
	const sees = (actor: Actor) => inHand(actor, [], [flag]).length;
	expect([sees(perpetua), sees(ama), sees(person('bystander', 'writer'))]).toEqual([1, 0, 0]);
});

test('a newer revision asks for work only where answers may differ', () => {
	const superseded = { ...flag, state: 'superseded' as const, inDraft: false };
	expect(inHand(tamsin, [], [{ ...superseded, instead: '2.0.0' }])).toHaveLength(1);
	expect(inHand(tamsin, [], [{ ...superseded, instead: '1.1.0' }])).toEqual([]);
});
