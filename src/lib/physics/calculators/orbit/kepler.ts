import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { dueToG, G, horizonOf } from '../gravity/newton.ts';
import { checksOf } from '../published-checks.ts';
import { codata2018 } from '../sources.ts';

const { GM_sun, au } = constants.astronomical;

/** Closer than this many horizon radii, orbits turn by more than Kepler allows for. */
const STRONG_GRAVITY = 1000;

/**
 * A light body around a heavy one: period 2π√(a³/GM) in s, and speeds √(GM/a · (1±e)/(1∓e)) in km/s at the nearest and
 * the farthest point. a in m, M in kg, e in [0, 1). Refuses orbits that dip into the horizon of the mass.
 */
export const kepler = defineCalculator({
	id: 'orbit.kepler',
	revision: '1.0.0',
	title: 'Orbit around a mass',
	purpose:
		'A light body goes round a heavy one at this distance: how long is its year, and how fast is it?',
	asks: [
		'How long does an orbit take?',
		'How fast does the Earth go round the Sun?',
		'How fast is a comet when it is closest?',
		'How high does a satellite hang still over one place?'
	],
	notFor: ['Double stars of like masses.', 'Orbits that other bodies bend.'],
	inputs: {
		mass_kg: {
			kind: 'number',
			label: 'Mass of the heavy body',
			symbol: 'M',
			quantity: 'mass',
			unit: 'kg',
			min: 0,
			minExclusive: true,
			max: 1e54,
			initial: GM_sun.value / G,
			log: true
		},
		a_m: {
			kind: 'number',
			label: 'Half the long axis of the orbit',
			symbol: 'a',
			quantity: 'distance',
			unit: 'm',
			min: 0,
			minExclusive: true,
			max: 1e25,
			initial: au.value,
			log: true
		},
		e: {
			kind: 'number',
			label: 'Eccentricity',
			symbol: 'e',
			quantity: 'number',
			unit: '',
			min: 0,
			max: 1,
			maxExclusive: true,
			initial: 0,
			optional: true
		},
		m_kg: {
			kind: 'number',
			label: 'Mass of the light body',
			symbol: 'm',
			quantity: 'mass',
			unit: 'kg',
			min: 0,
			max: 1e54,
			initial: 0,
			optional: true
		}
	},
	outputs: {
		period: { label: 'Time of one orbit', symbol: 'P', quantity: 'duration', unit: 's' },
		vPeri: { label: 'Speed at the nearest point', symbol: 'v_p', quantity: 'speed', unit: 'km/s' },
		vApo: { label: 'Speed at the farthest point', symbol: 'v_a', quantity: 'speed', unit: 'km/s' }
	},
	equations: [
		{
			tex: 'P = 2\\pi\\sqrt{\\frac{a^3}{GM}}',
			says: 'The time of an orbit hangs on its long axis alone, not on how stretched it is.'
		},
		{
			tex: 'v = \\sqrt{GM\\left(\\frac2r-\\frac1a\\right)}, \\qquad r = a(1\\mp e)',
			says: 'The body is fastest where it is nearest.'
		}
	],
	assumptions: [
		'The light body’s own mass counts for nothing.',
		'The heavy body is round, and nothing else pulls.'
	],
	warnings: [
		{
			code: 'not-so-light',
			message:
				'The light body weighs more than a hundredth of the heavy one: both move, and this is off.',
			when: 'mass of the light body above a hundredth of the heavy one’s',
			validity: 'approximate'
		},
		{
			code: 'strong-gravity',
			message:
				'So close to so much mass, the general theory of relativity turns and speeds up the orbit.',
			when: 'nearest point below 1000 horizon radii',
			validity: 'approximate'
		}
	],
	sources: [
		{ title: 'Kepler 1619, Harmonices mundi', fromMemory: true },
		{ title: 'Newton 1687, Philosophiæ naturalis principia mathematica', fromMemory: true },
		codata2018('G, uncertainty 2.2 × 10⁻⁵')
	],
	checks: checksOf('orbit.kepler'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ mass_kg: M, a_m: a, e, m_kg: m }): Computed {
		const nearest = a * (1 - e);
		const horizon = horizonOf(M);
		if (nearest <= horizon) {
			return refuse(
				'inside-horizon',
				'This orbit dips into a black hole. Give a larger orbit, a rounder one, or less mass.',
				'a_m'
			);
		}
		const speed = Math.sqrt((G * M) / a) / 1000;
		const period = 2 * Math.PI * a * Math.sqrt(a / (G * M));
		const vPeri = speed * Math.sqrt((1 + e) / (1 - e));
		const vApo = speed * Math.sqrt((1 - e) / (1 + e));
		return {
			ok: true,
			values: { period, vPeri, vApo },
			uncertainties: {
				period: dueToG(period, -0.5),
				vPeri: dueToG(vPeri, 0.5),
				vApo: dueToG(vApo, 0.5)
			},
			warnings: [
				...(m > M / 100 ? ['not-so-light'] : []),
				...(nearest < STRONG_GRAVITY * horizon ? ['strong-gravity'] : [])
			]
		};
	}
});
