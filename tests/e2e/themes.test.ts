/** Themes for partner pages, from the form to a real frame; and copy out as Markdown, in from a word file. */
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { packStored } from '../../src/lib/server/word-files/pack.ts';
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

const FRAME = '/w/same-drop-same-blow/latest';

/** The smallest .docx there is. */
function wordFile(text: string): Buffer {
	const opc = 'http://schemas.openxmlformats.org/package/2006';
	const main = 'http://schemas.openxmlformats.org/wordprocessingml/2006/main';
	const parts = {
		'[Content_Types].xml': `<Types xmlns="${opc}/content-types"/>`,
		'_rels/.rels': `<Relationships xmlns="${opc}/relationships"/>`,
		'word/document.xml': `<w:document xmlns:w="${main}"><w:body><w:p><w:r><w:t>${text}</w:t></w:r></w:p></w:body></w:document>`
	};
	return packStored(new Map(Object.entries(parts).map(([name, xml]) => [name, Buffer.from(xml)])));
}

/** A computed colour on the frame's page. */
function colourOf(page: Page, selector: string, property: 'color' | 'backgroundColor') {
	return page
		.locator(selector)
		.first()
		.evaluate((element, name) => getComputedStyle(element)[name], property);
}

test('a theme that fails can’t be kept; mended, it dresses real frames', async () => {
	const { page, context } = await actAs(browser, house.origin, 'perpetua');
	await page.goto(`${house.origin}/themes`);
	await page.waitForLoadState('networkidle');
	await expectNoAxeFindings(page);

	await page.getByLabel('Name').fill('The Harbour Courier');
	await page.getByLabel('Ground', { exact: true }).fill('#FDF6EC');
	await page.getByLabel('Accent', { exact: true }).fill('#f0a030');
	const refusal = page.getByRole('status').filter({ hasText: 'can’t be kept' });
	await refusal.waitFor();
	expect(await refusal.innerText()).toMatch(
		/Links on the ground, light scheme: 2\.0 to 1, and 4\.5 is needed\. The nearest accent that would do is #[0-9a-f]{6}\./
	);
	expect(await page.getByRole('button', { name: 'Keep this theme' }).count()).toBe(0);

	// Without the page’s own check the server refuses just the same.
	const sent = await page.evaluate(async () => {
		const body = new FormData();
		for (const [name, value] of Object.entries({
			id: '',
			name: 'Forced',
			ground: '#ffffff',
			accent: '#f0a030',
			face: 'literata',
			radiusPx: '2'
		}))
			body.set(name, value);
		return (await fetch('/themes?/save', { method: 'POST', body })).text();
	});
	expect(sent).toContain('can’t be read well enough');

	await page.getByRole('button', { name: /^Take #[0-9a-f]{6} as accent$/ }).click();
	await page.getByLabel('the host system’s serif').check();
	await page.getByLabel('Corners, in pixels').fill('10');
	await expectNoAxeFindings(page);
	await page.getByRole('button', { name: 'Keep this theme' }).click();
	await page.waitForURL(/\/themes\/[\w-]{22}$/);
	await page.waitForLoadState('networkidle');
	await expectNoAxeFindings(page);
	const id = page.url().split('/').at(-1) ?? '';

	const faults: string[] = [];
	const reader = await (await browser.newContext({ colorScheme: 'light' })).newPage();
	reader.on('pageerror', (error) => faults.push(error.message));
	reader.on('console', (message) => {
		// The test's own scripts and the missing icon are refused, too, and no part of a theme.
		if (message.text().includes('style')) faults.push(message.text());
	});
	await reader.goto(`${house.origin}${FRAME}?theme=${id}`);
	await reader.locator('html[data-awake]').waitFor();
	expect(await colourOf(reader, 'html', 'backgroundColor')).toBe('rgb(253, 246, 236)');
	expect(await colourOf(reader, '.sy-reset', 'color')).not.toBe('rgb(90, 42, 130)');
	const step = reader.locator('.sy-step').first();
	expect(await step.evaluate((element) => getComputedStyle(element).borderRadius)).toBe('10px');
	const face = await reader
		.locator('.sy-title')
		.evaluate((element) => getComputedStyle(element).fontFamily);
	expect(face).toContain('ui-serif');
	await expectNoAxeFindings(reader);
	await reader.emulateMedia({ colorScheme: 'dark' });
	await expectNoAxeFindings(reader);
	expect(faults).toEqual([]);

	// Nothing of a theme is left without one, or with one that nobody knows.
	for (const query of ['', '?theme=nobody', '?theme=%3C/style%3E']) {
		await reader.emulateMedia({ colorScheme: 'light' });
		await reader.goto(`${house.origin}${FRAME}${query}`);
		expect(await colourOf(reader, 'html', 'backgroundColor')).toBe('rgb(255, 255, 255)');
	}
	await reader.context().close();
	await context.close();
});

test('a writer may look at themes, and is axe clean on a phone in the dark', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 390, height: 844 },
		colorScheme: 'dark'
	});
	await page.goto(`${house.origin}/themes`);
	await page.waitForLoadState('networkidle');
	await expectNoAxeFindings(page);
	expect(await page.getByRole('button', { name: 'Keep this theme' }).count()).toBe(0);
	const overflow = await page.evaluate(
		() => document.documentElement.scrollWidth - document.documentElement.clientWidth
	);
	expect(overflow).toBeLessThanOrEqual(0);
	await context.close();
});

test('the copy of a piece comes out as Markdown, and a word file comes in', async () => {
	const { page, context } = await actAs(browser, house.origin, 'tamsin');
	const copy = await page.request.get(`${house.origin}/api/pieces/same-drop-same-blow/copy.md`);
	expect(copy.status()).toBe(200);
	expect(copy.headers()['content-disposition']).toMatch(
		/^attachment; filename="same-drop-same-blow-version-\d+\.md"$/
	);
	expect(copy.headers()['content-type']).toBe('text/markdown; charset=utf-8');
	expect(await copy.text()).toMatch(/^# .+\n\n[\s\S]+\[\^1\]: .+/);

	await page.goto(`${house.origin}/desk`);
	const refused = await page.evaluate(async () => {
		const body = new Blob(['%PDF-1.7 no word file'], { type: 'application/octet-stream' });
		const answer = await fetch('/api/import/word', { method: 'POST', body });
		return { status: answer.status, text: await answer.text() };
	});
	expect(refused.status).toBe(422);
	expect(refused.text).toContain('This isn’t a .docx file, whatever its name says.');
	const whole = await page.request.post(`${house.origin}/api/import/word`, {
		headers: { origin: house.origin, 'content-type': 'application/octet-stream' },
		data: wordFile('Cold hydrogen sends one note.')
	});
	expect(whole.status()).toBe(200);
	expect(await whole.json()).toEqual({
		blocks: [
			{ kind: 'paragraph', content: [{ kind: 'text', text: 'Cold hydrogen sends one note.' }] }
		],
		links: [],
		notes: []
	});
	const heavy = await page.evaluate(async () => {
		const body = new Blob([new Uint8Array(6 * 1024 * 1024)], { type: 'application/octet-stream' });
		return (await fetch('/api/import/word', { method: 'POST', body })).status;
	});
	expect(heavy).toBe(413);
	await context.close();

	const stranger = await fetch(`${house.origin}/api/pieces/same-drop-same-blow/copy.md`);
	expect(stranger.status).toBe(401);
});
