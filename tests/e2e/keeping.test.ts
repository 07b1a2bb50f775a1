/** Nothing typed is lost: the server is killed in mid-sentence, and the words are there when it is back. */
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { actAs } from '../support/actors.ts';
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

async function newPiece(title: string): Promise<Page> {
	const { page } = await actAs(browser, house.origin, 'tamsin');
	page.setDefaultTimeout(15_000);
	await page.getByRole('button', { name: 'New slip' }).click();
	await page.getByLabel('Title').fill(title);
	await page.keyboard.press('Enter');
	await page.waitForURL('**/manuscript');
	await manuscript(page).click();
	await page.keyboard.press('Control+End');
	return page;
}

const kept = (page: Page) => page.getByRole('status', { name: 'Keeping' });

test('the server is killed while one types, and is back', { timeout: 120_000 }, async () => {
	const page = await newPiece('Killed in mid sentence');
	await page.keyboard.type('These words are kept. ');
	await expect.poll(() => kept(page).innerText()).toMatch(/^kept/);
	await page.keyboard.type('These are being typed ', { delay: 10 });
	await house.end('SIGKILL');
	await page.keyboard.type('while the server is gone.', { delay: 10 });
	await expect.poll(() => kept(page).innerText()).not.toMatch(/^kept/);

	await house.startAgain();
	await expect.poll(() => kept(page).innerText(), { timeout: 40_000 }).toMatch(/^kept/);
	await page.reload();
	expect(await manuscript(page).innerText()).toContain(
		'These words are kept. These are being typed while the server is gone.'
	);
	await page.context().close();
});

test(
	'the server and the tab are both gone; the browser has the words',
	{ timeout: 120_000 },
	async () => {
		const page = await newPiece('Tab and server gone');
		await page.keyboard.type('Kept first. ');
		await expect.poll(() => kept(page).innerText()).toMatch(/^kept/);
		const address = page.url();
		await house.end('SIGKILL');
		await page.keyboard.type('Typed with nobody listening.', { delay: 10 });
		// The promise: nothing older than the last second is gone.
		await page.waitForTimeout(1000);
		await page.close({ runBeforeUnload: false });

		await house.startAgain();
		const again = await browser.contexts().at(-1)?.newPage();
		if (!again) throw new Error('the browser has no window left');
		await again.goto(address);
		await expect
			.poll(() => manuscript(again).innerText())
			.toContain('Kept first. Typed with nobody listening.');
		await again.getByText(/hadn.t kept yet are back/).waitFor();
		await expect.poll(() => kept(again).innerText()).toMatch(/^kept/);
		await again.context().close();
	}
);

test('two people at one piece: neither loses words', { timeout: 60_000 }, async () => {
	const page = await newPiece('Two at once');
	await page.keyboard.type('Mine. ');
	await expect.poll(() => kept(page).innerText()).toMatch(/^kept/);
	const other = await page.context().newPage();
	await other.goto(page.url());
	await manuscript(other).click();
	await other.keyboard.press('Control+End');
	await other.keyboard.type('Theirs. ');
	await expect.poll(() => kept(other).innerText()).toMatch(/^kept/);

	await page.bringToFront();
	await page.keyboard.type('Mine again. ');
	await page.getByRole('button', { name: 'Keep mine' }).click();
	await expect.poll(() => kept(page).innerText()).toMatch(/^kept/);
	expect(await manuscript(page).innerText()).toContain('Mine. Mine again.');
	await page.context().close();
});
