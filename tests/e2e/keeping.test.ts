/** Nothing typed is lost: the server is killed in mid-sentence, and the words are there when it is back. */
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
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

async function paste(page: Page, text: string): Promise<void> {
	await manuscript(page).evaluate((element, pasted) => {
		const clipboardData = new DataTransfer();
		clipboardData.setData('text/plain', pasted);
		element.dispatchEvent(
			new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true })
		);
	}, text);
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

test('what doesn’t fit into the title isn’t put in, and nothing after it is lost', async () => {
	const page = await newPiece('Over long');
	await page.keyboard.type('Words before. ');
	await page.keyboard.press('Control+Home');
	await paste(page, 'x'.repeat(121));
	await page.getByText(/The title holds 120 characters/).waitFor();
	await page.keyboard.type('Not ');
	await page.keyboard.press('Control+End');
	await page.keyboard.type('Words after.');
	await expect.poll(() => kept(page).innerText()).toMatch(/^kept/);
	await page.reload();
	const words = await manuscript(page).innerText();
	expect(words).toContain('Not Over long');
	expect(words).toContain('Words before. Words after.');
	await page.context().close();
});

describe('words that only this browser has', () => {
	/** Types while no save gets through, gives what the browser kept another title, and opens the sheet anew. */
	async function reopenedWith(title: string, keptTitle: string | null) {
		const page = await newPiece(title);
		await page.route('**/draft', (route) => route.abort());
		await page.keyboard.type('Only here.');
		await page.waitForTimeout(1000);
		const address = page.url();
		await page.goto(`${house.origin}/calculators`);
		await page.evaluate(async (changed) => {
			const done = <T>(request: IDBRequest<T>) =>
				new Promise<T>((resolve, reject) => {
					request.onsuccess = () => resolve(request.result);
					request.onerror = () => reject(new Error('The browser’s store fails.'));
				});
			const database = await done(indexedDB.open('steelyard-manuscripts'));
			const store = database.transaction('entries', 'readwrite').objectStore('entries');
			const [key] = await done(store.getAllKeys());
			const entry = (await done(store.get(key!))) as { document: { title: unknown } };
			entry.document.title = changed;
			await done(store.put(entry, key));
			database.close();
		}, keptTitle);
		await page.unroute('**/draft');
		await page.goto(address);
		return page;
	}

	test('come back though the server can’t keep them, with the mend', async () => {
		const page = await reopenedWith('Too long to keep', 'x'.repeat(130));
		await expect.poll(() => manuscript(page).innerText()).toContain('Only here.');
		await page.getByText(/The title is longer than 120 characters: shorten it\./).waitFor();
		await page.keyboard.press('Control+Home');
		for (let over = 0; over < 10; over += 1) await page.keyboard.press('Delete');
		await expect.poll(() => kept(page).innerText()).toMatch(/^kept/);
		await page.reload();
		expect(await manuscript(page).innerText()).toContain('Only here.');
		await page.context().close();
	});

	test('that no sheet can take are shown to be taken along', async () => {
		const page = await reopenedWith('No sheet', null);
		const words = page.getByLabel('The words set aside');
		await words.waitFor();
		expect(await words.inputValue()).toContain('Only here.');
		await page.getByRole('link', { name: 'Download them' }).waitFor();
		await page.getByRole('button', { name: 'drop them' }).click();
		await words.waitFor({ state: 'detached' });
		await page.context().close();
	});
});

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

	// Theirs is set aside, in this browser, until it is dropped.
	await page.getByText(/An earlier version, .* is set aside/).waitFor();
	await page.reload();
	await page.getByRole('button', { name: 'put it back' }).click();
	await expect.poll(() => manuscript(page).innerText()).toContain('Theirs.');
	await expect.poll(() => kept(page).innerText()).toMatch(/^kept/);
	await page.getByRole('button', { name: 'drop it' }).click();
	await page.getByText(/is set aside/).waitFor({ state: 'detached' });
	await page.context().close();
});
