/** What a calculator reads before rounding, as one sentence for a reader. */
import type { Reading } from '../../physics/calculator.ts';
import { commensurable, convert } from '../../physics/units/units.ts';
import type { ReadingOutcome } from '../../widget/evaluate.ts';
import type { Language } from '../../widget/language.ts';
import { readerWords } from '../reader-words.ts';
import { plainDecimal, printStated, roundToFigures } from '../../widget/stated.ts';

/** More than copy prints: all that an exact reading is good for, fewer where its uncertainty isn't known. */
const EXACT_FIGURES = 6;
const FIGURES = 4;

/** `unit` is the one the copy uses; null for the reading's own. */
export function readsSentence(
	outcome: ReadingOutcome,
	unit: string | null,
	language: Language
): string {
	const says = readerWords(language);
	if (!outcome.ok) return outcome.refusal.message;
	const { value, uncertainty } = outcome.reading;
	if (typeof value === 'string') return says.readsWords(value);
	const inUnit =
		unit !== null && commensurable(outcome.reading.unit, unit) ? unit : outcome.reading.unit;
	const figures = uncertainty === 'exact' ? EXACT_FIGURES : FIGURES;
	const spread = twiceTheUncertainty(value, uncertainty, outcome.reading.unit, inUnit);
	const reads = quantity(convert(value, outcome.reading.unit, inUnit), figures, inUnit, language);
	return says.readsNow(
		spread > 0 ? says.giveOrTake(reads, quantity(spread, 1, inUnit, language)) : reads
	);
}

/** Where the true value lies nineteen times in twenty; nought where nothing is known of it. */
function twiceTheUncertainty(
	value: number,
	uncertainty: Reading['uncertainty'],
	from: string,
	to: string
): number {
	if (typeof uncertainty !== 'number') return 0;
	return Math.abs(convert(value + 2 * uncertainty, from, to) - convert(value, from, to));
}

function quantity(value: number, figures: number, unit: string, language: Language): string {
	const numeral = plainDecimal(Number(roundToFigures(value, figures)));
	return printStated({ hedge: 'bare', hedgeWord: '', numeral, scale: 1, unit }, language);
}
