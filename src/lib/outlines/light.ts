/** Outlines about light and what stretches it. */
import {
	chart,
	fixed,
	follows,
	live,
	number,
	outline,
	printed,
	setting,
	shows,
	slider,
	stated,
	step,
	text,
	words,
	type Outline
} from './outline.ts';

export const stretchedLine: Outline = outline({
	id: 'stretched-line',
	field: 'Lines and waves of light',
	says: 'A line of hydrogen, and the colour in which it arrives.',
	title: 'A red that leaves the rainbow',
	point: 'Hydrogen shines in one exact red. The more its wave is stretched, the deeper the red.',
	steps: [
		step('line', 'line.observe', {
			restWavelength_nm: { from: 'line', line: 'h-alpha', value: 656.4614 },
			z: follows('redshift')
		})
	],
	controls: [slider('redshift', 'How far the wave is stretched: redshift', '', [0, 1, 0.05, 0.1])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('Glowing hydrogen has a red of its own, with waves '),
			number('rest', '656 nanometres'),
			words(' long. Stretch them, and they arrive as a deeper red, until no eye sees them.')
		),
		text(
			'result',
			'result',
			words('At a redshift of '),
			setting('redshift'),
			words(', the line arrives at '),
			live('arrives'),
			words('.')
		),
		shows('redshift'),
		chart('arrival', {
			title: 'Where the red line of hydrogen arrives',
			x: { control: 'redshift', label: 'Redshift' },
			y: {
				reading: { step: 'line', output: 'observedWavelength' },
				unit: 'nm',
				label: 'wavelength'
			},
			source: 'Wavelength in vacuum from the NIST Atomic Spectra Database',
			description: 'A straight line that climbs: the wave grows in step with the redshift.'
		}),
		text(
			'limits',
			'limits',
			words('what stretched the wave. Motion, gravity and growing space all leave the same mark.')
		)
	],
	claims: [
		stated('rest', { step: 'line', setting: 'restWavelength_nm' }),
		printed('arrives', { step: 'line', output: 'observedWavelength' }, 'nm', 3)
	]
});

export const speedingAway: Outline = outline({
	id: 'speeding-away',
	field: 'Redshift and speed',
	says: 'The redshift of something that races away from us.',
	title: 'Racing away, turning red',
	point:
		'The faster a lamp leaves us, the more its light is stretched, and near the speed of light without bound.',
	steps: [step('shift', 'doppler.z_from_beta', { beta: follows('speed') })],
	controls: [
		slider('speed', 'Speed away from us, as a share of that of light', '', [0.05, 0.95, 0.05, 0.5])
	],
	blocks: [
		text(
			'opening',
			'paragraph',
			words(
				'A lamp that flies away sends each wave from a little farther off. At a speed well short of that of light, its light comes in with a redshift of '
			),
			number('half', 'about 0.73'),
			words('.')
		),
		text(
			'result',
			'result',
			words('At '),
			setting('speed'),
			words(' of the speed of light, the redshift is '),
			live('redshift'),
			words('.')
		),
		shows('speed'),
		chart('shift', {
			title: 'Redshift of a lamp that flies straight away',
			x: { control: 'speed', label: 'Speed as a share of that of light' },
			y: { reading: { step: 'shift', output: 'z' }, unit: '', label: 'redshift' },
			source: 'Special relativity: the Doppler formula',
			description:
				'A curve that climbs ever more steeply: close to the speed of light a little more speed stretches the light a great deal.'
		}),
		text(
			'limits',
			'limits',
			words(
				'how fast a distant galaxy moves. Its light is stretched by the growth of space, which is no motion through space.'
			)
		)
	],
	claims: [
		stated('half', { step: 'shift', output: 'z' }),
		printed('redshift', { step: 'shift', output: 'z' }, '', 2)
	]
});

export const lightFromFar: Outline = outline({
	id: 'light-from-far',
	field: 'The expanding Universe',
	says: 'How long light has been on its way, and how far its source is now.',
	title: 'Old light',
	point: 'The more a galaxy’s light is stretched, the longer it has been on its way to us.',
	steps: [
		step('now', 'cosmo.at_z', { cosmology: fixed({ set: 'Planck18' }), z: fixed(0) }),
		step('then', 'cosmo.at_z', {
			cosmology: fixed({ set: 'Planck18' }),
			z: follows('redshift')
		})
	],
	controls: [slider('redshift', 'Redshift of the galaxy', '', [0.5, 10, 0.5, 2])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('The Universe is '),
			number('age', 'about 13.8 billion years'),
			words(
				' old. Light from a galaxy left it long ago, and the growth of space has stretched every wave since.'
			)
		),
		text(
			'result',
			'result',
			words('At a redshift of '),
			setting('redshift'),
			words(', the light left '),
			live('lookback'),
			words(' ago. By now its source is '),
			live('distance'),
			words(' away.')
		),
		shows('redshift'),
		chart('lookback', {
			title: 'How long the light has been on its way',
			x: { control: 'redshift', label: 'Redshift of the galaxy' },
			y: { reading: { step: 'then', output: 'lookback' }, unit: 'Gyr', label: 'time on the way' },
			source: 'Growth of space from Planck Collaboration 2018 VI',
			description:
				'A curve that climbs steeply and then flattens: most of the way back is crossed while the light is stretched only a little.'
		}),
		text(
			'limits',
			'limits',
			words(
				'where the galaxy is headed. It tells of the way the light took, not of the galaxy since.'
			)
		)
	],
	claims: [
		stated('age', { step: 'now', output: 'age' }),
		printed('lookback', { step: 'then', output: 'lookback' }, 'Gyr', 2),
		printed('distance', { step: 'then', output: 'comoving_distance_Gly' }, 'Gly', 2)
	]
});

export const dipInTheNoise: Outline = outline({
	id: 'dip-in-the-noise',
	field: 'Early hydrogen',
	says: 'Where on the dial early hydrogen would leave a dip, and how deep it can be.',
	title: 'A dip in the hiss',
	point:
		'Before the first stars warmed it, cold hydrogen could take a sip from the radio sky, and no more than a sip.',
	steps: [
		step('dial', 'g21.frequency_from_z', { z: follows('redshift') }),
		step('depth', 'g21.deepest', {
			cosmology: fixed({ set: 'Planck18' }),
			z: follows('redshift')
		})
	],
	controls: [slider('redshift', 'Redshift at which the hydrogen is seen', '', [10, 25, 0.5, 20])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words(
				'Hydrogen colder than the glow behind it drinks a little of that glow, at one radio note. From a redshift of '
			),
			number('start', '20'),
			words(' the note arrives at '),
			number('note', 'about 68 megahertz'),
			words('.')
		),
		text(
			'result',
			'result',
			words('From a redshift of '),
			setting('redshift'),
			words(', a dip would stand at '),
			live('frequency'),
			words(', and go down to '),
			live('deepest'),
			words(' at the very most.')
		),
		shows('redshift'),
		chart('depth', {
			title: 'The deepest dip that unheated hydrogen allows',
			x: { control: 'redshift', label: 'Redshift at which the hydrogen is seen' },
			y: { reading: { step: 'depth', output: 'dTb_exact' }, unit: 'mK', label: 'depth of the dip' },
			source:
				'Furlanetto, Oh & Briggs 2006; growth of space from Planck Collaboration 2018 VI; gas that nothing warms',
			description:
				'A line below zero that climbs towards zero: earlier hydrogen was warmer, so its dip is shallower.'
		}),
		text(
			'limits',
			'limits',
			words(
				'whether such a dip has been seen. A deep one was reported once, and an independent measurement rejects it.'
			)
		)
	],
	claims: [
		stated('start', { control: 'redshift' }),
		stated('note', { step: 'dial', output: 'frequency' }),
		printed('frequency', { step: 'dial', output: 'frequency' }, 'MHz', 2),
		printed('deepest', { step: 'depth', output: 'dTb_exact' }, 'mK', 2)
	]
});
