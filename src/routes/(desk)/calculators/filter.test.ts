import { catalogue } from '$lib/physics/calculators/index.ts';
import { expect, test } from 'vitest';
import { matching } from './filter.ts';

const all = [...catalogue.values()];

test('no words, and words that say nothing, leave every calculator', () => {
	expect(matching(all, '')).toHaveLength(all.length);
	expect(matching(all, 'how is the')).toHaveLength(all.length);
});

test('every word must be found, whatever its case and place', () => {
	const [first] = all;
	if (!first) throw new Error('The catalogue is empty.');
	const [lead = '', ...rest] = first.title.toUpperCase().split(' ');
	expect(matching(all, [...rest, lead].join(' '))).toContain(first);
	expect(matching(all, `${lead} zzz-nothing-holds-this`)).toEqual([]);
});
