import { afterAll, describe, expect, test } from 'vitest';
import {
	faultOf,
	readReferences,
	REFERENCE_TABLES
} from '../../../../tests/support/reference-cases.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';

interface PublishedRecord {
	id: string;
	calculator: string;
	publishedValue: number;
	publishedUncertaintyOrTolerance: number;
	outputScale: number;
	unit: string;
	source: string;
}

const ran: Record<string, number> = {};

describe.each(REFERENCE_TABLES)('%s', (file) => {
	const cases = readReferences(file);

	test.each(cases.map((one) => [one.id, one.calculator, one.output, one] as const))(
		'%s %s %s',
		(_id, calculator, _output, one) => {
			ran[file] = (ran[file] ?? 0) + 1;
			expect(faultOf(one, runCalculator(catalogue.get(calculator)!, one.inputs))).toBeNull();
		}
	);

	test('holds cases for these calculators', () => {
		expect(cases.length).toBeGreaterThan(30);
	});
});

afterAll(() => {
	for (const [file, count] of Object.entries(ran))
		process.stdout.write(`${file}: ${count} cases ran in Node\n`);
});

describe('published values', () => {
	const records = new Map(
		readReferences<PublishedRecord>('published-checks.json').map((record) => [record.id, record])
	);
	/** Those of the table; the ones of checks/ have no second transcription to be held against. */
	const checks = [...catalogue.values()].flatMap((calculator) =>
		calculator.checks.filter(({ id }) => records.has(id)).map((check) => ({ calculator, check }))
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
			expect(Math.abs(value - Number(check.published))).toBeLessThanOrEqual(check.tolerance);
		}
	);
});
