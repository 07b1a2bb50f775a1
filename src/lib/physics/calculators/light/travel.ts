import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { convert, unitOf } from '../../units/units.ts';
import { checksOf } from '../published-checks.ts';
import { codata2018, IAU_LENGTHS } from '../sources.ts';

const { c } = constants.physical;

const LENGTHS = ['m', 'km', 'au', 'ly', 'pc', 'kpc', 'Mpc'];
const FAR_MPC = 100;

/** Time light takes over a distance, in s and Julian years, and the distance in ly, pc and au. d/c in empty, still space. */
export const lightTravel = defineCalculator({
	id: 'light.travel',
	revision: '1.0.0',
	title: 'How long light is on its way',
	purpose: 'How long does light take over a distance, and what is that distance in other units?',
	asks: [
		'How far does light travel in a year?',
		'How long does sunlight take to reach us?',
		'How many light years is a parsec?',
		'How long does a radio signal take to Mars?'
	],
	notFor: [
		'Far galaxies: use the light-travel distance of the expanding universe.',
		'Light in glass, water or cables.'
	],
	inputs: {
		value: {
			kind: 'number',
			label: 'Distance',
			symbol: 'd',
			quantity: 'distance',
			unit: { by: 'unit', units: Object.fromEntries(LENGTHS.map((unit) => [unit, unit])) },
			min: 0,
			max: 1e30,
			initial: 1
		},
		unit: {
			kind: 'choice',
			label: 'Unit it is in',
			options: LENGTHS.map((value) => ({ value, label: unitOf(value)?.words.many ?? value })),
			initial: 'au'
		}
	},
	outputs: {
		time: { label: 'Time on the way', symbol: 't', quantity: 'duration', unit: 's' },
		timeYr: { label: 'Time on the way in years', symbol: 't', quantity: 'duration', unit: 'yr' },
		ly: { label: 'Distance in light years', symbol: 'd', quantity: 'distance', unit: 'ly' },
		pc: { label: 'Distance in parsecs', symbol: 'd', quantity: 'distance', unit: 'pc' },
		au: { label: 'Distance in astronomical units', symbol: 'd', quantity: 'distance', unit: 'au' }
	},
	equations: [
		{
			tex: 't = \\frac{d}{c}',
			says: 'Light takes a second for 299 792 458 metres; a light year is a length, not a time.'
		}
	],
	assumptions: ['Empty space that does not grow.', 'Years are Julian years of 365.25 days.'],
	warnings: [
		{
			code: 'space-grows',
			message:
				'Over such a distance space grows while light is on its way: its travel time is not the distance over c.',
			when: 'distance above 100 Mpc',
			validity: 'outside'
		}
	],
	sources: [IAU_LENGTHS, codata2018('c, exact by the SI')],
	checks: checksOf('light.travel'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ value, unit }): Computed {
		const time = convert(value, unit, 'm') / c.value;
		const values = {
			time,
			timeYr: convert(time, 's', 'yr'),
			ly: convert(value, unit, 'ly'),
			pc: convert(value, unit, 'pc'),
			au: convert(value, unit, 'au')
		};
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: convert(value, unit, 'Mpc') > FAR_MPC ? ['space-grows'] : []
		};
	}
});
