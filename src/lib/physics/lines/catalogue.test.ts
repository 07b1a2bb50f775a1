import { describe, expect, test } from 'vitest';
import { BANDS, bandOf } from '../calculators/line/bands.ts';
import { lineById, lines, restValue, searchLines } from './catalogue.ts';

test('all 105 lines are there, each under its own id with a source and a verification', () => {
	expect(lines).toHaveLength(105);
	expect(new Set(lines.map((line) => line.id)).size).toBe(105);
	for (const line of lines) {
		expect(line.source, line.id).not.toBe('');
		expect(line.verification, line.id).not.toBe('');
	}
	expect(lines.filter((line) => line.fromMemory)).toHaveLength(24);
});

// λν = c and E = hν with the exact constants of the SI: the table carries twelve digits.
test('wavelength, frequency and energy of each line agree with each other', () => {
	for (const line of lines) {
		expect(line.vacuumWavelengthNm * line.frequencyGHz, line.id).toBeCloseTo(299_792_458, 2);
		expect(
			line.energyEv / ((6.62607015e-34 * line.frequencyGHz * 1e9) / 1.602176634e-19),
			line.id
		).toBeCloseTo(1, 10);
		expect(restValue(line, 'nm') / line.vacuumWavelengthNm, line.id).toBeCloseTo(1, 10);
		expect(restValue(line, 'GHz') / line.frequencyGHz, line.id).toBeCloseTo(1, 10);
		expect(restValue(line, 'eV') / line.energyEv, line.id).toBeCloseTo(1, 10);
	}
});

test('the band printed beside a line is the one its wavelength lies in', () => {
	for (const line of lines) expect(bandOf(line.vacuumWavelengthNm).name, line.id).toBe(line.band);
	BANDS.slice(1).forEach((band, i) => expect(band.from).toBe(BANDS[i]?.to));
});

describe('air wavelengths', () => {
	// As printed in the NIST Atomic Spectra Database (air, nm).
	test.each([
		{ id: 'na-d2', printed: 588.9951, digits: 4 },
		{ id: 'caii-k', printed: 393.3663, digits: 4 },
		{ id: 'oiii-5007', printed: 500.6843, digits: 4 },
		{ id: 'h-alpha', printed: 656.28, digits: 3 }
	])('$id', ({ id, printed, digits }) => {
		expect(lineById(id)?.airWavelengthNm).toBeCloseTo(printed, digits);
	});
});

test('hydrogen’s line at 21 cm keeps every digit of its frequency', () => {
	const line = lineById('hi-21cm');
	expect(line && restValue(line, 'MHz')).toBe(1420.405751768);
	expect(line && restValue(line, 'Hz')).toBeCloseTo(1420405751.768, 5);
	expect(line && restValue(line, 'cm')).toBeCloseTo(21.10611405416, 10);
	expect(() => line && restValue(line, 'kg')).toThrow(RangeError);
});

test.each([
	['21', 'hi-21cm'],
	['Hα', 'h-alpha'],
	['h alpha', 'h-alpha'],
	['Lyman-α', 'ly-alpha'],
	['sodium', undefined],
	['[O III] 500.7', 'oiii-5007']
])('searching “%s” finds %s', (text, id) => {
	const ids = searchLines(text).map((line) => line.id);
	if (id) expect(ids).toContain(id);
	else expect(ids).toHaveLength(0);
});

test('an unknown id is no line', () => {
	expect(lineById('constructor')).toBeUndefined();
});
