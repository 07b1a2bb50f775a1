import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { sineOfDegrees } from '../../numerics/degrees.ts';
import { dueToG, G } from '../gravity/newton.ts';
import { checksOf } from '../published-checks.ts';
import { codata2018, IAU_NOMINAL } from '../sources.ts';

const { GM_sun, GM_jupiter } = constants.astronomical;
const { c } = constants.physical;

/**
 * Largest speed, m/s, at which a planet makes its star come and go: (2πG/P)^⅓ m sin i (M+m)^(−⅔) (1−e²)^(−½).
 * P in s, masses in kg, i in degrees from face-on, e in [0, 1).
 */
export const radialVelocity = defineCalculator({
	id: 'exoplanet.rv',
	revision: '1.0.0',
	title: 'A star that sways',
	purpose: 'A planet goes round its star: how fast does the star sway towards us and away?',
	asks: [
		'How fast does Jupiter make the Sun move?',
		'How small a planet can a star’s motion show?',
		'Why are heavy, close planets found first?'
	],
	notFor: ['Stars with several planets.', 'Motions of the star’s own surface.'],
	inputs: {
		P_s: {
			kind: 'number',
			label: 'Time of one orbit',
			symbol: 'P',
			quantity: 'duration',
			unit: 's',
			min: 1,
			max: 1e15,
			initial: 374_335_776,
			log: true
		},
		m_kg: {
			kind: 'number',
			label: 'Mass of the planet',
			symbol: 'm',
			quantity: 'mass',
			unit: 'kg',
			min: 0,
			max: 1e33,
			initial: GM_jupiter.value / G,
			log: true
		},
		M_kg: {
			kind: 'number',
			label: 'Mass of the star',
			symbol: 'M',
			quantity: 'mass',
			unit: 'kg',
			min: 1e20,
			max: 1e35,
			initial: GM_sun.value / G,
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
		i_deg: {
			kind: 'number',
			label: 'Tilt of the orbit, 90 for edge-on',
			symbol: 'i',
			quantity: 'angle',
			unit: 'deg',
			min: 0,
			max: 180,
			initial: 90,
			optional: true
		}
	},
	outputs: { K: { label: 'Sway of the star', symbol: 'K', quantity: 'speed', unit: 'm/s' } },
	equations: [
		{
			tex: 'K = \\left(\\frac{2\\pi G}{P}\\right)^{1/3}\\frac{m\\sin i}{(M+m)^{2/3}}\\,\\frac{1}{\\sqrt{1-e^2}}',
			says: 'Heavy planets on short orbits, seen edge-on, make their star sway most.'
		}
	],
	assumptions: ['One planet, and nothing else pulls.', 'Left out, the orbit is round and edge-on.'],
	warnings: [
		{
			code: 'too-fast',
			message: 'At such speeds Newton’s gravity no longer holds.',
			when: 'sway above a hundredth of the speed of light',
			validity: 'outside'
		}
	],
	sources: [
		{
			title:
				'Lovis & Fischer 2010, Radial velocity techniques for exoplanets, in Exoplanets (ed. Seager)',
			fromMemory: true
		},
		codata2018('G, uncertainty 2.2 × 10⁻⁵'),
		IAU_NOMINAL
	],
	checks: checksOf('exoplanet.rv'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ P_s: P, m_kg: m, M_kg: M, e, i_deg }): Computed {
		const both = Math.cbrt(M + m);
		const K =
			(Math.cbrt((2 * Math.PI * G) / P) * ((m / both / both) * sineOfDegrees(i_deg))) /
			Math.sqrt((1 - e) * (1 + e));
		return {
			ok: true,
			values: { K },
			uncertainties: { K: dueToG(K, 1 / 3) },
			warnings: K > c.value / 100 ? ['too-fast'] : []
		};
	}
});
