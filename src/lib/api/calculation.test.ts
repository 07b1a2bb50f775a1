import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { calculate, describeCalculators } from './calculation.ts';

describe('calculate', () => {
	test('answers in the public form', () => {
		expect(calculate({ calculator: 'g21.frequency_from_z', inputs: { z: 9 } })).toEqual({
			outputs: {
				frequency: { value: expect.closeTo(142.0405751768, 10), unit: 'MHz' },
				wavelength: { value: expect.any(Number), unit: 'm' }
			},
			warnings: [],
			validity: 'ok'
		});
	});

	test('a refusal names the input in words, and its key beside them', () => {
		expect(calculate({ calculator: 'line.band', inputs: {} })).toEqual({
			refused: {
				code: 'missing-input',
				message: expect.stringMatching(/^Wavelength.* is missing\. Give it a value\.$/),
				input: 'wavelength_nm'
			}
		});
	});

	test.each([
		[null, 'request-broken'],
		[[], 'request-broken'],
		['x', 'request-broken'],
		[{}, 'request-broken'],
		[{ calculator: 3, inputs: {} }, 'request-broken'],
		[{ calculator: 'line.band', inputs: {}, extra: 1 }, 'request-broken'],
		[{ calculator: 'line.bond', inputs: {} }, 'unknown-calculator'],
		[{ calculator: '__proto__', inputs: {} }, 'unknown-calculator'],
		[{ calculator: 'line.band' }, 'inputs-broken'],
		[{ calculator: 'line.band', inputs: [] }, 'inputs-broken'],
		[{ calculator: 'line.band', inputs: {} }, 'missing-input']
	])('%o is refused as %s', (request, code) => {
		expect(calculate(request)).toMatchObject({
			refused: { code, message: expect.stringMatching(/[.?]$/) }
		});
	});
});

describe('what a house offers', () => {
	const withheld = (id: string) =>
		id === 'house.draft' ? { code: 'calculator-not-vetted', message: 'Not signed yet.' } : null;
	const offered = { calculators: new Map([['line.band', catalogue.get('line.band')!]]), withheld };

	test('is run; what is there and isn’t offered says why; the rest isn’t known', () => {
		const run = (calculator: string) =>
			calculate({ calculator, inputs: { wavelength_nm: 550 } }, offered);
		expect(run('line.band')).toMatchObject({ outputs: { band: { value: 'visible' } } });
		expect(run('house.draft')).toEqual({
			refused: { code: 'calculator-not-vetted', message: 'Not signed yet.' }
		});
		expect(run('cosmo.at_z')).toMatchObject({ refused: { code: 'unknown-calculator' } });
	});

	test('without a house, one of a house’s own is told where to ask', () => {
		expect(calculate({ calculator: 'house.sound-in-air', inputs: {} })).toMatchObject({
			refused: {
				code: 'calculator-of-a-house',
				message: expect.stringContaining('POST /api/v1/calculators/house.sound-in-air')
			}
		});
	});
});

describe('uncertainties, where they are asked for', () => {
	const drop = { calculator: 'energy.drop', inputs: { mass_kg: 10, height_m: 5 } };

	test('are told beside each value', () => {
		// u(E) = m g u(h), g = 9.80665 m/s² (CGPM 1901).
		expect(calculate({ ...drop, uncertainties: { height_m: 0.1 } })).toMatchObject({
			outputs: {
				energy: { value: 490.3325, unit: 'J', uncertainty: expect.closeTo(9.80665, 9) }
			}
		});
		expect(calculate({ ...drop, uncertainties: {} })).toMatchObject({
			outputs: { energy: { uncertainty: 'exact' } }
		});
	});

	test('the age in a set keeps its published one; what rests on untied parameters says why it has none', () => {
		const at = (set: string, z: number) =>
			calculate({
				calculator: 'cosmo.at_z',
				inputs: { cosmology: { set }, z },
				uncertainties: {}
			});
		// Planck 2018 VI, table 2: 13.787 ± 0.020 Gyr.
		expect(at('Planck18', 0)).toMatchObject({ outputs: { age: { uncertainty: 0.02 } } });
		expect(at('Planck15', 1)).toMatchObject({
			outputs: { age: { uncertainty: 'not-available', note: expect.stringMatching(/\.$/) } }
		});
	});

	test('a request without them is answered as it always was', () => {
		expect(Object.keys(Object.values(outputsOf(calculate(drop)))[0]!)).toEqual(['value', 'unit']);
	});

	test.each([
		[{ uncertainties: [] }, 'uncertainties-broken'],
		[{ uncertainties: 0.1 }, 'uncertainties-broken'],
		[{ correlations: [] }, 'uncertainties-broken'],
		[{ uncertainties: {}, correlations: {} }, 'correlations-broken'],
		[{ uncertainties: { height: 1 } }, 'unknown-input'],
		[{ uncertainties: { height_m: -1 } }, 'uncertainty-broken'],
		[{ uncertainties: { height_m: 1 }, correlations: [1] }, 'correlation-broken']
	])('%o is refused as %s', (more, code) => {
		expect(calculate({ ...drop, ...more })).toMatchObject({
			refused: { code, message: expect.stringMatching(/[.?]$/) }
		});
	});

	function outputsOf(answer: ReturnType<typeof calculate>) {
		if ('refused' in answer) throw new Error(answer.refused.message);
		return answer.outputs;
	}
});

test('the description is plain JSON with inputs, outputs, units, ranges and sources', () => {
	const described = describeCalculators();
	expect(JSON.parse(JSON.stringify(described))).toEqual(described);
	const atZ = described.find((one) => one.id === 'cosmo.at_z');
	expect(atZ?.inputs.z).toMatchObject({ min: -1, minExclusive: true, unit: '' });
	expect(atZ?.inputs.cosmology).toMatchObject({
		sets: { Planck18: { H0: 67.66 } },
		parameters: { H0: { unit: 'km/s/Mpc' } }
	});
	expect(atZ?.outputs.age).toMatchObject({ unit: 'Gyr' });
	expect(atZ?.checks.length).toBe(14);
});
