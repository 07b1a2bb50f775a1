import type { Constant } from './constant.ts';
import { codata2018 } from './codata-2018.ts';

const SOURCE =
	'CODATA 2022: Mohr et al. 2025, Rev. Mod. Phys. 97, 025002, doi:10.1103/RevModPhys.97.025002';

/**
 * The later adjustment, kept beside the one in use: what the SI fixes and G stay, the largest move that matters here
 * (the Thomson cross section) is 4 × 10⁻⁹. Recalled, not read again from the paper.
 */
export const codata2022 = {
	...codata2018,
	m_e: recalled(codata2018.m_e, 9.1093837139e-31, 2.8e-40),
	m_p: recalled(codata2018.m_p, 1.67262192595e-27, 5.2e-37),
	m_u: recalled(codata2018.m_u, 1.66053906892e-27, 5.2e-37),
	alpha: recalled(codata2018.alpha, 7.2973525643e-3, 1.1e-12),
	R_inf: recalled(codata2018.R_inf, 10_973_731.568157, 1.2e-5),
	sigma_T: recalled(codata2018.sigma_T, 6.6524587051e-29, 6.2e-38),
	eps_0: recalled(codata2018.eps_0, 8.8541878188e-12, 1.4e-21)
} as const satisfies Record<keyof typeof codata2018, Constant>;

function recalled<C extends Constant>(older: C, value: number, uncertainty: number) {
	return {
		name: older.name,
		value,
		unit: older.unit,
		uncertainty,
		source: SOURCE,
		fromMemory: true
	};
}
