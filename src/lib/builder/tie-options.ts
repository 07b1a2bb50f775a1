/** The short list that `=` opens: readings to tie to, then what else a number can be. */
import type { Verdict } from '../factcheck/verdict.ts';
import { weigh } from '../factcheck/weigh.ts';
import { printStated, statedValue, stateReading, type LiveFormat } from '../widget/stated.ts';
import { sameRef, type BenchReading } from './bench-readings.ts';
import type { NumberInCopy } from './quantities.ts';
import { rankReadings } from './rank-readings.ts';
import { readIn, wordsOf } from './short-reading.ts';
import type { Language } from '../widget/language.ts';
import { liveFormat, scaledUnit } from './tie.ts';

export interface TieOption {
	reading: BenchReading;
	/** The reading in the number's unit: “68.14 MHz”. */
	value: string;
	/** What the words would get; null where they can't be read as a number. */
	verdict: Verdict | null;
	/** How it would be printed live. */
	format: LiveFormat;
	printed: string;
	/** It is the one the number is tied to already. */
	isTied: boolean;
}

export function tieOptions(
	number: NumberInCopy,
	readings: readonly BenchReading[],
	language: Language
): TieOption[] {
	const { quantity, claim } = number;
	const current = claim && claim.form !== 'exempt' ? claim.reading : null;
	const stated = quantity?.stated ?? null;
	const target = stated
		? { value: statedValue(stated), unit: stated.unit }
		: {
				value: middle(quantity?.value ?? null),
				unit: claim?.form === 'live' ? claim.unit : (quantity?.unit ?? '')
			};
	const shownUnit = stated ? (scaledUnit(stated.unit, stated.scale) ?? stated.unit) : target.unit;
	return rankReadings(target, readings).flatMap(({ reading }): TieOption[] => {
		const { outcome } = reading;
		if (!outcome.ok || typeof outcome.reading.value !== 'number') return [];
		const { value, unit, uncertainty } = outcome.reading;
		const format = claim?.form === 'live' ? claim : liveFormat(quantity, unit);
		return [
			{
				reading,
				value: wordsOf(readIn({ value, unit, uncertainty }, shownUnit)),
				verdict: stated ? weigh(stated, { ...outcome.reading, value }, language) : null,
				format: { unit: format.unit, figures: format.figures, hedge: format.hedge },
				printed: printStated(
					stateReading(value, unit, format, outcome.reading.quantity, language, uncertainty),
					language
				),
				isTied: current !== null && sameRef(current, reading.ref)
			}
		];
	});
}

/** One number to be near to: the middle of a range, and nothing in particular where the words name none. */
function middle(value: number | [number, number] | null): number {
	return Array.isArray(value) ? (value[0] + value[1]) / 2 : (value ?? 0);
}
