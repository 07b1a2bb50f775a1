/**
 * What a screen reader says for printed copy: signs, symbols and exponents in words. Print keeps its own form; this one
 * goes where nobody looks. Numbers past twenty keep their digits, which every voice can read.
 */
import { units } from '../physics/units/units.ts';
import type { Language } from './language.ts';
import { printWordsOf, type PrintWords } from './languages/print-words.ts';

const SPACE = '[\\s\\u00a0\\u202f]';
const NUMERAL = '\\d{1,3}(?:\\u202f\\d{3})+(?:[.,]\\d+)?|\\d+(?:[.,]\\d+)?';
const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const LOWERED = '₀₁₂₃₄₅₆₇₈₉';
/** Whole numbers up to here are said as words. */
const SPELT = 20;

/** Symbols that words of running text would be taken for. */
const NOT_SAID = ['', 'a', 'u', 'd', 'same', 'times', 'foe'];

const symbols = units
	.flatMap(({ symbol, symbols: others }) =>
		[symbol, ...others].map((one) => [one, symbol] as const)
	)
	.filter(([written, symbol]) => !NOT_SAID.includes(written) && !NOT_SAID.includes(symbol));
const symbolOf = new Map(symbols);

const escape = (text: string) => text.replace(/[.*+?^${}()|[\]\\/]/g, '\\$&');
const SYMBOL = [...symbolOf.keys()]
	.sort((a, b) => b.length - a.length)
	.map(escape)
	.join('|');

const QUANTITY = new RegExp(
	`(?<![\\p{L}\\p{N}.,])(?:(?<sign>[≈~<>≤≥])${SPACE}*)?(?<low>[−-]?(?:${NUMERAL}))` +
		`(?:–(?<high>−?(?:${NUMERAL})))?` +
		`(?:\\((?<brackets>\\d{1,3})\\)|${SPACE}*±${SPACE}*(?<spread>${NUMERAL}))?` +
		`(?:(?<raised>⁻?[${RAISED}]+)|${SPACE}*[×·]${SPACE}*10(?<power>⁻?[${RAISED}]+))?` +
		`(?:${SPACE}*(?<unit>${SYMBOL})(?![\\p{L}\\p{N}⁻²³]))?(?![\\p{L}\\p{N}]|-\\p{L})`,
	'gu'
);

/**
 * Printed text as it is said: “−19 °C” is “minus nineteen degrees Celsius”.
 * @throws {RangeError} when nothing has loaded the language.
 */
export function spokenForm(text: string, language: Language): string {
	const words = printWordsOf(language);
	return text
		.replace(QUANTITY, (...found: unknown[]) =>
			sayQuantity(words, found.at(-1) as Record<string, string | undefined>)
		)
		.replace(new RegExp(`(?<=\\p{L})[${LOWERED}]`, 'gu'), (sign) =>
			sign === '₀' ? ` ${words.spoken.nought}` : ` ${LOWERED.indexOf(sign)}`
		)
		.replace(/\u00a0/g, ' ');
}

function sayQuantity(words: PrintWords, parts: Record<string, string | undefined>): string {
	const { spoken } = words;
	const { sign, low = '', high, brackets, spread, raised, power, unit } = parts;
	const number = raised
		? `${sayNumber(words, low)} ${spoken.power} ${sayPower(words, raised)}`
		: sayNumber(words, low);
	const said = [
		sign ? spoken.signs[sign] : '',
		number,
		high ? `${spoken.to} ${sayNumber(words, high)}` : '',
		power ? `${spoken.timesTen} ${spoken.power} ${sayPower(words, power)}` : '',
		unit ? sayUnit(words, unit, high ?? low, power !== undefined || raised !== undefined) : ''
	];
	const width = spread ?? (brackets && asWritten(low, brackets));
	const tail = width ? `, ${spoken.giveOrTake} ${sayNumber(words, width)}` : '';
	return said.filter(Boolean).join(' ') + tail;
}

function sayNumber({ spoken }: PrintWords, written: string): string {
	const negative = /^[−-]/.test(written);
	const digits = written.replace(/^[−-]/, '').replace(/\u202f/g, '');
	const value = Number(digits);
	const isSpelt = /^\d+$/.test(digits) && value >= 2 && value <= SPELT;
	const said = isSpelt ? spoken.cardinal(value) : digits;
	return negative ? `${spoken.minus} ${said}` : said;
}

function sayPower({ spoken }: PrintWords, raised: string): string {
	const negative = raised.startsWith('⁻');
	const value = Number([...raised.replace('⁻', '')].map((sign) => RAISED.indexOf(sign)).join(''));
	const said = value >= 2 && value < 100 ? spoken.cardinal(value) : String(value);
	return negative ? `${spoken.minus} ${said}` : said;
}

function sayUnit(words: PrintWords, written: string, numeral: string, isMany: boolean): string {
	const symbol = symbolOf.get(written) ?? written;
	const [one, many] = words.spoken.units[symbol] ?? words.units(symbol) ?? [written, written];
	return !isMany && /^[−-]?1$/.test(numeral) ? one : many;
}

/** “(20)” after “13.787” stands for 0.020: its digits are the last ones. */
function asWritten(numeral: string, brackets: string): string {
	const mark = /[.,]/.exec(numeral)?.[0];
	if (!mark) return brackets;
	const places = numeral.length - numeral.indexOf(mark) - 1;
	const digits = brackets.padStart(places + 1, '0');
	return `${digits.slice(0, -places)}${mark}${digits.slice(-places)}`;
}
