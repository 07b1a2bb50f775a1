import type { CheckValue } from '$lib/physics/calculator.ts';
import { expect, test } from 'vitest';
import { readsAs, statedAs, withinAs } from './check-words.ts';

const check = (published: number | string, tolerance: number) =>
	({ published, tolerance }) as CheckValue;
const row = (published: number | string, tolerance: number, reads: number | string | null) => ({
	check: check(published, tolerance),
	reads,
	refusal: null,
	agrees: true,
	within:
		typeof reads === 'number' && typeof published === 'number' && tolerance > 0
			? Math.abs(reads - published) / tolerance
			: null
});
const plain = (text: string) => text.replace(/[\u00a0\u202f\u2009]/g, ' ').replace(/\u2212/g, '-');

test.each([
	[13.787, 0.02, 13.786885, '13.787 ± 0.02', '13.7869', '0.0 u'],
	[4.184, 0, 4.184, '4.184, exact', '4.1840', 'exactly'],
	['visible', 0, 'visible', 'visible', 'visible', 'exactly'],
	[2.8, 0.01, null, '2.8 ± 0.01', '–', '–']
] as const)('%s ± %s, read as %s', (published, tolerance, reads, stated, read, within) => {
	const one = row(published, tolerance, reads);
	expect(plain(statedAs(one.check))).toBe(stated);
	expect(plain(readsAs(one))).toBe(read);
	expect(plain(withinAs(one))).toBe(within);
});
