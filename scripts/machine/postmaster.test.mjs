import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { clearStaleNote, runningPostmaster } from './postmaster.mjs';

let cluster = '';
/** @type {import('node:child_process').ChildProcess | undefined} */
let child;
beforeEach(() => {
	cluster = mkdtempSync(join(tmpdir(), 'evendraft-postmaster-'));
});
afterEach(() => {
	child?.kill('SIGKILL');
	rmSync(cluster, { recursive: true });
});

const noteFile = () => join(cluster, 'postmaster.pid');
/** @param {number} pid */
const note = (pid) => writeFileSync(noteFile(), `${pid}\n${cluster}\n1700000000\n54310\n\n127.0.0.1\n`);
/** @param {string} cwd @returns {Promise<number>} */
const sleeper = (cwd) =>
	new Promise((resolve) => {
		child = spawn('sleep', ['60'], { cwd });
		child.once('spawn', () => resolve(child?.pid ?? 0));
	});

describe("a cluster's server", () => {
	it('is none without a note', () => {
		expect(runningPostmaster(cluster)).toBeNull();
	});

	it('is the process in the note that works in the folder', async () => {
		const pid = await sleeper(cluster);
		note(pid);
		expect(runningPostmaster(cluster)).toMatchObject({ port: 54_310, mark: { pid } });
	});

	it('is not a stranger who was given the number of one that was killed', async () => {
		note(await sleeper(tmpdir()));
		expect(runningPostmaster(cluster)).toBeNull();
		clearStaleNote(cluster);
		expect(existsSync(noteFile())).toBe(false);
	});

	it('keeps its note while a child of it still works in the folder', async () => {
		await sleeper(cluster);
		note(4_194_000);
		clearStaleNote(cluster);
		expect(existsSync(noteFile())).toBe(true);
	});
});
