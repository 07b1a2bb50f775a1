/**
 * Traps: ways in which copy often goes wrong. Each detector looks at one stated number and what the library gives, and
 * says what the number would fit instead. A trap is a hint beside a verdict, never a verdict.
 */
import type { Stated } from '../../widget/stated.ts';
import { decide } from '../decide.ts';
import type { WeighedReading } from '../weighing.ts';

export type TrapCode =
	| 'sibling-output'
	| 'time-as-distance'
	| 'parameter-set'
	| 'scale-slip'
	| 'factor-two'
	| 'reciprocal'
	| 'pair-disagrees'
	| 'other-column'
	| 'mixed-columns';

/** Something that the stated number would fit. */
export interface TrapMatch {
	/** An output’s key, a set’s name, a factor: what a screen can offer to tie or to change. */
	key: string;
	/** For people. */
	label: string;
	value: number;
	unit: string;
}

export interface Trap {
	code: TrapCode;
	/** Whole sentences for the desk: what was noticed, and what to look at. */
	says: string;
	/** Best first; at least one. */
	matches: TrapMatch[];
}

/**
 * Whether a number would be level with the wording. It is weighed as if it were exact: the question is what the writer
 * may have meant, and not how well that is known.
 */
export function fits(stated: Stated, value: number, unit: string, quantity?: string): boolean {
	const asked: Stated = stated.hedge === 'exactly' ? { ...stated, hedge: 'bare' } : stated;
	const reading: WeighedReading = { value, unit, uncertainty: 'exact' };
	return (
		decide(asked, quantity === undefined ? reading : { ...reading, quantity }).verdict === 'level'
	);
}

/** The first one fits and the trap has not sprung; nor has it where there is no number to compare. */
export function standsAsWritten(stated: Stated, reading: WeighedReading): boolean {
	return !Number.isFinite(reading.value) || fits(stated, reading.value, reading.unit);
}
