import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { onPath, wayToApt } from './debian.mjs';

let folder = '';
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'evendraft-debian-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

/** @param {string} name @param {number} [mode] */
const program = (name, mode = 0o755) => writeFileSync(join(folder, name), '#!/bin/sh\n', { mode });

describe('the way to apt', () => {
	it('is missing where there is no apt', () => {
		expect(wayToApt({ root: true, path: folder, terminal: true })).toEqual({ missing: 'apt' });
	});

	it('is open to root', () => {
		program('apt-get');
		expect(wayToApt({ root: true, path: folder, terminal: false })).toEqual({ before: [] });
	});

	it('leads through sudo for others, which may ask only at a terminal', () => {
		program('apt-get');
		expect(wayToApt({ root: false, path: folder, terminal: true })).toEqual({ missing: 'sudo' });
		program('sudo');
		expect(wayToApt({ root: false, path: folder, terminal: true })).toEqual({ before: ['sudo'] });
		expect(wayToApt({ root: false, path: folder, terminal: false })).toEqual({ before: ['sudo', '-n'] });
	});
});

describe('a program on the PATH', () => {
	it('is one that can be run', () => {
		program('plain', 0o644);
		program('initdb');
		expect(onPath('plain', folder)).toBeNull();
		expect(onPath('initdb', `/nowhere:${folder}`)).toBe(join(folder, 'initdb'));
	});
});
