/** How the commands speak while they work: one line a step, with the seconds it took. Plain Node, no packages. */
import process from 'node:process';

/** Where progress goes; `--json` runs send it to standard error so that standard output holds the answer alone. */
let out = process.stdout;
export const speakOnStandardError = () => {
	out = process.stderr;
};

export const say = (line = '') => out.write(`${line}\n`);

export const seconds = (since) => `${((performance.now() - since) / 1000).toFixed(1)} s`;

/** A failure that the person at the keyboard can mend: shown as its sentence, without a stack. */
export class Plain extends Error {
	name = 'Plain';
}

/**
 * Runs `work` under a line that counts the seconds: in place on a terminal, a line every ten seconds elsewhere.
 * Whatever `work` throws is passed on.
 */
export async function step(name, work) {
	const start = performance.now();
	const onTerminal = Boolean(out.isTTY);
	const tick = () => {
		if (onTerminal) out.write(`\r  … ${name}  ${seconds(start)}`);
		else say(`  … ${name}, ${seconds(start)}`);
	};
	if (onTerminal) tick();
	const timer = setInterval(tick, onTerminal ? 200 : 10_000);
	const close = (mark) => {
		clearInterval(timer);
		out.write(`${onTerminal ? '\r\x1b[K' : ''}  ${mark} ${name}  ${seconds(start)}\n`);
	};
	try {
		const result = await work();
		close('✓');
		return result;
	} catch (error) {
		close('✗');
		throw error;
	}
}

/** Ends the command: a plain failure as its sentence, anything else with its stack. */
export function giveUp(error) {
	process.stderr.write(`\n${error instanceof Plain ? error.message : (error?.stack ?? error)}\n`);
	process.exit(1);
}
