/**
 * Which user the database runs as, and where its folder can be. PostgreSQL refuses to run as root, so root hands it to
 * Debian's user `postgres`, who must be able to reach the folder.
 */
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { nearestFolder } from './disk.mjs';
import { Refusal } from './say.mjs';

/** @typedef {import('./processes.mjs').Account} Account */

/** @param {'-u' | '-g'} what @returns {number | null} */
function idOfPostgres(what) {
	const { status, stdout } = spawnSync('id', [what, 'postgres'], { encoding: 'utf8' });
	return status === 0 ? Number(stdout) : null;
}

/** @returns {Account | null} null for an ordinary user, who runs the database as himself */
export function databaseAccount() {
	if (process.getuid?.() !== 0) return null;
	const [uid, gid] = [idOfPostgres('-u'), idOfPostgres('-g')];
	if (uid === null || gid === null)
		throw new Refusal(
			"PostgreSQL does not run as root, and there is no user postgres to run it: make one ('useradd --system postgres'), or run the command as an ordinary user."
		);
	return { uid, gid };
}

/** @param {string} folder @param {Account} account whether that user may pass through */
export function canEnter(folder, account) {
	return spawnSync('test', ['-x', folder], { ...account, cwd: '/' }).status === 0;
}

/**
 * Where a cluster of this project goes.
 * @param {string} kept the project's own folder for such things
 * @param {Account | null} account
 * @param {{ elsewhere?: string, mayEnter?: typeof canEnter }} [given]
 */
export function clusterFolder(kept, account, { elsewhere = '/var/lib/postgresql', mayEnter = canEnter } = {}) {
	const inside = join(kept, 'cluster');
	if (account === null || existsSync(inside) || mayEnter(nearestFolder(kept), account)) return inside;
	const hash = createHash('sha256').update(dirname(kept)).digest('hex').slice(0, 12);
	return join(elsewhere, `evendraft-${hash}`);
}

/**
 * The user that an existing cluster belongs to.
 * @param {string} folder
 * @param {Account | null} account the one for a new cluster
 * @returns {Account | null}
 */
export function ownerOf(folder, account) {
	const { uid, gid } = statSync(folder);
	if (account === null) {
		if (uid === process.getuid?.()) return null;
		throw new Refusal(
			`The database in ${folder} belongs to another user: run the command as that user (or as root), or move the folder away to begin with an empty one.`
		);
	}
	if (uid === 0)
		throw new Refusal(
			`The database in ${folder} belongs to root, which PostgreSQL refuses: give it back with 'chown -R postgres: ${folder}'.`
		);
	return { uid, gid };
}
