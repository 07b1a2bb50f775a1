/** Keeps astropy running beside us for the whole bench, and asks it line by line. */
import { spawn, type ChildProcessWithoutNullStreams } from 'node:child_process';
import { createInterface } from 'node:readline';
import { fileURLToPath } from 'node:url';
import type { Contestant } from './rounds.ts';

const SCRIPT = fileURLToPath(new URL('anchor.py', import.meta.url));

export interface Anchor {
	/** Its answers to the first inputs of a cell, so that a fast wrong side can’t win. */
	values(cell: string, count: number): Promise<number[]>;
	contestant(cell: string): Contestant;
	close(): void;
}

export function startAnchor(python: string): Anchor {
	const child: ChildProcessWithoutNullStreams = spawn(python, ['-B', SCRIPT]);
	let said = '';
	child.stderr.on('data', (text: Buffer) => (said = (said + text.toString()).slice(-4000)));
	const lines = createInterface(child.stdout)[Symbol.asyncIterator]();
	const ask = async (question: object): Promise<Record<string, unknown>> => {
		child.stdin.write(`${JSON.stringify(question)}\n`);
		const { value, done } = await lines.next();
		if (done) throw new Error(`astropy’s side ended:\n${said}`);
		return JSON.parse(value) as Record<string, unknown>;
	};
	return {
		values: async (cell, count) => (await ask({ cell, values: count })).values as number[],
		contestant: (cell) => async (seconds) => (await ask({ cell, seconds })).rate as number,
		close: () => child.stdin.end()
	};
}
