#!/usr/bin/env node
/**
 * npm run build [-- --force]
 * Builds all that runs: build/app (pages), build/press (what the reader's frame loads), build/serve.js (the server).
 * An unchanged tree is not built again.
 */
import process from 'node:process';
import { ensureBuild, ensurePackages, requireNode } from './set-up/project.mjs';
import { giveUp, say } from './set-up/say.mjs';

try {
	requireNode();
	await ensurePackages();
	const built = await ensureBuild({ force: process.argv.includes('--force') });
	say(built ? 'Built into build/.' : 'The build is current. Build again all the same: --force');
} catch (error) {
	giveUp(error);
}
