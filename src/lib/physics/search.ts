/**
 * Calculators found by a question (“how far does light travel in a year?”) or by a quantity (“age”, “megahertz”).
 * Words are compared by their stems and, weaker, by what they ask for: “how far” asks for a distance, “how hot” for a
 * temperature. A rare word counts for more than one that every calculator uses.
 */
import type { Calculator } from './calculator.ts';
import { ASKS_FOR, IDLE, stemOf, wordsOf } from './search-words.ts';
import { QUANTITY_KINDS } from './units/quantities.ts';
import { unitOf } from './units/units.ts';

/** What of a calculator met the search, in words to show beside it. */
export interface Why {
	kind: 'asks' | 'purpose' | 'title' | 'gives' | 'takes' | 'id';
	text: string;
}

export interface Found {
	calculator: Calculator;
	score: number;
	/** The text that matches best. Null when nothing was searched for. */
	why: Why | null;
}

/** Ranked calculators, the best first; all of them, as they came, when nothing is asked. */
export type Search = (wanted: string) => Found[];

/** Why a calculator was found: “How old is the Universe?”, gives Range, by its title. '' when nothing was asked. */
export function whyWords(why: Why | null): string {
	switch (why?.kind) {
		case 'asks':
			return `“${why.text}”`;
		case 'gives':
			return `gives ${why.text}`;
		case 'takes':
			return `takes ${why.text}`;
		case 'purpose':
			return why.text;
		case 'title':
			return 'by its title';
		case 'id':
			return 'by its id';
		case undefined:
			return '';
	}
}

interface Phrase extends Why {
	/** All its words in order, plain. */
	words: string[];
	/** Stems of the words that say something. */
	stems: Set<string>;
	/** How many of them the text itself has, without the names of its unit and kind. */
	size: number;
}

interface Entry {
	calculator: Calculator;
	phrases: Phrase[];
}

/** How much a stem counts by where it stands. */
const WEIGHTS: Record<Why['kind'], number> = {
	asks: 3.2,
	purpose: 2.6,
	title: 4,
	gives: 3.4,
	takes: 1.4,
	id: 2
};
/** A word met by what it asks for, or by its first letters alone, counts for this share. */
const KIN = 0.5;
const BEGUN = 0.75;
/** What a phrase adds that holds the whole search, as a share of what its words count. */
const WHOLE_PHRASE = 1.6;
/** What words add that stand in the same order, the small ones too: all of them add this many times their weight. */
const RUN = 3;
/** What a parameter set of the Universe holds. */
const COSMOLOGY_WORDS = 'H0 Hubble constant Omega matter dark energy Planck WMAP';
/** Of what is asked for, by weight, this share must be met. */
const LEAST_MET = 0.5;
/** Results that count for less than this share of the best one are noise. */
const NOISE = 0.22;

/** Readies a search over these calculators; one search among a hundred then takes about a millisecond. */
export function searchIn(calculators: Iterable<Calculator>): Search {
	const entries = [...calculators].map(entryOf);
	const rarity = rarities(entries);
	return (wanted) => {
		const words = wordsOf(wanted);
		const stems = [...stemsOf(wanted)];
		// “How is the”: nothing is asked yet, so nothing is left out.
		if (stems.length === 0) {
			return entries.map(({ calculator }) => ({ calculator, score: 0, why: null }));
		}
		const terms = stems.map((stem) => ({ stem, weight: rarity(stem) }));
		const asked = terms.reduce((sum, { weight }) => sum + weight, 0);
		const found = entries.flatMap((entry) => rate(entry, terms, asked, words) ?? []);
		const named = wanted.trim().toLowerCase();
		const isNamed = ({ calculator }: Found) => Number(calculator.id.toLowerCase() === named);
		found.sort((a, b) => isNamed(b) - isNamed(a) || b.score - a.score);
		const least = Math.max(0, ...found.map(({ score }) => score)) * NOISE;
		return found.filter(({ score }) => score >= least);
	};
}

interface Term {
	stem: string;
	weight: number;
}

function rate(
	{ calculator, phrases }: Entry,
	terms: readonly Term[],
	asked: number,
	words: readonly string[]
): Found | null {
	let best: { phrase: Phrase; score: number } | null = null;
	const counts = new Map<string, number>();
	for (const phrase of phrases) {
		let met = 0;
		for (const { stem, weight } of terms) {
			const likeness = likenessIn(stem, phrase.stems);
			if (likeness === 0) continue;
			met += weight * likeness;
			const count = weight * likeness * WEIGHTS[phrase.kind];
			counts.set(stem, Math.max(counts.get(stem) ?? 0, count));
		}
		if (met === 0) continue;
		const covered = met / asked;
		const run = longestRun(words, phrase.words) / words.length;
		// A short phrase that is all about the search beats a long one that mentions it.
		const focus = terms.length / Math.max(terms.length, phrase.size);
		const whole = WEIGHTS[phrase.kind] * WHOLE_PHRASE * covered ** 2 * (0.5 + 0.5 * focus);
		const score = asked * (whole + RUN * covered * run ** 2);
		if (!best || score > best.score) best = { phrase, score };
	}
	if (!best) return null;
	const met = terms.reduce((sum, { stem, weight }) => sum + (counts.has(stem) ? weight : 0), 0);
	if (met < LEAST_MET * asked) return null;
	const { kind, text } = best.phrase;
	const score = [...counts.values()].reduce((sum, count) => sum + count, best.score);
	return { calculator, score, why: { kind, text } };
}

function likenessIn(stem: string, stems: ReadonlySet<string>): number {
	if (stems.has(stem)) return 1;
	if (stem.length >= 3) {
		for (const other of stems) if (other.startsWith(stem)) return BEGUN;
	}
	for (const meant of ASKS_FOR[stem] ?? []) if (stems.has(meant)) return KIN;
	return 0;
}

/** A stem's weight: 1 for one that every calculator uses, more the fewer do. Unknown ones count as rare. */
function rarities(entries: readonly Entry[]): (stem: string) => number {
	const counts = new Map<string, number>();
	for (const { phrases } of entries) {
		const own = new Set(phrases.flatMap(({ stems }) => [...stems]));
		for (const stem of own) counts.set(stem, (counts.get(stem) ?? 0) + 1);
	}
	return (stem) => 1 + Math.log(Math.max(1, entries.length) / (counts.get(stem) ?? 3));
}

function entryOf(calculator: Calculator): Entry {
	const { id, title, purpose, asks, inputs, outputs } = calculator;
	const phrases = [
		phrase('title', title),
		phrase('purpose', purpose),
		...asks.map((ask) => phrase('asks', ask)),
		phrase('id', id, id.replace(/[._]/g, ' '))
	];
	for (const output of Object.values(outputs)) {
		const units =
			typeof output.unit === 'string' ? [output.unit] : Object.values(output.unit.units);
		phrases.push(
			phrase('gives', output.label, measured(output.label, output.quantity, output.symbol, units))
		);
	}
	for (const input of Object.values(inputs)) {
		if (input.kind === 'number') {
			const units = typeof input.unit === 'string' ? [input.unit] : Object.values(input.unit.units);
			phrases.push(
				phrase('takes', input.label, measured(input.label, input.quantity, input.symbol, units))
			);
		} else if (input.kind === 'choice') {
			const options = input.options.map(({ label }) => label).join(' ');
			phrases.push(phrase('takes', input.label, `${input.label} ${options}`));
		} else if (input.kind === 'cosmology') {
			phrases.push(phrase('takes', input.label, `${input.label} ${COSMOLOGY_WORDS}`));
		} else phrases.push(phrase('takes', input.label));
	}
	return { calculator, phrases };
}

/** A quantity by all its names: its label, its kind, its letter and its units' words. */
function measured(
	label: string,
	quantity: keyof typeof QUANTITY_KINDS,
	symbol: string | undefined,
	units: readonly string[]
): string {
	const words = units.length > 3 ? [] : units.flatMap((unit) => unitOf(unit)?.names ?? []);
	return [label, QUANTITY_KINDS[quantity].label, symbol ?? '', ...words].join(' ');
}

function phrase(kind: Why['kind'], text: string, searched = text): Phrase {
	const stems = stemsOf(searched);
	return {
		kind,
		text,
		words: wordsOf(searched),
		stems,
		size: searched === text ? stems.size : stemsOf(text).size
	};
}

function stemsOf(text: string): Set<string> {
	return new Set(
		wordsOf(text)
			.filter((word) => !IDLE.has(word))
			.map(stemOf)
	);
}

/** The most words of the search that stand one after the other in the phrase. */
function longestRun(words: readonly string[], inside: readonly string[]): number {
	let longest = 0;
	for (let from = 0; from < words.length; from += 1) {
		for (let at = 0; at < inside.length; at += 1) {
			let length = 0;
			while (from + length < words.length && words[from + length] === inside[at + length])
				length += 1;
			longest = Math.max(longest, length);
		}
	}
	return longest;
}
