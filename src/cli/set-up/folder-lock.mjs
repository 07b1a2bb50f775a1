/**
 * One holder for a folder, by the same lock as the server takes on its data (src/lib/server/db/lock.ts): on Linux a
 * listening abstract socket named after the folder's real path, which the system frees the moment its holder ends, however
 * it ends; and everywhere a file `.in-use` that says who holds it. Plain Node, since it must work before the install.
 */
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, realpathSync, rmSync, writeFileSync } from 'node:fs';
import net from 'node:net';
import { hostname } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';

const onLinux = process.platform === 'linux';
const noteIn = (folder) => join(folder, '.in-use');

/** Who says they hold the folder, or null when nobody does or the note was cut short by a crash. */
function noted(folder) {
	const path = noteIn(folder);
	if (!existsSync(path)) return null;
	try {
		const { pid, since } = JSON.parse(readFileSync(path, 'utf8'));
		return Number.isInteger(pid) ? { pid, since: String(since) } : null;
	} catch (error) {
		if (error instanceof SyntaxError) return null;
		throw error;
	}
}

function isAlive(pid) {
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
		super(`${folder} is held${holder ? ` by process ${holder.pid} since ${holder.since}` : ''}.`);
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
	if (!onLinux) {
		const holder = noted(folder);
		if (holder && isAlive(holder.pid)) throw new FolderHeld(folder, holder);
	}
	const mine = {
		pid: process.pid,
		startedTicks: '',
		boot: onLinux ? readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim() : '',
		host: hostname(),
		command: process.argv.slice(0, 2).join(' '),
		since: new Date().toISOString()
	};
	writeFileSync(note, `${JSON.stringify(mine)}\n`);
	return () => {
		rmSync(note, { force: true });
		socket?.close();
	};
}
