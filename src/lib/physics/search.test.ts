import { describe, expect, test } from 'vitest';
import { catalogue } from './calculators/index.ts';
import { byField, fieldOf, FIELDS } from './fields.ts';
import { searchIn, whyWords } from './search.ts';

const search = searchIn(catalogue.values());
const ids = (wanted: string) => search(wanted).map(({ calculator }) => calculator.id);

describe('a question finds its calculator among the first three', () => {
	test.each([
		['how far does light travel in…?', 'light.travel'],
		['how old is the universe', 'cosmo.at_z'],
		['at what redshift', 'cosmo.inverse'],
		['age to redshift', 'cosmo.inverse'],
		['How hot?', 'blackbody.total'],
		['how long does it take to fall', 'energy.drop'],
		['how deep can the trough be', 'g21.deepest'],
		['How big is a black hole?', 'gravity.black_hole'],
		['how much faster than sound', 'gas.speeds'],
		['What colour is a hot star?', 'blackbody.total'],
		['how fast must a rocket be to leave a planet', 'gravity.body'],
		['how many tonnes of TNT', 'energy.convert'],
		['why do muons reach the ground', 'decay.in_flight'],
		['how old is this rock', 'decay.age'],
		['does ice float in water', 'mech.buoyancy'],
		['how cold was the gas', 'thermal.tla1'],
		['how does a trebuchet throw', 'launcher.hinged'],
		['how far away is that galaxy', 'cosmo.at_z'],
		['how much does a star dim when its planet passes', 'exoplanet.transit'],
		['how do I round to three figures', 'round.significant']
	])('%s', (question, id) => {
		expect(ids(question).slice(0, 3)).toContain(id);
	});
});

describe('a quantity finds what gives it', () => {
	test.each([
		['escape speed', 'gravity.body', 'gives Escape speed'],
		['speed of sound', 'gas.speeds', 'gives Speed of sound'],
		['lookback time since the light left', 'cosmo.at_z', 'gives Time since the light left'],
		['parallax', 'stars.magnitude', '“How far is a star with this parallax?”']
	])('%s', (quantity, id, why) => {
		const [first] = search(quantity);
		expect(first?.calculator.id).toBe(id);
		expect(whyWords(first?.why ?? null)).toBe(why);
	});

	test('a unit’s name does too', () => {
		expect(ids('megahertz').slice(0, 2)).toContain('g21.frequency_from_z');
	});
});

test('case, accents, endings and half-typed words don’t matter', () => {
	expect(ids('PENDULUMS')[0]).toBe('mech.pendulum');
	expect(ids('péndulum')[0]).toBe('mech.pendulum');
	expect(ids('pendu')[0]).toBe('mech.pendulum');
	expect(ids('falling')).toContain('fall.drag');
});

test('an id finds its own calculator first', () => {
	for (const id of catalogue.keys()) expect(ids(id)[0]).toBe(id);
});

test('a calculator’s own questions find it among the first three', () => {
	const missed = [...catalogue.values()].flatMap(({ id, asks }) =>
		asks.filter((ask) => !ids(ask).slice(0, 3).includes(id)).map((ask) => `${id}: ${ask}`)
	);
	expect(missed).toEqual([]);
});

test('nothing asked leaves every calculator, as they came; nonsense leaves none', () => {
	expect(ids('')).toEqual([...catalogue.keys()]);
	expect(ids('how is the')).toEqual([...catalogue.keys()]);
	expect(ids('zzz nothing-holds-this')).toEqual([]);
});

test('every calculator of the catalogue stands in a field of its own kind', () => {
	for (const calculator of catalogue.values()) {
		expect(fieldOf(calculator), calculator.id).not.toBe('Of this house');
	}
	expect(fieldOf({ id: 'house.tides' })).toBe('Of this house');
	const shelves = byField(catalogue.values());
	expect(shelves.flatMap(({ calculators }) => calculators)).toHaveLength(catalogue.size);
	expect(shelves.map(({ field }) => field)).toEqual(FIELDS.slice(0, -1));
});
