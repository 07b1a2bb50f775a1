import { describe, expect, test } from 'vitest';
import { seeded } from '../seeded.ts';
import { closedFormFamilies } from './closed-forms.ts';
import { compareFamily, relativeError } from './compare.ts';
import { expandingFamilies } from './expanding.ts';
import type { Answers, Family } from './family.ts';

const family: Family = {
	name: 'made-up',
	title: 'Made up',
	reference: 'nobody',
	columns: [
		{ key: 'sharp', allowed: 1e-12 },
		{
			key: 'blunt',
			allowed: 1e-12,
			limit: {
				says: 'it stops at six digits above ten',
				allowed: ({ x }) => ((x as number) > 10 ? 1e-6 : 0),
				leavesOut: true
			}
		}
	],
	rows: () => [],
	ours: ({ x }) => ({ sharp: x as number, blunt: x as number })
};

const compare = (xs: number[], answers: Answers[]) =>
	compareFamily(
		family,
		xs.map((x) => ({ x })),
		answers
	);

describe('one family', () => {
	test('keeps the worst difference of each output', () => {
		const [sharp, blunt] = compare(
			[1, 2],
			[
				{ sharp: 1, blunt: 1 },
				{ sharp: 2 + 4e-13, blunt: 2 }
			]
		);
		expect(sharp).toMatchObject({ compared: 2, faults: 0, row: null });
		expect(sharp!.relative).toBeCloseTo(2e-13, 15);
		expect(blunt!.relative).toBe(0);
	});

	test('names the first row past what is allowed', () => {
		const [sharp] = compare([1, 2, 3], [{ sharp: 1 }, { sharp: 2.1 }, { sharp: 3.3 }]);
		expect(sharp).toMatchObject({ faults: 2, row: { x: 2 } });
		expect(sharp!.relative).toBeCloseTo(0.0909, 4);
	});

	test('counts apart what the reference can’t do better, and no more than that', () => {
		const answers = [{ blunt: 20.00001 }, { blunt: 5.000001 }, { blunt: null }];
		const [, blunt] = compare([20, 5, 7], answers);
		expect(blunt).toMatchObject({ compared: 2, excused: 1, leftOut: 1, faults: 1, row: { x: 5 } });
		expect(blunt!.excusedRelative).toBeCloseTo(5e-7, 9);
	});

	test('an answer on one side alone is a fault', () => {
		const [sharp] = compare([1, NaN], [{ sharp: null }, { sharp: 1 }]);
		expect(sharp).toMatchObject({ faults: 2, relative: Infinity });
	});
});

test.each([
	[1, 1, 0],
	[0, 0, 0],
	[1, 0, Infinity],
	[-1.5, -1, 0.5]
])('%d against %d differs by %d', (ours, theirs, wanted) => {
	expect(relativeError(ours, theirs)).toBe(wanted);
});

describe('the inputs', () => {
	const all = [...expandingFamilies, ...closedFormFamilies];

	test.each(all.map((one) => [one.name, one] as const))(
		'%s repeat with their seed',
		(name, one) => {
			expect(one.rows(seeded(5), 20)).toEqual(one.rows(seeded(5), 20));
			if (name !== 'constants')
				expect(one.rows(seeded(6), 20)).not.toEqual(one.rows(seeded(5), 20));
		}
	);

	test.each(all.filter(({ name }) => name !== 'inverse').map((one) => [one.name, one] as const))(
		'%s all lie where our side answers',
		(_name, one) => {
			for (const row of one.rows(seeded(7), 40)) expect(() => one.ours(row, {})).not.toThrow();
		}
	);

	test('each family has a name of its own', () => {
		expect(new Set(all.map(({ name }) => name)).size).toBe(all.length);
	});
});
