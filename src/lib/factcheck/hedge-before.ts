/** Reads the hedge that stands before a number, and a second one before that. */
import type { HedgeFamily } from '../widget/stated.ts';
import type { Patterns } from './patterns.ts';
import { plainPhrase } from './text-patterns.ts';

export interface Hedge {
	family: HedgeFamily;
	word: string;
	start: number;
	/** Two hedges on one number. */
	double: boolean;
}

/** Longer than any hedge with an aside. */
export const LOOK_BACK = 48;

/** `floor` is where the quantity before ends; no hedge reaches across it. */
export function readHedge(patterns: Patterns, text: string, start: number, floor: number): Hedge {
	const near = hedgeEndingAt(patterns, text, start, floor);
	if (!near) return { family: 'bare', word: '', start, double: false };
	const far = hedgeEndingAt(patterns, text, near.start, floor);
	// “over about 20 km” says where, not how much.
	const isPlace = far && patterns.lexicon.prepositions.includes(far.word.toLowerCase());
	if (!far || isPlace) return { ...near, double: false };
	return { ...near, word: `${far.word} ${near.word}`, start: far.start, double: true };
}

function hedgeEndingAt(patterns: Patterns, text: string, start: number, floor: number) {
	if (!mayEndHedge(patterns, text, start)) return null;
	const from = Math.max(floor, start - LOOK_BACK);
	const match = patterns.hedgeBefore.exec(text.slice(from, start));
	const word = match?.groups?.word ?? match?.groups?.sign;
	const family = word && patterns.hedgeFamilies.get(plainPhrase(word));
	return match && word && family ? { family, word, start: from + match.index } : null;
}

/** Most numbers have no hedge, and the word before them tells at once. A sign may stand close, or after a space. */
function mayEndHedge({ hedgeLastWords }: Patterns, text: string, start: number): boolean {
	let end = start;
	while (end > 0 && /[\s\u00a0\u202f\u2009,]/.test(text[end - 1] ?? '')) end -= 1;
	let from = end;
	while (from > 0 && /[\p{L}.]/u.test(text[from - 1] ?? '')) from -= 1;
	return from === end
		? /[<>≈~≤≥]/.test(text[end - 1] ?? '')
		: hedgeLastWords.has(text.slice(from, end).toLowerCase());
}
