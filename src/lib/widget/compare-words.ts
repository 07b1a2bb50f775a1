/** Words laid side by side: which went, which came, which stayed. */
import { diffWordsWithSpace } from 'diff';

export interface WordPart {
	kind: 'same' | 'gone' | 'new';
	text: string;
}

/** Past this many characters together, words are compared whole, so that no comparison takes longer than a blink. */
const LONGEST = 60_000;

export function wordChanges(before: string, after: string): WordPart[] {
	if (before === after) return before === '' ? [] : [{ kind: 'same', text: before }];
	if (before.length + after.length > LONGEST) return whole(before, after);
	return diffWordsWithSpace(before, after).map(({ value, added, removed }) => ({
		kind: added ? 'new' : removed ? 'gone' : 'same',
		text: value
	}));
}

function whole(before: string, after: string): WordPart[] {
	const parts: WordPart[] = [
		{ kind: 'gone', text: before },
		{ kind: 'new', text: after }
	];
	return parts.filter(({ text }) => text !== '');
}
