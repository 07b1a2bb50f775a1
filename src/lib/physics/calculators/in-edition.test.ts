import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../calculator.ts';
import { constants, editions } from '../constants/index.ts';
import { catalogue } from './index.ts';
import { inEdition } from './in-edition.ts';
import { runCalculator } from './run.ts';

const later = editions['2026.2'];

function outputs(id: string, inputs: RawInputs, edition = constants) {
	const result = runCalculator(inEdition(catalogue.get(id)!, edition), inputs);
	if (!result.ok) throw new Error(result.refusal.message);
	return result.outputs;
}

function apart(id: string, inputs: RawInputs, output: string): number {
	const [older, newer] = [constants, later].map(
		(edition) => outputs(id, inputs, edition)[output]!.value as number
	);
	return newer! / older! - 1;
}

/**
 * Relative moves from CODATA 2018 (Tiesinga et al. 2021, Rev. Mod. Phys. 93, 025010, table XXXI) to CODATA 2022 (Mohr et
 * al. 2025, Rev. Mod. Phys. 97, 025002), from the digits of both, worked by hand: (new − old)/old.
 */
const MOVES = {
	/** 9.109 383 7139(28) after 9.109 383 7015(28) × 10⁻³¹ kg */
	m_e: 124e-10 / 9.1093837015,
	/** 1.660 539 068 92(52) after 1.660 539 066 60(50) × 10⁻²⁷ kg */
	m_u: 232e-11 / 1.6605390666,
	/** 1.672 621 925 95(52) after 1.672 621 923 69(51) × 10⁻²⁷ kg */
	m_p: 226e-11 / 1.67262192369,
	/** 10 973 731.568 157(12) after 10 973 731.568 160(21) m⁻¹ */
	R_inf: -3e-6 / 10_973_731.56816,
	/** 8.854 187 8188(14) after 8.854 187 8128(13) × 10⁻¹² F/m */
	eps_0: 60e-10 / 8.8541878128
};

describe('a calculator that rests on measured constants reads differently in another edition', () => {
	// x_α goes with 1/(ε₀ mₑ).
	test('the coupling by Lyman α, by the electron’s mass and the vacuum’s permittivity', () => {
		const move = apart('g21.x_alpha', { J: 1e-10, z: 17 }, 'x_alpha');
		expect(move).toBeCloseTo(-(MOVES.m_e + MOVES.eps_0), 14);
		expect(Math.abs(move)).toBeGreaterThan(2e-9);
	});

	// λ goes with (1 + mₑ/m_p)/R∞; a positronium-like nucleus as heavy as an electron shows the mass alone.
	test('a line of hydrogen, by the Rydberg constant and the masses', () => {
		const ratio = 1 / 1836.15267343; // mₑ/m_p, CODATA 2018
		const wanted = -MOVES.R_inf + (ratio / (1 + ratio)) * (MOVES.m_e - MOVES.m_p);
		expect(apart('line.rydberg', { nLower: 2, nUpper: 3 }, 'wavelength')).toBeCloseTo(wanted, 15);
		const light = { nLower: 2, nUpper: 3, nucleusMass_kg: 9.2e-31 };
		const share = 9.1093837015 / (9.1093837015 + 9.2);
		expect(apart('line.rydberg', light, 'wavelength')).toBeCloseTo(share * MOVES.m_e, 12);
	});

	test.each([
		['gas.speeds', { T_K: 300, mass_u: 28 }, 'mean', -0.5 * MOVES.m_u],
		['gas.jeans', { T_K: 10, mu: 2.33, n_m3: 1e10 }, 'freefall', -0.5 * MOVES.m_u],
		['gas.jeans', { T_K: 10, mu: 2.33, n_m3: 1e10 }, 'mass', -2 * MOVES.m_u],
		['energy.convert', { value: 2, from: 'hartree', to: 'J' }, 'value', MOVES.R_inf],
		['energy.convert', { value: 2, from: 'eV', to: 'hartree' }, 'value', -MOVES.R_inf],
		['energy.convert', { value: 2, from: 'eV', to: 'J' }, 'value', 0],
		// Optical depth goes with the number of atoms, so with 1/m_u.
		[
			'g21.brightness',
			{ cosmology: { set: 'Planck18' }, z: 17, Ts_K: 7, backgroundFactor: 1 },
			'tau',
			-MOVES.m_u
		]
	])('%s of %o: %s', (id, inputs, output, wanted) => {
		expect(apart(id, inputs, output)).toBeCloseTo(wanted, 14);
	});

	test('a hartree, as each publication prints it', () => {
		const hartree = { value: 1, from: 'hartree', to: 'J' };
		// 4.359 744 722 2071(85) and 4.359 744 722 2060(48) × 10⁻¹⁸ J; the second from memory.
		expect(outputs('energy.convert', hartree).value).toMatchObject({
			value: expect.closeTo(4.3597447222071e-18, 30)
		});
		const newer = outputs('energy.convert', hartree, later).value!;
		expect((newer.value as number) * 1e18).toBeCloseTo(4.359744722206, 12);
		expect((newer.uncertainty as number) * 1e18).toBeCloseTo(4.8e-12, 13);
	});

	test('unheated gas, from a history of its own', () => {
		const gas = { cosmology: { set: 'Planck18' }, z: 20 };
		const move = Math.abs(apart('thermal.tla1', gas, 'Tk'));
		expect(move).toBeGreaterThan(1e-11);
		expect(move).toBeLessThan(1e-7);
		for (const id of ['g21.deepest', 'g21.dark_ages'])
			expect(apart(id, gas, 'dTb_exact'), id).not.toBe(0);
	});
});

describe('everything else stays', () => {
	test('in the edition in use a calculator is itself', () => {
		for (const calculator of catalogue.values())
			expect(inEdition(calculator, constants)).toBe(calculator);
	});

	test('one that rests on exact constants is the same in every edition, and following ones say so', () => {
		const following = [...catalogue.values()].filter(
			(calculator) => inEdition(calculator, later) !== calculator
		);
		expect(following.map(({ id }) => id).sort()).toEqual([
			...['energy.convert', 'g21.brightness', 'g21.dark_ages', 'g21.deepest', 'g21.tk_for_depth'],
			...['g21.x_alpha', 'g21.x_c', 'gas.jeans', 'gas.speeds', 'line.rydberg', 'thermal.tla1']
		]);
	});

	test('id, revision and declarations don’t change; the adjustment among the sources does', () => {
		const own = catalogue.get('gas.speeds')!;
		const following = inEdition(own, later);
		expect(inEdition(own, later)).toBe(following);
		const { sources, compute: _one, ...rest } = own;
		const { sources: named, compute: _other, ...same } = following;
		expect(same).toEqual(rest);
		expect(sources.at(-1)).toMatchObject({ doi: '10.1103/RevModPhys.93.025010' });
		expect(named.at(-1)).toEqual({ ...sources.at(-1), ...later.adjustment });
	});

	test('the thermal histories of two editions don’t meet in what is kept', () => {
		const gas = { cosmology: { set: 'Planck15' }, z: 30 };
		const [first, second, again] = [constants, later, constants].map(
			(edition) => outputs('thermal.tla1', gas, edition).Tk!.value
		);
		expect(second).not.toBe(first);
		expect(again).toBe(first);
	});
});
