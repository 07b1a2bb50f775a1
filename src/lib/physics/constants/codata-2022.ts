import { codata2018 } from './codata-2018.ts';
import type { Adjusted, Constant } from './constant.ts';

const SOURCE =
	'CODATA 2022: Mohr et al. 2025, Rev. Mod. Phys. 97, 025002, doi:10.1103/RevModPhys.97.025002';
const VERIFICATION =
	'Recalled, then matched with its uncertainty in public transcriptions of the table that NIST issues.';

/**
 * The later adjustment. What the SI fixes and G stay; the largest move that matters here (the Thomson cross section) is
 * 4 × 10⁻⁹.
 */
export const codata2022 = {
	...codata2018,
	m_e: moved(codata2018.m_e, 9.1093837139e-31, 2.8e-40),
	m_p: moved(codata2018.m_p, 1.67262192595e-27, 5.2e-37),
	m_u: moved(codata2018.m_u, 1.66053906892e-27, 5.2e-37),
	alpha: moved(codata2018.alpha, 7.2973525643e-3, 1.1e-12),
	R_inf: moved(codata2018.R_inf, 10_973_731.568157, 1.2e-5),
	sigma_T: moved(codata2018.sigma_T, 6.6524587051e-29, 6.2e-38),
	eps_0: moved(codata2018.eps_0, 8.8541878188e-12, 1.4e-21)
} as const satisfies { [K in keyof typeof codata2018]: Adjusted<(typeof codata2018)[K]> };

function moved(older: Constant, value: number, uncertainty: number) {
	const { name, unit } = older;
	return { name, value, unit, uncertainty, source: SOURCE, verification: VERIFICATION };
}
