import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { expect, test, vi } from 'vitest';

// Each test starts a process, which a busy machine takes seconds over.
vi.setConfig({ testTimeout: 60_000 });

const calc = fileURLToPath(new URL('./calc.ts', import.meta.url));
const tsx = fileURLToPath(import.meta.resolve('tsx'));

/** Runs the command on this input; `until` stops reading after so many bytes, as `head` does. */
function run(
	input: string,
	until = Infinity
): Promise<{ code: number | null; out: string; err: string }> {
	return new Promise((resolve, reject) => {
		const child = spawn(process.execPath, ['--import', tsx, calc]);
		let out = '';
		let err = '';
		child.stdout.setEncoding('utf8').on('data', (text: string) => {
			out += text;
			if (out.length >= until) child.stdout.destroy();
		});
		child.stderr.setEncoding('utf8').on('data', (text: string) => (err += text));
		child.stdin.on('error', () => undefined); // it may stop reading before we stop writing
		child.on('error', reject);
		child.on('close', (code) => resolve({ code, out, err }));
		child.stdin.end(input);
	});
}

const band = '{"calculator":"line.band","inputs":{"wavelength_nm":550}}';
const answer = '{"outputs":{"band":{"value":"visible","unit":""}},"warnings":[],"validity":"ok"}';

test('one answer for each line, in order; broken lines are refused and the rest go on', async () => {
	const { code, out, err } = await run(`\uFEFF${band}\r\n\n{broken\n  \n"text"\n${band}`);
	const lines = out.split('\n');
	expect(lines).toHaveLength(5);
	expect(lines[0]).toBe(answer);
	expect(JSON.parse(lines[1]!)).toMatchObject({ refused: { code: 'not-json' } });
	expect(JSON.parse(lines[2]!)).toMatchObject({ refused: { code: 'request-broken' } });
	expect(lines[3]).toBe(answer);
	expect(lines[4]).toBe('');
	expect({ code, err }).toEqual({ code: 0, err: '' });
});

test('a line of three megabytes is refused, and the next one answered', async () => {
	const { out } = await run(`"${'a'.repeat(3_000_000)}"\n${band}\n`);
	const [first, second] = out.split('\n');
	expect(JSON.parse(first!)).toMatchObject({ refused: { code: 'line-too-long' } });
	expect(second).toBe(answer);
});

test('many lines stream through, and a reader who stops early is no error', async () => {
	const many = `${band}\n`.repeat(20_000);
	expect((await run(many)).out.split('\n')).toHaveLength(20_001);
	expect(await run(many, 1000)).toMatchObject({ code: 0, err: '' });
});

test('nothing in, nothing out', async () => {
	expect(await run('')).toEqual({ code: 0, out: '', err: '' });
});
