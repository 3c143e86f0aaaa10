/** Room on the disk: asked for before the work, and recognised when it runs out on the way. */
import { existsSync, statfsSync } from 'node:fs';
import { dirname } from 'node:path';
import { Refusal } from './say.mjs';

export const NEEDED_BYTES = 1e9;

/** @param {string} folder that may not exist yet */
export function nearestFolder(folder) {
	let at = folder;
	while (!existsSync(at) && dirname(at) !== at) at = dirname(at);
	return at;
}

/**
 * @param {string} folder
 * @param {(folder: string) => { bavail: number, bsize: number }} [statfs]
 * @throws {Refusal} when less than 1 GB is free there
 */
export function requireRoom(folder, statfs = statfsSync) {
	const { bavail, bsize } = statfs(nearestFolder(folder));
	const free = bavail * bsize;
	if (free >= NEEDED_BYTES) return;
	throw new Refusal(
		`Only ${Math.floor(free / 1e6)} MB are free on the disk of ${folder}, and 1 GB is needed: make room and run the command again.`
	);
}

/** @param {string} text an error's message or the output of a program */
export const tellsOfFullDisk = (text) => /ENOSPC|No space left on device|disk quota exceeded|EDQUOT/i.test(text);

/** @param {string} what was being done */
export function fullDisk(what) {
	return new Refusal(`The disk filled up while ${what}: make room (1 GB is enough) and run the command again.`);
}
