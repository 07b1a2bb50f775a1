#!/usr/bin/env node
/**
 * npm test [-- --only unit,database]
 * Sets itself up (packages, build, Chromium), then runs every check of the project and ends with `N passed, N failed`.
 * A stage that fails does not stop the ones after it; a stage that runs no test has failed.
 */
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';
import { parseArgs } from 'node:util';
import { ensureChromium } from './set-up/chromium.mjs';
import { ensureBuild, ensurePackages, requireNode, ROOT } from './set-up/project.mjs';
import { endRunning, runAloud } from './set-up/run.mjs';
import { giveUp, Plain, say, seconds } from './set-up/say.mjs';
import { tallyReport } from './set-up/tally.mjs';

const npmRun = (script) => ['npm', ['run', '--silent', script]];

/** A static check counts as one test; a Vitest project as many as it ran. */
const STAGES = [
	{ name: 'check', title: 'Types', command: npmRun('check') },
	{ name: 'lint', title: 'Lint', command: npmRun('lint') },
	{ name: 'format', title: 'Format', command: npmRun('format:check') },
	{ name: 'unit', title: 'Unit tests', project: 'unit' },
	{ name: 'database', title: 'Database tests', project: 'database', needs: ['build'] },
	{ name: 'browser', title: 'Browser tests', project: 'browser', needs: ['build', 'chromium'] }
];

const SET_UP = {
	build: async () => ensureBuild(),
	chromium: async () => {
		process.env.CHROMIUM_PATH = await ensureChromium();
	}
};

function readReport(path) {
	try {
		return JSON.parse(readFileSync(path, 'utf8'));
	} catch (error) {
		// Vitest ended before it wrote one; its own words are above.
		if (error.code === 'ENOENT') return null;
		throw error;
	}
}

async function runVitest(project, folder) {
	const reportPath = join(folder, `${project}.json`);
	const code = await runAloud(
		'npx',
		[
			'--no-install',
			'vitest',
			'run',
			'--project',
			project,
			'--allowOnly=false',
			'--reporter=default',
			'--reporter=json',
			`--outputFile.json=${reportPath}`
		],
		{ cwd: ROOT }
	);
	const report = readReport(reportPath);
	if (!report) return { passed: 0, failed: 1, failures: ['Vitest wrote no report.'] };
	const tally = tallyReport(report);
	if (tally.passed + tally.failed === 0) {
		return { passed: 0, failed: 1, failures: ['No test was run.'] };
	}
	if (code !== 0 && tally.failed === 0) {
		return { ...tally, failed: 1, failures: [`Vitest ended with code ${code}.`] };
	}
	return tally;
}

async function runStage(stage, folder) {
	for (const need of stage.needs ?? []) await SET_UP[need]();
	if (stage.project) return runVitest(stage.project, folder);
	const [program, args] = stage.command;
	const code = await runAloud(program, args, { cwd: ROOT });
	return code === 0
		? { passed: 1, failed: 0, failures: [] }
		: { passed: 0, failed: 1, failures: [`${stage.title} ended with code ${code}.`] };
}

function chosenStages() {
	const { values } = parseArgs({ options: { only: { type: 'string' } } });
	if (values.only === undefined) return STAGES;
	const names = values.only.split(',').map((name) => name.trim());
	const known = STAGES.map(({ name }) => name);
	const unknown = names.filter((name) => !known.includes(name));
	if (unknown.length > 0) {
		throw new Plain(`There is no stage ${unknown.join(', ')}. Stages: ${known.join(', ')}.`);
	}
	return STAGES.filter(({ name }) => names.includes(name));
}

async function run() {
	requireNode();
	const stages = chosenStages();
	await ensurePackages();

	const folder = mkdtempSync(join(tmpdir(), 'steelyard-test-'));
	const results = [];
	for (const stage of stages) {
		const start = performance.now();
		say(`\n── ${stage.title} ──`);
		const tally = await runStage(stage, folder).catch((error) => {
			if (!(error instanceof Plain)) throw error;
			return { passed: 0, failed: 1, failures: [error.message] };
		});
		results.push({ ...stage, ...tally, took: seconds(start) });
	}
	rmSync(folder, { recursive: true, force: true });

	say('\n── Summary ──');
	for (const { title, passed, failed, failures, took } of results) {
		say(`${failed === 0 ? '✓' : '✗'} ${title}: ${passed} passed, ${failed} failed, ${took}`);
		failures.slice(0, 20).forEach((failure) => say(`    ${failure}`));
	}
	const sum = (key) => results.reduce((total, result) => total + result[key], 0);
	say(`\n${sum('passed')} passed, ${sum('failed')} failed`);
	process.exitCode = sum('failed') === 0 ? 0 : 1;
}

for (const signal of ['SIGINT', 'SIGTERM']) {
	process.on(signal, () => {
		endRunning();
		process.exit(130);
	});
}

run().catch(giveUp);
