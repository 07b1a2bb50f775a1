/** Nothing typed is lost: the server is killed in mid-sentence, and the words are there when it is back. */
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { actAs } from '../support/actors.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
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

/** A second person at the same sheet, in a browser of their own. */
async function joins(address: string): Promise<Page> {
	const { page } = await actAs(browser, house.origin, 'perpetua');
	page.setDefaultTimeout(15_000);
	await page.goto(address);
	await manuscript(page).click();
	return page;
}

const isKept = (page: Page, timeout = 20_000) =>
	expect.poll(() => kept(page).innerText(), { timeout }).toMatch(/^kept/);

/** Puts the caret at the end of the line that holds these words. */
async function goTo(page: Page, words: string): Promise<void> {
	await manuscript(page).getByText(words).click();
	await page.keyboard.press('End');
}

describe('two people at one piece', () => {
	/** Two paragraphs, kept, with both people at them. */
	async function both(title: string): Promise<[Page, Page]> {
		const mine = await newPiece(title);
		await mine.keyboard.type('The first paragraph.');
		await mine.keyboard.press('Enter');
		await mine.keyboard.type('The second paragraph.');
		await isKept(mine);
		return [mine, await joins(mine.url())];
	}

	test('write in different blocks without a network, come back, and both have all of it', async () => {
		const [mine, theirs] = await both('Both offline');
		await mine.context().setOffline(true);
		await theirs.context().setOffline(true);
		await goTo(mine, 'The first');
		await mine.keyboard.type(' Mine, with no network.');
		await mine.keyboard.press('Enter');
		await mine.keyboard.type('A paragraph of mine.');
		await goTo(theirs, 'The second');
		await theirs.keyboard.type(' Theirs, with no network.');
		await expect.poll(() => kept(mine).innerText()).toMatch(/server is away/);
		await expect.poll(() => kept(theirs).innerText()).toMatch(/server is away/);

		await mine.context().setOffline(false);
		await isKept(mine);
		await theirs.context().setOffline(false);
		await isKept(theirs);
		await theirs.getByText(/Tamsin Orrelby kept this at .* while you were writing/).waitFor();
		const together = [
			'The first paragraph. Mine, with no network.',
			'A paragraph of mine.',
			'The second paragraph. Theirs, with no network.'
		];
		for (const words of together) expect(await manuscript(theirs).innerText()).toContain(words);
		await mine.reload();
		for (const words of together) expect(await manuscript(mine).innerText()).toContain(words);
		expect(await mine.getByRole('button', { name: 'Keep mine' }).count()).toBe(0);
		await mine.context().close();
		await theirs.context().close();
	});

	test('undo after a merge takes back one’s own words and leaves the other’s', async () => {
		const [mine, theirs] = await both('Undo over a merge');
		await goTo(theirs, 'The second');
		await theirs.keyboard.type(' Theirs.');
		await isKept(theirs);
		await goTo(mine, 'The first');
		await mine.keyboard.type(' Mine.');
		await mine.getByText(/Perpetua Lindqvane kept this/).waitFor();
		await isKept(mine);
		await goTo(mine, 'The first');
		for (let step = 0; step < 12; step += 1) await mine.keyboard.press('Control+z');
		const words = await manuscript(mine).innerText();
		expect(words).not.toContain('Mine.');
		expect(words).toContain('Theirs.');
		await isKept(mine);
		await mine.context().close();
		await theirs.context().close();
	});

	test('in the same block both versions stand side by side until one is chosen, also over a reload', async () => {
		const [mine, theirs] = await both('The same line');
		await goTo(theirs, 'The second');
		await theirs.keyboard.type(' As they put it.');
		await isKept(theirs);
		await goTo(mine, 'The second');
		await mine.keyboard.type(' As I put it.');
		await mine.getByText('This paragraph was changed here, and by Perpetua Lindqvane.').waitFor();
		await isKept(mine);
		expect(await manuscript(mine).innerText()).toContain('As I put it.');
		expect(await mine.getByRole('dialog').count()).toBe(0);
		// Nothing is in the way of writing on.
		await mine.keyboard.type(' And more.');
		await isKept(mine);

		await mine.reload();
		const other = mine.getByRole('region', { name: /^Perpetua Lindqvane/ });
		await expect.poll(() => other.innerText()).toContain('As they put it.');
		await expectNoAxeFindings(mine);
		await mine.getByRole('button', { name: 'Keep both' }).click();
		await expect.poll(() => manuscript(mine).innerText()).toContain('As they put it.');
		expect(await manuscript(mine).innerText()).toContain('As I put it. And more.');
		await other.waitFor({ state: 'detached' });
		await isKept(mine);
		await mine.reload();
		await manuscript(mine).waitFor();
		expect(await mine.getByRole('button', { name: 'Keep both' }).count()).toBe(0);
		await mine.context().close();
		await theirs.context().close();
	});
});

describe('two windows of one person', () => {
	test('are told apart from another person, and neither loses words', async () => {
		const page = await newPiece('Two windows');
		await page.keyboard.type('Here.');
		await isKept(page);
		const other = await page.context().newPage();
		await other.goto(page.url());
		await manuscript(other).click();
		await other.keyboard.press('Control+End');
		await other.keyboard.press('Enter');
		await other.keyboard.type('There.');
		await isKept(other);
		await page.bringToFront();
		await page.keyboard.type(' Here again.');
		await page.getByText(/You kept another version of this at .*, from another window/).waitFor();
		await isKept(page);
		const words = await manuscript(page).innerText();
		expect(words).toContain('Here. Here again.');
		expect(words).toContain('There.');
		await page.context().close();
	});

	test('closed in mid sentence, both come back', { timeout: 120_000 }, async () => {
		const page = await newPiece('Two windows closed');
		await page.keyboard.type('One line.');
		await page.keyboard.press('Enter');
		await page.keyboard.type('Another line.');
		await isKept(page);
		const context = page.context();
		const other = await context.newPage();
		await other.goto(page.url());
		const address = page.url();
		await context.setOffline(true);
		for (const [window, line, words] of [
			[page, 'One line.', ' From the first window.'],
			[other, 'Another line.', ' From the second window.']
		] as const) {
			await window.bringToFront();
			await goTo(window, line);
			await window.keyboard.type(words);
			await expect.poll(() => kept(window).innerText()).toMatch(/server is away/);
			await window.waitForTimeout(500);
			await window.close({ runBeforeUnload: false });
		}
		await context.setOffline(false);
		const again = await context.newPage();
		await again.goto(address);
		await expect.poll(() => manuscript(again).innerText()).toContain('From the first window.');
		await expect.poll(() => manuscript(again).innerText()).toContain('From the second window.');
		await isKept(again);
		await again.reload();
		expect(await manuscript(again).innerText()).toContain('From the second window.');
		await context.close();
	});
});

test(
	'the network is pulled, 200 words are typed, the tab is killed: all of them are there again',
	{ timeout: 120_000 },
	async () => {
		const page = await newPiece('Two hundred words');
		const context = page.context();
		const address = page.url();
		await context.setOffline(true);
		const words = Array.from(
			{ length: 200 },
			(_, index) =>
				`word${'abcdefghij'[index % 10]}${'abcdefghijklmnopqrst'[Math.floor(index / 10)]}`
		).join(' ');
		await page.keyboard.type(words);
		// The promise: nothing older than the last second is gone.
		await page.waitForTimeout(1000);
		await page.close({ runBeforeUnload: false });
		await context.setOffline(false);
		const again = await context.newPage();
		await again.goto(address);
		await expect.poll(() => manuscript(again).innerText()).toContain(words);
		await isKept(again);
		await context.close();
	}
);
