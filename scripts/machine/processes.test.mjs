import { spawn } from 'node:child_process';
import { describe, expect, it } from 'vitest';
import { isAlive, markOf, run, stopGroup, stopMarked } from './processes.mjs';

/** @param {string} script @param {NodeJS.ProcessEnv} [env] @returns {Promise<number>} once the script has spoken */
const shell = (script, env) =>
	new Promise((resolve) => {
		const child = spawn('sh', ['-c', script], { detached: true, env: { ...process.env, ...env } });
		child.stdout.once('data', () => resolve(child.pid ?? 0));
	});

describe('a process', () => {
	it('is alive by its number and its beginning together', async () => {
		const mark = markOf(process.pid);
		expect(isAlive(mark)).toBe(true);
		expect(isAlive({ ...mark, began: 'before the restart' })).toBe(false);
		expect(isAlive({ pid: 4_194_000, began: mark.began })).toBe(false);
		expect(isAlive(null)).toBe(false);
	});

	it('that takes no notice is stopped with all its group', async () => {
		const mark = markOf(await shell("trap '' TERM; sleep 60 & echo ready; wait; wait; sleep 60"));
		expect(isAlive(mark)).toBe(true);
		await stopGroup(mark, 200);
		for (let n = 0; n < 40 && isAlive(mark); n++) await new Promise((resolve) => setTimeout(resolve, 25));
		expect(isAlive(mark)).toBe(false);
	});

	it('is found by a variable that it was started with', async () => {
		const value = `test ${process.pid}`;
		const marked = markOf(await shell('echo ready; sleep 60', { EVENDRAFT_MARK: value }));
		const other = markOf(await shell('echo ready; sleep 60', { EVENDRAFT_MARK: `${value} other` }));
		await stopMarked('EVENDRAFT_MARK', value);
		expect(isAlive(marked)).toBe(false);
		expect(isAlive(other)).toBe(true);
		await stopGroup(other);
	});
});

describe('a short program', () => {
	it('gives its code and all it said', async () => {
		expect(await run('sh', ['-c', 'echo out; echo err >&2; exit 3'])).toMatchObject({ code: 3 });
		expect((await run('sh', ['-c', 'echo out; echo err >&2'])).output).toMatch(/out[^]*err|err[^]*out/);
	});

	it('that is not there is an outcome, not an exception', async () => {
		const { code, output } = await run('/no/such/program', []);
		expect(code).toBeNull();
		expect(output).toContain('ENOENT');
	});
});
