/** A number with its sign and the unit that follows it. */
import { unitOf } from '../physics/units/units.ts';
import { plainPhrase } from './hedges.ts';
import { readAt, type NumberRead } from './numbers.ts';
import type { Patterns } from './patterns.ts';

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
	const of = number.form === 'order-word' ? readAt(patterns.of, text, number.end) : null;
	const unit = readUnit(patterns, text, number.end + (of?.[0].length ?? 0));
	const before = text.slice(Math.max(floor, number.start - 12), number.start);
	const minus = patterns.minusBefore.exec(before);
	const sign = minus ? minus[0].replace(/^[\s(~≈<>≥≤“"–](?=[-−])/u, '') : '';
	return {
		number,
		negative: Boolean(minus),
		unit: unit?.symbol ?? '',
		unitWord: unit?.word ?? '',
		start: number.start - sign.length,
		end: unit?.end ?? number.end
	};
}

/** A unit right after the number, by name or by symbol, whichever is longer. */
function readUnit(patterns: Patterns, text: string, at: number) {
	const named = readAt(patterns.unitName, text, at);
	const name = named?.groups?.name;
	const byName =
		named && name
			? { symbol: patterns.unitByName.get(plainPhrase(name)), length: named[0].length, word: name }
			: null;
	const bySymbol = readSymbol(patterns, text, at);
	const best = (byName?.length ?? 0) >= (bySymbol?.length ?? 0) ? byName : bySymbol;
	return best?.symbol === undefined
		? null
		: { symbol: best.symbol, word: best.word, end: at + best.length };
}

function readSymbol(patterns: Patterns, text: string, at: number) {
	const match = readAt(patterns.unitSymbol, text, at);
	const { gap = '', symbol = '' } = match?.groups ?? {};
	if (!match) return null;
	const isWordLike = /\p{L}$/u.test(symbol);
	if (isWordLike && /^[\p{L}\p{N}]/u.test(text.slice(at + match[0].length))) return null;
	// “5K” and “1990s” are more often a name than a quantity; “5km” is a slip for “5 km”.
	if (gap === '' && /^\p{L}$/u.test(symbol)) return null;
	return { symbol: unitOf(symbol)?.symbol, length: match[0].length, word: symbol };
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
