/** The published frame in a real browser, inside a sandboxed iframe on another host's page. */
import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import type { Browser, BrowserContext, Frame, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect, test } from 'vitest';
import { startServer, stopServer } from '../../embed/server.ts';
import { catalogue } from '../../src/lib/physics/calculators/index.ts';
import { firstLight } from '../../src/lib/server/demo/first-light.ts';
import { sameDrop } from '../../src/lib/server/demo/same-drop.ts';
import { readManifest } from '../../src/lib/server/press/manifest.ts';
import type { Bundle } from '../../src/lib/server/press/press.ts';
import { shelfOf } from '../../src/lib/server/shelf/shelf.ts';
import { evaluate } from '../../src/lib/widget/evaluate.ts';
import { liveStated } from '../../src/lib/widget/places.ts';
import { printStated } from '../../src/lib/widget/stated.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import { PRESS_FOLDER, releaseOf } from '../support/release.ts';

let folder: string;
let server: Server;
let partner: Server;
let frames: string;
let newspaper: string;
let browser: Browser;
let context: BrowserContext | undefined;
let bundle: Bundle;

/** The script-free snippet, on a page that may itself be cross-origin isolated. */
const article = (
	src: string
) => `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>The Carrowby Lantern</title><link rel="icon" href="data:,"></head>
<body><main><h1>The oldest note you could tune to</h1>
<iframe src="${src}" title="First light on the dial – interactive explainer"
	sandbox="allow-scripts allow-popups allow-popups-to-escape-sandbox" allow="" referrerpolicy="strict-origin"
	style="display:block;width:100%;border:0;height:900px"></iframe>
<p>${'The wireless on Lantern Hill gets the shipping news. '.repeat(60)}</p></main>
<script>window.told=[];addEventListener('message',(e)=>told.push({data:e.data,origin:e.origin,own:e.source===document.querySelector('iframe').contentWindow}))</script>
</body></html>`;

beforeAll(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-frame-'));
	bundle = await releaseOf(firstLight, 'first-light');
	await shelfOf(folder).place(bundle);
	await shelfOf(folder).place(await releaseOf(sameDrop, 'same-drop'));
	server = await startServer({
		host: '127.0.0.1',
		port: 0,
		origin: 'http://localhost',
		dataFolder: folder,
		loadPages: async () => (_request, response) => response.writeHead(404).end()
	});
	frames = `http://localhost:${(server.address() as AddressInfo).port}`;
	partner = createServer((request, response) => {
		const { pathname, searchParams, hash } = new URL(request.url ?? '/', 'http://partner');
		if (pathname !== '/') return void response.writeHead(404).end();
		response.writeHead(200, {
			'Content-Type': 'text/html; charset=utf-8',
			...(searchParams.has('isolated') ? { 'Cross-Origin-Embedder-Policy': 'require-corp' } : {})
		});
		response.end(
			article(`${frames}${searchParams.get('frame') ?? '/w/first-light/latest'}${hash}`)
		);
	});
	await new Promise<void>((resolve) => partner.listen(0, '127.0.0.1', resolve));
	newspaper = `http://127.0.0.1:${(partner.address() as AddressInfo).port}`;
	browser = await launchChromium();
});

afterEach(async () => {
	await context?.close();
	context = undefined;
});

afterAll(async () => {
	await browser?.close();
	partner?.close();
	if (server) await stopServer(server, 'test');
	await rm(folder, { recursive: true, force: true });
});

interface Reader {
	page: Page;
	frame: Frame;
	asked: string[];
	complaints: string[];
}

async function read(
	path = '/',
	options: Parameters<Browser['newContext']>[0] = {}
): Promise<Reader> {
	context = await browser.newContext({ viewport: { width: 700, height: 1100 }, ...options });
	const page = await context.newPage();
	const asked: string[] = [];
	const complaints: string[] = [];
	page.on('request', (request) => asked.push(request.url()));
	page.on('console', (message) => {
		const isComplaint = message.type() === 'error' || message.text().includes('svelte.dev/e/');
		if (isComplaint) complaints.push(message.text());
	});
	page.on('pageerror', (error) => complaints.push(error.message));
	await page.goto(newspaper + path);
	const frame = page.frames().find((each) => each.url().startsWith(frames));
	if (!frame) throw new Error('The page has no frame.');
	if (options.javaScriptEnabled !== false) await frame.waitForSelector('html[data-awake]');
	return { page, frame, asked, complaints };
}

const sentence = async (frame: Frame) =>
	((await frame.textContent('.sy-result')) ?? '')
		.replace(/\u00a0/g, ' ')
		.replace(/\u2060/g, '')
		.trim();

/** What the calculators give, printed as the copy prints it. */
function expected(age: number): string {
	const evaluation = evaluate(firstLight, { 'wave-age': age }, catalogue);
	const words = (claim: string) => {
		const stated = liveStated(firstLight, evaluation, claim, catalogue);
		return stated ? printStated(stated).replace(/\u00a0/g, ' ') : 'no reading';
	};
	return `A wave that left ${age} million years after the Big Bang arrives today at ${words('frequency')}, each crest ${words('crest')} from the next.`;
}

test('it wakes in a sandbox on another host, asks no other host, keeps nothing, and tells only its height', async () => {
	const { page, frame, asked, complaints } = await read();
	expect(await sentence(frame)).toBe(expected(180));
	expect(complaints).toEqual([]);
	expect(asked.filter((url) => !url.startsWith(frames) && !url.startsWith(newspaper))).toEqual([]);
	expect(await context?.cookies()).toEqual([]);
	expect(
		await frame.evaluate(() => [
			window.origin,
			...['localStorage', 'indexedDB'].map((name) => {
				try {
					return String(Boolean(window[name as 'localStorage']));
				} catch {
					return 'refused';
				}
			})
		])
	).toContain('null');
	const told = await page.evaluate(() => (window as unknown as { told: unknown[] }).told);
	const height = await frame.evaluate(() =>
		Math.ceil(document.body.getBoundingClientRect().height)
	);
	expect(told.at(-1)).toEqual({
		data: { v: 1, type: 'height', height },
		origin: 'null',
		own: true
	});
});

test('waking changes nothing that was drawn', async () => {
	const drawing = (frame: Frame) =>
		Promise.all(
			['.sy-arm-drawing', '.sy-chart', '.sy-foot'].map((part) =>
				frame.locator(part).evaluate((element) => element.outerHTML.replace(/<!--.*?-->/g, ''))
			)
		);
	const { frame } = await read();
	const awake = [await sentence(frame), ...(await drawing(frame))];
	await context?.close();
	const { frame: asleep } = await read('/', { javaScriptEnabled: false });
	expect(awake).toEqual([await sentence(asleep), ...(await drawing(asleep))]);
});

test('a partner page that is cross-origin isolated can show it', async () => {
	const { frame } = await read('/?isolated');
	expect(await sentence(frame)).toBe(expected(180));
});

test('the slider moves by mouse', async () => {
	const { page, frame } = await read();
	const arm = await frame.locator('.sy-arm input').boundingBox();
	if (!arm) throw new Error('The slider isn’t to be seen.');
	const at = (share: number) =>
		[arm.x + 10 + (arm.width - 20) * share, arm.y + arm.height / 2] as const;
	await page.mouse.move(...at(0.2));
	await page.mouse.down();
	await page.mouse.move(...at(0.6), { steps: 5 });
	await page.mouse.up();
	await page.waitForTimeout(50);
	expect(await sentence(frame)).toBe(expected(340));
	await frame.locator('.sy-step').last().click();
	expect(await sentence(frame)).toBe(expected(350));
	await frame.getByRole('button', { name: 'Reset' }).click();
	expect(await sentence(frame)).toBe(expected(180));
});

test('the slider moves by keyboard, and says its value with the unit in words', async () => {
	const { page, frame } = await read();
	const slider = frame.getByRole('slider', { name: 'The wave left at this age, in million years' });
	await slider.focus();
	const steps = [
		['ArrowRight', 190],
		['ArrowUp', 200],
		['ArrowLeft', 190],
		['PageUp', 230],
		['PageDown', 190],
		['End', 500],
		['ArrowRight', 500],
		['Home', 100]
	] as const;
	for (const [key, age] of steps) {
		await page.keyboard.press(key);
		expect(await sentence(frame), key).toBe(expected(age));
		expect(await slider.getAttribute('aria-valuetext')).toBe(`${age}\u0020million years`);
		expect(await slider.inputValue()).toBe(String(age));
	}
	expect(
		await frame.getByRole('button', { name: 'one step less' }).getAttribute('aria-disabled')
	).toBe('true');
});

test('the slider moves by touch, and a finger that goes up and down scrolls the page', async () => {
	const { page, frame } = await read('/', {
		hasTouch: true,
		isMobile: true,
		viewport: { width: 390, height: 700 }
	});
	await frame.locator('.sy-arm').scrollIntoViewIfNeeded();
	const arm = await frame.locator('.sy-arm input').boundingBox();
	if (!arm) throw new Error('The slider isn’t to be seen.');
	await page.touchscreen.tap(arm.x + 10 + (arm.width - 20) * 0.5, arm.y + 20);
	await page.waitForTimeout(100);
	expect(await sentence(frame)).toBe(expected(300));
	await frame.locator('.sy-step').first().tap();
	expect(await sentence(frame)).toBe(expected(290));
	expect(
		await frame.locator('.sy-arm input').evaluate((input) => getComputedStyle(input).touchAction)
	).toBe('pan-y');
	for (const box of await frame.locator('.sy-step').all()) {
		const size = await box.boundingBox();
		expect(size && Math.min(size.width, size.height)).toBeGreaterThanOrEqual(44);
	}
});

test('a held key is said once, after it has come to rest', async () => {
	const { page, frame } = await read();
	await frame.evaluate(() => {
		const said: string[] = [];
		(window as unknown as { said: string[] }).said = said;
		const region = document.querySelector('.sy-unseen');
		if (region)
			new MutationObserver(() => said.push(region.textContent ?? '')).observe(region, {
				childList: true,
				characterData: true,
				subtree: true
			});
	});
	await frame.getByRole('slider').focus();
	for (let press = 0; press < 10; press += 1) await page.keyboard.press('ArrowRight');
	await page.waitForTimeout(300);
	const said = () => frame.evaluate(() => (window as unknown as { said: string[] }).said);
	expect(await said()).toEqual([]);
	await page.waitForTimeout(700);
	expect((await said()).map((words) => words.replace(/\u00a0/g, ' '))).toEqual([expected(280)]);
});

test('a link sets the slider; past its end, that is said', async () => {
	const page = await (context = await browser.newContext()).newPage();
	await page.goto(`${frames}/w/first-light/latest#wave-age=270`);
	await page.waitForSelector('html[data-awake]');
	expect(await sentence(page.mainFrame())).toBe(expected(270));
	await page.goto('about:blank');
	await page.goto(`${frames}/w/first-light/latest#wave-age=9000`);
	await page.waitForSelector('html[data-awake]');
	expect(await sentence(page.mainFrame())).toBe(expected(500));
	expect(await page.textContent('.sy-notice-plain')).toContain(
		'The link you followed asks for 9000'
	);
});

test('a number opens its record below its paragraph, and Esc gives the focus back', async () => {
	const { page, frame } = await read();
	const height = () =>
		frame.evaluate(() => document.querySelector<HTMLElement>('.sy-widget')?.offsetHeight ?? 0);
	const before = await height();
	const number = frame.locator('[data-claim="frequency"]');
	await number.focus();
	await page.keyboard.press('Enter');
	const record = frame.locator('.sy-record');
	await record.waitFor();
	expect(await number.getAttribute('aria-expanded')).toBe('true');
	expect(await record.innerText()).toMatch(
		/How do we know\? about 68.megahertz[^]*It fits\.[^]*Dr Mateus Quevarro, on 12 December 2026/
	);
	expect(await frame.locator('.sy-chart').count()).toBe(0);
	expect(await height()).toBeGreaterThanOrEqual(before);

	await frame.locator('.sy-step').last().click();
	expect(await record.innerText()).toMatch(
		/the calculator reads 7\d\.\d+.megahertz at this setting/
	);

	await page.keyboard.press('Escape');
	await record.waitFor({ state: 'detached' });
	expect(await frame.evaluate(() => document.activeElement?.getAttribute('data-claim'))).toBe(
		'frequency'
	);
	expect(await frame.locator('.sy-chart').count()).toBe(1);
});

test('with no script the text, the chart and its table are there, and nothing that would not work', async () => {
	const { frame } = await read('/', { javaScriptEnabled: false });
	expect(await sentence(frame)).toBe(expected(180));
	expect(await frame.locator('.sy-chart-plot').isVisible()).toBe(true);
	for (const dead of ['.sy-slider', '.sy-reset', '.sy-hint', '.sy-ask .sy-mark']) {
		expect(await frame.locator(dead).first().isVisible(), dead).toBe(false);
	}
	expect(await frame.locator('[role="button"]').count()).toBe(0);
	await frame.locator('summary').click();
	// Nine along the line, and the one that the widget stands at.
	expect(await frame.locator('tbody tr').count()).toBe(10);
});

test.each([
	{ width: 320, scheme: 'light' },
	{ width: 620, scheme: 'dark' }
] as const)(
	'axe finds nothing at $width px in $scheme, alone and within a page',
	async ({ width, scheme }) => {
		const { page, frame } = await read('/', {
			viewport: { width, height: 900 },
			colorScheme: scheme
		});
		await expectNoAxeFindings(page);
		await frame.locator('[data-claim="frequency"]').click();
		await frame.locator('.sy-record').waitFor();
		await expectNoAxeFindings(page);
		for (const slug of ['first-light', 'same-drop']) {
			await page.goto(`${frames}/w/${slug}/latest`);
			await page.waitForSelector('html[data-awake]');
			await page.waitForSelector('h1');
			await expectNoAxeFindings(page);
		}
	}
);

test.each([280, 320, 390, 800])(
	'at %i px nothing is cut off or scrolls sideways',
	async (width) => {
		const page = await (context = await browser.newContext({
			viewport: { width, height: 900 }
		})).newPage();
		for (const slug of ['first-light', 'same-drop']) {
			await page.goto(`${frames}/w/${slug}/latest`);
			await page.waitForSelector('html[data-awake]');
			await page.locator('.sy-result [data-claim]').first().click();
			await page.locator('.sy-record').waitFor();
			await page.getByRole('button', { name: /^Show/ }).click();
			await page.waitForTimeout(100);
			expect(
				await page.evaluate(() => document.documentElement.scrollWidth),
				slug
			).toBeLessThanOrEqual(width);
		}
	}
);

test('nothing moves while it loads and wakes', async () => {
	const page = await (context = await browser.newContext({
		viewport: { width: 620, height: 900 }
	})).newPage();
	await page.goto(`${frames}/w/first-light/latest`);
	await page.waitForSelector('html[data-awake]');
	await page.waitForTimeout(300);
	const shift = await page.evaluate(
		() =>
			new Promise<number>((resolve) => {
				let sum = 0;
				const observer = new PerformanceObserver((list) => {
					for (const entry of list.getEntries())
						sum += (entry as unknown as { value: number }).value;
				});
				observer.observe({ type: 'layout-shift', buffered: true });
				setTimeout(() => resolve(sum), 200);
			})
	);
	expect(shift).toBe(0);
});

test('every calculator of the catalogue is in the build', async () => {
	const { calculators } = await readManifest(PRESS_FOLDER);
	expect(Object.keys(calculators).sort()).toEqual([...catalogue.keys()].sort());
});

/**
 * gzip -9, in bytes, of all that this frame really asks for: its document, its scripts with those of its chart, and the
 * face it is set in. Blocks of many kinds have brought the script past the 26 kB that are the aim; DEVELOPERS.md says
 * what would lower it.
 */
const BUDGET = { document: 12_000, script: 66_000, everything: 130_000 };

test('the frame keeps to its budget', async () => {
	const { page } = await read();
	const asked = new Set<string>();
	page.on('response', (response) => asked.add(new URL(response.url()).pathname));
	await page.reload({ waitUntil: 'networkidle' });
	const loaded = bundle.files.filter(({ key }) => key.endsWith('.html') || asked.has(`/${key}`));
	const size = (ending: RegExp) =>
		loaded
			.filter(({ key }) => ending.test(key))
			.reduce((sum, { bytes }) => sum + gzipSync(bytes, { level: 9 }).length, 0);
	expect(
		loaded.some(({ key }) => /LineChart/.test(key)),
		'the chart’s own script'
	).toBe(true);
	expect(size(/\.html$/), 'document').toBeLessThanOrEqual(BUDGET.document);
	expect(size(/\.js$/), 'script').toBeLessThanOrEqual(BUDGET.script);
	expect(size(/./), 'all together').toBeLessThanOrEqual(BUDGET.everything);
});

test('no script carries a schema, a parser or a typesetter', async () => {
	for (const name of await readdir(PRESS_FOLDER)) {
		if (!name.endsWith('.js')) continue;
		const code = await readFile(join(PRESS_FOLDER, name), 'utf8');
		expect(code, name).not.toMatch(/ZodError|strictObject|katex|mathjs|\beval\(|new Function\(/i);
	}
});
