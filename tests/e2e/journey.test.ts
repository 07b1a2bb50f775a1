/**
 * The whole job, by hand, on the built server: a writer composes “First light on the dial” from an empty sheet, a
 * scientist queries and signs, another passes and releases, and readers on a partner's page move the slider.
 */
import { execFileSync } from 'node:child_process';
import type { Browser, BrowserContext, Frame, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { convert } from '../../src/lib/physics/units/units.ts';
import { printStated, stateReading } from '../../src/lib/widget/stated.ts';
import { actAs } from '../support/actors.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import { startHouse, type House } from '../support/server.ts';

const SLUG = 'first-light-on-the-dial';
const ROOT = new URL('../../', import.meta.url).pathname;

let house: House;
let browser: Browser;
beforeAll(async () => {
	house = await startHouse({ seed: 'people' });
	browser = await launchChromium();
});

/** A person at a browser of their own; a control that doesn't come within ten seconds isn't there. */
async function seat(who: Parameters<typeof actAs>[2]) {
	const seated = await actAs(browser, house.origin, who);
	seated.page.setDefaultTimeout(10_000);
	return seated;
}
afterAll(async () => {
	await browser?.close();
	await house?.close();
});

/** Copy as it is read: no-break spaces are spaces. */
const plain = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

/** What `npm run calc` gives for a wave of this age: the words the result sentence must hold. */
function calcWords(ageMyr: number): { frequency: string; crest: string } {
	const ask = (calculator: string, inputs: Record<string, unknown>) => {
		const answer = execFileSync('npm', ['run', '--silent', 'calc'], {
			cwd: ROOT,
			input: `${JSON.stringify({ calculator, inputs })}\n`,
			encoding: 'utf8'
		});
		return (JSON.parse(answer) as { outputs: Record<string, { value: number; unit: string }> })
			.outputs;
	};
	const age = ask('cosmo.inverse', {
		cosmology: { set: 'Planck18' },
		kind: 'z_from_age',
		value: convert(ageMyr, 'Myr', 'Gyr')
	});
	const line = ask('line.observe', { restFrequency_Hz: 1420405751.768, z: age.z?.value });
	const print = (key: string, unit: string, hedge: 'none' | 'about') => {
		const output = line[key];
		if (!output) throw new Error(`calc gave no ${key}`);
		const stated = stateReading(output.value, output.unit, { unit, figures: 2, hedge });
		return plain(printStated(stated));
	};
	return {
		frequency: print('observedFrequency', 'MHz', 'about'),
		crest: print('observedWavelength', 'm', 'none')
	};
}

describe('first light on the dial', { timeout: 120_000 }, () => {
	let writer: { context: BrowserContext; page: Page };
	let checker: { context: BrowserContext; page: Page };
	let proofId = '';

	test('the writer composes it from an empty sheet', async () => {
		writer = await seat('tamsin');
		const { page } = writer;
		await page.getByRole('button', { name: 'New slip' }).click();
		await page.getByLabel('Title').fill('First light on the dial');
		await page.keyboard.press('Enter');
		await page.waitForURL(`**/pieces/${SLUG}/manuscript`);
		await expectNoAxeFindings(page);

		const manuscript = page.getByRole('textbox', { name: 'Manuscript' });
		await manuscript.click();
		await page.keyboard.press('Control+Home');
		await page.keyboard.press('Enter');
		await page.keyboard.type('Space has grown, so the note we catch tells us when it left.');
		await page.keyboard.press('Enter');
		await page.keyboard.type('Cold hydrogen gives off a faint radio wave at 1420 megahertz. ');
		await page.keyboard.type(
			'From the days of the first stars it comes in about 21 times as long.'
		);

		await wireTheBench(page);

		await manuscript.click();
		await page.keyboard.press('Control+End');
		await page.keyboard.press('Enter');
		await insert(page, 'result');
		await page.keyboard.type(
			'A wave that left 180 million years after the Big Bang arrives today at about 68 megahertz'
		);
		await page.keyboard.type(', each crest 4.4 metres from the next.');

		await tieNext(page, '1420 megahertz', /^Frequency, at rest/);
		await tieNext(page, 'about 21 times', /^B/);
		await tieNext(page, '180 million years', /The wave left at this age/);
		await tieNext(page, 'about 68 megahertz', /^Print it live here/);
		await tieNext(page, '4.4 metres', /^Print it live here/);

		await manuscript.click();
		await page.keyboard.press('Control+End');
		await page.keyboard.press('Enter');
		await insert(page, 'control:');
		await insert(page, 'chart: line');
		const chart = page.getByRole('form', { name: 'Line chart' });
		await chart
			.getByLabel(/^Reading, upwards/)
			.selectOption({ label: 'D · Frequency as observed, Redshifted line' });
		await chart.getByLabel('Title').fill('Where the wave arrives on today’s radio dial');
		await chart.getByLabel(/^Unit/).selectOption('MHz');
		await chart.getByLabel('Source').fill('Planck Collaboration 2018 VI; Hellwig and others 1970');
		await chart
			.getByLabel(/^Description/)
			.fill(
				'A line that climbs: the later a wave left, the higher the frequency at which it arrives.'
			);
		await chart.getByRole('button', { name: 'Put the chart in' }).click();

		await expect
			.poll(() => page.getByRole('status', { name: 'Keeping' }).innerText())
			.toMatch(/^kept \d\d:\d\d:\d\d/);
		await expectNoAxeFindings(page);
	});

	test('the proof is pulled when nothing is missing', async () => {
		const { page } = writer;
		await page.getByRole('button', { name: 'Pull proof' }).click();
		await page.waitForURL(`**/pieces/${SLUG}/check`);
		await expect
			.poll(async () => plain(await page.locator('main').innerText()))
			.toContain('1420 megahertz');
	});

	test('a scientist queries one claim, the writer answers, the scientist signs all four', async () => {
		checker = await seat('anselm');
		const { page } = checker;
		await page.goto(`${house.origin}/pieces/${SLUG}/check`);
		await expectNoAxeFindings(page);
		await page.keyboard.press('2');
		await page.getByLabel(/^Your query on 1a/).fill('Which line of hydrogen is this?');
		await page.getByRole('button', { name: 'Send the query' }).click();
		await onClaim(page, '1b');
		await walkTo(page, '1a');
		await page.getByText('Which line of hydrogen is this?').first().waitFor();

		await writer.page.goto(`${house.origin}/pieces/${SLUG}/check`);
		await walkTo(writer.page, '1a');
		await writer.page.getByLabel('Your answer').fill('The 21 centimetre line, at rest.');
		await writer.page.getByRole('button', { name: 'Answer', exact: true }).click();
		await writer.page.getByText('The 21 centimetre line, at rest.').first().waitFor();
		await expectNoAxeFindings(writer.page);

		await page.reload();
		await walkTo(page, '1a');
		await page.getByRole('button', { name: 'Accept the answer' }).click();
		await page.getByText(/^Settled,/).waitFor();
		proofId = await page.locator('input[name="proofId"]').first().inputValue();
		for (const label of ['1a', '1b', '2a', '2b']) {
			await onClaim(page, label);
			await page.keyboard.press('1');
			await page.getByText(`Signed ${label}`).first().waitFor();
		}
	});

	test('who has checked can’t also pass it, on the page or past it', async () => {
		const { page, context } = checker;
		await page.goto(`${house.origin}/pieces/${SLUG}/release`);
		await page
			.getByText(/neither written nor checked this proof passes it/)
			.first()
			.waitFor();
		expect(await page.getByRole('button', { name: 'Pass for press' }).count()).toBe(0);
		const answer = await context.request.post(`${house.origin}/pieces/${SLUG}/release?/pass`, {
			headers: { origin: house.origin, accept: 'text/html' },
			form: { proofId }
		});
		expect(answer.status()).toBe(403);
		expect(await answer.text()).toContain('three people');
	});

	test('the editor passes and releases it', async () => {
		const { page, context } = await seat('perpetua');
		await page.goto(`${house.origin}/pieces/${SLUG}/release`);
		await expectNoAxeFindings(page);
		await page.getByRole('button', { name: 'Pass for press' }).click();
		await page.getByRole('button', { name: 'Release', exact: true }).click();
		await page
			.getByText(/Release 1/)
			.first()
			.waitFor();
		await expectNoAxeFindings(page);
		await context.close();
	});
});

describe('on a partner’s page, on another host', { timeout: 60_000 }, () => {
	async function openPartner(options: Parameters<Browser['newContext']>[0] = {}) {
		const context = await browser.newContext({
			viewport: { width: 1200, height: 1400 },
			...options
		});
		const page = await context.newPage();
		const hosts = new Set<string>();
		page.on('request', (request) => hosts.add(new URL(request.url()).host));
		await page.goto(`${house.partner}/${SLUG}`);
		const element = await page.locator('iframe').elementHandle();
		const frame = await element?.contentFrame();
		if (!frame) throw new Error('the partner’s page has no frame');
		await frame.waitForLoadState();
		return { context, page, frame, hosts };
	}

	const said = async (frame: Frame) =>
		plain(await frame.locator('body').innerText()).replace(/\s+/g, ' ');

	async function expectAge(frame: Frame, ageMyr: number): Promise<void> {
		const { frequency, crest } = calcWords(ageMyr);
		await expect.poll(() => said(frame)).toContain(`A wave that left ${ageMyr} million years`);
		const text = await said(frame);
		expect(text).toContain(frequency);
		expect(text).toContain(crest);
	}

	test('it states the default reading, from that page and our host alone, and sets no cookie', async () => {
		const { context, page, frame, hosts } = await openPartner();
		await expectAge(frame, 180);
		expect([...hosts].sort()).toEqual(
			[new URL(house.partner).host, new URL(house.origin).host].sort()
		);
		expect(await context.cookies()).toEqual([]);
		await expectNoAxeFindings(page);
		await context.close();
	});

	test('the slider moves by mouse, by key and by its plates, to what calc gives', async () => {
		const { context, page, frame } = await openPartner();
		const slider = frame.getByRole('slider', { name: /The wave left at this age/ });
		await slider.press('ArrowRight');
		await expectAge(frame, 190);
		await slider.press('End');
		await expectAge(frame, 500);
		await frame
			.getByRole('button', { name: /less|lower|decrease|−/i })
			.first()
			.click();
		await expectAge(frame, 490);

		const box = await slider.boundingBox();
		if (!box) throw new Error('the slider has no box');
		await page.mouse.move(box.x + box.width / 2, box.y + box.height / 2);
		await page.mouse.down();
		await page.mouse.move(box.x + box.width * 0.3, box.y + box.height / 2, { steps: 5 });
		await page.mouse.up();
		const age = Number(await slider.inputValue());
		expect(age).toBeGreaterThan(180);
		expect(age).toBeLessThan(290);
		await expectAge(frame, age);
		await context.close();
	});

	test('the slider moves by touch', async () => {
		const { context, page, frame } = await openPartner({
			hasTouch: true,
			isMobile: true,
			viewport: { width: 390, height: 844 }
		});
		const slider = frame.getByRole('slider', { name: /The wave left at this age/ });
		await slider.scrollIntoViewIfNeeded();
		const box = await slider.boundingBox();
		if (!box) throw new Error('the slider has no box');
		await page.touchscreen.tap(box.x + box.width * 0.75, box.y + box.height / 2);
		await expect.poll(async () => Number(await slider.inputValue())).toBeGreaterThan(350);
		await expectAge(frame, Number(await slider.inputValue()));
		await context.close();
	});

	test('with script off it still states the default reading', async () => {
		const { context, frame } = await openPartner({ javaScriptEnabled: false });
		await expectAge(frame, 180);
		expect(await frame.getByRole('slider').count()).toBe(0);
		await context.close();
	});
});

describe('a signature lapses', { timeout: 60_000 }, () => {
	test('when one character of its sentence changes, and no other does', async () => {
		const { page, context } = await seat('tamsin');
		await page.goto(`${house.origin}/pieces/${SLUG}/manuscript`);
		const manuscript = page.getByRole('textbox', { name: 'Manuscript' });
		await manuscript.getByText('gives off a faint radio wave').click({ position: { x: 4, y: 8 } });
		await page.keyboard.press('Home');
		await page.keyboard.press('Delete');
		await page.keyboard.type('c');
		const foot = page.getByText(/If kept, .*lapse/);
		await expect.poll(() => foot.innerText()).toMatch(/1a/);
		expect(await foot.innerText()).not.toMatch(/1b|2a|2b/);
		await page.keyboard.press('Control+z');
		await context.close();
	});
});

/** Waits until this claim is the one on the sheet. */
async function onClaim(page: Page, label: string): Promise<void> {
	await page.getByRole('region', { name: 'The claim' }).getByText(label, { exact: true }).waitFor();
}

/** Goes from claim to claim by key until this one is on the sheet. */
async function walkTo(page: Page, label: string): Promise<void> {
	const here = page.getByRole('region', { name: 'The claim' }).getByText(label, { exact: true });
	await page.getByRole('region', { name: 'The claim' }).waitFor();
	for (let step = 0; step < 12 && !(await here.isVisible()); step += 1) {
		await page.keyboard.press('j');
		await page.waitForTimeout(100);
	}
	await onClaim(page, label);
}

async function wireTheBench(page: Page): Promise<void> {
	const bench = page.getByRole('region', { name: 'Bench' });
	await page.keyboard.press('Control+b');
	await addCalculator(page, 'age to redshift');

	const age = bench.getByRole('region', { name: 'Age or distance to redshift' });
	await age.getByRole('button', { name: /Make a control of this/ }).click();
	await bench.getByLabel('What it moves').fill('The wave left at this age');
	await bench.locator('form').getByLabel(/^Unit/).selectOption('Myr');
	for (const [label, value] of [
		['From', '100'],
		['To', '500'],
		['Step', '10'],
		['Starts at', '180']
	] as const) {
		await bench.getByLabel(label, { exact: true }).fill(value);
	}
	await bench.getByRole('button', { name: 'Make the control' }).click();

	await addCalculator(page, 'redshifted line');
	const line = bench.getByRole('region', { name: 'Redshifted line' });
	await line.getByRole('button', { name: 'Choose a line…' }).click();
	await page.keyboard.type('21 cm');
	await page.keyboard.press('Enter');
	await line
		.getByRole('combobox', { name: /^Source of Redshift/ })
		.selectOption({ label: 'A · Redshift' });
}
async function addCalculator(page: Page, question: string): Promise<void> {
	const bench = page.getByRole('region', { name: 'Bench' });
	await bench.getByRole('button', { name: 'Add a calculator' }).click();
	await page.getByRole('combobox', { name: 'Find a calculator' }).fill(question);
	await page.keyboard.press('Enter');
}
async function insert(page: Page, kind: string): Promise<void> {
	await page.keyboard.type('/');
	await page.getByRole('combobox', { name: 'Insert' }).fill(kind);
	await page.keyboard.press('Enter');
}
async function tieNext(page: Page, words: string, option: RegExp): Promise<void> {
	await page.keyboard.press('Control+.');
	await page.keyboard.type('=');
	const list = page.getByRole('listbox', { name: 'Tie to a reading' });
	await expect.poll(async () => plain(await list.locator('..').innerText())).toContain(words);
	await list.getByRole('option', { name: option }).first().click();
}
