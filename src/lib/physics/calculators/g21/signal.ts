/** What the calculators of the global 21 cm signal share: sources, warnings and the inputs they have in common. */
import type { NumberInput, Source, WarningSpec } from '../../calculator.ts';
import { REST_MHZ } from './rest-line.ts';

export const FOB06: Source = {
	title: 'Furlanetto, Oh & Briggs 2006, Cosmology at low frequencies, Phys. Rep. 433, 181',
	doi: '10.1016/j.physrep.2006.08.002',
	fromMemory: true
};

export const FIELD_1958: Source = {
	title: 'Field 1958, Excitation of the hydrogen 21-cm line, Proc. IRE 46, 240',
	doi: '10.1109/JRPROC.1958.286741',
	fromMemory: true
};

export const PRITCHARD_LOEB: Source = {
	title: 'Pritchard & Loeb 2012, 21 cm cosmology, Rep. Prog. Phys. 75, 086901',
	doi: '10.1088/0034-4885/75/8/086901',
	fromMemory: true
};

export const BARKANA_2018: Source = {
	title: 'Barkana 2018, Nature 555, 71',
	doi: '10.1038/nature25791',
	fromMemory: true
};

export const SINGH_2022: Source = {
	title: 'Singh et al. 2022, Nature Astronomy 6, 607',
	locator: 'the profile near 78 MHz is rejected at 95.3 per cent confidence',
	doi: '10.1038/s41550-022-01610-5',
	fromMemory: true
};

export const SIGN_CONVENTION =
	'Brightness is told against the background: negative is absorption. It is no temperature of the gas.';

/** The note that honest copy carries beside any deep trough near 78 MHz. */
export const DISPUTED_TROUGH: WarningSpec = {
	code: 'disputed-trough',
	message:
		'A trough of half a kelvin near 78 megahertz was reported once; an independent measurement (Singh et al. 2022) rejects that profile at 95.3 per cent confidence. Don’t call it confirmed.',
	when: 'a trough of 0.2 K or deeper between 68 and 88 MHz',
	validity: 'ok'
};

export const NEW_PHYSICS: WarningSpec = {
	code: 'new-physics',
	message:
		'Gas colder than this, or a background brighter than the cosmic one, needs physics beyond the standard (such as Barkana 2018); there is no accepted evidence for either.',
	when: 'deeper than unheated gas before the cosmic background allows',
	validity: 'approximate'
};

/** Codes for a brightness in mK seen at a frequency in MHz. */
export function troughWarnings(brightnessMk: number, frequencyMhz: number): string[] {
	const isDeep = brightnessMk <= -200 && frequencyMhz >= 68 && frequencyMhz <= 88;
	return isDeep ? [DISPUTED_TROUGH.code] : [];
}

export function frequencyAt(z: number): number {
	return REST_MHZ / (1 + z);
}

export function signalRedshift(initial: number): NumberInput {
	return {
		kind: 'number',
		label: 'Redshift',
		symbol: 'z',
		quantity: 'redshift',
		unit: '',
		min: 0,
		max: 1700,
		initial
	};
}

export const backgroundFactor: NumberInput = {
	kind: 'number',
	label: 'Background, times the cosmic one',
	quantity: 'ratio',
	unit: '',
	min: 0,
	minExclusive: true,
	max: 1e4,
	initial: 1,
	optional: true
};

export function kelvin(
	label: string,
	symbol: string,
	quantity: NumberInput['quantity'],
	initial: number
): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity,
		unit: 'K',
		min: 0,
		minExclusive: true,
		max: 1e9,
		initial,
		log: true
	};
}
