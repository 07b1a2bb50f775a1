/**
 * A scientist adds a calculator of the house, a second one vets it, a writer finds it by a question and uses it in a
 * chain, and readers move a slider whose number it works out in their browser. Then it is revised, and taken out of use:
 * the people of the piece find it flagged.
 */
import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { DEMO_PASSPHRASE, DEMO_PEOPLE } from '../../src/lib/server/demo/people.ts';
import { actAs } from '../support/actors.ts';
import { expectNoAxeFindings } from '../support/axe.ts';
import { launchChromium } from '../support/chromium.ts';
import { startHouse, type House } from '../support/server.ts';

const SLUG = 'thunder-on-its-way';
const CARD = '/calculators/house.sound-in-air';

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

async function seat(who: Parameters<typeof actAs>[2]) {
	const seated = await actAs(browser, house.origin, who);
	seated.page.setDefaultTimeout(20_000);
	return seated;
}

const plain = (text: string) => text.replace(/[\u00a0\u202f\u2060]/g, ' ');

/** How long something that follows from an act may take on a busy machine. */
const SOON = { timeout: 15_000 };

/** Writes into the fields of one part by their labels. */
async function fill(part: Locator, fields: Record<string, string>): Promise<void> {
	for (const [label, value] of Object.entries(fields)) {
		await part.getByLabel(label, { exact: true }).fill(value);
	}
}

/**
 * Sound in dry air as an ideal gas, v = √(γ k T / m). The check values are those OpenStax, University Physics Volume 1,
 * §17.2 prints for 0 °C and 20 °C, and at 40 °C what its formula gives; recalled, not read again.
 */
const PRINTED = [
	{ kelvins: '273.15', metresASecond: '331' },
	{ kelvins: '293.15', metresASecond: '343' },
	{ kelvins: '313.15', metresASecond: '354' }
];

async function write(page: Page): Promise<void> {
	const part = (name: string) => page.getByRole('region', { name, exact: true });
	await page.getByLabel('Short name', { exact: true }).first().fill('sound-in-air');
	await fill(part('What it answers'), {
		Title: 'Speed of sound in air',
		'The question it answers, in one line': 'How fast does sound go in dry air?',
		'Questions a writer may ask, one a line': 'how long does thunder take to arrive'
	});
	const takes = part('Takes');
	await fill(takes, { Name: 'T', 'What it is': 'Air temperature' });
	await takes.getByLabel('A measure of').selectOption('temperature');
	await takes.getByLabel('Unit', { exact: true }).selectOption('K');
	await fill(takes, { Lowest: '200', Highest: '400', 'At first': '293.15' });

	const works = part('Works');
	await works.getByRole('button', { name: 'Add a value on the way' }).click();
	await fill(works, {
		Name: 'molecule',
		'What it is': 'Mass of a mean molecule',
		'Formula of molecule': '0.0289647*kilogram/mole/N_A'
	});

	const gives = part('Gives');
	await fill(gives, { Name: 'speed', 'What it is': 'Speed of sound' });
	await gives.getByLabel('A measure of').selectOption('speed');
	await gives.getByLabel('Unit', { exact: true }).selectOption('m/s');
	await fill(gives, { 'Formula of speed': 'sqrt(1.4*k_B*T/molecul)' });

	const checks = part('Check values');
	for (const [index, { kelvins, metresASecond }] of PRINTED.entries()) {
		const check = checks.getByRole('group', { name: `Check value ${index + 1}` });
		await fill(check, {
			'What was published': `Sound in dry air at ${kelvins} K`,
			'Air temperature, K': kelvins,
			'Where it was printed': 'OpenStax, University Physics Volume 1, §17.2',
			'How it was verified': 'from memory'
		});
		await check.getByLabel('Output').selectOption('speed');
		await fill(check, { 'Printed, m/s': metresASecond, Tolerance: '1' });
	}
	await fill(part('Rests on'), {
		Work: 'OpenStax, University Physics Volume 1',
		'Where in it': '§17.2'
	});
}

describe('a calculator of the house', { timeout: 120_000 }, () => {
	test('a scientist writes it: a wrong formula is told with its place, and nothing is lost', async () => {
		const { page, context } = await seat('mateus');
		await page.goto(`${house.origin}/calculators/house/new`);
		await write(page);
		const gives = page.getByRole('region', { name: 'Gives', exact: true });
		await gives.locator('mark').filter({ hasText: 'molecul' }).waitFor();
		await expectNoAxeFindings(page);

		await page.getByRole('button', { name: 'Propose it' }).click();
		await page.getByText('This calculator doesn’t hold yet.').waitFor();
		await page.reload();
		await page.getByText('it was kept in this browser').waitFor();
		expect(await gives.getByLabel('Formula of speed').inputValue()).toBe('sqrt(1.4*k_B*T/molecul)');

		await gives.getByLabel('Formula of speed').fill('sqrt(1.4*k_B*T/molecule)');
		await page.getByText('3 of 3 check values agree').waitFor();
		await page
			.getByText(/343\.\d+ m\/s/)
			.first()
			.waitFor();
		await page.getByRole('button', { name: 'Propose it' }).click();
		await page.waitForURL(`**${CARD}`);
		const vetting = page.getByRole('region', { name: 'Vetting' });
		await vetting.getByText('You proposed this revision; a second scientist signs it.').waitFor();
		expect(await vetting.innerText()).toContain('tested, not vetted yet');
		expect(await page.getByRole('button', { name: 'Sign as second scientist' }).count()).toBe(0);
		await expectNoAxeFindings(page);

		await page.goto(`${house.origin}/calculators/house/new`);
		await page.getByLabel('Title', { exact: true }).waitFor();
		await page.waitForTimeout(500);
		expect(await page.getByLabel('Title', { exact: true }).inputValue()).toBe('');
		await context.close();
	});

	test('a writer can’t add one, on the page or past it', async () => {
		const { page, context } = await seat('tamsin');
		const answer = await page.goto(`${house.origin}/calculators/house/new`);
		expect(answer?.status()).toBe(403);
		const tried = await context.request.post(`${house.origin}/api/calculators/try`, {
			headers: { origin: house.origin },
			data: {}
		});
		expect(tried.status()).toBe(403);
		await context.close();
	});

	test('a second scientist vets it', async () => {
		const { page, context } = await seat('ama');
		await page.goto(house.origin + CARD);
		await page.getByRole('button', { name: 'Sign as second scientist' }).click();
		const vetting = page.getByRole('region', { name: 'Vetting' });
		const passphrase = vetting.getByLabel('Your passphrase');
		const signed = vetting.getByText(/vetted by Dr Ama Tindleforth/);
		await passphrase.or(signed).first().waitFor();
		if (await passphrase.isVisible()) {
			await passphrase.fill(DEMO_PASSPHRASE);
			await page.getByRole('button', { name: 'Sign as second scientist' }).click();
		}
		await signed.waitFor();
		await context.close();
	});

	test('a writer finds it by a question and uses it in a chain', async () => {
		const { page, context } = await seat('tamsin');
		await page.getByRole('button', { name: 'New slip' }).click();
		await page.getByLabel('Title').fill('Thunder on its way');
		await page.keyboard.press('Enter');
		await page.waitForURL(`**/pieces/${SLUG}/manuscript`);

		const bench = page.getByRole('region', { name: 'Bench' });
		await page.keyboard.press('Control+b');
		await add(page, 'how long does thunder take?');
		const sound = bench.getByRole('region', { name: 'Speed of sound in air' });
		await sound.getByRole('button', { name: /Make a control of this/ }).click();
		await bench.getByLabel('What it moves').fill('The air’s temperature');
		for (const [label, value] of [
			['From', '250'],
			['To', '320'],
			['Step', '5'],
			['Starts at', '290']
		] as const) {
			await bench.getByLabel(label, { exact: true }).fill(value);
		}
		await bench.getByRole('button', { name: 'Make the control' }).click();
		await add(page, 'thrown at a speed and an angle');
		const flight = bench.getByRole('region', { name: /without air/ });
		await flight
			.getByRole('combobox', { name: /^Source of .*[Ss]peed/ })
			.selectOption({ label: 'A · Speed of sound' });

		const manuscript = page.getByRole('textbox', { name: 'Manuscript' });
		await manuscript.click();
		await page.keyboard.press('Control+Home');
		await page.keyboard.press('Enter');
		await page.keyboard.type('Warm air carries thunder faster than cold air does.');
		await page.keyboard.press('Enter');
		await page.keyboard.type('In such air it goes about 341 metres per second.');
		await page.keyboard.press('Control+.');
		await page.keyboard.type('=');
		const list = page.getByRole('listbox', { name: 'Tie to a reading' });
		await list
			.getByRole('option', { name: /^Print it live here/ })
			.first()
			.click();
		await page.keyboard.press('Control+End');
		await page.keyboard.press('Enter');
		await page.keyboard.type('/');
		await page.getByRole('combobox', { name: 'Insert' }).fill('control:');
		await page.keyboard.press('Enter');
		await expect
			.poll(() => page.getByRole('status', { name: 'Keeping' }).innerText(), SOON)
			.toMatch(/^kept \d\d:\d\d:\d\d/);
		await page.reload();
		await expect
			.poll(async () => plain(await manuscript.innerText()), SOON)
			.toContain('about 341 metres a second');
		await page.getByRole('button', { name: 'Pull proof' }).click();
		await page.waitForURL(`**/pieces/${SLUG}/check`);
		await context.close();
	});

	test('it is checked and released, and the reader’s frame works it out', async () => {
		const checker = await seat('mateus');
		await checker.page.goto(`${house.origin}/pieces/${SLUG}/check`);
		await checker.page.getByRole('button', { name: /^Sign(?! out)/ }).click();
		await checker.page
			.getByText(/Signed 1a/)
			.first()
			.waitFor();
		await checker.context.close();

		const editor = await seat('perpetua');
		await editor.page.goto(`${house.origin}/pieces/${SLUG}/release`);
		await editor.page.getByText('Every calculator it uses is vetted.').waitFor();
		await editor.page.getByRole('button', { name: 'Pass for press' }).click();
		await editor.page.getByRole('button', { name: 'Release', exact: true }).click();
		await editor.page.getByText('Release 1 is out').waitFor();

		await editor.page.goto(`${house.origin}/w/${SLUG}/latest`);
		const slider = editor.page.getByRole('slider', { name: /temperature/ });
		await slider.press('End');
		// √(1.4 k · 320 K / m) from the numbers above, to three figures.
		await expect
			.poll(async () => plain(await editor.page.locator('main').innerText()), SOON)
			.toContain('about 359 metres a second');
		await editor.context.close();
	});
});

/** Signs the revision on the card as the second scientist, with the passphrase where it is asked for. */
async function sign(page: Page): Promise<void> {
	const vetting = page.getByRole('region', { name: 'Vetting' });
	const plate = vetting.getByRole('button', { name: 'Sign as second scientist' });
	await plate.click();
	const passphrase = vetting.getByLabel('Your passphrase');
	await expect
		.poll(async () => (await passphrase.count()) + (1 - (await plate.count())), SOON)
		.toBe(1);
	if ((await passphrase.count()) === 0) return;
	await passphrase.fill(DEMO_PASSPHRASE);
	await plate.click();
	await plate.waitFor({ state: 'detached' });
}

const LOOKS = [
	{ viewport: { width: 1440, height: 900 }, colorScheme: 'light' as const },
	{ viewport: { width: 390, height: 844 }, colorScheme: 'dark' as const }
];

/** In both looks: axe finds nothing, and nothing scrolls sideways. */
async function expectSound(page: Page): Promise<void> {
	for (const { viewport, colorScheme } of LOOKS) {
		await page.setViewportSize(viewport);
		await page.emulateMedia({ colorScheme });
		await expectNoAxeFindings(page);
		const over = await page.evaluate(
			() => document.documentElement.scrollWidth - document.documentElement.clientWidth
		);
		expect(over, page.url()).toBe(0);
	}
	await page.setViewportSize(LOOKS[0]!.viewport);
	await page.emulateMedia({ colorScheme: 'light' });
}

describe('a newer revision, and the end of one', { timeout: 180_000 }, () => {
	const deskRow = (page: Page) =>
		page
			.getByRole('region', { name: 'In your hands' })
			.getByRole('listitem')
			.filter({ hasText: SLUG });

	test('a scientist revises it: a change that is labelled too small is told, and kept', async () => {
		const { page, context } = await seat('mateus');
		await page.goto(house.origin + CARD);
		await page.getByRole('link', { name: 'Revise it' }).click();
		await page.waitForURL('**/revise');
		await page.getByText('3 of 3 check values agree').waitFor();
		const gives = page.getByRole('region', { name: 'Gives', exact: true });
		await gives.getByLabel('Formula of speed').fill('sqrt(1.401*k_B*T/molecule)');
		await page.getByLabel('What changed, for the history on the card').fill('γ is 1.401 for air.');
		await expectSound(page);

		await page.getByRole('button', { name: 'Propose 1.0.1' }).click();
		await page.getByText('This change is larger than it is labelled.').waitFor();
		expect(await gives.getByLabel('Formula of speed').inputValue()).toContain('1.401');
		await page.getByLabel('The same inputs may give another answer').check();
		await page.getByRole('button', { name: 'Propose 2.0.0' }).click();
		await page.waitForURL(`**${CARD}`);
		const vetting = page.getByRole('region', { name: 'Vetting' });
		await vetting.getByText('2.0.0 tested, not vetted yet').waitFor();
		await vetting.getByText('You proposed this revision; a second scientist signs it.').waitFor();
		// The vetted revision runs as long as the new one waits.
		expect(await page.getByRole('heading', { level: 1 }).innerText()).toContain('1.0.0');
		await context.close();
	});

	test('a second scientist vets it, the old one is superseded, and what is live with it is flagged', async () => {
		const { page, context } = await seat('ama');
		await page.goto(house.origin + CARD);
		await page.getByRole('link', { name: 'Open the card of 2.0.0' }).click();
		await page.waitForURL('**revision=2.0.0');
		await sign(page);
		const vetting = page.getByRole('region', { name: 'Vetting' });
		await vetting.getByText('2.0.0 vetted').waitFor();
		await vetting.getByText('1.0.0 superseded').waitFor();
		await context.close();

		const writer = await seat('tamsin');
		const row = deskRow(writer.page);
		await row.waitFor();
		expect(plain(await row.innerText())).toContain(
			'Release 1, which readers have now, works with Speed of sound in air, 1.0.0.'
		);
		expect(plain(await row.innerText())).toContain('Dr Ama Tindleforth vetted revision 2.0.0');
		await writer.context.close();
	});

	test('the public API runs the vetted revision and lists it', async () => {
		const api = `${house.origin}/api/v1/calculators`;
		const listed = (await (await fetch(api)).json()) as { calculators: { id: string }[] };
		expect(listed.calculators.map(({ id }) => id)).toContain('house.sound-in-air');
		const answer = await fetch(`${api}/house.sound-in-air`, {
			method: 'POST',
			headers: { 'content-type': 'application/json' },
			body: JSON.stringify({ inputs: { T: 293.15 } })
		});
		// √(1.401 k · 293.15 K / m) = 343.358 m/s.
		expect(await answer.json()).toMatchObject({
			outputs: { speed: { value: expect.closeTo(343.358, 2), unit: 'm/s' } }
		});
	});

	test('withdrawn with a reason, the live piece is flagged within the minute, and each is written to once', async () => {
		const scientist = await seat('ama');
		const card = scientist.page;
		await card.goto(`${house.origin}${CARD}?revision=1.0.0`);
		const vetting = card.getByRole('region', { name: 'Vetting' });
		await vetting.getByRole('button', { name: 'Take 1.0.0 out of use' }).click();
		await vetting.getByRole('button', { name: 'Take it out of use' }).click();
		await vetting.getByText('Say why it is taken out of use.').waitFor();
		await vetting.getByLabel('Why it is taken out of use').fill('The heat capacity was too low.');
		await expectSound(card);
		const before = Date.now();
		await vetting.getByRole('button', { name: 'Take it out of use' }).click();
		await vetting.getByText('1.0.0 withdrawn').waitFor();
		await expectSound(card);
		await scientist.context.close();

		const writer = await seat('tamsin');
		const row = deskRow(writer.page);
		await row.waitFor();
		expect(Date.now() - before).toBeLessThan(60_000);
		const told = plain(await row.innerText());
		expect(told).toContain(
			'Release 1, which readers have now, works with Speed of sound in air, 1.0.0.'
		);
		expect(told).toContain('Withdrawn by Dr Ama Tindleforth: The heat capacity was too low.');
		expect(told).toContain('Revision 2.0.0 runs in its place');
		expect(await row.locator('time').count()).toBeGreaterThan(0);
		await expectSound(writer.page);
		await row.getByRole('link', { name: /Put it right/ }).click();
		await writer.page.waitForURL(`**/pieces/${SLUG}/manuscript`);
		for (const room of ['release', 'check']) {
			await writer.page.goto(`${house.origin}/pieces/${SLUG}/${room}`);
			const flags = writer.page.getByRole('region', { name: 'Calculators out of use' });
			await flags.getByText('The heat capacity was too low.').waitFor();
			await expectSound(writer.page);
		}
		await writer.context.close();

		const editor = await seat('perpetua');
		await deskRow(editor.page).waitFor();
		await editor.context.close();

		const subject = 'Withdrawn: Speed of sound in air, 1.0.0';
		const sent = () => house.mail.letters().filter((letter) => letter.subject === subject);
		// The writer, the signer, every editor; not the one who did it.
		const { tamsin, mateus, ...others } = DEMO_PEOPLE;
		const editors = Object.values(others).filter(({ roles }) =>
			roles.some((role) => role === 'editor')
		);
		const wanted = [tamsin, mateus, ...editors].map(({ email }) => email).sort();
		await expect
			.poll(
				() =>
					sent()
						.flatMap(({ to }) => to)
						.sort(),
				SOON
			)
			.toEqual(wanted);
		expect(sent()[0]!.text).toContain(SLUG);
	});

	test('with no vetted revision left the API runs none, and says why', async () => {
		const scientist = await seat('mateus');
		await scientist.page.goto(`${house.origin}${CARD}?revision=2.0.0`);
		const vetting = scientist.page.getByRole('region', { name: 'Vetting' });
		await vetting.getByRole('button', { name: 'Take 2.0.0 out of use' }).click();
		await vetting.getByLabel('Why it is taken out of use').fill('So is this one.');
		await vetting.getByRole('button', { name: 'Take it out of use' }).click();
		await vetting.getByText('2.0.0 withdrawn').waitFor();
		await scientist.context.close();
		const answer = await fetch(`${house.origin}/api/v1/calculators/house.sound-in-air`);
		expect(answer.status).toBe(410);
		expect(await answer.json()).toMatchObject({
			refused: {
				code: 'calculator-withdrawn',
				message: expect.stringContaining('was withdrawn by a scientist of this house')
			}
		});
	});
});

test(
	'one of the software’s is taken out of use too, and comes back by two scientists',
	{ timeout: 120_000 },
	async () => {
		const card = `${house.origin}/calculators/line.band`;
		const first = await seat('ama');
		const vetting = (page: Page) => page.getByRole('region', { name: 'Vetting' });
		await first.page.goto(card);
		await vetting(first.page)
			.getByRole('button', { name: /out of use/ })
			.click();
		await first.page.getByLabel('Why it is taken out of use').fill('The edges are in doubt.');
		await vetting(first.page).getByRole('button', { name: 'Take it out of use' }).click();
		await vetting(first.page).getByText('1.0.0 withdrawn').waitFor();
		await first.page.getByLabel('Why it may be used again').fill('They were right.');
		await vetting(first.page).getByRole('button', { name: 'Test it again' }).click();
		await vetting(first.page)
			.getByText('You put it to the test again; a second scientist signs it.')
			.waitFor();
		await expectSound(first.page);
		await first.context.close();

		const second = await seat('mateus');
		await second.page.goto(card);
		await sign(second.page);
		await vetting(second.page).getByText('1.0.0 vetted').waitFor();
		await second.context.close();
	}
);

async function add(page: Page, question: string): Promise<void> {
	const bench = page.getByRole('region', { name: 'Bench' });
	await bench.getByRole('button', { name: 'Add a calculator' }).click();
	await page.getByRole('combobox', { name: 'Find a calculator' }).fill(question);
	await page.keyboard.press('Enter');
}
