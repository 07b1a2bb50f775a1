import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import { cosineOfDegrees, sineOfDegrees } from '../../numerics/degrees.ts';
import { LAUNCHER_CAUTION } from '../energy/caution.ts';
import { gravityInput } from '../energy/gravity.ts';
import { printNumber } from '../wording.ts';
import { checksOf } from '../published-checks.ts';

/** One hundredth of the Earth's nominal radius: past it, flat ground and even gravity no longer hold. */
const FLAT_GROUND_M = 63_781;

/**
 * Flight without air from a height above (or below) the landing level: range and apex in m, time in s, speed at the
 * end in m/s, and the angle of the longest range in degrees. Refuses a target above the top of the path.
 */
export const vacuum = defineCalculator({
	id: 'projectile.vacuum',
	revision: '1.0.0',
	title: 'Flight without air',
	purpose: 'A body is thrown at a speed and an angle: how far, how high and how long does it fly?',
	asks: ['How far does it fly?', 'How fast does it come down?', 'Which angle carries farthest?'],
	notFor: ['Anything light or fast enough for air to matter.', 'Aiming at anything.'],
	inputs: {
		v0_ms: {
			kind: 'number',
			label: 'Speed at release',
			symbol: 'v_0',
			quantity: 'speed',
			unit: 'm/s',
			min: 0,
			max: 1e4,
			good: { min: 0, max: 50, warning: 'air-matters' },
			initial: 30
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
		h0_m: {
			kind: 'number',
			label: 'Height of the release above the landing',
			symbol: 'h_0',
			quantity: 'height',
			unit: 'm',
			min: -1e5,
			max: 1e5,
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
		bestAngle: { label: 'Angle of the longest range', quantity: 'angle', unit: 'deg' }
	},
	equations: [
		{
			tex: 't = \\frac{v_0\\sin\\alpha + \\sqrt{v_0^2\\sin^2\\alpha + 2 g h_0}}{g}, \\qquad R = v_0\\cos\\alpha\\;t',
			says: 'The upward speed decides how long it flies, the sideways speed how far it gets meanwhile.'
		},
		{
			tex: 'v = \\sqrt{v_0^2 + 2 g h_0}',
			says: 'The speed at the landing is the same for every path.'
		},
		{
			tex: '\\tan\\alpha_\\mathrm{best} = \\frac{v_0}{\\sqrt{v_0^2+2 g h_0}}',
			says: 'From above the landing, less than 45 degrees carries farthest; from below, more.'
		}
	],
	assumptions: ['No air, no spin.', 'Flat ground and the same gravity all along.'],
	warnings: [
		{
			code: 'air-matters',
			message:
				'Above 50 metres a second air takes a good part of the range: a real body falls short of this.',
			when: 'speed above 50 m/s',
			validity: 'approximate'
		},
		{
			code: 'curved-ground',
			message:
				'Over so long or high a flight the ground curves and gravity weakens; neither is in this model.',
			when: 'range or height above a hundredth of the Earth’s radius',
			validity: 'outside'
		}
	],
	caution: LAUNCHER_CAUTION,
	sources: [
		{
			title: 'OpenStax 2016, University Physics, volume 1',
			locator: '§4.3, projectile motion',
			fromMemory: true
		},
		{
			title: 'Standard acceleration of gravity, 3rd CGPM 1901; CODATA 2018',
			locator: '9.806 65 m/s²'
		}
	],
	checks: checksOf('projectile.vacuum'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ v0_ms: v0, angle_deg: angle, h0_m: h0, g_ms2: g }): Computed {
		const up = v0 * sineOfDegrees(angle);
		const along = v0 * cosineOfDegrees(angle);
		const rise = up > 0 ? (up * up) / (2 * g) : 0;
		const underRoot = up * up + 2 * g * h0;
		if (h0 < 0 && (up <= 0 || underRoot < 0)) {
			return refuse(
				'too-high',
				`The target lies ${printNumber(-h0)} m up, and this throw climbs ${printNumber(rise)} m. Throw faster or steeper, or lower the target.`,
				'h0_m'
			);
		}
		const root = Math.sqrt(underRoot);
		// For a throw downwards the other root of the quadratic keeps its digits.
		const time = up >= 0 ? (up + root) / g : (2 * h0) / (root - up);
		const impactSpeed = Math.sqrt(v0 * v0 + 2 * g * h0);
		const values = {
			range: along * time,
			time,
			apex: h0 + rise,
			impactSpeed,
			bestAngle: (Math.atan2(v0, impactSpeed) * 180) / Math.PI
		};
		return {
			ok: true,
			values,
			uncertainties: Object.fromEntries(Object.keys(values).map((key) => [key, 'exact' as const])),
			warnings:
				values.range > FLAT_GROUND_M || Math.abs(values.apex) > FLAT_GROUND_M
					? ['curved-ground']
					: []
		};
	}
});
