/** The built server for browser tests, with an object store, mail and a partner's pages around it, on free ports. */
import { spawn } from 'node:child_process';
import type { ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { existsSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';
import { setTimeout as pause } from 'node:timers/promises';
import { fileURLToPath } from 'node:url';
import { startMail } from './fakes/mail.ts';
import type { MailFake } from './fakes/mail.ts';
import { startObjectStore } from './fakes/object-store.ts';
import type { Listening } from './fakes/listen.ts';
import { startPartner } from './fakes/partner.ts';
import { freePorts } from './ports.ts';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));
const SERVER = join(ROOT, 'build/serve.js');
/** A test run that is itself killed leaves no server behind. */
const END_WITH_PARENT = join(ROOT, 'src/cli/set-up/end-with-parent.mjs');
const START_MS = 120_000;

export interface House {
	/** http://localhost:port. */
	origin: string;
	/** http://127.0.0.1:port, another host than the origin's. */
	partner: string;
	mail: MailFake;
	/** Where the server keeps its data. */
	dataFolder: string;
	/** Where the object store keeps its objects. */
	storeFolder: string;
	/** The server's process. */
	pid(): number;
	/** All that the server has printed since it last started. */
	said(): string;
	/** Ends the server with the signal and waits until it is gone; resolves to its exit code, null after SIGKILL. */
	end(signal: 'SIGTERM' | 'SIGKILL'): Promise<number | null>;
	/** Starts the server again on the same data, after `end`. */
	startAgain(): Promise<void>;
	/** Ends everything and deletes the data. */
	close(): Promise<void>;
}

interface Running {
	child: ChildProcess;
	ended: Promise<number | null>;
	said: () => string;
}

function spawnServer(env: Record<string, string>): Running {
	const child = spawn(process.execPath, ['--import', END_WITH_PARENT, SERVER], {
		cwd: ROOT,
		env: { PATH: process.env.PATH ?? '', NODE_ENV: 'production', ...env },
		stdio: ['ignore', 'pipe', 'pipe', 'ipc']
	});
	let said = '';
	const hear = (chunk: Buffer) => (said += chunk.toString('utf8'));
	child.stdout?.on('data', hear);
	child.stderr?.on('data', hear);
	const ended = once(child, 'close').then(([code]) => code as number | null);
	return { child, ended, said: () => said };
}

/** Waits for a page from the server; throws with what it said when it ends first or takes too long. */
async function untilAnswers({ child, said }: Running, url: string): Promise<void> {
	const deadline = Date.now() + START_MS;
	while (Date.now() < deadline) {
		if (child.exitCode !== null || child.signalCode !== null)
			throw new Error(`The server ended (${child.exitCode}):\n${said()}`);
		const status = await fetch(url, { redirect: 'manual' }).then(
			async (response) => {
				await response.arrayBuffer();
				return response.status;
			},
			// Not listening yet.
			() => 0
		);
		if (status === 200) return;
		await pause(100);
	}
	throw new Error(`The server gave no page within ${START_MS} ms:\n${said()}`);
}

/** Starts a house with people (`people`) or with people and pieces (`demo`). Needs a build: npm run build. */
export async function startHouse({
	seed = 'demo'
}: { seed?: 'none' | 'people' | 'demo' } = {}): Promise<House> {
	if (!existsSync(SERVER)) throw new Error('There is no build/serve.js. Run npm run build first.');
	const folder = await mkdtemp(join(tmpdir(), 'steelyard-house-'));
	const dataFolder = join(folder, 'house');
	const [appPort = 0] = await freePorts(1);
	const origin = `http://localhost:${appPort}`;
	const accessKey = 'key-of-the-tests';
	const store: Listening = await startObjectStore({
		port: 0,
		folder: join(folder, 'store'),
		accessKey
	});
	const mail = await startMail({ smtpPort: 0, trayPort: 0, folder: join(folder, 'mail') });
	const partner = await startPartner({ port: 0, steelyard: origin });

	const env = {
		ORIGIN: origin,
		HOST: '127.0.0.1',
		PORT: String(appPort),
		STEELYARD_DATA_DIR: dataFolder,
		AUTH_SECRET: 'a secret of the tests, which is long enough',
		STORE_ENDPOINT: store.url,
		STORE_BUCKET: 'steelyard',
		STORE_REGION: 'local',
		STORE_ACCESS_KEY: accessKey,
		STORE_SECRET_KEY: 'secret-of-the-tests',
		SMTP_URL: mail.smtpUrl,
		MAIL_FROM: 'desk@varrowmere.example',
		STEELYARD_SEED: seed,
		HOUSE_NAME: 'Varrowmere Institute, Public Desk'
	};
	let running: Running;
	const start = async () => {
		running = spawnServer(env);
		await untilAnswers(running, `${origin}/sign-in`);
	};
	const end = async (signal: 'SIGTERM' | 'SIGKILL') => {
		running.child.kill(signal);
		return running.ended;
	};
	const close = async () => {
		await end('SIGTERM');
		await Promise.all([store.close(), mail.close(), partner.close()]);
		await rm(folder, { recursive: true, force: true });
	};
	try {
		await start();
	} catch (error) {
		await close();
		throw error;
	}
	return {
		origin,
		partner: partner.url,
		mail,
		dataFolder,
		storeFolder: join(folder, 'store'),
		pid: () => running.child.pid ?? 0,
		said: () => running.said(),
		end,
		startAgain: start,
		close
	};
}
