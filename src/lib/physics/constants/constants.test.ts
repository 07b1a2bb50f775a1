import { expect, test } from 'vitest';
import { constants, EDITION_IN_USE, editions } from './index.ts';

test('the edition in use is one of the editions, and each value names its source', () => {
	expect(editions[EDITION_IN_USE]).toBe(constants);
	for (const edition of Object.values(editions)) {
		expect(edition.adopted).toMatch(/^\d{4}-\d\d-\d\d$/);
		for (const constant of [
			...Object.values(edition.physical),
			...Object.values(edition.astronomical)
		]) {
			expect(constant.source, constant.name).not.toBe('');
			if (constant.uncertainty !== 'exact') expect(constant.uncertainty).toBeGreaterThan(0);
		}
		for (const set of Object.values(edition.cosmologies)) expect(set.source).not.toBe('');
	}
});

// CODATA 2018, table XXXI, as printed: 5.670 374 419... × 10⁻⁸ W m⁻² K⁻⁴.
test('the Stefan–Boltzmann constant follows from h, c and k', () => {
	expect(constants.physical.sigma.value).toBeCloseTo(5.670374419e-8, 17);
});

// IAU 2015 Resolution B2: one parsec is 3.085 677 581... × 10¹⁶ m.
test('the parsec follows from the astronomical unit', () => {
	expect(constants.astronomical.pc.value / 1e16).toBeCloseTo(3.085677581, 8);
});
