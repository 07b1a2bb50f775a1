import { defineCalculator, type Computed } from '../../calculator.ts';
import { checksOf } from '../published-checks.ts';
import {
	AIR_ASSUMPTIONS,
	AIR_SOURCES,
	AIR_WARNINGS,
	airWarnings,
	formulaInput,
	refractivity,
	SHORTEST_IN_AIR_NM,
	wavelengthInput
} from './refraction.ts';

/**
 * Wavelength in standard air from that in vacuum, in nm (0 to 2500): λ/n. Below 200 nm the vacuum value is given back,
 * with a warning, and no refraction.
 */
export const fromVacuum = defineCalculator({
	id: 'air.from_vacuum',
	revision: '1.0.0',
	title: 'Vacuum wavelength to air',
	purpose:
		'A line has this wavelength in vacuum: what do optical tables, made in air, print for it?',
	asks: [
		'Why do two lists give a line different wavelengths?',
		'What is the wavelength of hydrogen alpha in air?',
		'How much does air bend light?'
	],
	notFor: ['Radio waves, and light that air absorbs.', 'Hot, damp or thin air.'],
	inputs: {
		vacuum_nm: wavelengthInput('Wavelength in vacuum', 656.4614),
		formula: formulaInput
	},
	outputs: {
		air: { label: 'Wavelength in air', symbol: 'λ_air', quantity: 'wavelength', unit: 'nm' },
		n_minus_1: {
			label: 'Refractive index less one',
			symbol: 'n−1',
			quantity: 'refractivity',
			unit: ''
		}
	},
	equations: [
		{
			tex: '\\lambda_\\mathrm{air} = \\frac{\\lambda_\\mathrm{vac}}{n(\\lambda_\\mathrm{vac})}',
			says: 'Light is slower in air, so its waves are shorter there.'
		},
		{
			tex: '(n-1)\\,10^8 = \\frac{5\\,792\\,105}{238.0185-\\sigma^2}+\\frac{167\\,917}{57.362-\\sigma^2}',
			says: 'The refraction of air, with σ the number of waves in a micrometre (Ciddor).'
		}
	],
	assumptions: AIR_ASSUMPTIONS,
	warnings: AIR_WARNINGS,
	sources: AIR_SOURCES,
	checks: checksOf('air.from_vacuum'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ vacuum_nm, formula }): Computed {
		const warnings = airWarnings(vacuum_nm);
		if (vacuum_nm < SHORTEST_IN_AIR_NM) {
			return {
				ok: true,
				values: { air: vacuum_nm },
				withheld: {
					n_minus_1: {
						code: 'no-formula',
						message: 'No formula covers waves shorter than 200 nanometres. Give a longer one.'
					}
				},
				warnings
			};
		}
		const n_minus_1 = refractivity(vacuum_nm, formula);
		return { ok: true, values: { air: vacuum_nm / (1 + n_minus_1), n_minus_1 }, warnings };
	}
});
