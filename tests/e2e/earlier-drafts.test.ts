/** A piece from its slip on: what it starts from, its earlier drafts, the spike. By keyboard, on a phone, light and dark. */
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { actAs } from '../support/actors.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import { startHouse, type House } from '../support/server.ts';

let house: House;
let browser: Browser;
beforeAll(async () => {
	house = await startHouse({ seed: 'people' });
	browser = await launchChromium();
});
afterAll(async () => {
	await browser?.close();
	await house?.close();
});

const manuscript = (page: Page) => page.getByRole('textbox', { name: 'Manuscript' });
const kept = (page: Page) => page.getByRole('status', { name: 'Keeping' });
const isKept = (page: Page) => kept(page).getByText(/^kept/).waitFor({ timeout: 20_000 });
const PHONE: BrowserContextOptions = { viewport: { width: 390, height: 844 }, colorScheme: 'dark' };

async function atTheDesk(options: BrowserContextOptions = {}): Promise<Page> {
	const { page } = await actAs(browser, house.origin, 'tamsin', options);
	page.setDefaultTimeout(15_000);
	// Letter keys are heard once the page is awake.
	await page.waitForLoadState('networkidle');
	return page;
}

async function noSideways(page: Page): Promise<void> {
	const overflow = await page.evaluate(
		() => document.documentElement.scrollWidth - document.documentElement.clientWidth
	);
	expect(overflow, 'pixels to scroll sideways').toBeLessThanOrEqual(0);
}

test('the desk is empty, and says how to begin', async () => {
	const page = await atTheDesk();
	await page.getByText('The desk is empty. A slip with a title is enough').waitFor();
	await page.getByText('Nothing is waiting for you.').waitFor();
	await page.context().close();
});

describe('a slip', () => {
	test('is filled in on one screen, by keyboard, and stands at the piece for good', async () => {
		const page = await atTheDesk();
		await page.keyboard.press('n');
		await page.getByLabel('Title').and(page.locator(':focus')).waitFor();
		await page.keyboard.type('A slip with everything');
		const fill = async (label: RegExp, value: string) => page.getByLabel(label).fill(value);
		await fill(/^Point/, 'One thing, said in one sentence.');
		await fill(/^Reader/, 'Children of ten');
		await fill(/^Length/, '400');
		await fill(/^Partner/, 'A museum');
		await fill(/^Due/, '2026-12-17T15:00');
		await fill(/by the clocks of/, 'Europe/Berlin');
		await fill(/^Embargo/, 'Not before the paper is out');
		await expectNoAxeFindings(page);
		await page.keyboard.press('Enter');
		await page.waitForURL('**/pieces/a-slip-with-everything/manuscript');
		expect(await manuscript(page).innerText()).toContain('One thing, said in one sentence.');
		await page.context().close();
	});

	test('with a wrong field stays open and says the mend', async () => {
		const page = await atTheDesk();
		await page.keyboard.press('n');
		await page.getByLabel('Title').and(page.locator(':focus')).waitFor();
		await page.keyboard.type('A wrong length');
		await page.getByLabel(/^Length/).fill('much');
		await page.keyboard.press('Enter');
		await page.getByText('Give the length as a number of words, such as 400.').waitFor();
		await page.getByLabel(/^Length/).fill('300');
		await page.keyboard.press('Enter');
		await page.waitForURL('**/manuscript');
		await page.context().close();
	});

	test('can start from an outline, whose numbers are level', async () => {
		const page = await atTheDesk();
		await page.getByRole('button', { name: 'New slip' }).click();
		await page.getByLabel('Title').fill('My own throw');
		await page.getByLabel('Start from').selectOption('outline:throw-and-range');
		await page.getByText('How far a throw goes, by its angle.').waitFor();
		await page.getByRole('button', { name: 'Start writing' }).click();
		await page.waitForURL('**/my-own-throw/manuscript');
		await expect.poll(() => manuscript(page).innerText()).toContain('20 metres a second');
		await page.getByText('1 calculator; 3 level', { exact: true }).waitFor();
		await page.context().close();
	});

	test('can start from a piece that is there', async () => {
		const page = await atTheDesk();
		await page.getByRole('button', { name: 'More for my-own-throw' }).click();
		await page.getByRole('button', { name: 'Duplicate' }).click();
		expect(await page.getByLabel('Title').inputValue()).toBe('Copy of My own throw');
		await page.getByLabel('Title').fill('A second throw');
		await page.keyboard.press('Enter');
		await page.waitForURL('**/a-second-throw/manuscript');
		await expect.poll(() => manuscript(page).innerText()).toContain('20 metres a second');
		await page.context().close();
	});
});

test('a piece is spiked, and is back at one press', async () => {
	const page = await atTheDesk();
	await page.getByRole('button', { name: 'More for a-wrong-length' }).click();
	await page.getByRole('button', { name: 'Spike' }).click();
	await page.getByText('“a-wrong-length” is on the spike').waitFor();
	expect(await page.getByRole('rowheader', { name: /a-wrong-length/ }).count()).toBe(0);
	await page.getByText('On the spike: 1 piece').click();
	await expectNoAxeFindings(page);
	await page.getByRole('button', { name: 'Take it off the spike: a-wrong-length' }).click();
	await page.getByRole('rowheader', { name: /a-wrong-length/ }).waitFor();
	await page.context().close();
});

describe('earlier drafts', () => {
	const HISTORY = '/pieces/my-own-throw/history';

	beforeAll(async () => {
		const page = await atTheDesk();
		await page.goto(`${house.origin}/pieces/my-own-throw/manuscript`);
		await manuscript(page).click();
		await page.keyboard.press('Control+End');
		await page.keyboard.type(' These words come and go.');
		await isKept(page);
		await page.goto(house.origin + HISTORY);
		await page
			.getByRole('link', { name: /^Draft \d+,/ })
			.first()
			.click();
		await page.getByLabel(/^Name/).fill('before the cut');
		await page.getByRole('button', { name: 'Name it' }).click();
		await page.getByText('“before the cut”').waitFor();
		await page.goto(`${house.origin}/pieces/my-own-throw/manuscript`);
		await manuscript(page).click();
		await page.keyboard.press('Control+End');
		for (let letter = 0; letter < ' These words come and go.'.length; letter += 1)
			await page.keyboard.press('Backspace');
		await page.keyboard.type(' Only these stay.');
		await isKept(page);
		await page.context().close();
	}, 60_000);

	test('are laid side by side, word by word, by keyboard alone', async () => {
		const page = await atTheDesk();
		await page.goto(house.origin + HISTORY);
		const drafts = page.getByRole('form', { name: 'Drafts' });
		await drafts.getByRole('radio').first().focus();
		await page.keyboard.press('Enter');
		await page.waitForURL(/to=\d+&from=\d+/);
		const side = page.getByRole('region', { name: 'The draft' });
		expect(await side.locator('del').allInnerTexts()).toContainEqual(
			expect.stringContaining('come and go')
		);
		expect(await side.locator('ins').allInnerTexts()).toContainEqual(
			expect.stringContaining('Only')
		);
		await expectNoAxeFindings(page);
		await page.context().close();
	});

	test('are opened within two seconds, are read-only, and come back with a way to take it back', async () => {
		const page = await atTheDesk();
		await page.goto(house.origin + HISTORY);
		const named = page.getByRole('row', { name: /before the cut/ });
		const start = performance.now();
		await named.getByRole('link').click();
		await page.getByRole('heading', { name: /^Draft \d+$/ }).waitFor();
		await page.getByText('These words come and go.').waitFor();
		expect(performance.now() - start).toBeLessThan(2_000);
		await page.getByRole('button', { name: 'Bring it back' }).click();
		await page.getByText(/stands in the manuscript again/).waitFor();
		await page.goto(`${house.origin}/pieces/my-own-throw/manuscript`);
		await expect.poll(() => manuscript(page).innerText()).toContain('These words come and go.');
		await page.goBack();
		await page.getByRole('button', { name: 'Take that back' }).click();
		await page.getByText(/stands in the manuscript again/).waitFor();
		await page.goto(`${house.origin}/pieces/my-own-throw/manuscript`);
		await expect.poll(() => manuscript(page).innerText()).toContain('Only these stay.');
		await page.context().close();
	});

	test('a turned peg and a moved slider show as plainly as words', async () => {
		const page = await atTheDesk();
		// The second throw starts as the outline; its slider and its speed are changed over the API, as autosave does.
		const changed = await page.evaluate(async () => {
			const address = '/api/pieces/a-second-throw/draft';
			const send = async (baseVersion: number, document: unknown) =>
				fetch(address, {
					method: 'PUT',
					headers: { 'content-type': 'application/json' },
					body: JSON.stringify({ baseVersion, document })
				});
			const stale = await send(999, { ...(await blank()), title: 'x' });
			const { version, document } = (await stale.json()).error.details;
			document.steps[0].settings.v0_ms.value = 25;
			document.controls[0].max = 80;
			document.blocks.find((block: { kind: string }) => block.kind === 'chart').y.from = 'data';
			return (await send(version, document)).status;

			async function blank() {
				return {
					version: 2,
					language: 'en',
					constants: '2026.1',
					title: '',
					point: '',
					formulas: [],
					steps: [],
					controls: [],
					blocks: [],
					claims: []
				};
			}
		});
		expect(changed).toBe(200);
		await page.goto(`${house.origin}/pieces/a-second-throw/history`);
		await page.getByRole('button', { name: 'Lay side by side' }).click();
		const side = page.getByRole('region', { name: 'The draft' });
		await expect.poll(() => side.innerText()).toContain('On the bench');
		const words = (await side.innerText()).replace(/\s+/g, ' ');
		expect(words).toMatch(/Speed at release: was 20 m\/s → is 25 m\/s/);
		expect(words).toMatch(/highest: was 85 deg → is 80 deg/);
		expect(words).toMatch(/upright axis from: was 0 → is the lowest point/);
		await page.context().close();
	});

	test.each([
		['wide and light', { viewport: { width: 1440, height: 900 } }],
		['on a phone, dark', PHONE]
	] satisfies [string, BrowserContextOptions][])('%s: nothing to find', async (_, options) => {
		const page = await atTheDesk(options);
		for (const query of ['', '?open=2', '?from=1&to=2', '?open=999']) {
			const answer = await page.goto(house.origin + HISTORY + query);
			if (query === '?open=999') {
				expect(answer?.status()).toBe(404);
				continue;
			}
			await page.waitForLoadState('networkidle');
			await expectNoAxeFindings(page);
			await noSideways(page);
		}
		await page.goto(`${house.origin}/desk`);
		await page.getByRole('button', { name: 'New slip' }).click();
		await expectNoAxeFindings(page);
		await noSideways(page);
		await page.context().close();
	});

	test('a scientist reads them and can neither name nor bring back', async () => {
		const { page } = await actAs(browser, house.origin, 'ama');
		await page.goto(`${house.origin}${HISTORY}?open=2`);
		await page.getByRole('heading', { name: 'Draft 2' }).waitFor();
		expect(await page.getByRole('button', { name: /Name it|Bring it back/ }).count()).toBe(0);
		await page.context().close();
	});
});
