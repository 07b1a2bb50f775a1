import { defineCalculator, refuse, type Computed, type NumberInput } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { ROCKET_CAUTION } from '../cautions.ts';
import { checksOf } from '../published-checks.ts';

const { c } = constants.physical;

function mass(label: string, symbol: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'mass',
		unit: 'kg',
		min: 0,
		minExclusive: true,
		max: 1e30,
		initial,
		log: true
	};
}

/**
 * Change of speed of a rocket, m/s, from the speed of its exhaust (m/s) and its mass before and after (kg):
 * v_e ln(m₀/m₁), and by special relativity c tanh(v_e/c ln(m₀/m₁)). Refuses a rocket that gets heavier.
 */
export const deltaV = defineCalculator({
	id: 'rocket.deltav',
	revision: '1.0.0',
	title: 'What a rocket’s fuel can do',
	purpose: 'A rocket burns from one mass down to another: by how much does its speed change?',
	asks: [
		'How fast can a rocket get?',
		'Why is a rocket nearly all fuel?',
		'How much fuel does a change of speed take?'
	],
	notFor: ['Lift-off, where gravity and air take their share.', 'Building or fuelling one.'],
	inputs: {
		ve_ms: {
			kind: 'number',
			label: 'Speed of the exhaust',
			symbol: 'v_e',
			quantity: 'speed',
			unit: 'm/s',
			min: 0,
			minExclusive: true,
			max: c.value,
			initial: 4400,
			log: true
		},
		m0: mass('Mass before', 'm_0', 100),
		m1: mass('Mass after', 'm_1', 10)
	},
	outputs: {
		deltav: { label: 'Change of speed', symbol: 'Δv', quantity: 'speed', unit: 'm/s' },
		deltavRel: {
			label: 'Change of speed, by special relativity',
			symbol: 'Δv',
			quantity: 'speed',
			unit: 'm/s'
		}
	},
	equations: [
		{
			tex: '\\Delta v = v_e\\ln\\frac{m_0}{m_1}',
			says: 'Each further step in speed takes the same share of what mass is left.'
		},
		{
			tex: '\\Delta v = c\\tanh\\left(\\frac{v_e}{c}\\ln\\frac{m_0}{m_1}\\right)',
			says: 'Near the speed of light the gain runs out.'
		}
	],
	assumptions: [
		'No gravity and no air: a real ascent loses a kilometre a second and more to them.',
		'The exhaust keeps its speed; no stage is dropped.'
	],
	warnings: [
		{
			code: 'near-light',
			message: 'So fast, only the value by special relativity holds.',
			when: 'plain change of speed above a tenth of that of light',
			validity: 'outside'
		}
	],
	caution: ROCKET_CAUTION,
	sources: [
		{
			title: 'Tsiolkovsky 1903, Exploration of outer space by means of rocket devices',
			fromMemory: true
		},
		{
			title: 'Ackeret 1946, Zur Theorie der Raketen, Helvetica Physica Acta 19, 103',
			fromMemory: true
		}
	],
	checks: checksOf('rocket.deltav'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ ve_ms: ve, m0, m1 }): Computed {
		if (m1 > m0) {
			return refuse(
				'gets-heavier',
				'A rocket gets lighter as it burns. Give a mass after that is no larger than the mass before.',
				'm1'
			);
		}
		// log1p keeps the digits of a short burn; the plain logarithm those of a long one.
		const logarithm = m0 < 2 * m1 ? Math.log1p((m0 - m1) / m1) : Math.log(m0 / m1);
		const deltav = ve * logarithm;
		const values = { deltav, deltavRel: c.value * Math.tanh(deltav / c.value) };
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: deltav > c.value / 10 ? ['near-light'] : []
		};
	}
});
