import { catalogue } from '$lib/physics/calculators/index.ts';
import { describe, expect, test } from 'vitest';
import { workPoints } from './plot-run.ts';
import { describeLine, stretches, stretchWords } from './plot-words.ts';
import { fileName, pointsCsv } from './points-csv.ts';

const atZ = catalogue.get('cosmo.at_z')!;
const breathe = async () => undefined;

describe('a line', () => {
	const order = {
		inputs: { cosmology: { set: 'Planck18' }, z: 0 },
		sweep: { input: 'z', output: 'age', from: -2, to: 20, log: false },
		whole: false
	};

	test('is worked in 200 points; refused ones are gaps with their reason', async () => {
		const points = (await workPoints(atZ, order, breathe, () => true))!;
		expect(points).toHaveLength(200);
		const refused = points.filter(({ y }) => y === null);
		expect(refused.every(({ x, refusal }) => x <= -1 && refusal)).toBe(true);
		expect(refused.length).toBeGreaterThan(5);
		// Between redshifts the age falls with every step.
		const ages = points.flatMap(({ x, y }) => (x >= 0 && y !== null ? [y] : []));
		expect(ages.every((age, index) => index === 0 || age < ages[index - 1]!)).toBe(true);
	});

	test('is given up as soon as nobody wants it', async () => {
		let asked = 0;
		const points = await workPoints(atZ, order, breathe, () => ++asked < 1);
		expect(points).toBeNull();
	});

	test('goes into a file with its provenance, its units and every digit', async () => {
		const points = (await workPoints(atZ, order, breathe, () => true))!;
		const text = pointsCsv({
			calculator: atZ,
			constants: '2026.1',
			inputs: order.inputs,
			sweep: order.sweep,
			along: { label: 'Redshift', unit: '' },
			points
		});
		const lines = text.split('\r\n');
		expect(lines[0]).toBe(
			`"# calculator: Expanding universe (cosmo.at_z), revision ${atZ.revision}"`
		);
		expect(lines).toContain('# constants: edition 2026.1');
		expect(lines).toContain('# setting: Expanding universe (cosmology) = set Planck18');
		expect(lines.some((line) => line.includes('(z) ='))).toBe(false);
		const head = lines.findIndex((line) => !/^"?#/.test(line));
		expect(lines[head]).toBe('Redshift,Age after the Big Bang (Gyr),Note');
		const rows = lines.slice(head + 1, -1);
		expect(rows).toHaveLength(200);
		expect(rows[0]).toMatch(/^-2,,/);
		const last = points.at(-1)!;
		expect(rows.at(-1)).toMatch(new RegExp(`^20,${String(last.y)},`));
		expect(fileName({ calculator: atZ, sweep: order.sweep })).toBe(
			`cosmo.at_z-${atZ.revision}-age-by-z.csv`
		);
	});
});

describe('its words', () => {
	const points = [
		{ x: 0, y: null, refusal: 'Too low.' },
		{ x: 1, y: 5 },
		{ x: 2, y: 1 },
		{ x: 3, y: 4, warnings: ['Far out.'] },
		{ x: 4, y: null, refusal: 'Too high.' },
		{ x: 5, y: null, refusal: 'Too high still.' }
	];

	test('tell the ends and what lies beyond them', () => {
		expect(describeLine(points)).toBe('From 5 at 1 to 4 at 3. Lowest: 1 at 2.');
		expect(describeLine([])).toMatch(/no reading/);
	});

	test('tell where there is none, with the first reason', () => {
		const gaps = stretches(points, ({ refusal }) => refusal);
		expect(gaps).toEqual([
			{ from: 0, to: 0, message: 'Too low.' },
			{ from: 4, to: 5, message: 'Too high.' }
		]);
		expect(gaps.map((gap) => stretchWords(gap, 'm'))).toEqual([
			'at 0\u00a0m',
			'from 4 to 5\u00a0m'
		]);
	});
});
