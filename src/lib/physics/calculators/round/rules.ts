/** What the roundings share: the rule for ties, and their sources. */
import type { ChoiceInput, DecimalInput, OutputSpec, Source } from '../../calculator.ts';

export const tieInput: ChoiceInput = {
	kind: 'choice',
	label: 'A five and nothing after it goes',
	options: [
		{ value: 'half-even', label: 'to the even digit' },
		{ value: 'half-away', label: 'away from zero' }
	],
	initial: 'half-even',
	optional: true
};

export const numberInput: DecimalInput = {
	kind: 'decimal',
	label: 'Number as written',
	initial: '2.345'
};

export const roundedOutput: OutputSpec = {
	label: 'Rounded',
	quantity: 'text',
	unit: '',
	text: true
};

export const ROUNDING_SOURCES: Source[] = [
	{
		title: 'ISO 80000-1:2009, Quantities and units, part 1',
		locator: 'annex B, rules A and B',
		fromMemory: true
	},
	{
		title: 'NIST Special Publication 811 (2008)',
		locator: 'B.7.1',
		doi: '10.6028/NIST.SP.811e2008'
	}
];

export const ROUNDING_ASSUMPTIONS = [
	'Digits are rounded as they are written, not as a machine stores them: 2.675 is 2.675.',
	'Round once, from the full value; what is rounded twice can be wrong.'
];
