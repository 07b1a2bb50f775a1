/** Reads the hedge that stands before a number, and a second one before that. */
import type { HedgeFamily } from '../widget/stated.ts';
import { plainPhrase } from './hedges.ts';
import type { Patterns } from './patterns.ts';

export interface Hedge {
	family: HedgeFamily;
	word: string;
	start: number;
	/** Two hedges on one number. */
	double: boolean;
}

/** Longer than any hedge with an aside. */
const LOOK_BACK = 48;

/** `floor` is where the quantity before ends; no hedge reaches across it. */
export function readHedge(patterns: Patterns, text: string, start: number, floor: number): Hedge {
	const near = hedgeEndingAt(patterns, text, start, floor);
	if (!near) return { family: 'bare', word: '', start, double: false };
	const far = hedgeEndingAt(patterns, text, near.start, floor);
	if (!far) return { ...near, double: false };
	return { ...near, word: `${far.word} ${near.word}`, start: far.start, double: true };
}

function hedgeEndingAt(patterns: Patterns, text: string, start: number, floor: number) {
	const from = Math.max(floor, start - LOOK_BACK);
	const match = patterns.hedgeBefore.exec(text.slice(from, start));
	const word = match?.groups?.word ?? match?.groups?.sign;
	const family = word && patterns.hedgeFamilies.get(plainPhrase(word));
	return match && word && family ? { family, word, start: from + match.index } : null;
}
