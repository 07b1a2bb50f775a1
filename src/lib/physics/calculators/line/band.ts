import { defineCalculator, type Computed } from '../../calculator.ts';
import { bandOf } from './bands.ts';
import { checksOf } from '../published-checks.ts';

/** The part of the spectrum a vacuum wavelength (nm, above 0) lies in, by the convention of `bands.ts`. */
export const band = defineCalculator({
	id: 'line.band',
	revision: '1.0.0',
	title: 'Part of the spectrum',
	purpose: 'Is light of this wavelength visible, infrared, radio or something else?',
	asks: ['What kind of light is this?', 'Could an eye see it?'],
	notFor: ['Legal radio allocations.', 'What a given eye sees near the edges of the visible.'],
	inputs: {
		wavelength_nm: {
			kind: 'number',
			label: 'Wavelength in vacuum',
			symbol: 'λ',
			quantity: 'wavelength',
			unit: 'nm',
			min: 0,
			minExclusive: true,
			max: 1e18,
			initial: 550,
			log: true
		}
	},
	outputs: { band: { label: 'Part of the spectrum', quantity: 'text', unit: '', text: true } },
	equations: [
		{
			tex: '380\\,\\mathrm{nm} \\le \\lambda_\\mathrm{visible} < 760\\,\\mathrm{nm}',
			says: 'Each part runs from its lower limit up to, but not including, the next.'
		}
	],
	assumptions: [
		'By the convention used here: visible light as in ISO 21348, the rest as astronomers often divide it. Other texts draw other lines.'
	],
	warnings: [],
	sources: [
		{
			title: 'ISO 21348:2007, Space environment: process for determining solar irradiances',
			locator: 'visible, 380–760 nm',
			fromMemory: true
		}
	],
	checks: checksOf('line.band'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ wavelength_nm }): Computed {
		return {
			ok: true,
			values: { band: bandOf(wavelength_nm).name },
			uncertainties: { band: 'exact' }
		};
	}
});
