/** What a run of vitest amounts to: its own JSON report, counted with distrust. */

/**
 * @typedef {{ status: string, assertionResults?: { status: string }[], message?: string, name?: string }} TestFile
 * @typedef {{ testResults?: TestFile[] }} VitestReport
 * @typedef {{ passed: number, failed: number, remarks: string[] }} Tally
 */

/**
 * Counts tests. A file that could not be run, a run that ended badly though its tests passed, a run without a test, and
 * a test that was skipped are failures.
 *
 * @param {VitestReport | null} report null when vitest left none
 * @param {number | null} code its exit code; null when a signal ended it
 * @returns {Tally}
 */
export function tallyOf(report, code) {
	const files = report?.testResults ?? [];
	const tests = files.flatMap((file) => file.assertionResults ?? []);
	const count = (/** @type {string} */ status) => tests.filter((test) => test.status === status).length;
	const passed = count('passed');
	const idle = tests.length - passed - count('failed');
	const broken = files.filter(
		(file) => file.status === 'failed' && !file.assertionResults?.some(({ status }) => status === 'failed')
	).length;
	const remarks = [];
	if (idle) remarks.push(`${idle} skipped or left to do: each counts as failed`);
	if (broken) remarks.push(`${broken} test files could not be run`);
	let failed = count('failed') + idle + broken;
	if (!failed && passed === 0) {
		failed = 1;
		remarks.push('no test was run');
	} else if (!failed && code !== 0) {
		failed = 1;
		remarks.push(`the tests passed, but the run ended with ${code === null ? 'a signal' : `code ${code}`}`);
	}
	return { passed, failed, remarks };
}
