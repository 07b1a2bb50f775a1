import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import { LAUNCHER_CAUTION } from '../energy/caution.ts';
import { gravityInput } from '../energy/gravity.ts';
import { openStax, STANDARD_GRAVITY_SOURCE } from '../sources.ts';
import { printNumber } from '../wording.ts';
import {
	AT_SOUND,
	densityInput,
	dragCoefficientInput,
	machWarnings,
	NEAR_SOUND,
	STANDARD_ATMOSPHERE
} from './air.ts';
import { landingOf } from './drag-path.ts';
import { checksOf } from '../published-checks.ts';

/**
 * Flight of a ball through still air, drag with the square of the speed: range and apex in m, time in s, speeds in m/s, to
 * about 1 part in 10⁸ of the model. Refuses a target above the top of the path.
 */
export const drag = defineCalculator({
	id: 'projectile.drag',
	revision: '1.0.0',
	title: 'Flight through air',
	purpose: 'A ball is thrown through still air: how far, how high and how long does it fly?',
	asks: [
		'How far does it fly in air?',
		'How much does air take from the range?',
		'How fast does it come down?'
	],
	notFor: [
		'Balls that spin, or anything with wings.',
		'Speeds near that of sound.',
		'Aiming at anything.'
	],
	inputs: {
		v0_ms: {
			kind: 'number',
			label: 'Speed at release',
			symbol: 'v_0',
			quantity: 'speed',
			unit: 'm/s',
			min: 0,
			max: 2000,
			good: { min: 0, max: 102, warning: NEAR_SOUND.code },
			initial: 50
		},
		angle_deg: {
			kind: 'number',
			label: 'Angle above the horizontal',
			symbol: 'α',
			quantity: 'angle',
			unit: 'deg',
			min: -90,
			max: 90,
			initial: 45
		},
		mass_kg: {
			kind: 'number',
			label: 'Mass',
			symbol: 'm',
			quantity: 'mass',
			unit: 'kg',
			min: 1e-6,
			max: 1e6,
			initial: 0.145,
			log: true
		},
		diameter_m: {
			kind: 'number',
			label: 'Diameter',
			symbol: 'd',
			quantity: 'diameter',
			unit: 'm',
			min: 1e-5,
			max: 100,
			initial: 0.0732,
			log: true
		},
		Cd: dragCoefficientInput(0.35),
		rho: densityInput,
		h0_m: {
			kind: 'number',
			label: 'Height of the release above the landing',
			symbol: 'h_0',
			quantity: 'height',
			unit: 'm',
			min: -1e4,
			max: 1e4,
			initial: 0,
			optional: true
		},
		g_ms2: gravityInput
	},
	outputs: {
		range: { label: 'Range', symbol: 'R', quantity: 'range', unit: 'm' },
		time: { label: 'Time of flight', symbol: 't', quantity: 'duration', unit: 's' },
		apex: { label: 'Highest point above the landing', quantity: 'height', unit: 'm' },
		impactSpeed: { label: 'Speed at the landing', quantity: 'speed', unit: 'm/s' },
		terminalSpeed: {
			label: 'Speed of a long, steady fall',
			symbol: 'v_t',
			quantity: 'speed',
			unit: 'm/s'
		}
	},
	equations: [
		{
			tex: '\\dot{\\vec v} = -g\\,\\hat y - k\\,v\\,\\vec v,\\qquad k = \\frac{\\pi\\,\\rho\\,C_d\\,d^2}{8\\,m}',
			says: 'Gravity pulls down, and air brakes along the path with the square of the speed.'
		},
		{
			tex: 'v_t = \\sqrt{g/k}',
			says: 'Where the two are even, the fall goes on at a steady speed.'
		}
	],
	assumptions: [
		'Still air of one density, a round body without spin, and a drag coefficient that stays the same.',
		'Flat ground and the same gravity all along.'
	],
	warnings: [
		NEAR_SOUND,
		AT_SOUND,
		{
			code: 'thin-air',
			message: 'So high up the air is thinner than at the ground, and brakes less than this says.',
			when: 'flight higher than 1000 m',
			validity: 'approximate'
		}
	],
	caution: LAUNCHER_CAUTION,
	sources: [
		openStax(1, '§6.4, drag force and terminal speed'),
		{
			title: 'Dormand & Prince 1980, J. Comput. Appl. Math. 6, 19',
			locator: 'the method of solution',
			doi: '10.1016/0771-050X(80)90013-3',
			fromMemory: true
		},
		STANDARD_ATMOSPHERE,
		STANDARD_GRAVITY_SOURCE
	],
	checks: checksOf('projectile.drag'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ v0_ms, angle_deg, mass_kg, diameter_m, Cd, rho, h0_m, g_ms2 }): Computed {
		const k = (Math.PI * rho * Cd * diameter_m ** 2) / (8 * mass_kg);
		const terminalSpeed = Math.sqrt(g_ms2 / k);
		// Speeds in units of the throw, or of the fall where nothing is thrown; lengths in that squared over g.
		const speed = Math.max(v0_ms, Math.sqrt(2 * g_ms2 * Math.abs(h0_m)));
		if (speed === 0) {
			const still = { range: 0, time: 0, apex: 0, impactSpeed: 0, terminalSpeed };
			return { ok: true, values: still };
		}
		const length = speed ** 2 / g_ms2;
		const angle = (angle_deg * Math.PI) / 180;
		const away = ((90 - Math.abs(angle_deg)) * Math.PI) / 180;
		const flown = landingOf({
			height: h0_m / length,
			along: (v0_ms / speed) * Math.sin(away),
			up: (v0_ms / speed) * Math.sin(angle),
			drag: k * length
		});
		if (flown.by === 'short') {
			return refuse(
				'too-high',
				`The target lies ${printNumber(-h0_m)} m up, and this throw climbs ${printNumber(flown.apex * length - h0_m)} m. Throw faster or steeper, or lower the target.`,
				'h0_m'
			);
		}
		if (flown.by === 'lost') {
			return refuse(
				'not-followed',
				'Air stops this body so abruptly that its path can’t be followed. Take a heavier or smaller one.',
				'mass_kg'
			);
		}
		const { landing } = flown;
		const values = {
			range: landing.range * length,
			time: (landing.time * speed) / g_ms2,
			apex: landing.apex * length,
			impactSpeed: landing.speed * speed,
			terminalSpeed
		};
		return {
			ok: true,
			values,
			warnings: [
				...machWarnings(Math.max(v0_ms, values.impactSpeed)),
				...(Math.abs(values.apex) > 1000 ? ['thin-air'] : [])
			]
		};
	}
});
