import type { WidgetDocument } from '../../widget/document.ts';

/** One note, lowered by the growth of space. Age → redshift → where hydrogen's 21 cm line arrives. */
export const firstLight: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: 'First light on the dial',
	point:
		'Cold hydrogen sends one radio note. The growth of space lowers it, so the note we catch says when it left.',
	formulas: [],
	steps: [
		{
			id: 'age',
			calculator: 'cosmo.inverse',
			revision: '1.0.0',
			settings: {
				cosmology: { from: 'fixed', value: { set: 'Planck18' } },
				kind: { from: 'fixed', value: 'z_from_age' },
				value: { from: 'control', control: 'wave-age' }
			}
		},
		{
			id: 'line',
			calculator: 'line.observe',
			revision: '1.0.0',
			settings: {
				restFrequency_Hz: { from: 'line', line: 'hi-21cm', value: 1420405751.768 },
				z: { from: 'reading', step: 'age', output: 'z' }
			}
		}
	],
	controls: [
		{
			id: 'wave-age',
			kind: 'slider',
			label: 'The wave left at this age',
			unit: 'Myr',
			min: 100,
			max: 500,
			step: 10,
			initial: 180
		}
	],
	blocks: [
		{
			id: 'opening',
			kind: 'paragraph',
			content: [
				{ kind: 'text', text: 'Cold hydrogen gives off a faint radio wave at ' },
				{ kind: 'claim', claim: 'rest-frequency', text: '1420 megahertz' },
				{
					kind: 'text',
					text: '. Space has grown while the wave was on its way, and stretched it: from the days of the first stars it comes in '
				},
				{ kind: 'claim', claim: 'stretch', text: 'about 21 times' },
				{ kind: 'text', text: ' as long as it set out.' }
			]
		},
		{
			id: 'result',
			kind: 'result',
			content: [
				{ kind: 'text', text: 'A wave that left ' },
				{ kind: 'setting', control: 'wave-age' },
				{ kind: 'text', text: ' after the Big Bang arrives today at ' },
				{ kind: 'live', claim: 'frequency' },
				{ kind: 'text', text: ', each crest ' },
				{ kind: 'live', claim: 'crest' },
				{ kind: 'text', text: ' from the next.' }
			]
		},
		{ id: 'slider', kind: 'control', control: 'wave-age' },
		{
			id: 'dial',
			kind: 'chart',
			form: 'line',
			title: 'Where the wave arrives on today’s radio dial',
			x: { control: 'wave-age', label: 'Age of the Universe when the wave left', scale: 'linear' },
			y: { unit: 'MHz', label: 'frequency', scale: 'linear', from: 'data' },
			series: [{ id: 'line', reading: { step: 'line', output: 'observedFrequency' }, label: '' }],
			bands: [{ from: 87.5, to: 108, label: 'FM radio' }],
			source:
				'Growth of space from Planck Collaboration 2018 VI; the line from Hellwig and others 1970',
			description:
				'A line that climbs from the lower left to the upper right: the later a wave left, the higher the frequency at which it arrives. It crosses the FM radio band on its way.'
		},
		{
			id: 'limits',
			kind: 'limits',
			content: [
				{
					kind: 'text',
					text: 'how bright the first stars were. That needs the strength of the wave, not its frequency.'
				}
			]
		}
	],
	claims: [
		{
			id: 'rest-frequency',
			form: 'stated',
			reading: { step: 'line', setting: 'restFrequency_Hz' }
		},
		{ id: 'stretch', form: 'stated', reading: { step: 'age', output: 'stretch' } },
		{
			id: 'frequency',
			form: 'live',
			reading: { step: 'line', output: 'observedFrequency' },
			unit: 'MHz',
			figures: 2,
			hedge: 'about'
		},
		{
			id: 'crest',
			form: 'live',
			reading: { step: 'line', output: 'observedWavelength' },
			unit: 'm',
			figures: 2,
			hedge: 'none'
		}
	]
};
