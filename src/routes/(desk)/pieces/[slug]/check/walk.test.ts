import type { ClaimState, ClaimView } from '$lib/workflow/piece.ts';
import { describe, expect, test } from 'vitest';
import { minutesLeft, nextOpen } from './walk.ts';
import { whyNotSigned } from './why-not.ts';

const claims = (...states: ClaimState[]) =>
	states.map((state, index) => ({ id: `c${index}`, state }) as unknown as ClaimView);

describe('the walk', () => {
	test.each([
		{ states: ['signed', 'unsigned', 'lapsed'], from: 0, next: 'c1' },
		{ states: ['unsigned', 'signed', 'queried'], from: 1, next: 'c0' },
		{ states: ['signed', 'queried', 'exempt'], from: 0, next: null }
	] satisfies { states: ClaimState[]; from: number; next: string | null }[])(
		'from $from of $states to $next',
		({ states, from, next }) => {
			expect(nextOpen(claims(...states), from)?.id ?? null).toBe(next);
		}
	);

	test('nothing open takes no time', () => {
		expect(minutesLeft(claims('signed', 'queried'))).toBe(0);
		expect(minutesLeft(claims('unsigned', 'lapsed'))).toBe(3);
	});
});

describe('why a claim can’t be signed', () => {
	const level = { state: 'unsigned', form: 'stated', label: '2b', verdict: { verdict: 'level' } };
	const claim = (change: object) => ({ ...level, ...change }) as unknown as ClaimView;

	test('a level claim can, by a scientist apart from it', () => {
		expect(whyNotSigned(claim({}), null, false)).toBeNull();
		expect(whyNotSigned(claim({ verdict: { verdict: 'leans' } }), null, false)).toBeNull();
	});

	test.each([
		[claim({}), 'same-person-twice', /another scientist/],
		[claim({}), 'not-permitted', /Scientists sign/],
		[claim({ state: 'queried' }), null, /open query/],
		[claim({ verdict: { verdict: 'tips' } }), null, /tips/],
		[claim({ verdict: { verdict: 'unweighed' } }), null, /no reading/],
		[claim({ form: 'exempt' }), null, /no claim/]
	] as const)('%# says so', (view, refused, says) => {
		expect(whyNotSigned(view, refused, false)).toMatch(says);
	});
});
