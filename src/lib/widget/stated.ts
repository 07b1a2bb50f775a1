/**
 * A stated quantity: the hedge, the numeral as written, the scale word and the unit. The fact-check weighs it and
 * the widget prints it, so what is printed is what is weighed. A language other than English must have been loaded
 * (`languages/load.ts`); printing in one that isn't throws a RangeError.
 */
import type { Uncertainty } from '../physics/calculator.ts';
import type { QuantityKind } from '../physics/units/quantities.ts';
import { convertDifference, convertQuantity, unitOf } from '../physics/units/units.ts';
import { fittingWording } from './fitting-hedge.ts';
import type { Language } from './language.ts';
import { printWordsOf, type PrintWords } from './languages/print-words.ts';
import { roundToFigures, shiftPoint } from './rounding.ts';

export { plainDecimal, roundToFigures } from './rounding.ts';

/** Families are what the rules know; the word as written is kept beside it. */
export type HedgeFamily =
	| 'bare'
	| 'exactly'
	| 'around'
	| 'below'
	| 'just-below'
	| 'just-above'
	| 'more-than'
	| 'well-over'
	| 'less-than'
	| 'within'
	| 'at-least'
	| 'at-most'
	| 'up-to';

export interface Stated {
	hedge: HedgeFamily;
	/** The hedge word as written: “nearly”, “about”; '' when bare. */
	hedgeWord: string;
	/** The numeral as written, with a point as decimal mark and an ASCII minus: “13.8”, “-19”. */
	numeral: string;
	/** 1, 1e3, 1e6, 1e9 or 1e12 from a scale word; another power of ten where one was written. */
	scale: number;
	/** A symbol of the unit table; '' for a plain count. */
	unit: string;
	/** The unit as written where that isn't the table's own name: “times”, “MHz”, “metres a second”. */
	unitWord?: string;
	/** A fraction word's two parts, “two-thirds” is [2, 3]; the numeral then is its decimal, cut short. */
	fraction?: readonly [over: number, under: number];
	/** The quantity kind where the words name one, as “across” names a diameter. */
	quantity?: string;
}

export interface LiveFormat {
	unit: string;
	/** Significant figures printed; a fitting hedge may ask for more where so few can't be level. */
	figures: number;
	/** `fitting`: whichever hedge the rules find for the reading at hand. */
	hedge: 'none' | 'about' | 'fitting';
}

const NO_BREAK = '\u00a0';
const GROUP = '\u202f';
const MINUS = '\u2212';

/** The stated value in its unit: numeral times scale. */
export function statedValue(stated: Stated): number {
	const [over, under] = stated.fraction ?? [Number(stated.numeral), 1];
	return (over / under) * stated.scale;
}

/** Numbers from here on get a scale word or a power of ten; copy has no use for rows of noughts. */
const WORDS_FROM = 1e6;
const POWERS_FROM = 1e15;
const POWERS_BELOW = 1e-6;
/** Units with a scale word in their names, “million years”, bear no second one. */
const SCALED_UNIT = /^(?:thousand|million|billion) /;

/**
 * States a reading by a live format: converts first, rounds once, last. Rounds half to even on the shortest decimal
 * string that round-trips the double (ISO 80000-1:2009 annex B rule A), as the number rules ask. `uncertainty` is the
 * reading's, in `unit`; a fitting hedge says “nearly” only where it leaves no doubt of the side.
 */
export function stateReading(
	value: number,
	unit: string,
	format: LiveFormat,
	quantity: QuantityKind = 'number',
	language: Language = 'en',
	uncertainty: Uncertainty = 'not-available'
): Stated {
	const converted = convertQuantity(value, unit, format.unit, quantity);
	const hedges = printWordsOf(language).hedges;
	if (format.hedge === 'fitting') {
		const u =
			typeof uncertainty === 'number'
				? Math.abs(convertDifference(uncertainty, unit, format.unit))
				: uncertainty;
		const { family, numeral, figures } = fittingWording(converted, u, format.figures);
		const hedgeWord = family === 'bare' ? '' : hedges[family];
		return {
			hedge: family,
			hedgeWord,
			...scaled(numeral, figures, format.unit),
			unit: format.unit
		};
	}
	const isAbout = format.hedge === 'about';
	return {
		hedge: isAbout ? 'around' : 'bare',
		hedgeWord: isAbout ? hedges.around : '',
		...scaled(roundToFigures(converted, format.figures), format.figures, format.unit),
		unit: format.unit
	};
}

/** A rounded numeral with the scale word or power of ten that keeps it short. */
function scaled(numeral: string, figures: number, unit: string): Pick<Stated, 'numeral' | 'scale'> {
	const size = Math.abs(Number(numeral));
	const power = size === 0 ? 0 : powerFor(size, SCALED_UNIT.test(unitOf(unit)?.words.many ?? ''));
	if (power === 0) return { numeral, scale: 1 };
	const [whole = '', rest = ''] = shiftPoint(numeral, -power).split('.');
	const kept = rest.slice(0, Math.max(0, figures - whole.replace('-', '').length));
	return { numeral: kept ? `${whole}.${kept}` : whole, scale: Number(`1e${power}`) };
}

function powerFor(size: number, isScaled: boolean): number {
	if (size >= POWERS_FROM || size < POWERS_BELOW) return Number(size.toExponential().split('e')[1]);
	if (size < WORDS_FROM || isScaled) return 0;
	return size < 1e9 ? 6 : size < 1e12 ? 9 : 12;
}

/** “about 68 megahertz”: numeral and unit keep together, the minus is a real one, long numerals are grouped. */
export function printStated(stated: Stated, language: Language = 'en'): string {
	return [
		stated.hedgeWord,
		printNumeral(stated.numeral, language) + printAfterNumeral(stated, language)
	]
		.filter(Boolean)
		.join(' ');
}

/** Scale word and unit with the space before them: what follows the numeral. '' for a plain number. */
export function printAfterNumeral(
	{ numeral, scale, unit, unitWord: written }: Stated,
	language: Language = 'en'
): string {
	const words = printWordsOf(language);
	const scaleWord = printScale(words, numeral, scale);
	const unitWord = written ?? printUnitWord(words, unit, scale === 1 ? numeral : null);
	if (!scaleWord) return unitWord && (words.closedUp.test(unitWord) ? '' : NO_BREAK) + unitWord;
	// “millones de metros”, but “millones por metro cúbico”.
	const after = scale >= 1e6 && words.scales[scale] && /^(?!por )\p{L}/u.test(unitWord);
	return (
		NO_BREAK +
		[scaleWord, after ? words.afterScale : '', unitWord.replace(/^-/, '')].filter(Boolean).join(' ')
	);
}

function printScale(words: PrintWords, numeral: string, scale: number): string {
	if (scale === 1) return '';
	const named = words.scales[scale];
	if (named) return named[isOne(words.language, numeral) ? 0 : 1];
	return `${words.timesSign}${NO_BREAK}10${superscript(Math.round(Math.log10(scale)))}`;
}

/** The numeral is null where a scale word stands between it and the unit. */
function printUnitWord(words: PrintWords, symbol: string, numeral: string | null): string {
	const unit = words.units(symbol);
	if (!unit) return symbol;
	if (numeral === null) return unit[1];
	const joined = isExactMillions(words, numeral) ? `${words.afterScale} ${unit[1]}` : null;
	return joined ?? unit[isOne(words.language, numeral) ? 0 : 1];
}

/** Spanish counts in an exact million as in a noun: “1 000 000 de años”. CLDR's category “many”. */
function isExactMillions({ afterScale }: PrintWords, numeral: string): boolean {
	return afterScale !== '' && /^-?[1-9]\d*0{6}$/.test(numeral);
}

const plurals = new Map<string, Intl.PluralRules>();

/** “1 metre” but “1.0 metres”: CLDR's plural rules, by the digits that are seen. */
function isOne(language: Language, numeral: string): boolean {
	const digits = numeral.split('.')[1]?.length ?? 0;
	const key = `${language} ${digits}`;
	const rules =
		plurals.get(key) ?? new Intl.PluralRules(language, { minimumFractionDigits: digits });
	plurals.set(key, rules);
	return rules.select(Math.abs(Number(numeral))) === 'one';
}

/** 10 to this power, as raised digits with a real minus. */
export function superscript(power: number): string {
	return [...String(power)].map((sign) => SUPERSCRIPTS[sign] ?? sign).join('');
}

const SUPERSCRIPTS: Record<string, string> = Object.fromEntries(
	[...'0123456789-'].map((sign, index) => [sign, [...'⁰¹²³⁴⁵⁶⁷⁸⁹⁻'][index] ?? sign])
);

/** The language's decimal mark, a real minus, and narrow no-break spaces between groups from five digits on. */
export function printNumeral(numeral: string, language: Language = 'en'): string {
	const [, sign, whole, rest] = /^(-?)(\d+)(.*)$/.exec(numeral) ?? ['', '', numeral, ''];
	const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, GROUP) : whole;
	const mark = printWordsOf(language).decimalMark;
	return (sign && Number(numeral) !== 0 ? MINUS : '') + grouped + rest.replace('.', mark);
}
