/** PostgreSQL's own programs: Debian's first, then those on the PATH, then installed through apt. */
import { readdirSync, readFileSync, realpathSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { spawnSync } from 'node:child_process';
import { installDebianPackage, onPath } from './debian.mjs';
import { Refusal } from './say.mjs';

const DEBIAN = '/usr/lib/postgresql';
const OLDEST = 14;

/** @typedef {{ folder: string, major: number, version: string }} Programs */

/** @param {string} folder @returns {Programs | null} null unless all three are there and agree on the version */
function programsIn(folder) {
	const versions = ['postgres', 'initdb', 'pg_ctl'].map((program) => {
		const { status, stdout } = spawnSync(join(folder, program), ['--version'], { encoding: 'utf8', cwd: '/' });
		return status === 0 ? stdout.match(/\(PostgreSQL\) (\d+)(\S*)/) : null;
	});
	const [first] = versions;
	if (!first || versions.some((version) => version?.[1] !== first[1])) return null;
	const major = Number(first[1]);
	return major < OLDEST ? null : { folder, major, version: first[1] + first[2] };
}

/** @param {string} debian @returns {string[]} newest first */
function debianFolders(debian) {
	try {
		return readdirSync(debian)
			.filter((name) => /^\d+$/.test(name))
			.sort((a, b) => Number(b) - Number(a))
			.map((name) => join(debian, name, 'bin'));
	} catch {
		return [];
	}
}

/**
 * The programs that fit.
 * @param {{ major?: number, debian?: string, path?: string }} [where] major: of a cluster that is there already
 * @returns {Programs | null}
 */
export function findPrograms({ major, debian = DEBIAN, path } = {}) {
	const folders = debianFolders(debian);
	const initdb = onPath('initdb', path);
	if (initdb) folders.push(dirname(initdb), dirname(realpathSync(initdb)));
	for (const folder of folders) {
		const programs = programsIn(folder);
		if (programs && (major === undefined || programs.major === major)) return programs;
	}
	return null;
}

/** @param {string} cluster @returns {number | undefined} the version that made it; undefined when there is none */
export function clusterVersion(cluster) {
	try {
		return Number(readFileSync(join(cluster, 'PG_VERSION'), 'utf8').trim());
	} catch (error) {
		if (/** @type {NodeJS.ErrnoException} */ (error).code === 'ENOENT') return undefined;
		throw error;
	}
}

/**
 * The programs for a cluster, installed if need be.
 * @param {string | null} cluster its folder, which may not exist yet; null for one that is about to be made
 * @returns {Promise<Programs>}
 */
export async function requirePrograms(cluster) {
	const major = cluster === null ? undefined : clusterVersion(cluster);
	const found = findPrograms({ major });
	if (found) return found;
	const other = findPrograms();
	if (other && major !== undefined) throw otherVersion(cluster ?? '', major, other);
	await installDebianPackage('postgresql', 'set DATABASE_URL to the owner of a database elsewhere');
	const installed = findPrograms({ major });
	if (installed) return installed;
	const newer = findPrograms();
	if (newer && major !== undefined) throw otherVersion(cluster ?? '', major, newer);
	throw new Refusal(
		`Debian's postgresql is installed but is not version ${OLDEST} or later, or its programs do not run: install a later one, or set DATABASE_URL.`
	);
}

/** @param {string} cluster @param {number} major @param {Programs} there */
export function otherVersion(cluster, major, there) {
	return new Refusal(
		`The database in ${cluster} was made by PostgreSQL ${major}, and only ${there.version} is here: install postgresql-${major}, or move that folder away to begin with an empty one.`
	);
}
