import { describe, expect, test } from 'vitest';
import { defineCalculator, type Calculator, type CalculatorSet } from '../physics/calculator.ts';
import { catalogue } from '../physics/calculators/index.ts';
import { generatorFrom } from '../physics/uncertainty/generator.ts';
import { firstLight } from '../server/demo/first-light.ts';
import type { SettingSource, Step } from './document.ts';
import { evaluate, readingAt, type Wired } from './evaluate.ts';
import { evaluateUncertainty, readingWithUncertainty } from './evaluate-uncertainty.ts';

type Ref = { step: string; output: string };

const fixed = (value: string | number | Record<string, unknown>): SettingSource => ({
	from: 'fixed',
	value
});
const reading = (step: string, output: string): SettingSource => ({
	from: 'reading',
	step,
	output
});
function step(id: string, calculator: string, settings: Step['settings']): Step {
	return { id, calculator, revision: '1.0.0', settings };
}

const planck = fixed({ set: 'Planck18' });

/** An age in Gyr to a redshift, and the redshift to everything, both in Planck 2018. */
function chain(ageGyr: number, cosmology = planck): Wired {
	return {
		formulas: [],
		controls: [],
		steps: [
			step('redshift', 'cosmo.inverse', {
				cosmology,
				kind: fixed('z_from_age'),
				value: fixed(ageGyr)
			}),
			step('universe', 'cosmo.at_z', { cosmology, z: reading('redshift', 'z') })
		]
	};
}

function noteOf(wired: Wired, ref: Ref, calculators: CalculatorSet = catalogue) {
	return evaluateUncertainty(wired, evaluate(wired, {}, calculators), ref, calculators);
}

function uncertaintyOf(wired: Wired, ref: Ref, calculators: CalculatorSet = catalogue): number {
	const { uncertainty } = noteOf(wired, ref, calculators);
	if (typeof uncertainty !== 'number') throw new Error(`no number: ${uncertainty}`);
	return uncertainty;
}

function valueOf(wired: Wired, ref: Ref): number {
	const outcome = readingAt(wired, evaluate(wired, {}, catalogue), ref, catalogue);
	if (!outcome.ok) throw new Error(outcome.refusal.message);
	return outcome.reading.value as number;
}

describe('a chain whose steps share a parameter set', () => {
	// The age that was put in comes out again, whatever the parameters are.
	test('an age sent to a redshift and back is exact', () => {
		const wired = chain(1);
		expect(uncertaintyOf(wired, { step: 'redshift', output: 'z' })).toBeGreaterThan(0.005);
		expect(noteOf(wired, { step: 'universe', output: 'age' })).toEqual({ uncertainty: 'exact' });
	});

	// Time since then = age now − the age put in, so it is as uncertain as the age now: 0.0219 Gyr from this fit.
	test('the time since an exact age is as uncertain as the age now', () => {
		const now: Wired = {
			formulas: [],
			controls: [],
			steps: [step('universe', 'cosmo.at_z', { cosmology: planck, z: fixed(1e-9) })]
		};
		const ageNow = uncertaintyOf(now, { step: 'universe', output: 'age' });
		const since = uncertaintyOf(chain(1), { step: 'universe', output: 'lookback' });
		expect(since).toBeCloseTo(ageNow, 6);
	});

	test('agrees with brute force over the whole wiring, where adding step by step does not', () => {
		const ref = { step: 'universe', output: 'comoving_distance' };
		const carried = uncertaintyOf(chain(1), ref);

		// Planck 2018 VI: 67.66 ± 0.42, 0.0056; 2.7255 ± 0.0006 K (Fixsen 2009); correlation −0.98 (from memory).
		const draws = 2000;
		const generator = generatorFrom('brute force');
		const sample = Array.from({ length: draws }, () => {
			const a = generator.normal();
			const b = -0.98 * a + Math.sqrt(1 - 0.98 ** 2) * generator.normal();
			const cosmology = fixed({
				set: 'Planck18',
				H0: 67.66 + 0.42 * a,
				Om0: 0.30966 + 0.0056 * b,
				Tcmb0: 2.7255 + 0.0006 * generator.normal()
			});
			return valueOf(chain(1, cosmology), ref);
		});
		const mean = sample.reduce((sum, value) => sum + value, 0) / draws;
		const brute = Math.sqrt(
			sample.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (draws - 1)
		);
		expect(Math.abs(carried / brute - 1)).toBeLessThan(5 / Math.sqrt(2 * draws));

		// Step by step: the distance at a fixed redshift, and the redshift's own share, as if they had nothing in common.
		const z = valueOf(chain(1), { step: 'redshift', output: 'z' });
		const at = (redshift: number): Wired => ({
			formulas: [],
			controls: [],
			steps: [step('universe', 'cosmo.at_z', { cosmology: planck, z: fixed(redshift) })]
		});
		const uz = uncertaintyOf(chain(1), { step: 'redshift', output: 'z' });
		const share = (valueOf(at(z + uz), ref) - valueOf(at(z - uz), ref)) / 2;
		const naive = Math.hypot(uncertaintyOf(at(z), ref), share);
		expect(Math.abs(naive / brute - 1)).toBeGreaterThan(5 / Math.sqrt(2 * draws));
	});
});

describe('the published age', () => {
	const age = { step: 'universe', output: 'age' };
	const now = step('universe', 'cosmo.at_z', { cosmology: planck, z: fixed(0) });

	test('goes on through a chain with its published uncertainty', () => {
		const wired: Wired = {
			formulas: [],
			controls: [],
			steps: [
				now,
				step('left', 'decay.halflife', {
					t: reading('universe', 'age'),
					halflife: fixed(10),
					unit: fixed('Gyr')
				})
			]
		};
		// 2^(−t/T) with T = 10 Gyr: u = y·ln 2·u(t)/T, u(t) = 0.020 Gyr (Planck 2018 VI, table 2).
		const y = valueOf(wired, { step: 'left', output: 'remaining' });
		const u = uncertaintyOf(wired, { step: 'left', output: 'remaining' });
		expect(u / ((y * Math.LN2 * 0.02) / 10)).toBeCloseTo(1, 4);
	});

	test('stands alone too, and is never 0.11 Gyr', () => {
		const wired: Wired = { formulas: [], controls: [], steps: [now] };
		const outcome = readingWithUncertainty(wired, evaluate(wired, {}, catalogue), age, catalogue);
		expect(outcome).toMatchObject({ ok: true, reading: { uncertainty: 0.02 } });
	});

	test('gives way to the fit where the chain takes more of it', () => {
		// The redshift at which the universe was as old as it is now: 0, however the parameters move.
		const wired: Wired = {
			formulas: [],
			controls: [],
			steps: [
				now,
				step('back', 'cosmo.inverse', {
					cosmology: planck,
					kind: fixed('z_from_age'),
					value: reading('universe', 'age')
				})
			]
		};
		expect(noteOf(wired, { step: 'back', output: 'stretch' })).toEqual({ uncertainty: 'exact' });
	});
});

describe('what can’t be carried says why', () => {
	test('a universe set by hand, a set whose parameters aren’t tied', () => {
		const ref = { step: 'universe', output: 'lookback' };
		expect(noteOf(chain(1, fixed({ set: 'Planck18', H0: 73 })), ref)).toMatchObject({
			uncertainty: 'not-available',
			uncertaintyNote: expect.stringMatching(/by hand/)
		});
		expect(noteOf(chain(1, fixed({ set: 'Planck15' })), ref)).toMatchObject({
			uncertainty: 'not-available',
			uncertaintyNote: expect.stringMatching(/together/)
		});
	});

	test('two steps that rest on measured constants, unless one hardly counts', () => {
		const calculators: CalculatorSet = new Map(
			[measured('test.good', 0.01), measured('test.fine', 1e-6)].map((one) => [one.id, one])
		);
		const wired = (first: string): Wired => ({
			formulas: [],
			controls: [],
			steps: [
				step('first', first, { x: fixed(2) }),
				step('second', 'test.good', { x: reading('first', 'y') })
			]
		});
		const ref = { step: 'second', output: 'y' };
		expect(noteOf(wired('test.good'), ref, calculators)).toMatchObject({
			uncertainty: 'not-available',
			uncertaintyNote: expect.stringMatching(/constants/)
		});
		expect(uncertaintyOf(wired('test.fine'), ref, calculators)).toBeCloseTo(0.02, 6);
	});
});

/** Gives back what it takes, with a constant of this relative uncertainty in between. */
function measured(id: string, relative: number): Calculator {
	return defineCalculator({
		id,
		revision: '1.0.0',
		title: 'Measured',
		purpose: 'Multiplies by a measured one.',
		asks: [],
		notFor: [],
		inputs: {
			x: { kind: 'number', label: 'x', quantity: 'number', unit: '', min: -10, max: 10, initial: 1 }
		},
		outputs: { y: { label: 'y', quantity: 'number', unit: '' } },
		equations: [],
		assumptions: [],
		warnings: [],
		sources: [],
		checks: [],
		history: [],
		compute: ({ x }) => ({ ok: true, values: { y: x }, uncertainties: { y: relative * x } })
	});
}

describe('the piece of the demo', () => {
	const evaluation = evaluate(firstLight, {}, catalogue);
	const frequency = { step: 'line', output: 'observedFrequency' };

	test('the frequency carries the fit, and the slider’s evaluation stays as it was', () => {
		const plain = readingAt(firstLight, evaluation, frequency, catalogue);
		const carried = readingWithUncertainty(firstLight, evaluation, frequency, catalogue);
		if (!plain.ok || !carried.ok) throw new Error('both read');
		expect(plain.reading.uncertainty).toBe('not-available');
		expect(carried.reading.value).toBe(plain.reading.value);
		// ν ∝ 1/(1+z), so its relative uncertainty is that of the stretch.
		const stretch = readingWithUncertainty(
			firstLight,
			evaluation,
			{ step: 'age', output: 'stretch' },
			catalogue
		);
		if (!stretch.ok) throw new Error('it reads');
		const relative = ({ value, uncertainty }: { value: unknown; uncertainty: unknown }) =>
			(uncertainty as number) / (value as number);
		expect(relative(carried.reading) / relative(stretch.reading)).toBeCloseTo(1, 2);
		expect(relative(carried.reading)).toBeLessThan(0.01);
	});

	test('a setting that takes a reading is as uncertain as it; others and sliders are exact', () => {
		const at = (ref: Parameters<typeof evaluateUncertainty>[2]) =>
			evaluateUncertainty(firstLight, evaluation, ref, catalogue).uncertainty;
		expect(at({ step: 'line', setting: 'z' })).toBe(at({ step: 'age', output: 'z' }));
		expect(at({ step: 'line', setting: 'restFrequency_Hz' })).toBe('exact');
		expect(at({ control: 'wave-age' })).toBe('exact');
	});

	test('asking twice gives the same', () => {
		const ask = () => evaluateUncertainty(firstLight, evaluation, frequency, catalogue);
		expect(ask()).toEqual(ask());
	});
});
