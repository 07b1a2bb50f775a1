/** Counts of a test run, from the report that Vitest writes as JSON. Plain Node, no packages. */

/**
 * Passed and failed tests of one report. A file that could not be run counts as one failure; so does a test that was
 * skipped or left to do, since this house keeps none.
 */
export function tallyReport(report) {
	let passed = 0;
	const failures = [];
	for (const file of report.testResults) {
		for (const { status, fullName } of file.assertionResults) {
			if (status === 'passed') passed += 1;
			else failures.push(`${status}: ${fullName}`);
		}
		const said = file.assertionResults.some(({ status }) => status === 'failed');
		if (file.status === 'failed' && !said) failures.push(`could not run: ${file.name}`);
	}
	return { passed, failed: failures.length, failures };
}
