import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { npmTrouble, packagesMatchLock } from './packages.mjs';

let project = '';
beforeEach(() => {
	project = mkdtempSync(join(tmpdir(), 'evendraft-packages-'));
	mkdirSync(join(project, 'node_modules/one'), { recursive: true });
});
afterEach(() => rmSync(project, { recursive: true }));

const one = { version: '1.0.0', integrity: 'sha512-one' };
/** @param {string} file @param {object} packages */
const write = (file, packages) => writeFileSync(join(project, file), JSON.stringify({ packages }));
/** @param {object} asked @param {object} there */
function matches(asked, there) {
	write('package-lock.json', { '': {}, ...asked });
	write('node_modules/.package-lock.json', there);
	return packagesMatchLock(project);
}

describe('the installed packages', () => {
	it('match the lock when version, sum and folder do', () => {
		expect(matches({ 'node_modules/one': one }, { 'node_modules/one': one })).toBe(true);
	});

	it('may lack what is for other systems, and nothing else', () => {
		expect(matches({ 'node_modules/mac': { ...one, optional: true } }, {})).toBe(true);
		expect(matches({ 'node_modules/two': one }, {})).toBe(false);
	});

	it('do not match with another version, another sum or a folder that has gone', () => {
		expect(matches({ 'node_modules/one': one }, { 'node_modules/one': { ...one, version: '1.0.1' } })).toBe(false);
		expect(matches({ 'node_modules/one': one }, { 'node_modules/one': { ...one, integrity: 'sha512-x' } })).toBe(false);
		expect(matches({ 'node_modules/gone': one }, { 'node_modules/gone': one })).toBe(false);
	});

	it('are missing where npm left no note', () => {
		write('package-lock.json', { '': {} });
		expect(packagesMatchLock(project)).toBe(false);
	});
});

describe("npm's trouble is told in one line:", () => {
	it.each([
		['npm error code ENOSPC\nnpm error syscall write', /disk filled up/],
		['npm error code EAI_AGAIN\nnpm error request to https://x failed', /connect this machine to the network/],
		['npm error code EACCES\nnpm error syscall mkdir', /cannot be written by this user/],
		['npm error code EINTEGRITY\nnpm error sha512-a integrity checksum failed', /integrity checksum failed/],
		['', /npm gave no reason/]
	])('%j', (output, words) => {
		const { message } = npmTrouble(output);
		expect(message).toMatch(words);
		expect(message).not.toContain('\n');
	});
});
