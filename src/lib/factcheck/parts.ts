/** A number with its sign and the unit that follows it. */
import { addParts, type NumberRead } from './number-read.ts';
import type { Patterns } from './patterns.ts';
import { readAt } from './text-patterns.ts';
import { readUnitName, readUnitSymbol } from './unit-read.ts';

export interface Part {
	number: NumberRead;
	negative: boolean;
	/** A symbol of the unit table; '' for none. */
	unit: string;
	/** The unit as written. */
	unitWord: string;
	/** From the sign to the unit. */
	start: number;
	end: number;
}

export function withUnit(
	patterns: Patterns,
	text: string,
	number: NumberRead,
	floor: number
): Part {
	const unit = number.unit === undefined ? readUnit(patterns, text, number) : null;
	const half = unit && halfAfter(patterns, text, number, unit.end);
	const before = text.slice(Math.max(floor, number.start - 12), number.start);
	const minus = patterns.minusBefore.exec(before);
	const sign = minus ? minus[0].replace(/^[\s\u00a0\u202f(~≈<>≥≤“"–](?=[-−])/u, '') : '';
	return {
		number: half ? half.number : number,
		negative: Boolean(minus),
		unit: number.unit ?? unit?.symbol ?? '',
		unitWord: unit?.word ?? '',
		start: number.start - sign.length,
		end: half?.end ?? unit?.end ?? number.end
	};
}

/** “a year and a half”: the half stands after the unit. */
function halfAfter({ andAHalf }: Patterns, text: string, number: NumberRead, at: number) {
	const isWhole = /^\d+$/.test(number.numeral) && number.scale === 1;
	const match =
		isWhole && ['word', 'article', 'numeral'].includes(number.form) && readAt(andAHalf, text, at);
	if (!match) return null;
	const form = number.form === 'article' ? 'word' : number.form;
	return {
		number: { ...number, form, numeral: addParts(number.numeral, [1, 2]) },
		end: at + match[0].length
	};
}

/** A unit right after the number, by name or by symbol, whichever is longer. */
function readUnit(patterns: Patterns, text: string, number: NumberRead) {
	const { end: at, form } = number;
	const between = betweenUnit(patterns, text, number);
	const byName =
		readUnitName(patterns, text, at + between) ??
		(between ? readUnitName(patterns, text, at) : null);
	const bySymbol = readUnitSymbol(patterns, text, at + between);
	const best = (byName?.end ?? 0) >= (bySymbol?.end ?? 0) ? byName : bySymbol;
	if (best?.symbol === undefined) return null;
	// After a number word a few small letters are rather a word than a symbol: “drei mag er”.
	const isSymbol = best === bySymbol && best !== byName;
	return isSymbol && form === 'word' && /^\p{Ll}{3,}$/u.test(best.word) ? null : best;
}

/** The length of “of” before what is counted, where the number may have one. */
function betweenUnit({ of, afterScale }: Patterns, text: string, number: NumberRead): number {
	const { form, scale, numeral } = number;
	if (form === 'order-word' || form === 'small-word' || scale === 12) {
		return readAt(of, text, number.end)?.[0].length ?? 0;
	}
	const isLarge = scale >= 1e6 || (numeral.length > 6 && /^\d+0{6}$/.test(numeral));
	return isLarge ? (readAt(afterScale, text, number.end)?.[0].length ?? 0) : 0;
}

/** The number stands by itself: not inside a name, an ordinal or a longer token. */
export function stands(patterns: Patterns, text: string, part: Part): boolean {
	const { start } = part.number;
	const isDigits = /\d/.test(text[start] ?? '');
	const before = text.slice(Math.max(0, start - 2), start);
	if (isDigits && /[\p{L}\p{N}_]$|[\p{L}\p{N}][-–/_.]$|\d,$/u.test(before)) return false;
	return endsCleanly(patterns, text, part);
}

export function endsCleanly(patterns: Patterns, text: string, { number, end }: Part): boolean {
	if (end !== number.end) return true;
	if (readAt(patterns.ordinalEnding, text, end)) return false;
	return !/^(?:[\p{L}_]|[-/]\p{L})/u.test(text.slice(end, end + 3));
}

/** In the part's unit; null where the words name no one number. */
export function valueOf({ number, negative }: Part): number | null {
	if (number.numeral === '') return number.form === 'order-word' ? number.scale : null;
	const [over, under] = number.fraction ?? [Number(number.numeral), 1];
	return Number((((negative ? -1 : 1) * over * number.scale) / under).toPrecision(15));
}
