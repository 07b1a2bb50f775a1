import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Stated } from '../widget/stated.ts';
import { beamPicture, type BeamPicture } from './beam.ts';
import { detectQuantities } from './detect.ts';
import { weigh, type WeighedReading } from './weigh.ts';

function statedIn(text: string): Stated {
	const stated = detectQuantities(text, 'en')[0]?.stated;
	if (!stated) throw new Error(`nothing to weigh in “${text}”`);
	return stated;
}

function pictureOf(text: string, reading: WeighedReading): BeamPicture {
	const picture = beamPicture(statedIn(text), reading);
	if (!picture) throw new Error(`no picture of “${text}”`);
	return picture;
}

const verdictsOf = ({ zones }: BeamPicture) => zones.map(({ verdict }) => verdict);
const edgesOf = ({ zones }: BeamPicture) => zones.slice(1).map(({ from }) => from);
const levelShare = ({ zones, fromPercent, toPercent }: BeamPicture) =>
	zones
		.filter(({ verdict }) => verdict === 'level')
		.reduce((sum, { from, to }) => sum + to - from, 0) /
	(toPercent - fromPercent);

describe('zones', () => {
	test('“nearly 14 billion years”: tips above, leans where the side isn’t established, level to 5 per cent below', () => {
		const picture = pictureOf('nearly 14 billion years', {
			value: 13.786,
			unit: 'Gyr',
			uncertainty: 0.02
		});
		expect(verdictsOf(picture)).toEqual(['leans', 'level', 'leans', 'tips']);
		const [far, near, above] = edgesOf(picture);
		expect(far).toBeCloseTo(-5, 9);
		expect(near).toBeCloseTo((-0.04 / 14) * 100, 9);
		expect(above).toBeCloseTo(0, 9);
		expect(picture.departurePercent).toBeCloseTo(-1.53, 2);
		expect(picture.whiskerPercent).toBeCloseTo((0.04 / 14) * 100, 9);
	});

	test('“more than 6 kilometres” reads in metres and is drawn in per cent', () => {
		const picture = pictureOf('more than 6 kilometres', {
			value: 6562,
			unit: 'm',
			uncertainty: 'exact'
		});
		expect(verdictsOf(picture)).toEqual(['tips', 'level', 'leans']);
		expect(edgesOf(picture)[0]).toBeCloseTo(0, 9);
		expect(edgesOf(picture)[1]).toBeCloseTo(25, 9);
		expect(picture.whiskerPercent).toBeNull();
	});

	test('a zone’s edge is where the verdict turns', () => {
		const picture = pictureOf('about 68 megahertz', {
			value: 68.14,
			unit: 'MHz',
			uncertainty: 0.1
		});
		expect(edgesOf(picture).map((edge) => (68 * (1 + edge / 100)).toFixed(6))).toEqual([
			'67.500000',
			'68.500000'
		]);
	});

	test('temperatures depart from what is printed, in its own scale', () => {
		const picture = pictureOf('about −19 °C', { value: 254.586, unit: 'K', uncertainty: 0.1 });
		expect(picture.departurePercent).toBeCloseTo(2.29, 2);
		expect(verdictsOf(picture)).toEqual(['leans', 'level', 'leans']);
	});

	test('a claim with idle digits tips wherever the reading lies', () => {
		const picture = pictureOf('13.7874 billion years', {
			value: 13.787,
			unit: 'Gyr',
			uncertainty: 0.02
		});
		expect(verdictsOf(picture)).toEqual(['tips']);
	});
});

describe('the arm', () => {
	test.each([
		['nearly 14 billion years', 13.786, 'Gyr'],
		['13.8 billion years', 13.786, 'Gyr'],
		['more than 6 kilometres', 6.562, 'km'],
		['less than 7 kilometres', 6.562, 'km'],
		['about 126 times', 125.641, 'times'],
		['1420 megahertz', 1420.4, 'MHz'],
		['just over 8 minutes', 8.3167, 'min'],
		['at least 13 km', 13.787, 'km']
	])('“%s”: the level zone takes 20 to 60 per cent of it', (text, value, unit) => {
		const share = levelShare(pictureOf(text, { value, unit, uncertainty: 'exact' }));
		expect(share).toBeGreaterThanOrEqual(0.2);
		expect(share).toBeLessThanOrEqual(0.6);
	});

	test('whatever is weighed, nought and the reading are on it, the zones meet, and the ticks are its own', () => {
		const words = fc.constantFrom(
			'about 14 km',
			'nearly 14 km',
			'13.8 km',
			'more than 13 km',
			'within 14 km',
			'exactly 14 km',
			'half a kilometre',
			'just under 20 km',
			'−14 km'
		);
		const uncertainty = fc.oneof(
			fc.constantFrom('exact' as const, 'not-available' as const),
			fc.double({ min: 0, max: 3, noNaN: true })
		);
		fc.assert(
			fc.property(
				words,
				fc.double({ min: -200, max: 200, noNaN: true }),
				uncertainty,
				(text, value, u) => {
					const reading: WeighedReading = { value, unit: 'km', uncertainty: u };
					const picture = pictureOf(text, reading);
					const { fromPercent, toPercent, zones, ticks, departurePercent } = picture;
					expect(fromPercent).toBeLessThanOrEqual(Math.min(0, departurePercent));
					expect(toPercent).toBeGreaterThanOrEqual(Math.max(0, departurePercent));
					expect(zones[0]?.from).toBe(fromPercent);
					expect(zones.at(-1)?.to).toBe(toPercent);
					for (const [index, zone] of zones.slice(1).entries())
						expect(zone.from).toBe(zones[index]?.to);
					expect(ticks).toContain(0);
					expect(ticks.length).toBeGreaterThanOrEqual(4);
					expect(ticks.length).toBeLessThanOrEqual(12);
					const under = zones.filter(
						({ from, to }) => departurePercent >= from - 1e-9 && departurePercent <= to + 1e-9
					);
					expect(under.map(({ verdict }) => verdict)).toContain(
						weigh(statedIn(text), reading).verdict
					);
				}
			),
			{ numRuns: 60 }
		);
	});
});

test('no picture without a departure: no reading, another dimension, or nought in the copy', () => {
	expect(
		beamPicture(statedIn('14 km'), { value: NaN, unit: 'km', uncertainty: 'exact' })
	).toBeNull();
	expect(beamPicture(statedIn('14 km'), { value: 14, unit: 's', uncertainty: 'exact' })).toBeNull();
	expect(beamPicture(statedIn('0 km'), { value: 14, unit: 'km', uncertainty: 'exact' })).toBeNull();
});
