import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { sameDrop } from '../server/demo/same-drop.ts';
import { evaluate, readingAt, sampleChart, valueIn } from './evaluate.ts';
import type { WidgetDocument } from './document.ts';

const frequency = { step: 'line', output: 'observedFrequency' };

/** Frequency today in MHz of a 21 cm wave that left at an age of the Universe in Myr. */
function frequencyMHz(ageMyr: number): number | null {
	const evaluation = evaluate(firstLight, { 'wave-age': ageMyr }, catalogue);
	return valueIn(readingAt(firstLight, evaluation, frequency, catalogue), 'MHz');
}

describe('a chain of two calculators', () => {
	// z of an age of 0.18 Gyr in the Planck 2018 set: 19.853586757207786 (50-digit quadrature of the Friedmann
	// equation, tests/references); 1420.405751768 MHz (Hellwig et al. 1970) divided by 1 + z.
	test('180 million years arrives at 1420.4 MHz ÷ 20.85', () => {
		expect(frequencyMHz(180)).toBeCloseTo(1420.405751768 / 20.853586757207786, 9);
	});

	test('units of the control are converted to those of the setting', () => {
		expect(frequencyMHz(270)).toBeGreaterThan(88);
		expect(frequencyMHz(270)).toBeLessThan(90);
	});

	test('a value outside the control is brought to its end', () => {
		expect(frequencyMHz(9000)).toBe(frequencyMHz(500));
		expect(frequencyMHz(Number.NaN)).toBe(frequencyMHz(180));
	});
});

test('the speed at the wall doesn’t hang on the path', () => {
	const evaluation = evaluate(sameDrop, {}, catalogue);
	const speed = (step: string) =>
		valueIn(readingAt(sameDrop, evaluation, { step, output: 'impactSpeed' }, catalogue), 'm/s');
	// √(2·(6000·g·8 − 60·g·12)/60) with g = 9.80665 m/s² (CGPM 1901).
	expect(speed('flat')).toBeCloseTo(Math.sqrt((2 * 9.80665 * (6000 * 8 - 60 * 12)) / 60), 9);
	expect(speed('lofted')).toBeCloseTo(speed('flat') ?? 0, 9);
});

test('a refusal is handed down with its first cause', () => {
	const late: WidgetDocument = {
		...firstLight,
		controls: firstLight.controls.map((control) => ({ ...control, min: -5, initial: -5 }))
	};
	const evaluation = evaluate(late, {}, catalogue);
	const first = evaluation.steps.age;
	const outcome = readingAt(late, evaluation, frequency, catalogue);
	expect(first?.ok).toBe(false);
	expect(outcome).toEqual(first);
});

test('settings and controls read as exact', () => {
	const evaluation = evaluate(firstLight, {}, catalogue);
	expect(
		readingAt(firstLight, evaluation, { step: 'line', setting: 'restFrequency_Hz' }, catalogue)
	).toMatchObject({
		ok: true,
		reading: { value: 1420405751.768, unit: 'Hz', uncertainty: 'exact' }
	});
	expect(readingAt(firstLight, evaluation, { control: 'wave-age' }, catalogue)).toMatchObject({
		ok: true,
		reading: { value: 180, unit: 'Myr', uncertainty: 'exact' }
	});
});

test('a chart’s line agrees with the readings at its ends', () => {
	const chart = firstLight.blocks.find((block) => block.kind === 'chart');
	if (chart?.kind !== 'chart' || chart.form !== 'line') throw new Error('the piece has a chart');
	const [line = []] = sampleChart(firstLight, {}, chart, catalogue);
	expect(line[0]).toEqual({ x: 100, y: frequencyMHz(100) });
	expect(line.at(-1)).toEqual({ x: 500, y: frequencyMHz(500) });
	expect(line.every(({ y }, index) => index === 0 || (y ?? 0) > (line[index - 1]?.y ?? 0))).toBe(
		true
	);
});

test('a reading that rests on an uncertain one is not exact', () => {
	const evaluation = evaluate(firstLight, {}, catalogue);
	const outcome = readingAt(firstLight, evaluation, frequency, catalogue);
	expect(outcome.ok && outcome.reading.uncertainty).toBe('not-available');
});

test('an output with no value for these inputs says why', () => {
	const here: WidgetDocument = {
		...firstLight,
		steps: [
			{
				id: 'now',
				calculator: 'cosmo.at_z',
				revision: '1.0.0',
				settings: {
					cosmology: { from: 'fixed', value: { set: 'Planck18' } },
					z: { from: 'fixed', value: 0 }
				}
			}
		]
	};
	const modulus = readingAt(
		here,
		evaluate(here, {}, catalogue),
		{ step: 'now', output: 'distmod' },
		catalogue
	);
	expect(modulus.ok ? '' : modulus.refusal.code).not.toBe('missing-output');
	expect(modulus.ok).toBe(false);
});
