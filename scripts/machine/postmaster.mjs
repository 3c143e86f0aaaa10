/** Who serves a cluster's folder at this moment. */
import { readdirSync, readFileSync, readlinkSync, realpathSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { markOf } from './processes.mjs';

/** @typedef {import('./processes.mjs').ProcessMark} ProcessMark */

/** @param {number | string} pid @returns {string | null} the folder it works in */
function workingFolder(pid) {
	try {
		return readlinkSync(`/proc/${pid}/cwd`);
	} catch {
		return null;
	}
}

/**
 * The running server of a cluster, from the note it keeps there. A note left by a killed server may name a process that
 * is by now something else: only one that works in the folder counts.
 *
 * @param {string} cluster
 * @returns {{ mark: ProcessMark, port: number } | null}
 */
export function runningPostmaster(cluster) {
	let lines;
	try {
		lines = readFileSync(join(cluster, 'postmaster.pid'), 'utf8').split('\n');
	} catch {
		return null;
	}
	const pid = Number(lines[0]);
	if (!(pid > 0) || workingFolder(pid) !== realpathSync(cluster)) return null;
	return { mark: markOf(pid), port: Number(lines[3]) };
}

/**
 * Removes the note of a server that has gone. It stays while any process works in the folder: a server's children can
 * outlive it for a moment, and two servers in one folder would destroy it.
 *
 * @param {string} cluster
 */
export function clearStaleNote(cluster) {
	const folder = realpathSync(cluster);
	const inUse = readdirSync('/proc').some((pid) => /^\d+$/.test(pid) && workingFolder(pid) === folder);
	if (!inUse) rmSync(join(cluster, 'postmaster.pid'), { force: true });
}
