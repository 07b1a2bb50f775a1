/**
 * Runs the .docx reader in a thread of its own: it takes about a second for a hundred pages, and readers’ frames are
 * answered meanwhile. Its time and its memory are bounded, so a file made to hang it ends with the thread.
 */
import { createRequire } from 'node:module';
import { Worker } from 'node:worker_threads';
import { WordFileRefused } from './refusal.ts';

const LONGEST_MS = 20_000;
const MOST_MEMORY_MB = 320;

/** Plain JavaScript that needs no file of its own in the build. It sees the package alone: no settings, no database. */
const READER = `
const { parentPort, workerData } = require('node:worker_threads');
const mammoth = require(workerData.reader);
mammoth
	.convertToHtml(
		{ buffer: Buffer.from(workerData.file) },
		{
			includeEmbeddedStyleMap: false,
			externalFileAccess: false,
			convertImage: mammoth.images.imgElement(() => Promise.resolve({ src: '' })),
			styleMap: ["p[style-name='Title'] => h1:fresh", "p[style-name='Subtitle'] => p:fresh"]
		}
	)
	.then(({ value }) => parentPort.postMessage(value));
`;

/** HTML of a .docx package. Throws a refusal: `broken` when the reader can’t make it out, `too-long` when it takes too long. */
export function htmlOfPackage(file: Buffer): Promise<string> {
	const reader = createRequire(import.meta.url).resolve('mammoth');
	const worker = new Worker(READER, {
		eval: true,
		env: {},
		stdout: true,
		stderr: true,
		workerData: { reader, file },
		resourceLimits: { maxOldGenerationSizeMb: MOST_MEMORY_MB }
	});
	return new Promise<string>((resolve, reject) => {
		const late = setTimeout(() => {
			reject(new WordFileRefused('too-long'));
			void worker.terminate();
		}, LONGEST_MS);
		worker.once('message', (html: string) => resolve(html));
		worker.once('error', (error: NodeJS.ErrnoException) =>
			reject(new WordFileRefused(error.code === 'ERR_WORKER_OUT_OF_MEMORY' ? 'too-long' : 'broken'))
		);
		// An end without a word is the reader’s own failure.
		worker.once('exit', () => {
			clearTimeout(late);
			reject(new WordFileRefused('broken'));
		});
	});
}
