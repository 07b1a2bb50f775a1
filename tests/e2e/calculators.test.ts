/** The Calculators room in a browser: found by a question, read, tried, plotted, taken away as a file. */
import { readFile } from 'node:fs/promises';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { catalogue } from '../../src/lib/physics/calculators/index.ts';
import { runCalculator } from '../../src/lib/physics/calculators/run.ts';
import { EDITION_IN_USE } from '../../src/lib/physics/constants/index.ts';
import { actAs } from '../support/actors.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import { startHouse, type House } from '../support/server.ts';

let house: House;
let browser: Browser;
let context: BrowserContext;
let page: Page;
const faults: string[] = [];

beforeAll(async () => {
	house = await startHouse({ seed: 'demo' });
	browser = await launchChromium();
	({ context, page } = await actAs(browser, house.origin, 'mateus', { acceptDownloads: true }));
	page.on('pageerror', (error) => faults.push(error.message));
});
afterAll(async () => {
	await context?.close();
	await browser?.close();
	await house?.close();
});

const open = (path: string) => page.goto(`${house.origin}${path}`, { waitUntil: 'networkidle' });
const plot = () => page.getByRole('region', { name: 'Plot', exact: true });

async function openPlot(id: string): Promise<void> {
	await open(`/calculators/${id}`);
	await plot().getByRole('heading', { name: 'Plot' }).click();
	await plot()
		.getByText(/^All \d+ points as a table$/)
		.waitFor();
}

/** The path that is drawn, as the starts of its pieces. */
const pieces = async () =>
	(await plot().locator('.sy-chart-line').getAttribute('d'))!.split('M').slice(1);

describe('the shelf', () => {
	test.each([
		['how far does light travel in a year?', 'How long light is on its way'],
		['how old is the universe', 'Expanding universe'],
		['does an iceberg float', 'Floating and sinking']
	])('“%s” leads to its calculator, and says why', async (question, title) => {
		await open('/calculators');
		await page.getByRole('searchbox').fill(question);
		const first = page.getByRole('list', { name: 'What answers' }).getByRole('listitem').first();
		await expect.poll(() => first.innerText()).toContain(title);
		expect(await first.innerText()).toMatch(/“.+”|gives|takes|by its title/);
		await page.getByRole('searchbox').press('Enter');
		await page.getByRole('heading', { level: 1, name: title }).waitFor();
	});

	test('without a question all stand under their fields', async () => {
		await open('/calculators');
		const shelf = page.getByRole('navigation', { name: 'Calculators' });
		for (const { title } of catalogue.values())
			expect(await shelf.getByRole('link', { name: title }).count(), title).toBeGreaterThan(0);
		expect(await shelf.getByRole('heading', { name: 'Early hydrogen' }).count()).toBe(1);
	});

	test('a search that nothing answers says what to try', async () => {
		await open('/calculators');
		await page.getByRole('searchbox').fill('zzz');
		await page.getByText('No calculator answers to that.').waitFor();
	});
});

describe('the cards', () => {
	test('on every card all published values agree, worked in this browser; a card without any says so', async () => {
		for (const { id, checks } of catalogue.values()) {
			await page.goto(`${house.origin}/calculators/${id}`, { waitUntil: 'domcontentloaded' });
			if (checks.length === 0) {
				await page.getByText('No published value is listed for this one').waitFor();
				continue;
			}
			await page.getByText(`${checks.length} of ${checks.length} agree`).first().waitFor();
			const rows = page.getByRole('region', { name: 'Check values' }).locator('tbody tr');
			expect(await rows.count(), id).toBe(checks.length);
			expect(await rows.getByText('agrees', { exact: true }).count(), id).toBe(checks.length);
		}
		await open('/calculators/cosmo.at_z');
		await page.getByRole('button', { name: 'Run them again' }).click();
		await page.getByText(/^Worked again: 14 of 14 agree, in [\d.]+ ms\.$/).waitFor();
	});

	test('the pieces that use a calculator are named, with their release', async () => {
		await open('/calculators/line.observe');
		const uses = page.getByRole('complementary');
		await uses.getByText(/^Used in one piece, for \d numbers\.$/).waitFor();
		expect(await uses.getByRole('link', { name: /^First light/ }).count()).toBe(1);
	});

	test('a setting outside the domain is refused in words, never printed as no number', async () => {
		await open('/calculators/cosmo.at_z');
		await page.getByLabel('Redshift', { exact: true }).first().fill('-3');
		await page.getByText(/^No reading\./).waitFor();
		expect(await page.getByRole('article').innerText()).not.toMatch(/\bNaN\b|Infinity/);
	});
});

describe('the plot', () => {
	test('draws any output against any input, a refused stretch as a gap, and says so', async () => {
		await openPlot('cosmo.at_z');
		await plot().getByLabel('Up: what it gives').selectOption({ label: 'Expansion rate' });
		await plot().getByLabel('Along: what it takes').selectOption({ label: 'Redshift' });
		await plot().getByLabel('level scale log').uncheck();
		await plot()
			.getByLabel(/^From(,|$)/)
			.fill('-2');
		await plot()
			.getByLabel(/^To(,|$)/)
			.fill('3');
		await plot()
			.getByText(/^No reading from −2 to /)
			.waitFor();
		const [only, ...others] = await pieces();
		expect(others).toEqual([]);
		// The line starts a fifth along or more: below −1 there is no Universe to read.
		expect(Number(only!.split(' ')[0])).toBeGreaterThan(190);
		await plot().getByText('both scales even').waitFor();
		await plot().getByLabel('upright scale log').check();
		await plot().getByText('upright scale log, level scale even').waitFor();
	});

	test('a choice of ends that can’t be drawn is told', async () => {
		await openPlot('cosmo.at_z');
		await plot()
			.getByLabel(/^From(,|$)/)
			.fill('5');
		await plot()
			.getByLabel(/^To(,|$)/)
			.fill('1');
		await plot().getByText('The first end must lie below the last.').waitFor();
	});

	test('goes into a file: provenance, units, and the numbers the calculator reads', async () => {
		await openPlot('projectile.vacuum');
		await plot().getByLabel('Up: what it gives').selectOption({ label: 'Range' });
		await plot()
			.getByLabel('Along: what it takes')
			.selectOption({ label: 'Angle above the horizontal' });
		await plot()
			.getByLabel(/^From(,|$)/)
			.fill('0');
		await plot()
			.getByLabel(/^To(,|$)/)
			.fill('90');
		await plot().getByText('Range by Angle above the horizontal').waitFor();
		await expect.poll(async () => (await pieces()).length).toBe(1);
		const downloading = page.waitForEvent('download');
		await plot().getByRole('button', { name: 'Download CSV' }).click();
		const download = await downloading;
		const { revision } = catalogue.get('projectile.vacuum')!;
		expect(download.suggestedFilename()).toBe(
			`projectile.vacuum-${revision}-range-by-angle_deg.csv`
		);
		const lines = (await readFile(await download.path(), 'utf8')).split('\r\n');
		const head = lines.findIndex((line) => !/^"?#/.test(line));
		const told = lines.slice(0, head).join('\n');
		expect(told).toContain(`projectile.vacuum), revision ${revision}`);
		expect(told).toContain(`edition ${EDITION_IN_USE}`);
		expect(told).toMatch(/# setting: .*\(v0_ms\) = [\d.]+ m\/s/);
		expect(lines[head]).toBe('Angle above the horizontal (deg),Range (m),Note');
		const rows = lines.slice(head + 1, -1).map((line) => line.split(','));
		expect(rows).toHaveLength(200);
		const speed = Number(/\(v0_ms\) = ([\d.]+)/.exec(told)![1]);
		for (const [angle, range] of [rows[0]!, rows[77]!, rows[199]!]) {
			const direct = runCalculator(catalogue.get('projectile.vacuum')!, {
				v0_ms: speed,
				angle_deg: Number(angle)
			});
			expect(direct.ok && direct.outputs.range?.value).toBe(Number(range));
		}
	});
});

describe('the constants', () => {
	test('each edition shows its values, how well they are known, and where they were printed', async () => {
		await open('/calculators');
		await page.getByRole('link', { name: EDITION_IN_USE, exact: true }).click();
		await page.getByRole('heading', { level: 1, name: `Constants ${EDITION_IN_USE}` }).waitFor();
		const row = page.getByRole('row', { name: /^Newtonian constant of gravitation/ });
		expect(await row.innerText()).toMatch(/6\.674\s30\(15\)\s×\s10⁻¹¹\s.*2\.2\s×\s10⁻⁵/s);
		expect(await row.getByRole('link').getAttribute('href')).toMatch(/^https:\/\/doi\.org\/10\./);
	});

	test('the other edition stands beside it, and what differs is told value by value', async () => {
		await open('/calculators');
		await page.getByRole('link', { name: '2026.2', exact: true }).click();
		await page.getByRole('heading', { level: 1, name: 'Constants 2026.2' }).waitFor();
		const differences = page.getByRole('region', { name: 'What differs from 2026.1' });
		const rows = differences.locator('tbody tr');
		expect(await rows.count()).toBe(7);
		expect(await rows.filter({ hasText: 'electron mass' }).innerText()).toMatch(
			/9\.109\s383\s7139\(28\)\s×\s10⁻³¹\s+9\.109\s383\s7015\(28\)\s×\s10⁻³¹\s+kg\s+\+1\.4\s×\s10⁻⁹\s+\+4\.4/
		);
		const nature = page.getByRole('region', { name: 'Constants of nature' });
		const row = nature.getByRole('row', { name: /^electron mass/ });
		expect(await row.getByRole('link').getAttribute('href')).toBe(
			'https://doi.org/10.1103/RevModPhys.97.025002'
		);
		await page.getByRole('link', { name: 'How fast a gas moves' }).last().click();
		await page.getByRole('heading', { level: 1, name: 'How fast a gas moves' }).waitFor();
	});
});

describe('the room holds at every width, light and dark', () => {
	test.each([1440, 768, 390])('%i', async (width) => {
		await page.setViewportSize({ width, height: 900 });
		for (const colorScheme of ['light', 'dark'] as const) {
			await page.emulateMedia({ colorScheme });
			for (const path of [
				'/calculators',
				'/calculators/cosmo.at_z',
				'/calculators/unc.power',
				`/calculators/constants/${EDITION_IN_USE}`,
				'/calculators/constants/2026.2'
			]) {
				if (path.endsWith('at_z')) await openPlot('cosmo.at_z');
				else await open(path);
				await expectNoAxeFindings(page);
				const beyond = await page.evaluate(
					() => document.documentElement.scrollWidth - document.documentElement.clientWidth
				);
				expect(beyond, `${path} scrolls sideways`).toBe(0);
			}
		}
		await page.emulateMedia({ colorScheme: null });
	});
});

test('nothing broke on the way', () => {
	expect(faults).toEqual([]);
});
