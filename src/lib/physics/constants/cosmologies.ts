/** Published parameter sets of an expanding universe, as the calculators use them. */

export interface CosmologySet {
	label: string;
	/** km/s/Mpc */
	H0: number;
	/** Baryons and cold dark matter, without neutrinos: the papers' Ωm is higher by the neutrinos' share. */
	Om0: number;
	Ob0: number;
	/** K; 0 for a universe without radiation. */
	Tcmb0: number;
	Neff: number;
	/** eV, one for each species; a single value stands for all species. */
	m_nu: readonly number[];
	/** Standard uncertainties as published; null where the numbers are a convention. */
	published: {
		ageGyr: number;
		ageUncertaintyGyr: number;
		H0Uncertainty: number;
		note: string;
	} | null;
	source: string;
}

export const cosmologySets = {
	Planck18: {
		label: 'Planck 2018',
		H0: 67.66,
		Om0: 0.30966,
		Ob0: 0.04897,
		Tcmb0: 2.7255,
		Neff: 3.046,
		m_nu: [0, 0, 0.06],
		published: {
			ageGyr: 13.787,
			ageUncertaintyGyr: 0.02,
			H0Uncertainty: 0.42,
			note: 'Age and H₀ as printed in table 2, last column.'
		},
		source:
			'Planck Collaboration 2020, Planck 2018 results VI, A&A 641, A6, table 2, last column (TT,TE,EE+lowE+lensing+BAO), doi:10.1051/0004-6361/201833910'
	},
	Planck15: {
		label: 'Planck 2015',
		H0: 67.74,
		Om0: 0.3075,
		Ob0: 0.0486,
		Tcmb0: 2.7255,
		Neff: 3.046,
		m_nu: [0, 0, 0.06],
		published: {
			ageGyr: 13.799,
			ageUncertaintyGyr: 0.021,
			H0Uncertainty: 0.46,
			note: 'Uncertainties from memory.'
		},
		source:
			'Planck Collaboration 2016, Planck 2015 results XIII, A&A 594, A13, table 4, doi:10.1051/0004-6361/201525830'
	},
	Planck13: {
		label: 'Planck 2013',
		H0: 67.77,
		Om0: 0.30712,
		Ob0: 0.048252,
		Tcmb0: 2.7255,
		Neff: 3.046,
		m_nu: [0, 0, 0.06],
		published: {
			ageGyr: 13.7965,
			ageUncertaintyGyr: 0.037,
			H0Uncertainty: 0.77,
			note: 'Uncertainties from memory.'
		},
		source:
			'Planck Collaboration 2014, Planck 2013 results XVI, A&A 571, A16, table 5, doi:10.1051/0004-6361/201321591'
	},
	WMAP9: {
		label: 'WMAP, nine years',
		H0: 69.32,
		Om0: 0.2865,
		Ob0: 0.04628,
		Tcmb0: 2.725,
		Neff: 3.04,
		m_nu: [0],
		published: {
			ageGyr: 13.772,
			ageUncertaintyGyr: 0.059,
			H0Uncertainty: 0.8,
			note: 'Uncertainties from memory.'
		},
		source: 'Hinshaw et al. 2013, ApJS 208, 19, table 4, doi:10.1088/0067-0049/208/2/19'
	},
	Simple: {
		label: 'Round numbers',
		H0: 70,
		Om0: 0.3,
		Ob0: 0.05,
		Tcmb0: 0,
		Neff: 0,
		m_nu: [0],
		published: null,
		source: 'Round numbers for a flat universe without radiation; a convention, not a measurement'
	}
} as const satisfies Record<string, CosmologySet>;

export type CosmologySetName = keyof typeof cosmologySets;
