/**
 * A stated quantity: the hedge, the numeral as written, the scale word and the unit. The fact-check weighs it and
 * the widget prints it, so what is printed is what is weighed. English; other languages join in their own file.
 */
import type { QuantityKind } from '../physics/units/quantities.ts';
import { convertQuantity, unitOf } from '../physics/units/units.ts';

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
	/** Significant figures printed. */
	figures: number;
	hedge: 'none' | 'about';
}

const NO_BREAK = '\u00a0';
const GROUP = '\u202f';
const MINUS = '\u2212';

/** The stated value in its unit: numeral times scale. */
export function statedValue(stated: Stated): number {
	const [over, under] = stated.fraction ?? [Number(stated.numeral), 1];
	return (over / under) * stated.scale;
}

/**
 * States a reading by a live format: converts first, rounds once, last. Rounds half to even on the shortest decimal
 * string that round-trips the double (ISO 80000-1:2009 annex B rule A), as the number rules ask.
 */
export function stateReading(
	value: number,
	unit: string,
	format: LiveFormat,
	quantity: QuantityKind = 'number'
): Stated {
	return {
		hedge: format.hedge === 'about' ? 'around' : 'bare',
		hedgeWord: format.hedge === 'about' ? 'about' : '',
		numeral: roundToFigures(convertQuantity(value, unit, format.unit, quantity), format.figures),
		scale: 1,
		unit: format.unit
	};
}

/** “about 68 megahertz”: numeral and unit keep together, the minus is a real one, long numerals are grouped. */
export function printStated(stated: Stated): string {
	return [stated.hedgeWord, printNumeral(stated.numeral) + printAfterNumeral(stated)]
		.filter(Boolean)
		.join(' ');
}

/** Scale word and unit with the space before them: what follows the numeral. '' for a plain number. */
export function printAfterNumeral({ numeral, scale, unit, unitWord: written }: Stated): string {
	const words = written ?? unitWord(unit, numeral);
	const tail = [scaleWord(scale), words].filter(Boolean).join(' ');
	return tail && (CLOSED_UP.test(tail) ? tail : NO_BREAK + tail);
}

/** English closes up the per cent sign and the signs of angle, and no other unit. */
const CLOSED_UP = /^(?:%|[°′″]$)/u;

function scaleWord(scale: number): string {
	if (scale === 1) return '';
	return SCALE_WORDS[scale] ?? `× 10${superscript(Math.round(Math.log10(scale)))}`;
}

function superscript(power: number): string {
	return [...String(power)].map((sign) => SUPERSCRIPTS[sign] ?? sign).join('');
}

const SUPERSCRIPTS: Record<string, string> = Object.fromEntries(
	[...'0123456789-'].map((sign, index) => [sign, [...'⁰¹²³⁴⁵⁶⁷⁸⁹⁻'][index] ?? sign])
);

export function printNumeral(numeral: string): string {
	const [, sign, whole, rest] = /^(-?)(\d+)(.*)$/.exec(numeral) ?? ['', '', numeral, ''];
	const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, GROUP) : whole;
	return (sign && Number(numeral) !== 0 ? MINUS : '') + grouped + rest;
}

function unitWord(symbol: string, numeral: string): string {
	const unit = unitOf(symbol);
	if (!unit) return symbol;
	return Math.abs(Number(numeral)) === 1 ? unit.words.one : unit.words.many;
}

const SCALE_WORDS: Record<number, string> = {
	1e3: 'thousand',
	1e6: 'million',
	1e9: 'billion',
	1e12: 'trillion'
};

/** Decimal digits of a finite double without exponent: “0.00012”, “1420405751.768”. */
export function plainDecimal(value: number): string {
	const text = String(value);
	const [, sign = '', whole = '', fraction = '', exponent] =
		/^(-?)(\d+)(?:\.(\d+))?(?:e([+-]\d+))?$/.exec(text) ?? [];
	if (exponent === undefined) return text;
	const digits = whole + fraction;
	const point = whole.length + Number(exponent);
	if (point <= 0) return `${sign}0.${'0'.repeat(-point)}${digits}`;
	if (point >= digits.length) return sign + digits + '0'.repeat(point - digits.length);
	return `${sign}${digits.slice(0, point)}.${digits.slice(point)}`;
}

/** Rounds to `figures` significant figures, half to even, in decimal; trailing zeros after the point are kept. */
export function roundToFigures(value: number, figures: number): string {
	if (value === 0) return '0';
	const decimal = plainDecimal(Math.abs(value));
	const [whole = '', fraction = ''] = decimal.split('.');
	const digits = (whole + fraction).replace(/^0+/, '');
	const magnitude = whole === '0' ? -(fraction.match(/^0*/)?.[0].length ?? 0) : whole.length;
	return (value < 0 ? '-' : '') + roundDigits(digits, magnitude, figures);
}

/** `digits` × 10^(magnitude − digits.length), rounded to `figures` digits. */
function roundDigits(digits: string, magnitude: number, figures: number): string {
	let kept = BigInt(digits.slice(0, figures).padEnd(figures, '0'));
	const rest = digits.slice(figures).replace(/0+$/, '');
	const half = rest === '5';
	if ((half && kept % 2n === 1n) || (!half && rest > '5')) kept += 1n;
	let text = kept.toString();
	let place = magnitude - figures; // power of ten of the last kept digit
	if (text.length > figures) {
		text = text.slice(0, figures);
		place += 1;
	}
	if (place >= 0) return text + '0'.repeat(place);
	const padded = text.padStart(-place + 1, '0');
	return `${padded.slice(0, place)}.${padded.slice(place)}`;
}
