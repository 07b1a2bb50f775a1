import { expect, test } from 'vitest';
import {
	asksForWork,
	wayOut,
	whatHappened,
	whatUses,
	type CalculatorFlag
} from './vetting-flags.ts';

const flag = (over: Partial<CalculatorFlag>): CalculatorFlag => ({
	piece: { slug: 'thunder', title: 'Thunder' },
	calculator: { id: 'house.sound', title: 'Speed of sound', revision: '1.2.0' },
	state: 'withdrawn',
	by: { personId: 'ama', name: 'Ama' },
	at: '2026-12-09T10:00:00Z',
	reason: 'It was wrong',
	release: 2,
	inDraft: true,
	instead: null,
	writers: [],
	...over
});
const superseded = { state: 'superseded', reason: '', inDraft: false } as const;

test.each<[Partial<CalculatorFlag>, string]>([
	[{}, 'Release 2, which readers have now, and the draft work with Speed of sound, 1.2.0.'],
	[{ inDraft: false }, 'Release 2, which readers have now, works with Speed of sound, 1.2.0.'],
	[{ release: null }, 'The draft works with Speed of sound, 1.2.0.']
])('what uses it: %o', (over, says) => expect(whatUses(flag(over))).toBe(says));

test.each<[Partial<CalculatorFlag>, string, string]>([
	[
		{},
		'Withdrawn by Ama: It was wrong.',
		'Hang another calculator in its place, then pull a proof and release anew.'
	],
	[
		{ release: null, reason: 'Who knows?' },
		'Withdrawn by Ama: Who knows?',
		'Hang another calculator in its place, then pull a proof.'
	],
	[
		{ inDraft: false },
		'Withdrawn by Ama: It was wrong.',
		'The draft no longer works with it: pull a proof and release anew.'
	],
	[
		{ inDraft: false, instead: '2.0.0' },
		'Withdrawn by Ama: It was wrong.',
		'Revision 2.0.0 runs in its place: look over what has moved, then pull a proof and release anew.'
	],
	[
		{ ...superseded, instead: '2.0.0' },
		'Superseded: Ama vetted revision 2.0.0.',
		'Look over what has moved, then pull a proof and release anew.'
	],
	[
		{ ...superseded, instead: '1.2.1' },
		'Superseded: Ama vetted revision 1.2.1.',
		'Every answer stays; the next release takes it along.'
	]
])('what happened, and what to do: %o', (over, happened, way) => {
	expect(whatHappened(flag(over))).toBe(happened);
	expect(wayOut(flag(over))).toBe(way);
});

test('only what may answer differently asks for work', () => {
	expect(asksForWork(flag({}))).toBe(true);
	expect(asksForWork(flag({ ...superseded, instead: '2.0.0' }))).toBe(true);
	expect(asksForWork(flag({ ...superseded, instead: '1.3.0' }))).toBe(false);
	// Nothing vetted runs now.
	expect(asksForWork(flag({ ...superseded, instead: null }))).toBe(true);
});
