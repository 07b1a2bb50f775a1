/** The walk through a proof's claims: which are open, and which comes next. */
import type { ClaimView } from '$lib/workflow/piece.ts';

/** A minute and a half for one claim: an estimate, said as “about”. */
const MINUTES_A_CLAIM = 1.5;

export function isOpen({ state }: ClaimView): boolean {
	return state === 'unsigned' || state === 'lapsed';
}

/** The next claim to look at after `index`, going round; null when none is open. */
export function nextOpen(claims: readonly ClaimView[], index: number): ClaimView | null {
	const inOrder = [...claims.slice(index + 1), ...claims.slice(0, index + 1)];
	return inOrder.find(isOpen) ?? null;
}

export function minutesLeft(claims: readonly ClaimView[]): number {
	return Math.ceil(claims.filter(isOpen).length * MINUTES_A_CLAIM);
}
