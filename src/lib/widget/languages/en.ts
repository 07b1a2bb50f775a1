/** English for print. Unit names are the unit table's. */
import { unitOf } from '../../physics/units/units.ts';
import type { PrintWords } from './print-words.ts';

const ONES =
	'nought one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen sixteen seventeen eighteen nineteen'.split(
		' '
	);
const TENS = '  twenty thirty forty fifty sixty seventy eighty ninety'.split(' ');

export const english: PrintWords = {
	language: 'en',
	decimalMark: '.',
	timesSign: '×',
	hedges: {
		around: 'about',
		below: 'nearly',
		'just-above': 'just over',
		'more-than': 'more than'
	},
	scales: {
		1e3: ['thousand', 'thousand'],
		1e6: ['million', 'million'],
		1e9: ['billion', 'billion'],
		1e12: ['trillion', 'trillion']
	},
	afterScale: '',
	units(symbol) {
		const words = unitOf(symbol)?.words;
		return words && [words.one, words.many];
	},
	closedUp: /^(?:%|[°′″]$)/u,
	spoken: {
		cardinal(value) {
			const [tens, ones] = [TENS[Math.floor(value / 10)] ?? '', ONES[value % 10] ?? ''];
			return ONES[value] ?? (value % 10 === 0 ? tens : `${tens}-${ones}`);
		},
		minus: 'minus',
		timesTen: 'times ten',
		ten: 'ten',
		power: 'to the',
		to: 'to',
		giveOrTake: 'give or take',
		units: { '%': ['per cent', 'per cent'], times: ['times', 'times'] },
		signs: {
			'≈': 'about',
			'~': 'about',
			'<': 'less than',
			'>': 'more than',
			'≤': 'at most',
			'≥': 'at least'
		},
		nought: 'nought'
	}
};
