import { defineCalculator, type Computed } from '../../calculator.ts';
import {
	beyondTurnaround,
	COSMOLOGY_ASSUMPTIONS,
	COSMOLOGY_SOURCES,
	COSMOLOGY_WARNINGS,
	cosmologyInput,
	cosmologyWarnings,
	redshiftInput,
	universeWithPast
} from './limits.ts';
import { checksOf } from '../published-checks.ts';

/** Energy of all neutrinos compared with that of the photons, and as a share of the critical density. */
export const omegaNu = defineCalculator({
	id: 'cosmo.omega_nu',
	revision: '1.0.0',
	title: 'Share of neutrinos',
	purpose: 'How much energy do the neutrinos of an expanding universe carry, beside its light?',
	asks: ['How much of the Universe is neutrinos?', 'Did neutrinos ever outweigh light?'],
	notFor: [
		'The masses themselves, which this takes as given.',
		'The first minutes after the Big Bang.'
	],
	inputs: { cosmology: cosmologyInput, z: redshiftInput('Redshift', 0) },
	outputs: {
		nu_relative_density: {
			label: 'Energy of neutrinos for each unit of the photons’',
			symbol: 'r_ν',
			quantity: 'density-ratio',
			unit: ''
		},
		Onu: { label: 'Share of neutrinos then', symbol: 'Ω_ν', quantity: 'density-share', unit: '' }
	},
	equations: [
		{
			tex: 'r_\\nu(z) = 0.2271\\,\\frac{N_\\mathrm{eff}}{n}\\left[n_0 + \\sum_i \\left(1+\\left(\\frac{0.3173\\,m_i}{k T_\\nu\\,(1+z)}\\right)^{1.83}\\right)^{1/1.83}\\right]',
			says: 'Each species weighs as light does while it is hot, and as its mass does once it has cooled.'
		}
	],
	assumptions: COSMOLOGY_ASSUMPTIONS,
	warnings: COSMOLOGY_WARNINGS,
	sources: COSMOLOGY_SOURCES,
	checks: checksOf('cosmo.omega_nu'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ cosmology, z }): Computed {
		const opened = universeWithPast(cosmology);
		if (!opened.ok) return opened;
		const { universe } = opened;
		const stopped = beyondTurnaround(universe, z, 'z');
		if (stopped) return stopped;
		const u = 1 + z;
		const ratio = universe.neutrinoRatio(u);
		return {
			ok: true,
			values: {
				nu_relative_density: ratio,
				Onu: (universe.Ogamma0 * ratio * u ** 4) / universe.E2(u)
			},
			warnings: cosmologyWarnings(universe, z)
		};
	}
});
