/** A weighing told in sentences: what the copy says, what the calculator reads, what the rule allows. */
import type { Language } from '../widget/language.ts';
import {
	printAfterNumeral,
	printNumeral,
	printStated,
	roundToFigures,
	type HedgeFamily,
	type Stated
} from '../widget/stated.ts';
import { bands } from './bands.ts';
import { decimalOf, firstPlace } from './decimal.ts';
import { scaleFor } from './suggestions.ts';
import type { Verdict, VerdictName } from './verdict.ts';
import {
	departurePercent,
	inUnit,
	prepare,
	sameDimension,
	uncertaintyIn,
	type WeighedReading
} from './weighing.ts';

export type Audience = 'office' | 'reader';

const ENDINGS: Record<Audience, Record<VerdictName, string>> = {
	office: { level: 'Level.', leans: 'Leans.', tips: 'Tips.', unweighed: 'Not weighed.' },
	reader: {
		level: 'It fits.',
		leans: 'It’s a stretch.',
		tips: 'It’s wrong.',
		unweighed: 'It isn’t weighed.'
	}
};

/** Figures shown of a reading that is exact, and of one whose uncertainty nobody knows. */
const EXACT_FIGURES = 6;
const UNKNOWN_FIGURES = 4;
const NO_BREAK = '\u00a0';

/**
 * “The copy says nearly 14 billion years. The calculator reads 13.786 ± 0.020 billion years, 1.5 per cent below. Nearly
 * allows up to 5 per cent below. Level.” `words` are the claim's own where they differ from the stated number's print.
 */
export function verdictSentence(
	stated: Stated,
	reading: WeighedReading,
	verdict: Pick<Verdict, 'verdict' | 'reason'>,
	audience: Audience = 'office',
	words?: string,
	language: Language = 'en'
): string {
	const says = `The copy says ${words ?? printStated(stated, language)}.`;
	const end = ENDINGS[audience][verdict.verdict];
	if (!Number.isFinite(reading.value)) return [says, verdict.reason, end].join(' ');
	const departure = sameDimension(reading.unit, stated.unit) ? departureWords(stated, reading) : '';
	const reads = `The calculator reads ${[readsInWords(stated, reading, language), departure].filter(Boolean).join(', ')}.`;
	const why = verdict.verdict === 'level' ? allowance(stated, reading) : verdict.reason;
	return [says, reads, why, end].join(' ');
}

/** The reading in the claim's unit and scale, with its uncertainty: “13.786 ± 0.020 billion years”. */
export function readsInWords(
	stated: Stated,
	reading: WeighedReading,
	language: Language = 'en'
): string {
	if (!sameDimension(reading.unit, stated.unit)) {
		return readsInWords({ ...bareIn(reading.unit), scale: 1 }, reading, language);
	}
	const value = inUnit(reading, stated.unit);
	const scale = value === 0 ? 1 : scaleFor(value, stated.scale);
	const u = uncertaintyIn(reading, stated.unit);
	const { numeral, spread } = digitsOf(value / scale, u === null ? null : u / scale, language);
	const printed: Stated = { ...stated, numeral, scale };
	return printNumeral(numeral, language) + spread + printAfterNumeral(printed, language);
}

/** The reading as it stands beside the rider: “13.786 ± 0.020 billion years, −1.5 %”. */
export function readsOnBeam(
	stated: Stated,
	reading: WeighedReading,
	language: Language = 'en'
): string {
	const percent = percentOf(stated, reading);
	const words = readsInWords(stated, reading, language);
	if (percent === null) return words;
	const printed = printPercent(percent);
	return `${words}, ${percent > 0 && printed !== '0' ? '+' : ''}${printed}${NO_BREAK}%`;
}

/** What the hedge's rule allows, as a sentence. */
export function allowance(stated: Stated, reading: WeighedReading): string {
	const word = stated.hedgeWord.charAt(0).toUpperCase() + stated.hedgeWord.slice(1);
	return ALLOWANCES[stated.hedge](
		word,
		Math.abs(percentOf(stated, reading) ?? 0),
		Boolean(stated.fraction)
	);
}

const short = (word: string, band: { level: number; leans: number }, percent: number) =>
	percent > band.level
		? `${word} allows up to ${band.leans} per cent below a number that the reading rounds to.`
		: `${word} allows up to ${band.level} per cent below.`;

const ALLOWANCES: Record<
	HedgeFamily,
	(word: string, percent: number, isFraction: boolean) => string
> = {
	bare: (_word, _percent, isFraction) =>
		isFraction
			? `A fraction without a hedge allows up to ${bands.bare.level} per cent.`
			: `A number without a hedge allows its own rounding, and never more than ${bands.bare.level} per cent.`,
	exactly: (word) => `${word} allows the very number and nothing else.`,
	around: (word, _percent, isFraction) =>
		isFraction
			? `${word} allows up to ${bands.around.leans} per cent.`
			: `${word} allows its own rounding; past it, up to ${bands.around.leans} per cent is a stretch.`,
	below: (word, percent) => short(word, bands.below, percent),
	'just-below': (word, percent) => short(word, bands.justBelow, percent),
	'just-above': (word) => `${word} allows up to ${bands.justAbove.level} per cent above.`,
	'more-than': (word) => `${word} allows up to ${bands.moreThan.level} per cent above.`,
	'well-over': (word) =>
		`${word} allows ${bands.moreThan.wellOver} to ${bands.moreThan.level} per cent above.`,
	'less-than': (word) => `${word} allows up to ${bands.lessThan.level} per cent below.`,
	within: (word) => `${word} allows up to ${bands.lessThan.level} per cent below.`,
	'at-least': (word) => `${word} allows up to ${bands.moreThan.level} per cent above.`,
	'at-most': (word) => `${word} allows up to ${bands.lessThan.level} per cent below.`,
	'up-to': (word) =>
		`${word} allows a highest reading from ${bands.upTo.near} per cent below to ${bands.upTo.past} per cent above.`
};

function bareIn(unit: string): Stated {
	return { hedge: 'bare', hedgeWord: '', numeral: '1', scale: 1, unit };
}

/** Digits down to the second one of the uncertainty, as long as that isn't too many to read. */
function digitsOf(
	value: number,
	u: number | null,
	language: Language
): { numeral: string; spread: string } {
	if (value === 0) return { numeral: '0', spread: '' };
	const first = firstPlace(decimalOf(value));
	const plain = (figures: number) => ({
		numeral: withoutIdleZeros(roundToFigures(value, figures)),
		spread: ''
	});
	if (u === null) return plain(UNKNOWN_FIGURES);
	if (u === 0) return plain(EXACT_FIGURES);
	const figures = first - firstPlace(decimalOf(u)) + 2;
	if (figures < 1 || figures > EXACT_FIGURES) return plain(UNKNOWN_FIGURES);
	return {
		numeral: roundToFigures(value, figures),
		spread: `${NO_BREAK}±${NO_BREAK}${printNumeral(roundToFigures(u, 2), language)}`
	};
}

function withoutIdleZeros(numeral: string): string {
	return numeral.includes('.') ? numeral.replace(/\.?0+$/, '') : numeral;
}

function percentOf(stated: Stated, reading: WeighedReading): number | null {
	if (!Number.isFinite(reading.value) || !sameDimension(reading.unit, stated.unit)) return null;
	return departurePercent(prepare(stated, reading));
}

/** Past this many per cent a multiple is easier to read. */
const AS_MULTIPLE = 200;

/** “1.5 per cent below”, “11 times as much”; for two negative numbers by size. */
function departureWords(stated: Stated, reading: WeighedReading): string {
	const percent = percentOf(stated, reading);
	if (percent === null) return '';
	if (percent === 0) return 'the very number';
	if (percent >= AS_MULTIPLE && !stated.numeral.startsWith('-')) {
		const ratio = roundToFigures(1 + percent / 100, 2);
		return `about ${printNumeral(ratio)} times as much`;
	}
	const isNegative = stated.numeral.startsWith('-') && inUnit(reading, stated.unit) < 0;
	const [above, below] = isNegative ? ['smaller in size', 'larger in size'] : ['above', 'below'];
	const size = Math.abs(percent) < 0.05 ? 'less than 0.1' : printPercent(Math.abs(percent));
	return `${size} per cent ${percent > 0 ? above : below}`;
}

/** None after the point above ten, one above a tenth, one digit that counts below; a real minus. */
function printPercent(percent: number): string {
	const size = Math.abs(percent);
	if (size < 0.0005) return '0';
	const text =
		size >= 10
			? percent.toFixed(0)
			: size >= 0.1
				? percent.toFixed(1)
				: percent.toFixed(size >= 0.01 ? 2 : 3);
	return /e/.test(text) ? text : printNumeral(withoutIdleZeros(text));
}
