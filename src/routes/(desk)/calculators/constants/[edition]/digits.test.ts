import { editions } from '$lib/physics/constants/index.ts';
import { expect, test } from 'vitest';
import { conciseDigits, signed } from './digits.ts';

const spaced = (text: string) => text.replace(/[\u202f\u00a0]/g, ' ');

// As printed in CODATA 2018 (Tiesinga et al. 2021, table XXXI), and CODATA 2022 (Mohr et al. 2025; from memory).
test.each([
	['2026.1', 'G', '6.674 30(15) × 10⁻¹¹'],
	['2026.1', 'm_e', '9.109 383 7015(28) × 10⁻³¹'],
	['2026.1', 'm_u', '1.660 539 066 60(50) × 10⁻²⁷'],
	['2026.1', 'R_inf', '10 973 731.568 160(21)'],
	['2026.1', 'sigma_T', '6.652 458 7321(60) × 10⁻²⁹'],
	['2026.2', 'm_e', '9.109 383 7139(28) × 10⁻³¹'],
	['2026.2', 'R_inf', '10 973 731.568 157(12)'],
	['2026.2', 'eps_0', '8.854 187 8188(14) × 10⁻¹²']
] as const)('%s: %s is %s', (edition, key, printed) => {
	expect(spaced(conciseDigits(editions[edition].physical[key]))).toBe(printed);
});

test('an exact constant has no brackets', () => {
	expect(conciseDigits({ value: 9.80665, uncertainty: 'exact' })).toBe('9.80665');
});

test('a move has its sign', () => {
	expect(spaced(signed(1.36e-9))).toBe('+1.4 × 10⁻⁹');
	expect(spaced(signed(-0.142857))).toBe('−0.14');
});
