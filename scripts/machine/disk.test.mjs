import { describe, expect, it } from 'vitest';
import { requireRoom, tellsOfFullDisk } from './disk.mjs';

describe('room on the disk', () => {
	it('is asked of the nearest folder that is there', () => {
		/** @type {string[]} */
		const asked = [];
		requireRoom('/tmp/not/there/yet', (folder) => {
			asked.push(folder);
			return { bavail: 300_000, bsize: 4096 };
		});
		expect(asked).toEqual(['/tmp']);
	});

	it('below 1 GB is refused with the figure', () => {
		expect(() => requireRoom('/tmp', () => ({ bavail: 100_000, bsize: 4096 }))).toThrow(/Only 409 MB are free/);
	});

	it('that runs out is known from what programs say', () => {
		expect(tellsOfFullDisk('npm error code ENOSPC')).toBe(true);
		expect(tellsOfFullDisk('initdb: error: could not write: No space left on device')).toBe(true);
		expect(tellsOfFullDisk('npm error code E404')).toBe(false);
	});
});
