/** Fractions in words and signs: “half a kelvin”, “two-thirds of a million years”, “una décima de segundo”, “⅓”. */
import { LOOK_BACK } from './hedge-before.ts';
import { decimalText, type NumberRead } from './number-read.ts';
import { readNumberWord, withScale } from './number-words.ts';
import { VULGAR_FRACTIONS, type Patterns } from './patterns.ts';
import { GAP, readAt, sticky, wordAt } from './text-patterns.ts';
import { readUnitSymbol } from './unit-read.ts';

const ANY_GAP = sticky(GAP);
/** Between what is counted and its part: “a third”, “two-thirds”. */
const JOINT = sticky(`-|${GAP}`);

export function vulgarAt(text: string, at: number): NumberRead | null {
	const parts = VULGAR_FRACTIONS[text[at] ?? ''];
	return parts ? fractionRead(at, at + 1, parts) : null;
}

export function readSlashFraction(
	{ slashFraction }: Patterns,
	text: string,
	at: number
): NumberRead | null {
	const match = readAt(slashFraction, text, at);
	const [over, under] = [Number(match?.groups?.over), Number(match?.groups?.under)];
	return match && over < under ? fractionRead(at, at + match[0].length, [over, under]) : null;
}

export function readFraction(patterns: Patterns, text: string, at: number): NumberRead | null {
	return phraseFraction(patterns, text, at) ?? partFraction(patterns, text, at);
}

/** “half”, “la mitad”, “eine halbe”: the phrase names both parts. */
function phraseFraction(patterns: Patterns, text: string, at: number): NumberRead | null {
	const found = patterns.fractions.read(text, at);
	if (!found || /^-\p{L}/u.test(text.slice(found.end, found.end + 2))) return null;
	const { beforeUnit, needs } = patterns.lexicon.fractions;
	const read = fractionRead(at, found.end, found.value);
	const needed = needs[found.phrase];
	if (needed) {
		const gap = readAt(ANY_GAP, text, found.end);
		return gap && needed.includes(wordAt(text, found.end + gap[0].length)) ? read : null;
	}
	const whole = readWhole(patterns, text, read, true);
	if (whole) return whole;
	return beforeUnit.includes(found.phrase) && !unitFollows(patterns, text, found.end) ? null : read;
}

/** “a third”, “two-thirds”, “a four-hundredth”, “zwei Drittel”, “tres décimas”. */
function partFraction(patterns: Patterns, text: string, at: number): NumberRead | null {
	const { articles, lexicon } = patterns;
	const article = articles.read(text, at);
	const word = wordAt(text, at);
	const over = article ? 1 : (lexicon.cardinals[word] ?? lexicon.compound?.(word) ?? 0);
	if (!(over >= 1 && over < 100 && Number.isInteger(over))) return null;
	const joint = readAt(JOINT, text, at + word.length);
	if (!joint) return null;
	const part = readPart(patterns, text, at + word.length + joint[0].length);
	if (!part || /^-\p{L}/u.test(text.slice(part.end, part.end + 2))) return null;
	const read = fractionRead(at, part.end, [over, part.under]);
	const whole = readWhole(patterns, text, read, false);
	if (whole) return whole;
	const { unmistakable } = lexicon.fractions;
	const stands = over > 1 || unmistakable === 'all' || unmistakable.includes(part.phrase);
	if (stands || readAt(patterns.afterFraction, text, read.end)) return read;
	return patterns.hedgeBefore.test(text.slice(Math.max(0, at - LOOK_BACK), at)) ? read : null;
}

/** A denominator, with what multiplies it: “four-hundredth”; in some languages the unit may be its tail. */
function readPart(patterns: Patterns, text: string, at: number) {
	const { denominators, lexicon } = patterns;
	const found = denominators.read(text, at);
	if (found) return { under: found.value, end: found.end, phrase: found.phrase };
	const word = wordAt(text, at);
	const tens =
		lexicon.cardinals[word] ?? lexicon.scales[word] ?? (lexicon.hundred.includes(word) ? 100 : 0);
	const tail =
		tens > 1 && text[at + word.length] === '-'
			? denominators.read(text, at + word.length + 1)
			: null;
	if (tail) return { under: tens * tail.value, end: tail.end, phrase: tail.phrase };
	const compound = lexicon.fractions.compound?.(word);
	if (compound) return { under: compound, end: at + word.length, phrase: word };
	return lexicon.fractions.joinsUnit ? partOfUnit(patterns, text, at, word) : null;
}

/** “Zehntelsekunde”: the denominator ends where the unit begins. */
function partOfUnit({ lexicon, units }: Patterns, text: string, at: number, word: string) {
	const phrase = Object.keys(lexicon.fractions.denominators).find(
		(name) => word.startsWith(name) && units.read(text, at + name.length)
	);
	const under = phrase && lexicon.fractions.denominators[phrase];
	return phrase && under ? { under, end: at + phrase.length, phrase } : null;
}

/** What the fraction is of, where that is a number or one of something: its scale joins the fraction's. */
function readWhole(
	patterns: Patterns,
	text: string,
	read: NumberRead,
	isPhrase: boolean
): NumberRead | null {
	const of = readAt(patterns.of, text, read.end);
	const scaled = withScale(patterns, text, read);
	if (scaled.end !== read.end) return scaled;
	if (!of && !isPhrase) return null;
	const from = read.end + (of?.[0].length ?? 0);
	const gap = readAt(ANY_GAP, text, from);
	if (!gap) return null;
	const at = from + gap[0].length;
	const [over, under] = read.fraction ?? [1, 1];
	const number = readWholeNumeral(patterns, text, at) ?? readNumberWord(patterns, text, at);
	if (number && Number(number.numeral) && Number.isInteger(Number(number.numeral))) {
		return {
			...fractionRead(read.start, number.end, [over * Number(number.numeral), under]),
			scale: number.scale
		};
	}
	const article = patterns.articles.read(text, at);
	const end = article?.end ?? from;
	return (article ?? of) && unitFollows(patterns, text, end)
		? fractionRead(read.start, end, [over, under])
		: null;
}

function readWholeNumeral(patterns: Patterns, text: string, at: number): NumberRead | null {
	const match = patterns.numerals
		.map((pattern) => readAt(pattern, text, at))
		.find((found) => found && found[0] !== '');
	if (!match || match.groups?.decimals || match.groups?.exponent) return null;
	const numeral = (match.groups?.whole ?? '').replace(/\D/g, '');
	const end = at + match[0].length;
	return withScale(patterns, text, { form: 'numeral', start: at, end, numeral, scale: 1 });
}

function unitFollows(patterns: Patterns, text: string, at: number): boolean {
	const gap = readAt(ANY_GAP, text, at);
	if (!gap) return false;
	const place = at + gap[0].length;
	return (
		patterns.units.read(text, place) !== null ||
		patterns.scales.read(text, place) !== null ||
		readUnitSymbol(patterns, text, at) !== null
	);
}

export function fractionRead(
	start: number,
	end: number,
	fraction: readonly [number, number]
): NumberRead {
	return {
		form: 'fraction',
		start,
		end,
		numeral: decimalText(Number((fraction[0] / fraction[1]).toPrecision(3))),
		scale: 1,
		fraction
	};
}
