/** Reads a file of copy, Markdown, plain text or a word file, into blocks; or says why it can't be had. */
import type { ImportedCopy } from '../../import/imported-copy.ts';
import { copyFromMarkdown } from '../../import/markdown-copy.ts';
import { copyFromText } from '../../import/text-copy.ts';
import { routes } from '../../routes.ts';

export type FileRead = { ok: true; copy: ImportedCopy } | { ok: false; says: string };

const AWAY = 'The server doesn’t answer. The file wasn’t brought in; try again when it is back.';

export async function readFile(file: File): Promise<FileRead> {
	if (/\.docx$/i.test(file.name)) return readWordFile(file);
	const text = await file.text();
	return {
		ok: true,
		copy: /\.txt$/i.test(file.name) ? copyFromText(text) : copyFromMarkdown(text)
	};
}

/** A word file is opened on the server, where what is hidden in it can do no harm. */
async function readWordFile(file: File): Promise<FileRead> {
	const answer = await fetch(routes.api.importWord(), {
		method: 'POST',
		headers: { 'content-type': 'application/octet-stream' },
		body: file
	}).catch(() => null);
	if (!answer) return { ok: false, says: AWAY };
	const told: unknown = await answer.json().catch(() => null);
	if (answer.ok && told) return { ok: true, copy: told as ImportedCopy };
	const { error } = (told ?? {}) as { error?: { message?: string; help?: string } };
	return { ok: false, says: [error?.message ?? AWAY, error?.help].filter(Boolean).join(' ') };
}
