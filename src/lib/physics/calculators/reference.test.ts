import { readFileSync } from 'node:fs';
import { afterAll, describe, expect, test } from 'vitest';
import type { RawInputs } from '../calculator.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';

interface ReferenceCase {
	id: string;
	calculator: string;
	inputs: RawInputs;
	output: string;
	value: number | string | null;
	unit: string;
	relTol: number | null;
	absTol?: number;
	expect?: 'domain_error' | 'domain_warning';
	source: string;
	howComputed?: string;
}

interface PublishedRecord {
	id: string;
	calculator: string;
	publishedValue: number;
	publishedUncertaintyOrTolerance: number;
	outputScale: number;
	unit: string;
	source: string;
}

function read<T>(name: string): T[] {
	return JSON.parse(
		readFileSync(new URL(`../../../../tests/references/${name}`, import.meta.url), 'utf8')
	) as T[];
}

const ran: Record<string, number> = {};

/** The tolerance asked of the expanding universe is far tighter than the file's: 1e-11. */
const TIGHT = 1e-11;

describe.each(['reference.json', 'cosmology-quadrature.json'])('%s', (file) => {
	const cases = read<ReferenceCase>(file).filter((one) => catalogue.has(one.calculator));

	test.each(cases.map((one) => [one.id, one.calculator, one.output, one] as const))(
		'%s %s %s',
		(_id, calculator, output, one) => {
			ran[file] = (ran[file] ?? 0) + 1;
			const result = runCalculator(catalogue.get(calculator)!, one.inputs);
			if (one.expect === 'domain_error') {
				expect(result.ok).toBe(false);
				return;
			}
			if (!result.ok) throw new Error(result.refusal.message);
			const reading = result.outputs[output];
			expect(reading?.unit).toBe(one.unit);
			if (one.expect === 'domain_warning') {
				expect(result.validity).not.toBe('ok');
				expect(result.warnings.length).toBeGreaterThan(0);
			}
			if (typeof one.value !== 'number') {
				expect(reading?.value).toBe(one.value);
				return;
			}
			const off = Math.abs((reading?.value as number) - one.value);
			const stated = one.relTol ?? 0;
			const relative = calculator.startsWith('cosmo.') ? Math.min(TIGHT, stated) : stated;
			expect(off).toBeLessThanOrEqual(Math.max(relative * Math.abs(one.value), one.absTol ?? 0));
		}
	);

	test('holds cases for these calculators', () => {
		expect(cases.length).toBeGreaterThan(30);
	});
});

afterAll(() => {
	for (const [file, count] of Object.entries(ran))
		process.stdout.write(`${file}: ${count} cases ran\n`);
});

describe('published values', () => {
	const records = new Map(
		read<PublishedRecord>('published-checks.json').map((record) => [record.id, record])
	);
	const checks = [...catalogue.values()].flatMap((calculator) =>
		calculator.checks.map((check) => ({ calculator, check }))
	);

	test('every published value for these calculators is shown by its calculator', () => {
		const wanted = [...records.values()]
			.filter((record) => catalogue.has(record.calculator))
			.map((record) => record.id);
		expect(checks.map(({ check }) => check.id).sort()).toEqual(wanted.sort());
	});

	test.each(checks.map((one) => [one.check.id, one.check.statement, one] as const))(
		'%s %s',
		(id, _statement, one) => {
			const { calculator, check } = one;
			const record = records.get(id);
			expect(record).toMatchObject({
				publishedValue: check.published,
				publishedUncertaintyOrTolerance: check.tolerance,
				outputScale: check.outputScale,
				unit: check.unit
			});
			const result = runCalculator(calculator, check.inputs);
			if (!result.ok) throw new Error(result.refusal.message);
			const value = (result.outputs[check.output]?.value as number) * check.outputScale;
			expect(Math.abs(value - check.published)).toBeLessThanOrEqual(check.tolerance);
		}
	);
});
