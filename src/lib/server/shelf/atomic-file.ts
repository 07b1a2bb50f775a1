/** Writes a file beside its place, brings it to the disk, and renames it into it: a crash leaves the old one, the new one, or none. */
import { randomUUID } from 'node:crypto';
import { mkdir, open, rename, rm } from 'node:fs/promises';
import { dirname } from 'node:path';

export async function write(file: string, bytes: Uint8Array): Promise<void> {
	await mkdir(dirname(file), { recursive: true });
	const draft = `${file}.${randomUUID()}.tmp`;
	try {
		const handle = await open(draft, 'wx');
		try {
			await handle.writeFile(bytes);
			await handle.sync();
		} finally {
			await handle.close();
		}
		await rename(draft, file);
	} catch (error) {
		await rm(draft, { force: true });
		throw error;
	}
	const folder = await open(dirname(file), 'r');
	try {
		await folder.sync(); // the new name, too
	} finally {
		await folder.close();
	}
}

export function isMissing(error: unknown): boolean {
	return error instanceof Error && 'code' in error && error.code === 'ENOENT';
}
