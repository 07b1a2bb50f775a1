#!/usr/bin/env node
/**
 * npm run demo [-- --fresh --json]
 * The whole house on this machine: installs and builds what is missing, starts an object store, a mail server, a partner's
 * pages and the built server, and says where everything is. Ctrl+C closes all of it.
 */
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import process from 'node:process';
import { setTimeout as pause } from 'node:timers/promises';
import { parseArgs } from 'node:util';
import {
	clearDemoFolder,
	demoFolder,
	holdDemoFolder,
	houseFolder,
	readPorts,
	readSecrets,
	requireFreePorts,
	requireIdleHouse
} from './set-up/demo-settings.mjs';
import { ensureBuild, ensurePackages, requireNode, ROOT } from './set-up/project.mjs';
import { endRunning } from './set-up/run.mjs';
import { giveUp, Plain, say, seconds, speakOnStandardError, step } from './set-up/say.mjs';

/** Longest the server may take to its first answer: a new database on a busy machine takes half a minute. */
const SERVER_START_MS = 180_000;
/** Longest a child may take to close before it is ended. */
const CLOSE_MS = 25_000;

const start = performance.now();
/** The demo's children, in the order in which they started; they close in the reverse. */
const children = [];
let closing = false;

/** Starts a child that ends with this process, keeping what it prints for the case that it fails. */
function startChild(name, args, { env = {}, onLine = () => {} } = {}) {
	const child = spawn(
		process.execPath,
		['--import', join(ROOT, 'src/cli/set-up/end-with-parent.mjs'), ...args],
		{
			cwd: ROOT,
			env: { ...process.env, ...env },
			stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
			// Its own group: Ctrl+C reaches this process alone, which closes the children in order.
			detached: true
		}
	);
	const entry = { name, child, said: '' };
	const hear = (chunk) => {
		entry.said = (entry.said + chunk).slice(-20_000);
		String(chunk).split('\n').forEach(onLine);
	};
	child.stdout.on('data', hear);
	child.stderr.on('data', hear);
	entry.ended = once(child, 'close').then(([code, signal]) => {
		entry.hasEnded = true;
		if (!closing) {
			entry.failure = new Plain(
				`${name} ended (${signal ?? code}). It said:\n\n${entry.said.trimEnd()}`
			);
		}
		return entry.failure;
	});
	children.push(entry);
	return entry;
}

/** Resolves with the promise, or rejects as soon as the child ends. */
function unlessItEnds(entry, promise) {
	return Promise.race([
		promise,
		entry.ended.then((failure) => {
			throw failure ?? new Plain(`${entry.name} was closed.`);
		})
	]);
}

async function closeAll() {
	closing = true;
	for (const { child, ended, hasEnded } of children.toReversed()) {
		if (hasEnded) continue;
		child.kill('SIGTERM');
		const timer = setTimeout(() => child.kill('SIGKILL'), CLOSE_MS);
		await ended;
		clearTimeout(timer);
	}
}

async function answers(url) {
	try {
		const response = await fetch(url, { redirect: 'manual', signal: AbortSignal.timeout(5000) });
		await response.arrayBuffer();
		return response.status === 200;
	} catch (error) {
		// Not listening yet, or slow: asked again by the caller until its time is up.
		if (error instanceof TypeError || error.name === 'TimeoutError') return false;
		throw error;
	}
}

async function until200(url, withinMs) {
	const deadline = Date.now() + withinMs;
	while (Date.now() < deadline) {
		if (await answers(url)) return;
		await pause(100);
	}
	throw new Plain(`${url} gave no page within ${withinMs / 1000} s.`);
}

async function startSurroundings({ folder, ports, secrets, origin }) {
	const settings = {
		storePort: ports.store,
		storeFolder: join(folder, 'store'),
		storeAccessKey: secrets.storeAccessKey,
		smtpPort: ports.smtp,
		mailPort: ports.mail,
		mailFolder: join(folder, 'mail'),
		partnerPort: ports.partner,
		steelyard: origin
	};
	const entry = startChild('The object store, mail and partner’s pages', [
		'--import',
		'tsx',
		join(ROOT, 'tests/support/fakes.ts'),
		JSON.stringify(settings)
	]);
	const [message] = await unlessItEnds(entry, once(entry.child, 'message'));
	return message.people;
}

async function startServer({ folder, ports, secrets, origin }) {
	let isReady = () => {};
	const ready = new Promise((resolve) => (isReady = resolve));
	const entry = startChild('The server', [join(ROOT, 'build/serve.js')], {
		env: {
			NODE_ENV: 'production',
			ORIGIN: origin,
			HOST: '127.0.0.1',
			PORT: String(ports.app),
			STEELYARD_DATA_DIR: houseFolder(folder),
			AUTH_SECRET: secrets.authSecret,
			STORE_ENDPOINT: `http://127.0.0.1:${ports.store}`,
			STORE_BUCKET: 'steelyard',
			STORE_REGION: 'local',
			STORE_ACCESS_KEY: secrets.storeAccessKey,
			STORE_SECRET_KEY: secrets.storeSecretKey,
			SMTP_URL: `smtp://127.0.0.1:${ports.smtp}`,
			MAIL_FROM: 'desk@varrowmere.example',
			STEELYARD_SEED: 'demo',
			HOUSE_NAME: 'Varrowmere Institute, Public Desk'
		},
		onLine: (line) => {
			if (/\bready\b/.test(line)) isReady();
		}
	});
	await unlessItEnds(entry, ready);
	await unlessItEnds(entry, until200(`${origin}/sign-in`, SERVER_START_MS));
}

function describe({ ports, origin, people }) {
	return {
		app: origin,
		partner: `http://127.0.0.1:${ports.partner}`,
		partnerArticles: ['first-light-on-the-dial', 'same-drop-same-blow'].map(
			(slug) => `http://127.0.0.1:${ports.partner}/${slug}`
		),
		mail: `http://localhost:${ports.mail}`,
		people
	};
}

function print(demo) {
	const width = Math.max(...demo.people.map(({ roles }) => roles.join(', ').length));
	const mailWidth = Math.max(...demo.people.map(({ email }) => email.length));
	say();
	say(`  Steelyard          ${demo.app}`);
	say(`  A partner's page   ${demo.partner}   (another host: frames of the published pieces)`);
	say(`  Mail tray          ${demo.mail}   (every letter the app sends)`);
	say();
	say('  Sign in as');
	for (const { roles, email, name, passphrase } of demo.people) {
		say(
			`    ${roles.join(', ').padEnd(width)}   ${email.padEnd(mailWidth)}   ${passphrase}   (${name})`
		);
	}
	say();
	say(
		`  Ready after ${seconds(start)}. Ctrl+C closes everything; the data stays for the next start.`
	);
}

function readFlags() {
	try {
		return parseArgs({ options: { fresh: { type: 'boolean' }, json: { type: 'boolean' } } }).values;
	} catch (error) {
		throw new Plain(`${error.message}. It takes --fresh, which starts over, and --json.`);
	}
}

async function run() {
	const flags = readFlags();
	if (flags.json) speakOnStandardError();
	requireNode();

	const ports = readPorts(process.env);
	const folder = demoFolder(process.env);
	const origin = `http://localhost:${ports.app}`;
	const letGo = await holdDemoFolder(folder);
	process.once('exit', letGo);
	await requireIdleHouse(folder);
	await requireFreePorts(ports);
	if (flags.fresh) clearDemoFolder(folder);

	say('Steelyard demo');
	await ensurePackages();
	await ensureBuild();
	const secrets = readSecrets(folder);
	const people = await step('Starting object store, mail and partner’s pages', () =>
		startSurroundings({ folder, ports, secrets, origin })
	);
	await step('Starting the server', () => startServer({ folder, ports, secrets, origin }));

	const demo = describe({ ports, origin, people });
	if (flags.json) process.stdout.write(`${JSON.stringify(demo)}\n`);
	print(demo);
	const failure = await Promise.race(children.map(({ ended }) => ended));
	if (failure) throw failure;
}

async function stop() {
	if (closing) return;
	say('\nClosing…');
	endRunning();
	await closeAll();
	process.exit(0);
}

process.on('SIGINT', stop);
process.on('SIGTERM', stop);
if (process.env.npm_lifecycle_event) {
	// `npm run` puts a shell between itself and this process, and that shell passes no SIGTERM on: it just ends.
	const shell = process.ppid;
	setInterval(() => process.ppid !== shell && stop(), 500).unref();
}

run().catch(async (error) => {
	if (closing) return;
	await closeAll();
	giveUp(error);
});
