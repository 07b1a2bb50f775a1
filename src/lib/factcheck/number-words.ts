/** Cardinal numbers in words, with their scale: “two and a half billion”, “dos mil quinientos”, “dreiundzwanzig”. */
import { addParts, type NumberRead } from './number-read.ts';
import type { Patterns } from './patterns.ts';
import { readAt, wordAt } from './text-patterns.ts';

interface Below {
	value: number;
	end: number;
}

export function readNumberWord(patterns: Patterns, text: string, at: number): NumberRead | null {
	const lone = loneScale(patterns, text, at);
	const first = lone ? null : (belowThousand(patterns, text, at) ?? oneOfScale(patterns, text, at));
	if (!lone && !first) return null;
	const start: NumberRead = {
		form: 'word',
		start: at,
		end: first?.end ?? at,
		numeral: String(first?.value ?? 1),
		scale: 1
	};
	const whole = lone ?? withScale(patterns, text, withHalf(patterns, text, start));
	return withHalf(patterns, text, withRest(patterns, text, whole));
}

/** “mil años”: a scale word that stands for one of itself. */
function loneScale({ lexicon, scales }: Patterns, text: string, at: number): NumberRead | null {
	const found = scales.read(text, at);
	if (!found || !lexicon.loneScales.includes(found.phrase)) return null;
	return { form: 'word', start: at, end: found.end, numeral: '1', scale: found.value };
}

/** “a million”: an article counts as one before a scale word. */
function oneOfScale(patterns: Patterns, text: string, at: number): Below | null {
	const article = patterns.articles.read(text, at);
	return article && readScale(patterns, text, article.end) ? { value: 1, end: article.end } : null;
}

/** “three hundred and twenty”, “doscientos cuarenta y uno”, “zweihunderteinundvierzig”. */
function belowThousand(patterns: Patterns, text: string, at: number): Below | null {
	const article = patterns.articles.read(text, at);
	const first = article ? { value: 1, end: article.end } : belowHundredAt(patterns, text, at);
	if (!first) return null;
	const hundred = first.value < 100 && readAt(patterns.hundred, text, first.end);
	if (!hundred) return article ? null : joined(patterns, text, first);
	return joined(patterns, text, {
		value: first.value * 100,
		end: first.end + hundred[0].length
	});
}

function belowHundredAt(patterns: Patterns, text: string, at: number): Below | null {
	const value = cardinalAt(patterns, text, at);
	if (value === null) return null;
	const first = { value, end: at + wordAt(text, at).length };
	return value >= 20 && value < 100 ? withOnes(patterns, text, first) : first;
}

function withOnes(patterns: Patterns, text: string, tens: Below): Below {
	if (tens.value % 10 !== 0) return tens;
	const joint = readAt(patterns.tensJoint, text, tens.end);
	const at = tens.end + (joint?.[0].length ?? 0);
	const ones = joint && cardinalAt(patterns, text, at);
	return ones && ones < 10 ? { value: tens.value + ones, end: at + wordAt(text, at).length } : tens;
}

/** Hundreds with what follows them; not where that is another number’s beginning: “between a hundred and two hundred”. */
function joined(patterns: Patterns, text: string, hundreds: Below): Below {
	if (hundreds.value < 100 || hundreds.value % 100 !== 0) return hundreds;
	const joint = readAt(patterns.hundredsJoint, text, hundreds.end);
	const rest = joint && belowHundredAt(patterns, text, hundreds.end + joint[0].length);
	if (!rest || rest.value === 0 || rest.value >= 100) return hundreds;
	if (readAt(patterns.hundred, text, rest.end)) return hundreds;
	return { value: hundreds.value + rest.value, end: rest.end };
}

function cardinalAt({ lexicon }: Patterns, text: string, at: number): number | null {
	const word = wordAt(text, at);
	if (word === '') return null;
	return lexicon.cardinals[word] ?? lexicon.compound?.(word) ?? null;
}

/** “two and a half billion” before the scale word, “dos millones y medio” after it. */
function withHalf(patterns: Patterns, text: string, read: NumberRead): NumberRead {
	if (read.numeral.includes('.')) return read;
	const half = readAt(patterns.andAHalf, text, read.end);
	return half
		? { ...read, numeral: addParts(read.numeral, [1, 2]), end: read.end + half[0].length }
		: read;
}

/** “two thousand five hundred” and “dos millones trescientos mil” are one number each. */
function withRest(patterns: Patterns, text: string, read: NumberRead): NumberRead {
	let sum = read;
	let last = read.scale;
	while (last >= 1000 && !sum.numeral.includes('.')) {
		const joint = readAt(patterns.hundredsJoint, text, sum.end);
		const at = sum.end + (joint?.[0].length ?? 0);
		const rest = joint && (loneScale(patterns, text, at) ?? scaledRest(patterns, text, at));
		if (!rest || rest.scale >= last) return sum;
		sum = {
			...sum,
			numeral: String(Number(sum.numeral) * sum.scale + Number(rest.numeral) * rest.scale),
			scale: 1,
			end: rest.end
		};
		last = rest.scale;
	}
	return sum;
}

function scaledRest(patterns: Patterns, text: string, at: number): NumberRead | null {
	const below = belowThousand(patterns, text, at);
	if (!below || below.value === 0) return null;
	const read: NumberRead = {
		form: 'word',
		start: at,
		end: below.end,
		numeral: String(below.value),
		scale: 1
	};
	return withScale(patterns, text, read);
}

export function withScale(patterns: Patterns, text: string, read: NumberRead): NumberRead {
	const scale = readScale(patterns, text, read.end);
	return scale
		? { ...read, scale: read.scale * scale.value, end: scale.end, bareDigits: false }
		: read;
}

/** A scale word after a gap, a hyphen, or nothing. */
function readScale({ scales }: Patterns, text: string, at: number): Below | null {
	let place = at;
	while (/[\s\u00a0\u202f\u2009]/.test(text[place] ?? '')) place += 1;
	if (place === at && text[at] === '-') place += 1;
	const found = scales.read(text, place);
	return found && { value: found.value, end: found.end };
}
