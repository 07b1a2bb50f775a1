/** A lexicon and the unit table, compiled once into patterns that read forward from one place in a text. */
import { units } from '../physics/units/units.ts';
import type { HedgeFamily } from '../widget/stated.ts';
import { hedgeWords, plainPhrase } from './hedges.ts';
import type { Lexicon } from './lexicon/lexicon.ts';

/** White space that may stand between the words of one quantity, the narrow and no-break ones among it. */
const GAP = '[\\s\\u00a0\\u202f\\u2009]+';
const GROUP_SPACE = '[ \\u00a0\\u202f\\u2009]';
const WORD_END = '(?![\\p{L}\\p{N}])';
const WORD_START = '(?<![\\p{L}\\p{N}])';

export const VULGAR_FRACTIONS: Readonly<Record<string, readonly [number, number]>> = {
	'½': [1, 2],
	'⅓': [1, 3],
	'⅔': [2, 3],
	'¼': [1, 4],
	'¾': [3, 4],
	'⅕': [1, 5],
	'⅛': [1, 8],
	'⅒': [1, 10]
};
const VULGAR = `[${Object.keys(VULGAR_FRACTIONS).join('')}]`;

export interface Patterns {
	lexicon: Lexicon;
	/** Where a quantity may begin. */
	trigger: RegExp;
	/** A numeral: whole part, decimals, exponent, vulgar fraction. */
	numeral: RegExp;
	slashFraction: RegExp;
	/** “× 10⁻¹⁸” after a numeral, and “10⁻¹⁸” alone. */
	timesPower: RegExp;
	barePower: RegExp;
	/** “(20)” or “± 0.020”. */
	uncertainty: RegExp;
	/** A number word below a thousand, with its parts named. */
	numberWord: RegExp;
	andAHalf: RegExp;
	/** Between the thousands and the rest: “two thousand and five”. */
	remainder: RegExp;
	/** “hundred” after a small word: “several hundred”. */
	hundredAfter: RegExp;
	scale: RegExp;
	article: RegExp;
	/** “half”, “a third”, “two-thirds”, “a four-hundredth”. */
	fraction: RegExp;
	afterFraction: RegExp;
	of: RegExp;
	multiple: RegExp;
	foldSuffix: RegExp;
	orderWord: RegExp;
	smallWord: RegExp;
	unitName: RegExp;
	unitSymbol: RegExp;
	unitByName: ReadonlyMap<string, string>;
	rangeDash: RegExp;
	rangeTo: RegExp;
	rangeAnd: RegExp;
	/** Read backwards from the end of a slice. */
	hedgeBefore: RegExp;
	hedgeFamilies: ReadonlyMap<string, HedgeFamily>;
	minusBefore: RegExp;
	/** The sign of a range's far end. */
	sign: RegExp;
	betweenBefore: RegExp;
	fromBefore: RegExp;
	halfNounBefore: RegExp;
	quantityWord: RegExp;
	/** Dates, times, versions and list numbers. */
	notQuantities: RegExp;
	ordinalEnding: RegExp;
	yearBefore: RegExp;
	/** Before a year only where nothing follows that could be counted. */
	yearPerhapsBefore: RegExp;
	numberedBefore: RegExp;
}

function escape(text: string): string {
	return text.replace(/[.*+?^${}()|[\]\\/]/g, '\\$&');
}

/** Alternatives, the longest first, with any white space between their words. */
function oneOf(words: Iterable<string>): string {
	return [...words]
		.sort((a, b) => b.length - a.length)
		.map((word) => escape(word).replace(/ /g, GAP))
		.join('|');
}

const sticky = (source: string, flags = 'iuy') => new RegExp(source, flags);

export function compile(lexicon: Lexicon): Patterns {
	const names = unitNames(lexicon);
	const ones = oneOf(Object.keys(lexicon.ones));
	const tens = oneOf(Object.keys(lexicon.tens));
	const digits = oneOf(
		Object.keys(lexicon.ones).filter(
			(word) => (lexicon.ones[word] ?? 0) % 10 === lexicon.ones[word] && lexicon.ones[word] !== 0
		)
	);
	const belowHundred = `(?:(?:${tens})(?:[- ](?:${digits})${WORD_END})?|${ones})`;
	const hundred = oneOf(lexicon.hundred);
	const and = oneOf(lexicon.and);
	const article = oneOf(lexicon.articles);
	const denominators = oneOf(Object.keys(lexicon.denominators));
	const scales = oneOf(Object.keys(lexicon.scales));
	const orders = oneOf(Object.keys(lexicon.orderWords));
	const months = oneOf(lexicon.months);
	const ordinals = oneOf(lexicon.ordinalEndings);
	const hedges = hedgeWords(lexicon);
	const wordHedges = [...hedges.keys()].filter((word) => /\p{L}/u.test(word));
	const signHedges = [...hedges.keys()].filter((word) => !/\p{L}/u.test(word));
	const of = `${GAP}(?:${oneOf(lexicon.of)})`;
	const beginnings = oneOf([
		...Object.keys(lexicon.ones),
		...Object.keys(lexicon.tens),
		...lexicon.articles,
		lexicon.half,
		...lexicon.multiples.map(({ word }) => word),
		...Object.keys(lexicon.orderWords),
		...lexicon.smallWords.map(({ word }) => word.split(' ')[0] ?? word)
	]);

	return {
		lexicon,
		trigger: new RegExp(
			`${WORD_START}(?:${beginnings})(?=${WORD_END}|${lexicon.fold}${WORD_END})|\\d|\\.(?=\\d)|${VULGAR}`,
			'giu'
		),
		numeral: sticky(
			`(?<whole>\\d{1,3}(?:,\\d{3})+(?!\\d)|\\d{1,3}(?:${GROUP_SPACE}\\d{3})+(?!\\d)|\\d+|(?=\\.\\d))` +
				`(?<decimals>\\.\\d+(?:[\\u00a0\\u202f\\u2009]\\d{1,3}(?!\\d))*)?` +
				`(?:e(?<exponent>[+-]?\\d{1,3})${WORD_END})?(?<vulgar>${VULGAR})?`
		),
		slashFraction: sticky('(?<over>\\d{1,2})\\/(?<under>\\d{1,3})(?![\\d\\/.])'),
		timesPower: sticky(
			'[\\s\\u00a0\\u202f\\u2009]*(?:[×x·]|times(?=[\\s\\u00a0]))[\\s\\u00a0\\u202f\\u2009]*10(?:\\^(?<caret>[-−]?\\d{1,3})|(?<raised>⁻?[⁰¹²³⁴-⁹]{1,3}))'
		),
		barePower: sticky('10(?:\\^(?<caret>[-−]?\\d{1,3})|(?<raised>⁻?[⁰¹²³⁴-⁹]{1,3}))'),
		uncertainty: sticky(
			`\\(\\d{1,3}\\)|${GROUP_SPACE}*(?:±|\\+\\/[-−])${GROUP_SPACE}*\\d+(?:\\.\\d+)?`
		),
		numberWord: sticky(
			`(?:(?:(?<hundreds>${belowHundred})|${article})${GAP}(?:${hundred})${WORD_END}` +
				`(?:${GAP}(?:${and})${GAP}(?<rest>${belowHundred})${WORD_END})?|(?<below>${belowHundred})(?:${WORD_END}|(?=${lexicon.fold}${WORD_END})))`
		),
		andAHalf: sticky(`${GAP}(?:${and})${GAP}(?:${article})${GAP}${lexicon.half}${WORD_END}`),
		remainder: sticky(`(?:${GAP}(?:${and}))?${GAP}`),
		hundredAfter: sticky(`${GAP}(?:${hundred})${WORD_END}`),
		scale: sticky(`(?:${GAP}|-)?(?<scale>${scales})${WORD_END}`),
		article: sticky(`(?:${article})${WORD_END}`),
		fraction: sticky(
			`(?:(?<half>${lexicon.half})${WORD_END}(?!-)|` +
				`(?:(?<over>${belowHundred})|${article})[- \\u00a0](?:(?<tens>${belowHundred}|${hundred})-)?(?<under>${denominators})${WORD_END}(?!-))`
		),
		afterFraction: sticky(
			`[\\s\\u00a0]*(?:$|[.,;:!?)–—”"’]|(?:${oneOf(lexicon.afterFraction)})${WORD_END})`
		),
		of: sticky(`${of}${WORD_END}`),
		multiple: sticky(
			`(?:${lexicon.multiples
				.map(
					({ word, needs }) =>
						escape(word) + WORD_END + (needs ? `(?=${GAP}(?:${oneOf(needs)})${WORD_END})` : '')
				)
				.join('|')})`
		),
		foldSuffix: sticky(`-?${lexicon.fold}${WORD_END}`),
		orderWord: sticky(
			`(?<first>${orders})(?:${of}${GAP}(?<second>${orders}))?(?=${of}${WORD_END})`
		),
		smallWord: sticky(`(?:${oneOf(lexicon.smallWords.map(({ word }) => word))})${WORD_END}`),
		unitName: sticky(`(?:${GAP}|-)(?<name>${oneOf(names.keys())})${WORD_END}`),
		unitSymbol: sticky(
			`(?<gap>${GROUP_SPACE}|-|)(?<symbol>${oneOf(unitSymbols(lexicon))})(?![\\p{N}⁻²³^]|\\/\\p{L})`,
			'uy'
		),
		unitByName: names,
		rangeDash: sticky('[\\s\\u00a0]*[–-][\\s\\u00a0]*(?=[\\d−.])'),
		rangeTo: sticky(`${GAP}(?:${oneOf(lexicon.range.to)})${GAP}`),
		rangeAnd: sticky(`${GAP}(?:${oneOf(lexicon.range.and)})${GAP}`),
		hedgeBefore: new RegExp(
			`(?:${WORD_START}(?<word>${oneOf(wordHedges)})(?:,?${GAP}(?:${oneOf(lexicon.asides)}),?)?${GAP}` +
				`|(?<sign>${oneOf(signHedges)})[\\s\\u00a0\\u202f]*)$`,
			'iu'
		),
		hedgeFamilies: hedges,
		minusBefore: new RegExp(
			`(?:(?:^|[\\s(~≈<>≥≤“"–])[-−]|${WORD_START}(?:${oneOf(lexicon.minus)})${GAP})$`,
			'iu'
		),
		sign: sticky(`[-−+](?=[\\d.])|(?:${oneOf(lexicon.minus)})${GAP}`),
		betweenBefore: new RegExp(`${WORD_START}(?:${oneOf(lexicon.range.between)})${GAP}$`, 'iu'),
		fromBefore: new RegExp(`${WORD_START}(?:${oneOf(lexicon.range.from)})${GAP}$`, 'iu'),
		halfNounBefore: new RegExp(`${WORD_START}(?:${oneOf(lexicon.beforeHalfNoun)})${GAP}$`, 'iu'),
		quantityWord: sticky(`${GAP}(?<word>${oneOf(Object.keys(lexicon.quantities))})${WORD_END}`),
		notQuantities: new RegExp(
			[
				`(?<!\\d)(?:${[
					'\\d{4}-\\d{2}-\\d{2}',
					'\\d{1,2}\\/\\d{1,2}\\/\\d{2,4}',
					'\\d{1,9}:\\d+(?::\\d+)?',
					'\\d{1,9}(?:\\.\\d+){2,}',
					`\\d{1,2}(?:${ordinals})?${GAP}(?:${months})${WORD_END}(?:,?${GAP}\\d{4})?`,
					`\\d{1,9}${GAP}(?:${oneOf(lexicon.eras)})${WORD_END}`,
					`\\d{1,2}(?:\\.\\d{2})?[\\s\\u00a0]?(?:${oneOf(lexicon.clock)})${WORD_END}`
				].join('|')})`,
				`${WORD_START}(?:${months})${GAP}(?:\\d{1,2}(?:${ordinals})?(?!\\d)(?:,?${GAP}\\d{4})?|\\d{4}(?!\\d))`,
				`${WORD_START}(?:${oneOf(lexicon.eras)})${GAP}\\d+`,
				`^\\d{1,2}[.)](?=${GAP}\\p{L})`,
				'\\[\\d+(?:[,–-]\\s?\\d+)*\\]'
			].join('|'),
			'gmu'
		),
		ordinalEnding: sticky(`(?:${ordinals})${WORD_END}`),
		yearBefore: new RegExp(
			`(?:${WORD_START}(?:${oneOf(lexicon.beforeYear)})\\.?,?[\\s\\u00a0]+|\\()$`,
			'iu'
		),
		yearPerhapsBefore: new RegExp(
			`${WORD_START}(?:${oneOf(lexicon.perhapsBeforeYear)})[\\s\\u00a0]+$`,
			'iu'
		),
		numberedBefore: new RegExp(
			`${WORD_START}(?:${oneOf(lexicon.numbered)})\\.?[\\s\\u00a0]+$|[#§][\\s\\u00a0]?$`,
			'iu'
		)
	};
}

/** Every name a unit has in running text, with “per” said in the language's other ways, to the unit's symbol. */
function unitNames(lexicon: Lexicon): Map<string, string> {
	const names = new Map<string, string>();
	for (const { symbol, names: given } of units) {
		for (const name of given) {
			if (!symbol || lexicon.notUnits.includes(name)) continue;
			for (const per of lexicon.per) {
				const said = plainPhrase(name.replace(/ per (?!cent|million)/g, ` ${per} `));
				if (!names.has(said)) names.set(said, symbol);
			}
		}
	}
	return names;
}

function unitSymbols(lexicon: Lexicon): string[] {
	return units
		.flatMap(({ symbol, symbols }) => [symbol, ...symbols])
		.filter(
			(symbol) => symbol && !lexicon.notUnits.includes(symbol) && !/^(?:×|times)$/.test(symbol)
		);
}
