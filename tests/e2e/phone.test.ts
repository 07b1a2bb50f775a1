/** The office on a phone: what is said at the width of a hand is said once, and nothing that matters is left out. */
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { actAs } from '../support/actors.ts';
import { launchChromium } from '../support/chromium.ts';
import { startHouse, type House } from '../support/server.ts';

const PHONE = { viewport: { width: 390, height: 844 }, hasTouch: true };

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

test('the manuscript says how a piece stands once, and what its limits open with', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin', PHONE);
	await page.goto(`${house.origin}/pieces/first-light-on-the-dial/manuscript`);
	const header = page.getByRole('banner');
	await expect.poll(async () => (await header.textContent())?.match(/at rest/g)).toHaveLength(1);
	const limits = page.getByRole('textbox', { name: 'Manuscript' }).locator('[data-kind="limits"]');
	const opening = await limits
		.first()
		.evaluate((block) => getComputedStyle(block, '::before').content);
	expect(opening).toContain('What this can’t tell you:');
	await context.close();
});
