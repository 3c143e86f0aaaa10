import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { clusterVersion, findPrograms, otherVersion } from './postgres-programs.mjs';

let folder = '';
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'evendraft-programs-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

/** Programs that tell a version and do nothing else. @param {string} place @param {string} version @param {string[]} [names] */
function install(place, version, names = ['postgres', 'initdb', 'pg_ctl']) {
	mkdirSync(join(folder, place), { recursive: true });
	for (const name of names)
		writeFileSync(join(folder, place, name), `#!/bin/sh\necho "${name} (PostgreSQL) ${version}"\n`, { mode: 0o755 });
	return join(folder, place);
}

/** @param {{ major?: number, path?: string }} [more] */
const find = (more) => findPrograms({ debian: join(folder, 'debian'), path: '', ...more });

describe("PostgreSQL's programs", () => {
	it('are none on a bare machine', () => {
		expect(find()).toBeNull();
	});

	it("are Debian's newest, by number and not by letters", () => {
		install('debian/9/bin', '9.6');
		install('debian/15/bin', '15.18 (Debian 15.18-0+deb12u1)');
		const newest = install('debian/17/bin', '17.2');
		expect(find()).toEqual({ folder: newest, major: 17, version: '17.2' });
	});

	it('are of the version that made the cluster', () => {
		const older = install('debian/15/bin', '15.18');
		install('debian/17/bin', '17.2');
		expect(find({ major: 15 })?.folder).toBe(older);
		expect(find({ major: 16 })).toBeNull();
	});

	it('are taken from the PATH after Debian, through a link if need be', () => {
		const real = install('opt/pgsql/bin', '16.4');
		mkdirSync(join(folder, 'bin'));
		symlinkSync(join(real, 'initdb'), join(folder, 'bin/initdb'));
		expect(find({ path: join(folder, 'bin') })?.folder).toBe(real);
		const debian = install('debian/15/bin', '15.18');
		expect(find({ path: join(folder, 'bin') })?.folder).toBe(debian);
	});

	it('are not taken when one of the three is missing, broken or of another version', () => {
		install('debian/15/bin', '15.18', ['postgres', 'initdb']);
		expect(find()).toBeNull();
		install('debian/15/bin', '14.9', ['pg_ctl']);
		expect(find()).toBeNull();
		writeFileSync(join(folder, 'debian/15/bin/pg_ctl'), '#!/bin/sh\nexit 127\n', { mode: 0o755 });
		expect(find()).toBeNull();
	});

	it('are not taken when they are too old', () => {
		install('debian/13/bin', '13.14');
		expect(find()).toBeNull();
	});
});

describe('a cluster', () => {
	it('tells its version, or that it is none', () => {
		expect(clusterVersion(folder)).toBeUndefined();
		writeFileSync(join(folder, 'PG_VERSION'), '15\n');
		expect(clusterVersion(folder)).toBe(15);
	});

	it('of another version is refused with what to do', () => {
		const { message } = otherVersion('/x/cluster', 15, { folder: '/y', major: 17, version: '17.2' });
		expect(message).toMatch(/made by PostgreSQL 15, and only 17\.2 is here: install postgresql-15/);
	});
});
