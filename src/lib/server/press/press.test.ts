import { createHash } from 'node:crypto';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { catalogue } from '../../physics/calculators/index.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { evaluate } from '../../widget/evaluate.ts';
import { freeze } from '../../widget/freeze.ts';
import { firstLight } from '../demo/first-light.ts';
import type { PressManifest } from './manifest.ts';
import { escapeText } from './page.ts';
import { makeBundle, type Bundle } from './press.ts';
import { recordsOf } from './records.ts';

let pressFolder: string;

/** Stands for the frame's build: what matters here is that each file is found and carried along. */
const MANIFEST: PressManifest = {
	frame: { file: 'frame-aaaa.js', imports: ['shared-bbbb.js'] },
	later: ['record-cccc.js'],
	style: 'style-dddd.css',
	fonts: ['literata-eeee.woff2', 'signs-ffff.woff2'],
	copyFace: 'literata-eeee.woff2',
	calculators: {
		'cosmo.inverse': { file: 'inverse-1111.js', imports: ['limits-2222.js'] },
		'line.observe': { file: 'observe-3333.js', imports: [] }
	}
};

beforeAll(async () => {
	pressFolder = await mkdtemp(join(tmpdir(), 'steelyard-press-'));
	await writeFile(join(pressFolder, 'manifest.json'), JSON.stringify(MANIFEST));
	const { frame, later, fonts, style, calculators } = MANIFEST;
	const names = [
		frame.file,
		...frame.imports,
		...later,
		...fonts,
		...Object.values(calculators).flatMap(({ file, imports }) => [file, ...imports])
	];
	for (const name of names) await writeFile(join(pressFolder, name), `bytes of ${name}`);
	await writeFile(join(pressFolder, style), '.sy-frame{color:red}');
});

afterAll(() => rm(pressFolder, { recursive: true }));

function print(document: WidgetDocument): Promise<Bundle> {
	const signedAt = new Date('2026-12-12T09:00:00Z');
	return makeBundle({
		frozen: freeze(document, catalogue),
		calculators: catalogue,
		houseCalculators: [],
		slug: 'first-light',
		releaseNumber: 3,
		releasedAt: new Date('2026-12-15T23:30:00Z'),
		house: 'Varrowmere Institute, Public Desk',
		makers: {
			writers: ['Tamsin Orrelby'],
			checkers: ['Dr Mateus Quevarro'],
			editor: 'Perpetua Lindqvane'
		},
		records: recordsOf(document, catalogue, [
			{ claim: 'frequency', name: 'Dr Mateus Quevarro', signedAt }
		]),
		pressFolder
	});
}

const page = ({ files, manifest }: Bundle) =>
	Buffer.from(files.find(({ key }) => key === manifest.page)?.bytes ?? []).toString('utf8');

/** What is read with no script: text without tags, and no element's content that isn't shown. */
const readable = (html: string) =>
	html
		.replace(/<(script|style|title)[^>]*>.*?<\/\1>/gs, '')
		.replace(/<[^>]*>/g, '')
		.replace(/[\u00a0\u2060]/g, (character) => (character === '\u2060' ? '' : ' '));

test('without script the document states the first reading in full', async () => {
	const words = readable(page(await print(firstLight)));
	expect(words).toContain('First light on the dial');
	expect(words).toContain(
		'A wave that left 180 million years after the Big Bang arrives today at about 68 megahertz, each crest 4.4 metres from the next.'
	);
	expect(words).toContain('release 3, 15 December 2026');
	expect(words).toContain('What this can’t tell you: how bright the first stars were.');
});

test('it loads nothing but its own files, and the policy’s hash is that of its style', async () => {
	const bundle = await print(firstLight);
	const html = page(bundle);
	const asked = [...html.matchAll(/(?:src|href)="(?!#)([^"]+)"/g)].map(([, address]) => address);
	const links = asked.filter((address) => !address?.startsWith('/press/'));
	expect(links).toEqual(['/w/first-light', '/w/first-light']); // which copy of it counts, and the foot line's
	const carried = bundle.files.map(({ key }) => `/${key}`);
	for (const address of asked.filter((address) => address?.startsWith('/press/')))
		expect(carried).toContain(address);

	const style = /<style>(.*?)<\/style>/s.exec(html)?.[1] ?? '';
	expect(bundle.manifest.styles).toEqual([
		`sha256-${createHash('sha256').update(style).digest('base64')}`
	]);
	expect(html).not.toMatch(/\sstyle="/); // the policy would refuse them
});

test('only the piece’s calculators are carried, with all that may be asked for later', async () => {
	const { files } = await print(firstLight);
	const names = files.flatMap(({ key }) =>
		key.startsWith('press/') ? [key.slice('press/'.length)] : []
	);
	expect(names.sort()).toEqual([
		'frame-aaaa.js',
		'inverse-1111.js',
		'limits-2222.js',
		'literata-eeee.woff2',
		'observe-3333.js',
		'record-cccc.js',
		'shared-bbbb.js',
		'signs-ffff.woff2'
	]);
});

test('every file is what its hash says, and the same release prints the same bytes', async () => {
	const [first, again] = [await print(firstLight), await print(firstLight)];
	for (const { sha256, bytes } of first.files) {
		expect(createHash('sha256').update(bytes).digest('hex')).toBe(sha256);
	}
	expect(again.manifest).toEqual(first.manifest);
	expect(first.manifest.page).toBe(`frames/${first.digest}.html`);
});

test('copy can’t break out of the document', async () => {
	const hostile = '</script><svg onload=alert(1)>\u2028"\'&<!--';
	const html = page(await print({ ...firstLight, title: hostile.slice(0, 60), point: hostile }));
	expect(html).not.toContain('<svg onload');
	expect(html.match(/<\/script>/g)).toHaveLength(2);
	const inlined =
		/<script type="application\/json" id="release">(.*?)<\/script>/s.exec(html)?.[1] ?? '';
	expect(JSON.parse(inlined).release.document.point).toBe(hostile);
	expect(inlined).not.toMatch(/[<>&\u2028\u2029]/);
});

test('a reading that is refused says why where its number would stand', async () => {
	const [age, line] = firstLight.steps;
	if (!age || !line) throw new Error('The sample has two steps.');
	const early = {
		...age,
		settings: { ...age.settings, value: { from: 'fixed' as const, value: -1 } }
	};
	const document = { ...firstLight, steps: [early, line] };
	const outcome = evaluate(document, {}, catalogue).steps.line;
	if (!outcome || outcome.ok) throw new Error('An age before the Big Bang should be refused.');
	const words = readable(page(await print(document)));
	expect(words).toContain(`arrives today at ${escapeText(outcome.refusal.message)}, each crest`);
	expect(words).toContain('There is nothing to draw at these settings.');
	expect(words).not.toMatch(/NaN|Infinity|undefined|null/);
});

test('a piece whose calculator isn’t in the build is not printed', async () => {
	const document: WidgetDocument = {
		...firstLight,
		steps: [
			...firstLight.steps,
			{
				id: 'drop',
				calculator: 'energy.drop',
				revision: '1.0.0',
				settings: { height_m: { from: 'fixed', value: 1 } }
			}
		]
	};
	await expect(print(document)).rejects.toThrow('npm run build');
});

test('a folder without a build says how to make one', async () => {
	const empty = { ...freeze(firstLight, catalogue) };
	await expect(
		makeBundle({
			frozen: empty,
			calculators: catalogue,
			houseCalculators: [],
			slug: 'a',
			releaseNumber: 1,
			releasedAt: new Date(0),
			house: '',
			makers: { writers: [], checkers: [], editor: '' },
			records: {},
			pressFolder: tmpdir()
		})
	).rejects.toThrow('npm run build');
});
