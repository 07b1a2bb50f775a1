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
import { checksOf } from '../published-checks.ts';

const { h, c } = constants.physical;

/** hc in J nm, and h in kg m/s nm. */
const JOULE_NM = h.value * c.value * 1e9;
const MOMENTUM_NM = h.value * 1e9;
const joulesOfWavelength = (nm: number) => JOULE_NM / nm;
const momentumOfWavelength = (nm: number) => MOMENTUM_NM / nm;

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
	checks: checksOf('photon.convert'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute(inputs): Computed {
		const nm = wavelengthOf(inputs);
		const values = {
			wavelength: nm,
			frequency: inputs.frequency_Hz ?? frequencyOfWavelength(nm),
			energy: inputs.energy_eV ?? energyOfWavelength(nm),
			energyJ: joulesOfWavelength(nm),
			momentum: inputs.momentum_kgms ?? momentumOfWavelength(nm)
		};
		return { ok: true, values, uncertainties: 'exact' };
	},
	curve(_inputs, key, places) {
		const wavelength =
			key === 'wavelength_nm' ? places : places.map((place) => wavelengthOf({ [key]: place }));
		const frequency = new Float64Array(places.length);
		const energy = new Float64Array(places.length);
		const energyJ = new Float64Array(places.length);
		const momentum = new Float64Array(places.length);
		for (let index = 0; index < places.length; index += 1) {
			const nm = wavelength[index]!;
			frequency[index] = frequencyOfWavelength(nm);
			energy[index] = energyOfWavelength(nm);
			energyJ[index] = joulesOfWavelength(nm);
			momentum[index] = momentumOfWavelength(nm);
		}
		return {
			columns: {
				wavelength,
				// What is given stays as given.
				frequency: key === 'frequency_Hz' ? places : frequency,
				energy: key === 'energy_eV' ? places : energy,
				energyJ,
				momentum: key === 'momentum_kgms' ? places : momentum
			}
		};
	}
});

function wavelengthOf(inputs: CheckedInputs): number {
	if (inputs.wavelength_nm !== undefined) return inputs.wavelength_nm as number;
	if (inputs.frequency_Hz !== undefined) return wavelengthOfFrequency(inputs.frequency_Hz);
	if (inputs.energy_eV !== undefined) return wavelengthOfEnergy(inputs.energy_eV);
	return MOMENTUM_NM / inputs.momentum_kgms;
}
