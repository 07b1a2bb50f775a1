/** A small widget with one of everything that a theme colours, for looking at a theme before it is kept. */
import type { WidgetDocument } from '../widget/document.ts';

export const SAMPLE: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: 'How this theme reads',
	point: 'A wave from early hydrogen is stretched on its way, and comes in on the radio dial.',
	formulas: [],
	steps: [
		{
			id: 'line',
			calculator: 'g21.frequency_from_z',
			revision: '1.0.0',
			settings: { z: { from: 'control', control: 'redshift' } }
		}
	],
	controls: [
		{
			id: 'redshift',
			kind: 'slider',
			label: 'Redshift',
			unit: '',
			min: 6,
			max: 26,
			step: 1,
			initial: 17
		}
	],
	blocks: [
		{
			id: 'opening',
			kind: 'paragraph',
			content: [
				{ kind: 'text', text: 'Emphasis stands in ' },
				{ kind: 'text', text: 'italics', marks: ['em'] },
				{ kind: 'text', text: ' or in ' },
				{ kind: 'text', text: 'strong letters', marks: ['strong'] },
				{ kind: 'text', text: '.' }
			]
		},
		{
			id: 'result',
			kind: 'result',
			content: [
				{ kind: 'text', text: 'The line arrives at ' },
				{ kind: 'live', claim: 'frequency' },
				{ kind: 'text', text: '.' }
			]
		},
		{ id: 'slider', kind: 'control', control: 'redshift' },
		{
			id: 'chart',
			kind: 'chart',
			form: 'line',
			title: 'Where it comes in',
			x: { control: 'redshift', label: 'Redshift', scale: 'linear' },
			y: { unit: 'MHz', label: 'Frequency', scale: 'linear', from: 'zero' },
			series: [
				{ id: 'series', reading: { step: 'line', output: 'frequency' }, label: 'frequency' }
			],
			bands: [],
			source: 'The house’s calculator for the 21 centimetre line',
			description: 'The line falls from 203 MHz at redshift 6 to 53 MHz at 26.'
		},
		{
			id: 'caution',
			kind: 'caution',
			content: [{ kind: 'text', text: 'A caution stands in a line of its own.' }]
		}
	],
	claims: [
		{
			id: 'frequency',
			form: 'live',
			reading: { step: 'line', output: 'frequency' },
			unit: 'MHz',
			figures: 2,
			hedge: 'about'
		}
	]
};
