/** `npm run demo` as a person meets it: the command itself, in its own process, on ports and a folder of its own. */
import { spawn } from 'node:child_process';
import type { ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdir, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';
import { setTimeout as pause } from 'node:timers/promises';
import { fileURLToPath } from 'node:url';
import { createTransport } from 'nodemailer';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { freePorts } from '../support/ports.ts';

const COMMAND = fileURLToPath(new URL('../../src/cli/demo.mjs', import.meta.url));

interface Place {
	folder: string;
	ports: Record<
		'DEMO_PORT' | 'DEMO_PARTNER_PORT' | 'DEMO_MAIL_PORT' | 'DEMO_SMTP_PORT' | 'DEMO_STORE_PORT',
		number
	>;
}

interface Demo {
	app: string;
	partner: string;
	mail: string;
	people: { name: string; roles: string[]; email: string; passphrase: string }[];
}

let folder: string;
const started: ChildProcess[] = [];

async function newPlace(name: string): Promise<Place> {
	const [app = 0, partner = 0, mail = 0, smtp = 0, store = 0] = await freePorts(5);
	return {
		folder: join(folder, name),
		ports: {
			DEMO_PORT: app,
			DEMO_PARTNER_PORT: partner,
			DEMO_MAIL_PORT: mail,
			DEMO_SMTP_PORT: smtp,
			DEMO_STORE_PORT: store
		}
	};
}

function spawnDemo(place: Place, ...flags: string[]) {
	const ports = Object.entries(place.ports).map(([name, port]) => [name, String(port)]);
	const child = spawn(process.execPath, [COMMAND, ...flags], {
		env: { ...process.env, DEMO_DATA_DIR: place.folder, ...Object.fromEntries(ports) },
		stdio: ['ignore', 'pipe', 'pipe']
	});
	started.push(child);
	let out = '';
	let err = '';
	child.stdout.on('data', (chunk: Buffer) => (out += chunk.toString()));
	child.stderr.on('data', (chunk: Buffer) => (err += chunk.toString()));
	const ended = once(child, 'close').then(([code]) => ({ code: code as number | null, out, err }));
	return { child, ended };
}

/** Starts a demo and waits for what it says when it is ready. */
async function startDemo(place: Place, ...flags: string[]) {
	const { child, ended } = spawnDemo(place, '--json', ...flags);
	const line = new Promise<string>((resolve) => {
		child.stdout.on('data', (chunk: Buffer) => resolve(chunk.toString()));
	});
	const early = ended.then(({ code, err }) => {
		throw new Error(`The demo ended (${code}) before it was ready:\n${err}`);
	});
	const demo = JSON.parse(await Promise.race([line, early])) as Demo;
	early.catch(() => undefined);
	return { demo, child, ended };
}

/** Runs a demo that is expected to refuse. */
const refusal = (place: Place, ...flags: string[]) => spawnDemo(place, ...flags).ended;

const answers = (url: string) =>
	fetch(url).then(
		(response) => response.ok,
		() => false
	);

/** Signs in as the first of the people printed; resolves to the cookies that keep them signed in. */
async function signIn({ app, people: [person] }: Demo): Promise<string> {
	const response = await fetch(`${app}/sign-in?/passphrase`, {
		method: 'POST',
		headers: { origin: app },
		body: new URLSearchParams({
			email: person?.email ?? '',
			passphrase: person?.passphrase ?? '',
			__superform_id: 'passphrase'
		}),
		redirect: 'manual'
	});
	return response.headers
		.getSetCookie()
		.map((cookie) => cookie.split(';')[0])
		.join('; ');
}

const deskStatus = async ({ app }: Demo, cookie: string) =>
	(await fetch(`${app}/desk`, { headers: { cookie }, redirect: 'manual' })).status;

async function sendLetter(place: Place, subject: string) {
	await createTransport({ host: '127.0.0.1', port: place.ports.DEMO_SMTP_PORT }).sendMail({
		from: 'a@varrowmere.example',
		to: 'b@varrowmere.example',
		subject,
		text: subject
	});
}

beforeAll(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-demo-'));
});

afterAll(async () => {
	for (const child of started) {
		if (child.exitCode === null && child.signalCode === null) {
			child.kill('SIGTERM');
			await once(child, 'close');
		}
	}
	await rm(folder, { recursive: true, force: true });
});

describe('npm run demo', () => {
	test('opens the house, lets no second one near it, closes cleanly and is soon back with its data', async () => {
		const place = await newPlace('main');
		const first = await startDemo(place);
		expect(first.demo.people.map(({ roles }) => roles).flat()).toEqual(
			expect.arrayContaining(['writer', 'scientist', 'editor', 'admin'])
		);
		for (const url of [`${first.demo.app}/sign-in`, first.demo.partner, first.demo.mail]) {
			expect(await answers(url), url).toBe(true);
		}
		expect(new URL(first.demo.partner).hostname).not.toBe(new URL(first.demo.app).hostname);
		const cookie = await signIn(first.demo);
		expect(await deskStatus(first.demo, cookie)).toBe(200);
		await sendLetter(place, 'kept over a restart');

		const elsewhere = { ...(await newPlace('unused')), folder: place.folder };
		const second = await refusal(elsewhere);
		expect(second.code).toBe(1);
		expect(second.err).toContain(
			`A demo already runs on ${place.folder} (process ${first.child.pid}`
		);
		const fresh = await refusal(elsewhere, '--fresh');
		expect(fresh.code).toBe(1);
		expect(fresh.err).toContain('Nothing was changed.');
		expect(await answers(`${first.demo.app}/sign-in`)).toBe(true);

		const samePorts = await refusal({ ...place, folder: join(folder, 'other') });
		expect(samePorts.code).toBe(1);
		expect(samePorts.err).toContain(`Port ${place.ports.DEMO_PORT}, for the app, is taken`);
		expect(samePorts.err).toContain(`DEMO_PORT=${place.ports.DEMO_PORT + 100} npm run demo`);
		expect(await answers(`${first.demo.app}/sign-in`)).toBe(true);

		first.child.kill('SIGINT');
		expect((await first.ended).code).toBe(0);
		expect(await answers(`${first.demo.app}/sign-in`)).toBe(false);

		const before = performance.now();
		const again = await startDemo(place);
		expect(performance.now() - before).toBeLessThan(10_000);
		const letters = await (await fetch(`${again.demo.mail}/letters.json`)).text();
		expect(letters).toContain('kept over a restart');
		expect(await deskStatus(again.demo, cookie)).toBe(200);
		again.child.kill('SIGTERM');
		expect((await again.ended).code).toBe(0);

		const anew = await startDemo(place, '--fresh');
		expect(await (await fetch(`${anew.demo.mail}/letters.json`)).json()).toEqual([]);
		expect(await deskStatus(anew.demo, cookie)).toBe(303);
		// Killed outright: what it started ends too, and the folder is free again.
		anew.child.kill('SIGKILL');
		await anew.ended;
		for (let tries = 0; tries < 100 && (await answers(`${anew.demo.app}/sign-in`)); tries += 1) {
			await pause(100);
		}
		const afterKill = await startDemo(place);
		afterKill.child.kill('SIGINT');
		expect((await afterKill.ended).code).toBe(0);
	}, 300_000);

	test('ends with its child’s own words when the child can’t go on', async () => {
		const place = await newPlace('broken');
		await mkdir(place.folder, { recursive: true });
		await writeFile(
			join(place.folder, 'steelyard-demo.json'),
			JSON.stringify({ authSecret: 'short', storeAccessKey: 'k', storeSecretKey: 's' })
		);
		const { code, err } = await refusal(place, '--json');
		expect(code).toBe(1);
		expect(err).toContain('AUTH_SECRET is too short');
		expect(await answers(`http://127.0.0.1:${place.ports.DEMO_PARTNER_PORT}`)).toBe(false);
	});

	test('touches no folder that is not its own', async () => {
		const place = await newPlace('of-someone');
		await mkdir(place.folder, { recursive: true });
		await writeFile(join(place.folder, 'thesis.txt'), 'years of work');
		const { code, err } = await refusal(place, '--fresh');
		expect(code).toBe(1);
		expect(err).toContain('has other things in it');
		expect(await readFile(join(place.folder, 'thesis.txt'), 'utf8')).toBe('years of work');
	});

	test('names every taken port and the setting that changes it', async () => {
		const place = await newPlace('ports');
		const holders = [place.ports.DEMO_MAIL_PORT, place.ports.DEMO_STORE_PORT].map((port) =>
			createServer().listen(port, '127.0.0.1')
		);
		await Promise.all(holders.map((server) => once(server, 'listening')));
		const { code, err } = await refusal(place);
		holders.forEach((server) => server.close());
		expect(code).toBe(1);
		expect(err).toMatch(/Port \d+, for the mail tray, is taken[^\n]+DEMO_MAIL_PORT=/);
		expect(err).toMatch(/Port \d+, for the object store, is taken[^\n]+DEMO_STORE_PORT=/);
		expect(err).not.toContain('for the app');
	});

	test.each([
		{ given: { DEMO_PORT: 'abc' }, says: 'DEMO_PORT is “abc”' },
		{ given: { DEMO_MAIL_PORT: '70000' }, says: 'DEMO_MAIL_PORT is “70000”' }
	])('says what is wrong with $given', async ({ given, says }) => {
		const place = await newPlace('settings');
		const { code, err } = await refusal({
			...place,
			ports: { ...place.ports, ...(given as unknown as Place['ports']) }
		});
		expect(code).toBe(1);
		expect(err).toContain(says);
		expect(err).not.toContain('    at ');
	});
});
