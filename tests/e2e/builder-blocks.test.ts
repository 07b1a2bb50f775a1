/**
 * The manuscript with the keyboard alone: from an empty sheet to a proof of four hundred words with three controls, two
 * charts, two chained calculators, a picture and twelve claims. Nothing here clicks, and nothing fills a field but keys.
 */
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { PictureView } from '../../src/lib/pictures/view.ts';
import type { WidgetDocument } from '../../src/lib/widget/document.ts';
import { actAs } from '../support/actors.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import { jpeg } from '../support/pictures.ts';
import { startHouse, type House } from '../support/server.ts';

const SLUG = 'one-note-from-the-dark';
/** A loaded machine lays out a full sheet slowly. */
const SOON = { timeout: 20_000 };

let house: House;
let browser: Browser;
let page: Page;
beforeAll(async () => {
	house = await startHouse({ seed: 'people' });
	browser = await launchChromium();
	({ page } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 1440, height: 900 }
	}));
	page.setDefaultTimeout(20_000);
	watchKeeping();
	await readyPicture();
});
afterAll(async () => {
	await browser?.close();
	await house?.close();
});

/** The picture desk has its own tests; here a picture with a whole record is there already. */
async function readyPicture(): Promise<void> {
	const headers = { origin: house.origin };
	const sent = await page.request.post(`${house.origin}/api/pictures?name=dipole.jpg`, {
		headers: { ...headers, 'content-type': 'application/octet-stream' },
		data: Buffer.from(await jpeg())
	});
	const { picture } = (await sent.json()) as { picture: PictureView };
	const answer = await page.request.put(`${house.origin}/api/pictures/${picture.id}`, {
		headers,
		data: {
			baseVersion: picture.version,
			record: {
				...picture.record,
				creator: 'Public Desk',
				credit: 'Public Desk',
				licence: 'own-work',
				alt: 'A wire antenna on a plain, drawn from the side.',
				labels: ['not-to-scale'],
				people: 'none-shown'
			}
		}
	});
	expect(answer.status(), await answer.text()).toBe(200);
}

const press = (key: string) => page.keyboard.press(key);
const type = (text: string) => page.keyboard.type(text);

/** What the focus is on, as it is named: its label, or its words. */
const focused = () =>
	page.evaluate(() => {
		const element = document.activeElement as HTMLElement & { labels?: NodeListOf<HTMLElement> };
		const label = [...(element.labels ?? [])].map(({ innerText }) => innerText).join(' ');
		const name = element.getAttribute('aria-label') ?? (label || element.innerText);
		return name.replace(/\s+/g, ' ').trim();
	});

/** Walks by Tab until the focus is on what is named so. */
async function reach(name: RegExp, key: 'Tab' | 'Shift+Tab' = 'Tab'): Promise<void> {
	const passed: string[] = [];
	for (let step = 0; step < 120; step += 1) {
		const here = await focused();
		if (name.test(here)) return;
		passed.push(here.slice(0, 40));
		await press(key);
	}
	throw new Error(`Tab never came to ${name}; it passed ${passed.join(' | ')}`);
}

async function write(name: RegExp, text: string): Promise<void> {
	await reach(name);
	await press('Control+a');
	await type(text);
}

/** Into the last line of the copy. */
async function toTheEnd(): Promise<void> {
	await reach(/^Manuscript$/, 'Shift+Tab');
	await press('Control+End');
}

/** On an empty line at the end. */
async function insert(word: string): Promise<void> {
	await type(`/${word}`);
	await press('Enter');
}

async function addCalculator(question: string): Promise<void> {
	await expect.poll(focused, SOON).toBe('Find a calculator');
	await type(question);
	await press('Enter');
	await expect.poll(focused, SOON).toMatch(/^Add a calculator/);
}

/** Ties the next number that isn't weighed: printed live where a reading fits it, no claim where the words say so. */
async function tieNext(noClaim: RegExp): Promise<void> {
	await press('Control+.');
	await press('=');
	const list = page.getByRole('listbox', { name: 'Tie to a reading' });
	await list.waitFor();
	const heading = await list.locator('..').innerText();
	const options = await list.getByRole('option').allInnerTexts();
	const live = options.findIndex((option) => option.startsWith('Print it live here'));
	const exempt = options.findIndex((option) => option.startsWith('Not a claim'));
	const isClaim = live >= 0 && !noClaim.test(heading);
	for (let step = 0; step < (isClaim ? live : exempt); step += 1) await press('ArrowDown');
	await press('Enter');
	if (!isClaim) {
		await expect.poll(focused, SOON).toMatch(/^Why is it not a claim/);
		await type('a way of speaking');
		await press('Enter');
	}
	await list.waitFor({ state: 'detached' });
}

/** The newest draft that the server has kept. */
let kept: WidgetDocument | null = null;

function watchKeeping(): void {
	page.on('response', (response) => {
		const request = response.request();
		if (request.method() !== 'PUT' || !request.url().endsWith('/draft') || !response.ok()) return;
		kept = (request.postDataJSON() as { document: WidgetDocument }).document;
	});
}

async function draft(): Promise<WidgetDocument> {
	await expect
		.poll(() => page.getByRole('status', { name: 'Keeping' }).innerText(), SOON)
		.toMatch(/^kept/);
	if (!kept) throw new Error('the server has kept nothing yet');
	return kept;
}

async function standing(kind: string): Promise<number> {
	return (await draft()).blocks.filter((block) => block.kind === kind).length;
}

const COPY = [
	'Cold hydrogen gives off a faint radio wave. It does so rarely: one atom waits for millions of years before it sends a single wave, and only because there is so much of it between the stars do we hear anything. Every such wave leaves with the same frequency, which is why a receiver can be set to wait for it.',
	'On its way the wave is stretched, since space itself grows while it travels. A wave that set out early has been stretched more than one that set out late. Whoever knows the frequency it left with, and reads the frequency it arrives with, knows by how much space has grown meanwhile, and so how long ago it left.',
	'The first stars lit up in a gas that was cold and dark. They warmed it, and later they tore its atoms apart. Both left a mark in the radio waves of the gas, a dip where it swallowed more than it gave. To find that dip is hard, because our own sky is louder by far, and because people on the ground speak on the very frequencies at which it would arrive.',
	'So the listeners go where nobody speaks: to deserts, to islands, and one day perhaps to the far side of the Moon. Their antennas are simple, often no more than a sheet of metal on a table. What is not simple is to know such an antenna so well that its own voice can be taken away from what it hears, and nothing else with it.',
	'What they have found so far is little, and each of the small findings is argued over. That is as it should be. A dip of this kind is smaller than the error that a careless hand makes when it screws a plug together, and whoever claims to have seen it must show that no plug has done it. The rest of us can wait. The wave has come a long way, and it will go on coming for as long as anybody cares to listen, whether or not the first stars are in it.'
];

describe('a piece by keyboard alone', { timeout: 300_000 }, () => {
	test('an empty sheet gets its words', async () => {
		await page.waitForLoadState('networkidle');
		await press('n');
		await expect.poll(focused, SOON).toMatch(/^Title/);
		await type('One note from the dark');
		await press('Enter');
		await page.waitForURL(`**/pieces/${SLUG}/manuscript`);
		await expect.poll(focused, SOON).toBe('Manuscript');
		await type('The growth of space lowers the note of hydrogen, so it tells us when it left.');
		for (const paragraph of COPY) {
			await press('Enter');
			await type(paragraph);
		}
		await press('Enter');
	});

	test('two calculators are hung up and chained', async () => {
		await insert('control');
		await addCalculator('age to redshift');
		await press('Enter');
		await addCalculator('redshifted line');
		await reach(/^Choose a line/);
		await press('Enter');
		await type('21 cm');
		await press('Enter');
		// The letter of a reading, typed into the setting, ties it.
		await write(/^Redshift$/, 'A');
		await press('Enter');
		await expect.poll(async () => (await draft()).steps.length, SOON).toBe(2);
		const chained = (await draft()).steps.flatMap(({ settings }) =>
			Object.values(settings).filter(({ from }) => from === 'reading')
		);
		expect(chained).toHaveLength(1);
	});

	test('three controls of three kinds come from their settings', async () => {
		await toTheEnd();
		await insert('new control: age');
		await reach(/^Kind/);
		await write(/^What it moves/, 'The wave left at this age');
		await reach(/^Unit/);
		await type('million years');
		await write(/^From/, '100');
		await write(/^To/, '500');
		await write(/^Step/, '10');
		await write(/^Starts at/, '180');
		await press('Enter');
		await expect.poll(focused, SOON).toBe('Manuscript');

		await insert('new control: expanding');
		await reach(/^Kind/);
		// A number in a label can't be tied to a reading.
		await write(/^Name of option 4/, 'WMAP');
		await reach(/^Make the control/);
		await press('Enter');
		await expect.poll(focused, SOON).toBe('Manuscript');

		await reach(/^Add a calculator/);
		await press('Enter');
		await addCalculator('diffraction');
		await toTheEnd();
		await insert('new control');
		await reach(/^Kind/);
		await type('number field');
		await reach(/^Make the control/);
		await press('Enter');
		await expect.poll(focused, SOON).toBe('Manuscript');
		await expect
			.poll(async () => (await draft()).controls.map(({ kind }) => kind).sort(), SOON)
			.toEqual(['choice', 'number', 'slider']);
		expect(await standing('control')).toBe(3);
	});

	test('twelve numbers are tied, printed live or named as no claim', async () => {
		await insert('result');
		await type(
			'Such a wave arrives at about 68 megahertz, each crest 4.4 metres from the next, stretched 21 times, at a redshift of 19.9. '
		);
		await type(
			'That is 0.068 gigahertz or 68 million hertz, and its crests lie 440 centimetres or 4400 millimetres apart; '
		);
		await type('it has grown 21 times as long, or roughly 20.8 times. ');
		await type(
			'A receiver waits at 68.1 megahertz, then at 0.0682 gigahertz, since the crests came 20.9 times as far apart, not 20.7 times. '
		);
		await type('The wave itself has 3 names.');
		const numbers = page.locator('.copy .number-unweighed');
		await expect.poll(() => numbers.count(), SOON).toBeGreaterThan(9);
		await press('Control+Home');
		for (let each = 0; (await numbers.count()) > 0 && each < 20; each += 1) {
			await tieNext(/Tie\s+(3|millions of years|one day)\s/);
		}
		await expect.poll(async () => (await draft()).claims.length, SOON).toBeGreaterThanOrEqual(12);
	});

	test('two charts are put in', async () => {
		await toTheEnd();
		await press('Enter');
		for (const title of ['Where the wave arrives', 'How sharp the antenna sees']) {
			await insert('chart: line');
			await write(/^Title/, title);
			await write(/^Source/, 'Planck Collaboration 2018 VI');
			await write(/^Description/, 'A line from the lower left to the right edge, without a bend.');
			await reach(/^Put the chart in/);
			await press('Enter');
			await expect.poll(focused, SOON).toBe('Manuscript');
		}
		await expect.poll(() => standing('chart'), SOON).toBe(2);
	});

	test('a picture is placed with its caption', async () => {
		await insert('picture');
		await reach(/^dipole/);
		await press('Enter');
		await reach(/^Place it in the copy/);
		await press('Enter');
		await write(/^Caption/, 'A simple antenna hears the whole sky at once.');
		await reach(/^Put the picture in/);
		await press('Enter');
		await expect.poll(focused, SOON).toBe('Manuscript');
		await expect
			.poll(async () => (await draft()).blocks.find(({ kind }) => kind === 'picture'), SOON)
			.toMatchObject({ caption: 'A simple antenna hears the whole sky at once.' });
	});

	test('a block moves by key, and undo brings it back', async () => {
		const order = async () => (await draft()).blocks.map(({ id }) => id);
		await press('Control+Home');
		await press('ArrowDown');
		await press('ArrowDown');
		const before = await order();
		await press('Alt+ArrowDown');
		await expect.poll(order, SOON).not.toEqual(before);
		await press('Control+z');
		await expect.poll(order, SOON).toEqual(before);
	});

	test('axe finds nothing, and the proof is pulled', async () => {
		await expectNoAxeFindings(page);
		await reach(/^Pull proof/);
		await press('Enter');
		await page.waitForURL(`**/pieces/${SLUG}/check`).catch(async () => {
			throw new Error(await page.locator('.bench-and-foot').innerText());
		});
	});
});
