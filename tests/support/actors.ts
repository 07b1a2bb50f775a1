/** The demo's people in browsers of their own. */
import type { Browser, BrowserContext, BrowserContextOptions, Page } from 'playwright-core';
import { DEMO_PASSPHRASE, DEMO_PEOPLE } from '../../src/lib/server/demo/people.ts';

export type Who = keyof typeof DEMO_PEOPLE;

/** Signs in through the sign-in page, as a person does, and waits for the desk. */
export async function signIn(page: Page, origin: string, who: Who): Promise<void> {
	await page.goto(`${origin}/sign-in`);
	await page.locator('input[type="email"]').fill(DEMO_PEOPLE[who].email);
	await page.locator('input[type="password"]').fill(DEMO_PASSPHRASE);
	await page.getByRole('button', { name: 'Sign in' }).click();
	await page.waitForURL(`${origin}/desk`);
}

/** Someone at a browser of their own: cookies are theirs alone. Close the context when they are done. */
export async function actAs(
	browser: Browser,
	origin: string,
	who: Who,
	options: BrowserContextOptions = {}
): Promise<{ context: BrowserContext; page: Page }> {
	const context = await browser.newContext(options);
	const page = await context.newPage();
	await signIn(page, origin, who);
	return { context, page };
}
