import { describe, expect, it } from 'vitest';
import { tallyOf } from './tally.mjs';

/** @param {string[]} statuses @param {string} [status] */
const file = (statuses, status = statuses.includes('failed') ? 'failed' : 'passed') => ({
	status,
	assertionResults: statuses.map((one) => ({ status: one }))
});
/** @param {ReturnType<typeof file>[]} testResults @param {number | null} code */
function counts(testResults, code) {
	const { passed, failed } = tallyOf({ testResults }, code);
	return [passed, failed];
}

describe('a run of tests', () => {
	it('counts what passed and what failed', () => {
		expect(counts([file(['passed', 'passed']), file(['passed', 'failed'])], 1)).toEqual([3, 1]);
	});

	it('counts what was skipped or left to do as failed', () => {
		expect(counts([file(['passed', 'skipped', 'pending', 'todo'])], 0)).toEqual([1, 3]);
	});

	it('counts a file that could not be run', () => {
		expect(counts([file(['passed']), file([], 'failed')], 1)).toEqual([1, 1]);
		expect(counts([file(['passed', 'passed'], 'failed')], 1)).toEqual([2, 1]);
	});

	it('has failed when no test was run, whatever its code', () => {
		expect(counts([], 0)).toEqual([0, 1]);
		const { passed, failed } = tallyOf(null, 0);
		expect([passed, failed]).toEqual([0, 1]);
	});

	it('has failed when it ended badly though its tests passed', () => {
		expect(counts([file(['passed'])], 1)).toEqual([1, 1]);
		expect(counts([file(['passed'])], null)).toEqual([1, 1]);
	});

	it('counts a bad end once when a test has told of it', () => {
		expect(counts([file(['failed'])], 1)).toEqual([0, 1]);
	});
});
