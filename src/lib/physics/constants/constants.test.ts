import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { codata2018 } from './codata-2018.ts';
import { codata2022 } from './codata-2022.ts';
import { constants, edition, EDITION_IN_USE, editions } from './index.ts';
import { movedConstants } from './moved.ts';

test('the edition in use is one of the editions, and each value names its source', () => {
	expect(editions[EDITION_IN_USE]).toBe(constants);
	for (const edition of Object.values(editions)) {
		expect(edition.adopted).toMatch(/^\d{4}-\d\d-\d\d$/);
		expect(edition.adjustment.doi).toMatch(/^10\.1103\/RevModPhys\./);
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
	expect(edition('2026.2')?.physical).toBe(codata2022);
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
});

// Two sums that each adjustment keeps by itself: R∞ = α² mₑ c/2h and σ_T = (8π/3)(α²/(4π R∞) · α)²; Tiesinga et al. 2021,
// table XXXI, and Mohr et al. 2025. The relations hold far within the rounding of the printed digits.
test.each([
	['CODATA 2018', codata2018],
	['CODATA 2022', codata2022]
])('%s agrees with itself', (_name, { m_e, alpha, R_inf, sigma_T, c, h, eps_0, e }) => {
	const rydberg = (alpha.value ** 2 * m_e.value * c.value) / (2 * h.value);
	expect(Math.abs(rydberg / R_inf.value - 1)).toBeLessThan(2e-10);
	const radius = alpha.value ** 3 / (4 * Math.PI * R_inf.value);
	expect(Math.abs(((8 * Math.PI) / 3) * (radius ** 2 / sigma_T.value) - 1)).toBeLessThan(2e-10);
	const permittivity = e.value ** 2 / (2 * alpha.value * h.value * c.value);
	expect(Math.abs(permittivity / eps_0.value - 1)).toBeLessThan(2e-10);
});

describe('what moved from one edition to another', () => {
	test('is told constant by constant, with how far', () => {
		const moved = movedConstants(editions['2026.2'], editions['2026.1']);
		expect(moved.map(({ key }) => key)).toEqual([
			...['m_e', 'm_p', 'm_u', 'alpha', 'R_inf', 'sigma_T', 'eps_0']
		]);
		// 9.109 383 7139 − 9.109 383 7015 is 124 in the last digits, of which CODATA 2018 was sure within 28.
		expect(moved[0]).toMatchObject({ here: codata2022.m_e, there: codata2018.m_e });
		expect(moved[0]!.relative).toBeCloseTo(124 / 91_093_837_015, 13);
		expect(moved[0]!.inUncertainties).toBeCloseTo(124 / 28, 4);
		expect(movedConstants(constants, constants)).toEqual([]);
	});
});

// A calculator that follows the edition takes these when it computes; one taken when the file is loaded would stay behind.
test('no calculator takes a constant that moves when its file is loaded', () => {
	const folder = new URL('../', import.meta.url);
	const still = Object.keys(codata2018).filter((key) =>
		Object.values(editions).every(
			({ physical }) =>
				physical[key as keyof typeof physical].value ===
				constants.physical[key as keyof typeof physical].value
		)
	);
	const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter(
		(file) => /^(calculators|lines)[/\\].*\.ts$/.test(file) && !file.endsWith('.test.ts')
	);
	const taken = files.flatMap((file) => {
		const code = readFileSync(new URL(file.replaceAll('\\', '/'), folder), 'utf8');
		const lists = [...code.matchAll(/\{([^{}]*)\} = constants\.physical/g)].flatMap(
			([, list = '']) => list.split(',').map((name) => name.trim())
		);
		const single = [...code.matchAll(/constants\.physical\.(\w+)/g)].map(([, name = '']) => name);
		return [...lists, ...single].map((name) => ({ file, name }));
	});
	expect(taken.length).toBeGreaterThan(20);
	expect(taken.filter(({ name }) => !still.includes(name))).toEqual([]);
});
