/** One JSON answer a line for each line read. A broken line is answered by itself and the rest go on. */
import { once } from 'node:events';

const LONGEST_LINE = 1 << 20;

export interface LineError {
	error: { code: string; message: string };
}

export function lineError(code: string, message: string): LineError {
	return { error: { code, message } };
}

/** How a command words what is wrong with a line. */
type Trouble = (code: string, message: string) => object;

/**
 * Answers standard input line by line until it ends; empty lines are passed over. A fault of ours is told on standard
 * error and by the exit code, and the line is answered with the trouble.
 */
export async function answerLines(
	answerTo: (line: string) => object,
	trouble: Trouble = lineError
): Promise<void> {
	process.stdout.on('error', (error: NodeJS.ErrnoException) => {
		// Whoever read us has read enough.
		if (error.code === 'EPIPE') process.exit(0);
		throw error;
	});
	process.stdin.setEncoding('utf8');
	for await (const line of linesOf(process.stdin)) {
		if (line !== null && line.trim() === '') continue;
		const answer = line === null ? tooLong(trouble) : guarded(answerTo, line, trouble);
		if (!process.stdout.write(`${JSON.stringify(answer)}\n`)) await once(process.stdout, 'drain');
	}
}

function tooLong(trouble: Trouble): object {
	return trouble(
		'line-too-long',
		'This line is longer than a megabyte. Send each request on a line of its own.'
	);
}

function guarded(answerTo: (line: string) => object, line: string, trouble: Trouble): object {
	try {
		return answerTo(line);
	} catch (fault) {
		process.exitCode = 1;
		process.stderr.write(`${fault instanceof Error ? fault.stack : String(fault)}\n`);
		return trouble(
			'fault',
			'This line could not be answered. The fault is ours; it is told on standard error.'
		);
	}
}

/** Lines of a stream, without their ends; null for one that is too long to hold. */
async function* linesOf(stream: AsyncIterable<string>): AsyncGenerator<string | null> {
	let held = '';
	let skipping = false;
	let isFirst = true;
	for await (const chunk of stream) {
		const parts = (isFirst ? chunk.replace(/^\uFEFF/, '') : chunk).split('\n');
		isFirst = false;
		for (const [index, part] of parts.entries()) {
			if (!skipping) held += part;
			if (!skipping && held.length > LONGEST_LINE) {
				held = '';
				skipping = true;
				yield null;
			}
			if (index < parts.length - 1) {
				if (!skipping) yield held;
				held = '';
				skipping = false;
			}
		}
	}
	if (held !== '') yield held;
}
