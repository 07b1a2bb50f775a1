import {
	defineCalculator,
	refuse,
	type Computed,
	type NumberInput,
	type Refusal
} from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { convert } from '../../units/units.ts';
import { codata2018, IAU_NOMINAL } from '../sources.ts';
import { printNumber } from '../wording.ts';
import { checksOf } from '../published-checks.ts';

const { c } = constants.physical;
const { GM_sun } = constants.astronomical;

function solarMass(label: string, symbol: string): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'mass',
		unit: 'Msun',
		min: 1e-3,
		max: 1e11,
		initial: 30,
		log: true
	};
}

/**
 * Two bodies (solar masses) that circle each other ever closer, at a distance in Mpc and a frequency of their waves in Hz:
 * chirp mass (m₁m₂)^(3/5)/(m₁+m₂)^(1/5), strain (4/d)(GM_c)^(5/3)(πf)^(2/3)/c⁴ seen from the best side, last stable
 * frequency c³/(6^1.5 πGM) in Hz, and the change of an arm, hL in m. Refuses frequencies above the last stable one.
 */
export const inspiral = defineCalculator({
	id: 'gw.inspiral',
	revision: '1.0.0',
	title: 'Waves from two bodies that close in',
	purpose: 'Two dense stars or holes spiral together: how much do their waves stretch space here?',
	asks: [
		'How strong is a gravitational wave when it gets here?',
		'By how much does a detector’s arm change?',
		'At what frequency do two black holes merge?'
	],
	notFor: [
		'The merger itself and what follows it.',
		'Whether a detector would see it.',
		'Stretched orbits and spins.'
	],
	inputs: {
		m1_Msun: solarMass('Mass of the first body', 'm_1'),
		m2_Msun: solarMass('Mass of the second body', 'm_2'),
		distance_Mpc: {
			kind: 'number',
			label: 'Distance',
			symbol: 'd',
			quantity: 'luminosity-distance',
			unit: 'Mpc',
			min: 1e-6,
			max: 1e6,
			good: { min: 0, max: 430, warning: 'space-grows' },
			initial: 400,
			log: true
		},
		f_Hz: {
			kind: 'number',
			label: 'Frequency of the waves',
			symbol: 'f',
			quantity: 'frequency',
			unit: 'Hz',
			min: 0,
			minExclusive: true,
			max: 1e8,
			initial: 50,
			log: true
		},
		arm_m: {
			kind: 'number',
			label: 'Length of a detector’s arm',
			symbol: 'L',
			quantity: 'length',
			unit: 'm',
			min: 0,
			minExclusive: true,
			max: 1e13,
			initial: 4000,
			optional: true,
			absent: 'no arm, so no change of it',
			log: true
		}
	},
	outputs: {
		strain: { label: 'Strain', symbol: 'h', quantity: 'strain', unit: '' },
		chirpMass: { label: 'Chirp mass', symbol: 'M_c', quantity: 'mass', unit: 'Msun' },
		lastStableFrequency: {
			label: 'Frequency at the last stable orbit',
			symbol: 'f_last',
			quantity: 'frequency',
			unit: 'Hz'
		},
		armChange: { label: 'Change of the arm', symbol: 'ΔL', quantity: 'length', unit: 'm' }
	},
	equations: [
		{
			tex: '\\mathcal M = \\frac{(m_1m_2)^{3/5}}{(m_1+m_2)^{1/5}}',
			says: 'The one mix of the two masses that sets how fast they close in.'
		},
		{
			tex: 'h = \\frac4d\\,\\frac{(G\\mathcal M)^{5/3}(\\pi f)^{2/3}}{c^4}, \\qquad \\Delta L = h L',
			says: 'Heavier and closer pairs stretch space more, and more as they close in.'
		},
		{
			tex: 'f_\\mathrm{last} = \\frac{c^3}{6^{3/2}\\,\\pi\\,G(m_1+m_2)}',
			says: 'Above this frequency no orbit is stable, and the pair falls together.'
		}
	],
	assumptions: [
		'Leading order, a round orbit, and the best orientation: seen along the axis of the orbit.',
		'Masses as at the source and no growth of space on the way. Far off, give masses times 1 + z and the luminosity distance.',
		'Masses in units of the Sun’s, so that G itself drops out.'
	],
	warnings: [
		{
			code: 'space-grows',
			message:
				'So far off, waves are redshifted: give the masses times 1 + z, and the luminosity distance.',
			when: 'distance above 430 Mpc, about redshift 0.1',
			validity: 'approximate'
		},
		{
			code: 'close-to-the-end',
			message: 'So close to the last stable orbit, leading order is only a rough guide.',
			when: 'frequency above half of the last stable one',
			validity: 'ok'
		}
	],
	sources: [
		{
			title: 'Maggiore 2007, Gravitational Waves, volume 1',
			locator: 'ch. 4',
			fromMemory: true
		},
		IAU_NOMINAL,
		codata2018('c, exact by the SI')
	],
	checks: checksOf('gw.inspiral'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ m1_Msun: m1, m2_Msun: m2, distance_Mpc, f_Hz: f, arm_m: arm }): Computed {
		const both = m1 + m2;
		const lastStableFrequency = c.value ** 3 / (6 ** 1.5 * Math.PI * GM_sun.value * both);
		if (f > lastStableFrequency) {
			return refuse(
				'past-the-last-orbit',
				`Past ${printNumber(lastStableFrequency)} Hz this pair has no stable orbit. Give a lower frequency or lighter bodies.`,
				'f_Hz'
			);
		}
		const chirpMass = both * ((m1 / both) * (m2 / both)) ** 0.6;
		const metres = convert(distance_Mpc, 'Mpc', 'm');
		// (GM_c)^(5/3) (πf)^(2/3) / c⁴ is a length times the square of a speed over that of light.
		const length = (GM_sun.value * chirpMass) / c.value ** 2;
		const speedShare = Math.cbrt((Math.PI * f * length) / c.value);
		const strain = 4 * (length / metres) * speedShare * speedShare;
		const values: Record<string, number> = { strain, chirpMass, lastStableFrequency };
		const withheld: Record<string, Refusal> = {};
		if (arm === undefined) {
			withheld.armChange = {
				code: 'needs-arm',
				message: 'Give the length of an arm to get its change.'
			};
		} else values.armChange = strain * arm;
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			withheld,
			warnings: f > lastStableFrequency / 2 ? ['close-to-the-end'] : []
		};
	}
});
