/**
 * The picture desk of the started server, over its real address and the store’s own protocol: what is taken, what is
 * refused and with which sentence, what is left behind, how much memory it costs; and the screen, by hand and keyboard.
 */
import { request as askHttp } from 'node:http';
import { randomBytes } from 'node:crypto';
import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { text } from 'node:stream/consumers';
import { setTimeout as pause } from 'node:timers/promises';
import type { Browser, Page } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { LARGEST_BYTES, type PictureView } from '../../src/lib/pictures/view.ts';
import { actAs } from '../support/actors.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import * as made from '../support/pictures.ts';
import { startHouse, type House } from '../support/server.ts';

let house: House;
let browser: Browser;
let page: Page;
let cookie: string;

beforeAll(async () => {
	house = await startHouse({ seed: 'people' });
	browser = await launchChromium();
	({ page } = await actAs(browser, house.origin, 'tamsin', {
		viewport: { width: 1440, height: 900 }
	}));
	cookie = (await page.context().cookies()).map(({ name, value }) => `${name}=${value}`).join('; ');
});
afterAll(async () => {
	await browser?.close();
	await house?.close();
});

interface Answer {
	status: number;
	body: {
		picture?: PictureView;
		error?: { code: string; message: string; help: string; details: Record<string, string> };
	};
}

/** Each over a connection of its own, as from people of their own. */
function send(bytes: Buffer, name: string, headers: Record<string, string> = {}): Promise<Answer> {
	return new Promise((resolve, reject) => {
		const asked = askHttp(
			`${house.origin}/api/pictures?name=${encodeURIComponent(name)}`,
			{
				method: 'POST',
				agent: false,
				headers: {
					cookie,
					origin: house.origin,
					'content-type': 'application/octet-stream',
					'content-length': bytes.length,
					...headers
				}
			},
			(response) => {
				text(response).then(
					(body) =>
						resolve({
							status: response.statusCode ?? 0,
							body: JSON.parse(body) as Answer['body']
						}),
					reject
				);
			}
		);
		asked.on('error', reject);
		asked.end(bytes);
	});
}

/** Names and contents of all that the store holds. */
async function stored(): Promise<Map<string, Buffer>> {
	const bucket = join(house.storeFolder, 'steelyard');
	const names = await readdir(bucket).catch(() => [] as string[]);
	const found = new Map<string, Buffer>();
	for (const name of names.filter((each) => each.endsWith('.json'))) {
		const { key } = JSON.parse(await readFile(join(bucket, name), 'utf8')) as { key: string };
		if (key.startsWith('pictures/'))
			found.set(key, await readFile(join(bucket, name.replace('.json', '.bytes'))));
	}
	return found;
}

async function residentBytes(): Promise<number> {
	const status = await readFile(`/proc/${house.pid()}/status`, 'utf8');
	return Number(/VmRSS:\s+(\d+) kB/.exec(status)?.[1]) * 1024;
}

const KINDS = {
	png: made.png,
	jpg: made.jpeg,
	webp: made.webp,
	avif: made.avif,
	svg: made.svg
};
type Kind = keyof typeof KINDS;
const kinds = Object.keys(KINDS) as Kind[];
const make = async (kind: Kind) => Buffer.from(await KINDS[kind]());

const html = Buffer.from('<!doctype html><title>Hello</title><script>1</script>');
const REFUSED: [name: string, why: string, bytes: () => Buffer | Promise<Buffer>][] = [
	['empty.png', 'empty', () => Buffer.alloc(0)],
	['notes.png', 'text', () => Buffer.from('This is a list of things to buy.\n')],
	['page.jpg', 'html', () => html],
	['page.svg', 'html', () => html],
	['feed.svg', 'xml', () => Buffer.from('<?xml version="1.0"?><rss version="2.0"/>')],
	['paper.png', 'pdf', () => Buffer.from('%PDF-1.7\n1 0 obj\n')],
	['all.webp', 'packed', made.emptyZip],
	['moving.gif', 'gif', made.movingGif],
	[
		'scan.png',
		'tiff',
		() =>
			sharp({ create: { width: 9, height: 9, channels: 3, background: '#fff' } })
				.tiff()
				.toBuffer()
	],
	['old.png', 'bmp', () => Buffer.from('BM' + '\0'.repeat(60), 'latin1')],
	['phone.avif', 'heic', () => Buffer.from('\0\0\0\x18ftypheic\0\0\0\0mif1heic', 'latin1')],
	['clip.avif', 'film', () => Buffer.from('\0\0\0\x18ftypisom\0\0\0\0isommp42', 'latin1')],
	['noise.png', 'unknown', () => Buffer.concat([Buffer.from([0, 0xfe]), randomBytes(4000)])],
	['moving.png', 'animated', made.movingPng],
	['moving.webp', 'animated', made.movingWebp],
	['both.png', 'hidden', async () => Buffer.concat([await made.png(), html])],
	['both.jpg', 'hidden', async () => Buffer.concat([await made.jpeg(), made.emptyZip()])],
	['wide.png', 'too-many-pixels', () => made.bombPng(16_000, 16_000)],
	['line.png', 'too-long', () => made.bombPng(200_000, 1)],
	['entities.svg', 'svg-entities', made.entityBomb],
	['repeats.svg', 'svg-tangled', made.useBomb],
	['script.svg', 'svg-script', () => made.svg('<script>1</script>')],
	['loads.svg', 'svg-outside', () => made.svg('<image href="http://127.0.0.1:9/a.png"/>')],
	['reads.svg', 'svg-outside', () => made.svg('<image href="file:///etc/passwd"/>')],
	['filter.svg', 'svg-part', () => made.svg('<filter id="f"/>')],
	['broken.svg', 'svg-broken', () => made.svg('<g>')],
	['huge.svg', 'too-many-pixels', () => made.svg('', 'width="1000000" height="1000000"')],
	['heavy.svg', 'svg-heavy', () => made.svg('<rect/>'.repeat(400_000))]
];

describe('what is sent', () => {
	test.each(kinds)('a good .%s is kept, and served to those who are signed in', async (kind) => {
		const { status, body } = await send(await make(kind), `good.${kind}`);
		expect(status).toBe(201);
		const { picture } = body;
		const all = await stored();
		for (const { digest, type, bytes } of picture!.files) {
			const name = `${digest}.${type === 'image/jpeg' ? 'jpg' : type.slice(6)}`;
			expect(all.get(`pictures/${name}`)?.length).toBe(bytes);
			const address = `${house.origin}/api/pictures/files/${name}`;
			const served = await fetch(address, { headers: { cookie } });
			expect(served.status).toBe(200);
			expect(served.headers.get('content-type')).toBe(type);
			expect(served.headers.get('x-content-type-options')).toBe('nosniff');
			expect(served.headers.get('content-security-policy')).toContain('sandbox');
			expect((await served.arrayBuffer()).byteLength).toBe(bytes);
			expect((await fetch(address)).status).toBe(401);
		}
	});

	test.each(REFUSED)('%s is refused: %s', async (name, why, bytes) => {
		const before = await stored();
		const { status, body } = await send(await bytes(), name);
		expect([status, body.error?.code, body.error?.details.why]).toEqual([
			422,
			'picture-refused',
			why
		]);
		expect(body.error?.details.says).toMatch(/^\S.{8,}\.$/);
		expect(body.error?.details.mend).toMatch(/^\S.{8,}\.$/);
		expect((await stored()).size).toBe(before.size);
	});

	test.each(kinds.flatMap((is) => kinds.filter((as) => as !== is).map((as) => [is, as] as const)))(
		'a .%s called .%s is refused by its name',
		async (is, as) => {
			const { status, body } = await send(await make(is), `renamed.${as}`);
			expect([status, body.error?.details.why]).toEqual([422, 'renamed']);
			expect(body.error?.details.says).toContain(`.${as}`);
			expect(body.error?.details.mend).toContain(`.${is}`);
		}
	);

	test.each(kinds.flatMap((kind) => [0.3, 0.7, 0.98].map((share) => [kind, share] as const)))(
		'a .%s of which only %d has come is refused as damaged',
		async (kind, share) => {
			const whole = await make(kind);
			const { status, body } = await send(
				whole.subarray(0, Math.floor(whole.length * share)),
				`cut.${kind}`
			);
			expect([status, body.error?.code]).toEqual([422, 'picture-refused']);
			expect(body.error?.details.why).toMatch(/^(?:damaged|svg-broken)$/);
		}
	);

	test('each reason has a sentence of its own', async () => {
		const sentences = new Map<string, string>();
		for (const [name, , bytes] of REFUSED) {
			const { why = '', says = '' } = (await send(await bytes(), name)).body.error?.details ?? {};
			sentences.set(why, why === 'too-many-pixels' ? 'pixels' : says);
		}
		expect(new Set(sentences.values()).size).toBe(sentences.size);
	});

	test('another kind by its header is refused', async () => {
		const { body } = await send(await make('png'), 'a.png', { 'content-type': 'image/jpeg' });
		expect(body.error?.details.why).toBe('declared');
	});

	test('a page elsewhere can’t send one, nor a stranger, nor a scientist', async () => {
		const bytes = await make('png');
		expect((await send(bytes, 'a.png', { origin: house.partner })).status).toBe(403);
		expect((await send(bytes, 'a.png', { cookie: '' })).status).toBe(401);
		const { context } = await actAs(browser, house.origin, 'ama');
		const theirs = (await context.cookies())
			.map(({ name, value }) => `${name}=${value}`)
			.join('; ');
		await context.close();
		expect((await send(bytes, 'a.png', { cookie: theirs })).status).toBe(403);
	});

	test('no stored file says where or with what it was taken', async () => {
		const { body } = await send(await made.telephoneJpeg(), 'telephone.jpg');
		expect([body.picture?.width, body.picture?.height]).toEqual([600, 800]);
		const traces = [
			'Exif',
			'eXIf',
			'EXIF',
			'xmpmeta',
			'http://ns.adobe.com/xap',
			'XMP ',
			'8BIM',
			'ICCP',
			'ICC_PROFILE',
			'iCCP',
			'Quorrel'
		];
		const all = await stored();
		expect(all.size).toBeGreaterThan(10);
		for (const [key, bytes] of all) {
			for (const trace of traces) expect(bytes.includes(trace), `${trace} in ${key}`).toBe(false);
		}
	});
});

/** Sends without saying how much, for as long as the server takes it; resolves to the answer’s status. */
function sendEndlessly(path: string, most: number): Promise<{ status: number; sent: number }> {
	return new Promise((resolve) => {
		let sent = 0;
		let over = false;
		const finish = (status: number) => {
			over = true;
			resolve({ status, sent });
		};
		const asked = askHttp(
			house.origin + path,
			{
				method: 'POST',
				headers: { cookie, origin: house.origin, 'content-type': 'application/octet-stream' }
			},
			(response) => {
				response.resume();
				finish(response.statusCode ?? 0);
				asked.destroy();
			}
		);
		asked.on('error', () => {
			if (!over) finish(0);
		});
		const piece = Buffer.alloc(256 * 1024, 0xff);
		void (async () => {
			while (!over && sent < most) {
				sent += piece.length;
				if (!asked.write(piece))
					await Promise.race([new Promise((go) => asked.once('drain', go)), pause(200)]);
				await pause(0);
			}
			if (!over) asked.end();
		})();
	});
}

describe('what is too large', () => {
	test('is refused by its announced length', async () => {
		const { status, body } = await send(Buffer.alloc(LARGEST_BYTES + 1, 0xff), 'large.jpg');
		expect([status, body.error?.code]).toEqual([413, 'picture-too-heavy']);
	});

	test('is cut off at the limit when it announces none', async () => {
		const { status, sent } = await sendEndlessly('/api/pictures?name=endless.jpg', 200e6);
		expect(status).toBe(413);
		expect(sent).toBeLessThan(60e6);
	});

	test('elsewhere is 512 kB as before, announced or not', async () => {
		const large = new Uint8Array(600_000).fill(0x20);
		const headers = { cookie, origin: house.origin, 'content-type': 'application/json' };
		const address = `${house.origin}/api/calculators/try`;
		const announced = await fetch(address, { method: 'POST', headers, body: large });
		expect(announced.status).toBe(413);
		const body = new Blob([large]).stream();
		const streamed = { method: 'POST', headers, body, duplex: 'half' } as RequestInit;
		expect((await fetch(address, streamed)).status).toBe(413);
	});
});

/** What 40 bad and huge uploads may add to the server’s resident memory, at its highest. */
const MOST_GROWTH = 64 * 1024 * 1024;

test(
	'memory stays flat while forty bad and huge uploads go through',
	{ timeout: 240_000 },
	async () => {
		const huge = Buffer.alloc(LARGEST_BYTES, 0xff);
		huge.set([0xff, 0xd8, 0xff, 0xe0]);
		const hugePng = made.bombPng(16_000, 16_000);
		const one = async (turn: number) => {
			switch (turn % 5) {
				case 0:
					return (await send(huge, 'huge.jpg')).status;
				case 1:
					return (await send(hugePng, 'huge.png')).status;
				case 2:
					return (await sendEndlessly('/api/pictures?name=endless.jpg', 60e6)).status;
				case 3:
					return (await send(made.useBomb(), 'bomb.svg')).status;
				default:
					return (await send(made.svg('<rect/>'.repeat(200_000)), 'heavy.svg')).status;
			}
		};
		// A first round, so that what is made once is there.
		for (let turn = 0; turn < 5; turn += 1) await one(turn);
		const kept = (await stored()).size;
		const before = await residentBytes();
		let highest = before;
		let watching = true;
		const watch = (async () => {
			while (watching) {
				highest = Math.max(highest, await residentBytes());
				await pause(20);
			}
		})();
		const statuses: number[] = [];
		for (let turn = 0; turn < 40; turn += 4) {
			statuses.push(...(await Promise.all([0, 1, 2, 3].map((more) => one(turn + more)))));
		}
		watching = false;
		await watch;
		expect(statuses).toHaveLength(40);
		for (const status of statuses) expect([413, 422]).toContain(status);
		const growth = highest - before;
		expect(growth, `on ${Math.round(before / 1e6)} MB`).toBeLessThan(MOST_GROWTH);
		expect((await stored()).size).toBe(kept);
	}
);

test(
	'fifty at once are taken or told to wait; nothing is left half',
	{ timeout: 120_000 },
	async () => {
		const bytes = await made.jpeg(400, 300);
		const answers = await Promise.all(
			Array.from({ length: 50 }, (_, index) => send(bytes, `many-${index}.jpg`))
		);
		for (const { status } of answers) expect([201, 429]).toContain(status);
		expect(answers.filter(({ status }) => status === 201).length).toBeGreaterThanOrEqual(20);
	}
);

describe('at the desk', () => {
	const files = () => page.getByRole('list', { name: 'Files' });

	test('by button, several at once, each with its sentence', async () => {
		await page.goto(`${house.origin}/pictures`);
		await page.waitForLoadState('networkidle');
		await page.getByLabel('Pictures to add').setInputFiles([
			{ name: 'pendulum.png', mimeType: 'image/png', buffer: await made.png() },
			{ name: 'notes.png', mimeType: 'image/png', buffer: Buffer.from('Not a picture.') },
			{ name: 'arc.svg', mimeType: 'image/svg+xml', buffer: made.svg() },
			{ name: 'large.jpg', mimeType: 'image/jpeg', buffer: Buffer.alloc(LARGEST_BYTES + 1, 1) }
		]);
		await page.getByText('2 pictures kept. 2 not taken.').waitFor({ state: 'attached' });
		const rows = files().getByRole('listitem');
		expect(await rows.filter({ hasText: 'notes.png' }).innerText()).toContain(
			'This is text, not a picture. Choose the picture itself.'
		);
		expect(await rows.filter({ hasText: 'large.jpg' }).innerText()).toContain('larger than 10 MB');
		await page.getByRole('link', { name: /pendulum\.png/ }).waitFor();
		await expectNoAxeFindings(page);
	});

	const handOver = (kind: 'drop' | 'paste', bytes: Buffer, name: string) =>
		page.evaluate(
			({ kind, base64, name }) => {
				const raw = Uint8Array.from(atob(base64), (character) => character.charCodeAt(0));
				const data = new DataTransfer();
				data.items.add(new File([raw], name, { type: 'image/png' }));
				const event =
					kind === 'drop'
						? new DragEvent('drop', { dataTransfer: data, bubbles: true, cancelable: true })
						: new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true });
				document.body.dispatchEvent(event);
			},
			{ kind, base64: bytes.toString('base64'), name }
		);

	test.each(['drop', 'paste'] as const)('by %s', async (kind) => {
		await page.goto(`${house.origin}/pictures`);
		await page.waitForLoadState('networkidle');
		await handOver(kind, await made.png(), `by-${kind}.png`);
		await page.getByRole('link', { name: new RegExp(`by-${kind}\\.png`) }).waitFor();
	});

	test('one that is stopped on its way leaves nothing', async () => {
		await page.goto(`${house.origin}/pictures`);
		await page.waitForLoadState('networkidle');
		const before = (await stored()).size;
		const wire = await page.context().newCDPSession(page);
		const slow = { offline: false, latency: 0, downloadThroughput: -1, uploadThroughput: 500_000 };
		await wire.send('Network.emulateNetworkConditions', slow);
		const noise = await sharp(randomBytes(1200 * 1200 * 3), {
			raw: { width: 1200, height: 1200, channels: 3 }
		})
			.png()
			.toBuffer();
		await page
			.getByLabel('Pictures to add')
			.setInputFiles([{ name: 'slow.png', mimeType: 'image/png', buffer: noise }]);
		await page.getByRole('progressbar', { name: /slow\.png, [1-9]\d? per cent sent/ }).waitFor();
		await page.getByRole('button', { name: 'Stop slow.png' }).click();
		await page.getByText('stopped; nothing of it is kept').waitFor();
		await wire.send('Network.emulateNetworkConditions', { ...slow, uploadThroughput: -1 });
		await pause(500);
		expect((await stored()).size).toBe(before);
		// And once more, to the end.
		await page.getByRole('button', { name: 'Send slow.png again' }).click();
		await page.getByRole('link', { name: /slow\.png/ }).waitFor();
	});

	test('a record is filled in with the keyboard until the picture is ready', async () => {
		await page.goto(`${house.origin}/pictures`);
		await page.waitForLoadState('networkidle');
		await page.keyboard.press('/');
		await page.keyboard.type('pendulum');
		await page.getByText(/^1 of \d+$/).waitFor();
		await page.getByRole('link', { name: /pendulum\.png/ }).focus();
		await page.keyboard.press('Enter');
		const record = page.getByRole('region', { name: 'Record' });
		await record.getByRole('button', { name: 'Keep the record' }).press('Enter');
		await record.getByText('There is no licence.').waitFor();
		expect(await record.locator('[aria-invalid="true"]').count()).toBeGreaterThanOrEqual(4);
		await expectNoAxeFindings(page);

		await record.getByLabel('Description').fill('A pendulum hangs still from a nail.');
		await record.getByLabel('Diagram').press('Space');
		await record.getByLabel('Not to scale').press('Space');
		await record.getByLabel('Creator').fill('The graphics desk');
		await record.getByLabel('Credit line').fill('Varrowmere Institute');
		await record.getByLabel('Licence').selectOption({ label: 'CC BY 4.0' });
		await record.getByLabel('Source').fill('Drawn for this piece');
		await record.getByLabel('nobody').press('Space');
		await record.getByText('Complete: it can be used.').waitFor();
		await record.getByLabel('Source').press('Enter');
		await record.getByText('Kept.').waitFor();
		await page.reload();
		expect(await record.getByLabel('Description').inputValue()).toContain('pendulum hangs');
		await page.getByRole('link', { name: /pendulum\.png.*ready to use/ }).waitFor();
	});

	test('someone else’s record isn’t written over', async () => {
		const other = await page.context().newPage();
		await other.goto(page.url());
		await other.waitForLoadState('networkidle');
		await other.getByLabel('Credit line').fill('Another credit');
		await other.getByRole('button', { name: 'Keep the record' }).click();
		await other.getByText('Kept.').waitFor();
		await other.close();
		await page.getByLabel('Credit line').fill('My credit');
		await page.getByRole('button', { name: 'Keep the record' }).click();
		await page.getByText('Tamsin Orrelby changed this record').waitFor();
		expect(await page.getByLabel('Credit line').inputValue()).toBe('My credit');
		await page.getByRole('button', { name: 'Take theirs' }).click();
		expect(await page.getByLabel('Credit line').inputValue()).toBe('Another credit');
	});

	test('an unused one is deleted, with its files, after being asked once more', async () => {
		await page.goto(`${house.origin}/pictures`);
		await page.getByRole('link', { name: /by-paste\.png/ }).click();
		await page.getByRole('button', { name: 'Delete it' }).click();
		await page.getByRole('button', { name: 'Delete', exact: true }).click();
		await page.waitForURL(`${house.origin}/pictures`);
		await page.getByRole('link', { name: /by-drop\.png/ }).waitFor();
		expect(await page.getByRole('link', { name: /by-paste\.png/ }).count()).toBe(0);
	});

	test.each([
		{ width: 1440, height: 900, colorScheme: 'light' },
		{ width: 768, height: 1024, colorScheme: 'light' },
		{ width: 390, height: 844, colorScheme: 'dark' }
	] as const)('at $width pixels, $colorScheme', async ({ width, height, colorScheme }) => {
		await page.setViewportSize({ width, height });
		await page.emulateMedia({ colorScheme });
		for (const open of [
			() => page.goto(`${house.origin}/pictures`),
			() => page.getByRole('link', { name: /pendulum\.png/ }).click()
		]) {
			await open();
			await page.waitForLoadState('networkidle');
			await expectNoAxeFindings(page);
			const overflow = await page.evaluate(
				() => document.documentElement.scrollWidth - document.documentElement.clientWidth
			);
			expect(overflow).toBeLessThanOrEqual(0);
		}
	});

	test('a scientist looks, and changes nothing', async () => {
		const { page: theirs, context } = await actAs(browser, house.origin, 'ama');
		await theirs.goto(`${house.origin}/pictures`);
		expect(await theirs.getByRole('button', { name: 'Add pictures' }).count()).toBe(0);
		await theirs.getByRole('link', { name: /pendulum\.png/ }).click();
		await theirs.getByRole('heading', { name: 'Where it stands' }).waitFor();
		expect(await theirs.getByRole('button', { name: 'Keep the record' }).count()).toBe(0);
		expect(await theirs.getByLabel('Creator').isDisabled()).toBe(true);
		await context.close();
	});
});
