import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import type * as Fs from 'node:fs/promises';
import { hostname, tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { DataFolderInUse, lockDataFolder } from './lock.ts';

/** What another process does in the moment between our look at the file and our taking it away. */
const meanwhile = vi.hoisted(() => ({ act: null as (() => Promise<void>) | null }));
vi.mock('node:fs/promises', async (original) => {
	const fs = await original<typeof Fs>();
	return {
		...fs,
		async rename(...names: Parameters<typeof Fs.rename>) {
			await meanwhile.act?.();
			meanwhile.act = null;
			await fs.rename(...names);
		}
	};
});

let folder: string;
const children: ChildProcess[] = [];

beforeEach(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-lock-'));
});
afterEach(async () => {
	for (const child of children.splice(0)) child.kill('SIGKILL');
	await rm(folder, { recursive: true, force: true });
});

/** Another process that takes the lock and keeps it. */
async function holdElsewhere(): Promise<ChildProcess> {
	const lockModule = fileURLToPath(new URL('./lock.ts', import.meta.url));
	const script = `
		import { lockDataFolder } from ${JSON.stringify(lockModule)};
		await lockDataFolder(${JSON.stringify(folder)});
		process.stdout.write('held');
		setInterval(() => {}, 1000);
	`;
	const child = spawn(
		process.execPath,
		['--import', 'tsx', '--input-type=module', '--eval', script],
		{
			stdio: ['ignore', 'pipe', 'inherit']
		}
	);
	children.push(child);
	await once(child.stdout!, 'data');
	return child;
}

test('a second opener is refused with the holder’s process and what to do', async () => {
	const holder = await holdElsewhere();
	const refusal = await lockDataFolder(folder).catch((error: unknown) => error);
	expect(refusal).toBeInstanceOf(DataFolderInUse);
	expect((refusal as Error).message).toContain(`in use by process ${holder.pid} `);
	expect((refusal as Error).message).toContain(`kill ${holder.pid}`);
	expect((refusal as Error).message).toContain('STEELYARD_DATA_DIR');
	// The holder is unharmed: its file is still there.
	expect(JSON.parse(await readFile(join(folder, '.in-use'), 'utf8'))).toMatchObject({
		pid: holder.pid
	});
});

test('a holder that was killed is taken over at once', async () => {
	const holder = await holdElsewhere();
	holder.kill('SIGKILL');
	await once(holder, 'exit');
	const lock = await lockDataFolder(folder);
	expect(JSON.parse(await readFile(join(folder, '.in-use'), 'utf8'))).toMatchObject({
		pid: process.pid
	});
	await lock.release();
});

test('the same process can’t take it twice, and can again after letting go', async () => {
	const lock = await lockDataFolder(folder);
	await expect(lockDataFolder(folder)).rejects.toThrow(DataFolderInUse);
	await lock.release();
	const again = await lockDataFolder(folder);
	await again.release();
});

test('two names for one folder are one folder', async () => {
	const lock = await lockDataFolder(folder);
	await expect(lockDataFolder(join(folder, '..', folder.split('/').at(-1)!, '.'))).rejects.toThrow(
		DataFolderInUse
	);
	await lock.release();
});

/** What another container on the same folder leaves: the socket can't be seen from here, only the file. */
const leftBehind = async (holder: Record<string, unknown>) => {
	await writeFile(
		join(folder, '.in-use'),
		JSON.stringify({
			pid: process.pid,
			startedTicks: '',
			boot: await readFile('/proc/sys/kernel/random/boot_id', 'utf8').then(
				(id) => id.trim(),
				() => ''
			),
			host: hostname(),
			command: 'node build',
			since: '2026-12-08T09:00:00.000Z',
			...holder
		})
	);
};

test('a file by a living process refuses, even when the socket is free', async () => {
	await leftBehind({});
	await expect(lockDataFolder(folder)).rejects.toThrow(/in use by process/);
});

test('a file by another host can’t be checked, so it refuses and says which file', async () => {
	await leftBehind({ host: 'another-host' });
	await expect(lockDataFolder(folder)).rejects.toThrow(/on another-host .*delete .*\.in-use/);
});

test('a number given to a new process since isn’t the old holder', async () => {
	await leftBehind({ startedTicks: '1' });
	const lock = await lockDataFolder(folder);
	await lock.release();
});

test('of two that find a dead holder’s file, the slower one leaves the quicker one’s in place', async () => {
	await leftBehind({ startedTicks: '1' });
	meanwhile.act = () => leftBehind({ command: 'node the-quicker-one' });
	await expect(lockDataFolder(folder)).rejects.toThrow(/node the-quicker-one/);
	expect(await readFile(join(folder, '.in-use'), 'utf8')).toContain('the-quicker-one');
	expect(await readdir(folder)).toEqual(['.in-use']);
});

test('a file from before the last boot, or cut short by a crash, holds nobody', async () => {
	await leftBehind({ boot: 'an earlier boot' });
	await (await lockDataFolder(folder)).release();
	await writeFile(join(folder, '.in-use'), '{"pid": 1');
	await (await lockDataFolder(folder)).release();
});
