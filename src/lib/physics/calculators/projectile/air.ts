/** Air as the calculators of flight take it: still, and as dense as at sea level. */
import type { NumberInput, Source, WarningSpec } from '../../calculator.ts';

/** m/s at 15 °C, International Standard Atmosphere. */
const SOUND_SPEED = 340.294;

export const STANDARD_ATMOSPHERE: Source = {
	title: 'ISO 2533:1975, Standard Atmosphere',
	locator: 'sea level: 1.225 kg/m³, speed of sound 340.294 m/s',
	fromMemory: true
};

export const densityInput: NumberInput = {
	kind: 'number',
	label: 'Density of the air',
	symbol: 'ρ',
	quantity: 'density',
	unit: 'kg/m3',
	min: 0,
	minExclusive: true,
	max: 2e4,
	initial: 1.225,
	optional: true
};

export function dragCoefficientInput(initial: number): NumberInput {
	return {
		kind: 'number',
		label: 'Drag coefficient',
		symbol: 'C_d',
		quantity: 'number',
		unit: '',
		min: 0,
		minExclusive: true,
		max: 100,
		initial
	};
}

export const NEAR_SOUND: WarningSpec = {
	code: 'near-sound',
	message: 'Above three tenths of the speed of sound the drag coefficient begins to change.',
	when: 'speed above Mach 0.3 (102 m/s in air at 15 °C)',
	validity: 'approximate'
};

export const AT_SOUND: WarningSpec = {
	code: 'at-sound',
	message:
		'Near and above the speed of sound drag follows other laws: this number is not to be used.',
	when: 'speed above Mach 0.8 (272 m/s in air at 15 °C)',
	validity: 'outside'
};

/** Codes for the greatest speed met, in m/s. */
export function machWarnings(speed: number): string[] {
	const mach = speed / SOUND_SPEED;
	if (mach > 0.8) return [AT_SOUND.code];
	return mach > 0.3 ? [NEAR_SOUND.code] : [];
}
