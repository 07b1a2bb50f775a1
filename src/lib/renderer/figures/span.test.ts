import fc from 'fast-check';
import { expect, test } from 'vitest';
import { percent, shareOf, spanOver } from './span.ts';

test('a span has round ends and holds what it is of', () => {
	expect(spanOver([46, 90, 134])).toEqual({ from: 40, to: 140 });
	expect(spanOver([46, 90, 134], { zero: true })).toEqual({ from: 0, to: 140 });
	expect(spanOver([-46, -90], { zero: true })?.to).toBe(0);
});

test('one value still gets a span, and no value gets none', () => {
	const span = spanOver([7, 7]);
	expect(span && span.from < 7 && span.to > 7).toBe(true);
	expect(spanOver([0])).toEqual({ from: -1, to: 1 });
	expect(spanOver([null, NaN])).toBeNull();
});

test('by the logarithm it ends on powers of ten, or finer where it spans little', () => {
	const over = (...values: number[]) => spanOver(values, { log: true });
	expect(over(3, 40_000)).toEqual({ from: 1, to: 100_000, log: true });
	expect(over(3, 40)).toEqual({ from: 2, to: 50, log: true });
	expect(over(1, 1)).toEqual({ from: 1, to: 2, log: true });
	expect(over(-1, 0)).toBeNull();
	expect(over(-1, 3)).toEqual({ from: 2, to: 5, log: true });
	expect(shareOf(10, { from: 1, to: 1000, log: true })).toBeCloseTo(1 / 3, 12);
});

test('shares are per cent as SVG takes them', () => {
	expect([0, 1 / 3, 1].map(percent)).toEqual(['0%', '33.333%', '100%']);
});

const anyValue = fc
	.tuple(
		fc.double({ min: 1, max: 10, noNaN: true }),
		fc.integer({ min: -30, max: 30 }),
		fc.boolean()
	)
	.map(([lead, power, negative]) => (negative ? -1 : 1) * lead * 10 ** power);

test('every value lies inside, and a span with zero holds zero', () => {
	fc.assert(
		fc.property(
			fc.array(anyValue, { minLength: 1, maxLength: 8 }),
			fc.boolean(),
			(values, zero) => {
				const span = spanOver(values, { zero });
				expect(span).not.toBeNull();
				for (const value of values) {
					const share = shareOf(value, span!);
					expect(share).toBeGreaterThanOrEqual(-1e-9);
					expect(share).toBeLessThanOrEqual(1 + 1e-9);
				}
				if (zero) expect(span!.from <= 0 && span!.to >= 0).toBe(true);
			}
		)
	);
});
