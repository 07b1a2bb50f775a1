/** One light, three ways to state it: wavelength in vacuum, frequency, energy of a photon. */
import type { NumberInput, Source, WarningSpec } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';

const { c, h, e } = constants.physical;

/** hc in eV nm: the product of a photon's energy and its wavelength. */
const EV_NM = ((h.value * c.value) / e.value) * 1e9;
/** c in Hz nm: the product of a frequency and its wavelength. */
const HERTZ_NM = c.value * 1e9;

export const frequencyOfWavelength = (nm: number) => HERTZ_NM / nm;
export const wavelengthOfFrequency = (hertz: number) => HERTZ_NM / hertz;
export const energyOfWavelength = (nm: number) => EV_NM / nm;
export const wavelengthOfEnergy = (ev: number) => EV_NM / ev;
export const energyOfFrequency = (hertz: number) => (h.value * hertz) / e.value;
export const frequencyOfEnergy = (ev: number) => (ev * e.value) / h.value;

/** The three inputs of a light; exactly one is given. `when` is “at rest” or “observed”. */
export function lightInputs<P extends string>(
	prefix: P,
	when: string,
	initialNm: number
): Record<`${P}Wavelength_nm` | `${P}Frequency_Hz` | `${P}Energy_eV`, NumberInput> {
	const common = { kind: 'number', min: 0, minExclusive: true, optional: true, log: true } as const;
	const inputs: Record<string, NumberInput> = {
		[`${prefix}Wavelength_nm`]: {
			...common,
			label: `Wavelength in vacuum, ${when}`,
			symbol: 'λ',
			quantity: 'wavelength',
			unit: 'nm',
			max: 1e18,
			initial: initialNm
		},
		[`${prefix}Frequency_Hz`]: {
			...common,
			label: `Frequency, ${when}`,
			symbol: 'ν',
			quantity: 'frequency',
			unit: 'Hz',
			max: 1e27,
			initial: frequencyOfWavelength(initialNm)
		},
		[`${prefix}Energy_eV`]: {
			...common,
			label: `Energy of a photon, ${when}`,
			symbol: 'E',
			quantity: 'photon-energy',
			unit: 'eV',
			max: 1e13,
			initial: energyOfWavelength(initialNm)
		}
	};
	return inputs as ReturnType<typeof lightInputs<P>>;
}

export const REDSHIFT_SOURCES: Source[] = [
	{
		title: 'Hogg 1999, Distance measures in cosmology',
		locator: 'eq. 1',
		url: 'https://arxiv.org/abs/astro-ph/9905116'
	},
	{
		title: 'CODATA 2018: Tiesinga et al. 2021, Rev. Mod. Phys. 93, 025010',
		locator: 'h, c, e',
		doi: '10.1103/RevModPhys.93.025010'
	}
];

export const REDSHIFT_WARNINGS: WarningSpec[] = [
	{
		code: 'near-motion',
		message: 'So near, motion within our neighbourhood matters as much as expansion.',
		when: 'redshift between −0.002 and 0.002',
		validity: 'approximate'
	},
	{
		code: 'unseen',
		message: 'No source has been seen this far; the line is hypothetical.',
		when: 'redshift above 30',
		validity: 'approximate'
	}
];

/** Codes of the warnings that hold at redshift z. */
export function redshiftWarnings(z: number): string[] {
	if (Math.abs(z) < 0.002) return ['near-motion'];
	return z > 30 ? ['unseen'] : [];
}
