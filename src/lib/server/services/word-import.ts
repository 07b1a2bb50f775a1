/** Brings the copy of a .docx file in. Nothing of the file is kept: what comes back goes to the writer’s manuscript. */
import { SteelyardError } from '../../errors.ts';
import type { ImportedCopy } from '../../import/imported-copy.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import { WORD_FILE_LIMIT_BYTES } from '../word-files/limit.ts';
import { REFUSALS, WordFileRefused } from '../word-files/refusal.ts';
import { readWordFile } from '../word-files/word-file.ts';

/** Files that are read at the same time, for everyone together: each takes a thread and its memory. */
const MOST_AT_ONCE = 2;
let underWay = 0;

/** Throws `word-file-refused` with a sentence, `word-file-too-heavy` at 5 MB, `word-files-slowed` when two are under way. */
export async function importWordFile(
	{ actor }: Pick<Context, 'actor'>,
	body: AsyncIterable<Uint8Array>
): Promise<ImportedCopy> {
	requirePermission(actor, 'edit-draft');
	if (underWay >= MOST_AT_ONCE)
		throw new SteelyardError('word-files-slowed', { retryAfterSeconds: 5 });
	underWay += 1;
	try {
		return await readWordFile(await wholeOf(body));
	} catch (error) {
		if (!(error instanceof WordFileRefused)) throw error;
		throw new SteelyardError('word-file-refused', { why: error.why, ...REFUSALS[error.why] });
	} finally {
		underWay -= 1;
	}
}

async function wholeOf(body: AsyncIterable<Uint8Array>): Promise<Buffer> {
	const chunks: Uint8Array[] = [];
	let size = 0;
	try {
		for await (const chunk of body) {
			size += chunk.byteLength;
			if (size > WORD_FILE_LIMIT_BYTES) throw new SteelyardError('word-file-too-heavy');
			chunks.push(chunk);
		}
	} catch (error) {
		// The server in front ends a body that is too long with a 413 of its own.
		if (error instanceof Error && 'status' in error && error.status === 413)
			throw new SteelyardError('word-file-too-heavy');
		throw error;
	}
	return Buffer.concat(chunks);
}
