import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Stated } from '../widget/stated.ts';
import { hedgeFamily } from './hedges.ts';
import { referenceVectors } from './reference-vectors.ts';
import { weigh, type WeighedReading } from './weigh.ts';

function stated(hedge: string, numeral: string, scale = 1, unit = ''): Stated {
	const family = hedgeFamily(hedge, 'en');
	if (!family) throw new Error(`no such hedge: ${hedge}`);
	return { hedge: family, hedgeWord: family === 'bare' ? '' : hedge, numeral, scale, unit };
}

function reading(
	value: number,
	uncertainty: WeighedReading['uncertainty'] = 'exact',
	unit = ''
): WeighedReading {
	return { value, unit, uncertainty };
}

describe('the house’s reference vectors', () => {
	test.each(referenceVectors)('%s %s × %d against %d, u %d: %s', (...vector) => {
		const [hedge, numeral, scale, value, u, verdict, departure] = vector;
		const read = { ...reading(value, u === 0 ? 'exact' : u), maximum: hedge === 'up to' };
		const result = weigh(stated(hedge, numeral, scale), read);
		expect(result.verdict, result.reason).toBe(verdict);
		expect(result.departurePercent).toBeCloseTo(departure, 0);
		expect(Math.abs((result.departurePercent ?? 0) - departure)).toBeLessThanOrEqual(0.0500001);
		expect(result.reason).toMatch(/\.$/);
	});
});

describe('the worked case: an age of 13.787(20) billion years', () => {
	const age: WeighedReading = { value: 13.787, unit: 'Gyr', uncertainty: 0.02, quantity: 'age' };
	const years = (hedge: string, numeral: string) => stated(hedge, numeral, 1e9, 'yr');
	test.each([
		['nearly', '14', 'level'],
		['bare', '13.8', 'level'],
		['about', '14', 'level'],
		['less than', '14', 'level'],
		['more than', '13', 'level'],
		['about', '15', 'leans'],
		['more than', '10', 'leans'],
		['more than', '13.75', 'leans'],
		['bare', '13.7', 'tips'],
		['more than', '14', 'tips'],
		['bare', '13.7874', 'tips']
	])('%s %s billion years: %s', (hedge, numeral, verdict) => {
		expect(weigh(years(hedge, numeral), age).verdict).toBe(verdict);
	});
	test('a newer edition at 13.99 leaves “nearly” leaning and “about” level; at 14.02 “nearly” tips', () => {
		expect(weigh(years('nearly', '14'), { ...age, value: 13.99 }).verdict).toBe('leans');
		expect(weigh(years('about', '14'), { ...age, value: 13.99 }).verdict).toBe('level');
		expect(weigh(years('nearly', '14'), { ...age, value: 14.02 }).verdict).toBe('tips');
	});
	test('suggests rounder wordings, the best first', () => {
		expect(weigh(years('bare', '13.7'), age).suggestions).toEqual([
			'about 14\u00a0billion years',
			'nearly 14\u00a0billion years',
			'more than 13\u00a0billion years'
		]);
	});
});

describe('rounding', () => {
	test('a half passes both ways', () => {
		for (const numeral of ['2', '3']) {
			// 2.5 against 2 is 25 per cent away, against 3 it is 17: right rounding, but too coarse to be bare.
			expect(weigh(stated('', numeral), reading(2.5)).reason).toMatch(/^Right rounding/);
		}
		for (const numeral of ['12', '13'])
			expect(weigh(stated('', numeral), reading(12.5)).verdict).toBe('level');
	});
	test('a half is told in decimal, not in binary', () => {
		// 1.005 as a double lies below the half, 0.615 above it; both are ties as written.
		expect(weigh(stated('', '1.01'), reading(1.005)).verdict).toBe('level');
		expect(weigh(stated('', '1.00'), reading(1.005)).verdict).toBe('level');
		expect(weigh(stated('', '0.61'), reading(0.615)).verdict).toBe('level');
	});
	test('rounds at the last place written', () => {
		expect(weigh(stated('', '10'), reading(9.96)).verdict).toBe('level');
		expect(weigh(stated('', '10.0'), reading(9.96)).verdict).toBe('level');
		expect(weigh(stated('', '9.9'), reading(9.96)).verdict).toBe('tips');
	});
	test('trailing zeros of a whole number are no figures', () => {
		expect(weigh(stated('', '1400'), reading(1420.4)).verdict).toBe('level');
		expect(weigh(stated('', '1400.0'), reading(1420.4)).verdict).toBe('tips');
	});
	test('a five may miss by two and a half of its last places', () => {
		expect(weigh(stated('about', '65'), reading(65.5)).verdict).toBe('level');
		expect(weigh(stated('about', '85'), reading(87.4)).verdict).toBe('level');
		expect(weigh(stated('about', '85'), reading(87.6)).verdict).toBe('leans');
		expect(weigh(stated('about', '86'), reading(87.4)).verdict).toBe('leans');
		// The last digit as written is a nought here, so this is no five.
		expect(weigh(stated('about', '250'), reading(256)).verdict).toBe('leans');
	});
	test('counts are exact', () => {
		expect(weigh(stated('exactly', '7'), reading(7)).verdict).toBe('level');
		expect(weigh(stated('exactly', '7'), reading(8)).verdict).toBe('tips');
		expect(weigh(stated('exactly', '7'), reading(7, 0)).verdict).toBe('tips');
	});
});

describe('severity', () => {
	test('more than three figures are asked about, unless the reading is exact', () => {
		expect(weigh(stated('', '13.787'), reading(13.787, 0.02)).severity).toBe('ask');
		expect(weigh(stated('', '1420.4'), reading(1420.4)).severity).toBe('none');
		expect(weigh(stated('about', '13.787'), reading(13.787)).severity).toBe('ask');
	});
	test('one-sided words on negative numbers go by size, and are asked about', () => {
		const cold = reading(-18.56, 'exact', '°C');
		expect(weigh(stated('nearly', '-20', 1, '°C'), cold)).toMatchObject({
			verdict: 'level',
			severity: 'ask'
		});
		expect(weigh(stated('nearly', '-18', 1, '°C'), cold)).toMatchObject({
			verdict: 'tips',
			severity: 'ask'
		});
		expect(weigh(stated('nearly', '-19', 1, '°C'), cold)).toMatchObject({
			verdict: 'level',
			severity: 'ask'
		});
		expect(weigh(stated('more than', '-18', 1, '°C'), cold)).toMatchObject({
			verdict: 'level',
			severity: 'ask'
		});
		expect(weigh(stated('about', '-19', 1, '°C'), cold)).toMatchObject({
			verdict: 'level',
			severity: 'none'
		});
	});
});

describe('same thing, same unit', () => {
	test('converts the reading, and its uncertainty, to the claim’s unit', () => {
		expect(weigh(stated('about', '68', 1, 'MHz'), reading(68.14e6, 1e5, 'Hz')).verdict).toBe(
			'level'
		);
		expect(weigh(stated('about', '68.14', 1, 'MHz'), reading(68.14e6, 1e5, 'Hz')).verdict).toBe(
			'leans'
		);
		expect(weigh(stated('', '68.142', 1, 'MHz'), reading(68.142e6, 1e5, 'Hz')).verdict).toBe(
			'tips'
		);
	});
	test('a temperature converts by its zero point, its uncertainty and a difference by scale alone', () => {
		expect(weigh(stated('about', '-19', 1, '°C'), reading(254.586, 0.1, 'K')).verdict).toBe(
			'level'
		);
		expect(weigh(stated('', '-18', 1, '°C'), reading(254.586, 'exact', 'K')).verdict).toBe('tips');
		const difference = { ...reading(20, 'exact', 'K'), quantity: 'temperature-difference' };
		expect(weigh(stated('', '20', 1, '°C'), difference).verdict).toBe('level');
		expect(weigh(stated('', '36', 1, '°F'), difference).verdict).toBe('level');
	});
	test('another dimension tips, and so does a number without its unit', () => {
		const far = reading(3, 'exact', 'km');
		expect(weigh(stated('', '3', 1, 's'), far)).toMatchObject({
			verdict: 'tips',
			departurePercent: null
		});
		expect(weigh(stated('', '3'), far).reason).toBe(
			'The reading is a number of kilometres; the copy gives a plain number.'
		);
	});
	test('a radius is no diameter', () => {
		const radius = { ...reading(2.953, 'exact', 'km'), quantity: 'radius' };
		expect(weigh({ ...stated('', '3', 1, 'km'), quantity: 'diameter' }, radius).verdict).toBe(
			'tips'
		);
		expect(weigh(stated('', '3', 1, 'km'), radius).verdict).toBe('level');
		expect(
			weigh(
				{ ...stated('', '3', 1, 'km'), quantity: 'diameter' },
				{ ...radius, quantity: 'length' }
			).verdict
		).toBe('level');
	});
	test('per cent and plain ratios are one dimension', () => {
		expect(weigh(stated('about', '1', 1, '%'), reading(0.01056)).verdict).toBe('level');
		expect(weigh(stated('', '1', 1, '%'), reading(0.01056)).verdict).toBe('leans');
	});
});

describe('no uncertainty to go by', () => {
	const unsure = reading(13.787, 'not-available');
	test.each(['nearly', 'less than', 'at most', 'just under'])(
		'“%s” leans, since its side isn’t established',
		(hedge) => {
			expect(weigh(stated(hedge, '14'), unsure).verdict).toBe('leans');
		}
	);
	test('a calculator may vouch for the side', () => {
		expect(weigh(stated('nearly', '14'), { ...unsure, directionEstablished: true }).verdict).toBe(
			'level'
		);
	});
	test('a bound that isn’t met still tips, and words without a side are as ever', () => {
		expect(weigh(stated('more than', '14'), unsure).verdict).toBe('tips');
		expect(weigh(stated('about', '14'), unsure).verdict).toBe('level');
	});
});

describe('edges', () => {
	test('“well over” and “within”', () => {
		expect(weigh(stated('well over', '10'), reading(10.9)).verdict).toBe('leans');
		expect(weigh(stated('well over', '10'), reading(11)).verdict).toBe('level');
		expect(weigh(stated('within', '10'), reading(9.5, 0.6)).verdict).toBe('tips');
		expect(weigh(stated('within', '10'), reading(9.5, 0.3)).verdict).toBe('leans');
		expect(weigh(stated('within', '10'), reading(9.5, 0.1)).verdict).toBe('level');
	});
	test('“at least” may touch its bound', () => {
		expect(weigh(stated('at least', '7'), reading(7)).verdict).toBe('level');
		expect(weigh(stated('more than', '7'), reading(7)).verdict).toBe('tips');
	});
	test('“up to” leans on a plain reading', () => {
		expect(weigh(stated('up to', '60'), reading(59.5)).verdict).toBe('leans');
		expect(weigh(stated('up to', '60'), reading(66)).verdict).toBe('tips');
	});
	test('nought', () => {
		expect(weigh(stated('', '0'), reading(0.4))).toMatchObject({
			verdict: 'level',
			departurePercent: null
		});
		expect(weigh(stated('', '0'), reading(0.6)).verdict).toBe('tips');
		expect(weigh(stated('', '0'), reading(0.6, 0.3)).verdict).toBe('level');
		expect(weigh(stated('', '0.0'), reading(0.4)).verdict).toBe('tips');
		expect(weigh(stated('', '14'), reading(0))).toMatchObject({
			verdict: 'tips',
			departurePercent: -100
		});
		expect(weigh(stated('', '0'), reading(0))).toMatchObject({
			verdict: 'level',
			departurePercent: 0
		});
		expect(weigh(stated('more than', '0'), reading(0.3)).verdict).toBe('leans');
	});
	test.each([NaN, Infinity, -Infinity])('%d is no reading, and gets no verdict', (value) => {
		expect(weigh(stated('about', '14'), reading(value))).toEqual({
			verdict: 'unweighed',
			severity: 'none',
			rule: '',
			reason: 'No reading.',
			departurePercent: null,
			suggestions: []
		});
	});
	test('fraction words have bands and no last place', () => {
		const half: Stated = { ...stated('', '0.5'), fraction: [1, 2] };
		expect(weigh(half, reading(0.52))).toMatchObject({ verdict: 'level', rule: 'N23' });
		expect(weigh(half, reading(0.54)).verdict).toBe('leans');
		expect(weigh(half, reading(0.56)).verdict).toBe('tips');
		const third: Stated = { ...stated('about', '0.333'), fraction: [1, 3] };
		expect(weigh(third, reading(0.365)).verdict).toBe('level');
		expect(weigh(third, reading(1 / 3)).departurePercent).toBeCloseTo(0, 10);
	});
});

test('the stretch of 20.84 times asks for a nearer number', () => {
	const result = weigh(
		{ ...stated('more than', '15', 1, 'times') },
		reading(20.84, 'exact', 'times')
	);
	expect(result).toMatchObject({ verdict: 'leans', rule: 'N7' });
	expect(result.suggestions.map((text) => text.replace('\u00a0', ' '))).toEqual([
		'about 21 times',
		'nearly 21 times',
		'more than 20 times'
	]);
});

describe('properties', () => {
	const hedge = fc.constantFrom(
		'',
		'exactly',
		'about',
		'nearly',
		'just under',
		'just over',
		'more than',
		'well over',
		'less than',
		'within',
		'at least',
		'at most',
		'up to'
	);
	const numeral = fc
		.tuple(fc.integer({ min: -99999, max: 99999 }), fc.integer({ min: 0, max: 4 }))
		.map(([digits, places]) => (digits / 10 ** places).toFixed(places));
	const uncertainty = fc.oneof(
		fc.constantFrom('exact' as const, 'not-available' as const),
		fc.double({ min: 0, max: 100, noNaN: true })
	);

	test('never throws, whatever is weighed', () => {
		fc.assert(
			fc.property(
				hedge,
				numeral,
				fc.constantFrom(1, 1e3, 1e9, 1e-18),
				fc.double(),
				uncertainty,
				(word, text, scale, value, u) => {
					const result = weigh(stated(word, text, scale), reading(value, u));
					expect(result.verdict === 'unweighed').toBe(!Number.isFinite(value));
				}
			)
		);
	});

	test('the same digits weigh the same in every power of ten', () => {
		fc.assert(
			fc.property(
				hedge,
				numeral,
				numeral,
				fc.integer({ min: -12, max: 12 }),
				(word, text, read, power) => {
					const near = weigh(stated(word, text), reading(Number(read)));
					const far = weigh(
						stated(word, text, Number(`1e${power}`)),
						reading(Number(`${read}e${power}`))
					);
					expect([far.verdict, far.reason]).toEqual([near.verdict, near.reason]);
				}
			)
		);
	});

	test('a number that is the reading’s own rounding never tips under “about”', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 1e-6, max: 1e6, noNaN: true }),
				fc.integer({ min: 2, max: 3 }),
				(value, figures) => {
					const text = Number(value.toPrecision(figures))
						.toFixed(12)
						.replace(/0+$/, '')
						.replace(/\.$/, '');
					expect(weigh(stated('about', text), reading(value)).verdict).toBe('level');
				}
			)
		);
	});
});
