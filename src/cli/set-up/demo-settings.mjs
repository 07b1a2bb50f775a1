/** What the demo runs on: its folder, its ports, its secrets. Plain Node, no packages. */
import { randomBytes } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { hostname } from 'node:os';
import { join, resolve } from 'node:path';
import { FolderHeld, holdFolder } from './folder-lock.mjs';
import { isFree } from './ports.mjs';
import { ROOT } from './project.mjs';
import { Plain } from './say.mjs';

/** Port, the setting that changes it, and what it is for. */
const PORTS = {
	app: [4620, 'DEMO_PORT', 'the app'],
	partner: [4621, 'DEMO_PARTNER_PORT', 'the partner’s pages'],
	mail: [4622, 'DEMO_MAIL_PORT', 'the mail tray'],
	smtp: [4625, 'DEMO_SMTP_PORT', 'the mail server'],
	store: [4629, 'DEMO_STORE_PORT', 'the object store']
};

/** The demo's ports by name; throws a sentence for one that is no port, or two that are the same. */
export function readPorts(env) {
	const ports = {};
	for (const [name, [standard, setting]] of Object.entries(PORTS)) {
		const given = env[setting]?.trim() || String(standard);
		const port = Number(given);
		if (!/^\d+$/.test(given) || port < 1 || port > 65535) {
			throw new Plain(
				`${setting} is “${given}”. Give it a whole number from 1 to 65535, such as ${standard}.`
			);
		}
		const twin = Object.keys(ports).find((other) => ports[other] === port);
		if (twin) {
			throw new Plain(
				`${PORTS[twin][1]} and ${setting} are both ${port}. Give each a port of its own.`
			);
		}
		ports[name] = port;
	}
	return ports;
}

/** Throws a sentence that names each taken port, what it is for and how to choose another. */
export async function requireFreePorts(ports) {
	const taken = [];
	for (const [name, port] of Object.entries(ports)) {
		const [, setting, purpose] = PORTS[name];
		if (!(await isFree(port))) {
			taken.push(
				`Port ${port}, for ${purpose}, is taken by another program. Stop that program, or choose another port: ` +
					`${setting}=${port + 100} npm run demo`
			);
		}
	}
	if (taken.length > 0) throw new Plain(taken.join('\n'));
}

/** Marks a folder as the demo's own, and holds its secrets. */
const RECORD = 'steelyard-demo.json';
const LOCK_NOTE = '.in-use';

const contents = (folder) =>
	existsSync(folder) ? readdirSync(folder).filter((name) => !name.startsWith(LOCK_NOTE)) : [];

export const demoFolder = (env) => resolve(ROOT, env.DEMO_DATA_DIR?.trim() || 'data/demo');

/** Throws unless the folder is the demo's own, empty, or not there yet: nothing else is written to or deleted. */
function requireDemoFolder(folder) {
	const inside = contents(folder);
	if (inside.length === 0 || inside.includes(RECORD)) return;
	throw new Plain(
		`${folder} has other things in it. Nothing was touched. Give the demo a folder of its own: ` +
			'DEMO_DATA_DIR=./data/another npm run demo'
	);
}

const isHere = (holder) => holder.host === hostname();
const holderOf = ({ holder }) => {
	if (!holder) return 'another process';
	const where = isHere(holder) ? '' : ` on ${holder.host}`;
	return `process ${holder.pid}${where}, since ${holder.since}`;
};
/** How to stop the holder; one on another host may have ended long ago, which can't be seen from here. */
const stopFor = (error, folder) => {
	if (!error.holder) return 'Ctrl+C where it runs';
	return isHere(error.holder)
		? `Ctrl+C where it runs, or kill ${error.holder.pid}`
		: `Ctrl+C where it runs; if it has long ended, delete ${join(folder, LOCK_NOTE)}`;
};

/** Takes the demo's folder; throws a sentence when another process has it. Returns the way to let go. */
export async function holdDemoFolder(folder) {
	requireDemoFolder(folder);
	try {
		return await holdFolder(folder);
	} catch (error) {
		if (!(error instanceof FolderHeld)) throw error;
		throw new Plain(
			`A demo already runs on ${folder} (${holderOf(error)}). Use that one, or stop it first: ${stopFor(error, folder)}. ` +
				'Nothing was changed.'
		);
	}
}

/** Where the server keeps its database; it takes its own lock on it. */
export const houseFolder = (folder) => join(folder, 'house');

/** Throws a sentence when a server runs on the demo's data without the demo. */
export async function requireIdleHouse(folder) {
	if (!existsSync(houseFolder(folder))) return;
	try {
		const release = await holdFolder(houseFolder(folder));
		release();
	} catch (error) {
		if (!(error instanceof FolderHeld)) throw error;
		throw new Plain(
			`A server runs on the demo’s data in ${houseFolder(folder)} (${holderOf(error)}). Stop it first: ` +
				`${stopFor(error, houseFolder(folder))}. Nothing was changed.`
		);
	}
}

/** Empties the folder. Call it only while holding the folder, with the house idle. */
export function clearDemoFolder(folder) {
	requireDemoFolder(folder);
	// The record goes last, so that a clearing cut short can be done again.
	const inside = contents(folder).sort((a, b) => Number(a === RECORD) - Number(b === RECORD));
	for (const name of inside) rmSync(join(folder, name), { recursive: true, force: true });
}

/** The demo's secrets, made at its first start. */
export function readSecrets(folder) {
	const path = join(folder, RECORD);
	if (!existsSync(path)) {
		const secrets = {
			authSecret: randomBytes(33).toString('base64'),
			storeAccessKey: `demo-${randomBytes(6).toString('hex')}`,
			storeSecretKey: randomBytes(24).toString('base64url')
		};
		writeFileSync(path, `${JSON.stringify(secrets, null, '\t')}\n`, { mode: 0o600 });
	}
	return JSON.parse(readFileSync(path, 'utf8'));
}
