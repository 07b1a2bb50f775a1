import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, SLUG } from '../../../../tests/support/desk.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import { firstLight } from '../demo/first-light.ts';
import { daybook, draftVersions } from '../db/schema/index.ts';
import {
	KEPT_DAYS,
	listDrafts,
	nameDraft,
	openDraft,
	restoreDraft,
	sweepDrafts
} from './history.ts';
import { saveDraft } from './pieces.ts';

let database: TestDatabase;
let office: Office;
let desk: Desk;

beforeAll(async () => {
	database = await openTestDatabase();
});
afterAll(() => database.close());
beforeEach(async () => {
	await database.fresh();
	office = new Office(database.db, noShelf);
	desk = await Desk.open(office);
	await desk.create();
});

const as = (by = desk.writer) => office.as(by);
const titled = (title: string) => ({ ...firstLight, title });
const list = async () => listDrafts(await as(), SLUG);
const versions = async () => (await list()).map(({ version }) => version);
const DAY = 24 * 60;

describe('what is kept', () => {
	test('the first sheet, and one row for each person and two minutes', async () => {
		const kofi = await office.add('Kofi Adjarra-Lund', ['writer']);
		for (const [title, by, wait] of [
			['a', desk.writer, 0.5],
			['b', desk.writer, 0.5],
			['c', kofi, 0.2],
			['d', desk.writer, 0.2],
			['e', desk.writer, 2],
			['f', desk.writer, 3],
			['g', desk.writer, 0]
		] as const) {
			await desk.save(titled(title), by);
			office.wait(wait);
		}
		const drafts = await list();
		// 1 is the empty sheet; c is Kofi's; e ends the first two minutes of Tamsin, f and g are runs of their own.
		expect(drafts.map(({ version, savedBy }) => [version, savedBy.name])).toEqual([
			[8, 'Tamsin Orrelby'],
			[7, 'Tamsin Orrelby'],
			[6, 'Tamsin Orrelby'],
			[4, 'Kofi Adjarra-Lund'],
			[1, 'Tamsin Orrelby']
		]);
		expect(drafts[0]).toMatchObject({ isNewest: true, name: null, proof: null });
		expect(drafts.slice(1).every(({ isNewest }) => !isNewest)).toBe(true);
	});

	test('an hour of typing without a pause is some thirty rows', async () => {
		for (let save = 0; save < 80; save += 1) {
			await desk.save(titled(`Save ${save}`));
			office.wait(0.75);
		}
		expect(await office.db.$count(draftVersions)).toBeLessThanOrEqual(32);
	}, 60_000);

	test('a clock that was set back loses no draft', async () => {
		await desk.save(titled('Before'));
		office.wait(-60);
		await desk.save(titled('After'));
		const { document } = await openDraft(await as(), SLUG, 2);
		expect(document.title).toBe('Before');
	});

	test('the draft of a proof can be opened by its number, however much was typed after', async () => {
		await desk.save(firstLight);
		await desk.pull();
		await desk.save(titled('Typed on'));
		expect(await list()).toContainEqual(expect.objectContaining({ version: 2, proof: 1 }));
		expect((await openDraft(await as(), SLUG, 2)).document).toEqual(firstLight);
	});
});

describe('opening', () => {
	test('gives the document of that draft, to everyone who reads the piece', async () => {
		await desk.save(titled('One'));
		office.wait(5);
		await desk.save(titled('Two'));
		for (const reader of [desk.writer, desk.scientist, desk.editor]) {
			const { draft, document } = await openDraft(await as(reader), SLUG, 2);
			expect(draft).toMatchObject({ version: 2, isNewest: false });
			expect(document.title).toBe('One');
		}
	});

	test('a piece of 60 earlier drafts opens within a second', async () => {
		const long = structuredClone(firstLight);
		for (let number = 0; number < 95; number += 1)
			long.blocks.push({
				id: `p-${number}`,
				kind: 'paragraph',
				content: [{ kind: 'text', text: `Words of paragraph ${number}. `.repeat(12) }]
			});
		for (let save = 0; save < 60; save += 1) {
			await desk.save({ ...long, title: `Save ${save}` });
			office.wait(3);
		}
		const start = performance.now();
		const { document } = await openDraft(await as(), SLUG, 20);
		expect(performance.now() - start).toBeLessThan(1_000);
		expect(document.blocks).toHaveLength(100);
	}, 120_000);

	test('strangers, and admins who don’t read pieces, are refused; what isn’t there isn’t found', async () => {
		const admin = await office.add('Ines Arbuthven', ['admin']);
		for (const refused of [office.stranger(), await as(admin)]) {
			await expect(listDrafts(refused, SLUG)).rejects.toMatchObject({ code: /not-/ });
			await expect(openDraft(refused, SLUG, 1)).rejects.toMatchObject({ code: /not-/ });
		}
		await expect(openDraft(await as(), SLUG, 99)).rejects.toMatchObject({ code: 'not-found' });
		await expect(listDrafts(await as(), 'nowhere')).rejects.toMatchObject({ code: 'not-found' });
	});
});

describe('names', () => {
	test('a named draft is never typed over, and says who named it', async () => {
		await desk.save(titled('Before the cut'));
		await nameDraft(await as(), SLUG, { version: 2, name: 'before the cut' });
		await desk.save(titled('After'));
		expect((await list()).find(({ version }) => version === 2)).toMatchObject({
			name: 'before the cut',
			namedBy: { name: 'Tamsin Orrelby' }
		});
		await nameDraft(await as(), SLUG, { version: 2, name: '' });
		expect((await list()).find(({ version }) => version === 2)).toMatchObject({
			name: null,
			namedBy: null
		});
		expect(await events()).toEqual(['draft-named', 'draft-named']);
	});

	test('the newest draft can be named though it has no row yet', async () => {
		await nameDraft(await as(), SLUG, { version: 1, name: 'empty' });
		await desk.save(firstLight);
		expect((await list()).at(-1)).toMatchObject({ version: 1, name: 'empty' });
	});

	test('a scientist can’t name one; one that isn’t there can’t be named', async () => {
		await expect(
			nameDraft(await as(desk.scientist), SLUG, { version: 1, name: 'x' })
		).rejects.toMatchObject({ code: 'not-permitted' });
		await expect(nameDraft(await as(), SLUG, { version: 7, name: 'x' })).rejects.toMatchObject({
			code: 'not-found'
		});
	});
});

describe('bringing back', () => {
	beforeEach(async () => {
		await desk.save(titled('Good'));
		office.wait(5);
		await desk.save(titled('Worse'));
	});

	test('makes the old words the newest draft, and can itself be taken back', async () => {
		expect(await restoreDraft(await as(), SLUG, { version: 2, baseVersion: 3 })).toMatchObject({
			version: 4
		});
		expect((await desk.piece()).document.title).toBe('Good');
		expect((await list())[0]).toMatchObject({ version: 4, restoredFrom: 2, isNewest: true });
		await restoreDraft(await as(), SLUG, { version: 3, baseVersion: 4 });
		expect((await desk.piece()).document.title).toBe('Worse');
		expect(await versions()).toEqual([5, 4, 3, 2, 1]);
		expect(await events()).toEqual(['draft-restored', 'draft-restored']);
	});

	test('what was typed right before stays, though it is of the same two minutes', async () => {
		await restoreDraft(await as(), SLUG, { version: 2, baseVersion: 3 });
		await desk.save(titled('Typed on'));
		expect((await openDraft(await as(), SLUG, 3)).document.title).toBe('Worse');
		expect((await openDraft(await as(), SLUG, 4)).document.title).toBe('Good');
	});

	test('is refused when someone has saved meanwhile, and to those who may not edit', async () => {
		await expect(
			restoreDraft(await as(), SLUG, { version: 2, baseVersion: 2 })
		).rejects.toMatchObject({ code: 'version-conflict', details: { version: 3 } });
		await expect(
			restoreDraft(await as(desk.scientist), SLUG, { version: 2, baseVersion: 3 })
		).rejects.toMatchObject({ code: 'not-permitted' });
	});

	test('whoever brings back is one of the writers', async () => {
		await restoreDraft(await as(desk.editor), SLUG, { version: 2, baseVersion: 3 });
		expect((await desk.piece()).writers.map(({ personId }) => personId)).toContain(desk.editor);
	});
});

describe('letting go', () => {
	const sweep = () => sweepDrafts(office, office.now);
	/** Someone was in the house today. */
	const someoneIsHere = async () =>
		office.db.insert(daybook).values({ at: office.now, event: 'signed-in', details: {} });

	test('unnamed drafts go after ninety days; named ones, proofs and the newest stay', async () => {
		await desk.save(titled('Kept by its name'));
		await nameDraft(await as(), SLUG, { version: 2, name: 'kept' });
		office.wait(5);
		await desk.save(firstLight);
		await desk.pull();
		office.wait(5);
		await desk.save(titled('Goes'));
		office.wait(5);
		await desk.save(titled('Stands'));
		office.wait(KEPT_DAYS * DAY - 60);
		await someoneIsHere();
		expect(await sweep()).toBe(0);
		office.wait(DAY);
		await someoneIsHere();
		expect(await sweep()).toBe(3);
		expect(await versions()).toEqual([5, 3, 2]);
		expect((await openDraft(await as(), SLUG, 3)).document).toEqual(firstLight);
		expect(await sweep()).toBe(0);
	});

	test('a clock that jumps ahead by years takes nothing away', async () => {
		await desk.save(titled('One'));
		office.wait(5);
		await desk.save(titled('Two'));
		const before = await versions();
		const { now } = office;
		office.wait(5 * 365 * DAY);
		expect(await sweep()).toBe(0);
		office.now = now;
		expect(await versions()).toEqual(before);
	});

	test('a clock that was set back takes nothing away', async () => {
		await desk.save(titled('One'));
		office.wait(-400 * DAY);
		expect(await sweep()).toBe(0);
	});
});

async function events(): Promise<string[]> {
	const rows = await office.db.select().from(daybook).orderBy(daybook.seq);
	return rows.map(({ event }) => event).filter((event) => /^draft-(named|restored)/.test(event));
}

test('saving on a version that is gone from the lists still tells of the newest', async () => {
	await desk.save(titled('One'));
	await office.db.delete(draftVersions).where(eq(draftVersions.version, 1));
	await expect(
		saveDraft(await as(), SLUG, { baseVersion: 1, document: titled('Late') })
	).rejects.toMatchObject({ code: 'version-conflict' });
});
