import { describe, expect, test } from 'vitest';
import {
	defineCalculator,
	refuse,
	type Calculator,
	type CalculatorSet
} from '../physics/calculator.ts';
import { catalogue } from '../physics/calculators/index.ts';
import type { Claim, Control, Inline, WidgetDocument } from '../widget/document.ts';
import { judgeClaims } from './judge.ts';
import { settingsOf } from './trials.ts';

/** Twice what it is given, so that the expected readings can be seen. Refuses past 90. */
const doubler: Calculator = defineCalculator({
	id: 'test.doubler',
	revision: '1.0.0',
	title: 'Doubler',
	purpose: 'Doubles a length.',
	asks: [],
	notFor: [],
	inputs: {
		length_m: {
			kind: 'number',
			label: 'Length',
			quantity: 'length',
			unit: 'm',
			min: -1e6,
			max: 1e6,
			initial: 7
		}
	},
	outputs: {
		length: { label: 'Twice the length', quantity: 'length', unit: 'm' },
		name: { label: 'Its name', quantity: 'text', unit: '', text: true }
	},
	equations: [],
	assumptions: [],
	warnings: [],
	sources: [],
	checks: [],
	history: [],
	compute: ({ length_m: length }) =>
		length > 90
			? refuse('too-long', 'Nothing is doubled past 90 metres.')
			: {
					ok: true,
					values: { length: 2 * length, name: 'twin' },
					uncertainties: { length: 'exact' }
				}
});
const calculators: CalculatorSet = new Map([[doubler.id, doubler]]);

const slider: Control = {
	id: 'length',
	kind: 'slider',
	label: 'Length',
	unit: 'm',
	min: 5,
	max: 15,
	step: 0.1,
	initial: 7
};
const output = { step: 'twice', output: 'length' };

function documentOf(content: Inline[], claims: Claim[], control = slider): WidgetDocument {
	return {
		version: 2,
		language: 'en',
		constants: '2026.1',
		title: 'Twice as long',
		point: 'A length and its double.',
		formulas: [],
		steps: [
			{
				id: 'twice',
				calculator: 'test.doubler',
				revision: '1.0.0',
				settings: { length_m: { from: 'control', control: 'length' } }
			}
		],
		controls: [control],
		blocks: [{ id: 'text', kind: 'paragraph', content }],
		claims
	};
}

function judgeWords(
	words: string,
	reading: Extract<Claim, { form: 'stated' }>['reading'] = output
) {
	const document = documentOf(
		[{ kind: 'claim', claim: 'it', text: words }],
		[{ id: 'it', form: 'stated', reading }]
	);
	return judgeClaims(document, calculators).get('it');
}

function judgeLive(figures: number, hedge: 'none' | 'about', control = slider, unit = 'm') {
	const document = documentOf(
		[{ kind: 'live', claim: 'it' }],
		[{ id: 'it', form: 'live', reading: output, unit, figures, hedge }],
		control
	);
	return judgeClaims(document, calculators).get('it');
}

describe('stated claims', () => {
	test('are weighed by their words, at the first settings', () => {
		expect(judgeWords('about 14 metres')).toMatchObject({
			verdict: 'level',
			rule: 'N3',
			departurePercent: 0
		});
		expect(judgeWords('more than 15 metres')).toMatchObject({ verdict: 'tips', rule: 'N7' });
		expect(judgeWords('exactly 14 metres')).toMatchObject({ verdict: 'level', rule: 'N2' });
		expect(judgeWords('0.014 kilometres')).toMatchObject({ verdict: 'level' });
	});
	test('a control and a setting read as exact', () => {
		expect(judgeWords('exactly 7 metres', { control: 'length' })?.verdict).toBe('level');
		expect(judgeWords('exactly 7 metres', { step: 'twice', setting: 'length_m' })?.verdict).toBe(
			'level'
		);
	});
	test('a number of another dimension tips', () => {
		expect(judgeWords('about 14 seconds')?.verdict).toBe('tips');
	});
	test('what can’t be weighed says why', () => {
		expect(judgeWords('a fair distance')).toMatchObject({
			verdict: 'unweighed',
			reason: 'No number in these words.'
		});
		expect(judgeWords('2–3 metres')?.reason).toMatch(/^A range isn’t weighed yet/);
		expect(judgeWords('a few metres')?.verdict).toBe('unweighed');
		expect(judgeWords('14', { step: 'twice', output: 'name' })?.reason).toBe(
			'The reading is words, “twin”, and no number.'
		);
		expect(judgeWords('14 metres', { step: 'gone', output: 'length' })?.reason).toMatch(
			/^No reading: /
		);
	});
	test('two hedges are a block', () => {
		expect(judgeWords('about up to 14 metres')).toMatchObject({
			severity: 'block',
			reason: 'Two hedges on one number: keep one.'
		});
	});
	test('an exempt number is no claim', () => {
		const document = documentOf(
			[{ kind: 'claim', claim: 'it', text: '14 metres' }],
			[{ id: 'it', form: 'exempt', reason: 'A turn of phrase' }]
		);
		expect(judgeClaims(document, calculators).get('it')).toMatchObject({
			verdict: 'unweighed',
			reason: 'Not a claim: A turn of phrase.'
		});
	});
	test('a claim whose words are gone is told', () => {
		const document = documentOf([], [{ id: 'it', form: 'stated', reading: output }]);
		expect(judgeClaims(document, calculators).get('it')?.reason).toBe(
			'Its words are no longer in the copy.'
		);
	});
});

describe('live claims', () => {
	test('three figures fit from end to end', () => {
		expect(judgeLive(3, 'none')).toMatchObject({
			verdict: 'level',
			reason:
				'The number printed fits at all 11 settings tried, from 5\u00a0metres to 15\u00a0metres.'
		});
	});
	test('the worst setting counts, and is named', () => {
		// One figure of 2 × 13 = 26 prints “30”, 13 per cent off, while 2 × 5 = 10 is printed as it is.
		const verdict = judgeLive(1, 'none', { ...slider, initial: 5 });
		expect(verdict?.verdict).toBe('tips');
		expect(verdict?.reason).toMatch(
			/^At \d+(\.\d)?\u00a0metres: Right rounding, but more than 10 per cent away/
		);
	});
	test('a setting without a reading is named with the refusal', () => {
		const verdict = judgeLive(3, 'none', { ...slider, max: 100 });
		expect(verdict).toMatchObject({ verdict: 'unweighed' });
		expect(verdict?.reason).toBe(
			'At 90.5\u00a0metres: No reading: Nothing is doubled past 90 metres.'
		);
	});
	test('a unit the reading can’t have is told', () => {
		expect(judgeLive(3, 'none', slider, 's')?.reason).toMatch(/choose another unit/);
	});
});

describe('settingsOf', () => {
	test('both ends, the first setting, and at least seven more, on the slider’s own steps', () => {
		const settings = settingsOf(slider);
		expect(settings.length).toBeGreaterThanOrEqual(10);
		expect(settings[0]).toBe(5);
		expect(settings.at(-1)).toBe(15);
		expect(settings).toContain(7);
		for (const value of settings)
			expect(Math.abs((value - 5) / 0.1 - Math.round((value - 5) / 0.1))).toBeLessThan(1e-6);
	});
	test('a slider of few steps is tried at each', () => {
		expect(settingsOf({ ...slider, min: 1, max: 4, step: 1, initial: 2 })).toEqual([1, 2, 3, 4]);
	});
});

describe('stated words in a result sentence', () => {
	const stated: Claim = { id: 'it', form: 'stated', reading: output };
	const content: Inline[] = [{ kind: 'claim', claim: 'it', text: 'about 14 metres' }];
	const inBlock = (kind: 'result' | 'paragraph') => {
		const document = documentOf(content, [stated]);
		return { ...document, blocks: [{ id: 'text', kind, content }] };
	};
	test('are weighed at every setting, since the sentence moves', () => {
		const verdict = judgeClaims(inBlock('result'), calculators).get('it');
		expect(verdict).toMatchObject({ verdict: 'tips', suggestions: [] });
		expect(verdict?.reason).toMatch(/^These words stand still while their sentence moves\. At \d/);
	});
	test('elsewhere they tell of the first settings', () => {
		expect(judgeClaims(inBlock('paragraph'), calculators).get('it')).toMatchObject({
			verdict: 'level'
		});
	});
});

describe('what a reader sees is what is weighed', () => {
	const stated: Claim = { id: 'it', form: 'stated', reading: output };
	const told = (before: string, words: string, after = '') =>
		judgeClaims(
			documentOf(
				[
					...(before ? [{ kind: 'text', text: before } as const] : []),
					{ kind: 'claim', claim: 'it', text: words },
					...(after ? [{ kind: 'text', text: after } as const] : [])
				],
				[stated]
			),
			calculators
		).get('it');
	test.each([
		['a hedge just before the claim', 'more than ', '14 metres', ''],
		['a digit just before it', 'It is 1', '14 metres', ''],
		['a scale word just after it', 'It is ', '14', ' million metres'],
		['a second number inside it', 'It is ', '14 metres, that is 999 kilometres', '']
	])('%s leaves it unweighed', (_, before, words, after) => {
		expect(told(before, words, after)).toMatchObject({ verdict: 'unweighed' });
	});
	test('the whole number in the claim is weighed', () => {
		expect(told('It is ', 'about 14 metres', ' long.')).toMatchObject({ verdict: 'level' });
	});
	test('words beside a live number are weighed at every setting', () => {
		const live: Claim = {
			id: 'live',
			form: 'live',
			reading: output,
			unit: 'm',
			figures: 2,
			hedge: 'none'
		};
		const content: Inline[] = [
			{ kind: 'live', claim: 'live' },
			{ kind: 'text', text: ', that is ' },
			{ kind: 'claim', claim: 'it', text: 'about 14 metres' }
		];
		const verdict = judgeClaims(documentOf(content, [live, stated]), calculators).get('it');
		expect(verdict).toMatchObject({ verdict: 'tips' });
	});
});

describe('the uncertainty behind stated words', () => {
	/** “nearly 14 billion years” on the age in Planck 2018 at a redshift, in a block of this kind. */
	const ageOf = (z: number, set = 'Planck18'): WidgetDocument => ({
		...documentOf(
			[{ kind: 'claim', claim: 'it', text: 'nearly 14 billion years' }],
			[{ id: 'it', form: 'stated', reading: { step: 'now', output: 'age' } }]
		),
		formulas: [],
		steps: [
			{
				id: 'now',
				calculator: 'cosmo.at_z',
				revision: '1.0.0',
				settings: {
					cosmology: { from: 'fixed', value: { set } },
					z: { from: 'fixed', value: z }
				}
			}
		]
	});

	// 13.787 ± 0.020 Gyr (Planck 2018 VI, table 2). With H₀ and Ωₘ as independent u would be 0.11, and the words would lean.
	test.each([0, 1e-9])('the age at redshift %d stays on its side of 14', (z) => {
		expect(judgeClaims(ageOf(z), catalogue).get('it')?.verdict).toBe('level');
	});

	test('where it can’t be carried, the direction isn’t established', () => {
		expect(judgeClaims(ageOf(1e-9, 'Planck15'), catalogue).get('it')?.verdict).toBe('leans');
	});
});
