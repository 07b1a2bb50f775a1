import { expect, test } from 'vitest';
import { codata2018 } from './codata-2018.ts';
import { codata2022 } from './codata-2022.ts';
import { editionPage } from './edition-page.ts';
import { constants, edition, EDITION_IN_USE, editions } from './index.ts';

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

test('an edition is found by its name, and by nothing else', () => {
	expect(edition(EDITION_IN_USE)).toBe(constants);
	for (const name of ['', '2025.9', 'toString', '__proto__']) expect(edition(name)).toBeUndefined();
});

// What the SI fixes doesn’t move, and the rest by a few parts in 10⁹ and less than five of the older standard
// uncertainties: a slip of a digit in recalling a value would show.
test('CODATA 2022 stands beside 2018, key by key, and hardly moved', () => {
	expect(Object.keys(codata2022)).toEqual(Object.keys(codata2018));
	for (const [key, older] of Object.entries(codata2018)) {
		const newer = codata2022[key as keyof typeof codata2018];
		expect(newer.unit, key).toBe(older.unit);
		if (older.uncertainty === 'exact') {
			expect(newer, key).toEqual(older);
			continue;
		}
		expect(Math.abs(newer.value / older.value - 1), key).toBeLessThan(5e-9);
		expect(Math.abs(newer.value - older.value), key).toBeLessThan(5 * older.uncertainty);
	}
	expect(codata2022.sigma_T.fromMemory).toBe(true);
});

test('an edition’s page tells of every value how well it is known, from where, and how it was checked', () => {
	const page = editionPage(constants);
	expect(page).toMatchObject({ name: EDITION_IN_USE, inUse: true });
	const groups = [...page.groups, ...page.beside];
	for (const { title, rows } of groups) {
		expect(rows.length, title).toBeGreaterThan(0);
		for (const row of rows) {
			expect(Number.isFinite(row.value), row.name).toBe(true);
			expect(row.source, row.name).not.toBe('');
			expect(row.verification, row.name).toMatch(/[.]$/);
		}
	}
	const planck = page.groups.find(({ title }) => title === 'Planck 2018');
	expect(planck?.rows.find(({ symbol }) => symbol === 'age')).toMatchObject({
		value: 13.787,
		uncertainty: 0.02,
		unit: 'Gyr'
	});
	expect(planck?.notes.join(' ')).toMatch(/−0.98 \(from memory/);
	expect(page.beside[0]?.rows.map(({ symbol }) => symbol)).toEqual([
		'm_e',
		'm_p',
		'm_u',
		'alpha',
		'R_inf',
		'sigma_T',
		'eps_0'
	]);
	expect(page.beside[0]?.rows.every(({ verification }) => /memory/.test(verification))).toBe(true);
});
