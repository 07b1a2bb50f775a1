import { expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { evaluate } from './evaluate.ts';
import { claimPlaces, sentenceSpans, wordsAt } from './places.ts';

const sentences = (text: string) =>
	sentenceSpans(text).map(({ start, end }) => text.slice(start, end).trim());

test.each([
	['One. Two.', ['One.', 'Two.']],
	['It is 4.4 metres long. That is e.g. a bus.', ['It is 4.4 metres long.', 'That is e.g. a bus.']],
	['“Really?” She left… Then nothing', ['“Really?”', 'She left…', 'Then nothing']],
	[
		'About 13.8 billion years ago. 21 centimetres.',
		['About 13.8 billion years ago.', '21 centimetres.']
	],
	['', []]
])('sentences of %j', (text, expected) => {
	expect(sentences(text)).toEqual(expected);
});

test('claims are labelled, worded and set in their sentences', () => {
	const words = wordsAt(firstLight, evaluate(firstLight, {}, catalogue), catalogue);
	const places = claimPlaces(firstLight, words);
	expect(places.map(({ label, words: said }) => [label, said.replaceAll('\u00a0', ' ')])).toEqual([
		['1a', '1420 megahertz'],
		['1b', 'about 21 times'],
		['2a', 'about 68 megahertz'],
		['2b', '4.4 metres']
	]);
	for (const place of places) {
		expect(place.sentence.slice(place.start, place.start + place.words.length)).toBe(place.words);
	}
	expect(places[1]?.before).toMatch(/^Cold hydrogen/);
});
