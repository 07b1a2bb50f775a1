import { expect, test } from 'vitest';
import { csvOf } from './csv.ts';

test('rows end in CR LF; commas, quotes and line breaks are quoted', () => {
	expect(
		csvOf([
			['a', 'b,c', 'say "x"'],
			['two\nlines', '', null]
		])
	).toBe('a,"b,c","say ""x"""\r\n"two\nlines",,\r\n');
});

test.each([
	'=1+1',
	'+1',
	'-1',
	'@SUM(A1)',
	'\t=1',
	'\r=1',
	'＝1',
	'＋1',
	'－1',
	'＠A1',
	'=HYPERLINK("http://x","y")'
])('text that begins like a formula is made text: %j', (text) => {
	const cell = csvOf([[text]]).slice(0, -2);
	expect(cell.replace(/^"/, '')[0]).toBe("'");
});

test('numbers stay numbers, with all their digits', () => {
	expect(csvOf([[-1.5, 1e-30, 0.1 + 0.2, -0, 13.786885301987]])).toBe(
		'-1.5,1e-30,0.30000000000000004,0,13.786885301987\r\n'
	);
	expect(csvOf([[Number.NaN, Number.POSITIVE_INFINITY]])).toBe(',\r\n');
});
