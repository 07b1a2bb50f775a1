import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';
import { referenceVectors } from '../lib/factcheck/reference-vectors.ts';
import { detectLine, weighLine } from './weigh-line.ts';

const weigh = (request: object) => weighLine(JSON.stringify(request));

describe('the bare form', () => {
	test.each(referenceVectors)('%s %s × %d against %d, u %d: %s', (...vector) => {
		const [hedge, numeral, scale, value, u, verdict] = vector;
		expect(weigh({ hedge, numeral, scale, value, u })).toMatchObject({ verdict });
	});
	test('gives every part of the answer', () => {
		expect(weigh({ hedge: 'more than', numeral: '15', value: 20.84, u: 0 })).toEqual({
			verdict: 'leans',
			severity: 'none',
			rule: 'N7',
			reason: 'True but weak: more than 25 per cent past the bound.',
			departurePercent: expect.closeTo(38.933, 2) as number,
			suggestions: ['about 21', 'nearly 21', 'more than 20']
		});
	});
	test('no hedge is bare, by either name or none', () => {
		for (const hedge of ['bare', '', undefined, null])
			expect(weigh({ hedge, numeral: '14', value: 14, u: 0 })).toMatchObject({ rule: 'N1' });
	});
	test('numerals come as text or as numbers, grouped or not, with either minus', () => {
		for (const numeral of ['1420', 1420, '1,420', '1 420', '1\u202f420']) {
			expect(weigh({ numeral, value: 1420.4, u: 0 })).toMatchObject({ verdict: 'level' });
		}
		expect(weigh({ hedge: 'about', numeral: '−19', value: -18.56, u: 0 })).toMatchObject({
			verdict: 'level'
		});
	});
	test('an uncertainty that isn’t available is neither nought nor exact', () => {
		expect(weigh({ hedge: 'nearly', numeral: '14', value: 13.787, u: null })).toMatchObject({
			verdict: 'leans'
		});
		expect(weigh({ hedge: 'nearly', numeral: '14', value: 13.787, u: 0 })).toMatchObject({
			verdict: 'level'
		});
		expect(weigh({ hedge: 'exactly', numeral: '14', value: 14, u: 0, exact: false })).toMatchObject(
			{ verdict: 'tips' }
		);
		expect(
			weigh({ hedge: 'exactly', numeral: '14', value: 14, u: null, exact: true })
		).toMatchObject({ verdict: 'level' });
	});
	test('no finite number is no reading', () => {
		for (const value of ['null', '"NaN"', 'NaN', 'Infinity', '-Infinity', '1e999', '"Infinity"']) {
			expect(
				weighLine(`{"hedge": "nearly", "numeral": "14", "value": ${value}, "u": 0}`)
			).toMatchObject({
				verdict: 'unweighed',
				reason: 'No reading.'
			});
		}
	});
});

describe('what can’t be read says so', () => {
	test.each([
		['nonsense', 'not-json'],
		['[1]', 'not-an-object'],
		['{}', 'input-broken'],
		['{"numeral": "14"}', 'input-broken'],
		['{"numeral": "14", "value": "much"}', 'input-broken'],
		['{"numeral": "14", "value": 14, "u": -1}', 'input-broken'],
		['{"numeral": "14", "value": 14, "scale": 0}', 'input-broken'],
		['{"numeral": "fourteen", "value": 14}', 'not-a-numeral'],
		['{"hedge": "sort of", "numeral": "14", "value": 14}', 'unknown-hedge'],
		['{"lang": "xx", "text": "14 km", "value": 14, "unit": "km"}', 'unknown-language'],
		['{"lang": "en", "text": "14 km", "value": 14, "unit": "KM"}', 'unknown-unit'],
		['{"lang": "en", "text": "14 km", "unit": "km"}', 'input-broken']
	])('%s', (line, code) => {
		expect(weighLine(line)).toEqual({
			error: { code, message: expect.stringMatching(/\.$/) as string }
		});
	});
});

describe('the sentence form', () => {
	const sentence =
		'It has been growing for nearly 14 billion years, and 3 kilometres are a trifle.';
	test('weighs the first quantity of the reading’s dimension', () => {
		expect(
			weigh({ lang: 'en', text: sentence, value: 13.787, unit: 'Gyr', u: 0.02 })
		).toMatchObject({ verdict: 'level', rule: 'N4' });
		expect(weigh({ lang: 'en-GB', text: sentence, value: 2953, unit: 'm', u: 0 })).toMatchObject({
			verdict: 'level',
			rule: 'N1'
		});
	});
	test('a claim’s place picks the quantity', () => {
		const start = sentence.indexOf('3 kilo');
		const claim = { start, end: start + '3 kilometres'.length };
		expect(
			weigh({ lang: 'en', text: sentence, claim, value: 13.787, unit: 'Gyr', u: 0.02 })
		).toMatchObject({ verdict: 'tips' });
	});
	test('the kind of quantity is compared where the words name one', () => {
		const request = { lang: 'en', text: '3 kilometres across', value: 2.953, unit: 'km', u: 0 };
		expect(weigh({ ...request, kind: 'radius' })).toMatchObject({ verdict: 'tips' });
		expect(weigh({ ...request, kind: 'diameter' })).toMatchObject({ verdict: 'level' });
		expect(weigh(request)).toMatchObject({ verdict: 'level' });
	});
	test('“up to” takes the high end of a range', () => {
		expect(
			weigh({ lang: 'en', text: 'up to 60 km', values: [10, 59.5], unit: 'km', u: 0 })
		).toMatchObject({ verdict: 'level', rule: 'N10' });
		expect(weigh({ lang: 'en', text: 'up to 60 km', value: 59.5, unit: 'km', u: 0 })).toMatchObject(
			{ verdict: 'leans' }
		);
	});
	test('a sentence without a number is unweighed', () => {
		expect(weigh({ lang: 'en', text: 'a long way', value: 1, unit: 'km' })).toMatchObject({
			verdict: 'unweighed'
		});
	});
});

test('detection gives the quantities with their places', () => {
	expect(
		detectLine(JSON.stringify({ lang: 'en', text: 'nearly 14 billion years, 2–3 km' }))
	).toEqual({
		quantities: [
			{
				start: 0,
				end: 23,
				surface: 'nearly 14 billion years',
				kind: 'number',
				value: 1.4e10,
				unit: 'yr',
				hedge: 'nearly'
			},
			{ start: 25, end: 31, surface: '2–3 km', kind: 'range', value: [2, 3], unit: 'km', hedge: '' }
		]
	});
});

describe('the command', () => {
	const run = (input: string, args: string[] = []) =>
		new Promise<{ out: string; code: number | null }>((resolve, reject) => {
			const script = fileURLToPath(new URL('./weigh.ts', import.meta.url));
			const child = spawn(process.execPath, ['--import', 'tsx', script, ...args], {
				stdio: ['pipe', 'pipe', 'inherit']
			});
			let out = '';
			child.stdout.setEncoding('utf8').on('data', (chunk: string) => (out += chunk));
			child.on('error', reject).on('close', (code) => resolve({ out, code }));
			child.stdin.end(input);
		});

	test(
		'answers each line in order; a broken one is answered and the rest go on',
		{ timeout: 30_000 },
		async () => {
			const good =
				'{"hedge": "nearly", "numeral": "14", "scale": 1e9, "value": 1.3787e10, "u": 2e7, "exact": false}';
			const { out, code } = await run(`${good}\nbroken\n\n${good}`);
			const answers = out
				.trim()
				.split('\n')
				.map((line) => JSON.parse(line) as Record<string, unknown>);
			expect(answers.map((answer) => answer.verdict ?? answer.error)).toEqual([
				'level',
				expect.objectContaining({ code: 'not-json' }),
				'level'
			]);
			expect(code).toBe(0);
		}
	);
});
