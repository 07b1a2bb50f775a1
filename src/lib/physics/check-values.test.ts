import { describe, expect, test } from 'vitest';
import { catalogue } from './calculators/index.ts';
import { checkRows } from './check-values.ts';

const withChecks = [...catalogue.values()].filter(({ checks }) => checks.length > 0);

describe('check values', () => {
	test.each(withChecks.map((calculator) => [calculator.id, calculator] as const))(
		'%s agrees with all of its own',
		(_id, calculator) => {
			for (const { check, agrees, within } of checkRows(calculator)) {
				expect(agrees, check.id).toBe(true);
				if (within !== null) expect(within, check.id).toBeLessThanOrEqual(1);
			}
		}
	);

	test('one that is off is said to be, by how much', () => {
		const atZ = catalogue.get('cosmo.at_z')!;
		const [first] = atZ.checks;
		const off = { ...first!, published: Number(first!.published) + 3 * first!.tolerance };
		const [row] = checkRows({ ...atZ, checks: [off] });
		expect(row!.agrees).toBe(false);
		expect(row!.within).toBeGreaterThan(2);
	});

	test('words agree when they are the same', () => {
		const band = catalogue.get('line.band')!;
		const [first] = band.checks;
		expect(checkRows({ ...band, checks: [first!] })[0]).toMatchObject({
			reads: 'visible',
			agrees: true,
			within: null
		});
		const [row] = checkRows({ ...band, checks: [{ ...first!, published: 'radio' }] });
		expect(row!.agrees).toBe(false);
	});

	test('a refusal is no agreement', () => {
		const atZ = catalogue.get('cosmo.at_z')!;
		const refused = { ...atZ.checks[0]!, inputs: { z: -5, cosmology: { set: 'Planck18' } } };
		const [row] = checkRows({ ...atZ, checks: [refused] });
		expect(row).toMatchObject({ reads: null, agrees: false, within: null });
		expect(row!.refusal).toBeTruthy();
	});
});
