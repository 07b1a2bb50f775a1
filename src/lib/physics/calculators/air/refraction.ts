/** Refraction of light by standard dry air (15 °C, 101 325 Pa), by three published formulas. */
import type { ChoiceInput, NumberInput, Source, WarningSpec } from '../../calculator.ts';

interface Refraction {
	label: string;
	/** n − 1 from σ² in µm⁻², where σ = 1000/λ_vacuum[nm]. */
	lessOne(sigmaSquared: number): number;
}

/** Constants as printed in the papers of `AIR_SOURCES`. */
const FORMULAS: Record<string, Refraction> = {
	ciddor1996: {
		label: 'Ciddor 1996',
		lessOne: (s) => (5_792_105 / (238.0185 - s) + 167_917 / (57.362 - s)) * 1e-8
	},
	edlen1953: {
		label: 'Edlén 1953',
		lessOne: (s) => 6.4328e-5 + 2.94981e-2 / (146 - s) + 2.554e-4 / (41 - s)
	},
	edlen1966: {
		label: 'Edlén 1966',
		lessOne: (s) => (8342.13 + 2_406_030 / (130 - s) + 15_997 / (38.9 - s)) * 1e-8
	}
};

/** Shorter waves are given in vacuum by convention, and air absorbs them. */
export const SHORTEST_IN_AIR_NM = 200;

/** n − 1 at a vacuum wavelength in nm, from 200 nm on. */
export function refractivity(vacuumNm: number, formula: string): number {
	const sigma = 1000 / vacuumNm;
	return FORMULAS[formula]?.lessOne(sigma * sigma) ?? NaN;
}

/** Vacuum wavelength of a wavelength in air: a fixed point, reached to the last bit in a few turns as n barely moves. */
export function vacuumOf(airNm: number, formula: string): number {
	let vacuum = airNm;
	for (let turn = 0; turn < 6; turn += 1) vacuum = airNm * (1 + refractivity(vacuum, formula));
	return vacuum;
}

export const formulaInput: ChoiceInput = {
	kind: 'choice',
	label: 'Formula for the air',
	options: Object.entries(FORMULAS).map(([value, { label }]) => ({ value, label })),
	initial: 'ciddor1996',
	optional: true
};

export function wavelengthInput(label: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol: 'λ',
		quantity: 'wavelength',
		unit: 'nm',
		min: 0,
		minExclusive: true,
		max: 2500,
		initial
	};
}

export const AIR_SOURCES: Source[] = [
	{
		title: 'Ciddor 1996, Refractive index of air, Applied Optics 35, 1566',
		locator: 'eq. 1',
		doi: '10.1364/AO.35.001566'
	},
	{
		title: 'Edlén 1953, The dispersion of standard air, J. Opt. Soc. Am. 43, 339',
		locator: 'as used by Morton 1991, ApJS 77, 119',
		doi: '10.1364/JOSA.43.000339'
	},
	{
		title: 'Edlén 1966, The refractive index of air, Metrologia 2, 71',
		doi: '10.1088/0026-1394/2/2/002'
	}
];

export const AIR_ASSUMPTIONS = [
	'Dry air at 15 degrees Celsius and 101 325 pascals, with 450 parts of carbon dioxide in a million.',
	'The three formulas agree to about 2 parts in 100 million.'
];

export const AIR_WARNINGS: WarningSpec[] = [
	{
		code: 'vacuum-by-convention',
		message:
			'Wavelengths below 200 nanometres are given in vacuum by convention, so nothing is changed.',
		when: 'wavelength below 200 nm',
		validity: 'outside'
	},
	{
		code: 'past-the-measurements',
		message: 'The formulas were published for 230 to 1690 nanometres; here they are stretched.',
		when: 'wavelength of 200 to 230 nm, or above 1690 nm',
		validity: 'approximate'
	}
];

/** Codes of the warnings that hold at a wavelength in nm. */
export function airWarnings(nm: number): string[] {
	if (nm < SHORTEST_IN_AIR_NM) return ['vacuum-by-convention'];
	return nm < 230 || nm > 1690 ? ['past-the-measurements'] : [];
}
