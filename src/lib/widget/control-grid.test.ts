import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { Control, type LogSlider, type OptionControl } from './control.ts';
import {
	nearestSetting,
	settingAt,
	settingFrom,
	settingsAcross,
	settleValue,
	stepOf,
	stepsOf
} from './control-grid.ts';

const log: LogSlider = {
	kind: 'log-slider',
	id: 'mass',
	label: 'Mass',
	unit: 'kg',
	min: 0.1,
	max: 1000,
	perDecade: 10,
	initial: 1
};
const choice: OptionControl = {
	kind: 'choice',
	id: 'line',
	label: 'Line',
	unit: 'nm',
	options: [
		{ label: 'Lyman-alpha', value: 121.567 },
		{ label: 'H-alpha', value: 656.28 }
	],
	initial: 1
};

describe('a logarithmic slider', () => {
	test('goes from end to end in equal factors, kept to three figures', () => {
		expect(stepsOf(log)).toBe(40);
		expect([0, 1, 10, 13, 40].map((step) => settingAt(log, step))).toEqual([
			0.1, 0.126, 1, 2, 1000
		]);
	});

	test('every setting leads back to its own step', () => {
		fc.assert(
			fc.property(
				fc.integer({ min: -30, max: 30 }),
				fc.integer({ min: 1, max: 12 }),
				fc.integer({ min: 1, max: 100 }),
				fc.double({ min: 0, max: 1, noNaN: true }),
				(power, decades, perDecade, share) => {
					const slider = {
						...log,
						min: Number(`1e${power}`),
						max: Number(`1e${power + decades}`),
						perDecade
					};
					const step = Math.round(share * stepsOf(slider));
					expect(stepOf(slider, settingAt(slider, step))).toBe(step);
				}
			)
		);
	});
});

describe('options', () => {
	test('stand at their index, and give a setting their value', () => {
		expect(settingFrom(choice, 0)).toBe(121.567);
		expect(settingsAcross(choice, 11)).toEqual([0, 1]);
		expect([-3, 0.4, 9, NaN].map((value) => settleValue(choice, value))).toEqual([0, 0, 1, 1]);
	});

	test('are all numbers or all words', () => {
		const mixed = { ...choice, options: [choice.options[0], { label: 'none', value: 'none' }] };
		expect(Control.safeParse(mixed).error?.issues[0]?.message).toMatch(/all numbers or all words/);
	});

	test('start at one of them', () => {
		expect(Control.safeParse({ ...choice, initial: 2 }).success).toBe(false);
	});
});

test('no value leads out of any control', () => {
	const slider = { ...log, kind: 'slider' as const, step: 0.3, perDecade: undefined };
	const field = { ...slider, kind: 'number' as const };
	fc.assert(
		fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
			for (const control of [log, slider, field]) {
				const near = nearestSetting(control, value);
				expect(near).toBeGreaterThanOrEqual(0.1);
				expect(near).toBeLessThanOrEqual(1000);
			}
			expect([0, 1]).toContain(nearestSetting(choice, value));
		})
	);
});
