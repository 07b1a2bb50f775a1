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
	/** What was published of its age and how well it is known; null where the numbers are a convention. */
	published: {
		ageGyr: number;
		ageUncertaintyGyr: number;
		uncertainties: ParameterUncertainties;
		/**
		 * Correlation of H₀ with Ωₘ in the fit. The two are strongly tied, so without it nothing that rests on both has an
		 * honest uncertainty: null where the house doesn't hold it.
		 */
		correlation: { H0WithOm0: number; source: string } | null;
		note: string;
	} | null;
	source: string;
}

/** Standard uncertainties of a set's parameters, in their own units. What isn't here is a choice of the model. */
export interface ParameterUncertainties {
	/** km/s/Mpc */
	H0: number;
	Om0?: number;
	/** K */
	Tcmb0?: number;
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
			uncertainties: { H0: 0.42, Om0: 0.0056, Tcmb0: 0.0006 },
			correlation: { H0WithOm0: -0.98, source: 'from memory, about −0.98' },
			note: 'Age, H₀ and Ωₘ as printed in table 2, last column; the background’s temperature from Fixsen 2009, ApJ 707, 916 (from memory), measured apart from the rest.'
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
			uncertainties: { H0: 0.46 },
			correlation: null,
			note: 'Uncertainties from memory; how H₀ and Ωₘ move together isn’t held.'
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
			uncertainties: { H0: 0.77 },
			correlation: null,
			note: 'Uncertainties from memory; how H₀ and Ωₘ move together isn’t held.'
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
			uncertainties: { H0: 0.8 },
			correlation: null,
			note: 'Uncertainties from memory; how H₀ and Ωₘ move together isn’t held.'
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
