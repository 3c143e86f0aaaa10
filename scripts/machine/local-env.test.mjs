import { appendFileSync, mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { localEnv } from './local-env.mjs';

let folder = '';
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'evendraft-env-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

describe('the local secrets', () => {
	it('are made once, differ from one another, and are for the owner alone', () => {
		const first = localEnv({}, folder);
		expect(localEnv({}, folder)).toEqual(first);
		expect(new Set(Object.values(first)).size).toBe(3);
		for (const value of Object.values(first)) expect(Buffer.from(value, 'base64url')).toHaveLength(32);
		expect(statSync(join(folder, 'local.env')).mode & 0o777).toBe(0o600);
	});

	it('keep what was added by hand, and take changes', () => {
		const { AUTH_SECRET } = localEnv({}, folder);
		appendFileSync(join(folder, 'local.env'), 'MINE=a=b\n');
		const changed = localEnv({ DATABASE_PORT: '54321' }, folder);
		expect(changed).toMatchObject({ AUTH_SECRET, MINE: 'a=b', DATABASE_PORT: '54321' });
		expect(readFileSync(join(folder, 'local.env'), 'utf8')).toContain('\nMINE=a=b\n');
	});
});
