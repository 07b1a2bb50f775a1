/**
 * What printing a number needs to know of a language. English is always at hand, as the unit table is written in it; of
 * the others a page loads the one it prints in (`load.ts`), and the server has them all (`all.ts`).
 */
import type { Language } from '../language.ts';
import type { HedgeFamily } from '../stated.ts';
import { english } from './en.ts';

/** One and many, as Intl.PluralRules tells them apart. */
export type OneMany = readonly [one: string, many: string];

/** Hedges that the house chooses by itself. */
export type PrintedHedge = Extract<HedgeFamily, 'around' | 'below' | 'just-above' | 'more-than'>;

/** How signs are said, for readers who listen. */
export interface SpokenWords {
	/** Whole numbers from 2 to 99; others are left to the reader's own voice, as gender may bend them. */
	cardinal: (value: number) => string;
	minus: string;
	/** Between a numeral and its power of ten: “times ten to the”. */
	timesTen: string;
	ten: string;
	/** Before an exponent: “to the”. */
	power: string;
	/** Between the ends of a range. */
	to: string;
	giveOrTake: string;
	/** Units whose printed form is a sign. */
	units: Readonly<Record<string, OneMany>>;
	/** Signs before a number. */
	signs: Readonly<Record<string, string>>;
	/** A lowered nought, as in H₀. */
	nought: string;
}

export interface PrintWords {
	language: Language;
	decimalMark: '.' | ',';
	/** Between a numeral and its power of ten. */
	timesSign: '×' | '·';
	hedges: Readonly<Record<PrintedHedge, string>>;
	/** Words for powers of ten; the unit table's own names have theirs already. */
	scales: Readonly<Record<number, OneMany>>;
	/** Joins a scale word from a million on to what is counted: “millones de años”. */
	afterScale: string;
	/** What stands after a numeral, by symbol; undefined for a symbol that isn't in the unit table. */
	units: (symbol: string) => OneMany | undefined;
	/** What takes no space before it. */
	closedUp: RegExp;
	spoken: SpokenWords;
}

const shelf = new Map<Language, PrintWords>([['en', english]]);

export function putOnShelf(words: PrintWords): void {
	shelf.set(words.language, words);
}

export function hasPrintWords(language: Language): boolean {
	return shelf.has(language);
}

/** @throws {RangeError} when nothing has loaded the language's words. */
export function printWordsOf(language: Language): PrintWords {
	const words = shelf.get(language);
	if (!words) {
		throw new RangeError(
			`The words for print of “${language}” aren’t loaded: call loadPrintWords first.`
		);
	}
	return words;
}
