import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../../physics/calculator.ts';
import { catalogue } from '../../physics/calculators/index.ts';
import { runCalculator } from '../../physics/calculators/run.ts';
import { lineById } from '../../physics/lines/catalogue.ts';
import type { Stated } from '../../widget/stated.ts';
import { detectQuantities } from '../detect.ts';
import type { WeighedReading } from '../weighing.ts';
import { columnOf, mixedColumns, otherColumn } from './air-and-vacuum.ts';
import { factorTwo, reciprocal, scaleSlip } from './factors.ts';
import { findTraps } from './find.ts';
import { pairDisagrees } from './pairs.ts';
import { overSets, parameterSet } from './parameter-sets.ts';
import { siblingOutput, timeAsDistance } from './siblings.ts';

const atZ = catalogue.get('cosmo.at_z')!;
const planck = { set: 'Planck18' };

function stated(words: string): Stated {
	const found = detectQuantities(words, 'en')[0]?.stated;
	if (!found) throw new Error(`No number in “${words}”`);
	return found;
}

function sibling(words: string, output: string, z: number) {
	const result = runCalculator(atZ, { cosmology: planck, z });
	const trap = siblingOutput(stated(words), atZ, result, output);
	return trap?.matches.map(({ key }) => key);
}

const exact = (value: number, unit: string): WeighedReading => ({
	value,
	unit,
	uncertainty: 'exact'
});

// The numbers are those of the parameter set Planck 2018 as this library and astropy 5.2.1 give them.
describe('another output’s number', () => {
	test.each([
		['12.86 billion light years', 'comoving_distance_Gly', 6, 'light_travel_distance'],
		['27.48 billion light years', 'light_travel_distance', 6, 'comoving_distance_Gly'],
		['3.93 billion light years', 'comoving_distance_Gly', 6, 'angular'],
		['1204 megaparsecs', 'comoving_distance', 6, 'angular'],
		['59.0 gigaparsecs', 'comoving_distance', 6, 'luminosity'],
		['221 million years', 'lookback', 17.2, 'age'],
		['13.57 billion years', 'age', 17.2, 'lookback'],
		['14.45 billion light years', 'particle_horizon', 0, 'hubble_radius'],
		['46.2 billion light years', 'hubble_radius', 0, 'particle_horizon'],
		['16.6 billion light years', 'particle_horizon', 0, 'event_horizon']
	])('%s for %s at z = %d is %s', (words, output, z, key) => {
		expect(sibling(words, output, z)).toContain(key);
	});

	test('says both labels and asks', () => {
		const result = runCalculator(atZ, { cosmology: planck, z: 6 });
		const trap = siblingOutput(
			stated('12.86 billion light years'),
			atZ,
			result,
			'comoving_distance_Gly'
		);
		expect(trap?.says).toBe(
			'12.86\u00a0billion light years doesn’t fit “Distance now (comoving), in light years”, and fits “Distance the light travelled”. Which of them do the words mean?'
		);
	});

	test('no trap where the number fits its own output, or none', () => {
		expect(sibling('27.5 billion light years', 'comoving_distance_Gly', 6)).toBeUndefined();
		expect(sibling('100 billion light years', 'comoving_distance_Gly', 6)).toBeUndefined();
	});

	test('the age of the Universe is no radius of what can be seen', () => {
		const result = runCalculator(atZ, { cosmology: planck, z: 0 });
		const trap = timeAsDistance(
			stated('13.8 billion light years'),
			atZ,
			result,
			'particle_horizon'
		);
		expect(trap?.matches.map(({ key }) => key)).toEqual(['age']);
		const years = stated('13.8 billion years');
		expect(timeAsDistance(years, atZ, result, 'particle_horizon')).toBeNull();
	});
});

describe('another parameter set', () => {
	const inputs: RawInputs = { cosmology: planck, z: 17.2 };

	test('the age at redshift 17.2 spreads from 219.0 to 224.6 million years', () => {
		const ages = overSets(atZ, inputs, 'age');
		expect(ages).toHaveLength(5);
		expect(ages.at(0)).toMatchObject({ key: 'Simple' });
		expect(ages.at(0)!.value).toBeCloseTo(0.21896, 5);
		expect(ages.at(-1)).toMatchObject({ key: 'WMAP9' });
		expect(ages.at(-1)!.value).toBeCloseTo(0.2246, 4);
	});

	test('224.6 million years is WMAP’s', () => {
		const trap = parameterSet(stated('224.6 million years'), atZ, inputs, 'age');
		expect(trap?.matches.map(({ key }) => key)).toEqual(['WMAP9']);
		expect(trap?.says).toContain('fits WMAP, nine years');
	});

	test('no trap where the set in use fits, or the calculator has none', () => {
		expect(parameterSet(stated('221 million years'), atZ, inputs, 'age')).toBeNull();
		const photon = catalogue.get('photon.convert')!;
		expect(
			parameterSet(stated('500 nanometres'), photon, { energy_eV: 2 }, 'wavelength')
		).toBeNull();
	});
});

describe('factors', () => {
	test.each([
		['13.8 million years', 13.787, 'Gyr', '1e-3', 'million for billion'],
		['13.8 trillion years', 13.787, 'Gyr', '1e3', 'billion for million'],
		['0.5 kelvin', 0.5, 'mK', '1e3', 'thousand times too large'],
		['1420.4 Hz', 1420.405751768, 'MHz', '1e-6', 'million times too small'],
		['1420.4 mHz', 1420.405751768, 'MHz', '1e-9', 'wrong case']
	])('%s for %d %s is off by %s', (words, value, unit, key, part) => {
		const said = words === '1420.4 mHz' ? { ...stated('1420.4 Hz'), scale: 1e-3 } : stated(words);
		const trap = scaleSlip(said, exact(value, unit));
		expect(trap?.matches[0]?.key).toBe(key);
		expect(trap?.says).toContain(part);
	});

	test('ten times too much is no slip of a word', () => {
		expect(scaleSlip(stated('138 billion years'), exact(13.787, 'Gyr'))).toBeNull();
	});

	test('46 and 93 billion light years: radius and diameter', () => {
		const radius = exact(46.2, 'Gly');
		expect(factorTwo(stated('92 billion light years'), radius)?.says).toMatch(/^Twice/);
		expect(factorTwo(stated('46 billion light years'), exact(92.4, 'Gly'))?.says).toMatch(/^Half/);
		expect(factorTwo(stated('46 billion light years'), radius)).toBeNull();
		expect(factorTwo(stated('70 billion light years'), radius)).toBeNull();
	});

	test('a third of, and three times', () => {
		expect(reciprocal(stated('0.333'), exact(3, ''))?.matches[0]?.value).toBeCloseTo(1 / 3, 12);
		expect(reciprocal(stated('3 times'), exact(1 / 3, 'times'))?.code).toBe('reciprocal');
		expect(reciprocal(stated('3 times'), exact(3, 'times'))).toBeNull();
		expect(reciprocal(stated('3 metres'), exact(1 / 3, 'm'))).toBeNull();
	});
});

describe('two numbers of one wave', () => {
	const pair = (one: string, other: string) => pairDisagrees(stated(one), stated(other));

	test.each([
		['21.106 centimetres', '1420.4 megahertz'],
		['1420.4 megahertz', '21.1 centimetres'],
		['about 21 centimetres', '1400 megahertz'],
		['121.567 nanometres', '10.1988 electronvolts']
	])('%s and %s agree', (one, other) => {
		expect(pair(one, other)).toBeNull();
	});

	test('21 millimetres and 1420.4 megahertz do not', () => {
		const trap = pair('21 millimetres', '1420.4 megahertz');
		expect(trap?.matches.map(({ unit }) => unit)).toEqual(['MHz', 'mm']);
		expect(trap?.matches[0]?.value).toBeCloseTo(14_276, 0);
		expect(trap?.matches[1]?.value).toBeCloseTo(211.06, 2);
		expect(trap?.says).toMatch(
			/^Wavelength times frequency is the speed of light: .*One of the two is off\.$/
		);
	});

	test('1.4 megahertz is not the line of 21.1 centimetres', () => {
		expect(pair('21.1 centimetres', '1.4 megahertz')?.code).toBe('pair-disagrees');
	});

	test('the peaks in wavelength and in frequency of 5772 K are two photons', () => {
		const trap = pairDisagrees(stated('502 nanometres'), {
			...stated('339 terahertz'),
			hedge: 'bare'
		});
		expect(trap?.matches.find(({ unit }) => unit === 'nm')?.value).toBeCloseTo(884, 0);
	});

	test('two lengths are no such pair', () => {
		expect(pair('21 centimetres', '5 metres')).toBeNull();
	});
});

// H alpha: 656.280 nm in air, 656.461 nm in vacuum (NIST Atomic Spectra Database).
describe('air and vacuum', () => {
	const hAlpha = lineById('h-alpha')!;
	const hBeta = lineById('h-beta')!;

	test.each([
		['656.28 nanometres', 'air'],
		['656.46 nanometres', 'vacuum'],
		['656 nanometres', null],
		['650 nanometres', null],
		['656.28 metres', null]
	])('%s is %s', (words, column) => {
		expect(columnOf(stated(words), hAlpha)).toBe(column);
	});

	test('a line without an air wavelength is in vacuum alone', () => {
		expect(columnOf(stated('121.567 nanometres'), lineById('ly-alpha')!)).toBeNull();
	});

	test('the other column is named', () => {
		const trap = otherColumn(stated('656.28 nanometres'), hAlpha, 'vacuum');
		expect(trap?.matches.map(({ value }) => Number(value.toFixed(2)))).toEqual([656.28, 656.46]);
		expect(otherColumn(stated('656.46 nanometres'), hAlpha, 'vacuum')).toBeNull();
	});

	test('one list keeps to one column', () => {
		const list = (alpha: string, beta: string) => [
			{ stated: stated(alpha), line: hAlpha },
			{ stated: stated(beta), line: hBeta }
		];
		expect(mixedColumns(list('656.28 nanometres', '486.27 nanometres'))?.code).toBe(
			'mixed-columns'
		);
		expect(mixedColumns(list('656.28 nanometres', '486.13 nanometres'))).toBeNull();
	});
});

describe('all traps of one number', () => {
	const codes = (words: string, output: string, z: number) =>
		findTraps(stated(words), atZ, { cosmology: planck, z }, output).map(({ code }) => code);

	test.each([
		['92.4 billion light years', 'particle_horizon', 0, ['factor-two']],
		['13.8 billion light years', 'particle_horizon', 0, ['time-as-distance']],
		['221 billion years', 'age', 17.2, ['scale-slip']],
		['221 million years', 'age', 17.2, []],
		['221 kilograms', 'age', 17.2, []]
	])('%s for %s at z = %d', (words, output, z, wanted) => {
		expect(codes(words, output, z)).toEqual(wanted);
	});

	test('a refusal has no traps', () => {
		expect(findTraps(stated('3 years'), atZ, { cosmology: planck, z: -2 }, 'age')).toEqual([]);
	});
});
