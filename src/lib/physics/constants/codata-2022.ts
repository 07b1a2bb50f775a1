import type { Constant } from './constant.ts';
import { codata2018 } from './codata-2018.ts';

const SOURCE = 'CODATA 2022 (from memory): Mohr et al. 2025, Rev. Mod. Phys. 97, 025002';

/**
 * The later adjustment, kept for comparison and not yet tested: only four values that matter here move, the largest
 * (the Thomson cross section) by 4 × 10⁻⁹. Uncertainties are those of 2018 until the paper is read again.
 */
export const codata2022 = {
	...codata2018,
	m_e: { ...codata2018.m_e, value: 9.1093837139e-31, source: SOURCE, fromMemory: true },
	m_p: { ...codata2018.m_p, value: 1.67262192595e-27, source: SOURCE, fromMemory: true },
	sigma_T: { ...codata2018.sigma_T, value: 6.6524587051e-29, source: SOURCE, fromMemory: true },
	R_inf: { ...codata2018.R_inf, value: 10_973_731.568157, source: SOURCE, fromMemory: true }
} as const satisfies Record<string, Constant>;
