/** Finds a Chromium, or installs Debian's. Plain Node, no packages. */
import { accessSync, constants, existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import process from 'node:process';
import { runQuietly } from './run.mjs';
import { Plain, step } from './say.mjs';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'];

function onPath(name) {
	return (process.env.PATH ?? '')
		.split(delimiter)
		.map((folder) => join(folder, name))
		.find((path) => {
			if (!existsSync(path)) return false;
			try {
				accessSync(path, constants.X_OK);
				return true;
			} catch (error) {
				if (error.code === 'EACCES') return false;
				throw error;
			}
		});
}

/** Path of the browser to drive: CHROMIUM_PATH, or the first known name on the PATH; null when there is none. */
export function findChromium() {
	const given = process.env.CHROMIUM_PATH?.trim();
	if (given) {
		if (existsSync(given)) return given;
		throw new Plain(`CHROMIUM_PATH is ${given}, and there is no such file.`);
	}
	return NAMES.map(onPath).find(Boolean) ?? null;
}

/** Path of a Chromium, installed through apt where there is none and this may install it; else throws how to get one. */
export async function ensureChromium() {
	const found = findChromium();
	if (found) return found;
	const isRoot = process.getuid?.() === 0;
	if (!isRoot || !onPath('apt-get')) {
		throw new Plain(
			'The browser tests need Chromium, and there is none on the PATH. On Debian: sudo apt-get install chromium. ' +
				'Elsewhere install Chromium or Chrome and set CHROMIUM_PATH to its program file.'
		);
	}
	const options = {
		cwd: '/',
		env: { DEBIAN_FRONTEND: 'noninteractive' },
		failure: 'Chromium could not be installed. apt-get said:'
	};
	await step('Installing Chromium (apt-get)', async () => {
		await runQuietly('apt-get', ['update', '-q'], options);
		await runQuietly('apt-get', ['install', '-qy', '--no-install-recommends', 'chromium'], options);
	});
	const installed = findChromium();
	if (!installed) throw new Plain('apt-get installed chromium, and it is still not on the PATH.');
	return installed;
}
