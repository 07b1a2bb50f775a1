/** The checkout itself: where it is, whether its packages and its build are current. Plain Node, no packages. */
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import process from 'node:process';
import { fileURLToPath } from 'node:url';
import { FolderHeld, holdFolder } from './folder-lock.mjs';
import { runQuietly } from './run.mjs';
import { Plain, step } from './say.mjs';

export const ROOT = fileURLToPath(new URL('../../../', import.meta.url));
const at = (...path) => join(ROOT, ...path);

const BUILD_STAMP = at('build', '.steelyard-sources');

const npm = process.platform === 'win32' ? 'npm.cmd' : 'npm';

/** Throws when this Node is too old to go on; engine-strict says the same at install, but later and longer. */
export function requireNode() {
	const [major, minor] = process.versions.node.split('.').map(Number);
	if ((major === 20 && minor >= 19) || (major === 22 && minor >= 12) || major > 22) return;
	throw new Plain(
		`Steelyard needs Node.js 20.19 or later in that line, or 22.12 and later. This is ${process.versions.node}.`
	);
}

const read = (path) => (existsSync(path) ? readFileSync(path, 'utf8') : null);
const packagesIn = (path) => JSON.parse(readFileSync(path, 'utf8')).packages;

/**
 * Whether what is installed is what the lock says. npm writes its own account of what it installed at the end of an
 * install, so one that was cut short has none. Optional packages may be missing: they are for other systems.
 */
function hasLockedPackages() {
	const account = at('node_modules', '.package-lock.json');
	if (!existsSync(account)) return false;
	const installed = packagesIn(account);
	return Object.entries(packagesIn(at('package-lock.json'))).every(
		([path, { version, optional }]) =>
			path === '' || (installed[path] ? installed[path].version === version : optional)
	);
}

/** Installs the locked packages when there are none, or others than the lock says. */
export async function ensurePackages() {
	if (hasLockedPackages()) return;
	await step('Installing packages (npm ci)', () =>
		runQuietly(npm, ['ci', '--no-audit', '--no-fund', '--loglevel=error'], {
			cwd: ROOT,
			failure: 'The packages could not be installed. npm said:'
		})
	);
}

const SOURCES = [
	'src',
	'embed',
	'static',
	'svelte.config.js',
	'vite.config.ts',
	'tsconfig.json',
	'package-lock.json'
];
/** Changes here change nothing that is built. */
const NOT_BUILT = [/\.test\.ts$/, /^src\/cli\//, /(^|\/)node_modules\//];

function* filesUnder(path) {
	const entries = readdirSync(path, { withFileTypes: true });
	entries.sort((a, b) => (a.name < b.name ? -1 : 1));
	for (const entry of entries) {
		const child = join(path, entry.name);
		if (entry.isDirectory()) yield* filesUnder(child);
		else if (entry.isFile()) yield child;
	}
}

/** One hash over all that the build is made from. */
function sourcesStamp() {
	const hash = createHash('sha256').update(process.versions.node);
	for (const source of SOURCES.map((name) => at(name)).filter(existsSync)) {
		const files = statSync(source).isDirectory() ? filesUnder(source) : [source];
		for (const file of files) {
			const name = relative(ROOT, file).replaceAll('\\', '/');
			if (NOT_BUILT.some((pattern) => pattern.test(name))) continue;
			hash.update(`\0${name}\0`).update(readFileSync(file));
		}
	}
	return hash.digest('hex');
}

const local = (tool) =>
	at('node_modules', '.bin', process.platform === 'win32' ? `${tool}.cmd` : tool);

/** The parts of the build, in order; each embed configuration says itself where its files go. */
const PARTS = [
	['Building the app', ['build']],
	['Building the frame’s script and style', ['build', '--config', 'embed/vite.config.ts']],
	['Building the server', ['build', '--config', 'embed/vite.serve.config.ts']]
];

/** Builds the app, the frame and the server when a source has changed since the last whole build. */
export async function ensureBuild({ force = false } = {}) {
	const release = await holdFolder(at('build')).catch((error) => {
		if (!(error instanceof FolderHeld)) throw error;
		throw new Plain(
			`Another build of this checkout is running${error.holder ? ` (process ${error.holder.pid})` : ''}. ` +
				'Wait for it to end, then start this again.'
		);
	});
	try {
		const stamp = sourcesStamp();
		if (!force && read(BUILD_STAMP) === stamp) return false;
		rmSync(BUILD_STAMP, { force: true });
		for (const [name, args] of PARTS) {
			await step(name, () =>
				runQuietly(local('vite'), args, {
					cwd: ROOT,
					env: { NODE_ENV: 'production' },
					failure: `${name} failed:`
				})
			);
		}
		writeFileSync(BUILD_STAMP, stamp);
		return true;
	} finally {
		release();
	}
}
