/** What a new row of each kind starts with, and an empty form. */
import type { HouseCard } from '../forms/house-calculator.ts';

type Row<Key extends keyof HouseCard> = HouseCard[Key] extends (infer Each)[] ? Each : never;

export const fresh = {
	inputs: (): Row<'inputs'> => ({
		name: '',
		label: '',
		quantity: 'number',
		unit: '',
		min: 0,
		max: 1,
		minExclusive: false,
		maxExclusive: false,
		initial: 0.5,
		whole: false,
		log: false,
		good: null
	}),
	derived: (): Row<'derived'> => ({ name: '', label: '', formula: '' }),
	outputs: (): Row<'outputs'> => ({
		name: '',
		label: '',
		quantity: 'number',
		unit: '',
		formula: ''
	}),
	conditions: (): Row<'conditions'> => ({ code: '', formula: '', message: '', effect: 'refuse' }),
	checks: (): Row<'checks'> => ({
		statement: '',
		inputs: {},
		output: '',
		published: 0,
		tolerance: 0,
		source: '',
		verification: ''
	}),
	sources: (): Row<'sources'> => ({ title: '', locator: '', doi: '', fromMemory: false })
};

/** One input, one output and the three check values that it takes. */
export function emptyCard(): HouseCard {
	return {
		title: '',
		purpose: '',
		asks: [],
		notFor: [],
		assumptions: [],
		caution: '',
		inputs: [fresh.inputs()],
		derived: [],
		outputs: [fresh.outputs()],
		conditions: [],
		checks: [fresh.checks(), fresh.checks(), fresh.checks()],
		sources: [fresh.sources()]
	};
}
