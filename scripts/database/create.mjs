/** The database inside a cluster. */
import postgres from 'postgres';
import { clusterFault } from '../machine/cluster-faults.mjs';
import { Refusal } from '../machine/say.mjs';

const WRONG_PASSWORD = '28P01';

/**
 * Makes the database unless it is there.
 * @param {string} url the owner's, to any database of the cluster
 * @param {string} name @param {string} cluster its folder, for the words of a refusal
 */
export async function requireDatabase(url, name, cluster) {
	const sql = postgres(url, { max: 1, onnotice: () => {}, connect_timeout: 30 });
	try {
		const [found] = await sql`select 1 from pg_database where datname = ${name}`;
		if (!found) await sql`create database ${sql(name)}`;
	} catch (error) {
		const { code, message } = /** @type {Error & { code?: string }} */ (error);
		if (code === WRONG_PASSWORD)
			throw new Refusal(
				`The database in ${cluster} does not know the password in .evendraft/local.env: put the file back that belongs to it, or move ${cluster} away to begin with an empty one.`
			);
		throw clusterFault(`error: ${message}`, { cluster });
	} finally {
		await sql.end({ timeout: 5 });
	}
}
