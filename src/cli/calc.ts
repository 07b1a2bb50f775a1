/**
 * JSON lines in, JSON lines out: `{"calculator": "line.band", "inputs": {"wavelength_nm": 550}}` on standard input gives
 * one answer a line on standard output. A broken line is refused by itself and the rest go on. A fault of ours is told on
 * standard error and by the exit code.
 */
import { once } from 'node:events';
import { calculate, type CalculationAnswer } from '../lib/api/calculation.ts';

const LONGEST_LINE = 1 << 20;

let faults = 0;

process.stdout.on('error', (error: NodeJS.ErrnoException) => {
	// Whoever read us has read enough.
	if (error.code === 'EPIPE') process.exit(0);
	throw error;
});

process.stdin.setEncoding('utf8');
for await (const line of linesOf(process.stdin)) {
	if (line !== null && line.trim() === '') continue;
	const answer = line === null ? tooLong() : answerTo(line);
	if (!process.stdout.write(`${JSON.stringify(answer)}\n`)) await once(process.stdout, 'drain');
}
if (faults > 0) process.exitCode = 1;

function answerTo(line: string): CalculationAnswer {
	let request: unknown;
	try {
		request = JSON.parse(line);
	} catch {
		return {
			refused: {
				code: 'not-json',
				message: 'This line is not JSON. Send one whole object on each line.'
			}
		};
	}
	try {
		return calculate(request);
	} catch (fault) {
		faults += 1;
		process.stderr.write(`${fault instanceof Error ? fault.stack : String(fault)}\n`);
		return {
			refused: {
				code: 'fault',
				message:
					'The calculator failed on this line. The fault is ours; it is told on standard error.'
			}
		};
	}
}

function tooLong(): CalculationAnswer {
	return {
		refused: {
			code: 'line-too-long',
			message: 'This line is longer than a megabyte. Send each calculation on a line of its own.'
		}
	};
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
