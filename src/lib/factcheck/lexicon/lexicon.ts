/** What detection needs to know of a language. One file per language; adding one needs no change to `detect.ts`. */
import type { HedgeFamily } from '../../widget/stated.ts';

export interface Lexicon {
	language: string;
	/** Hedges that stand before their number, by family. Phrases are in small letters, words one space apart. */
	hedges: Readonly<Record<Exclude<HedgeFamily, 'bare'>, readonly string[]>>;
	/** Words that may stand between a hedge and its number: “about, say, 14”. */
	asides: readonly string[];
	/** Number words up to ninety. */
	ones: Readonly<Record<string, number>>;
	tens: Readonly<Record<string, number>>;
	/** “hundred” multiplies what stands before it. */
	hundred: readonly string[];
	/** Joins the parts of a number word: “a hundred and twenty”. */
	and: readonly string[];
	/** Articles that count as one before a scale word or a unit. */
	articles: readonly string[];
	scales: Readonly<Record<string, number>>;
	/** Words for a negative number. */
	minus: readonly string[];
	/** Whole words that are a number of times: “twice”. With `needs`, only before one of those words. */
	multiples: readonly { word: string; value: number; needs?: readonly string[] }[];
	/** Ending of a multiple written as one word: “tenfold”. */
	fold: string;
	/** A half needs no article, and may end a number: “two and a half”. */
	half: string;
	/** Denominators, singular and plural. */
	denominators: Readonly<Record<string, number>>;
	/** What may follow “a third”, so that it isn't “a third person”. */
	afterFraction: readonly string[];
	/** Joins a fraction to its whole: “half of a kelvin”. */
	of: readonly string[];
	/** What before a half makes it a noun: “the second half”. */
	beforeHalfNoun: readonly string[];
	/** Order words, with the power they name. */
	orderWords: Readonly<Record<string, number>>;
	/** Small words, longest first; `value` only where the word names one number. */
	smallWords: readonly { word: string; value: number | null }[];
	range: {
		between: readonly string[];
		and: readonly string[];
		from: readonly string[];
		to: readonly string[];
	};
	/** “per” in a compound unit may be said otherwise: “metres a second”. */
	per: readonly string[];
	/** Names and symbols of the unit table that mean something else in running text. */
	notUnits: readonly string[];
	/** The unit of multiples: “three times”. */
	times: string;
	months: readonly string[];
	/** Words before a number that make it a year. */
	beforeYear: readonly string[];
	/** Words before a number that make it a year where no noun follows: “the team of 1965.” */
	perhapsBeforeYear: readonly string[];
	eras: readonly string[];
	clock: readonly string[];
	/** Nouns that take a number as a name: “figure 3”. */
	numbered: readonly string[];
	/** Endings of ordinals written with digits. */
	ordinalEndings: readonly string[];
	/** Words after the unit that name the quantity: “3 kilometres across” is a diameter. */
	quantities: Readonly<Record<string, string>>;
}
