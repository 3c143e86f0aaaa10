import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { clusterFolder } from './database-account.mjs';

let kept = '';
beforeEach(() => {
	kept = mkdtempSync(join(tmpdir(), 'evendraft-kept-'));
});
afterEach(() => rmSync(kept, { recursive: true }));

const account = { uid: 101, gid: 104 };
const closed = { elsewhere: '/var/lib/postgresql', mayEnter: () => false };

describe("the cluster's folder", () => {
	it('is in the project for an ordinary user, and for root where the database may enter', () => {
		expect(clusterFolder(kept, null, closed)).toBe(join(kept, 'cluster'));
		expect(clusterFolder(kept, account, { ...closed, mayEnter: () => true })).toBe(join(kept, 'cluster'));
	});

	it('is elsewhere, one for each project, where the database may not enter', () => {
		const one = clusterFolder('/root/one/.evendraft', account, closed);
		expect(one).toMatch(/^\/var\/lib\/postgresql\/evendraft-[0-9a-f]{12}$/);
		expect(clusterFolder('/root/two/.evendraft', account, closed)).not.toBe(one);
		expect(clusterFolder('/root/one/.evendraft', account, closed)).toBe(one);
	});

	it('stays where it is once it was made', () => {
		mkdirSync(join(kept, 'cluster'));
		expect(clusterFolder(kept, account, closed)).toBe(join(kept, 'cluster'));
	});
});
