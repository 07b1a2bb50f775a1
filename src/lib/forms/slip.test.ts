import { expect, test } from 'vitest';
import { EMPTY_SLIP, lackingOn, type Slip } from '../workflow/slip.ts';
import { fieldsOf, SlipFields, slipOf } from './slip.ts';

const filled: Slip = {
	reader: 'Children of ten',
	partner: 'A museum',
	embargo: '',
	words: 400,
	due: { at: '2026-12-17T14:00:00.000Z', zone: 'Europe/Berlin' }
};

test('what a slip fills into the fields, the fields give back', () => {
	for (const slip of [filled, EMPTY_SLIP])
		expect(slipOf(SlipFields.parse(fieldsOf(slip, 'Europe/Berlin')))).toEqual(slip);
	expect(fieldsOf(filled, 'UTC')).toMatchObject({ due: '2026-12-17T15:00', zone: 'Europe/Berlin' });
});

test.each([
	[{ words: 'four hundred' }, 'words', 'number of words'],
	[{ words: '0' }, 'words', 'number of words'],
	[{ due: 'tomorrow' }, 'due', 'day and a time'],
	[{ due: '2026-03-29T02:30', zone: 'Europe/Berlin' }, 'due', 'no such time'],
	[{ due: '2026-12-17T15:00', zone: 'Middle/Earth' }, 'zone', 'time zone'],
	[{ reader: 'x'.repeat(161) }, 'reader', '160']
])('%o is refused at its field, with the mend', (fields, path, says) => {
	const { error } = SlipFields.safeParse(fields);
	expect(error?.issues.map((issue) => [issue.path.join('.'), issue.message])).toEqual([
		[path, expect.stringContaining(says)]
	]);
});

test('a slip says what it lacks, and an embargo is no part of it', () => {
	expect(lackingOn(filled, 'One thing.')).toEqual([]);
	expect(lackingOn(EMPTY_SLIP, ' ')).toEqual([
		'the point',
		'the reader',
		'the length',
		'the partner',
		'the date'
	]);
});
