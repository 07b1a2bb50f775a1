/**
 * The manuscript in the built server and a real Chromium: how long a keystroke takes until it is painted, in a piece of
 * a hundred blocks on a processor slowed fourfold, and how much script the page loads before anything lazy is asked for.
 */
import type { BrowserContext, CDPSession, Page } from 'playwright-core';
import { actAs } from '../../../tests/support/actors.ts';
import { launchChromium } from '../../../tests/support/chromium.ts';
import { startHouse } from '../../../tests/support/server.ts';
import type { Block, WidgetDocument } from '../../lib/widget/document.ts';
import { say } from '../set-up/say.mjs';
import type { Measured } from './calculators.ts';

const SLUG = 'first-light-on-the-dial';
const BLOCKS = 100;
const SLOWED = 4;
/** A steady typist's time from key to key. */
const BETWEEN_KEYS_MS = 120;
const TEXT = 'The wave is stretched on its way, and so it tells when it left. ';

/** Aims for a page of this house, in milliseconds and in kB of 1000 bytes. */
const AIM = { p95Ms: 32, scriptKB: 120 };

export async function benchBuilder(): Promise<Measured[]> {
	const house = await startHouse({ seed: 'demo' });
	const browser = await launchChromium();
	try {
		const { context, page } = await actAs(browser, house.origin, 'tamsin', {
			viewport: { width: 1440, height: 900 }
		});
		const address = `${house.origin}/pieces/${SLUG}/manuscript`;
		const script = await scriptOf(context, address);
		say(
			`\nManuscript: ${(script / 1000).toFixed(0)} kB of script, compressed, before lazy parts (aim ${AIM.scriptKB}).`
		);
		await fillUp(page, address);
		const times = await keystrokes(page, address);
		const at = (share: number) => times[Math.ceil(share * times.length) - 1] ?? NaN;
		say(
			`Keystroke to paint, ${BLOCKS} blocks, processor slowed ×${SLOWED}, ${times.length} keys: p50 ${at(0.5).toFixed(1)} ms, p95 ${at(0.95).toFixed(1)} ms (aim ${AIM.p95Ms}).`
		);
		return [];
	} finally {
		await browser.close();
		await house.close();
	}
}

/** Bytes of script over the wire until the page rests. */
async function scriptOf(context: BrowserContext, address: string): Promise<number> {
	const page = await context.newPage();
	const session = await context.newCDPSession(page);
	await session.send('Network.enable');
	await session.send('Network.setCacheDisabled', { cacheDisabled: true });
	const scripts = new Set<string>();
	let bytes = 0;
	session.on('Network.responseReceived', ({ requestId, type }) => {
		if (type === 'Script') scripts.add(requestId);
	});
	session.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
		if (scripts.has(requestId)) bytes += encodedDataLength;
	});
	await page.goto(address);
	await page.getByRole('textbox', { name: 'Manuscript' }).waitFor();
	await page.waitForLoadState('networkidle');
	await page.close();
	return bytes;
}

/** Paragraphs up to the hundred, with numbers in them, through the page's own address for drafts. */
async function fillUp(page: Page, address: string): Promise<void> {
	const kept = page.waitForResponse((response) => response.request().method() === 'PUT');
	await page.goto(address);
	const manuscript = page.getByRole('textbox', { name: 'Manuscript' });
	await manuscript.waitFor();
	await page.keyboard.press('Control+Home');
	await manuscript.focus();
	await page.keyboard.type(' ');
	await page.keyboard.press('Backspace');
	await page.keyboard.type('A');
	const response = await kept;
	const input = response.request().postDataJSON() as { document: WidgetDocument };
	const sent = input.document;
	const { version } = (await response.json()) as { version: number };
	const more = Array.from({ length: BLOCKS - sent.blocks.length }, (_, index): Block => ({
		id: `bench-${index}`,
		kind: 'paragraph',
		content: [
			{
				kind: 'text',
				text: `${TEXT}It came with ${index + 3} others, ${index + 20} metres from crest to crest. ${TEXT}`
			}
		]
	}));
	await page.waitForTimeout(1000);
	const answer = await page.request.put(
		address.replace('/pieces', '/api/pieces').replace('/manuscript', '/draft'),
		{
			headers: { origin: new URL(address).origin },
			data: { baseVersion: version, document: { ...sent, blocks: [...sent.blocks, ...more] } }
		}
	);
	if (!answer.ok()) throw new Error(`The draft wasn’t taken: ${await answer.text()}`);
}

/** Milliseconds from the key's event to the frame that shows it, sorted. */
async function keystrokes(page: Page, address: string): Promise<number[]> {
	await page.goto(address);
	const manuscript = page.getByRole('textbox', { name: 'Manuscript' });
	await manuscript.waitFor();
	await page.waitForLoadState('networkidle');
	await manuscript.locator('p').nth(40).click();
	await page.keyboard.press('End');
	const session: CDPSession = await page.context().newCDPSession(page);
	await session.send('Emulation.setCPUThrottlingRate', { rate: SLOWED });
	await page.evaluate(() => {
		const times: number[] = [];
		Object.assign(globalThis, { keyTimes: times });
		addEventListener(
			'keydown',
			({ timeStamp }) => {
				// A task that is queued in the frame runs once the frame has been laid out and painted.
				requestAnimationFrame(() => {
					const channel = new MessageChannel();
					channel.port1.onmessage = () => times.push(performance.now() - timeStamp);
					channel.port2.postMessage(null);
				});
			},
			{ capture: true }
		);
	});
	await page.keyboard.type(TEXT.repeat(3), { delay: BETWEEN_KEYS_MS });
	await page.waitForTimeout(1000);
	const times = await page.evaluate(
		() => (globalThis as unknown as { keyTimes: number[] }).keyTimes
	);
	await session.send('Emulation.setCPUThrottlingRate', { rate: 1 });
	return times.sort((a, b) => a - b);
}
