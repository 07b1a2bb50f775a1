import { defineCalculator, type Computed } from '../../calculator.ts';
import { RADIATION_CAUTION } from '../cautions.ts';
import { ALMOST_GONE, DECAY_SOURCES, halfLifeInput, timeUnit, unitInput } from './half-lives.ts';
import { checksOf } from '../published-checks.ts';

/** Age of a sample from how many daughter atoms there are for each parent: T log₂(1 + D/P), in the unit of the half-life. */
export const radiometricAge = defineCalculator({
	id: 'decay.age',
	revision: '1.0.0',
	title: 'Age by decay',
	purpose: 'A sample holds so many decayed atoms for each that is left: how old is it?',
	asks: ['How old is this rock?', 'How is a rock dated?', 'How far back does carbon dating reach?'],
	notFor: [
		'Rocks or bones that have taken in or lost atoms.',
		'Carbon dating past some 50 000 years, and of anything that never lived.'
	],
	inputs: {
		halflife: halfLifeInput(4.468),
		ratio: {
			kind: 'number',
			label: 'Daughter atoms for each parent that is left',
			symbol: 'D/P',
			quantity: 'ratio',
			unit: '',
			min: 0,
			max: 1e15,
			initial: 1
		},
		unit: unitInput
	},
	outputs: {
		age: { label: 'Age of the sample', symbol: 't', quantity: 'duration', unit: timeUnit }
	},
	equations: [
		{
			tex: 't = T_{1/2}\\,\\log_2\\left(1+\\frac DP\\right)',
			says: 'As many daughters as parents means that one half-life has gone by.'
		}
	],
	assumptions: [
		'The sample held no daughter atoms at the start.',
		'Nothing has got in or out since.',
		'The half-life never changed.'
	],
	warnings: [ALMOST_GONE],
	caution: RADIATION_CAUTION,
	sources: DECAY_SOURCES,
	checks: checksOf('decay.age'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ halflife, ratio }): Computed {
		const halves = Math.log1p(ratio) / Math.LN2;
		const values = { age: halflife * halves };
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: halves > 10 ? [ALMOST_GONE.code] : []
		};
	}
});
