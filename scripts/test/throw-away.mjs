/** A cluster for one run of the tests, in a temporary folder, stopped and removed whatever happens. */
import { chmodSync, existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { databaseUrl, makeCluster, OWNER, startCluster, stopCluster } from '../machine/cluster.mjs';
import { databaseAccount, ownerOf } from '../machine/database-account.mjs';
import { requireRoom } from '../machine/disk.mjs';
import { secret } from '../machine/local-env.mjs';
import { freePort } from '../machine/ports.mjs';
import { findPrograms, requirePrograms } from '../machine/postgres-programs.mjs';
import { isAlive, markOf, stopMarked } from '../machine/processes.mjs';

const FIRST = 54_400;
const LAST = 54_999;
const PREFIX = 'evendraft-test-';

/** The variable by which the processes of a run, and all that they start, are known. */
export const RUN_MARK = 'EVENDRAFT_TEST_RUN';

/** Nothing here outlives the run, so nothing waits for the disk, except where a test is about just that. */
const speed = () => (process.env.EVENDRAFT_TEST_FSYNC ? {} : { fsync: 'off', full_page_writes: 'off' });

/** @returns {string} a folder for one run, marked with the process it belongs to */
export function makeRunFolder() {
	const folder = mkdtempSync(join(tmpdir(), PREFIX));
	chmodSync(folder, 0o711);
	writeFileSync(join(folder, 'run.json'), JSON.stringify(markOf(process.pid)));
	return folder;
}

/** Stops and removes what runs that were killed have left. */
export async function clearLeftRuns() {
	for (const name of readdirSync(tmpdir()).filter((one) => one.startsWith(PREFIX))) {
		const folder = join(tmpdir(), name);
		try {
			if (isAlive(JSON.parse(readFileSync(join(folder, 'run.json'), 'utf8')))) continue;
			await removeRun(folder);
		} catch {
			// Another user's, or one that is being made at this moment.
		}
	}
}

/** @param {string} folder of a run, and the cluster in it */
export async function removeRun(folder) {
	await stopMarked(RUN_MARK, folder);
	const cluster = join(folder, 'cluster');
	const programs = findPrograms();
	if (existsSync(cluster) && programs)
		await stopCluster({ folder: cluster, programs, account: ownerOf(cluster, databaseAccount()) });
	rmSync(folder, { recursive: true, force: true, maxRetries: 5 });
}

/**
 * @param {string} folder of the run
 * @returns {Promise<{ adminUrl: string, appPassword: string }>} the owner's address, and the password that the
 *   application's role is to get
 */
export async function startThrowAway(folder) {
	requireRoom(folder);
	const account = databaseAccount();
	const cluster = { folder: join(folder, 'cluster'), account, programs: await requirePrograms(null) };
	const password = secret();
	await makeCluster(cluster, { password, durable: false, settings: { max_connections: '200', ...speed() } });
	// Runs beside one another begin at different places.
	const begin = FIRST + (process.pid % (LAST - FIRST + 1));
	const { port } = await startCluster(cluster, await freePort(FIRST, LAST, begin));
	return { adminUrl: databaseUrl({ user: OWNER, password, port, database: 'postgres' }), appPassword: secret() };
}
