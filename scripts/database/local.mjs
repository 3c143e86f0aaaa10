/** The database of this project on this machine: its cluster in .evendraft/, made at the first start. */
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { APP, databaseUrl, makeCluster, OWNER, startCluster } from '../machine/cluster.mjs';
import { clusterFolder, databaseAccount, ownerOf } from '../machine/database-account.mjs';
import { requireRoom } from '../machine/disk.mjs';
import { KEPT, makeFolders, PROJECT } from '../machine/folders.mjs';
import { localEnv } from '../machine/local-env.mjs';
import { freePort, portProblem } from '../machine/ports.mjs';
import { requirePrograms } from '../machine/postgres-programs.mjs';
import { runningPostmaster } from '../machine/postmaster.mjs';
import { say } from '../machine/say.mjs';
import { requireDatabase } from './create.mjs';

const FIRST = 54_310;
const LAST = 54_399;
const NAME = 'evendraft';

/** @typedef {import('../machine/cluster.mjs').Cluster} Cluster */

/** @returns {Promise<Cluster>} the cluster's place and programs; PostgreSQL is installed if need be, nothing is made */
export async function localCluster() {
	const account = databaseAccount();
	const folder = clusterFolder(KEPT, account);
	const exists = existsSync(folder);
	return {
		folder,
		account: exists ? ownerOf(folder, account) : account,
		programs: await requirePrograms(exists ? folder : null)
	};
}

/** @param {Cluster} cluster @param {Record<string, string>} env @returns {Promise<number>} the kept port, or a new one */
async function databasePort(cluster, env) {
	const running = runningPostmaster(cluster.folder);
	if (running) return running.port;
	const kept = Number(env.DATABASE_PORT);
	if (kept && (await portProblem(kept)) === null) return kept;
	// Clones of the project on one machine begin at different places.
	const begin = FIRST + ([...PROJECT].reduce((sum, letter) => sum + letter.charCodeAt(0), 0) % (LAST - FIRST + 1));
	const port = await freePort(FIRST, LAST, begin);
	if (kept) say(`  Port ${kept} is taken by another program: the database uses ${port} from now on.`);
	return port;
}

/**
 * The local database, running and there to be migrated.
 *
 * @param {(started: { cluster: Cluster, mark: import('../machine/processes.mjs').ProcessMark, wasRunning: boolean })
 *   => void} [onStarted] told as soon as it runs, so that it can be stopped should a later step fail
 * @returns {Promise<{ cluster: Cluster, adminUrl: string, appUrl: string, wasRunning: boolean, made: boolean,
 *   port: number }>}
 */
export async function startLocalDatabase(onStarted) {
	makeFolders();
	requireRoom(KEPT);
	const cluster = await localCluster();
	requireRoom(cluster.folder);
	const env = localEnv();
	const made = !existsSync(cluster.folder);
	if (made) {
		if (cluster.folder !== join(KEPT, 'cluster'))
			say(`  ${PROJECT} is closed to the database's user: its folder is ${cluster.folder}.`);
		await makeCluster(cluster, { password: env.DATABASE_OWNER_PASSWORD });
	}
	const { port, wasRunning, mark } = await startCluster(cluster, await databasePort(cluster, env));
	onStarted?.({ cluster, mark, wasRunning });
	localEnv({ DATABASE_PORT: String(port) });
	const owner = { user: OWNER, password: env.DATABASE_OWNER_PASSWORD, port };
	await requireDatabase(databaseUrl({ ...owner, database: 'postgres' }), NAME, cluster.folder);
	return {
		cluster,
		made,
		port,
		wasRunning,
		adminUrl: databaseUrl({ ...owner, database: NAME }),
		appUrl: databaseUrl({ user: APP, password: env.DATABASE_APP_PASSWORD, port, database: NAME })
	};
}
