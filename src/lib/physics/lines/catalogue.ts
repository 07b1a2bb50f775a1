/** The line catalogue: look up by id, search by what a writer would type, and state a line in any of its units. */
import { constants } from '../constants/index.ts';
import { commensurable, convert } from '../units/units.ts';
import { LINE_TABLE, type LineRow, type NativeUnit } from './table.ts';

export interface Line {
	id: string;
	label: string;
	species: string;
	transition: string;
	region: string;
	/** How the source states the line. */
	nativeUnit: NativeUnit;
	nativeValue: number;
	/** Standard uncertainty over value, roughly. */
	relativeUncertainty: number;
	vacuumWavelengthNm: number;
	/** Standard dry air (Ciddor 1996); null outside 200–2500 nm. */
	airWavelengthNm: number | null;
	frequencyGHz: number;
	energyEv: number;
	band: string;
	source: string;
	fromMemory: boolean;
	verification: string;
}

function lineFrom(row: LineRow): Line {
	return Object.freeze({
		id: row[0],
		label: row[1],
		species: row[2],
		transition: row[3],
		region: row[4],
		nativeUnit: row[5],
		nativeValue: row[6],
		relativeUncertainty: row[7],
		vacuumWavelengthNm: row[8],
		airWavelengthNm: row[9],
		frequencyGHz: row[10],
		energyEv: row[11],
		band: row[12],
		source: row[13],
		fromMemory: row[14],
		verification: row[15]
	});
}

export const lines: readonly Line[] = LINE_TABLE.map(lineFrom);

const byId = new Map(lines.map((line) => [line.id, line]));

export function lineById(id: string): Line | undefined {
	return byId.get(id);
}

/** Lines whose label, species, transition or id holds every word of the text, in catalogue order. */
export function searchLines(text: string): Line[] {
	const words = fold(text).split(' ').filter(Boolean);
	if (words.length === 0) return [...lines];
	return lines.filter((line) => {
		const held = fold(`${line.label} ${line.species} ${line.transition} ${line.id} ${line.region}`);
		return words.every((word) => held.includes(word));
	});
}

/**
 * A line at rest, in any unit of wavelength (vacuum), frequency or photon energy, from the value its source states so
 * that no digit is lost.
 * @throws {RangeError} for a unit of another kind.
 */
export function restValue(line: Line, unit: string): number {
	const { c, h } = constants.physical;
	const frequencyHz = restFrequencyHz(line);
	if (commensurable(unit, 'Hz')) return convert(frequencyHz, 'Hz', unit);
	if (commensurable(unit, 'm')) {
		return line.nativeUnit === 'nm_vac'
			? convert(line.nativeValue, 'nm', unit)
			: convert(c.value / frequencyHz, 'm', unit);
	}
	if (commensurable(unit, 'J')) {
		return line.nativeUnit === 'eV'
			? convert(line.nativeValue, 'eV', unit)
			: convert(h.value * frequencyHz, 'J', unit);
	}
	throw new RangeError(
		`A line can't be stated in ${unit}. Use a unit of wavelength, frequency or energy.`
	);
}

function restFrequencyHz(line: Line): number {
	const { c, h, e } = constants.physical;
	switch (line.nativeUnit) {
		case 'MHz':
			return line.nativeValue * 1e6;
		case 'GHz':
			return line.nativeValue * 1e9;
		case 'eV':
			return (line.nativeValue * e.value) / h.value;
		case 'um_vac':
			return (c.value * 1e6) / line.nativeValue;
		case 'nm_vac':
			return (c.value * 1e9) / line.nativeValue;
		case 'nm_air':
			return (c.value * 1e9) / line.vacuumWavelengthNm;
	}
}

const GREEK: Record<string, string> = {
	α: 'alpha',
	β: 'beta',
	γ: 'gamma',
	δ: 'delta',
	ε: 'epsilon'
};

/** Small letters, Greek ones spelled out, hyphens as spaces: “Hα” and “h-alpha” find the same line. */
function fold(text: string): string {
	return text
		.toLowerCase()
		.replace(/[αβγδε]/g, (letter) => ` ${GREEK[letter]} `)
		.replace(/[-–_\s]+/g, ' ')
		.trim();
}
