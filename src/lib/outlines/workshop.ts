/** Outlines about throws, falls and swings, about decay, and about how sure a number is. */
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
	strong,
	takes,
	text,
	words,
	type Outline
} from './outline.ts';

export const throwAndRange: Outline = outline({
	id: 'throw-and-range',
	field: 'Fall, flight and launch',
	says: 'How far a throw goes, by its angle.',
	title: 'The best angle',
	point: 'Too flat, and a ball lands soon. Too steep, and it goes up for nothing.',
	steps: [step('flight', 'projectile.vacuum', { v0_ms: fixed(20), angle_deg: follows('angle') })],
	controls: [slider('angle', 'Angle above the horizontal', 'deg', [5, 85, 5, 45])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('A ball leaves the hand at '),
			number('speed', '20 metres a second'),
			words('. Without air, it goes farthest when thrown midway between level and upright: '),
			number('best', 'about 41 metres'),
			words('.')
		),
		text(
			'result',
			'result',
			words('At '),
			setting('angle'),
			words(', it comes down '),
			live('range'),
			words(' away.')
		),
		shows('angle'),
		chart('range', {
			title: 'How far the ball goes',
			x: { control: 'angle', label: 'Angle above the horizontal' },
			y: { reading: { step: 'flight', output: 'range' }, unit: 'm', label: 'range' },
			source: 'Even gravity, 9.80665 m/s², and no air',
			description:
				'A hill: it climbs to its top in the middle and comes down the same on the other side.'
		}),
		text(
			'limits',
			'limits',
			words(
				'what a real throw does. Air slows a ball, and an arm throws some angles better than others.'
			)
		),
		text(
			'caution',
			'caution',
			strong('Throw where nobody stands.'),
			words(' Follow local rules, and leave anything that launches by itself to qualified people.')
		)
	],
	claims: [
		stated('speed', { step: 'flight', setting: 'v0_ms' }),
		stated('best', { step: 'flight', output: 'range' }),
		printed('range', { step: 'flight', output: 'range' }, 'm', 2)
	]
});

export const energyLedger: Outline = outline({
	id: 'energy-ledger',
	field: 'Motion and energy on the bench',
	says: 'What a falling weight gives up, and what a climb takes of it.',
	title: 'A ledger of one fall',
	point: 'Energy changes hands and is never spent: what one thing gives up, another takes on.',
	steps: [
		step('fall', 'energy.drop', { height_m: follows('height'), mass_kg: fixed(2) }),
		step('roll', 'energy.drop', {
			height_m: fixed(1),
			mass_kg: fixed(2),
			v0_ms: takes('fall', 'impactSpeed')
		})
	],
	controls: [slider('height', 'Height of the fall', 'm', [1, 20, 0.5, 5])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('A weight of '),
			number('mass', '2 kilograms'),
			words(' comes down by '),
			number('height', '5 metres'),
			words('. It arrives at '),
			number('speed', 'about 10 metres a second'),
			words(', whatever way it took.')
		),
		text(
			'result',
			'result',
			words('From '),
			setting('height'),
			words(' it brings '),
			live('energy'),
			words(' with it and arrives at '),
			live('arrives'),
			words('. Let it fall '),
			number('more', '1 metre'),
			words(' more, and it arrives at '),
			live('farther'),
			words('.')
		),
		shows('height'),
		chart('speed', {
			title: 'How fast the weight arrives',
			x: { control: 'height', label: 'Height of the fall' },
			y: { reading: { step: 'fall', output: 'impactSpeed' }, unit: 'm/s', label: 'speed' },
			source: 'Conservation of energy; standard gravity, 9.80665 m/s²',
			description:
				'A curve that climbs and flattens: each further metre adds less speed than the one before.'
		}),
		text('limits', 'limits', words('what air and friction keep back. Here they keep nothing.')),
		text(
			'caution',
			'caution',
			strong('A falling weight injures.'),
			words(' Keep clear below, and follow local rules for lifting.')
		)
	],
	claims: [
		stated('mass', { step: 'fall', setting: 'mass_kg' }),
		stated('height', { control: 'height' }),
		stated('speed', { step: 'fall', output: 'impactSpeed' }),
		stated('more', { step: 'roll', setting: 'height_m' }),
		printed('energy', { step: 'fall', output: 'energy' }, 'J', 2),
		printed('arrives', { step: 'fall', output: 'impactSpeed' }, 'm/s', 2),
		printed('farther', { step: 'roll', output: 'impactSpeed' }, 'm/s', 2)
	]
});

export const longThread: Outline = outline({
	id: 'long-thread',
	field: 'Motion and energy on the bench',
	says: 'How slowly a pendulum swings, by its length.',
	title: 'A slow swing needs a long thread',
	point: 'How long a swing takes hangs on the length of the thread, and hardly on anything else.',
	steps: [step('swing', 'mech.pendulum', { L_m: follows('length'), theta0_deg: fixed(10) })],
	controls: [slider('length', 'Length of the thread', 'm', [0.2, 5, 0.1, 1])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('On a thread of '),
			number('start', '1 metre'),
			words(', a swing there and back takes '),
			number('swing', 'about 2 seconds'),
			words('.')
		),
		text(
			'result',
			'result',
			words('On '),
			setting('length'),
			words(' it takes '),
			live('time'),
			words('.')
		),
		shows('length'),
		chart('time', {
			title: 'How long a swing takes',
			x: { control: 'length', label: 'Length of the thread' },
			y: { reading: { step: 'swing', output: 'exact' }, unit: 's', label: 'time there and back' },
			source: 'The pendulum in even gravity, 9.80665 m/s²',
			description: 'A curve that climbs and flattens: the time grows more slowly than the thread.'
		}),
		text('limits', 'limits', words('when it comes to rest. That is up to air and to the nail.'))
	],
	claims: [
		stated('start', { control: 'length' }),
		stated('swing', { step: 'swing', output: 'exact' }),
		printed('time', { step: 'swing', output: 'exact' }, 's', 3)
	]
});

export const whatIsLeft: Outline = outline({
	id: 'what-is-left',
	field: 'Gases and decays',
	says: 'What is left of something that decays, by the time gone by.',
	title: 'What is left, and left again',
	point:
		'What decays doesn’t run out on a day: of what is left, the same share goes in each equal stretch of time.',
	steps: [
		step('decay', 'decay.halflife', {
			unit: fixed('yr'),
			t: follows('time'),
			halflife: fixed(5730)
		})
	],
	controls: [slider('time', 'Time gone by', 'yr', [0, 40_000, 10, 11_460])],
	blocks: [
		text(
			'opening',
			'paragraph',
			words('Carbon-14 has a half-life of '),
			number('halflife', '5730 years'),
			words('. After '),
			number('start', '11 460 years'),
			words(', '),
			number('quarter', '25 per cent'),
			words(' is left.')
		),
		text(
			'result',
			'result',
			words('After '),
			setting('time'),
			words(', '),
			live('left'),
			words(' is left.')
		),
		shows('time'),
		chart('left', {
			title: 'What is left',
			x: { control: 'time', label: 'Time gone by' },
			y: {
				reading: { step: 'decay', output: 'remaining' },
				unit: '%',
				label: 'share that is left'
			},
			source: 'Half-life 5730 years: Godwin 1962, Nature 195, 984 (from memory)',
			description:
				'A curve that falls steeply and then ever more slowly, and never quite reaches nothing.'
		}),
		text(
			'limits',
			'limits',
			words(
				'which atom goes next. And a date needs more: what was there at the start wasn’t always the same.'
			)
		)
	],
	claims: [
		stated('halflife', { step: 'decay', setting: 'halflife' }),
		stated('start', { control: 'time' }),
		stated('quarter', { step: 'decay', output: 'remaining' }),
		printed('left', { step: 'decay', output: 'remaining' }, '%', 2)
	]
});

export const twoMeasurements: Outline = outline({
	id: 'two-measurements',
	field: 'Uncertainty and rounding',
	says: 'Two measurements of one thing, and what they say together.',
	title: 'Two rulers, one answer',
	point: 'The surer of two measurements counts for more, and together they are surer than either.',
	steps: [step('mean', 'unc.weighted_mean', { x: fixed('9.81, 9.79'), u: fixed('0.02, 0.03') })],
	controls: [],
	blocks: [
		text(
			'opening',
			'paragraph',
			words(
				'A thing is measured by one person and then by another, and they don’t quite agree. Weighed by how sure each is, their mean is '
			),
			number('mean', 'about 9.80'),
			words('.')
		),
		text('heading', 'heading', words('How sure is that?')),
		text(
			'second',
			'paragraph',
			words('The answer is good to '),
			live('sure'),
			words('. Neither of them was as sure alone.')
		),
		text(
			'limits',
			'limits',
			words(
				'whether both made the same mistake. What measurements have in common, their mean keeps.'
			)
		)
	],
	claims: [
		stated('mean', { step: 'mean', output: 'mean' }),
		printed('sure', { step: 'mean', output: 'u' }, '', 2)
	]
});
