/** Weighing, whole: the verdict on a stated number, with wordings that would be level. */
import type { Stated } from '../widget/stated.ts';
import { decide } from './decide.ts';
import { suggestWordings } from './suggestions.ts';
import type { Verdict } from './verdict.ts';
import type { WeighedReading } from './weighing.ts';

export type { WeighedReading } from './weighing.ts';

/**
 * Weighs what the copy says against what the calculator reads. Never throws. A reading that is no finite number is
 * unweighed; units of different dimension tip; otherwise the rule of the hedge's family decides.
 */
export function weigh(stated: Stated, reading: WeighedReading): Verdict {
	return { ...decide(stated, reading), suggestions: suggestWordings(stated, reading) };
}
