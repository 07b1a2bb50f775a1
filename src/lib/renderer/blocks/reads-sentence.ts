/** What a calculator reads before rounding, as one sentence for a reader. */
import type { Reading } from '../../physics/calculator.ts';
import { commensurable, convert } from '../../physics/units/units.ts';
import type { ReadingOutcome } from '../../widget/evaluate.ts';
import { plainDecimal, printStated, roundToFigures } from '../../widget/stated.ts';

/** More than copy prints: all that an exact reading is good for, fewer where its uncertainty isn't known. */
const EXACT_FIGURES = 6;
const FIGURES = 4;

/** `unit` is the one the copy uses; null for the reading's own. */
export function readsSentence(outcome: ReadingOutcome, unit: string | null): string {
	if (!outcome.ok) return outcome.refusal.message;
	const { value, uncertainty } = outcome.reading;
	if (typeof value === 'string') return `The calculator reads ${value}.`;
	const inUnit =
		unit !== null && commensurable(outcome.reading.unit, unit) ? unit : outcome.reading.unit;
	const figures = uncertainty === 'exact' ? EXACT_FIGURES : FIGURES;
	const give = giveOrTake(value, uncertainty, outcome.reading.unit, inUnit);
	const reads = quantity(convert(value, outcome.reading.unit, inUnit), figures, inUnit);
	return `Before rounding, the calculator reads ${reads}${give} at this setting.`;
}

/** Twice the standard uncertainty, to one figure: where the true value lies nineteen times in twenty. */
function giveOrTake(
	value: number,
	uncertainty: Reading['uncertainty'],
	from: string,
	to: string
): string {
	if (typeof uncertainty !== 'number' || uncertainty === 0) return '';
	const twice = Math.abs(convert(value + 2 * uncertainty, from, to) - convert(value, from, to));
	return twice > 0 ? `, give or take ${quantity(twice, 1, to)}` : '';
}

function quantity(value: number, figures: number, unit: string): string {
	const numeral = plainDecimal(Number(roundToFigures(value, figures)));
	return printStated({ hedge: 'bare', hedgeWord: '', numeral, scale: 1, unit });
}
