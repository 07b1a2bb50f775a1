import type { Constant } from './constant.ts';

const SOURCE =
	'CODATA 2018: Tiesinga et al. 2021, Rev. Mod. Phys. 93, 025010, doi:10.1103/RevModPhys.93.025010';
const SI = 'Fixed by the SI, 2019 (SI Brochure, 9th edition); listed in CODATA 2018';

const h = 6.62607015e-34;
const c = 299_792_458;
const k = 1.380649e-23;

/** The set every calculator is tested with. */
export const codata2018 = {
	c: { name: 'speed of light in vacuum', value: c, unit: 'm/s', uncertainty: 'exact', source: SI },
	h: { name: 'Planck constant', value: h, unit: 'J s', uncertainty: 'exact', source: SI },
	k: { name: 'Boltzmann constant', value: k, unit: 'J/K', uncertainty: 'exact', source: SI },
	e: {
		name: 'elementary charge',
		value: 1.602176634e-19,
		unit: 'C',
		uncertainty: 'exact',
		source: SI
	},
	N_A: {
		name: 'Avogadro constant',
		value: 6.02214076e23,
		unit: '1/mol',
		uncertainty: 'exact',
		source: SI
	},
	G: {
		name: 'Newtonian constant of gravitation',
		value: 6.6743e-11,
		unit: 'm3/(kg s2)',
		uncertainty: 1.5e-15,
		source: SOURCE
	},
	m_e: {
		name: 'electron mass',
		value: 9.1093837015e-31,
		unit: 'kg',
		uncertainty: 2.8e-40,
		source: SOURCE
	},
	m_p: {
		name: 'proton mass',
		value: 1.67262192369e-27,
		unit: 'kg',
		uncertainty: 5.1e-37,
		source: SOURCE
	},
	m_u: {
		name: 'atomic mass constant',
		value: 1.6605390666e-27,
		unit: 'kg',
		uncertainty: 5e-37,
		source: SOURCE
	},
	alpha: {
		name: 'fine-structure constant',
		value: 7.2973525693e-3,
		unit: '',
		uncertainty: 1.1e-12,
		source: SOURCE
	},
	R_inf: {
		name: 'Rydberg constant',
		value: 10_973_731.56816,
		unit: '1/m',
		uncertainty: 2.1e-5,
		source: SOURCE
	},
	sigma_T: {
		name: 'Thomson cross section',
		value: 6.6524587321e-29,
		unit: 'm2',
		uncertainty: 6e-38,
		source: SOURCE
	},
	eps_0: {
		name: 'vacuum electric permittivity',
		value: 8.8541878128e-12,
		unit: 'F/m',
		uncertainty: 1.3e-21,
		source: SOURCE
	},
	g_0: {
		name: 'standard acceleration of gravity',
		value: 9.80665,
		unit: 'm/s2',
		uncertainty: 'exact',
		source: 'Adopted by the 3rd CGPM, 1901; listed in CODATA 2018'
	},
	sigma: {
		name: 'Stefan–Boltzmann constant',
		value: (2 * Math.PI ** 5 * k ** 4) / (15 * h ** 3 * c ** 2),
		unit: 'W/(m2 K4)',
		uncertainty: 'exact',
		source: 'Computed from the exact h, c and k: 2π⁵k⁴/(15h³c²)'
	}
} as const satisfies Record<string, Constant>;
