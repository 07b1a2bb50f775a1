import { expect, test } from 'vitest';
import { sentenceDiff } from './sentence-diff.ts';

test('names the words that went and came', () => {
	expect(
		sentenceDiff(
			'It peaks at nearly twice the wavelength.',
			'It peaks at more than twice the wavelength.'
		)
	).toEqual([
		{ kind: 'same', text: 'It peaks at ' },
		{ kind: 'gone', text: 'nearly ' },
		{ kind: 'new', text: 'more than ' },
		{ kind: 'same', text: 'twice the wavelength.' }
	]);
});

test('a sentence that stayed is one part', () => {
	expect(sentenceDiff('Nothing moved.', 'Nothing moved.')).toEqual([
		{ kind: 'same', text: 'Nothing moved.' }
	]);
});

test.each([
	['', 'All new.'],
	['All gone.', ''],
	['a b c d', 'd c b a']
])('both sentences can be read back from “%s” → “%s”', (then, now) => {
	const parts = sentenceDiff(then, now);
	const read = (kinds: string[]) =>
		parts
			.filter(({ kind }) => kinds.includes(kind))
			.flatMap(({ text }) => text.split(' '))
			.filter(Boolean)
			.join(' ');
	expect(read(['same', 'gone'])).toBe(then);
	expect(read(['same', 'new'])).toBe(now);
});
