import { defineCalculator, type Computed } from '../../calculator.ts';
import { gravityInput } from './gravity.ts';
import { checksOf } from '../published-checks.ts';

/**
 * A body let down by a height (m, 0 to 10⁴): energy mgh in J, speed √(v₀² + 2gh) in m/s, and for a straight fall the
 * time in s. No air, no friction, even gravity.
 */
export const drop = defineCalculator({
	id: 'energy.drop',
	revision: '1.0.0',
	title: 'Energy of a drop',
	purpose:
		'A body comes down by a height: what energy does it gain, and how fast is it at the bottom?',
	asks: [
		'How much energy is in a falling weight?',
		'How fast does it hit the ground?',
		'How long does it fall?'
	],
	notFor: ['Falls through air at more than a few tens of metres.', 'Whether a fall is survivable.'],
	inputs: {
		height_m: {
			kind: 'number',
			label: 'Height of the drop',
			symbol: 'h',
			quantity: 'height',
			unit: 'm',
			min: 0,
			max: 1e4,
			good: { min: 0, max: 50, warning: 'air-matters' },
			initial: 10
		},
		mass_kg: {
			kind: 'number',
			label: 'Mass',
			symbol: 'm',
			quantity: 'mass',
			unit: 'kg',
			min: 0,
			minExclusive: true,
			max: 1e12,
			initial: 1,
			log: true
		},
		v0_ms: {
			kind: 'number',
			label: 'Speed at the start, downwards',
			symbol: 'v_0',
			quantity: 'speed',
			unit: 'm/s',
			min: 0,
			max: 1e4,
			initial: 0,
			optional: true
		},
		g_ms2: gravityInput
	},
	outputs: {
		energy: { label: 'Energy gained', symbol: 'E', quantity: 'energy', unit: 'J' },
		impactSpeed: { label: 'Speed at the bottom', symbol: 'v', quantity: 'speed', unit: 'm/s' },
		fallTime: { label: 'Time of a straight fall', symbol: 't', quantity: 'duration', unit: 's' }
	},
	equations: [
		{
			tex: 'E = m g h',
			says: 'Coming down by a height gives the same energy whatever the way down.'
		},
		{
			tex: 'v = \\sqrt{v_0^2 + 2 g h}',
			says: 'So the speed at the bottom is the same on a ramp, a loop or in free fall.'
		},
		{
			tex: 't = \\frac{v - v_0}{g}',
			says: 'Only the time depends on the way; this is that of a straight fall.'
		}
	],
	assumptions: [
		'No air and no friction.',
		'Nothing rolls: a rolling body keeps part of the energy in its spin.',
		'Gravity is the same all the way down.'
	],
	warnings: [
		{
			code: 'air-matters',
			message: 'From more than 50 metres air resistance matters: a real fall ends slower.',
			when: 'height above 50 m',
			validity: 'approximate'
		}
	],
	sources: [
		{
			title: 'OpenStax 2016, University Physics, volume 1',
			locator: '§8.3, conservation of energy',
			fromMemory: true
		},
		{
			title: 'Standard acceleration of gravity, 3rd CGPM 1901; CODATA 2018',
			locator: '9.806 65 m/s²'
		}
	],
	checks: checksOf('energy.drop'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ height_m: h, mass_kg: m, v0_ms: v0, g_ms2: g }): Computed {
		const impactSpeed = Math.sqrt(v0 * v0 + 2 * g * h);
		return {
			ok: true,
			values: {
				energy: m * g * h,
				impactSpeed,
				// 2h/(v + v₀) is (v − v₀)/g without the loss of digits in a short, fast drop.
				fallTime: h === 0 ? 0 : (2 * h) / (impactSpeed + v0)
			},
			uncertainties: { energy: 'exact', impactSpeed: 'exact', fallTime: 'exact' }
		};
	}
});
