/** States of numbers in words and colours, as the margin and the bench say them. */
import type { ClaimMark } from '../renderer/marks/claim-marks.ts';
import type { NumberState } from './weighing.ts';

export const STATE_WORDS: Record<NumberState, string> = {
	unweighed: 'not weighed',
	level: 'level',
	leans: 'leans',
	tips: 'tips',
	queried: 'queried',
	stet: 'stet',
	signed: 'signed',
	countersigned: 'countersigned',
	lapsed: 'signature lapsed',
	'stale-same': 'newer reading, same verdict',
	'stale-moved': 'newer reading, no longer fits',
	sourced: 'sourced',
	setting: 'setting',
	exempt: 'not a claim'
};

/** The drawing of a state; a number that is no claim has none. */
export function markOf(state: NumberState): ClaimMark | null {
	return state === 'exempt' ? null : state;
}

/** What most needs a person comes first, when one mark stands for a whole line. */
const URGENCY: readonly NumberState[] = [
	'tips',
	'queried',
	'leans',
	'unweighed',
	'lapsed',
	'level',
	'setting',
	'exempt'
];

export function mostUrgent(states: readonly NumberState[]): NumberState {
	return URGENCY.find((state) => states.includes(state)) ?? states[0] ?? 'unweighed';
}
