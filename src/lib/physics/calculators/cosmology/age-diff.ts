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
import { timeOver } from './integrals.ts';
import { checksOf } from '../published-checks.ts';

/** Time between two redshifts, in Myr, whichever comes first. Integrated directly, so that near redshifts lose no digits. */
export const ageDiff = defineCalculator({
	id: 'cosmo.age_diff',
	revision: '1.0.0',
	title: 'Time between two redshifts',
	purpose: 'How much time passed while the redshift fell from one value to another?',
	asks: ['How long did this take?', 'How much older was the Universe by then?'],
	notFor: ['Sources nearer than about 100 megaparsecs.', 'The first minutes after the Big Bang.'],
	inputs: {
		cosmology: cosmologyInput,
		z1: { ...redshiftInput('First redshift', 6), symbol: 'z_1' },
		z2: { ...redshiftInput('Second redshift', 10), symbol: 'z_2' }
	},
	outputs: {
		duration: { label: 'Time between them', symbol: 'Δt', quantity: 'duration', unit: 'Myr' }
	},
	restsOnCosmology: ['duration'],
	equations: [
		{
			tex: '\\Delta t = \\frac{1}{H_0}\\left|\\int_{z_1}^{z_2} \\frac{\\mathrm{d}z}{(1+z)\\,E(z)}\\right|',
			says: 'The time between is added up over the expansion that lies between.'
		}
	],
	assumptions: COSMOLOGY_ASSUMPTIONS,
	warnings: COSMOLOGY_WARNINGS,
	sources: COSMOLOGY_SOURCES,
	checks: checksOf('cosmo.age_diff'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ cosmology, z1, z2 }): Computed {
		const opened = universeWithPast(cosmology);
		if (!opened.ok) return opened;
		const { universe } = opened;
		const stopped = beyondTurnaround(universe, z1, 'z1') ?? beyondTurnaround(universe, z2, 'z2');
		if (stopped) return stopped;
		const x1 = Math.log1p(z1);
		// ln((1+z₂)/(1+z₁)) from the difference, which is exact for near redshifts.
		const width = Math.log1p((z2 - z1) / (1 + z1));
		const time = Math.abs(timeOver(universe, x1, width));
		return {
			ok: true,
			values: { duration: time * universe.hubbleTimeGyr * 1000 },
			warnings: [...cosmologyWarnings(universe, z1), ...cosmologyWarnings(universe, z2)]
		};
	}
});
