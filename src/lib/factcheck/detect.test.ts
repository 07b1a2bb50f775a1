import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { detectQuantities } from './detect.ts';

/**
 * Our own sentences, written to cover the ways numbers stand in the house's copy. Each quantity is marked ⟦so⟧; what
 * isn't marked must not be found.
 */
const CORPUS = `
Cold hydrogen gives off a faint radio wave at ⟦1420 megahertz⟧, ⟦21 centimetres⟧ from crest to crest.
The Universe has been growing for ⟦nearly 14 billion years⟧.
Run the film backwards and the distances shrink to nothing ⟦13.8 billion years⟧ ago.
From the days of the first stars it comes in ⟦more than 15 times⟧ as long as it set out.
A wave that left ⟦180 million years⟧ after the Big Bang arrives today at ⟦about 68 megahertz⟧, each crest ⟦4.4 metres⟧ from the next.
A weight of ⟦6000 kilograms⟧ that falls ⟦8 metres⟧ can give a stone ⟦471 kilojoules⟧.
The stone pays back ⟦1.5 per cent⟧ to reach the top of a wall, ⟦12 metres⟧ up, and arrives there at ⟦about 124 metres a second⟧.
The starlight dips by ⟦about 1 per cent⟧; an Earth makes a dip of ⟦84 parts per million⟧.
That is ⟦less than a hundredth of 1 per cent⟧, and the shadow is ⟦about 126 times⟧ as deep.
Left alone at rest, a muon lasts ⟦2.2 microseconds⟧ on average.
At ⟦99.5 per cent⟧ of light speed it should get ⟦about 660 metres⟧, and it covers ⟦more than 6 kilometres⟧.
Carbon-14 halves every ⟦5730 years⟧; after ⟦17 190 years⟧, ⟦exactly one eighth⟧ is left, as Figure 3 shows.
With no air, Earth would sit at ⟦about −19 °C⟧ (⟦255 kelvin⟧).
The colder gas reads ⟦-19 °C⟧, or ⟦minus nineteen degrees Celsius⟧ when spoken.
A star like the Sun shines most strongly at ⟦about 500 nanometres⟧; a cooler one at ⟦nearly 1000 nanometres⟧, ⟦nearly twice⟧ the wavelength.
Sound covers ⟦343 metres each second⟧, so ⟦about three seconds⟧ make a kilometre.
Gravity there is ⟦about a sixth⟧ of ours, and ⟦two-thirds⟧ of what it is elsewhere.
A dip of ⟦half a kelvin⟧ would be ⟦more than twice⟧ as deep, and ⟦a fifth of a kelvin⟧ is the most.
The gap is ⟦2–3 km⟧ wide, ⟦between 2 and 3 kilometres⟧ at noon, and runs ⟦from 2 to 3 kilometres⟧ at night.
Temperatures fall to ⟦−5 to −2 °C⟧ and the control goes over ⟦100–500 million years⟧.
The difference between the arms is ⟦1.5 × 10⁻¹⁸ m⟧, or ⟦3.7 × 10^-18 m⟧ in plain type.
The fit gives ⟦13.787(20) billion years⟧, that is ⟦13.787 ± 0.020 Gyr⟧.
Planck 2018 and Hinshaw 2013 agree; so did the team of 1965, and the paper of Tuesday 24 November 2026.
The 21st century began after the 1990s; in 2018 the third edition came out, W4 followed, then Release 2.
⟦Dozens⟧ of galaxies, ⟦hundreds of thousands of years⟧, ⟦a few per cent⟧ and ⟦several hundred metres⟧.
One of them said that no one would look at 10:00 or on 2026-11-24.
The light needs ⟦8.3 minutes⟧; the Moon is ⟦just over a second⟧ away, and the year lasts ⟦about 365 days⟧.
It's ⟦roughly twenty kilometres⟧ high, ⟦a hundred and twenty kilometres⟧ long, and ⟦at least twelve metres⟧ deep.
The model takes ⟦two thousand five hundred⟧ steps and ⟦half a million⟧ photons.
The FM band runs ⟦from 87.5 to 108 MHz⟧ in most of the world; a ⟦4-kilometre⟧ arm hears none of it.
The wave comes from ⟦close to 1.3 billion light years⟧ away, ⟦some 400 megaparsecs⟧.
It weighs ⟦about, say, 14 tonnes⟧, ⟦up to 60 kg⟧ more than the old one, and costs ⟦almost double⟧ the first.
The dose was ⟦20%⟧ higher, ⟦0.5 %⟧ at most, ⟦well over 10 percent⟧ for some.
Its speed is ⟦299 792 458 m/s⟧; light takes ⟦1.28 s⟧ to the Moon and ⟦1,420 s⟧ to Mars.
The line of ⟦21 cm⟧ is named so, but uranium-235 and H2O carry names, as do Apollo 11 and 5G.
The result is ⟦tenfold⟧, or ⟦three times⟧ what it was; version 2.1.0 gave ⟦9.81 m/s²⟧.
Its frequency is ⟦no more than 90 MHz⟧, ⟦just under 2 GHz⟧ in the other, ⟦slightly over 3 GHz⟧ in the last.
⟦Two⟧ black holes circle each other, and the second half of the story takes ⟦two and a half minutes⟧.
On page 12 the table has ⟦seven⟧ rows; Chapter Two has the rest, and a second look helps.
The half-life is long; two-way traffic is not one-sided, and a third person agreed.
It grew ⟦15-fold⟧ in ⟦under a minute⟧, from ⟦½⟧ to ⟦¾⟧ of the width, at ⟦50⟧ beats a second.
The redshift is ⟦about 20⟧, the stretch ⟦21 times⟧, the age ⟦in the region of 180 million years⟧.
Energies reach ⟦a trillion electronvolts⟧ (⟦1 TeV⟧); the camera takes ⟦1/3⟧ of that.
See equation 4, step 2 and room 12 (2022), [12] and § 3.2 for the rest, at 5 pm on 3 May.
`;

function expected(line: string): { text: string; marks: string[] } {
	return {
		text: line.replace(/[⟦⟧]/g, ''),
		marks: [...line.matchAll(/⟦([^⟧]*)⟧/g)].map(([, mark = '']) => mark)
	};
}

describe('our own corpus', () => {
	const lines = CORPUS.trim().split('\n').map(expected);
	const wanted = lines.flatMap(({ marks }, index) => marks.map((mark) => `${index}: ${mark}`));
	const found = lines.flatMap(({ text }, index) =>
		detectQuantities(text, 'en').map(({ surface }) => `${index}: ${surface}`)
	);
	const right = found.filter((surface) => wanted.includes(surface));

	test('holds at least sixty quantities', () => {
		expect(wanted.length).toBeGreaterThanOrEqual(60);
	});
	test('at least 95 per cent of the quantities are found, from hedge to unit', () => {
		const missed = wanted.filter((surface) => !found.includes(surface));
		expect(right.length / wanted.length, `missed ${missed.join(' · ')}`).toBeGreaterThanOrEqual(
			0.95
		);
	});
	test('at least 95 per cent of what is found is a quantity', () => {
		const wrong = found.filter((surface) => !wanted.includes(surface));
		expect(
			right.length / found.length,
			`wrongly found ${wrong.join(' · ')}`
		).toBeGreaterThanOrEqual(0.95);
	});
});

describe('what is read', () => {
	const first = (text: string) => {
		const [quantity] = detectQuantities(text, 'en');
		if (!quantity) throw new Error(`nothing found in “${text}”`);
		return quantity;
	};

	test.each([
		['nearly 14 billion years', { numeral: '14', scale: 1e9, unit: 'yr', hedge: 'below' }],
		['1,420 MHz', { numeral: '1420', scale: 1, unit: 'MHz', unitWord: 'MHz' }],
		['17 190 years', { numeral: '17190', unit: 'yr' }],
		['17\u202f190 years', { numeral: '17190', unit: 'yr' }],
		['−19 °C', { numeral: '-19', unit: '°C' }],
		['minus nineteen degrees Celsius', { numeral: '-19', unit: '°C' }],
		['a million years', { numeral: '1', scale: 1e6, unit: 'yr' }],
		['three hundred million kilometres', { numeral: '300', scale: 1e6, unit: 'km' }],
		['two thousand five hundred metres', { numeral: '2500', scale: 1, unit: 'm' }],
		['one and a half billion years', { numeral: '1.5', scale: 1e9, unit: 'yr' }],
		['13.80 Gyr', { numeral: '13.80', unit: 'Gyr' }],
		['124 metres per second', { numeral: '124', unit: 'm/s', unitWord: 'metres per second' }],
		['124 metres a second', { numeral: '124', unit: 'm/s' }],
		['1.5 × 10⁻¹⁸ m', { numeral: '1.5', scale: 1e-18, unit: 'm' }],
		['half a million years', { fraction: [1, 2], scale: 1e6, unit: 'yr' }],
		['a fifth of a kelvin', { fraction: [1, 5], unit: 'K' }],
		['less than a hundredth of 1 per cent', { fraction: [1, 100], unit: '%', hedge: 'less-than' }],
		['a four-hundredth of it', { fraction: [1, 400], unit: '' }],
		['well over 30 km', { hedge: 'well-over', hedgeWord: 'well over' }],
		['Just under 30 km', { hedge: 'just-below', hedgeWord: 'Just under' }],
		['no more than 30 km', { hedge: 'at-most' }],
		['about, say, 14 km', { hedge: 'around', hedgeWord: 'about' }],
		['3 kilometres across', { numeral: '3', unit: 'km', quantity: 'diameter' }],
		['3 kilometres from centre to edge', { quantity: 'radius' }],
		['more than 15 times', { numeral: '15', unit: 'times', hedge: 'more-than' }],
		['twice as long', { numeral: '2', unit: '' }]
	])('%s', (text, stated) => {
		expect(first(text).stated).toMatchObject(stated);
	});

	test.each([
		['2–3 km', [2, 3], 'km'],
		['2-3 km', [2, 3], 'km'],
		['between 2 and 3 million years', [2e6, 3e6], 'yr'],
		['from −5 to −2 °C', [-5, -2], '°C'],
		['−5 to +2 °C', [-5, 2], '°C'],
		['200 metres to 3 kilometres', [200, 3], 'km']
	])('the range %s', (text, ends, unit) => {
		expect(first(text)).toMatchObject({
			kind: 'range',
			value: null,
			ends,
			unit,
			stated: null,
			surface: text
		});
	});

	test('offsets are UTF-16, and the surface is what stands there', () => {
		const text = '🛰️ It’s nearly 14 km up';
		const { start, end, surface } = first(text);
		expect(text.slice(start, end)).toBe(surface);
		expect(surface).toBe('nearly 14 km');
	});

	test('two hedges on one number are told', () => {
		expect(first('about up to 15 km')).toMatchObject({ doubleHedge: true, hedge: 'about up to' });
	});
});

describe('what is no quantity', () => {
	test.each([
		'in 1965',
		'since about 1965',
		'24 November 2026',
		'November 24, 2026',
		'2026-11-24',
		'10:02:14',
		'5 pm',
		'300 BC',
		'the 1990s',
		'the 21st century',
		'the third edition',
		'a third person',
		'a second look',
		'Planck 2018',
		'W4',
		'carbon-14',
		'H2O',
		'COVID-19',
		'5G',
		'version 2.1.0',
		'Figure 3',
		'page 12',
		'Chapter Two',
		'[12]',
		'one of them',
		'no one',
		'a metre',
		'half-life',
		'the second half',
		'two-way',
		'(Singh et al. 2022)',
		'from 1965 to 1970',
		'1. First of all'
	])('%s', (text) => {
		expect(detectQuantities(`It was ${text}`.replace('It was 1.', '1.'), 'en')).toEqual([]);
	});
	test('four digits with a unit or a one-sided hedge are a number', () => {
		expect(detectQuantities('in 1965 metres', 'en')).toHaveLength(1);
		expect(detectQuantities('in more than 1965 galaxies', 'en')).toHaveLength(1);
	});
});

describe('any text', () => {
	test('is read without an error, in order, without overlap, and each surface is where it says', () => {
		const bits = fc.constantFrom(
			'14',
			'13.8',
			'−',
			'-',
			'–',
			' ',
			',',
			'.',
			'billion',
			'years',
			'km',
			'%',
			'about',
			'nearly',
			'half',
			'a',
			'two',
			'third',
			'of',
			'to',
			'between',
			'and',
			'from',
			'10⁻¹⁸',
			'×',
			'(20)',
			'±',
			'½',
			'W',
			'°C',
			'\u00a0',
			'times',
			'dozens',
			'a few',
			'🛰️',
			'one'
		);
		fc.assert(
			fc.property(
				fc.oneof(
					fc.string({ unit: 'grapheme' }),
					fc.array(bits).map((parts) => parts.join(' ')),
					fc.array(bits).map((parts) => parts.join(''))
				),
				(text) => {
					let end = 0;
					for (const quantity of detectQuantities(text, 'en')) {
						expect(quantity.start).toBeGreaterThanOrEqual(end);
						expect(text.slice(quantity.start, quantity.end)).toBe(quantity.surface);
						end = quantity.end;
					}
				}
			)
		);
	});

	// Time that grows as a square takes minutes here; figures belong to the bench.
	test('long runs of what looks like numbers are got through', { timeout: 60_000 }, () => {
		const parts = [
			'1',
			'1 ',
			'1,',
			'1.',
			'1:',
			'1-',
			'1–',
			'[1,',
			'a ',
			'two ',
			'2 to ',
			'about ',
			'hundreds of ',
			' ',
			'½',
			'1 000 '
		];
		for (const part of parts) {
			const long = `1${part.repeat(Math.ceil(100_000 / part.length))}b`;
			for (const { start, end, surface } of detectQuantities(long, 'en')) {
				expect(long.slice(start, end)).toBe(surface);
			}
		}
	});
});
