/** What is to be said of a whole sentence, or of how a paragraph begins. */
import { sentenceSpans } from '../widget/places.ts';
import type { Language } from '../widget/language.ts';
import type { Finding } from './note.ts';

/**
 * Words after which a reader has lost the start. Smithsonian Guidelines for Accessible Exhibition Design ask for 25 at
 * most on a label; copy for a page gets a little more. German packs words together, Spanish takes more small ones:
 * common practice.
 */
const LONGEST: Record<Language, number> = { en: 30, de: 26, es: 35 };

const DANGLING: Record<Language, RegExp> = {
	en: /^(?:This|That|These|Those) (?:is|was|are|were|means?|meant|shows?|showed|makes?|made|happens?|happened|can|will|would|has|have|gives?|gave|explains?|leads?)\b/u,
	de: /^(?:Das|Dies) (?:ist|war|bedeutet|zeigt|heißt|macht|passiert|geschieht|kann|wird|erklärt|führt)(?!\p{L})/u,
	es: /^(?:Esto|Eso) (?:es|era|fue|significa|muestra|hace|ocurre|puede|explica|lleva)(?!\p{L})/u
};

/** A list's own number isn't a figure in a sentence. */
const LIST_NUMBER = /^\d+[.)]\s/u;

/** `starts`: where each word begins, in order. */
export function sentenceFindings(
	text: string,
	starts: readonly number[],
	language: Language
): Finding[] {
	const found: Finding[] = [];
	const dangling = DANGLING[language].exec(text);
	if (dangling) {
		found.push({
			code: 'dangling-this',
			from: 0,
			to: dangling[0].length,
			says: 'A paragraph starts here, and nothing in it says what this points to.',
			mend: 'Name the thing: “This delay is …”.'
		});
	}
	let word = 0;
	for (const { start, end } of sentenceSpans(text)) {
		const first = word;
		while (word < starts.length && (starts[word] ?? end) < end) word++;
		const sentence = text.slice(start, end);
		const from = start + (sentence.length - sentence.trimStart().length);
		const to = start + sentence.trimEnd().length;
		const words = word - first;
		if (words > LONGEST[language]) {
			found.push({
				code: 'long-sentence',
				from,
				to,
				says: `${words} words: by the end a reader has lost the start.`,
				mend: 'Make two of it.'
			});
		}
		if (/^\d/u.test(text.slice(from, from + 1)) && !LIST_NUMBER.test(text.slice(from, from + 5))) {
			found.push({
				code: 'starts-with-number',
				from,
				to: from + (/^[\d.,]*/u.exec(text.slice(from, from + 20))?.[0].length ?? 1),
				says: 'A sentence starts with a figure.',
				mend: 'Put a word before it, or spell it out.'
			});
		}
	}
	return found;
}
