/** The check by keys: each press counts once what it acts on is there, and the cursor goes where one types next. */
import { PGlite } from '@electric-sql/pglite';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { DEMO_PASSPHRASE } from '../../src/lib/server/demo/people.ts';
import { actAs } from '../support/actors.ts';
import { launchChromium } from '../support/chromium.ts';
import { startHouse, type House } from '../support/server.ts';

const CHECK = '/pieces/first-light-on-the-dial/check?claim=rest-frequency';

let house: House;
let browser: Browser;
beforeAll(async () => {
	house = await startHouse();
	browser = await launchChromium();
});
afterAll(async () => {
	await browser?.close();
	await house?.close();
});

/** Opens the check and waits until its scripts are there: keys act once the page is awake. */
async function openCheck(page: Page): Promise<void> {
	await page.goto(`${house.origin}${CHECK}`);
	await page.waitForLoadState('networkidle');
}

async function atCheck(who: Parameters<typeof actAs>[2]): Promise<Page> {
	const { page } = await actAs(browser, house.origin, who);
	page.setDefaultTimeout(10_000);
	await openCheck(page);
	return page;
}

test('the first key after a query is settled signs', { timeout: 60_000 }, async () => {
	const checker = await atCheck('mateus');
	await checker.keyboard.press('2');
	await checker.getByLabel(/^Your query on 1a/).fill('Which line of hydrogen is this?');
	await checker.getByRole('button', { name: 'Send the query' }).click();
	await checker.getByText(/asks, proof 1/).waitFor();

	const writer = await atCheck('tamsin');
	await writer.getByLabel('Your answer').fill('The 21 centimetre line.');
	await writer.getByRole('button', { name: 'Answer', exact: true }).click();
	await writer.getByText('The 21 centimetre line.').waitFor();
	await writer.context().close();

	await openCheck(checker);
	await checker.getByRole('button', { name: 'Accept the answer' }).click();
	await checker.getByText(/^Settled,/).waitFor();
	await checker.keyboard.press('1');
	await checker.getByText('Signed 1a').waitFor();
	await checker.context().close();
});

test(
	'a sign-in that is old asks for the passphrase, with the cursor in it',
	{ timeout: 90_000 },
	async () => {
		const checker = await atCheck('anselm');
		await house.end('SIGTERM');
		const database = await PGlite.create(join(house.dataFolder, 'database'));
		await database.query(`UPDATE sessions SET fresh_at = fresh_at - interval '1 day'`);
		await database.close();
		await house.startAgain();

		await openCheck(checker);
		await checker.getByRole('button', { name: /^Sign 1/ }).waitFor();
		await checker.keyboard.press('1');
		const passphrase = checker.getByLabel('Your passphrase');
		await passphrase.waitFor();
		await expect
			.poll(() => passphrase.evaluate((field) => field === document.activeElement))
			.toBe(true);
		await checker.keyboard.type('not this one');
		await checker.keyboard.press('Enter');
		await expect.poll(() => passphrase.inputValue()).toBe('');
		await expect
			.poll(() => passphrase.evaluate((field) => field === document.activeElement))
			.toBe(true);
		await checker.keyboard.type(DEMO_PASSPHRASE);
		await checker.keyboard.press('Enter');
		await checker.getByText('Signed 1a').waitFor();
		await passphrase.waitFor({ state: 'detached' });
		// The next claim needs no passphrase any more.
		await checker.keyboard.press('j');
		await checker
			.getByRole('region', { name: 'The claim' })
			.getByText('1b', { exact: true })
			.waitFor();
		await checker.keyboard.press('1');
		await checker.getByText('Signed 1b').waitFor();
		await checker.context().close();
	}
);
