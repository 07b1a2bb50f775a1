import { count, sql } from 'drizzle-orm';
import { spawn, spawnSync, type ChildProcess } from 'node:child_process';
import { cp, mkdtemp, readFile, readdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { MIGRATIONS } from '../../../../tests/support/database.ts';
import { openDatabase } from './client.ts';
import { DataFolderInUse } from './lock.ts';
import { daybook, pieceWriters, proofs } from './schema/index.ts';

let folder: string;
let child: ChildProcess | null = null;

beforeEach(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-data-'));
});
afterEach(async () => {
	child?.kill('SIGKILL');
	child = null;
	await rm(folder, { recursive: true, force: true });
});

const open = () => openDatabase({ dataDir: folder, migrations: MIGRATIONS });

/** A process that adds lines to the daybook and tells after each one that it is safe. */
function writeElsewhere(): ChildProcess {
	const client = fileURLToPath(new URL('./client.ts', import.meta.url));
	const schema = fileURLToPath(new URL('./schema/index.ts', import.meta.url));
	const script = `
		import { openDatabase } from ${JSON.stringify(client)};
		import { daybook } from ${JSON.stringify(schema)};
		const { db } = await openDatabase({ dataDir: ${JSON.stringify(folder)}, migrations: ${JSON.stringify(MIGRATIONS)} });
		for (let line = 1; ; line += 1) {
			await db.transaction((tx) => tx.insert(daybook).values({ at: new Date(), event: 'test', details: { line } }));
			process.stdout.write(line + '\\n');
		}
	`;
	return spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '--eval', script], {
		stdio: ['ignore', 'pipe', 'inherit']
	});
}

test('a process killed while it writes loses nothing it had told, keeps the folder to itself until then, and frees it', async () => {
	child = writeElsewhere();
	let told = 0;
	const enough = new Promise<void>((resolve, reject) => {
		child!.stdout!.on('data', (chunk: Buffer) => {
			told = Number(chunk.toString().trim().split('\n').at(-1));
			if (told >= 50) resolve();
		});
		child!.once('exit', (code) => reject(new Error(`The writer ended early (${code}).`)));
	});
	await enough;
	await expect(open()).rejects.toThrow(DataFolderInUse);

	const gone = new Promise((resolve) => child!.once('exit', resolve));
	child.kill('SIGKILL');
	await gone;
	const { db, close } = await open();
	const [row] = await db.select({ lines: count() }).from(daybook);
	expect(row!.lines).toBeGreaterThanOrEqual(told);
	await close();
}, 120_000);

test('opening again finds what was written, and migrating again changes nothing', async () => {
	const first = await open();
	await first.db.insert(daybook).values({ at: new Date(), event: 'kept', details: {} });
	await first.close();
	const second = await open();
	expect(await second.db.select({ event: daybook.event }).from(daybook)).toEqual([
		{ event: 'kept' }
	]);
	await second.close();
}, 120_000);

test('a folder without migrations is a sentence, and leaves the data folder free', async () => {
	await expect(openDatabase({ dataDir: folder, migrations: tmpdir() })).rejects.toThrow(
		/holds no migrations.*STEELYARD_MIGRATIONS/
	);
	const { close } = await open();
	await close();
}, 120_000);

test('the committed migrations make exactly the schema of the code', async () => {
	const root = fileURLToPath(new URL('../../../../', import.meta.url));
	const copy = join(folder, 'drizzle');
	await cp(MIGRATIONS, copy, { recursive: true });
	const before = await readdir(copy);
	const run = spawnSync(
		process.execPath,
		[
			join(root, 'node_modules/drizzle-kit/bin.cjs'),
			'generate',
			'--dialect=postgresql',
			'--schema=./src/lib/server/db/schema/index.ts',
			`--out=${relative(root, copy)}`, // it takes relative paths alone
			'--casing=snake_case'
		],
		{ cwd: root, encoding: 'utf8' }
	);
	// It ends with 0 even when it asks a question that nobody answers, so its words are what counts.
	expect(run.stdout + run.stderr).toContain('No schema changes');
	expect(await readdir(copy)).toEqual(before);
}, 60_000);

test('rows from before versions were kept are read as what they safely are', async () => {
	const older = join(folder, 'older');
	await cp(MIGRATIONS, older, { recursive: true });
	const journalFile = join(older, 'meta/_journal.json');
	const journal = JSON.parse(await readFile(journalFile, 'utf8'));
	const entries = journal.entries.slice(0, 2);
	await writeFile(journalFile, JSON.stringify({ ...journal, entries }));
	const before = await openDatabase({ dataDir: join(folder, 'data'), migrations: older });
	for (const statement of [
		`INSERT INTO people (id, email, name, created_at) VALUES ('t', 't@varrowmere.example', 'T', now())`,
		`INSERT INTO pieces (id, slug, document, version, created_by, created_at, saved_by, saved_at)
			VALUES ('p', 'p', '{"title": "new"}', 7, 't', now(), 't', now())`,
		`INSERT INTO piece_writers (piece_id, person_id, changed_at) VALUES ('p', 't', now())`,
		`INSERT INTO proofs (id, piece_id, number, document, digest, pulled_by, pulled_at, writers) VALUES
			('1', 'p', 1, '{"title": "old"}', 'a', 't', now(), '["t"]'),
			('2', 'p', 2, '{"title": "new"}', 'b', 't', now(), '["t"]')`
	])
		await before.db.execute(sql.raw(statement));
	await before.close();

	const after = await openDatabase({ dataDir: join(folder, 'data'), migrations: MIGRATIONS });
	expect(await after.db.select({ version: pieceWriters.version }).from(pieceWriters)).toEqual([
		{ version: 7 }
	]);
	expect(
		await after.db.select({ version: proofs.version }).from(proofs).orderBy(proofs.number)
	).toEqual([{ version: 0 }, { version: 7 }]);
	await after.close();
}, 120_000);

test('each migration is in the journal, in order', async () => {
	const journal: { entries: { idx: number; tag: string; when: number }[] } = JSON.parse(
		await readFile(join(MIGRATIONS, 'meta/_journal.json'), 'utf8')
	);
	const files = (await readdir(MIGRATIONS)).filter((name) => name.endsWith('.sql')).sort();
	expect(journal.entries.map(({ tag }) => `${tag}.sql`)).toEqual(files);
	const times = journal.entries.map(({ when }) => when);
	expect([...times].sort((a, b) => a - b)).toEqual(times);
});
