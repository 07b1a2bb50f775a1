import { afterAll, expect, test } from 'vitest';
import { readReferences } from '../../../../../tests/support/reference-cases.ts';
import { catalogue } from '../index.ts';

const all = [...catalogue.values()];
const checks = all.flatMap(({ id, checks: own }) => own.map((check) => ({ id, check })));
const computed = checks.filter(({ check }) => check.computed);

afterAll(() => {
	const publishedOf = (calculator: (typeof all)[number]) =>
		calculator.checks.filter((check) => !check.computed).length;
	process.stdout.write(
		`check values: ${checks.length - computed.length} published, ${computed.length} computed; ` +
			`${all.filter((one) => publishedOf(one) >= 3).length} of ${all.length} calculators have three published\n`
	);
});

test.each(all)('$id has at least three check values, each with its source', ({ checks: own }) => {
	expect(own.length).toBeGreaterThanOrEqual(3);
	for (const { source, verification, statement } of own) {
		expect(source).not.toBe('');
		expect(verification).not.toBe('');
		expect(statement).not.toBe('');
	}
});

test('no two have one id', () => {
	expect(new Set(checks.map(({ check }) => check.id)).size).toBe(checks.length);
});

test('a computed value names its method, and one with a reference case is that case, rounded', () => {
	const records = readReferences('reference.json');
	let held = 0;
	for (const { id, check } of computed) {
		expect(check.verification, check.id).toMatch(/^(worked with|by hand)/);
		const record = records.find(
			({ calculator, output, inputs }) =>
				calculator === id &&
				output === check.output &&
				JSON.stringify(sorted(inputs)) === JSON.stringify(sorted(check.inputs))
		);
		if (typeof record?.value !== 'number') continue;
		held += 1;
		expect(Math.abs(Number(check.published) - record.value), check.id).toBeLessThanOrEqual(
			check.tolerance
		);
	}
	expect(held).toBeGreaterThan(60);
});

function sorted(inputs: Record<string, unknown>) {
	return Object.entries(inputs).sort(([a], [b]) => (a < b ? -1 : 1));
}
