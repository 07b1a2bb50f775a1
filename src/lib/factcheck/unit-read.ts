/** A unit at a place in a text, by name or by symbol, with the gap before it. */
import { unitOf } from '../physics/units/units.ts';
import type { Patterns } from './patterns.ts';
import { GAP, readAt, sticky } from './text-patterns.ts';

export interface UnitRead {
	/** Of the unit table. */
	symbol: string;
	end: number;
	/** As written. */
	word: string;
}

const NAME_GAP = sticky(`${GAP}|-|`);

export function readUnitName(
	{ units, lexicon, otherUnit }: Patterns,
	text: string,
	at: number
): UnitRead | null {
	const gap = readAt(NAME_GAP, text, at)?.[0] ?? '';
	if (gap === '' && !lexicon.fractions.joinsUnit) return null;
	const found = units.read(text, at + gap.length);
	if (!found || readAt(otherUnit, text, found.end)) return null;
	const word = text.slice(at + gap.length, found.end);
	return { symbol: found.value, end: found.end, word };
}

export function readUnitSymbol(patterns: Patterns, text: string, at: number): UnitRead | null {
	const match = readAt(patterns.unitSymbol, text, at);
	const { gap = '', symbol = '' } = match?.groups ?? {};
	if (!match) return null;
	const isWordLike = /\p{L}$/u.test(symbol);
	if (isWordLike && /^[\p{L}\p{N}]/u.test(text.slice(at + match[0].length))) return null;
	// “5K” and “1990s” are more often a name than a quantity; “5km” is a slip for “5 km”.
	if (gap === '' && /^\p{L}$/u.test(symbol)) return null;
	const unit = unitOf(symbol);
	return unit ? { symbol: unit.symbol, end: at + match[0].length, word: symbol } : null;
}
