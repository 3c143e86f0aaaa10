/** What PostgreSQL says when it cannot go on, in one line that tells what to do. */
import { fullDisk } from './disk.mjs';
import { Refusal } from './say.mjs';

/**
 * @param {string} said the server's log, or what initdb or pg_ctl printed
 * @param {{ cluster: string, port?: number }} where
 * @returns {Refusal}
 */
export function clusterFault(said, { cluster, port }) {
	const afresh = `bring it back from a copy, or move ${cluster} away to begin with an empty one`;
	if (/could not (?:resize|open|create) shared memory|shmget|semget/i.test(said))
		return new Refusal(
			'The database got no shared memory from the system: close other programs or enlarge /dev/shm, and run the command again.'
		);
	if (/No space left on device|ENOSPC|Disk quota exceeded/i.test(said)) return fullDisk('the database wrote');
	if (/Address already in use|could not create any TCP\/IP sockets/i.test(said))
		return new Refusal(`Port ${port} was taken while the database started: run the command again.`);
	// The version in PG_VERSION has been compared before.
	if (/database files are incompatible|not compatible with (?:this|server)/i.test(said))
		return new Refusal(`The database in ${cluster} is damaged, or was made by another build of PostgreSQL: ${afresh}.`);
	if (/lock file "[^"]*" already exists|pre-existing shared memory block/i.test(said))
		return new Refusal(
			`Another PostgreSQL still works in ${cluster}: stop it ('node scripts/database.mjs stop') and run the command again.`
		);
	if (/Permission denied|has wrong ownership|has invalid permissions|group or world access/i.test(said))
		return new Refusal(
			`The database in ${cluster} cannot be read by the user it belongs to (${firstFatal(said)}): mend the permissions of the folder.`
		);
	if (
		/checkpoint record|control file|pg_control|checksum|invalid page|PANIC|could not (?:open|access|read)/i.test(said)
	)
		return new Refusal(`The database in ${cluster} is damaged (${firstFatal(said)}): ${afresh}.`);
	return new Refusal(
		`The database in ${cluster} did not start (${firstFatal(said)}): see ${cluster}/server.log and mend that, or ${afresh}.`
	);
}

/** @param {string} said */
function firstFatal(said) {
	const line = said.match(/(?:PANIC|FATAL|error|fatal):\s+.*/)?.[0] ?? said.trim().split('\n').at(-1) ?? '';
	return line.replace(/\s+/g, ' ') || 'it gave no reason';
}
