import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { inputsAllOver } from '../../../../tests/support/any-inputs.ts';
import { defineCalculator, type CalculatorDefinition, type RawInputs } from '../calculator.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';

const run = (id: string, inputs: RawInputs) => runCalculator(catalogue.get(id)!, inputs);
const planck = { set: 'Planck18' };

describe('a refusal names the input and the mend', () => {
	test.each([
		['cosmo.at_z', { cosmology: planck, zz: 1 }, 'unknown-input', /It takes cosmology, z/, 'zz'],
		['cosmo.at_z', { cosmology: planck }, 'missing-input', /^Redshift is missing/, 'z'],
		['cosmo.at_z', { cosmology: planck, z: null }, 'missing-input', /^Redshift is missing/, 'z'],
		['cosmo.at_z', { cosmology: planck, z: '1' }, 'not-a-number', /without quotes/, 'z'],
		['cosmo.at_z', { cosmology: planck, z: NaN }, 'not-finite', /finite/, 'z'],
		['cosmo.at_z', { cosmology: planck, z: Infinity }, 'not-finite', /finite/, 'z'],
		['cosmo.at_z', { cosmology: planck, z: -1 }, 'out-of-range', /more than −1/, 'z'],
		['cosmo.at_z', { z: 1 }, 'missing-input', /^Expanding universe is missing/, 'cosmology'],
		['cosmo.at_z', { cosmology: 'Planck18', z: 1 }, 'cosmology-broken', /"set"/, 'cosmology'],
		['cosmo.at_z', { cosmology: [], z: 1 }, 'cosmology-broken', /"set"/, 'cosmology'],
		[
			'cosmo.at_z',
			{ cosmology: { set: 'Planck2018' }, z: 1 },
			'unknown-set',
			/Planck18/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { set: 'toString' }, z: 1 },
			'unknown-set',
			/Choose one of/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { ...planck, h0: 70 }, z: 1 },
			'unknown-parameter',
			/“H0”/,
			'cosmology'
		],
		['cosmo.at_z', { cosmology: { H0: 70 }, z: 1 }, 'parameter-missing', /Om0/, 'cosmology'],
		['cosmo.at_z', { cosmology: {}, z: 1 }, 'parameter-missing', /H0/, 'cosmology'],
		[
			'cosmo.at_z',
			{ cosmology: { ...planck, H0: 0 }, z: 1 },
			'parameter-out-of-range',
			/more than 0/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { ...planck, Om0: -0.1 }, z: 1 },
			'parameter-out-of-range',
			/at least 0/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { ...planck, Tcmb0: -1 }, z: 1 },
			'parameter-out-of-range',
			/Tcmb0/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { ...planck, w0: 'x' }, z: 1 },
			'parameter-not-a-number',
			/w0/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { ...planck, m_nu: 0.06 }, z: 1 },
			'parameter-not-a-number',
			/m_nu/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { ...planck, m_nu: [-1] }, z: 1 },
			'parameter-out-of-range',
			/m_nu/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { ...planck, m_nu: [0, 0.06] }, z: 1 },
			'neutrino-count',
			/3 species/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { H0: 70, Om0: 0.1, Ode0: 2 }, z: 3 },
			'no-big-bang',
			/Big Bang/,
			'cosmology'
		],
		[
			'cosmo.at_z',
			{ cosmology: { H0: 70, Om0: 2, Ode0: 0 }, z: -0.6 },
			'stops-expanding',
			/−0.5/,
			'z'
		],
		[
			'cosmo.inverse',
			{ cosmology: planck, kind: 'z_from_agee', value: 1 },
			'unknown-choice',
			/“z_from_age”/,
			'kind'
		],
		[
			'cosmo.inverse',
			{ cosmology: planck, kind: 7, value: 1 },
			'unknown-choice',
			/Choose one of|word/,
			'kind'
		],
		[
			'cosmo.inverse',
			{ cosmology: planck, kind: 'z_from_age', value: -1 },
			'out-of-range',
			/at least 0/,
			'value'
		],
		[
			'cosmo.inverse',
			{ cosmology: planck, kind: 'z_from_age', value: 0 },
			'out-of-reach',
			/before this model/,
			'value'
		],
		[
			'cosmo.inverse',
			{ cosmology: planck, kind: 'z_from_age', value: 500 },
			'out-of-reach',
			/at most/,
			'value'
		],
		[
			'cosmo.inverse',
			{ cosmology: planck, kind: 'z_from_lookback', value: 13.8 },
			'out-of-reach',
			/13.7869 Gyr/,
			'value'
		],
		[
			'cosmo.inverse',
			{ cosmology: planck, kind: 'z_from_comoving', value: 14200 },
			'out-of-reach',
			/below/,
			'value'
		],
		[
			'cosmo.inverse',
			{ cosmology: { H0: 70, Om0: 0, Ode0: 1 }, kind: 'z_from_age', value: 1 },
			'no-age',
			/matter/,
			'cosmology'
		],
		['line.observe', { z: 1 }, 'one-of', /none was given/, 'restWavelength_nm'],
		[
			'line.observe',
			{ restWavelength_nm: 1, restEnergy_eV: 1, z: 1 },
			'one-of',
			/were given/,
			'restEnergy_eV'
		],
		[
			'line.observe',
			{ restWavelength_nm: 0, z: 1 },
			'out-of-range',
			/more than 0/,
			'restWavelength_nm'
		],
		[
			'line.redshift',
			{ restWavelength_nm: 500 },
			'one-of',
			/“Wavelength in vacuum, observed”.*none was given/,
			'observedWavelength_nm'
		],
		['line.band', { wavelength_nm: -5 }, 'out-of-range', /more than 0/, 'wavelength_nm'],
		['g21.z_from_frequency', { frequency_MHz: 0 }, 'out-of-range', /more than 0/, 'frequency_MHz'],
		['energy.drop', { height_m: -1, mass_kg: 1 }, 'out-of-range', /at least 0/, 'height_m'],
		[
			'energy.counterweight',
			{ counterweight_kg: 10, projectile_kg: 1, drop_m: 1, climb_m: 9 },
			'too-high',
			/6 m/,
			'climb_m'
		],
		['projectile.vacuum', { v0_ms: 10, angle_deg: 45, h0_m: -12 }, 'too-high', /12 m up/, 'h0_m'],
		[
			'projectile.vacuum',
			{ v0_ms: 100, angle_deg: -10, h0_m: -1 },
			'too-high',
			/Throw faster/,
			'h0_m'
		],
		['energy.convert', { value: 1, from: 'KWH', to: 'J' }, 'unknown-choice', /“kWh”/, 'from'],
		[
			'energy.convert',
			{ value: 1, from: 'J', to: '__proto__' },
			'unknown-choice',
			/Choose one of/,
			'to'
		],
		[
			'energy.convert',
			{ value: 1e300, from: 'foe', to: 'eV' },
			'no-finite-value',
			/finite/,
			undefined
		]
	] as [string, RawInputs, string, RegExp, string | undefined][])(
		'%s %o: %s',
		(id, inputs, code, words, input) => {
			const result = run(id, inputs);
			if (result.ok) throw new Error('no refusal');
			expect(result.refusal.code).toBe(code);
			expect(result.refusal.message).toMatch(words);
			expect(result.refusal.message).toMatch(/[.?]$/);
			expect(result.refusal.input).toBe(input);
		}
	);

	test.each([null, undefined, 7, 'x', []])('%o instead of inputs', (raw) => {
		const result = run('line.band', raw as unknown as RawInputs);
		expect(result).toMatchObject({ ok: false, refusal: { code: 'inputs-broken' } });
	});
});

describe('a reading', () => {
	test('fills what may be left out', () => {
		const result = run('energy.counterweight', {
			counterweight_kg: 1000,
			projectile_kg: 10,
			drop_m: 3
		});
		expect(result.ok && result.outputs.launchSpeed?.value).toBeCloseTo(59.41711874535822, 12);
	});

	test('takes its unit from the input that decides it', () => {
		const result = run('energy.convert', { value: 1, from: 'kgmc2', to: 'MtTNT' });
		expect(result.ok && result.outputs.value).toMatchObject({
			unit: 'MtTNT',
			quantity: 'energy',
			uncertainty: 'exact'
		});
	});

	test('past the good zone carries a warning and is no longer ok', () => {
		const near = run('energy.drop', { height_m: 50, mass_kg: 1 });
		const far = run('energy.drop', { height_m: 51, mass_kg: 1 });
		expect(near).toMatchObject({ ok: true, warnings: [], validity: 'ok' });
		expect(far).toMatchObject({
			ok: true,
			warnings: [{ code: 'air-matters' }],
			validity: 'approximate'
		});
		expect(
			run('energy.counterweight', {
				counterweight_kg: 100,
				projectile_kg: 1,
				drop_m: 1,
				efficiency: 1.2
			})
		).toMatchObject({
			validity: 'outside',
			warnings: [{ code: 'more-than-all' }]
		});
		expect(run('g21.z_from_frequency', { frequency_MHz: 1500 })).toMatchObject({
			ok: true,
			validity: 'outside'
		});
	});

	test('without a value is withheld with a reason, and the rest stand', () => {
		const result = run('cosmo.at_z', { cosmology: planck, z: 0 });
		if (!result.ok) throw new Error(result.refusal.message);
		expect(result.outputs.distmod).toBeUndefined();
		expect(result.withheld?.distmod?.code).toBe('no-distance');
		expect(result.outputs.age?.value).toBeGreaterThan(13);
	});

	test('from inputs that are not exact is not exact', () => {
		const inputs = { restFrequency_Hz: 1420405751.768, z: 19.85 };
		const observe = catalogue.get('line.observe')!;
		const alone = runCalculator(observe, inputs);
		const chained = runCalculator(observe, inputs, { z: 'not-available' });
		expect(alone.ok && alone.outputs.observedFrequency?.uncertainty).toBe('exact');
		expect(chained.ok && chained.outputs.observedFrequency?.uncertainty).toBe('not-available');
	});
});

describe('a calculator’s own faults surface', () => {
	const sound = catalogue.get('line.band')!;
	const faulty = (change: Partial<CalculatorDefinition>) =>
		defineCalculator({ ...sound, ...change });

	test('a throw inside compute is thrown on', () => {
		const calculator = faulty({
			compute() {
				throw new TypeError('a bug');
			}
		});
		expect(() => runCalculator(calculator, { wavelength_nm: 1 })).toThrow('a bug');
	});

	test('a missing output and an undeclared warning are thrown', () => {
		const silent = faulty({ compute: () => ({ ok: true, values: {} }) });
		expect(() => runCalculator(silent, { wavelength_nm: 1 })).toThrow('band');
		const alarmed = faulty({
			compute: () => ({ ok: true, values: { band: 'x' }, warnings: ['fire'] })
		});
		expect(() => runCalculator(alarmed, { wavelength_nm: 1 })).toThrow('fire');
	});

	test('unknown units and warnings are named when a calculator is defined', () => {
		const spec = sound.inputs.wavelength_nm!;
		expect(() =>
			faulty({ inputs: { wavelength_nm: { ...spec, unit: 'Nm' } as typeof spec } })
		).toThrow('Nm');
		expect(() =>
			faulty({
				inputs: {
					wavelength_nm: { ...spec, good: { min: 0, max: 1, warning: 'w' } } as typeof spec
				}
			})
		).toThrow('“w”');
		expect(() => faulty({ oneOf: [['nowhere']] })).toThrow('nowhere');
	});
});

describe('any input at all', () => {
	const anything = fc.oneof(
		fc.double(),
		fc.string(),
		fc.boolean(),
		fc.constant(null),
		fc.array(fc.double(), { maxLength: 3 }),
		fc.dictionary(fc.string({ maxLength: 5 }), fc.double(), { maxKeys: 3 }),
		fc.constantFrom<unknown>(planck, { H0: 70, Om0: 0.3 }, 'z_from_age', 'J', 1e-300, 1e300, -0)
	);

	test.each([...catalogue.values()].map((calculator) => [calculator.id, calculator] as const))(
		'%s answers with finite numbers or a sentence',
		(_id, calculator) => {
			const inputs = fc.record(
				Object.fromEntries(Object.keys(calculator.inputs).map((key) => [key, anything])),
				{ requiredKeys: [] }
			);
			fc.assert(
				fc.property(inputs, (raw) => {
					const result = runCalculator(calculator, raw);
					if (result.ok) {
						for (const { value } of Object.values(result.outputs)) {
							if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true);
						}
					} else {
						expect(result.refusal.message.length).toBeGreaterThan(20);
					}
				}),
				{ seed: 2026, numRuns: 400 }
			);
		}
	);

	test.each([...catalogue.values()].map((calculator) => [calculator.id, calculator] as const))(
		'%s answers all over its declared ranges',
		(_id, calculator) => {
			fc.assert(
				fc.property(inputsAllOver(calculator), (raw) => {
					const result = runCalculator(calculator, raw);
					if (!result.ok) expect(result.refusal.message).toMatch(/[.?]$/);
				}),
				{ seed: 4620, numRuns: 400 }
			);
		},
		60_000 // four hundred thermal histories of ten milliseconds, on a machine that may be busy
	);
});
