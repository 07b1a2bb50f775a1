/** The two sides of one claim at some settings: what it states, and what is read. For pictures and sentences about it. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { benchSet } from '../widget/bench-set.ts';
import type { Claim, WidgetDocument } from '../widget/document.ts';
import { readingAt, type Evaluation } from '../widget/evaluate.ts';
import { readingWithUncertainty } from '../widget/evaluate-uncertainty.ts';
import { liveStated } from '../widget/places.ts';
import type { Stated } from '../widget/stated.ts';
import { detectQuantities } from './detect.ts';
import type { WeighedReading } from './weighing.ts';

/**
 * Null where there is no number on one of the sides. Live numbers move too often for their uncertainty to be carried,
 * as in `judgeClaims`. `words` are the claim's own, as they stand in the copy.
 */
export function weighingOf(
	document: WidgetDocument,
	evaluation: Evaluation,
	claim: Claim,
	words: string,
	house: CalculatorSet
): { stated: Stated; reading: WeighedReading } | null {
	if (claim.form === 'exempt') return null;
	const calculators = benchSet(document, house);
	const read = claim.form === 'live' ? readingAt : readingWithUncertainty;
	const outcome = read(document, evaluation, claim.reading, calculators);
	if (!outcome.ok || typeof outcome.reading.value !== 'number') return null;
	const reading = { ...outcome.reading, value: outcome.reading.value };
	const stated =
		claim.form === 'live'
			? liveStated(document, evaluation, claim.id, calculators)
			: (detectQuantities(words, document.language)[0]?.stated ?? null);
	return stated && { stated, reading };
}
