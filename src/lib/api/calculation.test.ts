import { describe, expect, test } from 'vitest';
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
