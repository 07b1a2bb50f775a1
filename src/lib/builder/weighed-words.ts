/** One claim as the beam picture needs it: what is said, what is read, and both in words. */
import type { WeighedReading } from '../factcheck/weigh.ts';
import { readsOnBeam } from '../factcheck/words.ts';
import { commensurable } from '../physics/units/units.ts';
import type { CalculatorSet } from '../physics/calculator.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { readingAt, type Evaluation } from '../widget/evaluate.ts';
import { readingWithUncertainty } from '../widget/evaluate-uncertainty.ts';
import { liveStated } from '../widget/places.ts';
import { printStated, type Stated } from '../widget/stated.ts';
import type { NumberInCopy } from './quantities.ts';

export interface WeighedWords {
	stated: Stated;
	reading: WeighedReading;
	words: string;
	/** “68.14 MHz, +0.2 %”. */
	reads: string;
}

interface Home {
	document: WidgetDocument;
	calculators: CalculatorSet;
	/** Stated words are weighed at the first settings, live ones where the controls stand. */
	firstEvaluation: Evaluation;
	widget: { evaluation: Evaluation };
}

/** Null where there is nothing to lay on the arm: no tie, no reading, or words that are no number. */
export function weighedWords(home: Home, number: NumberInCopy): WeighedWords | null {
	const { claim } = number;
	if (!claim || claim.form === 'exempt') return null;
	const { document, calculators } = home;
	const evaluation = claim.form === 'live' ? home.widget.evaluation : home.firstEvaluation;
	const read = claim.form === 'live' ? readingAt : readingWithUncertainty;
	const outcome = read(document, evaluation, claim.reading, calculators);
	const stated =
		claim.form === 'live'
			? liveStated(document, evaluation, claim.id, calculators)
			: (number.quantity?.stated ?? null);
	if (!stated || !outcome.ok || typeof outcome.reading.value !== 'number') return null;
	const reading = { ...outcome.reading, value: outcome.reading.value };
	if (!commensurable(reading.unit, stated.unit)) return null;
	return {
		stated,
		reading,
		words: number.words || printStated(stated, document.language),
		reads: readsOnBeam(stated, reading)
	};
}
