/**
 * What detection needs to know of a language. One file per language; adding one needs no change to `detect.ts`. Phrases
 * are in small letters, words one space apart; where case matters the field says so.
 */
import type { Language } from '../../widget/language.ts';
import type { HedgeFamily } from '../../widget/stated.ts';

export type HedgeLists = Readonly<Record<Exclude<HedgeFamily, 'bare'>, readonly string[]>>;

export interface Lexicon {
	language: Language;
	/** Marks inside numerals. `groups` are those between three digits, beside the spaces. */
	numerals: { decimal: '.' | ','; groups: string };
	/** Hedges that stand before their number, by family. */
	hedges: HedgeLists;
	/** Hedges that are prepositions too: before another hedge they say where something is. */
	prepositions: readonly string[];
	/** Words that may stand between a hedge and its number: “about, say, 14”. */
	asides: readonly string[];
	/** Articles that may stand there: “casi el 5 %”. */
	hedgeArticles: readonly string[];
	/** Whole words for numbers below a thousand. Put together by `joints`. */
	cardinals: Readonly<Record<string, number>>;
	/** A number written as one long word, “dreiundzwanzig”; null for any other word. */
	compound?: (word: string) => number | null;
	/** How the parts of a number word are joined: tens to ones, hundreds to the rest. Patterns. */
	joints: { tens: string; hundreds: string };
	/** “hundred” multiplies what stands before it. */
	hundred: readonly string[];
	/** Articles that count as one before a scale word or a unit. */
	articles: readonly string[];
	/** Units that “a” makes a quantity only under a hedge, as “in a second” is seldom a second long; or all of them. */
	loosely: 'all' | readonly string[];
	scales: Readonly<Record<string, number>>;
	/** Scale words that count as one of themselves: “mil años”. */
	loneScales: readonly string[];
	/** After a number, its scale or its unit: “and a half”. */
	andAHalf: readonly string[];
	/** Between a large number and what is counted: “millones de años”. */
	afterScale: readonly string[];
	/** Words for a negative number, and what before them makes them something else: “al menos 40”. */
	minus: { words: readonly string[]; notAfter: readonly string[] };
	/** Phrases that are a number of times: “twice”. Only before one of `needs`, or after one of `after`. */
	multiples: readonly {
		phrase: string;
		value: number;
		needs?: readonly string[];
		after?: readonly string[];
	}[];
	/** Endings of a multiple written as one word, “tenfold”, with the unit they stand for. */
	folds: Readonly<Record<string, string>>;
	/** Articles that belong to such a word: “das Zehnfache”. */
	foldArticles: readonly string[];
	/** Before a number that multiplies: “a factor of 8”. */
	factor: readonly string[];
	fractions: {
		/** Whole phrases: “half”, “la mitad”. */
		phrases: Readonly<Record<string, readonly [over: number, under: number]>>;
		/** Of these, the ones that count only before a unit or a scale word: “media hora”. */
		beforeUnit: readonly string[];
		/** And those that count only before these words: “halb so”. */
		needs: Readonly<Record<string, readonly string[]>>;
		/** Denominators, singular and plural. */
		denominators: Readonly<Record<string, number>>;
		/** Denominators that are nothing else, so that “a tenth” needs no proof by what follows. */
		unmistakable: 'all' | readonly string[];
		/** What else may follow “a third”, so that it isn't “a third person”. */
		after: readonly string[];
		/** What before a half makes it a noun: “the second half”. */
		notAfter: readonly string[];
		/** A denominator written as one long word, “zwanzigtausendstel”; null for any other word. */
		compound?: (word: string) => number | null;
		/** Units that may be written as one word with a denominator: “Zehntelsekunde”. */
		joinsUnit: boolean;
	};
	/** Joins a fraction, an order word or a small word to what is counted. */
	of: readonly string[];
	/** Order words, with the power they name, and whether “of” must follow. */
	orderWords: Readonly<Record<string, number>>;
	orderNeedsOf: boolean;
	/** Small words; `value` only where the word names one number. */
	smallWords: readonly { phrase: string; value: number | null }[];
	range: {
		between: readonly string[];
		and: readonly string[];
		from: readonly string[];
		to: readonly string[];
		/** Articles before either end: “entre el 5 y el 10 %”. */
		articles: readonly string[];
	};
	/** “per” in a compound unit, first as the unit table's words have it. */
	per: readonly string[];
	/** Names of units, by symbol, beside those that are printed: other inflections, other spellings. */
	unitNames: Readonly<Record<string, readonly string[]>>;
	/** Names and symbols of the unit table that mean something else in running text. */
	notUnits: readonly string[];
	/** Words after a unit that make another one of it, which the table hasn't: “centímetros cúbicos”. */
	otherUnit: readonly string[];
	/** Between a numeral and its power of ten: “times”. */
	timesWords: readonly string[];
	/** “10 hoch 24”. */
	powerWords: readonly string[];
	months: readonly string[];
	/** “24 November” is a date; where it isn't, since “1 julio” is a joule, `skips` has the dates. */
	dayThenMonth: boolean;
	/** Further dates, times and names as patterns; case counts. A space is any gap, `_` a gap or none, `#` a month. */
	skips: readonly string[];
	/** Words before a number that make it a year. */
	beforeYear: readonly string[];
	/** Words before a number that make it a year where no noun follows: “the team of 1965.” */
	perhapsBeforeYear: readonly string[];
	/** Four bare digits are a year wherever nothing that can be counted follows: for languages with capital nouns. */
	yearsStandAlone: boolean;
	/** Nouns have capitals, so that a capital makes no name; these introduce a value all the same. */
	capitalNouns: { introduce: readonly string[] } | null;
	eras: readonly string[];
	clock: readonly string[];
	/** Nouns that take a number as a name: “figure 3”. */
	numbered: readonly string[];
	/**
	 * “on flight 815”: a noun after one of `after` takes a bare number as its name, unless it is one of `except`, or
	 * something that is counted follows.
	 */
	labels: { after: readonly string[]; except: readonly string[] };
	/** Endings of ordinals written with digits. */
	ordinalEndings: readonly string[];
	/** Words after the unit that name the quantity: “3 kilometres across” is a diameter. */
	quantities: Readonly<Record<string, string>>;
}
