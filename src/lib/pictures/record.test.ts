import { describe, expect, test } from 'vitest';
import { fileNamed, fileNameOf, pressAddress, sourcesOf, storeKey } from './address.ts';
import { findPictures } from './find.ts';
import { LICENCE_IDS, LICENCES } from './licences.ts';
import { placePicture } from './place.ts';
import {
	emptyRecord,
	PictureRecord,
	pictureReady,
	rightsDaysLeft,
	type PictureFinding
} from './record.ts';
import type { PictureFile, PictureView } from './view.ts';
import { readyWords, rightsWords, usedWords, useWords } from './words.ts';

const TODAY = '2026-12-08';
const whole: PictureRecord = {
	...emptyRecord(),
	creator: 'The graphics desk',
	credit: 'Varrowmere Institute',
	licence: 'CC-BY-4.0',
	source: 'Drawn for this piece',
	alt: 'A pendulum hangs still.',
	labels: ['diagram', 'not-to-scale'],
	people: 'none-shown'
};

describe('a record', () => {
	test('is complete when all of it is said', () => {
		expect(PictureRecord.parse(whole)).toEqual(whole);
		expect(pictureReady(whole, TODAY)).toEqual({ ready: true, findings: [] });
	});

	const MISSING: [over: Partial<PictureRecord>, fields: PictureFinding['field'][]][] = [
		[{ creator: '' }, ['creator']],
		[{ credit: '' }, ['credit']],
		[{ licence: '' }, ['licence']],
		[{ licence: 'written-permission' }, ['licenceNote']],
		[{ licence: 'written-permission', licenceNote: 'By letter, 3 May 2026, all uses.' }, []],
		[{ source: '' }, ['source']],
		[{ source: '', licence: 'own-work' }, []],
		[{ rightsEnd: '2026-12-07' }, ['rightsEnd']],
		[{ rightsEnd: '2026-12-08' }, []],
		[{ alt: '' }, ['alt']],
		[{ alt: '', decorative: 'A line between two parts.' }, []],
		[{ decorative: 'A line.' }, ['decorative']],
		[{ labels: [] }, ['labels']],
		[{ labels: ['photograph', 'artists-impression'] }, ['labels']],
		[{ labels: ['photograph', 'false-colour'] }, []],
		[{ people: '' }, ['people']],
		[{ people: 'consent-given' }, ['consentNote']],
		[{ people: 'consent-given', consentNote: 'Two pupils; letters in the office.' }, []]
	];
	test.each(MISSING)('%j lacks %j', (over, fields) => {
		const { ready, findings } = pictureReady({ ...whole, ...over }, TODAY);
		expect(findings.map(({ field }) => field)).toEqual(fields);
		expect(ready).toBe(fields.length === 0);
		for (const { says } of findings)
			expect(says).toMatch(/^[A-Z].+\. [A-Z].+\.$|^[A-Z].+[,;] .+\.$/);
	});

	test('can be kept empty, and no longer than a block can hold', () => {
		expect(PictureRecord.parse(emptyRecord())).toEqual(emptyRecord());
		expect(pictureReady(emptyRecord(), TODAY).findings).toHaveLength(7);
		expect(PictureRecord.safeParse({ ...whole, credit: 'x'.repeat(201) }).success).toBe(false);
		for (const day of ['2026-02-30', '8 Dec 2026', '2026-13-01', '2026-1-1'])
			expect(PictureRecord.safeParse({ ...whole, rightsEnd: day }).success, day).toBe(false);
	});

	test('every licence has a name, and a text where it is a public one', () => {
		for (const id of LICENCE_IDS) {
			const { name, address } = LICENCES[id];
			expect(name).not.toBe('');
			expect(address !== null).toBe(id.startsWith('CC'));
		}
	});
});

test('the end of the rights is told from two months before', () => {
	const at = (rightsEnd: string) => ({ ...whole, rightsEnd });
	expect(rightsDaysLeft(whole, TODAY)).toBeNull();
	expect(rightsWords(at('2027-03-01'), TODAY)).toBeNull();
	expect(rightsWords(at('2027-02-06'), TODAY)).toBe('The rights end in 60 days, on 2027-02-06.');
	expect(rightsWords(at('2026-12-09'), TODAY)).toBe('The rights end tomorrow.');
	expect(rightsWords(at('2026-12-08'), TODAY)).toBe('The rights end today.');
	expect(rightsWords(at('2026-12-01'), TODAY)).toBe('The rights ended on 2026-12-01.');
	expect(readyWords(at('2026-12-01'), TODAY).words).toBe('rights ended');
});

const file = (digit: string, width: number, type: PictureFile['type']): PictureFile => ({
	digest: digit.repeat(64),
	width,
	height: width / 2,
	type,
	bytes: 10
});
const files = [
	file('a', 640, 'image/webp'),
	file('b', 320, 'image/webp'),
	file('c', 640, 'image/jpeg')
];

test('a file’s name is its hash and its kind, and is read back', () => {
	const [first] = files;
	expect(storeKey(first!)).toBe(`pictures/${'a'.repeat(64)}.webp`);
	expect(pressAddress(first!)).toBe(`/press/${'a'.repeat(64)}.webp`);
	for (const each of files)
		expect(fileNamed(fileNameOf(each))).toEqual({ digest: each.digest, type: each.type });
	for (const name of ['', 'a.webp', `${'a'.repeat(64)}.svg`, `../${'a'.repeat(64)}.webp`])
		expect(fileNamed(name)).toBeNull();
	const { srcset, fallback } = sourcesOf(files, pressAddress);
	expect(srcset).toBe(`/press/${'b'.repeat(64)}.webp 320w, /press/${'a'.repeat(64)}.webp 640w`);
	expect(fallback).toBe(`/press/${'c'.repeat(64)}.jpg`);
});

describe('placed', () => {
	const place = (over: Partial<PictureRecord> = {}) =>
		placePicture({ id: 'p', files, record: { ...whole, ...over } }, 'At rest.');

	test('it is a copy of its record, in readers’ words', () => {
		expect(place()).toEqual({
			picture: 'p',
			files: files.map(({ bytes: _bytes, ...kept }) => kept),
			alt: 'Diagram, not to scale: A pendulum hangs still.',
			decorative: '',
			caption: 'At rest.',
			credit: 'Varrowmere Institute',
			licence: 'CC BY 4.0',
			labels: ['Diagram', 'Not to scale']
		});
	});

	test('a label that the words say already isn’t said twice', () => {
		const alt = "Artist's impression of the first stars.";
		expect(place({ alt, labels: ['artists-impression'] }).alt).toBe(alt);
		expect(place({ alt, labels: ['artists-impression', 'not-to-scale'] }).alt).toBe(
			`Not to scale: ${alt}`
		);
	});

	test('a decorative one stays silent', () => {
		expect(place({ alt: '', decorative: 'A line.' })).toMatchObject({
			alt: '',
			decorative: 'A line.'
		});
	});

	test('one that isn’t ready can’t be placed', () => {
		expect(() => place({ licence: '' })).toThrow('There is no licence.');
	});
});

test('pictures are found by any word that is known of them', () => {
	const view = { id: 'p', fileName: 'dial.png', files, record: whole, uses: [], addedBy: 'Tamsin' };
	const all = [view as unknown as PictureView];
	for (const wanted of ['', 'DIAL', 'pendulum varrowmere', 'not to scale', 'tamsin'])
		expect(findPictures(all, wanted), wanted).toHaveLength(1);
	expect(findPictures(all, 'pendulum moon')).toEqual([]);
});

test('where it stands is said in words', () => {
	const use = { slug: 'a', title: 'A', draft: true, proofs: [1, 3], releases: [1], live: true };
	expect(useWords(use)).toBe('draft; proofs 1, 3; release 1, live');
	expect(usedWords([])).toBe('not used');
	expect(usedWords([use])).toBe('in one piece, live');
	expect(usedWords([{ ...use, live: false }, use])).toBe('in 2 pieces, live');
});
