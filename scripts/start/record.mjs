/**
 * The record of a running `npm start`: one at a time in a folder, and what one that was killed left behind is found
 * again by the next.
 */
import { existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { isAlive, markOf, stopGroup } from '../machine/processes.mjs';
import { Refusal } from '../machine/say.mjs';

/** @typedef {import('../machine/processes.mjs').ProcessMark} ProcessMark */
/** @typedef {{ start: ProcessMark, address?: string, server?: ProcessMark, database?: ProcessMark }} Running */

/** @param {string} file @returns {Running | null} null when there is none, or none that can be read */
function readRecord(file) {
	try {
		const record = JSON.parse(readFileSync(file, 'utf8'));
		return typeof record?.start?.pid === 'number' ? record : null;
	} catch {
		return null;
	}
}

/**
 * Takes the record for this process.
 * @param {string} file
 * @returns {{ left: Running | null, note: (more: Partial<Running>) => void, drop: () => void }} left: what a killed start
 *   left behind
 * @throws {Refusal} when another start is alive
 */
export function takeRecord(file) {
	/** @type {Running} */
	let record = { start: markOf(process.pid) };
	const left = readRecord(file);
	if (left && isAlive(left.start)) {
		const where = left.address ? ` at ${left.address}` : '';
		throw new Refusal(
			`Evendraft already runs here${where} (process ${left.start.pid}): use that one, or stop it with Ctrl-C first.`
		);
	}
	if (existsSync(file)) rmSync(file, { force: true });
	try {
		writeFileSync(file, JSON.stringify(record), { flag: 'wx', mode: 0o600 });
	} catch (error) {
		if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
		throw new Refusal('Evendraft is being started here at this very moment: use that one.');
	}
	return {
		left,
		note(more) {
			record = { ...record, ...more };
			writeFileSync(`${file}.half`, JSON.stringify(record), { mode: 0o600 });
			renameSync(`${file}.half`, file);
		},
		drop: () => rmSync(file, { force: true })
	};
}

/** Stops the web server of a start that was killed. @param {Running | null} left @returns {Promise<boolean>} */
export async function stopLeftServer(left) {
	if (!left?.server || !isAlive(left.server)) return false;
	await stopGroup(left.server);
	return true;
}
