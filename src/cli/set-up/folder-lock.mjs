/**
 * One holder for a folder, by the same lock as the server takes on its data (src/lib/server/db/lock.ts): on Linux a
 * listening abstract socket named after the folder's real path, which the system frees the moment its holder ends, however
 * it ends; and everywhere a file `.in-use` that says who holds it. Plain Node, since it must work before the install.
 */
import { createHash, randomUUID } from 'node:crypto';
import {
	linkSync,
	mkdirSync,
	readFileSync,
	realpathSync,
	renameSync,
	rmSync,
	writeFileSync
} from 'node:fs';
import net from 'node:net';
import { hostname } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';

const onLinux = process.platform === 'linux';
const noteIn = (folder) => join(folder, '.in-use');

/** The note's text; null when there is none. */
function textOf(path) {
	try {
		return readFileSync(path, 'utf8');
	} catch (error) {
		if (error.code === 'ENOENT') return null;
		throw error;
	}
}

/** Who says in this text that they hold the folder; null when it was cut short by a crash. */
function holderIn(text) {
	try {
		const { pid, startedTicks, boot, host, since } = JSON.parse(text);
		return Number.isInteger(pid) ? { pid, startedTicks, boot, host, since } : null;
	} catch (error) {
		if (error instanceof SyntaxError) return null;
		throw error;
	}
}

function noted(folder) {
	const text = textOf(noteIn(folder));
	return text === null ? null : holderIn(text);
}

const bootId = () =>
	onLinux ? readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim() : '';

/** Field 22 of /proc/<pid>/stat, counted from the end of the name; '' where there is no such process or file. */
function startedTicksOf(pid) {
	const stat = textOf(`/proc/${pid}/stat`);
	const fields = stat?.slice(stat.lastIndexOf(')') + 2).split(' ') ?? [];
	return fields[0] === 'Z' ? '' : (fields[19] ?? '');
}

/** A holder on another host can't be looked at, so it counts as living. */
function isAlive({ pid, startedTicks, boot, host }) {
	if (host !== hostname()) return true;
	if (boot !== bootId()) return false;
	if (startedTicks) return startedTicksOf(pid) === startedTicks;
	try {
		process.kill(pid, 0);
		return true;
	} catch (error) {
		return error.code === 'EPERM';
	}
}

export class FolderHeld extends Error {
	name = 'FolderHeld';
	constructor(folder, holder) {
		const elsewhere = holder && holder.host !== hostname() ? ` on ${holder.host}` : '';
		const by = holder ? ` by process ${holder.pid}${elsewhere} since ${holder.since}` : '';
		const mend = elsewhere ? ` If that has long ended, delete ${noteIn(folder)}.` : '';
		super(`${folder} is held${by}.${mend}`);
		this.holder = holder;
	}
}

function takeSocket(folder) {
	const name = `\0steelyard-${createHash('sha256').update(folder).digest('hex')}`;
	return new Promise((resolve, reject) => {
		const server = net.createServer((socket) => socket.destroy());
		server.once('error', (error) =>
			reject(error.code === 'EADDRINUSE' ? new FolderHeld(folder, noted(folder)) : error)
		);
		server.listen({ path: name }, () => resolve(server.unref()));
	});
}

/**
 * Takes the folder (made when missing) until the returned function is called or this process ends.
 * Throws FolderHeld when another process has it.
 */
export async function holdFolder(path) {
	mkdirSync(path, { recursive: true });
	const folder = realpathSync(path);
	const note = noteIn(folder);

	const socket = onLinux ? await takeSocket(folder) : null;
	try {
		takeNote(folder, note);
	} catch (error) {
		socket?.close();
		throw error;
	}
	return () => {
		rmSync(note, { force: true });
		socket?.close();
	};
}

function takeNote(folder, note) {
	const earlier = textOf(note);
	if (earlier !== null) {
		const holder = holderIn(earlier);
		if (holder && isAlive(holder)) throw new FolderHeld(folder, holder);
		setAside(folder, note, earlier);
	}
	const mine = {
		pid: process.pid,
		startedTicks: startedTicksOf(process.pid),
		boot: bootId(),
		host: hostname(),
		command: process.argv.slice(0, 2).join(' '),
		since: new Date().toISOString()
	};
	try {
		// `wx`: between two that find no living holder, the file system chooses.
		writeFileSync(note, `${JSON.stringify(mine)}\n`, { flag: 'wx' });
	} catch (error) {
		throw error.code === 'EEXIST' ? new FolderHeld(folder, noted(folder)) : error;
	}
}

/** Takes a dead holder's note away; when another one came away, since someone was quicker, it is put back. */
function setAside(folder, note, read) {
	const aside = `${note}.${randomUUID()}`;
	try {
		renameSync(note, aside);
	} catch (error) {
		if (error.code === 'ENOENT') return; // someone else set it aside; `wx` decides
		throw error;
	}
	const taken = readFileSync(aside, 'utf8');
	try {
		if (taken === read) return;
		try {
			linkSync(aside, note);
		} catch (error) {
			if (error.code !== 'EEXIST') throw error;
		}
		throw new FolderHeld(folder, holderIn(taken));
	} finally {
		rmSync(aside, { force: true });
	}
}
