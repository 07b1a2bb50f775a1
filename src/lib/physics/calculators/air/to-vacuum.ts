import { defineCalculator, type Computed } from '../../calculator.ts';
import {
	AIR_ASSUMPTIONS,
	AIR_SOURCES,
	AIR_WARNINGS,
	airWarnings,
	formulaInput,
	SHORTEST_IN_AIR_NM,
	vacuumOf,
	wavelengthInput
} from './refraction.ts';
import { checksOf } from '../published-checks.ts';

/** Vacuum wavelength from that in standard air, in nm (0 to 2500). Below 200 nm the value given is the vacuum value. */
export const toVacuum = defineCalculator({
	id: 'air.to_vacuum',
	revision: '1.0.0',
	title: 'Air wavelength to vacuum',
	purpose: 'An optical table prints a wavelength in air: what is it in vacuum?',
	asks: [
		'Is this wavelength in air or in vacuum?',
		'What is the vacuum wavelength of a line in an old list?'
	],
	notFor: ['Radio waves, and light that air absorbs.', 'Hot, damp or thin air.'],
	inputs: {
		air_nm: wavelengthInput('Wavelength in air', 656.28),
		formula: formulaInput
	},
	outputs: {
		vacuum: { label: 'Wavelength in vacuum', symbol: 'λ_vac', quantity: 'wavelength', unit: 'nm' }
	},
	equations: [
		{
			tex: '\\lambda_\\mathrm{vac} = n(\\lambda_\\mathrm{vac})\\,\\lambda_\\mathrm{air}',
			says: 'The wave is longer in vacuum by the refraction of air, found step by step since that hangs on the answer.'
		}
	],
	assumptions: AIR_ASSUMPTIONS,
	warnings: AIR_WARNINGS,
	sources: AIR_SOURCES,
	checks: checksOf('air.to_vacuum'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ air_nm, formula }): Computed {
		const vacuum = air_nm < SHORTEST_IN_AIR_NM ? air_nm : vacuumOf(air_nm, formula);
		return { ok: true, values: { vacuum }, warnings: airWarnings(air_nm) };
	}
});
