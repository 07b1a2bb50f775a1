import { catalogue } from '$lib/physics/calculators/index.ts';
import { runCalculator } from '$lib/physics/calculators/run.ts';
import { firstLight } from '$lib/server/demo/first-light.ts';
import type { WidgetDocument } from '$lib/widget/document.ts';
import { evaluate } from '$lib/widget/evaluate.ts';
import { wordsAt } from '$lib/widget/places.ts';
import { describe, expect, test } from 'vitest';
import { claimRecord } from './claim-record.ts';
import { placeWords } from './place-words.ts';
import { sentenceParts } from './sentence-parts.ts';

function claimOf(document: WidgetDocument, id: string) {
	const claim = document.claims.find((each) => each.id === id);
	if (!claim) throw new Error(`The demo has no claim ${id}.`);
	return claim;
}

describe('the record of a number that moves', () => {
	const record = claimRecord(
		firstLight,
		claimOf(firstLight, 'frequency'),
		'about 68 megahertz',
		catalogue
	);

	test('is read in the unit of the copy, and worked from the first step on', () => {
		expect(record?.reading).toMatchObject({ unit: 'MHz' });
		expect(Number(record?.reading?.value)).toBeCloseTo(68.1, 1);
		expect(record?.working.map(({ href }) => href)).toEqual([
			'/calculators/cosmo.inverse',
			'/calculators/line.observe'
		]);
		expect(record?.working[0]?.readings).toEqual([
			expect.objectContaining({ own: false, value: expect.stringMatching(/^19\.8/) as string })
		]);
	});

	test('tries the sentence at ten settings or more, one of them the first', () => {
		const probes = record?.strips[0]?.probes ?? [];
		expect(probes.length).toBeGreaterThanOrEqual(10);
		expect(probes.filter(({ first }) => first)).toHaveLength(1);
		expect(new Set(probes.map(({ sentence }) => sentence)).size).toBe(probes.length);
	});

	test('its address holds the settings that give the same reading', () => {
		const address = new URL(record?.tryAt ?? '', 'http://localhost');
		expect(address.pathname).toBe('/calculators/line.observe');
		const inputs = Object.fromEntries(
			[...address.searchParams].map(([key, value]) => [key, Number(value)])
		);
		const line = catalogue.get('line.observe');
		const here = line && runCalculator(line, inputs);
		const there = evaluate(firstLight, {}, catalogue).steps.line;
		expect(here?.ok && here.outputs.observedFrequency?.value).toBe(
			there?.ok && there.outputs.observedFrequency?.value
		);
	});
});

test('a number tied to a setting is read off the setting', () => {
	const record = claimRecord(
		firstLight,
		claimOf(firstLight, 'rest-frequency'),
		'1420 megahertz',
		catalogue
	);
	expect(record?.reading).toMatchObject({ value: '1420.41', unit: 'MHz', uncertainty: 'exact' });
	expect(record?.strips).toEqual([]);
});

test('the sentence is cut where its claims stand, and reads whole', () => {
	const words = wordsAt(firstLight, evaluate(firstLight, {}, catalogue), catalogue);
	const parts = sentenceParts(firstLight, 'stretch', words);
	const read = (list: { text: string }[] | undefined) => list?.map(({ text }) => text).join('');
	expect(read(parts?.before)).toBe('Cold hydrogen gives off a faint radio wave at 1420 megahertz.');
	expect(read(parts?.sentence)).toMatch(/^Space has grown .* as long as it set out\.$/);
	expect(parts?.sentence.filter(({ claim }) => claim === 'stretch')).toEqual([
		{ text: 'about 21 times', claim: 'stretch' }
	]);
	expect(parts?.after).toEqual([]);
});

test('says where a claim stands', () => {
	expect(placeWords(firstLight, 'frequency')).toBe('“First light on the dial”, result sentence');
});
