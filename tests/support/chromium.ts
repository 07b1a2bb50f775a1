/** One way to start the browser for tests: Debian's Chromium, with nothing of its own on the network. */
import process from 'node:process';
import { chromium } from 'playwright-core';
import type { Browser, LaunchOptions } from 'playwright-core';
import { findChromium } from '../../src/cli/set-up/chromium.mjs';

const QUIET = [
	'--disable-gpu',
	'--disable-quic',
	'--no-first-run',
	'--disable-background-networking',
	'--disable-component-update',
	'--disable-sync',
	'--disable-dev-shm-usage'
];

/** Starts Chromium; throws a sentence when there is none. */
export async function launchChromium(options: LaunchOptions = {}): Promise<Browser> {
	const executablePath = findChromium();
	if (!executablePath) {
		throw new Error('There is no Chromium on the PATH. npm test installs it, or says how.');
	}
	// Chromium's own sandbox does not start as root, as in most containers.
	const sandbox = process.getuid?.() === 0 ? ['--no-sandbox'] : [];
	return chromium.launch({ ...options, executablePath, args: [...QUIET, ...sandbox] });
}
