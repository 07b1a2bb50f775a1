import { expect, test } from 'vitest';
import { tallyReport } from './tally.mjs';

const file = (name: string, status: string, statuses: string[]) => ({
	name,
	status,
	assertionResults: statuses.map((each, index) => ({ status: each, fullName: `${name} ${index}` }))
});

test('counts what passed and what did not, and lets no test be skipped', () => {
	const tally = tallyReport({
		testResults: [
			file('a', 'passed', ['passed', 'passed']),
			file('b', 'failed', ['passed', 'failed']),
			file('c', 'passed', ['passed', 'skipped', 'todo'])
		]
	});
	expect(tally).toEqual({
		passed: 4,
		failed: 3,
		failures: ['failed: b 1', 'skipped: c 1', 'todo: c 2']
	});
});

test('a file that could not be run is a failure', () => {
	expect(tallyReport({ testResults: [file('broken.ts', 'failed', [])] })).toEqual({
		passed: 0,
		failed: 1,
		failures: ['could not run: broken.ts']
	});
});
