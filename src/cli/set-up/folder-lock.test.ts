import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, realpath, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { lockDataFolder } from '../../lib/server/db/lock.ts';
import { FolderHeld, holdFolder } from './folder-lock.mjs';

let folder: string;

beforeEach(async () => {
	folder = await realpath(await mkdtemp(join(tmpdir(), 'steelyard-lock-')));
});
afterEach(() => rm(folder, { recursive: true }));

test('one holder at a time, and it can be had again after', async () => {
	const release = await holdFolder(folder);
	await expect(holdFolder(folder)).rejects.toThrow(FolderHeld);
	await expect(holdFolder(folder)).rejects.toThrow(`${folder} is held by process ${process.pid}`);
	release();
	(await holdFolder(folder))();
});

test('it is the lock that the server takes on its data, from either side', async () => {
	const release = await holdFolder(folder);
	await expect(lockDataFolder(folder)).rejects.toThrow(`in use by process ${process.pid}`);
	release();

	const lock = await lockDataFolder(folder);
	await expect(holdFolder(folder)).rejects.toThrow(`held by process ${process.pid}`);
	await lock.release();
});

test('a holder that is killed outright holds nothing', async () => {
	const lockModule = new URL('./folder-lock.mjs', import.meta.url).href;
	const holder = spawn(
		process.execPath,
		[
			'--input-type=module',
			'--eval',
			`import { holdFolder } from ${JSON.stringify(lockModule)};
			await holdFolder(${JSON.stringify(folder)});
			console.log('held');
			setInterval(() => {}, 1000);`
		],
		{ stdio: ['ignore', 'pipe', 'inherit'] }
	);
	await once(holder.stdout, 'data');
	await expect(holdFolder(folder)).rejects.toThrow(`held by process ${holder.pid}`);
	holder.kill('SIGKILL');
	await once(holder, 'close');
	(await holdFolder(folder))();
});
