import { eq } from 'drizzle-orm';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, reword, SLUG } from '../../../../tests/support/desk.ts';
import { Office } from '../../../../tests/support/office.ts';
import { PRESS_FOLDER } from '../../../../tests/support/release.ts';
import { SteelyardError } from '../../errors.ts';
import { sha256 } from '../auth/hashes.ts';
import { firstLight } from '../demo/first-light.ts';
import { daybook, pieces, pieceWriters, proofs, releases } from '../db/schema/index.ts';
import { ReleaseShelf } from '../shelf/shelf.ts';
import { readColophon } from './colophon.ts';
import { takeBackSignature } from './claims.ts';
import { passConditions } from './proofs.ts';
import { releaseProof } from './releases.ts';
import { restockShelf } from './restock-shelf.ts';

let database: TestDatabase;
let office: Office;
let desk: Desk;
let folder: string;

beforeAll(async () => {
	database = await openTestDatabase();
});
afterAll(() => database.close());
beforeEach(async () => {
	await database.fresh();
	folder = await mkdtemp(join(tmpdir(), 'steelyard-shelf-'));
	office = new Office(database.db, new ReleaseShelf(folder));
	office.pressFolder = PRESS_FOLDER;
	desk = await Desk.open(office);
});
afterEach(() => rm(folder, { recursive: true, force: true }));

const code = (code: string) => expect.objectContaining({ code });
const release = async (proofId: string, by = desk.editor) =>
	releaseProof(await office.as(by), SLUG, { proofId });
const passed = async () => {
	const proofId = await desk.toChecked();
	await desk.pass(proofId);
	return proofId;
};
const rows = () => office.db.select().from(releases);

describe('releasing a passed proof', () => {
	test('puts the bytes in the store under their hashes, the release in the database, the frame before readers', async () => {
		const proofId = await passed();
		expect(await release(proofId)).toMatchObject({
			number: 1,
			proofNumber: 1,
			releasedBy: { name: 'Perpetua Lindqvane' }
		});

		const [row] = await rows();
		expect(row!.manifest.files.length).toBeGreaterThan(2);
		for (const { key, sha256: hash } of row!.manifest.files) {
			const bytes = await office.store.get(key);
			expect(sha256(bytes!), key).toBe(hash);
		}
		expect(office.shelf.find(SLUG, 'latest')).toMatchObject({
			release: 1,
			sha256: row!.manifest.digest
		});
		expect(await desk.piece()).toMatchObject({
			working: 'at-rest',
			liveRelease: 1,
			missing: '',
			writers: []
		});
		expect(await readColophon(office.stranger(), SLUG)).toMatchObject({
			account: { makers: { writers: ['Tamsin Orrelby'], editor: 'Perpetua Lindqvane' } },
			releases: [{ number: 1 }]
		});
	});

	test('once: a second time it says so, and nothing is added', async () => {
		const proofId = await passed();
		await release(proofId);
		await expect(release(proofId)).rejects.toEqual(code('already-released'));
		expect(await rows()).toHaveLength(1);
	});

	test('two editors pressing at once make one release', async () => {
		const proofId = await passed();
		const anselm = await office.add('Anselm Torviq', ['editor']);
		const both = await Promise.allSettled([release(proofId), release(proofId, anselm)]);
		expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
		expect(await rows()).toHaveLength(1);
		const events = await office.db
			.select()
			.from(daybook)
			.where(eq(daybook.event, 'proof-released'));
		expect(events).toHaveLength(1);
	});

	test('not before it was passed, nor by its writer or checker', async () => {
		const proofId = await desk.toChecked();
		await expect(release(proofId)).rejects.toEqual(code('conditions-open'));
		await desk.pass(proofId);
		const both = await office.add('Hanno Velisar', ['writer', 'scientist', 'editor']);
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'), both);
		const next = await desk.pull();
		await desk.signAll();
		await desk.pass(next);
		await expect(release(next, both)).rejects.toEqual(code('same-person-twice'));
		await expect(release(proofId)).rejects.toEqual(code('proof-superseded'));
		expect(await rows()).toEqual([]);
	});

	test('with the store away nothing is out, and it can be tried again', async () => {
		const proofId = await passed();
		office.store.failure = new SteelyardError('store-away');
		await expect(release(proofId)).rejects.toEqual(code('store-away'));
		expect(await rows()).toEqual([]);
		expect(office.shelf.find(SLUG, 'latest')).toBeUndefined();
		office.store.failure = null;
		expect(await release(proofId)).toMatchObject({ number: 1 });
	});

	test('the next release stands beside the first, whose bytes stay', async () => {
		await release(await passed());
		const before = Buffer.from(office.shelf.find(SLUG, 1)!.plain);
		office.wait(60);
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'));
		const next = await desk.pull();
		await desk.signAll();
		await desk.pass(next);
		expect(await release(next)).toMatchObject({ number: 2 });
		expect(office.shelf.find(SLUG, 'latest')!.release).toBe(2);
		expect(office.shelf.find(SLUG, 1)!.plain.equals(before)).toBe(true);
	});

	test('keeps the names it went out with, when a signature is taken back for the next one', async () => {
		await release(await passed());
		const { account } = await readColophon(office.stranger(), SLUG);
		expect(account.numbers.every(({ checkedBy }) => checkedBy.length === 1)).toBe(true);
		office.wait(60);
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'));
		await desk.pull();
		for (const { signatures } of (await desk.piece()).proof!.claims) {
			const ctx = await office.as(desk.scientist);
			await takeBackSignature(ctx, SLUG, { signatureId: signatures[0]!.id });
		}
		expect((await readColophon(office.stranger(), SLUG)).account).toEqual(account);
		// A release from before accounts were kept is worked out anew, with the names of its day.
		await office.db.update(releases).set({ account: null });
		expect((await readColophon(office.stranger(), SLUG)).account).toEqual(account);
	});

	test('says for good what was released, whatever becomes of draft and calculators', async () => {
		await release(await passed());
		const { account } = await readColophon(office.stranger(), SLUG);
		expect(account).toMatchObject({
			title: firstLight.title,
			numbers: expect.arrayContaining([
				expect.objectContaining({ id: 'frequency', verdict: 'level', reads: expect.any(String) })
			]),
			calculators: expect.arrayContaining([{ title: expect.any(String), revision: '1.0.0' }])
		});
		const document = { ...firstLight, version: 999 } as never;
		await office.db.update(pieces).set({ document });
		await office.db.update(proofs).set({ document });
		await office.db.update(releases).set({ document });
		expect((await readColophon(office.stranger(), SLUG)).account).toEqual(account);
	});

	test('prints no name that changed while it was being printed', async () => {
		const proofId = await passed();
		const ama = await office.add('Ama Tindleforth', ['scientist']);
		const { put } = office.store;
		office.store.put = async (key, bytes) => {
			office.store.put = put;
			const signature = (await desk.piece()).proof!.claims[0]!.signatures[0]!;
			await takeBackSignature(await office.as(desk.scientist), SLUG, {
				signatureId: signature.id
			});
			await desk.signAll(ama);
			await desk.pass(proofId);
			await put.call(office.store, key, bytes);
		};
		await expect(release(proofId)).rejects.toEqual(code('check-moved'));
		expect(await rows()).toEqual([]);
		await release(proofId);
		expect((await readColophon(office.stranger(), SLUG)).account.makers.checkers.sort()).toEqual([
			'Ama Tindleforth',
			'Mateus Quevarro'
		]);
	});

	test('a change after the proof makes a writer of the next, whatever the clocks said', async () => {
		const proofId = await passed();
		// The request came in before the proof was pulled, and got the lock after it.
		office.wait(-60);
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'));
		office.wait(60);
		await release(proofId);
		expect((await desk.piece()).writers.map(({ personId }) => personId)).toEqual([desk.writer]);
		await desk.pull();
		expect((await desk.piece()).proof!.writers.map(({ personId }) => personId)).toEqual([
			desk.writer
		]);
	});

	test('without a new word since the last one it names its checkers alone', async () => {
		await release(await passed());
		// As after a change of a calculator: another digest, and nobody who wrote.
		await desk.edit((document) => (document.point = 'Another point.'));
		await office.db.delete(pieceWriters);
		const next = await desk.pull();
		await desk.signAll();
		const says = (await passConditions(await office.as(desk.editor), SLUG)).map(
			(condition) => condition.says
		);
		expect(says).toContain('No words changed since the last release; checked by Mateus Quevarro.');
		expect(says.join()).not.toContain('Written by ;');
		await desk.pass(next);
		await release(next);
		expect((await readColophon(office.stranger(), SLUG)).account.makers.writers).toEqual([]);
	});

	test('whoever wrote only the earlier release may pass the next', async () => {
		await release(await passed());
		office.wait(60);
		const kofi = await office.add('Kofi Adjarra-Lund', ['writer']);
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'), kofi);
		expect((await desk.piece()).writers.map(({ name }) => name)).toEqual(['Kofi Adjarra-Lund']);
	});
});

test('a piece of which nothing is out is not found by the public', async () => {
	await passed();
	await expect(readColophon(office.stranger(), SLUG)).rejects.toEqual(code('not-found'));
});

describe('after a restart', () => {
	beforeEach(async () => {
		await release(await passed());
	});
	const restart = (at = folder) => {
		const shelf = new ReleaseShelf(at);
		return { shelf, restocked: restockShelf({ db: office.db, store: office.store, shelf }) };
	};

	test('releases stand again from the shelf’s own disk, with the store away', async () => {
		office.store.failure = new SteelyardError('store-away');
		const { shelf, restocked } = restart();
		expect(await restocked).toEqual({ there: 1, fetched: 0, missing: [] });
		expect(shelf.find(SLUG, 'latest')?.release).toBe(1);
	});

	test('a shelf without its disk is filled from the store, byte for byte', async () => {
		const bytes = Buffer.from(office.shelf.find(SLUG, 1)!.plain);
		const { shelf, restocked } = restart(join(folder, 'another'));
		expect(await restocked).toEqual({ there: 0, fetched: 1, missing: [] });
		expect(shelf.find(SLUG, 1)!.plain.equals(bytes)).toBe(true);
	});

	test('what is neither here nor there, or there with other bytes, is named', async () => {
		const [row] = await rows();
		office.store.objects.set(row!.manifest.page, Buffer.from('something else'));
		const { shelf, restocked } = restart(join(folder, 'another'));
		expect(await restocked).toEqual({ there: 0, fetched: 0, missing: [`${SLUG}.1`] });
		expect(shelf.find(SLUG, 1)).toBeUndefined();
	});
});
