import {
	defineCalculator,
	type CheckedInputs,
	type Computed,
	type NumberInput
} from '../../calculator.ts';
import type { QuantityKind } from '../../units/quantities.ts';
import { constants } from '../../constants/index.ts';
import {
	energyOfWavelength,
	frequencyOfWavelength,
	wavelengthOfEnergy,
	wavelengthOfFrequency
} from '../line/spectrum.ts';
import { codata2018, EINSTEIN_1905 } from '../sources.ts';
import { exactly } from '../uncertainties.ts';

const { h, c } = constants.physical;

function given(
	label: string,
	symbol: string,
	quantity: QuantityKind,
	unit: string,
	[min, max]: [number, number],
	initial: number
): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity,
		unit,
		min,
		max,
		initial,
		optional: true,
		log: true
	};
}

/**
 * One photon told in four ways: wavelength in vacuum (nm), frequency (Hz), energy (eV and J) and momentum (kg m/s), from
 * any one of them. E = hν = hc/λ = pc.
 */
export const photon = defineCalculator({
	id: 'photon.convert',
	revision: '1.0.0',
	title: 'A photon in other terms',
	purpose:
		'A photon is known by its wavelength, frequency, energy or momentum: what are the others?',
	asks: [
		'How much energy does a photon of green light carry?',
		'What frequency is this wavelength?',
		'What wavelength has an X-ray of this energy?'
	],
	notFor: ['Wavelengths in air, as older optical lists give them.', 'Particles with mass.'],
	inputs: {
		wavelength_nm: given('Wavelength in vacuum', 'λ', 'wavelength', 'nm', [1e-12, 1e20], 550),
		frequency_Hz: given('Frequency', 'ν', 'frequency', 'Hz', [1e-3, 1e29], 5.45e14),
		energy_eV: given('Energy', 'E', 'photon-energy', 'eV', [1e-18, 1e15], 2.25),
		momentum_kgms: given('Momentum', 'p', 'momentum', 'kg m/s', [1e-45, 1e-12], 1.2e-27)
	},
	oneOf: [['wavelength_nm', 'frequency_Hz', 'energy_eV', 'momentum_kgms']],
	outputs: {
		wavelength: {
			label: 'Wavelength in vacuum',
			symbol: 'λ',
			quantity: 'wavelength',
			unit: 'nm'
		},
		frequency: { label: 'Frequency', symbol: 'ν', quantity: 'frequency', unit: 'Hz' },
		energy: { label: 'Energy', symbol: 'E', quantity: 'photon-energy', unit: 'eV' },
		energyJ: { label: 'Energy in joules', symbol: 'E', quantity: 'energy', unit: 'J' },
		momentum: { label: 'Momentum', symbol: 'p', quantity: 'momentum', unit: 'kg m/s' }
	},
	equations: [
		{
			tex: 'E = h\\nu = \\frac{hc}{\\lambda}',
			says: 'Shorter waves carry more energy in each photon.'
		},
		{ tex: 'p = \\frac{E}{c} = \\frac{h}{\\lambda}', says: 'Light pushes, a little.' }
	],
	assumptions: ['In vacuum.', 'All constants here are exact by the SI.'],
	warnings: [],
	sources: [codata2018('h, c and e, exact by the SI'), EINSTEIN_1905],
	checks: [],
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute(inputs): Computed {
		const nm = wavelengthOf(inputs);
		const values = {
			wavelength: nm,
			frequency: inputs.frequency_Hz ?? frequencyOfWavelength(nm),
			energy: inputs.energy_eV ?? energyOfWavelength(nm),
			energyJ: (h.value * c.value * 1e9) / nm,
			momentum: inputs.momentum_kgms ?? (h.value * 1e9) / nm
		};
		return { ok: true, values, uncertainties: exactly(values) };
	}
});

function wavelengthOf(inputs: CheckedInputs): number {
	if (inputs.wavelength_nm !== undefined) return inputs.wavelength_nm as number;
	if (inputs.frequency_Hz !== undefined) return wavelengthOfFrequency(inputs.frequency_Hz);
	if (inputs.energy_eV !== undefined) return wavelengthOfEnergy(inputs.energy_eV);
	return (h.value * 1e9) / inputs.momentum_kgms;
}
