/**
 * One process a data folder. PGlite takes no lock of its own: two processes on one folder both open it, and one of
 * them silently loses what it wrote. So every opener takes this lock first, and holds it until it closes.
 *
 * The lock is a Linux abstract socket named by a hash of the real path: the kernel gives it to one process, and takes
 * it back at once however that process ends. Abstract sockets don't reach across containers and don't exist on other
 * systems, so a file with pid, start time and host stands beside it.
 */
import { randomUUID } from 'node:crypto';
import { link, mkdir, readFile, realpath, rename, rm, writeFile } from 'node:fs/promises';
import { createServer, type Server } from 'node:net';
import { hostname } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { z } from 'zod';
import { sha256 } from '../auth/hashes.ts';

const Holder = z.object({
	pid: z.number().int().positive(),
	/** Clock ticks between boot and the start of the process; '' where the system doesn't tell. */
	startedTicks: z.string(),
	/** Changes with every boot; '' where the system doesn't tell. */
	boot: z.string(),
	host: z.string(),
	command: z.string(),
	since: z.string()
});
type Holder = z.infer<typeof Holder>;

/** The folder is someone else's; the message says whose, and what to do. */
export class DataFolderInUse extends Error {
	constructor(
		readonly folder: string,
		readonly holder: Holder | null
	) {
		super(sentence(folder, holder));
		this.name = 'DataFolderInUse';
	}
}

export interface FolderLock {
	/** The folder's real path. */
	folder: string;
	release(): Promise<void>;
}

/** Makes the folder when it's missing, and takes it. Throws DataFolderInUse when a living process has it. */
export async function lockDataFolder(path: string): Promise<FolderLock> {
	await mkdir(path, { recursive: true });
	const folder = await realpath(path);
	const file = join(folder, '.in-use');

	const socket = process.platform === 'linux' ? await takeSocket(folder) : null;
	if (socket === 'taken') throw new DataFolderInUse(folder, await readHolderSoon(file));
	try {
		await takeFile(folder, file);
	} catch (error) {
		await closeSocket(socket);
		throw error;
	}

	let held = true;
	return {
		folder,
		async release() {
			if (!held) return;
			held = false;
			await rm(file, { force: true });
			await closeSocket(socket);
		}
	};
}

function takeSocket(folder: string): Promise<Server | 'taken'> {
	const name = `\0steelyard-${sha256(folder)}`;
	return new Promise((resolve, reject) => {
		const server = createServer((connection) => connection.destroy());
		server.once('error', (error: NodeJS.ErrnoException) =>
			error.code === 'EADDRINUSE' ? resolve('taken') : reject(error)
		);
		server.listen({ path: name }, () => {
			server.unref();
			resolve(server);
		});
	});
}

function closeSocket(socket: Server | null): Promise<void> {
	return new Promise((resolve) => (socket ? socket.close(() => resolve()) : resolve()));
}

async function takeFile(folder: string, file: string): Promise<void> {
	const earlier = await readText(file);
	if (earlier !== null) {
		const holder = holderIn(earlier);
		if (holder && (await isAlive(holder))) throw new DataFolderInUse(folder, holder);
		await setAside(folder, file, earlier);
	}
	const holder: Holder = {
		pid: process.pid,
		startedTicks: (await startedTicks(process.pid)) ?? '',
		boot: await bootId(),
		host: hostname(),
		command: process.argv.slice(0, 2).join(' '),
		since: new Date().toISOString()
	};
	try {
		// `wx`: between two that find no living holder, the file system chooses.
		await writeFile(file, `${JSON.stringify(holder)}\n`, { flag: 'wx' });
	} catch (error) {
		if (!isCode(error, 'EEXIST')) throw error;
		throw new DataFolderInUse(folder, await readHolder(file));
	}
}

/**
 * Takes a dead holder's file away by renaming it, which one process alone can do, and looks at what came away: someone
 * quicker may have taken the folder since it was read, and then theirs is put back.
 */
async function setAside(folder: string, file: string, read: string): Promise<void> {
	const aside = `${file}.${randomUUID()}`;
	try {
		await rename(file, aside);
	} catch (error) {
		if (isCode(error, 'ENOENT')) return; // someone else set it aside; `wx` decides
		throw error;
	}
	const taken = await readText(aside);
	if (taken !== read) {
		// `link` takes no one's place, and a third one's file says just as well that the folder is in use.
		await link(aside, file).catch((error: unknown) => {
			if (!isCode(error, 'EEXIST')) throw error;
		});
		await rm(aside, { force: true });
		throw new DataFolderInUse(folder, holderIn(taken ?? ''));
	}
	await rm(aside, { force: true });
}

/** A holder on another host can't be looked at, so it counts as living. */
async function isAlive(holder: Holder): Promise<boolean> {
	if (holder.host !== hostname()) return true;
	if (holder.boot !== (await bootId())) return false;
	if (holder.startedTicks !== '') return (await startedTicks(holder.pid)) === holder.startedTicks;
	try {
		process.kill(holder.pid, 0);
		return true;
	} catch (error) {
		return isCode(error, 'EPERM');
	}
}

/** Field 22 of /proc/<pid>/stat; null when there is no such process, or it has ended and only waits to be reaped. */
async function startedTicks(pid: number): Promise<string | null> {
	try {
		const stat = await readFile(`/proc/${pid}/stat`, 'utf8');
		// The command name stands in brackets and may hold spaces: count from its end.
		const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
		return fields[0] === 'Z' ? null : (fields[19] ?? null);
	} catch (error) {
		if (isCode(error, 'ENOENT') || isCode(error, 'ESRCH')) return null;
		throw error;
	}
}

async function bootId(): Promise<string> {
	try {
		return (await readFile('/proc/sys/kernel/random/boot_id', 'utf8')).trim();
	} catch (error) {
		if (isCode(error, 'ENOENT')) return '';
		throw error;
	}
}

async function readHolder(file: string): Promise<Holder | null> {
	const text = await readText(file);
	return text === null ? null : holderIn(text);
}

/** Null when there is no file. */
async function readText(file: string): Promise<string | null> {
	try {
		return await readFile(file, 'utf8');
	} catch (error) {
		if (isCode(error, 'ENOENT')) return null;
		throw error;
	}
}

/** Null for a file cut short by a crash: nobody to ask. */
function holderIn(text: string): Holder | null {
	try {
		return Holder.parse(JSON.parse(text));
	} catch (error) {
		if (error instanceof SyntaxError || error instanceof z.ZodError) return null;
		throw error;
	}
}

/** The holder of the socket writes the file a moment after taking the socket. */
async function readHolderSoon(file: string): Promise<Holder | null> {
	for (let tries = 0; tries < 10; tries += 1) {
		const holder = await readHolder(file);
		if (holder && (await isAlive(holder))) return holder;
		await pause(50);
	}
	return readHolder(file);
}

function sentence(folder: string, holder: Holder | null): string {
	if (!holder) {
		return `The data folder ${folder} is in use by another process. Stop it, or set STEELYARD_DATA_DIR to another folder.`;
	}
	const where = holder.host === hostname() ? '' : ` on ${holder.host}`;
	const who = `process ${holder.pid}${where} (${holder.command}, since ${holder.since})`;
	const mend =
		where === ''
			? `Stop it first: Ctrl+C where it runs, or kill ${holder.pid}.`
			: `Stop it there first. If it has long ended, delete ${join(folder, '.in-use')}.`;
	return `The data folder ${folder} is in use by ${who}. ${mend} Or set STEELYARD_DATA_DIR to another folder.`;
}

function isCode(error: unknown, code: string): boolean {
	return error instanceof Error && 'code' in error && error.code === code;
}
