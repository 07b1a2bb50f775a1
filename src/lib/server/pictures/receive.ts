/** Takes an upload in: to a file, piece by piece, so that memory stays flat however large it is or how many come at once. */
import { createHash } from 'node:crypto';
import { mkdtemp, open, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { SteelyardError } from '../../errors.ts';
import { LARGEST_BYTES } from '../../pictures/view.ts';

/** Uploads on their way in, of everyone together: each holds one file of up to 10 MB. */
const MOST_AT_ONCE = 24;
let underWay = 0;
const HEAD_BYTES = 64 * 1024;

export interface Received {
	/** SHA-256 of the bytes, in hex. */
	digest: string;
	/** The first 64 kB, to tell the kind by. */
	head(): Promise<Buffer>;
	read(): Promise<Buffer>;
}

/**
 * Runs `use` on what came in, and deletes it afterwards, whatever happens. Throws `picture-too-heavy` at the limit,
 * `picture-cut-off` when the sender goes away, `pictures-slowed` when too many come at once.
 */
export async function received<T>(
	body: AsyncIterable<Uint8Array>,
	use: (received: Received) => Promise<T>
): Promise<T> {
	if (underWay >= MOST_AT_ONCE)
		throw new SteelyardError('pictures-slowed', { retryAfterSeconds: 5 });
	underWay += 1;
	try {
		const folder = await mkdtemp(join(tmpdir(), 'steelyard-picture-'));
		try {
			const path = join(folder, 'upload');
			const digest = await write(path, body);
			return await use({ digest, head: () => readHead(path), read: () => readFile(path) });
		} finally {
			await rm(folder, { recursive: true, force: true });
		}
	} finally {
		underWay -= 1;
	}
}

async function readHead(path: string): Promise<Buffer> {
	const file = await open(path, 'r');
	try {
		const { buffer, bytesRead } = await file.read(Buffer.alloc(HEAD_BYTES), 0, HEAD_BYTES, 0);
		return buffer.subarray(0, bytesRead);
	} finally {
		await file.close();
	}
}

async function write(path: string, body: AsyncIterable<Uint8Array>): Promise<string> {
	const hash = createHash('sha256');
	const file = await open(path, 'wx');
	let size = 0;
	try {
		for await (const chunk of whole(body)) {
			size += chunk.byteLength;
			if (size > LARGEST_BYTES) throw new SteelyardError('picture-too-heavy');
			hash.update(chunk);
			await file.writeFile(chunk);
		}
	} finally {
		await file.close();
	}
	return hash.digest('hex');
}

/** The server ends a body that is too long with a 413 of its own, and one whose sender goes away with a plain error. */
async function* whole(body: AsyncIterable<Uint8Array>): AsyncGenerator<Uint8Array> {
	try {
		yield* body;
	} catch (error) {
		if (error instanceof SteelyardError) throw error;
		const isTooLong = error instanceof Error && 'status' in error && error.status === 413;
		throw new SteelyardError(isTooLong ? 'picture-too-heavy' : 'picture-cut-off');
	}
}
