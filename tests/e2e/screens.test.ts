/** Every screen, wide and narrow, light and dark: axe finds nothing, nothing scrolls sideways, no fault is logged. */
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { catalogue } from '../../src/lib/physics/calculators/index.ts';
import { actAs, type Who } from '../support/actors.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import { startHouse, type House } from '../support/server.ts';

let house: House;
let browser: Browser;
beforeAll(async () => {
	house = await startHouse({ seed: 'demo' });
	browser = await launchChromium();
});
afterAll(async () => {
	await browser?.close();
	await house?.close();
});

const PIECE = '/pieces/same-drop-same-blow';
const SCREENS: { who: Who | null; path: string; status?: number }[] = [
	{ who: null, path: '/' },
	{ who: null, path: '/sign-in' },
	{ who: null, path: '/sign-in/link?token=nothing' },
	{ who: null, path: '/w/same-drop-same-blow' },
	{ who: null, path: '/w/same-drop-same-blow/latest' },
	{ who: null, path: '/w/first-light-on-the-dial/1' },
	{ who: null, path: '/w/no-such-piece/latest', status: 404 },
	{ who: 'tamsin', path: '/desk' },
	{ who: 'tamsin', path: `${PIECE}/manuscript` },
	{ who: 'tamsin', path: '/nowhere', status: 404 },
	{ who: 'tamsin', path: `${PIECE}/history` },
	{ who: 'tamsin', path: `${PIECE}/history?open=2` },
	{ who: 'mateus', path: `${PIECE}/history?from=1&to=2` },
	{ who: 'mateus', path: `${PIECE}/manuscript` },
	{ who: 'mateus', path: `${PIECE}/check` },
	{ who: 'perpetua', path: '/desk' },
	{ who: 'perpetua', path: `${PIECE}/release` },
	{ who: 'juno', path: '/desk' },
	{ who: 'tamsin', path: '/pictures' },
	{ who: 'ama', path: '/pictures' },
	{ who: 'ama', path: '/calculators' },
	{ who: 'ama', path: '/calculators/cosmo.at_z' },
	{ who: 'ama', path: '/calculators/energy.counterweight' }
];

const LOOKS: { name: string; options: BrowserContextOptions }[] = [
	{ name: 'wide and light', options: { viewport: { width: 1440, height: 900 } } },
	{
		name: 'narrow and dark',
		options: { viewport: { width: 390, height: 844 }, colorScheme: 'dark' }
	}
];

describe.each(LOOKS)('$name', ({ options }) => {
	const pages = new Map<Who | null, Page>();
	const faults: string[] = [];

	async function pageOf(who: Who | null): Promise<Page> {
		const known = pages.get(who);
		if (known) return known;
		const { page } =
			who === null
				? { page: await (await browser.newContext(options)).newPage() }
				: await actAs(browser, house.origin, who, options);
		page.on('pageerror', (error) => faults.push(error.message));
		pages.set(who, page);
		return page;
	}
	afterAll(async () => {
		for (const page of pages.values()) await page.context().close();
	});

	test.each(SCREENS)('$path for $who', { timeout: 60_000 }, async ({ who, path, status = 200 }) => {
		const page = await pageOf(who);
		const answer = await page.goto(house.origin + path);
		expect(answer?.status()).toBe(status);
		await page.waitForLoadState('networkidle');
		await expectNoAxeFindings(page);
		const overflow = await page.evaluate(
			() => document.documentElement.scrollWidth - document.documentElement.clientWidth
		);
		expect(overflow, 'pixels to scroll sideways').toBeLessThanOrEqual(0);
		expect(faults).toEqual([]);
	});
});

test('every published check agrees on its calculator’s page', { timeout: 180_000 }, async () => {
	const { page, context } = await actAs(browser, house.origin, 'ama');
	for (const { id, checks } of catalogue.values()) {
		if (checks.length === 0) continue;
		await page.goto(`${house.origin}/calculators/${id}`);
		const table = page.getByRole('region', { name: 'Check values' }).getByRole('table');
		const rows = table.getByRole('row');
		expect(await rows.count(), id).toBe(checks.length + 1);
		for (const check of checks) expect(await table.innerText()).toContain(check.source);
		expect(await table.getByText('agrees', { exact: true }).count(), id).toBe(checks.length);
	}
	await context.close();
});
