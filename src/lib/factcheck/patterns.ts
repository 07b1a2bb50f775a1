/** A lexicon and the unit table, compiled once into patterns that read forward from one place in a text. */
import type { HedgeFamily } from '../widget/stated.ts';
import { hedgeWords } from './hedges.ts';
import type { Lexicon } from './lexicon/lexicon.ts';
import { phrasesOf, type Phrases } from './phrases.ts';
import { skipPattern } from './skip-pattern.ts';
import {
	escape,
	GAP,
	GROUP_SPACE,
	oneOf,
	SPACE,
	sticky,
	WORD_END,
	WORD_START
} from './text-patterns.ts';
import { unitNames, unitSymbols } from './unit-names.ts';

export const VULGAR_FRACTIONS: Readonly<Record<string, readonly [number, number]>> = {
	'½': [1, 2],
	'⅓': [1, 3],
	'⅔': [2, 3],
	'¼': [1, 4],
	'¾': [3, 4],
	'⅕': [1, 5],
	'⅖': [2, 5],
	'⅗': [3, 5],
	'⅘': [4, 5],
	'⅙': [1, 6],
	'⅛': [1, 8],
	'⅜': [3, 8],
	'⅝': [5, 8],
	'⅞': [7, 8],
	'⅒': [1, 10]
};
const VULGAR = `[${Object.keys(VULGAR_FRACTIONS).join('')}]`;
const EXPONENT = '(?:\\^\\{?(?<caret>[-−]?\\d{1,3})\\}?|(?<raised>⁻?[⁰¹²³⁴-⁹]{1,3})';

export interface Patterns {
	lexicon: Lexicon;
	/** Where a quantity may begin: a digit, a vulgar fraction, or any word. */
	trigger: RegExp;
	/** Words, in small letters, that may begin one. */
	beginnings: ReadonlySet<string>;
	/** Numerals, in the order they are tried: whole part, decimals, exponent, vulgar fraction. */
	numerals: readonly RegExp[];
	slashFraction: RegExp;
	/** “× 10⁻¹⁸” after a numeral, and “10⁻¹⁸” alone. */
	timesPower: RegExp;
	barePower: RegExp;
	/** “(20)” or “± 0.020”. */
	uncertainty: RegExp;
	tensJoint: RegExp;
	hundredsJoint: RegExp;
	hundred: RegExp;
	andAHalf: RegExp;
	scales: Phrases<number>;
	articles: Phrases<1>;
	fractions: Phrases<readonly [number, number]>;
	denominators: Phrases<number>;
	afterFraction: RegExp;
	of: RegExp;
	afterScale: RegExp;
	multiples: Phrases<Lexicon['multiples'][number]>;
	foldSuffix: RegExp;
	foldWord: RegExp;
	foldArticle: RegExp;
	/** A word that ends like “tenfold”. */
	foldEnding: RegExp;
	orderWords: Phrases<number>;
	smallWords: Phrases<number | null>;
	units: Phrases<string>;
	unitSymbol: RegExp;
	rangeDash: RegExp;
	rangeTo: RegExp;
	rangeAnd: RegExp;
	/** An article before the far end of a range. */
	rangeArticle: RegExp;
	/** These are read backwards from the end of a slice. */
	hedgeBefore: RegExp;
	minusBefore: RegExp;
	betweenBefore: RegExp;
	fromBefore: RegExp;
	fractionNounBefore: RegExp;
	factorBefore: RegExp;
	yearBefore: RegExp;
	/** Before a year only where nothing follows that could be counted. */
	yearPerhapsBefore: RegExp;
	numberedBefore: RegExp;
	introducedBefore: RegExp;
	/** “the flight” before a number. */
	labelBefore: RegExp;
	otherUnit: RegExp;
	hedgeFamilies: ReadonlyMap<string, HedgeFamily>;
	/** The last words of hedges, and of what may stand between a hedge and its number. */
	hedgeLastWords: ReadonlySet<string>;
	/** The sign of a range's far end. */
	sign: RegExp;
	quantityWords: Phrases<string>;
	/** Dates, times, versions and list numbers. */
	notQuantities: RegExp;
	ordinalEnding: RegExp;
	clockAfter: RegExp;
}

const before = (source: string) => new RegExp(`${source}$`, 'iu');
const wordsBefore = (words: readonly string[]) => before(`${WORD_START}(?:${oneOf(words)})${GAP}`);

export function compile(lexicon: Lexicon): Patterns {
	const { fractions, range } = lexicon;
	const hedges = hedgeWords(lexicon);
	const wordHedges = [...hedges.keys()].filter((word) => /\p{L}/u.test(word));
	const signHedges = [...hedges.keys()].filter((word) => !/\p{L}/u.test(word));
	const folds = oneOf(Object.keys(lexicon.folds));
	const tables = {
		scales: phrasesOf(Object.entries(lexicon.scales)),
		articles: phrasesOf(lexicon.articles.map((word) => [word, 1] as const)),
		fractions: phrasesOf(Object.entries(fractions.phrases)),
		denominators: phrasesOf(Object.entries(fractions.denominators)),
		multiples: phrasesOf(lexicon.multiples.map((multiple) => [multiple.phrase, multiple] as const)),
		orderWords: phrasesOf(Object.entries(lexicon.orderWords)),
		smallWords: phrasesOf(lexicon.smallWords.map(({ phrase, value }) => [phrase, value] as const)),
		units: phrasesOf(unitNames(lexicon)),
		quantityWords: phrasesOf(Object.entries(lexicon.quantities))
	};
	const beginnings = new Set([
		...Object.keys(lexicon.cardinals),
		...lexicon.loneScales.map((phrase) => phrase.split(' ')[0] ?? phrase),
		...lexicon.foldArticles,
		...(['articles', 'fractions', 'multiples', 'orderWords', 'smallWords'] as const).flatMap(
			(table) => tables[table].firstWords
		)
	]);
	return {
		lexicon,
		...tables,
		trigger: new RegExp(`\\p{L}+|\\d|\\.(?=\\d)|${VULGAR}`, 'giu'),
		beginnings,
		numerals: numeralPatterns(lexicon),
		slashFraction: sticky('(?<over>\\d{1,2})\\/(?<under>\\d{1,3})(?![\\d\\/.])'),
		timesPower: sticky(
			`${SPACE}*(?:[×x·⋅*]|(?:${oneOf(lexicon.timesWords)})(?=${SPACE}))${SPACE}*10${EXPONENT}|${powerWords(lexicon)})`
		),
		barePower: sticky(`10${EXPONENT}|${powerWords(lexicon)})`),
		uncertainty: sticky(
			`\\(\\d{1,3}\\)|${GROUP_SPACE}*(?:±|\\+\\/[-−])${GROUP_SPACE}*\\d+(?:[${lexicon.numerals.decimal}.]\\d+)?`
		),
		tensJoint: sticky(lexicon.joints.tens),
		hundredsJoint: sticky(lexicon.joints.hundreds),
		hundred: sticky(`${GAP}(?:${oneOf(lexicon.hundred)})${WORD_END}`),
		andAHalf: sticky(`(?:${GAP}|-)(?:${oneOf(lexicon.andAHalf)})${WORD_END}`),
		afterFraction: sticky(
			`${SPACE}*(?:$|[.,;:!?)–—”"’»“]|(?:${oneOf(fractions.after)})${WORD_END})`
		),
		of: sticky(`${GAP}(?:${oneOf(lexicon.of)})${WORD_END}`),
		afterScale: sticky(`${GAP}(?:${oneOf(lexicon.afterScale)})${WORD_END}`),
		foldSuffix: sticky(`(?:-?(?<fold>${folds})|[×x])${WORD_END}`),
		foldWord: sticky(`(?<stem>\\p{L}+?)(?<fold>${folds})${WORD_END}`),
		foldArticle: sticky(`(?:${oneOf(lexicon.foldArticles)})${GAP}`),
		foldEnding: new RegExp(`.(?:${folds})$`, 'u'),
		unitSymbol: sticky(
			`(?<gap>${GROUP_SPACE}|-|)(?<symbol>${oneOf(unitSymbols(lexicon))})(?![\\p{N}⁻²³^]|\\/\\p{L})`,
			'uy'
		),
		rangeDash: sticky(`${SPACE}*[–-]${SPACE}*(?=[\\d−.])`),
		rangeTo: sticky(`-?${GAP}(?:${oneOf(range.to)})${GAP}`),
		rangeAnd: sticky(`${GAP}(?:${oneOf(range.and)})${GAP}`),
		rangeArticle: sticky(`(?:${oneOf(range.articles)})${GAP}`),
		hedgeBefore: before(
			`(?:${WORD_START}(?<word>${oneOf(wordHedges)})(?:,?${GAP}(?:${oneOf(lexicon.asides)}),?)?` +
				`(?:${GAP}(?:${oneOf(lexicon.hedgeArticles)}))?${GAP}|(?<sign>${oneOf(signHedges)})${SPACE}*)`
		),
		minusBefore: before(
			`(?:(?:^|[\\s\\u00a0\\u202f(~≈<>≥≤“"–])[-−]|${WORD_START}` +
				`(?<!(?:${oneOf(lexicon.minus.notAfter)})${GAP})(?:${oneOf(lexicon.minus.words)})${GAP})`
		),
		betweenBefore: rangeBefore(range.between, lexicon),
		fromBefore: rangeBefore(range.from, lexicon),
		fractionNounBefore: wordsBefore(fractions.notAfter),
		factorBefore: wordsBefore(lexicon.factor),
		yearBefore: before(`(?:${WORD_START}(?:${oneOf(lexicon.beforeYear)})\\.?,?${SPACE}+|\\()`),
		yearPerhapsBefore: wordsBefore(lexicon.perhapsBeforeYear),
		numberedBefore: before(
			`(?:${WORD_START}(?:${oneOf(lexicon.numbered)})\\.?${SPACE}+|[#§]${SPACE}?)`
		),
		introducedBefore: wordsBefore(lexicon.capitalNouns?.introduce ?? []),
		labelBefore: before(
			`${WORD_START}(?:${oneOf(lexicon.labels.after)})${GAP}(?!(?:${oneOf(lexicon.labels.except)})${GAP})\\p{Ll}{2,}${GAP}`
		),
		otherUnit: sticky(`${GAP}(?:${oneOf(lexicon.otherUnit)})${WORD_END}`),
		hedgeFamilies: hedges,
		hedgeLastWords: new Set(
			[...wordHedges, ...lexicon.asides, ...lexicon.hedgeArticles].map(
				(phrase) => phrase.split(' ').at(-1) ?? phrase
			)
		),
		sign: sticky(`[-−+](?=[\\d.])|(?:${oneOf(lexicon.minus.words)})${GAP}`),
		notQuantities: skipPattern(lexicon),
		ordinalEnding: sticky(`(?:${oneOf(lexicon.ordinalEndings)})${WORD_END}`),
		clockAfter: sticky(`${SPACE}*(?:${oneOf(lexicon.clock)})${WORD_END}`)
	};
}

function powerWords({ powerWords: words, minus }: Lexicon): string {
	return words.length === 0
		? '(?!)'
		: `${GAP}(?:${oneOf(words)})${GAP}(?<said>(?:(?:[-−]|(?:${oneOf(minus.words)})${GAP}))?\\d{1,3})`;
}

function rangeBefore(words: readonly string[], { range }: Lexicon): RegExp {
	return before(`${WORD_START}(?:${oneOf(words)})${GAP}(?:(?:${oneOf(range.articles)})${GAP})?`);
}

/**
 * One pattern where the point is the decimal mark. Where it is the comma, a point that can't stand between groups of
 * three is read as a decimal mark all the same, as in “13.8” or “13.787(20)”, and so is one after comma groups.
 */
function numeralPatterns({ numerals: { decimal, groups } }: Lexicon): RegExp[] {
	const group = `[${escape(groups)}]`;
	const tail = `(?:e(?<exponent>[+-]?\\d{1,3})${WORD_END})?(?<vulgar>${VULGAR})?`;
	const mark = escape(decimal);
	const own = sticky(
		`(?<whole>\\d{1,3}(?:${group}\\d{3})+(?!\\d)|\\d{1,3}(?:${GROUP_SPACE}\\d{3})+(?!\\d)|\\d+|(?=\\.\\d))` +
			`(?<decimals>${mark}\\d+(?:[\\u00a0\\u202f\\u2009]\\d{1,3}(?!\\d))*)?${tail}`
	);
	if (decimal === '.') return [own];
	const foreign = sticky(
		`(?![1-9]\\d{0,2}(?:\\.\\d{3})+(?![\\d(]))(?<whole>\\d{1,3}(?:,\\d{3})+(?=\\.\\d)|\\d+)(?<decimals>\\.\\d+)(?!\\.?\\d)${tail}`
	);
	return [foreign, own];
}
