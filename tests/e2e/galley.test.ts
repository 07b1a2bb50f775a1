/** The galley in a real browser: strips of real frames that move together, and faults that are there to be found. */
import type { Browser, Frame, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type { WidgetDocument } from '../../src/lib/widget/document.ts';
import { firstLight } from '../../src/lib/server/demo/first-light.ts';
import { actAs } from '../support/actors.ts';
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

const SLUG = 'first-light-on-the-dial';
const STRIPS = 8;

async function openGalley(page: Page, slug: string): Promise<void> {
	await page.goto(`${house.origin}/pieces/${slug}/galley`);
	await page
		.getByRole('status')
		.filter({ hasText: `All ${STRIPS} strips measured.` })
		.waitFor({ timeout: 100_000 });
}

function stripFrames(page: Page): Frame[] {
	return page.frames().filter((frame) => frame.url().endsWith('/galley/strip'));
}

/** The faults of the list, each as its sentence and its rule. */
async function faults(page: Page): Promise<string[]> {
	return page.locator('li[id^="fault-"]').allInnerTexts();
}

/** Where the wave's slider stands in every strip, in the order in which they were drawn. */
function standings(page: Page): Promise<string[]> {
	return Promise.all(
		stripFrames(page).map(async (frame) =>
			frame.locator('.sy-frame input[type="range"]').inputValue()
		)
	);
}

/** Saves a document as the piece's newest draft, as the manuscript does. */
async function save(page: Page, slug: string, document: WidgetDocument): Promise<void> {
	const outcome = await page.evaluate(
		async ([path, body]) => {
			let baseVersion = 1;
			for (let attempt = 0; attempt < 2; attempt += 1) {
				const response = await fetch(path, {
					method: 'PUT',
					headers: { 'content-type': 'application/json' },
					body: JSON.stringify({ baseVersion, document: JSON.parse(body) })
				});
				if (response.ok) return 'kept';
				const answer = await response.json();
				const version = answer?.error?.details?.version;
				if (typeof version !== 'number') return JSON.stringify(answer).slice(0, 400);
				baseVersion = version;
			}
			return 'not kept';
		},
		[`/api/pieces/${slug}/draft`, JSON.stringify(document)] as const
	);
	expect(outcome).toBe('kept');
}

test('eight strips of the real frame hang, and none of the demo’s pieces must be mended', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 1440, height: 900 }
	});
	const errors: string[] = [];
	page.on('pageerror', (error) => errors.push(error.message));
	page.on('console', (message) => {
		if (message.type() === 'error') errors.push(message.text());
	});
	for (const slug of [SLUG, 'same-drop-same-blow']) {
		await openGalley(page, slug);
		const frames = stripFrames(page);
		expect(frames).toHaveLength(STRIPS);
		const widths = await Promise.all(frames.map((frame) => frame.evaluate(() => innerWidth)));
		expect(widths).toEqual([320, 390, 620, 800, 320, 320, 320, 680]);
		const must = (await faults(page)).filter((fault) => fault.includes('To be mended'));
		expect(must, slug).toEqual([]);
	}
	const grounds = await Promise.all(
		stripFrames(page).map((frame) =>
			frame.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)
		)
	);
	expect(grounds[0]).toBe('rgb(255, 255, 255)');
	expect(grounds[4]).toBe('rgb(28, 36, 33)');
	expect(errors).toEqual([]);
	await context.close();
});

test('what is moved in one strip moves in all, and at the left', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 1440, height: 900 }
	});
	await openGalley(page, SLUG);
	expect(new Set(await standings(page))).toEqual(new Set(['180']));

	const left = page.getByRole('slider', { name: /The wave left at this age/ });
	await left.focus();
	await page.keyboard.press('End');
	await expect.poll(async () => new Set(await standings(page))).toEqual(new Set(['500']));

	const fourth = stripFrames(page)[3];
	await fourth?.locator('.sy-frame input[type="range"]').press('Home');
	await expect.poll(async () => new Set(await standings(page))).toEqual(new Set(['100']));
	expect(await left.inputValue()).toBe('100');
	await page
		.locator('#strip-spoken')
		.getByText(/100 million years/)
		.first()
		.waitFor();
	await context.close();
});

test('seeded faults are found, pinned, and lead to their cause', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 1440, height: 900 }
	});
	await page.goto(`${house.origin}/desk`);
	const document = structuredClone(firstLight);
	document.title = 'Radiofrequenzspektrumsdurchstimmungen on the dial';
	for (const block of document.blocks) if (block.kind === 'chart') block.description = '';
	document.controls.push({
		id: 'place',
		kind: 'choice',
		label: 'Where you listen',
		unit: '',
		initial: 0,
		options: [
			{ label: 'here', value: 'here' },
			{
				label: 'on the far side of the Moon, where no radio station of the Earth is ever heard',
				value: 'moon'
			}
		]
	});
	const at = document.blocks.findIndex(({ id }) => id === 'slider');
	document.blocks.splice(at + 1, 0, { id: 'place-control', kind: 'control', control: 'place' });
	const result = document.blocks.find(({ id }) => id === 'result');
	if (result?.kind !== 'result') throw new Error('The demo has no result sentence.');
	result.content.push(
		{ kind: 'text', text: ' You listen ' },
		{ kind: 'setting', control: 'place' }
	);
	try {
		await save(page, SLUG, document);

		await openGalley(page, SLUG);
		const list = await faults(page);
		const one = (pattern: RegExp) => {
			const found = list.filter((fault) => pattern.test(fault.replace(/\s+/g, ' ')));
			expect(found.length, `${pattern} in\n${list.join('\n')}`).toBeGreaterThan(0);
			return list.indexOf(found[0] ?? '') + 1;
		};
		const wide = one(/In \d strips “Radiofrequenz.* px wider than the strip.* 1\.4\.10/);
		one(/no description|Describe|description/i);
		const jump = one(
			/with “Where you listen: on the far side.* the result sentence takes .* more than at first/
		);

		await page
			.locator('#strip-320')
			.getByRole('link', { name: `Fault ${wide}, to the list` })
			.waitFor();
		await page.locator(`#fault-${jump}`).getByRole('link', { name: 'To the cause' }).click();
		await page.waitForURL(/\/manuscript#block-result$/);
	} finally {
		await save(page, SLUG, firstLight);
	}
	await context.close();
});

test('keys lead along strips and faults; the page is axe clean, light and dark', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 1440, height: 900 },
		colorScheme: 'light'
	});
	await openGalley(page, SLUG);
	await page.locator('h1').click();
	await page.keyboard.press(']');
	expect(await page.evaluate(() => document.activeElement?.id)).toBe('strip-320');
	await page.keyboard.press(']');
	expect(await page.evaluate(() => document.activeElement?.id)).toBe('strip-390');
	await page.keyboard.press('[');
	expect(await page.evaluate(() => document.activeElement?.id)).toBe('strip-320');
	if ((await faults(page)).length > 0) {
		await page.keyboard.press('f');
		expect(await page.evaluate(() => document.activeElement?.id)).toBe('fault-1');
	}
	await expectNoAxeFindings(page);
	await page.emulateMedia({ colorScheme: 'dark' });
	await expectNoAxeFindings(page);
	await context.close();
});

test('on a phone the strips come one by one, and nothing is wider than it', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 390, height: 844 }
	});
	await openGalley(page, SLUG);
	const overflow = await page.evaluate(
		() => document.documentElement.scrollWidth - document.documentElement.clientWidth
	);
	expect(overflow).toBeLessThanOrEqual(0);
	await page.getByRole('button', { name: 'Next strip' }).click();
	await page.getByRole('button', { name: 'Next strip' }).click();
	await expect
		.poll(() =>
			page.locator('#strip-390').evaluate((element) => element.getBoundingClientRect().left)
		)
		.toBeLessThan(60);
	await expectNoAxeFindings(page);
	await context.close();
});

test('a strip stands in no foreign page, and shows nothing to strangers', async () => {
	const address = `${house.origin}/pieces/${SLUG}/galley/strip`;
	const stranger = await fetch(address, { redirect: 'manual' });
	expect(stranger.status).toBe(303);
	const { page, context } = await actAs(browser, house.origin, 'tamsin');
	const strip = await page.request.get(address);
	expect(strip.headers()['x-frame-options']).toBe('SAMEORIGIN');
	expect(strip.headers()['content-security-policy']).toContain("frame-ancestors 'self'");
	const room = await page.request.get(`${house.origin}/pieces/${SLUG}/galley`);
	expect(room.headers()['x-frame-options']).toBe('DENY');
	expect(room.headers()['content-security-policy']).toContain("frame-ancestors 'none'");
	await context.close();
});

test('a strip that can’t be drawn says so, and is drawn again when asked', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 1440, height: 900 }
	});
	let refused = 0;
	await page.route('**/galley/strip', (route) =>
		refused++ === 2 ? route.abort() : route.continue()
	);
	await page.goto(`${house.origin}/pieces/${SLUG}/galley`);
	await page
		.getByRole('status')
		.filter({ hasText: `1 of ${STRIPS} strips couldn’t be measured.` })
		.waitFor({ timeout: 100_000 });
	const strip = page.locator('#strip-620');
	expect(await strip.getByRole('alert').innerText()).toContain('couldn’t be drawn');
	await strip.getByRole('button', { name: 'Draw it again' }).click();
	await page
		.getByRole('status')
		.filter({ hasText: `All ${STRIPS} strips measured.` })
		.waitFor();
	await context.close();
});
