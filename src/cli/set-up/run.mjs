/** Runs another program to its end. Plain Node, no packages. */
import { spawn } from 'node:child_process';
import process from 'node:process';
import { Plain } from './say.mjs';

const running = new Set();

/** Ends what is running on this command's behalf; for the moment when it is itself told to stop. */
export const endRunning = () => running.forEach((child) => child.kill('SIGTERM'));

/**
 * Runs a program and keeps its output back unless it fails, when the last of it is in the error.
 *
 * @param {string} program
 * @param {string[]} args
 * @param {{ cwd: string, env?: Record<string, string>, failure?: string }} options
 */
export function runQuietly(program, args, { cwd, env = {}, failure }) {
	return new Promise((resolve, reject) => {
		const child = spawn(program, args, {
			cwd,
			env: { ...process.env, ...env },
			stdio: ['ignore', 'pipe', 'pipe']
		});
		running.add(child);
		let output = '';
		const keep = (chunk) => (output = (output + chunk).slice(-60_000));
		child.stdout.on('data', keep);
		child.stderr.on('data', keep);
		child.on('error', reject);
		child.on('close', (code, signal) => {
			running.delete(child);
			if (code === 0) return resolve(output);
			const said = output.trimEnd().split('\n').slice(-60).join('\n');
			const head = failure ?? `${program} ${args.join(' ')} ended with ${signal ?? code}.`;
			reject(new Plain(`${head}\n\n${said}`));
		});
	});
}

/** Runs a program with this one's output; resolves to its exit code (128 when a signal ended it). */
export function runAloud(program, args, { cwd, env = {} }) {
	return new Promise((resolve, reject) => {
		const child = spawn(program, args, {
			cwd,
			env: { ...process.env, ...env },
			stdio: ['ignore', 'inherit', 'inherit']
		});
		running.add(child);
		child.on('error', reject);
		child.on('close', (code) => {
			running.delete(child);
			resolve(code ?? 128);
		});
	});
}
