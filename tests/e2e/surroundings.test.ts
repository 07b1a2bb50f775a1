/** The demo's own pages beside the app: they too are read by people. */
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import type { Listening } from '../support/fakes/listen.ts';
import { startMail } from '../support/fakes/mail.ts';
import type { MailFake } from '../support/fakes/mail.ts';
import { startPartner } from '../support/fakes/partner.ts';

let folder: string;
let mail: MailFake;
let partner: Listening;
let browser: Browser;
let page: Page;

beforeAll(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-surroundings-'));
	mail = await startMail({ smtpPort: 0, trayPort: 0, folder });
	partner = await startPartner({ port: 0, steelyard: mail.tray.url });
	browser = await launchChromium();
	page = await (await browser.newContext()).newPage();
});

afterAll(async () => {
	await browser.close();
	await Promise.all([mail.close(), partner.close()]);
	await rm(folder, { recursive: true });
});

test('the mail tray lists letters and opens one, its links included', async () => {
	await page.goto(mail.tray.url);
	await expectNoAxeFindings(page);
	await createTransport(mail.smtpUrl).sendMail({
		from: 'desk@varrowmere.example',
		to: 'tamsin@varrowmere.example',
		subject: 'Your sign-in link',
		text: `Open ${mail.tray.url}/?from=letter\n\nThe Public Desk`
	});
	await page.getByRole('link', { name: 'Look again' }).click();
	await expectNoAxeFindings(page);
	await page.getByRole('link', { name: 'Your sign-in link' }).click();
	await expectNoAxeFindings(page);
	await page.getByRole('link', { name: `${mail.tray.url}/?from=letter` }).click();
	expect(page.url()).toBe(`${mail.tray.url}/?from=letter`);
});

test.each([320, 1280])('the newspaper holds at %d px, with a frame in a sandbox', async (width) => {
	await page.setViewportSize({ width, height: 900 });
	await page.goto(partner.url);
	await expectNoAxeFindings(page);
	await page.getByRole('link', { name: 'The oldest note you could tune to' }).click();
	await expectNoAxeFindings(page);
	const frame = page.locator('iframe');
	expect(await frame.getAttribute('src')).toBe(`${mail.tray.url}/w/first-light-on-the-dial/latest`);
	expect(await frame.getAttribute('sandbox')).toBe(
		'allow-scripts allow-popups allow-popups-to-escape-sandbox'
	);
	expect(await page.locator('script').count()).toBe(0);
	const overflow = await page.evaluate(
		() => document.documentElement.scrollWidth - document.documentElement.clientWidth
	);
	expect(overflow).toBe(0);
	expect((await frame.boundingBox())?.height).toBeGreaterThan(700);
});
