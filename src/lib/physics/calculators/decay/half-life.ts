import {
	defineCalculator,
	type CheckedInputs,
	type Computed,
	type Refusal
} from '../../calculator.ts';
import { convert } from '../../units/units.ts';
import { RADIATION_CAUTION } from '../cautions.ts';
import { checksOf } from '../published-checks.ts';
import {
	ALMOST_GONE,
	DECAY_SOURCES,
	halfLifeInput,
	timeUnit,
	unitInput,
	UNSTATED
} from './half-lives.ts';

/**
 * Share 2^(−t/T) left after a time and share gone, −expm1(−t ln 2/T); mean life T/ln 2 in the unit of the times; and decays
 * each second, N₀ 2^(−t/T) ln 2/T, when the number of atoms at the start and the half-life in seconds are known.
 */
export const halfLife = defineCalculator({
	id: 'decay.halflife',
	revision: '1.0.0',
	title: 'What is left of a decay',
	purpose: 'A substance decays with a known half-life: how much is left after a time?',
	asks: [
		'How much is left after two half-lives?',
		'How long until it is gone?',
		'How active is a source now?'
	],
	notFor: ['Whether a source is safe.', 'Chains in which one decay feeds another.'],
	inputs: {
		t: {
			kind: 'number',
			label: 'Time gone by',
			symbol: 't',
			quantity: 'duration',
			unit: timeUnit,
			min: 0,
			max: 1e35,
			initial: 11_460
		},
		halflife: halfLifeInput(5730),
		unit: unitInput,
		halflife_s: {
			kind: 'number',
			label: 'Half-life in seconds',
			symbol: 'T_½',
			quantity: 'duration',
			unit: 's',
			min: 1e-30,
			max: 1e35,
			initial: 1.808e11,
			optional: true,
			absent: 'the half-life, if its unit is stated',
			log: true
		},
		N: {
			kind: 'number',
			label: 'Number of atoms at the start',
			symbol: 'N_0',
			quantity: 'number',
			unit: '',
			min: 0,
			max: 1e60,
			initial: 1e20,
			optional: true,
			absent: 'no number of atoms, so no activity',
			log: true
		}
	},
	outputs: {
		remaining: { label: 'Share that is left', quantity: 'fraction', unit: '' },
		decayed: { label: 'Share that is gone', quantity: 'fraction', unit: '' },
		meanLife: { label: 'Mean life', symbol: 'τ', quantity: 'duration', unit: timeUnit },
		activity: { label: 'Decays each second', symbol: 'A', quantity: 'activity', unit: 'Bq' }
	},
	equations: [
		{
			tex: '\\frac{N}{N_0} = 2^{-t/T_{1/2}}',
			says: 'Every half-life takes half of what is there: after two, a quarter is left.'
		},
		{
			tex: '\\tau = \\frac{T_{1/2}}{\\ln 2}, \\qquad A = \\frac{N\\ln 2}{T_{1/2}}',
			says: 'The mean life is longer than the half-life; activity is what is left over the mean life.'
		}
	],
	assumptions: [
		'Nothing makes more of the substance, and nothing takes it away but decay.',
		'Many atoms: a single one decays when it will.'
	],
	warnings: [
		ALMOST_GONE,
		{
			code: 'half-lives-differ',
			message:
				'The half-life in seconds is another one than the half-life given. The activity goes by the seconds.',
			when: 'the two half-lives more than 1 per cent apart, where the unit is stated',
			validity: 'outside'
		}
	],
	caution: RADIATION_CAUTION,
	sources: DECAY_SOURCES,
	checks: checksOf('decay.halflife'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute(inputs): Computed {
		const { t, halflife, N } = inputs;
		const halves = t / halflife;
		const remaining = 2 ** -halves;
		const values: Record<string, number> = {
			remaining,
			decayed: -Math.expm1(-halves * Math.LN2),
			meanLife: halflife / Math.LN2
		};
		const seconds = inSeconds(inputs);
		const withheld: Record<string, Refusal> = {};
		if (N === undefined || seconds === undefined) withheld.activity = NEEDS_ATOMS;
		else values.activity = ((N * remaining) / seconds) * Math.LN2;
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			withheld,
			warnings: [
				...(halves > 10 ? [ALMOST_GONE.code] : []),
				...(halfLivesDiffer(inputs) ? ['half-lives-differ'] : [])
			]
		};
	}
});

const NEEDS_ATOMS: Refusal = {
	code: 'needs-atoms',
	message: 'Give the number of atoms, and the unit of the times or the half-life in seconds.'
};

function inSeconds({ halflife, halflife_s, unit }: CheckedInputs): number | undefined {
	if (halflife_s !== undefined) return halflife_s as number;
	return unit === UNSTATED ? undefined : convert(halflife, unit, 's');
}

function halfLivesDiffer({ halflife, halflife_s, unit }: CheckedInputs): boolean {
	if (halflife_s === undefined || unit === UNSTATED) return false;
	return Math.abs(convert(halflife, unit, 's') / halflife_s - 1) > 0.01;
}
