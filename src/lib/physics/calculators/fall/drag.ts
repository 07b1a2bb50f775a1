import { defineCalculator, type Computed } from '../../calculator.ts';
import { gravityInput } from '../energy/gravity.ts';
import {
	AT_SOUND,
	densityInput,
	dragCoefficientInput,
	machWarnings,
	NEAR_SOUND,
	STANDARD_ATMOSPHERE
} from '../projectile/air.ts';
import { openStax, STANDARD_GRAVITY_SOURCE } from '../sources.ts';
import { checksOf } from '../published-checks.ts';

/**
 * A straight fall from rest through still air after a time in s: speed v_t tanh(gt/v_t) in m/s, distance
 * (v_t²/g) ln cosh(gt/v_t) in m.
 */
export const fallDrag = defineCalculator({
	id: 'fall.drag',
	revision: '1.0.0',
	title: 'Fall through air',
	purpose: 'A body is let go in still air: how fast is it after a while, and how far has it come?',
	asks: [
		'What is the terminal speed?',
		'How fast does a coin from a tower come down?',
		'Does the heavier one fall faster?'
	],
	notFor: [
		'Parachutes that open on the way.',
		'Whether a fall is survivable.',
		'Falls of many kilometres.'
	],
	inputs: {
		mass_kg: {
			kind: 'number',
			label: 'Mass',
			symbol: 'm',
			quantity: 'mass',
			unit: 'kg',
			min: 0,
			minExclusive: true,
			max: 1e9,
			initial: 80,
			log: true
		},
		rho: densityInput,
		Cd: dragCoefficientInput(1),
		area_m2: {
			kind: 'number',
			label: 'Area seen from below',
			symbol: 'A',
			quantity: 'area',
			unit: 'm2',
			min: 0,
			minExclusive: true,
			max: 1e6,
			initial: 0.7,
			log: true
		},
		t_s: {
			kind: 'number',
			label: 'Time since it was let go',
			symbol: 't',
			quantity: 'duration',
			unit: 's',
			min: 0,
			max: 1e5,
			initial: 5
		},
		g_ms2: gravityInput
	},
	outputs: {
		speed: { label: 'Speed', symbol: 'v', quantity: 'speed', unit: 'm/s' },
		distance: { label: 'Distance fallen', symbol: 'y', quantity: 'height', unit: 'm' },
		terminalSpeed: {
			label: 'Speed it tends to',
			symbol: 'v_t',
			quantity: 'speed',
			unit: 'm/s'
		}
	},
	equations: [
		{
			tex: 'v_t = \\sqrt{\\frac{2 m g}{\\rho\\,C_d A}}',
			says: 'Heavier bodies of one shape have a higher limit: that is why they fall faster in air.'
		},
		{
			tex: 'v = v_t \\tanh\\frac{g t}{v_t},\\qquad y = \\frac{v_t^2}{g}\\,\\ln\\cosh\\frac{g t}{v_t}',
			says: 'It starts as in a vacuum and settles to the limit.'
		}
	],
	assumptions: [
		'Let go at rest; still air of one density; a drag coefficient that stays the same.',
		'The same gravity all the way down.'
	],
	warnings: [
		NEAR_SOUND,
		AT_SOUND,
		{
			code: 'thin-air',
			message: 'Over so long a fall the air is not of one density; high up it brakes less.',
			when: 'distance above 1000 m',
			validity: 'approximate'
		}
	],
	sources: [
		openStax(1, '§6.4, drag force and terminal speed'),
		STANDARD_ATMOSPHERE,
		STANDARD_GRAVITY_SOURCE
	],
	checks: checksOf('fall.drag'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ mass_kg, rho, Cd, area_m2, t_s, g_ms2 }): Computed {
		const terminalSpeed = Math.sqrt((2 * mass_kg * g_ms2) / (rho * Cd * area_m2));
		const x = (g_ms2 * t_s) / terminalSpeed;
		const values = {
			speed: terminalSpeed * Math.tanh(x),
			distance: (terminalSpeed ** 2 / g_ms2) * lnCosh(x),
			terminalSpeed
		};
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: [...machWarnings(values.speed), ...(values.distance > 1000 ? ['thin-air'] : [])]
		};
	}
});

/** ln cosh x for x of 0 and more: in the form that keeps its digits on either side. */
function lnCosh(x: number): number {
	return x < 1 ? 0.5 * Math.log1p(Math.sinh(x) ** 2) : x - Math.LN2 + Math.log1p(Math.exp(-2 * x));
}
