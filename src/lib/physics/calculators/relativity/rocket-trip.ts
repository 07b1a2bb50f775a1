import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { checksOf } from '../published-checks.ts';

const { c, g_0 } = constants.physical;
const { ly, julianYear } = constants.astronomical;

/**
 * A ship that keeps up one acceleration (m/s², as felt on board) over a distance in light years: time on Earth
 * √((d/c)² + 2d/a) and on board (c/a) acosh(1 + ad/c²), in years, and the largest Lorentz factor. With the turn half way
 * it brakes from there on and arrives at rest.
 */
export const rocketTrip = defineCalculator({
	id: 'sr.rocket_trip',
	revision: '1.0.0',
	title: 'A ship that never stops pushing',
	purpose:
		'A ship keeps up a steady push all the way to a star: how long is it for us, how long on board?',
	asks: [
		'How long would a trip to the nearest star take?',
		'How much younger would a traveller stay?',
		'How fast would a ship get at one g?'
	],
	notFor: ['Any ship that could be built.', 'Distances over which expansion counts.'],
	inputs: {
		accel_ms2: {
			kind: 'number',
			label: 'Acceleration felt on board',
			symbol: 'a',
			quantity: 'acceleration',
			unit: 'm/s2',
			min: 1e-9,
			max: 1e9,
			initial: g_0.value,
			optional: true,
			log: true
		},
		distance_ly: {
			kind: 'number',
			label: 'Distance',
			symbol: 'd',
			quantity: 'distance',
			unit: 'ly',
			min: 0,
			max: 1e11,
			good: { min: 0, max: 3e8, warning: 'space-grows' },
			initial: 4.2465,
			log: true
		},
		flip: {
			kind: 'choice',
			label: 'Turn and brake half way',
			options: [
				{ value: 'true', label: 'yes, arrives at rest' },
				{ value: 'false', label: 'no, flies through' }
			],
			initial: 'true',
			optional: true
		}
	},
	outputs: {
		earthTime: { label: 'Time on Earth', symbol: 't', quantity: 'duration', unit: 'yr' },
		shipTime: { label: 'Time on board', symbol: 'τ', quantity: 'duration', unit: 'yr' },
		peakGamma: {
			label: 'Largest Lorentz factor',
			symbol: 'γ',
			quantity: 'lorentz-factor',
			unit: ''
		}
	},
	equations: [
		{
			tex: 't = \\sqrt{\\left(\\frac{d}{c}\\right)^2+\\frac{2d}{a}}',
			says: 'Time on Earth for one stretch of steady push; with the turn there are two of half the distance.'
		},
		{
			tex: '\\tau = \\frac{c}{a}\\,\\operatorname{arcosh}\\left(1+\\frac{a d}{c^2}\\right)',
			says: 'Time on board grows ever more slowly with distance.'
		}
	],
	assumptions: ['The push felt on board never changes.', 'Space is flat and does not grow.'],
	warnings: [
		{
			code: 'no-fuel',
			message: 'No known fuel could keep this up: the ship is a thought, not a plan.',
			when: 'always',
			validity: 'ok'
		},
		{
			code: 'space-grows',
			message: 'Over such a distance space grows during the trip, which is not in this model.',
			when: 'distance above 300 million light years',
			validity: 'outside'
		}
	],
	sources: [
		{ title: 'Misner, Thorne & Wheeler 1973, Gravitation', locator: '§6.2', fromMemory: true }
	],
	checks: checksOf('sr.rocket_trip'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ accel_ms2: a, distance_ly, flip }): Computed {
		const legs = flip === 'true' ? 2 : 1;
		const x = (a * ((distance_ly * ly.value) / legs)) / c.value ** 2;
		const root = Math.sqrt(x) * Math.sqrt(2 + x);
		const years = (legs * c.value) / a / julianYear.value;
		const values = {
			earthTime: years * root,
			// arcosh(1+x) without the loss of digits in a short trip.
			shipTime: years * Math.log1p(x + root),
			peakGamma: 1 + x
		};
		return { ok: true, values, uncertainties: 'exact', warnings: ['no-fuel'] };
	}
});
