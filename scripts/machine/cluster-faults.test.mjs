import { describe, expect, it } from 'vitest';
import { clusterFault } from './cluster-faults.mjs';

// The lines are those of PostgreSQL 15's own sources.
describe("PostgreSQL's trouble", () => {
	it.each([
		['FATAL:  could not write to file "pg_wal/xlogtemp.77": No space left on device', 'The disk filled up'],
		['FATAL:  could not resize shared memory segment "/PostgreSQL.1": No space left on device', '/dev/shm'],
		['LOG:  could not bind IPv4 address "127.0.0.1": Address already in use', 'Port 54310 was taken'],
		['FATAL:  database files are incompatible with server', 'another build of PostgreSQL'],
		['FATAL:  lock file "postmaster.pid" already exists', 'Another PostgreSQL still works in'],
		['FATAL:  data directory "/c" has wrong ownership', 'cannot be read by the user'],
		['PANIC:  could not locate a valid checkpoint record', 'is damaged (PANIC: could not locate'],
		['FATAL:  could not open file "global/pg_filenode.map": No such file or directory', 'is damaged'],
		['FATAL:  unrecognized configuration parameter "x"', 'did not start (FATAL: unrecognized'],
		['', 'did not start (it gave no reason)']
	])('%s', (said, expected) => {
		const { message } = clusterFault(`LOG:  starting\n${said}\nLOG:  shut down\n`, { cluster: '/c', port: 54_310 });
		expect(said === '' ? clusterFault('', { cluster: '/c' }).message : message).toContain(expected);
		expect(message).not.toContain('\n');
	});
});
