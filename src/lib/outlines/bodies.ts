/** Outlines about stars, planets and their orbits. */
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

export const glow: Outline = outline({
	id: 'glow',
	field: 'Glow and heat of bodies',
	says: 'The colour in which a star shines most, by its temperature.',
	title: 'Hot is blue',
	point: 'The hotter a star, the shorter the waves in which it shines most.',
	steps: [step('glow', 'blackbody.total', { T_K: follows('temperature') })],
	controls: [
		slider('temperature', 'Temperature of the star’s surface', 'K', [3000, 12_000, 100, 5800])
	],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('The Sun’s surface is at '),
			number('sun', 'about 5800 kelvins'),
			words('. Its light is strongest at waves of '),
			number('peak', 'about 500 nanometres'),
			words(', in the green.')
		),
		text(
			'result',
			'result',
			words('At '),
			setting('temperature'),
			words(', a star shines most at '),
			live('wave'),
			words('.')
		),
		shows('temperature'),
		chart('peak', {
			title: 'Where a star shines most',
			x: { control: 'temperature', label: 'Temperature of the surface' },
			y: { reading: { step: 'glow', output: 'peakWavelength' }, unit: 'nm', label: 'wavelength' },
			source: 'Planck’s law; constants from CODATA 2018',
			description: 'A curve that falls: the hotter the star, the shorter the wave.'
		}),
		text(
			'limits',
			'limits',
			words('the colour a star has to the eye. That takes in all of its light, and the eye.')
		)
	],
	claims: [
		stated('sun', { control: 'temperature' }),
		stated('peak', { step: 'glow', output: 'peakWavelength' }),
		printed('wave', { step: 'glow', output: 'peakWavelength' }, 'nm', 2)
	]
});

export const planetsShadow: Outline = outline({
	id: 'planets-shadow',
	field: 'Stars, planets and what is seen of them',
	says: 'How much of a star’s light a planet hides as it passes.',
	title: 'A shadow on a star',
	point: 'A planet that passes before its star dims it by the share of the disc that it covers.',
	steps: [
		step('transit', 'exoplanet.transit', {
			Rp_m: follows('radius'),
			Rs_m: fixed(695_700_000),
			a_m: fixed(149_597_870_700)
		})
	],
	controls: [slider('radius', 'Radius of the planet', 'km', [2000, 80_000, 1000, 71_000])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('Take a star like the Sun, with a radius of '),
			number('star', '695 700 kilometres'),
			words('. A planet with a radius of '),
			number('planet', '71 000 kilometres'),
			words(' hides '),
			number('share', 'about 1 per cent'),
			words(' of its light.')
		),
		text(
			'result',
			'result',
			words('A planet with a radius of '),
			setting('radius'),
			words(' hides '),
			live('hidden'),
			words(' of the star’s light.')
		),
		shows('radius'),
		chart('depth', {
			title: 'How much light a planet hides',
			x: { control: 'radius', label: 'Radius of the planet' },
			y: { reading: { step: 'transit', output: 'depth' }, unit: '%', label: 'share of the light' },
			source: 'Geometry of two discs; nominal radius of the Sun, IAU 2015 resolution B3',
			description:
				'A curve that climbs ever more steeply: the light that is hidden goes with the square of the radius.'
		}),
		text(
			'limits',
			'limits',
			words(
				'what the planet is made of. A dip in the light tells its size and nothing of its weight.'
			)
		)
	],
	claims: [
		stated('star', { step: 'transit', setting: 'Rs_m' }),
		stated('planet', { control: 'radius' }),
		stated('share', { step: 'transit', output: 'depth' }),
		printed('hidden', { step: 'transit', output: 'depth' }, '%', 2)
	]
});

export const roundTheSun: Outline = outline({
	id: 'round-the-sun',
	field: 'Gravity and orbits',
	says: 'How long a round takes, by its size.',
	title: 'The farther, the slower',
	point:
		'Far from the Sun an orbit is longer, and the planet slower: a round takes much more time.',
	steps: [
		step('orbit', 'orbit.kepler', {
			mass_kg: fixed(1.988409870698051e30),
			a_m: follows('distance')
		})
	],
	controls: [slider('distance', 'Distance from the Sun', 'au', [0.4, 30, 0.2, 5.2])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('The Earth goes round once a year. At '),
			number('start', '5.2 astronomical units'),
			words(', a round takes '),
			number('round', 'about 12 years'),
			words('.')
		),
		text(
			'result',
			'result',
			words('At '),
			setting('distance'),
			words(' from the Sun, a round takes '),
			live('period'),
			words('.')
		),
		shows('distance'),
		chart('period', {
			title: 'How long a round takes',
			x: { control: 'distance', label: 'Distance from the Sun' },
			y: { reading: { step: 'orbit', output: 'period' }, unit: 'yr', label: 'time of a round' },
			source: 'Kepler’s third law; mass of the Sun from the IAU’s nominal solar mass parameter',
			description: 'A curve that climbs ever more steeply: time grows faster than distance.'
		}),
		text('limits', 'limits', words('whether a planet is there. Any distance has its time.'))
	],
	claims: [
		stated('start', { control: 'distance' }),
		stated('round', { step: 'orbit', output: 'period' }),
		printed('period', { step: 'orbit', output: 'period' }, 'yr', 3)
	]
});

export const slowClock: Outline = outline({
	id: 'slow-clock',
	field: 'Close to the speed of light',
	says: 'How much slower a fast clock runs.',
	title: 'A clock that takes its time',
	point:
		'A clock that races past us runs slow, and close to the speed of light almost stands still.',
	steps: [step('clock', 'sr.kinematics', { beta: follows('speed'), properTime_s: fixed(60) })],
	controls: [slider('speed', 'Speed as a share of that of light', '', [0.1, 0.99, 0.01, 0.6])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('While a fast clock counts '),
			number('minute', '60 seconds'),
			words(', ours count more. At first the difference is small, and then it has no end.')
		),
		text(
			'result',
			'result',
			words('At '),
			setting('speed'),
			words(' of the speed of light, ours count '),
			live('ours'),
			words(' meanwhile.')
		),
		shows('speed'),
		chart('ours', {
			title: 'What our clocks count meanwhile',
			x: { control: 'speed', label: 'Speed as a share of that of light' },
			y: {
				reading: { step: 'clock', output: 'dilatedTime' },
				unit: 's',
				label: 'time by our clocks'
			},
			source: 'Special relativity: the Lorentz factor',
			description: 'A curve that is nearly level at first and then climbs without end.'
		}),
		text(
			'limits',
			'limits',
			words('what the traveller feels. For whoever flies with the clock, it runs as ever.')
		)
	],
	claims: [
		stated('minute', { step: 'clock', setting: 'properTime_s' }),
		printed('ours', { step: 'clock', output: 'dilatedTime' }, 's', 3)
	]
});
